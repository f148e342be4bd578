import { RowParams } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf } from '#server/utils/http/readInput'
import { removeMember } from '#server/utils/team/people'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'A person leaves or is taken out, at once everywhere', parameters: [{ in: 'path', name: 'id', required: true }], responses: { 204: { description: 'Gone' }, 403: { description: 'Only coordinators, or oneself' }, 404: { description: 'No such person in this team' }, 422: { description: 'The last coordinator' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  // Anyone may leave; taking somebody else out is asked about inside.
  const member = await requireMember(event, 'team.see')
  removeMember(member, readParamsOf(event, RowParams).id)
  setResponseStatus(event, 204)
  return null
})
