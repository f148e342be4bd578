import { sql } from 'drizzle-orm'
import { index, integer, primaryKey, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { FEED_OUTCOMES, PLAN_STATES, WAITS } from '../../shared/types/planLife'
import { ROLES } from '../../shared/utils/abilities'

const instant = (name: string) => text(name).notNull()
const flag = (name: string) => integer(name, { mode: 'boolean' }).notNull().default(false)
const empty = (name: string) => text(name).notNull().default('')

// ── People and teams ──────────────────────────────────────────────────────────────────────────────────────────────

export const users = sqliteTable('users', {
  id: text('id').primaryKey(),
  name: text('name').notNull(),
  /** Lower case. */
  email: text('email').notNull(),
  passwordHash: text('password_hash').notNull(),
  /** Text of a vet's registration, as it is printed beside an approval. */
  registration: empty('registration'),
  /** Secret of the one-time codes, sealed with the server's secret; null without them. */
  codesSealed: text('codes_sealed'),
  /** The last time step a code was taken for: a code works once. */
  codesLastStep: integer('codes_last_step'),
  demo: flag('demo'),
  createdAt: instant('created_at'),
}, table => [uniqueIndex('users_email').on(table.email)])

export const recoveryCodes = sqliteTable('recovery_codes', {
  userId: text('user_id').notNull().references(() => users.id, { onDelete: 'restrict' }),
  codeHash: text('code_hash').notNull(),
  usedAt: text('used_at'),
}, table => [primaryKey({ columns: [table.userId, table.codeHash] })])

/** A sign-in of one browser. The cookie names it; everything else about it stands here, so that it can be ended. */
export const sessions = sqliteTable('sessions', {
  id: text('id').primaryKey(),
  userId: text('user_id').notNull().references(() => users.id, { onDelete: 'restrict' }),
  /** The team this browser works in. */
  teamId: text('team_id'),
  tokenHash: text('token_hash').notNull(),
  device: empty('device'),
  address: empty('address'),
  createdAt: instant('created_at'),
  lastSeenAt: instant('last_seen_at'),
  expiresAt: instant('expires_at'),
  endedAt: text('ended_at'),
}, table => [uniqueIndex('sessions_token_hash').on(table.tokenHash), index('sessions_user_id').on(table.userId)])

/** Links in mails that work once: a new password, a new e-mail address. */
export const userTokens = sqliteTable('user_tokens', {
  tokenHash: text('token_hash').primaryKey(),
  userId: text('user_id').notNull().references(() => users.id, { onDelete: 'restrict' }),
  kind: text('kind', { enum: ['reset', 'email'] }).notNull(),
  newEmail: text('new_email'),
  createdAt: instant('created_at'),
  expiresAt: instant('expires_at'),
  usedAt: text('used_at'),
})

export const teams = sqliteTable('teams', {
  id: text('id').primaryKey(),
  name: text('name').notNull(),
  settingsJson: text('settings_json').notNull(),
  demo: flag('demo'),
  createdAt: instant('created_at'),
})

export const members = sqliteTable('members', {
  id: text('id').primaryKey(),
  teamId: text('team_id').notNull().references(() => teams.id, { onDelete: 'restrict' }),
  userId: text('user_id').notNull().references(() => users.id, { onDelete: 'restrict' }),
  role: text('role', { enum: ROLES }).notNull(),
  joinedAt: instant('joined_at'),
  /** Nobody is deleted: what they did still needs their name. */
  leftAt: text('left_at'),
}, table => [
  uniqueIndex('members_team_id_user_id').on(table.teamId, table.userId).where(sql`left_at is null`),
  index('members_user_id').on(table.userId),
])

export const invitations = sqliteTable('invitations', {
  id: text('id').primaryKey(),
  teamId: text('team_id').notNull().references(() => teams.id, { onDelete: 'restrict' }),
  email: text('email').notNull(),
  role: text('role', { enum: ROLES }).notNull(),
  tokenHash: text('token_hash').notNull(),
  invitedBy: text('invited_by').notNull().references(() => users.id, { onDelete: 'restrict' }),
  createdAt: instant('created_at'),
  expiresAt: instant('expires_at'),
  acceptedAt: text('accepted_at'),
  withdrawnAt: text('withdrawn_at'),
}, table => [uniqueIndex('invitations_token_hash').on(table.tokenHash), index('invitations_team_id').on(table.teamId, table.createdAt)])

/** Links that open one animal, or one room, without an account. */
export const helperLinks = sqliteTable('helper_links', {
  id: text('id').primaryKey(),
  teamId: text('team_id').notNull().references(() => teams.id, { onDelete: 'restrict' }),
  /** One of the two is set. */
  regimenId: text('regimen_id').references(() => regimens.id, { onDelete: 'restrict' }),
  room: text('room'),
  purpose: text('purpose').notNull(),
  tokenHash: text('token_hash').notNull(),
  createdBy: text('created_by').notNull().references(() => users.id, { onDelete: 'restrict' }),
  createdAt: instant('created_at'),
  expiresAt: instant('expires_at'),
  revokedAt: text('revoked_at'),
  opened: integer('opened').notNull().default(0),
  lastOpenedAt: text('last_opened_at'),
  lastInitials: text('last_initials'),
}, table => [uniqueIndex('helper_links_token_hash').on(table.tokenHash), index('helper_links_team_id').on(table.teamId, table.createdAt)])

/** Wrong passwords, codes and links, per address and per account; the wait grows with them and outlives a restart. */
export const attempts = sqliteTable('attempts', {
  key: text('key').primaryKey(),
  failures: integer('failures').notNull(),
  lastAt: instant('last_at'),
})

/** Every mail this application sends: a queue with its past. */
export const mails = sqliteTable('mails', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  /** Whose coordinators see it; null for mails about an account. */
  teamId: text('team_id'),
  toAddress: text('to_address').notNull(),
  kind: text('kind').notNull(),
  subject: text('subject').notNull(),
  /** Emptied once sent: links in it open things. */
  text: text('text').notNull(),
  html: text('html').notNull(),
  state: text('state', { enum: ['waiting', 'sent', 'failed', 'kept'] }).notNull(),
  attempts: integer('attempts').notNull().default(0),
  createdAt: instant('created_at'),
  nextAttemptAt: text('next_attempt_at'),
  sentAt: text('sent_at'),
  problem: text('problem'),
}, table => [index('mails_state').on(table.state, table.nextAttemptAt), index('mails_team_id').on(table.teamId, table.createdAt)])

