import { all, create } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { GROUPS, type EquationItem } from '#shared/types/reference'
import { isEctotherm } from '#shared/utils/groups'
import { equationNumber, evaluateEquation } from '#server/utils/calc/equation/evaluateEquation'
import { currentEdition, editionById } from '#server/utils/reference'

const edition = currentEdition()
const equations = [...edition.equations.values()]
const math = create(all!)

/** A point inside every range, geometric where the range spans powers of ten. */
function middle(equation: EquationItem): Record<string, number> {
  return Object.fromEntries(equation.variables.map(({ name, low, high }) => [name, low > 0 ? Math.sqrt(low * high) : (low + high) / 2]))
}

describe('editions', () => {
  it('finds the current one by its id, and no other', () => {
    expect(editionById(edition.id)).toBe(edition)
    expect(editionById('1999-01')).toBeNull()
    expect(Object.isFrozen(edition)).toBe(true)
  })

  it('holds every equation that the rules name, for the groups they name it for', () => {
    const { energy, condition } = edition.rules
    for (const group of GROUPS) {
      const standard = edition.equations.get(energy.defaultEquationId[group])
      expect(standard, group).toMatchObject({ topic: 'energy', groups: expect.arrayContaining([group]) })
      expect(['resting', 'standard'], group).toContain(standard!.basis)
      if (isEctotherm(group)) expect(standard!.temperatureTerm, group).not.toBe('none')
      const field = energy.fieldEquationId[group]
      if (field !== null) expect(edition.equations.get(field), group).toMatchObject({ basis: 'field', groups: expect.arrayContaining([group]) })
      const length = condition.groupLengthEquationId[group]
      if (length) expect(edition.equations.get(length.equationId), group).toMatchObject({ topic: 'length', groups: [group] })
    }
  })
})

describe.each(equations.map(equation => [equation.id, equation] as const))('equation %s', (_id, equation) => {
  it('gives what mathjs itself makes of the expression', () => {
    const scope = { ...middle(equation), ...Object.fromEntries(Object.entries(equation.constants).map(([name, { value }]) => [name, value])) }
    const expected = math.evaluate(equation.expression, scope) as number
    expect(equationNumber(equation, middle(equation)) / expected).toBeCloseTo(1, 12)
  })

  it('gives a finite, positive result at both ends of its ranges', () => {
    for (const end of ['low', 'high'] as const) {
      const variables = Object.fromEntries(equation.variables.map(variable => [variable.name, variable[end]]))
      if (equation.resultUnit === 'kcal/g' && end === 'low') continue
      const { value, kcalPerDay } = evaluateEquation(equation, variables, { refuseOutOfRange: true })
      expect(value).toBeGreaterThan(0)
      if (equation.topic === 'energy') expect(kcalPerDay).toBeGreaterThan(0)
    }
  })

  it('says what it is', () => {
    expect(equation.basis === null).toBe(equation.topic !== 'energy' || equation.id === 'hughes-1971-tortoise-active')
    expect(equation.title.length).toBeGreaterThan(10)
    expect(equation.variables.some(variable => variable.name === 'T')).toBe(equation.temperatureTerm !== 'none')
    expect(new Set(equation.groups).size).toBe(equation.groups.length)
    if (equation.groups.length === 0) expect(equation.notes.join(' '), 'an equation no plan offers must say where its twin is').toContain('Plans offer the same formula as')
    if (equation.topic === 'energy' && equation.temperatureTerm === 'none' && equation.groups.some(isEctotherm) && equation.basis !== 'field') expect(equation.holdsAtC).not.toBeNull()
  })
})

it('never takes the state term for a power of ten of its own', () => {
  const squamate = edition.equations.get('andrews-pough-1985')!
  expect(equationNumber(squamate, { g: 50, T: 30, S: 1 }) / equationNumber(squamate, { g: 50, T: 30, S: 0 })).toBeCloseTo(1.38, 2)
})
