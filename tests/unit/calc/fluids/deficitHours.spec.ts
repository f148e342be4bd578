import { describe, expect, it } from 'vitest'
import { deficitHours } from '#server/utils/calc/fluids/deficitHours'

describe('deficitHours', () => {
  // Nutrition sheet 6.3: 1 kg tortoise, 8 %, 20 mL/kg/day, limit 40: 96 h.
  it('stretches until the day stays inside its limit', () => {
    expect(deficitHours({ deficitMl: 80, groupHours: 72, maintenanceMlPerDay: 20, capMlPerDay: 40, longestHours: 168 })).toBeCloseTo(96, 9)
  })
  it('keeps the group\'s hours where they fit', () => {
    expect(deficitHours({ deficitMl: 50, groupHours: 72, maintenanceMlPerDay: 20, capMlPerDay: 40, longestHours: 168 })).toBe(72)
    expect(deficitHours({ deficitMl: 0, groupHours: 72, maintenanceMlPerDay: 20, capMlPerDay: 40, longestHours: 168 })).toBe(72)
  })
  it('stops stretching at the longest time', () => {
    expect(deficitHours({ deficitMl: 80, groupHours: 72, maintenanceMlPerDay: 40, capMlPerDay: 40, longestHours: 168 })).toBe(168)
    expect(deficitHours({ deficitMl: 800, groupHours: 72, maintenanceMlPerDay: 20, capMlPerDay: 40, longestHours: 168 })).toBe(168)
  })
  it('refuses a longest time under the group\'s', () => expect(() => deficitHours({ deficitMl: 1, groupHours: 72, maintenanceMlPerDay: 20, capMlPerDay: 40, longestHours: 24 })).toThrow())
})