// ── Plans ─────────────────────────────────────────────────────────────────────────────────────────────────────────

/** A feeding plan as a thing with a life: what is planned stands in its versions. */
export const regimens = sqliteTable('regimens', {
  /** Short enough to read aloud, long enough not to be guessed; the key is what opens it. */
  id: text('id').primaryKey(),
  latestVersion: integer('latest_version').notNull(),
  /** SHA-256 of the link's key, hex. The key itself is never stored. */
  keyHash: text('key_hash').notNull(),
  linkExpiresAt: instant('link_expires_at'),
  /** A guest's plan has none. Once a team owns it, the private link of the guest opens it no more. */
  teamId: text('team_id'),
  /** Invented, for the demonstration. */
  demo: flag('demo'),
  createdAt: instant('created_at'),
  updatedAt: instant('updated_at'),
  state: text('state', { enum: PLAN_STATES }).notNull().default('draft'),
  waiting: text('waiting', { enum: WAITS }),
  waitingSince: text('waiting_since'),
  askedBy: text('asked_by'),
  /** Of the newest version. */
  draftedById: text('drafted_by_id'),
  draftedBy: empty('drafted_by'),
  checkedById: text('checked_by_id'),
  checkedBy: text('checked_by'),
  checkedAt: text('checked_at'),
  sentBackJson: text('sent_back_json'),
  /** When and why it was finished or stopped, or which team took it over. */
  endedAt: text('ended_at'),
  endedReason: text('ended_reason'),
  movedAt: text('moved_at'),
  // What lists show, sort and search, from the newest version.
  animalName: empty('animal_name'),
  caseNumber: empty('case_number'),
  speciesName: empty('species_name'),
  enclosure: empty('enclosure'),
  room: empty('room'),
  weightG: real('weight_g').notNull().default(0),
  goodUntil: empty('good_until'),
  searchText: empty('search_text'),
  lastWeightG: real('last_weight_g'),
  lastWeighedAt: text('last_weighed_at'),
}, table => [
  index('regimens_team_id').on(table.teamId, table.updatedAt),
  index('regimens_team_id_waiting').on(table.teamId, table.waiting, table.waitingSince),
  index('regimens_team_id_room').on(table.teamId, table.room),
])

/** Each version keeps its input, its result and its edition: printing it later never recalculates. */
export const regimenVersions = sqliteTable('regimen_versions', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  regimenId: text('regimen_id').notNull().references(() => regimens.id, { onDelete: 'restrict' }),
  version: integer('version').notNull(),
  edition: text('edition').notNull(),
  inputJson: text('input_json').notNull(),
  planJson: text('plan_json').notNull(),
  createdAt: instant('created_at'),
  authorId: text('author_id'),
  author: empty('author'),
  note: empty('note'),
}, table => [uniqueIndex('regimen_versions_regimen_id_version').on(table.regimenId, table.version)])

