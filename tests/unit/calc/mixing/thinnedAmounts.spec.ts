import { expect, it } from 'vitest'
import { thinnedAmounts } from '#server/utils/calc/mixing/thinnedAmounts'

it('thins by volume and is never short', () => {
  expect(thinnedAmounts({ neededMl: 4, strengthFraction: 0.5, stepMl: 0.5, densityKcalPerMl: 1 })).toEqual({ feedMl: 2, waterMl: 2, madeUpMl: 4, energyKcalPerMl: 0.5 })
  expect(thinnedAmounts({ neededMl: 4.2, strengthFraction: 1, stepMl: 0.5, densityKcalPerMl: 1 })).toEqual({ feedMl: 4.5, waterMl: 0, madeUpMl: 4.5, energyKcalPerMl: 1 })
  const pot = thinnedAmounts({ neededMl: 5, strengthFraction: 0.75, stepMl: 0.1, densityKcalPerMl: 1.2 })
  expect(pot.madeUpMl).toBeGreaterThanOrEqual(5)
  expect(pot.energyKcalPerMl).toBeCloseTo(0.9, 1)
  expect(() => thinnedAmounts({ neededMl: 4, strengthFraction: 0, stepMl: 0.5, densityKcalPerMl: 1 })).toThrow()
})
