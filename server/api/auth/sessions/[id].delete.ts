import { SessionParams } from '#shared/schemas/auth'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { fail } from '#server/utils/http/fail'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf } from '#server/utils/http/readInput'
import { endSignIns } from '#server/utils/team/accounts'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Ends one sign-in of this account at once', parameters: [{ in: 'path', name: 'id', required: true }], responses: { 204: { description: 'Ended' }, 401: { description: 'Not signed in' }, 404: { description: 'No such sign-in' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  const { id } = readParamsOf(event, SessionParams)
  if (endSignIns(who, id) === 0) throw fail({ status: 404, code: 'session.notFound', message: 'This sign-in has ended already.' })
  setResponseStatus(event, 204)
  return null
})