export const approvals = sqliteTable('approvals', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  teamId: text('team_id').notNull(),
  regimenId: text('regimen_id').notNull().references(() => regimens.id, { onDelete: 'restrict' }),
  version: integer('version').notNull(),
  weightG: real('weight_g').notNull(),
  fromDate: text('from_date').notNull(),
  goodUntil: text('good_until').notNull(),
  edition: text('edition').notNull(),
  userId: text('user_id').notNull().references(() => users.id, { onDelete: 'restrict' }),
  vetName: text('vet_name').notNull(),
  registration: text('registration').notNull(),
  note: empty('note'),
  at: instant('at'),
  lapsedAt: text('lapsed_at'),
  lapseReason: text('lapse_reason'),
}, table => [index('approvals_regimen_id').on(table.regimenId, table.version), index('approvals_standing').on(table.goodUntil).where(sql`lapsed_at is null`)])

export const weighIns = sqliteTable('weigh_ins', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  teamId: text('team_id').notNull(),
  regimenId: text('regimen_id').notNull().references(() => regimens.id, { onDelete: 'restrict' }),
  weightG: real('weight_g').notNull(),
  weighedAt: instant('weighed_at'),
  by: text('by').notNull(),
  /** What it did to the plan, in a sentence. */
  effect: empty('effect'),
  createdAt: instant('created_at'),
}, table => [index('weigh_ins_regimen_id').on(table.regimenId, table.weighedAt)])

export const feedEntries = sqliteTable('feed_entries', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  teamId: text('team_id').notNull(),
  regimenId: text('regimen_id').notNull().references(() => regimens.id, { onDelete: 'restrict' }),
  version: integer('version').notNull(),
  at: instant('at'),
  dueAt: text('due_at'),
  outcome: text('outcome', { enum: FEED_OUTCOMES }).notNull(),
  takenMl: real('taken_ml'),
  note: empty('note'),
  initials: text('initials').notNull(),
  by: text('by').notNull(),
  struckAt: text('struck_at'),
  struckReason: text('struck_reason'),
}, table => [index('feed_entries_regimen_id').on(table.regimenId, table.at)])

/** An animal's plan and papers on their way to another team. */
export const transfers = sqliteTable('transfers', {
  id: text('id').primaryKey(),
  teamId: text('team_id').notNull().references(() => teams.id, { onDelete: 'restrict' }),
  regimenId: text('regimen_id').notNull().references(() => regimens.id, { onDelete: 'restrict' }),
  tokenHash: text('token_hash').notNull(),
  note: empty('note'),
  createdById: text('created_by_id').notNull().references(() => users.id, { onDelete: 'restrict' }),
  createdAt: instant('created_at'),
  expiresAt: instant('expires_at'),
  state: text('state', { enum: ['open', 'accepted', 'declined', 'withdrawn'] }).notNull().default('open'),
  decidedAt: text('decided_at'),
  decidedBy: text('decided_by'),
  otherTeamId: text('other_team_id'),
  newRegimenId: text('new_regimen_id'),
}, table => [uniqueIndex('transfers_token_hash').on(table.tokenHash), index('transfers_team_id').on(table.teamId, table.createdAt)])

// ── Record ────────────────────────────────────────────────────────────────────────────────────────────────────────

/** Who did what, when. Written in the same transaction as the change; rows are only ever added, each sealing the one before. */
export const auditRecords = sqliteTable('audit_records', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  at: text('at').notNull().default(sql`(strftime('%Y-%m-%dT%H:%M:%fZ', 'now'))`),
  /** user:ID, helper:ID of the link, guest, demo, or system. */
  actor: text('actor').notNull(),
  actorName: empty('actor_name'),
  teamId: text('team_id'),
  action: text('action').notNull(),
  objectType: text('object_type').notNull(),
  objectId: text('object_id').notNull(),
  objectName: empty('object_name'),
  version: integer('version'),
  detailJson: text('detail_json'),
  beforeJson: text('before_json'),
  afterJson: text('after_json'),
  reason: empty('reason'),
  /** SHA-256 over this row and the hash before it, hex; null only for rows older than the chain. */
  previousHash: text('previous_hash'),
  hash: text('hash'),
}, table => [index('audit_records_object').on(table.objectType, table.objectId), index('audit_records_team_id').on(table.teamId, table.id)])
