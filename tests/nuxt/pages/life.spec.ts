import { mountSuspended, registerEndpoint } from '@nuxt/test-utils/runtime'
import { flushPromises } from '@vue/test-utils'
import type { Component } from 'vue'
import { beforeEach, describe, expect, it } from 'vitest'
import ApprovePage from '~/pages/plans/[id]/approve.vue'
import DeskPage from '~/pages/desk.vue'
import HistoryPage from '~/pages/plans/[id]/history.vue'
import PlanPage from '~/pages/plans/[id]/index.vue'
import PlansPage from '~/pages/plans/index.vue'
import SheetPage from '~/pages/sheet/[id].vue'
import { TeamSettings } from '#shared/schemas/team'
import type { PlanRow, SheetAnswer, Standing, TeamPlanInfo } from '#shared/types/planLife'
import type { Role } from '#shared/utils/abilities'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { sheetModel } from '#server/utils/print/sheet'
import { currentEdition } from '#server/utils/reference'
import { regimenInput } from '../../unit/plan/inputs'
import { slipsOf } from '../structure'

const edition = currentEdition()
const plan = buildPlan(regimenInput(), edition)
const none: Standing = { state: 'none', band: 'NOT APPROVED BY A VET', line: 'No vet has approved this version.' }
const approval = { version: 1, weightG: 22, fromDate: '2026-12-02', goodUntil: '2026-12-09', edition: plan.edition, vetName: 'Dr Amara Osei', registration: 'DEMO-0142', note: '', at: '2026-12-02T18:40:00Z', lapsedAt: null, lapseReason: null }
const row: PlanRow = { id: 'abc', version: 3, animalName: 'Pebble', caseNumber: '', speciesName: 'Leopard gecko', enclosure: 'Warm room, tank 4', room: 'Warm room', weightG: 22, goodUntil: '2026-12-09', state: 'checked', waiting: 'approval', askedBy: 'Mara Linde', waitingSince: '2026-12-01T14:10:00Z', standing: none, updatedAt: '2026-12-01T14:10:00Z', updatedBy: 'Mara Linde' }
const page = <Item>(items: Item[]) => ({ items, total: items.length, page: 1, pageSize: 25 })

let info: Partial<TeamPlanInfo> = {}
let compared: unknown = null
let desk: PlanRow[] = []
let answer: Partial<SheetAnswer> = {}
registerEndpoint('/api/regimens/abc', () => ({ id: 'abc', version: 3, latestVersion: 3, createdAt: '2026-12-02T10:00:00Z', linkExpiresAt: '', edition: plan.edition, input: regimenInput(), plan, team: { state: 'checked', waiting: 'approval', waitingSince: '2026-12-03T14:10:00Z', askedBy: 'Mara Linde', draftedBy: 'Mara Linde', checkedBy: 'Ines Kask', checkedAt: '2026-12-03T13:10:00Z', sentBack: null, approval, standing: none, lastWeighIn: null, steps: [], notYet: {}, mayEdit: true, mayWeigh: true, mayTransfer: false, mayLink: true, ...info } }))
registerEndpoint('/api/regimens/abc/compare', (event) => {
  compared = Object.fromEntries(new URL(event.path, 'http://localhost').searchParams)
  return { from: 1, to: 3, lines: [{ part: 'Days', text: 'Each feed on Thu 3 Dec from 0.35 mL to 0.4 mL', weight: 'amount' }] }
})
registerEndpoint('/api/regimens/abc/versions', () => page([3, 2, 1].map(version => ({ version, createdAt: '2026-12-03T14:10:00Z', author: 'Mara Linde', edition: plan.edition, weightG: 22, note: '', approval: version === 1 ? approval : null }))))
registerEndpoint('/api/regimens/abc/weigh-ins', () => page([]))
registerEndpoint('/api/regimens/abc/feed-log', () => page([]))
registerEndpoint('/api/regimens', event => event.path.includes('of=browser') ? { items: [{ id: 'old', version: 1, animalName: 'Juniper', speciesName: 'Bearded dragon', createdAt: '2026-12-02T10:00:00Z', linkExpiresAt: '2027-01-01T10:00:00Z' }] } : page([row]))
registerEndpoint('/api/team/rooms', () => ({ items: [] }))
registerEndpoint('/api/team/desk', () => ({ approvals: page(desk), checks: page([]) }))
registerEndpoint('/api/sheets/abc', () => ({ answer: { code: 'current', title: 'This sheet is current', message: 'Approved by Dr Amara Osei.', good: true, version: 3, latestVersion: 3, ...answer }, sheet: sheetModel(plan, { paper: 'a4', appVersion: '1', madeAt: '2026-12-02T18:40:00Z', reference: null }), planId: null }))

