import { beforeAll, describe, expect, it } from 'vitest'
import type { Me, Page } from '#shared/types/team'
import { filesUnder } from '../../guards/files'
import { expectOurShape, juniper, withDatabase } from '../api/client'
import { ACCESS, ASKERS, type Asker, type Row } from './access.data'
import { approvedPlan, Browser, changeSettings, freshEmail, juniperNow, makeTeam, PASSWORD, savedPlan, signedUp, tokenOfMail, visitBy, type Team } from './people'

/** Every route by its file: `[id]/sheet.pdf.get.ts` is `GET /api/regimens/{id}/sheet.pdf`. */
const routes = filesUnder('server/api', ['.ts']).filter(file => !file.includes('[...]')).map((file) => {
  const [, path, method] = /^server(.+?)(?:\/index)?\.(get|post|put|patch|delete)\.ts$/.exec(file) ?? []
  return `${method!.toUpperCase()} ${path!.replace(/\[(\w+)\]/g, '{$1}')}`
}).sort()

let team: Team
let planId: string
let askers: Record<Asker, Browser>

beforeAll(async () => {
  team = await makeTeam()
  await changeSettings(team.people.coordinator, { approvalRequired: true, contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }] })
  planId = await approvedPlan(team)
  const stranger = await signedUp('Harbour Refuge', 'Stig Aalto', freshEmail('stig'))
  askers = { ...team.people, nobody: new Browser(), helper: (await visitBy(team.people.keeper, { room: 'Warm room' })).browser, stranger: stranger.browser }
}, 120_000)

/** What one question needs, made anew for it, so that no answer depends on the one before. */
async function prepared(asker: Asker, needs: Row['needs']): Promise<{ id: string, entryId: string }> {
  const { people } = team
  const found = { id: planId, entryId: '1' }
  switch (needs) {
    case 'draft':
      // Drafted by whoever does not ask: the same hand may not check.
      return { ...found, id: await savedPlan(people.keeper) }
    case 'checked': {
      const id = await savedPlan(people.keeper)
      await people.technician.done('POST', `/api/regimens/${id}/check`, { version: 1 })
      return { ...found, id }
    }
    case 'approved': return { ...found, id: await approvedPlan(team) }
    case 'in-use': {
      const id = await approvedPlan(team)
      await people.keeper.done('POST', `/api/regimens/${id}/use`, { version: 1 })
      return { ...found, id }
    }
    case 'entry': return { ...found, entryId: String((await people.carer.done<{ id: number }>('POST', `/api/regimens/${planId}/feed-log`, { outcome: 'all' })).id) }
    case 'link': return { ...found, id: (await people.keeper.done<{ id: string }>('POST', '/api/team/links', { room: 'Warm room', purpose: 'Night shift', hours: 12 })).id }
    case 'invitation': return { ...found, id: (await people.coordinator.done<{ id: string }>('POST', '/api/team/invitations', { email: freshEmail(), role: 'carer' })).id }
    case 'transfer': {
      const id = await savedPlan(people.keeper)
      return { ...found, id: (await people.coordinator.done<{ id: string }>('POST', `/api/regimens/${id}/transfers`, {})).id }
    }
    case 'failed-mail': return { ...found, id: String(withDatabase(db => db.prepare('insert into mails (team_id, to_address, kind, subject, text, html, state, created_at) values (?, \'a@b.example\', \'invitation\', \'s\', \'t\', \'h\', \'failed\', \'2026-01-01T00:00:00.000Z\') returning id').pluck().get(team.me.team!.id) as number)) }
    case 'member': {
      const email = freshEmail('leaver')
      await people.coordinator.done('POST', '/api/team/invitations', { email, role: 'keeper' })
      await new Browser().done('POST', '/api/invitations/accept', { token: tokenOfMail(email, 'invitation'), name: 'Leaver', password: PASSWORD })
      const page = await people.coordinator.done<Page<{ id: string }>>('GET', `/api/team/members?q=${encodeURIComponent(email)}`)
      return { ...found, id: page.items[0]!.id }
    }
    case 'guest-plan': {
      // The guest's plan has to be in this browser's own cookie.
      const guest = new Browser()
      const { id, key } = await guest.done<{ id: string, key: string }>('POST', '/api/regimens', juniper())
      await askers[asker].ask('GET', `/api/regimens/${id}?key=${key}`)
      return { ...found, id }
    }
    default: return found
  }
}

async function bodyOf(row: Row, asker: Asker): Promise<unknown> {
  if (row.body === 'the plan') return juniperNow()
  if (row.body === 'a change') return { ...juniperNow({ weightG: 190 }), baseVersion: 1 }
  if (row.body === 'the settings') {
    const { team: own } = await (asker === 'stranger' ? askers.stranger : team.people.coordinator).done<Me>('GET', '/api/auth/me')
    return { name: own!.name, settings: own!.settings }
  }
  return row.body && typeof row.body === 'object' && 'email' in row.body && row.body.email === 'FRESH' ? { ...row.body, email: freshEmail() } : row.body
}

describe('every route', () => {
  it('has a row, and every row a route', () => expect(Object.keys(ACCESS).sort()).toEqual(routes))
})

describe.each(Object.entries(ACCESS))('%s', (route, row) => {
  it.each(ASKERS.map(asker => [asker, row.answers[asker]] as const))('answers %s with %i', async (asker, status) => {
    const [method = '', path = ''] = route.split(' ')
    const { id, entryId } = await prepared(asker, row.needs)
    // Routes that end or begin a sign-in are asked by a copy, so that the person stays signed in.
    const browser = new Browser()
    browser.cookie = askers[asker].cookie
    const query = route.endsWith('/compare') ? '?from=1&to=1' : ''
    const body = await bodyOf(row, asker)
    const isEnding = ['POST /api/auth/sign-out', 'POST /api/auth/sign-up', 'POST /api/auth/sessions/end-others'].includes(route)
    if (isEnding && asker !== 'nobody' && asker !== 'helper') {
      browser.cookie = ''
      await browser.done('POST', '/api/auth/sign-in', { email: asker === 'stranger' ? (await askers.stranger.done<Me>('GET', '/api/auth/me')).user.email : team.emails[asker as keyof Team['emails']], password: PASSWORD })
    }
    const answer = await browser.ask(method, path.replace('{id}', id).replace('{entryId}', entryId) + query, body)
    expect(answer.status, answer.text.slice(0, 400)).toBe(status)
    if (status >= 400) expectOurShape(answer, status)
    // Every other sign-in of that person has ended: this one goes on.
    if (route.endsWith('end-others') && status === 200) askers[asker].cookie = browser.cookie
  })
})
