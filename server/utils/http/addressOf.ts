import { getHeader, getRequestIP, type H3Event } from 'h3'

/**
 * Whom a request comes from, for counting. Behind one's own proxy (NUXT_TRUST_PROXY=true) it is what that proxy added
 * last: whatever stands before it a stranger may have written.
 */
export function addressOf(event: H3Event): string {
  const forwarded = process.env.NUXT_TRUST_PROXY === 'true' ? getHeader(event, 'x-forwarded-for')?.split(',').at(-1)?.trim() : undefined
  return forwarded || getRequestIP(event) || 'unknown'
}
