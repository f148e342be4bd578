import { afterEach, beforeEach, expect, it, vi } from 'vitest'
import { mails } from '../../../server/db/schema'
import { insertMail } from '../../../server/utils/data/mailRows'
import { mailTransport } from '../../../server/utils/mail/transport'
import { hasMailService, startMailWorker, wakeMailWorker } from '../../../server/utils/mail/worker'
import { scratchDatabase } from '../db/scratch'
import { openPostbox, refusal, type Postbox } from './postbox'

let scratch: ReturnType<typeof scratchDatabase>
let postbox: Postbox
let worker: ReturnType<typeof startMailWorker> | null = null

beforeEach(async () => {
  scratch = scratchDatabase()
  postbox = await openPostbox()
})
afterEach(async () => {
  await worker?.stop()
  worker = null
  vi.restoreAllMocks()
  await postbox.close()
  scratch.remove()
})

const start = (over: Partial<Parameters<typeof startMailWorker>[0]> = {}) => {
  worker = startMailWorker({ db: scratch.db, transport: mailTransport({ url: postbox.url, from: 'plans@saltings.example' }), retrySeconds: 60, ...over })
}
const queue = (tx: Parameters<typeof insertMail>[0] = scratch.db) => insertMail(tx, { teamId: null, to: 'ines@keepers.example', kind: 'newSignIn', subject: 'Hello', text: 'Hello', html: '<p>Hello</p>', at: new Date().toISOString(), hasService: hasMailService() })
const states = () => scratch.db.select({ state: mails.state }).from(mails).all().map(row => row.state)

it('sends what waits when it starts, and what comes when it is woken', async () => {
  expect(hasMailService()).toBe(false)
  wakeMailWorker()
  queue()
  start()
  expect(hasMailService()).toBe(true)
  queue()
  wakeMailWorker()
  queue()
  wakeMailWorker()
  await vi.waitFor(() => expect(states()).toEqual(['kept', 'sent', 'sent']), 5000)
  expect(postbox.received).toHaveLength(2)
})

it('waits for the transaction that woke it', async () => {
  start()
  await vi.waitFor(() => expect(hasMailService()).toBe(true))
  scratch.db.transaction((tx) => {
    queue(tx)
    wakeMailWorker()
  })
  expect(() => scratch.db.transaction((tx) => {
    queue(tx)
    wakeMailWorker()
    throw new Error('undone')
  })).toThrow('undone')
  await vi.waitFor(() => expect(states()).toEqual(['sent']), 5000)
  expect(postbox.received).toHaveLength(1)
})

it('wakes by itself when a mail is due again, and says how many failed, never whose', async () => {
  const said = vi.spyOn(console, 'warn').mockImplementation(() => {})
  postbox.decide = (_, asked) => asked === 1 ? refusal(451, 'later') : null
  start({ retrySeconds: 0.2 })
  queue()
  wakeMailWorker()
  await vi.waitFor(() => expect(states()).toEqual(['sent']), 5000)
  expect(said.mock.calls).toEqual([['Mail: 1 mail could not be sent. The outbox says why.']])
})

it('lets the mail on its way arrive when it stops, and starts no other', async () => {
  start()
  queue()
  queue()
  wakeMailWorker()
  await vi.waitFor(() => expect(postbox.asked()).toBe(1), { timeout: 5000, interval: 1 })
  await worker!.stop()
  const before = states()
  expect(before).not.toContain('failed')
  expect(before.filter(state => state === 'sent')).toHaveLength(postbox.received.length)
  expect(hasMailService()).toBe(false)
  wakeMailWorker()
  await new Promise(resolve => setTimeout(resolve, 50))
  expect(states()).toEqual(before)
})
