import { describe, expect, it } from 'vitest'
import { hashOfKey, keyFits, newLinkKey, newRegimenId } from '../../../server/utils/access/linkKey'

describe('newLinkKey', () => {
  const now = new Date('2026-12-03T18:00:00.000Z')
  it('makes 32 random bytes that fit an address, and keeps only their hash', () => {
    const { key, keyHash } = newLinkKey(now)
    expect(Buffer.from(key, 'base64url')).toHaveLength(32)
    expect(key).toMatch(/^[\w-]{43}$/)
    expect(keyHash).toMatch(/^[0-9a-f]{64}$/)
    expect(keyHash).not.toContain(key)
    expect(newLinkKey(now).key).not.toBe(key)
  })
  it('is good for 30 days', () => expect(newLinkKey(now).linkExpiresAt).toBe('2027-01-02T18:00:00.000Z'))
})

describe('keyFits', () => {
  const { key, keyHash } = newLinkKey(new Date())
  it('takes the key', () => expect(keyFits(key, keyHash)).toBe(true))
  it.each(['', ' ', key.slice(1), `${key}=`, key.toUpperCase(), keyHash, 'x'.repeat(10_000), '\u0000'])('takes nothing else: %j', other => expect(keyFits(other, keyHash)).toBe(false))
  it('is SHA-256', () => expect(hashOfKey('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'))
})

describe('newRegimenId', () => {
  it('has no letters that are taken for others, and does not repeat', () => {
    const ids = Array.from({ length: 2000 }, newRegimenId)
    for (const id of ids) expect(id).toMatch(/^[abcdefghjkmnpqrstuvwxyz23456789]{12}$/)
    expect(new Set(ids).size).toBe(2000)
  })
})
