import { cpSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import type Database from 'better-sqlite3'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { openDatabase, type Db } from '../../../server/db/client'
import { migrateDatabase } from '../../../server/db/migrate'
import { MIGRATIONS, scratchFolder } from './scratch'

interface Journal { entries: { idx: number, version: string, when: number, tag: string, breakpoints: boolean }[] }
const journalOf = (folder: string): Journal => JSON.parse(readFileSync(join(folder, 'meta/_journal.json'), 'utf8')) as Journal
const steps = journalOf(MIGRATIONS).entries

let scratch: ReturnType<typeof scratchFolder>
const opened: Db[] = []
beforeEach(() => {
  scratch = scratchFolder()
})
afterEach(() => {
  for (const db of opened.splice(0)) db.$client.close()
  scratch.remove()
})

function open(): Db {
  const db = openDatabase(join(scratch.folder, 'thimbleful.db'))
  opened.push(db)
  return db
}

/** The real migrations up to a step, and made-up ones after it. */
function migrations(upTo: number, ...madeUp: string[]): string {
  const folder = join(scratch.folder, `migrations-${upTo}-${madeUp.length}`)
  cpSync(MIGRATIONS, folder, { recursive: true })
  const journal = journalOf(folder)
  journal.entries = journal.entries.slice(0, upTo)
  madeUp.forEach((sql, at) => {
    const idx = upTo + at
    journal.entries.push({ idx, version: '6', when: steps.at(-1)!.when + 1000 * (at + 1), tag: `made-up-${idx}`, breakpoints: true })
    mkdirSync(folder, { recursive: true })
    writeFileSync(join(folder, `made-up-${idx}.sql`), sql)
  })
  writeFileSync(join(folder, 'meta/_journal.json'), JSON.stringify(journal))
  return folder
}

/** Rows as the first release wrote them; the tables of step 1 and nothing later. */
function fill(client: Database.Database): void {
  client.exec(`
    insert into regimens (id, latest_version, key_hash, link_expires_at, demo, created_at, updated_at) values ('juniper', 2, 'hash', '2027-01-01T00:00:00.000Z', 0, '2026-12-01T00:00:00.000Z', '2026-12-02T00:00:00.000Z');
    insert into regimen_versions (regimen_id, version, edition, input_json, plan_json, created_at) values ('juniper', 1, '2026-12', '{"a":1}', '{"b":1}', '2026-12-01T00:00:00.000Z'), ('juniper', 2, '2026-12', '{"a":2}', '{"b":2}', '2026-12-02T00:00:00.000Z');
    insert into audit_records (actor, action, object_type, object_id, version) values ('guest', 'regimen.create', 'regimen', 'juniper', 1), ('guest', 'regimen.change', 'regimen', 'juniper', 2);
  `)
}

/** What the first release wrote: columns that came later are not asked for. */
const FIRST = { regimens: 'id, latest_version, key_hash, link_expires_at, team_id, demo, created_at, updated_at', regimen_versions: 'id, regimen_id, version, edition, input_json, plan_json, created_at', audit_records: 'id, at, actor, action, object_type, object_id, version, detail_json' }
const content = (client: Database.Database) => Object.entries(FIRST).map(([table, columns]) => client.prepare(`select ${columns} from ${table} order by 1`).all())
const copies = () => readdirSync(scratch.folder).filter(name => name.startsWith('thimbleful.db.before-'))

/** What Drizzle writes when a column changes: the table made anew, filled from the old one, and put in its place. */
function rebuildOf(db: Db): string {
  const { sql } = db.$client.prepare('select sql from sqlite_master where name = \'regimens\'').get() as { sql: string }
  return ['PRAGMA foreign_keys=OFF;', `${sql.replace('`regimens`', '`__new_regimens`')};`, 'INSERT INTO `__new_regimens` SELECT * FROM `regimens`;', 'DROP TABLE `regimens`;', 'ALTER TABLE `__new_regimens` RENAME TO `regimens`;', 'PRAGMA foreign_keys=ON;'].join('--> statement-breakpoint\n')
}

describe('the migrations', () => {
  it('exist', () => expect(steps.length).toBeGreaterThanOrEqual(2))

  it.each(steps.map((step, at) => [step.tag, at + 1] as const))('keep every row of a database that stood at %s', (_tag, upTo) => {
    const db = open()
    expect(migrateDatabase(db, migrations(upTo))).toBe(upTo)
    fill(db.$client)
    const before = content(db.$client)
    expect(migrateDatabase(db, MIGRATIONS)).toBe(steps.length - upTo)
    expect(content(db.$client)).toEqual(before)
    expect(db.$client.pragma('foreign_key_check')).toEqual([])
    expect(db.$client.pragma('foreign_keys', { simple: true })).toBe(1)
    expect(copies()).toHaveLength(upTo === steps.length ? 0 : 1)
  })

  it('do nothing the second time', () => {
    const db = open()
    expect(migrateDatabase(db, MIGRATIONS)).toBe(steps.length)
    expect(migrateDatabase(db, MIGRATIONS)).toBe(0)
  })

  it('leave a database whose audit cannot be changed or shortened', () => {
    const db = open()
    migrateDatabase(db, MIGRATIONS)
    fill(db.$client)
    expect(() => db.$client.exec('update audit_records set actor = \'someone\'')).toThrow('never changed')
    expect(() => db.$client.exec('delete from audit_records')).toThrow('never deleted')
  })

  it('leave a database that keeps a plan with versions from being deleted', () => {
    const db = open()
    migrateDatabase(db, MIGRATIONS)
    fill(db.$client)
    expect(() => db.$client.exec('delete from regimens')).toThrow(/FOREIGN KEY/)
  })
})

describe('migrateDatabase', () => {
  it('keeps the child rows when a table is rebuilt', () => {
    const db = open()
    migrateDatabase(db, MIGRATIONS)
    fill(db.$client)
    const before = content(db.$client)
    expect(migrateDatabase(db, migrations(steps.length, rebuildOf(db)))).toBe(1)
    expect(content(db.$client)).toEqual(before)
    expect(db.$client.pragma('foreign_keys', { simple: true })).toBe(1)
  })

  it.each([
    ['loses rows', 'DELETE FROM regimen_versions WHERE version = 1;', 'lost rows of regimen_versions'],
    ['drops a table that holds rows', 'DROP TABLE regimen_versions;', 'lost rows of regimen_versions'],
    ['leaves rows without their parent', 'UPDATE regimen_versions SET regimen_id = \'nobody\';', '2 rows without their parent'],
  ])('refuses a migration that %s, puts the file back, and refuses it again at the next start', (_what, sql, sentence) => {
    const db = open()
    migrateDatabase(db, MIGRATIONS)
    fill(db.$client)
    const before = content(db.$client)
    const bad = migrations(steps.length, sql)
    expect(() => migrateDatabase(db, bad)).toThrow(sentence)
    const again = open()
    expect(content(again.$client)).toEqual(before)
    expect(() => migrateDatabase(again, bad)).toThrow(sentence)
    expect(copies().length).toBeGreaterThan(0)
  })

  it('refuses SQL that fails halfway and keeps what was there', () => {
    const db = open()
    migrateDatabase(db, MIGRATIONS)
    fill(db.$client)
    const before = content(db.$client)
    expect(() => migrateDatabase(db, migrations(steps.length, 'DELETE FROM regimen_versions;--> statement-breakpoint\nINSERT INTO nowhere VALUES (1);'))).toThrow()
    expect(content(db.$client)).toEqual(before)
  })

  it('copies what stood in the write-ahead log too', () => {
    const db = open()
    migrateDatabase(db, MIGRATIONS)
    fill(db.$client)
    migrateDatabase(db, migrations(steps.length, rebuildOf(db)))
    const copy = openDatabase(join(scratch.folder, copies()[0]!))
    opened.push(copy)
    expect(content(copy.$client)).toEqual(content(db.$client))
  })
})
