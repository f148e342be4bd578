/**
 * The mixing card as rows of finished text: what to weigh and measure for which days, in numbered steps, and a label
 * for each pot. It writes what the plan says and works out nothing.
 */
import type { Plan, PlanMixing } from '#shared/types/plan'
import { formatDay } from '#shared/utils/calendar'
import { formatQuantity, formatRange, formatSignificant, formatVolumeMl, NBSP } from '#shared/utils/quantity'
import { chosenDays, SheetRefusedError, type PrintOptions } from './options'
import { plain, strong, type RichText } from './richText'
import { codedFrom, daySpan, DEMO_FEED, discardInWords, ended, footOf, held, hoursInWords, identityOf, originOf, sentence, type Coded, type FootLines, type Identity } from './wording'

export interface MixRow { days: string, strength: string, base: string, water: string, makes: string, energy: string, ratio: string }

export interface PotLabel { mix: string, animal: string, day: string, lines: string[] }

/** As many as a page holds. */
const MOST_LABELS = 6

export interface MixingCardModel {
  title: string
  identity: Identity
  coded: Coded
  feedName: string
  demo: string | null
  /** Set instead of rows when nothing is to be mixed. */
  nothing: { isSign: boolean, title: string, message: string } | null
  heads: string[]
  rows: MixRow[]
  steps: RichText[]
  discard: string[]
  /** Lines to write on, one row each day. */
  logHeads: string[]
  bin: string
  labels: PotLabel[]
  origin: string
  foot: FootLines
}

/** @throws SheetRefusedError when a pot lacks what to weigh, how much water or how warm. */
export function mixingCardModel(plan: Plan, options: PrintOptions): MixingCardModel {
  const pots = potsOf(plan, options)
  const missing = missingForMixing(plan, options)
  if (missing.length > 0) throw new SheetRefusedError(missing)
  const identity = identityOf(plan.animal)
  const shut = plan.gate.state === 'do-not-feed'
  return {
    title: `Mixing card: ${identity.name ?? identity.species}`,
    identity,
    coded: codedFrom(options),
    feedName: plan.feed.name,
    demo: plan.feed.demo ? DEMO_FEED : null,
    nothing: pots.length > 0 ? null : nothingToMix(plan),
    heads: ['Days', 'Strength', pots.some(pot => pot.powderG !== null) ? 'Powder' : 'Feed', 'Water', 'Makes', `Energy in 1${NBSP}mL`],
    rows: pots.map(pot => rowOf(pot)),
    steps: shut || pots.length === 0 ? [] : stepsFor(plan, pots),
    discard: [...new Set(pots.map(discardInWords))],
    logHeads: ['Day', 'Made at', 'Use by', 'Bin at', 'Warmed to', 'Made by'],
    bin: 'Lumpy, thick or smells? Bin it, make new. Do not thin it by eye.',
    labels: labelsOf(plan, options, pots, identity),
    origin: originOf(plan, options),
    foot: footOf(plan, options),
  }
}

/** Behind a shut gate nothing is mixed; else the pots of the days asked for, or of the whole plan where those have none. */
function potsOf(plan: Plan, options: PrintOptions): PlanMixing[] {
  if (plan.gate.state === 'do-not-feed') return []
  if (!options.days) return plan.mixing
  const dates = chosenDays(plan.days, options).map(day => day.date)
  const asked = plan.mixing.filter(pot => dates.some(date => date >= pot.fromDate && date <= pot.toDate))
  return asked.length > 0 ? asked : plan.mixing
}

/** @returns what the pots lack, in plain words; empty when the card may be printed. */
export function missingForMixing(plan: Plan, options: PrintOptions): string[] {
  return [...new Set(potsOf(plan, options).flatMap(missingForPot))]
}

function missingForPot(pot: PlanMixing): string[] {
  const positive = (value: number | null) => value !== null && Number.isFinite(value) && value > 0
  return [
    ...pot.feedName.trim() ? [] : ['the name of the feed'],
    ...positive(pot.powderG) || positive(pot.feedMl) ? [] : ['how much to weigh'],
    ...Number.isFinite(pot.waterMl) && pot.waterMl >= 0 ? [] : ['how much water'],
    ...Number.isFinite(pot.warmToC.low) && Number.isFinite(pot.warmToC.high) ? [] : ['how warm to give it'],
  ]
}

