import { MembersQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { database, listMembers } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'People of the team', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }, { in: 'query', name: 'role' }], responses: { 200: { description: 'Page of MemberRow' }, 401: { description: 'Not signed in' } } } })

export default defineEventHandler(async (event) => {
  const { teamId, user } = await requireMember(event, 'team.see')
  return listMembers(database(), teamId, user.id, readQueryOf(event, MembersQuery))
})
