import type { ReferenceList, SourceItem } from '#shared/types/reference'
import { limitRequests } from '#server/utils/http/limitRequests'
import { currentEdition } from '#server/utils/reference'

defineRouteMeta({ openAPI: { tags: ['Reference'], summary: 'The bibliography: what every number comes from, what of it was read, and its known errors', responses: { 200: { description: '{ edition, items: SourceItem[] }' } } } })

export default defineEventHandler(async (event): Promise<ReferenceList<SourceItem>> => {
  await limitRequests(event, 'read', useRuntimeConfig(event).rateLimitFactor)
  const { id, sources } = currentEdition()
  return { edition: id, items: [...sources.values()] }
})
