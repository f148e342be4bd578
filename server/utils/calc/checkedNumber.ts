import { CalcInputError } from './calcInputError'

/**
 * A number that is finite and inside its range, or an error that names the quantity.
 *
 * @param value  any number.
 * @param quantity  what it is, in words, for the sentence ("the weight").
 * @param unit  its unit.
 * @param low  smallest value allowed, in `unit`.
 * @param high  largest value allowed, in `unit`; default no limit.
 * @returns `value`, unchanged.
 * @throws CalcInputError `number.outOfRange` when it is not finite, below `low` or above `high`.
 * @source house rule (NaN never leaves a formula)
 * @example checkedNumber(10, 'the weight', 'g', 0.1) // 10
 */
export function checkedNumber(value: number, quantity: string, unit: string, low: number, high = Number.POSITIVE_INFINITY): number {
  if (!Number.isFinite(value) || value < low || value > high) {
    const least = low === Number.MIN_VALUE ? 'above 0' : undefined
    const range = high === Number.POSITIVE_INFINITY ? (least ? `${least} ${unit}` : `${low} ${unit} or more`) : least ? `${least}, up to ${high} ${unit}` : `from ${low} to ${high} ${unit}`
    throw new CalcInputError('number.outOfRange', `${quantity.charAt(0).toUpperCase()}${quantity.slice(1)} must be ${range}.`, { received: value, expected: range })
  }
  return value
}
