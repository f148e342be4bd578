import { RegimenInput } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { planOf } from '#server/utils/regimen/planOf'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'A feeding plan worked out, nothing saved', requestBody: { description: 'RegimenInput: animal, feed, route, feeding hours, start and time zone', content: { 'application/json': {} } }, responses: { 200: { description: 'Plan' }, 400: { description: 'A field is missing or not as expected: data.issues' }, 422: { description: 'Understood, but impossible: data.code, data.issues' } } } })

export default defineEventHandler(async (event): Promise<Plan> => {
  await limitRequests(event, 'preview', useRuntimeConfig().rateLimitFactor)
  return planOf(await readBodyOf(event, RegimenInput))
})
