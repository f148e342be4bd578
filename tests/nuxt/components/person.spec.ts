import { mountSuspended, registerEndpoint } from '@nuxt/test-utils/runtime'
import { flushPromises } from '@vue/test-utils'
import { readBody } from 'h3'
import type { Component } from 'vue'
import { beforeEach, describe, expect, it } from 'vitest'
import AccountCard from '~/components/account/AccountCard.vue'
import AccountMenu from '~/components/account/AccountMenu.vue'
import HelpDoor from '~/components/help/HelpDoor.vue'
import HelpRound from '~/components/help/HelpRound.vue'
import PersonCodes from '~/components/person/PersonCodes.vue'
import PersonEmail from '~/components/person/PersonEmail.vue'
import PersonName from '~/components/person/PersonName.vue'
import PersonPassword from '~/components/person/PersonPassword.vue'
import PersonSessions from '~/components/person/PersonSessions.vue'
import PersonTeams from '~/components/person/PersonTeams.vue'
import { TeamSettings } from '#shared/schemas/team'
import type { HelperRound, Me } from '#shared/types/team'
import { slipsOf } from '../structure'

const me = (): Me => ({
  user: { id: 'mara', name: 'Mara Linde', email: 'mara@saltings.example', registration: '', hasCodes: false, demo: false },
  team: { id: 'saltings', name: 'Saltings Rescue', role: 'keeper', settings: TeamSettings.parse({}), demo: false, codesDue: false },
  teams: [{ id: 'saltings', name: 'Saltings Rescue', role: 'keeper' }, { id: 'harbour', name: 'Harbour Refuge', role: 'carer' }],
})
const round: HelperRound = { teamName: 'Saltings Rescue', purpose: 'Night shift', initials: 'JT', expiresAt: '2026-12-04T06:00:00Z', animals: [{ id: 'abc', version: 2, name: 'Pebble', speciesName: 'Leopard gecko', caseNumber: '26-044', enclosure: 'Night room, tub 2' }] }
const asked: string[] = []
const answers = (path: string, method: 'GET' | 'POST' | 'PATCH' | 'DELETE', answer: unknown) => registerEndpoint(path, { method, handler: async (event) => {
  asked.push(`${method} ${path} ${method === 'POST' || method === 'PATCH' ? JSON.stringify(await readBody(event)) : ''}`.trim())
  return answer
} })
answers('/api/auth/me', 'GET', me())
answers('/api/auth/sign-out', 'POST', '')
answers('/api/auth/profile', 'PATCH', { ...me(), user: { ...me().user, name: 'Mara L.' } })
answers('/api/auth/codes/set-up', 'POST', { secret: 'GEZDGNBVGY3TQOJQGEZDGNBVGY3TQOJQ', uri: 'otpauth://totp/x', svg: '<svg xmlns="http://www.w3.org/2000/svg"></svg>' })
answers('/api/auth/codes/confirm', 'POST', { recoveryCodes: ['0123456789', 'abcdefabcd'] })
answers('/api/auth/sessions', 'GET', { items: [{ id: 's1', device: 'Firefox on Linux', address: '127.0.0.1', createdAt: '2026-12-01T08:00:00Z', lastSeenAt: '2026-12-03T08:00:00Z', current: true }, { id: 's2', device: 'Chrome on Android', address: '', createdAt: '2026-12-01T08:00:00Z', lastSeenAt: '2026-12-02T08:00:00Z', current: false }], total: 2, page: 1, pageSize: 25 })
answers('/api/auth/sessions/s2', 'DELETE', '')

beforeEach(() => {
  useSessionStore().take(me())
  asked.length = 0
})
const settle = async () => {
  await flushPromises()
  await new Promise(resolve => setTimeout(resolve, 20))
  await flushPromises()
}

