import { getCookie, getRequestProtocol, type H3Event } from 'h3'

/** What the sealed cookie holds: the newest first, few enough to fit a cookie. */
export interface GuestPlan { id: string, key: string }
const MOST_REMEMBERED = 20

declare module '#auth-utils' {
  interface SecureSessionData { plans?: GuestPlan[] }
}

/** Plans that this browser's sealed cookie remembers, newest first. */
export async function guestPlansOf(event: H3Event): Promise<GuestPlan[]> {
  // Asking for a session makes one: a visitor who saved nothing gets no cookie.
  if (!getCookie(event, useRuntimeConfig().session.name ?? 'nuxt-session')) return []
  const session = await getUserSession(event)
  return session.secure?.plans ?? []
}

/** Remembers a plan in the sealed cookie of this browser. */
export async function rememberGuestPlan(event: H3Event, plan: GuestPlan): Promise<void> {
  const others = (await guestPlansOf(event)).filter(one => one.id !== plan.id)
  // A Secure cookie would be lost on plain http, which is the usual case in a barn.
  const cookie = { sameSite: 'lax', httpOnly: true, secure: getRequestProtocol(event) === 'https' } as const
  await replaceUserSession(event, { secure: { plans: [plan, ...others].slice(0, MOST_REMEMBERED) } }, { cookie })
}
