import { getHeader, type H3Event } from 'h3'
import type { MemberRecord, SessionRecord, TeamRecord, UserRecord } from '#shared/types/rows'
import { database, endSession, findMember, findSession, findTeam, newestTeamOf, setSessionTeam, touchSession } from '../data'
import { addressOf } from '../http/addressOf'
import { deviceOf } from './deviceOf'
import { hashOfKey, newRegimenId, newToken } from './linkKey'
import { readCookie, writeCookie } from './sealedCookie'

/** Somebody signed in, as the database knows them at this moment. */
export interface Who { user: UserRecord, session: SessionRecord, member: MemberRecord | null, team: TeamRecord | null }

const DAY_MS = 86_400_000
/** A browser that is not used for so long is signed out. */
const IDLE_DAYS = 30
/** And after so long in any case. */
const LONGEST_DAYS = 180
const TOUCH_EVERY_MS = 10 * 60_000

/** Who asks; null for someone who is not signed in. Read once for each request. */
export async function whoIs(event: H3Event): Promise<Who | null> {
  const { user, session } = await readCookie(event)
  if (!user || !session) return null
  const kept = event.context.who as Who | null | undefined
  return kept === undefined ? event.context.who = whoHas(user.id, session, new Date()) : kept
}

function whoHas(userId: string, token: string, now: Date): Who | null {
  const db = database()
  const found = findSession(db, hashOfKey(token), now.toISOString())
  if (!found || found.user.id !== userId) return null
  const { session, user } = found
  if (now.getTime() - Date.parse(session.lastSeenAt) > TOUCH_EVERY_MS) touchSession(db, session.id, now.toISOString(), expiryOf(session.createdAt, now))
  // The team of the session may be gone: then the newest that is left.
  const member = (session.teamId && findMember(db, session.teamId, user.id)) || null
  if (member) return { user, session, member, team: findTeam(db, member.teamId) ?? null }
  const other = newestTeamOf(db, user.id)
  if (other !== session.teamId) setSessionTeam(db, session.id, other)
  const otherMember = other ? findMember(db, other, user.id) ?? null : null
  return { user, session, member: otherMember, team: otherMember ? findTeam(db, otherMember.teamId) ?? null : null }
}

function expiryOf(createdAt: string, now: Date): string {
  return new Date(Math.min(now.getTime() + IDLE_DAYS * DAY_MS, Date.parse(createdAt) + LONGEST_DAYS * DAY_MS)).toISOString()
}

/** A sign-in to be written down in the transaction of what leads to it; then `enterSession` hands it to the browser. */
export function newSession(event: H3Event, userId: string, teamId: string | null): { row: NewSession, token: string } {
  const now = new Date()
  const at = now.toISOString()
  const token = newToken()
  const row = { id: newRegimenId(), userId, teamId, tokenHash: hashOfKey(token), device: deviceOf(getHeader(event, 'user-agent')), address: addressOf(event), createdAt: at, lastSeenAt: at, expiresAt: expiryOf(at, now) }
  return { row, token }
}
export type NewSession = Omit<SessionRecord, 'endedAt'>

/** A session of its own for each sign-in: one from before is ended, its cookie worth nothing. */
export async function enterSession(event: H3Event, userId: string, token: string): Promise<void> {
  const before = await whoIs(event)
  if (before) endSession(database(), before.user.id, before.session.id, new Date().toISOString())
  event.context.who = undefined
  await writeCookie(event, { user: { id: userId }, session: token, help: undefined })
}

/** Takes the sign-in out of this browser's cookie. Plans it remembers by their links stay. */
export async function forgetSession(event: H3Event): Promise<void> {
  event.context.who = undefined
  await writeCookie(event, { user: undefined, session: undefined })
}
