import { LinksQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { database, listHelperLinks } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'

defineRouteMeta({ openAPI: { tags: ['Helpers'], summary: 'Links for helpers, open and past, with how often each was opened', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }, { in: 'query', name: 'state' }], responses: { 200: { description: 'Page of HelperLinkRow' }, 403: { description: 'Keepers and above' } } } })

export default defineEventHandler(async (event) => {
  const { teamId } = await requireMember(event, 'link.make')
  return listHelperLinks(database(), teamId, new Date().toISOString(), readQueryOf(event, LinksQuery))
})
