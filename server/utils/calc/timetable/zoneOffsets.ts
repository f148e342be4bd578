import { CalcInputError } from '../calcInputError'

/** From this instant on the zone is this far ahead of UTC. */
export interface ZoneOffset { fromMs: number, offsetMs: number }

// Making a formatter costs more than a whole plan; a zone's rules do not change while the process runs.
const formatters = new Map<string, Intl.DateTimeFormat>()
const WEEK_MS = 7 * 86_400_000

/**
 * The offsets of a named time zone between two instants, with each clock change found to the second.
 *
 * @param timeZone  IANA name, for example `Europe/London`.
 * @param fromMs  start, instant in ms since 1970.
 * @param toMs  end, instant, at or after the start.
 * @returns offsets in order of time, the first from `fromMs`, at least one.
 * @throws CalcInputError `timeZone.unknown` when the name is not known.
 * @source definition (the time zone data of the runtime)
 * @example zoneOffsets('Europe/London', Date.UTC(2026, 2, 28), Date.UTC(2026, 2, 30)).length // 2
 */
export function zoneOffsets(timeZone: string, fromMs: number, toMs: number): ZoneOffset[] {
  const found: ZoneOffset[] = [{ fromMs, offsetMs: offsetAtMs(timeZone, fromMs) }]
  // Weekly samples: even the zones that change twice around a month of fasting are caught.
  for (let at = fromMs; at < toMs; at += WEEK_MS) {
    const next = Math.min(at + WEEK_MS, toMs)
    const offsetMs = offsetAtMs(timeZone, next)
    if (offsetMs !== found.at(-1)!.offsetMs) found.push({ fromMs: changeBetween(timeZone, at, next), offsetMs })
  }
  return found
}

/** First instant (to the second) at which the offset of `toMs` holds. */
function changeBetween(timeZone: string, fromMs: number, toMs: number): number {
  const after = offsetAtMs(timeZone, toMs)
  let low = fromMs
  let high = toMs
  while (high - low > 1000) {
    const middle = Math.floor((low + high) / 2000) * 1000
    if (offsetAtMs(timeZone, middle) === after) high = middle
    else low = middle
  }
  return high
}

function offsetAtMs(timeZone: string, atMs: number): number {
  const written = formatterOf(timeZone).format(atMs)
  const match = /^(\d{2})\/(\d{2})\/(\d{4}), (\d{2}):(\d{2}):(\d{2})$/.exec(written)
  if (!match) throw new CalcInputError('timeZone.unknown', `The time zone ${timeZone} could not be read.`, { path: 'timeZone' })
  const [, day, month, year, hour, minute, second] = match.map(Number) as [number, number, number, number, number, number, number]
  return Date.UTC(year, month - 1, day, hour, minute, second) - Math.floor(atMs / 1000) * 1000
}

function formatterOf(timeZone: string): Intl.DateTimeFormat {
  const known = formatters.get(timeZone)
  if (known) return known
  try {
    const formatter = new Intl.DateTimeFormat('en-GB', { timeZone, hourCycle: 'h23', year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit', second: '2-digit' })
    formatters.set(timeZone, formatter)
    return formatter
  }
  catch {
    throw new CalcInputError('timeZone.unknown', `The time zone ${timeZone} is not known. Give its name, for example Europe/London.`, { path: 'timeZone', received: timeZone })
  }
}
