import { registerEndpoint } from '@nuxt/test-utils/runtime'
import { createError, readBody } from 'h3'
import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import { TeamSettings } from '#shared/schemas/team'
import type { Plan, SavedRegimen } from '#shared/types/plan'
import { usePlannerStore } from '~/stores/planner'
import { emptyDraft, type PlannerDraft } from '~/utils/plannerDraft'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { currentEdition } from '#server/utils/reference'
import { regimenInput } from '../../unit/plan/inputs'

/** What the server was asked, and what it answers next. Its plans are told apart by their weight alone. */
interface Asked { animal: { weightG: number, name?: string }, baseVersion?: number, note?: string }
let asked: Asked[] = []
let answer: (body: Asked) => unknown = planOf

function planOf(body: Asked): unknown {
  return { animal: { weightG: body.animal.weightG } }
}
const handle = (method: 'POST' | 'PATCH') => ({
  method,
  handler: async (event: Parameters<typeof readBody>[0]) => {
    const body = await readBody<Asked>(event)
    asked.push(body)
    return await answer(body)
  },
})
registerEndpoint('/api/regimens/preview', handle('POST'))
registerEndpoint('/api/regimens', handle('POST'))
registerEndpoint('/api/regimens/abc', handle('PATCH'))
registerEndpoint('/api/regimens/abc', { method: 'GET', handler: () => ({ id: 'abc', latestVersion: 5 }) })

function filled(weight: string, change: Partial<PlannerDraft> = {}): PlannerDraft {
  return { ...emptyDraft(), speciesId: 'sp-leopard-gecko', weight: { text: weight, unit: 'g' }, dryness: '8', daysUnfed: '30', startAt: '2026-12-02T09:00', timeZone: 'Europe/London', ...change }
}
const refuse = (statusCode: number, data: object) => () => {
  throw createError({ statusCode, data })
}

let planner: ReturnType<typeof usePlannerStore>
beforeEach(() => {
  setActivePinia(createPinia())
  planner = usePlannerStore()
  asked = []
  answer = planOf
})

describe('preview', () => {
  it('asks for nothing while something is needed, and shows no plan of before', async () => {
    planner.draft = filled('22')
    await planner.preview()
    expect(planner.plan?.animal.weightG).toBe(22)
    planner.draft.weight.text = ''
    await planner.preview()
    expect(planner.plan).toBeNull()
    expect(planner.needed).toEqual(['its weight'])
    expect(asked).toHaveLength(1)
  })

  it('asks for nothing while a word stands for a number, and says where', async () => {
    planner.draft = filled('22', { feedsPerDay: 'few' })
    await planner.preview()
    expect(asked).toHaveLength(0)
    expect(planner.issueAt('feedsPerDay')).toBe('Type a number, for example 0.4.')
    expect(planner.issueAt('animal.weightG')).toBeUndefined()
  })

  it('drops an answer that a newer question has overtaken', async () => {
    let release = () => {}
    const held = new Promise<void>(resolve => release = resolve)
    answer = body => body.animal.weightG === 22 ? held.then(() => planOf(body)) : planOf(body)
    planner.draft = filled('22')
    const first = planner.preview()
    planner.draft.weight.text = '23'
    await planner.preview()
    release()
    await first
    expect(planner.plan?.animal.weightG).toBe(23)
    expect(planner.problem).toBeNull()
    expect(planner.working).toBe(false)
  })

  it('shows each refused field at its place and keeps the last plan', async () => {
    planner.draft = filled('22')
    await planner.preview()
    answer = refuse(422, { code: 'weight.implausible', message: 'Too heavy.', issues: [{ path: 'animal.weightG', message: 'Too heavy.' }] })
    planner.draft.weight.text = '22000'
    await planner.preview()
    expect(planner.problem).toMatchObject({ code: 'weight.implausible', offline: false })
    expect(planner.issueAt('animal.weightG')).toBe('Too heavy.')
  })

  it('drops an answer to what was since taken away', async () => {
    let release = () => {}
    const held = new Promise<void>(resolve => release = resolve)
    answer = body => held.then(() => planOf(body))
    planner.draft = filled('22')
    const first = planner.preview()
    planner.draft.weight.text = ''
    await planner.preview()
    release()
    await first
    expect(planner.plan).toBeNull()
    expect(planner.working).toBe(false)
  })

  it('says that the plan shown is behind what is typed', async () => {
    planner.draft = filled('22')
    await planner.preview()
    expect(planner.behind).toBe(false)
    planner.draft.temperature.text = 'warm'
    await planner.preview()
    expect(planner.behind).toBe(true)
    expect(planner.plan?.animal.weightG).toBe(22)
  })

  it('is rid of a problem as soon as the plan can be worked out', async () => {
    answer = refuse(422, { code: 'a.b', message: 'No.', issues: [{ path: 'startAt', message: 'No.' }] })
    planner.draft = filled('22')
    await planner.preview()
    answer = planOf
    await planner.preview()
    expect(planner.problem).toBeNull()
    expect(planner.issues).toEqual([])
  })
})

