import { RegimenParams } from '#shared/schemas/regimen'
import { TransferInput } from '#shared/schemas/team'
import { requireTeamRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { offerTransfer } from '#server/utils/team/transfers'

defineRouteMeta({ openAPI: { tags: ['Handing over'], summary: 'Makes a one-time link that hands an animal\'s plan and papers to another team', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'TransferInput', content: { 'application/json': {} } }, responses: { 201: { description: '{ id, link, expiresAt }' }, 403: { description: 'Only coordinators' }, 404: { description: 'No such plan in this team' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const { row, member } = await requireTeamRegimen(event, id, 'plan.transfer')
  const receipt = offerTransfer(event, member, row, await readBodyOf(event, TransferInput))
  setResponseStatus(event, 201)
  setResponseHeader(event, 'cache-control', 'no-store')
  return receipt
})
