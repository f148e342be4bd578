/**
 * `npm run audit:verify [-- path/to/thimbleful.db]`: walks the whole record and checks that no row was changed, added,
 * moved or taken away. Prints the hash of the last row: noted down elsewhere, it also shows a record written anew.
 */
import { existsSync, mkdtempSync, rmSync, symlinkSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { installIfNeeded, root } from './run.mjs'

installIfNeeded()
const file = process.argv[2] ?? join(process.env.NUXT_DATA_DIR ?? join(root, '.data'), 'thimbleful.db')
if (!existsSync(file)) {
  console.error(`There is no database at ${file}. Name one: npm run audit:verify -- path/to/thimbleful.db`)
  process.exit(2)
}

const scratch = mkdtempSync(join(tmpdir(), 'thimbleful-audit-'))
try {
  const { openDatabase, verifyChain } = await library()
  const db = openDatabase(file)
  const { rows, head, problems } = verifyChain(db)
  db.$client.close()
  for (const problem of problems) console.error(problem)
  console.log(problems.length === 0 ? `The record holds: ${rows} rows, none changed, added or taken away.` : `The record does not hold: ${problems.length} ${problems.length === 1 ? 'place' : 'places'} in ${rows} rows.`)
  if (head) console.log(`Hash of the last row: ${head}`)
  process.exitCode = problems.length === 0 ? 0 : 1
}
finally {
  rmSync(scratch, { recursive: true, force: true })
}

/** The very code that writes the record, bundled for this one run. */
async function library() {
  const { build } = await import('vite')
  await build({
    root,
    configFile: false,
    logLevel: 'error',
    resolve: { alias: { '#shared': join(root, 'shared'), '#server': join(root, 'server') } },
    build: { ssr: join(root, 'scripts', 'audit.entry.ts'), outDir: scratch, emptyOutDir: false, target: 'node20' },
    ssr: { external: ['better-sqlite3', 'drizzle-orm'] },
  })
  symlinkSync(join(root, 'node_modules'), join(scratch, 'node_modules'))
  return import(pathToFileURL(join(scratch, 'audit.entry.js')).href)
}
