/** What a carer would give differently, day by day, and whether the animal may be fed at all. */
import type { GateState, Plan, PlanDay, PlanFeed } from '#shared/types/plan'
import type { ChangedLine } from '#shared/types/planLife'
import { formatVolumeMl } from '#shared/utils/quantity'
import { STATE_WORDS } from '../print/sheet'
import { daySpan, inWords, sentence, timesInWords, waterInFigures } from '../print/wording'
import { clockInWords, fillings, changedInsteadOf, runsOfDays, syringeAndMarks, listWithout, type ComparedPart } from './compareWords'

/** A smaller change of the water of a day is no change in what is given: it is given by and by, never to a mark. */
const WATER_CHANGE = 0.05

/** What both versions order, by date, with every date that either has. */
interface BothPlans { dates: string[], before: Map<string, PlanDay>, after: Map<string, PlanDay> }

const isShut = (plan: Plan) => plan.gate.state === 'do-not-feed'

/** The days of a plan as paper orders them: behind a shut gate nothing is given, whatever the plan reckons with. */
export function orderedDays(plan: Plan): PlanDay[] {
  return plan.days.map(day => ({ ...day, state: isShut(plan) ? 'do-not-feed' : day.state, feeds: isShut(plan) || day.state !== 'feed' ? [] : day.feeds }))
}

function bothPlans(before: Plan, after: Plan): BothPlans {
  const byDate = (plan: Plan) => new Map(orderedDays(plan).map(day => [day.date, day]))
  const days = { before: byDate(before), after: byDate(after) }
  return { dates: [...new Set([...days.before.keys(), ...days.after.keys()])].sort(), ...days }
}

/** Lines about feeds and water, for every date that either plan has. */
export function comparedGiven(before: Plan, after: Plan): ChangedLine[] {
  if (isShut(before) && isShut(after)) return []
  const both = bothPlans(before, after)
  const texts = [...daysNewAndGone(both), ...mealsNewAndGone(both), ...feedChanges(both), ...isShut(before) || isShut(after) ? [] : waterChanges(both)]
  return texts.map(text => ({ part: 'What is given', text, weight: 'amount' }))
}

function daysNewAndGone({ dates, before, after }: BothPlans): string[] {
  return runsOfDays(dates, date => [before.has(date) ? 'planned' : '', after.has(date) ? 'planned' : '']).map(({ from, to, dates: days, before: was }) => {
    const are = days.length === 1 ? 'is' : 'are'
    return was ? `${daySpan(from, to)} ${are} no longer planned` : `${daySpan(from, to)} ${are} new: ${orders(days.map(date => after.get(date)!))}`
  })
}

function mealsNewAndGone({ dates, before, after }: BothPlans): string[] {
  const meals = (day: PlanDay) => day.feeds.length > 0 ? 'meals' : ''
  const inBoth = dates.filter(date => before.has(date) && after.has(date) && (meals(before.get(date)!) || meals(after.get(date)!)))
  return runsOfDays(inBoth, date => [meals(before.get(date)!), meals(after.get(date)!)]).map(({ from, to, dates: days, before: was }) =>
    was ? `No meals any more on ${daySpan(from, to)}` : `Meals on ${daySpan(from, to)} are new: ${orders(days.map(date => after.get(date)!))}`)
}

/** All that some days order, the same for days in a row said once. @example '3 feeds of 0.5 mL, full strength' */
function orders(days: readonly PlanDay[]): string {
  const byDate = new Map(days.map(day => [day.date, day]))
  const runs = runsOfDays([...byDate.keys()], date => ['', order(byDate.get(date)!)])
  return runs.map(({ from, to, after }) => runs.length === 1 ? after : `${after} (${daySpan(from, to)})`).join('; ')
}

