import type { H3Event } from 'h3'
import type { z } from 'zod'
import type { TransferInput } from '#shared/schemas/team'
import type { TransferLook } from '#shared/types/team'
import type { RegimenRow, TransferRecord } from '#shared/types/rows'
import { hashOfKey, newLinkKey, newRegimenId, newToken } from '../access/linkKey'
import type { Member } from '../access/requireMember'
import { database, declineTransfer, findOpenTransfer, findRegimen, findTeam, insertTransfer, moveRegimen, nameOfUser, withdrawTransfer, writeAudit, WRITING, type Writer } from '../data'
import { fail } from '../http/fail'
import { serverOrigin } from './serverOrigin'

const objectOf = (row: RegimenRow) => ({ objectType: 'regimen', objectId: row.id, objectName: row.animalName || row.speciesName, version: row.latestVersion })

/** A one-time link that hands an animal over. An earlier one of the same animal ends. */
export function offerTransfer(event: H3Event, { teamId, user, actor }: Member, row: RegimenRow, { days, note }: z.output<typeof TransferInput>): { id: string, link: string, expiresAt: string } {
  const [id, token, now] = [newRegimenId(), newToken(), new Date()]
  const at = now.toISOString()
  const expiresAt = new Date(now.getTime() + days * 86_400_000).toISOString()
  database().transaction((tx) => {
    insertTransfer(tx, { id, teamId, regimenId: row.id, tokenHash: hashOfKey(token), note, createdById: user.id, createdAt: at, expiresAt })
    writeAudit(tx, { at, actor, teamId, action: 'transfer.offer', ...objectOf(row), reason: note, after: { expiresAt } })
  }, WRITING)
  return { id, link: `${serverOrigin(event)}/transfer#${token}`, expiresAt }
}

export function takeTransferBack({ teamId, user, actor }: Member, id: string): void {
  const at = new Date().toISOString()
  database().transaction((tx) => {
    const transfer = withdrawTransfer(tx, teamId, id, at, user.name)
    if (!transfer) throw fail({ status: 404, code: 'transfer.notFound', message: 'There is no such open link.' })
    writeAudit(tx, { at, actor, teamId, action: 'transfer.withdraw', ...objectOf(findRegimen(tx, transfer.regimenId)!) })
  }, WRITING)
}

/** @throws 410 `transfer.ended`. */
export function lookAtTransfer(token: string): TransferLook {
  const db = database()
  const transfer = openTransfer(db, token)
  const row = findRegimen(db, transfer.regimenId)!
  return { fromTeam: findTeam(db, transfer.teamId)!.name, animal: row.animalName, speciesName: row.speciesName, versions: row.latestVersion, by: nameOfUser(db, transfer.createdById), expiresAt: transfer.expiresAt, note: transfer.note }
}

/** @returns the plan's id in the team that takes it. @throws 410 `transfer.ended`, 422 `transfer.own`. */
export function acceptTransfer(member: Member, token: string): string {
  const now = new Date()
  const newId = newRegimenId()
  database().transaction((tx) => {
    const transfer = openTransfer(tx, token)
    if (transfer.teamId === member.teamId) throw fail({ status: 422, code: 'transfer.own', message: 'This animal is in your team already. Switch to the team that takes it, then open the link again.' })
    const from = findRegimen(tx, transfer.regimenId)!
    moveRegimen(tx, { from, toTeamId: member.teamId, toTeamName: member.team.name, fromTeamName: findTeam(tx, transfer.teamId)!.name, newId, keyHash: newLinkKey(now).keyHash, at: now.toISOString(), actor: member.actor, transferId: transfer.id })
  }, WRITING)
  return newId
}

export function refuseTransfer({ user, actor, teamId, team }: Member, token: string): void {
  const at = new Date().toISOString()
  database().transaction((tx) => {
    const transfer = openTransfer(tx, token)
    const row = findRegimen(tx, transfer.regimenId)!
    declineTransfer(tx, transfer.id, at, user.name, teamId)
    for (const side of new Set([transfer.teamId, teamId])) writeAudit(tx, { at, actor, teamId: side, action: 'transfer.decline', ...objectOf(row), detail: { by: team.name } })
  }, WRITING)
}

function openTransfer(db: Writer, token: string): TransferRecord {
  const found = findOpenTransfer(db, hashOfKey(token), new Date().toISOString())
  const row = found && findRegimen(db, found.regimenId)
  if (!found || !row || row.movedAt || row.endedAt) throw fail({ status: 410, code: 'transfer.ended', message: 'This link has ended, was taken back or was used already. Ask who sent it for a new one.' })
  return found
}
