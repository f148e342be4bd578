import { expect, it } from 'vitest'
import { shortfallPercent } from '#server/utils/calc/condition/shortfallPercent'

it('is the share missing from the expected weight, never negative', () => {
  expect(shortfallPercent(182, 350)).toBeCloseTo(48, 12)
  expect(shortfallPercent(400, 350)).toBe(0)
  expect(() => shortfallPercent(0, 350)).toThrow()
  expect(() => shortfallPercent(10, Number.NaN)).toThrow()
})
