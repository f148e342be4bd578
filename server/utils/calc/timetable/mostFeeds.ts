import { CalcInputError } from '../calcInputError'

/**
 * Most feeds that fit the feeding hours with a gap kept between them.
 *
 * @param input.spanMinutes  length of the feeding hours, min, above 0;
 * @param input.gapHours  shortest time between two feeds, h, above 0.
 * @returns whole number, 1 or more.
 * @throws CalcInputError `gap.notPositive` when the gap is not above 0.
 * @source definition
 * @example mostFeeds({ spanMinutes: 780, gapHours: 4 }) // 4
 */
export function mostFeeds(input: { spanMinutes: number, gapHours: number }): number {
  if (!(input.gapHours > 0)) throw new CalcInputError('gap.notPositive', 'The gap between two feeds must be above 0 hours.', { received: input.gapHours })
  // Five minutes less: times are rounded to whole five minutes, and the gap must survive that.
  const slots = Math.floor(input.spanMinutes / (input.gapHours * 60) + 1e-9)
  const kept = (feeds: number) => feeds < 2 || Math.floor(input.spanMinutes / (feeds - 1) / 5) * 5 >= input.gapHours * 60 - 1e-9
  return kept(slots + 1) ? slots + 1 : Math.max(1, slots)
}
