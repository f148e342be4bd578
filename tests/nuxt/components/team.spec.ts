import { mockNuxtImport, mountSuspended, registerEndpoint } from '@nuxt/test-utils/runtime'
import { flushPromises, type VueWrapper } from '@vue/test-utils'
import { createError, getQuery, readBody } from 'h3'
import type { Component } from 'vue'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { TeamSettings } from '#shared/schemas/team'
import type { HelperLinkRow, InvitationRow, MailRow, Me, MemberRow, RecordRow, TransferRow } from '#shared/types/team'
import type { Role } from '#shared/utils/abilities'
import TeamCheck from '~/components/team/TeamCheck.vue'
import TeamConfirm from '~/components/team/TeamConfirm.vue'
import TeamFrame from '~/components/team/TeamFrame.vue'
import TeamInvitations from '~/components/team/TeamInvitations.vue'
import TeamInviteForm from '~/components/team/TeamInviteForm.vue'
import TeamLinkAnimal from '~/components/team/TeamLinkAnimal.vue'
import TeamLinkCard from '~/components/team/TeamLinkCard.vue'
import TeamLinkForm from '~/components/team/TeamLinkForm.vue'
import TeamLinks from '~/components/team/TeamLinks.vue'
import TeamMailBody from '~/components/team/TeamMailBody.vue'
import TeamMails from '~/components/team/TeamMails.vue'
import TeamMemberRole from '~/components/team/TeamMemberRole.vue'
import TeamMembers from '~/components/team/TeamMembers.vue'
import TeamNav from '~/components/team/TeamNav.vue'
import TeamProblem from '~/components/team/TeamProblem.vue'
import TeamRecord from '~/components/team/TeamRecord.vue'
import TeamRecordChange from '~/components/team/TeamRecordChange.vue'
import TeamSaveBar from '~/components/team/TeamSaveBar.vue'
import TeamSearch from '~/components/team/TeamSearch.vue'
import TeamSettingsContacts from '~/components/team/TeamSettingsContacts.vue'
import TeamSettingsForm from '~/components/team/TeamSettingsForm.vue'
import TeamSettingsHouse from '~/components/team/TeamSettingsHouse.vue'
import TeamSettingsRules from '~/components/team/TeamSettingsRules.vue'
import TeamSettingsShown from '~/components/team/TeamSettingsShown.vue'
import TeamSettingsTools from '~/components/team/TeamSettingsTools.vue'
import TeamState from '~/components/team/TeamState.vue'
import TeamTransfers from '~/components/team/TeamTransfers.vue'
import { useSessionStore } from '~/stores/session'
import { useTeamStore } from '~/stores/team'
import { fieldInWords, recordLines, valueInWords } from '~/utils/recordWords'
import { changeOfDraft, draftOfTeam, moveRow } from '~/utils/teamDraft'
import { INVITATION_WORDS, stampInZone, wholeAddress } from '~/utils/teamWords'
import { slipsOf } from '../structure'

// No page stands around the components here: what they ask of the router is kept.
const { guards, gone } = vi.hoisted(() => ({ guards: [] as ((to: { fullPath: string }) => boolean)[], gone: [] as unknown[] }))
mockNuxtImport('onBeforeRouteLeave', () => (guard: (to: { fullPath: string }) => boolean) => { guards.push(guard) })
mockNuxtImport('navigateTo', () => (to: unknown) => { gone.push(to) })

