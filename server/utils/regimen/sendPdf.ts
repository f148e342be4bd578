import { setResponseHeader, type H3Event } from 'h3'
import type { RegimenInput, SheetQuery } from '#shared/schemas/regimen'
import type { TeamSettings } from '#shared/schemas/team'
import type { Plan, SavedRegimen } from '#shared/types/plan'
import type { RegimenRow, TeamRecord } from '#shared/types/rows'
import { sheetCodeOf } from '../access/linkKey'
import { settingsOf } from '../access/requireMember'
import { database, findApproval, findTeam } from '../data'
import { fail } from '../http/fail'
import { labelPdf, mixingPdf, packetPdf, sheetPdf } from '../print'
import { SheetRefusedError, type PrintContact, type PrintOptions } from '../print/options'
import { serverOrigin } from '../team/serverOrigin'
import { serverSecret } from '../team/secrets'
import { sheetAnswer } from './sheetAnswer'
import { standingOf } from './standingOf'
import { versionOf } from './versionOf'

const PAPERS_OF = { sheet: sheetPdf, mixing: mixingPdf, label: labelPdf, packet: packetPdf } as const
export type PdfKind = keyof typeof PAPERS_OF

/** What is printed: a saved version with the key of its link, or a plan nobody saved. */
export interface Printed { plan: Plan, input: RegimenInput, saved?: { row: RegimenRow, regimen: SavedRegimen, key: string | undefined } }

/** Prints one version of a saved plan exactly as it was saved. */
export function sendSavedPdf(event: H3Event, kind: PdfKind, row: RegimenRow, query: SheetQuery): Promise<Buffer> {
  const regimen = versionOf(row, query.version)
  return sendPdf(event, kind, { plan: regimen.plan, input: regimen.input, saved: { row, regimen, key: query.key } }, query)
}

/** Answers a plan as a PDF. A sheet that would not say all a carer needs is refused with the list of what is missing. */
export async function sendPdf(event: H3Event, kind: PdfKind, printed: Printed, query: SheetQuery): Promise<Buffer> {
  try {
    const pdf = await PAPERS_OF[kind](printed.plan, printOptions(event, printed, query))
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

/** Everything on paper that is not the plan itself: of a team's plan, also whether a vet stands behind it now. */
export function printOptions(event: H3Event, { plan, input, saved }: Printed, query: Pick<SheetQuery, 'paper' | 'days'>): PrintOptions {
  const team = saved?.row.teamId ? findTeam(database(), saved.row.teamId) : undefined
  const settings = team && settingsOf(team)
  return {
    paper: query.paper ?? settings?.paper ?? 'a4',
    days: daysOf(query.days, plan.days.length),
    reference: saved ? { id: saved.regimen.id, version: saved.regimen.version, latestVersion: saved.regimen.latestVersion, createdAt: saved.regimen.createdAt, url: team ? sheetLink(event, saved.regimen) : linkOf(event, saved.regimen.id, saved.key) } : null,
    contacts: settings ? contactsOf(settings, input) : input.contacts ?? [],
    teamName: team ? [team.name, settings?.address].filter(Boolean).join(', ') : input.teamName,
    appVersion: useRuntimeConfig().public.appVersion,
    madeAt: new Date().toISOString(),
    ...(saved && team && settings && lifeOnPaper(saved.row, plan, saved.regimen.version, team, settings)),
  }
}

/** Contacts of the team, then the first of its ladder: one number is printed. A team without any prints those of the plan. */
export function contactsOf(settings: TeamSettings, input: RegimenInput): PrintContact[] {
  const own = [...settings.contacts, ...settings.ladder.slice(0, 1)]
  return own.length > 0 ? own : input.contacts ?? []
}

function lifeOnPaper(row: RegimenRow, plan: Plan, version: number, team: TeamRecord, settings: TeamSettings): Pick<PrintOptions, 'approval' | 'lifeNote'> {
  const now = new Date()
  const approval = findApproval(database(), row.id, version) ?? null
  const answer = sheetAnswer({ row, plan, version, approval, approvalRequired: settings.approvalRequired, call: '', now })
  const isOver = answer.code === 'stopped' || answer.code === 'finished' || answer.code === 'moved'
  return { approval: standingOf(approval, { version, timeZone: plan.timeZone, now }), ...(isOver && { lifeNote: `${answer.title}. Do not use this sheet.` }) }
}

/** "1-3" or "2", cut to the days the plan has and to a week. */
function daysOf(written: string, planDays: number): { from: number, to: number } {
  const [from = 1, to = from] = written.split('-').map(Number)
  const first = Math.min(Math.max(1, from), planDays)
  return { from: first, to: Math.min(Math.max(first, to), first + 6, planDays) }
}

/** Address of a plan's page. Without the key it opens only in a browser that remembers the plan. */
export function linkOf(event: H3Event, id: string, key: string | undefined): string {
  const url = new URL(`/plans/${id}`, serverOrigin(event))
  if (key) url.searchParams.set('key', key)
  return url.href
}

/** Address in the square code of a team's sheet: it answers for that version, to anyone who holds the paper. */
function sheetLink(event: H3Event, { id, version }: Pick<SavedRegimen, 'id' | 'version'>): string {
  const url = new URL(`/sheet/${id}`, serverOrigin(event))
  url.searchParams.set('version', String(version))
  url.searchParams.set('code', sheetCodeOf(serverSecret(), id, version))
  return url.href
}
