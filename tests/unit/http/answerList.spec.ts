import { gunzipSync } from 'node:zlib'
import { createApp, defineEventHandler, toWebHandler } from 'h3'
import { describe, expect, it } from 'vitest'
import { answerList } from '#server/utils/http/answerList'

const items = new Map([['a', { id: 'a', name: 'Leopard gecko, 26–32 °C' }], ['b', { id: 'b', name: 'Adder' }]])
const whole = { edition: '2026-12', items: [...items.values()] }
const app = createApp().use('/list', defineEventHandler(event => answerList(event, '2026-12', items)))
const ask = (headers: Record<string, string> = {}) => toWebHandler(app)(new Request('http://127.0.0.1/list', { headers }))

describe('answerList', () => {
  it('answers the whole list with a tag that asks to be checked each time', async () => {
    const answer = await ask()
    expect(answer.status).toBe(200)
    expect(answer.headers.get('cache-control')).toBe('public, max-age=0, must-revalidate')
    expect(answer.headers.get('etag')).toMatch(/^W\/"[\w-]{40,}"$/)
    expect(answer.headers.get('content-encoding')).toBeNull()
    expect(await answer.json()).toEqual(whole)
  })
  it('answers 304 without a body to who has the list, whichever of his tags it is', async () => {
    const etag = (await ask()).headers.get('etag')!
    for (const given of [etag, `W/"another", ${etag}`, '*']) {
      const answer = await ask({ 'if-none-match': given })
      expect(answer.status, given).toBe(304)
      expect(await answer.text(), given).toBe('')
      expect(answer.headers.get('etag'), given).toBe(etag)
    }
    expect((await ask({ 'if-none-match': 'W/"old"' })).status).toBe(200)
  })
  it.each([['gzip', true], ['br, gzip;q=0.5', true], ['*', true], ['gzip;q=0', false], ['gzip; q=0.0', false], ['br', false], ['', false]])('compresses for "%s": %s', async (header, expected) => {
    const answer = await ask({ 'accept-encoding': header })
    expect(answer.headers.get('vary')).toBe('accept-encoding')
    expect(answer.headers.get('content-encoding') === 'gzip').toBe(expected)
    const body = Buffer.from(await answer.arrayBuffer())
    expect(answer.headers.get('content-type')).toContain('application/json')
    expect(JSON.parse((expected ? gunzipSync(body) : body).toString('utf8'))).toEqual(whole)
  })
  it('gives another list another tag', async () => {
    const other = createApp().use('/list', defineEventHandler(event => answerList(event, '2027-02', new Map(items))))
    const tag = (await toWebHandler(other)(new Request('http://127.0.0.1/list'))).headers.get('etag')
    expect(tag).not.toBe((await ask()).headers.get('etag'))
  })
})
