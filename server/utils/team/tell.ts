import type { Role } from '#shared/utils/abilities'
import { insertMail, membersWithRole, type Writer } from '../data'
import type { MailContent } from '../mail/layout'
import { hasMailService, wakeMailWorker } from '../mail/worker'

/** Queues a mail inside the transaction of what it tells of; it leaves after the request, never within it. */
export function queueMail(tx: Writer, teamId: string | null, to: string, mail: MailContent, at: string): void {
  insertMail(tx, { teamId, to, ...mail, at, hasService: hasMailService() })
  wakeMailWorker()
}

/** The same mail to everyone of these roles, but not to the one who caused it. */
export function tellRoles(tx: Writer, teamId: string, roles: readonly Role[], exceptUserId: string | null, mail: MailContent, at: string): void {
  for (const { email } of membersWithRole(tx, teamId, roles).filter(one => one.userId !== exceptUserId)) queueMail(tx, teamId, email, mail, at)
}
