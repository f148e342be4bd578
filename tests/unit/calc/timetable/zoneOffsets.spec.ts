import { describe, expect, it } from 'vitest'
import { zoneOffsets } from '#server/utils/calc/timetable/zoneOffsets'

const hour = 3_600_000

describe('zoneOffsets', () => {
  it('is one offset where clocks stand still', () => {
    expect(zoneOffsets('Asia/Kathmandu', Date.UTC(2026, 0, 1), Date.UTC(2026, 11, 31))).toEqual([{ fromMs: Date.UTC(2026, 0, 1), offsetMs: 5.75 * hour }])
  })
  // Clock changes as published for 2026: European Union Sun 29 March 01:00 UTC; United States Sun 1 November 06:00 UTC (Eastern).
  it('finds clock changes to the second', () => {
    expect(zoneOffsets('Europe/London', Date.UTC(2026, 2, 20), Date.UTC(2026, 3, 5))[1]).toEqual({ fromMs: Date.UTC(2026, 2, 29, 1), offsetMs: hour })
    expect(zoneOffsets('America/New_York', Date.UTC(2026, 9, 20), Date.UTC(2026, 10, 10))[1]).toEqual({ fromMs: Date.UTC(2026, 10, 1, 6), offsetMs: -5 * hour })
    expect(zoneOffsets('Pacific/Chatham', Date.UTC(2026, 3, 1), Date.UTC(2026, 3, 10))).toHaveLength(2)
  })
  it('refuses a zone that is not known', () => expect(() => zoneOffsets('Nowhere/Else', 0, 1)).toThrow('not known'))
})
