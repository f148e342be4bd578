import { TransferToken } from '#shared/schemas/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { lookAtTransfer } from '#server/utils/team/transfers'

defineRouteMeta({ openAPI: { tags: ['Handing over'], summary: 'What would be handed over, to whoever holds the link and is signed in', requestBody: { description: 'TransferToken', content: { 'application/json': {} } }, responses: { 200: { description: 'TransferLook' }, 401: { description: 'Not signed in' }, 410: { description: 'The link has ended or was used' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  await requireSignedIn(event)
  const { token } = await readBodyOf(event, TransferToken)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  const look = lookAtTransfer(token)
  right()
  return look
})
