import { ForgotInput } from '#shared/schemas/auth'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { sendReset } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Asks for a link to set a new password; the answer is always the same', requestBody: { description: 'ForgotInput', content: { 'application/json': {} } }, responses: { 202: { description: '{ message }' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { email } = await readBodyOf(event, ForgotInput)
  takeAttempt(event, 'reset', email, useRuntimeConfig().rateLimitFactor)
  setResponseStatus(event, 202)
  return { message: sendReset(event, email) }
})
