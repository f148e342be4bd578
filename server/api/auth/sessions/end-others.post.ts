import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { endSignIns } from '#server/utils/team/accounts'
import { z } from 'zod'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Ends every sign-in of this account but this one', requestBody: { description: 'An empty object', content: { 'application/json': {} } }, responses: { 200: { description: '{ ended }' }, 401: { description: 'Not signed in' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  await readBodyOf(event, z.object({}))
  return { ended: endSignIns(who) }
})
