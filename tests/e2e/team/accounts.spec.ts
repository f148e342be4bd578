import { createHmac } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import type { Me, Page, SessionRow } from '#shared/types/team'
import { expectOurShape, withDatabase } from '../api/client'
import { startServer } from '../server'
import { Browser, changeSettings, freshEmail, makeTeam, PASSWORD, signedUp, tokenOfMail, visitBy } from './people'

/** RFC 4226 and RFC 6238, written here from the standard: the server uses a package. */
function codeNow(base32: string, at = Date.now()): string {
  const bits = [...base32].map(letter => 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567'.indexOf(letter).toString(2).padStart(5, '0')).join('')
  const key = Buffer.from(bits.match(/.{8}/g)!.map(byte => Number.parseInt(byte, 2)))
  const counter = Buffer.alloc(8)
  counter.writeBigUInt64BE(BigInt(Math.floor(at / 30_000)))
  const hash = createHmac('sha1', key).update(counter).digest()
  return String((hash.readUInt32BE(hash[19]! & 15) & 0x7FFFFFFF) % 1_000_000).padStart(6, '0')
}

const signIn = (email: string, password = PASSWORD, more = {}) => new Browser().ask<Me>('POST', '/api/auth/sign-in', { email, password, ...more })

describe('signing up', () => {
  it('makes an account, a team and a sign-in, whose cookie no script reads', async () => {
    const browser = new Browser()
    const answer = await browser.ask<Me>('POST', '/api/auth/sign-up', { name: 'Ines Carvalho', email: `  ${freshEmail('Ines').toUpperCase()} `, password: PASSWORD, teamName: 'Saltings Rescue' })
    expect(answer.status).toBe(201)
    expect(answer.json.team).toMatchObject({ name: 'Saltings Rescue', role: 'coordinator' })
    expect(answer.json.user.email).toMatch(/^ines\./)
    const cookie = answer.headers.getSetCookie().join()
    expect(cookie).toMatch(/HttpOnly/i)
    expect(cookie).toMatch(/SameSite=Lax/i)
    expect(cookie).not.toMatch(/;\s*Secure/i)
    expect((await browser.done<Me>('GET', '/api/auth/me')).user.name).toBe('Ines Carvalho')
  })

  it('sets a Secure cookie behind https', async () => {
    const answer = await new Browser({ 'x-forwarded-proto': 'https' }).ask('POST', '/api/auth/sign-up', { name: 'A', email: freshEmail(), password: PASSWORD, teamName: 'B' })
    expect(answer.headers.getSetCookie().join()).toMatch(/;\s*Secure/i)
  })

  it.each([
    ['too short', 'elevenchars', 400], ['a common one', 'passwordpassword', 422], ['a common one with figures around', 'Football2026!', 422], ['keys in a row', '123456789012', 422], ['one sign', 'aaaaaaaaaaaa', 422],
  ])('refuses a password that is %s and makes nothing', async (_what, password, status) => {
    const email = freshEmail()
    const answer = await new Browser().ask('POST', '/api/auth/sign-up', { name: 'A', email, password, teamName: 'B' })
    expectOurShape(answer, status)
    expect(answer.data.issues?.[0]?.path).toBe('password')
    expect(withDatabase(db => db.prepare('select count(*) from users where email = ?').pluck().get(email))).toBe(0)
  })

  it('takes any characters in a password', async () => {
    const [email, password] = [freshEmail(), 'ž µ 亀 \'";--<b>🦎 x']
    expect((await new Browser().ask('POST', '/api/auth/sign-up', { name: 'A', email, password, teamName: 'B' })).status).toBe(201)
    expect((await signIn(email, password)).status).toBe(200)
  })

  it('keeps no password, only its hash', async () => {
    const { email } = await signedUp()
    const hash = withDatabase(db => db.prepare('select password_hash from users where email = ?').pluck().get(email)) as string
    expect(hash).toMatch(/^\$scrypt\$/)
    expect(hash).not.toContain(PASSWORD)
  })
})

describe('signing in', () => {
  it('gives one answer for a wrong password and for an unknown address', async () => {
    const { email } = await signedUp()
    const [wrong, unknown] = [await signIn(email, 'not the password'), await signIn(freshEmail())]
    expectOurShape(wrong, 401, 'auth.wrong')
    expect(unknown.text).toBe(wrong.text)
    expect(wrong.headers.getSetCookie()).toEqual([])
  })

  it('begins a session of its own: the cookie from before is worth nothing', async () => {
    const { browser, email } = await signedUp()
    const before = browser.cookie
    await browser.done('POST', '/api/auth/sign-in', { email, password: PASSWORD })
    expect(browser.cookie).not.toBe(before)
    const old = new Browser()
    old.cookie = before
    expect((await old.ask('GET', '/api/team')).status).toBe(401)
    expect((await browser.ask('GET', '/api/team')).status).toBe(200)
  })

  it('ends with signing out, for a copy of the cookie too', async () => {
    const { browser } = await signedUp()
    const copy = new Browser()
    copy.cookie = browser.cookie
    expect((await browser.ask('POST', '/api/auth/sign-out', {})).status).toBe(204)
    expect((await copy.ask('GET', '/api/team')).status).toBe(401)
    expect(await copy.done('GET', '/api/auth/me')).toEqual({ user: null })
  })

  it('waits longer and longer after wrong tries, for the account and whether it exists or not', async () => {
    for (const email of [(await signedUp()).email, freshEmail()]) {
      for (let tries = 0; tries < 6; tries += 1) await signIn(email, 'not the password')
      const refused = await signIn(email)
      expectOurShape(refused, 429, 'attempt.tooMany')
      expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0)
    }
  })

  it('still waits after a restart', async () => {
    const first = await startServer()
    const email = 'mara@saltings.example'
    const tries = async (base: string) => (await fetch(`${base}/api/auth/sign-in`, { method: 'POST', body: JSON.stringify({ email, password: 'wrong wrong wrong' }) })).status
    let last = 0
    // Each wrong try doubles the wait; nine of them make it longer than a restart.
    for (let count = 0; count < 40 && last !== 429; count += 1) last = await tries(first.url)
    await new Promise(resolve => setTimeout(resolve, 2100))
    await tries(first.url)
    await new Promise(resolve => setTimeout(resolve, 4100))
    await tries(first.url)
    expect(await tries(first.url)).toBe(429)
    const folder = first.dataDir
    const second = await startServer({ dataDir: folder })
    expect(await tries(second.url)).toBe(429)
    await second.stop()
    await first.stop()
  })

  it('takes as long for an unknown address as for a wrong password', async () => {
    const { email } = await signedUp()
    const time = async (address: string) => {
      const started = performance.now()
      await signIn(address, 'not the password')
      return performance.now() - started
    }
    await time(freshEmail())
    const known = Math.min(await time(email), await time(email), await time(email))
    const unknown = Math.min(await time(freshEmail()), await time(freshEmail()), await time(freshEmail()))
    // Hashing takes some 60 ms: without it the answer would come in two or three.
    expect(unknown / known).toBeGreaterThan(0.4)
    expect(unknown / known).toBeLessThan(2.5)
  })
})

