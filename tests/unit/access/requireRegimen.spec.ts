import type { H3Event } from 'h3'
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { closeDatabase } from '../../../server/db/client'
import { migrateDatabase } from '../../../server/db/migrate'
import { newLinkKey } from '../../../server/utils/access/linkKey'
import { isOpen, opensRegimen, requireRegimen } from '../../../server/utils/access/requireRegimen'
import { database, GUEST, insertRegimen } from '../../../server/utils/data'
import { buildPlan } from '../../../server/utils/plan/buildPlan'
import { currentEdition } from '../../../server/utils/reference'
import { MIGRATIONS, scratchFolder } from '../db/scratch'
import { regimenInput } from '../plan/inputs'

const scratch = scratchFolder()
const input = regimenInput()
const pebble = newLinkKey(new Date())
const oak = newLinkKey(new Date())
const old = newLinkKey(new Date(Date.now() - 31 * 86_400_000))
const demo = newLinkKey(new Date(Date.now() - 99 * 86_400_000))
let remembered: { id: string, key: string }[] = []

beforeAll(() => {
  vi.stubEnv('NUXT_DATA_DIR', scratch.folder)
  closeDatabase()
  // Nuxt's own functions, where the cookie is read.
  vi.stubGlobal('useRuntimeConfig', () => ({ session: { name: 'thimbleful' } }))
  vi.stubGlobal('getUserSession', () => Promise.resolve({ secure: { plans: remembered } }))
  migrateDatabase(database(), MIGRATIONS)
  const plan = buildPlan(input, currentEdition())
  const row = { actor: GUEST, at: new Date().toISOString(), input, plan }
  for (const [id, key] of Object.entries({ pebble, oak, old })) insertRegimen(database(), { id, ...key, ...row })
  insertRegimen(database(), { id: 'demo', ...demo, ...row, demo: true })
})
afterAll(() => {
  closeDatabase()
  scratch.remove()
  vi.unstubAllGlobals()
  vi.unstubAllEnvs()
})
beforeEach(() => {
  remembered = []
})

const event = (cookie?: string) => ({ context: {}, node: { req: { headers: cookie ? { cookie } : {} } } }) as unknown as H3Event
const statusOf = (promise: Promise<unknown>) => promise.then(() => 200, (error: { statusCode: number }) => error.statusCode)

describe('requireRegimen', () => {
  it('gives the row to the key of its link, to look and to change', async () => {
    expect((await requireRegimen(event(), 'pebble', pebble.key, 'plan.see')).row.id).toBe('pebble')
    expect((await requireRegimen(event(), 'pebble', pebble.key, 'plan.edit')).row.id).toBe('pebble')
  })

  it.each<[string, string, string | undefined]>([
    ['no key', 'pebble', undefined],
    ['an empty key', 'pebble', ''],
    ['a wrong key', 'pebble', 'x'.repeat(43)],
    ['the key of another plan', 'pebble', oak.key],
    ['the stored hash', 'pebble', pebble.keyHash],
    ['a link that has ended', 'old', old.key],
    ['no such plan', 'nobody', pebble.key],
  ])('refuses %s with one and the same answer', async (_what, id, key) => {
    for (const purpose of ['plan.see', 'plan.edit'] as const) {
      await expect(requireRegimen(event('thimbleful=sealed'), id, key, purpose)).rejects.toMatchObject({ statusCode: 404, data: { code: 'regimen.notFound', message: expect.stringContaining('no plan behind this link') as string } })
    }
  })

  it('gives the row to a browser that remembers it, but not when another key is shown', async () => {
    remembered = [{ id: 'pebble', key: pebble.key }]
    expect(await statusOf(requireRegimen(event('thimbleful=sealed'), 'pebble', undefined, 'plan.see'))).toBe(200)
    expect(await statusOf(requireRegimen(event('thimbleful=sealed'), 'pebble', oak.key, 'plan.see'))).toBe(404)
    expect(await statusOf(requireRegimen(event('thimbleful=sealed'), 'oak', undefined, 'plan.see'))).toBe(404)
    expect(await statusOf(requireRegimen(event(), 'pebble', undefined, 'plan.see'))).toBe(404)
  })

  it('forgets with the link: a remembered plan ends when its link ends', async () => {
    remembered = [{ id: 'old', key: old.key }]
    expect(await statusOf(requireRegimen(event('thimbleful=sealed'), 'old', undefined, 'plan.see'))).toBe(404)
  })

  it('shows a demo plan to anyone and lets nobody change it', async () => {
    expect((await requireRegimen(event(), 'demo', undefined, 'plan.see')).row.demo).toBe(true)
    for (const key of [undefined, demo.key, pebble.key]) expect(await statusOf(requireRegimen(event(), 'demo', key, 'plan.edit'))).toBe(403)
  })
})

describe('isOpen', () => {
  const row = { keyHash: pebble.keyHash, linkExpiresAt: '2026-12-31T12:00:00.000Z' }
  it.each([['2026-12-31T11:59:59.999Z', true], ['2026-12-31T12:00:00.000Z', false], ['2026-12-31T12:00:00.001Z', false]])('at %s: %s', (now, open) => {
    expect(isOpen(row, pebble.key, new Date(now))).toBe(open)
  })
})

describe('opensRegimen', () => {
  it.each<[string, string, boolean]>([['pebble', pebble.key, true], ['pebble', oak.key, false], ['old', old.key, false], ['nobody', pebble.key, false], ['demo', demo.key, false]])('%s', (id, key, opens) => expect(opensRegimen(id, key)).toBe(opens))
})
