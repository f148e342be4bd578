import { createHash } from 'node:crypto'
import { gzipSync } from 'node:zlib'
import { getHeader, setResponseHeaders, setResponseStatus, type H3Event } from 'h3'
import type { ReferenceList } from '#shared/types/reference'

interface Prepared { list: ReferenceList<unknown>, etag: string, compressed: Buffer }

// A list never changes while the server runs: written out, hashed and compressed once, then only sent.
const prepared = new WeakMap<ReadonlyMap<string, unknown>, Prepared>()

/**
 * A list of the reference data with its tag: 304 without a body to who has it already, compressed to who can read that.
 *
 * The browser asks again each time (a new edition must not wait for a cache to age) and nearly always gets the 304.
 */
export function answerList<Item>(event: H3Event, edition: string, items: ReadonlyMap<string, Item>): ReferenceList<Item> | Buffer | null {
  const { list, etag, compressed } = preparedOf(edition, items)
  setResponseHeaders(event, { etag, 'cache-control': 'public, max-age=0, must-revalidate', 'vary': 'accept-encoding' })
  if (tagsOf(getHeader(event, 'if-none-match')).some(tag => tag === etag || tag === '*')) {
    setResponseStatus(event, 304)
    return null
  }
  if (!acceptsGzip(getHeader(event, 'accept-encoding'))) return list as ReferenceList<Item>
  setResponseHeaders(event, { 'content-type': 'application/json', 'content-encoding': 'gzip' })
  return compressed
}

function preparedOf(edition: string, items: ReadonlyMap<string, unknown>): Prepared {
  let found = prepared.get(items)
  if (!found) {
    const list = { edition, items: [...items.values()] }
    const text = JSON.stringify(list)
    // Weak: the same list compressed and not compressed differs in bytes, not in meaning.
    const etag = `W/"${createHash('sha256').update(text).digest('base64url')}"`
    prepared.set(items, found = { list, etag, compressed: gzipSync(text) })
  }
  return found
}

function tagsOf(header: string | undefined): string[] {
  return (header ?? '').split(',').map(tag => tag.trim()).filter(Boolean)
}

/** "gzip;q=0" means: anything but that. */
function acceptsGzip(header: string | undefined): boolean {
  return (header ?? '').split(',').some((part) => {
    const [coding, ...parameters] = part.trim().toLowerCase().split(/\s*;\s*/)
    return (coding === 'gzip' || coding === '*') && !parameters.some(one => /^q=0(\.0*)?$/.test(one))
  })
}
