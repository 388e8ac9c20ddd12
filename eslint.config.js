import importX from 'eslint-plugin-import-x'
import pluginVue from 'eslint-plugin-vue'
import tseslint from 'typescript-eslint'

/** Imports run one way: pages → renderer → shared; pages (+data.ts) → server → shared; shared imports nothing of ours. */
const mayNotImport = (folder, forbidden, why) => ({
  files: [`${folder}/**/*.{ts,vue,mjs}`],
  ignores: ['**/*.test.ts'],
  rules: {
    'import-x/no-restricted-paths': [
      'error',
      { zones: forbidden.map((from) => ({ target: `./${folder}`, from: `./${from}`, message: why })) },
    ],
    'no-restricted-imports': [
      'error',
      {
        patterns: [
          { group: forbidden.map((from) => `#${from}/*`), message: why },
          ...(folder === 'shared'
            ? [{ group: ['node:*', 'vue', 'vue/*', 'vike', 'vike/*', 'express', 'pg', 'drizzle-orm', 'drizzle-orm/*'], message: why }]
            : []),
        ],
      },
    ],
  },
})

export default tseslint.config(
  { ignores: ['dist/**', 'node_modules/**', '.local/**', 'drizzle/**'] },
  ...tseslint.configs.recommended,
  ...pluginVue.configs['flat/recommended'],
  {
    plugins: { 'import-x': importX },
    languageOptions: {
      parserOptions: { parser: tseslint.parser, extraFileExtensions: ['.vue'] },
    },
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'no-console': 'error',
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      // Layout of templates is a matter of taste that reviews need not talk about.
      'vue/max-attributes-per-line': 'off',
      'vue/singleline-html-element-content-newline': 'off',
      'vue/multiline-html-element-content-newline': 'off',
      'vue/html-self-closing': 'off',
      'vue/html-indent': 'off',
      'vue/html-closing-bracket-newline': 'off',
      'vue/first-attribute-linebreak': 'off',
      'vue/multi-word-component-names': 'off',
      'vue/attributes-order': 'off',
    },
  },
  // TypeScript itself knows what is defined.
  { files: ['**/*.{ts,vue}'], rules: { 'no-undef': 'off' } },
  { files: ['server/commands/**', 'tests/**'], rules: { 'no-console': 'off' } },
  // One declaration carries both the schema and its type.
  { files: ['shared/schemas/**'], rules: { '@typescript-eslint/no-redeclare': 'off' } },
  mayNotImport('shared', ['server', 'renderer', 'pages'], 'shared/ is pure: it imports nothing of ours, no I/O, no Vue, no Node.'),
  mayNotImport('renderer', ['server', 'pages'], 'renderer/ runs in the browser: it may import shared/ only.'),
  {
    files: ['pages/**/*.{vue,ts}'],
    // What Vike runs on the server alone.
    ignores: ['**/+data.ts', '**/+guard.server.ts', '**/+title.ts', '**/+description.ts', '**/+headersResponse.ts', '**/+on*.ts', '**/+htmlAttributes.ts', '**/*.test.ts'],
    rules: {
      '@typescript-eslint/no-restricted-imports': [
        'error',
        { patterns: [{ group: ['#server/*'], message: 'Components run in the browser: take what +data.ts returns.', allowTypeImports: true }] },
      ],
    },
  },
  mayNotImport('server', ['renderer', 'pages'], 'server/ may import shared/ only.'),
)
