/**
 * The enclosure sheet as rows of finished text: everything that will be read, in the order it is read, and nothing
 * about where it stands on a page. It writes what the plan says and works out nothing.
 */
import type { GateState, Plan, PlanDay } from '#shared/types/plan'
import { formatClock, formatDay } from '#shared/utils/calendar'
import { formatVolumeMl, formatWeightG, NBSP } from '#shared/utils/quantity'
import { chosenDays, type PrintOptions } from './options'
import { refuseIncomplete } from './refusal'
import { plain, strong, type RichText } from './richText'
import {
  amountKey, amountsOf, amountsOfPot, callLines, codedFrom, daySpan, discardInWords, ended, footOf, held, identityOf, keepWarmInWords, longDaySpan,
  noFoodBelow, NOT_SURE, originOf, potsFor, routeInWords, sentence, warmEnoughHead, warmFeedInWords, waterInFigures,
  type Amount, type CallLine, type Coded, type FootLines, type Identity,
} from './wording'

export const STATE_WORDS: Record<GateState, string> = { 'feed': 'FEED', 'wait': 'WAIT', 'do-not-feed': 'DO NOT FEED' }

/** Reasons and what to do, before anything else on the sheet. */
export interface Notice {
  state: GateState
  word: string
  reasons: { title: string, message: string }[]
  warm: string[]
}

export interface StateBand { state: GateState, word: string, reason: string, days: string }

export interface LogRow {
  time: string
  give: string
  /** Where one feed takes several draws. */
  giveNote: string
}

export interface LogDay {
  date: string
  label: string
  /** "Feeding day 1 of 11", or the stage. */
  note: string
  /** What to give besides feeds, and where to write that it was given. */
  water: { label: string, figure: string | null }
  weigh: string
  rows: LogRow[]
}

/** Days in a row that share state and amounts. */
export interface Stretch {
  band: StateBand
  amounts: Amount[]
  /** One line each, beside the amount or below the band. */
  facts: string[]
  heads: string[]
  days: LogDay[]
  /** Label of the spare row; null where the rows are blank anyway. */
  spare: string | null
}

export interface StepBox { title: string, lines: RichText[] }

export interface StopBox { signs: string[], weight: string, order: string, calls: CallLine[], last: string }

export interface SheetModel {
  title: string
  identity: Identity
  dates: string
  coded: Coded
  /** The whole sheet when the gate is shut; the first thing on it when it says wait. */
  notice: Notice | null
  stretches: Stretch[]
  boxes: StepBox[]
  stop: StopBox
  origin: string
  foot: FootLines
}

const LOG_ROWS_ON_FLUIDS = 3

/**
 * A day that the weight no longer carries is no order: it says WAIT, and why.
 * The plan itself keeps its amounts; they count again once the animal was weighed and a new sheet made.
 */
export function heldToWeight(plan: Plan, day: PlanDay): PlanDay {
  const { weighedOn } = plan.animal
  const { goodUntil } = plan.validity
  if (day.state === 'do-not-feed' || !isPastWeight(plan, day)) return day
  return { ...day, state: 'wait', stateReason: `Weigh it and make a new sheet: the weight of ${held(formatDay(weighedOn))} was good until ${held(formatDay(goodUntil))}`, feeds: [], strengthFraction: 0, strengthLabel: '' }
}

function isPastWeight(plan: Plan, day: PlanDay): boolean {
  return plan.validity.goodUntil.trim() !== '' && day.date > plan.validity.goodUntil
}

/** @throws SheetRefusedError when something that a carer needs is missing; see `missingFor`. */
export function sheetModel(plan: Plan, options: PrintOptions): SheetModel {
  const days = chosenDays(plan.days, options).map(day => heldToWeight(plan, day))
  refuseIncomplete(plan, days)
  const shut = plan.gate.state === 'do-not-feed'
  const identity = identityOf(plan.animal)
  return {
    title: `${shut ? 'Do not feed' : 'Feeding sheet'}: ${identity.name ?? identity.species}`,
    identity,
    dates: shut ? '' : datesInWords(plan, days),
    coded: codedFrom(options),
    notice: noticeOf(plan),
    stretches: shut ? [] : stretchesOf(plan, days),
    boxes: shut ? [] : boxesOf(plan, days),
    stop: stopOf(plan, options),
    origin: originOf(plan, options),
    foot: footOf(plan, options),
  }
}

function datesInWords(plan: Plan, days: readonly PlanDay[]): string {
  const span = longDaySpan(days[0]!.date, days.at(-1)!.date)
  const feeding = days.filter(day => day.feedingDay > 0).map(day => day.feedingDay)
  if (feeding.length === 0) return `${span}, before the first meal`
  const total = plan.days.at(-1)!.feedingDay
  const which = feeding.length === 1 ? `day ${feeding[0]}` : `days ${feeding[0]} to ${feeding.at(-1)}`
  return `${span}, ${held(`feeding ${which} of ${total}`)}`
}

function noticeOf(plan: Plan): Notice | null {
  const { state, findings } = plan.gate
  if (state === 'feed') return null
  return {
    state,
    word: STATE_WORDS[state],
    reasons: findings.filter(finding => finding.title.trim() !== '').map(({ title, message }) => ({ title, message })),
    warm: [noFoodBelow(plan.animal), keepWarmInWords(plan.animal)],
  }
}

/** Days in a row that share state and amounts, each with one band and one set of amounts. */
export function stretchesOf(plan: Plan, days: readonly PlanDay[]): Stretch[] {
  const groups: PlanDay[][] = []
  for (const day of days) {
    const last = groups.at(-1)
    if (last && stretchKey(last[0]!) === stretchKey(day)) last.push(day)
    else groups.push([day])
  }
  return groups.map(group => stretchOf(plan, group))
}

