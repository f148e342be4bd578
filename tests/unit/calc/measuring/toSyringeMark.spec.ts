import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { toSyringeMark } from '#server/utils/calc/measuring/toSyringeMark'

const draw = (volumeMl: number, stepMl: number, atMostMl = 100, upAtMost = 1) => toSyringeMark({ volumeMl, stepMl, atMostMl, upAtMost }).markMl

describe('toSyringeMark', () => {
  it.each([
    ['nearest, down', 0.41, 0.05, 0.4],
    ['nearest, up', 0.44, 0.05, 0.45],
    ['tie goes down', 0.275, 0.05, 0.25],
    ['tie that binary arithmetic blurs', 0.15, 0.1, 0.1],
    ['on a mark that binary arithmetic blurs', 0.3, 0.1, 0.3],
    ['on a mark', 0.35, 0.05, 0.35],
    ['whole marks', 11.6, 1, 12],
  ])('%s: %s on %s gives %s', (_, volume, step, mark) => expect(draw(volume, step)).toBe(mark))

  it('never passes the limit, even when the nearest mark would', () => {
    expect(draw(0.44, 0.05, 0.44)).toBe(0.4)
    expect(draw(0.3, 0.1, 0.3)).toBe(0.3)
    expect(draw(0.3, 0.1, 0.05)).toBe(0)
  })
  it('never adds more than the set share', () => {
    expect(draw(0.26, 0.1, 100, 0.1)).toBe(0.2)
    expect(draw(0.28, 0.1, 100, 0.1)).toBe(0.3)
  })
  // Check value K-ROUND-PCT2 of the dosing sheet: 0.13 mL on marks of 0.2 mL becomes 0.2 mL, 53.85 % more.
  it('says what rounding changed', () => {
    const { markMl, roundingFraction } = toSyringeMark({ volumeMl: 0.13, stepMl: 0.2, atMostMl: 10, upAtMost: 1 })
    expect(markMl).toBe(0.2)
    expect(100 * roundingFraction).toBeCloseTo(53.85, 2)
  })
  it('is always a whole number of marks within half a mark or the limit', () => {
    fc.assert(fc.property(fc.double({ min: 0.001, max: 60, noNaN: true }), fc.constantFrom(0.01, 0.02, 0.05, 0.1, 0.2, 0.25, 0.5, 1, 2), fc.double({ min: 0.01, max: 60, noNaN: true }), (volumeMl, stepMl, atMostMl) => {
      const { markMl } = toSyringeMark({ volumeMl, stepMl, atMostMl, upAtMost: 1 })
      expect(Math.abs(markMl / stepMl - Math.round(markMl / stepMl))).toBeLessThan(1e-4)
      expect(markMl).toBeLessThanOrEqual(atMostMl + 1e-6)
      if (volumeMl <= atMostMl - stepMl) expect(Math.abs(markMl - volumeMl)).toBeLessThanOrEqual(stepMl / 2 + 1e-6)
    }))
  })
  it('refuses nothing and nonsense', () => {
    expect(() => draw(0, 0.1)).toThrow()
    expect(() => draw(Number.NaN, 0.1)).toThrow()
    expect(() => draw(1, 0)).toThrow()
  })
})
