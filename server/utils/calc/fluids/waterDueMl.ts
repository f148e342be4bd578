import { checkedNumber } from '../checkedNumber'

/**
 * Water due within one span of time (a calendar day): maintenance from the moment fluids begin, and the part of the
 * deficit that falls inside the span, never above the limit for that span.
 *
 * @param input  all times are instants in ms since 1970 (UTC), so a day of 23 or 25 hours comes out right:
 * @param input.spanFromMs  start of the span;
 * @param input.spanToMs  end of the span, at or after its start;
 * @param input.fluidsFromMs  when fluids begin;
 * @param input.maintenanceMlPerDay  mL per 24 h, 0 or more;
 * @param input.deficitMl  whole deficit, mL, 0 or more;
 * @param input.deficitHours  hours it is spread over, above 0;
 * @param input.capMlPerDay  most in 24 h, mL, above 0.
 * @returns mL, unrounded, 0 or more.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule (even spread); the 100 g bird of the nutrition sheet: 8 %, 48 h, 50 mL/kg/day gives 9 mL on day 1
 * @example waterDueMl({ spanFromMs: 0, spanToMs: 864e5, fluidsFromMs: 0, maintenanceMlPerDay: 5, deficitMl: 8, deficitHours: 48, capMlPerDay: 10 }) // 9
 */
export function waterDueMl(input: { spanFromMs: number, spanToMs: number, fluidsFromMs: number, maintenanceMlPerDay: number, deficitMl: number, deficitHours: number, capMlPerDay: number }): number {
  const from = checkedNumber(input.spanFromMs, 'the start of the span', 'ms', Number.NEGATIVE_INFINITY)
  const to = checkedNumber(input.spanToMs, 'the end of the span', 'ms', from)
  const begin = checkedNumber(input.fluidsFromMs, 'the start of fluids', 'ms', Number.NEGATIVE_INFINITY)
  const hours = checkedNumber(input.deficitHours, 'the hours of the deficit', 'h', Number.MIN_VALUE)
  const hoursOfFluids = Math.max(0, to - Math.max(from, begin)) / 3_600_000
  const hoursOfDeficit = Math.max(0, Math.min(to, begin + hours * 3_600_000) - Math.max(from, begin)) / 3_600_000
  const due = checkedNumber(input.maintenanceMlPerDay, 'maintenance', 'mL/day', 0) * hoursOfFluids / 24
    + checkedNumber(input.deficitMl, 'the deficit', 'mL', 0) * hoursOfDeficit / hours
  return Math.min(due, checkedNumber(input.capMlPerDay, 'the limit', 'mL/day', 0) * hoursOfFluids / 24)
}
