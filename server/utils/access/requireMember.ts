import type { H3Event } from 'h3'
import { TeamSettings } from '#shared/schemas/team'
import type { MemberRecord, SessionRecord, TeamRecord, UserRecord } from '#shared/types/rows'
import { ABILITIES, can, ROLE_LABELS, type Ability, type Role } from '#shared/utils/abilities'
import type { Actor } from '../data'
import { fail } from '../http/fail'
import { whoIs, type Who } from './signedIn'

/** A member of a team as the database says at this moment: what a handler gets instead of a yes. */
export interface Member { user: UserRecord, session: SessionRecord, member: MemberRecord, team: TeamRecord, teamId: string, role: Role, settings: TeamSettings, actor: Actor }

/** Somebody signed in, in a team or not. @throws 401 `auth.signIn`. */
export async function requireSignedIn(event: H3Event): Promise<Who> {
  const who = await whoIs(event)
  if (!who) throw fail({ status: 401, code: 'auth.signIn', message: 'Sign in first.' })
  return who
}

/**
 * A member of a team who has the ability, by the role the database holds now.
 * @throws 401 `auth.signIn`, 403 `team.none`, `auth.codesDue` or `auth.notAllowed`.
 */
export async function requireMember(event: H3Event, ability: Ability): Promise<Member> {
  const member = memberOf(await requireSignedIn(event))
  if (!can(member.role, ability)) throw notAllowed(member.role, ability)
  return member
}

/** @throws 403 for somebody who left every team, or whose team wants one-time codes first. */
export function memberOf(who: Who): Member {
  const { user, session, member, team } = who
  if (!member || !team) throw fail({ status: 403, code: 'team.none', message: 'You are in no team at the moment. Ask a coordinator to invite you.' })
  const settings = settingsOf(team)
  if (codesDue(user, member.role, settings)) throw fail({ status: 403, code: 'auth.codesDue', message: `${team.name} asks ${ROLE_LABELS[member.role].label.toLowerCase()}s to use one-time codes. Set them up on your profile, then go on.` })
  return { user, session, member, team, teamId: team.id, role: member.role, settings, actor: actorOf(user) }
}

export function actorOf(user: UserRecord): Actor {
  return { id: `user:${user.id}`, name: user.name }
}

/** Settings as they are kept, with today's defaults for what was not asked when they were saved. */
export function settingsOf(team: TeamRecord): TeamSettings {
  return TeamSettings.parse(JSON.parse(team.settingsJson))
}

/** Whether somebody must set up one-time codes before going on. */
export function codesDue(user: UserRecord, role: Role, settings: TeamSettings): boolean {
  return settings.codesRequired && (role === 'vet' || role === 'coordinator') && user.codesSealed === null
}

export function notAllowed(role: Role, ability: Ability) {
  const who = ABILITIES[ability].map(one => ROLE_LABELS[one].label.toLowerCase())
  return fail({ status: 403, code: 'auth.notAllowed', message: `As ${ROLE_LABELS[role].label.toLowerCase()} you cannot do this. Ask a ${who.join(' or a ')}.` })
}
