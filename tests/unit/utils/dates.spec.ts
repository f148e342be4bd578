import { describe, expect, it } from 'vitest'
import { currentEdition } from '../../../server/utils/reference'
import { buildPlan } from '../../../server/utils/plan/buildPlan'
import { dateInZone, focusDayOf } from '../../../utils/dates'
import { regimenInput } from '../plan/inputs'

describe('dateInZone', () => {
  it.each([['2026-12-03T23:30:00Z', 'Etc/UTC', '2026-12-03'], ['2026-12-03T23:30:00Z', 'Pacific/Chatham', '2026-12-04'], ['2026-12-03T03:30:00Z', 'America/New_York', '2026-12-02']])('%s in %s', (at, zone, day) => {
    expect(dateInZone(new Date(at), zone)).toBe(day)
  })
})

describe('focusDayOf', () => {
  const plan = buildPlan(regimenInput(), currentEdition())
  const fed = plan.days.filter(day => day.feeds.length > 0)
  it('is the first meal while today is unknown, before it, or after the plan', () => {
    for (const today of [null, plan.days[0]!.date, '2030-01-01']) expect(focusDayOf(plan, today)).toBe(fed[0])
  })
  it('is today where today has a meal, and the next meal day where it has none', () => {
    for (const day of plan.days.slice(plan.days.indexOf(fed[0]!))) {
      const next = fed.find(one => one.date >= day.date)
      if (next) expect(focusDayOf(plan, day.date)).toBe(next)
    }
    expect(focusDayOf(plan, fed[1]!.date)).toBe(fed[1])
  })
  it('is nothing where nothing can be fed', () => expect(focusDayOf({ ...plan, days: plan.days.map(day => ({ ...day, feeds: [] })) }, null)).toBeUndefined())
})
