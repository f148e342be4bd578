import type { H3Event } from 'h3'
import type { RegimenRow } from '#shared/types/rows'
import { can, HELPER_ABILITIES, type Ability } from '#shared/utils/abilities'
import { database, findRegimen, findTeam, GUEST, type Actor } from '../data'
import { fail } from '../http/fail'
import { guestPlansOf } from './guestPlans'
import { visitOf } from './helperVisit'
import { keyFits } from './linkKey'
import { memberOf, notAllowed, settingsOf, type Member } from './requireMember'
import { whoIs } from './signedIn'

/** A plan that may be used as asked, by whom and by what right. */
export interface OpenedRegimen { row: RegimenRow, via: 'demo' | 'key' | 'member' | 'helper', actor: Actor, member: Member | null, initials: string | null }

/** What the private link of a guest's plan lets its holder do. */
const KEY_ABILITIES: readonly Ability[] = ['plan.see', 'plan.print', 'plan.edit']

/**
 * The plan that a request may use: as a member of its team, on a helper's visit, by the key of its private link, or
 * because this browser's cookie remembers it. Anyone may look at the invented plans; nobody changes them.
 * Wrong key, ended link, another team's plan and no such plan are one answer, so that nothing can be found out by trying.
 * @returns what was checked, so that a handler cannot skip the check.
 */
export async function requireRegimen(event: H3Event, id: string, key: string | undefined, ability: Ability): Promise<OpenedRegimen> {
  const row = findRegimen(database(), id)
  if (row?.demo && row.teamId === null) {
    if (ability === 'plan.see' || ability === 'plan.print') return { row, via: 'demo', actor: GUEST, member: null, initials: null }
    throw fail({ status: 403, code: 'regimen.demo', message: 'This plan belongs to the demonstration and stays as it is. Save one of your own from the planner.' })
  }
  const opened = row?.teamId ? await openTeamRegimen(event, row, key, ability) : await openGuestRegimen(event, row, key, ability)
  if (!opened) throw regimenNotFound()
  return opened
}

export function regimenNotFound() {
  return fail({ status: 404, code: 'regimen.notFound', message: 'There is no plan behind this link, or the link has ended. Links are good for 30 days; ask who sent it for a new one.' })
}

/** A plan of the team of whoever asks, and the ability to do so; anything else is a 404. */
export async function requireTeamRegimen(event: H3Event, id: string, ability: Ability): Promise<OpenedRegimen & { member: Member }> {
  const who = await whoIs(event)
  if (!who) throw fail({ status: 401, code: 'auth.signIn', message: 'Sign in first.' })
  const member = memberOf(who)
  const row = findRegimen(database(), id)
  if (!row || row.teamId !== member.teamId || row.movedAt) throw regimenNotFound()
  if (!can(member.role, ability)) throw notAllowed(member.role, ability)
  return { row, via: 'member', actor: member.actor, member, initials: null }
}

async function openTeamRegimen(event: H3Event, row: RegimenRow, key: string | undefined, ability: Ability): Promise<OpenedRegimen | null> {
  const who = await whoIs(event)
  if (who?.member && who.member.teamId === row.teamId) {
    const member = memberOf(who)
    if (!can(member.role, ability)) throw notAllowed(member.role, ability)
    return { row, via: 'member', actor: member.actor, member, initials: null }
  }
  const visit = await visitOf(event)
  if (visit?.regimens.some(one => one.id === row.id)) {
    if (!HELPER_ABILITIES.includes(ability)) throw fail({ status: 403, code: 'help.notAllowed', message: 'This link lets you see, print and log. Ask the team for anything else.' })
    return { row, via: 'helper', actor: visit.actor, member: null, initials: visit.initials }
  }
  // Paper that a guest printed before the team took the plan over still leads here: to look, as long as the link holds.
  const team = findTeam(database(), row.teamId!)
  if (ability === 'plan.see' && team && settingsOf(team).sheetCodes && key !== undefined && isOpen(row, key, new Date())) return { row, via: 'key', actor: GUEST, member: null, initials: null }
  return null
}

async function openGuestRegimen(event: H3Event, row: RegimenRow | undefined, key: string | undefined, ability: Ability): Promise<OpenedRegimen | null> {
  const usedKey = key ?? (row && (await guestPlansOf(event)).find(one => one.id === row.id)?.key)
  if (!row || usedKey === undefined || !isOpen(row, usedKey, new Date()) || !KEY_ABILITIES.includes(ability)) return null
  return { row, via: 'key', actor: GUEST, member: null, initials: null }
}

/** Whether a key opens a plan now. */
export function isOpen(row: Pick<RegimenRow, 'keyHash' | 'linkExpiresAt'>, key: string, now: Date): boolean {
  return keyFits(key, row.keyHash) && row.linkExpiresAt > now.toISOString()
}

/** Whether a key opens the plan of that id now; never so for the demonstration, which needs none, or a team's plan. */
export function opensRegimen(id: string, key: string): boolean {
  const row = findRegimen(database(), id)
  return row !== undefined && !row.demo && row.teamId === null && isOpen(row, key, new Date())
}