const ZONE = 'Europe/London'
const at = '2026-12-03T14:10:00Z'
const settings = TeamSettings.parse({
  timeZone: ZONE, contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '01632 960001' }],
  ladder: [{ role: 'Vet on call', name: 'Dr Amara Osei', phone: '01632 960002' }, { role: 'Coordinator', name: 'Mara Linde', phone: '01632 960003' }],
  syringes: [{ capacityMl: 1, stepMl: 0.01 }], scales: [{ name: 'Kitchen', stepG: 1, mostG: 5000 }], tubes: [{ name: 'Red', deadVolumeMl: 0.3 }],
})
const meAs = (role: Role): Me => ({
  user: { id: 'u1', name: 'Mara Linde', email: 'mara@saltings.example', registration: '', hasCodes: false, demo: false },
  team: { id: 't1', name: 'Saltings Rescue', role, settings, demo: true, codesDue: false }, teams: [{ id: 't1', name: 'Saltings Rescue', role }],
})
const members: MemberRow[] = [
  { id: 'm1', name: 'Mara Linde', email: 'mara@saltings.example', role: 'coordinator', registration: '', hasCodes: true, joinedAt: at, lastSeenAt: at, you: true },
  { id: 'm2', name: 'Dr Amara Osei', email: 'amara@saltings.example', role: 'vet', registration: 'V-1042', hasCodes: false, joinedAt: at, lastSeenAt: null, you: false },
]
const invitations: InvitationRow[] = [{ id: 'i1', email: 'new@saltings.example', role: 'carer', state: 'open', invitedBy: 'Mara Linde', createdAt: at, expiresAt: at }, { id: 'i2', email: 'old@saltings.example', role: 'vet', state: 'expired', invitedBy: 'Mara Linde', createdAt: at, expiresAt: at }]
const links: HelperLinkRow[] = [{ id: 'l1', scope: 'room', what: 'Warm room', purpose: 'night shift', state: 'open', createdBy: 'Mara Linde', createdAt: at, expiresAt: at, opened: 2, lastOpenedAt: at, lastInitials: 'JT' }, { id: 'l2', scope: 'animal', what: 'Juniper', purpose: 'ride', state: 'revoked', createdBy: 'Mara Linde', createdAt: at, expiresAt: at, opened: 0, lastOpenedAt: null, lastInitials: null }]
const mails: MailRow[] = [{ id: 1, to: 'new@saltings.example', kind: 'invitation', subject: 'Join Saltings Rescue', state: 'kept', attempts: 0, createdAt: at, sentAt: null, nextAttemptAt: null, problem: null, text: 'Come: http://localhost/invitation#abc', html: '<p>Come</p>' }, { id: 2, to: 'x@saltings.example', kind: 'reset', subject: 'New password', state: 'failed', attempts: 5, createdAt: at, sentAt: null, nextAttemptAt: null, problem: 'The mail server refused it.' }]
const recordRow: RecordRow = { id: 7, at, actor: 'Mara Linde', action: 'regimen.change', what: 'Plan changed', objectType: 'regimen', objectId: 'abc', objectName: 'Juniper', version: 2, reason: 'weighed again', before: { 'animal.weightG': 182 }, after: { 'animal.weightG': 196, 'animal.enclosure': 'Tank 4' }, hash: '0123456789abcdef' }
const transfers: TransferRow[] = [{ id: 'x1', regimenId: 'abc', animal: 'Pebble', state: 'open', createdBy: 'Mara Linde', createdAt: at, expiresAt: at, decidedAt: null, decidedBy: null, otherTeam: null }, { id: 'x2', regimenId: 'def', animal: 'Juniper', state: 'accepted', createdBy: 'Mara Linde', createdAt: at, expiresAt: at, decidedAt: at, decidedBy: 'Rikke', otherTeam: 'Dunes Rescue' }]

