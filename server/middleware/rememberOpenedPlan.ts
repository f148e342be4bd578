import { getQuery, getRequestPath } from 'h3'
import { rememberGuestPlan } from '../utils/access/guestPlans'
import { opensRegimen } from '../utils/access/requireRegimen'

/**
 * A plan opened by its link is in this browser's list from then on. The page fetches the plan on the server, and a
 * cookie set for that fetch would not reach the browser: it is set here, on the page itself.
 */
export default defineEventHandler(async (event) => {
  if (event.method !== 'GET') return
  const id = /^\/plans\/([a-z0-9]{1,64})$/.exec(getRequestPath(event).split('?')[0]!)?.[1]
  const { key } = getQuery(event)
  if (id && typeof key === 'string' && opensRegimen(id, key)) await rememberGuestPlan(event, { id, key })
})
