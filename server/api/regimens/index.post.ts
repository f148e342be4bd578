import { RegimenInput } from '#shared/schemas/regimen'
import type { SavedRegimenReceipt } from '#shared/types/plan'
import { rememberGuestPlan } from '#server/utils/access/guestPlans'
import { newLinkKey, newRegimenId } from '#server/utils/access/linkKey'
import { requireMember } from '#server/utils/access/requireMember'
import { whoIs } from '#server/utils/access/signedIn'
import { database, GUEST, insertRegimen } from '#server/utils/data'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { planOf } from '#server/utils/regimen/planOf'
import { linkOf } from '#server/utils/regimen/sendPdf'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'Saves a plan with its input, result and edition: into the team of whoever is signed in, or behind a private link', requestBody: { description: 'RegimenInput', content: { 'application/json': {} } }, responses: { 201: { description: '{ id, version, key, link }; the link of a guest works without an account for 30 days, a team\'s plan has no key' }, 400: { description: 'A field is not as expected' }, 403: { description: 'Signed in with a role that plans nothing' }, 422: { description: 'Understood, but impossible' } } } })

export default defineEventHandler(async (event): Promise<SavedRegimenReceipt> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await whoIs(event) ? await requireMember(event, 'plan.edit') : null
  const input = await readBodyOf(event, RegimenInput)
  const plan = planOf(input)
  const now = new Date()
  const id = newRegimenId()
  const { key, keyHash, linkExpiresAt } = newLinkKey(now)
  insertRegimen(database(), { id, keyHash, linkExpiresAt, teamId: member?.teamId, actor: member?.actor ?? GUEST, at: now.toISOString(), input, plan })
  setResponseStatus(event, 201)
  if (member) return { id, version: 1, key: '', link: linkOf(event, id, undefined) }
  await rememberGuestPlan(event, { id, key })
  return { id, version: 1, key, link: linkOf(event, id, key) }
})
