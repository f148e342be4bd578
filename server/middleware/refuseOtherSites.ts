import { getHeader } from 'h3'
import { fail } from '../utils/http/fail'

const LOOKING_ONLY = ['GET', 'HEAD', 'OPTIONS']

/** A page of another site may not save or print here in the name of someone who visits it. Programs do not send this header. */
export default defineEventHandler((event) => {
  if (!event.path.startsWith('/api/') || LOOKING_ONLY.includes(event.method)) return
  if (getHeader(event, 'sec-fetch-site') === 'cross-site') throw fail({ status: 403, code: 'request.otherSite', message: 'Another site sent this request, so nothing was done. Open the plan here and try again.' })
})
