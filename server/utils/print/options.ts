import type { Paper } from '#shared/schemas/regimen'
import type { Standing } from '#shared/types/planLife'

/** The saved plan a sheet belongs to. */
export interface PrintReference {
  id: string
  version: number
  /** Higher than `version` when this one was replaced. */
  latestVersion: number
  /** Instant, ISO 8601. */
  createdAt: string
  /** Opens the plan; goes into the square code. */
  url: string
}

export interface PrintContact { role: string, name?: string, phone?: string }

export interface PrintOptions {
  paper: Paper
  /** Days of the plan, counted from 1, both included; at most seven. The first three when absent. */
  days?: { from: number, to: number }
  /** Null when the plan was not saved: the sheet then has no code. */
  reference?: PrintReference | null
  contacts?: PrintContact[]
  teamName?: string
  /** Whether a vet's approval holds for this version; nobody approved it when absent. */
  approval?: Standing
  /** What the life of the plan has to say before anything else: "This plan was stopped on Thu 3 Dec. Do not use this sheet." */
  lifeNote?: string
  appVersion: string
  /** Instant of printing, ISO 8601. */
  madeAt: string
}

export const MOST_DAYS = 7
const USUAL_DAYS = 3

/** The sheet would not say all that a carer needs; `missing` says what, one thing each, in plain words. */
export class SheetRefusedError extends Error {
  constructor(readonly missing: string[]) {
    super(`This sheet cannot be printed. It lacks: ${missing.join('; ')}.`)
    this.name = 'SheetRefusedError'
  }
}

/** @throws SheetRefusedError when the plan has no such days, or too many are asked for. */
export function chosenDays<T>(days: readonly T[], options: Pick<PrintOptions, 'days'>): T[] {
  const { from, to } = options.days ?? { from: 1, to: Math.min(USUAL_DAYS, days.length) }
  if (!Number.isInteger(from) || !Number.isInteger(to) || from < 1 || to < from) throw new SheetRefusedError([`days to print: from ${from} to ${to} is no span of days`])
  if (to - from + 1 > MOST_DAYS) throw new SheetRefusedError([`a span of at most ${MOST_DAYS} days: ${to - from + 1} were asked for`])
  if (from > days.length) throw new SheetRefusedError([`day ${from}: the plan has ${days.length} ${days.length === 1 ? 'day' : 'days'}`])
  return days.slice(from - 1, to)
}
