import type { Me } from '#shared/types/team'
import { codesDue, settingsOf } from '../access/requireMember'
import { database, teamsOf } from '../data'
import type { Who } from '../access/signedIn'

/** What a person may know of themselves and their teams. */
export function meOf({ user, member, team }: Who): Me {
  const settings = team && settingsOf(team)
  return {
    user: { id: user.id, name: user.name, email: user.email, registration: user.registration, hasCodes: user.codesSealed !== null, demo: user.demo },
    team: member && team && settings && { id: team.id, name: team.name, role: member.role, settings, demo: team.demo, codesDue: codesDue(user, member.role, settings) },
    teams: teamsOf(database(), user.id).map(({ id, name, role }) => ({ id, name, role })),
  }
}
