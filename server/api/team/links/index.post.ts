import { HelperLinkInput } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { makeHelperLink } from '#server/utils/team/helperLinks'

defineRouteMeta({ openAPI: { tags: ['Helpers'], summary: 'Makes a link that opens one animal or one room without an account; its address is shown this once', requestBody: { description: 'HelperLinkInput', content: { 'application/json': {} } }, responses: { 201: { description: 'HelperLinkReceipt' }, 403: { description: 'Keepers and above' }, 404: { description: 'No such animal in this team' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'link.make')
  const receipt = makeHelperLink(event, member, await readBodyOf(event, HelperLinkInput))
  setResponseStatus(event, 201)
  setResponseHeader(event, 'cache-control', 'no-store')
  return receipt
})
