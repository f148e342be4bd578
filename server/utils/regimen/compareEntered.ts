/** What was entered differently, and the figures that came of it: the animal, its feed, the steps, fluids, limits, the house. */
import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan, PlanMixing, Route } from '#shared/types/plan'
import type { ChangedLine } from '#shared/types/planLife'
import type { LengthMeasure } from '#shared/types/reference'
import { SIGNS } from '#shared/types/regimenLists'
import { formatNumber, formatPercent, formatQuantity, formatRange, formatSignificant, formatTemperatureC, formatVolumeMl, formatWeightG, NBSP } from '#shared/utils/quantity'
import { amountsOfPot, hoursInWords, inWords, sentence, whenInWords } from '../print/wording'
import { orderedDays } from './compareGiven'
import type { ComparedVersion } from './compareVersions'
import { addedAndTakenOff, clockInWords, dayInWords, changedFromTo, inFigures, changedInsteadOf, changedByHand, syringeAndMarks, withUnit, writtenIfGiven, type ComparedPart } from './compareWords'

const MEASURES: Record<LengthMeasure, string> = { 'snout-vent': 'from snout to vent', 'total': 'from snout to tail tip', 'carapace': 'along the shell, straight', 'wing': 'along the wing', 'body': 'along the body' }
const ROUTE_WORDS: Record<Route, string> = { syringe: 'by mouth with a syringe', tube: 'by tube', hand: 'by hand or bowl' }

const percent = withUnit('%', 1)
const daysInWords = (value: number) => formatQuantity(value, value === 1 ? 'day' : 'days', 1)
const hoursOrNone = (value: number) => value === 0 ? 'none' : hoursInWords(value)
/** @example stepsInWords([0.2, 0.5, 1]) // '20, 50 and 100 %' */
const stepsInWords = (fractions: readonly number[]) => `${inWords(fractions.map(one => formatNumber(one * 100, 0)))}${NBSP}%`

/** Who it is, how it was measured and how it was found. */
export function comparedAnimal(before: ComparedVersion, after: ComparedVersion): ChangedLine[] {
  const line = changedFromTo('Animal')
  const [was, is] = [before.input.animal, after.input.animal]
  const [wasPlan, isPlan] = [before.plan.animal, after.plan.animal]
  const measure = (animal: Plan['animal']) => animal.lengthMeasure && MEASURES[animal.lengthMeasure]
  return [
    ...line('Name', wasPlan.name, isPlan.name),
    ...line('Case number', wasPlan.caseNumber, isPlan.caseNumber),
    ...line('Enclosure', wasPlan.enclosure, isPlan.enclosure),
    ...line('Species', ...speciesNames(wasPlan, isPlan)),
    ...weightChange(wasPlan, isPlan),
    ...line('Scale it is weighed on, step', writtenIfGiven(was.scaleStepG, withUnit('g', 3)), writtenIfGiven(is.scaleStepG, withUnit('g', 3))),
    ...line('Length', writtenIfGiven(was.lengthMm, withUnit('mm', 1)), writtenIfGiven(is.lengthMm, withUnit('mm', 1))),
    ...was.lengthMm !== undefined && is.lengthMm !== undefined ? changedInsteadOf('Animal')('Length measured', measure(wasPlan), measure(isPlan)) : [],
    ...line('Earlier healthy weight', writtenIfGiven(was.healthyWeightG, formatWeightG), writtenIfGiven(is.healthyWeightG, formatWeightG)),
    ...line('Body condition score', writtenIfGiven(was.bodyConditionScore, formatNumber), writtenIfGiven(is.bodyConditionScore, formatNumber)),
    ...line('Dryness', percent(was.drynessPercent), percent(is.drynessPercent)),
    ...line('Body temperature', writtenIfGiven(was.bodyTemperatureC, formatTemperatureC), writtenIfGiven(is.bodyTemperatureC, formatTemperatureC)),
    ...line('Time without a proper meal', daysInWords(was.daysUnfed), daysInWords(is.daysUnfed)),
    ...line('Life stage', was.lifeStage, is.lifeStage),
    ...addedAndTakenOff('Animal', 'Sign', was.signs.map(sign => SIGNS[sign].label), is.signs.map(sign => SIGNS[sign].label)),
  ]
}

