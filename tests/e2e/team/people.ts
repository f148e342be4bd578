import { expect } from 'vitest'
import type { SavedRegimenReceipt } from '#shared/types/plan'
import type { Me } from '#shared/types/team'
import { ROLES, type Role } from '#shared/utils/abilities'
import { ask, cookieOf, juniper, withDatabase, type Answer } from '../api/client'

export const PASSWORD = 'lantern pebble orchard nine'
let count = 0
/** Addresses that no other test uses. */
export const freshEmail = (name = 'person') => `${name}.${process.pid}.${Date.now().toString(36)}.${count += 1}@saltings.example`

/** Somebody with a browser: every request carries its cookie, and takes over what the answer sets. */
export class Browser {
  cookie = ''
  constructor(readonly headers: Record<string, string> = {}) {}

  async ask<T = unknown>(method: string, path: string, body?: unknown, headers: Record<string, string> = {}): Promise<Answer<T>> {
    const answer = await ask<T>(method, path, body, { ...this.headers, ...(this.cookie && { cookie: this.cookie }), ...headers })
    if (answer.headers.getSetCookie().length > 0) this.cookie = cookieOf(answer)
    return answer
  }

  /** The same, and it must go well. */
  async done<T = unknown>(method: string, path: string, body?: unknown): Promise<T> {
    const answer = await this.ask<T>(method, path, body)
    expect(answer.status, `${method} ${path}: ${answer.text}`).toBeLessThan(300)
    return answer.json
  }
}

export async function signedUp(teamName = 'Saltings Rescue', name = 'Ines Carvalho', email = freshEmail('ines')): Promise<{ browser: Browser, email: string, me: Me }> {
  const browser = new Browser()
  const me = await browser.done<Me>('POST', '/api/auth/sign-up', { name, email, password: PASSWORD, teamName, timeZone: 'Europe/London' })
  return { browser, email, me }
}

/** The token of the newest mail of a kind to an address, out of the mails that are kept where no mail service is set. */
export function tokenOfMail(to: string, kind: string): string {
  const text = withDatabase(db => (db.prepare('select text from mails where to_address = ? and kind = ? order by id desc limit 1').get(to, kind) as { text: string } | undefined)?.text ?? '')
  const token = /#([\w-]{20,})/.exec(text)?.[1]
  expect(token, `a link in the mail ${kind} to ${to}`).toBeTruthy()
  return token!
}

export type People = Record<Role, Browser>
export interface Team { people: People, emails: Record<Role, string>, me: Me }

const NAMES: Record<Role, string> = { coordinator: 'Ines Carvalho', vet: 'Dr Amara Osei', technician: 'Tove Brandt', keeper: 'Mara Linde', carer: 'Joss Tait' }

/** A team with one person for each role, made the way people would: sign up, invite, accept. */
export async function makeTeam(name = 'Saltings Rescue'): Promise<Team> {
  const { browser: coordinator, email, me } = await signedUp(name)
  const people = { coordinator } as People
  const emails = { coordinator: email } as Record<Role, string>
  for (const role of ROLES.filter(one => one !== 'coordinator')) {
    emails[role] = freshEmail(role)
    await coordinator.done('POST', '/api/team/invitations', { email: emails[role], role })
    people[role] = new Browser()
    await people[role].done('POST', '/api/invitations/accept', { token: tokenOfMail(emails[role], 'invitation'), name: NAMES[role], password: PASSWORD })
  }
  await people.vet.done('PATCH', '/api/auth/profile', { name: NAMES.vet, registration: 'Register of vets, no. 00-4821' })
  return { people, emails, me }
}

/** Settings of a team with some changed. */
export async function changeSettings(coordinator: Browser, settings: Record<string, unknown>): Promise<void> {
  const { team } = await coordinator.done<Me>('GET', '/api/auth/me')
  await coordinator.done('PATCH', '/api/team', { name: team!.name, settings: { ...team!.settings, ...settings } })
}

/** Juniper, beginning now: a weight of today carries the plan. */
export function juniperNow(changes: { weightG?: number, enclosure?: string, name?: string } = {}) {
  const input = juniper()
  return { ...input, animal: { ...input.animal, caseNumber: '26-041', enclosure: 'Warm room, tank 4', ...changes }, startAt: new Date().toISOString() }
}

export async function savedPlan(by: Browser, input: unknown = juniperNow()): Promise<string> {
  return (await by.done<SavedRegimenReceipt>('POST', '/api/regimens', input)).id
}

/** From draft to approved: keeper asks, technician checks, vet approves. */
export async function approvedPlan({ people }: Team, input?: unknown): Promise<string> {
  const id = await savedPlan(people.keeper, input)
  await people.technician.done('POST', `/api/regimens/${id}/check`, { version: 1 })
  await people.vet.done('POST', `/api/regimens/${id}/approve`, { version: 1, note: '' })
  return id
}

/** A visit by a helper's link of a room or an animal. */
export async function visitBy(keeper: Browser, what: { regimenId: string } | { room: string }): Promise<{ browser: Browser, linkId: string }> {
  const { id, link } = await keeper.done<{ id: string, link: string }>('POST', '/api/team/links', { ...what, purpose: 'Night shift', hours: 12 })
  const browser = new Browser()
  await browser.done('POST', '/api/help/open', { token: link.split('#')[1], initials: 'JT' })
  return { browser, linkId: id }
}
