import { TIERS, type Tier } from '#shared/types/plan'
import { checkedNumber } from '../checkedNumber'

/** Lower edges of the tiers; a value at the edge belongs to the higher tier. */
export interface TierEdges { moderate: number, high: number, extreme: number }

/**
 * Refeeding risk tier: the worst that any one measure says, with each reason.
 *
 * @param input  one animal:
 * @param input.shortfallPercent  percent under its expected weight, 0 to 100; null when unknown;
 * @param input.daysUnfed  days without a proper meal, 0 or more;
 * @param input.daysStretch  1 for birds and mammals; how many times longer an ectotherm can go, 1 or more;
 * @param input.score  body condition score 1 to 5; null when not scored;
 * @param input.drynessPercent  % of body weight, 0 to 15;
 * @param edges  lower edges: `shortfallPercent`, `daysUnfed` (unstretched), `drynessPercent` (each moderate, high, extreme)
 *   and `score` (at or below: high, extreme).
 * @returns `{ tier, reasons }`; reasons name the measure and its value, the deciding ones first; empty for low.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule after nutrition sheet 4.1 `proposed-tiers`, `vet-risk`, `nice-risk-major`
 * @example refeedingTier({ shortfallPercent: 48, daysUnfed: 24, daysStretch: 5, score: null, drynessPercent: 8 }, edges).tier // 'extreme'
 */
export function refeedingTier(
  input: { shortfallPercent: number | null, daysUnfed: number, daysStretch: number, score: number | null, drynessPercent: number },
  edges: { shortfallPercent: TierEdges, daysUnfed: TierEdges, drynessPercent: TierEdges, score: { high: number, extreme: number } },
): { tier: Tier, reasons: string[] } {
  const days = checkedNumber(input.daysUnfed, 'the days without a meal', 'days', 0)
  const stretch = checkedNumber(input.daysStretch, 'the stretch of days', 'times', 1)
  const dryness = checkedNumber(input.drynessPercent, 'the dryness', '%', 0, 100)
  const votes: { rank: number, reason: string }[] = []

  if (input.shortfallPercent !== null) {
    const short = checkedNumber(input.shortfallPercent, 'the shortfall', '%', 0, 100)
    votes.push({ rank: rankOf(short, edges.shortfallPercent), reason: `${Math.round(short)} % under its expected weight` })
  }
  const stretched = stretch > 1 ? `, which weighs like ${Math.round(10 * days / stretch) / 10} days in a bird or mammal` : ''
  votes.push({ rank: rankOf(days / stretch, edges.daysUnfed), reason: `${days} ${days === 1 ? 'day' : 'days'} without a proper meal${stretched}` })
  if (input.score !== null) {
    const score = checkedNumber(input.score, 'the body condition score', 'points', 1, 5)
    votes.push({ rank: score <= edges.score.extreme ? 3 : score <= edges.score.high ? 2 : 0, reason: `body condition ${score} of 5` })
  }
  votes.push({ rank: rankOf(dryness, edges.drynessPercent), reason: `${dryness} % dry` })

  const rank = Math.max(...votes.map(vote => vote.rank))
  const reasons = votes.filter(vote => vote.rank > 0).sort((a, b) => b.rank - a.rank).map(vote => vote.reason)
  return { tier: TIERS[rank]!, reasons }
}

function rankOf(value: number, edges: TierEdges): number {
  if (value >= edges.extreme) return 3
  if (value >= edges.high) return 2
  return value >= edges.moderate ? 1 : 0
}
