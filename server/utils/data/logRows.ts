import { and, eq, isNull } from 'drizzle-orm'
import type { FeedEntryRecord, RegimenRow, WeighInRecord } from '#shared/types/rows'
import type { Page } from '#shared/types/team'
import type { Db } from '../../db/client'
import { feedEntries, regimens, weighIns } from '../../db/schema'
import { writeAudit, type Actor } from './auditRows'
import { orderBy, pageOf, type ListAsked } from './paging'
import { WRITING, type Writer } from './writing'

const objectOf = (row: RegimenRow) => ({ objectType: 'regimen', objectId: row.id, objectName: row.animalName || row.speciesName, version: row.latestVersion })

export function insertWeighIn(db: Db, asked: { row: RegimenRow, teamId: string, weightG: number, weighedAt: string, actor: Actor, at: string, effect: string }, also?: (tx: Writer) => void): WeighInRecord {
  const { row, teamId, weightG, weighedAt, actor, at, effect } = asked
  return db.transaction((tx) => {
    const entry = tx.insert(weighIns).values({ teamId, regimenId: row.id, weightG, weighedAt, by: actor.name, effect, createdAt: at }).returning().get()
    if (!row.lastWeighedAt || weighedAt >= row.lastWeighedAt) tx.update(regimens).set({ lastWeightG: weightG, lastWeighedAt: weighedAt }).where(and(eq(regimens.teamId, teamId), eq(regimens.id, row.id))).run()
    writeAudit(tx, { at, actor, teamId, action: 'weight.add', ...objectOf(row), after: { weightG, weighedAt }, detail: { effect } })
    also?.(tx)
    return entry
  }, WRITING)
}

export function listWeighIns(db: Db, teamId: string, regimenId: string, asked: ListAsked): Page<WeighInRecord> {
  const where = and(eq(weighIns.teamId, teamId), eq(weighIns.regimenId, regimenId))
  return pageOf(db, weighIns, where, asked, (limit, offset) => db.select().from(weighIns).where(where).orderBy(...orderBy(asked.sort, { at: weighIns.weighedAt }, weighIns.id)).limit(limit).offset(offset).all(), one => one)
}

export function insertFeedEntry(db: Db, asked: { row: RegimenRow, teamId: string, entry: Omit<typeof feedEntries.$inferInsert, 'id' | 'teamId' | 'regimenId'>, actor: Actor }, also?: (tx: Writer) => void): FeedEntryRecord {
  const { row, teamId, entry, actor } = asked
  return db.transaction((tx) => {
    const written = tx.insert(feedEntries).values({ ...entry, teamId, regimenId: row.id }).returning().get()
    writeAudit(tx, { at: entry.at, actor, teamId, action: 'feed.log', ...objectOf(row), version: entry.version, after: { outcome: entry.outcome, takenMl: entry.takenMl ?? null, initials: entry.initials, note: entry.note ?? '' } })
    also?.(tx)
    return written
  }, WRITING)
}

/** Nothing of a log is deleted: a wrong line is struck out, with why. @returns false when there is none, or it was struck out before. */
export function strikeFeedEntry(db: Db, asked: { row: RegimenRow, teamId: string, entryId: number, reason: string, actor: Actor, at: string }): boolean {
  const { row, teamId, entryId, reason, actor, at } = asked
  return db.transaction((tx) => {
    const struck = tx.update(feedEntries).set({ struckAt: at, struckReason: reason }).where(and(eq(feedEntries.teamId, teamId), eq(feedEntries.regimenId, row.id), eq(feedEntries.id, entryId), isNull(feedEntries.struckAt))).returning().get()
    if (!struck) return false
    writeAudit(tx, { at, actor, teamId, action: 'feed.strike', ...objectOf(row), version: struck.version, reason, before: { outcome: struck.outcome, takenMl: struck.takenMl, at: struck.at } })
    return true
  }, WRITING)
}

export function listFeedEntries(db: Db, teamId: string, regimenId: string, asked: ListAsked): Page<FeedEntryRecord> {
  const where = and(eq(feedEntries.teamId, teamId), eq(feedEntries.regimenId, regimenId))
  return pageOf(db, feedEntries, where, asked, (limit, offset) => db.select().from(feedEntries).where(where).orderBy(...orderBy(asked.sort, { at: feedEntries.at }, feedEntries.id)).limit(limit).offset(offset).all(), one => one)
}

