import { mountSuspended, registerEndpoint } from '@nuxt/test-utils/runtime'
import { flushPromises } from '@vue/test-utils'
import { createError, readBody } from 'h3'
import type { Component } from 'vue'
import { beforeEach, describe, expect, it } from 'vitest'
import LifeAnswer from '~/components/life/LifeAnswer.vue'
import LifeApprovalHead from '~/components/life/LifeApprovalHead.vue'
import LifeBar from '~/components/life/LifeBar.vue'
import LifeChanges from '~/components/life/LifeChanges.vue'
import LifeDecision from '~/components/life/LifeDecision.vue'
import LifeFeedEntry from '~/components/life/LifeFeedEntry.vue'
import LifeFeedLog from '~/components/life/LifeFeedLog.vue'
import LifeFeedRow from '~/components/life/LifeFeedRow.vue'
import LifeLimits from '~/components/life/LifeLimits.vue'
import LifeNoSheet from '~/components/life/LifeNoSheet.vue'
import LifePlan from '~/components/life/LifePlan.vue'
import LifePlans from '~/components/life/LifePlans.vue'
import LifeProblem from '~/components/life/LifeProblem.vue'
import LifeRemembered from '~/components/life/LifeRemembered.vue'
import LifeShape from '~/components/life/LifeShape.vue'
import LifeSheet from '~/components/life/LifeSheet.vue'
import LifeSheetAnswer from '~/components/life/LifeSheetAnswer.vue'
import LifeSheetPrint from '~/components/life/LifeSheetPrint.vue'
import LifeSheetStop from '~/components/life/LifeSheetStop.vue'
import LifeSheetStretch from '~/components/life/LifeSheetStretch.vue'
import LifeStanding from '~/components/life/LifeStanding.vue'
import LifeStepPanel from '~/components/life/LifeStepPanel.vue'
import LifeSteps from '~/components/life/LifeSteps.vue'
import LifeTransfer from '~/components/life/LifeTransfer.vue'
import LifeVersions from '~/components/life/LifeVersions.vue'
import LifeWaiting from '~/components/life/LifeWaiting.vue'
import LifeWeighIns from '~/components/life/LifeWeighIns.vue'
import PlanSheet from '~/components/plan/PlanSheet.vue'
import PrintChoices from '~/components/print/PrintChoices.vue'
import UiTextarea from '~/components/ui/UiTextarea.vue'
import { TeamSettings } from '#shared/schemas/team'
import type { FeedEntry, PlanRow, Standing, TeamPlanInfo, VersionRow } from '#shared/types/planLife'
import type { SheetView } from '#shared/types/sheet'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { sheetModel } from '#server/utils/print/sheet'
import { currentEdition } from '#server/utils/reference'
import type { OpenedRegimen } from '~/stores/regimens'
import { regimenInput } from '../../unit/plan/inputs'
import { slipsOf } from '../structure'

