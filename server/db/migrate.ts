import { copyFileSync, existsSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import type Database from 'better-sqlite3'
import { migrate } from 'drizzle-orm/better-sqlite3/migrator'
import type { Db } from './client'

interface Journal { entries: { when: number, tag: string }[] }

/**
 * Brings a database to the newest migration, or throws and leaves the database as it was.
 *
 * The order matters: SQLite rebuilds tables on many changes, and inside the migrator's transaction foreign keys cannot
 * be switched off any more, so a cascade would eat the child rows.
 *
 * @returns how many migrations were applied.
 */
export function migrateDatabase(db: Db, migrationsFolder: string, now = new Date()): number {
  const client = db.$client
  const due = dueMigrations(client, migrationsFolder)
  if (due === 0) return 0
  const before = rowCounts(client)
  const copy = Object.keys(before).length > 0 ? copyAside(client, now) : null

  client.pragma('foreign_keys = OFF')
  migrate(db, { migrationsFolder })
  const surprise = surpriseAfter(client, before)
  if (surprise) {
    // The migration is in the file by now: without this, the next start would find nothing to do and go on.
    if (copy) putBack(client, copy)
    throw new Error(`${surprise} The database is as it was before${copy ? `, and so is its copy ${copy}` : ''}.`)
  }
  client.pragma('foreign_keys = ON')
  return due
}

function surpriseAfter(client: Database.Database, before: Record<string, number>): string | null {
  const broken = client.pragma('foreign_key_check') as unknown[]
  if (broken.length > 0) return `The migration left ${broken.length} rows without their parent.`
  const after = rowCounts(client)
  const lost = Object.entries(before).filter(([table, count]) => count > (after[table] ?? 0)).map(([table]) => table)
  return lost.length > 0 ? `The migration lost rows of ${lost.join(', ')}.` : null
}

function dueMigrations(client: Database.Database, migrationsFolder: string): number {
  const { entries } = JSON.parse(readFileSync(join(migrationsFolder, 'meta', '_journal.json'), 'utf8')) as Journal
  const known = client.prepare('select count(*) as count from sqlite_master where type = \'table\' and name = \'__drizzle_migrations\'').get() as { count: number }
  if (known.count === 0) return entries.length
  const last = client.prepare('select max(created_at) as at from __drizzle_migrations').get() as { at: number | null }
  return entries.filter(entry => entry.when > (last.at ?? 0)).length
}

function rowCounts(client: Database.Database): Record<string, number> {
  const tables = client.prepare('select name from sqlite_master where type = \'table\' and name not like \'sqlite_%\' and name not like \'\\_\\_%\' escape \'\\\'').all() as { name: string }[]
  return Object.fromEntries(tables.map(({ name }) => [name, (client.prepare(`select count(*) as count from "${name}"`).get() as { count: number }).count]))
}

/** @returns the path of the copy; null for a database that lives in memory. */
function copyAside(client: Database.Database, now: Date): string | null {
  if (client.memory || !existsSync(client.name)) return null
  // What still stands in the write-ahead log belongs to the copy too.
  client.pragma('wal_checkpoint(TRUNCATE)')
  const copy = `${client.name}.before-${now.toISOString().replace(/[:.]/g, '-')}`
  copyFileSync(client.name, copy)
  return copy
}

/** Closes the database and puts the copy in its place. */
function putBack(client: Database.Database, copy: string): void {
  const file = client.name
  client.close()
  for (const leftOver of ['-wal', '-shm']) rmSync(`${file}${leftOver}`, { force: true })
  copyFileSync(copy, file)
}
