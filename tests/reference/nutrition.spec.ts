import { describe, expect, it } from 'vitest'
import { KJ_PER_DAY_PER_WATT, KJ_PER_KCAL } from '#shared/utils/units'
import { deficitMl } from '#server/utils/calc/fluids/deficitMl'
import { waterDueMl } from '#server/utils/calc/fluids/waterDueMl'
import { equationKcalPerDay, equationNumber } from '#server/utils/calc/equation/evaluateEquation'
import { equationVariables } from '#server/utils/calc/equation/equationVariables'
import { currentEdition } from '#server/utils/reference'
import published from './nutrition-check-values.json'

/** Published results, each with its source and the tolerance it was printed to. Rows called "derived" guard our own sums. */
interface Row { id: string, equation: string, inputs: Record<string, number>, expected: number, unit: string, tolerance: number, source: string }
const rows = published as unknown as Row[]
const { equations, rules } = currentEdition()
const HOUR_MS = 3_600_000

function massG({ mass_g: grams, mass_kg: kilograms, mass }: Row['inputs']): number | undefined {
  return grams ?? (kilograms === undefined ? mass : kilograms * 1000)
}

function variablesOf(row: Row): Record<string, number> {
  const { T_C: celsius, T_K: kelvin, length_m: metres, scl_cm: centimetres, L, L0, b } = row.inputs
  return equationVariables(equations.get(row.equation)!, {
    massG: massG(row.inputs),
    temperatureC: kelvin === undefined ? celsius : kelvin - 273.15,
    lengthMm: metres !== undefined ? metres * 1000 : centimetres !== undefined ? centimetres * 10 : L,
    L0, b,
  })
}

function equationResult(row: Row): number {
  const equation = equations.get(row.equation)!
  if (row.unit === 'kcal/day') return equationKcalPerDay(equation, variablesOf(row))
  if (row.unit === 'kJ/day') return equationKcalPerDay(equation, variablesOf(row)) * KJ_PER_KCAL
  if (row.unit === 'W') return equationKcalPerDay(equation, variablesOf(row)) * KJ_PER_KCAL / KJ_PER_DAY_PER_WATT
  return equationNumber(equation, variablesOf(row))
}

/** The bird tables print rates times the factors that are also our rules for caged and growing birds. */
const timesRule = (equationId: string, factor: number) => (row: Row) => equationKcalPerDay(equations.get(equationId)!, { M: massG(row.inputs)! / 1000 }) * factor
const { breeding: caged, growing } = rules.energy.factor.bird

const OTHERS: Record<string, (row: Row) => number> = {
  'mer-1.5x-k129': timesRule('k129-passerine', caged.value),
  'mer-1.5x-k78': timesRule('k78-nonpasserine', caged.value),
  'growth-1.5x-mer': timesRule('k129-passerine', growing.value),
  'deficit': row => deficitMl({ weightG: massG(row.inputs)!, drynessPercent: row.inputs.dehydration_pct! }),
  'maintenance-plus-pct': (row) => {
    const deficit = deficitMl({ weightG: 1000, drynessPercent: row.inputs.dehydration_pct! })
    return waterDueMl({ spanFromMs: 0, spanToMs: 24 * HOUR_MS, fluidsFromMs: 0, maintenanceMlPerDay: row.inputs.maintenance_ml_kg!, deficitMl: deficit, deficitHours: 24, capMlPerDay: 1000 })
  },
  'time-bird': (row) => {
    const weightG = massG(row.inputs)!
    const day = row.inputs.day!
    return waterDueMl({
      spanFromMs: (day - 1) * 24 * HOUR_MS, spanToMs: day * 24 * HOUR_MS, fluidsFromMs: 0,
      maintenanceMlPerDay: row.inputs.maintenance_ml_kg! * weightG / 1000,
      deficitMl: deficitMl({ weightG, drynessPercent: row.inputs.dehydration_pct! }),
      deficitHours: rules.fluids.deficitHours.bird.value,
      capMlPerDay: rules.fluids.capMlPerKgPerDay.bird.value * weightG / 1000,
    })
  },
}

