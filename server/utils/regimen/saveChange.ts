import type { H3Event } from 'h3'
import type { z } from 'zod'
import type { RegimenChange } from '#shared/schemas/regimen'
import type { OpenedRegimen } from '../access/requireRegimen'
import { database, findRegimen, insertRegimenVersion, RegimenChangedError } from '../data'
import { fail } from '../http/fail'
import { approvalLapsedMail } from '../mail/templates'
import { serverOrigin } from '../team/serverOrigin'
import { tellRoles } from '../team/tell'
import { changedMeanwhile } from './changes'
import { planOf } from './planOf'

/**
 * A new version on top of the one its author saw.
 * @returns its number. @throws 409 `regimen.changed` with what changed and by whom, or `plan.ended`; 400 for a team's plan without `baseVersion`.
 */
export function saveChange(event: H3Event, { row, actor, member }: OpenedRegimen, { baseVersion, note, ...input }: z.output<typeof RegimenChange>): number {
  if (row.teamId && baseVersion === undefined) {
    const message = 'Say which version this change is based on, so that nobody\'s work is written over.'
    throw fail({ status: 400, code: 'input.invalid', message, issues: [{ path: 'baseVersion', message }] })
  }
  if (row.endedAt) throw fail({ status: 409, code: 'plan.ended', message: 'This plan has ended. Begin a new one from the planner.' })
  const plan = planOf(input)
  const at = new Date().toISOString()
  try {
    return insertRegimenVersion(database(), { id: row.id, baseVersion, actor, at, input, plan, note }, (tx, lapsed) => {
      if (!member || lapsed.length === 0) return
      // Whoever approved it hears that their name no longer stands under what is given.
      tellRoles(tx, member.teamId, ['vet'], member.user.id, approvalLapsedMail({ animal: row.animalName || row.speciesName, version: lapsed[0]!.version, reason: lapsed[0]!.lapseReason ?? '', link: `${serverOrigin(event)}/plans/${row.id}` }, { teamName: member.team.name }), at)
    })
  }
  catch (error) {
    if (!(error instanceof RegimenChangedError)) throw error
    throw changedMeanwhile(findRegimen(database(), row.id)!, baseVersion ?? 0)
  }
}
