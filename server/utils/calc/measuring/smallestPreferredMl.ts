import type { Syringe } from '#shared/types/plan'
import { checkedNumber } from '../checkedNumber'

/**
 * Smallest volume that a syringe should be used for where accuracy matters: a fifth of its capacity, and two marks.
 *
 * @param syringe  `{ capacityMl, stepMl }`, both above 0.
 * @param rule.ofCapacity  share of the capacity, 0 to 1;
 * @param rule.marks  marks at least, whole, 1 or more.
 * @returns mL, unrounded, above 0.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule H-05 after USP 1176 (graduates not below a fifth of capacity, from memory)
 * @example smallestPreferredMl({ capacityMl: 10, stepMl: 0.2 }, { ofCapacity: 0.2, marks: 2 }) // 2
 */
export function smallestPreferredMl(syringe: Syringe, rule: { ofCapacity: number, marks: number }): number {
  const capacity = checkedNumber(syringe.capacityMl, 'the capacity', 'mL', Number.MIN_VALUE)
  const step = checkedNumber(syringe.stepMl, 'the step', 'mL', Number.MIN_VALUE)
  return Math.max(checkedNumber(rule.ofCapacity, 'the share', 'of capacity', 0, 1) * capacity, checkedNumber(rule.marks, 'the marks', 'marks', 1) * step)
}
