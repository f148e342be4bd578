import type { H3Event } from 'h3'
import type { z } from 'zod'
import type { InvitationAccept, InvitationInput } from '#shared/schemas/team'
import type { InvitationLook, Me } from '#shared/types/team'
import type { InvitationRecord } from '#shared/types/rows'
import { ROLE_LABELS } from '#shared/utils/abilities'
import { hashOfKey, newRegimenId, newToken } from '../access/linkKey'
import { actorOf, type Member } from '../access/requireMember'
import { whoIs } from '../access/signedIn'
import { database, findInvitation, findInvitationOf, findMember, findOpenInvitation, findTeam, findUser, findUserByEmail, insertInvitation, insertMember, insertUser, nameOfUser, setSessionTeam, updateInvitation, writeAudit, WRITING, type Writer } from '../data'
import { fail } from '../http/fail'
import { invitationMail } from '../mail/templates'
import { hasMailService } from '../mail/worker'
import { whenInZone } from '../regimen/whenInZone'
import { enter, refuseCommon } from './accounts'
import { meOf } from './meOf'
import { serverOrigin } from './serverOrigin'
import { queueMail } from './tell'

/** `kept` where no mail service is set: the mail is only in the outbox. */
interface InvitationReceipt { id: string, expiresAt: string, mail: 'waiting' | 'kept' }

const DAY_MS = 86_400_000
const AGAIN_DAYS = 7

/** @throws 422 for somebody who is in the team, or invited, already. */
export function invite(event: H3Event, member: Member, { email, role, days }: z.output<typeof InvitationInput>): InvitationReceipt {
  const { teamId, actor, user } = member
  const [id, token, now] = [newRegimenId(), newToken(), new Date()]
  const at = now.toISOString()
  const expiresAt = new Date(now.getTime() + days * DAY_MS).toISOString()
  database().transaction((tx) => {
    const known = findUserByEmail(tx, email)
    if (known && findMember(tx, teamId, known.id)) throw already('This person is in the team already.')
    if (findInvitationOf(tx, teamId, email, at)) throw already('This address is invited already. Send that invitation again, or withdraw it first.')
    insertInvitation(tx, { id, teamId, email, role, tokenHash: hashOfKey(token), invitedBy: user.id, createdAt: at, expiresAt })
    sendInvitation(tx, event, member, { email, role, expiresAt }, token, at)
    writeAudit(tx, { at, actor, teamId, action: 'invitation.create', objectType: 'invitation', objectId: id, objectName: email, after: { email, role, expiresAt } })
  }, WRITING)
  return { id, expiresAt, mail: hasMailService() ? 'waiting' : 'kept' }
}

export function inviteAgain(event: H3Event, member: Member, id: string): InvitationReceipt {
  const { teamId, actor } = member
  const [token, now] = [newToken(), new Date()]
  const at = now.toISOString()
  const expiresAt = new Date(now.getTime() + AGAIN_DAYS * DAY_MS).toISOString()
  database().transaction((tx) => {
    const invitation = findInvitation(tx, teamId, id)
    if (!invitation || !updateInvitation(tx, teamId, id, { tokenHash: hashOfKey(token), expiresAt })) throw invitationNotFound()
    sendInvitation(tx, event, member, { ...invitation, expiresAt }, token, at)
    writeAudit(tx, { at, actor, teamId, action: 'invitation.resend', objectType: 'invitation', objectId: id, objectName: invitation.email, before: { expiresAt: invitation.expiresAt }, after: { expiresAt } })
  }, WRITING)
  return { id, expiresAt, mail: hasMailService() ? 'waiting' : 'kept' }
}

function sendInvitation(tx: Writer, event: H3Event, { team, teamId, user, settings }: Member, { email, role, expiresAt }: Pick<InvitationRecord, 'email' | 'role' | 'expiresAt'>, token: string, at: string): void {
  queueMail(tx, teamId, email, invitationMail({ teamName: team.name, roleLabel: ROLE_LABELS[role].label, invitedBy: user.name, link: `${serverOrigin(event)}/invitation#${token}`, expiresAt: whenInZone(expiresAt, settings.timeZone) }), at)
}

