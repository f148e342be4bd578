import { checkedNumber } from '../checkedNumber'

/**
 * Energy of full meals for a whole day: resting rate times a factor, never above what a free-living animal spends.
 *
 * Hint: does not choose the equation; `planEnergy` does.
 *
 * @param input  one animal:
 * @param input.restingKcalPerDay  resting rate at its body temperature, kcal/day, above 0;
 * @param input.factor  multiplier on resting, 0.1 to 6;
 * @param input.fieldCapKcalPerDay  free-living (field) rate, kcal/day, above 0; null where none is published for the group.
 * @returns `{ targetKcalPerDay, cappedByFieldRate }`, kcal/day, unrounded.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule; factor and cap from nutrition sheet 12.1 (resting x 1.5, never above the field rate)
 * @example targetKcalPerDay({ restingKcalPerDay: 0.18, factor: 1.5, fieldCapKcalPerDay: 0.363 }) // { targetKcalPerDay: 0.27, cappedByFieldRate: false }
 */
export function targetKcalPerDay(input: { restingKcalPerDay: number, factor: number, fieldCapKcalPerDay: number | null }): { targetKcalPerDay: number, cappedByFieldRate: boolean } {
  const resting = checkedNumber(input.restingKcalPerDay, 'the resting rate', 'kcal/day', Number.MIN_VALUE)
  const factor = checkedNumber(input.factor, 'the factor', 'times resting', 0.1, 6)
  const wanted = resting * factor
  if (input.fieldCapKcalPerDay === null) return { targetKcalPerDay: wanted, cappedByFieldRate: false }
  const cap = checkedNumber(input.fieldCapKcalPerDay, 'the field rate', 'kcal/day', Number.MIN_VALUE)
  return wanted > cap ? { targetKcalPerDay: cap, cappedByFieldRate: true } : { targetKcalPerDay: wanted, cappedByFieldRate: false }
}
