import { and, desc, eq, gt, isNotNull, isNull, like, lte, or, sql, type SQL } from 'drizzle-orm'
import type { HelperLinkRecord, InvitationRecord, RegimenRow, TransferRecord } from '#shared/types/rows'
import type { HelperLinkRow, InvitationRow, InvitationState, LinkState, Page, TransferRow } from '#shared/types/team'
import type { Db } from '../../db/client'
import { helperLinks, invitations, regimens, teams, transfers, users } from '../../db/schema'
import { likePattern, orderBy, pageOf, type ListAsked } from './paging'
import type { Writer } from './writing'

// ── Invitations ───────────────────────────────────────────────────────────────────────────────────────────────────

export function insertInvitation(tx: Writer, row: typeof invitations.$inferInsert): void {
  tx.insert(invitations).values(row).run()
}
export function findInvitation(db: Writer, teamId: string, id: string): InvitationRecord | undefined {
  return db.select().from(invitations).where(and(eq(invitations.teamId, teamId), eq(invitations.id, id))).get()
}
/** An invitation that can still be accepted. */
export function findOpenInvitation(db: Writer, tokenHash: string, now: string): InvitationRecord | undefined {
  return db.select().from(invitations).where(and(eq(invitations.tokenHash, tokenHash), isNull(invitations.acceptedAt), isNull(invitations.withdrawnAt), gt(invitations.expiresAt, now))).get()
}
/** An open invitation of that address, so that nobody is invited twice. */
export function findInvitationOf(db: Writer, teamId: string, email: string, now: string): InvitationRecord | undefined {
  return db.select().from(invitations).where(and(eq(invitations.teamId, teamId), eq(invitations.email, email), isNull(invitations.acceptedAt), isNull(invitations.withdrawnAt), gt(invitations.expiresAt, now))).get()
}
export function updateInvitation(tx: Writer, teamId: string, id: string, change: Partial<Pick<InvitationRecord, 'tokenHash' | 'expiresAt' | 'acceptedAt' | 'withdrawnAt'>>): boolean {
  return tx.update(invitations).set(change).where(and(eq(invitations.teamId, teamId), eq(invitations.id, id), isNull(invitations.acceptedAt), isNull(invitations.withdrawnAt))).run().changes === 1
}
const INVITATION_IS: Record<InvitationState, (now: string) => SQL | undefined> = {
  open: now => and(isNull(invitations.acceptedAt), isNull(invitations.withdrawnAt), gt(invitations.expiresAt, now)),
  accepted: () => isNotNull(invitations.acceptedAt),
  withdrawn: () => isNotNull(invitations.withdrawnAt),
  expired: now => and(isNull(invitations.acceptedAt), isNull(invitations.withdrawnAt), lte(invitations.expiresAt, now)),
}
export function listInvitations(db: Db, teamId: string, now: string, asked: ListAsked & { state?: InvitationState }): Page<InvitationRow> {
  const where = and(eq(invitations.teamId, teamId), asked.state ? INVITATION_IS[asked.state](now) : undefined, asked.q ? like(invitations.email, sql`${likePattern(asked.q)} escape '\\'`) : undefined)
  return pageOf(db, invitations, where, asked,
    (limit, offset) => db.select({ row: invitations, by: users.name }).from(invitations).innerJoin(users, eq(users.id, invitations.invitedBy)).where(where).orderBy(...orderBy(asked.sort, { createdAt: invitations.createdAt, email: invitations.email, expiresAt: invitations.expiresAt }, invitations.id)).limit(limit).offset(offset).all(),
    ({ row, by }) => ({ id: row.id, email: row.email, role: row.role, state: row.acceptedAt ? 'accepted' : row.withdrawnAt ? 'withdrawn' : row.expiresAt <= now ? 'expired' : 'open', invitedBy: by, createdAt: row.createdAt, expiresAt: row.expiresAt }))
}

// ── Links for helpers ─────────────────────────────────────────────────────────────────────────────────────────────

