import { WeighInInput } from '#shared/schemas/planLife'
import { RegimenParams } from '#shared/schemas/regimen'
import { requireTeamRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { addWeighIn } from '#server/utils/regimen/log'

defineRouteMeta({ openAPI: { tags: ['Log'], summary: 'Writes a weight down and says what it does to the plan; an approval that no longer fits lapses', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'WeighInInput', content: { 'application/json': {} } }, responses: { 201: { description: '{ weighIn, team }' }, 403: { description: 'Keepers and above' }, 404: { description: 'No such plan in this team' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const opened = await requireTeamRegimen(event, id, 'plan.weigh')
  const answer = addWeighIn(event, opened, await readBodyOf(event, WeighInInput))
  setResponseStatus(event, 201)
  return answer
})
