import type { Db } from '../../db/client'
import { claimMail, mailsDue, markMailProblem, markMailSent, type MailRecord } from '../data/mailRows'
import { LONGEST_SEND_MS, MailProblem, type MailTransport } from './transport'

export interface MailRun { db: Db, transport: MailTransport, retrySeconds: number, now?: () => Date, /** Asked before each mail. */ stopped?: () => boolean }
export interface MailRunResult { sent: number, problems: number }

const MOST_AT_ONCE = 50
const MOST_TRIES = 10
const LONGEST_WAIT_MS = 6 * 3_600_000
/** How long a claimed mail is out of reach of another run; a crash during the attempt makes it due again after this. */
const CLAIM_MS = 2 * LONGEST_SEND_MS

const running = new WeakSet<Db>()

/** Sends what is due, one after another. Never throws; a second run while one is on its way does nothing. */
export async function sendDueMails(run: MailRun): Promise<MailRunResult> {
  const result = { sent: 0, problems: 0 }
  if (running.has(run.db)) return result
  running.add(run.db)
  try {
    const now = run.now ?? (() => new Date())
    for (const row of mailsDue(run.db, now().toISOString(), MOST_AT_ONCE)) {
      if (run.stopped?.()) break
      const outcome = await attempt(run, row, now)
      if (outcome === 'sent') result.sent += 1
      else if (outcome !== 'taken') result.problems += 1
      // The others would wait for the same server: they stay due, and the next run begins with one of them.
      if (outcome === 'unreachable') break
    }
  }
  catch (error) {
    // Only what kind of error: its message could name an address.
    console.error(`Mail: the queue could not be worked through (${(error as { code?: string })?.code ?? 'unknown error'}).`)
  }
  finally {
    running.delete(run.db)
  }
  return result
}

async function attempt({ db, transport, retrySeconds }: MailRun, row: MailRecord, now: () => Date): Promise<'sent' | 'taken' | 'problem' | 'unreachable'> {
  const attempts = row.attempts + 1
  if (!claimMail(db, row, later(now(), CLAIM_MS))) return 'taken'
  try {
    // Only after crashes in the middle of an attempt: every other way ends a mail at its last try.
    if (attempts > MOST_TRIES) throw new MailProblem('The mail was tried too often.', true, true)
    await transport.send({ id: row.id, to: row.toAddress, subject: row.subject, text: row.text, html: row.html, createdAt: row.createdAt })
  }
  catch (error) {
    const problem = error instanceof MailProblem ? error : new MailProblem('The mail could not be sent.', false, true)
    const over = problem.permanent || attempts >= MOST_TRIES
    markMailProblem(db, row.id, { problem: problem.message, attempts, nextAttemptAt: over ? null : later(now(), waitMs(retrySeconds, attempts)) })
    return problem.reached ? 'problem' : 'unreachable'
  }
  markMailSent(db, row.id, now().toISOString())
  return 'sent'
}

/** Doubles with each try that failed. @example waitMs(60, 1) // 60000, after the first */
function waitMs(retrySeconds: number, attempts: number): number {
  return Math.min(retrySeconds * 1000 * 2 ** (attempts - 1), LONGEST_WAIT_MS)
}

function later(from: Date, ms: number): string {
  return new Date(from.getTime() + ms).toISOString()
}
