import { describe, expect, it } from 'vitest'
import { usedTemperatureC } from '#server/utils/calc/energy/usedTemperatureC'

const window = { windowLowC: 35, windowHighC: 39, limitLowC: 15, limitHighC: 40 }

describe('usedTemperatureC', () => {
  it.each([
    ['inside the window: its own', 36.5, 36.5],
    ['colder: the middle, it is warmed first', 31, 37],
    ['unknown: the middle', null, 37],
    ['warmer: the top', 39.6, 39],
    ['on the edge', 35, 35],
  ])('%s', (_, bodyTemperatureC, expected) => {
    expect(usedTemperatureC({ ...window, bodyTemperatureC })).toBe(expected)
  })
  it('stays within the limits of the equations', () => {
    expect(usedTemperatureC({ bodyTemperatureC: null, windowLowC: 10, windowHighC: 14, limitLowC: 15, limitHighC: 40 })).toBe(15)
  })
  it('refuses a window upside down and a body out of range', () => {
    expect(() => usedTemperatureC({ ...window, windowHighC: 20, bodyTemperatureC: null })).toThrow()
    expect(() => usedTemperatureC({ ...window, bodyTemperatureC: 60 })).toThrow()
  })
})
