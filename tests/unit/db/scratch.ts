import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join, resolve } from 'node:path'
import { fileURLToPath } from 'node:url'
import { openDatabase, type Db } from '../../../server/db/client'
import { migrateDatabase } from '../../../server/db/migrate'

export const MIGRATIONS = resolve(fileURLToPath(new URL('../../../server/db/migrations', import.meta.url)))

/** A folder of its own for one test, gone afterwards. */
export function scratchFolder(): { folder: string, remove: () => void } {
  const folder = mkdtempSync(join(tmpdir(), 'thimbleful-unit-'))
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) }
}

/** A real database file at the newest migration. */
export function scratchDatabase(): { db: Db, file: string, remove: () => void } {
  const { folder, remove } = scratchFolder()
  const file = join(folder, 'thimbleful.db')
  const db = openDatabase(file)
  migrateDatabase(db, MIGRATIONS)
  return { db, file, remove: () => { db.$client.close(); remove() } }
}
