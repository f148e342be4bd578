import type { Syringe } from '#shared/types/plan'
import { checkedNumber } from '../checkedNumber'
import { smallestFeedMl } from './smallestFeedMl'
import { toSyringeMark } from './toSyringeMark'

/** A feed as it can really be drawn up. `volumeMl` is `draws` times `markMl`. */
export interface MeasuredFeed {
  syringe: Syringe
  draws: number
  markMl: number
  volumeMl: number
  roundingFraction: number
}

/**
 * One feed on the syringes in the house: the smallest that holds it in one draw, rounded once to its marks. Only a
 * feed larger than the largest syringe is split into equal draws.
 *
 * @param input  one feed:
 * @param input.volumeMl  wanted volume, mL, above 0;
 * @param input.capMl  never more than this, mL, above 0;
 * @param input.syringes  syringes in the house, at least one, in any order;
 * @param input.smallest  `{ marks, floorMl }`, see `smallestFeedMl`;
 * @param input.upAtMost  largest share that rounding may add, 0 to 1.
 * @returns the measured feed, or null when no syringe can measure so little. Never above `capMl`.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule H-04, DEV-18 (smallest device that holds it)
 * @example measureFeed({ volumeMl: 0.41, capMl: 1, syringes: [{ capacityMl: 1, stepMl: 0.05 }], smallest: { marks: 2, floorMl: 0.05 }, upAtMost: 0.1 })?.markMl // 0.4
 */
export function measureFeed(input: { volumeMl: number, capMl: number, syringes: readonly Syringe[], smallest: { marks: number, floorMl: number }, upAtMost: number }): MeasuredFeed | null {
  const cap = checkedNumber(input.capMl, 'the limit', 'mL', Number.MIN_VALUE)
  const wanted = Math.min(checkedNumber(input.volumeMl, 'the volume', 'mL', Number.MIN_VALUE), cap)
  const bySize = [...input.syringes].sort((a, b) => a.capacityMl - b.capacityMl || a.stepMl - b.stepMl)
  const largest = bySize.at(-1)
  if (!largest) return null
  const holding = bySize.filter(one => one.capacityMl * (1 + 1e-9) >= wanted)
  const draws = holding.length > 0 ? 1 : Math.ceil(wanted / largest.capacityMl - 1e-9)
  for (const syringe of holding.length > 0 ? holding : [largest]) {
    const { markMl } = toSyringeMark({ volumeMl: wanted / draws, stepMl: syringe.stepMl, atMostMl: Math.min(cap / draws, syringe.capacityMl), upAtMost: input.upAtMost })
    if (markMl < smallestFeedMl(syringe, input.smallest) - 1e-9) continue
    const volumeMl = Math.round(markMl * draws * 1e6) / 1e6
    return { syringe: { capacityMl: syringe.capacityMl, stepMl: syringe.stepMl }, draws, markMl, volumeMl, roundingFraction: volumeMl / input.volumeMl - 1 }
  }
  return null
}
