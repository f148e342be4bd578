import type { Plan } from '#shared/types/plan'
import type { PlanRow, TeamPlanInfo } from '#shared/types/planLife'
import type { RegimenRow } from '#shared/types/rows'
import { can } from '#shared/utils/abilities'
import type { Member } from '../access/requireMember'
import { database, findApproval, findRegimenVersion, type ListedPlan } from '../data'
import { openSteps, standingNow, type StepAsked } from './planLife'
import { approvalOf, standingOf } from './standingOf'

/** The plan of the newest version. */
export function newestPlan(row: RegimenRow): Plan {
  return JSON.parse(findRegimenVersion(database(), row.id, row.latestVersion)!.planJson) as Plan
}

export function stepAsked(row: RegimenRow, plan: Plan, member: Member, now: Date): StepAsked {
  const { user, role, settings, actor } = member
  return { row, plan, approval: findApproval(database(), row.id) ?? null, approvalRequired: settings.approvalRequired, who: { ...actor, role, registration: user.registration }, now }
}

/** What a member sees of a plan's life, and the steps open to them now. */
export function teamInfo(row: RegimenRow, member: Member, now = new Date()): TeamPlanInfo {
  const asked = stepAsked(row, newestPlan(row), member, now)
  const { role } = member
  const ended = row.endedAt !== null
  return {
    state: row.state, waiting: row.waiting, waitingSince: row.waitingSince, askedBy: row.askedBy, draftedBy: row.draftedBy, checkedBy: row.checkedBy, checkedAt: row.checkedAt,
    sentBack: row.sentBackJson ? JSON.parse(row.sentBackJson) as TeamPlanInfo['sentBack'] : null,
    approval: asked.approval && approvalOf(asked.approval),
    standing: standingNow(asked),
    lastWeighIn: row.lastWeightG !== null && row.lastWeighedAt !== null ? { weightG: row.lastWeightG, weighedAt: row.lastWeighedAt } : null,
    ...openSteps(asked),
    mayEdit: can(role, 'plan.edit') && !ended, mayWeigh: can(role, 'plan.weigh') && !ended, mayTransfer: can(role, 'plan.transfer') && !ended, mayLink: can(role, 'link.make') && !ended,
  }
}

/** A row of the team's list. @param timeZone  of the team: days of a list are its days. */
export function planRow({ row, approval }: ListedPlan, timeZone: string, now: Date): PlanRow {
  const { id, latestVersion: version, animalName, caseNumber, speciesName, enclosure, room, weightG, goodUntil, state, waiting, waitingSince, askedBy, updatedAt, draftedBy: updatedBy, demo } = row
  return { id, version, animalName, caseNumber, speciesName, enclosure, room, weightG, goodUntil, state, waiting, waitingSince, askedBy, standing: standingOf(approval, { version, timeZone, now }), updatedAt, updatedBy, ...(demo && { demo }) }
}
