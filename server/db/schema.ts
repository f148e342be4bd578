import { sql } from 'drizzle-orm'
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'

const instant = (name: string) => text(name).notNull()

/** A feeding plan as a thing with a life: what is planned stands in its versions. */
export const regimens = sqliteTable('regimens', {
  /** Short enough to read aloud, long enough not to be guessed; the key is what opens it. */
  id: text('id').primaryKey(),
  latestVersion: integer('latest_version').notNull(),
  /** SHA-256 of the link's key, hex. The key itself is never stored. */
  keyHash: text('key_hash').notNull(),
  linkExpiresAt: instant('link_expires_at'),
  /** Set once teams own plans; a guest's plan has none. */
  teamId: text('team_id'),
  /** Invented, for the demonstration. */
  demo: integer('demo', { mode: 'boolean' }).notNull().default(false),
  createdAt: instant('created_at'),
  updatedAt: instant('updated_at'),
}, table => [index('regimens_team_id').on(table.teamId)])

/** Each version keeps its input, its result and its edition: printing it later never recalculates. */
export const regimenVersions = sqliteTable('regimen_versions', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  regimenId: text('regimen_id').notNull().references(() => regimens.id, { onDelete: 'restrict' }),
  version: integer('version').notNull(),
  edition: text('edition').notNull(),
  inputJson: text('input_json').notNull(),
  planJson: text('plan_json').notNull(),
  createdAt: instant('created_at'),
}, table => [uniqueIndex('regimen_versions_regimen_id_version').on(table.regimenId, table.version)])

/** Who did what, when. Written in the same transaction as the change; rows are only ever added. */
export const auditRecords = sqliteTable('audit_records', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  at: text('at').notNull().default(sql`(strftime('%Y-%m-%dT%H:%M:%fZ', 'now'))`),
  actor: text('actor').notNull(),
  action: text('action').notNull(),
  objectType: text('object_type').notNull(),
  objectId: text('object_id').notNull(),
  version: integer('version'),
  detailJson: text('detail_json'),
}, table => [index('audit_records_object').on(table.objectType, table.objectId)])
