import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { SavedRegimenReceipt } from '#shared/types/plan'
import { ask, expectOurShape, juniper, rowCounts, saved } from './client'

/** Every route that takes a plan's input, and what it must never do with a bad one: save, print, fail. */
const ROUTES: [string, (own: SavedRegimenReceipt) => [string, string]][] = [
  ['preview', () => ['POST', '/api/regimens/preview']],
  ['save', () => ['POST', '/api/regimens']],
  ['change', own => ['PATCH', `/api/regimens/${own.id}?key=${own.key}`]],
  ['sheet', () => ['POST', '/api/regimens/sheet.pdf']],
  ['mixing card', () => ['POST', '/api/regimens/mixing.pdf']],
  ['label', () => ['POST', '/api/regimens/label.pdf']],
]

type Draft = Record<string, unknown> & { animal: Record<string, unknown> }
const changed = (change: (draft: Draft) => void): string => {
  const draft = juniper() as unknown as Draft
  change(draft)
  return JSON.stringify(draft)
}
const whole = JSON.stringify(juniper())

/** What is sent, the status, the code, and the path of the first issue where there is one. */
const BAD: [string, string, number, string, string?][] = [
  ['broken JSON', whole.slice(0, -1), 400, 'input.notJson'],
  ['nothing', '', 400, 'input.notJson'],
  ['NaN for a number', whole.replace('"weightG":182', '"weightG":NaN'), 400, 'input.notJson'],
  ['a form', 'weightG=182', 400, 'input.notJson'],
  ['10 MB', changed(draft => draft.filler = 'x'.repeat(10_000_000)), 413, 'input.tooLarge'],
  ['ten thousand brackets', '['.repeat(10_000) + ']'.repeat(10_000), 400, 'input.invalid', ''],
  ['null', 'null', 400, 'input.invalid', ''],
  ['a list', '[]', 400, 'input.invalid', ''],
  ['a text', '"plan"', 400, 'input.invalid', ''],
  ['an empty object', '{}', 400, 'input.invalid', 'animal'],
  ['no animal', changed(draft => delete (draft as Partial<Draft>).animal), 400, 'input.invalid', 'animal'],
  ['a list for the animal', changed(draft => Object.assign(draft, { animal: [] })), 400, 'input.invalid', 'animal'],
  ['no weight', changed(draft => delete draft.animal.weightG), 400, 'input.invalid', 'animal.weightG'],
  ['a weight as text', changed(draft => draft.animal.weightG = '182'), 400, 'input.invalid', 'animal.weightG'],
  ['a weight of nothing', changed(draft => draft.animal.weightG = 0), 400, 'input.invalid', 'animal.weightG'],
  ['a weight below nothing', changed(draft => draft.animal.weightG = -182), 400, 'input.invalid', 'animal.weightG'],
  ['a weight beyond all numbers', whole.replace('"weightG":182', '"weightG":1e999'), 400, 'input.invalid', 'animal.weightG'],
  ['a huge weight', changed(draft => draft.animal.weightG = 1e308), 400, 'input.invalid', 'animal.weightG'],
  ['a weight times 1000', changed(draft => draft.animal.weightG = 182_000), 422, 'weight.implausible', 'animal.weightG'],
  ['a weight in kilograms', changed(draft => draft.animal.weightG = 0.182), 422, 'weight.implausible', 'animal.weightG'],
  ['an unknown species', changed(draft => draft.animal.speciesId = 'sp-unicorn'), 422, 'species.unknown', 'animal.speciesId'],
  ['a species named like a part of every object', changed(draft => draft.animal.speciesId = '__proto__'), 422, 'species.unknown', 'animal.speciesId'],
  ['a date that does not exist', changed(draft => draft.animal.weighedOn = '2026-02-30'), 400, 'input.invalid', 'animal.weighedOn'],
  ['a start that does not exist', changed(draft => draft.startAt = '2026-02-30T18:00:00Z'), 400, 'input.invalid', 'startAt'],
  ['a start without offset', changed(draft => draft.startAt = '2026-12-03T18:00:00'), 400, 'input.invalid', 'startAt'],
  ['a start at the end of time', changed(draft => draft.startAt = '9999-12-31T23:59:59Z'), 400, 'input.invalid', 'startAt'],
  ['an unknown time zone', changed(draft => draft.timeZone = 'Mars/Base'), 400, 'input.invalid', 'timeZone'],
  ['an hour that does not exist', changed(draft => draft.feedingHours = { from: '24:30', to: '20:30' }), 400, 'input.invalid', 'feedingHours.from'],
  ['an unknown feed', changed(draft => draft.feed = { feedId: 'nothing' }), 422, 'feed.unknown', 'feed.feedId'],
  ['a feed without energy', changed(draft => draft.feed = {}), 400, 'input.invalid', 'feed'],
  ['a feed richer than fat', changed(draft => draft.feed = { energyKcalPerMl: 12 }), 400, 'input.invalid', 'feed.energyKcalPerMl'],
  ['a feed of more than everything', changed(draft => draft.feed = { proteinPercent: 60, fatPercent: 50, carbohydratePercent: 10 }), 400, 'input.invalid', 'feed'],
  ['an unknown route', changed(draft => draft.route = 'spoon'), 400, 'input.invalid', 'route'],
  ['two and a half feeds', changed(draft => draft.feedsPerDay = 2.5), 400, 'input.invalid', 'feedsPerDay'],
  ['a thousand feeds', changed(draft => draft.feedsPerDay = 1000), 400, 'input.invalid', 'feedsPerDay'],
  ['an unknown sign', changed(draft => draft.animal.signs = ['happy']), 400, 'input.invalid', 'animal.signs.0'],
  ['a sign twice', changed(draft => draft.animal.signs = ['swollen', 'swollen']), 400, 'input.invalid', 'animal.signs'],
  ['a thousand syringes', changed(draft => draft.syringes = Array.from({ length: 1000 }, () => ({ capacityMl: 1, stepMl: 0.1 }))), 400, 'input.invalid', 'syringes'],
  ['a syringe without marks', changed(draft => draft.syringes = [{ capacityMl: 1, stepMl: 0.9 }]), 400, 'input.invalid', 'syringes.0'],
  ['a name as long as a book', changed(draft => draft.animal.name = 'x'.repeat(100_000)), 400, 'input.invalid', 'animal.name'],
  ['an unknown equation', changed(draft => draft.overrides = { energyEquationId: 'mine' }), 422, 'energy.unknownEquation', 'overrides.energyEquationId'],
  ['a step above all measure', changed(draft => draft.overrides = { fractions: [0.2, 50] }), 400, 'input.invalid', 'overrides.fractions.1'],
]

