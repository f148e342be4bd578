import type { GateState, PlanDay, PlanEnergy, PlanFeed, PlanFluids, PlanStep } from '#shared/types/plan'
import type { EquationStep } from '#shared/types/reference'
import { formatDay } from '#shared/utils/calendar'
import { formatNumber, formatPercent, formatSignificant, formatVolumeMl, strengthInWords } from '#shared/utils/quantity'
import type { ChosenMeal, MealBound } from '../calc/meals/chooseMeal'
import { waterDueMl } from '../calc/fluids/waterDueMl'
import { waterInFeedMl } from '../calc/fluids/waterInFeedMl'
import { isoToleranceMl, type SyringeToleranceClass } from '../calc/measuring/isoToleranceMl'
import { feedMinutes } from '../calc/timetable/feedMinutes'
import { instantOfLocalMs } from '../calc/timetable/instantOfLocalMs'
import { localOfInstantMs } from '../calc/timetable/localOfInstantMs'
import { zoneOffsets, type ZoneOffset } from '../calc/timetable/zoneOffsets'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'
import { boundSentences, minuteOf, type MealRules } from './planMeals'
import type { RampOutline } from './planRamp'

const DAY_MS = 86_400_000
const HOUR_MS = 3_600_000

/** Days with their feeds and water, and what they say about the course. */
export interface PlannedDays {
  days: PlanDay[]
  steps: PlanStep[]
  fluidsFromMs: number
  firstFeedAt: string | null
  fullMealsOn: string | null
  daysToFull: number | null
  firstMealMl: number | null
  largestMealMl: number | null
  binds: string[]
  firstMealSteps: EquationStep[]
}

/**
 * The days of the plan: stage, fraction, feeds at clock times, water. Feeding begins at the first feed time after the
 * fluids-only stage; birds and mammals begin within that day, the others on the next whole one.
 *
 * @param context  the plan's context; findings are added.
 * @param outline  tier, steps and hours before food.
 * @param energy  energy of full meals.
 * @param fluids  maintenance, deficit, limit.
 * @param meals  limits of meals and the chooser.
 * @param closedReason  set when nothing may be given by mouth until a person has looked again; every day then says so.
 * @returns days in order, at least a week of them; feeds are empty where none is due or none can be measured.
 * @throws CalcInputError `timeZone.unknown` for a zone that is not known.
 * @source house rule; water by `water-in-food` and `metabolic-water`
 * @example planDays(context, outline, energy, fluids, meals, null).days[0].stage // 'fluids'
 */
