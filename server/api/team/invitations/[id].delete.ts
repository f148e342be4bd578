import { RowParams } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf } from '#server/utils/http/readInput'
import { withdrawInvitation } from '#server/utils/team/invitations'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Withdraws an invitation', parameters: [{ in: 'path', name: 'id', required: true }], responses: { 204: { description: 'Withdrawn' }, 403: { description: 'Only coordinators' }, 404: { description: 'No such open invitation' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'people.change')
  withdrawInvitation(member, readParamsOf(event, RowParams).id)
  setResponseStatus(event, 204)
  return null
})
