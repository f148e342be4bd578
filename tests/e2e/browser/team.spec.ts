import { createHmac } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import AxeBuilder from '@axe-core/playwright'
import type { Browser, BrowserContext, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Page as ListPage, MailRow } from '#shared/types/team'
import { plainOf, readPdf } from '../../unit/print/readPdf'
import { openPostbox, readMail, refusal, type Postbox } from '../../unit/mail/postbox'
import { launchBrowser } from '../browser'
import { startServer, type StartedServer } from '../server'

/** A team around one animal, from the invitation to the old sheet that says it is replaced; mails over a real SMTP conversation. */
const PASSWORD = 'lantern pebble orchard nine'
let server: StartedServer
let postbox: Postbox
let browser: Browser
const contexts: BrowserContext[] = []
const complaints: string[] = []
const outside: string[] = []

async function someone(width = 1280): Promise<Page> {
  const context = await browser.newContext({ viewport: { width, height: 900 }, timezoneId: 'Europe/London' })
  contexts.push(context)
  const page = await context.newPage()
  page.setDefaultTimeout(15_000)
  page.on('request', request => /^https?:|^wss?:/.test(request.url()) && !request.url().startsWith(server.url) && outside.push(request.url()))
  page.on('pageerror', error => complaints.push(error.message))
  page.on('console', message => message.type() === 'error' && !/status of (401|409|422)/.test(message.text()) && complaints.push(message.text()))
  return page
}
const visit = (page: Page, path: string) => page.goto(path.startsWith('http') ? path : server.url + path, { waitUntil: 'networkidle' })
async function send<T>(page: Page, method: 'post' | 'patch', path: string, data: unknown): Promise<T> {
  const answer = await page.context().request[method](server.url + path, { data })
  expect(answer.status(), await answer.text()).toBeLessThan(300)
  return answer.status() === 204 ? undefined as T : await answer.json() as T
}
const fetched = async <T>(page: Page, path: string) => await (await page.context().request.get(server.url + path)).json() as T

/** The link of the newest mail to somebody whose subject fits, once it has arrived. */
async function linkOfMail(to: string, part: string): Promise<string> {
  for (let tries = 0; tries < 100; tries += 1) {
    for (const { to: addresses, raw } of [...postbox.received].reverse()) {
      const link = addresses.includes(to) ? new RegExp(`${server.url}/\\S*${part}\\S*`).exec(readMail(raw).text)?.[0] : undefined
      if (link) return link
    }
    await new Promise(resolve => setTimeout(resolve, 100))
  }
  throw new Error(`No mail with ${part} came to ${to}.`)
}
/** Nothing for axe to find, and no sideways scrolling at any width, in daylight and in lamp mode. */
async function expectUsable(page: Page) {
  const size = page.viewportSize()!
  for (const width of [1440, 768, 390, 320]) {
    await page.setViewportSize({ width, height: 900 })
    expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth), `${page.url()} at ${width} px`).toBe(0)
    if (width !== 1440 && width !== 390) continue
    // A desk by day, a phone under the lamp.
    const lamp = width === 390
    await page.evaluate(on => document.documentElement.classList.toggle('lamp', on), lamp)
    const { violations } = await new AxeBuilder({ page }).withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']).analyze()
    expect(violations.map(one => `${page.url()} ${width} ${one.id}: ${one.nodes.slice(0, 3).map(node => node.target.join(' ')).join(' | ')}`)).toEqual([])
  }
  await page.evaluate(() => document.documentElement.classList.remove('lamp'))
  await page.setViewportSize(size)
}

beforeAll(async () => {
  postbox = await openPostbox()
  server = await startServer({ smtpUrl: postbox.url })
  browser = await launchBrowser()
}, 60_000)
afterAll(async () => {
  await browser?.close()
  await server?.stop()
  await postbox?.close()
})

