import { describe, expect, it } from 'vitest'
import { targetKcalPerDay } from '#server/utils/calc/energy/targetKcalPerDay'

describe('targetKcalPerDay', () => {
  // Nutrition sheet, section 5: a 10 g gecko at 30 deg C needs about 0.27 kcal/day (1.5 x resting 0.18).
  it('multiplies resting by the factor', () => {
    const { targetKcalPerDay: target, cappedByFieldRate } = targetKcalPerDay({ restingKcalPerDay: 0.18, factor: 1.5, fieldCapKcalPerDay: 0.363 })
    expect(target).toBeCloseTo(0.27, 12)
    expect(cappedByFieldRate).toBe(false)
  })
  it('never passes the free-living rate', () => {
    expect(targetKcalPerDay({ restingKcalPerDay: 0.923, factor: 1, fieldCapKcalPerDay: 0.363 })).toEqual({ targetKcalPerDay: 0.363, cappedByFieldRate: true })
  })
  it('has no cap where no field rate is published', () => {
    expect(targetKcalPerDay({ restingKcalPerDay: 2, factor: 2, fieldCapKcalPerDay: null })).toEqual({ targetKcalPerDay: 4, cappedByFieldRate: false })
  })
  it.each([[0, 1, 1], [1, 0, 1], [1, 7, 1], [1, 1, 0], [Number.NaN, 1, 1]])('refuses resting %s, factor %s, cap %s', (restingKcalPerDay, factor, fieldCapKcalPerDay) => {
    expect(() => targetKcalPerDay({ restingKcalPerDay, factor, fieldCapKcalPerDay })).toThrow()
  })
})
