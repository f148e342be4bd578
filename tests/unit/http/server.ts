import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { createApp, eventHandler, setResponseHeader, setResponseStatus, toNodeListener, type H3Event } from 'h3'
import { toApiError } from '../../../server/utils/http/toApiError'

/** Serves one handler over real HTTP, its failures in our shape. */
export async function serve(handler: (event: H3Event) => unknown): Promise<{ url: string, close: () => Promise<void> }> {
  const app = createApp({
    onError(error, event) {
      const { status, statusMessage, data } = toApiError(error)
      setResponseStatus(event, status, statusMessage)
      setResponseHeader(event, 'content-type', 'application/json')
      event.node.res.end(JSON.stringify({ data }))
    },
  })
  app.use(eventHandler(handler))
  const server: Server = createServer(toNodeListener(app))
  await new Promise<void>(resolve => server.listen(0, '127.0.0.1', resolve))
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    close: () => new Promise((resolve) => {
      server.closeAllConnections()
      server.close(() => resolve())
    }),
  }
}
