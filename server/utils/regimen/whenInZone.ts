import { formatClock, formatDayAndYear } from '#shared/utils/calendar'

/**
 * An instant as a person in that zone would say it.
 * @example whenInZone('2026-12-03T18:00:00Z', 'Europe/London') // 'Thu 3 Dec 2026, 18:00 (Europe/London)'
 */
export function whenInZone(instant: string, timeZone: string): string {
  const [date, time] = wallClock(new Date(instant), timeZone)
  return `${formatDayAndYear(date)}, ${formatClock(time)} (${timeZone})`
}

/** The calendar day there. @example todayInZone(new Date('2026-12-03T23:30:00Z'), 'Pacific/Chatham') // '2026-12-04' */
export function todayInZone(now: Date, timeZone: string): string {
  return wallClock(now, timeZone)[0]
}

const clocks = new Map<string, Intl.DateTimeFormat>()

function wallClock(instant: Date, timeZone: string): [string, string] {
  let clock = clocks.get(timeZone)
  // Swedish writes dates the way the rest of this code does: 2026-12-03 18:00. Making a formatter is slow, so it is kept.
  if (!clock) clocks.set(timeZone, clock = new Intl.DateTimeFormat('sv-SE', { timeZone, dateStyle: 'short', timeStyle: 'short' }))
  const [date = '', time = ''] = clock.format(instant).split(' ')
  return [date, time]
}