const pageOf = <Row>(items: Row[]) => ({ items, total: items.length, page: 1, pageSize: 25 })
const asked: { method: string, path: string, body?: unknown, query?: unknown }[] = []
let lastOne = false
registerEndpoint('/api/team/members', event => { asked.push({ method: 'GET', path: 'members', query: getQuery(event) }); return pageOf(members) })
registerEndpoint('/api/team/members/m2', { method: 'PATCH', handler: async (event) => { asked.push({ method: 'PATCH', path: 'm2', body: await readBody(event) }); return {} } })
registerEndpoint('/api/team/members/m1', { method: 'DELETE', handler: () => { if (lastOne) throw createError({ statusCode: 422, data: { code: 'team.lastCoordinator', message: 'You are the last coordinator. Make someone else one first.' } }); return null } })
registerEndpoint('/api/team/members/m2', { method: 'DELETE', handler: () => { asked.push({ method: 'DELETE', path: 'm2' }); return null } })
registerEndpoint('/api/team/invitations', { method: 'GET', handler: () => pageOf(invitations) })
registerEndpoint('/api/team/invitations', { method: 'POST', handler: async (event) => { asked.push({ method: 'POST', path: 'invitations', body: await readBody(event) }); return { id: 'i3', mail: 'kept', link: '/invitation#abc' } } })
registerEndpoint('/api/team/invitations/i1/resend', { method: 'POST', handler: () => ({}) })
registerEndpoint('/api/team/links', { method: 'GET', handler: () => pageOf(links) })
registerEndpoint('/api/team/links', { method: 'POST', handler: async (event) => { asked.push({ method: 'POST', path: 'links', body: await readBody(event) }); return { id: 'l3', link: '/help#secret', expiresAt: at } } })
registerEndpoint('/api/team/rooms', () => ({ items: ['Warm room'] }))
registerEndpoint('/api/regimens', () => pageOf([{ id: 'abc', animalName: 'Juniper', speciesName: 'Inland bearded dragon', caseNumber: '26-041', room: 'Warm room', enclosure: 'Tank 4', state: 'in-use' }]))
registerEndpoint('/api/team/mails', () => pageOf(mails))
registerEndpoint('/api/team/record', () => pageOf([recordRow]))
registerEndpoint('/api/team/transfers', () => pageOf(transfers))
registerEndpoint('/api/team', { method: 'PATCH', handler: async (event) => {
  const body = await readBody<{ name: string, settings: TeamSettings }>(event)
  asked.push({ method: 'PATCH', path: 'team', body })
  if (body.name === 'Taken') throw createError({ statusCode: 422, data: { code: 'input.invalid', message: 'Look again.', issues: [{ path: 'name', message: 'Another name, please.' }] } })
  return { ...meAs('coordinator').team, ...body }
} })

beforeEach(() => {
  asked.length = 0
  gone.length = 0
  lastOne = false
  useSessionStore().take(meAs('coordinator'))
  useTeamStore().begin()
})
async function mounted(component: Component, props: Record<string, unknown> = {}, slots: Record<string, unknown> = {}): Promise<VueWrapper> {
  const wrapper = await mountSuspended(component, { props, slots: slots as never, attachTo: document.body })
  await settled()
  return wrapper
}
async function settled() {
  for (let turn = 0; turn < 4; turn += 1) {
    await flushPromises()
    await new Promise(resolve => setTimeout(resolve, 15))
  }
}
/** Spaces that hold a number to its unit, as spaces. */
const textOf = (wrapper: VueWrapper) => wrapper.text().replaceAll('\u00A0', ' ')
const button = (wrapper: VueWrapper, words: string) => wrapper.findAll('button').find(one => one.text() === words)!

const draft = draftOfTeam({ name: 'Saltings Rescue', settings })
const offline = { code: 'network.offline', message: '', offline: true }
const CASES: [string, Component, Record<string, unknown>?][] = [
  ['TeamCheck', TeamCheck, { label: 'Codes', hint: 'On: yes.', error: 'Say yes or no.', modelValue: true }],
  ['TeamConfirm', TeamConfirm, { label: 'Remove', yes: 'Yes, remove Mara' }],
  ['TeamFrame', TeamFrame, { title: 'People', about: 'Who is here.', needs: 'team.see' }],
  ['TeamInvitations', TeamInvitations], ['TeamInviteForm', TeamInviteForm],
  ['TeamLinkAnimal', TeamLinkAnimal, { modelValue: null, error: 'Choose one.' }],
  ['TeamLinkCard', TeamLinkCard, { link: 'http://localhost/help#secret', what: 'Juniper', purpose: 'night shift', expiresAt: at, timeZone: ZONE, teamName: 'Saltings Rescue' }],
  ['TeamLinkForm', TeamLinkForm], ['TeamLinks', TeamLinks],
  ['TeamMailBody', TeamMailBody, { mail: mails[0] }], ['TeamMails', TeamMails],
  ['TeamMemberRole', TeamMemberRole, { member: members[1] }], ['TeamMembers', TeamMembers], ['TeamNav', TeamNav],
  ['TeamProblem', TeamProblem, { problem: { ...offline, issues: [{ path: 'a', message: 'No.' }] }, again: 'Again' }],
  ['TeamRecord', TeamRecord], ['TeamRecordChange', TeamRecordChange, { row: recordRow, timeZone: ZONE }],
  ['TeamSaveBar', TeamSaveBar, { leaving: true }], ['TeamSearch', TeamSearch, { label: 'Search', asked: '' }],
  ['TeamSettingsContacts', TeamSettingsContacts, { modelValue: draft.ladder, path: 'ladder', title: 'Out of hours', about: 'In order.', most: 10, roleHint: 'vet' }],
  ['TeamSettingsForm', TeamSettingsForm], ['TeamSettingsHouse', TeamSettingsHouse, { modelValue: draft }], ['TeamSettingsRules', TeamSettingsRules, { modelValue: draft }],
  ['TeamSettingsShown', TeamSettingsShown, { name: 'Saltings Rescue', settings }], ['TeamSettingsTools', TeamSettingsTools, { modelValue: draft }],
  ['TeamState', TeamState, { state: INVITATION_WORDS.open }], ['TeamTransfers', TeamTransfers],
]

