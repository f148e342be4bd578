/** Shapes of people, teams and their lists, as the API answers them. */
import type { Role } from '../utils/abilities'
import type { TeamSettings } from '../schemas/team'

/** Every list of the API: one page of it, and how many there are in all. */
export interface Page<Item> { items: Item[], total: number, page: number, pageSize: number }

export interface TeamChoice { id: string, name: string, role: Role }

/** `GET /api/auth/me`. */
export interface Me {
  user: { id: string, name: string, email: string, registration: string, hasCodes: boolean, demo: boolean }
  /** Null for somebody who has left every team. */
  team: { id: string, name: string, role: Role, settings: TeamSettings, demo: boolean, /** This role must set up one-time codes first. */ codesDue: boolean } | null
  teams: TeamChoice[]
}

export interface MemberRow { id: string, name: string, email: string, role: Role, registration: string, hasCodes: boolean, joinedAt: string, lastSeenAt: string | null, you: boolean }

export const INVITATION_STATES = ['open', 'accepted', 'withdrawn', 'expired'] as const
export type InvitationState = (typeof INVITATION_STATES)[number]
export interface InvitationRow { id: string, email: string, role: Role, state: InvitationState, invitedBy: string, createdAt: string, expiresAt: string }
/** What someone with the link of an invitation sees before accepting. */
export interface InvitationLook { teamName: string, role: Role, email: string, invitedBy: string, expiresAt: string, hasAccount: boolean, signedInAs: string | null }

export const LINK_STATES = ['open', 'ended', 'revoked'] as const
export type LinkState = (typeof LINK_STATES)[number]
export interface HelperLinkRow { id: string, scope: 'animal' | 'room', what: string, purpose: string, state: LinkState, createdBy: string, createdAt: string, expiresAt: string, opened: number, lastOpenedAt: string | null, lastInitials: string | null }
/** Only when it is made: the address is never stored. */
export interface HelperLinkReceipt { id: string, link: string, expiresAt: string }

export interface SessionRow { id: string, device: string, address: string, createdAt: string, lastSeenAt: string, current: boolean }

export interface MailRow { id: number, to: string, kind: string, subject: string, state: 'waiting' | 'sent' | 'failed' | 'kept', attempts: number, createdAt: string, sentAt: string | null, nextAttemptAt: string | null, problem: string | null, /** Only in the demonstration's outbox. */ text?: string, html?: string }

export interface RecordRow { id: number, at: string, actor: string, action: string, /** In words. */ what: string, objectType: string, objectId: string, objectName: string, version: number | null, reason: string, before: unknown, after: unknown, hash: string }

export interface TransferLook { fromTeam: string, animal: string, speciesName: string, versions: number, by: string, expiresAt: string, note: string }
export interface TransferRow { id: string, regimenId: string, animal: string, state: 'open' | 'accepted' | 'declined' | 'withdrawn' | 'expired', createdBy: string, createdAt: string, expiresAt: string, decidedAt: string | null, decidedBy: string | null, otherTeam: string | null }

/** What a helper without an account sees. */
export interface HelperRound { teamName: string, purpose: string, initials: string, expiresAt: string, animals: { id: string, version: number, name: string, speciesName: string, caseNumber: string, enclosure: string }[] }
