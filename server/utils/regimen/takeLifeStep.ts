import type { H3Event } from 'h3'
import type { TeamPlanInfo, LifeStep } from '#shared/types/planLife'
import type { RegimenRow } from '#shared/types/rows'
import { formatDay } from '#shared/utils/calendar'
import { formatWeightG } from '#shared/utils/quantity'
import type { OpenedRegimen } from '../access/requireRegimen'
import type { Member } from '../access/requireMember'
import { database, findApproval, findRegimenVersion, findUser, stepRegimen, type Writer } from '../data'
import { fail } from '../http/fail'
import { approvalAskedMail, approvedMail, checkAskedMail, sentBackMail } from '../mail/templates'
import { serverOrigin } from '../team/serverOrigin'
import { queueMail, tellRoles } from '../team/tell'
import { changedMeanwhile, changesSince } from './changes'
import { decideStep, PlanStepError } from './planLife'
import { newestPlan, stepAsked, teamInfo } from './teamPlan'

/**
 * Takes a step in a plan's life and tells those it concerns, in one transaction.
 * @throws 409 when the version on the person's screen is no longer the newest, and what `decideStep` refuses.
 */
export function takeLifeStep(event: H3Event, { row, member }: OpenedRegimen & { member: Member }, step: LifeStep, input: { version: number, note?: string, reason?: string }): TeamPlanInfo {
  const now = new Date()
  const at = now.toISOString()
  const text = input.reason ?? input.note ?? ''
  try {
    const changed = stepRegimen(database(), { teamId: member.teamId, id: row.id, at, actor: member.actor }, (_tx, current, approval) => {
      if (current.latestVersion !== input.version) throw changedMeanwhile(current, input.version)
      return decideStep(step, { ...stepAsked(current, newestPlan(current), member, now), approval }, text)
    }, (tx, after) => tell(tx, event, step, after, member, text, at))
    return teamInfo(changed, member, now)
  }
  catch (error) {
    if (!(error instanceof PlanStepError)) throw error
    throw fail({ status: error.status, code: error.code, message: error.message })
  }
}

/** The mails that a step sends. */
function tell(tx: Writer, event: H3Event, step: LifeStep, row: RegimenRow, member: Member, text: string, at: string): void {
  const plan = newestPlan(row)
  const animal = row.animalName || row.speciesName
  const link = `${serverOrigin(event)}/plans/${row.id}`
  const about = { animal, version: row.latestVersion, link }
  const from = { teamName: member.team.name }
  const me = member.user.id
  if (step === 'ask-check') tellRoles(tx, member.teamId, ['technician', 'vet', 'coordinator'], me, checkAskedMail({ ...about, askedBy: member.user.name }, from), at)
  if (step === 'ask-approval') {
    const lastApproved = findApproval(tx, row.id)?.version
    const changed = lastApproved && lastApproved < row.latestVersion && findRegimenVersion(tx, row.id, lastApproved) ? changesSince(row.id, lastApproved, row.latestVersion).map(line => line.text) : []
    tellRoles(tx, member.teamId, ['vet'], me, approvalAskedMail({ ...about, caseNumber: row.caseNumber, species: row.speciesName, askedBy: member.user.name, link: `${link}/approve`, weight: `${formatWeightG(plan.animal.weightG)}, weighed ${formatDay(plan.animal.weighedOn)}`, changed: changed.slice(0, 30) }, from), at)
  }
  if (step === 'approve') tellPeople(tx, row, member, approvedMail({ ...about, vet: member.user.name, note: text, until: formatDay(plan.validity.goodUntil) }, from), at)
  if (step === 'send-back') tellPeople(tx, row, member, sentBackMail({ ...about, by: member.user.name, reason: text }, from), at)
}

/** Whoever drafted this version. */
function tellPeople(tx: Writer, row: RegimenRow, member: Member, mail: ReturnType<typeof sentBackMail>, at: string): void {
  const drafter = row.draftedById?.startsWith('user:') ? findUser(tx, row.draftedById.slice(5)) : undefined
  if (drafter && drafter.id !== member.user.id) queueMail(tx, member.teamId, drafter.email, mail, at)
}
