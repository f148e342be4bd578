import type { PlanEnergy, PlanFluids, Syringe } from '#shared/types/plan'
import type { EquationStep } from '#shared/types/reference'
import { formatNumber, formatSignificant, formatVolumeMl } from '#shared/utils/quantity'
import { chooseMeal, type ChosenMeal, type MealBound } from '../calc/meals/chooseMeal'
import { measureFeed } from '../calc/measuring/measureFeed'
import { smallestFeedMl } from '../calc/measuring/smallestFeedMl'
import { feedingSpanMinutes } from '../calc/timetable/feedingSpanMinutes'
import { mostFeeds } from '../calc/timetable/mostFeeds'
import type { UsualFeeds } from '../reference/rules'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'

/** Limits of meals for this animal, and a function that makes the meal of a day. */
export interface MealRules {
  firstCapMl: number
  laterCapMl: number
  firstCapMeals: number
  smallestMeasurableMl: number
  syringes: Syringe[]
  steps: EquationStep[]
  /** The meal of a feeding day (counted from 0) at a fraction of full meals; null when it cannot be measured. */
  mealOn: (feedingDay: number, fraction: number, share: number) => ChosenMeal | null
}

/**
 * How large, how strong and how many the meals may be, and how they are chosen day by day.
 *
 * `mealOn` remembers the strength it last gave, so call it in order of days: the mix never gets thinner again.
 *
 * @param context  the plan's context; findings are added.
 * @param energy  energy of full meals.
 * @param fluids  limit of a day's water.
 * @param daysPerMeal  days that one meal stands for: 1, or the interval of animals that eat once an interval.
 * @returns the limits and the chooser.
 * @throws Never for a context that `planContext` made.
 * @source nutrition sheet 5 (limits), corrections B, dosing sheet 3.5; order of choices is a house rule
 * @example planMeals(context, energy, fluids, 1).firstCapMl // 0.1 for a gecko of 10 g
 */
export function planMeals(context: PlanContext, energy: PlanEnergy, fluids: PlanFluids, daysPerMeal: number): MealRules {
  const { rules, feed, weightKg } = context
  const caps = capsMl(context)
  const syringes = (context.input.syringes ?? rules.measuring.syringes).map(one => ({ capacityMl: one.capacityMl, stepMl: one.stepMl }))
  const smallest = { marks: rules.measuring.smallestMarks.value, floorMl: rules.measuring.smallestMl.value }
  const strengths = context.species.diluteFirstFeeds ? rules.meals.strengths.map(one => one.value) : [1]
  const feeds = feedsADay(context)
  const chelonian = context.species.group === 'chelonian' && context.input.animal.lifeStage !== 'growing' ? rules.meals.chelonianDayMlPerKg : null
  const known = new Map<string, ChosenMeal | null>()
  let floor = -1
  let fewest = feeds.usual

  function mealOn(feedingDay: number, fraction: number, share: number): ChosenMeal | null {
    const first = feedingDay < caps.firstMeals
    const key = `${fraction}|${first}|${floor}|${fewest}|${share}`
    if (!known.has(key)) known.set(key, choose(feedingDay, fraction, share))
    const meal = known.get(key)!
    if (meal) {
      floor = Math.max(floor, strengths.indexOf(meal.strengthFraction))
      fewest = Math.max(fewest, Math.min(meal.feeds, feeds.most))
    }
    return meal
  }

  function choose(feedingDay: number, fraction: number, share: number): ChosenMeal | null {
    const from = Math.max(floor, 0)
    const allowed = strengths.slice(from)
    const dayMlPerKg = chelonian && (feedingDay < chelonian.firstDays.value ? chelonian.first.value : chelonian.later.value)
    return chooseMeal({
      energyKcal: energy.targetKcalPerDay * fraction * daysPerMeal,
      densityKcalPerMl: feed.energyKcalPerMl,
      strengths: allowed,
      start: floor < 0 ? startIndex(context, strengths) : 0,
      feeds: { usual: Math.max(feeds.usual, feeds.fixed ? 0 : fewest), most: feeds.most },
      mealCapMl: feedingDay < caps.firstMeals ? caps.firstMl : caps.laterMl,
      dayCapMl: dayMlPerKg === null ? null : dayMlPerKg * weightKg,
      waterCapMl: fluids.capMlPerDay * daysPerMeal * share,
      waterFraction: feed.waterFraction,
      thickenFirst: fraction >= rules.meals.thickenFromFraction.value,
    }, (volumeMl, capMl) => measureFeed({ volumeMl, capMl, syringes, smallest, upAtMost: rules.measuring.roundingCaution.value }))
  }

  return {
    firstCapMl: caps.firstMl,
    laterCapMl: caps.laterMl,
    firstCapMeals: caps.firstMeals,
    smallestMeasurableMl: Math.min(...syringes.map(one => smallestFeedMl(one, smallest))),
    syringes,
    steps: caps.steps,
    mealOn,
  }
}

