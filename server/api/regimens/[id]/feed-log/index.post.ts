import { FeedEntryInput } from '#shared/schemas/planLife'
import { RegimenParams } from '#shared/schemas/regimen'
import { requireRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { addFeed } from '#server/utils/regimen/log'

defineRouteMeta({ openAPI: { tags: ['Log'], summary: 'Writes down what happened at a feed; members and helpers', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'FeedEntryInput', content: { 'application/json': {} } }, responses: { 201: { description: 'FeedEntry' }, 404: { description: 'No such plan' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const opened = await requireRegimen(event, id, undefined, 'plan.log')
  const entry = addFeed(event, opened, await readBodyOf(event, FeedEntryInput))
  setResponseStatus(event, 201)
  return entry
})