function nothingToMix(plan: Plan): NonNullable<MixingCardModel['nothing']> {
  const reason = plan.gate.state === 'feed' ? undefined : plan.gate.findings[0]
  return {
    isSign: plan.gate.state === 'do-not-feed',
    title: 'Nothing to mix',
    message: reason ? `${reason.title}. ${reason.message}` : 'No feed of this plan is mixed.',
  }
}

function rowOf(pot: PlanMixing): MixRow {
  return {
    days: daySpan(pot.fromDate, pot.toDate),
    strength: sentence(pot.strengthLabel),
    base: pot.powderG !== null ? formatQuantity(pot.powderG, 'g', 3) : formatVolumeMl(pot.feedMl ?? 0),
    water: pot.waterMl > 0 ? formatVolumeMl(pot.waterMl) : 'none',
    makes: `${formatSignificant(pot.madeUpMl)}${NBSP}mL`,
    energy: `${formatSignificant(pot.energyKcalPerMl)}${NBSP}kcal`,
    ratio: ended(sentence(pot.ratioInWords)),
  }
}

function stepsFor(plan: Plan, pots: readonly PlanMixing[]): RichText[] {
  const only = pots.length === 1 ? rowOf(pots[0]!) : null
  const powder = pots.some(pot => pot.powderG !== null)
  const water = pots.some(pot => pot.waterMl > 0)
  const scale = pots.find(pot => pot.powderG !== null)
  const warm = pots[0]!.warmToC
  return [
    'Wash your hands. Use a clean pot, spoon and syringe.',
    ...powder
      ? [
          [plain(`Put the pot on a scale that shows ${formatQuantity(scale!.kitchenScaleStepG, 'g', 3)} or finer. Set it to zero.`)],
          only ? [plain('Weigh in '), strong(only.base), plain(' of powder. Never a scoop: scoops run high.')] : [plain('Weigh in the powder of today\'s row. Never a scoop: scoops run high.')],
        ]
      : [only ? [plain('Measure '), strong(only.base), plain(' of the feed with a syringe.')] : [plain('Measure the feed of today\'s row with a syringe.')]],
    ...water ? [only ? [plain('Add '), strong(only.water), plain(' of warm boiled water, measured with a syringe.')] : [plain('Add the water of today\'s row, boiled and warm, measured with a syringe.')]] : [],
    ...powder ? [`Stir for 1${NBSP}minute, leave for 5${NBSP}minutes, stir again.`] : ['Stir until it is even.'],
    ...plan.route === 'tube' ? ['Press it through a fine sieve, so that the tube does not block.'] : [],
    'Write the label at once and stick it on the pot. Keep the pot in the fridge.',
    [plain('Warm only what you need, in a cup of warm water, to '), strong(formatRange(warm.low, warm.high, '°C')), plain('. Check with a thermometer. Never a microwave: it leaves scalding pockets.')],
  ]
}

/** A label for each pot of the next days: one pot lasts one day. */
function labelsOf(plan: Plan, options: PrintOptions, pots: readonly PlanMixing[], identity: Identity): PotLabel[] {
  const asked = options.days ? chosenDays(plan.days, options) : plan.days
  const days = asked.some(day => day.feeds.length > 0) ? asked : plan.days
  return days.flatMap((day) => {
    const pot = day.feeds.length > 0 ? pots.find(one => one.strengthFraction === day.strengthFraction && day.date >= one.fromDate && day.date <= one.toDate) : undefined
    return pot ? [{ pot, date: day.date }] : []
  }).slice(0, MOST_LABELS).map(({ pot, date }) => labelOf(pot, date, identity))
}

function labelOf(pot: PlanMixing, date: string, identity: Identity): PotLabel {
  const { room, started, fridge } = pot.discardHours
  return {
    mix: `${pot.feedName}, ${pot.strengthLabel}`,
    animal: [identity.name, identity.caseNumber && `case ${identity.caseNumber}`, identity.enclosure].filter(Boolean).join(', ') || identity.species,
    day: held(formatDay(date)),
    lines: ['Made at', 'Bin at', 'Made by', `Bin after: fridge ${held(hoursInWords(fridge))}, room ${held(hoursInWords(room))}, started ${held(hoursInWords(started))}`],
  }
}
