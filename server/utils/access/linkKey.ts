import { createHash, createHmac, randomBytes, timingSafeEqual } from 'node:crypto'

/** A private link is good for this long. */
const LINK_DAYS = 30

/** A new key for a private link, its hash to store, and when the link ends. */
export function newLinkKey(now: Date): { key: string, keyHash: string, linkExpiresAt: string } {
  const key = newToken()
  return { key, keyHash: hashOfKey(key), linkExpiresAt: new Date(now.getTime() + LINK_DAYS * 86_400_000).toISOString() }
}

/** A secret for a link or a session: 256 bits that nobody can guess. Only its hash is stored. */
export function newToken(): string {
  return randomBytes(32).toString('base64url')
}

export function hashOfKey(key: string): string {
  return createHash('sha256').update(key).digest('hex')
}

/** Compares in constant time, so that a wrong key tells nothing by how long it takes. */
export function keyFits(key: string, keyHash: string): boolean {
  return timingSafeEqual(Buffer.from(hashOfKey(key), 'hex'), Buffer.from(keyHash, 'hex'))
}

const LETTERS = 'abcdefghjkmnpqrstuvwxyz23456789'

/** An id without letters that are taken for others (no l, o, i, 0, 1). */
export function newRegimenId(): string {
  return [...randomBytes(12)].map(byte => LETTERS[byte % LETTERS.length]).join('')
}

/**
 * The code in the square on a team's sheet: it opens that version's answer and nothing else. It is worked out from the
 * server's secret, so that each print carries the same one and none is stored.
 */
export function sheetCodeOf(secret: string, id: string, version: number): string {
  const bytes = createHmac('sha256', secret).update(`sheet|${id}|${version}`).digest()
  return [...bytes.subarray(0, 20)].map(byte => LETTERS[byte % LETTERS.length]).join('')
}

export function sheetCodeFits(secret: string, id: string, version: number, code: string): boolean {
  return keyFits(code, hashOfKey(sheetCodeOf(secret, id, version)))
}
