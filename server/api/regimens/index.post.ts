import { RegimenInput } from '#shared/schemas/regimen'
import type { SavedRegimenReceipt } from '#shared/types/plan'
import { rememberGuestPlan } from '#server/utils/access/guestPlans'
import { newLinkKey, newRegimenId } from '#server/utils/access/linkKey'
import { database, insertRegimen } from '#server/utils/data'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { planOf } from '#server/utils/regimen/planOf'
import { linkOf } from '#server/utils/regimen/sendPdf'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'Saves a plan with its input, result and edition', requestBody: { description: 'RegimenInput', content: { 'application/json': {} } }, responses: { 201: { description: '{ id, version, key, link }; the link works without an account for 30 days' }, 400: { description: 'A field is not as expected' }, 422: { description: 'Understood, but impossible' } } } })

export default defineEventHandler(async (event): Promise<SavedRegimenReceipt> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const input = await readBodyOf(event, RegimenInput)
  const plan = planOf(input)
  const now = new Date()
  const id = newRegimenId()
  const { key, keyHash, linkExpiresAt } = newLinkKey(now)
  insertRegimen(database(), { id, keyHash, linkExpiresAt, actor: 'guest', at: now.toISOString(), input, plan })
  await rememberGuestPlan(event, { id, key })
  setResponseStatus(event, 201)
  return { id, version: 1, key, link: linkOf(event, id, key) }
})