export function insertHelperLink(tx: Writer, row: typeof helperLinks.$inferInsert): void {
  tx.insert(helperLinks).values(row).run()
}
/** A link that opens something now. */
export function findOpenHelperLink(db: Writer, by: { tokenHash: string } | { id: string }, now: string): HelperLinkRecord | undefined {
  return db.select().from(helperLinks).where(and('id' in by ? eq(helperLinks.id, by.id) : eq(helperLinks.tokenHash, by.tokenHash), isNull(helperLinks.revokedAt), gt(helperLinks.expiresAt, now))).get()
}
export function countHelperOpening(tx: Writer, id: string, at: string, initials: string): void {
  tx.update(helperLinks).set({ opened: sql`${helperLinks.opened} + 1`, lastOpenedAt: at, lastInitials: initials }).where(eq(helperLinks.id, id)).run()
}
export function revokeHelperLink(tx: Writer, teamId: string, id: string, at: string): HelperLinkRecord | undefined {
  return tx.update(helperLinks).set({ revokedAt: at }).where(and(eq(helperLinks.teamId, teamId), eq(helperLinks.id, id), isNull(helperLinks.revokedAt))).returning().get()
}
/** Plans that a link opens: those of its animal or of its room, as long as they are cared for here. */
export function regimensOfLink(db: Writer, link: HelperLinkRecord): RegimenRow[] {
  return db.select().from(regimens).where(and(
    eq(regimens.teamId, link.teamId), isNull(regimens.movedAt), isNull(regimens.endedAt),
    link.regimenId ? eq(regimens.id, link.regimenId) : eq(regimens.room, link.room ?? ''),
  )).orderBy(regimens.enclosure, regimens.animalName).limit(200).all()
}
const LINK_IS: Record<LinkState, (now: string) => SQL | undefined> = {
  open: now => and(isNull(helperLinks.revokedAt), gt(helperLinks.expiresAt, now)),
  ended: now => and(isNull(helperLinks.revokedAt), lte(helperLinks.expiresAt, now)),
  revoked: () => isNotNull(helperLinks.revokedAt),
}
export function listHelperLinks(db: Db, teamId: string, now: string, asked: ListAsked & { state?: LinkState }): Page<HelperLinkRow> {
  const pattern = likePattern(asked.q)
  const where = and(eq(helperLinks.teamId, teamId), asked.state ? LINK_IS[asked.state](now) : undefined, asked.q ? or(like(sql`lower(${helperLinks.purpose})`, sql`${pattern} escape '\\'`), like(sql`lower(coalesce(${helperLinks.room}, ''))`, sql`${pattern} escape '\\'`)) : undefined)
  return pageOf(db, helperLinks, where, asked,
    (limit, offset) => db.select({ row: helperLinks, by: users.name, animal: regimens.animalName, species: regimens.speciesName }).from(helperLinks).innerJoin(users, eq(users.id, helperLinks.createdBy)).leftJoin(regimens, eq(regimens.id, helperLinks.regimenId)).where(where)
      .orderBy(...orderBy(asked.sort, { createdAt: helperLinks.createdAt, expiresAt: helperLinks.expiresAt, opened: helperLinks.opened }, helperLinks.id)).limit(limit).offset(offset).all(),
    ({ row, by, animal, species }) => ({
      id: row.id, scope: row.regimenId ? 'animal' : 'room', what: row.regimenId ? animal || species || '' : row.room ?? '', purpose: row.purpose, state: row.revokedAt ? 'revoked' : row.expiresAt <= now ? 'ended' : 'open',
      createdBy: by, createdAt: row.createdAt, expiresAt: row.expiresAt, opened: row.opened, lastOpenedAt: row.lastOpenedAt, lastInitials: row.lastInitials,
    }))
}

// ── Handing over ──────────────────────────────────────────────────────────────────────────────────────────────────

export function insertTransfer(tx: Writer, row: typeof transfers.$inferInsert): void {
  // One way out at a time: an older link of the same plan ends.
  tx.update(transfers).set({ state: 'withdrawn', decidedAt: row.createdAt }).where(and(eq(transfers.regimenId, row.regimenId), eq(transfers.state, 'open'))).run()
  tx.insert(transfers).values(row).run()
}
export function findOpenTransfer(db: Writer, tokenHash: string, now: string): TransferRecord | undefined {
  return db.select().from(transfers).where(and(eq(transfers.tokenHash, tokenHash), eq(transfers.state, 'open'), gt(transfers.expiresAt, now))).get()
}
export function declineTransfer(tx: Writer, id: string, at: string, by: string, otherTeamId: string): void {
  tx.update(transfers).set({ state: 'declined', decidedAt: at, decidedBy: by, otherTeamId }).where(and(eq(transfers.id, id), eq(transfers.state, 'open'))).run()
}
export function withdrawTransfer(tx: Writer, teamId: string, id: string, at: string, by: string): TransferRecord | undefined {
  return tx.update(transfers).set({ state: 'withdrawn', decidedAt: at, decidedBy: by }).where(and(eq(transfers.teamId, teamId), eq(transfers.id, id), eq(transfers.state, 'open'))).returning().get()
}
export function listTransfers(db: Db, teamId: string, now: string, asked: ListAsked): Page<TransferRow> {
  const where = eq(transfers.teamId, teamId)
  return pageOf(db, transfers, where, asked,
    (limit, offset) => db.select({ row: transfers, by: users.name, animal: regimens.animalName, species: regimens.speciesName, other: teams.name }).from(transfers).innerJoin(users, eq(users.id, transfers.createdById)).innerJoin(regimens, eq(regimens.id, transfers.regimenId)).leftJoin(teams, eq(teams.id, transfers.otherTeamId)).where(where).orderBy(desc(transfers.createdAt), desc(transfers.id)).limit(limit).offset(offset).all(),
    ({ row, by, animal, species, other }) => ({ id: row.id, regimenId: row.regimenId, animal: animal || species, state: row.state === 'open' && row.expiresAt <= now ? 'expired' : row.state, createdBy: by, createdAt: row.createdAt, expiresAt: row.expiresAt, decidedAt: row.decidedAt, decidedBy: row.decidedBy, otherTeam: other }))
}

/** Links somebody made who is leaving: they may still have the addresses. @returns how many ended. */
export function endLinksOf(tx: Writer, teamId: string, userId: string, at: string): number {
  const links = tx.update(helperLinks).set({ revokedAt: at }).where(and(eq(helperLinks.teamId, teamId), eq(helperLinks.createdBy, userId), isNull(helperLinks.revokedAt), gt(helperLinks.expiresAt, at))).run().changes
  const offers = tx.update(transfers).set({ state: 'withdrawn', decidedAt: at }).where(and(eq(transfers.teamId, teamId), eq(transfers.createdById, userId), eq(transfers.state, 'open'))).run().changes
  return links + offers
}