/** What must be the same for one amount block to speak for several days. */
function stretchKey(day: PlanDay): string {
  const feeds = day.state === 'feed' ? day.feeds.map(feed => `${feed.localTime} ${amountKey(feed)}`) : []
  return [day.state, day.stateReason, day.stage === 'warm' ? 'warm' : '', day.strengthFraction, ...feeds].join('|')
}

function stretchOf(plan: Plan, days: PlanDay[]): Stretch {
  const first = days[0]!
  const feeding = first.state === 'feed'
  return {
    band: { state: first.state, word: STATE_WORDS[first.state], reason: first.stateReason, days: daySpan(first.date, days.at(-1)!.date) },
    amounts: feeding ? amountsOf(plan, first) : [],
    facts: feeding ? feedFacts(plan, first) : waitFacts(plan, first),
    heads: feeding
      ? ['Time', 'Give', warmEnoughHead(plan.animal), `Taken${NBSP}(mL)`, 'Brought up?', 'Droppings?', 'Initials']
      : ['Time', `Fluid${NBSP}given (mL)`, 'How given', `Warmth${NBSP}(°C)`, 'Droppings?', 'Initials'],
    days: days.map(day => logDayOf(plan, day)),
    spare: feeding ? `Extra feed given${NBSP}at:` : null,
  }
}

function feedFacts(plan: Plan, day: PlanDay): string[] {
  const pot = potsFor(plan, [day])[0]
  return [[routeInWords(plan), ...pot ? [warmFeedInWords(pot)] : []].join(' ')]
}

function waitFacts(plan: Plan, day: PlanDay): string[] {
  // The notice above has said the first two already.
  const early = day.stage === 'warm' || day.stage === 'fluids'
  const warmth = plan.gate.state === 'wait' && early ? [] : [`${early ? `${noFoodBelow(plan.animal)} ` : ''}${keepWarmInWords(plan.animal)}`]
  return [...warmth, ...day.stage === 'warm' && day.waterToGiveMl === 0 ? [] : [`Fluids: ${plan.fluids.usualRoute}`]]
}

function logDayOf(plan: Plan, day: PlanDay): LogDay {
  const feeding = day.state === 'feed'
  const early = day.stage === 'warm' || day.stage === 'fluids'
  return {
    date: day.date,
    label: held(formatDay(day.date)),
    note: day.feedingDay > 0 ? held(`Feeding day ${day.feedingDay}`) : { warm: 'Warming', fluids: 'Fluids only', ramp: '', full: '' }[day.stage],
    water: waterOf(plan, day),
    weigh: feeding ? `Weigh before the first${NBSP}feed:` : 'Weigh at the same time each day:',
    rows: feeding
      ? day.feeds.map(feed => ({ time: held(formatClock(feed.localTime)), give: formatVolumeMl(feed.volumeMl), giveNote: feed.draws > 1 ? held(`${feed.draws} × ${formatVolumeMl(feed.markMl)}`) : '' }))
      : Array.from({ length: early ? LOG_ROWS_ON_FLUIDS : 1 }, () => ({ time: '', give: '', giveNote: '' })),
  }
}

/** What to give besides feeds on one day. */
export function waterOf(plan: Plan, day: PlanDay): LogDay['water'] {
  // The water of such a day was worked out beside feeds that are not ordered.
  if (isPastWeight(plan, day)) return { label: 'Water: see the new sheet', figure: null }
  const figure = waterInFigures(day)
  if (figure) return { label: day.feeds.length > 0 && day.state === 'feed' ? `Water on top of${NBSP}feeds:` : `Water to give in${NBSP}the${NBSP}day:`, figure }
  // Amphibians drink through the skin, so their plan names no volume.
  if (day.waterNeedMl === 0 && plan.fluids.maintenanceMlPerDay === 0) return { label: 'Soak given, for how long:', figure: null }
  return { label: day.waterToGiveMl > 0 ? 'Water: less than a drop' : 'No water on top', figure: null }
}

function boxesOf(plan: Plan, days: readonly PlanDay[]): StepBox[] {
  const pots = potsFor(plan, days)
  const how: StepBox = { title: 'How to give it', lines: plan.howToGive }
  if (pots.length === 0) return days.some(day => day.state === 'feed') ? [how] : []
  const amounts = pots.map(pot => [strong(`${sentence(pot.strengthLabel)}, ${daySpan(...overlap(pot, days))}: `), plain(`${amountsOfPot(pot)}. ${ended(sentence(pot.ratioInWords))}`)])
  // What differs from pot to pot is said for each; what does not, once.
  const discards = [...new Set(pots.map(discardInWords))]
  return [{
    title: 'Mix one pot for one day',
    lines: [
      ...amounts,
      'Weigh and measure, never by scoop. Warm it in a cup of warm water, never a microwave.',
      ...discards,
      'Lumpy, thick or smells: bin it, make new.',
    ],
  }, how]
}

/** The part of a pot's days that this sheet shows. */
function overlap(pot: { fromDate: string, toDate: string, strengthFraction: number }, days: readonly PlanDay[]): [string, string] {
  const dates = days.filter(day => day.feeds.length > 0 && day.strengthFraction === pot.strengthFraction && day.date >= pot.fromDate && day.date <= pot.toDate).map(day => day.date)
  return [dates[0]!, dates.at(-1)!]
}

function stopOf(plan: Plan, options: PrintOptions): StopBox {
  return {
    signs: plan.stopSigns,
    weight: `It weighs less than ${formatWeightG(plan.validity.stopWeightG)}`,
    order: 'Do not give the next feed.',
    calls: callLines(options),
    last: NOT_SURE,
  }
}
