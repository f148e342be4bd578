import { describe, expect, it } from 'vitest'
import { refeedingTier } from '#server/utils/calc/risk/refeedingTier'

const edges = {
  shortfallPercent: { moderate: 10, high: 20, extreme: 30 },
  daysUnfed: { moderate: 3, high: 5, extreme: 10 },
  drynessPercent: { moderate: 5, high: 10, extreme: 13 },
  score: { high: 2, extreme: 1 },
}
const well = { shortfallPercent: 0, daysUnfed: 0, daysStretch: 1, score: 3, drynessPercent: 0 }

describe('refeedingTier', () => {
  it.each([
    ['nothing wrong', {}, 'low'],
    ['just under an edge', { shortfallPercent: 9.99 }, 'low'],
    ['at an edge: the higher tier', { shortfallPercent: 10 }, 'moderate'],
    ['20 % under', { shortfallPercent: 20 }, 'high'],
    ['30 % under', { shortfallPercent: 30 }, 'extreme'],
    ['10 days unfed', { daysUnfed: 10 }, 'extreme'],
    ['24 days, stretched five times', { daysUnfed: 24, daysStretch: 5 }, 'moderate'],
    ['score 2', { score: 2 }, 'high'],
    ['score 1', { score: 1 }, 'extreme'],
    ['dry 10 %', { drynessPercent: 10 }, 'high'],
    ['nothing known but days', { shortfallPercent: null, score: null, daysUnfed: 6 }, 'high'],
  ] as const)('%s', (_, change, tier) => {
    expect(refeedingTier({ ...well, ...change }, edges).tier).toBe(tier)
  })
  it('takes the worst and lists reasons, the deciding one first', () => {
    const { tier, reasons } = refeedingTier({ ...well, shortfallPercent: 12, score: 1 }, edges)
    expect(tier).toBe('extreme')
    expect(reasons[0]).toContain('body condition 1 of 5')
    expect(reasons).toHaveLength(2)
  })
  it('gives no reason for a well animal', () => expect(refeedingTier(well, edges).reasons).toEqual([]))
  it('refuses what cannot be', () => {
    expect(() => refeedingTier({ ...well, daysUnfed: -1 }, edges)).toThrow()
    expect(() => refeedingTier({ ...well, daysStretch: 0 }, edges)).toThrow()
    expect(() => refeedingTier({ ...well, score: 9 }, edges)).toThrow()
  })
})
