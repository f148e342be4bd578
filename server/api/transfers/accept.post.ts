import { TransferToken } from '#shared/schemas/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { acceptTransfer } from '#server/utils/team/transfers'

defineRouteMeta({ openAPI: { tags: ['Handing over'], summary: 'Takes an animal\'s plan and papers into the team of this browser; a draft there until its own vet approves', requestBody: { description: 'TransferToken', content: { 'application/json': {} } }, responses: { 200: { description: '{ id }' }, 403: { description: 'Only coordinators' }, 410: { description: 'The link has ended or was used' }, 422: { description: 'It is this team\'s own' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'plan.transfer')
  const { token } = await readBodyOf(event, TransferToken)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  const id = acceptTransfer(member, token)
  right()
  return { id }
})
