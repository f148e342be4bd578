import { describe, expect, it } from 'vitest'
import { expectedWeightFromScoreG } from '#server/utils/calc/condition/expectedWeightFromScoreG'

describe('expectedWeightFromScoreG', () => {
  // WSAVA World Congress 2018 p. 290: a cat of 3.4 kg at 3 of 9 and 4.0 kg at 5 of 9, that is 2 of 5 and 3 of 5.
  it('reproduces the published thin cat', () => {
    expect(expectedWeightFromScoreG({ weightG: 3400, score: 2, lossPerNinthStep: 0.075 })).toBeCloseTo(4000, 6)
  })
  it('says a score of 3 or more is not thin', () => {
    for (const score of [3, 3.5, 4, 5]) expect(expectedWeightFromScoreG({ weightG: 100, score, lossPerNinthStep: 0.075 })).toBe(100)
  })
  it('rises as the score falls', () => {
    const at = (score: number) => expectedWeightFromScoreG({ weightG: 100, score, lossPerNinthStep: 0.1 })
    expect(at(1)).toBeGreaterThan(at(1.5))
    expect(at(1.5)).toBeGreaterThan(at(2))
  })
  it.each([0, 6, Number.NaN])('refuses a score of %s', score => expect(() => expectedWeightFromScoreG({ weightG: 100, score, lossPerNinthStep: 0.075 })).toThrow())
})