describe('a team around one animal', () => {
  let ines: Page
  let mara: Page
  let tove: Page
  let amara: Page
  let joss: Page
  let planId = ''
  const to = (name: string) => `${name}@saltings.example`

  it('begins with somebody who signs up', async () => {
    ines = await someone()
    await visit(ines, '/sign-up')
    await ines.getByLabel('Your name').fill('Ines Carvalho')
    await ines.getByLabel('E-mail address').fill(to('ines'))
    await ines.getByLabel('Password').fill('short')
    await ines.getByLabel('Name of the team').fill('Saltings Rescue')
    await ines.getByRole('button', { name: 'Make the account' }).click()
    await ines.getByText('A password needs at least 12 characters', { exact: false }).first().waitFor()
    await ines.getByLabel('Password').fill(PASSWORD)
    await ines.getByRole('button', { name: 'Make the account' }).click()
    await ines.waitForURL('**/plans')
    await ines.getByRole('heading', { name: 'Plans of Saltings Rescue' }).waitFor()
  })

  it('invites by mail; a newcomer joins by its link, and the secret leaves the address bar', async () => {
    await visit(ines, '/team')
    await ines.getByLabel('E-mail address').fill(to('mara'))
    await ines.getByRole('radio', { name: /Keeper/ }).check()
    await ines.getByRole('button', { name: 'Invite as keeper' }).click()
    mara = await someone()
    await visit(mara, await linkOfMail(to('mara'), 'invitation#'))
    await mara.getByRole('heading', { name: 'Join Saltings Rescue' }).waitFor()
    expect(mara.url()).toBe(`${server.url}/invitation`)
    await mara.getByLabel('Your name').fill('Mara Linde')
    await mara.getByLabel('Choose a password').fill(PASSWORD)
    await mara.getByRole('button', { name: 'Join Saltings Rescue' }).click()
    await mara.waitForURL('**/plans')
    for (const [name, role, full] of [['tove', 'technician', 'Tove Brandt'], ['amara', 'vet', 'Dr Amara Osei']] as const) {
      await send(ines, 'post', '/api/team/invitations', { email: to(name), role })
      const page = await someone(name === 'amara' ? 390 : 1280)
      await send(page, 'post', '/api/invitations/accept', { token: (await linkOfMail(to(name), 'invitation#')).split('#')[1], name: full, password: PASSWORD })
      if (name === 'tove') tove = page
      else amara = page
    }
    await send(amara, 'patch', '/api/auth/profile', { name: 'Dr Amara Osei', registration: 'Register of vets, no. 00-4821' })
    const me = await fetched<{ team: { name: string, settings: object } }>(ines, '/api/auth/me')
    await send(ines, 'patch', '/api/team', { name: me.team.name, settings: { ...me.team.settings, approvalRequired: true, contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }] } })
  }, 60_000)

  it('the keeper drafts and asks for a check', async () => {
    await visit(mara, '/')
    await mara.getByRole('combobox', { name: /Species/ }).click()
    await mara.keyboard.type('inland bearded')
    await mara.keyboard.press('Enter')
    await mara.getByText('Name, case number, enclosure, earlier weight').click()
    await mara.getByLabel(/^Name/).first().fill('Juniper')
    await mara.getByLabel(/^Enclosure/).fill('Warm room, tank 4')
    await mara.getByLabel(/^Weight now/).fill('182')
    await mara.getByLabel(/^Temperature now/).fill('36')
    await mara.getByLabel(/^Dryness/).fill('8')
    await mara.getByLabel(/^Without a proper meal/).fill('24')
    await mara.locator('section[aria-busy="false"] article h1').waitFor()
    await mara.getByRole('button', { name: 'Save to Saltings Rescue' }).click()
    await mara.waitForURL('**/plans/*')
    planId = /\/plans\/(\w+)/.exec(mara.url())![1]!
    await mara.getByRole('button', { name: 'Ask for a check' }).click()
    await mara.locator('form').getByRole('button', { name: 'Ask for a check' }).click()
    await mara.getByText('waits for a check', { exact: false }).first().waitFor()
    expect(await mara.getByRole('button', { name: 'Mark as checked' }).count()).toBe(0)
  })

  it('the technician finds it on the desk, checks it and asks the vet', async () => {
    await linkOfMail(to('tove'), `plans/${planId}`)
    await visit(tove, '/desk')
    await tove.getByText('Juniper').first().waitFor()
    await expectUsable(tove)
    await visit(tove, `/plans/${planId}`)
    await tove.getByRole('button', { name: 'Mark as checked' }).click()
    await tove.getByRole('button', { name: 'Yes, version 1 is checked' }).click()
    await tove.getByRole('button', { name: 'Ask a vet to approve' }).click()
    await tove.locator('form').getByRole('button', { name: 'Ask a vet to approve' }).click()
    await tove.getByText('waits for approval', { exact: false }).first().waitFor()
  }, 60_000)

  it('the vet approves from the mail, on a phone, after signing in', async () => {
    await amara.context().clearCookies()
    await visit(amara, await linkOfMail(to('amara'), `plans/${planId}/approve`))
    await amara.waitForURL('**/sign-in?**')
    await amara.getByLabel('E-mail address').fill(to('amara'))
    await amara.getByLabel('Password').fill(PASSWORD)
    await amara.getByRole('button', { name: 'Sign in' }).click()
    await amara.waitForURL(`**/plans/${planId}/approve`)
    await amara.getByRole('button', { name: 'Approve', exact: true }).waitFor()
    await expectUsable(amara)
    await amara.getByRole('button', { name: 'Approve', exact: true }).click()
    await amara.getByLabel(/^Note/).fill('Watch the droppings on the first day.')
    await amara.getByRole('button', { name: 'Yes, approve version 1' }).click()
    await amara.getByText('Approved by Dr Amara Osei', { exact: false }).first().waitFor()
    await linkOfMail(to('mara'), `plans/${planId}`)
  }, 60_000)

  it('the keeper puts it in use and makes a link for a helper', async () => {
    await visit(mara, `/plans/${planId}`)
    await mara.getByRole('button', { name: 'Put in use' }).click()
    await mara.getByRole('button', { name: 'Put version 1 in use' }).click()
    await mara.getByRole('button', { name: 'Finish' }).waitFor()
    await expectUsable(mara)
    await visit(mara, `/team/links?regimenId=${planId}`)
    const make = mara.getByRole('button', { name: 'Make a link' })
    if (await make.isVisible()) await make.click()
    await mara.getByLabel(/^What for/).fill('Night shift')
    await mara.getByRole('button', { name: 'Make the link' }).click()
    const link = await mara.locator('text=/help#[\\w-]{40,}/').first().innerText().catch(async () => await mara.locator('input[readonly]').first().inputValue())
    const address = /https?:\S+\/help#[\w-]+/.exec(link)![0]
    joss = await someone(360)
    await visit(joss, address)
    expect(joss.url()).toBe(`${server.url}/help`)
  }, 60_000)

  it('the carer opens it without an account, reads one big answer, prints, and logs a feed', async () => {
    await joss.getByLabel('Your initials').fill('JT')
    await joss.getByRole('button', { name: 'Begin' }).click()
    await joss.getByRole('link', { name: /Juniper/ }).waitFor()
    await expectUsable(joss)
    await joss.getByRole('link', { name: /Juniper/ }).click()
    await joss.getByText('This sheet is current').first().waitFor()
    await expectUsable(joss)
    const pdf = await joss.context().request.get(`${server.url}/api/regimens/${planId}/sheet.pdf`)
    const words = plainOf((await readPdf(Buffer.from(await pdf.body()))).text)
    expect(words).toContain('Approved by Dr Amara Osei')
    expect(words).toContain('00 5550 0142')
    await joss.getByRole('button', { name: 'All taken' }).click()
    await joss.getByRole('button', { name: 'Write down: all taken' }).click()
    await joss.getByText('JT').first().waitFor()
    expect((await joss.context().request.get(`${server.url}/api/team`)).status()).toBe(401)
  }, 60_000)

  it('a new weight ends the approval, on screen, on paper and by mail', async () => {
    await visit(mara, `/plans/${planId}`)
    await mara.getByLabel('Weight now').fill('206')
    await mara.getByRole('button', { name: 'Write the weight down' }).click()
    await mara.getByText('Change the plan to the new weight before the next feed', { exact: false }).first().waitFor()
    await mara.getByText('APPROVAL LAPSED').first().waitFor()
    const pdf = await mara.context().request.get(`${server.url}/api/regimens/${planId}/sheet.pdf`)
    expect(plainOf((await readPdf(Buffer.from(await pdf.body()))).text)).toContain('APPROVAL LAPSED')
    await linkOfMail(to('amara'), `plans/${planId}`)
  })

  it('the code of the old sheet says lapsed, then replaced, to someone who is not signed in', async () => {
    const secret = readFileSync(join(server.dataDir, 'session-secret'), 'utf8').trim()
    const letters = 'abcdefghjkmnpqrstuvwxyz23456789'
    const code = [...createHmac('sha256', secret).update(`sheet|${planId}|1`).digest().subarray(0, 20)].map(byte => letters[byte % letters.length]).join('')
    const passer = await someone(390)
    await visit(passer, `/sheet/${planId}?version=1&code=${code}`)
    await passer.getByText('The approval of this sheet has lapsed').first().waitFor()
    const saved = await fetched<{ input: { animal: object }, latestVersion: number }>(mara, `/api/regimens/${planId}`)
    await send(mara, 'patch', `/api/regimens/${planId}`, { ...saved.input, animal: { ...saved.input.animal, weightG: 206 }, baseVersion: 1, note: 'Weighed again.' })
    await passer.reload({ waitUntil: 'networkidle' })
    await passer.getByText('Replaced by version 2', { exact: false }).first().waitFor()
    await passer.getByText('Do not feed from this sheet', { exact: false }).first().waitFor()
    await expectUsable(passer)
  }, 60_000)

  it('what changed stands on one screen, in words', async () => {
    await visit(amara, `/plans/${planId}/history`)
    await amara.getByText('Weight from', { exact: false }).first().waitFor()
    await expectUsable(amara)
  }, 60_000)

  it.each(['/plans', '/team', '/team/settings', '/team/links', '/team/record', '/team/mail', '/team/transfers', '/profile'])('%s can be used by everyone, at every width', async (path) => {
    await visit(ines, path)
    await ines.locator('h1').first().waitFor()
    await expectUsable(ines)
  }, 60_000)

  it.each(['/sign-in', '/sign-up', '/forgot', '/reset', '/confirm-email', '/invitation', '/transfer', '/help', '/sheet/nothing'])('%s can be used by everyone, signed out', async (path) => {
    const stranger = await someone()
    await visit(stranger, path)
    await stranger.locator('h1').first().waitFor()
    await expectUsable(stranger)
    await stranger.context().close()
  }, 60_000)

  it('signs out, and leaves nothing of the team at a shared computer', async () => {
    await visit(mara, '/plans')
    await mara.getByText('Mara Linde').first().click()
    await mara.getByRole('button', { name: 'Sign out' }).click()
    await mara.getByRole('link', { name: 'Sign in' }).first().waitFor()
    expect(await mara.evaluate(() => Object.keys(localStorage).filter(key => /draft|editing/.test(key) && /Juniper|Saltings/.test(localStorage.getItem(key) ?? '')))).toEqual([])
    await visit(mara, '/team')
    expect(new URL(mara.url()).pathname).toBe('/sign-in')
  })

  it('mails that the server refuses are tried again, or shown as failed, and block nobody', async () => {
    postbox.decide = (address, asked) => address === to('later') && asked % 2 === 1 ? refusal(451, 'try later') : address === to('never') ? refusal(550, 'no such box') : null
    const started = Date.now()
    for (const name of ['later', 'never']) await send(ines, 'post', '/api/team/invitations', { email: to(name), role: 'carer' })
    expect(Date.now() - started).toBeLessThan(5000)
    await linkOfMail(to('later'), 'invitation#')
    const mails = async () => (await fetched<ListPage<MailRow>>(ines, '/api/team/mails?pageSize=100')).items
    for (let tries = 0; tries < 60 && (await mails()).find(one => one.to === to('never'))!.state !== 'failed'; tries += 1) await new Promise(resolve => setTimeout(resolve, 200))
    const failed = (await mails()).find(one => one.to === to('never'))!
    expect(failed).toMatchObject({ state: 'failed' })
    expect(failed.text).toBeUndefined()
    postbox.decide = () => null
    await send(ines, 'post', `/api/team/mails/${failed.id}/retry`, {})
    await linkOfMail(to('never'), 'invitation#')
    expect(JSON.stringify(await mails())).not.toContain('invitation#')
  }, 60_000)

  it('nothing failed in any page, nothing was asked of another host, and no secret is in the log', () => {
    expect(complaints).toEqual([])
    expect(outside).toEqual([])
    expect(server.log()).not.toMatch(/#[\w-]{40}|lantern pebble|code=[a-z0-9]{20}/)
  })
})