/** Rows that nothing in the product works out, each with its reason. */
const LEFT_OUT: Record<string, string> = {
  'chick-intake': 'share of body weight by day for kingfisher and hornbill chicks; plans go by energy and meal limit',
  'f75-volume': 'feeding of children: read for the shape of a ramp, not used for an animal',
  'f75-volume-oedema': 'feeding of children: read for the shape of a ramp, not used for an animal',
  'f100-min': 'feeding of children: read for the shape of a ramp, not used for an animal',
  'f100-max': 'feeding of children: read for the shape of a ramp, not used for an animal',
  'gain-g-kg-d': 'weight gain of children; plans stop on loss and do not judge gain',
  'nice-10kcal': 'feeding of adult people: read for the shape of a ramp, not used for an animal',
}

const covered = (row: Row) => equations.has(row.equation) || row.equation in OTHERS

it('covers every published row, or says why not', () => {
  expect(rows).toHaveLength(55)
  expect(rows.filter(row => covered(row) === row.equation in LEFT_OUT).map(row => row.id)).toEqual([])
  expect(Object.keys({ ...LEFT_OUT, ...OTHERS }).filter(name => !rows.some(row => row.equation === name))).toEqual([])
  expect(rows.filter(covered).length).toBeGreaterThanOrEqual(47)
})

describe('published results', () => {
  it.each(rows.filter(covered).map(row => [row.id, row.source, row] as const))('%s (%s)', (_id, _source, row) => {
    const result = (OTHERS[row.equation] ?? equationResult)(row)
    // A tolerance of 0 means printed exactly; binary fractions still need their last place.
    expect(Math.abs(result - row.expected), `got ${result}, printed ${row.expected} ${row.unit}`).toBeLessThanOrEqual(Math.max(row.tolerance, 1e-9 * Math.abs(row.expected)))
  })
})

/** Nutrition sheet 1.3 and 12.1: computed tables, kept so that no equation moves unseen. */
const kcal = (id: string, grams: number, temperatureC?: number, state?: 0 | 1) => equationKcalPerDay(equations.get(id)!, equationVariables(equations.get(id)!, { massG: grams, temperatureC, state }))

describe('birds side by side, kcal a day', () => {
  const ids = ['k129-passerine', 'lasiewski-dawson-1967-pass', 'k78-nonpasserine', 'lasiewski-dawson-1967-nonpass', 'mckechnie-wolf-2004', 'nagy-1999-bird']
  it.each([
    [10, 4.1, 4.6, 2.5, 2.8, 3.3, 12.0],
    [30, 9.3, 10.2, 5.6, 6.2, 7.0, 25.4],
    [100, 22.9, 24.4, 13.9, 14.8, 15.6, 57.8],
    [400, 64.9, 66.4, 39.2, 40.4, 39.3, 148.5],
    [1000, 129.0, 129.0, 78.0, 78.3, 72.6, 277.1],
  ])('%d g', (grams, ...expected) => {
    expect(ids.map(id => Number(kcal(id, grams).toFixed(1)))).toEqual(expected)
  })
})