const CASES: [string, Component, Record<string, unknown>?][] = [
  ['AccountCard', AccountCard, { title: 'Sign in', lead: 'For members.' }], ['AccountMenu', AccountMenu],
  ['HelpDoor', HelpDoor, { busy: false }], ['HelpRound', HelpRound, { round, busy: false }], ['HelpRound, empty', HelpRound, { round: { ...round, animals: [] }, busy: false }],
  ['PersonCodes', PersonCodes], ['PersonEmail', PersonEmail], ['PersonName', PersonName], ['PersonPassword', PersonPassword], ['PersonSessions', PersonSessions], ['PersonTeams', PersonTeams],
]

describe.each(CASES)('%s', (_name, component, props = {}) => {
  it('has fields with labels, buttons with words, and no slip in its structure', async () => {
    const wrapper = await mountSuspended(component, { props })
    await settle()
    expect(wrapper.text().length).toBeGreaterThan(3)
    expect(slipsOf(wrapper.element as Element)).toEqual([])
  })
})

describe('the door for helpers', () => {
  it('lets in with two to six letters, and with nothing else', async () => {
    const wrapper = await mountSuspended(HelpDoor, { props: { busy: false } })
    for (const [typed, opens] of [['', false], ['J', false], ['J T', false], ['JT', true]] as const) {
      await wrapper.get('input').setValue(typed)
      await wrapper.get('form').trigger('submit')
      expect(wrapper.emitted('open') !== undefined, typed).toBe(opens)
    }
    expect(wrapper.emitted('open')).toEqual([['JT']])
  })

  it('leads to the sheet of each animal', async () => {
    const wrapper = await mountSuspended(HelpRound, { props: { round, busy: false } })
    expect(wrapper.get('a').attributes('href')).toBe('/sheet/abc?help=1')
    expect(wrapper.text()).toContain('Night room, tub 2')
  })
})

describe('the profile', () => {
  it('turns one-time codes on by a first code and shows the recovery codes once', async () => {
    const wrapper = await mountSuspended(PersonCodes)
    await wrapper.get('input[type="password"]').setValue('lantern pebble orchard nine')
    await wrapper.get('form').trigger('submit')
    await settle()
    expect(wrapper.text()).toContain('GEZD GNBV GY3T QOJQ')
    expect(wrapper.get('img').attributes('src')).toMatch(/^data:image\/svg\+xml/)
    await wrapper.get('input[autocomplete="one-time-code"]').setValue('123456')
    await wrapper.get('form').trigger('submit')
    await settle()
    expect(wrapper.text()).toContain('0123456789')
    expect(asked).toContain('POST /api/auth/codes/confirm {"code":"123456"}')
  })

  it('ends another sign-in only when asked twice', async () => {
    const wrapper = await mountSuspended(PersonSessions)
    await settle()
    await wrapper.get('button[aria-label="End: Chrome on Android"]').trigger('click')
    expect(asked.some(one => one.startsWith('DELETE'))).toBe(false)
    await wrapper.findAll('button').find(one => one.text() === 'Yes, sign it out')!.trigger('click')
    await settle()
    expect(asked).toContain('DELETE /api/auth/sessions/s2')
  })

  it('saves the name and says so', async () => {
    const wrapper = await mountSuspended(PersonName)
    await wrapper.get('input').setValue('Mara L.')
    await wrapper.get('form').trigger('submit')
    await settle()
    expect(wrapper.text()).toContain('Saved.')
    expect(useSessionStore().user?.name).toBe('Mara L.')
  })
})

describe('the account menu', () => {
  it('signs out and leaves nothing for the next person', async () => {
    const planner = usePlannerStore()
    planner.draft.name = 'Juniper'
    localStorage.setItem('thimbleful.draft', '{"name":"Juniper"}')
    const wrapper = await mountSuspended(AccountMenu)
    await wrapper.findAll('button').find(one => one.text() === 'Sign out')!.trigger('click')
    await settle()
    expect(useSessionStore().user).toBeNull()
    expect(planner.draft.name).toBe('')
    expect(localStorage.getItem('thimbleful.draft')).toBeNull()
  })
})
