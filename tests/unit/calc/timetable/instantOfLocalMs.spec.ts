import { describe, expect, it } from 'vitest'
import { instantOfLocalMs } from '#server/utils/calc/timetable/instantOfLocalMs'
import { localOfInstantMs } from '#server/utils/calc/timetable/localOfInstantMs'
import { zoneOffsets } from '#server/utils/calc/timetable/zoneOffsets'

const offsets = zoneOffsets('Europe/London', Date.UTC(2026, 2, 1), Date.UTC(2026, 10, 30))

describe('instantOfLocalMs', () => {
  it('subtracts the offset', () => {
    expect(instantOfLocalMs(Date.UTC(2026, 2, 10, 7, 30), offsets)).toBe(Date.UTC(2026, 2, 10, 7, 30))
    expect(instantOfLocalMs(Date.UTC(2026, 5, 1, 7, 30), offsets)).toBe(Date.UTC(2026, 5, 1, 6, 30))
  })
  it('moves a skipped time forward by the gap', () => {
    expect(instantOfLocalMs(Date.UTC(2026, 2, 29, 1, 30), offsets)).toBe(Date.UTC(2026, 2, 29, 1, 30))
    expect(localOfInstantMs(Date.UTC(2026, 2, 29, 1, 30), offsets)).toBe(Date.UTC(2026, 2, 29, 2, 30))
  })
  it('takes a doubled time the first time', () => {
    expect(instantOfLocalMs(Date.UTC(2026, 9, 25, 1, 30), offsets)).toBe(Date.UTC(2026, 9, 25, 0, 30))
  })
  it('undoes localOfInstantMs everywhere else', () => {
    for (let at = Date.UTC(2026, 2, 1); at < Date.UTC(2026, 10, 29); at += 3_600_000) {
      const doubled = at >= Date.UTC(2026, 9, 25, 1) && at < Date.UTC(2026, 9, 25, 2)
      if (!doubled) expect(instantOfLocalMs(localOfInstantMs(at, offsets), offsets)).toBe(at)
    }
  })
})
