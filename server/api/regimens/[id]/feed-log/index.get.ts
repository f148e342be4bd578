import { LogQuery } from '#shared/schemas/planLife'
import { RegimenParams } from '#shared/schemas/regimen'
import { requireRegimen } from '#server/utils/access/requireRegimen'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { listFeeds } from '#server/utils/regimen/log'

defineRouteMeta({ openAPI: { tags: ['Log'], summary: 'What was given, newest first; members and helpers', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }], responses: { 200: { description: 'Page of FeedEntry' }, 404: { description: 'No such plan' } } } })

export default defineEventHandler(async (event) => {
  const { id } = readParamsOf(event, RegimenParams)
  const { row } = await requireRegimen(event, id, undefined, 'plan.log')
  return listFeeds(row, readQueryOf(event, LogQuery))
})