/** Two species can share a plain name: then the scientific one tells them apart. */
function speciesNames(was: Plan['animal'], is: Plan['animal']): [string, string] {
  if (was.speciesName !== is.speciesName || was.scientificName === is.scientificName) return [was.speciesName, is.speciesName]
  return [`${was.speciesName} (${was.scientificName})`, `${is.speciesName} (${is.scientificName})`]
}

function weightChange(was: Plan['animal'], is: Plan['animal']): ChangedLine[] {
  const [from, to] = [formatWeightG(was.weightG), formatWeightG(is.weightG)]
  const [fromDay, toDay] = [dayInWords(was.weighedOn), dayInWords(is.weighedOn)]
  if (from === to) return changedInsteadOf('Animal')('Weighed on', fromDay, toDay)
  const change = is.weightG / was.weightG - 1
  const share = Math.abs(change) < 0.01 ? `${formatSignificant(Math.abs(change) * 100, 1)}${NBSP}%` : formatPercent(Math.abs(change))
  const weighed = was.weighedOn === is.weighedOn ? `weighed ${toDay}` : `weighed ${fromDay} and ${toDay}`
  return [{ part: 'Animal', text: `Weight from ${from} to ${to} (${share} ${change > 0 ? 'more' : 'less'}), ${weighed}`, weight: 'other' }]
}

/** What it is fed, how it is given, and the pots that are mixed. */
export function comparedFeed({ input: was, plan: wasPlan }: ComparedVersion, { input: is, plan: isPlan }: ComparedVersion): ChangedLine[] {
  const line = changedFromTo('Feed and mixing')
  const ownShare = (input: RegimenInput, of: 'proteinPercent' | 'fatPercent' | 'carbohydratePercent') => 'feedId' in input.feed ? null : writtenIfGiven(input.feed[of], percent)
  return [
    ...line('Feed', wasPlan.feed.name, isPlan.feed.name, 'amount'),
    ...line('Energy of the feed', kcalPerMl(wasPlan.feed.energyKcalPerMl), kcalPerMl(isPlan.feed.energyKcalPerMl)),
    ...line('Water in the feed', formatPercent(wasPlan.feed.waterFraction), formatPercent(isPlan.feed.waterFraction)),
    ...line('Protein of the feed', ownShare(was, 'proteinPercent'), ownShare(is, 'proteinPercent')),
    ...line('Fat of the feed', ownShare(was, 'fatPercent'), ownShare(is, 'fatPercent')),
    ...line('Carbohydrate of the feed', ownShare(was, 'carbohydratePercent'), ownShare(is, 'carbohydratePercent')),
    ...changedInsteadOf('Feed and mixing')('Given', ROUTE_WORDS[wasPlan.route], ROUTE_WORDS[isPlan.route], 'amount'),
    ...line('Flush after each tube feed', writtenIfGiven(was.flushMl, formatVolumeMl), writtenIfGiven(is.flushMl, formatVolumeMl), 'amount'),
    ...changedByHand('Feed and mixing')('Feeds a day', writtenIfGiven(was.feedsPerDay, String), writtenIfGiven(is.feedsPerDay, String)),
    ...potChanges(wasPlan, isPlan),
  ]
}

const kcalPerMl = inFigures('kcal/mL')

/** Pots by their strength; behind a shut gate nothing is mixed. */
function potsByStrength(plan: Plan): Map<string, PlanMixing> {
  const pots = new Map<string, PlanMixing>()
  for (const pot of plan.gate.state === 'do-not-feed' ? [] : plan.mixing) {
    const label = sentence(pot.strengthLabel)
    pots.set(pots.has(label) ? `Second ${pot.strengthLabel}` : label, pot)
  }
  return pots
}

function potChanges(before: Plan, after: Plan): ChangedLine[] {
  const part: ComparedPart = 'Feed and mixing'
  const [was, is] = [potsByStrength(before), potsByStrength(after)]
  return [...new Set([...was.keys(), ...is.keys()])].flatMap((strength): ChangedLine[] => {
    const [from, to] = [was.get(strength), is.get(strength)]
    if (!from) return [{ part, text: `${strength} pot is new: ${amountsOfPot(to!)}`, weight: 'amount' }]
    if (!to) return [{ part, text: `${strength} pot is no longer mixed, it was ${amountsOfPot(from)}`, weight: 'amount' }]
    return potChange(`${strength} pot:`, from, to)
  })
}

