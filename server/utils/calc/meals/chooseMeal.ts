import { checkedNumber } from '../checkedNumber'
import type { MeasuredFeed } from '../measuring/measureFeed'

/** What stood in the way, by name; the plan turns each into a sentence. */
export type MealBound = 'meal-cap' | 'day-cap' | 'water-cap' | 'most-feeds' | 'full-strength' | 'fewer-feeds' | 'thinned' | 'short'

export interface ChosenMeal {
  strengthFraction: number
  feeds: number
  measured: MeasuredFeed
  /** Wanted volume of one feed before limits and marks, mL. */
  wantedMl: number
  bounds: MealBound[]
}

/**
 * Strength, number and size of the meals of one day, for a wanted energy.
 *
 * Starts thin and with the usual number of meals. When a meal passes its limit it adds meals or thickens the mix (which
 * first is the caller's choice); when a meal is too small to measure it thins the mix (first step only) or feeds less
 * often. What is still over the limit is cut to the limit and named.
 *
 * @param input  one day:
 * @param input.energyKcal  wanted, kcal, above 0;
 * @param input.densityKcalPerMl  full-strength energy density, kcal/mL, above 0;
 * @param input.strengths  allowed strengths, ascending, each above 0 to 1, at least one; thinner ones than
 *   `strengths[start]` are used only to make a meal measurable;
 * @param input.start  index of the strength to begin with;
 * @param input.feeds  `{ usual, most }`: meals to begin with and at most, whole, 1 or more; equal when a person fixed them;
 * @param input.mealCapMl  most in one meal, mL, above 0;
 * @param input.dayCapMl  most in one day, mL; null for none;
 * @param input.waterCapMl  most water the feeds may bring in a day, mL; null for none;
 * @param input.waterFraction  water of the full-strength feed, mL per mL, 0 to 1;
 * @param input.thickenFirst  true to thicken before adding meals.
 * @param measure  draws a volume (mL, with its limit) up on the syringes in the house; null when it cannot.
 * @returns the meal, or null when even one meal at the thinnest strength cannot be measured within its limit.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule (thin first, thicker as volume binds); density rises only after half of full meals, nutrition sheet 11
 * @example chooseMeal({ energyKcal: 0.4, densityKcalPerMl: 1, strengths: [0.5, 0.75, 1], start: 0, feeds: { usual: 2, most: 2 }, mealCapMl: 0.3, dayCapMl: null, waterCapMl: null, waterFraction: 0.8, thickenFirst: true }, draw)?.strengthFraction // 0.75
 */
export function chooseMeal(
  input: {
    energyKcal: number
    densityKcalPerMl: number
    strengths: readonly number[]
    start: number
    feeds: { usual: number, most: number }
    mealCapMl: number
    dayCapMl: number | null
    waterCapMl: number | null
    waterFraction: number
    thickenFirst: boolean
  },
  measure: (volumeMl: number, capMl: number) => MeasuredFeed | null,
): ChosenMeal | null {
  const energy = checkedNumber(input.energyKcal, 'the energy', 'kcal', Number.MIN_VALUE)
  const density = checkedNumber(input.densityKcalPerMl, 'the energy density', 'kcal/mL', Number.MIN_VALUE)
  const mealCap = checkedNumber(input.mealCapMl, 'the limit of a meal', 'mL', Number.MIN_VALUE)
  const slack = 1 + 1e-9
  const bounds = new Set<MealBound>()
  let at = input.start
  let feeds = input.feeds.usual

  const dayMl = () => energy / (density * input.strengths[at]!)
  const overMeal = () => dayMl() / feeds > mealCap * slack
  const overDay = () => input.dayCapMl !== null && dayMl() > input.dayCapMl * slack
  const overWater = () => input.waterCapMl !== null && dayMl() * (1 - input.strengths[at]! * (1 - input.waterFraction)) > input.waterCapMl * slack
  const canThicken = () => at < input.strengths.length - 1
  const canAdd = () => overMeal() && feeds < input.feeds.most

  while (overMeal() || overDay() || overWater()) {
    if (overMeal()) bounds.add('meal-cap')
    if (overDay()) bounds.add('day-cap')
    if (overWater()) bounds.add('water-cap')
    if (canThicken() && (input.thickenFirst || !canAdd())) at += 1
    else if (canAdd()) feeds += 1
    else break
  }
  if (overMeal() && feeds >= input.feeds.most) bounds.add('most-feeds')
  if ((overMeal() || overDay() || overWater()) && !canThicken()) bounds.add('full-strength')

  const capOfOne = () => Math.min(mealCap, input.dayCapMl === null ? mealCap : input.dayCapMl / feeds)
  const draw = () => measure(Math.min(dayMl() / feeds, capOfOne()), capOfOne())
  let measured = draw()
  while (!measured && (at > 0 && at <= input.start)) {
    at -= 1
    bounds.add('thinned')
    measured = draw()
  }
  while (!measured && feeds > 1) {
    feeds -= 1
    bounds.add('fewer-feeds')
    measured = draw()
  }
  if (!measured) return null
  // Rounded up to a mark, a day that just fitted its water may not any more: one strength thicker does.
  const drawnWaterMl = (meal: MeasuredFeed) => feeds * meal.volumeMl * (1 - input.strengths[at]! * (1 - input.waterFraction))
  while (input.waterCapMl !== null && drawnWaterMl(measured) > input.waterCapMl && canThicken()) {
    at += 1
    const thicker = draw()
    if (!thicker) {
      at -= 1
      break
    }
    measured = thicker
    bounds.add('water-cap')
  }
  if (overWater()) bounds.add('water-cap')
  const wantedMl = dayMl() / feeds
  if (wantedMl > capOfOne() * slack) bounds.add('short')
  return { strengthFraction: input.strengths[at]!, feeds, measured, wantedMl, bounds: [...bounds] }
}
