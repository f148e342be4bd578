import { and, desc, eq, isNotNull, isNull, like, lt, ne, sql, type SQL } from 'drizzle-orm'
import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import type { PlanState, Wait } from '#shared/types/planLife'
import type { ApprovalRecord, RegimenRow, RegimenVersionRow } from '#shared/types/rows'
import type { Page } from '#shared/types/team'
import type { Db } from '../../db/client'
import { approvals, regimens, regimenVersions, transfers, users } from '../../db/schema'
import { SYSTEM, writeAudit, type Actor } from './auditRows'
import { changedFields } from './changedFields'
import { likePattern, orderBy, pageOf, type ListAsked } from './paging'
import { WRITING, type Writer } from './writing'

/** A version is only added on top of the one its author saw. */
export class RegimenChangedError extends Error {
  constructor(readonly latestVersion: number, readonly changedAt: string) {
    super(`The plan has version ${latestVersion} by now.`)
    this.name = 'RegimenChangedError'
  }
}

/** What lists show, sort and search. The room is what stands before the first comma of the enclosure. */
export function listedOf(input: RegimenInput, plan: Plan): Pick<RegimenRow, 'animalName' | 'caseNumber' | 'speciesName' | 'enclosure' | 'room' | 'weightG' | 'goodUntil' | 'searchText'> {
  const { name = '', caseNumber = '', enclosure = '' } = input.animal
  const { speciesName, scientificName, weightG } = plan.animal
  return {
    animalName: name, caseNumber, speciesName, enclosure, room: enclosure.split(',')[0]!.trim(), weightG, goodUntil: plan.validity.goodUntil,
    searchText: [name, caseNumber, speciesName, scientificName, enclosure].join(' ').toLowerCase(),
  }
}

export interface NewRegimen { id: string, keyHash: string, linkExpiresAt: string, demo?: boolean, teamId?: string | null, actor: Actor, at: string, input: RegimenInput, plan: Plan, note?: string }

export function insertRegimen(db: Writer, row: NewRegimen): void {
  const { id, actor, at, input, plan, note = '' } = row
  const teamId = row.teamId ?? null
  db.transaction((tx) => {
    tx.insert(regimens).values({
      id, latestVersion: 1, keyHash: row.keyHash, linkExpiresAt: row.linkExpiresAt, demo: row.demo ?? false, teamId, createdAt: at, updatedAt: at,
      draftedById: actor.id, draftedBy: actor.name, ...listedOf(input, plan),
    }).run()
    tx.insert(regimenVersions).values({ regimenId: id, version: 1, edition: plan.edition, inputJson: JSON.stringify(input), planJson: JSON.stringify(plan), createdAt: at, authorId: actor.id, author: actor.name, note }).run()
    writeAudit(tx, { at, actor, teamId, action: 'regimen.create', objectType: 'regimen', objectId: id, objectName: input.animal.name || plan.animal.speciesName, version: 1, reason: note, after: input })
  }, WRITING)
}

/**
 * Adds a version. It begins its life as a draft: whatever was checked or approved was another version.
 * @throws RegimenChangedError when `baseVersion` is given and is not the newest.
 * @returns the new version's number.
 */
