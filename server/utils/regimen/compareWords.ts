/** Turns of phrase that every part of a comparison shares. What is compared is always the text that would be printed. */
import type { PlanFeed, Syringe } from '#shared/types/plan'
import type { ChangedLine } from '#shared/types/planLife'
import { formatClock, formatDay } from '#shared/utils/calendar'
import { formatQuantity, formatSignificant, formatVolumeMl, NBSP } from '#shared/utils/quantity'
import { held } from '../print/wording'

/** Headings that lines are grouped by, in their order. */
export type ComparedPart = 'What is given' | 'May it be fed' | 'Animal' | 'Feed and mixing' | 'Steps' | 'Fluids' | 'Limits' | 'House' | 'Reference data'

type Written = string | null | undefined
type LineMaker = (label: string, before: Written, after: Written, weight?: ChangedLine['weight']) => ChangedLine[]

/** How a change is said that has a text on both sides, one only after, or one only before. */
interface Sayings { both: (label: string, from: string, to: string) => string, added?: (label: string, to: string) => string, gone?: (label: string, from: string) => string }

/** One line where two texts differ, none where they read the same. Nothing, null and empty text are "not given". */
export function changedFromTo(part: ComparedPart): LineMaker {
  return changedLine(part, { both: (label, from, to) => `${label} from ${from} to ${to}` })
}

/** As `changedFromTo`, for texts that would read badly between "from" and "to". */
export function changedInsteadOf(part: ComparedPart): LineMaker {
  return changedLine(part, { both: (label, from, to) => `${label} ${to} instead of ${from}` })
}

/** As `changedFromTo`, for what is worked out unless a person sets it. */
export function changedByHand(part: ComparedPart): LineMaker {
  return changedLine(part, {
    both: (label, from, to) => `${label} set by hand from ${from} to ${to}`,
    added: (label, to) => `${label} set by hand: ${to}`,
    gone: (label, from) => `${label} no longer set by hand, it was ${from}`,
  })
}

function changedLine(part: ComparedPart, { both, added = (label, to) => `${label} added: ${to}`, gone = (label, from) => `${label} taken off, it was ${from}` }: Sayings): LineMaker {
  return (label, before, after, weight = 'other') => {
    const from = before?.trim() || null
    const to = after?.trim() || null
    if (from === to) return []
    const text = from === null ? added(label, to!) : to === null ? gone(label, from) : both(label, from, to)
    return [{ part, text, weight }]
  }
}

/** What one list has and the other has not, each in a line. */
export function addedAndTakenOff(part: ComparedPart, label: string, before: readonly string[], after: readonly string[], weight: ChangedLine['weight'] = 'other'): ChangedLine[] {
  return [
    ...listWithout(after, before).map(one => ({ part, text: `${label} added: ${one}`, weight })),
    ...listWithout(before, after).map(one => ({ part, text: `${label} taken off: ${one}`, weight })),
  ]
}

/** What is left of a list when each of the others took one away. */
export function listWithout(list: readonly string[], others: readonly string[]): string[] {
  const left = [...others]
  return list.filter((one) => {
    const at = left.indexOf(one)
    if (at >= 0) left.splice(at, 1)
    return at < 0
  })
}

/** Days in a row for which the same is said. */
interface DayRun { from: string, to: string, dates: string[], before: string, after: string }

/**
 * Days in a row with the same change in one run. A day without the change ends a run.
 *
 * @param dates  in order; days that the change cannot be about are left out, and do not end a run.
 * @param textsOn  what is written before and after; null where there is nothing to compare.
 */
export function runsOfDays(dates: readonly string[], textsOn: (date: string) => readonly [string, string] | null): DayRun[] {
  const runs: DayRun[] = []
  let open: DayRun | null = null
  for (const date of dates) {
    const [before, after] = textsOn(date) ?? ['', '']
    if (before === after) open = null
    else if (open && open.before === before && open.after === after) {
      open.to = date
      open.dates.push(date)
    }
    else runs.push(open = { from: date, to: date, dates: [date], before, after })
  }
  return runs
}

/** A value as it would be printed, or null where it was not given. */
export function writtenIfGiven<Value>(value: Value | null | undefined, write: (value: Value) => string): string | null {
  return value === null || value === undefined ? null : write(value)
}

export function withUnit(unit: string, decimals = 2): (value: number) => string {
  return value => formatQuantity(value, unit, decimals)
}

export function inFigures(unit: string, figures = 3): (value: number) => string {
  return value => `${formatSignificant(value, figures)}${NBSP}${unit}`
}

/** @example clockInWords('12:00') // '12:00 noon' */
export function clockInWords(time: string): string {
  return held(formatClock(time))
}

export function dayInWords(date: string): string {
  return held(formatDay(date))
}

/** @example syringeAndMarks({ capacityMl: 1, stepMl: 0.01 }) // '1 mL with marks every 0.01 mL' */
export function syringeAndMarks({ capacityMl, stepMl }: Syringe): string {
  return `${formatVolumeMl(capacityMl)} with marks every ${formatVolumeMl(stepMl)}`
}

/** How often a syringe is filled for one feed. The mark is said only where it is not simply the amount. */
export function fillings({ draws, markMl, volumeMl }: Pick<PlanFeed, 'draws' | 'markMl' | 'volumeMl'>): string {
  const mark = formatVolumeMl(markMl)
  if (draws !== 1) return `${draws}${NBSP}times to ${mark}`
  return mark === formatVolumeMl(volumeMl) ? 'once' : `once to ${mark}`
}
