import type { Plan } from '#shared/types/plan'
import { formatDay } from '#shared/utils/calendar'
import { formatNumber, formatWeightG } from '#shared/utils/quantity'
import { STANDING_RULES } from '../reference/standingRules'

/** What a new weight does to the plan it is held against. */
export interface WeighInVerdict {
  /** A sentence for the person at the scale. */
  effect: string
  /** Why the approval ends; null when it stands. */
  lapse: string | null
}

/**
 * Holds a new weight against the weight a plan was made and approved for, by the re-weigh rule: under the stop weight,
 * or changed by a tenth or more, and the plan no longer fits.
 *
 * @param plan  the newest version.
 * @param weightG  new weight, g, > 0.
 * @throws Never.
 * @source house rules (`STANDING_RULES`), the plan's own stop weight
 * @example judgeWeighIn(planFor182g, 205).lapse // 'Weighed 205 g, 13 % more than the 182 g it was made for.'
 */
export function judgeWeighIn(plan: Plan, weightG: number): WeighInVerdict {
  const { weightG: madeFor, weighedOn } = plan.animal
  // Percent of grams: 0.1 g on 10 g is 1 %, and must not become 0.9999.
  const percent = Math.round((weightG - madeFor) / madeFor * 1e6) / 1e4
  const inWords = percent === 0 ? 'the same as' : `${formatNumber(Math.abs(percent), 1)} % ${percent > 0 ? 'more' : 'less'} than`
  const weighed = `Weighed ${formatWeightG(weightG)}, ${inWords} the ${formatWeightG(madeFor)} it was made for.`
  if (weightG < plan.validity.stopWeightG) return { effect: `${weighed} That is under the stop weight of ${formatWeightG(plan.validity.stopWeightG)}: do not give the next feed, and call the vet.`, lapse: `${weighed} Under the stop weight.` }
  if (Math.abs(percent) >= STANDING_RULES.weightChangePercent.value) return { effect: `${weighed} Change the plan to the new weight before the next feed.`, lapse: weighed }
  return { effect: `${weighed} The plan of ${formatDay(weighedOn)} still fits.`, lapse: null }
}