describe('reptiles side by side, kcal a day', () => {
  const weights = [5, 10, 50, 100, 500, 1000, 5000]
  it.each<[string, string, number | undefined, 0 | 1 | undefined, number[]]>([
    ['squamates, standard at 30 deg C', 'andrews-pough-1985', 30, 0, [0.075, 0.131, 0.473, 0.824, 2.98, 5.2, 18.8]],
    ['squamates, resting at 30 deg C', 'andrews-pough-1985', 30, 1, [0.103, 0.18, 0.653, 1.14, 4.12, 7.17, 26]],
    ['all pooled at 30 deg C', 'bennett-dawson-1976', undefined, undefined, [0.111, 0.189, 0.652, 1.11, 3.84, 6.54, 22.6]],
    ['theory at 30 deg C', 'gillooly-2001-reptile', 30, undefined, [0.139, 0.234, 0.783, 1.32, 4.4, 7.4, 24.7]],
    ['squamates, standard at 37 deg C', 'andrews-pough-1985', 37, 0, [0.138, 0.241, 0.873, 1.52, 5.51, 9.59, 34.7]],
    ['squamates, resting at 37 deg C', 'andrews-pough-1985', 37, 1, [0.191, 0.332, 1.2, 2.1, 7.6, 13.2, 48]],
    ['theory at 37 deg C', 'gillooly-2001-reptile', 37, undefined, [0.268, 0.45, 1.5, 2.53, 8.46, 14.2, 47.6]],
    ['K = 10 at 37 deg C', 'reptile-k10-37c', undefined, undefined, [0.188, 0.316, 1.06, 1.78, 5.95, 10, 33.4]],
    ['free-living day', 'nagy-1999-reptile', undefined, undefined, [0.196, 0.363, 1.52, 2.81, 11.8, 21.8, 91]],
    ['older formula, exponent 0.77', 'donoghue-32-077', undefined, undefined, [0.541, 0.923, 3.19, 5.43, 18.8, 32, 110]],
    ['older formula, exponent 0.75', 'donoghue-32-075', undefined, undefined, [0.602, 1.01, 3.38, 5.69, 19, 32, 107]],
  ])('%s', (_what, id, temperatureC, state, expected) => {
    const three = (value: number) => Number(value.toPrecision(3))
    expect(weights.map(grams => three(kcal(id, grams, temperatureC, state)))).toEqual(expected)
  })

  it('keeps the older formula above a free-living day until 26 kg', () => {
    expect(kcal('donoghue-32-077', 25_000)).toBeGreaterThan(kcal('nagy-1999-reptile', 25_000))
    expect(kcal('donoghue-32-077', 27_000)).toBeLessThan(kcal('nagy-1999-reptile', 27_000))
  })

  it('lets no equation of 30 deg C stray further than a factor of 1.5 from another at 1 kg', () => {
    const values = [kcal('andrews-pough-1985', 1000, 30, 0), kcal('andrews-pough-1985', 1000, 30, 1), kcal('seymour-2013-crocodile', 1000, 30), kcal('hughes-1971-tortoise', 1000, 30), kcal('gillooly-2001-reptile', 1000, 30), kcal('bennett-dawson-1976', 1000)]
    expect(values.map(value => Number(value.toPrecision(3)))).toEqual([5.2, 7.17, 6.99, 7.77, 7.4, 6.54])
    expect(Math.max(...values) / Math.min(...values)).toBeLessThan(1.5)
  })
})

describe('amphibians of 50 g, kcal a day', () => {
  it.each([[15, 0.24], [20, 0.33], [25, 0.46]])('at %d deg C', (temperatureC, expected) => {
    expect(Number(kcal('gillooly-2001-amphibian', 50, temperatureC).toFixed(2))).toBe(expected)
  })
  it('by the tables for 25 deg C', () => {
    expect(Number(kcal('wright-whitaker-anuran-25', 50).toFixed(2))).toBe(0.53)
    expect(Number(kcal('wright-whitaker-caudate-25', 50).toFixed(2))).toBe(0.23)
  })
})

describe('dogs and cats: straight line against curve', () => {
  it.each([[2, 130, 118], [4, 190, 198], [10, 370, 394], [20, 670, 662], [34, 1090, 986], [45, 1420, 1216]])('%d kg', (kilograms, line, curve) => {
    expect(kcal('rer-linear-dogcat', kilograms * 1000)).toBeCloseTo(line, 6)
    expect(Math.round(kcal('kleiber-1961-placental', kilograms * 1000))).toBe(curve)
  })
})
