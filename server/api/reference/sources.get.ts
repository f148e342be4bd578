import { answerList } from '#server/utils/http/answerList'
import { limitRequests } from '#server/utils/http/limitRequests'
import { currentEdition } from '#server/utils/reference'

defineRouteMeta({ openAPI: { tags: ['Reference'], summary: 'The bibliography: what every number comes from, what of it was read, and its known errors', parameters: [{ in: 'header', name: 'if-none-match', description: 'Tag of the list you have: 304 when it has not changed', schema: { type: 'string' } }], responses: { 200: { description: '{ edition, items: SourceItem[] }, with an ETag' }, 304: { description: 'You have this list already' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'read', useRuntimeConfig().rateLimitFactor)
  const { id, sources } = currentEdition()
  return answerList(event, id, sources)
})
