import { EmailChange } from '#shared/schemas/auth'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { askEmailChange, checkPassword } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Asks for another e-mail address; both ends are told, and the new one has to be confirmed', requestBody: { description: 'EmailChange', content: { 'application/json': {} } }, responses: { 202: { description: '{ message }' }, 401: { description: 'Not signed in' }, 422: { description: 'The password is wrong' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  const { password, newEmail } = await readBodyOf(event, EmailChange)
  await checkPassword(who.user, password, takeAttempt(event, 'sign-in', who.user.email, useRuntimeConfig().rateLimitFactor))
  setResponseStatus(event, 202)
  return { message: askEmailChange(event, who, newEmail) }
})
