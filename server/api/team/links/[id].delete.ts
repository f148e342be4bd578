import { RowParams } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf } from '#server/utils/http/readInput'
import { endHelperLink } from '#server/utils/team/helperLinks'

defineRouteMeta({ openAPI: { tags: ['Helpers'], summary: 'Takes a link back at once', parameters: [{ in: 'path', name: 'id', required: true }], responses: { 204: { description: 'It opens nothing any more' }, 403: { description: 'Keepers and above' }, 404: { description: 'No such open link' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'link.make')
  endHelperLink(member, readParamsOf(event, RowParams).id)
  setResponseStatus(event, 204)
  return null
})
