import type { PlanCondition, Tier } from '#shared/types/plan'
import { TIERS } from '#shared/types/plan'
import { formatNumber, formatPercent } from '#shared/utils/quantity'
import { rampSteps } from '../calc/ramp/rampSteps'
import { refeedingTier } from '../calc/risk/refeedingTier'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'

/** The course before dates and meals are known. */
export interface RampOutline {
  tier: Tier
  reasons: string[]
  fractions: number[]
  stepDays: number
  /** True when a meal comes once per step (snakes and their like), not every day. */
  onceAStep: boolean
  warmHours: number
  fluidHours: number
  sourceKey: string
}

/**
 * Risk tier, its reasons, the hours before the first meal and the steps to full meals.
 *
 * @param context  the plan's context; findings are added.
 * @param condition  how far it is under its expected weight.
 * @returns the outline; fractions are a person's own where given, and then what they break is a finding.
 * @throws Never for a context that `planContext` made.
 * @source house rule after nutrition sheet 4 and 11, corrections D
 * @example planRamp(planContext(gecko, edition), condition).tier // 'extreme'
 */
export function planRamp(context: PlanContext, condition: PlanCondition): RampOutline {
  const { rules, species, ectotherm, input } = context
  const { tier: foundTier, reasons } = tierOf(context, condition)
  const tier = input.overrides?.tier ?? foundTier
  if (tier !== foundTier) {
    const lower = TIERS.indexOf(tier) < TIERS.indexOf(foundTier)
    context.findings.push(makeFinding(lower ? 'ramp.tierLowered' : 'ramp.tierRaised', lower ? 'caution' : 'note', lower ? 'Risk set lower than it looks' : 'Risk set higher than it looks', lower ? `The signs say ${foundTier} (${reasons.join('; ')}); the plan follows ${tier}. It climbs faster than the house rule allows: a vet should agree.` : `The signs say ${foundTier}; the plan follows ${tier} and climbs more slowly.`, { path: 'overrides.tier', expected: foundTier, received: tier, sourceKey: 'house-rule' }))
  }
  const stepDays = ectotherm ? Math.max(1, Math.round(species.feedingIntervalHours / 24)) : 1
  const hold = context.kind === 'reptile' ? { fraction: rules.ramp.reptileHold.fraction.value, days: rules.ramp.reptileHold.days.value } : null
  const usual = rampSteps({ fractions: rules.ramp.fractions[tier].map(one => one.value), stepDays, hold })
  const own = input.overrides?.fractions
  const fractions = own ? rampSteps({ fractions: own, stepDays, hold: null }) : usual
  if (own) judgeOwnFractions(context, own, usual)
  return {
    tier,
    reasons,
    fractions,
    stepDays,
    onceAStep: rules.meals.onceAnInterval.includes(species.group),
    warmHours: warmHoursOf(context),
    fluidHours: fluidHoursOf(context, tier),
    sourceKey: own ? 'house-rule' : rules.ramp.fractions[tier][0]!.sourceKey,
  }
}

function tierOf(context: PlanContext, condition: PlanCondition): { tier: Tier, reasons: string[] } {
  const { risk } = context.rules
  const animal = context.input.animal
  const stretch = context.species.group === 'snake' ? risk.snakeDaysStretch : risk.daysStretch[context.kind]
  const edges = (one: { moderate: { value: number }, high: { value: number }, extreme: { value: number } }) => ({ moderate: one.moderate.value, high: one.high.value, extreme: one.extreme.value })
  return refeedingTier(
    { shortfallPercent: condition.shortfallPercent, daysUnfed: animal.daysUnfed, daysStretch: stretch.value, score: animal.bodyConditionScore ?? null, drynessPercent: animal.drynessPercent },
    { shortfallPercent: edges(risk.shortfallPercent), daysUnfed: edges(risk.daysUnfed), drynessPercent: edges(risk.drynessPercent), score: { high: risk.score.high.value, extreme: risk.score.extreme.value } },
  )
}

function warmHoursOf(context: PlanContext): number {
  const { ramp } = context.rules
  const body = context.bodyTemperatureC
  const low = context.species.feedingTemperatureC.low
  if (body === null) return ramp.holdBeforeFeedHours.value
  if (body >= low) return 0
  return Math.min(ramp.warmingHoursAtMost.value, (low - body) / ramp.warmingCPerHour.value + ramp.holdBeforeFeedHours.value)
}

function fluidHoursOf(context: PlanContext, tier: Tier): number {
  const { ramp, risk } = context.rules
  const chosen = context.input.overrides?.fluidHours
  const small = !context.ectotherm && context.weightG < ramp.smallEndotherm.underG.value
  const dry = context.input.animal.drynessPercent >= risk.drynessPercent.moderate.value
  const usual = tier === 'low' && !dry ? 0 : ramp.fluidHours[context.ectotherm ? 'ectotherm' : 'endotherm'][tier].value
  const wanted = small ? Math.min(usual, ramp.smallEndotherm.fluidHoursAtMost.value) : usual
  if (chosen === undefined) {
    if (wanted < usual) context.findings.push(makeFinding('ramp.fluidsShortened', 'note', 'Fluids-only stage made short', `A bird or mammal under ${ramp.smallEndotherm.underG.value} g cannot wait ${usual} h without energy: ${wanted} h of fluids, then food.`, { expected: usual, received: wanted, unit: 'h', sourceKey: 'house-rule' }))
    return wanted
  }
  if (chosen < wanted) context.findings.push(makeFinding('ramp.fluidsCutShort', 'caution', 'Fluids-only stage cut short', `${formatNumber(chosen)} h was chosen; ${formatNumber(wanted)} h is usual at this risk. Food before water can kill a dry, starved animal.`, { path: 'overrides.fluidHours', expected: wanted, received: chosen, unit: 'h', sourceKey: 'house-rule' }))
  return chosen
}

function judgeOwnFractions(context: PlanContext, own: readonly number[], usual: readonly number[]): void {
  const say = (code: string, title: string, message: string) => context.findings.push(makeFinding(code, 'caution', title, message, { path: 'overrides.fractions', sourceKey: 'house-rule' }))
  if (own.some((fraction, index) => index > 0 && fraction < own[index - 1]!)) say('ramp.fractionsFall', 'A step goes down', 'One of the steps you set is smaller than the one before. Steps usually only rise; a step back is for an animal that brought food up.')
  if (own.at(-1) !== 1) say('ramp.endsElsewhere', 'The steps do not end at full meals', `The last step you set is ${formatPercent(own.at(-1)!)} of full meals, so this plan does not reach them.`)
  if (own[0]! > usual[0]! + 1e-9) say('ramp.startsHigh', 'Starts higher than the house rule', `The first step you set is ${formatPercent(own[0]!)} of full meals; ${formatPercent(usual[0]!)} is usual at this risk. Too much at first is how starved animals die.`)
  if (own.length < usual.length) say('ramp.fewerSteps', 'Climbs faster than the house rule', `${own.length} steps were set; ${usual.length} are usual at this risk. A vet should agree.`)
}
