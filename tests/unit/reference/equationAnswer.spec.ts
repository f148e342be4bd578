import { describe, expect, it } from 'vitest'
import { EquationParams, EquationQuery } from '#shared/schemas/reference'
import { currentEdition } from '#server/utils/reference'
import { equationAnswer, queryNameOf } from '#server/utils/reference/equationAnswer'

const equation = (id: string) => currentEdition().equations.get(id)!

describe('EquationQuery', () => {
  it('reads numbers out of an address', () => {
    expect(EquationQuery.parse({ massG: '10', temperatureC: ' 30.5 ', state: '1', lengthMm: '1e2', exponent: '.5' })).toEqual({ massG: 10, temperatureC: 30.5, state: 1, lengthMm: 100, exponent: 0.5 })
    expect(EquationQuery.parse({})).toEqual({})
    expect(EquationQuery.parse({ temperatureC: '-2' })).toEqual({ temperatureC: -2 })
  })
  it.each([
    { massG: '' }, { massG: ' ' }, { massG: 'ten' }, { massG: '0x10' }, { massG: '1,000' }, { massG: '10g' }, { massG: 'Infinity' }, { massG: 'NaN' }, { massG: '-1' }, { massG: '0' }, { massG: '1e400' }, { massG: ['1', '2'] },
    { state: '0.5' }, { state: '2' }, { temperatureC: '95' }, { massKg: '1' }, { mass: '1' }, { exponent: '0' },
  ])('refuses %o', query => expect(EquationQuery.safeParse(query).success).toBe(false))
  it('names an equation plainly', () => {
    expect(EquationParams.safeParse({ id: 'k129-passerine' }).success).toBe(true)
    for (const id of ['', '../x', 'K129', 'a'.repeat(81), '__proto__']) expect(EquationParams.safeParse({ id }).success, id).toBe(false)
  })
})

describe('equationAnswer', () => {
  it('gives the value and its working', () => {
    expect(equationAnswer(equation('k129-passerine'), { massG: 20 }).value).toBeCloseTo(6.86, 2)
    expect(equationAnswer(equation('scaled-mass-index'), { massG: 50, lengthMm: 100, referenceLengthMm: 110, exponent: 3 }).value).toBeCloseTo(66.55, 10)
    expect(equationAnswer(equation('relative-condition'), { massG: 50, lengthMm: 100, coefficient: 0.0001, exponent: 3 }).value).toBeCloseTo(0.5, 10)
    expect(equationAnswer(equation('atwater-modified'), { proteinPercent: 10, fatPercent: 10, carbohydratePercent: 0 }).value).toBeCloseTo(1.2, 10)
  })
  it('takes the temperature as it is given, and refuses one outside the range', () => {
    expect(equationAnswer(equation('hughes-1971-tortoise'), { massG: 1000 }).value).toBeCloseTo(45.47, 10)
    expect(() => equationAnswer(equation('hughes-1971-tortoise'), { massG: 1000, temperatureC: 5 })).toThrow(expect.objectContaining({ code: 'equation.outOfRange', path: 'T' }))
    expect(() => equationAnswer(equation('andrews-pough-1985'), { massG: 10 })).toThrow(expect.objectContaining({ code: 'equation.variable', path: 'T' }))
  })
  it('refuses a weight that is missing or outside the range', () => {
    expect(() => equationAnswer(equation('k129-passerine'), {})).toThrow(expect.objectContaining({ code: 'equation.variable', path: 'M' }))
    expect(() => equationAnswer(equation('rer-linear-dogcat'), { massG: 100 })).toThrow(expect.objectContaining({ code: 'equation.outOfRange', path: 'M' }))
  })
  it('has a name in requests for every variable of every equation', () => {
    const names = new Set([...currentEdition().equations.values()].flatMap(one => one.variables.map(variable => variable.name)))
    for (const name of names) expect(Object.keys(EquationQuery.shape), name).toContain(queryNameOf(name))
  })
})
