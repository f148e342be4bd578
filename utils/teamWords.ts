import type { InvitationState, LinkState, MailRow, TransferRow } from '#shared/types/team'
import { formatDayAndYear } from '#shared/utils/calendar'
import { dateInZone } from './dates'
import { dayInZone, momentInZone } from './lifeWords'

/** A state in a word and a shape, so that it reads without colour. */
export interface StateWord { label: string, shape: 'open' | 'good' | 'over' | 'bad' }

export const INVITATION_WORDS: Record<InvitationState, StateWord> = {
  open: { label: 'Waits for an answer', shape: 'open' }, accepted: { label: 'Accepted', shape: 'good' }, withdrawn: { label: 'Withdrawn', shape: 'over' }, expired: { label: 'Ran out', shape: 'over' },
}
export const LINK_WORDS: Record<LinkState, StateWord> = {
  open: { label: 'Open', shape: 'good' }, ended: { label: 'Ran out', shape: 'over' }, revoked: { label: 'Ended by hand', shape: 'over' },
}
export const MAIL_WORDS: Record<MailRow['state'], StateWord> = {
  waiting: { label: 'Waiting to be sent', shape: 'open' }, sent: { label: 'Sent', shape: 'good' }, failed: { label: 'Not sent', shape: 'bad' }, kept: { label: 'Kept here, not sent', shape: 'over' },
}
export const TRANSFER_WORDS: Record<TransferRow['state'], StateWord> = {
  open: { label: 'Waits for an answer', shape: 'open' }, accepted: { label: 'Accepted', shape: 'good' }, declined: { label: 'Declined', shape: 'bad' }, withdrawn: { label: 'Withdrawn', shape: 'over' }, expired: { label: 'Ran out', shape: 'over' },
}

/** Choices of a filter: everything, then each state by its words. */
export function statesToChoose(words: Record<string, StateWord>): { value: string, label: string }[] {
  return [{ value: '', label: 'All' }, ...Object.entries(words).map(([value, { label }]) => ({ value, label }))]
}

export const LINK_HOURS = [{ value: '12', label: '12 hours' }, { value: '24', label: '1 day' }, { value: '72', label: '3 days' }, { value: '168', label: '1 week' }, { value: '720', label: '30 days' }]
export const INVITATION_DAYS = [{ value: '1', label: '1 day' }, { value: '3', label: '3 days' }, { value: '7', label: '1 week' }, { value: '14', label: '2 weeks' }, { value: '30', label: '30 days' }]

/** With the year, for lists that reach back. @example stampInZone('2026-12-03T14:10:00Z', 'Europe/London') // 'Thu 3 Dec 2026 14:10' */
export function stampInZone(instant: string, timeZone: string): string {
  return momentInZone(instant, timeZone).replace(dayInZone(instant, timeZone), dayAndYearInZone(instant, timeZone))
}

/** @example dayAndYearInZone('2026-12-03T14:10:00Z', 'Europe/London') // 'Thu 3 Dec 2026' */
export function dayAndYearInZone(instant: string, timeZone: string): string {
  return formatDayAndYear(dateInZone(new Date(instant), timeZone))
}

/** The address of a link as a person needs it: whole, wherever the server answers from. */
export function wholeAddress(link: string, origin: string): string {
  return new URL(link, origin).href
}

/** What a list is narrowed to by one of its filters. @example filterOf({ page: 1, role: 'vet' }, 'role') // 'vet' */
export function filterOf(asked: object, name: string): string {
  return String((asked as Record<string, unknown>)[name] ?? '')
}
