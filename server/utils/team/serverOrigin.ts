import { getRequestURL, type H3Event } from 'h3'

/**
 * Where people reach this server. For links in mails only what was set counts: the address of a request is whatever the
 * one who sends it writes, and a link to reset a password must not follow that.
 */
export function serverOrigin(event: H3Event): string {
  return useRuntimeConfig().origin || getRequestURL(event).origin
}
