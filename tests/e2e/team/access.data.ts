import { ROLES, type Role } from '#shared/utils/abilities'

export type Asker = Role | 'nobody' | 'helper' | 'stranger'
export const ASKERS: readonly Asker[] = [...ROLES, 'nobody', 'helper', 'stranger']

/** Expected answer of one route to each who may ask. */
export interface Row { answers: Record<Asker, number>, body?: unknown, /** Prepares what this very question needs. */ needs?: 'draft' | 'checked' | 'approved' | 'in-use' | 'entry' | 'link' | 'invitation' | 'transfer' | 'failed-mail' | 'member' | 'guest-plan' }

const to = (members: Partial<Record<Role, number>>, others: { nobody: number, helper: number, stranger: number }): Record<Asker, number> => ({ coordinator: 403, vet: 403, technician: 403, keeper: 403, carer: 403, ...members, ...others })
const all = (status: number): Record<Role, number> => ({ coordinator: status, vet: status, technician: status, keeper: status, carer: status })
const planners = (status: number) => ({ coordinator: status, vet: status, technician: status, keeper: status })
const checkers = (status: number) => ({ coordinator: status, vet: status, technician: status })

/** The same for everyone. */
const open = (status: number, body?: unknown): Row => ({ answers: to(all(status), { nobody: status, helper: status, stranger: status }), body })
/** Needs an account, of whatever team. */
const account = (status: number, body?: unknown): Row => ({ answers: to(all(status), { nobody: 401, helper: 401, stranger: status }), body })
/** The asker's own team: a stranger has one too. */
const ownTeam = (members: Partial<Record<Role, number>>, stranger: number, rest: Omit<Row, 'answers'> = {}): Row => ({ answers: to(members, { nobody: 401, helper: 401, stranger }), ...rest })
/** A plan, or a thing, of the team: nobody else's business. */
const ofTeam = (members: Partial<Record<Role, number>>, rest: Omit<Row, 'answers'> = {}): Row => ({ answers: to(members, { nobody: 401, helper: 401, stranger: 404 }), ...rest })
/** A plan that a helper on a visit may see, print or log for. */
const withHelper = (members: Partial<Record<Role, number>>, helper: number, rest: Omit<Row, 'answers'> = {}): Row => ({ answers: to(members, { nobody: 404, helper, stranger: 404 }), ...rest })

const PLAN = 'the plan'
const SIGN_UP = { name: 'New Person', email: 'FRESH', password: 'lantern pebble orchard nine', teamName: 'Another' }

/**
 * Every route and what it answers to whom. A stranger is the coordinator of another team; a helper came by a link for
 * the room of the plan. A new route without a row here fails the test.
 */
