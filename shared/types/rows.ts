/** Row types, inferred once from the schema. The only file of shared/ that looks at the database, and only at its types. */
import type { approvals, auditRecords, feedEntries, helperLinks, invitations, members, regimens, regimenVersions, sessions, teams, transfers, users, weighIns } from '../../server/db/schema'

export type RegimenRow = typeof regimens.$inferSelect
export type RegimenVersionRow = typeof regimenVersions.$inferSelect
export type AuditRow = typeof auditRecords.$inferSelect
export type UserRecord = typeof users.$inferSelect
export type SessionRecord = typeof sessions.$inferSelect
export type TeamRecord = typeof teams.$inferSelect
export type MemberRecord = typeof members.$inferSelect
export type InvitationRecord = typeof invitations.$inferSelect
export type HelperLinkRecord = typeof helperLinks.$inferSelect
export type ApprovalRecord = typeof approvals.$inferSelect
export type WeighInRecord = typeof weighIns.$inferSelect
export type FeedEntryRecord = typeof feedEntries.$inferSelect
export type TransferRecord = typeof transfers.$inferSelect
