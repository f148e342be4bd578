import { RegimenParams } from '#shared/schemas/regimen'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { takeIntoTeam } from '#server/utils/regimen/takeIntoTeam'
import { z } from 'zod'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'Takes a guest\'s plan that this browser remembers into the team; its private link changes nothing from then on', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'An empty object', content: { 'application/json': {} } }, responses: { 200: { description: '{ id }' }, 403: { description: 'Keepers and above' }, 404: { description: 'This browser remembers no such plan' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'plan.edit')
  const { id } = readParamsOf(event, RegimenParams)
  await readBodyOf(event, z.object({}))
  return { id: await takeIntoTeam(event, member, id) }
})
