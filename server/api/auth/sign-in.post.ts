import { SignInInput } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { checkSignIn, enter, newSignInTold } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Signs in; the answer for a wrong password and for an unknown address is the same', requestBody: { description: 'SignInInput', content: { 'application/json': {} } }, responses: { 200: { description: 'Me, as GET /api/auth/me answers it' }, 401: { description: 'auth.wrong; auth.codeNeeded or auth.codeWrong for accounts with one-time codes' }, 429: { description: 'Too many tries; Retry-After says how long to wait' } } } })

export default defineEventHandler(async (event): Promise<Me> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const input = await readBodyOf(event, SignInInput)
  const right = takeAttempt(event, 'sign-in', input.email, useRuntimeConfig().rateLimitFactor)
  const user = await checkSignIn(input, right)
  return enter(event, user, null, newSignInTold(event, user))
})
