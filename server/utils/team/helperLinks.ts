import type { H3Event } from 'h3'
import type { z } from 'zod'
import type { HelperLinkInput } from '#shared/schemas/team'
import type { HelperLinkReceipt, HelperRound } from '#shared/types/team'
import { requireVisit, type Visit } from '../access/helperVisit'
import { hashOfKey, newRegimenId, newToken } from '../access/linkKey'
import type { Member } from '../access/requireMember'
import { writeCookie } from '../access/sealedCookie'
import { countHelperOpening, database, findOpenHelperLink, findTeam, findTeamRegimen, insertHelperLink, revokeHelperLink, writeAudit, WRITING } from '../data'
import { fail } from '../http/fail'
import { serverOrigin } from './serverOrigin'

/** @throws 404 for an animal of another team. */
export function makeHelperLink(event: H3Event, { teamId, user, actor }: Member, { regimenId, room, purpose, hours }: z.output<typeof HelperLinkInput>): HelperLinkReceipt {
  const row = regimenId ? findTeamRegimen(database(), teamId, regimenId) : undefined
  if (regimenId && (!row || row.movedAt)) throw fail({ status: 404, code: 'regimen.notFound', message: 'There is no such animal in this team.' })
  const [id, token, now] = [newRegimenId(), newToken(), new Date()]
  const at = now.toISOString()
  const expiresAt = new Date(now.getTime() + hours * 3_600_000).toISOString()
  database().transaction((tx) => {
    insertHelperLink(tx, { id, teamId, regimenId: regimenId ?? null, room: room ?? null, purpose, tokenHash: hashOfKey(token), createdBy: user.id, createdAt: at, expiresAt })
    writeAudit(tx, { at, actor, teamId, action: 'link.create', objectType: 'link', objectId: id, objectName: row ? row.animalName || row.speciesName : room, reason: purpose, after: { regimenId, room, expiresAt } })
  }, WRITING)
  // Behind the hash it reaches no server log and no other site.
  return { id, link: `${serverOrigin(event)}/help#${token}`, expiresAt }
}

export function endHelperLink({ teamId, actor }: Member, id: string): void {
  const at = new Date().toISOString()
  database().transaction((tx) => {
    const revoked = revokeHelperLink(tx, teamId, id, at)
    if (!revoked) throw fail({ status: 404, code: 'link.notFound', message: 'There is no such open link.' })
    writeAudit(tx, { at, actor, teamId, action: 'link.revoke', objectType: 'link', objectId: id, objectName: revoked.room ?? '', reason: revoked.purpose })
  }, WRITING)
}

/** Lets a helper in. @throws 401 `help.closed`. */
export async function openHelperLink(event: H3Event, token: string, initials: string): Promise<HelperRound> {
  const at = new Date().toISOString()
  const link = findOpenHelperLink(database(), { tokenHash: hashOfKey(token) }, at)
  await writeCookie(event, { help: link && { link: link.id, initials } })
  const visit = await requireVisit(event)
  database().transaction((tx) => {
    countHelperOpening(tx, visit.link.id, at, initials)
    writeAudit(tx, { at, actor: visit.actor, teamId: visit.link.teamId, action: 'link.open', objectType: 'link', objectId: visit.link.id, objectName: visit.link.room ?? '', reason: visit.link.purpose })
  }, WRITING)
  return roundOf(visit)
}

export function roundOf({ link, initials, regimens }: Visit): HelperRound {
  return {
    teamName: findTeam(database(), link.teamId)!.name, purpose: link.purpose, initials, expiresAt: link.expiresAt,
    animals: regimens.map(row => ({ id: row.id, version: row.latestVersion, name: row.animalName, speciesName: row.speciesName, caseNumber: row.caseNumber, enclosure: row.enclosure })),
  }
}
