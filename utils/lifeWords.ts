import { PLAN_STATE_LABELS, type ChangedLine, type PlanRow, type TeamPlanInfo } from '#shared/types/planLife'
import type { GateState } from '#shared/types/plan'
import { formatClock, formatDay } from '#shared/utils/calendar'
import { dateInZone } from './dates'

// Formatters are slow to make: one for each time zone.
const clocks = new Map<string, Intl.DateTimeFormat>()

function clockInZone(at: Date, timeZone: string): string {
  let clock = clocks.get(timeZone)
  if (!clock) {
    clock = new Intl.DateTimeFormat('en-GB', { timeZone, hour: '2-digit', minute: '2-digit', hourCycle: 'h23' })
    clocks.set(timeZone, clock)
  }
  return clock.format(at)
}

/** The day of an instant. @example dayInZone('2026-12-03T14:10:00Z', 'Europe/London') // 'Thu 3 Dec' */
export function dayInZone(instant: string, timeZone: string): string {
  return formatDay(dateInZone(new Date(instant), timeZone))
}

/** @example momentInZone('2026-12-03T14:10:00Z', 'Europe/London') // 'Thu 3 Dec 14:10' */
export function momentInZone(instant: string, timeZone: string): string {
  return `${dayInZone(instant, timeZone)} ${formatClock(clockInZone(new Date(instant), timeZone))}`
}

/** How long something has stood, in whole units. @example lapseInWords(0, 7_200_000) // '2 hours' */
export function lapseInWords(fromMs: number, toMs: number): string {
  const minutes = Math.floor(Math.max(0, toMs - fromMs) / 60_000)
  if (minutes < 1) return 'less than a minute'
  if (minutes < 60) return counted(minutes, 'minute')
  if (minutes < 48 * 60) return counted(Math.floor(minutes / 60), 'hour')
  return counted(Math.floor(minutes / (24 * 60)), 'day')
}

function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? '' : 's'}`
}

/** @example stateInWords({ state: 'draft', waiting: 'check', waitingSince }, zone) // 'Draft, waits for a check since Thu 3 Dec 14:10' */
export function stateInWords({ state, waiting, waitingSince }: Pick<PlanRow, 'state' | 'waiting' | 'waitingSince'>, timeZone: string): string {
  if (waiting === null) return PLAN_STATE_LABELS[state]
  const since = waitingSince === null ? '' : ` since ${momentInZone(waitingSince, timeZone)}`
  return `${PLAN_STATE_LABELS[state]}, waits for ${waiting === 'check' ? 'a check' : 'approval'}${since}`
}

/** @example initialsOf('Mara Linde') // 'ML' */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/).filter(word => !/^(dr|mr|mrs|ms|mx|prof)\.?$/i.test(word))
  const letters = words.length > 1 ? words.map(word => word[0]).join('') : words[0] ?? ''
  return letters.slice(0, words.length > 1 ? 6 : 2).toUpperCase()
}

export type Look = 'good' | 'care' | 'stop'
export const LOOKS: Record<Look, string> = { good: 'border-moss bg-moss-tint', care: 'border-food-fill bg-food-tint', stop: 'border-stop bg-stop-tint border-double' }

interface PlanAnswer { look: Look, title: string, message: string }

/** What a plan on the screen is good for, the most serious thing first. */
export function planAnswer(plan: { info: TeamPlanInfo, version: number, latestVersion: number, goodUntil: string, today: string | null, gate: GateState, /** Of this team: a vet approves before a plan is used. */ approvalRequired: boolean }): PlanAnswer {
  const { info, version, latestVersion, goodUntil, today } = plan
  if (latestVersion > version) return { look: 'stop', title: `Replaced by version ${latestVersion}.`, message: 'Take sheets of this version down and print the new one.' }
  if (info.state === 'stopped') return { look: 'stop', title: 'This plan is stopped.', message: 'Do not feed from its sheets. Take them down.' }
  if (info.state === 'finished') return { look: 'care', title: 'This plan is finished.', message: 'Take its sheets down. A new plan begins with a new weight.' }
  if (info.standing.state === 'lapsed') return { look: 'stop', title: 'The approval has lapsed.', message: 'Do not feed from it. Weigh the animal, save a new version, and have a vet approve that.' }
  if (today !== null && today > goodUntil) return { look: 'stop', title: 'The weight is too old.', message: `It was good until ${formatDay(goodUntil)}. Weigh the animal before the next feed.` }
  const gate = { 'feed': '', 'wait': ' It says: wait, do not feed yet.', 'do-not-feed': ' It says: do not feed.' }[plan.gate]
  if (info.state === 'in-use') {
    if (info.standing.state === 'none' && plan.approvalRequired) return { look: 'stop', title: `Version ${version} is not approved by a vet.`, message: 'In this team a vet approves first. Do not feed from it yet.' }
    if (info.standing.state === 'none') return { look: 'care', title: `Version ${version} is in use without a vet's approval.`, message: `Sheets with this number are the ones that hang.${gate}` }
    return { look: gate === '' ? 'good' : 'care', title: `This plan is current, version ${version}.`, message: `A sheet with this number is still good.${gate}` }
  }
  if (info.standing.state === 'approved') return { look: 'good', title: `Version ${version} is approved.`, message: `It is not in use yet: put it in use when its sheets hang.${gate}` }
  return { look: 'care', title: 'Not approved by a vet.', message: `${info.state === 'draft' ? 'A draft, version' : 'Checked, version'} ${version}: not to feed from yet.` }
}

interface ChangedPart { part: string, lines: ChangedLine[] }

/** Changed lines by their headings: what a carer would give differently comes first, inside a heading and among them. */
export function changedParts(lines: readonly ChangedLine[]): ChangedPart[] {
  const first = (line: ChangedLine) => line.weight === 'amount' ? 0 : 1
  const parts = new Map<string, ChangedLine[]>()
  for (const line of [...lines].sort((a, b) => first(a) - first(b))) parts.set(line.part, [...parts.get(line.part) ?? [], line])
  return [...parts].map(([part, found]) => ({ part, lines: found }))
}
