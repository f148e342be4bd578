import { and, eq } from 'drizzle-orm'
import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import type { RegimenRow, RegimenVersionRow } from '#shared/types/rows'
import type { Db } from '../../db/client'
import { auditRecords, regimens, regimenVersions } from '../../db/schema'

/** Takes the write lock at once: reading first and then finding the database busy would fail instead of waiting. */
const WRITING = { behavior: 'immediate' } as const

/** A version is only added on top of the one its author saw. */
export class RegimenChangedError extends Error {
  constructor(readonly latestVersion: number, readonly changedAt: string) {
    super(`The plan has version ${latestVersion} by now.`)
    this.name = 'RegimenChangedError'
  }
}

export function insertRegimen(db: Db, row: { id: string, keyHash: string, linkExpiresAt: string, demo?: boolean, actor: string, at: string, input: RegimenInput, plan: Plan }): void {
  db.transaction((tx) => {
    tx.insert(regimens).values({ id: row.id, latestVersion: 1, keyHash: row.keyHash, linkExpiresAt: row.linkExpiresAt, demo: row.demo ?? false, createdAt: row.at, updatedAt: row.at }).run()
    tx.insert(regimenVersions).values({ regimenId: row.id, version: 1, edition: row.plan.edition, inputJson: JSON.stringify(row.input), planJson: JSON.stringify(row.plan), createdAt: row.at }).run()
    tx.insert(auditRecords).values({ at: row.at, actor: row.actor, action: 'regimen.create', objectType: 'regimen', objectId: row.id, version: 1 }).run()
  }, WRITING)
}

/** @throws RegimenChangedError when `baseVersion` is given and is not the newest. @returns the new version's number. */
export function insertRegimenVersion(db: Db, row: { id: string, baseVersion?: number, actor: string, at: string, input: RegimenInput, plan: Plan }): number {
  return db.transaction((tx) => {
    const current = tx.select().from(regimens).where(eq(regimens.id, row.id)).get()!
    if (row.baseVersion !== undefined && row.baseVersion !== current.latestVersion) throw new RegimenChangedError(current.latestVersion, current.updatedAt)
    const version = current.latestVersion + 1
    tx.insert(regimenVersions).values({ regimenId: row.id, version, edition: row.plan.edition, inputJson: JSON.stringify(row.input), planJson: JSON.stringify(row.plan), createdAt: row.at }).run()
    tx.update(regimens).set({ latestVersion: version, updatedAt: row.at }).where(eq(regimens.id, row.id)).run()
    tx.insert(auditRecords).values({ at: row.at, actor: row.actor, action: 'regimen.change', objectType: 'regimen', objectId: row.id, version, detailJson: JSON.stringify({ replaces: current.latestVersion }) }).run()
    return version
  }, WRITING)
}

export function findRegimen(db: Db, id: string): RegimenRow | undefined {
  return db.select().from(regimens).where(eq(regimens.id, id)).get()
}

export function findRegimenVersion(db: Db, regimenId: string, version: number): RegimenVersionRow | undefined {
  return db.select().from(regimenVersions).where(and(eq(regimenVersions.regimenId, regimenId), eq(regimenVersions.version, version))).get()
}
