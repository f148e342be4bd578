import { CompareQuery } from '#shared/schemas/planLife'
import { RegimenParams } from '#shared/schemas/regimen'
import type { Comparison } from '#shared/types/planLife'
import { requireTeamRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { changesSince } from '#server/utils/regimen/changes'

defineRouteMeta({ openAPI: { tags: ['Life of a plan'], summary: 'What differs between two versions, line by line, in words', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'from' }, { in: 'query', name: 'to' }], responses: { 200: { description: 'Comparison' }, 404: { description: 'No such plan or version' } } } })

export default defineEventHandler(async (event): Promise<Comparison> => {
  await limitRequests(event, 'read', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  await requireTeamRegimen(event, id, 'plan.see')
  const { from, to } = readQueryOf(event, CompareQuery)
  return { from, to, lines: changesSince(id, from, to) }
})
