import fc from 'fast-check'
import { expect, it } from 'vitest'
import { feedMinutes } from '#server/utils/calc/timetable/feedMinutes'
import { mostFeeds } from '#server/utils/calc/timetable/mostFeeds'

it('counts the feeds that fit', () => {
  expect(mostFeeds({ spanMinutes: 780, gapHours: 4 })).toBe(4)
  expect(mostFeeds({ spanMinutes: 780, gapHours: 24 })).toBe(1)
  expect(mostFeeds({ spanMinutes: 60, gapHours: 0.5 })).toBe(3)
  expect(() => mostFeeds({ spanMinutes: 60, gapHours: 0 })).toThrow()
})

it('keeps the gap between all feeds it allows, after rounding to five minutes', () => {
  fc.assert(fc.property(fc.integer({ min: 60, max: 1440 }), fc.constantFrom(0.5, 1, 2, 3, 4, 6), fc.integer({ min: 0, max: 1439 }), (spanMinutes, gapHours, fromMinute) => {
    const feeds = mostFeeds({ spanMinutes, gapHours })
    const minutes = feedMinutes({ feeds, fromMinute, toMinute: (fromMinute + spanMinutes) % 1440 })
    for (let index = 1; index < minutes.length; index += 1) expect(minutes[index]! - minutes[index - 1]!).toBeGreaterThanOrEqual(gapHours * 60)
  }))
})
