import { checkedNumber } from '../checkedNumber'

/**
 * How far a weight is below the expected healthy weight.
 *
 * @param weightG  weight now, g, above 0.
 * @param expectedG  expected healthy weight, g, above 0.
 * @returns percent of the expected weight, 0 to 100, unrounded; 0 when at or above it.
 * @throws CalcInputError `number.outOfRange` when a weight is not above 0.
 * @source definition
 * @example shortfallPercent(182, 350) // 48
 */
export function shortfallPercent(weightG: number, expectedG: number): number {
  const weight = checkedNumber(weightG, 'the weight', 'g', Number.MIN_VALUE)
  const expected = checkedNumber(expectedG, 'the expected weight', 'g', Number.MIN_VALUE)
  return Math.max(0, 100 * (expected - weight) / expected)
}
