import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { eq } from 'drizzle-orm'
import { openDatabase } from '../../../server/db/client'
import { mails } from '../../../server/db/schema'
import { insertMail, type NewMail } from '../../../server/utils/data/mailRows'
import { sendDueMails } from '../../../server/utils/mail/sendDueMails'
import { invitationMail } from '../../../server/utils/mail/templates'
import { mailTransport, type MailTransport } from '../../../server/utils/mail/transport'
import { scratchDatabase } from '../db/scratch'
import { closedPort, openPostbox, readMail, refusal, type Postbox } from './postbox'

const FROM = 'Thimbleful <plans@saltings.example>'
const START = Date.parse('2026-12-02T09:00:00.000Z')
const SECRET = 'https://plans.saltings.example/join#k=secret-of-the-link'

let scratch: ReturnType<typeof scratchDatabase>
let postbox: Postbox
let transport: MailTransport
let clock: number
const now = () => new Date(clock)
const at = (seconds: number) => new Date(START + seconds * 1000).toISOString()

beforeEach(async () => {
  clock = START
  scratch = scratchDatabase()
  postbox = await openPostbox()
  transport = mailTransport({ url: postbox.url, from: FROM })
})
afterEach(async () => {
  vi.restoreAllMocks()
  transport.close()
  await postbox.close()
  scratch.remove()
})

const queue = (mail: Partial<NewMail> = {}) => insertMail(scratch.db, { teamId: 'team', to: 'ines@keepers.example', kind: 'invitation', subject: 'Žarnić: 5 µm', text: `Read this: ${SECRET}\n`, html: `<p>Read this: ${SECRET}</p>`, at: at(0), hasService: true, ...mail })
const run = (over: Partial<Parameters<typeof sendDueMails>[0]> = {}) => sendDueMails({ db: scratch.db, transport, retrySeconds: 60, now, ...over })
const rowOf = (id: number) => scratch.db.select().from(mails).where(eq(mails.id, id)).get()!

describe('a mail that arrives', () => {
  it('has both parts, its headers, and every letter', async () => {
    const { kind, subject, text, html } = invitationMail({ teamName: 'Žabac & Čaplja µ-Rescue', roleLabel: 'Keeper', invitedBy: 'Ines Žarnić', link: SECRET, expiresAt: 'Wed 9 Dec, 14:00' })
    const id = queue({ kind, subject, text, html })
    expect(await run()).toEqual({ sent: 1, problems: 0 })

    const [received] = postbox.received
    expect(received).toMatchObject({ from: 'plans@saltings.example', to: ['ines@keepers.example'] })
    const mail = readMail(received!.raw)
    expect(mail.headers).toMatchObject({ 'from': 'Thimbleful <plans@saltings.example>', 'to': 'ines@keepers.example', subject, 'auto-submitted': 'auto-generated', 'x-auto-response-suppress': 'All' })
    expect(subject).toBe('Ines Žarnić invites you to Žabac & Čaplja µ-Rescue')
    expect(mail.headers['content-type']).toContain('multipart/alternative')
    expect(mail.headers['message-id']).toMatch(/^<[\da-f]{32}@saltings\.example>$/)
    expect(mail.headers).toHaveProperty('date')
    expect(mail.text.trimEnd()).toBe(text.trimEnd())
    expect(mail.html.trimEnd()).toBe(html.trimEnd())
    expect(mail.html).toContain('Žabac &amp; Čaplja µ-Rescue')
    expect(rowOf(id)).toMatchObject({ state: 'sent', attempts: 1, sentAt: at(0), nextAttemptAt: null, problem: null })
  })

  it('leaves no text behind', async () => {
    const id = queue()
    await run()
    expect(rowOf(id)).toMatchObject({ text: '', html: '', state: 'sent' })
    expect(JSON.stringify(scratch.db.select().from(mails).all())).not.toContain('secret')
  })

  it('is sent once, and those that are not due stay', async () => {
    queue()
    const later = queue({ at: at(1) })
    await run()
    await run()
    expect(postbox.received).toHaveLength(1)
    expect(rowOf(later)).toMatchObject({ state: 'waiting', attempts: 0 })
  })

  it('goes to one address or to none', async () => {
    const ids = ['a@one.example, b@two.example', 'a@one.example\r\nBcc: b@two.example', 'a@one.example>\r\nRCPT TO:<b@two.example', 'A <a@one.example>', 'all: a@one.example;', '', 'nobody'].map(to => queue({ to }))
    expect(await run()).toEqual({ sent: 0, problems: ids.length })
    expect(postbox.received).toEqual([])
    expect(ids.map(id => [rowOf(id).state, rowOf(id).problem])).toEqual(ids.map(() => ['failed', 'This is not an address that mail can be sent to.']))
  })

  it('takes nothing from a name into its headers', async () => {
    const name = 'Ines\r\nBcc: all@elsewhere.example\r\n\r\n<script>alert(1)</script>'
    const { subject, text, html } = invitationMail({ teamName: name, roleLabel: 'Keeper', invitedBy: name, link: SECRET, expiresAt: 'Wed 9 Dec' })
    queue({ subject, text, html })
    // Even a subject that nobody cleaned.
    queue({ subject: 'Hello\r\nBcc: all@elsewhere.example\r\nX-More: yes' })
    await run()
    expect(postbox.received).toHaveLength(2)
    for (const { raw, to } of postbox.received) {
      const { headerLines } = readMail(raw)
      expect(headerLines.filter(line => /^(bcc|x-more):/i.test(line))).toEqual([])
      expect(to).toEqual(['ines@keepers.example'])
    }
    expect(readMail(postbox.received[0]!.raw).html).not.toContain('<script')
  })
})

