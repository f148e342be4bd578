import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { beginChain, GUEST, hashOfAuditRow, verifyChain, writeAudit } from '../../../server/utils/data/auditRows'
import { changedFields } from '../../../server/utils/data/changedFields'
import { auditRecords } from '../../../server/db/schema'
import { csvField } from '../../../server/utils/team/record'
import { scratchDatabase } from '../db/scratch'

let scratch: ReturnType<typeof scratchDatabase>
beforeEach(() => {
  scratch = scratchDatabase()
})
afterEach(() => scratch.remove())

const entry = (reason: string) => ({ at: '2026-12-03T09:00:00.000Z', actor: GUEST, teamId: null, action: 'plan.check', objectType: 'regimen', objectId: 'pebble', reason })

describe('the chain', () => {
  it('seals each row with the one before', () => {
    beginChain(scratch.db, '2026-12-03T08:00:00.000Z')
    for (const reason of ['one', 'two', 'three']) writeAudit(scratch.db, entry(reason))
    const rows = scratch.db.select().from(auditRecords).all()
    expect(rows.map(row => row.previousHash)).toEqual(['', ...rows.slice(0, -1).map(row => row.hash)])
    for (const row of rows) expect(row.hash).toBe(hashOfAuditRow(row))
    expect(verifyChain(scratch.db)).toMatchObject({ rows: 4, head: rows.at(-1)!.hash, problems: [] })
  })

  it('takes rows of before it under its seal', () => {
    scratch.db.$client.exec('insert into audit_records (actor, action, object_type, object_id) values (\'guest\', \'regimen.create\', \'regimen\', \'old\')')
    beginChain(scratch.db, '2026-12-03T08:00:00.000Z')
    beginChain(scratch.db, '2026-12-04T08:00:00.000Z')
    writeAudit(scratch.db, entry('one'))
    expect(verifyChain(scratch.db)).toMatchObject({ rows: 3, problems: [] })
    scratch.db.$client.exec('drop trigger audit_records_no_update; update audit_records set actor = \'someone\' where id = 1')
    expect(verifyChain(scratch.db).problems).toEqual(['The rows older than the chain were changed.'])
  })

  it.each(['at', 'actor', 'actor_name', 'team_id', 'action', 'object_type', 'object_id', 'object_name', 'detail_json', 'before_json', 'after_json', 'reason', 'previous_hash', 'hash'])('notices a changed %s', (column) => {
    beginChain(scratch.db, '2026-12-03T08:00:00.000Z')
    for (const reason of ['one', 'two']) writeAudit(scratch.db, entry(reason))
    scratch.db.$client.exec(`drop trigger audit_records_no_update; update audit_records set ${column} = 'changed' where id = 2`)
    expect(verifyChain(scratch.db).problems.length).toBeGreaterThan(0)
  })

  it('holds in an empty database', () => expect(verifyChain(scratch.db)).toEqual({ rows: 0, head: null, problems: [] }))
})

describe('changedFields', () => {
  it('names what differs by its path, on the side where it stands', () => {
    expect(changedFields({ a: { b: 1, c: [1] }, d: 'x' }, { a: { b: 2, c: [1] }, e: null })).toEqual({ before: { 'a.b': 1, 'd': 'x' }, after: { 'a.b': 2, 'e': null } })
    expect(changedFields({ a: [1, 2] }, { a: [1, 3] })).toEqual({ before: { a: [1, 2] }, after: { a: [1, 3] } })
    expect(changedFields({ a: 1 }, { a: 1 })).toEqual({ before: {}, after: {} })
  })
})

describe('csvField', () => {
  it.each([['plain', 'plain'], ['a,b', '"a,b"'], ['say "x"', '"say ""x"""'], ['=1+1', '\'=1+1'], ['-5', '\'-5'], ['@x', '\'@x'], [null, ''], [12, '12'], [{ a: 1 }, '"{""a"":1}"']])('writes %j as %s', (value, text) => expect(csvField(value)).toBe(text))
})
