import { and, asc, eq, inArray, like, lt, lte, min, sql } from 'drizzle-orm'
import type { MailRow, Page } from '#shared/types/team'
import type { Db } from '../../db/client'
import { mails } from '../../db/schema'
import { likePattern, orderBy, pageOf, type ListAsked } from './paging'
import type { Writer } from './writing'

export interface NewMail { teamId: string | null, to: string, kind: string, subject: string, text: string, html: string, at: string, /** Without one the mail is only kept. */ hasService: boolean }
export type MailRecord = typeof mails.$inferSelect

/** Puts a mail into the queue: call it inside the transaction of what the mail tells of. */
export function insertMail(tx: Pick<Writer, 'insert'>, row: NewMail): number {
  const { teamId, to, kind, subject, text, html, at, hasService } = row
  return tx.insert(mails).values({
    teamId, toAddress: to, kind, subject, text, html, createdAt: at,
    state: hasService ? 'waiting' : 'kept', nextAttemptAt: hasService ? at : null,
  }).returning({ id: mails.id }).get().id
}

/** What is due by now, longest due first. */
export function mailsDue(db: Db, now: string, most: number): MailRecord[] {
  return db.select().from(mails).where(and(eq(mails.state, 'waiting'), lte(mails.nextAttemptAt, now))).orderBy(asc(mails.nextAttemptAt), asc(mails.id)).limit(most).all()
}

/** Takes a due mail for one attempt, counted at once. False when somebody else has taken it since it was read. */
export function claimMail(db: Db, row: Pick<MailRecord, 'id' | 'attempts' | 'nextAttemptAt'>, until: string): boolean {
  if (row.nextAttemptAt === null) return false
  return db.update(mails).set({ attempts: row.attempts + 1, nextAttemptAt: until })
    .where(and(eq(mails.id, row.id), eq(mails.state, 'waiting'), eq(mails.attempts, row.attempts), eq(mails.nextAttemptAt, row.nextAttemptAt))).run().changes === 1
}

/** The text goes: links in it open things. */
export function markMailSent(db: Db, id: number, at: string): void {
  db.update(mails).set({ state: 'sent', sentAt: at, text: '', html: '', nextAttemptAt: null, problem: null }).where(eq(mails.id, id)).run()
}

/** Next try at `nextAttemptAt`; null is failed for good. `problem` is a code and a short sentence, never an answer of the server. */
export function markMailProblem(db: Db, id: number, { problem, attempts, nextAttemptAt }: { problem: string, attempts: number, nextAttemptAt: string | null }): void {
  db.update(mails).set({ state: nextAttemptAt === null ? 'failed' : 'waiting', problem, attempts, nextAttemptAt }).where(and(eq(mails.id, id), eq(mails.state, 'waiting'))).run()
}

/** Puts a mail of the team back at the front of the queue, with all its tries. */
export function retryMail(db: Writer, teamId: string, id: number, at: string): boolean {
  return db.update(mails).set({ state: 'waiting', attempts: 0, nextAttemptAt: at, problem: null })
    .where(and(eq(mails.id, id), eq(mails.teamId, teamId), inArray(mails.state, ['failed', 'waiting']))).run().changes === 1
}

/** When the next mail is due; null when none waits. */
export function nextMailAt(db: Db): string | null {
  return db.select({ at: min(mails.nextAttemptAt) }).from(mails).where(eq(mails.state, 'waiting')).get()?.at ?? null
}

/** Mails of a team, newest first. What they say is shown only where they are invented: links in them open things. */
export function listMails(db: Db, teamId: string, withText: boolean, asked: ListAsked & { state?: MailRecord['state'] }): Page<MailRow> {
  const where = and(eq(mails.teamId, teamId), asked.state ? eq(mails.state, asked.state) : undefined, asked.q ? like(sql`lower(${mails.toAddress} || ' ' || ${mails.subject})`, sql`${likePattern(asked.q)} escape '\\'`) : undefined)
  return pageOf(db, mails, where, asked,
    (limit, offset) => db.select().from(mails).where(where).orderBy(...orderBy(asked.sort, { createdAt: mails.createdAt }, mails.id)).limit(limit).offset(offset).all(),
    ({ id, toAddress, kind, subject, text, html, state, attempts, createdAt, sentAt, nextAttemptAt, problem }) => ({ id, to: toAddress, kind, subject, state, attempts, createdAt, sentAt, nextAttemptAt, problem, ...(withText && { text, html }) }))
}

/** What was kept or failed loses its text after a while: the links in it have ended, and nobody reads it any more. */
export function emptyOldMails(db: Db, before: string): void {
  db.update(mails).set({ text: '', html: '' }).where(and(inArray(mails.state, ['kept', 'failed']), lt(mails.createdAt, before))).run()
}
