import { PlansQuery } from '#shared/schemas/planLife'
import { guestPlansOf } from '#server/utils/access/guestPlans'
import { requireMember } from '#server/utils/access/requireMember'
import { whoIs } from '#server/utils/access/signedIn'
import { database, listRegimens } from '#server/utils/data'
import { readQueryOf } from '#server/utils/http/readInput'
import { rememberedPlans } from '#server/utils/regimen/rememberedPlans'
import { planRow } from '#server/utils/regimen/teamPlan'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'The plans of the team; signed out, or with of=browser, those this browser\'s sealed cookie remembers', parameters: [{ in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }, { in: 'query', name: 'state' }, { in: 'query', name: 'waiting' }, { in: 'query', name: 'room' }, { in: 'query', name: 'of' }], responses: { 200: { description: 'Page of PlanRow; of a browser { items: [{ id, version, animalName, speciesName, createdAt, linkExpiresAt }] }' } } } })

export default defineEventHandler(async (event) => {
  const { of, ...asked } = readQueryOf(event, PlansQuery)
  setResponseHeader(event, 'cache-control', 'private, no-store')
  if (of === 'browser' || (of === undefined && !await whoIs(event))) return { items: rememberedPlans(await guestPlansOf(event)) }
  const { teamId, settings } = await requireMember(event, 'plan.see')
  const now = new Date()
  const page = listRegimens(database(), teamId, asked)
  return { ...page, items: page.items.map(one => planRow(one, settings.timeZone, now)) }
})