export function planDays(context: PlanContext, outline: RampOutline, energy: PlanEnergy, fluids: PlanFluids, meals: MealRules, closedReason: string | null): PlannedDays {
  const { input, rules, startMs } = context
  const fluidsFromMs = startMs + outline.warmHours * HOUR_MS
  const feedFromMs = fluidsFromMs + outline.fluidHours * HOUR_MS
  const horizonDays = Math.ceil((outline.warmHours + outline.fluidHours) / 24) + outline.fractions.length * outline.stepDays + rules.ramp.daysAtLeast.value + rules.ramp.fullDays.value + 4
  const offsets = zoneOffsets(input.timeZone, startMs - 2 * DAY_MS, startMs + horizonDays * DAY_MS)
  const firstDay = dayOf(startMs, offsets)
  const hours = { fromMinute: minuteOf(input.feedingHours.from), toMinute: minuteOf(input.feedingHours.to) }
  const slotsOn = (day: number, feeds: number) => feedMinutes({ feeds, ...hours }).map(minute => instantOfLocalMs(day * DAY_MS + minute * 60_000, offsets))
  const daysPerMeal = outline.onceAStep ? outline.stepDays : 1

  const firstMeal = meals.mealOn(0, outline.fractions[0]!, 1)
  const begin = firstFeedingDay(context, firstMeal?.feeds ?? 1, firstDay, feedFromMs, slotsOn)
  const course = courseOf(outline, begin, context)
  const lastDay = Math.max(course.lastDay, firstDay + rules.ramp.daysAtLeast.value - 1)

  const days: PlanDay[] = []
  const bounds = new Map<string, { day: number, capMl: number, bounds: readonly MealBound[], given: number, target: number }>()
  let feedingDay = 0
  let unmeasured = firstMeal === null
  for (let day = firstDay; day <= lastDay; day += 1) {
    const date = dateOf(day)
    const step = course.stepOn(day)
    const isMealDay = step !== null && (!outline.onceAStep || (day - step.firstDay) % outline.stepDays === 0)
    const partial = step !== null && day === begin.day && begin.partial
    const meal = isMealDay && !unmeasured ? meals.mealOn(feedingDay, step.fraction, 1) : null
    if (isMealDay && meal === null) unmeasured = true
    const slots = meal ? slotsOn(day, meal.feeds).filter(at => !partial || at >= feedFromMs) : []
    const share = meal ? slots.length / meal.feeds : 0
    const feeds = meal ? feedsOf(context, meal, slots, offsets) : []
    const given = feeds.reduce((sum, feed) => sum + feed.energyKcal, 0)
    const target = step !== null && isMealDay ? energy.targetKcalPerDay * step.fraction * daysPerMeal * (meal ? share : 1) : 0
    const water = waterOn(context, fluids, fluidsFromMs, day, offsets, meal, feeds, given)
    const stage = step === null ? (outline.warmHours > 0 && day === firstDay ? 'warm' : 'fluids') : step.fraction >= 1 && step.last ? 'full' : 'ramp'
    const state = stateOn(context, stage, feeds, isMealDay, closedReason, unmeasured, outline.fluidHours, partial && outline.fluidHours + outline.warmHours > 0)
    if (meal && meal.bounds.length > 0) {
      // Of days bound in the same way the one that falls shortest is told.
      const key = meal.bounds.join()
      const known = bounds.get(key)
      if (!known || given / target < known.given / known.target - 1e-9) bounds.set(key, { day, capMl: feedingDay < meals.firstCapMeals ? meals.firstCapMl : meals.laterCapMl, bounds: meal.bounds, given, target })
    }
    if (meal && slots.length > 0) feedingDay += 1
    days.push({
      date,
      stage,
      ...state,
      step: step?.number ?? 0,
      feedingDay: step === null ? 0 : day - begin.day + 1,
      fraction: step?.fraction ?? 0,
      energyTargetKcal: target,
      energyGivenKcal: given,
      strengthFraction: meal && feeds.length > 0 ? meal.strengthFraction : 0,
      strengthLabel: meal && feeds.length > 0 ? strengthInWords(meal.strengthFraction) : '',
      feeds,
      ...water,
    })
  }
  sayWhatBinds(context, bounds, meals, unmeasured)
  sayRounding(context, days)
  sayWaterOverCap(context, days, fluids, daysPerMeal)
  const volumes = days.flatMap(one => one.feeds.map(feed => feed.volumeMl))
  const fullDay = days.find(one => one.stage === 'full')
  return {
    days,
    steps: course.steps,
    fluidsFromMs,
    firstFeedAt: days.find(one => one.feeds.length > 0)?.feeds[0]!.at ?? null,
    fullMealsOn: unmeasured ? null : fullDay?.date ?? null,
    daysToFull: unmeasured || !fullDay ? null : days.indexOf(fullDay) + 1,
    firstMealMl: volumes[0] ?? null,
    largestMealMl: volumes.length > 0 ? Math.max(...volumes) : null,
    firstMealSteps: firstMeal ? firstMealSteps(context, energy, outline.fractions[0]!, daysPerMeal, firstMeal) : [],
    binds: [...new Set([...bounds.values()].flatMap(one => boundSentences(one.bounds, one.capMl)))],
  }
}

/** From the energy of full meals to the mark on the syringe, step by step. */
function firstMealSteps(context: PlanContext, energy: PlanEnergy, fraction: number, daysPerMeal: number, meal: ChosenMeal): EquationStep[] {
  const density = context.feed.energyKcalPerMl * meal.strengthFraction
  const wantedKcal = energy.targetKcalPerDay * fraction * daysPerMeal
  const { measured } = meal
  const written = (value: number) => formatSignificant(value)
  return [
    { label: `Energy of the first step: ${formatPercent(fraction)} of full meals${daysPerMeal > 1 ? `, for ${daysPerMeal} days at once` : ''} (house rule)`, expression: `${written(energy.targetKcalPerDay)} kcal × ${formatNumber(fraction)}${daysPerMeal > 1 ? ` × ${daysPerMeal}` : ''}`, value: wantedKcal, unit: 'kcal' },
    { label: `Energy of the mix at ${strengthInWords(meal.strengthFraction)}`, expression: `${written(context.feed.energyKcalPerMl)} kcal/mL × ${formatNumber(meal.strengthFraction)}`, value: density, unit: 'kcal/mL' },
    { label: `Volume of one feed, ${meal.feeds} a day`, expression: `${written(wantedKcal)} ÷ ${written(density)} ÷ ${meal.feeds}`, value: meal.wantedMl, unit: 'mL' },
    { label: `Nearest mark of a ${formatNumber(measured.syringe.capacityMl)} mL syringe with marks of ${formatNumber(measured.syringe.stepMl, 3)} mL, never over the limit`, expression: `${written(meal.wantedMl)} mL rounded once`, value: measured.volumeMl, unit: 'mL' },
  ]
}

