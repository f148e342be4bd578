/** Fields that several inputs share, each with the sentence that is shown when it is not as expected. */
import { z } from 'zod'

export const number = (what: string, unit: string, low: number, high: number) =>
  z.number({ error: issue => issue.input === undefined ? `Give ${what} in ${unit}.` : `${capital(what)} must be a number in ${unit}.` })
    .min(low, `${capital(what)} must be at least ${low} ${unit}.`)
    .max(high, `${capital(what)} must be at most ${high.toLocaleString('en-GB')} ${unit}.`)

function capital(text: string) {
  return text.charAt(0).toUpperCase() + text.slice(1)
}

// Control characters, and those that turn the direction of writing: on a sheet they could reorder an amount beside a name.
const UNSEEN = /[\p{Cc}\u200E\u200F\u202A-\u202E\u2066-\u2069]+/gu

export const text = (what: string, most: number) =>
  z.string({ error: `${capital(what)} must be text.` }).overwrite(value => value.replace(UNSEEN, ' ')).trim().max(most, `${capital(what)} can have at most ${most} characters.`)

export const CalendarDate = z.string({ error: 'Give the date as YYYY-MM-DD, for example 2026-12-03.' }).refine((value) => {
  const match = /^(\d{4})-(\d{2})-(\d{2})$/.exec(value)
  if (!match) return false
  const date = new Date(`${value}T00:00:00Z`)
  return !Number.isNaN(date.getTime()) && date.toISOString().slice(0, 10) === value
}, 'This date does not exist. Give it as YYYY-MM-DD, for example 2026-12-03.')

export const Instant = z.string({ error: 'Give the start as a date and time with its offset, for example 2026-12-03T18:00:00Z.' }).refine((value) => {
  const match = /^(\d{4}-\d{2}-\d{2})T\d{2}:\d{2}(:\d{2}(\.\d{1,3})?)?(Z|[+-]\d{2}:\d{2})$/.exec(value)
  // Time zones are only known for our own times.
  return match !== null && value >= '2000' && value < '2101' && CalendarDate.safeParse(match[1]).success && !Number.isNaN(Date.parse(value))
}, 'The start must be a date and time that exists, with its offset, for example 2026-12-03T18:00:00Z.')

export const ClockTime = z.string({ error: 'Give a clock time as HH:MM, for example 07:30.' })
  .regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Give a clock time as HH:MM, for example 07:30.')

// Asking the runtime for a zone costs more than checking the rest of the input; there are only some hundred of them.
const knownZones = new Set<string>()

function isTimeZone(zone: string): boolean {
  if (knownZones.has(zone)) return true
  try {
    new Intl.DateTimeFormat('en-GB', { timeZone: zone })
  }
  catch { return false }
  if (knownZones.size < 1000) knownZones.add(zone)
  return true
}

export const TimeZone = z.string({ error: 'Give the time zone by name, for example Europe/London.' }).max(64)
  .refine(isTimeZone, 'This time zone is not known. Give its name, for example Europe/London.')

/** A list asked for page by page. Sorting is by a named column, with a minus in front for the other way round. */
export function listQuery<Column extends string>(columns: readonly [Column, ...Column[]], usual: Column | `-${Column}`) {
  const sorts = columns.flatMap(column => [column, `-${column}` as const])
  return z.object({
    page: z.coerce.number({ error: 'The page must be a whole number.' }).int('The page must be a whole number.').min(1, 'Pages begin at 1.').max(100_000).default(1),
    pageSize: z.coerce.number({ error: 'The page size must be a whole number.' }).int('The page size must be a whole number.').min(1, 'A page has at least 1 row.').max(100, 'A page has at most 100 rows.').default(25),
    sort: z.enum(sorts as [string, ...string[]], { error: `Sort by one of: ${columns.join(', ')}; with a minus in front for the other way round.` }).default(usual),
    q: text('the search', 100).default(''),
  })
}

/** An e-mail address as it is kept: trimmed, in lower case. */
export const Email = z.string({ error: 'Give an e-mail address.' }).trim().toLowerCase().max(254, 'An e-mail address has at most 254 characters.')
  .refine(value => /^[^\s@<>"]+@[^\s@<>"]+\.[^\s@<>".]+$/.test(value), 'This is no e-mail address: it needs a name, an @ and a place, for example mara@rescue.example.')

/** Secrets out of links. */
export const Token = z.string({ error: 'The link is incomplete. Open it again from the mail.' }).min(20, 'The link is incomplete. Open it again from the mail.').max(200, 'The link is too long. Open it again from the mail.')

export const RowId = z.string().min(1).max(64)
