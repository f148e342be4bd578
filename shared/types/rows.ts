/** Row types, inferred once from the schema. The only file of shared/ that looks at the database, and only at its types. */
import type { auditRecords, regimens, regimenVersions } from '../../server/db/schema'

export type RegimenRow = typeof regimens.$inferSelect
export type RegimenVersionRow = typeof regimenVersions.$inferSelect
export type AuditRow = typeof auditRecords.$inferSelect
