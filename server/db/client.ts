import { mkdirSync } from 'node:fs'
import { join, resolve } from 'node:path'
import Database from 'better-sqlite3'
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3'
import * as schema from './schema'

export type Db = BetterSQLite3Database<typeof schema> & { $client: Database.Database }

let open: Db | null = null

/** Folder of database, uploads and secret, made when missing. */
export function dataFolder(): string {
  const folder = resolve(process.env.NUXT_DATA_DIR || '.data')
  mkdirSync(folder, { recursive: true, mode: 0o700 })
  return folder
}

/** Opens a database file with what every connection here needs. */
export function openDatabase(file: string): Db {
  const client = new Database(file)
  client.pragma('journal_mode = WAL')
  client.pragma('synchronous = NORMAL')
  client.pragma('busy_timeout = 5000')
  client.pragma('foreign_keys = ON')
  return drizzle(client, { schema })
}

/** The database of this process. The plugin opened and migrated it before the first request. */
export function database(): Db {
  if (!open) open = openDatabase(join(dataFolder(), 'thimbleful.db'))
  return open
}

/** Lets go of the file; the next question opens the one that is then set. */
export function closeDatabase(): void {
  open?.$client.close()
  open = null
}
