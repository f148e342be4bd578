import { TeamSwitch } from '#shared/schemas/auth'
import type { Me } from '#shared/types/team'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { whoIs } from '#server/utils/access/signedIn'
import { database, findMember, setSessionTeam } from '#server/utils/data'
import { fail } from '#server/utils/http/fail'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { meOf } from '#server/utils/team/meOf'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Switches this browser to another of the person\'s teams', requestBody: { description: 'TeamSwitch', content: { 'application/json': {} } }, responses: { 200: { description: 'Me, as GET /api/auth/me answers it' }, 401: { description: 'Not signed in' }, 404: { description: 'Not a team of theirs' } } } })

export default defineEventHandler(async (event): Promise<Me> => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { user, session } = await requireSignedIn(event)
  const { teamId } = await readBodyOf(event, TeamSwitch)
  if (!findMember(database(), teamId, user.id)) throw fail({ status: 404, code: 'team.notFound', message: 'You are not in this team.' })
  setSessionTeam(database(), session.id, teamId)
  event.context.who = undefined
  return meOf((await whoIs(event))!)
})
