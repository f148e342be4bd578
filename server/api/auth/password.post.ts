import { PasswordChange } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { changePassword, checkPassword } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Changes the password; every other sign-in ends', requestBody: { description: 'PasswordChange', content: { 'application/json': {} } }, responses: { 200: { description: 'Me, as GET /api/auth/me answers it' }, 401: { description: 'Not signed in' }, 422: { description: 'The old password is wrong, or the new one a common one' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event): Promise<Me> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  const input = await readBodyOf(event, PasswordChange)
  await checkPassword(who.user, input.password, takeAttempt(event, 'sign-in', who.user.email, useRuntimeConfig().rateLimitFactor))
  return changePassword(who, input.newPassword)
})