describe('save', () => {
  it('saves a new plan and says where it can be seen', async () => {
    answer = () => ({ id: 'abc', version: 1, key: 'k/+=', link: '' })
    planner.draft = filled('22')
    expect(await planner.save()).toBe('/plans/abc?key=k%2F%2B%3D')
    expect(asked[0]?.baseVersion).toBeUndefined()
    expect(planner.saving).toBe(false)
  })

  it('empties the form for the next animal, keeps the house and says where the plan went', async () => {
    answer = () => ({ id: 'abc', version: 1, key: 'k', link: '' })
    planner.draft = filled('22', { name: 'Pebble', teamName: 'Saltings Rescue' })
    await planner.save()
    expect(planner.draft).toMatchObject({ name: '', speciesId: '', weight: { text: '' }, teamName: 'Saltings Rescue' })
    expect(planner.plan).toBeNull()
    expect(planner.justSaved).toEqual({ name: 'Pebble', to: '/plans/abc?key=k' })
  })

  it('saves a change on top of the version it was made from', async () => {
    planner.change({ id: 'abc', version: 2, latestVersion: 2, input: regimenInput(), plan: {} as Plan } as SavedRegimen, 'key')
    planner.draft.weight.text = '25'
    answer = () => ({ id: 'abc', version: 3 })
    expect(await planner.save()).toBe('/plans/abc?key=key')
    expect(asked[0]).toMatchObject({ baseVersion: 2, animal: { weightG: 25 } })
    expect(planner.editing).toBeNull()
  })

  it('that someone overtook loses nothing: the problem is said, and the change is still one', async () => {
    planner.change({ id: 'abc', version: 2, latestVersion: 2, input: regimenInput(), plan: {} as Plan } as SavedRegimen, null)
    answer = refuse(409, { code: 'regimen.changed', message: 'Version 3 was saved meanwhile.' })
    expect(await planner.save()).toBeNull()
    expect(planner.problem).toMatchObject({ code: 'regimen.changed' })
    expect(planner.editing).toMatchObject({ id: 'abc', version: 2 })
    expect(planner.draft.speciesId).toBe('sp-leopard-gecko')
  })
})

describe('a team\'s plan', () => {
  const saved = { id: 'abc', version: 2, latestVersion: 2, input: regimenInput(), plan: {} as Plan, team: {} } as unknown as SavedRegimen
  it('is saved without a key', async () => {
    answer = () => ({ id: 'abc', version: 1, key: '', link: '/plans/abc' })
    planner.draft = filled('22')
    expect(await planner.save()).toBe('/plans/abc')
  })
  it('takes along what was said of the change, once', async () => {
    planner.change(saved, null)
    expect(planner.editing).toMatchObject({ team: true })
    planner.note = ' New weight. '
    answer = () => ({ id: 'abc', version: 3 })
    await planner.save()
    expect(asked[0]!.note).toBe('New weight.')
    expect(planner.note).toBe('')
  })
  it('that someone overtook can be saved as the version after it, once that is wanted', async () => {
    planner.change(saved, null)
    answer = body => body.baseVersion === 5 ? { id: 'abc', version: 6 } : refuse(409, { code: 'regimen.changed', message: 'Mara Linde saved version 5.', issues: [{ path: 'animal.weightG', message: 'Weight from 22 g to 23 g' }] })()
    expect(await planner.save()).toBeNull()
    expect(planner.problem?.issues).toHaveLength(1)
    expect(await planner.saveOnTop()).toBe('/plans/abc')
    expect(asked.map(one => one.baseVersion)).toEqual([2, 5])
  })
})

