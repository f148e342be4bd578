import { LogQuery } from '#shared/schemas/planLife'
import { RegimenParams } from '#shared/schemas/regimen'
import { requireTeamRegimen } from '#server/utils/access/requireRegimen'
import { database, listWeighIns } from '#server/utils/data'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'

defineRouteMeta({ openAPI: { tags: ['Log'], summary: 'Weigh-ins of a plan\'s animal, newest first', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }], responses: { 200: { description: 'Page of WeighIn' }, 404: { description: 'No such plan in this team' } } } })

export default defineEventHandler(async (event) => {
  const { id } = readParamsOf(event, RegimenParams)
  const { member } = await requireTeamRegimen(event, id, 'plan.see')
  const page = listWeighIns(database(), member.teamId, id, readQueryOf(event, LogQuery))
  return { ...page, items: page.items.map(({ id, weightG, weighedAt, by, effect }) => ({ id, weightG, weighedAt, by, effect })) }
})
