import { RowParams } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf } from '#server/utils/http/readInput'
import { takeTransferBack } from '#server/utils/team/transfers'

defineRouteMeta({ openAPI: { tags: ['Handing over'], summary: 'Takes the link back before it was accepted', parameters: [{ in: 'path', name: 'id', required: true }], responses: { 204: { description: 'Withdrawn' }, 403: { description: 'Only coordinators' }, 404: { description: 'No such open link' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'plan.transfer')
  takeTransferBack(member, readParamsOf(event, RowParams).id)
  setResponseStatus(event, 204)
  return null
})
