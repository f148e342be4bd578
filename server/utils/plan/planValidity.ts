import type { PlanDay, PlanGate, PlanValidity, Tier } from '#shared/types/plan'
import { formatDay } from '#shared/utils/calendar'
import { formatNumber, formatWeightG } from '#shared/utils/quantity'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'
import { dateOf } from './planDays'

/**
 * How long the weight carries the plan, when to weigh next, and the weight under which to stop.
 *
 * @param context  the plan's context; findings are added.
 * @param tier  refeeding risk.
 * @param days  days of the plan.
 * @param gate  a weight too old closes it to `wait`, with the reason.
 * @returns dates and the stop weight, g, rounded down to the scale's step and always under the weight.
 * @throws Never for a context that `planContext` made.
 * @source dosing sheet MET-02 (weight age), trade needs 6.4; house rules
 * @example planValidity(context, 'extreme', days, gate).stopWeightG // 9.5 for a gecko of 10 g on a 0.1 g scale
 */
export function planValidity(context: PlanContext, tier: Tier, days: readonly PlanDay[], gate: PlanGate): PlanValidity {
  const { rules, weightG } = context
  const weighedOn = weighedOnOf(context, days)
  const highRisk = tier === 'high' || tier === 'extreme'
  const catDog = context.species.id === 'sp-cat' || context.species.id === 'sp-dog'
  const life = catDog && !highRisk && context.input.animal.lifeStage === 'adult' ? rules.validity.weightDays.adultCatDog : rules.validity.weightDays.usual
  const every = !context.ectotherm ? rules.validity.weighEveryDays.endotherm : highRisk ? rules.validity.weighEveryDays.ectothermHighRisk : rules.validity.weighEveryDays.ectotherm
  const goodUntil = addDays(weighedOn, life.value)
  const startDate = days[0]!.date
  if (weighedOn > days.at(-1)!.date) {
    context.findings.push(makeFinding('weight.fromTheFuture', 'caution', 'Weighed after the plan ends', `The weight is dated ${formatDay(weighedOn)}, the plan begins on ${formatDay(startDate)}. Check the dates.`, { path: 'animal.weighedOn', expected: startDate, received: weighedOn }))
  }
  else if (weighedOn > startDate) {
    context.findings.push(makeFinding('weight.sinceStart', 'note', 'Weighed since the plan began', `It began on ${formatDay(startDate)}. All amounts are worked out from the weight of ${formatDay(weighedOn)}.`, { path: 'animal.weighedOn', received: weighedOn }))
  }
  else if (goodUntil < startDate) {
    gate.findings.push(makeFinding('weight.stale', 'stop', 'The weight is too old', `It was weighed on ${formatDay(weighedOn)}; a weight carries a plan like this for ${life.value} days. Weigh it again before the first feed.`, { path: 'animal.weighedOn', expected: `${life.value} days at most`, received: weighedOn, sourceKey: 'house-rule' }))
    if (gate.state === 'feed') gate.state = 'wait'
  }
  sayCoarseScale(context)
  const step = scaleStepG(context)
  const wanted = Math.floor(weightG * (1 - rules.validity.stopLossFraction.value) / step + 1e-9) * step
  // On a coarse scale a twentieth is less than a step: the next readable weight below it is the first sure loss.
  const stopWeightG = Math.max(0, Math.round((wanted < weightG ? wanted : weightG - step) * 1e4) / 1e4)
  return {
    goodUntil,
    nextWeighInOn: addDays(startDate, every.value),
    rule: `Weighed ${formatDay(weighedOn)}; good for ${life.value} days (${life.locator}). Weigh every ${every.value === 1 ? 'day' : `${every.value} days`}, before the first feed.`,
    stopWeightG,
  }
}

/** Step of the animal's scale: as given, or the one assumed for its weight. */
export function scaleStepG(context: PlanContext): number {
  const rule = context.rules.measuring.scaleStepG
  return context.input.animal.scaleStepG ?? (context.weightG < 100 ? rule.under100G : context.weightG < 1000 ? rule.under1000G : rule.above).value
}

/** Date weighed: as given, or the day the plan begins. */
export function weighedOnOf(context: PlanContext, days: readonly PlanDay[]): string {
  return context.input.animal.weighedOn ?? days[0]!.date
}

function addDays(date: string, days: number): string {
  return dateOf(Date.parse(`${date}T00:00:00Z`) / 86_400_000 + days)
}

function sayCoarseScale(context: PlanContext): void {
  const rule = context.rules.measuring.scaleStepG
  const most = (context.weightG < 100 ? rule.under100G : context.weightG < 1000 ? rule.under1000G : rule.above).value
  const step = context.input.animal.scaleStepG
  if (step === undefined || step <= most) return
  const large = step / 2 / context.weightG
  context.findings.push(makeFinding('weight.coarseScale', large > 0.02 ? 'caution' : 'note', 'Scale too coarse for this animal', `A scale that reads to ${formatNumber(step, 3)} g may be ${formatNumber(100 * large, 1)} % off on ${formatWeightG(context.weightG)} from its display alone. Use one that reads to ${formatNumber(most, 2)} g.`, { path: 'animal.scaleStepG', expected: most, received: step, unit: 'g', sourceKey: 'house-rule' }))
}