let own: SavedRegimenReceipt
let before: Record<string, number>
beforeAll(async () => {
  own = await saved()
  before = rowCounts()
})
afterAll(() => expect(rowCounts(), 'something was saved of what was refused').toEqual(before))

describe.each(ROUTES)('%s', (_name, route) => {
  it.each(BAD)('answers %s as it should', async (_what, body, status, code, path) => {
    const [method, address] = route(own)
    const answer = await ask(method, address, body)
    expectOurShape(answer, status, code)
    if (path !== undefined) expect(answer.data.issues?.[0]?.path).toBe(path)
    else expect(answer.data.issues).toBeUndefined()
  })
})

describe('what is let pass', () => {
  const preview = (body: string) => ask<Record<string, unknown>>('POST', '/api/regimens/preview', body)

  it('fields that nobody knows change nothing', async () => {
    const plain = await preview(whole)
    const filled = await preview(changed((draft) => {
      draft.extra = { deep: [1, 2, 3] }
      draft.animal.weightKg = 3
    }))
    expect(filled.status).toBe(200)
    expect(filled.json).toEqual(plain.json)
  })

  it('keys that reach for every object reach nothing', async () => {
    const plain = await preview(whole)
    const reaching = await preview(`{"__proto__":{"route":"tube","polluted":1},"constructor":{"prototype":{"polluted":1}},${whole.slice(1)}`)
    expect(reaching.status).toBe(200)
    expect(reaching.json).toEqual(plain.json)
    expect((await ask('GET', '/api/health')).text).not.toContain('polluted')
  })

  it('a name is text, whatever stands in it, without signs that nobody sees', async () => {
    const answer = await preview(changed(draft => draft.animal.name = 'Žofka <b>&\u202E\u0000 🦎'))
    expect((answer.json as { animal: { name: string } }).animal.name).toBe('Žofka <b>&  🦎')
  })
})
