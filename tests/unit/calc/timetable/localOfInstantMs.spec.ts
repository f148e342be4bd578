import { expect, it } from 'vitest'
import { localOfInstantMs } from '#server/utils/calc/timetable/localOfInstantMs'

const offsets = [{ fromMs: 0, offsetMs: 0 }, { fromMs: 1000, offsetMs: 500 }]
it('adds the offset that holds at the instant', () => {
  expect(localOfInstantMs(999, offsets)).toBe(999)
  expect(localOfInstantMs(1000, offsets)).toBe(1500)
  expect(localOfInstantMs(-5, offsets)).toBe(-5)
})
