import type { z } from 'zod'
import type { RecordQuery } from '#shared/schemas/team'
import type { RecordRow } from '#shared/types/team'
import type { AuditRow } from '#shared/types/rows'
import { database, listRecord } from '../data'

const ACTIONS: Record<string, string> = {
  'regimen.create': 'saved a plan', 'regimen.change': 'saved a new version', 'regimen.take': 'took a plan into the team',
  'plan.askCheck': 'asked for a check', 'plan.check': 'checked the version', 'plan.askApproval': 'asked a vet to approve', 'plan.approve': 'approved the version', 'plan.sendBack': 'sent the version back',
  'plan.use': 'put the plan in use', 'plan.waitsLong': 'reminded of a waiting approval', 'plan.finish': 'finished the plan', 'plan.stop': 'stopped the plan', 'approval.lapse': 'ended the approval',
  'weight.add': 'weighed the animal', 'feed.log': 'wrote down a feed', 'feed.strike': 'struck a line of the log out',
  'link.create': 'made a link for helpers', 'link.revoke': 'took a link back', 'link.open': 'opened a link for helpers',
  'invitation.create': 'invited somebody', 'invitation.resend': 'sent an invitation again', 'invitation.withdraw': 'withdrew an invitation',
  'member.join': 'joined the team', 'member.changeRole': 'changed a role', 'member.remove': 'took somebody out of the team', 'member.leave': 'left the team',
  'team.create': 'made the team', 'team.change': 'changed the settings', 'session.begin': 'signed in', 'session.end': 'signed a browser out',
  'user.change': 'changed the profile', 'user.changePassword': 'changed the password', 'user.resetPassword': 'set a new password', 'user.changeEmail': 'changed the e-mail address', 'user.codesOn': 'turned one-time codes on', 'user.codesOff': 'turned one-time codes off',
  'transfer.offer': 'made a link to hand the animal over', 'transfer.withdraw': 'took that link back', 'transfer.decline': 'declined to take the animal', 'transfer.accept': 'took the animal over', 'transfer.receive': 'received the animal',
  'record.begin': 'began the record',
}

/** A row as people read it. */
export function recordRow(row: AuditRow): RecordRow {
  const { id, at, actorName, actor, action, objectType, objectId, objectName, version, reason, hash } = row
  return {
    id, at, actor: actorName || actor, action, what: ACTIONS[action] ?? action, objectType, objectId, objectName, version, reason,
    before: row.beforeJson ? JSON.parse(row.beforeJson) as unknown : null, after: row.afterJson ? JSON.parse(row.afterJson) as unknown : null, hash: hash ?? '',
  }
}

const COLUMNS = ['id', 'at', 'actor', 'action', 'what', 'objectType', 'objectId', 'objectName', 'version', 'reason', 'before', 'after', 'hash'] as const
const BATCH = 500

/** The record as CSV (RFC 4180), every page of it. */
export function recordCsv(teamId: string, asked: z.output<typeof RecordQuery>): string {
  const lines = [COLUMNS.join(',')]
  for (let page = 1; ; page += 1) {
    const { items } = listRecord(database(), teamId, { ...asked, page, pageSize: BATCH })
    for (const item of items.map(recordRow)) lines.push(COLUMNS.map(column => csvField(item[column])).join(','))
    if (items.length < BATCH) return `${lines.join('\r\n')}\r\n`
  }
}

/** A field that begins like a formula gets an apostrophe: a spreadsheet would run what somebody typed as a name. */
export function csvField(value: unknown): string {
  const text = value === null || value === undefined ? '' : typeof value === 'object' ? JSON.stringify(value) : String(value)
  const safe = /^[=+\-@\t\r]/.test(text) ? `'${text}` : text
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}
