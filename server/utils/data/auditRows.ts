import { createHash } from 'node:crypto'
import { and, desc, eq, gt, gte, inArray, like, sql, type SQL } from 'drizzle-orm'
import type { AuditRow } from '#shared/types/rows'
import type { Page } from '#shared/types/team'
import type { Db } from '../../db/client'
import { auditRecords, regimens } from '../../db/schema'
import { likePattern, orderBy, pageOf, type ListAsked } from './paging'
import type { Writer } from './writing'

/** Who did it: user:ID, helper:ID of the link, guest, demo or system; and the name as others read it. */
export interface Actor { id: string, name: string }
export const SYSTEM: Actor = { id: 'system', name: 'Thimbleful' }
export const GUEST: Actor = { id: 'guest', name: 'someone without an account' }

export interface AuditEntry {
  at: string
  actor: Actor
  teamId: string | null
  /** `noun.verb`. */
  action: string
  objectType: string
  objectId: string
  objectName?: string
  version?: number | null
  reason?: string
  before?: unknown
  after?: unknown
  detail?: unknown
}

type Sealed = Pick<AuditRow, 'at' | 'actor' | 'actorName' | 'teamId' | 'action' | 'objectType' | 'objectId' | 'objectName' | 'version' | 'detailJson' | 'beforeJson' | 'afterJson' | 'reason' | 'previousHash'>

/** SHA-256 over a row and the hash before it: changing, dropping or swapping a row breaks every hash after it. */
export function hashOfAuditRow(row: Sealed): string {
  const whole = [row.previousHash, row.at, row.actor, row.actorName, row.teamId, row.action, row.objectType, row.objectId, row.objectName, row.version, row.detailJson, row.beforeJson, row.afterJson, row.reason]
  return createHash('sha256').update(JSON.stringify(whole)).digest('hex')
}

const json = (value: unknown) => value === undefined || value === null ? null : JSON.stringify(value)

/** Adds a row to the record. Call it inside the transaction of the change it tells of. */
export function writeAudit(tx: Writer, entry: AuditEntry): void {
  const last = tx.select({ hash: auditRecords.hash }).from(auditRecords).orderBy(desc(auditRecords.id)).limit(1).get()
  const row = {
    at: entry.at, actor: entry.actor.id, actorName: entry.actor.name, teamId: entry.teamId, action: entry.action, objectType: entry.objectType, objectId: entry.objectId,
    objectName: entry.objectName ?? '', version: entry.version ?? null, detailJson: json(entry.detail), beforeJson: json(entry.before), afterJson: json(entry.after), reason: entry.reason ?? '',
    previousHash: last?.hash ?? '',
  }
  tx.insert(auditRecords).values({ ...row, hash: hashOfAuditRow(row) }).run()
}

/** Rows older than the chain have no hash: the first row of the chain seals them all at once. */
export function beginChain(db: Db, at: string): void {
  db.transaction((tx) => {
    const older = tx.select().from(auditRecords).orderBy(auditRecords.id).all()
    if (older.some(row => row.hash !== null)) return
    writeAudit(tx, { at, actor: SYSTEM, teamId: null, action: 'record.begin', objectType: 'record', objectId: 'chain', detail: { rowsBefore: older.length, digestBefore: digestOf(older) } })
  }, { behavior: 'immediate' })
}

function digestOf(rows: AuditRow[]): string {
  const hash = createHash('sha256')
  for (const row of rows) hash.update(hashOfAuditRow({ ...row, previousHash: String(row.id) }))
  return hash.digest('hex')
}

export interface ChainVerdict { rows: number, head: string | null, problems: string[] }

const BATCH = 1000

function* rowsInOrder(db: Db): Generator<AuditRow> {
  for (let after = 0; ;) {
    const batch = db.select().from(auditRecords).where(gt(auditRecords.id, after)).orderBy(auditRecords.id).limit(BATCH).all()
    yield* batch
    if (batch.length < BATCH) return
    after = batch.at(-1)!.id
  }
}

/** Walks the whole record and says where it does not hold. */
export function verifyChain(db: Db): ChainVerdict {
  const problems: string[] = []
  const before: AuditRow[] = []
  let previous: AuditRow | null = null
  let rows = 0
  for (const row of rowsInOrder(db)) {
    rows += 1
    if (row.hash === null) {
      if (previous) problems.push(`Row ${row.id} (${row.at}) has no hash although the chain had begun.`)
      else before.push(row)
      continue
    }
    if (row.previousHash !== (previous?.hash ?? '')) problems.push(`Row ${row.id} (${row.at}) does not follow the row before it: a row is missing, added or moved.`)
    if (row.hash !== hashOfAuditRow(row)) problems.push(`Row ${row.id} (${row.at}, ${row.action}) was changed after it was written.`)
    if (!previous) problems.push(...problemsOfBeginning(row, before))
    previous = row
  }
  const counted = db.get<{ seq: number } | undefined>(sql`select seq from sqlite_sequence where name = 'audit_records'`)
  const last = previous?.id ?? before.at(-1)?.id ?? 0
  if (counted && counted.seq !== last) problems.push(`Rows were taken off the end: the last is ${last}, but ${counted.seq} were written.`)
  return { rows, head: previous?.hash ?? null, problems }
}

function problemsOfBeginning(first: AuditRow, before: AuditRow[]): string[] {
  if (first.action !== 'record.begin') return ['The first row of the chain is missing.']
  const detail = JSON.parse(first.detailJson ?? '{}') as { rowsBefore?: number, digestBefore?: string }
  return detail.rowsBefore === before.length && detail.digestBefore === digestOf(before) ? [] : ['The rows older than the chain were changed.']
}

export interface RecordAsked extends ListAsked { regimenId?: string, caseNumber?: string, action?: string }

function recordWhere(db: Db, teamId: string, asked: RecordAsked): SQL | undefined {
  const ofCase = asked.caseNumber ? db.select({ id: regimens.id }).from(regimens).where(and(eq(regimens.teamId, teamId), eq(regimens.caseNumber, asked.caseNumber))).all().map(row => row.id) : null
  return and(
    eq(auditRecords.teamId, teamId),
    asked.regimenId ? and(eq(auditRecords.objectType, 'regimen'), eq(auditRecords.objectId, asked.regimenId)) : undefined,
    ofCase ? and(eq(auditRecords.objectType, 'regimen'), inArray(auditRecords.objectId, ofCase)) : undefined,
    asked.action ? eq(auditRecords.action, asked.action) : undefined,
    asked.q ? like(sql`lower(${auditRecords.actorName} || ' ' || ${auditRecords.objectName} || ' ' || ${auditRecords.action} || ' ' || ${auditRecords.reason})`, sql`${likePattern(asked.q)} escape '\\'`) : undefined,
  )
}

/** The record of a team, newest first unless asked otherwise. */
export function listRecord(db: Db, teamId: string, asked: RecordAsked): Page<AuditRow> {
  const where = recordWhere(db, teamId, asked)
  return pageOf(db, auditRecords, where, asked, (limit, offset) => db.select().from(auditRecords).where(where).orderBy(...orderBy(asked.sort, { at: auditRecords.id }, auditRecords.id)).limit(limit).offset(offset).all(), row => row)
}

/** Whether something was written down of a plan since a moment: so that nobody is told twice. */
export function wasToldSince(db: Db, regimenId: string, action: string, since: string): boolean {
  return db.select({ id: auditRecords.id }).from(auditRecords).where(and(eq(auditRecords.objectType, 'regimen'), eq(auditRecords.objectId, regimenId), eq(auditRecords.action, action), gte(auditRecords.at, since))).limit(1).get() !== undefined
}