describe('a mail server that refuses', () => {
  it('is asked again after a while, and takes the mail once', async () => {
    const id = queue()
    postbox.decide = (_, asked) => asked <= 2 ? refusal(451, `Try later, ines@keepers.example, ${SECRET}`) : null

    expect(await run()).toEqual({ sent: 0, problems: 1 })
    expect(rowOf(id)).toMatchObject({ state: 'waiting', attempts: 1, nextAttemptAt: at(60), problem: '451: The mail server does not take mail for this address at the moment.' })
    clock = START + 59_000
    expect(await run()).toEqual({ sent: 0, problems: 0 })
    clock = START + 60_000
    await run()
    expect(rowOf(id)).toMatchObject({ state: 'waiting', attempts: 2, nextAttemptAt: at(60 + 120) })
    clock = START + 180_000
    expect(await run()).toEqual({ sent: 1, problems: 0 })
    await run()
    expect(postbox.received).toHaveLength(1)
    expect(rowOf(id)).toMatchObject({ state: 'sent', attempts: 3, problem: null })
  })

  it('for good is not asked again, and the others still go', async () => {
    const id = queue({ to: 'gone@keepers.example' })
    const other = queue()
    postbox.decide = address => address.startsWith('gone') ? refusal(550, `No such user gone@keepers.example, see ${SECRET}`) : null
    expect(await run()).toEqual({ sent: 1, problems: 1 })
    expect(rowOf(id)).toMatchObject({ state: 'failed', attempts: 1, nextAttemptAt: null, problem: '550: The mail server refuses this address. Check how it is written.' })
    expect(rowOf(id).text).toContain('secret')
    expect(rowOf(other).state).toBe('sent')
    clock += 86_400_000
    await run()
    expect(postbox.asked()).toBe(2)
  })

  it('waits longer each time, never over six hours, and gives up after ten tries', async () => {
    const id = queue()
    postbox.decide = () => refusal(450, 'busy')
    const waits: number[] = []
    for (let tries = 1; tries <= 10; tries += 1) {
      await run()
      const { nextAttemptAt } = rowOf(id)
      if (nextAttemptAt === null) break
      waits.push((Date.parse(nextAttemptAt) - clock) / 60_000)
      clock = Date.parse(nextAttemptAt)
    }
    expect(waits).toEqual([1, 2, 4, 8, 16, 32, 64, 128, 256])
    expect(rowOf(id)).toMatchObject({ state: 'failed', attempts: 10, nextAttemptAt: null })
    const slow = queue({ at: now().toISOString() })
    await run({ retrySeconds: 86_400 })
    expect(Date.parse(rowOf(slow).nextAttemptAt!) - clock).toBe(6 * 3_600_000)
  })
})

