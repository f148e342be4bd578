/**
 * `node scripts/freeze-edition.mjs`: writes the digest of every edition that has none yet. From then on its files cannot
 * change unseen: saved plans name their edition.
 *
 * `--check` compares only and writes nothing. `--again <id>` replaces a digest: only for an edition no plan was saved under.
 */
import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join, relative, resolve, sep } from 'node:path'
import { fileURLToPath } from 'node:url'

const option = name => process.argv.includes(name) ? process.argv[process.argv.indexOf(name) + 1] : undefined
const root = resolve(option('--root') ?? fileURLToPath(new URL('..', import.meta.url)))
const editions = join(root, 'server/utils/reference/editions')
const digestFile = join(root, 'tests/guards/editions.digest.json')
const again = option('--again')

const stored = existsSync(digestFile) ? JSON.parse(readFileSync(digestFile, 'utf8')) : {}
const ids = readdirSync(editions, { withFileTypes: true }).filter(one => one.isDirectory()).map(one => one.name).sort()
const problems = Object.keys(stored).filter(id => !ids.includes(id)).map(id => `Edition ${id} is gone. Saved plans name it: bring it back.`)

for (const id of ids) {
  const digest = digestOf(join(editions, id))
  if (stored[id] === digest) continue
  if (process.argv.includes('--check')) problems.push(stored[id] ? `Edition ${id} has changed. Copy the folder to a new edition and change it there.` : `Edition ${id} is not frozen yet: run node scripts/freeze-edition.mjs.`)
  else if (stored[id] && again !== id) problems.push(`Edition ${id} has changed since it was frozen. Make a new edition; or, if no plan was ever saved under it, add --again ${id}.`)
  else stored[id] = digest
}

if (problems.length > 0) {
  console.error(problems.join('\n'))
  process.exit(1)
}
if (!process.argv.includes('--check')) {
  writeFileSync(digestFile, `${JSON.stringify(stored, null, 2)}\n`)
  console.log(`Frozen: ${ids.join(', ')}`)
}

/** SHA-256 over names and contents of all files, in order of name; the same on every system. */
function digestOf(folder) {
  const hash = createHash('sha256')
  const files = readdirSync(folder, { recursive: true, withFileTypes: true }).filter(one => one.isFile()).map(one => relative(folder, join(one.parentPath ?? one.path, one.name)).split(sep).join('/')).sort()
  for (const file of files) {
    const text = readFileSync(join(folder, file), 'utf8').replaceAll('\r\n', '\n')
    hash.update(`${file}\n${Buffer.byteLength(text)}\n${text}`)
  }
  return hash.digest('hex')
}
