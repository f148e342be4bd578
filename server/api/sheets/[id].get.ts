import { SheetCodeQuery, SheetParams } from '#shared/schemas/team'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { lookAtSheet } from '#server/utils/regimen/lookAtSheet'

defineRouteMeta({ openAPI: { tags: ['Paper'], summary: 'What the code on a sheet answers: is this paper still current, and what it shows', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'version' }, { in: 'query', name: 'code' }], responses: { 200: { description: 'SheetLook' }, 404: { description: 'No such sheet, a wrong code, or the team does not answer codes' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'read', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, SheetParams)
  setResponseHeader(event, 'cache-control', 'private, no-store')
  return lookAtSheet(event, id, readQueryOf(event, SheetCodeQuery))
})
