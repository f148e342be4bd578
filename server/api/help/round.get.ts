import { requireVisit } from '#server/utils/access/helperVisit'
import { roundOf } from '#server/utils/team/helperLinks'

defineRouteMeta({ openAPI: { tags: ['Helpers'], summary: 'The animals of an open visit', responses: { 200: { description: 'HelperRound' }, 401: { description: 'The link is closed' } } } })

export default defineEventHandler(async (event) => {
  setResponseHeader(event, 'cache-control', 'private, no-store')
  return roundOf(await requireVisit(event))
})
