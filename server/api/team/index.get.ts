import { requireMember } from '#server/utils/access/requireMember'
import { meOf } from '#server/utils/team/meOf'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'The team of this browser, with its settings', responses: { 200: { description: 'Me.team' }, 401: { description: 'Not signed in' } } } })

export default defineEventHandler(async (event) => {
  const member = await requireMember(event, 'team.see')
  return meOf(member).team
})