function dayOf(instantMs: number, offsets: readonly ZoneOffset[]): number {
  return Math.floor(localOfInstantMs(instantMs, offsets) / DAY_MS)
}

/** YYYY-MM-DD of a day number (days since 1970-01-01). */
export function dateOf(day: number): string {
  return new Date(day * DAY_MS).toISOString().slice(0, 10)
}

/** HH:MM of a wall-clock time written as if it were UTC. Arithmetic: a Date for each feed would cost more than its plan. */
function clockOf(localMs: number): string {
  const minute = Math.floor(localMs / 60_000) % 1440
  return `${String(Math.floor(minute / 60)).padStart(2, '0')}:${String(minute % 60).padStart(2, '0')}`
}

function firstFeedingDay(context: PlanContext, feeds: number, firstDay: number, feedFromMs: number, slotsOn: (day: number, feeds: number) => number[]): { day: number, partial: boolean } {
  for (let day = firstDay; ; day += 1) {
    const slots = slotsOn(day, feeds)
    if (slots[0]! >= feedFromMs) return { day, partial: false }
    // A bird or mammal is not made to wait for a new day, and nothing is that may eat now; an ectotherm coming out of a
    // fluids-only stage never is in such a hurry.
    const mayBeginToday = !context.ectotherm || feedFromMs === context.startMs
    if (mayBeginToday && slots.some(at => at >= feedFromMs)) return { day, partial: true }
  }
}

interface CourseStep { number: number, fraction: number, firstDay: number, last: boolean }

/** Which step holds on which day. A begun day does not use up a step; the last step is shown for some days. */
function courseOf(outline: RampOutline, begin: { day: number, partial: boolean }, context: PlanContext): { steps: PlanStep[], lastDay: number, stepOn: (day: number) => CourseStep | null } {
  const { fullDays } = context.rules.ramp
  const starts: CourseStep[] = []
  let at = begin.day
  outline.fractions.forEach((fraction, index) => {
    starts.push({ number: index + 1, fraction, firstDay: at, last: index === outline.fractions.length - 1 })
    at += outline.stepDays + (index === 0 && begin.partial ? 1 : 0)
  })
  const lastStart = starts.at(-1)!
  const lastDays = outline.onceAStep ? outline.stepDays : Math.max(outline.stepDays, fullDays.value)
  const lastDay = lastStart.firstDay + lastDays - 1
  return {
    steps: starts.map((one, index) => ({ number: one.number, fraction: one.fraction, days: (starts[index + 1]?.firstDay ?? lastDay + 1) - one.firstDay, firstDate: dateOf(one.firstDay) })),
    lastDay,
    stepOn: day => day < begin.day ? null : starts.findLast(one => one.firstDay <= day) ?? null,
  }
}

function feedsOf(context: PlanContext, meal: ChosenMeal, slots: readonly number[], offsets: readonly ZoneOffset[]): PlanFeed[] {
  const { measured } = meal
  const toleranceMl = measured.draws * isoToleranceMl({ capacityMl: measured.syringe.capacityMl, volumeMl: measured.markMl }, isoClassesOf(context))
  return slots.map(at => ({
    at: new Date(at).toISOString(),
    localTime: clockOf(localOfInstantMs(at, offsets)),
    volumeMl: measured.volumeMl,
    markMl: measured.markMl,
    draws: measured.draws,
    syringe: measured.syringe,
    energyKcal: measured.volumeMl * context.feed.energyKcalPerMl * meal.strengthFraction,
    toleranceMl,
    toleranceFraction: toleranceMl / measured.volumeMl,
    roundingFraction: measured.roundingFraction,
  }))
}

