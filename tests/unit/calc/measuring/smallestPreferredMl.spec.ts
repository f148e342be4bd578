import { expect, it } from 'vitest'
import { smallestPreferredMl } from '#server/utils/calc/measuring/smallestPreferredMl'

// Check values K-SYRMIN-0.5, K-SYRMIN-10, K-SYRMIN-20, K-SYRMIN-35 of the dosing sheet (house rule H-05).
it.each([[0.5, 0.01, 0.1], [10, 0.2, 2], [20, 1, 4], [35, 1, 7]])('%s mL by %s mL: from %s mL', (capacityMl, stepMl, expected) => {
  expect(smallestPreferredMl({ capacityMl, stepMl }, { ofCapacity: 0.2, marks: 2 })).toBeCloseTo(expected, 9)
})
it('refuses a capacity of nothing', () => expect(() => smallestPreferredMl({ capacityMl: 0, stepMl: 0.1 }, { ofCapacity: 0.2, marks: 2 })).toThrow())
