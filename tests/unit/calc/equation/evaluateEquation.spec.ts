import { describe, expect, it } from 'vitest'
import type { EquationItem } from '#shared/types/reference'
import { equationKcalPerDay, equationNumber, evaluateEquation } from '#server/utils/calc/equation/evaluateEquation'

function record(over: Partial<EquationItem>): EquationItem {
  return {
    id: 'made-up', topic: 'energy', title: 'Made up', expression: '70 * M ^ 0.75', variables: [{ name: 'M', meaning: 'body weight', unit: 'kg', low: 0.5, high: 100 }], constants: {}, taxon: 'none', groups: [], speciesIds: null, basis: 'resting',
    holdsAtC: null, temperatureTerm: 'none', resultUnit: 'kcal/day', notes: [], provenance: { sourceKey: 'kleiber1961', locator: 'test', howRead: 'original', unit: 'kcal/day' }, ...over,
  }
}
const squamate = record({
  expression: '0.013 * g ^ 0.8 * 10 ^ (0.038 * T) * 10 ^ (0.14 * S)', resultUnit: 'mL O2/h',
  variables: [['g', 'g'], ['T', 'deg C'], ['S', '0 or 1']].map(([name, unit]) => ({ name: name!, unit: unit!, meaning: name!, low: 0, high: 1000 })),
})

describe('equationNumber', () => {
  it('gives the value in the published unit', () => {
    expect(equationNumber(record({}), { M: 1.36 })).toBeCloseTo(88.15607, 5)
  })
  it('uses the constants of the record', () => {
    expect(equationNumber(record({ expression: 'k * M', constants: { k: { value: 2, unit: '1', meaning: 'test' } } }), { M: 3 })).toBe(6)
  })
  it.each([[{}], [{ M: Number.NaN }], [{ M: Number.POSITIVE_INFINITY }]])('refuses %o, which lacks a variable', (variables) => {
    expect(() => equationNumber(record({}), variables as Record<string, number>)).toThrow(expect.objectContaining({ name: 'CalcInputError', code: 'equation.variable', path: 'M' }))
  })
  it('never lets a result out that is no number', () => {
    expect(() => equationNumber(record({ expression: 'log10(M)' }), { M: -1 })).toThrow(expect.objectContaining({ code: 'equation.notFinite' }))
    expect(() => equationNumber(record({ expression: '1 / M' }), { M: 0 })).toThrow(expect.objectContaining({ code: 'equation.notFinite' }))
  })
})

describe('equationKcalPerDay', () => {
  it.each([
    ['kcal/day', 1],
    ['kJ/day', 1 / 4.184],
    ['W', 86.4 / 4.184],
    ['mL O2/h', 24 * 20.1 / 4184],
    ['mL O2/min', 60 * 24 * 20.1 / 4184],
  ])('converts %s', (resultUnit, factor) => {
    expect(equationKcalPerDay(record({ expression: 'M', resultUnit }), { M: 10 })).toBeCloseTo(10 * factor, 10)
  })
  it('refuses what is no energy', () => {
    expect(() => equationKcalPerDay(record({ resultUnit: 'g' }), { M: 1 })).toThrow(expect.objectContaining({ code: 'equation.notEnergy' }))
  })
  it('gives a 10 g gecko at 30 deg C 0.18 kcal a day at rest, 1.38 times its standard rate', () => {
    const resting = equationKcalPerDay(squamate, { g: 10, T: 30, S: 1 })
    expect(resting).toBeCloseTo(0.18, 3)
    expect(resting / equationKcalPerDay(squamate, { g: 10, T: 30, S: 0 })).toBeCloseTo(1.38, 2)
  })
})

describe('evaluateEquation', () => {
  it('shows its working, one unit at a time', () => {
    const { value, unit, kcalPerDay, steps, sourceKey } = evaluateEquation(squamate, { g: 10, T: 30, S: 1 })
    expect({ unit, sourceKey }).toEqual({ unit: 'mL O2/h', sourceKey: 'kleiber1961' })
    expect(steps.map(step => step.expression)).toEqual([
      '0.013 × g^0.8 × 10^(0.038 × T) × 10^(0.14 × S) = 0.013 × 10^0.8 × 10^(0.038 × 30) × 10^(0.14 × 1)',
      '1.563 × 24',
      '37.51 × 20.1 ÷ 1,000',
      '0.754 ÷ 4.184',
    ])
    expect(steps.map(step => step.unit)).toEqual(['mL O2/h', 'mL O2/day', 'kJ/day', 'kcal/day'])
    expect(steps[0]!.value).toBe(value)
    expect(steps.at(-1)!.value).toBe(kcalPerDay)
    expect(kcalPerDay).toBeCloseTo(equationKcalPerDay(squamate, { g: 10, T: 30, S: 1 }), 12)
  })
  it('writes minutes to hours as a step of its own', () => {
    expect(evaluateEquation(record({ resultUnit: 'mL O2/min' }), { M: 1 }).steps.map(step => step.unit)).toEqual(['mL O2/min', 'mL O2/h', 'mL O2/day', 'kJ/day', 'kcal/day'])
  })
  it('gives no kcal a day for what is no energy', () => {
    const result = evaluateEquation(record({ topic: 'length', resultUnit: 'g' }), { M: 1 })
    expect(result.kcalPerDay).toBeUndefined()
    expect(result.steps).toHaveLength(1)
  })
  it('refuses a value outside the range only when asked to', () => {
    expect(evaluateEquation(record({}), { M: 0.1 }).value).toBeCloseTo(12.448, 3)
    expect(() => evaluateEquation(record({}), { M: 0.1 }, { refuseOutOfRange: true })).toThrow(expect.objectContaining({ code: 'equation.outOfRange', path: 'M', expected: '0.5 to 100 kg' }))
    expect(evaluateEquation(record({}), { M: 0.5 }, { refuseOutOfRange: true }).value).toBeGreaterThan(0)
  })
})