/** Plain numbers of the tolerance table, for `calc`. */
export function isoClassesOf(context: PlanContext): SyringeToleranceClass[] {
  return context.rules.measuring.isoClasses.map(one => ({ underCapacityMl: one.underCapacityMl, ofCapacity: one.ofCapacity.value, ofVolume: one.ofVolume.value, ofVolumeFromHalf: one.ofVolumeFromHalf.value }))
}

function waterOn(context: PlanContext, fluids: PlanFluids, fluidsFromMs: number, day: number, offsets: readonly ZoneOffset[], meal: ChosenMeal | null, feeds: readonly PlanFeed[], givenKcal: number) {
  const need = context.kind === 'amphibian'
    ? 0
    : waterDueMl({
        spanFromMs: instantOfLocalMs(day * DAY_MS, offsets),
        spanToMs: instantOfLocalMs((day + 1) * DAY_MS, offsets),
        fluidsFromMs,
        maintenanceMlPerDay: fluids.maintenanceMlPerDay,
        deficitMl: fluids.deficitMl,
        deficitHours: fluids.deficitHours,
        capMlPerDay: fluids.capMlPerDay,
      })
  const flushMl = context.input.route === 'tube' ? (context.input.flushMl ?? 0) * feeds.length : 0
  const inFeed = meal && feeds.length > 0
    ? waterInFeedMl({ volumeMl: feeds.length * meal.measured.volumeMl, strengthFraction: meal.strengthFraction, waterFraction: context.feed.waterFraction, flushMl })
    : 0
  const metabolic = givenKcal * fluids.metabolicWaterMlPerKcal
  return { waterNeedMl: need, waterInFeedMl: inFeed, metabolicWaterMl: metabolic, waterToGiveMl: Math.max(0, need - inFeed - metabolic) }
}

function stateOn(context: PlanContext, stage: PlanDay['stage'], feeds: readonly PlanFeed[], isMealDay: boolean, closedReason: string | null, unmeasured: boolean, fluidHours: number, fluidsFirst: boolean): { state: GateState, stateReason: string } {
  const warmTo = `${formatNumber(context.species.feedingTemperatureC.low, 1)} °C`
  if (closedReason !== null) return { state: 'do-not-feed', stateReason: closedReason }
  if (stage === 'warm') return { state: context.bodyTemperatureC === null ? 'wait' : 'do-not-feed', stateReason: `Warm to ${warmTo} or more first, then fluids only` }
  if (stage === 'fluids') return { state: 'wait', stateReason: fluidHours > 0 ? 'Fluids only, no food yet' : 'First feed tomorrow' }
  if (unmeasured) return { state: 'do-not-feed', stateReason: 'The meal is too small to measure: call a vet' }
  if (!isMealDay || feeds.length === 0) return { state: 'wait', stateReason: 'No meal today' }
  if (fluidsFirst) return { state: 'feed', stateReason: `Fluids only until ${feeds[0]!.localTime}; then only at ${warmTo} or more` }
  return { state: 'feed', stateReason: `Only at ${warmTo} or more` }
}

function sayWhatBinds(context: PlanContext, bounds: Map<string, { day: number, capMl: number, bounds: readonly MealBound[], given: number, target: number }>, meals: MealRules, unmeasured: boolean): void {
  if (unmeasured) {
    context.findings.push(makeFinding('meal.cannotBeMeasured', 'stop', 'Too small to measure', `The meal it needs may be at most ${formatVolumeMl(meals.firstCapMl)}; your syringes measure ${formatVolumeMl(meals.smallestMeasurableMl)} and more. No amount is planned. A finer syringe may help; otherwise a vet must choose how to feed it.`, { expected: meals.smallestMeasurableMl, received: meals.firstCapMl, unit: 'mL', path: 'syringes', sourceKey: 'house-rule' }))
  }
  for (const one of [...bounds.values()].sort((a, b) => a.given / a.target - b.given / b.target)) {
    const when = formatDay(dateOf(one.day))
    for (const sentence of boundSentences(one.bounds, one.capMl)) {
      const short = sentence.startsWith('Meals stay')
      const code = short ? 'meal.capBinds' : sentence.startsWith('Even') ? 'fluids.feedOverCap' : sentence.startsWith('Fed less') ? 'meal.fewerFeeds' : 'meal.thinned'
      if (context.findings.some(finding => finding.code === code)) continue
      const reached = short ? ` On ${when} meals reach ${formatPercent(one.given / one.target)} of what is wanted.` : ''
      context.findings.push(makeFinding(code, short || code === 'fluids.feedOverCap' ? 'caution' : 'note', short ? 'It cannot eat enough this way' : code === 'fluids.feedOverCap' ? 'Much water in the feed' : code === 'meal.fewerFeeds' ? 'Fed less often' : 'Mix thinned to be measurable', sentence + reached, { ...(short ? { expected: one.target, received: one.given, unit: 'kcal/day' } : {}), sourceKey: 'house-rule' }))
    }
  }
}

