import { formatClock, formatDayAndYear } from '#shared/utils/calendar'

/**
 * An instant as a person in that zone would say it.
 * @example whenInZone('2026-12-03T18:00:00Z', 'Europe/London') // 'Thu 3 Dec 2026, 18:00 (Europe/London)'
 */
export function whenInZone(instant: string, timeZone: string): string {
  // Swedish writes dates the way the rest of this code does: 2026-12-03 18:00.
  const [date = '', time = ''] = new Date(instant).toLocaleString('sv-SE', { timeZone, dateStyle: 'short', timeStyle: 'short' }).split(' ')
  return `${formatDayAndYear(date)}, ${formatClock(time)} (${timeZone})`
}
