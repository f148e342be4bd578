/**
 * The foster packet as finished text: a cover for someone alone with the animal, the sheet for the enclosure and the
 * card for the kitchen. It writes what the plan says and works out nothing.
 */
import type { Plan, PlanDay } from '#shared/types/plan'
import { formatDay } from '#shared/utils/calendar'
import { missingForMixing, mixingCardModel, type MixingCardModel } from './mixingCard'
import { chosenDays, SheetRefusedError, type PrintOptions } from './options'
import { missingFor } from './refusal'
import { plain, strong, type RichText } from './richText'
import { heldToWeight, sheetModel, type Notice, type SheetModel, type StopBox } from './sheet'
import { approvalOn, callLines, daySpan, ended, held, keepWarmInWords, noFoodBelow, potsFor, type ApprovalLines, type CallLine, type Coded, type FootLines, type Identity } from './wording'

/** One paper of the packet, as its cover lists it. */
export interface PacketPart {
  title: string
  /** Where it belongs. */
  place: string
}

export interface PacketCover {
  title: string
  identity: Identity
  dates: string
  coded: Coded
  /** Why not to feed, or not yet; null where the gate is open. */
  notice: Notice | null
  approval: ApprovalLines
  callTitle: string
  calls: CallLine[]
  stopTitle: string
  /** Without whom to ring: they stand above it, larger. */
  stop: StopBox
  partsTitle: string
  /** In the order of the pages; the cover comes first. */
  parts: PacketPart[]
  careTitle: string
  care: RichText[]
  /** Labels of lines to write on. */
  writeIns: string[]
  foot: FootLines
}

export interface PacketModel {
  title: string
  cover: PacketCover
  sheet: SheetModel
  /** Null when nothing is mixed on the days of the packet. */
  mixing: MixingCardModel | null
}

/** @throws SheetRefusedError where the sheet or the mixing card is refused, and without a number to ring. */
export function packetModel(plan: Plan, options: PrintOptions): PacketModel {
  const days = chosenDays(plan.days, options).map(day => heldToWeight(plan, day))
  const mixingOptions = optionsForMixing(plan, options, days)
  refuseIncompletePacket(plan, options, days, mixingOptions)
  const sheet = sheetModel(plan, options)
  const mixing = mixingOptions ? mixingCardModel(plan, mixingOptions) : null
  const title = `Foster packet: ${sheet.identity.name ?? sheet.identity.species}`
  return { title, cover: coverOf(plan, options, days, { title, sheet, mixing }), sheet, mixing }
}

/** Someone alone with an animal must be able to ring somebody: a packet without a number is not handed out. */
function refuseIncompletePacket(plan: Plan, options: PrintOptions, days: readonly PlanDay[], mixingOptions: PrintOptions | null): void {
  const missing = [
    ...missingFor(plan, days),
    ...mixingOptions ? missingForMixing(plan, mixingOptions) : [],
    ...callLines(options).some(call => /\p{Nd}/u.test(call.phone ?? '')) ? [] : ['a phone number to call'],
  ]
  if (missing.length > 0) throw new SheetRefusedError([...new Set(missing)])
}

/** The card shows the pots of the days that the sheet gives feeds on; null where those need no pot. */
function optionsForMixing(plan: Plan, options: PrintOptions, days: readonly PlanDay[]): PrintOptions | null {
  if (plan.gate.state === 'do-not-feed') return null
  const fed = days.filter(day => day.state === 'feed' && day.feeds.length > 0)
  if (potsFor(plan, fed).length === 0) return null
  const numberOf = (day: PlanDay) => plan.days.findIndex(one => one.date === day.date) + 1
  return { ...options, days: { from: numberOf(fed[0]!), to: numberOf(fed.at(-1)!) } }
}

function coverOf(plan: Plan, options: PrintOptions, days: readonly PlanDay[], { title, sheet, mixing }: Omit<PacketModel, 'cover'>): PacketCover {
  const { identity, dates, coded, notice, stop, foot } = sheet
  return {
    title,
    identity,
    dates,
    coded,
    notice,
    approval: approvalOn(options),
    callTitle: 'Who to call',
    calls: stop.calls,
    stopTitle: 'When to stop',
    stop: { ...stop, calls: [] },
    partsTitle: 'In this packet',
    parts: [
      { title: 'This cover', place: 'by the phone' },
      notice?.state === 'do-not-feed'
        ? { title: 'DO NOT FEED sign', place: 'on the enclosure' }
        : { title: `Feeding sheet for ${daySpan(days[0]!.date, days.at(-1)!.date)}`, place: 'on the enclosure' },
      ...mixing ? [{ title: 'Mixing card', place: 'where you mix' }] : [],
    ],
    careTitle: 'Warmth and weight',
    care: careOf(plan),
    writeIns: ['Taken by', 'Phone', 'Date'],
    foot,
  }
}

function careOf(plan: Plan): RichText[] {
  const { goodUntil, nextWeighInOn, rule } = plan.validity
  const shut = plan.gate.state === 'do-not-feed'
  return [
    [strong(keepWarmInWords(plan.animal))],
    // Behind a shut gate warmth alone opens nothing.
    ...shut ? [] : [noFoodBelow(plan.animal)],
    [plain('This plan is good until '), strong(`${held(formatDay(goodUntil))}.`), plain(shut ? ' Then call for a new one.' : ' Then do not feed from it: call for a new one.')],
    [plain('Weigh next on '), strong(`${held(formatDay(nextWeighInOn))}.`), plain(rule.trim() ? ` ${ended(rule.trim())}` : '')],
  ]
}

/** One line of the list on the cover. @example partInWords(part, 2, 4) // 'Feeding sheet for Thu 3 Dec, pages 2 to 4: on the enclosure.' */
export function partInWords({ title, place }: PacketPart, from: number, to: number): RichText {
  const pages = from === to ? `page ${from}` : `pages ${from} ${to === from + 1 ? 'and' : 'to'} ${to}`
  return [plain(`${title}, `), strong(held(pages)), plain(`: ${place}.`)]
}
