import type { Syringe } from '#shared/types/plan'
import { checkedNumber } from '../checkedNumber'

/**
 * Smallest feed that one syringe can measure: two marks, and never under a floor.
 *
 * Hint: medicines have a stricter limit (a fifth of the capacity); see `smallestPreferredMl`.
 *
 * @param syringe  `{ capacityMl, stepMl }`, both above 0.
 * @param rule.marks  marks at least, whole, 1 or more;
 * @param rule.floorMl  never less than this, mL, 0 or more.
 * @returns mL, on a mark, above 0.
 * @throws CalcInputError `number.outOfRange` when a number is not above 0.
 * @source house rule (feeds may go down to two marks and 0.05 mL, with the error shown)
 * @example smallestFeedMl({ capacityMl: 1, stepMl: 0.01 }, { marks: 2, floorMl: 0.05 }) // 0.05
 */
export function smallestFeedMl(syringe: Syringe, rule: { marks: number, floorMl: number }): number {
  const step = checkedNumber(syringe.stepMl, 'the step', 'mL', Number.MIN_VALUE)
  const marks = Math.max(checkedNumber(rule.marks, 'the marks', 'marks', 1), Math.ceil(rule.floorMl / step - 1e-9))
  return Math.round(marks * step * 1e6) / 1e6
}
