/** Turns of phrase that the sheet, the mixing card and the label share. They write what the plan says and work out nothing. */
import type { Plan, PlanAnimal, PlanDay, PlanFeed, PlanMixing } from '#shared/types/plan'
import type { Standing } from '#shared/types/planLife'
import { formatClock, formatDay, formatDayAndYear, formatLongDay } from '#shared/utils/calendar'
import { formatNumber, formatQuantity, formatRange, formatSignificant, formatTemperatureC, formatVolumeMl, formatWeightG, NBSP, volumeInWords } from '#shared/utils/quantity'
import type { PrintOptions } from './options'
import { plain, strong, type Run } from './richText'

/** Said on everything that is printed for as long as there is no approval. */
export const NOT_APPROVED = 'NOT APPROVED BY A VET'
export const NOT_SURE = 'Not sure? Do not feed. Leave a note. Call.'
export const DEMO_FEED = 'Demo feed: invented figures. Not for a real animal.'

/** @example inWords(['a', 'b', 'c']) // 'a, b and c' */
export function inWords(items: readonly string[]): string {
  if (items.length < 2) return items[0] ?? ''
  return `${items.slice(0, -1).join(', ')} and ${items.at(-1)}`
}

/** First letter as a capital, the rest as it is. */
export function sentence(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}

/** Number, unit and day name hold together: no line may end between them. */
export function held(text: string): string {
  return text.replace(/ /g, NBSP)
}

const WRITTEN_DAY = /\b(?:Mon|Tue|Wed|Thu|Fri|Sat|Sun) \d{1,2} [A-Z][a-z]{2}\b(?: \d{4}\b)?|\d (?:g|kg)\b/g

/** A sentence made elsewhere: no line may end inside its days and weights. */
export function heldInside(text: string): string {
  return text.replace(WRITTEN_DAY, held)
}

/** @example daySpan('2026-12-03', '2026-12-05') // 'Thu 3 to Sat 5 Dec' */
export function daySpan(from: string, to: string): string {
  if (from === to) return held(formatDay(from))
  return `${held(withoutMonth(formatDay(from), from, to))} ${nextDay(from) === to ? 'and' : 'to'} ${held(formatDay(to))}`
}

/** @example longDaySpan('2026-12-03', '2026-12-05') // 'Thursday 3 to Saturday 5 December' */
export function longDaySpan(from: string, to: string): string {
  if (from === to) return held(formatLongDay(from))
  return `${held(withoutMonth(formatLongDay(from), from, to))} ${nextDay(from) === to ? 'and' : 'to'} ${held(formatLongDay(to))}`
}

function withoutMonth(written: string, from: string, to: string): string {
  return from.slice(0, 7) === to.slice(0, 7) ? written.slice(0, written.lastIndexOf(' ')) : written
}

function nextDay(date: string): string {
  return new Date(Date.parse(`${date}T00:00:00Z`) + 86_400_000).toISOString().slice(0, 10)
}

const zoneClocks = new Map<string, Intl.DateTimeFormat>()