export function insertRegimenVersion(db: Db, row: { id: string, baseVersion?: number, actor: Actor, at: string, input: RegimenInput, plan: Plan, note?: string }, also?: (tx: Writer, lapsed: ApprovalRecord[]) => void): number {
  const { id, actor, at, input, plan, note = '' } = row
  return db.transaction((tx) => {
    const current = tx.select().from(regimens).where(eq(regimens.id, id)).get()!
    if (row.baseVersion !== undefined && row.baseVersion !== current.latestVersion) throw new RegimenChangedError(current.latestVersion, current.updatedAt)
    const before = tx.select({ inputJson: regimenVersions.inputJson }).from(regimenVersions).where(and(eq(regimenVersions.regimenId, id), eq(regimenVersions.version, current.latestVersion))).get()!
    const version = current.latestVersion + 1
    tx.insert(regimenVersions).values({ regimenId: id, version, edition: plan.edition, inputJson: JSON.stringify(input), planJson: JSON.stringify(plan), createdAt: at, authorId: actor.id, author: actor.name, note }).run()
    tx.update(regimens).set({
      latestVersion: version, updatedAt: at, state: 'draft', waiting: null, waitingSince: null, askedBy: null, checkedById: null, checkedBy: null, checkedAt: null, sentBackJson: null,
      draftedById: actor.id, draftedBy: actor.name, ...listedOf(input, plan),
    }).where(eq(regimens.id, id)).run()
    const objectName = input.animal.name || plan.animal.speciesName
    writeAudit(tx, { at, actor, teamId: current.teamId, action: 'regimen.change', objectType: 'regimen', objectId: id, objectName, version, reason: note, ...changedFields(JSON.parse(before.inputJson), input), detail: { replaces: current.latestVersion, wasState: current.state } })
    const lapsed = lapseApprovals(tx, { regimenId: id, teamId: current.teamId, objectName, at, actor, reason: `Version ${version} replaced it.` })
    also?.(tx, lapsed)
    return version
  }, WRITING)
}

/** Ends every standing approval of a plan and writes it down. @returns those that ended. */
export function lapseApprovals(tx: Writer, ended: { regimenId: string, teamId: string | null, objectName: string, at: string, actor: Actor, reason: string }): ApprovalRecord[] {
  const lapsed = tx.update(approvals).set({ lapsedAt: ended.at, lapseReason: ended.reason }).where(and(eq(approvals.regimenId, ended.regimenId), isNull(approvals.lapsedAt))).returning().all()
  for (const approval of lapsed) writeAudit(tx, { at: ended.at, actor: ended.actor, teamId: ended.teamId, action: 'approval.lapse', objectType: 'regimen', objectId: ended.regimenId, objectName: ended.objectName, version: approval.version, reason: ended.reason })
  return lapsed
}

/** By its id alone: whoever asks must have been given the right to it by `access/requireRegimen`. */
export function findRegimen(db: Writer, id: string): RegimenRow | undefined {
  return db.select().from(regimens).where(eq(regimens.id, id)).get()
}

export function findTeamRegimen(db: Writer, teamId: string, id: string): RegimenRow | undefined {
  return db.select().from(regimens).where(and(eq(regimens.teamId, teamId), eq(regimens.id, id))).get()
}

export function findRegimenVersion(db: Writer, regimenId: string, version: number): RegimenVersionRow | undefined {
  return db.select().from(regimenVersions).where(and(eq(regimenVersions.regimenId, regimenId), eq(regimenVersions.version, version))).get()
}

/** The newest approval of a plan, standing or not. */
export function findApproval(db: Writer, regimenId: string, version?: number): ApprovalRecord | undefined {
  return db.select().from(approvals).where(and(eq(approvals.regimenId, regimenId), version ? eq(approvals.version, version) : undefined)).orderBy(desc(approvals.id)).limit(1).get()
}

export function listRegimenVersions(db: Db, regimenId: string, asked: ListAsked): Page<Pick<RegimenVersionRow, 'version' | 'createdAt' | 'author' | 'edition' | 'note' | 'planJson'>> {
  const where = eq(regimenVersions.regimenId, regimenId)
  return pageOf(db, regimenVersions, where, asked, (limit, offset) => db.select().from(regimenVersions).where(where).orderBy(...orderBy(asked.sort, { version: regimenVersions.version }, regimenVersions.id)).limit(limit).offset(offset).all(), row => row)
}

export interface PlansAsked extends ListAsked { state?: PlanState, waiting?: Wait, room?: string, notDraftedBy?: string }
export interface ListedPlan { row: RegimenRow, approval: ApprovalRecord | null }

