import { TransferToken } from '#shared/schemas/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { refuseTransfer } from '#server/utils/team/transfers'

defineRouteMeta({ openAPI: { tags: ['Handing over'], summary: 'Declines it; the animal stays where it is', requestBody: { description: 'TransferToken', content: { 'application/json': {} } }, responses: { 204: { description: 'Declined' }, 403: { description: 'Only coordinators' }, 410: { description: 'The link has ended or was used' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'plan.transfer')
  const { token } = await readBodyOf(event, TransferToken)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  refuseTransfer(member, token)
  right()
  setResponseStatus(event, 204)
  return null
})
