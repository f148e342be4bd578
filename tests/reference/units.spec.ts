import convert from 'convert-units'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  celsiusFrom, celsiusTo, gramsFrom, gramsTo, G_PER_LB, G_PER_OZ, J_PER_ML_O2, KJ_PER_DAY_PER_WATT, KJ_PER_KCAL, LENGTH_UNITS, MASS_UNITS, millimetresFrom, millimetresTo, ML_PER_US_FL_OZ, MM_PER_INCH, TEMPERATURE_UNITS,
} from '#shared/utils/units'

/** An independent library, right to its own printed factors. */
const WITHIN = 1e-5
const apart = (ours: number, theirs: number) => Math.abs(ours - theirs) / Math.max(Math.abs(theirs), 1e-12)
const AMOUNTS = [0.001, 0.35, 1, 10, 60, 453.59237, 4500, 25_000]
const quantity = fc.double({ min: 1e-6, max: 1e6, noNaN: true })

describe('units against an independent library', () => {
  it.each(MASS_UNITS.flatMap(unit => AMOUNTS.map(amount => [amount, unit] as const)))('%d %s', (amount, unit) => {
    expect(apart(gramsFrom(amount, unit), convert(amount).from(unit).to('g'))).toBeLessThan(WITHIN)
    expect(apart(gramsTo(amount, unit), convert(amount).from('g').to(unit))).toBeLessThan(WITHIN)
  })
  it.each(LENGTH_UNITS.flatMap(unit => AMOUNTS.map(amount => [amount, unit] as const)))('%d %s', (amount, unit) => {
    expect(apart(millimetresFrom(amount, unit), convert(amount).from(unit).to('mm'))).toBeLessThan(WITHIN)
    expect(apart(millimetresTo(amount, unit), convert(amount).from('mm').to(unit))).toBeLessThan(WITHIN)
  })
  it.each([-40, 0, 20, 32, 95, 98.6, 104])('%d degrees', (degrees) => {
    expect(celsiusFrom(degrees, 'degF')).toBeCloseTo(convert(degrees).from('F').to('C'), 9)
    expect(celsiusTo(degrees, 'degF')).toBeCloseTo(convert(degrees).from('C').to('F'), 9)
  })
  it('fluid ounces', () => {
    expect(apart(ML_PER_US_FL_OZ, convert(1).from('fl-oz').to('ml'))).toBeLessThan(WITHIN)
  })
  it('a watt over a day', () => {
    expect(apart(KJ_PER_DAY_PER_WATT, convert(24).from('Wh').to('kJ'))).toBeLessThan(WITHIN)
  })
})

describe('exact factors', () => {
  it('are the defined ones', () => {
    expect(G_PER_LB).toBe(453.59237)
    expect(G_PER_OZ * 16).toBe(G_PER_LB)
    expect(MM_PER_INCH).toBe(25.4)
    expect(KJ_PER_KCAL).toBe(4.184)
    expect(ML_PER_US_FL_OZ).toBeCloseTo(231 * MM_PER_INCH ** 3 / 1000 / 128, 12)
    expect(KJ_PER_DAY_PER_WATT).toBe(24 * 3600 / 1000)
  })
  it('turn oxygen and watts into kilocalories as published', () => {
    // 20.1 J per mL is 4.80 kcal per L; 1 W is 20.65 kcal a day; 1 mL of oxygen an hour is 0.1153 kcal a day.
    expect((J_PER_ML_O2 / KJ_PER_KCAL).toFixed(2)).toBe('4.80')
    expect((KJ_PER_DAY_PER_WATT / KJ_PER_KCAL).toFixed(2)).toBe('20.65')
    expect((24 * J_PER_ML_O2 / 1000 / KJ_PER_KCAL).toFixed(4)).toBe('0.1153')
    expect((1 / KJ_PER_DAY_PER_WATT).toFixed(7)).toBe('0.0115741')
  })
  it('turn the rate of a wintering kite into the printed kilocalories', () => {
    // 5.49 W, printed as 113.1 kcal a day (abstract on the energetics of two wintering raptors).
    expect(Math.abs(5.49 * KJ_PER_DAY_PER_WATT / KJ_PER_KCAL - 113.1)).toBeLessThan(0.4)
  })
})

describe('there and back', () => {
  it.each(MASS_UNITS)('grams and %s', unit => fc.assert(fc.property(quantity, value => apart(gramsTo(gramsFrom(value, unit), unit), value) < 1e-12)))
  it.each(LENGTH_UNITS)('millimetres and %s', unit => fc.assert(fc.property(quantity, value => apart(millimetresTo(millimetresFrom(value, unit), unit), value) < 1e-12)))
  it.each(TEMPERATURE_UNITS)('Celsius and %s', unit => fc.assert(fc.property(fc.double({ min: -60, max: 150, noNaN: true }), value => Math.abs(celsiusFrom(celsiusTo(value, unit), unit) - value) < 1e-10)))
})
