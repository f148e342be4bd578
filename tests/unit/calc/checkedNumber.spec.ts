import { describe, expect, it } from 'vitest'
import { CalcInputError } from '#server/utils/calc/calcInputError'
import { checkedNumber } from '#server/utils/calc/checkedNumber'

describe('checkedNumber', () => {
  it('gives back a number inside its range, ends included', () => {
    expect(checkedNumber(10, 'the weight', 'g', 0.1)).toBe(10)
    expect(checkedNumber(0.1, 'the weight', 'g', 0.1, 5)).toBe(0.1)
    expect(checkedNumber(5, 'the weight', 'g', 0.1, 5)).toBe(5)
  })
  it.each([Number.NaN, Number.POSITIVE_INFINITY, 0.09, 5.01])('refuses %s and names the quantity', (value) => {
    expect(() => checkedNumber(value, 'the weight', 'g', 0.1, 5)).toThrow(CalcInputError)
    expect(() => checkedNumber(value, 'the weight', 'g', 0.1, 5)).toThrow('The weight must be from 0.1 to 5 g.')
  })
  it('says "above 0" where anything above it will do', () => {
    expect(() => checkedNumber(0, 'the weight', 'g', Number.MIN_VALUE)).toThrow('The weight must be above 0 g.')
    expect(() => checkedNumber(0, 'the weight', 'g', Number.MIN_VALUE, 5)).toThrow('The weight must be above 0, up to 5 g.')
  })
})
