import { describe, expect, it } from 'vitest'
import type { EquationItem, EquationVariable } from '#shared/types/reference'
import { equationVariables } from '#server/utils/calc/equation/equationVariables'

function record(variables: [name: string, unit: string, low?: number, high?: number][], holdsAtC: number | null = null): EquationItem {
  return {
    id: 'made-up', topic: 'energy', title: 'Made up', expression: '1', constants: {}, taxon: 'none', groups: [], speciesIds: null, basis: 'resting',
    holdsAtC, temperatureTerm: 'none', resultUnit: 'kcal/day', notes: [], provenance: { sourceKey: 'definition', locator: 'test', howRead: 'original', unit: 'kcal/day' },
    variables: variables.map(([name, unit, low = 0, high = 1e6]): EquationVariable => ({ name, unit, low, high, meaning: name })),
  }
}

describe('equationVariables', () => {
  it('gives weight in kg or g as the record says', () => {
    expect(equationVariables(record([['M', 'kg']]), { massG: 1360 })).toEqual({ M: 1.36 })
    expect(equationVariables(record([['M', 'g']]), { massG: 1360 })).toEqual({ M: 1360 })
    expect(equationVariables(record([['g', 'g']]), { massG: 10 })).toEqual({ g: 10 })
  })

  it('gives length in the record\'s own unit', () => {
    for (const [unit, expected] of [['m', 0.125], ['cm', 12.5], ['mm', 125]] as const) {
      expect(equationVariables(record([['L', unit]]), { lengthMm: 125 }).L).toBeCloseTo(expected, 12)
    }
  })

  it('keeps the temperature inside the record\'s range', () => {
    const withT = record([['T', 'deg C', 15, 40]])
    expect(equationVariables(withT, { temperatureC: 30 })).toEqual({ T: 30 })
    expect(equationVariables(withT, { temperatureC: 5 })).toEqual({ T: 15 })
    expect(equationVariables(withT, { temperatureC: 45 })).toEqual({ T: 40 })
  })

  it('takes the temperature the equation holds at when none is given', () => {
    const tortoise = record([['T', 'deg C', 15, 40]], 25.5)
    expect(equationVariables(tortoise, {})).toEqual({ T: 25.5 })
    expect(equationVariables(tortoise, { temperatureC: null })).toEqual({ T: 25.5 })
    expect(equationVariables(record([['T', 'deg C', 15, 40]]), { temperatureC: null }).T).toBeNaN()
  })

  it('takes the resting state when none is given, and passes other names through', () => {
    expect(equationVariables(record([['S', '0 or 1']]), {})).toEqual({ S: 1 })
    expect(equationVariables(record([['S', '0 or 1']]), { state: 0 })).toEqual({ S: 0 })
    expect(equationVariables(record([['L0', 'mm'], ['b', 'exponent']]), { L0: 110, b: 3, unused: 9 })).toEqual({ L0: 110, b: 3 })
  })

  it('leaves what is not known as not a number, for the equation to refuse', () => {
    expect(equationVariables(record([['M', 'kg'], ['L', 'mm'], ['b', 'exponent']]), {})).toEqual({ M: Number.NaN, L: Number.NaN, b: Number.NaN })
  })
})