function as(role: Role | null) {
  const session = useSessionStore()
  session.take(role === null ? { user: null } : { user: { id: 'u', name: 'Dr Amara Osei', email: 'amara@rescue.example', registration: 'DEMO-0142', hasCodes: false, demo: true }, team: { id: 't', name: 'Saltings Rescue', role, settings: TeamSettings.parse({}), demo: true, codesDue: false }, teams: [] })
}
let visits = 0
/** Each visit is a navigation of its own: a page fetches once for each. */
async function open(component: Component, route: string) {
  const mounted = await mountSuspended(component, { route: `${route}${route.includes('?') ? '&' : '?'}visit=${++visits}` })
  for (let turn = 0; turn < 6; turn++) {
    await flushPromises()
    await new Promise(resolve => setTimeout(resolve, 10))
  }
  const root = document.createElement('div')
  root.innerHTML = mounted.html()
  expect(slipsOf(root)).toEqual([])
  return mounted
}
beforeEach(() => {
  info = {}
  compared = null
  desk = []
  answer = {}
  as('vet')
})

describe('the desk', () => {
  it('says when nothing waits', async () => expect((await open(DeskPage, '/desk')).text()).toContain('Nothing waits for you.'))
  it('leads to where it is decided', async () => {
    desk = [row]
    const shown = await open(DeskPage, '/desk')
    expect(shown.text()).toContain('since Tue 1 Dec 14:10')
    expect(shown.findAll('a').map(one => one.attributes('href'))).toContain('/plans/abc/approve')
  })
})

describe('the page to approve', () => {
  it('shows a vet what changed since the last approval, and both buttons', async () => {
    info = { steps: ['approve', 'send-back'] }
    const shown = await open(ApprovePage, '/plans/abc/approve')
    expect(compared).toEqual({ from: '1', to: '3' })
    expect(shown.text()).toContain('Each feed on Thu 3 Dec from 0.35 mL to 0.4 mL')
    expect(shown.findAll('button').map(one => one.text())).toEqual(expect.arrayContaining(['Approve', 'Send back']))
  })
  it('refuses anyone else politely', async () => {
    as('keeper')
    const shown = await open(ApprovePage, '/plans/abc/approve')
    expect(shown.text()).toContain('Only a vet of the team approves plans.')
    expect(shown.findAll('button').map(one => one.text())).not.toContain('Approve')
  })
  it('says why not yet', async () => {
    info = { notYet: { approve: 'Put your registration on your profile first.' } }
    expect((await open(ApprovePage, '/plans/abc/approve')).text()).toContain('Put your registration on your profile first.')
  })
})

describe('the versions', () => {
  it('are compared from the last approval on, until two are picked', async () => {
    const shown = await open(HistoryPage, '/plans/abc/history')
    expect(shown.text()).toContain('What changed since the last approval')
    expect(compared).toEqual({ from: '1', to: '3' })
    await open(HistoryPage, '/plans/abc/history?from=2&to=3')
    expect(compared).toEqual({ from: '2', to: '3' })
  })
})

describe('a plan and the list', () => {
  it('of a team open with the answer first', async () => {
    const shown = await open(PlanPage, '/plans/abc')
    expect(shown.get('[role="status"]').text()).toContain('Not approved by a vet.')
    expect(shown.text()).toContain('Feed log')
  })
  it('offer to take in what this browser knows, to those who may plan', async () => {
    expect((await open(PlansPage, '/plans')).text()).toContain('Take into the team')
    as('carer')
    expect((await open(PlansPage, '/plans')).text()).not.toContain('Take into the team')
    as(null)
    expect((await open(PlansPage, '/plans')).text()).toContain('My plans')
  })
})

describe('the page behind the code of a sheet', () => {
  it('answers, then shows what the sheet says', async () => {
    as(null)
    const shown = await open(SheetPage, '/sheet/abc?version=3&code=c0de')
    expect(shown.get('section').text()).toContain('This sheet is current')
    expect(shown.text()).toContain('Pebble')
    expect(shown.text()).not.toContain('Feed log')
  })
  it('folds away what must not be fed from', async () => {
    answer = { code: 'replaced', good: false, title: 'Replaced by version 4 on Thu 3 Dec', latestVersion: 4 }
    const shown = await open(SheetPage, '/sheet/abc?version=3&code=other')
    expect(shown.get('section strong').text()).toBe('Replaced')
    expect(shown.get('details').text()).toContain('NOT TO FEED FROM')
  })
  it('lets a helper log and go back', async () => {
    as(null)
    const shown = await open(SheetPage, '/sheet/abc?version=3&help=1')
    expect(shown.text()).toContain('Feed log')
    expect(shown.text()).toContain('Back to the round')
    expect(shown.text()).not.toContain('Your initials')
  })
})
