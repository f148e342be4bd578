import withNuxt from './.nuxt/eslint.config.mjs'

/**
 * Which folder may import what (the table is in DEVELOPERS.md). The same rules are a test with the table's sentences:
 * tests/guards/imports.spec.ts. Here they show up while one types.
 */
const FRAMEWORK = ['h3', 'drizzle-orm', 'drizzle-orm/*', 'better-sqlite3', 'nuxt', 'nuxt/*', '#imports']
const layer = (files, { packages = [], folders = [] }, message) => ({
  files,
  rules: {
    'no-restricted-imports': ['error', {
      patterns: [
        ...(packages.length > 0 ? [{ group: packages, message }] : []),
        // Folders of our own, however they are reached. Types in shared/ may carry the name of a folder.
        ...(folders.length > 0 ? [{ regex: `^(?!#shared/).*(^|/)(${folders.join('|')})(/|$)`, message }] : []),
      ],
    }],
  },
})

export default withNuxt(
  { ignores: ['.output/**', '.nuxt/**', 'server/db/migrations/**', 'coverage/**'] },
  layer(['shared/**/*.ts'], { packages: ['vue', 'node:*', '#server/*', ...FRAMEWORK] }, 'shared/ imports only shared/ and zod.'),
  layer(['pages/**', 'components/**', 'composables/**', 'stores/**', 'utils/**', 'layouts/**'], { packages: ['#server/*', 'h3', 'drizzle-orm', 'better-sqlite3', 'mathjs', 'pdfkit', 'node:*'], folders: ['server'] }, 'The browser asks the server over HTTP; it never imports from server/.'),
  layer(['server/utils/calc/**/*.ts'], { packages: [...FRAMEWORK, 'node:*'], folders: ['reference', 'plan', 'print', 'data', 'access', 'http', 'db'] }, 'calc/ is pure: it gets numbers as arguments and imports only calc/ and shared/.'),
  layer(['server/utils/reference/**/*.ts'], { packages: FRAMEWORK, folders: ['plan', 'print', 'data', 'access', 'http', 'db'] }, 'reference/ holds cited records and imports only itself, calc/equation and shared/.'),
  layer(['server/utils/plan/**/*.ts'], { packages: [...FRAMEWORK, 'node:*'], folders: ['print', 'data', 'access', 'http', 'db'] }, 'plan/ joins calc and reference; no database, no HTTP, no print.'),
  layer(['server/utils/print/**/*.ts'], { packages: FRAMEWORK, folders: ['calc', 'reference', 'plan', 'data', 'access', 'http', 'db'] }, 'print/ prints what the plan says and computes nothing.'),
  layer(['server/utils/data/**/*.ts'], { packages: ['h3', '#imports'], folders: ['calc', 'reference', 'plan', 'print', 'access', 'http'] }, 'data/ imports db/ and shared/.'),
  layer(['server/utils/access/**/*.ts', 'server/utils/http/**/*.ts'], { packages: ['drizzle-orm', 'drizzle-orm/*', 'better-sqlite3'], folders: ['plan', 'print', 'reference', 'db'] }, 'access/ and http/ stand at the edge: no rules, no print, no database of their own.'),
  layer(['server/api/**/*.ts'], { packages: ['drizzle-orm', 'drizzle-orm/*', 'better-sqlite3'], folders: ['db'] }, 'Routes reach the database through server/utils/data only.'),
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      'no-console': ['error', { allow: ['warn', 'error', 'info'] }],
    },
  },
  { files: ['scripts/**'], rules: { 'no-console': 'off' } },
  {
    // The one file of shared/ that looks at the tables, and only at their types (tests/guards/imports.spec.ts).
    files: ['shared/types/rows.ts'],
    rules: { 'no-restricted-imports': 'off' },
  },
)
