import type { Plan } from '#shared/types/plan'
import { guestPlansOf } from '#server/utils/access/guestPlans'
import { database, findRegimen, findRegimenVersion } from '#server/utils/data'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'The plans this browser\'s sealed cookie remembers', responses: { 200: { description: '{ items: [{ id, version, animalName, speciesName, createdAt, linkExpiresAt }] }' } } } })

export default defineEventHandler(async (event) => {
  const db = database()
  const now = new Date().toISOString()
  const items = (await guestPlansOf(event)).flatMap(({ id }) => {
    const row = findRegimen(db, id)
    const newest = row && row.linkExpiresAt > now ? findRegimenVersion(db, id, row.latestVersion) : undefined
    if (!row || !newest) return []
    const { animal } = JSON.parse(newest.planJson) as Plan
    return [{ id, version: row.latestVersion, animalName: animal.name, speciesName: animal.speciesName, createdAt: newest.createdAt, linkExpiresAt: row.linkExpiresAt }]
  })
  return { items }
})
