import { send, setResponseHeader, setResponseStatus } from 'h3'
import { defineNitroErrorHandler } from 'nitropack/runtime'
import { failureForLog } from './utils/http/failureForLog'
import { toApiError } from './utils/http/toApiError'

/**
 * Every failure under /api answers in one shape. Any other is left to the next handler: Nuxt's, which shows error.vue.
 */
export default defineNitroErrorHandler((error, event) => {
  if (event.handled) return
  const path = event.path.split('?')[0]!
  if (path !== '/api' && !path.startsWith('/api/')) {
    if (import.meta.dev) return
    // The next handler would log the whole address, and the address of a plan holds its key.
    if (error.unhandled) {
      console.error(failureForLog({ method: event.method, path }, error))
      error.message = 'Server Error'
      error.data = undefined
    }
    error.unhandled = error.fatal = false
    return
  }
  const { status, statusMessage, data } = toApiError(error)
  if (status >= 500) console.error(failureForLog({ method: event.method, path }, error))
  setResponseStatus(event, status, statusMessage)
  setResponseHeader(event, 'content-type', 'application/json')
  setResponseHeader(event, 'cache-control', 'no-store')
  return send(event, JSON.stringify({ statusCode: status, statusMessage, message: data.message, data }))
})
