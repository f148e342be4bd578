import { TokenInput } from '#shared/schemas/auth'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { confirmEmail } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Confirms a new e-mail address by the link sent to it, once', requestBody: { description: 'TokenInput', content: { 'application/json': {} } }, responses: { 200: { description: '{ email }' }, 410: { description: 'The link has ended or was used' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { token } = await readBodyOf(event, TokenInput)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  const email = confirmEmail(event, token)
  right()
  return { email }
})
