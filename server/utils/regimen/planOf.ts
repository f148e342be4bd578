import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import { buildPlan } from '../plan/buildPlan'
import { currentEdition } from '../reference'

/** The plan of an input by today's edition. Impossible input throws `CalcInputError`, which answers 422. */
export function planOf(input: RegimenInput): Plan {
  return buildPlan(input, currentEdition())
}
