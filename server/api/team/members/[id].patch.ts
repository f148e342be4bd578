import { MemberChange, RowParams } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { changeRole } from '#server/utils/team/people'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Gives a person another role; it holds from their next request on', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'MemberChange', content: { 'application/json': {} } }, responses: { 200: { description: '{ role }' }, 403: { description: 'Only coordinators' }, 404: { description: 'No such person in this team' }, 422: { description: 'The last coordinator' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'people.change')
  const { id } = readParamsOf(event, RowParams)
  return changeRole(member, id, (await readBodyOf(event, MemberChange)).role)
})
