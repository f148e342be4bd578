import { checkedNumber } from '../checkedNumber'

/**
 * Length of the feeding hours. Equal ends mean a whole day.
 *
 * @param input.fromMinute  start, minutes after midnight, 0 to 1439;
 * @param input.toMinute  end, minutes after midnight, 0 to 1439.
 * @returns minutes, 5 to 1440.
 * @throws CalcInputError `number.outOfRange` when an end is outside its range.
 * @source definition
 * @example feedingSpanMinutes({ fromMinute: 1140, toMinute: 180 }) // 480
 */
export function feedingSpanMinutes(input: { fromMinute: number, toMinute: number }): number {
  const from = checkedNumber(input.fromMinute, 'the start of the feeding hours', 'min', 0, 1439)
  const to = checkedNumber(input.toMinute, 'the end of the feeding hours', 'min', 0, 1439)
  return to > from ? to - from : to + 1440 - from
}
