import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { auditRecords, regimens, regimenVersions } from '../../../server/db/schema'
import { GUEST } from '../../../server/utils/data/auditRows'
import { findRegimen, findRegimenVersion, insertRegimen, insertRegimenVersion, RegimenChangedError } from '../../../server/utils/data/regimenRows'
import { buildPlan } from '../../../server/utils/plan/buildPlan'
import { currentEdition } from '../../../server/utils/reference'
import { scratchDatabase } from '../db/scratch'
import { regimenInput } from '../plan/inputs'

const input = regimenInput()
const plan = buildPlan(input, currentEdition())
const row = { id: 'pebble', keyHash: 'hash', linkExpiresAt: '2027-01-01T00:00:00.000Z', actor: GUEST, at: '2026-12-02T09:00:00.000Z', input, plan }

let scratch: ReturnType<typeof scratchDatabase>
beforeEach(() => {
  scratch = scratchDatabase()
})
afterEach(() => scratch.remove())

const counts = () => [regimens, regimenVersions, auditRecords].map(table => scratch.db.select().from(table).all().length)

describe('insertRegimen', () => {
  it('keeps input, result and edition, with its audit row', () => {
    insertRegimen(scratch.db, row)
    expect(findRegimen(scratch.db, 'pebble')).toMatchObject({ latestVersion: 1, demo: false, teamId: null, createdAt: row.at, updatedAt: row.at })
    const version = findRegimenVersion(scratch.db, 'pebble', 1)!
    expect(JSON.parse(version.inputJson)).toEqual(input)
    expect(JSON.parse(version.planJson)).toEqual(JSON.parse(JSON.stringify(plan)))
    expect(version.edition).toBe(plan.edition)
    expect(scratch.db.select().from(auditRecords).all()).toMatchObject([{ at: row.at, actor: 'guest', action: 'regimen.create', objectType: 'regimen', objectId: 'pebble', version: 1 }])
  })

  it('saves all or nothing', () => {
    // The audit comes last: when it cannot be written, neither is the plan.
    scratch.db.$client.exec('create trigger full before insert on audit_records begin select raise(abort, \'full\'); end')
    expect(() => insertRegimen(scratch.db, row)).toThrow('full')
    expect(counts()).toEqual([0, 0, 0])
  })

  it('refuses an id twice and keeps the first', () => {
    insertRegimen(scratch.db, row)
    expect(() => insertRegimen(scratch.db, { ...row, keyHash: 'other' })).toThrow(/UNIQUE/)
    expect(findRegimen(scratch.db, 'pebble')?.keyHash).toBe('hash')
    expect(counts()).toEqual([1, 1, 1])
  })
})

describe('insertRegimenVersion', () => {
  const change = { id: 'pebble', actor: GUEST, at: '2026-12-03T09:00:00.000Z', input: regimenInput({ animal: { weightG: 23 } }), plan }
  beforeEach(() => insertRegimen(scratch.db, row))

  it('adds a version and leaves the old one as it was', () => {
    const old = findRegimenVersion(scratch.db, 'pebble', 1)
    expect(insertRegimenVersion(scratch.db, { ...change, baseVersion: 1 })).toBe(2)
    expect(findRegimenVersion(scratch.db, 'pebble', 1)).toEqual(old)
    expect((JSON.parse(findRegimenVersion(scratch.db, 'pebble', 2)!.inputJson) as typeof input).animal.weightG).toBe(23)
    expect(findRegimen(scratch.db, 'pebble')).toMatchObject({ latestVersion: 2, createdAt: row.at, updatedAt: change.at })
    expect(counts()).toEqual([1, 2, 2])
  })

  it('works without a base version, on top of the newest', () => {
    insertRegimenVersion(scratch.db, change)
    expect(insertRegimenVersion(scratch.db, change)).toBe(3)
  })

  it('refuses a base that is not the newest, says when it changed, and writes nothing', () => {
    insertRegimenVersion(scratch.db, { ...change, baseVersion: 1 })
    const before = counts()
    const refused = () => insertRegimenVersion(scratch.db, { ...change, baseVersion: 1, at: '2026-12-04T09:00:00.000Z' })
    expect(refused).toThrow(RegimenChangedError)
    try { refused() }
    catch (error) { expect(error).toMatchObject({ latestVersion: 2, changedAt: change.at }) }
    expect(counts()).toEqual(before)
  })
})

it('finds nothing where there is nothing', () => {
  expect(findRegimen(scratch.db, 'nobody')).toBeUndefined()
  expect(findRegimenVersion(scratch.db, 'nobody', 1)).toBeUndefined()
})