function order(day: PlanDay): string {
  const [first] = day.feeds
  if (!first) return [STATE_WORDS[day.state], 'no meal', ...waterInFigures(day) ? [`${waterInFigures(day)} of water`] : []].join(', ')
  const volumes = new Set(day.feeds.map(feed => formatVolumeMl(feed.volumeMl)))
  const amount = volumes.size === 1
    ? `${day.feeds.length} ${day.feeds.length === 1 ? 'feed' : 'feeds'} of ${[...volumes][0]}`
    : `feeds of ${inWords(day.feeds.map(feed => `${formatVolumeMl(feed.volumeMl)} at ${clockInWords(feed.localTime)}`))}`
  return [amount, day.strengthLabel].filter(Boolean).join(', ')
}

/** What can differ between two feeds, and how it is said. Without a "from" the feed is new, without a "to" it is gone; null says nothing. */
interface Aspect { textOf: (feed: PlanFeed) => string, lineOf: (which: string, span: string, from: string, to: string) => string | null }

const ASPECTS: Record<'volume' | 'syringe' | 'filling', Aspect> = {
  volume: {
    textOf: feed => formatVolumeMl(feed.volumeMl),
    lineOf: (which, span, from, to) => {
      if (!from) return `${sentence(which)} on ${span} is new: ${to}`
      return to ? `${sentence(which)} on ${span} from ${from} to ${to}` : `${sentence(which)} on ${span} is no longer planned, it was ${from}`
    },
  },
  syringe: { textOf: feed => syringeAndMarks(feed.syringe), lineOf: (which, span, from, to) => from && to ? `Syringe for ${which} on ${span} from ${from} to ${to}` : null },
  filling: { textOf: fillings, lineOf: (which, span, from, to) => from && to ? `Draw up ${to} instead of ${from} for ${which} on ${span}` : null },
}

type TextsOf = (was: PlanDay, is: PlanDay) => readonly [string, string] | null
/** One line for each run of days on which both plans have meals. */
type LinesOf = (textsOf: TextsOf, lineOf: (span: string, from: string, to: string) => string | null) => string[]

function feedChanges({ dates, before, after }: BothPlans): string[] {
  const feedsOn = (plan: BothPlans['before'], date: string) => plan.get(date)?.feeds ?? []
  // Days that have no meal in either plan do not end a run: an animal fed every third day is one run.
  const fed = dates.filter(date => feedsOn(before, date).length > 0 || feedsOn(after, date).length > 0)
  const linesOf: LinesOf = (textsOf, lineOf) => runsOfDays(fed, (date) => {
    if (feedsOn(before, date).length === 0 || feedsOn(after, date).length === 0) return null
    return textsOf(before.get(date)!, after.get(date)!)
  }).flatMap(run => lineOf(daySpan(run.from, run.to), run.before, run.after) ?? [])
  const slots = [...new Set(fed.flatMap(date => [before, after].flatMap(plan => [...byTime(feedsOn(plan, date)).keys()])))].sort()
  const of = (aspect: Aspect) => aspectChanges(aspect, slots, linesOf)
  return [
    ...of(ASPECTS.volume),
    ...linesOf((was, is) => [String(was.feeds.length), String(is.feeds.length)], (span, from, to) => `Number of feeds on ${span} from ${from} to ${to}`),
    ...linesOf(times, (span, from, to) => `Feeds on ${span} ${to} instead of ${from.replace(/^at /, '')}`),
    ...of(ASPECTS.syringe),
    ...of(ASPECTS.filling),
    ...linesOf((was, is) => [was.strengthLabel, is.strengthLabel], (span, from, to) => `Strength on ${span} from ${from} to ${to}`),
  ]
}

/** Days whose feeds are all alike in one line; others by the clock. */
function aspectChanges({ textOf, lineOf }: Aspect, slots: readonly string[], linesOf: LinesOf): string[] {
  const textAt = (day: PlanDay, slot: string) => {
    const feed = byTime(day.feeds).get(slot)
    return feed ? textOf(feed) : ''
  }
  return [
    ...linesOf((was, is) => sameForAll(was, is, textOf) ? [textOf(was.feeds[0]!), textOf(is.feeds[0]!)] : null, (span, from, to) => lineOf('each feed', span, from, to)),
    ...slots.flatMap(slot => linesOf((was, is) => sameForAll(was, is, textOf) ? null : [textAt(was, slot), textAt(is, slot)], (span, from, to) => lineOf(`the feed at ${clockInWords(slot.slice(0, 5))}`, span, from, to))),
  ]
}

