import { RowParams } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { inviteAgain } from '#server/utils/team/invitations'
import { z } from 'zod'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Sends an invitation again; the link of the earlier mail ends', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'An empty object', content: { 'application/json': {} } }, responses: { 200: { description: '{ id, expiresAt }' }, 403: { description: 'Only coordinators' }, 404: { description: 'No such open invitation' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const member = await requireMember(event, 'people.change')
  const { id } = readParamsOf(event, RowParams)
  await readBodyOf(event, z.object({}))
  return inviteAgain(event, member, id)
})
