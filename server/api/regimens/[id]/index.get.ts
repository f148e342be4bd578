import { RegimenParams, RegimenQuery } from '#shared/schemas/regimen'
import type { SavedRegimen } from '#shared/types/plan'
import { rememberGuestPlan } from '#server/utils/access/guestPlans'
import { requireRegimen } from '#server/utils/access/requireRegimen'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { teamInfo } from '#server/utils/regimen/teamPlan'
import { versionOf } from '#server/utils/regimen/versionOf'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'A saved plan, as it was saved; with its life for members of its team', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'key' }, { in: 'query', name: 'version' }], responses: { 200: { description: 'SavedRegimen' }, 404: { description: 'No such plan, wrong key, or the link has ended' } } } })

export default defineEventHandler(async (event): Promise<SavedRegimen> => {
  await limitRequests(event, 'read', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const { key, version } = readQueryOf(event, RegimenQuery)
  const { row, via, member } = await requireRegimen(event, id, key, 'plan.see')
  // Opened by its link, a guest's plan is in this browser's list from now on.
  if (key && via === 'key' && row.teamId === null) await rememberGuestPlan(event, { id, key })
  setResponseHeader(event, 'cache-control', 'private, no-store')
  return { ...versionOf(row, version), ...(member && { team: teamInfo(row, member) }) }
})
