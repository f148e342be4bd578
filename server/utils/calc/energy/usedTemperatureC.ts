import { checkedNumber } from '../checkedNumber'

/**
 * Body temperature that the energy of an ectotherm is worked out for: its own when it is inside the window it may be
 * fed in, the middle of the window when it is colder or unknown (it is warmed before it eats), the top when warmer.
 *
 * @param input  one animal:
 * @param input.bodyTemperatureC  measured, deg C, 0 to 50; null when unknown;
 * @param input.windowLowC  bottom of the feeding window, deg C;
 * @param input.windowHighC  top of the feeding window, deg C, at or above the bottom;
 * @param input.limitLowC  lowest temperature the equations are used at, deg C;
 * @param input.limitHighC  highest, deg C.
 * @returns deg C, unrounded, within the limits.
 * @throws CalcInputError `number.outOfRange` when a temperature is outside 0 to 50, or the window is upside down.
 * @source house rule; limits 15 to 40 from nutrition sheet 12.1
 * @example usedTemperatureC({ bodyTemperatureC: 31, windowLowC: 35, windowHighC: 39, limitLowC: 15, limitHighC: 40 }) // 37
 */
export function usedTemperatureC(input: { bodyTemperatureC: number | null, windowLowC: number, windowHighC: number, limitLowC: number, limitHighC: number }): number {
  const low = checkedNumber(input.windowLowC, 'the bottom of the window', 'deg C', 0, 50)
  const high = checkedNumber(input.windowHighC, 'the top of the window', 'deg C', low, 50)
  const body = input.bodyTemperatureC
  const wanted = body === null || checkedNumber(body, 'the body temperature', 'deg C', 0, 50) < low ? (low + high) / 2 : Math.min(body, high)
  return Math.min(Math.max(wanted, input.limitLowC), input.limitHighC)
}
