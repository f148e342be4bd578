import type { H3Event } from 'h3'
import { readCookie, writeCookie, type GuestPlan } from './sealedCookie'

/** The newest first, few enough to fit a cookie. */
const MOST_REMEMBERED = 20

/** Plans that this browser's sealed cookie remembers, newest first. */
export async function guestPlansOf(event: H3Event): Promise<GuestPlan[]> {
  return (await readCookie(event)).plans ?? []
}

/** Remembers a plan in the sealed cookie of this browser. */
export async function rememberGuestPlan(event: H3Event, plan: GuestPlan): Promise<void> {
  const others = (await guestPlansOf(event)).filter(one => one.id !== plan.id)
  await writeCookie(event, { plans: [plan, ...others].slice(0, MOST_REMEMBERED) })
}

/** Takes a plan off this browser's list: a team owns it now. */
export async function forgetGuestPlan(event: H3Event, id: string): Promise<void> {
  await writeCookie(event, { plans: (await guestPlansOf(event)).filter(one => one.id !== id) })
}
