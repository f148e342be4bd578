import type { H3Event } from 'h3'

/** What the sealed cookie holds: the newest first, few enough to fit a cookie. */
export interface GuestPlan { id: string, key: string }
const MOST_REMEMBERED = 20

declare module '#auth-utils' {
  interface SecureSessionData { plans?: GuestPlan[] }
}

/** Plans that this browser's sealed cookie remembers, newest first. */
export async function guestPlansOf(event: H3Event): Promise<GuestPlan[]> {
  const session = await getUserSession(event)
  return session.secure?.plans ?? []
}

/** Remembers a plan in the sealed cookie of this browser. */
export async function rememberGuestPlan(event: H3Event, plan: GuestPlan): Promise<void> {
  const others = (await guestPlansOf(event)).filter(one => one.id !== plan.id)
  await replaceUserSession(event, { secure: { plans: [plan, ...others].slice(0, MOST_REMEMBERED) } })
}
