import { describe, expect, it } from 'vitest'
import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan, SavedRegimen, SavedRegimenReceipt } from '#shared/types/plan'
import { baseUrl } from '../server'
import { ask, cookieOf, expectOurShape, juniper, rowCounts, saved, withDatabase } from './client'

const get = (id: string, query = '', headers = {}) => ask<SavedRegimen>('GET', `/api/regimens/${id}${query}`, undefined, headers)
const heavier = (weightG: number): RegimenInput => ({ ...juniper(), animal: { ...juniper().animal, weightG } })

describe('a preview', () => {
  it('is the plan, and keeps nothing', async () => {
    const before = rowCounts()
    const answer = await ask<Plan>('POST', '/api/regimens/preview', juniper())
    expect(answer.status).toBe(200)
    expect(answer.json).toMatchObject({ edition: expect.any(String) as string, animal: { name: 'Juniper', weightG: 182 }, timeZone: 'Europe/London' })
    expect(answer.json.days.length).toBeGreaterThan(3)
    expect(answer.headers.getSetCookie()).toEqual([])
    expect(rowCounts()).toEqual(before)
  })

  it('is the same for the same input', async () => {
    const twice = await Promise.all([1, 2].map(() => ask('POST', '/api/regimens/preview', juniper())))
    expect(twice[0]!.text).toBe(twice[1]!.text)
  })
})

describe('a saved plan', () => {
  it('answers 201 with a link, and opens by it as it was worked out', async () => {
    const before = rowCounts()
    const answer = await ask<SavedRegimenReceipt>('POST', '/api/regimens', juniper())
    expect(answer.status).toBe(201)
    const { id, version, key, link } = answer.json
    expect(version).toBe(1)
    expect(Buffer.from(key, 'base64url')).toHaveLength(32)
    expect(link).toBe(`${baseUrl()}/plans/${id}?key=${key}`)
    expect(rowCounts()).toEqual({ regimens: before.regimens! + 1, regimen_versions: before.regimen_versions! + 1, audit_records: before.audit_records! + 1 })

    const opened = await get(id, `?key=${key}`)
    const preview = await ask<Plan>('POST', '/api/regimens/preview', juniper())
    expect(opened.status).toBe(200)
    expect(opened.json).toMatchObject({ id, version: 1, latestVersion: 1, edition: preview.json.edition, input: juniper() })
    expect(opened.json.plan).toEqual(preview.json)
    expect(opened.json.demo).toBeUndefined()
    expect(Date.parse(opened.json.linkExpiresAt) - Date.parse(opened.json.createdAt)).toBe(30 * 86_400_000)
    expect(opened.headers.get('cache-control')).toBe('private, no-store')
  })

  it('keeps the hash of its key and nothing more', async () => {
    const { id, key } = await saved()
    withDatabase((db) => {
      const everything = JSON.stringify(['regimens', 'regimen_versions', 'audit_records'].map(table => db.prepare(`select * from ${table}`).all()))
      expect(everything).toContain(id)
      expect(everything).not.toContain(key)
    })
  })

  it('opens in the browser that saved it without a key, and in no other', async () => {
    const answer = await ask<SavedRegimenReceipt>('POST', '/api/regimens', juniper())
    const cookie = cookieOf(answer)
    expect((await get(answer.json.id, '', { cookie })).status).toBe(200)
    expectOurShape(await get(answer.json.id), 404, 'regimen.notFound')
    const other = await ask<SavedRegimenReceipt>('POST', '/api/regimens', juniper())
    expectOurShape(await get(answer.json.id, '', { cookie: cookieOf(other) }), 404, 'regimen.notFound')
    expectOurShape(await get(answer.json.id, '', { cookie: `${cookie}x` }), 404, 'regimen.notFound')
  })

  it('gets a cookie that scripts cannot read, Secure only behind https', async () => {
    const plain = await ask('POST', '/api/regimens', juniper())
    expect(plain.headers.getSetCookie()).toHaveLength(1)
    expect(plain.headers.getSetCookie()[0]).toMatch(/^thimbleful=.*HttpOnly; SameSite=Lax$/)
    const secure = await ask('POST', '/api/regimens', juniper(), { 'x-forwarded-proto': 'https' })
    expect(secure.headers.getSetCookie()[0]).toMatch(/; Secure/)
  })

  it.each<[string, (own: SavedRegimenReceipt, other: SavedRegimenReceipt) => string]>([
    ['no key', own => own.id],
    ['an empty key', own => `${own.id}?key=`],
    ['a wrong key', own => `${own.id}?key=${'x'.repeat(43)}`],
    ['the key of another plan', (own, other) => `${own.id}?key=${other.key}`],
    ['an id that is none', own => `nobody?key=${own.key}`],
  ])('stays shut to %s, wherever it is asked', async (_what, address) => {
    const own = await saved()
    const other = await saved()
    const before = rowCounts()
    const path = address(own, other)
    const [id, query = ''] = path.split('?')
    for (const part of ['', '/sheet.pdf', '/mixing.pdf', '/label.pdf']) expectOurShape(await ask('GET', `/api/regimens/${id}${part}?${query}`), 404, 'regimen.notFound')
    expectOurShape(await ask('PATCH', `/api/regimens/${path}`, juniper()), 404, 'regimen.notFound')
    expect(rowCounts()).toEqual(before)
  })

  it('refuses a key as long as a book, or twice', async () => {
    const { id, key } = await saved()
    expectOurShape(await get(id, `?key=${'x'.repeat(5000)}`), 400, 'input.invalid')
    expectOurShape(await get(id, `?key=${key}&key=${key}`), 400, 'input.invalid')
  })

  it('shuts when its link ends', async () => {
    const answer = await ask<SavedRegimenReceipt>('POST', '/api/regimens', juniper())
    const { id, key } = answer.json
    withDatabase(db => db.prepare('update regimens set link_expires_at = ? where id = ?').run(new Date(Date.now() - 1000).toISOString(), id))
    for (const part of ['', '/sheet.pdf', '/mixing.pdf', '/label.pdf']) expectOurShape(await ask('GET', `/api/regimens/${id}${part}?key=${key}`), 404, 'regimen.notFound')
    expectOurShape(await ask('PATCH', `/api/regimens/${id}?key=${key}`, juniper()), 404, 'regimen.notFound')
    const cookie = cookieOf(answer)
    expectOurShape(await get(id, '', { cookie }), 404, 'regimen.notFound')
    expect((await ask<{ items: unknown[] }>('GET', '/api/regimens', undefined, { cookie })).json.items).toEqual([])
  })
})

