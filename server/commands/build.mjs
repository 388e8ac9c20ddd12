import { spawnSync } from 'node:child_process'
import process from 'node:process'
import { fileURLToPath } from 'node:url'
import { compressAssets } from './steps/compress-assets.mjs'

// `npm run build`: the pages for production, without starting anything. `npm start` does the same when something has changed.
const root = fileURLToPath(new URL('../..', import.meta.url))
const { status } = spawnSync(process.execPath, ['node_modules/vite/bin/vite.js', 'build'], {
  cwd: root,
  stdio: 'inherit',
  env: { ...process.env, NODE_ENV: 'production' },
})
if (status !== 0) process.exit(status ?? 1)
compressAssets(root)
