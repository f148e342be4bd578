import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { potAmounts } from '#server/utils/calc/mixing/potAmounts'

const base = { neededMl: 10, strengthFraction: 0.5, powderGPerMl: 0.25, powderVolumeMlPerG: 0.6, energyKcalPerPowderG: 4, scaleStepG: 0.1, fewestSteps: 5, waterStepMl: 0.5 }

describe('potAmounts', () => {
  it('weighs whole scale steps and gives the energy these amounts really have', () => {
    const pot = potAmounts(base)
    expect(pot).toMatchObject({ powderG: 1.3, waterMl: 9.5, madeUpMl: 10.28 })
    expect(pot.energyKcalPerMl).toBeCloseTo(1.3 * 4 / 10.28, 9)
  })
  it('makes a larger pot rather than weigh too little', () => {
    const pot = potAmounts({ ...base, neededMl: 0.5, scaleStepG: 1 })
    expect(pot.powderG).toBe(5)
    expect(pot.madeUpMl).toBeGreaterThan(0.5)
  })
  it('is never short, always on the steps, and close to the wanted strength', () => {
    fc.assert(fc.property(fc.double({ min: 0.1, max: 2000, noNaN: true }), fc.constantFrom(0.25, 0.5, 0.75, 1), fc.constantFrom(0.01, 0.1, 1, 5), (neededMl, strengthFraction, scaleStepG) => {
      const pot = potAmounts({ ...base, neededMl, strengthFraction, scaleStepG, waterStepMl: 0.1 })
      expect(pot.madeUpMl).toBeGreaterThanOrEqual(neededMl - 1e-9)
      expect(Math.abs(pot.powderG / scaleStepG - Math.round(pot.powderG / scaleStepG))).toBeLessThan(1e-3)
      expect(Math.abs(pot.energyKcalPerMl / strengthFraction - 1)).toBeLessThan(0.25)
    }))
  })
  it('refuses nothing', () => expect(() => potAmounts({ ...base, neededMl: 0 })).toThrow())
})
