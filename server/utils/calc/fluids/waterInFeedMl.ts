import { checkedNumber } from '../checkedNumber'

/**
 * Water that the day's feeds bring: the feed's own water, the water it was thinned with, and the flushes.
 *
 * @param input  one day:
 * @param input.volumeMl  all feeds of the day, as given, mL, 0 or more;
 * @param input.strengthFraction  share of full-strength feed in the mix, above 0 to 1;
 * @param input.waterFraction  water of the full-strength feed, mL per mL, 0 to 1;
 * @param input.flushMl  water flushed through a tube, all feeds together, mL, 0 or more.
 * @returns mL, unrounded, 0 or more.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source `water-in-food`: moisture of the feed and flush water count (nutrition sheet 6.4)
 * @example waterInFeedMl({ volumeMl: 0.27, strengthFraction: 1, waterFraction: 0.8, flushMl: 0 }) // 0.216
 */
export function waterInFeedMl(input: { volumeMl: number, strengthFraction: number, waterFraction: number, flushMl: number }): number {
  const volume = checkedNumber(input.volumeMl, 'the volume', 'mL', 0)
  const strength = checkedNumber(input.strengthFraction, 'the strength', 'of full', 0, 1)
  const water = checkedNumber(input.waterFraction, 'the water share', 'mL per mL', 0, 1)
  return volume * (strength * water + (1 - strength)) + checkedNumber(input.flushMl, 'the flush', 'mL', 0)
}