describe('a mail server that is down', () => {
  it('leaves the mail waiting with its problem, and gets it when it is back', async () => {
    const port = await closedPort()
    const lost = mailTransport({ url: `smtp://127.0.0.1:${port}`, from: FROM })
    const first = queue()
    const second = queue()
    expect(await run({ transport: lost })).toEqual({ sent: 0, problems: 1 })
    expect(rowOf(first)).toMatchObject({ state: 'waiting', attempts: 1, nextAttemptAt: at(60), problem: 'The mail server could not be reached.' })
    expect(rowOf(second), 'not used up while nobody is there').toMatchObject({ state: 'waiting', attempts: 0, problem: null })

    const back = await openPostbox({ atPort: port })
    clock += 60_000
    expect(await run({ transport: lost })).toEqual({ sent: 2, problems: 0 })
    expect(back.received).toHaveLength(2)
    expect(rowOf(first)).toMatchObject({ state: 'sent', problem: null, text: '' })
    await back.close()
  })

  it('never makes a run throw, whatever breaks, and names nobody in the log', async () => {
    const said = vi.spyOn(console, 'error').mockImplementation(() => {})
    const id = queue()
    expect(await run({ transport: { send: () => Promise.reject(new Error('ines@keepers.example')), close: () => {} } })).toEqual({ sent: 0, problems: 1 })
    expect(rowOf(id).problem).toBe('The mail could not be sent.')
    scratch.db.$client.exec('alter table mails rename to mails_gone')
    expect(await run()).toEqual({ sent: 0, problems: 0 })
    expect(said).toHaveBeenCalledOnce()
    expect(said.mock.calls.flat().join(' ')).not.toMatch(/ines|@|http/)
    scratch.db.$client.exec('alter table mails_gone rename to mails')
    clock += 60_000
    expect(await run(), 'the lock is free again').toEqual({ sent: 1, problems: 0 })
  })
})

describe('two runs at once', () => {
  it('of one process send once', async () => {
    queue()
    queue()
    const results = await Promise.all([run(), run()])
    expect(results).toEqual([{ sent: 2, problems: 0 }, { sent: 0, problems: 0 }])
    expect(postbox.received).toHaveLength(2)
  })

  it('over two connections send once', async () => {
    const other = openDatabase(scratch.file)
    for (let mail = 0; mail < 6; mail += 1) queue({ subject: `Mail ${mail}` })
    const results = await Promise.all([run(), run({ db: other })])
    expect(results.reduce((sum, { sent }) => sum + sent, 0)).toBe(6)
    expect(new Set(postbox.received.map(({ raw }) => readMail(raw).headers.subject)).size).toBe(6)
    expect(postbox.received).toHaveLength(6)
    other.$client.close()
  })

  it('after a crash in the middle the mail is due again, and counted', async () => {
    const id = queue()
    let free = () => {}
    const stuck = run({ transport: { send: () => new Promise((resolve) => {
      free = resolve
    }), close: () => {} } })
    expect(rowOf(id)).toMatchObject({ state: 'waiting', attempts: 1, nextAttemptAt: at(120) })
    const other = openDatabase(scratch.file)
    expect(await run({ db: other })).toEqual({ sent: 0, problems: 0 })
    clock += 120_000
    expect(await run({ db: other })).toEqual({ sent: 1, problems: 0 })
    free()
    await stuck
    other.$client.close()
    // Ten crashes in a row are enough.
    const poison = queue({ at: now().toISOString() })
    scratch.db.update(mails).set({ attempts: 10 }).where(eq(mails.id, poison)).run()
    await run()
    expect(rowOf(poison)).toMatchObject({ state: 'failed', problem: 'The mail was tried too often.' })
  })

  it('stops between two mails when asked', async () => {
    queue()
    queue()
    let mailsLeft = 1
    expect(await run({ stopped: () => mailsLeft-- <= 0 })).toEqual({ sent: 1, problems: 0 })
  })
})

it('keeps a mail without a mail service', async () => {
  const id = queue({ hasService: false })
  clock += 86_400_000
  expect(await run()).toEqual({ sent: 0, problems: 0 })
  expect(rowOf(id)).toMatchObject({ state: 'kept', nextAttemptAt: null, attempts: 0 })
  expect(rowOf(id).text).toContain(SECRET)
})
