import { SignUpInput } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { enter, signUp } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Makes an account and its first team, and signs in', requestBody: { description: 'SignUpInput', content: { 'application/json': {} } }, responses: { 201: { description: 'Me, as GET /api/auth/me answers it' }, 400: { description: 'A field is not as expected' }, 422: { description: 'A common password, or an address that has an account' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event): Promise<Me> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const input = await readBodyOf(event, SignUpInput)
  // Counted and never forgiven: who makes accounts by the dozen waits.
  takeAttempt(event, 'sign-up', null, useRuntimeConfig().rateLimitFactor)
  const { user, teamId } = await signUp(input)
  setResponseStatus(event, 201)
  return enter(event, user, teamId, null)
})