describe('sessions', () => {
  it('are listed, and each can be ended from another', async () => {
    const { browser, email } = await signedUp()
    const phone = new Browser({ 'user-agent': 'Mozilla/5.0 (Linux; Android 15) AppleWebKit/537.36 Chrome/140.0 Mobile Safari/537.36' })
    await phone.done('POST', '/api/auth/sign-in', { email, password: PASSWORD })
    const { items } = await browser.done<Page<SessionRow>>('GET', '/api/auth/sessions')
    expect(items.map(one => one.device)).toEqual(expect.arrayContaining(['Chrome on Android']))
    expect(items.filter(one => one.current)).toHaveLength(1)
    await browser.done('DELETE', `/api/auth/sessions/${items.find(one => !one.current)!.id}`)
    expect((await phone.ask('GET', '/api/team')).status).toBe(401)
  })

  it('of somebody else are a 404', async () => {
    const [one, other] = [await signedUp(), await signedUp()]
    const { items } = await other.browser.done<Page<SessionRow>>('GET', '/api/auth/sessions')
    expectOurShape(await one.browser.ask('DELETE', `/api/auth/sessions/${items[0]!.id}`), 404, 'session.notFound')
    expect((await other.browser.ask('GET', '/api/team')).status).toBe(200)
  })

  it('end, all others, with a changed password', async () => {
    const { browser, email } = await signedUp()
    const other = new Browser()
    await other.done('POST', '/api/auth/sign-in', { email, password: PASSWORD })
    await browser.done('POST', '/api/auth/password', { password: PASSWORD, newPassword: 'another lantern orchard' })
    expect((await other.ask('GET', '/api/team')).status).toBe(401)
    expect((await browser.ask('GET', '/api/team')).status).toBe(200)
    expect((await signIn(email)).status).toBe(401)
    expect((await signIn(email, 'another lantern orchard')).status).toBe(200)
  })

  it('hold no role: a new one counts from the next request on', async () => {
    const { people } = await makeTeam()
    const page = await people.coordinator.done<Page<{ id: string, role: string }>>('GET', '/api/team/members')
    expect((await people.carer.ask('GET', '/api/team/links')).status).toBe(403)
    await people.coordinator.done('PATCH', `/api/team/members/${page.items.find(one => one.role === 'carer')!.id}`, { role: 'keeper' })
    expect((await people.carer.ask('GET', '/api/team/links')).status).toBe(200)
  })
})

