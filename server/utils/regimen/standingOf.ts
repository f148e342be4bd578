import type { Plan } from '#shared/types/plan'
import type { Approval, Standing } from '#shared/types/planLife'
import type { ApprovalRecord } from '#shared/types/rows'
import { formatDay } from '#shared/utils/calendar'
import { formatWeightG } from '#shared/utils/quantity'
import { todayInZone, whenInZone } from './whenInZone'

export const NONE: Standing = { state: 'none', band: 'NOT APPROVED BY A VET', line: 'No vet has approved this version.' }

/**
 * Whether an approval holds for a version on a day. It names one version, its weight and its days; when any of the
 * three no longer fits, it has lapsed, whether or not that was written down yet.
 */
export function standingOf(approval: ApprovalRecord | null | undefined, asked: { version: number, timeZone: string, now: Date }): Standing {
  if (!approval || approval.version !== asked.version) return NONE
  const by = `${approval.vetName}${approval.registration ? ` (${approval.registration})` : ''}`
  const signed = `Approved by ${by}, ${whenInZone(approval.at, asked.timeZone)}: version ${approval.version}, ${formatWeightG(approval.weightG)}, until ${formatDay(approval.goodUntil)}.`
  const reason = approval.lapseReason ?? (todayInZone(asked.now, asked.timeZone) > approval.goodUntil ? dateReason(approval.goodUntil) : null)
  if (reason !== null) return { state: 'lapsed', band: 'APPROVAL LAPSED', line: `${reason} It was approved by ${by} on ${whenInZone(approval.at, asked.timeZone)}.` }
  return { state: 'approved', band: `Approved by ${approval.vetName}`, line: signed }
}

export function dateReason(goodUntil: string): string {
  return `Its weight was good until ${formatDay(goodUntil)}.`
}

export function approvalOf(record: ApprovalRecord): Approval {
  const { version, weightG, fromDate, goodUntil, edition, vetName, registration, note, at, lapsedAt, lapseReason } = record
  return { version, weightG, fromDate, goodUntil, edition, vetName, registration, note, at, lapsedAt, lapseReason }
}

/** What an approval of a plan names. */
export function approvalFor(plan: Plan, version: number, vet: { id: string, name: string, registration: string }, note: string, at: string): Omit<ApprovalRecord, 'id' | 'regimenId' | 'teamId' | 'lapsedAt' | 'lapseReason'> {
  return { version, weightG: plan.animal.weightG, fromDate: plan.days[0]!.date, goodUntil: plan.validity.goodUntil, edition: plan.edition, userId: vet.id, vetName: vet.name, registration: vet.registration, note, at }
}
