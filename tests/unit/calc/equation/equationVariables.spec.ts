import { expect, it } from 'vitest'
import { equationVariables } from '#server/utils/calc/equation/equationVariables'
import { equationRecord } from './records'

it('fills the canonical names in the units the record asks for', () => {
  const record = equationRecord('M + g + T + S + L', [['M', 'kg', 0, 99], ['g', 'g', 0, 99999], ['T', 'deg C', 15, 40], ['S', '', 0, 1], ['L', 'm', 0, 9]])
  expect(equationVariables(record, { massG: 1360, temperatureC: 30, lengthMm: 40 })).toEqual({ M: 1.36, g: 1360, T: 30, S: 1, L: 0.04 })
})
it('keeps the temperature inside the range, and falls back to where the equation holds', () => {
  const record = equationRecord('T', [['T', 'deg C', 15, 40]], { holdsAtC: 25.5 })
  expect(equationVariables(record, { temperatureC: 50 })).toEqual({ T: 40 })
  expect(equationVariables(record, { temperatureC: null })).toEqual({ T: 25.5 })
})
it('takes grams where the record says grams, extras by name, and leaves the unknown as NaN', () => {
  const record = equationRecord('M * b', [['M', 'g', 0, 99999], ['b', '', 0, 9]])
  expect(equationVariables(record, { massG: 50, b: 3 })).toEqual({ M: 50, b: 3 })
  expect(equationVariables(record, { massG: 50 }).b).toBeNaN()
})
