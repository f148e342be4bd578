import { EntryParams, StrikeInput } from '#shared/schemas/planLife'
import { requireRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { strikeFeed } from '#server/utils/regimen/log'

defineRouteMeta({ openAPI: { tags: ['Log'], summary: 'Strikes a line of the log out, with a reason; nothing is deleted', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'path', name: 'entryId', required: true }], requestBody: { description: 'StrikeInput', content: { 'application/json': {} } }, responses: { 204: { description: 'Struck out' }, 404: { description: 'No such line' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { id, entryId } = readParamsOf(event, EntryParams)
  const opened = await requireRegimen(event, id, undefined, 'plan.log')
  strikeFeed(opened, entryId, (await readBodyOf(event, StrikeInput)).reason)
  setResponseStatus(event, 204)
  return null
})
