import { checkedNumber } from '../checkedNumber'

/**
 * Standard uncertainty from a limit that is equally likely anywhere inside (rectangular).
 *
 * Hint: a display step d stands for a half-width of d / 2.
 *
 * @param halfWidth  half-width of the limit, any unit, 0 or more.
 * @returns in the same unit, unrounded: half-width / square root of 3.
 * @throws CalcInputError `number.outOfRange` when it is negative or not finite.
 * @source JCGM 100:2008 (GUM) 4.3.7
 * @example standardFromLimit(0.5) // 0.2886751…
 */
export function standardFromLimit(halfWidth: number): number {
  return checkedNumber(halfWidth, 'the half-width', '', 0) / Math.sqrt(3)
}