/** The plans of a team. Those that were handed over are not among them. */
export function listRegimens(db: Db, teamId: string, asked: PlansAsked): Page<ListedPlan> {
  const where = and(
    eq(regimens.teamId, teamId), isNull(regimens.movedAt),
    asked.state ? eq(regimens.state, asked.state) : undefined,
    asked.waiting ? eq(regimens.waiting, asked.waiting) : undefined,
    asked.room ? eq(regimens.room, asked.room) : undefined,
    asked.notDraftedBy ? ne(regimens.draftedById, asked.notDraftedBy) : undefined,
    ...asked.q.split(/\s+/).filter(Boolean).map((word): SQL => like(regimens.searchText, sql`${likePattern(word)} escape '\\'`)),
  )
  const columns = { updatedAt: regimens.updatedAt, animalName: sql`lower(${regimens.animalName})`, enclosure: sql`lower(${regimens.enclosure})`, state: regimens.state, waitingSince: regimens.waitingSince, goodUntil: regimens.goodUntil }
  return pageOf(db, regimens, where, asked, (limit, offset) => db.select().from(regimens).where(where).orderBy(...orderBy(asked.sort, columns, regimens.id)).limit(limit).offset(offset).all(),
    row => ({ row, approval: findApproval(db, row.id) ?? null }))
}

export function listRooms(db: Db, teamId: string): string[] {
  return db.selectDistinct({ room: regimens.room }).from(regimens).where(and(eq(regimens.teamId, teamId), isNull(regimens.movedAt), ne(regimens.room, ''))).orderBy(regimens.room).limit(500).all().map(row => row.room)
}

/** Plans of every team that have waited since before a moment: for what time brings about, not for a request. */
export function regimensWaitingSince(db: Db, waiting: Wait, before: string): RegimenRow[] {
  return db.select().from(regimens).where(and(eq(regimens.waiting, waiting), lt(regimens.waitingSince, before), isNull(regimens.endedAt), isNotNull(regimens.teamId))).all()
}

// ── Life ──────────────────────────────────────────────────────────────────────────────────────────────────────────

/** What a step does to a plan: decided by `regimen/planLife`, written here. */
export interface LifeChange {
  action: string
  reason: string
  set: Partial<Pick<RegimenRow, 'state' | 'waiting' | 'waitingSince' | 'askedBy' | 'checkedById' | 'checkedBy' | 'checkedAt' | 'sentBackJson' | 'endedAt' | 'endedReason'>>
  approval?: Omit<typeof approvals.$inferInsert, 'id' | 'regimenId' | 'teamId'>
  /** Why a standing approval ends with it. */
  lapse?: string
}

/**
 * One step in a plan's life, in one transaction with its row of the record.
 * @param decide  sees the plan as it is inside the transaction; what it throws undoes everything.
 */
export function stepRegimen(db: Db, asked: { teamId: string, id: string, at: string, actor: Actor }, decide: (tx: Writer, row: RegimenRow, approval: ApprovalRecord | null) => LifeChange, also?: (tx: Writer, row: RegimenRow) => void): RegimenRow {
  const { teamId, id, at, actor } = asked
  return db.transaction((tx) => {
    const row = findTeamRegimen(tx, teamId, id)!
    const change = decide(tx, row, findApproval(tx, id) ?? null)
    const changed = tx.update(regimens).set({ ...change.set, updatedAt: at }).where(and(eq(regimens.teamId, teamId), eq(regimens.id, id))).returning().get()!
    const objectName = row.animalName || row.speciesName
    writeAudit(tx, { at, actor, teamId, action: change.action, objectType: 'regimen', objectId: id, objectName, version: row.latestVersion, reason: change.reason, before: { state: row.state, waiting: row.waiting }, after: { state: changed.state, waiting: changed.waiting } })
    if (change.lapse) lapseApprovals(tx, { regimenId: id, teamId, objectName, at, actor, reason: change.lapse })
    if (change.approval) tx.insert(approvals).values({ ...change.approval, regimenId: id, teamId }).run()
    also?.(tx, changed)
    return changed
  }, WRITING)
}

/** A guest's plan becomes a team's. @returns false when another team was quicker. */
export function takeRegimen(db: Db, asked: { id: string, teamId: string, at: string, actor: Actor, listed: ReturnType<typeof listedOf> }): boolean {
  return db.transaction((tx) => {
    const { id, teamId, at, actor, listed } = asked
    if (tx.update(regimens).set({ ...listed, teamId, updatedAt: at, draftedById: actor.id, draftedBy: actor.name }).where(and(eq(regimens.id, id), isNull(regimens.teamId))).run().changes === 0) return false
    writeAudit(tx, { at, actor, teamId, action: 'regimen.take', objectType: 'regimen', objectId: id, objectName: listed.animalName || listed.speciesName, before: { teamId: null }, after: { teamId } })
    return true
  }, WRITING)
}