describe('a forgotten password', () => {
  const demoUser = async () => {
    const { browser, email } = await signedUp()
    // Without a mail service only invented people get the mail, into the outbox of the demonstration.
    withDatabase(db => db.prepare('update users set demo = 1 where email = ?').run(email))
    return { browser, email }
  }
  const mailed = async (email: string) => {
    for (let tries = 0; tries < 50; tries += 1) {
      const found = withDatabase(db => db.prepare('select count(*) from mails where to_address = ? and kind = \'passwordReset\'').pluck().get(email)) as number
      if (found > 0) return
      await new Promise(resolve => setTimeout(resolve, 20))
    }
  }

  it('answers the same whether there is such an account or not', async () => {
    const { email } = await demoUser()
    const [known, unknown] = [await new Browser().ask('POST', '/api/auth/forgot', { email }), await new Browser().ask('POST', '/api/auth/forgot', { email: freshEmail() })]
    expect(known.status).toBe(202)
    expect(unknown.text).toBe(known.text)
  })

  it('is set anew by the link, once, and ends every sign-in', async () => {
    const { browser, email } = await demoUser()
    await new Browser().done('POST', '/api/auth/forgot', { email })
    await mailed(email)
    const token = tokenOfMail(email, 'passwordReset')
    const fresh = new Browser()
    await fresh.done('POST', '/api/auth/reset', { token, password: 'a new lantern by the sea' })
    expect((await fresh.ask('GET', '/api/team')).status).toBe(200)
    expect((await browser.ask('GET', '/api/team')).status).toBe(401)
    expectOurShape(await new Browser().ask('POST', '/api/auth/reset', { token, password: 'once more lantern sea' }), 410, 'auth.linkEnded')
    expect((await signIn(email, 'a new lantern by the sea')).status).toBe(200)
  })

  it('has a link for one hour, of which only the hash is stored', async () => {
    const { email } = await demoUser()
    await new Browser().done('POST', '/api/auth/forgot', { email })
    await mailed(email)
    const token = tokenOfMail(email, 'passwordReset')
    const row = withDatabase(db => db.prepare('select t.* from user_tokens t join users u on u.id = t.user_id where u.email = ?').get(email)) as { token_hash: string, created_at: string, expires_at: string }
    expect(Date.parse(row.expires_at) - Date.parse(row.created_at)).toBe(3_600_000)
    expect(row.token_hash).not.toContain(token)
    withDatabase(db => db.prepare('update user_tokens set expires_at = \'2026-01-01T00:00:00.000Z\' where token_hash = ?').run(row.token_hash))
    expectOurShape(await new Browser().ask('POST', '/api/auth/reset', { token, password: 'a new lantern by the sea' }), 410)
  })
})

