import { SessionsQuery } from '#shared/schemas/team'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { database, listSessions } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'The sign-ins of this account', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }], responses: { 200: { description: 'Page of SessionRow' }, 401: { description: 'Not signed in' } } } })

export default defineEventHandler(async (event) => {
  const { user, session } = await requireSignedIn(event)
  return listSessions(database(), user.id, session.id, new Date().toISOString(), readQueryOf(event, SessionsQuery))
})
