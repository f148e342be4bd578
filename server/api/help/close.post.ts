import { writeCookie } from '#server/utils/access/sealedCookie'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { z } from 'zod'

defineRouteMeta({ openAPI: { tags: ['Helpers'], summary: 'Ends the visit in this browser', requestBody: { description: 'An empty object', content: { 'application/json': {} } }, responses: { 204: { description: 'Closed' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  await readBodyOf(event, z.object({}))
  await writeCookie(event, { help: undefined })
  setResponseStatus(event, 204)
  return null
})
