import { HelperOpen } from '#shared/schemas/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { openHelperLink } from '#server/utils/team/helperLinks'

defineRouteMeta({ openAPI: { tags: ['Helpers'], summary: 'Opens a link for helpers with initials; the cookie holds the visit', requestBody: { description: 'HelperOpen', content: { 'application/json': {} } }, responses: { 200: { description: 'HelperRound' }, 401: { description: 'The link is closed' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { token, initials } = await readBodyOf(event, HelperOpen)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  const round = await openHelperLink(event, token, initials)
  right()
  return round
})
