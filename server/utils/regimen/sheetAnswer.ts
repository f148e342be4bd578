import type { Plan } from '#shared/types/plan'
import type { SheetAnswer, SheetAnswerCode } from '#shared/types/planLife'
import type { ApprovalRecord, RegimenRow } from '#shared/types/rows'
import { formatDay } from '#shared/utils/calendar'
import { standingOf } from './standingOf'
import { todayInZone } from './whenInZone'

export interface SheetAsked {
  row: RegimenRow
  /** The plan of the version on the sheet in the hand. */
  plan: Plan
  version: number
  approval: ApprovalRecord | null
  approvalRequired: boolean
  /** Who to ring, as it stands on the sheet; empty where nobody is named. */
  call: string
  now: Date
}

/**
 * What the code on a sheet answers, before anything else: may I go on feeding from this paper? Where it is not sure, no.
 */
export function sheetAnswer(asked: SheetAsked): SheetAnswer {
  const { row, plan, version, now } = asked
  const zone = plan.timeZone
  const standing = standingOf(asked.approval, { version: row.latestVersion, timeZone: zone, now })
  const day = (instant: string) => formatDay(todayInZone(new Date(instant), zone))
  const ask = asked.call ? `Call ${asked.call}.` : 'Ask who runs the enclosure.'
  const answer = (code: SheetAnswerCode, title: string, message: string): SheetAnswer => ({ code, title, message, good: code === 'current', version, latestVersion: row.latestVersion })

  if (row.movedAt) return answer('moved', `This animal was handed over on ${day(row.movedAt)}`, `Do not feed from this sheet. Another team cares for it now. ${ask}`)
  if (row.state === 'stopped') return answer('stopped', `This plan was stopped on ${day(row.endedAt ?? row.updatedAt)}`, `Do not feed from this sheet.${row.endedReason ? ` Why: ${row.endedReason}${/[.?]$/.test(row.endedReason) ? '' : '.'}` : ''} ${ask}`)
  if (row.state === 'finished') return answer('finished', `This plan was finished on ${day(row.endedAt ?? row.updatedAt)}`, `Take this sheet down. ${ask}`)
  const good = standing.state === 'approved' || (!asked.approvalRequired && standing.state === 'none')
  if (version < row.latestVersion) {
    return answer('replaced', `Replaced by version ${row.latestVersion} on ${day(row.updatedAt)}`, good
      ? `Print version ${row.latestVersion} and take this one down.`
      : `Take this one down. Version ${row.latestVersion} is not approved yet: before the next feed, ${ask.charAt(0).toLowerCase()}${ask.slice(1)}`)
  }
  if (standing.state === 'lapsed') return answer('lapsed', 'The approval of this sheet has lapsed', `Do not feed from it. ${standing.line} ${ask}`)
  if (todayInZone(now, zone) > plan.validity.goodUntil) return answer('out-of-date', 'The weight behind this sheet is too old', `It was good until ${formatDay(plan.validity.goodUntil)}. Weigh the animal and get a new sheet before the next feed.`)
  if (!good) return answer('not-approved', 'This sheet is not approved yet', `In this team a vet approves first. Do not feed from it. ${ask}`)
  return answer('current', 'This sheet is current', standing.state === 'approved' ? standing.line : `Version ${version} is the newest. No vet has approved it; this team works without.`)
}
