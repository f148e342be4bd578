import type { EquationItem, EquationValue } from '#shared/types/reference'
import type { EquationQuery } from '#shared/schemas/reference'
import { equationVariables } from '../calc/equation/equationVariables'
import { evaluateEquation } from '../calc/equation/evaluateEquation'

/** Name of each variable of an equation in a request. */
const QUERY_NAMES: Record<string, keyof EquationQuery> = {
  M: 'massG', g: 'massG', T: 'temperatureC', S: 'state', L: 'lengthMm', L0: 'referenceLengthMm', b: 'exponent', a: 'coefficient', P: 'proteinPercent', F: 'fatPercent', C: 'carbohydratePercent',
}

/**
 * Name under which a request gives a variable of an equation.
 *
 * @param variable  name in the equation, for example `L0`.
 * @returns name in the request, for example `referenceLengthMm`; the same name when there is none.
 * @throws Never.
 * @source house rule (names of the API say their unit)
 * @example queryNameOf('g') // 'massG'
 */
export function queryNameOf(variable: string): string {
  return QUERY_NAMES[variable] ?? variable
}

/**
 * One equation worked out for what a request gives, for people who look one up rather than plan.
 *
 * Hint: unlike a plan it refuses a value outside the range the equation is kept for, temperature included.
 *
 * @param equation  record of the edition.
 * @param query     weight g, temperature deg C, state, lengths mm and so on; what the equation does not need is ignored.
 * @returns value, kcal/day for energy, and the working; unrounded.
 * @throws CalcInputError `equation.variable` when something it needs is missing; `path` is the name in the equation;
 * @throws CalcInputError `equation.outOfRange` when a value is outside its range;
 * @throws CalcInputError `equation.notFinite` when there is no result.
 * @source the equation's own
 * @example equationAnswer(k129, { massG: 20 }).value // 6.86
 */
export function equationAnswer(equation: EquationItem, query: EquationQuery): EquationValue {
  const { massG, temperatureC, state, lengthMm, referenceLengthMm, exponent, coefficient, proteinPercent, fatPercent, carbohydratePercent } = query
  const variables = equationVariables(equation, {
    massG,
    // Given by its name in the equation it is taken as it is; a plan's temperature would be moved into the range.
    T: temperatureC,
    state,
    lengthMm,
    L0: referenceLengthMm,
    b: exponent,
    a: coefficient,
    P: proteinPercent,
    F: fatPercent,
    C: carbohydratePercent,
  })
  return evaluateEquation(equation, variables, { refuseOutOfRange: true })
}
