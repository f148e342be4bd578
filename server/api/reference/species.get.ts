import type { SpeciesItem, ReferenceList } from '#shared/types/reference'
import { limitRequests } from '#server/utils/http/limitRequests'
import { currentEdition } from '#server/utils/reference'

defineRouteMeta({ openAPI: { tags: ['Reference'], summary: 'Every species of the list, with its ranges and where each value comes from', responses: { 200: { description: '{ edition, items: SpeciesItem[] }' } } } })

export default defineEventHandler(async (event): Promise<ReferenceList<SpeciesItem>> => {
  await limitRequests(event, 'read', useRuntimeConfig(event).rateLimitFactor)
  const { id, species } = currentEdition()
  return { edition: id, items: [...species.values()] }
})
