import { getHeader, getQuery, getRouterParams, type H3Event } from 'h3'
import type { z } from 'zod'
import { fail } from './fail'
import { issuesOf } from './issuesOf'

/** A plan is a few kilobytes; more is a mistake or an attack. */
export const MOST_BODY_BYTES = 256 * 1024

/** The JSON body of a request, checked by its schema. Too large 413, not JSON or not right 400, each with what to do. */
export async function readBodyOf<Schema extends z.ZodType>(event: H3Event, schema: Schema): Promise<z.output<Schema>> {
  const text = await bodyText(event)
  let body: unknown
  try {
    body = JSON.parse(text)
  }
  catch {
    throw fail({ status: 400, code: 'input.notJson', message: 'The request holds no readable JSON. Send one JSON object, with the header content-type: application/json.' })
  }
  return checked(schema, body)
}

/** The query of a request, checked by its schema. */
export function readQueryOf<Schema extends z.ZodType>(event: H3Event, schema: Schema): z.output<Schema> {
  return checked(schema, getQuery(event))
}

/** The parameters of a route, checked by their schema. */
export function readParamsOf<Schema extends z.ZodType>(event: H3Event, schema: Schema): z.output<Schema> {
  return checked(schema, getRouterParams(event, { decode: true }))
}

function checked<Schema extends z.ZodType>(schema: Schema, value: unknown): z.output<Schema> {
  const result = schema.safeParse(value)
  if (result.success) return result.data
  const issues = issuesOf(result.error, value)
  const first = issues[0]!
  throw fail({ status: 400, code: 'input.invalid', message: issues.length === 1 ? first.message : `${issues.length} fields need another look. First: ${first.message}`, issues })
}

/** Reads at most the limit: what is longer is refused while it arrives, not after it has filled the memory. */
async function bodyText(event: H3Event): Promise<string> {
  const tooLarge = () => fail({ status: 413, code: 'input.tooLarge', message: `The request is larger than ${MOST_BODY_BYTES / 1024} kB. A plan needs far less.` })
  if (Number(getHeader(event, 'content-length') ?? 0) > MOST_BODY_BYTES) throw tooLarge()
  const ready = (event.node.req as { body?: unknown }).body
  if (ready !== undefined) return typeof ready === 'string' ? ready : JSON.stringify(ready)
  const chunks: Buffer[] = []
  let bytes = 0
  // Leaving the loop early must not cut the connection: the answer still has to go out on it.
  for await (const chunk of event.node.req.iterator({ destroyOnReturn: false }) as AsyncIterable<Buffer>) {
    bytes += chunk.length
    if (bytes > MOST_BODY_BYTES) throw tooLarge()
    chunks.push(chunk)
  }
  return Buffer.concat(chunks).toString('utf8')
}
