import type { Plan } from '#shared/types/plan'
import { guestPlansOf } from '#server/utils/access/guestPlans'
import { isOpen } from '#server/utils/access/requireRegimen'
import { database, findRegimen, findRegimenVersion } from '#server/utils/data'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'The plans this browser\'s sealed cookie remembers', responses: { 200: { description: '{ items: [{ id, version, animalName, speciesName, createdAt, linkExpiresAt }] }' } } } })

export default defineEventHandler(async (event) => {
  const db = database()
  const now = new Date()
  const items = (await guestPlansOf(event)).flatMap(({ id, key }) => {
    const row = findRegimen(db, id)
    const newest = row && isOpen(row, key, now) ? findRegimenVersion(db, id, row.latestVersion) : undefined
    if (!row || !newest) return []
    const { animal } = JSON.parse(newest.planJson) as Plan
    return [{ id, version: row.latestVersion, animalName: animal.name, speciesName: animal.speciesName, createdAt: newest.createdAt, linkExpiresAt: row.linkExpiresAt }]
  })
  setResponseHeader(event, 'cache-control', 'private, no-store')
  return { items }
})