interface MealLimit { first: number, later: number, firstMeals: number, mostMl?: number }

function capsMl(context: PlanContext): { firstMl: number, laterMl: number, firstMeals: number, steps: EquationStep[] } {
  const { species, weightKg, weightG } = context
  const limit: MealLimit = growingLimit(context) ?? species.mealLimitMlPerKg
  const firstMl = Math.min(limit.first * weightKg, limit.mostMl ?? Number.POSITIVE_INFINITY)
  const laterMl = Math.min(limit.later * weightKg, limit.mostMl ?? Number.POSITIVE_INFINITY)
  const steps: EquationStep[] = [
    { label: `Limit of the first ${limit.firstMeals} meal days`, expression: `${formatNumber(limit.first)} mL/kg × ${formatSignificant(weightG / 1000)} kg`, value: firstMl, unit: 'mL' },
    { label: 'Limit of later meals', expression: `${formatNumber(limit.later)} mL/kg × ${formatSignificant(weightG / 1000)} kg`, value: laterMl, unit: 'mL' },
  ]
  return { firstMl, laterMl, firstMeals: limit.firstMeals, steps }
}

/** Young mammals and birds with a crop take more at a time than their parents. */
function growingLimit(context: PlanContext): MealLimit | null {
  if (context.input.animal.lifeStage !== 'growing') return null
  const { growing } = context.rules.meals
  const { species } = context
  if (context.kind === 'mammal') {
    const perKg = species.id === 'sp-cat' ? growing.kittenMlPerKg.value : growing.mammalMlPerKg.value
    return { first: perKg / 2, later: perKg, firstMeals: species.mealLimitMlPerKg.firstMeals }
  }
  if (context.kind === 'bird' && species.hasCrop) {
    const squab = growing.squabSpeciesIds.includes(species.id)
    return { first: species.mealLimitMlPerKg.first, later: squab ? growing.squabMlPerKg.value : growing.birdWithCropMlPerKg.value, firstMeals: species.mealLimitMlPerKg.firstMeals, mostMl: squab ? growing.squabMl.value : undefined }
  }
  return null
}

function startIndex(context: PlanContext, strengths: readonly number[]): number {
  const { startStrength, startDensityKcalPerMl } = context.rules.meals
  let index = 0
  strengths.forEach((strength, at) => {
    if (strength <= startStrength.value && strength * context.feed.energyKcalPerMl <= startDensityKcalPerMl.value) index = at
  })
  return index
}

