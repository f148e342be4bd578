import { MailParams } from '#shared/schemas/team'
import { requireMember } from '#server/utils/access/requireMember'
import { database, retryMail } from '#server/utils/data'
import { fail } from '#server/utils/http/fail'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf } from '#server/utils/http/readInput'
import { wakeMailWorker } from '#server/utils/mail/worker'
import { z } from 'zod'

defineRouteMeta({ openAPI: { tags: ['Team'], summary: 'Tries a failed mail again', parameters: [{ in: 'path', name: 'id', required: true }], requestBody: { description: 'An empty object', content: { 'application/json': {} } }, responses: { 204: { description: 'It is on its way' }, 403: { description: 'Only coordinators' }, 404: { description: 'No such mail that could be tried' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { teamId } = await requireMember(event, 'mail.see')
  const { id } = readParamsOf(event, MailParams)
  await readBodyOf(event, z.object({}))
  if (!retryMail(database(), teamId, id, new Date().toISOString())) throw fail({ status: 404, code: 'mail.notFound', message: 'There is no mail that could be tried again.' })
  wakeMailWorker()
  setResponseStatus(event, 204)
  return null
})
