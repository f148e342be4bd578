import { InvitationToken } from '#shared/schemas/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { lookAtInvitation } from '#server/utils/team/invitations'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'What an invitation is for, to whoever holds its link', requestBody: { description: 'InvitationToken', content: { 'application/json': {} } }, responses: { 200: { description: 'InvitationLook' }, 410: { description: 'The invitation has ended' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { token } = await readBodyOf(event, InvitationToken)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  const look = await lookAtInvitation(event, token)
  right()
  return look
})
