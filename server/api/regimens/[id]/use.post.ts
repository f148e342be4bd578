import { StepInput } from '#shared/schemas/planLife'
import { RegimenParams } from '#shared/schemas/regimen'
import type { TeamPlanInfo } from '#shared/types/planLife'
import { requireTeamRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { takeLifeStep } from '#server/utils/regimen/takeLifeStep'

defineRouteMeta({ openAPI: { tags: ['Life of a plan'], summary: 'Puts a version in use', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'StepInput', content: { 'application/json': {} } }, responses: { 200: { description: 'TeamPlanInfo' }, 403: { description: 'Not with this role, or not by the same hand' }, 404: { description: 'No such plan in this team' }, 409: { description: 'Not in this state, or a newer version exists' }, 422: { description: 'Understood, but not possible now' } } } })

export default defineEventHandler(async (event): Promise<TeamPlanInfo> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const opened = await requireTeamRegimen(event, id, 'plan.use')
  return takeLifeStep(event, opened, 'use', await readBodyOf(event, StepInput))
})
