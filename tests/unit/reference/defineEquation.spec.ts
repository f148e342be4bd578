import { describe, expect, it } from 'vitest'
import { defineEquation, type EquationDraft } from '#server/utils/reference/defineEquation'
import { cited } from '#server/utils/reference/record'

const Q10 = cited({ value: 2.4, unit: 'times per 10 deg C', sourceKey: 'andrews1985', locator: 'Eq. 2', howRead: 'computed' })
const draft: EquationDraft = {
  id: 'made-up', topic: 'energy', title: 'Made up', expression: '70 * M ^ 0.75', variables: [{ name: 'M', meaning: 'body weight', unit: 'kg', low: 0.1, high: 100 }],
  taxon: 'none', groups: ['lizard'], basis: 'resting', holdsAtC: null, temperatureTerm: 'none', resultUnit: 'kcal/day',
  provenance: { sourceKey: 'kleiber1961', locator: 'test', howRead: 'restated' },
}
const withConstant: EquationDraft = { ...draft, expression: 'q * M', constants: { q: { cited: Q10, meaning: 'rise' } } }

describe('defineEquation', () => {
  it('fills what was left out and gives the source the unit of the result', () => {
    const record = defineEquation(draft)
    expect(record).toMatchObject({ speciesIds: null, constants: {}, notes: [], provenance: { unit: 'kcal/day', sourceKey: 'kleiber1961' } })
  })

  it('is frozen with all its parts', () => {
    const record = defineEquation({ ...withConstant, speciesIds: ['sp-cat'], notes: ['A note.'] })
    for (const part of [record, record.variables, record.variables[0], record.constants, record.constants.q, record.groups, record.speciesIds, record.provenance, record.notes]) expect(Object.isFrozen(part)).toBe(true)
  })

  it('keeps value, unit and source of a constant', () => {
    expect(defineEquation(withConstant).constants.q).toEqual({ value: 2.4, unit: 'times per 10 deg C', meaning: 'rise', sourceKey: 'andrews1985', locator: 'Eq. 2', howRead: 'computed' })
  })

  it.each<[string, Partial<EquationDraft>]>([
    ['equation.expression', { expression: 'sin(M)' }],
    ['equation.expression', { expression: '70 M' }],
    ['equation.unknownName', { expression: '70 * M * x' }],
    ['equation.unusedName', { expression: '70' }],
    ['equation.unusedName', { constants: { q: { cited: Q10, meaning: 'rise' } } }],
    ['equation.uncitedConstant', { expression: 'q * M', constants: { q: { cited: { ...Q10 }, meaning: 'rise' } } }],
    ['equation.badRange', { variables: [{ name: 'M', meaning: 'body weight', unit: 'kg', low: 2, high: 1 }] }],
    ['equation.badRange', { variables: [{ name: 'M', meaning: 'body weight', unit: 'kg', low: 0, high: Number.NaN }] }],
    ['cited.unknownSource', { provenance: { sourceKey: 'nobody1900', locator: 'test', howRead: 'restated' } }],
    ['cited.noUnit', { resultUnit: '' }],
  ])('refuses with %s: %o', (code, wrong) => {
    expect(() => defineEquation({ ...draft, ...wrong })).toThrow(expect.objectContaining({ code }))
  })
})
