import withNuxt from './.nuxt/eslint.config.mjs'

/**
 * Which folder may import what (the table is in DEVELOPERS.md). The same rules are a test with the table's sentences:
 * tests/guards/imports.spec.ts. Here they show up while one types.
 */
const layer = (files, forbidden, message) => ({
  files,
  rules: { 'no-restricted-imports': ['error', { patterns: [{ group: forbidden, message }] }] },
})

export default withNuxt(
  { ignores: ['.output/**', '.nuxt/**', 'server/db/migrations/**', 'coverage/**'] },
  layer(['shared/**/*.ts'], ['vue', 'nuxt', 'nuxt/*', '#imports', 'h3', 'drizzle-orm', 'node:*', '#server/*'], 'shared/ imports only shared/ and zod.'),
  layer(['pages/**', 'components/**', 'composables/**', 'stores/**', 'utils/**', 'layouts/**'], ['#server/*', '**/server/**', 'drizzle-orm', 'better-sqlite3', 'mathjs', 'pdfkit'], 'The browser asks the server over HTTP; it never imports from server/.'),
  layer(['server/utils/calc/**/*.ts'], ['h3', 'drizzle-orm', '#imports', 'node:*', '**/reference', '**/reference/*', '**/plan/*', '**/print/*', '**/data/*', '**/db/*'], 'calc/ is pure: it gets numbers as arguments and imports only calc/ and shared/.'),
  layer(['server/utils/reference/**/*.ts'], ['h3', 'drizzle-orm', '#imports', '**/plan/*', '**/print/*', '**/data/*', '**/db/*'], 'reference/ holds cited records and imports only itself, calc/equation types and shared/.'),
  layer(['server/utils/plan/**/*.ts'], ['h3', 'drizzle-orm', '#imports', 'node:*', '**/print/*', '**/data/*', '**/db/*'], 'plan/ joins calc and reference; no database, no HTTP, no print.'),
  layer(['server/utils/print/**/*.ts'], ['h3', 'drizzle-orm', '#imports', '**/calc/*', '**/calc/**', '**/reference', '**/reference/*', '**/plan/*', '**/data/*', '**/db/*'], 'print/ prints what the plan says and computes nothing.'),
  layer(['server/api/**/*.ts'], ['**/server/db/*', '#server/db/*'], 'Routes reach the database through server/utils/data only.'),
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      'no-console': ['error', { allow: ['warn', 'error', 'info'] }],
    },
  },
  { files: ['scripts/**'], rules: { 'no-console': 'off' } },
)