describe('every component of the team', () => {
  it.each(CASES)('%s can be used without sight or mouse', async (_, component, props) => {
    const wrapper = await mounted(component, props)
    const root = document.createElement('div')
    root.innerHTML = wrapper.html()
    expect(root.textContent!.trim().length).toBeGreaterThan(0)
    expect(slipsOf(root)).toEqual([])
    wrapper.unmount()
  })
})

describe('the pages of a team', () => {
  it.each([['coordinator', 6], ['technician', 4], ['carer', 2]] as const)('shown to a %s are %i', async (role, count) => {
    useSessionStore().take(meAs(role))
    expect((await mounted(TeamNav)).findAll('a')).toHaveLength(count)
  })
  it('say so to someone whose role does not open them, and to someone in no team', async () => {
    useSessionStore().take(meAs('carer'))
    const frame = await mounted(TeamFrame, { title: 'Mail', about: 'x', needs: 'mail.see' }, { default: () => 'the mails' })
    expect(frame.text()).toContain('Your role in this team does not open this page')
    expect(frame.text()).not.toContain('the mails')
    useSessionStore().take({ ...meAs('carer'), team: null })
    expect((await mounted(TeamFrame, { title: 'Mail', about: 'x', needs: 'mail.see' })).text()).toContain('You are in no team')
  })
})

describe('a button for what cannot be undone', () => {
  it('asks in place, takes the focus along and gives it back', async () => {
    const confirm = await mounted(TeamConfirm, { label: 'Remove', about: 'Mara', yes: 'Yes, remove Mara', asks: 'She no longer sees the plans.' })
    await confirm.get('button').trigger('click')
    expect(confirm.text()).toContain('She no longer sees the plans.')
    await settled()
    expect(document.activeElement?.textContent).toBe('Yes, remove Mara')
    await confirm.get('[role="group"]').trigger('keydown', { key: 'Escape' })
    await settled()
    expect(document.activeElement?.textContent).toBe('Remove')
    expect(confirm.emitted('yes')).toBeUndefined()
    await confirm.get('button').trigger('click')
    await button(confirm, 'Yes, remove Mara').trigger('click')
    expect(confirm.emitted('yes')).toHaveLength(1)
  })
})

describe('the people', () => {
  it('are without buttons for someone who may not change them, but oneself can leave', async () => {
    useSessionStore().take(meAs('keeper'))
    const people = await mounted(TeamMembers)
    expect(people.findAll('tbody select')).toHaveLength(0)
    expect(people.findAll('tbody button').map(one => one.text())).toEqual(['Leave this team'])
    expect(people.text()).toContain('you')
  })
  it('change role in place only after a second press', async () => {
    const people = await mounted(TeamMembers)
    await people.get('select[aria-label="Role of Dr Amara Osei"]').setValue('technician')
    expect(asked.some(one => one.method === 'PATCH')).toBe(false)
    await button(people, 'Yes, make Dr Amara Osei technician').trigger('click')
    await settled()
    expect(asked.find(one => one.method === 'PATCH')?.body).toEqual({ role: 'technician' })
    expect(people.text()).toContain('The role of Dr Amara Osei is changed.')
  })
  it('show the sentence of the server when the last coordinator would go', async () => {
    lastOne = true
    const people = await mounted(TeamMembers)
    await button(people, 'Leave this team').trigger('click')
    await button(people, 'Yes, leave the team').trigger('click')
    await settled()
    expect(people.get('tbody [role="alert"]').text()).toContain('You are the last coordinator. Make someone else one first.')
  })
  it('are removed once it was confirmed', async () => {
    const people = await mounted(TeamMembers)
    await people.get('button[aria-label="Remove: Dr Amara Osei"]').trigger('click')
    await button(people, 'Yes, remove Dr Amara Osei').trigger('click')
    await settled()
    expect(asked.some(one => one.method === 'DELETE' && one.path === 'm2')).toBe(true)
  })
})

