import { TeamChange } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { changeTeam } from '#server/utils/team/people'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Changes name and settings', requestBody: { description: 'TeamChange', content: { 'application/json': {} } }, responses: { 200: { description: 'Me.team' }, 403: { description: 'Only coordinators' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'team.change')
  return changeTeam(member, await readBodyOf(event, TeamChange))
})