function sayRounding(context: PlanContext, days: readonly PlanDay[]): void {
  const { roundingNotice, roundingCaution, preferredOfCapacity, smallestMarks } = context.rules.measuring
  let worst: { day: PlanDay, feed: PlanFeed } | null = null
  let loose: { day: PlanDay, feed: PlanFeed } | null = null
  for (const day of days) {
    const feed = day.feeds[0]
    if (!feed) continue
    if (!worst || Math.abs(feed.roundingFraction) > Math.abs(worst.feed.roundingFraction)) worst = { day, feed }
    if (!loose || feed.toleranceFraction > loose.feed.toleranceFraction) loose = { day, feed }
  }
  if (worst && Math.abs(worst.feed.roundingFraction) > roundingNotice.value) {
    const large = Math.abs(worst.feed.roundingFraction) > roundingCaution.value
    context.findings.push(makeFinding(large ? 'measuring.roundingLarge' : 'measuring.rounding', large ? 'caution' : 'note', large ? 'Rounded by more than a tenth' : 'Rounded to a mark', `On ${formatDay(worst.day.date)} the mark of ${formatVolumeMl(worst.feed.markMl)} is ${formatPercent(Math.abs(worst.feed.roundingFraction))} ${worst.feed.roundingFraction > 0 ? 'more' : 'less'} than worked out. A syringe with finer marks comes closer.`, { expected: worst.feed.markMl / (1 + worst.feed.roundingFraction), received: worst.feed.markMl, unit: 'mL', sourceKey: 'house-rule' }))
  }
  if (loose && loose.feed.markMl < Math.max(preferredOfCapacity.value * loose.feed.syringe.capacityMl, smallestMarks.value * loose.feed.syringe.stepMl)) {
    context.findings.push(makeFinding('measuring.belowPreferred', loose.feed.toleranceFraction > 0.2 ? 'caution' : 'note', 'Small for its syringe', `${formatVolumeMl(loose.feed.markMl)} in a ${formatNumber(loose.feed.syringe.capacityMl)} mL syringe may be off by ${formatPercent(loose.feed.toleranceFraction)} and still meet the standard. Look at the mark at eye level; a smaller syringe is surer.`, { expected: preferredOfCapacity.value * loose.feed.syringe.capacityMl, received: loose.feed.markMl, unit: 'mL', sourceKey: 'iso7886' }))
  }
}

function sayWaterOverCap(context: PlanContext, days: readonly PlanDay[], fluids: PlanFluids, daysPerMeal: number): void {
  const cap = fluids.capMlPerDay * daysPerMeal * (1 + 1e-6)
  const worst = days.reduce<PlanDay | null>((most, day) => !most || day.waterInFeedMl + day.waterToGiveMl > most.waterInFeedMl + most.waterToGiveMl ? day : most, null)
  if (!worst || worst.waterInFeedMl + worst.waterToGiveMl <= cap) return
  const total = worst.waterInFeedMl + worst.waterToGiveMl
  context.findings.push(makeFinding('fluids.overHydration', 'caution', 'More water than a day may bring', `On ${formatDay(worst.date)} feeds and fluids bring ${formatVolumeMl(Math.round(total * 100) / 100)}; the limit is ${formatVolumeMl(Math.round(fluids.capMlPerDay * daysPerMeal * 100) / 100)}. Watch for wet breathing and swelling; a denser feed would free it.`, { expected: fluids.capMlPerDay * daysPerMeal, received: total, unit: 'mL/day', sourceKey: 'house-rule' }))
}