describe('an invitation', () => {
  it('needs an address, and is sent with role and days', async () => {
    const form = await mounted(TeamInviteForm)
    await form.get('form').trigger('submit')
    await settled()
    expect(form.get('input[type="email"]').attributes('aria-invalid')).toBe('true')
    await form.get('input[type="email"]').setValue('Rikke@saltings.example')
    await form.get('input[value="keeper"]').setValue()
    await form.get('select').setValue('14')
    await form.get('form').trigger('submit')
    await settled()
    expect(asked.find(one => one.path === 'invitations')?.body).toEqual({ email: 'rikke@saltings.example', role: 'keeper', days: 14 })
    expect(form.get('a').attributes('href')).toBe(wholeAddress('/invitation#abc', location.origin))
    expect(form.emitted('invited')).toHaveLength(1)
  })
  it('can be sent again while it is open or has run out, and withdrawn while it is open', async () => {
    const list = await mounted(TeamInvitations)
    expect(list.findAll('li button').map(one => one.attributes('aria-label'))).toEqual(['Send again to new@saltings.example', 'Withdraw: new@saltings.example', 'Send again to old@saltings.example'])
    await list.get('li button').trigger('click')
    await settled()
    expect(list.text()).toContain('A new mail goes to new@saltings.example.')
  })
})

describe('a link for a helper', () => {
  it('is for one animal or one room, and says which is missing', async () => {
    const form = await mounted(TeamLinkForm)
    await form.get('form').trigger('submit')
    await settled()
    expect(form.text()).toContain('Choose the animal this link is for.')
    expect(asked.some(one => one.path === 'links')).toBe(false)
    await form.get('input[value="abc"]').setValue()
    await form.get('input[maxlength="80"]').setValue('night shift')
    await form.findAll('select').at(-1)!.setValue('72')
    await form.get('form').trigger('submit')
    await settled()
    expect(asked.find(one => one.path === 'links')?.body).toEqual({ regimenId: 'abc', purpose: 'night shift', hours: 72 })
    expect(form.emitted('made')).toEqual([[{ link: wholeAddress('/help#secret', location.origin), what: 'Juniper', purpose: 'night shift', expiresAt: at }]])
  })
  it('for a room asks the server for rooms', async () => {
    const form = await mounted(TeamLinkForm)
    await form.get('input[value="room"]').setValue()
    await form.findAll('select')[0]!.setValue('Warm room')
    await form.get('input[maxlength="80"]').setValue('night shift')
    await form.get('form').trigger('submit')
    await settled()
    expect(asked.find(one => one.path === 'links')?.body).toEqual({ room: 'Warm room', purpose: 'night shift', hours: 12 })
  })
  it('is shown with a square code that is made here', async () => {
    const card = await mounted(TeamLinkCard, CASES.find(([name]) => name === 'TeamLinkCard')![2])
    expect(card.get('img').attributes('src')).toMatch(/^data:image\/svg\+xml,/)
    expect(card.text()).toContain('http://localhost/help#secret')
    expect(card.text()).toContain('Shown only now.')
  })
  it('that is ended has no button', async () => {
    const list = await mounted(TeamLinks)
    expect(list.findAll('tbody button')).toHaveLength(1)
    expect(list.text()).toContain('2 times')
    expect(list.text()).toContain('by JT')
  })
})

