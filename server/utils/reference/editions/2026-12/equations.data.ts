/**
 * Every equation of the edition that has a value, by id. Left out of the nutrition sheet, each with its reason:
 *
 * - `marsupial-ratio`, `blackwell-ratio`, `gienger-2017`, `fmr-class-ratio`, `fmr-vs-resting-lizard`: ratios, not equations; they stand in notes.
 * - `mcnab-2005-marsupial`, `white-seymour-exp`, `white-2006-exponents`, `nagy-slopes`, `chappell-ellis-1987`, `beck-lowe-1994`: exponents or spread only, no intercept seen.
 * - `harper-2000-note`, `jackson-criticism`: advice in words.
 * - `ultsch-2013-turtle`, `gatten-1992`, `feldman-meiri-2013`: they exist, their coefficients were not seen.
 * - `lizard-40g-field`: two measurements of one species, not an equation.
 * - `residual-index`: needs the whole sample, not one animal.
 * - 32 M^0.76 for snakes: seen once, between 32 M^0.75 and 32 M^0.77, which are here.
 * - ferrets, 70 and 200 to 300 kcal/kg: one clinic page, weak, and not linear in weight.
 * - fluid rates in mL/kg/day: not equations; they stand with the species and in the rules.
 */
import type { EquationItem } from '#shared/types/reference'
import { ectothermEnergyEquations } from './equationsEctotherm.data'
import { endothermEnergyEquations } from './equationsEndotherm.data'
import { feedEnergyEquations, fluidEquations, indexEquations, lengthEquations } from './equationsOther.data'

/**
 * Equations of edition 2026-12, by id, in the order in which they are shown.
 *
 * @source nutrition sheet 1.2 to 1.7, 6.1, 7.2 with its corrections; data set of lizard traits
 * @example equations.get('k129-passerine')!.expression // '129 * M ^ 0.75'
 */
export const equations: ReadonlyMap<string, EquationItem> = equationsById([
  ...ectothermEnergyEquations, ...endothermEnergyEquations, ...fluidEquations, ...lengthEquations, ...indexEquations, ...feedEnergyEquations,
])

function equationsById(list: EquationItem[]): ReadonlyMap<string, EquationItem> {
  const map = new Map<string, EquationItem>()
  for (const equation of list) {
    if (map.has(equation.id)) throw new Error(`Two equations are called "${equation.id}".`)
    map.set(equation.id, equation)
  }
  return map
}
