import type { PlanRow, Wait } from '#shared/types/planLife'
import type { Page } from '#shared/types/team'
import { can } from '#shared/utils/abilities'
import type { Member } from '../access/requireMember'
import { database, listRegimens } from '../data'
import { planRow } from './teamPlan'

/** What waits for one person, oldest first. A check of one's own draft is for others. */
export function deskOf({ teamId, role, actor, settings }: Member, asked: { page: number, pageSize: number }): { approvals: Page<PlanRow>, checks: Page<PlanRow> } {
  const now = new Date()
  const waiting = (wait: Wait, open: boolean, notDraftedBy?: string): Page<PlanRow> => {
    if (!open) return { items: [], total: 0, ...asked }
    const page = listRegimens(database(), teamId, { ...asked, sort: 'waitingSince', q: '', waiting: wait, notDraftedBy })
    return { ...page, items: page.items.map(one => planRow(one, settings.timeZone, now)) }
  }
  return { approvals: waiting('approval', can(role, 'plan.approve')), checks: waiting('check', can(role, 'plan.check'), actor.id) }
}
