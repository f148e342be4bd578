import { expect, it } from 'vitest'
import { CalcInputError } from '#server/utils/calc/calcInputError'

it('carries code, sentence and where', () => {
  const error = new CalcInputError('weight.notPositive', 'The weight must be above 0 g.', { path: 'animal.weightG', received: -1 })
  expect(error).toBeInstanceOf(Error)
  expect(error).toMatchObject({ code: 'weight.notPositive', message: 'The weight must be above 0 g.', path: 'animal.weightG', received: -1 })
})
