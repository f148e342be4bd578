import { expect, it } from 'vitest'
import { deficitMl } from '#server/utils/calc/fluids/deficitMl'

// WSAVA World Congress 2018 p. 434: 10 kg at 5 % lacks 500 mL. Board question 2025: 4.4 kg at 7 % lacks 308 mL.
it('is kg times percent times ten', () => {
  expect(deficitMl({ weightG: 10_000, drynessPercent: 5 })).toBe(500)
  expect(deficitMl({ weightG: 4400, drynessPercent: 7 })).toBeCloseTo(308, 9)
  expect(deficitMl({ weightG: 10, drynessPercent: 0 })).toBe(0)
  expect(() => deficitMl({ weightG: 0, drynessPercent: 5 })).toThrow()
  expect(() => deficitMl({ weightG: 10, drynessPercent: 16 })).toThrow()
})
