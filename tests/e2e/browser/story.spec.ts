import type { Browser, BrowserContext, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { SavedRegimen } from '#shared/types/plan'
import { formatNumber, volumeInWords } from '#shared/utils/quantity'
import { plainOf, readPdf } from '../../unit/print/readPdf'
import { launchBrowser } from '../browser'

/** A stranger with an animal in a box: plans, prints, comes back by the private link. No account anywhere. */
const base = process.env.E2E_BASE_URL!
let browser: Browser
let context: BrowserContext
let page: Page
const outside: string[] = []
const complaints: string[] = []

async function freshPage(options: Parameters<Browser['newContext']>[0] = {}) {
  context = await browser.newContext({ viewport: { width: 1440, height: 1000 }, timezoneId: 'Europe/London', ...options })
  page = await context.newPage()
  page.setDefaultTimeout(15_000)
  page.on('request', request => /^https?:|^wss?:/.test(request.url()) && !request.url().startsWith(base) && outside.push(request.url()))
  page.on('console', message => ['error', 'warning'].includes(message.type()) && complaints.push(message.text()))
  page.on('pageerror', error => complaints.push(error.message))
}

async function describeAnimal(animal: { species: string, weight: string, unit?: string, temperature: string, dryness: string, days: string }) {
  await page.getByRole('combobox', { name: /Species/ }).click()
  await page.keyboard.type(animal.species)
  await page.keyboard.press('Enter')
  await page.getByLabel(/^Weight now/).fill(animal.weight)
  if (animal.unit) await page.getByLabel('Unit of: Weight now').selectOption(animal.unit)
  await page.getByLabel(/^Temperature now/).fill(animal.temperature)
  await page.getByLabel(/^Dryness/).fill(animal.dryness)
  await page.getByLabel(/^Without a proper meal/).fill(animal.days)
}

const settled = () => page.locator('section[aria-busy="false"] article h1').waitFor()

beforeAll(async () => {
  browser = await launchBrowser()
  await freshPage()
})
afterAll(async () => {
  await browser?.close()
})

describe('a stranger', () => {
  let link = ''
  let saved: SavedRegimen

  it('sees what is still needed, and then a plan as they type', async () => {
    await page.goto(base, { waitUntil: 'networkidle' })
    await page.getByText('Still needed:').waitFor()
    await describeAnimal({ species: 'tawny owl', weight: '290', temperature: '39.5', dryness: '8', days: '5' })
    await settled()
    expect(await page.locator('article h1').innerText()).toMatch(/^Tawny owl, back to full meals in \d+ days$/)
    expect(await page.locator('#gate-state').innerText()).toBe('WAIT')
  })

  it('sees the gate close when it ticks a sign, and open again', async () => {
    await page.getByLabel('Cannot swallow').check()
    await page.locator('#gate-state', { hasText: 'DO NOT FEED' }).waitFor()
    await page.getByText('What goes in goes to the lungs').first().waitFor()
    await page.getByLabel('Cannot swallow').uncheck()
    await page.locator('#gate-state', { hasText: 'WAIT' }).waitFor()
  })

  it('types a weight in pounds and sees the grams', async () => {
    await page.getByLabel('Unit of: Weight now').selectOption('lb')
    await page.getByLabel(/^Weight now/).fill('0,64')
    await page.getByText(`= ${formatNumber(0.64 * 453.59237, 1)} g`).waitFor()
    await settled()
    await page.getByText('Tawny owl, 290.3 g on').waitFor()
  })

  it('is told in a sentence, at the field, what cannot be', async () => {
    await page.getByLabel(/^Weight now/).fill('640')
    await page.getByText(/is too heavy for this species/).first().waitFor()
    await page.getByLabel(/^Weight now/).fill('0.64')
    await page.getByText(/is too heavy for this species/).first().waitFor({ state: 'detached' })
  })

  it('opens a number and finds formula, values and source', async () => {
    // The first meal: from energy to the mark. Then the energy itself.
    await page.getByText('How this was worked out').first().click()
    await page.getByText(/Nearest mark of a \d+ mL syringe/).waitFor()
    await page.getByText('How this was worked out').nth(1).click()
    await page.locator('article', { hasText: /78 × 0\.29\d*\^0\.75/ }).waitFor()
    await page.getByRole('link', { name: /^Source: / }).first().waitFor()
  })

  it('finds the draft again after a reload', async () => {
    await page.reload({ waitUntil: 'networkidle' })
    await settled()
    expect(await page.getByLabel(/^Weight now/).inputValue()).toBe('0.64')
  })

  it('prints without saving, and the paper carries the plan\'s numbers', async () => {
    await page.getByRole('button', { name: 'Print sheets' }).click()
    const [response] = await Promise.all([page.waitForResponse(one => one.url().includes('/api/regimens/sheet.pdf')), page.getByRole('button', { name: 'Sheet for the enclosure' }).click()])
    expect(response.status()).toBe(200)
    expect(response.headers()['content-type']).toBe('application/pdf')
    await page.getByRole('link', { name: 'Open it to print' }).waitFor()
  })

  it('saves it and gets a private link', async () => {
    await page.getByRole('button', { name: 'Save plan' }).click()
    await page.waitForURL(/\/plans\/[a-z0-9]+\?key=/)
    await page.getByText('This is the current version, 1.').waitFor()
    link = page.url()
  })

  it('comes back by the link in another browser, and the printed sheet says what the screen says', async () => {
    await context.close()
    await freshPage()
    await page.goto(link, { waitUntil: 'networkidle' })
    await page.getByText('This is the current version, 1.').waitFor()
    const { pathname, searchParams } = new URL(link)
    const key = searchParams.get('key')!
    const id = pathname.split('/').at(-1)!
    saved = await (await fetch(`${base}/api/regimens/${id}?key=${key}`)).json() as SavedRegimen
    const first = saved.plan.days.findIndex(day => day.feeds.length > 0)
    const sheet = await fetch(`${base}/api/regimens/${id}/sheet.pdf?key=${key}&paper=a4&days=${first + 1}-${first + 3}`)
    expect(sheet.status).toBe(200)
    const { text } = await readPdf(Buffer.from(await sheet.arrayBuffer()))
    for (const day of saved.plan.days.slice(first, first + 3)) {
      for (const feed of day.feeds) {
        expect(text).toContain(`${formatNumber(feed.volumeMl, 3)} mL`)
        expect(text).toContain(feed.localTime)
      }
    }
    expect(text).toContain(plainOf(volumeInWords(saved.plan.days[first]!.feeds[0]!.volumeMl)))
    expect(text).toContain('NOT APPROVED BY A VET')
    expect(text).toContain('Tawny owl')
  })

  it('changes it: a new version, and the old sheet\'s page says it is replaced', async () => {
    await page.getByRole('button', { name: 'Change the plan' }).click()
    await page.getByText('You are changing version 1').waitFor()
    await page.getByLabel(/^Weight now/).fill('300')
    await settled()
    await page.getByText('Tawny owl, 300 g on').waitFor()
    await page.getByRole('button', { name: 'Save as a new version' }).click()
    await page.getByText('This is the current version, 2.').waitFor()
    await page.goto(`${link}&version=1`, { waitUntil: 'networkidle' })
    await page.getByText('Replaced by version 2.').waitFor()
    await page.getByText('Tawny owl, 290.3 g on').waitFor()
  })

  it('finds it among the plans this browser remembers', async () => {
    await page.goto(`${base}/plans`, { waitUntil: 'networkidle' })
    await page.getByRole('link', { name: 'Tawny owl' }).click()
    await page.getByText('This is the current version, 2.').waitFor()
  })

  it('gets a plain answer from a wrong link', async () => {
    await context.close()
    await freshPage()
    await page.goto(link.replace(/key=.*/, 'key=wrong'), { waitUntil: 'networkidle' })
    await page.getByText('This plan cannot be opened').waitFor()
    complaints.length = 0
  })

  it('is told when there is no signal, and loses nothing', async () => {
    await page.goto(base, { waitUntil: 'networkidle' })
    await describeAnimal({ species: 'corn snake', weight: '310', temperature: '28', dryness: '5', days: '90' })
    await settled()
    await context.setOffline(true)
    await page.getByText('No signal.').waitFor()
    await page.getByLabel(/^Weight now/).fill('320')
    await page.getByText('No connection.').waitFor()
    await context.setOffline(false)
    await page.getByRole('button', { name: 'Try again' }).click()
    await page.getByText('Corn snake, 320 g on').waitFor()
    // The browser itself notes each request that found no network.
    complaints.splice(0, complaints.length, ...complaints.filter(one => !/ERR_INTERNET_DISCONNECTED/.test(one)))
  })

  it('was never sent outside, and the page never complained', () => {
    expect(outside).toEqual([])
    expect(complaints).toEqual([])
  })
})
