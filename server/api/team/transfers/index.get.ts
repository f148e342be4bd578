import { TransfersQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { database, listTransfers } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'

defineRouteMeta({ openAPI: { tags: ['Handing over'], summary: 'Animals handed over, or on their way', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }], responses: { 200: { description: 'Page of TransferRow' }, 403: { description: 'Only coordinators' } } } })

export default defineEventHandler(async (event) => {
  const { teamId } = await requireMember(event, 'plan.transfer')
  return listTransfers(database(), teamId, new Date().toISOString(), readQueryOf(event, TransfersQuery))
})