const ZONE = 'Europe/London'
const edition = currentEdition()
const input = regimenInput({ animal: { caseNumber: '26-041', enclosure: 'Warm room, tank 4' } })
const plan = buildPlan(input, edition)
const approved: Standing = { state: 'approved', band: 'Approved by Dr Amara Osei', line: 'Approved by Dr Amara Osei for 22 g, good until Wed 9 Dec.' }
const none: Standing = { state: 'none', band: 'NOT APPROVED BY A VET', line: 'No vet has approved this version.' }
const lapsed: Standing = { state: 'lapsed', band: 'APPROVAL LAPSED', line: 'It lapsed when the weight fell by 12 %.' }
const approval = { version: 1, weightG: 22, fromDate: '2026-12-02', goodUntil: '2026-12-09', edition: plan.edition, vetName: 'Dr Amara Osei', registration: 'DEMO-0142', note: 'Weigh daily.', at: '2026-12-02T18:40:00Z', lapsedAt: null, lapseReason: null }
const team = (change: Partial<TeamPlanInfo> = {}): TeamPlanInfo => ({
  state: 'draft', waiting: 'check', waitingSince: '2026-12-03T14:10:00Z', askedBy: 'Mara Linde', draftedBy: 'Mara Linde', checkedBy: null, checkedAt: null, sentBack: null, approval: null, standing: none,
  lastWeighIn: null, steps: ['check', 'send-back', 'stop'], notYet: { approve: 'It must be checked first.' }, mayEdit: true, mayWeigh: true, mayTransfer: true, mayLink: true, ...change,
})
const opened = (info: Partial<TeamPlanInfo> = {}, change: Partial<OpenedRegimen> = {}): OpenedRegimen => ({ id: 'abc', version: 2, latestVersion: 2, createdAt: '2026-12-02T10:00:00Z', linkExpiresAt: '', edition: plan.edition, input, plan, team: team(info), ...change })
const row = (change: Partial<PlanRow> = {}): PlanRow => ({ id: 'abc', version: 2, animalName: 'Pebble', caseNumber: '26-041', speciesName: 'Leopard gecko', enclosure: 'Warm room, tank 4', room: 'Warm room', weightG: 22, goodUntil: '2020-12-09', state: 'draft', waiting: 'check', waitingSince: '2026-12-03T14:10:00Z', askedBy: 'Mara Linde', standing: none, updatedAt: '2026-12-03T14:10:00Z', updatedBy: 'Mara Linde', ...change })
const versions: VersionRow[] = [{ version: 2, createdAt: '2026-12-03T14:10:00Z', author: 'Mara Linde', edition: plan.edition, weightG: 23, note: 'New weight.', approval: null }, { version: 1, createdAt: '2026-12-02T14:10:00Z', author: 'Mara Linde', edition: plan.edition, weightG: 22, note: '', approval }]
const entry = (change: Partial<FeedEntry> = {}): FeedEntry => ({ id: 1, at: '2026-12-03T07:40:00Z', dueAt: '2026-12-03T07:30:00Z', outcome: 'part', takenMl: 0.3, note: 'slow', initials: 'ML', by: 'Mara Linde', struckAt: null, struckReason: null, ...change })
const lines = [{ part: 'Animal', text: 'Weight from 22 g to 23 g', weight: 'other' as const }, { part: 'Days', text: 'Each feed on Thu 3 Dec from 0.35 mL to 0.4 mL', weight: 'amount' as const }]
const printed = (of = plan): SheetView => sheetModel(of, { paper: 'a4', appVersion: '1', madeAt: '2026-12-02T18:40:00Z', contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }], reference: { id: 'abc', version: 2, latestVersion: 2, createdAt: '2026-12-02T10:00:00Z', url: 'http://localhost/sheet/abc' } }) as SheetView
const sheet = printed()
const shut = printed(buildPlan(regimenInput({ animal: { signs: ['convulsing'] } }), edition))
/** A sheet whose days are over: nothing on it speaks of today. */
const fed: SheetView = { ...sheet, notice: null }
const answer = { code: 'current' as const, title: 'This sheet is current.', message: 'Feed as it says.', good: true, version: 2, latestVersion: 2 }
const replaced = { code: 'replaced' as const, title: 'Replaced by version 3 on Thu 3 Dec.', message: 'Print it, take this one down.', good: false, version: 2, latestVersion: 3 }

let sent: { path: string, body: unknown }[] = []
let refusal: { statusCode: number, data: object } | null = null
const post = (path: string, reply: unknown) => registerEndpoint(path, { method: 'POST', handler: async (event) => {
  sent.push({ path, body: await readBody(event) })
  if (refusal) throw createError(refusal)
  return reply
} })
const page = <Item>(items: Item[]) => ({ items, total: items.length, page: 1, pageSize: 25 })
registerEndpoint('/api/regimens', () => page([row(), row({ id: 'def', animalName: '', state: 'in-use', waiting: null, waitingSince: null, standing: approved })]))
registerEndpoint('/api/team/rooms', () => ({ items: ['Warm room'] }))
registerEndpoint('/api/regimens/abc/weigh-ins', { method: 'GET', handler: () => page([{ id: 1, weightG: 22, weighedAt: '2026-12-03T07:10:00Z', by: 'Mara Linde', effect: 'The plan stands.' }]) })
registerEndpoint('/api/regimens/abc/feed-log', { method: 'GET', handler: () => page([entry(), entry({ id: 2, outcome: 'brought-up', takenMl: null }), entry({ id: 3, struckAt: '2026-12-03T08:00:00Z', struckReason: 'Wrong animal.' })]) })
post('/api/regimens/abc/weigh-ins', { weighIn: { id: 2, weightG: 22.5, weighedAt: '2026-12-04T07:10:00Z', by: 'Mara Linde', effect: 'The plan stands.' }, team: team({ state: 'in-use' }) })
post('/api/regimens/abc/feed-log', entry())
post('/api/regimens/abc/feed-log/1/strike', {})
post('/api/regimens/abc/check', team({ state: 'checked', waiting: null }))
post('/api/regimens/abc/approve', team({ state: 'approved', standing: approved }))
post('/api/regimens/abc/send-back', team())
post('/api/regimens/abc/transfers', { id: 't', link: 'http://localhost/transfer#secret', expiresAt: '2026-12-10T10:00:00Z' })

