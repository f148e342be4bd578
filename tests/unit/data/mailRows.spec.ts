import { eq } from 'drizzle-orm'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { mails } from '../../../server/db/schema'
import { claimMail, insertMail, mailsDue, markMailProblem, markMailSent, nextMailAt, retryMail, type NewMail } from '../../../server/utils/data/mailRows'
import { scratchDatabase } from '../db/scratch'

const at = (minute: number) => new Date(Date.parse('2026-12-02T09:00:00.000Z') + minute * 60_000).toISOString()
const mail: NewMail = { teamId: 'saltings', to: 'ines@keepers.example', kind: 'approved', subject: 'Juniper', text: 'text', html: '<p>html</p>', at: at(0), hasService: true }

let scratch: ReturnType<typeof scratchDatabase>
beforeEach(() => {
  scratch = scratchDatabase()
})
afterEach(() => scratch.remove())

const put = (over: Partial<NewMail> = {}) => insertMail(scratch.db, { ...mail, ...over })
const rowOf = (id: number) => scratch.db.select().from(mails).where(eq(mails.id, id)).get()!

describe('insertMail', () => {
  it('queues a mail where there is a mail service, and keeps it where there is none', () => {
    expect(rowOf(put())).toMatchObject({ teamId: 'saltings', toAddress: mail.to, kind: 'approved', subject: 'Juniper', text: 'text', html: '<p>html</p>', state: 'waiting', attempts: 0, createdAt: at(0), nextAttemptAt: at(0), sentAt: null, problem: null })
    expect(rowOf(put({ hasService: false, teamId: null }))).toMatchObject({ teamId: null, state: 'kept', nextAttemptAt: null })
  })
  it('belongs to the transaction it is called in', () => {
    expect(() => scratch.db.transaction((tx) => {
      insertMail(tx, mail)
      throw new Error('undone')
    })).toThrow('undone')
    expect(scratch.db.select().from(mails).all()).toEqual([])
    expect(scratch.db.transaction(tx => insertMail(tx, mail))).toBeGreaterThan(0)
  })
})

it('mailsDue gives what is due, the longest due first, and no more than asked for', () => {
  const late = put({ at: at(5) })
  const early = put({ at: at(1) })
  const same = put({ at: at(1) })
  put({ at: at(9) })
  put({ hasService: false })
  markMailSent(scratch.db, put(), at(0))
  expect(mailsDue(scratch.db, at(5), 10).map(row => row.id)).toEqual([early, same, late])
  expect(mailsDue(scratch.db, at(5), 2).map(row => row.id)).toEqual([early, same])
  expect(mailsDue(scratch.db, at(0), 10)).toEqual([])
})

it('claimMail gives a mail to one only', () => {
  const row = rowOf(put())
  expect(claimMail(scratch.db, row, at(2))).toBe(true)
  expect(claimMail(scratch.db, row, at(2))).toBe(false)
  expect(rowOf(row.id)).toMatchObject({ state: 'waiting', attempts: 1, nextAttemptAt: at(2) })
  expect(mailsDue(scratch.db, at(1), 10)).toEqual([])
  markMailSent(scratch.db, row.id, at(1))
  expect(claimMail(scratch.db, rowOf(row.id), at(2))).toBe(false)
})

it('markMailSent empties the mail', () => {
  const id = put()
  markMailProblem(scratch.db, id, { problem: '451: later', attempts: 1, nextAttemptAt: at(1) })
  markMailSent(scratch.db, id, at(1))
  expect(rowOf(id)).toMatchObject({ state: 'sent', sentAt: at(1), text: '', html: '', problem: null, nextAttemptAt: null, subject: 'Juniper' })
})

it('markMailProblem waits for the next try, or ends it', () => {
  const id = put()
  markMailProblem(scratch.db, id, { problem: '451: later', attempts: 1, nextAttemptAt: at(1) })
  expect(rowOf(id)).toMatchObject({ state: 'waiting', problem: '451: later', attempts: 1, nextAttemptAt: at(1), text: 'text' })
  markMailProblem(scratch.db, id, { problem: '550: no', attempts: 2, nextAttemptAt: null })
  expect(rowOf(id)).toMatchObject({ state: 'failed', problem: '550: no', attempts: 2, nextAttemptAt: null, text: 'text' })
  const sent = put()
  markMailSent(scratch.db, sent, at(1))
  markMailProblem(scratch.db, sent, { problem: '451: later', attempts: 1, nextAttemptAt: at(1) })
  expect(rowOf(sent).state).toBe('sent')
})

it('retryMail brings back what failed or waits, of this team only', () => {
  const failed = put()
  markMailProblem(scratch.db, failed, { problem: '550: no', attempts: 10, nextAttemptAt: null })
  expect(retryMail(scratch.db, 'other', failed, at(9))).toBe(false)
  expect(rowOf(failed).state).toBe('failed')
  expect(retryMail(scratch.db, 'saltings', failed, at(9))).toBe(true)
  expect(rowOf(failed)).toMatchObject({ state: 'waiting', attempts: 0, nextAttemptAt: at(9), problem: null })
  const waiting = put({ at: at(60) })
  expect(retryMail(scratch.db, 'saltings', waiting, at(9))).toBe(true)
  expect(rowOf(waiting).nextAttemptAt).toBe(at(9))
  const sent = put()
  markMailSent(scratch.db, sent, at(1))
  expect([sent, put({ hasService: false }), put({ teamId: null }), 9999].map(id => retryMail(scratch.db, 'saltings', id, at(9)))).toEqual([false, false, false, false])
})

it('nextMailAt is the earliest that waits', () => {
  expect(nextMailAt(scratch.db)).toBeNull()
  put({ hasService: false })
  expect(nextMailAt(scratch.db)).toBeNull()
  put({ at: at(5) })
  put({ at: at(2) })
  expect(nextMailAt(scratch.db)).toBe(at(2))
})
