import type { Me } from '#shared/types/team'
import { whoIs } from '#server/utils/access/signedIn'
import { meOf } from '#server/utils/team/meOf'

defineRouteMeta({ openAPI: { tags: ['Accounts'], summary: 'Who is signed in, in which team, with which role', responses: { 200: { description: 'Me, or { user: null }' } } } })

export default defineEventHandler(async (event): Promise<Me | { user: null }> => {
  setResponseHeader(event, 'cache-control', 'private, no-store')
  const who = await whoIs(event)
  return who ? meOf(who) : { user: null }
})