export function withdrawInvitation({ teamId, actor }: Member, id: string): void {
  const at = new Date().toISOString()
  database().transaction((tx) => {
    const invitation = findInvitation(tx, teamId, id)
    if (!invitation || !updateInvitation(tx, teamId, id, { withdrawnAt: at })) throw invitationNotFound()
    writeAudit(tx, { at, actor, teamId, action: 'invitation.withdraw', objectType: 'invitation', objectId: id, objectName: invitation.email })
  }, WRITING)
}

/** @throws 410 `invitation.ended`. */
export async function lookAtInvitation(event: H3Event, token: string): Promise<InvitationLook> {
  const invitation = openInvitation(database(), token)
  const who = await whoIs(event)
  return {
    teamName: findTeam(database(), invitation.teamId)!.name, role: invitation.role, email: invitation.email, invitedBy: nameOfUser(database(), invitation.invitedBy), expiresAt: invitation.expiresAt,
    hasAccount: findUserByEmail(database(), invitation.email) !== undefined, signedInAs: who?.user.email ?? null,
  }
}

/**
 * Joins the team. Somebody with an account must be signed in as the invited address: the link alone is not enough to act
 * in their name. A newcomer makes an account; having the mail shows that the address is theirs.
 */
export async function acceptInvitation(event: H3Event, { token, name, password }: z.output<typeof InvitationAccept>): Promise<Me> {
  const invitation = openInvitation(database(), token)
  const who = await whoIs(event)
  const account = findUserByEmail(database(), invitation.email)
  if (account) {
    if (who?.user.id !== account.id) throw fail({ status: 401, code: 'invitation.signIn', message: `${invitation.email} has an account. Sign in with it, then open the link of the mail again.` })
    join(token, account.id, null)
    setSessionTeam(database(), who.session.id, invitation.teamId)
    event.context.who = undefined
    return meOf((await whoIs(event))!)
  }
  const missing = [...name ? [] : [{ path: 'name', message: 'Give your name, as others will read it.' }], ...password ? [] : [{ path: 'password', message: 'Choose a password of at least 12 characters.' }]]
  if (!name || !password) throw fail({ status: 422, code: 'invitation.incomplete', message: missing[0]!.message, issues: missing })
  refuseCommon(password, [invitation.email, name])
  const passwordHash = await hashPassword(password)
  const id = newRegimenId()
  join(token, id, { name, email: invitation.email, passwordHash })
  return enter(event, findUser(database(), id)!, invitation.teamId, null)
}

function join(token: string, userId: string, newcomer: { name: string, email: string, passwordHash: string } | null): void {
  const at = new Date().toISOString()
  database().transaction((tx) => {
    // Looked at again inside: two clicks must not join twice.
    const invitation = openInvitation(tx, token)
    updateInvitation(tx, invitation.teamId, invitation.id, { acceptedAt: at })
    if (newcomer) insertUser(tx, { id: userId, createdAt: at, ...newcomer })
    if (!findMember(tx, invitation.teamId, userId)) insertMember(tx, { id: newRegimenId(), teamId: invitation.teamId, userId, role: invitation.role, joinedAt: at })
    const user = findUser(tx, userId)!
    writeAudit(tx, { at, actor: actorOf(user), teamId: invitation.teamId, action: 'member.join', objectType: 'invitation', objectId: invitation.id, objectName: user.name, after: { role: invitation.role } })
  }, WRITING)
}

function openInvitation(db: Writer, token: string): InvitationRecord {
  const found = findOpenInvitation(db, hashOfKey(token), new Date().toISOString())
  if (!found) throw fail({ status: 410, code: 'invitation.ended', message: 'This invitation has ended, was withdrawn or was accepted already. Ask who sent it for a new one.' })
  return found
}

const invitationNotFound = () => fail({ status: 404, code: 'invitation.notFound', message: 'There is no such open invitation.' })
const already = (message: string) => fail({ status: 422, code: 'invitation.already', message, issues: [{ path: 'email', message }] })