describe('the mails', () => {
  it('of the demonstration open in a frame without any right, their links beside it', async () => {
    const list = await mounted(TeamMails)
    await button(list, 'Read').trigger('click')
    const frame = list.get('iframe')
    expect(frame.attributes('sandbox')).toBe('')
    expect(frame.attributes('srcdoc')).toBe('<p>Come</p>')
    expect(list.get('a[target="_blank"]').attributes('href')).toBe('http://localhost/invitation#abc')
    expect(list.findAll('tbody button').filter(one => one.text() === 'Try again')).toHaveLength(1)
  })
})

describe('the record', () => {
  it('opens a row to what changed, in words', async () => {
    const list = await mounted(TeamRecord)
    await button(list, 'Show').trigger('click')
    expect(textOf(list)).toContain('Weight182 g196 g')
    expect(textOf(list)).toContain('EnclosurenothingTank 4')
    expect(list.text()).toContain('0123456789ab')
    expect(list.text()).not.toContain('0123456789abc')
    expect(list.get('a[download]').attributes('href')).toContain('/api/team/record.csv?sort=-at')
    expect(list.get('tbody a').attributes('href')).toBe('/plans/abc?version=2')
  })
  it('words fields and values', () => {
    expect(fieldInWords('animal.weightG')).toBe('Weight')
    expect(fieldInWords('feedingHours.from')).toBe('Feeding hours: from')
    expect(fieldInWords('settings.syringes.0.capacityMl')).toBe('Syringe 1: holds')
    expect(fieldInWords('animal.speciesId')).toBe('Species')
    expect(fieldInWords('settings.escalation.approvalWaitsHours')).toBe('An approval may wait')
    expect(valueInWords('animal.weightG', 1250, ZONE)).toBe('1.25\u00A0kg')
    expect(valueInWords('flushMl', 0.35, ZONE)).toBe('0.35\u00A0mL')
    expect(valueInWords('startAt', at, ZONE)).toBe('Thu 3 Dec 2026 14:10')
    expect(valueInWords('animal.weighedOn', '2026-12-03', ZONE)).toBe('Thu 3 Dec 2026')
    expect(valueInWords('state', 'in-use', ZONE)).toBe('In use')
    expect(valueInWords('animal.name', 'finished', ZONE)).toBe('finished')
    expect(valueInWords('animal.signs', ['convulsing'], ZONE)).toBe('Fits, twitches or trembles')
    expect(valueInWords('overrides.fractions', [0.15, 1], ZONE)).toBe('15\u00A0%, 100\u00A0%')
    expect(valueInWords('settings.sheetCodes', false, ZONE)).toBe('no')
  })
  it('leaves out what did not change and what nobody can read', () => {
    const before = { teamId: null, state: 'draft', waiting: null, animal: { name: 'Juniper' } }
    expect(recordLines({ before, after: { ...before, teamId: 't1', state: 'checked' } }, ZONE)).toEqual([{ field: 'State', before: 'Draft', after: 'Checked' }])
    expect(recordLines({ before: null, after: null }, ZONE)).toEqual([])
    expect(stampInZone('2026-07-01T11:00:00Z', ZONE)).toBe('Wed 1 Jul 2026 12:00 noon')
  })
})

describe('an animal handed over', () => {
  it('can be kept while nobody has answered', async () => {
    const list = await mounted(TeamTransfers)
    expect(list.findAll('tbody button').map(one => one.text())).toEqual(['Withdraw'])
    expect(list.text()).toContain('Dunes Rescue')
  })
})

