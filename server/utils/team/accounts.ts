import type { H3Event } from 'h3'
import type { z } from 'zod'
import type { ProfileInput, SignInInput, SignUpInput } from '#shared/schemas/auth'
import { TeamSettings } from '#shared/schemas/team'
import type { Me } from '#shared/types/team'
import type { UserRecord } from '#shared/types/rows'
import { isCommonPassword } from '../access/commonPassword'
import { deviceOf } from '../access/deviceOf'
import { hashOfKey, newRegimenId, newToken } from '../access/linkKey'
import { actorOf } from '../access/requireMember'
import { enterSession, forgetSession, newSession, whoIs, type Who } from '../access/signedIn'
import { database, endSession, endSessions, findUser, findUserByEmail, hasSessions, insertMember, insertSession, insertTeam, insertUser, insertUserToken, knowsDevice, newestTeamOf, takeUserToken, teamsOf, updateUser, writeAudit, WRITING, type Writer } from '../data'
import { addressOf } from '../http/addressOf'
import { fail } from '../http/fail'
import { emailChangeAskMail, emailChangeToldMail, newSignInMail, passwordResetMail } from '../mail/templates'
import { hasMailService } from '../mail/worker'
import { whenInZone } from '../regimen/whenInZone'
import { checkCode } from './codes'
import { meOf } from './meOf'
import { serverOrigin } from './serverOrigin'
import { queueMail } from './tell'

const HOUR_MS = 3_600_000

// Hashing takes as long for an address nobody has: the answer must not tell by its time.
let decoy: Promise<string> | null = null

/**
 * The account of an address and a password, and of a code where it uses them.
 * @throws 401 `auth.wrong` (one answer for both), `auth.codeNeeded`, `auth.codeWrong`.
 */
export async function checkSignIn({ email, password, code }: SignInInput, right: () => void): Promise<UserRecord> {
  const user = findUserByEmail(database(), email)
  const hash = user?.passwordHash ?? await (decoy ??= hashPassword(newToken()))
  if (!await verifyPassword(hash, password) || !user) throw fail({ status: 401, code: 'auth.wrong', message: 'Address and password do not fit together. Try again, or ask for a new password.' })
  if (user.codesSealed !== null) {
    if (code === undefined) throw fail({ status: 401, code: 'auth.codeNeeded', message: 'This account uses one-time codes. Give the code of your authenticator app, or a recovery code.' })
    if (!checkCode(user, code)) throw fail({ status: 401, code: 'auth.codeWrong', message: 'This code is wrong or was used already. Wait for the next one and try again.' })
  }
  right()
  return user
}

/** Signs this browser in under a session of its own, and tells whom `also` tells, in one transaction. */
export async function enter(event: H3Event, user: UserRecord, teamId: string | null, also: ((tx: Writer, at: string) => void) | null): Promise<Me> {
  const { row, token } = newSession(event, user.id, teamId ?? newestTeamOf(database(), user.id))
  database().transaction((tx) => {
    also?.(tx, row.createdAt)
    insertSession(tx, row)
    writeAudit(tx, { at: row.createdAt, actor: actorOf(user), teamId: row.teamId, action: 'session.begin', objectType: 'user', objectId: user.id, objectName: user.name, detail: { device: row.device } })
  }, WRITING)
  await enterSession(event, user.id, token)
  return meNow(event, row.id, user.id)
}

/** The cookie of this answer reaches the browser only with it: what it will be allowed is read for it here. */
async function meNow(event: H3Event, _sessionId: string, userId: string): Promise<Me> {
  event.context.who = undefined
  const who = await whoIs(event)
  if (!who || who.user.id !== userId) throw new Error('The new session was not taken over.')
  return meOf(who)
}

/** A mail for a sign-in from a device this account has not been seen on. The first ever needs none. */
export function newSignInTold(event: H3Event, user: UserRecord): ((tx: Writer, at: string) => void) | null {
  const device = deviceOf(getRequestHeader(event, 'user-agent'))
  if (!hasSessions(database(), user.id) || knowsDevice(database(), user.id, device)) return null
  return (tx, at) => queueMail(tx, mailTeamOf(user), user.email, newSignInMail({ name: user.name, when: whenInZone(at, zoneOf(user)), device, address: addressOf(event), link: `${serverOrigin(event)}/profile` }), at)
}