const CASES: [string, Component, Record<string, unknown>][] = [
  ['LifeAnswer', LifeAnswer, { saved: opened() }],
  ['LifeAnswer, replaced', LifeAnswer, { saved: opened({}, { latestVersion: 3 }) }],
  ['LifeApprovalHead', LifeApprovalHead, { saved: opened({ lastWeighIn: { weightG: 21, weighedAt: '2026-12-03T07:10:00Z' } }), timeZone: ZONE }],
  ['LifeBar', LifeBar, { info: team(), version: 2, timeZone: ZONE }],
  ['LifeBar, stopped', LifeBar, { info: team({ state: 'stopped', waiting: null, approval, standing: lapsed, sentBack: { by: 'Dr Amara Osei', at: '2026-12-03T09:00:00Z', reason: 'Too steep.' } }), version: 2, timeZone: ZONE }],
  ['LifeChanges', LifeChanges, { lines }],
  ['LifeChanges, none', LifeChanges, { lines: [] }],
  ['LifeDecision', LifeDecision, { saved: opened({ steps: ['approve', 'send-back'] }) }],
  ['LifeFeedEntry', LifeFeedEntry, { id: 'abc', feeds: plan.days.find(day => day.feeds.length > 0)!.feeds }],
  ['LifeFeedLog', LifeFeedLog, { id: 'abc', timeZone: ZONE, mayLog: true }],
  ['LifeFeedRow', LifeFeedRow, { id: 'abc', entry: entry(), timeZone: ZONE, mayStrike: true }],
  ['LifeLimits', LifeLimits, { plan }],
  ['LifeNoSheet', LifeNoSheet, { loading: false, problem: null, helper: true }],
  ['LifePlan', LifePlan, { saved: opened() }],
  ['LifePlans', LifePlans, {}],
  ['LifeProblem', LifeProblem, { problem: { code: 'plan.noRegistration', message: 'Your profile has no registration.', offline: false } }],
  ['LifeRemembered', LifeRemembered, { plans: [{ id: 'abc', version: 1, animalName: 'Pebble', speciesName: 'Leopard gecko', createdAt: '2026-12-02T10:00:00Z', linkExpiresAt: '2027-01-01T10:00:00Z' }], team: 'Saltings Rescue' }],
  ...(['good', 'care', 'stop'] as const).map((look): [string, Component, Record<string, unknown>] => [`LifeShape, ${look}`, LifeShape, { look }]),
  ['LifeSheet', LifeSheet, { sheet, version: 2 }],
  ['LifeSheet, shut', LifeSheet, { sheet: shut, version: 2, stale: true }],
  ['LifeSheetAnswer', LifeSheetAnswer, { answer, sheet: fed }],
  ['LifeSheetAnswer, replaced', LifeSheetAnswer, { answer: replaced, sheet: null }],
  ['LifeSheetPrint', LifeSheetPrint, { id: 'abc', version: 2, replaced: false, team: true }],
  ['LifeSheetStop', LifeSheetStop, { stop: sheet.stop }],
  ['LifeSheetStretch', LifeSheetStretch, { stretch: sheet.stretches[0], today: null }],
  ...[approved, none, lapsed].map((standing): [string, Component, Record<string, unknown>] => [`LifeStanding, ${standing.state}`, LifeStanding, { standing }]),
  ['LifeStepPanel', LifeStepPanel, { step: 'stop', saved: opened() }],
  ['LifeSteps', LifeSteps, { saved: opened() }],
  ['LifeTransfer', LifeTransfer, { id: 'abc', animal: 'Pebble', timeZone: ZONE }],
  ['LifeVersions', LifeVersions, { id: 'abc', rows: versions, total: 2, page: 1, pageSize: 25, sort: '-version', loading: false, from: 1, to: 2, timeZone: ZONE }],
  ['LifeWaiting', LifeWaiting, { heading: 'To check', rows: [row()], timeZone: ZONE }],
  ['LifeWeighIns', LifeWeighIns, { id: 'abc', timeZone: ZONE, mayWeigh: true }],
  ['PlanSheet with a standing', PlanSheet, { plan, standing: approved }],
  ['UiTextarea', UiTextarea, { label: 'Note', modelValue: '', hint: 'as you like', error: 'Too long.' }],
]

beforeEach(() => {
  sent = []
  refusal = null
  useReferenceStore().species = [...edition.species.values()]
  useSessionStore().take({ user: { id: 'u', name: 'Mara Linde', email: 'mara@rescue.example', registration: '', hasCodes: false, demo: true }, team: { id: 't', name: 'Saltings Rescue', role: 'keeper', settings: TeamSettings.parse({}), demo: true, codesDue: false }, teams: [] })
})

