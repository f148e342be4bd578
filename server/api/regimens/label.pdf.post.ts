import { RegimenInput, SheetQuery } from '#shared/schemas/regimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readQueryOf } from '#server/utils/http/readInput'
import { planOf } from '#server/utils/regimen/planOf'
import { sendPdf } from '#server/utils/regimen/sendPdf'

defineRouteMeta({ openAPI: { tags: ['Paper'], summary: 'The label strip with the syringe of an unsaved plan, as PDF', parameters: [{ in: 'query', name: 'paper' }, { in: 'query', name: 'days' }], requestBody: { description: 'RegimenInput', content: { 'application/json': {} } }, responses: { 200: { description: 'application/pdf' }, 400: { description: 'A field is not as expected' }, 422: { description: 'Impossible, or it would lack something a carer needs' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'print', useRuntimeConfig().rateLimitFactor)
  const query = readQueryOf(event, SheetQuery)
  const input = await readBodyOf(event, RegimenInput)
  return sendPdf(event, 'label', { plan: planOf(input), input }, query)
})
