import { CodesSetUp } from '#shared/schemas/auth'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { checkPassword } from '#server/utils/team/accounts'
import { beginCodes } from '#server/utils/team/codes'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Begins one-time codes: a secret for the authenticator app; nothing changes until a code confirms it', requestBody: { description: 'CodesSetUp', content: { 'application/json': {} } }, responses: { 200: { description: '{ secret, uri, svg }' }, 401: { description: 'Not signed in' }, 422: { description: 'The password is wrong' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  const { password } = await readBodyOf(event, CodesSetUp)
  await checkPassword(who.user, password, takeAttempt(event, 'sign-in', who.user.email, useRuntimeConfig().rateLimitFactor))
  setResponseHeader(event, 'cache-control', 'no-store')
  return beginCodes(event, who.user)
})
