import { afterEach, describe, expect, it } from 'vitest'
import { limitRequests } from '../../../server/utils/http/limitRequests'
import type { ApiErrorData } from '../../../shared/types/error'
import { serve } from './server'

let server: Awaited<ReturnType<typeof serve>>
afterEach(() => server.close())

describe('limitRequests', () => {
  it('refuses what is too much, says when to come back, and counts each kind by itself', async () => {
    // A twentieth of the usual 60 a minute: three.
    server = await serve(async (event) => {
      await limitRequests(event, event.path === '/save' ? 'save' : 'print', 0.05)
      return 'ok'
    })
    const statuses = []
    for (let count = 0; count < 5; count += 1) statuses.push((await fetch(`${server.url}/save`)).status)
    expect(statuses).toEqual([200, 200, 200, 429, 429])
    const refused = await fetch(`${server.url}/save`)
    expect(Number(refused.headers.get('retry-after'))).toBeGreaterThanOrEqual(1)
    expect(Number(refused.headers.get('retry-after'))).toBeLessThanOrEqual(60)
    expect(((await refused.json()) as { data: ApiErrorData }).data.code).toBe('request.tooMany')
    expect((await fetch(`${server.url}/print`)).status).toBe(200)
  })

  it('lets a person type: twenty previews a second for half a minute', async () => {
    server = await serve(async (event) => {
      await limitRequests(event, 'preview', 1)
      return 'ok'
    })
    let refused = 0
    for (let count = 0; count < 600; count += 1) refused += (await fetch(server.url)).status === 429 ? 1 : 0
    expect(refused).toBe(0)
    expect((await fetch(server.url)).status).toBe(429)
  })
})
