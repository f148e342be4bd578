import { getRequestURL, setResponseHeader, type H3Event } from 'h3'
import type { RegimenInput, SheetQuery } from '#shared/schemas/regimen'
import type { Plan, SavedRegimen } from '#shared/types/plan'
import { fail } from '../http/fail'
import { labelPdf, mixingPdf, sheetPdf } from '../print'
import { SheetRefusedError, type PrintOptions } from '../print/options'

const PAPERS_OF = { sheet: sheetPdf, mixing: mixingPdf, label: labelPdf } as const
export type PdfKind = keyof typeof PAPERS_OF

/** What is printed: a saved version with the key of its link, or a plan nobody saved. */
export interface Printed { plan: Plan, input: RegimenInput, saved?: { regimen: SavedRegimen, key: string | undefined } }

/** Answers a plan as a PDF. A sheet that would not say all a carer needs is refused with the list of what is missing. */
export async function sendPdf(event: H3Event, kind: PdfKind, printed: Printed, query: SheetQuery): Promise<Buffer> {
  try {
    const pdf = await PAPERS_OF[kind](printed.plan, optionsOf(event, printed, query))
    const name = printed.saved ? `${printed.saved.regimen.id}-${printed.saved.regimen.version}` : 'preview'
    setResponseHeader(event, 'content-type', 'application/pdf')
    setResponseHeader(event, 'content-disposition', `inline; filename="thimbleful-${kind}-${name}.pdf"`)
    setResponseHeader(event, 'cache-control', 'private, no-store')
    return pdf
  }
  catch (error) {
    if (!(error instanceof SheetRefusedError)) throw error
    throw fail({ status: 422, code: 'sheet.incomplete', message: error.message, issues: error.missing.map(message => ({ path: 'sheet', message })) })
  }
}

function optionsOf(event: H3Event, { plan, input, saved }: Printed, query: SheetQuery): PrintOptions {
  return {
    paper: query.paper,
    days: daysOf(query.days, plan.days.length),
    reference: saved ? { id: saved.regimen.id, version: saved.regimen.version, latestVersion: saved.regimen.latestVersion, createdAt: saved.regimen.createdAt, url: linkOf(event, saved.regimen.id, saved.key) } : null,
    contacts: input.contacts ?? [],
    teamName: input.teamName,
    appVersion: useRuntimeConfig().public.appVersion,
    madeAt: new Date().toISOString(),
  }
}

/** "1-3" or "2", cut to the days the plan has and to a week. */
function daysOf(written: string, planDays: number): { from: number, to: number } {
  const [from = 1, to = from] = written.split('-').map(Number)
  const first = Math.min(Math.max(1, from), planDays)
  return { from: first, to: Math.min(Math.max(first, to), first + 6, planDays) }
}

/** Address of a plan's page. Without the key it opens only in a browser that remembers the plan. */
export function linkOf(event: H3Event, id: string, key: string | undefined): string {
  const url = new URL(`/plans/${id}`, getRequestURL(event).origin)
  if (key) url.searchParams.set('key', key)
  return url.href
}
