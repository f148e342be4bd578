import { expect, it } from 'vitest'
import { waterInFeedMl } from '#server/utils/calc/fluids/waterInFeedMl'

// Nutrition sheet 6.4: 0.27 mL at 80 % water brings 0.22 mL.
it('counts the feed\'s water, the thinning and the flush', () => {
  expect(waterInFeedMl({ volumeMl: 0.27, strengthFraction: 1, waterFraction: 0.8, flushMl: 0 })).toBeCloseTo(0.216, 12)
  expect(waterInFeedMl({ volumeMl: 1, strengthFraction: 0.5, waterFraction: 0.8, flushMl: 0 })).toBeCloseTo(0.9, 12)
  expect(waterInFeedMl({ volumeMl: 0, strengthFraction: 1, waterFraction: 0.8, flushMl: 2 })).toBe(2)
  expect(() => waterInFeedMl({ volumeMl: 1, strengthFraction: 2, waterFraction: 0.8, flushMl: 0 })).toThrow()
})
