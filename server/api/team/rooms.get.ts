import { requireMember } from '#server/utils/access/requireMember'
import { database, listRooms } from '#server/utils/data'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Rooms that the team\'s plans name', responses: { 200: { description: '{ items }' }, 401: { description: 'Not signed in' } } } })

export default defineEventHandler(async (event) => {
  const { teamId } = await requireMember(event, 'plan.see')
  return { items: listRooms(database(), teamId) }
})
