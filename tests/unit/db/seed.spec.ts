import { afterEach, beforeEach, expect, it } from 'vitest'
import type { Plan } from '../../../shared/types/plan'
import { RegimenInput } from '../../../shared/schemas/regimen'
import { regimens, regimenVersions } from '../../../server/db/schema'
import { seedDemo } from '../../../server/db/seed'
import { scratchDatabase } from './scratch'

let scratch: ReturnType<typeof scratchDatabase>
beforeEach(() => {
  scratch = scratchDatabase()
})
afterEach(() => scratch.remove())

it('adds invented plans of Saltings Rescue that are marked as such', () => {
  expect(seedDemo(scratch.db, new Date('2026-12-03T18:00:00Z'))).toBe(true)
  const rows = scratch.db.select().from(regimens).all()
  expect(rows.length).toBeGreaterThanOrEqual(2)
  expect(rows.every(row => row.demo)).toBe(true)
  for (const version of scratch.db.select().from(regimenVersions).all()) {
    const input: unknown = JSON.parse(version.inputJson)
    expect(RegimenInput.safeParse(input).success).toBe(true)
    expect((input as RegimenInput).teamName).toBe('Saltings Rescue')
    const plan = JSON.parse(version.planJson) as Plan
    expect(plan.edition).toBe(version.edition)
    expect(plan.days.some(day => day.feeds.length > 0)).toBe(true)
  }
})

it('never adds them to a database that holds a plan', () => {
  seedDemo(scratch.db)
  const before = scratch.db.select().from(regimenVersions).all()
  expect(seedDemo(scratch.db)).toBe(false)
  expect(scratch.db.select().from(regimenVersions).all()).toEqual(before)
})
