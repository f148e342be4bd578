import type { H3Event } from 'h3'
import type { SheetLook } from '#shared/types/sheet'
import type { RegimenRow } from '#shared/types/rows'
import { takeAttempt } from '../access/attempts'
import { visitOf } from '../access/helperVisit'
import { sheetCodeFits } from '../access/linkKey'
import { settingsOf } from '../access/requireMember'
import { whoIs } from '../access/signedIn'
import { database, findApproval, findRegimen, findTeam } from '../data'
import { fail } from '../http/fail'
import { sheetOnScreen } from '../print'
import { SheetRefusedError } from '../print/options'
import { serverSecret } from '../team/secrets'
import { contactsOf, printOptions } from './sendPdf'
import { sheetAnswer } from './sheetAnswer'
import { versionOf } from './versionOf'
import { todayInZone } from './whenInZone'

/**
 * Answers the code on a team's sheet: first whether the paper still holds, then what it shows, and nothing more. Members
 * and helpers on a visit need no code.
 * @throws 404 `sheet.notFound`: no such sheet, a wrong code, or a team that does not answer codes.
 */
export async function lookAtSheet(event: H3Event, id: string, asked: { version?: number, code?: string }): Promise<SheetLook> {
  const row = findRegimen(database(), id)
  const team = row?.teamId ? findTeam(database(), row.teamId) : undefined
  const isMember = row?.teamId !== undefined && (await whoIs(event))?.member?.teamId === row?.teamId
  const isOpen = isMember || (row !== undefined && await isOnVisit(event, row)) || (asked.code !== undefined && codeOpens(event, id, asked, team !== undefined && settingsOf(team).sheetCodes))
  if (!row || !team || !isOpen) throw fail({ status: 404, code: 'sheet.notFound', message: 'There is no sheet behind this code. Scan it again; if it stays, do not feed from the paper, and ask who put it up.' })

  const regimen = versionOf(row, asked.version)
  const { plan, input, version } = regimen
  const settings = settingsOf(team)
  const [first] = contactsOf(settings, input)
  const call = first ? [first.name || first.role, first.phone].filter(Boolean).join(', ') : ''
  const now = new Date()
  const answer = sheetAnswer({ row, plan, version, approval: findApproval(database(), id, row.latestVersion) ?? null, approvalRequired: settings.approvalRequired, call, now })
  const days = daysAround(plan.days.map(day => day.date), todayInZone(now, plan.timeZone))
  return { answer, sheet: sheetOf(() => sheetOnScreen(plan, printOptions(event, { plan, input, saved: { row, regimen, key: undefined } }, { days }))), planId: isMember ? id : null }
}

async function isOnVisit(event: H3Event, row: RegimenRow): Promise<boolean> {
  return (await visitOf(event))?.regimens.some(one => one.id === row.id) ?? false
}

/** A code is tried, so wrong ones are counted. */
function codeOpens(event: H3Event, id: string, { version, code }: { version?: number, code?: string }, isAnswered: boolean): boolean {
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  if (!version || !code || !sheetCodeFits(serverSecret(), id, version, code)) return false
  right()
  return isAnswered
}

const DAYS_SHOWN = 3

/** Today and the days after it, as the paper would hold them; the last ones of a plan that is over. */
function daysAround(dates: string[], today: string): string {
  const found = dates.findIndex(date => date >= today)
  const from = Math.max(0, Math.min(found === -1 ? dates.length - 1 : found, dates.length - 1))
  return `${from + 1}-${Math.min(dates.length, from + DAYS_SHOWN)}`
}

function sheetOf(make: () => ReturnType<typeof sheetOnScreen>): SheetLook['sheet'] {
  try {
    return make()
  }
  catch (error) {
    if (error instanceof SheetRefusedError) return null
    throw error
  }
}
