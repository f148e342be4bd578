import { spawnSync } from 'node:child_process'
import { describe, expect, it } from 'vitest'
import type { Plan } from '#shared/types/plan'
import { baseUrl } from '../server'
import { expectOurShape, ask, juniper, rowCounts, saved, withDatabase } from './client'

const KINDS = ['sheet', 'mixing', 'label'] as const

async function pdf(path: string, init: RequestInit = {}) {
  const answer = await fetch(baseUrl() + path, init)
  const bytes = Buffer.from(await answer.arrayBuffer())
  return { status: answer.status, headers: answer.headers, bytes, text: answer.status === 200 ? textOf(bytes) : bytes.toString() }
}

const posted = (body: unknown): RequestInit => ({ method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) })

/** What the paper says, read back by another program. */
function textOf(bytes: Buffer): string {
  const read = spawnSync('pdftotext', ['-layout', '-', '-'], { input: bytes, maxBuffer: 20_000_000 })
  if (read.status !== 0) throw new Error(`pdftotext: ${read.error?.message ?? read.stderr.toString()}`)
  return read.stdout.toString('utf8').replace(/\u00A0/g, ' ')
}

describe.each(KINDS)('%s', (kind) => {
  it.each(['a4', 'letter'])('is a PDF on %s paper, unsaved, and keeps nothing', async (paper) => {
    const before = rowCounts()
    const { status, headers, bytes, text } = await pdf(`/api/regimens/${kind}.pdf?paper=${paper}&days=2-4`, posted(juniper()))
    expect(status, text).toBe(200)
    expect(bytes.subarray(0, 5).toString()).toBe('%PDF-')
    expect(headers.get('content-type')).toBe('application/pdf')
    expect(headers.get('cache-control')).toBe('private, no-store')
    expect(headers.get('content-disposition')).toBe(`inline; filename="thimbleful-${kind}-preview.pdf"`)
    expect(text).toContain('Juniper')
    expect(rowCounts()).toEqual(before)
  })

  it('of a saved plan says the same as the plan, and its file name is safe', async () => {
    const { id, key } = await saved({ ...juniper(), animal: { ...juniper().animal, name: 'Ju"ni\\per/..;ř' } })
    const { status, headers, text } = await pdf(`/api/regimens/${id}/${kind}.pdf?key=${key}&days=2-4`)
    expect(status, text).toBe(200)
    expect(headers.get('content-disposition')).toMatch(/^inline; filename="[a-z0-9-]+\.pdf"$/)
    expect(text).toContain('ř')
  })

  it.each([['paper=a5', 'paper'], ['days=first', 'days'], ['days=1-2-3', 'days'], ['days=-1', 'days']])('refuses %s', async (query, path) => {
    const { id, key } = await saved()
    for (const answer of [await ask('POST', `/api/regimens/${kind}.pdf?${query}`, juniper()), await ask('GET', `/api/regimens/${id}/${kind}.pdf?key=${key}&${query}`)]) {
      expectOurShape(answer, 400, 'input.invalid')
      expect(answer.data.issues?.[0]?.path).toBe(path)
    }
  })
})

describe('the sheet', () => {
  it('says the amounts of the plan', async () => {
    const { json: plan } = await ask<Plan>('POST', '/api/regimens/preview', juniper())
    const at = plan.days.findIndex(day => day.feeds.length > 0)
    expect(at).toBeGreaterThanOrEqual(0)
    const { text } = await pdf(`/api/regimens/sheet.pdf?days=${at + 1}`, posted(juniper()))
    const feed = plan.days[at]!.feeds[0]!
    expect(text).toMatch(new RegExp(`(^|[^\\d.])${String(feed.markMl).replace('.', '\\.')}\\s*mL`, 'm'))
    for (const { localTime } of plan.days[at]!.feeds) expect(text).toContain(localTime)
    expect(text).toContain(plan.edition)
  })

  it('of a saved plan is never worked out again', async () => {
    const { id, key } = await saved()
    withDatabase((db) => {
      const { plan_json: json } = db.prepare('select plan_json from regimen_versions where regimen_id = ?').get(id) as { plan_json: string }
      const plan = JSON.parse(json) as Plan
      // Nothing that works a plan out would ever come to this name.
      plan.animal.name = 'Number 61 as saved'
      db.prepare('update regimen_versions set plan_json = ? where regimen_id = ?').run(JSON.stringify(plan), id)
    })
    expect((await pdf(`/api/regimens/${id}/sheet.pdf?key=${key}`)).text).toContain('Number 61 as saved')
  })

  it('of an old version says that it was replaced', async () => {
    const { id, key } = await saved()
    await ask('PATCH', `/api/regimens/${id}?key=${key}`, { ...juniper(), animal: { ...juniper().animal, weightG: 190 } })
    const old = await pdf(`/api/regimens/${id}/sheet.pdf?key=${key}&version=1`)
    expect(old.headers.get('content-disposition')).toContain(`-${id}-1.pdf`)
    expect(old.text).toMatch(/182\s*g/)
    expect(old.text).not.toMatch(/190\s*g/)
    expect(old.text).toMatch(/version 2|replaced/i)
  })

  it('lacking something is refused with the list of what is missing', async () => {
    const { id, key } = await saved()
    withDatabase((db) => {
      const { plan_json: json } = db.prepare('select plan_json from regimen_versions where regimen_id = ?').get(id) as { plan_json: string }
      const plan = JSON.parse(json) as Plan
      plan.animal.speciesName = ''
      plan.howToGive = []
      db.prepare('update regimen_versions set plan_json = ? where regimen_id = ?').run(JSON.stringify(plan), id)
    })
    const answer = await ask('GET', `/api/regimens/${id}/sheet.pdf?key=${key}&days=2-4`)
    expectOurShape(answer, 422, 'sheet.incomplete')
    expect(answer.data.issues?.map(issue => issue.message)).toContain('the species')
  })

  it('of a day after the last prints the last, and of a month a week', async () => {
    expect((await pdf('/api/regimens/sheet.pdf?days=999', posted(juniper()))).status).toBe(200)
    expect((await pdf('/api/regimens/sheet.pdf?days=1-31', posted(juniper()))).status).toBe(200)
    expect((await pdf('/api/regimens/sheet.pdf?days=0', posted(juniper()))).status).toBe(200)
  })
})