/** A new account with a team of its own. */
export async function signUp({ name, email, password, teamName, timeZone }: SignUpInput): Promise<{ user: UserRecord, teamId: string }> {
  refuseCommon(password, [email, name, teamName])
  const passwordHash = await hashPassword(password)
  const at = new Date().toISOString()
  const [id, teamId] = [newRegimenId(), newRegimenId()]
  // One person alone has nobody to ask: such a team works without approval, and its sheets say so, until it decides otherwise.
  const parsed = TeamSettings.safeParse({ approvalRequired: false, ...(timeZone && { timeZone }) })
  const settings = parsed.success ? parsed.data : TeamSettings.parse({ approvalRequired: false })
  return database().transaction((tx) => {
    if (findUserByEmail(tx, email)) throw fail({ status: 422, code: 'auth.emailTaken', message: 'With this address you cannot sign up. If it is yours, sign in, or ask for a new password.', issues: [{ path: 'email', message: 'Sign in with this address, or ask for a new password.' }] })
    insertUser(tx, { id, name, email, passwordHash, createdAt: at })
    insertTeam(tx, { id: teamId, name: teamName, settingsJson: JSON.stringify(settings), createdAt: at })
    insertMember(tx, { id: newRegimenId(), teamId, userId: id, role: 'coordinator', joinedAt: at })
    const user = findUser(tx, id)!
    writeAudit(tx, { at, actor: actorOf(user), teamId, action: 'team.create', objectType: 'team', objectId: teamId, objectName: teamName, after: { name: teamName, coordinator: name } })
    return { user, teamId }
  }, WRITING)
}

/** Says the same whether somebody has the address or not, and does the work after the answer. */
export function sendReset(event: H3Event, email: string): string {
  const origin = serverOrigin(event)
  setImmediate(() => {
    const user = findUserByEmail(database(), email)
    // Without a mail service a link could only be read by somebody else; the demonstration shows its own.
    if (!user || (!hasMailService() && !user.demo)) return
    const [token, now] = [newToken(), new Date()]
    const at = now.toISOString()
    database().transaction((tx) => {
      insertUserToken(tx, { tokenHash: hashOfKey(token), userId: user.id, kind: 'reset', createdAt: at, expiresAt: new Date(now.getTime() + HOUR_MS).toISOString() })
      queueMail(tx, mailTeamOf(user), user.email, passwordResetMail({ name: user.name, link: `${origin}/reset#${token}` }), at)
    }, WRITING)
  })
  return hasMailService()
    ? 'If we know this address, a mail is on its way. Its link works once, for one hour.'
    : 'This server sends no mail yet. Ask whoever runs it to set up a mail service; in the demonstration, the outbox of the team shows the mail.'
}

/** @throws 410 `auth.linkEnded`, 422 for a common password. */
export async function resetPassword(token: string, password: string): Promise<UserRecord> {
  refuseCommon(password, [])
  const passwordHash = await hashPassword(password)
  const at = new Date().toISOString()
  return database().transaction((tx) => {
    const taken = takeUserToken(tx, hashOfKey(token), 'reset', at)
    if (!taken) throw linkEnded()
    updateUser(tx, taken.userId, { passwordHash })
    const user = findUser(tx, taken.userId)!
    const ended = endSessions(tx, user.id, at)
    writeAudit(tx, { at, actor: actorOf(user), teamId: newestTeamOf(tx, user.id), action: 'user.resetPassword', objectType: 'user', objectId: user.id, objectName: user.name, detail: { sessionsEnded: ended } })
    return user
  }, WRITING)
}

export async function checkPassword(user: UserRecord, password: string, right: () => void): Promise<void> {
  if (!await verifyPassword(user.passwordHash, password)) throw fail({ status: 422, code: 'auth.passwordWrong', message: 'This is not your password.', issues: [{ path: 'password', message: 'This is not your password.' }] })
  right()
}

/** Ends one sign-in of a person, or all but the present one. @returns how many ended. */
export function endSignIns({ user, session, team }: Who, id?: string): number {
  const at = new Date().toISOString()
  return database().transaction((tx) => {
    const ended = id === undefined ? endSessions(tx, user.id, at, session.id) : Number(endSession(tx, user.id, id, at))
    if (ended > 0) writeAudit(tx, { at, actor: actorOf(user), teamId: team?.id ?? null, action: 'session.end', objectType: 'user', objectId: user.id, objectName: user.name, detail: { ended } })
    return ended
  }, WRITING)
}

/** Signs this browser out; one that is not signed in stays so. */
export async function signOut(event: H3Event): Promise<void> {
  const who = await whoIs(event)
  if (who) endSignIns(who, who.session.id)
  await forgetSession(event)
}

