import { describe, expect, it } from 'vitest'
import { combinedUncertainty } from '#server/utils/calc/sureness/combinedUncertainty'

describe('combinedUncertainty', () => {
  // Check values K-UNC-01 and K-UNC-02 of the dosing sheet: combined 13.608 % and 6.666 %, k = 2.
  it.each([
    [{ scale: 0.02887, density: 0.05774, syringe: 0.1198 }, 0.13608],
    [{ scale: 0.00289, density: 0.05774, syringe: 0.0332 }, 0.06666],
  ])('reproduces the worked budget %o', (parts, combined) => {
    expect(combinedUncertainty(parts).relativeExpanded / 2).toBeCloseTo(combined, 4)
  })
  it('shares add up to the whole', () => {
    const { shares } = combinedUncertainty({ scale: 0.03, density: 0.06, syringe: 0.12 })
    expect(shares.scale + shares.density + shares.syringe).toBeCloseTo(1, 12)
    expect(combinedUncertainty({ scale: 0 }).shares.scale).toBe(0)
  })
  it('refuses a negative part', () => expect(() => combinedUncertainty({ scale: -0.1 })).toThrow('scale'))
})
