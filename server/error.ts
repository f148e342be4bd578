import { send, setResponseHeader, setResponseStatus } from 'h3'
import { toApiError } from './utils/http/toApiError'
import { defineNitroErrorHandler } from 'nitropack/runtime'

/**
 * Every failure under /api answers in one shape. Pages fall through to Nuxt's own error page (error.vue).
 */
export default defineNitroErrorHandler((error, event, context) => {
  if (!event.path.startsWith('/api/')) return context?.defaultHandler(error, event)
  const { status, statusMessage, data } = toApiError(error)
  if (status >= 500) console.error(`${event.method} ${event.path.split('?')[0]}`, error)
  setResponseStatus(event, status, statusMessage)
  setResponseHeader(event, 'content-type', 'application/json')
  setResponseHeader(event, 'cache-control', 'no-store')
  return send(event, JSON.stringify({ statusCode: status, statusMessage, message: data.message, data }))
})
