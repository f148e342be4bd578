import { RegimenParams } from '#shared/schemas/regimen'
import { RecordQuery } from '#shared/schemas/team'
import { requireTeamRegimen } from '#server/utils/access/requireRegimen'
import { database, listRecord } from '#server/utils/data'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { recordRow } from '#server/utils/team/record'

defineRouteMeta({ openAPI: { tags: ['Record'], summary: 'Everything that touched one plan', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }], responses: { 200: { description: 'Page of RecordRow' }, 403: { description: 'Keepers and above' }, 404: { description: 'No such plan in this team' } } } })

export default defineEventHandler(async (event) => {
  const { id } = readParamsOf(event, RegimenParams)
  const { member } = await requireTeamRegimen(event, id, 'record.see')
  const page = listRecord(database(), member.teamId, { ...readQueryOf(event, RecordQuery), regimenId: id })
  return { ...page, items: page.items.map(recordRow) }
})
