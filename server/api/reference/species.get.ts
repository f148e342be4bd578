import { answerList } from '#server/utils/http/answerList'
import { limitRequests } from '#server/utils/http/limitRequests'
import { currentEdition } from '#server/utils/reference'

defineRouteMeta({ openAPI: { tags: ['Reference'], summary: 'Every species of the list, with its ranges and where each value comes from', parameters: [{ in: 'header', name: 'if-none-match', description: 'Tag of the list you have: 304 when it has not changed', schema: { type: 'string' } }], responses: { 200: { description: '{ edition, items: SpeciesItem[] }, with an ETag' }, 304: { description: 'You have this list already' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'read', useRuntimeConfig().rateLimitFactor)
  const { id, species } = currentEdition()
  return answerList(event, id, species)
})
