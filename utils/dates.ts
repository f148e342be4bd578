import type { Plan, PlanDay } from '#shared/types/plan'

/**
 * The calendar day of a moment in a time zone, YYYY-MM-DD.
 * @example dateInZone(new Date('2026-12-03T23:30:00Z'), 'Pacific/Chatham') // '2026-12-04'
 */
export function dateInZone(at: Date, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', { timeZone, year: 'numeric', month: '2-digit', day: '2-digit' }).formatToParts(at)
  const part = (type: string) => parts.find(one => one.type === type)?.value ?? ''
  return `${part('year')}-${part('month')}-${part('day')}`
}

/**
 * The day whose amount is the one to look at: the first with a meal from today on, or the plan's first meal day where
 * today is not known or the plan is over. Undefined for a plan without meals.
 */
export function focusDayOf(plan: Plan, today: string | null): PlanDay | undefined {
  const fed = plan.days.filter(one => one.feeds.length > 0)
  return (today === null ? undefined : fed.find(one => one.date >= today)) ?? fed[0]
}
