import { CodesConfirm } from '#shared/schemas/auth'
import { takeAttempt } from '#server/utils/access/attempts'
import { requireSignedIn } from '#server/utils/access/requireMember'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf } from '#server/utils/http/readInput'
import { confirmCodes } from '#server/utils/team/codes'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Turns one-time codes on with the first code; the recovery codes are shown this once', requestBody: { description: 'CodesConfirm', content: { 'application/json': {} } }, responses: { 200: { description: '{ recoveryCodes }' }, 401: { description: 'Not signed in' }, 422: { description: 'The code is wrong' }, 429: { description: 'Too many tries' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const who = await requireSignedIn(event)
  const { code } = await readBodyOf(event, CodesConfirm)
  const right = takeAttempt(event, 'code', who.user.email, useRuntimeConfig().rateLimitFactor)
  const recoveryCodes = await confirmCodes(event, who, code)
  right()
  setResponseHeader(event, 'cache-control', 'no-store')
  return { recoveryCodes }
})