describe('a change', () => {
  it('adds a version, and the old one stays as it was', async () => {
    const { id, key } = await saved()
    const first = await get(id, `?key=${key}`)
    const answer = await ask('PATCH', `/api/regimens/${id}?key=${key}`, { ...heavier(190), baseVersion: 1 })
    expect(answer.status).toBe(200)
    expect(answer.json).toEqual({ id, version: 2 })
    const newest = await get(id, `?key=${key}`)
    expect(newest.json).toMatchObject({ version: 2, latestVersion: 2, input: { animal: { weightG: 190 } }, plan: { animal: { weightG: 190 } } })
    expect(newest.json.input).not.toHaveProperty('baseVersion')
    const old = await get(id, `?key=${key}&version=1`)
    expect(old.json).toEqual({ ...first.json, latestVersion: 2 })
    withDatabase((db) => {
      expect(db.prepare('select action, version, actor from audit_records where object_id = ? order by id').all(id)).toEqual([{ action: 'regimen.create', version: 1, actor: 'guest' }, { action: 'regimen.change', version: 2, actor: 'guest' }])
    })
  })

  it('based on a version that is no longer the newest answers 409, says by whom and when, and writes nothing', async () => {
    const { id, key } = await saved()
    await ask('PATCH', `/api/regimens/${id}?key=${key}`, { ...heavier(190), baseVersion: 1 })
    const before = rowCounts()
    const answer = await ask('PATCH', `/api/regimens/${id}?key=${key}`, { ...heavier(200), baseVersion: 1 })
    expectOurShape(answer, 409, 'regimen.changed')
    expect(answer.data.message).toMatch(/^Version 2 was saved meanwhile by someone with this plan's link: \w{3} \d{1,2} \w{3} \d{4}, \d{2}:\d{2}.* \(Europe\/London\)\./)
    expect(rowCounts()).toEqual(before)
    expect((await get(id, `?key=${key}`)).json.input.animal.weightG).toBe(190)
  })

  it('made by two at once is saved once', async () => {
    const { id, key } = await saved()
    const answers = await Promise.all([190, 195, 200].map(weightG => ask('PATCH', `/api/regimens/${id}?key=${key}`, { ...heavier(weightG), baseVersion: 1 })))
    expect(answers.map(answer => answer.status).sort()).toEqual([200, 409, 409])
    expect((await get(id, `?key=${key}`)).json.latestVersion).toBe(2)
  })

  it.each([[0], [1.5], ['1'], [-1]])('based on version %j is refused', async (baseVersion) => {
    const { id, key } = await saved()
    const answer = await ask('PATCH', `/api/regimens/${id}?key=${key}`, { ...juniper(), baseVersion })
    expectOurShape(answer, 400, 'input.invalid')
    expect(answer.data.issues?.[0]?.path).toBe('baseVersion')
  })
})

describe('a version', () => {
  it.each([['99', 404, 'regimen.noVersion'], ['0', 400, 'input.invalid'], ['-1', 400, 'input.invalid'], ['1.5', 400, 'input.invalid'], ['x', 400, 'input.invalid'], ['1e99', 400, 'input.invalid']])('numbered %s answers %i', async (version, status, code) => {
    const { id, key } = await saved()
    for (const part of ['', '/sheet.pdf']) expectOurShape(await ask('GET', `/api/regimens/${id}${part}?key=${key}&version=${version}`), status, code)
  })
})

describe('the list of a browser', () => {
  it('is empty, and sets no cookie, for one that saved nothing', async () => {
    const answer = await ask('GET', '/api/regimens')
    expect(answer.json).toEqual({ items: [] })
    expect(answer.headers.getSetCookie()).toEqual([])
  })

  it('holds what was saved or opened there, newest first, and what is needed to tell plans apart', async () => {
    const first = await ask<SavedRegimenReceipt>('POST', '/api/regimens', juniper())
    const second = await saved({ ...juniper(), animal: { ...juniper().animal, name: 'Oak' } })
    const opened = await get(second.id, `?key=${second.key}`, { cookie: cookieOf(first) })
    const list = await ask<{ items: { id: string }[] }>('GET', '/api/regimens', undefined, { cookie: cookieOf(opened) })
    expect(list.json.items.map(item => item.id)).toEqual([second.id, first.json.id])
    expect(list.json.items[0]).toEqual({ id: second.id, version: 1, animalName: 'Oak', speciesName: expect.any(String) as string, createdAt: expect.any(String) as string, linkExpiresAt: expect.any(String) as string })
    expect(list.text).not.toContain(second.key)
  })

  it('holds a plan whose page was opened by its link, and none opened by a wrong one', async () => {
    const { id, key } = await saved()
    const page = await ask('GET', `/plans/${id}?key=${key}`, undefined, { accept: 'text/html' })
    expect(page.text).toContain('Juniper')
    const list = await ask<{ items: { id: string }[] }>('GET', '/api/regimens', undefined, { cookie: cookieOf(page) })
    expect(list.json.items.map(item => item.id)).toEqual([id])
    const shut = await ask('GET', `/plans/${id}?key=${'x'.repeat(43)}`, undefined, { accept: 'text/html' })
    expect(shut.headers.getSetCookie().filter(line => line.startsWith('thimbleful='))).toEqual([])
    expect(shut.text).not.toContain('Juniper')
  })

  it('keeps the last 20 in a cookie that a browser still takes', async () => {
    let cookie = ''
    const ids: string[] = []
    for (let count = 0; count < 22; count += 1) {
      const answer: Awaited<ReturnType<typeof ask<SavedRegimenReceipt>>> = await ask<SavedRegimenReceipt>('POST', '/api/regimens', juniper(), cookie ? { cookie } : {})
      expect(answer.status).toBe(201)
      cookie = cookieOf(answer)
      ids.unshift(answer.json.id)
    }
    expect(cookie.length).toBeLessThan(4096)
    const list = await ask<{ items: { id: string }[] }>('GET', '/api/regimens', undefined, { cookie })
    expect(list.json.items.map(item => item.id)).toEqual(ids.slice(0, 20))
  })
})
