import { createHash, randomBytes, timingSafeEqual } from 'node:crypto'

/** A private link is good for this long. */
const LINK_DAYS = 30

/** A new key for a private link, its hash to store, and when the link ends. */
export function newLinkKey(now: Date): { key: string, keyHash: string, linkExpiresAt: string } {
  const key = randomBytes(32).toString('base64url')
  return { key, keyHash: hashOfKey(key), linkExpiresAt: new Date(now.getTime() + LINK_DAYS * 86_400_000).toISOString() }
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
