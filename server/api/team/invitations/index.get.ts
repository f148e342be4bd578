import { InvitationsQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { database, listInvitations } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Invitations, open and past', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }, { in: 'query', name: 'state' }], responses: { 200: { description: 'Page of InvitationRow' }, 403: { description: 'Only coordinators' } } } })

export default defineEventHandler(async (event) => {
  const { teamId } = await requireMember(event, 'people.change')
  return listInvitations(database(), teamId, new Date().toISOString(), readQueryOf(event, InvitationsQuery))
})
