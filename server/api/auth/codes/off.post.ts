import { CodesOff } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { checkPassword } from '#server/utils/team/accounts'
import { endCodes } from '#server/utils/team/codes'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Turns one-time codes off', requestBody: { description: 'CodesOff', content: { 'application/json': {} } }, responses: { 200: { description: 'Me, as GET /api/auth/me answers it' }, 401: { description: 'Not signed in' }, 422: { description: 'The password is wrong' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event): Promise<Me> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  const { password } = await readBodyOf(event, CodesOff)
  await checkPassword(who.user, password, takeAttempt(event, 'sign-in', who.user.email, useRuntimeConfig().rateLimitFactor))
  return endCodes(who)
})
