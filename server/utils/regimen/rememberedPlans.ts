import type { Plan } from '#shared/types/plan'
import { isOpen } from '../access/requireRegimen'
import type { GuestPlan } from '../access/sealedCookie'
import { database, findRegimen, findRegimenVersion } from '../data'

/** Plans of a browser that its links still open. Those a team took over are in that team's list. */
export function rememberedPlans(known: GuestPlan[]) {
  const db = database()
  const now = new Date()
  return known.flatMap(({ id, key }) => {
    const row = findRegimen(db, id)
    const newest = row && row.teamId === null && isOpen(row, key, now) ? findRegimenVersion(db, id, row.latestVersion) : undefined
    if (!row || !newest) return []
    const { animal } = JSON.parse(newest.planJson) as Plan
    return [{ id, version: row.latestVersion, animalName: animal.name, speciesName: animal.speciesName, createdAt: newest.createdAt, linkExpiresAt: row.linkExpiresAt }]
  })
}
