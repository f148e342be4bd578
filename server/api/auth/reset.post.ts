import { ResetInput } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { enter, resetPassword } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Sets a new password by the link of a mail, once, and signs in; every other sign-in ends', requestBody: { description: 'ResetInput', content: { 'application/json': {} } }, responses: { 200: { description: 'Me, or { user: null } where one-time codes are still asked for' }, 410: { description: 'The link has ended or was used' }, 422: { description: 'A common password' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event): Promise<Me | { user: null }> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { token, password } = await readBodyOf(event, ResetInput)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  const user = await resetPassword(token, password)
  right()
  // A mailbox alone must not do where one-time codes are asked for.
  return user.codesSealed === null ? enter(event, user, null, null) : { user: null }
})
