import type { Plan } from '#shared/types/plan'
import { PLAN_STATE_LABELS, LIFE_STEPS, type LifeStep, type Standing } from '#shared/types/planLife'
import type { ApprovalRecord, RegimenRow } from '#shared/types/rows'
import { can, type Ability, type Role } from '#shared/utils/abilities'
import { formatDay } from '#shared/utils/calendar'
import type { LifeChange } from '../data'
import { approvalFor, standingOf } from './standingOf'
import { todayInZone } from './whenInZone'

/** A step that cannot be taken now, and why, in the words the person reads. */
export class PlanStepError extends Error {
  constructor(readonly status: 403 | 409 | 422, readonly code: string, message: string) {
    super(message)
    this.name = 'PlanStepError'
  }
}

/** Who takes the step, on what, when. */
export interface StepAsked {
  row: RegimenRow
  plan: Plan
  approval: ApprovalRecord | null
  approvalRequired: boolean
  who: { id: string, name: string, role: Role, registration: string }
  now: Date
}

/** The ability that each step asks for. */
export const STEP_ABILITIES: Record<LifeStep, Ability> = {
  'ask-check': 'plan.edit', 'check': 'plan.check', 'ask-approval': 'plan.edit', 'approve': 'plan.approve',
  'send-back': 'plan.check', 'use': 'plan.use', 'finish': 'plan.use', 'stop': 'plan.use',
}

/**
 * What a step does to a plan, or why it cannot be taken. Pure: the same plan, person and moment give the same answer,
 * for the button as for the route.
 *
 * @param text  note, or the reason where the step asks for one.
 * @throws PlanStepError `plan.step` (not in this state, 409), `plan.sameHand` (403), `plan.noRegistration`, `plan.staleWeight`, `plan.needsApproval` (422).
 */
export function decideStep(step: LifeStep, asked: StepAsked, text: string): LifeChange {
  const { row, plan, who, now } = asked
  const at = now.toISOString()
  const standing = standingNow(asked)
  const only = (open: boolean, why: string) => {
    if (!open) throw new PlanStepError(409, 'plan.step', why)
  }
  const notFrom = `This plan is ${stateInWords(row, standing)}.`
  const rest = { waiting: null, waitingSince: null, askedBy: null }

  switch (step) {
    case 'ask-check':
      only(row.state === 'draft' && row.waiting !== 'check', row.waiting === 'check' ? 'It waits for a check already.' : `${notFrom} Only a draft waits for a check.`)
      return { action: 'plan.askCheck', reason: text, set: { waiting: 'check', waitingSince: at, askedBy: who.name } }
    case 'check':
      only(row.state === 'draft', `${notFrom} Only a draft can be checked.`)
      if (row.draftedById === who.id) throw new PlanStepError(403, 'plan.sameHand', 'You drafted this version, so somebody else has to check it.')
      return { action: 'plan.check', reason: text, set: { ...rest, state: 'checked', checkedById: who.id, checkedBy: who.name, checkedAt: at, sentBackJson: null } }
    case 'ask-approval':
      only(row.checkedAt !== null && standing.state === 'none' && row.waiting !== 'approval' && row.endedAt === null, row.waiting === 'approval' ? 'It waits for approval already.' : `${notFrom} It has to be checked first.`)
      return { action: 'plan.askApproval', reason: text, set: { waiting: 'approval', waitingSince: at, askedBy: who.name } }
    case 'approve':
      only(row.checkedAt !== null && standing.state === 'none' && row.endedAt === null, standing.state === 'approved' ? 'It is approved already.' : standing.state === 'lapsed' ? 'This version was approved and that lapsed. Weigh the animal and save a new version.' : `${notFrom} Somebody who did not draft it has to check it first.`)
      if (who.registration.trim() === '') throw new PlanStepError(422, 'plan.noRegistration', 'Put your registration on your profile first: it stands beside your name on the sheet.')
      refuseStaleWeight(plan, now, 'approve')
      return { action: 'plan.approve', reason: text, set: { ...rest, sentBackJson: null, ...(row.state === 'in-use' ? {} : { state: 'approved' as const }) }, approval: approvalFor(plan, row.latestVersion, { ...who, id: who.id.replace(/^user:/, '') }, text, at) }
    case 'send-back':
      only(row.waiting !== null || row.state === 'checked' || row.state === 'approved', `${notFrom} There is nothing to send back.`)
      if (row.state !== 'draft' && row.waiting !== 'check' && !can(who.role, 'plan.approve') && !(row.state === 'checked' && row.checkedById === who.id)) throw new PlanStepError(403, 'plan.sendBack', 'It is with a vet now: a vet sends it back, or whoever checked it.')
      return { action: 'plan.sendBack', reason: text, set: { ...rest, state: row.state === 'in-use' ? 'in-use' : 'draft', checkedById: null, checkedBy: null, checkedAt: null, sentBackJson: JSON.stringify({ by: who.name, at, reason: text }) }, lapse: `Sent back by ${who.name}: ${text}` }
    case 'use':
      only(row.state === 'draft' || row.state === 'checked' || row.state === 'approved', notFrom)
      if (asked.approvalRequired && standing.state !== 'approved') throw new PlanStepError(422, 'plan.needsApproval', standing.state === 'lapsed' ? `Its approval lapsed. ${standing.line}` : 'In this team a plan is used only when a vet has approved it.')
      refuseStaleWeight(plan, now, 'use')
      return { action: 'plan.use', reason: text, set: { state: 'in-use' } }
    case 'finish':
      only(row.state === 'in-use', `${notFrom} Only a plan in use can be finished.`)
      return { action: 'plan.finish', reason: text, set: { ...rest, state: 'finished', endedAt: at, endedReason: text }, lapse: 'The plan is finished.' }
    case 'stop':
      only(row.endedAt === null, notFrom)
      return { action: 'plan.stop', reason: text, set: { ...rest, state: 'stopped', endedAt: at, endedReason: text }, lapse: `Stopped: ${text}` }
  }
}

/** Steps a person may take now, in the order of buttons, and why others of their role are not open yet. */
export function openSteps(asked: StepAsked): { steps: LifeStep[], notYet: Partial<Record<LifeStep, string>> } {
  const steps: LifeStep[] = []
  const notYet: Partial<Record<LifeStep, string>> = {}
  for (const step of LIFE_STEPS.filter(one => can(asked.who.role, STEP_ABILITIES[one]))) {
    try {
      decideStep(step, asked, 'asked only to know')
      steps.push(step)
    }
    catch (error) {
      if (!(error instanceof PlanStepError)) throw error
      if (error.code !== 'plan.step') notYet[step] = error.message
    }
  }
  return { steps, notYet }
}

export function standingNow({ row, plan, approval, now }: Pick<StepAsked, 'row' | 'plan' | 'approval' | 'now'>): Standing {
  return standingOf(approval, { version: row.latestVersion, timeZone: plan.timeZone, now })
}

function stateInWords(row: RegimenRow, standing: Standing): string {
  return `${PLAN_STATE_LABELS[row.state].toLowerCase()}${standing.state === 'lapsed' ? ', and its approval lapsed' : ''}`
}

function refuseStaleWeight(plan: Plan, now: Date, what: 'approve' | 'use'): void {
  if (todayInZone(now, plan.timeZone) <= plan.validity.goodUntil) return
  throw new PlanStepError(422, 'plan.staleWeight', `Its weight was good until ${formatDay(plan.validity.goodUntil)}. Weigh the animal and save a new version, then ${what} that.`)
}