function potChange(pot: string, was: PlanMixing, is: PlanMixing): ChangedLine[] {
  const line = changedFromTo('Feed and mixing')
  const other = changedInsteadOf('Feed and mixing')
  const water = (one: PlanMixing) => one.waterMl > 0 ? formatVolumeMl(one.waterMl) : 'none'
  const bins = ({ discardHours: { room, started, fridge } }: PlanMixing) => `${hoursInWords(room)} at room warmth, ${hoursInWords(started)} once started, ${hoursInWords(fridge)} in the fridge`
  const warm = (one: PlanMixing) => formatRange(one.warmToC.low, one.warmToC.high, '°C')
  return [
    ...(was.powderG === null) === (is.powderG === null)
      ? [
          ...line(`${pot} powder`, writtenIfGiven(was.powderG, withUnit('g', 3)), writtenIfGiven(is.powderG, withUnit('g', 3)), 'amount'),
          ...line(`${pot} feed`, writtenIfGiven(was.feedMl, formatVolumeMl), writtenIfGiven(is.feedMl, formatVolumeMl), 'amount'),
          ...line(`${pot} water`, water(was), water(is), 'amount'),
        ]
      : other(pot, amountsOfPot(was), amountsOfPot(is), 'amount'),
    ...other(`${pot} warm to`, warm(was), warm(is)),
    ...other(`${pot} bin after`, bins(was), bins(is)),
  ]
}

/** From the first hour to full meals. */
export function comparedSteps({ plan: was }: ComparedVersion, { plan: is }: ComparedVersion): ChangedLine[] {
  const line = changedFromTo('Steps')
  const firstMeal = (plan: Plan) => writtenIfGiven(orderedDays(plan).find(day => day.feeds.length > 0)?.date, dayInWords) ?? 'none planned'
  const fullMeals = (plan: Plan) => plan.gate.state === 'do-not-feed' || plan.ramp.fullMealsOn === null ? 'none planned' : dayInWords(plan.ramp.fullMealsOn)
  return [
    ...line('Start of the plan', whenInWords(was.ramp.startsAt, was.timeZone), whenInWords(is.ramp.startsAt, is.timeZone)),
    ...line('Refeeding risk', was.ramp.tier, is.ramp.tier),
    ...line('Steps up to full meals', stepsInWords(was.ramp.fractions), stepsInWords(is.ramp.fractions)),
    ...line('Each step lasts', daysInWords(was.ramp.stepDays), daysInWords(is.ramp.stepDays)),
    ...line('Time to warm it first', hoursOrNone(was.ramp.warmHours), hoursOrNone(is.ramp.warmHours)),
    ...line('Time on fluids only', hoursOrNone(was.ramp.fluidHours), hoursOrNone(is.ramp.fluidHours)),
    ...line('First meal', firstMeal(was), firstMeal(is)),
    ...line('Full meals', fullMeals(was), fullMeals(is)),
  ]
}

/** What the water of each day is reckoned from. */
export function comparedFluids({ plan: { fluids: was } }: ComparedVersion, { plan: { fluids: is } }: ComparedVersion): ChangedLine[] {
  const line = changedFromTo('Fluids')
  const ml = inFigures('mL', 2)
  return [
    ...line('Maintenance fluid a day', ml(was.maintenanceMlPerDay), ml(is.maintenanceMlPerDay)),
    ...line('Missing fluid to bring back', ml(was.deficitMl), ml(is.deficitMl)),
    ...line('Time to bring it back', hoursOrNone(was.deficitHours), hoursOrNone(is.deficitHours)),
  ]
}

