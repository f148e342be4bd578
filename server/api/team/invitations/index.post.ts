import { InvitationInput } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { invite } from '#server/utils/team/invitations'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Invites somebody by e-mail, with a role', requestBody: { description: 'InvitationInput', content: { 'application/json': {} } }, responses: { 201: { description: '{ id, expiresAt }' }, 403: { description: 'Only coordinators' }, 422: { description: 'In the team already, or invited already' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'people.change')
  const invitation = invite(event, member, await readBodyOf(event, InvitationInput))
  setResponseStatus(event, 201)
  return invitation
})
