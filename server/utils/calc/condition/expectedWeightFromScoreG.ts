import { checkedNumber } from '../checkedNumber'

/**
 * Expected healthy weight from a body condition score of 1 to 5, for thin animals.
 *
 * Hint: scores of 3 and above say "not thin" and give the weight itself. The step was taken from one published thin
 * cat; scoring is little tested in very thin animals, so a length or an earlier weight is better.
 *
 * @param input  one animal:
 * @param input.weightG  weight now, g, above 0;
 * @param input.score  body condition score, 1 (emaciated) to 5 (obese), halves allowed;
 * @param input.lossPerNinthStep  share of body weight lost per step of the nine-point scale, 0 to 0.2.
 * @returns g, unrounded, at or above `weightG`.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source WSAVA 2018 p. 290 (7.5 % a step), linear map between the scales (score9 = 2 x score5 - 1)
 * @example expectedWeightFromScoreG({ weightG: 3.4, score: 2, lossPerNinthStep: 0.075 }) // 4
 */
export function expectedWeightFromScoreG(input: { weightG: number, score: number, lossPerNinthStep: number }): number {
  const weightG = checkedNumber(input.weightG, 'the weight', 'g', Number.MIN_VALUE)
  const score = checkedNumber(input.score, 'the body condition score', 'points', 1, 5)
  const loss = checkedNumber(input.lossPerNinthStep, 'the loss per step', 'of body weight', 0, 0.2)
  const stepsBelowIdeal = Math.max(0, 5 - (2 * score - 1))
  return weightG / (1 - loss * stepsBelowIdeal)
}
