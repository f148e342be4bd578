import { getHeader, getRequestHost } from 'h3'
import { fail } from '../utils/http/fail'

const LOOKING_ONLY = ['GET', 'HEAD', 'OPTIONS']

/** A page of another site may not save or print here in the name of someone who visits it. Programs send neither header. */
export default defineEventHandler((event) => {
  if (!event.path.startsWith('/api/') || LOOKING_ONLY.includes(event.method)) return
  const site = getHeader(event, 'sec-fetch-site')
  if (site === 'cross-site' || site === 'same-site' || isOtherOrigin(getHeader(event, 'origin'), getRequestHost(event, { xForwardedHost: true }))) {
    throw fail({ status: 403, code: 'request.otherSite', message: 'Another site sent this request, so nothing was done. Open the plan here and try again.' })
  }
})

function isOtherOrigin(origin: string | undefined, host: string): boolean {
  if (origin === undefined) return false
  try {
    return new URL(origin).host !== host
  }
  catch { return true }
}
