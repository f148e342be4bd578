import type { H3Event } from 'h3'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { addressOf } from '../../../server/utils/http/addressOf'

const event = (forwarded?: string) => ({ context: {}, node: { req: { headers: forwarded ? { 'x-forwarded-for': forwarded } : {}, socket: { remoteAddress: '10.0.0.9' } } } }) as unknown as H3Event
afterEach(() => vi.unstubAllEnvs())

describe('addressOf', () => {
  it('believes no header of a stranger', () => expect(addressOf(event('1.2.3.4'))).toBe('10.0.0.9'))
  it('believes what its own proxy added last', () => {
    vi.stubEnv('NUXT_TRUST_PROXY', 'true')
    expect(addressOf(event('6.6.6.6, 1.2.3.4'))).toBe('1.2.3.4')
    expect(addressOf(event())).toBe('10.0.0.9')
  })
})