describe('another e-mail address', () => {
  it('is asked of the new one, told to the old one, and counts only when confirmed', async () => {
    const { browser, email } = await signedUp()
    const newEmail = freshEmail('new')
    await browser.done('POST', '/api/auth/email', { password: PASSWORD, newEmail })
    const kinds = (to: string) => withDatabase(db => db.prepare('select kind from mails where to_address = ? order by id').pluck().all(to))
    expect(kinds(email)).toEqual(['emailChangeTold'])
    expect(kinds(newEmail)).toEqual(['emailChangeAsk'])
    expect((await signIn(email)).status).toBe(200)
    const token = tokenOfMail(newEmail, 'emailChangeAsk')
    await new Browser().done('POST', '/api/auth/email-confirm', { token })
    expect((await signIn(newEmail)).status).toBe(200)
    expect((await signIn(email)).status).toBe(401)
    expect(kinds(email)).toEqual(['emailChangeTold', 'newSignIn', 'emailChangeTold'].filter(kind => kinds(email).includes(kind)))
    expectOurShape(await new Browser().ask('POST', '/api/auth/email-confirm', { token }), 410)
  })

  it('that has an account already is not told of, and takes nothing over', async () => {
    const [one, other] = [await signedUp(), await signedUp()]
    const [taken, free] = [await one.browser.ask('POST', '/api/auth/email', { password: PASSWORD, newEmail: other.email }), await one.browser.ask('POST', '/api/auth/email', { password: PASSWORD, newEmail: freshEmail() })]
    expect(taken.status).toBe(free.status)
    expect(withDatabase(db => db.prepare('select count(*) from mails where to_address = ? and kind = \'emailChangeAsk\'').pluck().get(other.email))).toBe(0)
  })
})

