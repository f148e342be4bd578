import { checkedNumber } from '../checkedNumber'

/**
 * The mark to draw up to: nearest mark, ties down, never above a limit, and never up by more than a set share.
 * This is the only place in the product that rounds an amount to give.
 *
 * @param input  one draw:
 * @param input.volumeMl  wanted volume, mL, above 0;
 * @param input.stepMl  step between marks, mL, above 0;
 * @param input.atMostMl  limit, mL, above 0;
 * @param input.upAtMost  largest share that rounding may add, 0 to 1.
 * @returns `{ markMl, roundingFraction }`: the mark, mL, a whole number of steps, 0 when the limit is under one step;
 *   and what rounding changed, as a fraction of the wanted volume (-1 when the mark is 0).
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule DEV-69 (nearest graduation, ties to the lower volume)
 * @example toSyringeMark({ volumeMl: 0.275, stepMl: 0.05, atMostMl: 1, upAtMost: 0.1 }) // { markMl: 0.25, roundingFraction: -0.0909… }
 */
export function toSyringeMark(input: { volumeMl: number, stepMl: number, atMostMl: number, upAtMost: number }): { markMl: number, roundingFraction: number } {
  const volume = checkedNumber(input.volumeMl, 'the volume', 'mL', Number.MIN_VALUE)
  const step = checkedNumber(input.stepMl, 'the step', 'mL', Number.MIN_VALUE)
  const atMost = checkedNumber(input.atMostMl, 'the limit', 'mL', Number.MIN_VALUE)
  const upAtMost = checkedNumber(input.upAtMost, 'the share added', 'of the volume', 0, 1)
  // 0.15 / 0.05 is 2.9999… in binary: compare with a slack far under one mark.
  const slack = 1e-9
  const wanted = volume / step
  const below = Math.floor(wanted + slack)
  const goesUp = wanted - below > 0.5 + slack && (below + 1) * step <= volume * (1 + upAtMost) * (1 + slack)
  const marks = Math.min(goesUp ? below + 1 : below, Math.floor(atMost / step + slack))
  const markMl = Math.round(marks * step * 1e6) / 1e6
  return { markMl, roundingFraction: markMl / volume - 1 }
}
