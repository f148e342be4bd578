import { DeskQuery } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { readQueryOf } from '#server/utils/http/readInput'
import { deskOf } from '#server/utils/regimen/desk'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'What waits for the one who asks: approvals and checks, oldest first', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }], responses: { 200: { description: '{ approvals, checks }: pages of PlanRow' }, 401: { description: 'Not signed in' } } } })

export default defineEventHandler(async (event) => {
  const member = await requireMember(event, 'plan.see')
  return deskOf(member, readQueryOf(event, DeskQuery))
})
