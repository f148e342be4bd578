import { setResponseHeader, type H3Event } from 'h3'
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible'
import { addressOf } from './addressOf'
import { fail } from './fail'

/** What is counted together, and how many requests an address may make in a minute. A person typing fast stays far below. */
const LIMITS = { preview: 600, save: 60, print: 120, read: 600 } as const
export type Limited = keyof typeof LIMITS

// Counts live in this process: enough for one server, gone with a restart.
const limiters = new Map<string, RateLimiterMemory>()

/**
 * Counts a request and refuses it when its address has made too many.
 * @param factor multiplies the limits; tests and benchmarks raise it. Routes read it from `useRuntimeConfig()` without the event:
 *   with it, Nitro goes through the whole environment again for each request, which costs more than a plan.
 * @throws the error answer 429 `request.tooMany`, with Retry-After in seconds.
 */
export async function limitRequests(event: H3Event, kind: Limited, factor: number): Promise<void> {
  const key = `${kind}|${factor}`
  let limiter = limiters.get(key)
  if (!limiter) limiters.set(key, limiter = new RateLimiterMemory({ points: Math.ceil(LIMITS[kind] * factor), duration: 60, keyPrefix: kind }))
  try {
    await limiter.consume(addressOf(event))
  }
  catch (refused) {
    const seconds = refused instanceof RateLimiterRes ? Math.max(1, Math.ceil(refused.msBeforeNext / 1000)) : 60
    setResponseHeader(event, 'retry-after', seconds)
    throw fail({ status: 429, code: 'request.tooMany', message: `Too many requests from this address. Wait ${seconds} seconds and try again; nothing is lost.` })
  }
}
