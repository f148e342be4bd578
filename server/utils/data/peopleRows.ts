import { and, asc, count, desc, eq, gt, isNull, like, max, ne, or, sql } from 'drizzle-orm'
import type { MemberRecord, SessionRecord, TeamRecord, UserRecord } from '#shared/types/rows'
import type { MemberRow, Page, SessionRow, TeamChoice } from '#shared/types/team'
import type { Role } from '#shared/utils/abilities'
import type { Db } from '../../db/client'
import { members, recoveryCodes, sessions, teams, users, userTokens } from '../../db/schema'
import { likePattern, orderBy, pageOf, type ListAsked } from './paging'
import type { Writer } from './writing'

// ── People ────────────────────────────────────────────────────────────────────────────────────────────────────────

export function findUser(db: Writer, id: string): UserRecord | undefined {
  return db.select().from(users).where(eq(users.id, id)).get()
}
export function findUserByEmail(db: Writer, email: string): UserRecord | undefined {
  return db.select().from(users).where(eq(users.email, email)).get()
}
export function insertUser(tx: Writer, row: { id: string, name: string, email: string, passwordHash: string, registration?: string, demo?: boolean, createdAt: string }): void {
  tx.insert(users).values(row).run()
}
export function updateUser(tx: Writer, id: string, change: Partial<Pick<UserRecord, 'name' | 'email' | 'passwordHash' | 'registration' | 'codesSealed' | 'codesLastStep'>>): void {
  tx.update(users).set(change).where(eq(users.id, id)).run()
}
/** A code of a time step counts once. @returns whether this one was still free. */
export function useCodeStep(db: Db, userId: string, step: number): boolean {
  return db.update(users).set({ codesLastStep: step }).where(and(eq(users.id, userId), or(isNull(users.codesLastStep), sql`${users.codesLastStep} < ${step}`))).run().changes === 1
}
export function replaceRecoveryCodes(tx: Writer, userId: string, hashes: string[]): void {
  tx.delete(recoveryCodes).where(eq(recoveryCodes.userId, userId)).run()
  for (const codeHash of hashes) tx.insert(recoveryCodes).values({ userId, codeHash }).run()
}
/** @returns whether the code was one of theirs and not used yet. */
export function useRecoveryCode(db: Db, userId: string, codeHash: string, at: string): boolean {
  return db.update(recoveryCodes).set({ usedAt: at }).where(and(eq(recoveryCodes.userId, userId), eq(recoveryCodes.codeHash, codeHash), isNull(recoveryCodes.usedAt))).run().changes === 1
}

// ── Links in mails ────────────────────────────────────────────────────────────────────────────────────────────────

export function insertUserToken(tx: Writer, row: typeof userTokens.$inferInsert): void {
  // The newest is the only one that works.
  tx.delete(userTokens).where(and(eq(userTokens.userId, row.userId), eq(userTokens.kind, row.kind))).run()
  tx.insert(userTokens).values(row).run()
}
/** Takes a token so that it works once. @returns its row, or undefined when there is none, it ended or it was used. */
export function takeUserToken(tx: Writer, tokenHash: string, kind: 'reset' | 'email', at: string): typeof userTokens.$inferSelect | undefined {
  return tx.update(userTokens).set({ usedAt: at }).where(and(eq(userTokens.tokenHash, tokenHash), eq(userTokens.kind, kind), isNull(userTokens.usedAt), gt(userTokens.expiresAt, at))).returning().get()
}

// ── Sessions ──────────────────────────────────────────────────────────────────────────────────────────────────────

export function insertSession(tx: Writer, row: typeof sessions.$inferInsert): void {
  tx.insert(sessions).values(row).run()
}
export function findSession(db: Db, tokenHash: string, now: string): { session: SessionRecord, user: UserRecord } | undefined {
  const found = db.select({ session: sessions, user: users }).from(sessions).innerJoin(users, eq(users.id, sessions.userId)).where(and(eq(sessions.tokenHash, tokenHash), isNull(sessions.endedAt), gt(sessions.expiresAt, now))).get()
  return found
}
export function touchSession(db: Db, id: string, at: string, expiresAt: string): void {
  db.update(sessions).set({ lastSeenAt: at, expiresAt }).where(eq(sessions.id, id)).run()
}
export function setSessionTeam(tx: Writer, id: string, teamId: string | null): void {
  tx.update(sessions).set({ teamId }).where(eq(sessions.id, id)).run()
}
export function endSession(tx: Writer, userId: string, id: string, at: string): boolean {
  return tx.update(sessions).set({ endedAt: at }).where(and(eq(sessions.id, id), eq(sessions.userId, userId), isNull(sessions.endedAt))).run().changes === 1
}
/** Ends every session of a person, or all but one. */
export function endSessions(tx: Writer, userId: string, at: string, exceptId?: string): number {
  return tx.update(sessions).set({ endedAt: at }).where(and(eq(sessions.userId, userId), isNull(sessions.endedAt), exceptId ? ne(sessions.id, exceptId) : undefined)).run().changes
}
export function listSessions(db: Db, userId: string, currentId: string, now: string, asked: ListAsked): Page<SessionRow> {
  const where = and(eq(sessions.userId, userId), isNull(sessions.endedAt), gt(sessions.expiresAt, now))
  return pageOf(db, sessions, where, asked, (limit, offset) => db.select().from(sessions).where(where).orderBy(...orderBy(asked.sort, { lastSeenAt: sessions.lastSeenAt }, sessions.id)).limit(limit).offset(offset).all(),
    ({ id, device, address, createdAt, lastSeenAt }) => ({ id, device, address, createdAt, lastSeenAt, current: id === currentId }))
}
/** Whether a person has signed in from such a device before. */
export function knowsDevice(db: Writer, userId: string, device: string): boolean {
  return db.select({ id: sessions.id }).from(sessions).where(and(eq(sessions.userId, userId), eq(sessions.device, device))).limit(1).get() !== undefined
}
export function hasSessions(db: Writer, userId: string): boolean {
  return db.select({ id: sessions.id }).from(sessions).where(eq(sessions.userId, userId)).limit(1).get() !== undefined
}

