import { expect, it } from 'vitest'
import { feedingSpanMinutes } from '#server/utils/calc/timetable/feedingSpanMinutes'

it('measures the feeding hours, over midnight too', () => {
  expect(feedingSpanMinutes({ fromMinute: 450, toMinute: 1230 })).toBe(780)
  expect(feedingSpanMinutes({ fromMinute: 1140, toMinute: 180 })).toBe(480)
  expect(feedingSpanMinutes({ fromMinute: 450, toMinute: 450 })).toBe(1440)
  expect(() => feedingSpanMinutes({ fromMinute: -1, toMinute: 450 })).toThrow()
})
