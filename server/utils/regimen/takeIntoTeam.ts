import type { H3Event } from 'h3'
import type { RegimenInput } from '#shared/schemas/regimen'
import { forgetGuestPlan, guestPlansOf } from '../access/guestPlans'
import type { Member } from '../access/requireMember'
import { isOpen, regimenNotFound } from '../access/requireRegimen'
import { database, findRegimen, findRegimenVersion, listedOf, takeRegimen } from '../data'
import { newestPlan } from './teamPlan'

/** A guest's plan that this browser remembers becomes the team's, as a draft. @returns its id. @throws 404 `regimen.notFound`. */
export async function takeIntoTeam(event: H3Event, { teamId, actor }: Member, id: string): Promise<string> {
  const db = database()
  const known = (await guestPlansOf(event)).find(one => one.id === id)
  const row = findRegimen(db, id)
  const now = new Date()
  if (!known || !row || row.demo || row.teamId !== null || !isOpen(row, known.key, now)) throw regimenNotFound()
  const input = JSON.parse(findRegimenVersion(db, id, row.latestVersion)!.inputJson) as RegimenInput
  if (!takeRegimen(db, { id, teamId, at: now.toISOString(), actor, listed: listedOf(input, newestPlan(row)) })) throw regimenNotFound()
  await forgetGuestPlan(event, id)
  return id
}
