import { getCookie, getRequestProtocol, type H3Event } from 'h3'

/** A plan that this browser may open by its private link. */
export interface GuestPlan { id: string, key: string }
/** A helper's visit: which link, and the initials given at the door. */
export interface HelperVisit { link: string, initials: string }

/** All that the sealed cookie holds: who, by id only, and which sign-in; what they may do is read from the database each time. */
export interface CookieContent { user?: { id: string }, session?: string, plans?: GuestPlan[], help?: HelperVisit, /** A secret of one-time codes until the first code confirms it. */ codes?: string }

declare module '#auth-utils' {
  interface User { id: string }
  interface SecureSessionData { session?: string, plans?: GuestPlan[], help?: HelperVisit, /** A secret of one-time codes until the first code confirms it. */ codes?: string }
}

/** What this browser's sealed cookie says; nothing for a browser without one. */
export async function readCookie(event: H3Event): Promise<CookieContent> {
  // Asking for a session makes one: a visitor who saved nothing gets no cookie.
  if (!getCookie(event, useRuntimeConfig().session.name ?? 'nuxt-session') && !event.context.cookieWritten) return {}
  const { user, secure } = await getUserSession(event)
  return { ...(user && { user }), ...secure }
}

/** Changes parts of the cookie and leaves the others; undefined takes a part away. */
export async function writeCookie(event: H3Event, change: CookieContent): Promise<void> {
  const { user, ...secure } = { ...await readCookie(event), ...change }
  event.context.cookieWritten = true
  // A Secure cookie would be lost on plain http, which is the usual case in a barn.
  const cookie = { sameSite: 'lax', httpOnly: true, secure: getRequestProtocol(event) === 'https' } as const
  await replaceUserSession(event, { user, secure }, { cookie })
}