const mount = (component: Component, props: Record<string, unknown>) => mountSuspended(component, { props })
const press = (mounted: Awaited<ReturnType<typeof mount>>, words: string) => mounted.findAll('button').find(one => one.text().includes(words))!.trigger('click')
async function submit(mounted: Awaited<ReturnType<typeof mount>>) {
  await mounted.get('form').trigger('submit')
  // Validation and the request each take their turns.
  for (let turn = 0; turn < 8; turn++) {
    await flushPromises()
    await new Promise(resolve => setTimeout(resolve, 5))
  }
}

describe('every component of the life of plans', () => {
  it.each(CASES)('%s can be used without sight or mouse', async (_, component, props) => {
    const mounted = await mount(component, props)
    await flushPromises()
    const root = document.createElement('div')
    root.innerHTML = mounted.html()
    expect(root.textContent!.length + root.querySelectorAll('svg').length).toBeGreaterThan(0)
    expect(slipsOf(root)).toEqual([])
  })
})

describe('the steps', () => {
  it('stand in the order of the server, the first as the main one, with what must wait', async () => {
    const steps = await mount(LifeSteps, { saved: opened() })
    expect(steps.findAll('button').map(one => one.text())).toEqual(['Mark as checked', 'Send back', 'Stop this plan'])
    expect(steps.findAll('.button-main')).toHaveLength(1)
    expect(steps.text()).toContain('It must be checked first.')
  })
  it('send the version on the screen, and show what follows', async () => {
    const regimens = useRegimensStore()
    regimens.saved = opened()
    const panel = await mount(LifeStepPanel, { step: 'check', saved: opened() })
    await submit(panel)
    expect(sent).toEqual([{ path: '/api/regimens/abc/check', body: { version: 2, note: '' } }])
    expect(regimens.saved.team!.state).toBe('checked')
    expect(panel.emitted('done')).toHaveLength(1)
  })
  it('ask for a reason where one is needed', async () => {
    const panel = await mount(LifeStepPanel, { step: 'send-back', saved: opened() })
    await submit(panel)
    expect(sent).toEqual([])
    expect(panel.text()).toContain('Say why it goes back')
    await panel.get('textarea').setValue('Start lower.')
    await submit(panel)
    expect(sent).toEqual([{ path: '/api/regimens/abc/send-back', body: { version: 2, reason: 'Start lower.' } }])
  })
  it('say what changed when somebody was faster, and offer the newest version', async () => {
    refusal = { statusCode: 409, data: { code: 'regimen.changed', message: 'Mara Linde saved version 3.', issues: [{ path: 'animal.weightG', message: 'Weight from 22 g to 23 g' }] } }
    const panel = await mount(LifeStepPanel, { step: 'approve', saved: opened() })
    await submit(panel)
    expect(panel.text()).toContain('Weight from 22 g to 23 g')
    await press(panel, 'Fetch the newest version')
    expect(panel.emitted('reload')).toHaveLength(1)
    expect(panel.emitted('done')).toBeUndefined()
  })
})

describe('the feed entry', () => {
  it('asks how much when part was taken, and knows the initials', async () => {
    const form = await mount(LifeFeedEntry, { id: 'abc' })
    await press(form, 'Part taken')
    await submit(form)
    expect(sent).toEqual([])
    expect(form.text()).toContain('Say how much was taken, in mL.')
    await form.findAll('input')[0]!.setValue('0,3')
    await submit(form)
    expect(sent).toEqual([{ path: '/api/regimens/abc/feed-log', body: { outcome: 'part', takenMl: 0.3, note: '', initials: 'ML' } }])
    expect(form.emitted('written')).toHaveLength(1)
  })
  it('of a helper sends no initials: the visit has them', async () => {
    const form = await mount(LifeFeedEntry, { id: 'abc', helper: true })
    await press(form, 'All taken')
    await submit(form)
    expect(sent[0]!.body).toEqual({ outcome: 'all', note: '' })
  })
  it('can be struck out, with a reason', async () => {
    const line = await mount(LifeFeedRow, { id: 'abc', entry: entry(), timeZone: ZONE, mayStrike: true })
    await press(line, 'Strike out')
    await line.get('input').setValue('Wrong animal.')
    await submit(line)
    expect(sent).toEqual([{ path: '/api/regimens/abc/feed-log/1/strike', body: { reason: 'Wrong animal.' } }])
  })
})

