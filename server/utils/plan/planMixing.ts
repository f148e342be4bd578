import type { PlanDay, PlanMixing } from '#shared/types/plan'
import type { Range } from '#shared/types/reference'
import { formatNumber, formatPercent, strengthInWords } from '#shared/utils/quantity'
import { potAmounts } from '../calc/mixing/potAmounts'
import { thinnedAmounts } from '../calc/mixing/thinnedAmounts'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'

/**
 * One pot per run of days at the same strength: what to weigh and measure, and the energy these amounts really give.
 *
 * @param context  the plan's context; findings are added.
 * @param days  days of the plan with their feeds.
 * @returns pots in order of days; empty when no feed is planned.
 * @throws Never for a context that `planContext` made.
 * @source trade needs 4.3 (weigh, never scoop), dosing sheet H-14, H-19
 * @example planMixing(context, days)[0].powderG // 0.5
 */
export function planMixing(context: PlanContext, days: readonly PlanDay[]): PlanMixing[] {
  const fed = days.filter(day => day.feeds.length > 0)
  const runs: PlanDay[][] = []
  for (const day of fed) {
    const run = runs.at(-1)
    if (run && run[0]!.strengthFraction === day.strengthFraction) run.push(day)
    else runs.push([day])
  }
  const pots = runs.map(run => potOf(context, run))
  const worst = pots.reduce<PlanMixing | null>((most, pot) => !most || Math.abs(pot.differenceFraction) > Math.abs(most.differenceFraction) ? pot : most, null)
  if (worst && Math.abs(worst.differenceFraction) > context.rules.mixing.densityNotice.value) {
    context.findings.push(makeFinding('mixing.offStrength', 'caution', 'The pot is off its strength', `Rounded to what the scale shows, the ${worst.strengthLabel} pot gives ${formatPercent(Math.abs(worst.differenceFraction))} ${worst.differenceFraction > 0 ? 'more' : 'less'} energy than planned. A finer kitchen scale or a larger pot comes closer.`, { expected: worst.plannedKcalPerMl, received: worst.energyKcalPerMl, unit: 'kcal/mL', path: 'kitchenScaleStepG', sourceKey: 'house-rule' }))
  }
  return pots
}

function potOf(context: PlanContext, run: readonly PlanDay[]): PlanMixing {
  const { rules, feed } = context
  const strength = run[0]!.strengthFraction
  const overage = rules.mixing.overage.value
  const neededMl = Math.max(...run.map(day => day.feeds.reduce((sum, one) => sum + one.volumeMl, 0))) * (1 + overage)
  const scaleStepG = kitchenScaleStepG(context)
  const stepMl = (neededMl < 10 ? rules.mixing.waterStepMl.under10Ml : rules.mixing.waterStepMl.above).value
  const plannedKcalPerMl = feed.energyKcalPerMl * strength
  const pot = feed.recipe
    ? { feedMl: null, ...potAmounts({ neededMl, strengthFraction: strength, powderGPerMl: feed.recipe.powderG / feed.recipe.madeUpMl, powderVolumeMlPerG: (feed.recipe.madeUpMl - feed.recipe.waterMl) / feed.recipe.powderG, energyKcalPerPowderG: feed.recipe.energyKcalPerPowderG, scaleStepG, fewestSteps: rules.mixing.fewestScaleSteps.value, waterStepMl: rules.mixing.waterStepMl.under10Ml.value }) }
    : { powderG: null, ...thinnedAmounts({ neededMl, strengthFraction: strength, stepMl, densityKcalPerMl: feed.energyKcalPerMl }) }
  return {
    strengthFraction: strength,
    strengthLabel: strengthInWords(strength),
    fromDate: run[0]!.date,
    toDate: run.at(-1)!.date,
    feedName: feed.name,
    neededMl,
    overageFraction: overage,
    powderG: pot.powderG,
    feedMl: pot.feedMl,
    waterMl: pot.waterMl,
    madeUpMl: pot.madeUpMl,
    kitchenScaleStepG: scaleStepG,
    energyKcalPerMl: pot.energyKcalPerMl,
    plannedKcalPerMl,
    differenceFraction: pot.energyKcalPerMl / plannedKcalPerMl - 1,
    ratioInWords: ratioWords(pot.powderG, pot.feedMl, pot.waterMl),
    discardHours: { room: rules.mixing.discardHours.room.value, started: rules.mixing.discardHours.started.value, fridge: rules.mixing.discardHours.fridge.value },
    warmToC: warmToC(context),
  }
}

/** Step of the kitchen scale: as given, or the one assumed for a mix this small. */
export function kitchenScaleStepG(context: PlanContext): number {
  const rule = context.rules.mixing.kitchenScaleStepG
  return context.input.kitchenScaleStepG ?? (context.weightG < 100 ? rule.under100G : rule.above).value
}

function ratioWords(powderG: number | null, feedMl: number | null, waterMl: number): string {
  const parts = powderG ?? feedMl!
  const what = powderG !== null ? 'powder by weight' : 'feed'
  if (waterMl === 0) return 'as it is, no water added'
  return `1 part ${what} to ${formatNumber(waterMl / parts, 1)} parts water, so ${formatNumber(waterMl / parts + 1, 1)} parts in all`
}

function warmToC(context: PlanContext): Range {
  const rule = context.rules.mixing.warmToC
  if (context.kind === 'bird') return { low: rule.bird[0].value, high: rule.bird[1].value }
  if (context.kind === 'mammal') return { low: rule.mammal[0].value, high: rule.mammal[1].value }
  const { low, high } = context.species.feedingTemperatureC
  return { low, high }
}