export async function changePassword(who: Who, newPassword: string): Promise<Me> {
  const { user, session, team } = who
  refuseCommon(newPassword, [user.email, user.name, team?.name ?? ''], 'newPassword')
  const passwordHash = await hashPassword(newPassword)
  const at = new Date().toISOString()
  database().transaction((tx) => {
    updateUser(tx, user.id, { passwordHash })
    const ended = endSessions(tx, user.id, at, session.id)
    writeAudit(tx, { at, actor: actorOf(user), teamId: team?.id ?? null, action: 'user.changePassword', objectType: 'user', objectId: user.id, objectName: user.name, detail: { sessionsEnded: ended } })
  }, WRITING)
  return meOf(who)
}

export function changeProfile(who: Who, change: z.output<typeof ProfileInput>): Me {
  const { user, team } = who
  const at = new Date().toISOString()
  database().transaction((tx) => {
    updateUser(tx, user.id, change)
    writeAudit(tx, { at, actor: actorOf(user), teamId: team?.id ?? null, action: 'user.change', objectType: 'user', objectId: user.id, objectName: change.name, before: { name: user.name, registration: user.registration }, after: change })
  }, WRITING)
  return meOf({ ...who, user: { ...user, ...change } })
}

/** The new address takes over when its own link is opened; the old one is told at once. */
export function askEmailChange(event: H3Event, { user }: Who, newEmail: string): string {
  const [token, now] = [newToken(), new Date()]
  const at = now.toISOString()
  const origin = serverOrigin(event)
  database().transaction((tx) => {
    queueMail(tx, mailTeamOf(user), user.email, emailChangeToldMail({ name: user.name, newEmail, changed: false, link: `${origin}/profile` }), at)
    // An address that has an account already gets no link, and the one who asks is not told of it.
    if (findUserByEmail(tx, newEmail)) return
    insertUserToken(tx, { tokenHash: hashOfKey(token), userId: user.id, kind: 'email', newEmail, createdAt: at, expiresAt: new Date(now.getTime() + 24 * HOUR_MS).toISOString() })
    queueMail(tx, mailTeamOf(user), newEmail, emailChangeAskMail({ name: user.name, link: `${origin}/confirm-email#${token}` }), at)
  }, WRITING)
  return `Open the link in the mail to ${newEmail} within a day. Until then you sign in with the address you have.`
}

/** @throws 410 `auth.linkEnded`. */
export function confirmEmail(event: H3Event, token: string): string {
  const at = new Date().toISOString()
  return database().transaction((tx) => {
    const taken = takeUserToken(tx, hashOfKey(token), 'email', at)
    if (!taken?.newEmail || findUserByEmail(tx, taken.newEmail)) throw linkEnded()
    const user = findUser(tx, taken.userId)!
    updateUser(tx, user.id, { email: taken.newEmail })
    queueMail(tx, mailTeamOf(user), user.email, emailChangeToldMail({ name: user.name, newEmail: taken.newEmail, changed: true, link: `${serverOrigin(event)}/profile` }), at)
    writeAudit(tx, { at, actor: actorOf(user), teamId: newestTeamOf(tx, user.id), action: 'user.changeEmail', objectType: 'user', objectId: user.id, objectName: user.name, before: { email: user.email }, after: { email: taken.newEmail } })
    return taken.newEmail
  }, WRITING)
}

function linkEnded() {
  return fail({ status: 410, code: 'auth.linkEnded', message: 'This link has ended or was used already. Ask for a new one.' })
}

/** @throws 422 `auth.commonPassword`. */
export function refuseCommon(password: string, own: string[], path = 'password'): void {
  if (isCommonPassword(password, own)) throw fail({ status: 422, code: 'auth.commonPassword', message: 'This password is among those that are tried first. Take another, for example four words that do not belong together.', issues: [{ path, message: 'This password is among those that are tried first. Take another.' }] })
}

/**
 * The team whose coordinators see that a mail about an account waits or failed, never what it says. Only the outbox of
 * the demonstration shows texts, so nobody but its invented people may have mails there.
 */
export function mailTeamOf(user: UserRecord): string | null {
  return teamsOf(database(), user.id).find(team => team.demo === user.demo)?.id ?? null
}

function zoneOf(user: UserRecord): string {
  const [team] = teamsOf(database(), user.id)
  return team ? team.timeZone : 'Etc/UTC'
}
