/** Dates as they are written: "Thu 3 Dec", 24-hour clock, noon and midnight named. Display only. */

const DAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat']
const LONG_DAYS = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday']
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec']
const LONG_MONTHS = ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December']

function parts(date: string) {
  const at = new Date(`${date}T00:00:00Z`)
  return { weekday: at.getUTCDay(), day: at.getUTCDate(), month: at.getUTCMonth(), year: at.getUTCFullYear() }
}

/** @example formatDay('2026-12-03') // 'Thu 3 Dec' */
export function formatDay(date: string): string {
  const { weekday, day, month } = parts(date)
  return `${DAYS[weekday]} ${day} ${MONTHS[month]}`
}

/** @example formatLongDay('2026-12-03') // 'Thursday 3 December' */
export function formatLongDay(date: string): string {
  const { weekday, day, month } = parts(date)
  return `${LONG_DAYS[weekday]} ${day} ${LONG_MONTHS[month]}`
}

/** @example formatDayAndYear('2026-12-03') // 'Thu 3 Dec 2026' */
export function formatDayAndYear(date: string): string {
  return `${formatDay(date)} ${parts(date).year}`
}

/** @example formatClock('12:00') // '12:00 noon' */
export function formatClock(time: string): string {
  if (time === '12:00') return '12:00 noon'
  if (time === '00:00') return '00:00 midnight'
  return time
}
