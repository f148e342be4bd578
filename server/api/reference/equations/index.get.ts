import type { EquationItem, ReferenceList } from '#shared/types/reference'
import { limitRequests } from '#server/utils/http/limitRequests'
import { currentEdition } from '#server/utils/reference'

defineRouteMeta({ openAPI: { tags: ['Reference'], summary: 'Every equation of the edition, with its source, units and ranges', responses: { 200: { description: '{ edition, items: EquationItem[] }' } } } })

export default defineEventHandler(async (event): Promise<ReferenceList<EquationItem>> => {
  await limitRequests(event, 'read', useRuntimeConfig(event).rateLimitFactor)
  const { id, equations } = currentEdition()
  return { edition: id, items: [...equations.values()] }
})