describe('the settings', () => {
  it('go to the server as they came, unchanged', () => {
    expect(changeOfDraft(draft)).toEqual({ change: { name: 'Saltings Rescue', settings }, issues: [] })
  })
  it('name numbers that cannot be read, at the path of the API', () => {
    const changed = { ...draft, waitsHours: '', scales: [{ key: 1, name: 'Kitchen', step: '1,250', most: 'many' }] }
    expect(changeOfDraft(changed).issues.map(one => one.path)).toEqual(['settings.scales.0.stepG', 'settings.scales.0.mostG', 'settings.escalation.approvalWaitsHours'])
  })
  it('move a person of the ladder up and down, and stop at the ends', () => {
    const rows = ['a', 'b', 'c']
    moveRow(rows, 0, -1)
    moveRow(rows, 0, 1)
    moveRow(rows, 2, 1)
    expect(rows).toEqual(['b', 'a', 'c'])
  })
  it('are saved once, and say so', async () => {
    const form = await mounted(TeamSettingsForm)
    expect(form.text()).toContain('Nothing is changed.')
    await form.get('input').setValue('Saltings House')
    expect(form.text()).toContain('Changes are not saved yet.')
    await button(form, 'Save the settings').trigger('click')
    await settled()
    expect(form.text()).toContain('Saved.')
    expect(useSessionStore().team?.name).toBe('Saltings House')
    expect(asked.filter(one => one.method === 'PATCH')).toHaveLength(1)
  })
  it('with a slip are not sent, and the field has the focus', async () => {
    const form = await mounted(TeamSettingsForm)
    await button(form, 'Add a scale').trigger('click')
    await settled()
    expect((document.activeElement as HTMLInputElement).placeholder).toBe('for example kitchen')
    await button(form, 'Save the settings').trigger('click')
    await settled()
    expect(form.text()).toContain('Not saved. 3 fields need another look.')
    expect(document.activeElement?.getAttribute('aria-invalid')).toBe('true')
    expect(asked.filter(one => one.method === 'PATCH')).toHaveLength(0)
  })
  it('show the issue of the server at its field, and keep what was typed', async () => {
    const form = await mounted(TeamSettingsForm)
    await form.get('input').setValue('Taken')
    await button(form, 'Save the settings').trigger('click')
    await settled()
    expect(form.text()).toContain('Another name, please.')
    expect((form.get('input').element as HTMLInputElement).value).toBe('Taken')
  })
  it('keep the focus on the way down the ladder', async () => {
    const team = useTeamStore()
    const form = await mounted(TeamSettingsForm)
    const down = form.get('button[aria-label="Move Dr Amara Osei down"]')
    ;(down.element as HTMLButtonElement).focus()
    await down.trigger('click')
    await settled()
    expect(team.draft!.ladder.map(one => one.name)).toEqual(['Mara Linde', 'Dr Amara Osei'])
    expect(document.activeElement?.getAttribute('aria-label')).toBe('Move Dr Amara Osei up')
  })
  it('hold someone back who leaves with changes, until they have decided', async () => {
    const form = await mounted(TeamSettingsForm)
    const leaving = () => guards.at(-1)!({ fullPath: '/plans?page=2' })
    expect(leaving()).toBe(true)
    await form.get('input').setValue('Saltings House')
    expect(leaving()).toBe(false)
    await settled()
    await button(form, 'Stay here').trigger('click')
    expect(form.text()).toContain('Changes are not saved yet.')
    expect(gone).toEqual([])
    leaving()
    await settled()
    await button(form, 'Leave without saving').trigger('click')
    expect(gone).toEqual(['/plans?page=2'])
    expect(leaving()).toBe(true)
    expect(asked.filter(one => one.method === 'PATCH')).toHaveLength(0)
  })
  it('can be saved on the way out', async () => {
    const form = await mounted(TeamSettingsForm)
    await form.get('input').setValue('Saltings House')
    guards.at(-1)!({ fullPath: '/plans' })
    await settled()
    await button(form, 'Save, then leave').trigger('click')
    await settled()
    expect(useSessionStore().team?.name).toBe('Saltings House')
    expect(gone).toEqual(['/plans'])
  })
  it('ask before leaving with changes', async () => {
    const bar = await mounted(TeamSaveBar, { leaving: false })
    await bar.setProps({ leaving: true })
    await settled()
    expect(document.activeElement?.textContent).toBe('Save, then leave')
    for (const words of ['Save, then leave', 'Leave without saving', 'Stay here']) await button(bar, words).trigger('click')
    expect(Object.keys(bar.emitted())).toEqual(expect.arrayContaining(['saveAndLeave', 'leave', 'stay']))
  })
  it('are words for those who may not change them', async () => {
    const shown = await mounted(TeamSettingsShown, { name: 'Saltings Rescue', settings })
    expect(shown.findAll('input, select, button')).toHaveLength(0)
    expect(shown.text()).toContain('1. Vet on call, Dr Amara Osei, 01632 960002 (printed on the sheet)')
    expect(textOf(shown)).toContain('1 mL, a mark every 0.01 mL')
  })
})