export const ACCESS: Record<string, Row> = {
  'GET /api/health': open(200),
  'GET /api/reference/species': open(200),
  'GET /api/reference/foods': open(200),
  'GET /api/reference/equations': open(200),
  'GET /api/reference/equations/{id}/value': open(404),
  'GET /api/reference/sources': open(200),
  'POST /api/regimens/preview': open(200, PLAN),
  'POST /api/regimens/sheet.pdf': open(200, PLAN),
  'POST /api/regimens/mixing.pdf': open(200, PLAN),
  'POST /api/regimens/label.pdf': open(200, PLAN),
  // A guest may save; somebody signed in saves into the team, if the role plans at all.
  'POST /api/regimens': { answers: to(planners(201), { nobody: 201, helper: 201, stranger: 201 }), body: PLAN },
  'GET /api/regimens': open(200),
  'GET /api/regimens/{id}': withHelper(all(200), 200),
  'PATCH /api/regimens/{id}': withHelper(planners(200), 403, { needs: 'draft', body: 'a change' }),
  'GET /api/regimens/{id}/sheet.pdf': withHelper(all(200), 200),
  'GET /api/regimens/{id}/mixing.pdf': withHelper(all(200), 200),
  'GET /api/regimens/{id}/label.pdf': withHelper(all(200), 200),
  'GET /api/regimens/{id}/packet.pdf': withHelper(all(200), 200),
  'GET /api/regimens/{id}/versions': ofTeam(all(200)),
  'GET /api/regimens/{id}/compare': ofTeam(all(200)),
  'GET /api/regimens/{id}/record': ofTeam(planners(200)),
  'GET /api/regimens/{id}/weigh-ins': ofTeam(all(200)),
  'POST /api/regimens/{id}/weigh-ins': ofTeam(planners(201), { body: { weightG: 183 } }),
  'GET /api/regimens/{id}/feed-log': withHelper(all(200), 200),
  'POST /api/regimens/{id}/feed-log': withHelper(all(201), 201, { body: { outcome: 'all' } }),
  'POST /api/regimens/{id}/feed-log/{entryId}/strike': withHelper(all(204), 204, { needs: 'entry', body: { reason: 'wrong animal' } }),
  'POST /api/regimens/{id}/ask-check': ofTeam(planners(200), { needs: 'draft', body: { version: 1 } }),
  'POST /api/regimens/{id}/check': ofTeam(checkers(200), { needs: 'draft', body: { version: 1 } }),
  'POST /api/regimens/{id}/ask-approval': ofTeam(planners(200), { needs: 'checked', body: { version: 1 } }),
  'POST /api/regimens/{id}/approve': ofTeam({ vet: 200 }, { needs: 'checked', body: { version: 1 } }),
  // Checked by another hand, it is with the vet: others of the checkers may not take it from there.
  'POST /api/regimens/{id}/send-back': ofTeam({ coordinator: 403, vet: 200, technician: 200 }, { needs: 'checked', body: { version: 1, reason: 'weigh again' } }),
  'POST /api/regimens/{id}/use': ofTeam(planners(200), { needs: 'approved', body: { version: 1 } }),
  'POST /api/regimens/{id}/finish': ofTeam(planners(200), { needs: 'in-use', body: { version: 1 } }),
  'POST /api/regimens/{id}/stop': ofTeam(planners(200), { needs: 'in-use', body: { version: 1, reason: 'not well' } }),
  'POST /api/regimens/{id}/transfers': ofTeam({ coordinator: 201 }, { needs: 'draft', body: {} }),
  'POST /api/regimens/{id}/take': ownTeam(planners(200), 200, { needs: 'guest-plan', body: {} }),
  'GET /api/sheets/{id}': withHelper(all(200), 200),
  'POST /api/auth/sign-up': open(201, SIGN_UP),
  'POST /api/auth/sign-in': open(401, { email: 'FRESH', password: 'not the password' }),
  'POST /api/auth/sign-out': open(204, {}),
  'GET /api/auth/me': open(200),
  'POST /api/auth/forgot': open(202, { email: 'FRESH' }),
  'POST /api/auth/reset': open(410, { token: 'x'.repeat(43), password: 'lantern pebble orchard nine' }),
  'POST /api/auth/email-confirm': open(410, { token: 'x'.repeat(43) }),
  'PATCH /api/auth/profile': account(200, { name: 'Somebody', registration: 'Register of vets, no. 00-4821' }),
  'POST /api/auth/password': account(422, { password: 'not the password', newPassword: 'another lantern orchard' }),
  'POST /api/auth/email': account(422, { password: 'not the password', newEmail: 'new@saltings.example' }),
  'POST /api/auth/codes/set-up': account(422, { password: 'not the password' }),
  'POST /api/auth/codes/confirm': account(422, { code: '123456' }),
  'POST /api/auth/codes/off': account(422, { password: 'not the password' }),
  'GET /api/auth/sessions': account(200),
  'DELETE /api/auth/sessions/{id}': account(404),
  'POST /api/auth/sessions/end-others': account(200, {}),
  'POST /api/auth/team': account(404, { teamId: 'no-such-team' }),
  'GET /api/team': ownTeam(all(200), 200),
  'PATCH /api/team': ownTeam({ coordinator: 200 }, 200, { body: 'the settings' }),
  'GET /api/team/members': ownTeam(all(200), 200),
  'PATCH /api/team/members/{id}': ofTeam({ coordinator: 200 }, { needs: 'member', body: { role: 'carer' } }),
  'DELETE /api/team/members/{id}': ofTeam({ coordinator: 204 }, { needs: 'member' }),
  'GET /api/team/invitations': ownTeam({ coordinator: 200 }, 200),
  'POST /api/team/invitations': ownTeam({ coordinator: 201 }, 201, { body: { email: 'FRESH', role: 'carer' } }),
  'POST /api/team/invitations/{id}/resend': ofTeam({ coordinator: 200 }, { needs: 'invitation', body: {} }),
  'DELETE /api/team/invitations/{id}': ofTeam({ coordinator: 204 }, { needs: 'invitation' }),
  'POST /api/invitations/look': open(410, { token: 'x'.repeat(43) }),
  'POST /api/invitations/accept': open(410, { token: 'x'.repeat(43) }),
  'GET /api/team/links': ownTeam(planners(200), 200),
  'POST /api/team/links': ownTeam(planners(201), 201, { body: { room: 'Warm room', purpose: 'Night shift', hours: 12 } }),
  'DELETE /api/team/links/{id}': ofTeam(planners(204), { needs: 'link' }),
  'GET /api/team/rooms': ownTeam(all(200), 200),
  'GET /api/team/record': ownTeam(planners(200), 200),
  'GET /api/team/record.csv': ownTeam(planners(200), 200),
  'GET /api/team/mails': ownTeam({ coordinator: 200 }, 200),
  'POST /api/team/mails/{id}/retry': ofTeam({ coordinator: 204 }, { needs: 'failed-mail', body: {} }),
  'GET /api/team/transfers': ownTeam({ coordinator: 200 }, 200),
  'DELETE /api/team/transfers/{id}': ofTeam({ coordinator: 204 }, { needs: 'transfer' }),
  'GET /api/team/desk': ownTeam(all(200), 200),
  'POST /api/help/open': open(401, { token: 'x'.repeat(43), initials: 'JT' }),
  'GET /api/help/round': { answers: to(all(401), { nobody: 401, helper: 200, stranger: 401 }) },
  'POST /api/help/close': open(204, {}),
  'POST /api/transfers/look': account(410, { token: 'x'.repeat(43) }),
  'POST /api/transfers/accept': ownTeam({ coordinator: 410 }, 410, { body: { token: 'x'.repeat(43) } }),
  'POST /api/transfers/decline': ownTeam({ coordinator: 410 }, 410, { body: { token: 'x'.repeat(43) } }),
}
