import { describe, expect, it } from 'vitest'
import { filesUnder } from '../../guards/files'
import { baseUrl } from '../server'
import { ask, expectOurShape, juniper, rowCounts } from './client'

interface OpenApi { info: { title: string, version: string }, paths: Record<string, Record<string, { summary?: string, responses?: Record<string, { description?: string }>, requestBody?: { description?: string } }>> }

/** Every route by its file: `[id]/sheet.pdf.get.ts` is `get /api/regimens/{id}/sheet.pdf`. The catch-all is none of them. */
function routesInFiles(): string[] {
  return filesUnder('server/api', ['.ts']).filter(file => !file.includes('[...]')).map((file) => {
    const [, path, method] = /^server(.+?)(?:\/index)?\.(get|post|put|patch|delete)\.ts$/.exec(file) ?? []
    return `${method} ${path?.replace(/\[(\w+)\]/g, '{$1}')}`
  }).sort()
}

describe('an address', () => {
  it.each(['GET', 'POST', 'PUT', 'PATCH', 'DELETE'])('that is none answers 404 to %s', async method => expectOurShape(await ask(method, '/api/nothing/here', method === 'GET' ? undefined : {}), 404, 'route.notFound'))
  it.each(['/api', '/api/', '/api/regimens/a/b', '/api/%E0%A4%A', '/api/..%2f..%2fetc/passwd', `/api/${'x'.repeat(5000)}`])('%s answers 404', async path => expectOurShape(await ask('GET', path), 404))
  it.each([['DELETE', '/api/regimens', 'GET, POST'], ['PUT', '/api/regimens/abc', 'GET, PATCH'], ['DELETE', '/api/regimens/abc', 'GET, PATCH'], ['POST', '/api/health', 'GET'], ['PUT', '/api/regimens/abc/sheet.pdf', 'GET']])('answers 405 to %s %s and says what it takes', async (method, path, allowed) => {
    const answer = await ask(method, path, {})
    expectOurShape(answer, 405, 'route.method')
    expect(answer.headers.get('allow')).toBe(allowed)
  })
  it('of a page that is none shows a page in plain words, not a list of fields', async () => {
    const answer = await ask('GET', '/nothing-here', undefined, { accept: 'text/html' })
    expect(answer.status).toBe(404)
    expect(answer.headers.get('content-type')).toContain('text/html')
    expect(answer.text).toContain('There is no page here')
  })
})

describe('health', () => {
  it('says that it is up, with what', async () => {
    expect((await ask('GET', '/api/health')).json).toEqual({ ok: true, edition: expect.stringMatching(/^\d{4}-\d{2}$/) as string, version: expect.stringMatching(/^\d+\.\d+\.\d+$/) as string })
  })
})

describe('the OpenAPI document', () => {
  it('describes every route: what it is for, what it takes, what it answers', async () => {
    const { json } = await ask<OpenApi>('GET', '/_openapi.json')
    expect(json.info.title).toBe('Thimbleful')
    const own = Object.entries(json.paths).filter(([path]) => path.startsWith('/api/') && !path.includes('*'))
    const listed = own.flatMap(([path, methods]) => Object.keys(methods).map(method => `${method} ${path}`))
    expect(listed.sort()).toEqual(routesInFiles())
    for (const [path, methods] of own) {
      for (const [method, described] of Object.entries(methods)) {
        expect(described.summary, `${method} ${path}`).toMatch(/\w{3,}/)
        expect(Object.values(described.responses ?? {}).every(answer => (answer.description ?? '').length > 2), `${method} ${path}`).toBe(true)
        if (method === 'post' || method === 'patch') expect(described.requestBody?.description, `${method} ${path}`).toBeTruthy()
      }
    }
  })
})

describe('the shapes in the OpenAPI document', () => {
  it('are the schemas that check what is sent', async () => {
    const { json } = await ask<{ components: { schemas: Record<string, { required: string[], properties: Record<string, { properties?: Record<string, unknown> }> }> }, paths: Record<string, Record<string, { requestBody: { content: unknown } }>> }>('GET', '/_openapi.json')
    const { RegimenInput, RegimenChange } = json.components.schemas
    expect(RegimenInput!.required).toEqual(expect.arrayContaining(['animal', 'feed', 'route', 'feedingHours', 'startAt', 'timeZone']))
    expect(Object.keys(RegimenInput!.properties.animal!.properties!)).toEqual(expect.arrayContaining(['speciesId', 'weightG', 'drynessPercent', 'signs']))
    expect(RegimenChange!.properties).toHaveProperty('baseVersion')
    expect(json.paths['/api/regimens/preview']!.post!.requestBody.content).toEqual({ 'application/json': { schema: { $ref: '#/components/schemas/RegimenInput' } } })
  })
})

describe('headers', () => {
  it.each(['/', '/plans/abc?key=secret', '/api/health'])('of %s send no address on and let nobody guess a type', async (path) => {
    const { headers } = await fetch(baseUrl() + path, { headers: { accept: 'text/html' } })
    expect(headers.get('referrer-policy')).toBe('no-referrer')
    expect(headers.get('x-content-type-options')).toBe('nosniff')
    expect(headers.get('strict-transport-security')).toBeNull()
    expect(headers.get('x-powered-by')).toBeNull()
  })

  it('of a page allow scripts by a nonce of that page only, and do not force https', async () => {
    const nonces = await Promise.all([1, 2].map(async () => {
      const { headers, text } = await ask('GET', '/', undefined, { accept: 'text/html' })
      const policy = headers.get('content-security-policy') ?? ''
      expect(policy).not.toContain('upgrade-insecure-requests')
      expect(policy).toMatch(/default-src 'self'/)
      expect(/script-src[^;]*/.exec(policy)?.[0]).not.toContain('unsafe-inline')
      const nonce = /'nonce-([^']+)'/.exec(policy)?.[1]
      expect(nonce).toBeTruthy()
      const scripts = [...text.matchAll(/<script\b[^>]*>/g)].map(match => match[0]).filter(tag => !tag.includes('type="application/json"'))
      for (const tag of scripts) expect(tag).toContain(`nonce="${nonce}"`)
      return nonce
    }))
    expect(nonces[0]).not.toBe(nonces[1])
  })

  it('of a built file are for a year, compressed where the browser takes it', async () => {
    const { text } = await ask('GET', '/', undefined, { accept: 'text/html' })
    const file = /\/_nuxt\/[\w-]+\.js/.exec(text)?.[0]
    expect(file).toBeTruthy()
    const answer = await fetch(baseUrl() + file, { headers: { 'accept-encoding': 'gzip' } })
    expect(answer.headers.get('content-encoding')).toBe('gzip')
    expect(answer.headers.get('cache-control')).toContain('immutable')
  })
})

describe('a request that a page of another site makes', () => {
  it('saves nothing', async () => {
    const before = rowCounts()
    expectOurShape(await ask('POST', '/api/regimens', juniper(), { 'sec-fetch-site': 'cross-site' }), 403, 'request.otherSite')
    expect(rowCounts()).toEqual(before)
    expect((await ask('POST', '/api/regimens/preview', juniper(), { 'sec-fetch-site': 'same-origin' })).status).toBe(200)
  })
})