describe('the settings of a team', () => {
  const team = { id: 't', name: 'Saltings Rescue', role: 'keeper' as const, demo: true, codesDue: false, settings: TeamSettings.parse({ timeZone: 'Pacific/Auckland', feedingHours: { from: '06:00', to: '22:00' }, syringes: [{ capacityMl: 1, stepMl: 0.02 }], contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }] }) }
  it('fill in the house of an empty form, and say so', () => {
    planner.fillFromTeam(team)
    expect(planner.draft).toMatchObject({ timeZone: 'Pacific/Auckland', from: '06:00', to: '22:00', teamName: 'Saltings Rescue', syringes: [{ capacity: '1', step: '0.02' }], contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }] })
    expect(planner.filledFrom).toBe('Saltings Rescue')
  })
  it('leave alone what has begun, and keep what the team has not set', () => {
    planner.draft = filled('22', { from: '08:00' })
    planner.fillFromTeam(team)
    expect(planner.draft.from).toBe('08:00')
    expect(planner.filledFrom).toBe('')
    planner.draft = emptyDraft()
    planner.fillFromTeam({ ...team, settings: TeamSettings.parse({}) })
    expect(planner.draft.syringes).toEqual(emptyDraft().syringes)
    expect(planner.draft.contacts).toEqual(emptyDraft().contacts)
  })
})

describe('a draft from days ago', () => {
  const OLD = '2020-12-02T09:00'
  it('is asked about, and begins now with a weight to be typed anew', () => {
    planner.draft = filled('22', { startAt: OLD })
    planner.fillFromBrowser()
    expect(planner.begunOn).toBe('2020-12-02')
    planner.startNow('new')
    expect(planner.draft.weight.text).toBe('')
    expect(planner.draft.weighedOn).toBe('')
    expect(planner.draft.startAt > OLD).toBe(true)
    expect(planner.begunOn).toBe('')
  })
  it('or keeps the weight with the day it is from', () => {
    planner.draft = filled('22', { startAt: OLD })
    planner.fillFromBrowser()
    planner.startNow('old')
    expect(planner.draft).toMatchObject({ weight: { text: '22' }, weighedOn: '2020-12-02' })
  })
  it('of a saved plan goes on from where it began', () => {
    planner.change({ id: 'abc', version: 1, latestVersion: 1, input: regimenInput(), plan: {} as Plan } as SavedRegimen, null)
    planner.draft.startAt = OLD
    planner.fillFromBrowser()
    expect(planner.begunOn).toBe('')
  })
})

describe('starting over', () => {
  it('while changing a saved plan, and undone, still changes that plan', () => {
    planner.change({ id: 'abc', version: 1, latestVersion: 2, input: regimenInput(), plan: {} as Plan } as SavedRegimen, 'k')
    planner.startOver()
    expect(planner.editing).toBeNull()
    planner.undo()
    expect(planner.editing).toEqual({ id: 'abc', version: 2, key: 'k' })
  })

  it('empties the form, and can be undone', () => {
    planner.draft = filled('22', { name: 'Pebble' })
    planner.startOver()
    expect(planner.draft.name).toBe('')
    expect(planner.draft.timeZone).not.toBe('')
    planner.undo()
    expect(planner.draft).toMatchObject({ name: 'Pebble', weight: { text: '22' } })
    planner.undo()
    expect(planner.draft.name).toBe('Pebble')
  })
})

it('dates a new weight of a saved plan today, once, and leaves a day that was given', async () => {
  const planner = usePlannerStore()
  const input = regimenInput({ animal: { weighedOn: '2026-12-02' } })
  const saved = { id: 'abc', version: 1, latestVersion: 1, createdAt: '', linkExpiresAt: '', edition: '', input, plan: buildPlan(input, currentEdition()) }
  const today = new Date().toLocaleDateString('sv-SE')
  planner.change(saved, null)
  await planner.preview()
  expect(planner.draft.weighedOn).toBe('2026-12-02')
  planner.draft.weight.text = '24'
  await planner.preview()
  expect(planner.draft.weighedOn).toBe(today)
  planner.draft.weighedOn = '2026-12-02'
  await planner.preview()
  expect(planner.draft.weighedOn).toBe('2026-12-02')
  planner.change(saved, null)
  planner.draft.weight.text = '24'
  planner.draft.weighedOn = '2026-12-03'
  await planner.preview()
  expect(planner.draft.weighedOn).toBe('2026-12-03')
})
