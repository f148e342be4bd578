import { describe, expect, it } from 'vitest'
import { parseNumber, whyNoNumber } from '../../../utils/parseNumber'

describe('parseNumber', () => {
  it.each<[string, number]>([
    ['22', 22], [' 22 ', 22], ['0.4', 0.4], ['0,4', 0.4], ['.5', 0.5], ['5.', 5], ['1 250', 1250], ['1\u00A0250', 1250], ['1\'250', 1250], ['-3', -3],
    ['0,125', 0.125], ['12,5', 12.5], ['1,25', 1.25], ['1,2500', 1.25], ['1250', 1250], ['1.250', 1.25],
  ])('reads %j', (text, value) => expect(parseNumber(text)).toBe(value))

  it.each(['', '  ', 'abc', '1.2.3', '1,2,3', '1e5', '0x10', '½', '5 g', '--3', '.', ',', 'NaN', 'Infinity', null, undefined])('takes %j for no number', text => expect(parseNumber(text)).toBeNull())

  it.each(['1,250', '12,345', '999,000', '-1,250', '1,250,000', '1,250.5'])('does not guess what %j means', text => expect(parseNumber(text)).toBeNull())
})

describe('whyNoNumber', () => {
  it.each(['', ' ', '0,4', '1250', undefined, null])('has nothing to say of %j', text => expect(whyNoNumber(text)).toBe(''))
  it.each([['1,250', '1250 or 1.25'], ['12,345', '12345 or 12.345'], ['-1,500', '-1500 or -1.5']])('shows both readings of %j', (text, both) => expect(whyNoNumber(text)).toBe(`This can be read two ways. Type ${both}.`))
  it.each(['heavy', '1,2,3', '5 g', '1,250,000'])('asks for a number instead of %j', text => expect(whyNoNumber(text)).toBe('Type a number, for example 0.4.'))
})
