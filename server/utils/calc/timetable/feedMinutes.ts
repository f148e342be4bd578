import { checkedNumber } from '../checkedNumber'
import { feedingSpanMinutes } from './feedingSpanMinutes'

/**
 * Clock times of a day's feeds: spread evenly over the feeding hours, first at their beginning and last at their end,
 * on whole five minutes (rounded down, so that no gap gets shorter than the last).
 *
 * @param input  one day:
 * @param input.feeds  number of feeds, whole, 1 or more;
 * @param input.fromMinute  start of the feeding hours, minutes after midnight, 0 to 1439;
 * @param input.toMinute  end, minutes after midnight; at or before the start means the next day (night feeders).
 * @returns minutes after midnight of the day they begin on, ascending, as many as `feeds`; over 1439 is after midnight.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule
 * @example feedMinutes({ feeds: 3, fromMinute: 450, toMinute: 1230 }) // [450, 840, 1230]
 */
export function feedMinutes(input: { feeds: number, fromMinute: number, toMinute: number }): number[] {
  const feeds = checkedNumber(input.feeds, 'the number of feeds', 'feeds a day', 1)
  const span = feedingSpanMinutes(input)
  if (feeds === 1) return [input.fromMinute]
  const every = span / (feeds - 1)
  return Array.from({ length: feeds }, (_, index) => input.fromMinute + (index === feeds - 1 ? span : Math.floor(index * every / 5 + 1e-9) * 5))
}
