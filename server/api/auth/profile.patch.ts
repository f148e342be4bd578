import { ProfileInput } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { changeProfile } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Changes the name and the registration that stand beside approvals', requestBody: { description: 'ProfileInput', content: { 'application/json': {} } }, responses: { 200: { description: 'Me, as GET /api/auth/me answers it' }, 401: { description: 'Not signed in' } } } })

export default defineEventHandler(async (event): Promise<Me> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  return changeProfile(who, await readBodyOf(event, ProfileInput))
})
