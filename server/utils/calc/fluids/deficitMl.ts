import { checkedNumber } from '../checkedNumber'

/**
 * Water that a dry animal lacks: kg x % x 10.
 *
 * @param input  one animal:
 * @param input.weightG  weight now, g, above 0;
 * @param input.drynessPercent  dryness, % of body weight, 0 to 15.
 * @returns mL, unrounded, 0 or more.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source AAHA 2013 (fluid deficit), WSAVA 2018 p. 434 (10 kg, 5 % gives 500 mL)
 * @example deficitMl({ weightG: 10_000, drynessPercent: 5 }) // 500
 */
export function deficitMl(input: { weightG: number, drynessPercent: number }): number {
  const weightG = checkedNumber(input.weightG, 'the weight', 'g', Number.MIN_VALUE)
  const drynessPercent = checkedNumber(input.drynessPercent, 'the dryness', '%', 0, 15)
  return weightG / 1000 * drynessPercent * 10
}