function feedsADay(context: PlanContext): { usual: number, most: number, fixed: boolean } {
  const { input } = context
  const [fromMinute, toMinute] = [minuteOf(input.feedingHours.from), minuteOf(input.feedingHours.to)]
  const spanMinutes = feedingSpanMinutes({ fromMinute, toMinute })
  const gapHours = minimumGapHoursOf(context)
  const most = mostFeeds({ spanMinutes, gapHours })
  const wanted = input.feedsPerDay
  if (wanted !== undefined) {
    if (wanted > most) context.findings.push(makeFinding('timetable.tooManyFeeds', 'caution', 'Too many feeds for the feeding hours', `${wanted} feeds a day do not fit between ${input.feedingHours.from} and ${input.feedingHours.to} with ${formatNumber(gapHours)} h between them: the plan has ${most}. Longer feeding hours make room.`, { path: 'feedsPerDay', expected: most, received: wanted, unit: 'feeds a day', sourceKey: 'house-rule' }))
    const fixed = Math.min(wanted, most)
    return { usual: fixed, most: fixed, fixed: true }
  }
  const rule = usualFeedsRule(context)
  const usual = 'count' in rule ? rule.count.value : Math.floor(spanMinutes / 60 / rule.everyHours.value + 1e-9) + 1
  return { usual: Math.max(1, Math.min(usual, most)), most, fixed: false }
}

/** Young birds and mammals are fed more often than their parents. */
function minimumGapHoursOf(context: PlanContext): number {
  const own = context.species.minimumGapHours
  return context.input.animal.lifeStage === 'growing' && !context.ectotherm ? Math.min(own, context.rules.meals.growing.minimumGapHours.value) : own
}

function usualFeedsRule(context: PlanContext): UsualFeeds {
  const { usualFeeds, smallMammalUnderG } = context.rules.meals
  switch (context.species.group) {
    case 'lizard': return usualFeeds.lizard
    case 'snake': return usualFeeds.snake
    case 'chelonian': return usualFeeds.chelonian
    case 'crocodilian': return usualFeeds.crocodilian
    case 'amphibian-anuran':
    case 'amphibian-caudate': return usualFeeds.amphibian
    case 'bird-passerine': return context.weightG < context.rules.fluids.birdSmallUnderG.value ? usualFeeds.passerine : usualFeeds.birdWithoutCrop
    case 'bird-other': return context.species.minimumGapHours < 1 ? usualFeeds.passerine : context.species.hasCrop ? usualFeeds.birdWithCrop : usualFeeds.birdWithoutCrop
    default: return context.weightG < smallMammalUnderG.value ? usualFeeds.smallMammal : usualFeeds.mammal
  }
}

/** Minutes after midnight of HH:MM. */
export function minuteOf(clock: string): number {
  return Number(clock.slice(0, 2)) * 60 + Number(clock.slice(3, 5))
}

const BOUND_WORDS: Record<MealBound, string> = {
  'meal-cap': 'the most that one meal may be',
  'day-cap': 'the most that one day may bring',
  'water-cap': 'the most water that a day may bring',
  'most-feeds': 'how many feeds fit the feeding hours',
  'full-strength': 'the feed is at full strength',
  'fewer-feeds': 'what the syringes can measure',
  'thinned': 'what the syringes can measure',
  'short': '',
}

/**
 * What bound a meal, in a sentence with what would free it.
 *
 * @param bounds  names from `chooseMeal`.
 * @param capMl  limit of a meal then, mL.
 * @returns one sentence per kind of bound, in plain words; empty for none.
 * @throws Never.
 * @source house rule (say which limit binds and what would free it)
 * @example boundSentences(['fewer-feeds'], 0.1)[0] // 'Fed less often: …'
 */
export function boundSentences(bounds: readonly MealBound[], capMl: number): string[] {
  const sentences: string[] = []
  if (bounds.includes('thinned')) sentences.push('The mix is thinned further so that the syringes can measure it.')
  if (bounds.includes('fewer-feeds')) sentences.push('Fed less often than usual, because smaller feeds cannot be measured. A syringe with finer marks would free it.')
  if (bounds.includes('short')) {
    const named = (['meal-cap', 'day-cap', 'most-feeds', 'full-strength'] as const).filter(one => bounds.includes(one)).map(one => BOUND_WORDS[one])
    sentences.push(`Meals stay at ${formatVolumeMl(capMl)} and under: ${named.join(', ')}. A denser feed, longer feeding hours, more feeds a day, or its own food beside would free it.`)
  }
  if (bounds.includes('water-cap') && bounds.includes('full-strength')) sentences.push('Even at full strength the feeds bring more water than a day may. A drier, denser feed would free it.')
  return sentences
}