// ── Teams and members ─────────────────────────────────────────────────────────────────────────────────────────────

export function insertTeam(tx: Writer, row: { id: string, name: string, settingsJson: string, demo?: boolean, createdAt: string }): void {
  tx.insert(teams).values(row).run()
}
export function findTeam(db: Writer, id: string): TeamRecord | undefined {
  return db.select().from(teams).where(eq(teams.id, id)).get()
}
export function updateTeam(tx: Writer, teamId: string, change: { name: string, settingsJson: string }): void {
  tx.update(teams).set(change).where(eq(teams.id, teamId)).run()
}
export function insertMember(tx: Writer, row: { id: string, teamId: string, userId: string, role: Role, joinedAt: string }): void {
  tx.insert(members).values(row).run()
}
export function findMember(db: Writer, teamId: string, userId: string): MemberRecord | undefined {
  return db.select().from(members).where(and(eq(members.teamId, teamId), eq(members.userId, userId), isNull(members.leftAt))).get()
}
export function findMemberById(db: Writer, teamId: string, id: string): { member: MemberRecord, user: UserRecord } | undefined {
  return db.select({ member: members, user: users }).from(members).innerJoin(users, eq(users.id, members.userId)).where(and(eq(members.teamId, teamId), eq(members.id, id), isNull(members.leftAt))).get()
}
export function setMemberRole(tx: Writer, teamId: string, id: string, role: Role): void {
  tx.update(members).set({ role }).where(and(eq(members.teamId, teamId), eq(members.id, id))).run()
}
/** A person leaves: the membership ends, and no browser of theirs stays in that team. */
export function endMember(tx: Writer, teamId: string, id: string, userId: string, at: string): void {
  tx.update(members).set({ leftAt: at }).where(and(eq(members.teamId, teamId), eq(members.id, id))).run()
  tx.update(sessions).set({ teamId: null }).where(and(eq(sessions.userId, userId), eq(sessions.teamId, teamId))).run()
}
export function countCoordinators(db: Writer, teamId: string): number {
  return db.select({ count: count() }).from(members).where(and(eq(members.teamId, teamId), eq(members.role, 'coordinator'), isNull(members.leftAt))).get()?.count ?? 0
}
/** Teams of a person, in the order of their names. */
export function teamsOf(db: Writer, userId: string): (TeamChoice & { demo: boolean, timeZone: string })[] {
  return db.select({ id: teams.id, name: teams.name, role: members.role, demo: teams.demo, timeZone: sql<string>`coalesce(json_extract(${teams.settingsJson}, '$.timeZone'), 'Etc/UTC')` }).from(members).innerJoin(teams, eq(teams.id, members.teamId)).where(and(eq(members.userId, userId), isNull(members.leftAt))).orderBy(asc(teams.name), asc(teams.id)).all()
}
/** People of a team with one of these roles. */
export function membersWithRole(db: Writer, teamId: string, roles: readonly Role[]): { userId: string, name: string, email: string, role: Role }[] {
  return db.select({ userId: users.id, name: users.name, email: users.email, role: members.role }).from(members).innerJoin(users, eq(users.id, members.userId)).where(and(eq(members.teamId, teamId), isNull(members.leftAt))).all().filter(one => roles.includes(one.role))
}
export function listMembers(db: Db, teamId: string, youId: string, asked: ListAsked & { role?: Role }): Page<MemberRow> {
  const where = and(
    eq(members.teamId, teamId), isNull(members.leftAt),
    asked.role ? eq(members.role, asked.role) : undefined,
    asked.q ? sql`exists (select 1 from ${users} where ${users.id} = ${members.userId} and ${like(sql`lower(${users.name} || ' ' || ${users.email})`, sql`${likePattern(asked.q)} escape '\\'`)})` : undefined,
  )
  const seen = db.select({ userId: sessions.userId, at: max(sessions.lastSeenAt).as('at') }).from(sessions).where(eq(sessions.teamId, teamId)).groupBy(sessions.userId).as('seen')
  return pageOf(db, members, where, asked,
    (limit, offset) => db.select({ member: members, user: users, seenAt: seen.at }).from(members).innerJoin(users, eq(users.id, members.userId)).leftJoin(seen, eq(seen.userId, members.userId)).where(where)
      .orderBy(...orderBy(asked.sort, { name: sql`lower(${users.name})`, role: members.role, joinedAt: members.joinedAt }, members.id)).limit(limit).offset(offset).all(),
    ({ member, user, seenAt }) => ({ id: member.id, name: user.name, email: user.email, role: member.role, registration: user.registration, hasCodes: user.codesSealed !== null, joinedAt: member.joinedAt, lastSeenAt: seenAt, you: user.id === youId }))
}
/** The newest of a person's teams, where the one of a session is gone. */
export function newestTeamOf(db: Writer, userId: string): string | null {
  return db.select({ teamId: members.teamId }).from(members).where(and(eq(members.userId, userId), isNull(members.leftAt))).orderBy(desc(members.joinedAt)).limit(1).get()?.teamId ?? null
}
