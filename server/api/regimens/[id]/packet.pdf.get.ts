import { PacketQuery, RegimenParams } from '#shared/schemas/regimen'
import { requireRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { sendSavedPdf } from '#server/utils/regimen/sendPdf'

defineRouteMeta({ openAPI: { tags: ['Paper'], summary: 'The foster packet: cover with contacts and stop rules, sheet, mixing card, in one PDF', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'key' }, { in: 'query', name: 'version' }, { in: 'query', name: 'paper' }, { in: 'query', name: 'days' }], responses: { 200: { description: 'application/pdf' }, 404: { description: 'No such plan' }, 422: { description: 'It would lack something a carer needs: data.issues' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'print', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const query = readQueryOf(event, PacketQuery)
  const { row } = await requireRegimen(event, id, query.key, 'plan.print')
  return sendSavedPdf(event, 'packet', row, query)
})
