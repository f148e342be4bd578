import { copyFileSync, existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import type Database from 'better-sqlite3'
import { migrate } from 'drizzle-orm/better-sqlite3/migrator'
import type { Db } from './client'

interface Journal { entries: { when: number, tag: string }[] }

/**
 * Brings a database to the newest migration, or throws and leaves a copy of what was there.
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
  if (Object.keys(before).length > 0) copyAside(client, now)

  client.pragma('foreign_keys = OFF')
  try {
    migrate(db, { migrationsFolder })
  }
  finally {
    client.pragma('foreign_keys = ON')
  }
  const broken = client.pragma('foreign_key_check') as unknown[]
  if (broken.length > 0) throw new Error(`The migration left ${broken.length} rows without their parent. The copy beside the database is from before it.`)
  const after = rowCounts(client)
  const lost = Object.entries(before).filter(([table, count]) => table in after && after[table]! < count)
  if (lost.length > 0) throw new Error(`The migration lost rows of ${lost.map(([table]) => table).join(', ')}. The copy beside the database is from before it.`)
  return due
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

function copyAside(client: Database.Database, now: Date): void {
  if (client.memory || !existsSync(client.name)) return
  // What still stands in the write-ahead log belongs to the copy too.
  client.pragma('wal_checkpoint(TRUNCATE)')
  copyFileSync(client.name, `${client.name}.before-${now.toISOString().replace(/[:.]/g, '-')}`)
}