/** Whether the feeds of each of two days do not differ among themselves. */
function sameForAll(was: PlanDay, is: PlanDay, textOf: Aspect['textOf']): boolean {
  return [was, is].every(day => new Set(day.feeds.map(textOf)).size === 1)
}

/** Feeds by clock time; the hour that a clock change repeats has two. */
function byTime(feeds: readonly PlanFeed[]): Map<string, PlanFeed> {
  const slots = new Map<string, PlanFeed>()
  for (const feed of feeds) slots.set(slots.has(feed.localTime) ? `${feed.localTime} again` : feed.localTime, feed)
  return slots
}

function times(was: PlanDay, is: PlanDay): [string, string] {
  const [from, to] = [was, is].map(day => day.feeds.map(feed => feed.localTime)) as [string[], string[]]
  if (from.join() === to.join()) return ['', '']
  const short = [from, to].map(timesInWords) as [string, string]
  const said = short[0] === short[1] ? [from, to].map(list => inWords(list.map(clockInWords))) : short
  return said.map(text => text.includes('from') ? text : `at ${text}`) as [string, string]
}

function waterChanges({ dates, before, after }: BothPlans): string[] {
  const label = (was: PlanDay, is: PlanDay) => was.feeds.length > 0 && is.feeds.length > 0 ? 'Water on top of feeds' : 'Water to give'
  const inBoth = dates.filter(date => before.has(date) && after.has(date))
  return ['Water to give', 'Water on top of feeds'].flatMap(kind => runsOfDays(inBoth, (date) => {
    const [was, is] = [before.get(date)!, after.get(date)!]
    const [from, to] = [waterInFigures(was), waterInFigures(is)]
    if (label(was, is) !== kind || (from && to && !isMoreThan(WATER_CHANGE, was.waterToGiveMl, is.waterToGiveMl))) return null
    return [from ?? 'none', to ?? 'none']
  }).map(run => `${kind} on ${daySpan(run.from, run.to)} from ${run.before} to ${run.after}`))
}

/** Measured against the smaller of the two, so that there and back is the same change. */
function isMoreThan(fraction: number, one: number, other: number): boolean {
  return Math.abs(one - other) > fraction * Math.min(one, other) + 1e-9
}

/** The gate with its reasons, then single days that say something else than the gate does. */
export function comparedGate(before: Plan, after: Plan): ChangedLine[] {
  const part: ComparedPart = 'May it be fed'
  const titles = (plan: Plan) => [...new Set(plan.gate.findings.map(finding => finding.title.trim()).filter(Boolean))]
  const word = (plan: Plan) => STATE_WORDS[plan.gate.state]
  return [
    ...changedInsteadOf(part)('The plan says', word(before), word(after), 'amount'),
    ...listWithout(titles(after), titles(before)).map(title => ({ part, text: `New reason: ${title}`, weight: 'other' as const })),
    ...listWithout(titles(before), titles(after)).map(title => ({ part, text: `Reason gone: ${title}`, weight: 'other' as const })),
    ...dayStates(before, after).map(text => ({ part, text, weight: 'amount' as const })),
  ]
}

function dayStates(before: Plan, after: Plan): string[] {
  const both = bothPlans(before, after)
  // A gate that shuts or opens speaks for the days that follow it.
  const saidByGate = (was: GateState, is: GateState) => isShut(before) !== isShut(after) && was === before.gate.state && is === after.gate.state
  return runsOfDays(both.dates, (date) => {
    const [was, is] = [both.before.get(date), both.after.get(date)]
    return was && is && !saidByGate(was.state, is.state) ? [STATE_WORDS[was.state], STATE_WORDS[is.state]] : null
  }).map(({ from, to, before: was, after: is }) => `${is} instead of ${was} on ${daySpan(from, to)}`)
}
