import { RecordQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readQueryOf } from '#server/utils/http/readInput'
import { recordCsv } from '#server/utils/team/record'

defineRouteMeta({ openAPI: { tags: ['Record'], summary: 'The same record as CSV, whole', parameters: [{ in: 'query', name: 'q' }, { in: 'query', name: 'regimenId' }, { in: 'query', name: 'caseNumber' }, { in: 'query', name: 'action' }], responses: { 200: { description: 'text/csv' }, 403: { description: 'Keepers and above' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'print', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'record.see')
  setResponseHeader(event, 'content-type', 'text/csv; charset=utf-8')
  setResponseHeader(event, 'content-disposition', 'attachment; filename="thimbleful-record.csv"')
  setResponseHeader(event, 'cache-control', 'private, no-store')
  return recordCsv(member.teamId, readQueryOf(event, RecordQuery))
})
