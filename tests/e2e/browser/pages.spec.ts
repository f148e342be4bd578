import AxeBuilder from '@axe-core/playwright'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { launchBrowser } from '../browser'

/** Every page: nothing for axe to find, in daylight and lamp mode, and no sideways scrolling down to 320 px. */
const base = process.env.E2E_BASE_URL!
let browser: Browser
let savedPath = ''

const PAGES = ['/', '/plans', '/species', '/equations', '/sources', '/print/preview', '/nowhere']

beforeAll(async () => {
  browser = await launchBrowser()
  const answer = await fetch(`${base}/api/regimens`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({
      animal: { name: 'Wilhelmina-Theodora the unexpectedly long-named tortoise', enclosure: 'Warm room, table 4, left-hand side', speciesId: 'sp-t-hermanni', weightG: 700, lengthMm: 160, drynessPercent: 8, bodyTemperatureC: 26, daysUnfed: 60, lifeStage: 'adult', signs: [] },
      feed: { feedId: 'demo-herbivore-slurry' }, route: 'syringe', feedingHours: { from: '07:30', to: '20:30' }, startAt: '2026-12-02T09:00:00Z', timeZone: 'Europe/London',
    }),
  })
  const { id, key } = await answer.json() as { id: string, key: string }
  savedPath = `/plans/${id}?key=${key}`
})
afterAll(async () => {
  await browser?.close()
})

async function open(path: string, width: number): Promise<Page> {
  const context = await browser.newContext({ viewport: { width, height: 900 } })
  const page = await context.newPage()
  await page.goto(base + path, { waitUntil: 'networkidle' })
  if (path === '/') {
    await page.getByRole('combobox', { name: /Species/ }).click()
    await page.keyboard.type('leopard gecko')
    await page.keyboard.press('Enter')
    await page.getByLabel(/^Weight now/).fill('22')
    await page.getByLabel(/^Dryness/).fill('8')
    await page.getByLabel(/^Without a proper meal/).fill('40')
    await page.locator('section[aria-busy="false"] article h1').waitFor()
    for (const summary of await page.locator('summary').all()) await summary.click()
  }
  return page
}

async function violationsOf(page: Page) {
  const { violations } = await new AxeBuilder({ page }).withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']).analyze()
  return violations.map(one => `${one.id}: ${one.help} ${one.nodes.slice(0, 3).map(node => node.target.join(' ')).join(' | ')}`)
}

describe.each([...PAGES, 'a saved plan', 'its print page'])('%s', (path) => {
  const real = () => path === 'a saved plan' ? savedPath : path === 'its print page' ? savedPath.replace('/plans/', '/print/') : path
  let page: Page

  beforeAll(async () => {
    page = await open(real(), 1440)
  }, 60_000)
  afterAll(async () => {
    await page.context().close()
  })

  it.each([1440, 390])('at %s px has nothing for axe to find', async (width) => {
    await page.setViewportSize({ width, height: 900 })
    expect(await violationsOf(page)).toEqual([])
  }, 60_000)

  it('in lamp mode has nothing for axe to find', async () => {
    await page.evaluate(() => document.documentElement.classList.add('lamp'))
    expect(await violationsOf(page)).toEqual([])
    await page.evaluate(() => document.documentElement.classList.remove('lamp'))
  }, 60_000)

  it.each([1440, 768, 390, 320])('at %s px does not scroll sideways', async (width) => {
    await page.setViewportSize({ width, height: 900 })
    expect(await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth)).toBe(0)
  })
})

it('remembers lamp mode', async () => {
  const page = await open('/sources', 1440)
  await page.getByRole('button', { name: /Lamp mode/ }).click()
  await page.reload({ waitUntil: 'networkidle' })
  expect(await page.evaluate(() => document.documentElement.classList.contains('lamp'))).toBe(true)
  await page.context().close()
})

it('keeps targets large enough for a gloved thumb on a phone', async () => {
  const page = await open('/', 390)
  const small = await page.locator('button:visible, select:visible, input:not([type="checkbox"]):not([type="radio"]):visible').evaluateAll(nodes => nodes.filter(node => node.getBoundingClientRect().height < 43.5 && !node.classList.contains('sr-only')).map(node => node.outerHTML.slice(0, 80)))
  expect(small).toEqual([])
  await page.context().close()
})
