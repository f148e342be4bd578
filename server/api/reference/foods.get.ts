import type { FoodItem, ReferenceList } from '#shared/types/reference'
import { limitRequests } from '#server/utils/http/limitRequests'
import { currentEdition } from '#server/utils/reference'

defineRouteMeta({ openAPI: { tags: ['Reference'], summary: 'Every feed of the list, with its energy, water and where each value comes from', responses: { 200: { description: '{ edition, items: FoodItem[] }' } } } })

export default defineEventHandler(async (event): Promise<ReferenceList<FoodItem>> => {
  await limitRequests(event, 'read', useRuntimeConfig(event).rateLimitFactor)
  const { id, foods } = currentEdition()
  return { edition: id, items: [...foods.values()] }
})
