import { describe, expect, it } from 'vitest'
import { waterDueMl } from '#server/utils/calc/fluids/waterDueMl'

const day = 86_400_000
const bird = { fluidsFromMs: 0, maintenanceMlPerDay: 5, deficitMl: 8, deficitHours: 48, capMlPerDay: 10 }

describe('waterDueMl', () => {
  // Check value derived-bird-fluid-day1: 100 g bird, 8 %, 50 mL/kg/day: 4 + 5 = 9 mL on the first day.
  it('gives the worked bird 9 mL on day 1, and maintenance once the deficit is back', () => {
    expect(waterDueMl({ ...bird, spanFromMs: 0, spanToMs: day })).toBeCloseTo(9, 9)
    expect(waterDueMl({ ...bird, spanFromMs: day, spanToMs: 2 * day })).toBeCloseTo(9, 9)
    expect(waterDueMl({ ...bird, spanFromMs: 2 * day, spanToMs: 3 * day })).toBeCloseTo(5, 9)
  })
  it('counts only the hours after fluids begin', () => {
    expect(waterDueMl({ ...bird, deficitMl: 0, fluidsFromMs: day / 2, spanFromMs: 0, spanToMs: day })).toBeCloseTo(2.5, 9)
    expect(waterDueMl({ ...bird, fluidsFromMs: 3 * day, spanFromMs: 0, spanToMs: day })).toBe(0)
  })
  it('gives back the whole deficit, over days of 23 and 25 hours too', () => {
    const spans = [0, 23, 48, 72, 96].map(hours => hours * 3_600_000)
    let sum = 0
    for (let index = 1; index < spans.length; index += 1) sum += waterDueMl({ ...bird, maintenanceMlPerDay: 0, capMlPerDay: 100, spanFromMs: spans[index - 1]!, spanToMs: spans[index]! })
    expect(sum).toBeCloseTo(8, 9)
  })
  it('never passes the limit', () => expect(waterDueMl({ ...bird, deficitMl: 100, spanFromMs: 0, spanToMs: day })).toBeCloseTo(10, 9))
  it('refuses a span that runs backwards', () => expect(() => waterDueMl({ ...bird, spanFromMs: day, spanToMs: 0 })).toThrow())
})