/** An instant on the plan's wall clock. @example whenInWords('2026-12-02T18:40:00Z', 'Europe/London') // 'Wed 2 Dec 2026, 18:40' */
export function whenInWords(instant: string, timeZone: string): string {
  let clock = zoneClocks.get(timeZone)
  if (!clock) {
    clock = new Intl.DateTimeFormat('en-GB', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit', hourCycle: 'h23' })
    zoneClocks.set(timeZone, clock)
  }
  const part = Object.fromEntries(clock.formatToParts(new Date(instant)).map(({ type, value }) => [type, value]))
  return `${held(formatDayAndYear(`${part.year}-${part.month}-${part.day}`))}, ${held(formatClock(`${part.hour}:${part.minute}`))}`
}

const MOST_TIMES_IN_A_LINE = 4

/** @example timesInWords(['07:30', '14:00']) // '07:30 and 14:00' */
export function timesInWords(times: readonly string[]): string {
  const clocks = times.map(time => held(formatClock(time)))
  if (clocks.length <= MOST_TIMES_IN_A_LINE) return inWords(clocks)
  return `${clocks.length} times from ${clocks[0]} to ${clocks.at(-1)}`
}

/** Two names for one animal, always: on paper a lone name is how the wrong one gets fed. */
export interface Identity {
  /** Null prints as a line to write on. */
  name: string | null
  caseNumber: string | null
  enclosure: string | null
  species: string
  weight: string
}

export function identityOf(animal: PlanAnimal): Identity {
  return {
    name: animal.name.trim() || null,
    caseNumber: animal.caseNumber.trim() || null,
    enclosure: animal.enclosure.trim() || null,
    species: animal.speciesName,
    weight: `${formatWeightG(animal.weightG)}, weighed ${held(formatDay(animal.weighedOn))}`,
  }
}

/** What one feed is, in every way it is shown: figure, words, syringe and mark. */
export interface Amount {
  heading: string
  figure: string
  unit: string
  words: string
  syringe: string
  strength: string
  feedName: string
  demo: string | null
  barrel: { capacityMl: number, stepMl: number, markMl: number, markLabel: string }
}

/** One amount per different feed of a day; nearly always one. */
export function amountsOf(plan: Plan, day: PlanDay): Amount[] {
  const kinds = new Map<string, PlanFeed[]>()
  for (const feed of day.feeds) {
    const key = amountKey(feed)
    kinds.set(key, [...kinds.get(key) ?? [], feed])
  }
  return [...kinds.values()].map((feeds) => {
    const feed = feeds[0]!
    const times = timesInWords(feeds.map(one => one.localTime))
    return {
      heading: feeds.length === 1 ? `One feed: at ${times}` : `Each feed: ${times.includes('from') ? times : `at ${times}`}`,
      figure: formatNumber(feed.volumeMl, 3),
      unit: 'mL',
      words: volumeInWords(feed.volumeMl),
      syringe: syringeInWords(feed),
      strength: sentence(day.strengthLabel),
      feedName: plan.feed.name,
      demo: plan.feed.demo ? DEMO_FEED : null,
      barrel: { ...feed.syringe, markMl: feed.markMl, markLabel: formatNumber(feed.markMl, 3) },
    }
  })
}

export function amountKey(feed: PlanFeed): string {
  return [feed.volumeMl, feed.markMl, feed.draws, feed.syringe.capacityMl, feed.syringe.stepMl].join(' ')
}

function syringeInWords(feed: PlanFeed): string {
  const syringe = `${formatVolumeMl(feed.syringe.capacityMl)} syringe`
  const mark = formatVolumeMl(feed.markMl)
  if (feed.draws === 1) return `${syringe}, draw up to ${mark}`
  return `${syringe}, draw up to ${mark}, ${feed.draws}${NBSP}times for each feed`
}

/** How it is given and by whom, as the plan words it. */
export function routeInWords(plan: Plan): string {
  return ended(sentence(plan.routeLabel))
}

/** A full stop at the end, and one only. */
export function ended(text: string): string {
  return /[.?]$/.test(text) ? text : `${text}.`
}

/** The pots that serve these days. */
export function potsFor(plan: Plan, days: readonly PlanDay[]): PlanMixing[] {
  return plan.mixing.filter(pot => days.some(day => day.feeds.length > 0 && day.strengthFraction === pot.strengthFraction && day.date >= pot.fromDate && day.date <= pot.toDate))
}

export function warmFeedInWords(pot: PlanMixing): string {
  return `Warm the feed to ${formatRange(pot.warmToC.low, pot.warmToC.high, '°C')}.`
}

const THERMOMETER = { body: 'Body', ambient: 'Air', water: 'Water' } as const

/** @example warmEnoughHead(animal) // 'Body 33 °C or more?' */
export function warmEnoughHead(animal: PlanAnimal): string {
  return `${THERMOMETER[animal.feedingTemperatureC.what]} ${formatTemperatureC(animal.feedingTemperatureC.low)} or${NBSP}more?`
}

export function keepWarmInWords(animal: PlanAnimal): string {
  const { low, high, what } = animal.warmPlaceC
  const place = { 'warm end': 'the warm end', 'air': 'the air around it', 'water': 'its water' }[what]
  return `Keep ${place} at ${formatRange(low, high, '°C')}.`
}

export function noFoodBelow(animal: PlanAnimal): string {
  const { low, what } = animal.feedingTemperatureC
  const where = { body: 'its body is', ambient: 'the air around it is', water: 'its water is' }[what]
  return `No food until ${where} at ${formatTemperatureC(low)} or more.`
}

/** About what one drop holds, mL: less than this nobody can give. */
const DROP_ML = 0.05

/** Water to give in a day, to two figures: it is given by and by, never to a mark. Null where none can be given by volume. */
export function waterInFigures(day: PlanDay): string | null {
  return day.waterToGiveMl >= DROP_ML ? `${formatSignificant(day.waterToGiveMl, 2)}${NBSP}mL` : null
}

export function discardInWords(pot: PlanMixing): string {
  const { room, started, fridge } = pot.discardHours
  return `Bin it ${hoursInWords(room)} after mixing at room warmth, ${hoursInWords(fridge)} in the fridge, ${hoursInWords(started)} once started.`
}

export function hoursInWords(value: number): string {
  if (value < 1) return formatQuantity(value * 60, 'minutes', 0)
  return formatQuantity(value, value === 1 ? 'hour' : 'hours', 1)
}

/** @example amountsOfPot(pot) // '1.2 g of powder and 3.6 mL of warm boiled water' */
export function amountsOfPot(pot: PlanMixing): string {
  const base = pot.powderG !== null ? `${formatQuantity(pot.powderG, 'g', 3)} of powder` : `${formatVolumeMl(pot.feedMl ?? 0)} of the feed`
  return pot.waterMl > 0 ? `${base} and ${formatVolumeMl(pot.waterMl)} of warm boiled water` : `${base}, no water added`
}

/** Who to ring. A number that was not given is a line to write on. */
export interface CallLine { role: string, name: string | null, phone: string | null }

const DAY_AND_NIGHT: CallLine[] = [{ role: 'By day', name: null, phone: null }, { role: 'At night', name: null, phone: null }]
const NIGHT = /night|hours|emergency/i

export function callLines(options: Pick<PrintOptions, 'contacts'>): CallLine[] {
  const given = (options.contacts ?? []).map(({ role, name, phone }) => ({ role: role.trim(), name: name?.trim() || null, phone: phone?.trim() || null }))
  if (given.length === 0) return DAY_AND_NIGHT
  // Half of all trouble is at night: a sheet always has a place for that number.
  return given.some(line => NIGHT.test(line.role)) ? given : [...given, DAY_AND_NIGHT[1]!]
}

/** Source keys that the figures of a plan rest on, each once, in the order of the plan. */
export function sourcesOf(plan: Plan): string[] {
  return [...new Set([plan.energy.sourceKey, plan.fluids.sourceKey, plan.ramp.sourceKey, plan.feed.sourceKey, ...plan.condition.estimates.map(one => one.sourceKey)])].filter(Boolean)
}

/** Code, version and the state of both. */
export interface Coded {
  code: string | null
  version: string | null
  url: string | null
  note: string
  replaces: string | null
  superseded: string | null
  /** That the plan was stopped, finished or moved. */
  lifeNote: string | null
}

export function codedFrom(options: Pick<PrintOptions, 'reference' | 'lifeNote'>): Coded {
  const reference = options.reference ?? null
  const lifeNote = heldInside(options.lifeNote?.trim() ?? '') || null
  if (!reference) return { code: null, version: null, url: null, note: 'Not saved: this sheet has no code.', replaces: null, superseded: null, lifeNote }
  const { id, version, latestVersion, url } = reference
  return {
    code: id,
    version: `Version ${version}`,
    url,
    note: 'Scan to see if this sheet is still current.',
    replaces: version > 1 ? `Replaces version ${version - 1}: bin it.` : null,
    superseded: latestVersion > version ? `SUPERSEDED. Version ${latestVersion} is newer: do not use this sheet.` : null,
    lifeNote,
  }
}

/** Why this paper is not to be used, worst first; empty for paper that may be. */
export function haltsOf(coded: Coded): string[] {
  return [coded.lifeNote, coded.superseded].filter(text => text !== null)
}

/** A vet's word on a plan. Whatever is not a standing approval is said white on black. */
export interface ApprovalLines {
  state: Standing['state']
  band: string
  /** Who, when, for which weight and until when, or why it lapsed; null where there never was one. */
  line: string | null
}

export function approvalOn(options: Pick<PrintOptions, 'approval'>): ApprovalLines {
  const { state, band, line }: Standing = options.approval ?? { state: 'none', band: '', line: '' }
  // The words that nobody approved it are ours: no caller can soften them.
  if (state === 'none') return { state, band: NOT_APPROVED, line: null }
  return { state, band: band.trim(), line: heldInside(line.trim()) || null }
}

/** The band and its line as one text, for paper without room for both; who approved it is named once. */
export function approvalInWords({ band, line }: ApprovalLines): Run[] {
  if (line === null) return [strong(band)]
  if (line.startsWith(band)) return [strong(band), plain(ended(line.slice(band.length)))]
  return [strong(ended(band)), plain(` ${ended(line)}`)]
}

export interface FootLines { band: string, isReversed: boolean, animal: string, lines: Run[][] }

/** The foot of every page: whether it is approved, what it rests on, until when, which version, made when. */
export function footOf(plan: Plan, options: PrintOptions): FootLines {
  const { validity, animal } = plan
  const { code, version, replaces } = codedFrom(options)
  const identity = identityOf(animal)
  const { state, band, line } = approvalOn(options)
  const isReversed = state !== 'approved'
  return {
    band,
    isReversed,
    animal: [identity.name ?? 'No name', identity.enclosure].filter(Boolean).join(', '),
    lines: [
      ...line === null ? [] : [[isReversed ? strong(line) : plain(line)]],
      [plain(`Worked out from ${identity.weight}. `), strong(`Good until ${held(formatDay(validity.goodUntil))}.`), plain(` Next weigh-in ${held(formatDay(validity.nextWeighInOn))}.`)],
      [plain(code === null ? 'Not saved, no code. ' : `Sheet ${code}, ${version!.toLowerCase()}. `), ...replaces ? [strong(`${replaces} `)] : [], plain([`Made ${whenInWords(options.madeAt, plan.timeZone)}.`, options.teamName?.trim()].filter(Boolean).join(' '))],
    ],
  }
}

export function originOf(plan: Plan, options: PrintOptions): string {
  return `Thimbleful ${options.appVersion}, reference data ${plan.edition}. Sources: ${sourcesOf(plan).join(', ')}.`
}
