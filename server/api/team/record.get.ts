import { RecordQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { database, listRecord } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'
import { recordRow } from '#server/utils/team/record'

defineRouteMeta({ openAPI: { tags: ['Record'], summary: 'Who did what, when and why: of the team, of one plan, or of one animal by its case number', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }, { in: 'query', name: 'regimenId' }, { in: 'query', name: 'caseNumber' }, { in: 'query', name: 'action' }], responses: { 200: { description: 'Page of RecordRow' }, 403: { description: 'Keepers and above' } } } })

export default defineEventHandler(async (event) => {
  const { teamId } = await requireMember(event, 'record.see')
  const page = listRecord(database(), teamId, readQueryOf(event, RecordQuery))
  return { ...page, items: page.items.map(recordRow) }
})