describe('weighing in', () => {
  it('sends grams and says what the weight means', async () => {
    const panel = await mount(LifeWeighIns, { id: 'abc', timeZone: ZONE, mayWeigh: true })
    await panel.get('input').setValue('heavy')
    await submit(panel)
    expect(panel.text()).toContain('Type a number')
    await panel.get('input').setValue('22.5')
    await submit(panel)
    expect(sent).toEqual([{ path: '/api/regimens/abc/weigh-ins', body: { weightG: 22.5 } }])
    expect(panel.get('[role="status"]').text()).toContain('The plan stands.')
  })
})

describe('handing over', () => {
  it('shows the link once', async () => {
    const form = await mount(LifeTransfer, { id: 'abc', animal: 'Pebble', timeZone: ZONE })
    await submit(form)
    expect(sent).toEqual([{ path: '/api/regimens/abc/transfers', body: { days: 7, note: '' } }])
    expect((form.get('input').element as HTMLInputElement).value).toBe('http://localhost/transfer#secret')
  })
})

describe('the answer of a sheet', () => {
  it('reads at once', async () => {
    const good = await mount(LifeSheetAnswer, { answer, sheet: fed })
    expect(good.get('strong').text()).toBe('Current')
    const old = await mount(LifeSheetAnswer, { answer: replaced, sheet: null })
    expect(old.get('strong').text()).toBe('Replaced')
    expect(old.text()).toContain('Do not feed from this sheet.')
  })
  it('of a current sheet that closes its gate is no go-ahead', async () => {
    const closed = await mount(LifeSheetAnswer, { answer, sheet: shut })
    expect(closed.get('strong').text()).toBe('DO NOT FEED')
    expect(closed.get('section').classes().join(' ')).toContain('stop')
  })
  it('says what the sheet says of today', async () => {
    const days = [{ ...sheet.stretches[0]!.days[0]!, date: new Intl.DateTimeFormat('en-CA').format(new Date()) }]
    const waits = await mount(LifeSheetAnswer, { answer, sheet: { ...fed, stretches: [{ ...sheet.stretches[0]!, band: { state: 'wait', word: 'WAIT', reason: 'Fluids only, no food yet', days: '' }, days }] } })
    expect(waits.get('strong').text()).toBe('WAIT')
    expect(waits.text()).toContain('Today it says: Fluids only, no food yet.')
  })
  it('lets only the amount of today meet the eye', async () => {
    const stretch = { ...sheet.stretches[0]!, amounts: [{ heading: 'Each feed: at 07:30', figure: '0.52', unit: 'mL', words: 'nought point five two millilitres', syringe: '1 mL syringe, draw up to 0.52 mL', strength: 'Half strength', feedName: 'slurry', demo: null, barrel: { capacityMl: 1, stepMl: 0.01, markMl: 0.52, markLabel: '0.52' } }] }
    const now = new Intl.DateTimeFormat('en-CA').format(new Date())
    const of = (date: string) => ({ ...stretch, band: { ...stretch.band, days: date }, days: [{ ...stretch.days[0]!, date }] })
    const shown = await mount(LifeSheet, { sheet: { ...fed, stretches: [of('2020-01-01'), of(now)] }, version: 2 })
    expect(shown.findAll('.text-amount-lg')).toHaveLength(1)
    expect(shown.text().match(/not today/g)).toHaveLength(1)
  })
  it('shows every amount with its words and times as printed', async () => {
    const shown = await mount(LifeSheet, { sheet, version: 2 })
    for (const amount of sheet.stretches.flatMap(one => one.amounts)) expect(shown.text()).toContain(amount.words)
    expect(shown.get('a[href^="tel:"]').attributes('href')).toBe('tel:0055500142')
  })
})

describe('the plans of the team', () => {
  it('say state, approval and a weight that is past', async () => {
    const list = await mount(LifePlans, {})
    await flushPromises()
    await new Promise(resolve => setTimeout(resolve, 20))
    expect(list.text()).toContain('Draft, waits for a check since Thu 3 Dec 14:10')
    expect(list.text()).toContain('Approved by Dr Amara Osei')
    expect(list.text()).toContain('past, weigh again')
  })
})

describe('a team\'s plan on paper', () => {
  it('has a packet for foster homes; a guest\'s has none', async () => {
    const labels = async (team: boolean) => (await mount(PrintChoices, { plan, saved: { id: 'abc', key: null, version: 2, team } })).findAll('a').map(one => one.text())
    expect(await labels(true)).toContain('Foster packet')
    expect(await labels(false)).not.toContain('Foster packet')
  })
})
