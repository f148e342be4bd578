import type { z } from 'zod'
import type { RegimenChange } from '#shared/schemas/regimen'
import type { OpenedRegimen } from '../access/requireRegimen'
import { database, findRegimen, insertRegimenVersion, RegimenChangedError } from '../data'
import { fail } from '../http/fail'
import { changedMeanwhile } from './changes'
import { planOf } from './planOf'

/**
 * A new version on top of the one its author saw.
 * @returns its number. @throws 409 `regimen.changed` with what changed and by whom, or `plan.ended`; 400 for a team's plan without `baseVersion`.
 */
export function saveChange({ row, actor }: OpenedRegimen, { baseVersion, note, ...input }: z.output<typeof RegimenChange>): number {
  if (row.teamId && baseVersion === undefined) {
    const message = 'Say which version this change is based on, so that nobody\'s work is written over.'
    throw fail({ status: 400, code: 'input.invalid', message, issues: [{ path: 'baseVersion', message }] })
  }
  if (row.endedAt) throw fail({ status: 409, code: 'plan.ended', message: 'This plan has ended. Begin a new one from the planner.' })
  const plan = planOf(input)
  try {
    return insertRegimenVersion(database(), { id: row.id, baseVersion, actor, at: new Date().toISOString(), input, plan, note })
  }
  catch (error) {
    if (!(error instanceof RegimenChangedError)) throw error
    throw changedMeanwhile(findRegimen(database(), row.id)!, baseVersion ?? 0)
  }
}
