import { expect, it } from 'vitest'
import { smallestFeedMl } from '#server/utils/calc/measuring/smallestFeedMl'

const rule = { marks: 2, floorMl: 0.05 }
it.each([[1, 0.01, 0.05], [3, 0.1, 0.2], [10, 0.2, 0.4], [0.5, 0.02, 0.06], [1, 0.05, 0.1]])('a %s mL syringe with marks of %s mL measures from %s mL', (capacityMl, stepMl, expected) => {
  expect(smallestFeedMl({ capacityMl, stepMl }, rule)).toBe(expected)
})
it('refuses a step of nothing', () => expect(() => smallestFeedMl({ capacityMl: 1, stepMl: 0 }, rule)).toThrow())
