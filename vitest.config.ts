import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'

// Unit tests stand beside the code; the other projects need a database or a browser and are run by `npm test`.
export default defineConfig({
  test: {
    projects: [
      {
        plugins: [vue()],
        test: {
          name: 'unit',
          include: ['{shared,server,renderer,pages}/**/*.test.{ts,mjs}', 'tests/reference/**/*.test.ts'],
          exclude: ['**/*.db.test.ts'],
        },
      },
      {
        plugins: [vue()],
        test: {
          name: 'integration',
          include: ['tests/{integration,security}/**/*.test.ts', 'server/**/*.db.test.ts'],
          globalSetup: ['tests/support/database-template.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/support/database-template.ts'],
          testTimeout: 120_000,
          hookTimeout: 180_000,
          fileParallelism: false,
        },
      },
    ],
  },
})
