import { describe, expect, it } from 'vitest'
import { equationKcalPerDay, equationNumber, evaluateEquation } from '#server/utils/calc/equation/evaluateEquation'
import { equationRecord } from './records'

const kleiber = equationRecord('k * M ^ 0.75', [['M', 'kg', 0.01, 100]], { constants: { k: { value: 70, unit: 'kcal/day', meaning: 'at 1 kg' } } })

describe('evaluateEquation', () => {
  // Small Animal Clinical Nutrition 5th ed.: 1.36 kg needs 88 kcal/day by 70 M^0.75; 70 kcal is 293 kJ.
  it('gives value, unit and the expression with its values', () => {
    const { value, unit, kcalPerDay, steps } = evaluateEquation(kleiber, { M: 1.36 })
    expect(value).toBeCloseTo(88.156, 3)
    expect(unit).toBe('kcal/day')
    expect(kcalPerDay).toBe(value)
    expect(steps).toEqual([{ label: 'A test', expression: '70 × 1.36^0.75', value, unit: 'kcal/day' }])
    expect(equationNumber(kleiber, { M: 1.36 })).toBe(value)
  })
  it.each([
    ['kJ/day', 293, 293 / 4.184],
    ['W', 1, 20.65],
    // conv-mlh-kcal: mL O2 an hour x 0.1153 is kcal a day.
    ['mL O2/h', 1, 0.1153],
    ['mL O2/min', 1, 6.918],
  ])('turns %s into kcal a day, step by step', (resultUnit, value, expected) => {
    const record = equationRecord('v', [['v', '', 0, 999]], { resultUnit })
    const evaluated = evaluateEquation(record, { v: value })
    expect(evaluated.kcalPerDay).toBeCloseTo(expected, 2)
    expect(evaluated.steps.at(-1)).toMatchObject({ unit: 'kcal/day', value: evaluated.kcalPerDay })
    expect(equationKcalPerDay(record, { v: value })).toBeCloseTo(evaluated.kcalPerDay!, 12)
  })
  it('gives no kcal for what is no energy', () => {
    const record = equationRecord('v', [['v', '', 0, 999]], { topic: 'index', resultUnit: 'g' })
    expect(evaluateEquation(record, { v: 1 }).kcalPerDay).toBeUndefined()
    expect(() => equationKcalPerDay(record, { v: 1 })).toThrow('not an energy')
  })
  it('refuses missing and impossible values, and ranges when asked to', () => {
    expect(() => evaluateEquation(kleiber, {})).toThrow('needs the value M')
    expect(() => evaluateEquation(kleiber, { M: Number.NaN })).toThrow()
    expect(() => evaluateEquation(kleiber, { M: 500 }, { refuseOutOfRange: true })).toThrow('must be from 0.01 to 100 kg')
    expect(evaluateEquation(kleiber, { M: 500 }).value).toBeGreaterThan(0)
    expect(() => equationNumber(equationRecord('1 / v', [['v', '', 0, 1]]), { v: 0 })).toThrow('no number')
  })
})