/** Approvals whose last day is over, in the zone of each plan as far as a day can tell: the caller looks closer. */
export function approvalsGoodUntilBefore(db: Db, date: string): (ApprovalRecord & { planJson: string })[] {
  return db.select({ approval: approvals, planJson: regimenVersions.planJson }).from(approvals)
    .innerJoin(regimenVersions, and(eq(regimenVersions.regimenId, approvals.regimenId), eq(regimenVersions.version, approvals.version)))
    .where(and(isNull(approvals.lapsedAt), lt(approvals.goodUntil, date))).all().map(row => ({ ...row.approval, planJson: row.planJson }))
}

/** An approval ends by itself. The plan that was approved but not used yet is a draft again. */
export function lapseRegimen(db: Db, asked: { teamId: string, id: string, at: string, reason: string, actor?: Actor }, also?: (tx: Writer, row: RegimenRow, lapsed: ApprovalRecord[]) => void): void {
  const { teamId, id, at, reason, actor = SYSTEM } = asked
  db.transaction((tx) => {
    const row = findTeamRegimen(tx, teamId, id)
    if (!row) return
    const lapsed = lapseApprovals(tx, { regimenId: id, teamId, objectName: row.animalName || row.speciesName, at, actor, reason })
    if (lapsed.length === 0) return
    if (row.state === 'approved') tx.update(regimens).set({ state: 'draft', checkedAt: null, checkedBy: null, checkedById: null }).where(eq(regimens.id, id)).run()
    also?.(tx, row, lapsed)
  }, WRITING)
}

// ── Handing over ──────────────────────────────────────────────────────────────────────────────────────────────────

/** Copies a plan with its versions into another team and ends it here: both sides keep what happened until now. */
export function moveRegimen(tx: Writer, asked: { from: RegimenRow, toTeamId: string, toTeamName: string, fromTeamName: string, newId: string, keyHash: string, at: string, actor: Actor, transferId: string }): void {
  const { from, toTeamId, newId, at, actor } = asked
  const objectName = from.animalName || from.speciesName
  tx.insert(regimens).values({ ...from, id: newId, teamId: toTeamId, keyHash: asked.keyHash, linkExpiresAt: at, state: 'draft', waiting: null, waitingSince: null, askedBy: null, checkedById: null, checkedBy: null, checkedAt: null, sentBackJson: null, demo: false, createdAt: at, updatedAt: at }).run()
  for (const version of tx.select().from(regimenVersions).where(eq(regimenVersions.regimenId, from.id)).orderBy(regimenVersions.version).all()) {
    tx.insert(regimenVersions).values({ ...version, id: undefined, regimenId: newId }).run()
  }
  tx.update(regimens).set({ movedAt: at, endedAt: at, endedReason: `Handed over to ${asked.toTeamName}.`, state: 'finished', waiting: null, updatedAt: at }).where(eq(regimens.id, from.id)).run()
  tx.update(transfers).set({ state: 'accepted', decidedAt: at, decidedBy: actor.name, otherTeamId: toTeamId, newRegimenId: newId }).where(eq(transfers.id, asked.transferId)).run()
  lapseApprovals(tx, { regimenId: from.id, teamId: from.teamId, objectName, at, actor, reason: `Handed over to ${asked.toTeamName}.` })
  writeAudit(tx, { at, actor, teamId: from.teamId, action: 'transfer.accept', objectType: 'regimen', objectId: from.id, objectName, version: from.latestVersion, detail: { toTeam: asked.toTeamName } })
  writeAudit(tx, { at, actor, teamId: toTeamId, action: 'transfer.receive', objectType: 'regimen', objectId: newId, objectName, version: from.latestVersion, detail: { fromTeam: asked.fromTeamName, fromId: from.id } })
}

/** Whose name a person has, for lists. */
export function nameOfUser(db: Writer, id: string): string {
  return db.select({ name: users.name }).from(users).where(eq(users.id, id)).get()?.name ?? ''
}
