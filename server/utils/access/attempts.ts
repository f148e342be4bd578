import { setResponseHeader, type H3Event } from 'h3'
import { database, findAttempts, forgetAttempts, forgetAttemptsBefore, saveAttempts } from '../data'
import { addressOf } from '../http/addressOf'
import { fail } from '../http/fail'
import { hashOfKey } from './linkKey'

/** What is tried: each kind is counted apart. */
export type Tried = 'sign-in' | 'reset' | 'link' | 'sign-up' | 'code'

/** So many go through before the waiting begins; a shared address has more people behind it than an account. */
const FREE = { account: 5, address: 20 } as const
const FIRST_WAIT_S = 2
const LONGEST_WAIT_S = 15 * 60
const FORGET_AFTER_MS = 24 * 3_600_000

/** Seconds to wait after so many failures in a row: nothing at first, then doubling. @example waitAfter(8, 5) // 16 */
export function waitAfter(failures: number, free: number): number {
  return failures < free ? 0 : Math.min(LONGEST_WAIT_S, FIRST_WAIT_S * 2 ** (failures - free))
}

/**
 * Counts an attempt before it is made, per address and per account, in the database: many at once gain nothing, and
 * neither does a restart. Call what it returns when the attempt was right.
 * @param account  what is attacked, for example the e-mail address, whether it exists or not; null where there is none.
 * @throws the error answer 429 `attempt.tooMany`, with Retry-After in seconds.
 */
export function takeAttempt(event: H3Event, kind: Tried, account: string | null, factor: number): () => void {
  const now = Date.now()
  const db = database()
  const keys = [
    { key: `${kind}|address|${addressOf(event)}`, free: Math.ceil(FREE.address * factor), isAccount: false },
    ...account === null ? [] : [{ key: `${kind}|account|${hashOfKey(account).slice(0, 32)}`, free: FREE.account, isAccount: true }],
  ]
  const counted = keys.map((one) => {
    const found = findAttempts(db, one.key)
    const failures = found && now - Date.parse(found.lastAt) < FORGET_AFTER_MS ? found.failures : 0
    const left = found ? Date.parse(found.lastAt) + waitAfter(failures, one.free) * 1000 - now : 0
    return { ...one, failures, left: failures >= one.free ? left : 0 }
  })
  const seconds = Math.ceil(Math.max(...counted.map(one => one.left)) / 1000)
  if (seconds > 0) {
    setResponseHeader(event, 'retry-after', seconds)
    throw fail({ status: 429, code: 'attempt.tooMany', message: `Too many wrong tries. Wait ${seconds < 120 ? `${seconds} seconds` : `${Math.ceil(seconds / 60)} minutes`} and try again.` })
  }
  const at = new Date(now).toISOString()
  for (const one of counted) saveAttempts(db, one.key, one.failures + 1, at)
  return () => {
    for (const { key, isAccount } of counted) {
      const left = (findAttempts(db, key)?.failures ?? 0) - 1
      // Whoever knows one account must not clear the way for trying others from the same address: there only this one try is taken back.
      if (isAccount || left <= 0) forgetAttempts(db, key)
      else saveAttempts(db, key, left, at)
    }
  }
}

/** Old counts go: called now and then. */
export function forgetOldAttempts(now: Date): void {
  forgetAttemptsBefore(database(), new Date(now.getTime() - FORGET_AFTER_MS).toISOString())
}
