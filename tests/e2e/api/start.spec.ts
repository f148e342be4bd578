import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import type { SavedRegimen, SavedRegimenReceipt } from '#shared/types/plan'
import { startServer, type StartedServer } from '../server'
import { juniper } from './client'

let folder: string
let server: StartedServer | null = null
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'thimbleful-start-'))
})
afterEach(async () => {
  await server?.stop()
  server = null
  rmSync(folder, { recursive: true, force: true })
})

const start = async (env: Record<string, string> = {}) => server = await startServer({ dataDir: folder, env })
const save = (url: string, headers: Record<string, string> = {}) => fetch(`${url}/api/regimens`, { method: 'POST', headers: { 'content-type': 'application/json', ...headers }, body: JSON.stringify(juniper()) })

describe('a first start with nothing set', () => {
  it('makes its database and a secret that only it can read, and can save', async () => {
    const { url } = await start()
    expect(statSync(join(folder, 'session-secret')).mode & 0o777).toBe(0o600)
    expect(readFileSync(join(folder, 'session-secret'), 'utf8').length).toBeGreaterThanOrEqual(32)
    expect(existsSync(join(folder, 'thimbleful.db'))).toBe(true)
    expect((await save(url)).status).toBe(201)
  })

  it('adds the demo plans unless told not to: anyone may look at them, nobody changes them', async () => {
    const { url } = await start({ NUXT_SEED_DEMO: 'true' })
    const answer = await fetch(`${url}/api/regimens/demojuniper`)
    expect(answer.status).toBe(200)
    expect(await answer.json() as SavedRegimen).toMatchObject({ id: 'demojuniper', demo: true, plan: { animal: { name: 'Juniper' } } })
    expect(answer.headers.getSetCookie()).toEqual([])
    expect((await fetch(`${url}/api/regimens/demojuniper/sheet.pdf`)).status).toBe(200)
    const change = await fetch(`${url}/api/regimens/demojuniper`, { method: 'PATCH', headers: { 'content-type': 'application/json' }, body: JSON.stringify(juniper()) })
    expect(change.status).toBe(403)
  })

  it('adds none when told not to', async () => {
    const { url } = await start()
    expect((await fetch(`${url}/api/regimens/demojuniper`)).status).toBe(404)
  })
})

describe('a restart', () => {
  it('keeps plans, their links and what browsers remember', async () => {
    const first = await start()
    const answer = await save(first.url)
    const cookie = answer.headers.getSetCookie()[0]!.split(';')[0]!
    const { id, key } = await answer.json() as SavedRegimenReceipt
    const secret = readFileSync(join(folder, 'session-secret'), 'utf8')
    await first.stop()
    const { url } = await start()
    expect(readFileSync(join(folder, 'session-secret'), 'utf8')).toBe(secret)
    expect((await fetch(`${url}/api/regimens/${id}?key=${key}`)).status).toBe(200)
    expect((await fetch(`${url}/api/regimens/${id}`, { headers: { cookie } })).status).toBe(200)
    expect(readdirSync(folder).filter(name => name.includes('.before-'))).toEqual([])
  })

  it('forgets what browsers remember with another secret, and links go on', async () => {
    const first = await start()
    const answer = await save(first.url)
    const cookie = answer.headers.getSetCookie()[0]!.split(';')[0]!
    const { id, key } = await answer.json() as SavedRegimenReceipt
    await first.stop()
    const { url } = await start({ NUXT_SESSION_PASSWORD: 'another-password-of-at-least-32-letters' })
    expect((await fetch(`${url}/api/regimens/${id}`, { headers: { cookie } })).status).toBe(404)
    expect((await fetch(`${url}/api/regimens/${id}?key=${key}`)).status).toBe(200)
  })
})

describe('a start that would go wrong', () => {
  it('with a damaged database does not happen', async () => {
    writeFileSync(join(folder, 'thimbleful.db'), 'this is no database, and long enough to be taken for one '.repeat(200))
    await expect(start()).rejects.toThrow(/ended with code [1-9]/)
  })
  it('with a secret cut short does not happen, and says what to do', async () => {
    writeFileSync(join(folder, 'session-secret'), 'short')
    await expect(start()).rejects.toThrow(/Delete the file to have a new one made/)
  })
})

describe('the log', () => {
  it('never holds a key, whatever goes wrong', async () => {
    const running = await start()
    const { id, key } = await (await save(running.url)).json() as SavedRegimenReceipt
    for (const path of [`/api/regimens/${id}?key=${key}`, `/api/regimens/${id}?key=${key}&version=99`, `/plans/${id}?key=${key}`, `/plans/${id}/nothing?key=${key}`, `/nothing?key=${key}`, `/api/nothing?key=${key}`]) {
      await fetch(running.url + path, { headers: { accept: 'text/html' } })
    }
    // The data taken away under its feet: the worst that can happen to it.
    rmSync(join(folder, 'thimbleful.db'))
    writeFileSync(join(folder, 'thimbleful.db'), 'gone')
    for (const path of [`/api/regimens/${id}?key=${key}`, `/plans/${id}?key=${key}`]) await fetch(running.url + path, { headers: { accept: 'text/html' } })
    expect(running.log()).not.toContain(key)
    expect(running.log()).toContain('Listening')
  })
})

it('ends at once when asked to', async () => {
  const running = await start()
  const before = Date.now()
  await running.stop()
  expect(Date.now() - before).toBeLessThan(5000)
})

describe('limits', () => {
  it('refuse an address that saves without end, in our shape, and say when to come back', async () => {
    const { url } = await start({ NUXT_RATE_LIMIT_FACTOR: '0.05' })
    const statuses = []
    for (let count = 0; count < 4; count += 1) statuses.push((await save(url)).status)
    expect(statuses).toEqual([201, 201, 201, 429])
    const refused = await save(url)
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0)
    expect(await refused.json()).toMatchObject({ statusCode: 429, statusMessage: 'Too Many Requests', data: { code: 'request.tooMany' } })
    expect((await fetch(`${url}/api/health`)).status).toBe(200)
  })
})
