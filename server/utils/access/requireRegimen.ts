import type { H3Event } from 'h3'
import type { RegimenRow } from '#shared/types/rows'
import { database, findRegimen } from '../data'
import { fail } from '../http/fail'
import { guestPlansOf } from './guestPlans'
import { keyFits } from './linkKey'

/**
 * The plan that a request may see: by the key of its private link, or because this browser's cookie remembers it.
 * Anyone may look at the invented plans of the demonstration; nobody changes them.
 * Wrong key, ended link and no such plan are the same answer, so that nothing can be found out by trying.
 * @returns the row that was checked, so that a handler cannot skip the check.
 */
export async function requireRegimen(event: H3Event, id: string, key: string | undefined, purpose: 'look' | 'change'): Promise<RegimenRow> {
  const row = findRegimen(database(), id)
  if (row?.demo) {
    if (purpose === 'look') return row
    throw fail({ status: 403, code: 'regimen.demo', message: 'This plan belongs to the demonstration and stays as it is. Save one of your own from the planner.' })
  }
  const usedKey = key ?? (await guestPlansOf(event)).find(one => one.id === id)?.key
  if (!row || usedKey === undefined || !isOpen(row, usedKey, new Date())) {
    throw fail({ status: 404, code: 'regimen.notFound', message: 'There is no plan behind this link, or the link has ended. Links are good for 30 days; ask who sent it for a new one.' })
  }
  return row
}

/** Whether a key opens a plan now. */
export function isOpen(row: Pick<RegimenRow, 'keyHash' | 'linkExpiresAt'>, key: string, now: Date): boolean {
  return keyFits(key, row.keyHash) && row.linkExpiresAt > now.toISOString()
}

/** Whether a key opens the plan of that id now; never so for the demonstration, which needs none. */
export function opensRegimen(id: string, key: string): boolean {
  const row = findRegimen(database(), id)
  return row !== undefined && !row.demo && isOpen(row, key, new Date())
}
