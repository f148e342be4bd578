import { InvitationAccept } from '#shared/schemas/team'
import type { Me } from '#shared/types/team'
import { takeAttempt } from '#server/utils/access/attempts'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { acceptInvitation } from '#server/utils/team/invitations'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Joins a team by the link of an invitation: signed in as the invited address, or with a new account', requestBody: { description: 'InvitationAccept', content: { 'application/json': {} } }, responses: { 200: { description: 'Me, as GET /api/auth/me answers it' }, 401: { description: 'That address has an account: sign in first' }, 410: { description: 'The invitation has ended' }, 422: { description: 'Name or password missing, or a common password' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event): Promise<Me> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const input = await readBodyOf(event, InvitationAccept)
  const right = takeAttempt(event, 'link', null, useRuntimeConfig().rateLimitFactor)
  const me = await acceptInvitation(event, input)
  right()
  return me
})