/** What is never exceeded, and how long all of it holds. */
export function comparedLimits({ plan: was }: ComparedVersion, { plan: is }: ComparedVersion): ChangedLine[] {
  const line = changedFromTo('Limits')
  const ml = inFigures('mL')
  const warmth = ({ animal: { feedingTemperatureC } }: Plan) => `${{ body: 'body', ambient: 'air', water: 'water' }[feedingTemperatureC.what]} at ${formatTemperatureC(feedingTemperatureC.low)}`
  const kcal = inFigures('kcal/day')
  return [
    ...line('Largest meal allowed', ml(was.meal.capMl), ml(is.meal.capMl)),
    ...line('Largest first meal allowed', ml(was.meal.firstCapMl), ml(is.meal.firstCapMl)),
    ...line('Most fluid on a day', inFigures('mL', 2)(was.fluids.capMlPerDay), inFigures('mL', 2)(is.fluids.capMlPerDay)),
    ...line('Energy of full meals', kcal(was.energy.targetKcalPerDay), kcal(is.energy.targetKcalPerDay)),
    ...changedInsteadOf('Limits')('No food until', warmth(was), warmth(is), 'amount'),
    ...line('Weight under which to stop and call', formatWeightG(was.validity.stopWeightG), formatWeightG(is.validity.stopWeightG)),
    ...changedInsteadOf('Limits')('Good until', dayInWords(was.validity.goodUntil), dayInWords(is.validity.goodUntil)),
    ...line('Next weigh-in', dayInWords(was.validity.nextWeighInOn), dayInWords(is.validity.nextWeighInOn)),
  ]
}

/** The house: its hours, syringes, people, and what a person set by hand. */
export function comparedHouse(before: ComparedVersion, after: ComparedVersion): ChangedLine[] {
  const line = changedFromTo('House')
  const [was, is] = [before.input, after.input]
  const hours = ({ feedingHours: { from, to } }: RegimenInput) => `${clockInWords(from)} to ${clockInWords(to)}`
  return [
    ...changedInsteadOf('House')('Feeding hours', hours(was), hours(is)),
    ...line('Time zone', was.timeZone, is.timeZone),
    ...syringeChanges(was.syringes, is.syringes),
    ...line('Kitchen scale, step', writtenIfGiven(was.kitchenScaleStepG, withUnit('g', 3)), writtenIfGiven(is.kitchenScaleStepG, withUnit('g', 3))),
    ...addedAndTakenOff('House', 'Contact', contacts(was), contacts(is)),
    ...line('Team name', was.teamName, is.teamName),
    ...overrideChanges(before, after),
  ]
}

function syringeChanges(was: RegimenInput['syringes'], is: RegimenInput['syringes']): ChangedLine[] {
  if (was && is) return addedAndTakenOff('House', 'Syringe', was.map(syringeAndMarks), is.map(syringeAndMarks))
  const list = (syringes: RegimenInput['syringes']) => syringes ? inWords(syringes.map(syringeAndMarks)) : 'the usual ones'
  return changedInsteadOf('House')('Syringes:', list(was), list(is))
}

function contacts(input: RegimenInput): string[] {
  return (input.contacts ?? []).map(({ role, name, phone }) => [role, name, phone].map(text => text?.trim()).filter(Boolean).join(', '))
}

function overrideChanges(before: ComparedVersion, after: ComparedVersion): ChangedLine[] {
  const line = changedByHand('House')
  const [was, is] = [before.input.overrides, after.input.overrides]
  return [
    ...was?.energyEquationId === is?.energyEquationId ? [] : line('Energy equation', equationTitle(before), equationTitle(after)),
    ...line('Refeeding risk', was?.tier, is?.tier),
    ...line('Steps', writtenIfGiven(was?.fractions, stepsInWords), writtenIfGiven(is?.fractions, stepsInWords)),
    ...line('Maintenance fluid', writtenIfGiven(was?.maintenanceMlPerKgPerDay, withUnit('mL/kg/day', 1)), writtenIfGiven(is?.maintenanceMlPerKgPerDay, withUnit('mL/kg/day', 1))),
    ...line('Time on fluids only', writtenIfGiven(was?.fluidHours, hoursOrNone), writtenIfGiven(is?.fluidHours, hoursOrNone)),
  ]
}

/** The first step of working out the energy carries the title of its equation. */
function equationTitle({ input, plan }: ComparedVersion): string | null {
  if (input.overrides?.energyEquationId === undefined) return null
  return plan.energy.steps[0]?.label ?? 'another one'
}

/** The edition of the reference data that figures come from. */
export function comparedEdition({ plan: was }: ComparedVersion, { plan: is }: ComparedVersion): ChangedLine[] {
  return changedFromTo('Reference data')('Reference data', was.edition, is.edition)
}

