import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { MOST_BODY_BYTES, readBodyOf, readParamsOf, readQueryOf } from '../../../server/utils/http/readInput'
import type { ApiErrorData } from '../../../shared/types/error'
import { serve } from './server'

const Body = z.object({ weightG: z.number('Weight must be a number in g.').min(1, 'Weight must be at least 1 g.'), name: z.string().optional() })
const Query = z.object({ days: z.coerce.number('Days must be a number.').int('Days must be whole.') })

let server: Awaited<ReturnType<typeof serve>>
beforeAll(async () => {
  server = await serve(async (event) => {
    if (event.path.startsWith('/query')) return readQueryOf(event, Query)
    if (event.path.startsWith('/params')) {
      event.context.params = { id: decodeURIComponent(event.path.slice(8)) }
      return readParamsOf(event, z.object({ id: z.string().max(4, 'The id is too long.') }))
    }
    return readBodyOf(event, Body)
  })
})
afterAll(() => server.close())

async function post(body: BodyInit | null, headers: Record<string, string> = { 'content-type': 'application/json' }) {
  const answer = await fetch(server.url, { method: 'POST', body, headers, ...(body instanceof ReadableStream && { duplex: 'half' }) } as RequestInit)
  const whole = await answer.json() as { data?: ApiErrorData }
  return { status: answer.status, whole, data: whole.data }
}

describe('readBodyOf', () => {
  it('gives what the schema made of the body', async () => {
    const { status, whole } = await post('{"weightG": 22, "unknown": true}')
    expect(status).toBe(200)
    expect(whole).toEqual({ weightG: 22 })
  })

  it.each([['broken JSON', '{"weightG": 2'], ['no body', ''], ['NaN', '{"weightG": NaN}'], ['a form', 'weightG=22']])('answers 400 to %s', async (_what, body) => {
    const { status, data } = await post(body)
    expect(status).toBe(400)
    expect(data?.code).toBe('input.notJson')
    expect(data?.message).not.toMatch(/position|token|Unexpected/)
  })

  it('answers 400 with the refused fields', async () => {
    const { status, data } = await post('{"weightG": 0}')
    expect(status).toBe(400)
    expect(data).toEqual({ code: 'input.invalid', message: 'Weight must be at least 1 g.', issues: [{ path: 'weightG', message: 'Weight must be at least 1 g.' }] })
  })

  it('takes no prototype from outside', async () => {
    const { status, whole } = await post('{"weightG": 22, "__proto__": {"polluted": true}, "constructor": {"prototype": {"polluted": true}}}')
    expect(status).toBe(200)
    expect(whole).toEqual({ weightG: 22 })
    expect(({} as { polluted?: boolean }).polluted).toBeUndefined()
  })

  it('takes a body as large as the limit and refuses one byte more', async () => {
    const filled = (bytes: number) => `{"weightG":22,"name":"${'x'.repeat(bytes - 24)}"}`
    expect(filled(MOST_BODY_BYTES)).toHaveLength(MOST_BODY_BYTES)
    expect((await post(filled(MOST_BODY_BYTES))).status).toBe(200)
    const { status, data } = await post(filled(MOST_BODY_BYTES + 1))
    expect(status).toBe(413)
    expect(data?.code).toBe('input.tooLarge')
  })

  it('refuses a body that does not say how long it is while it arrives', async () => {
    let sent = 0
    const endless = new ReadableStream({
      pull(controller) {
        sent += 65_536
        controller.enqueue(new Uint8Array(65_536).fill(120))
        if (sent > 10_000_000) controller.close()
      },
    })
    const { status, data } = await post(endless)
    expect(status).toBe(413)
    expect(data?.code).toBe('input.tooLarge')
  })
})

describe('readQueryOf and readParamsOf', () => {
  it('give what the schema made of them', async () => {
    expect(await (await fetch(`${server.url}/query?days=3`)).json()).toEqual({ days: 3 })
    expect(await (await fetch(`${server.url}/params/ab%20c`)).json()).toEqual({ id: 'ab c' })
  })
  it.each([['/query?days=x', 'days'], ['/query', 'days'], ['/query?days=1&days=2', 'days'], ['/params/abcde', 'id']])('answer 400 to %s', async (path, field) => {
    const answer = await fetch(server.url + path)
    expect(answer.status).toBe(400)
    expect(((await answer.json()) as { data: ApiErrorData }).data.issues?.[0]?.path).toBe(field)
  })
})
