import { describe, expect, it } from 'vitest'
import { feedMinutes } from '#server/utils/calc/timetable/feedMinutes'

describe('feedMinutes', () => {
  it('spreads feeds over the feeding hours', () => {
    expect(feedMinutes({ feeds: 3, fromMinute: 450, toMinute: 1230 })).toEqual([450, 840, 1230])
    expect(feedMinutes({ feeds: 1, fromMinute: 450, toMinute: 1230 })).toEqual([450])
  })
  it('goes past midnight for night feeders', () => {
    expect(feedMinutes({ feeds: 3, fromMinute: 1140, toMinute: 180 })).toEqual([1140, 1380, 1620])
  })
  it('keeps to whole five minutes', () => {
    for (const minute of feedMinutes({ feeds: 7, fromMinute: 421, toMinute: 1231 }).slice(1, -1)) expect((minute - 421) % 5).toBe(0)
  })
  it('refuses no feeds', () => expect(() => feedMinutes({ feeds: 0, fromMinute: 0, toMinute: 60 })).toThrow())
})
