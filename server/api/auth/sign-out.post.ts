import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { signOut } from '#server/utils/team/accounts'
import { z } from 'zod'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Ends the sign-in of this browser', requestBody: { description: 'An empty object', content: { 'application/json': {} } }, responses: { 204: { description: 'Signed out, or was not signed in' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  await readBodyOf(event, z.object({}))
  await signOut(event)
  setResponseStatus(event, 204)
  return null
})