describe('one-time codes', () => {
  async function withCodes() {
    const { browser, email } = await signedUp()
    const { secret, uri, svg } = await browser.done<{ secret: string, uri: string, svg: string }>('POST', '/api/auth/codes/set-up', { password: PASSWORD })
    expect(uri).toMatch(/^otpauth:\/\/totp\//)
    expect(svg).toContain('<svg')
    const { recoveryCodes } = await browser.done<{ recoveryCodes: string[] }>('POST', '/api/auth/codes/confirm', { code: codeNow(secret) })
    expect(recoveryCodes).toHaveLength(10)
    return { browser, email, secret, recoveryCodes }
  }

  it('are asked for at the sign-in from then on, and each works once', async () => {
    const { email, secret } = await withCodes()
    expectOurShape(await signIn(email), 401, 'auth.codeNeeded')
    expectOurShape(await signIn(email, PASSWORD, { code: '000000' }), 401, 'auth.codeWrong')
    // The code of the set-up is used; the next step's is not.
    expectOurShape(await signIn(email, PASSWORD, { code: codeNow(secret) }), 401, 'auth.codeWrong')
    const next = codeNow(secret, Date.now() + 30_000)
    expect((await signIn(email, PASSWORD, { code: next })).status).toBe(200)
    expectOurShape(await signIn(email, PASSWORD, { code: next }), 401, 'auth.codeWrong')
  })

  it('tell nothing of themselves to a wrong password', async () => {
    const { email } = await withCodes()
    expectOurShape(await signIn(email, 'not the password'), 401, 'auth.wrong')
  })

  it('have recovery codes, each good once', async () => {
    const { email, recoveryCodes } = await withCodes()
    expect((await signIn(email, PASSWORD, { code: recoveryCodes[3] })).status).toBe(200)
    expectOurShape(await signIn(email, PASSWORD, { code: recoveryCodes[3] }), 401, 'auth.codeWrong')
    expect((await signIn(email, PASSWORD, { code: recoveryCodes[4]!.toUpperCase() })).status).toBe(200)
  })

  it('stand sealed in the database', async () => {
    const { email, secret, recoveryCodes } = await withCodes()
    const whole = JSON.stringify(withDatabase(db => [db.prepare('select codes_sealed from users where email = ?').all(email), db.prepare('select code_hash from recovery_codes').all()]))
    for (const secretWord of [secret, ...recoveryCodes]) expect(whole).not.toContain(secretWord)
  })

  it('can be required of vets and coordinators: until they have them, nothing of the team opens', async () => {
    const { people } = await makeTeam()
    await changeSettings(people.coordinator, { codesRequired: true })
    expectOurShape(await people.vet.ask('GET', '/api/regimens'), 403, 'auth.codesDue')
    expect((await people.carer.ask('GET', '/api/regimens')).status).toBe(200)
    const { secret } = await people.vet.done<{ secret: string }>('POST', '/api/auth/codes/set-up', { password: PASSWORD })
    await people.vet.done('POST', '/api/auth/codes/confirm', { code: codeNow(secret) })
    expect((await people.vet.ask('GET', '/api/regimens')).status).toBe(200)
  })
})

describe('people of several teams', () => {
  it('join with the account they have, and switch with one request', async () => {
    const [one, other] = [await signedUp('Saltings Rescue'), await signedUp('Harbour Refuge')]
    await other.browser.done('POST', '/api/team/invitations', { email: one.email, role: 'carer' })
    const token = tokenOfMail(one.email, 'invitation')
    // The link alone is not enough for an address that has an account.
    expectOurShape(await new Browser().ask('POST', '/api/invitations/accept', { token, name: 'Somebody else', password: PASSWORD }), 401, 'invitation.signIn')
    const me = await one.browser.done<Me>('POST', '/api/invitations/accept', { token })
    expect(me.team).toMatchObject({ name: 'Harbour Refuge', role: 'carer' })
    expect(me.teams.map(team => team.name)).toEqual(['Harbour Refuge', 'Saltings Rescue'])
    const back = await one.browser.done<Me>('POST', '/api/auth/team', { teamId: one.me.team!.id })
    expect(back.team).toMatchObject({ name: 'Saltings Rescue', role: 'coordinator' })
  })

  it('leave, or are taken out, at once everywhere', async () => {
    const { people, emails } = await makeTeam()
    const second = new Browser()
    await second.done('POST', '/api/auth/sign-in', { email: emails.carer, password: PASSWORD })
    const { items } = await people.coordinator.done<Page<{ id: string, role: string }>>('GET', '/api/team/members?role=carer')
    await people.coordinator.done('DELETE', `/api/team/members/${items[0]!.id}`)
    for (const browser of [people.carer, second]) expectOurShape(await browser.ask('GET', '/api/regimens'), 403, 'team.none')
    // Links they made go with them: they may still have the addresses.
    const { browser: helper } = await visitBy(people.keeper, { room: 'Warm room' })
    const keeper = (await people.coordinator.done<Page<{ id: string }>>('GET', '/api/team/members?role=keeper')).items[0]!
    await people.coordinator.done('DELETE', `/api/team/members/${keeper.id}`)
    expectOurShape(await helper.ask('GET', '/api/help/round'), 401, 'help.closed')
  })

  it('cannot leave a team without a coordinator', async () => {
    const { browser } = await signedUp()
    const { items } = await browser.done<Page<{ id: string }>>('GET', '/api/team/members')
    expectOurShape(await browser.ask('DELETE', `/api/team/members/${items[0]!.id}`), 422, 'member.lastCoordinator')
    expectOurShape(await browser.ask('PATCH', `/api/team/members/${items[0]!.id}`, { role: 'carer' }), 422, 'member.lastCoordinator')
  })
})

describe('invitations', () => {
  it('work once, and end when they are withdrawn, sent again or too old', async () => {
    const { browser } = await signedUp()
    const invite = async () => {
      const email = freshEmail('new')
      const { id } = await browser.done<{ id: string }>('POST', '/api/team/invitations', { email, role: 'keeper' })
      return { id, email, token: tokenOfMail(email, 'invitation') }
    }
    const accept = (token: string) => new Browser().ask('POST', '/api/invitations/accept', { token, name: 'Mara Linde', password: PASSWORD })
    const used = await invite()
    expect((await accept(used.token)).status).toBe(200)
    expectOurShape(await accept(used.token), 410, 'invitation.ended')
    const withdrawn = await invite()
    await browser.done('DELETE', `/api/team/invitations/${withdrawn.id}`)
    expectOurShape(await accept(withdrawn.token), 410)
    const again = await invite()
    await browser.done('POST', `/api/team/invitations/${again.id}/resend`, {})
    expectOurShape(await accept(again.token), 410)
    expect((await accept(tokenOfMail(again.email, 'invitation'))).status).toBe(200)
    const old = await invite()
    withDatabase(db => db.prepare('update invitations set expires_at = \'2026-01-01T00:00:00.000Z\' where id = ?').run(old.id))
    expectOurShape(await accept(old.token), 410)
    expectOurShape(await browser.ask('POST', '/api/team/invitations', { email: used.email, role: 'carer' }), 422, 'invitation.already')
  })
})

describe('requests from elsewhere', () => {
  it.each([['another site', { 'sec-fetch-site': 'cross-site' }], ['another origin by an old browser', { origin: 'https://evil.example' }], ['a neighbour of the same domain', { 'sec-fetch-site': 'same-site', 'origin': 'https://other.saltings.example' }]])('that change something are refused: %s', async (_what, headers) => {
    const { browser } = await signedUp()
    expectOurShape(await browser.ask('POST', '/api/auth/sign-out', {}, headers), 403, 'request.otherSite')
    expect((await browser.ask('GET', '/api/team')).status).toBe(200)
  })
})
