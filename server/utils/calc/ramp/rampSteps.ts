import { checkedNumber } from '../checkedNumber'
import { CalcInputError } from '../calcInputError'

/**
 * The steps from the first meal to full meals, one fraction per step.
 *
 * A hold keeps early steps low where the group asks for it: while the days of feeding before a step are fewer than
 * `holdDays`, its fraction is at most `holdFraction`, and the wanted step comes later instead of being skipped.
 *
 * @param input  one animal:
 * @param input.fractions  wanted fractions of full meals, in order, each above 0, at least one;
 * @param input.stepDays  days that one step lasts, whole, 1 or more;
 * @param input.hold  `{ fraction, days }`: at most this fraction in the first days; null for none.
 * @returns fractions, one per step, in order; as long as `fractions` or longer. Never mutates its input.
 * @throws CalcInputError `ramp.empty` when there is no fraction;
 * @throws CalcInputError `number.outOfRange` when a fraction or number of days is outside its range.
 * @source house rule; fractions from nutrition sheet 11, hold of reptiles from corrections D (40 to 75 % on days 1 to 4)
 * @example rampSteps({ fractions: [0.5, 0.75, 1], stepDays: 1, hold: { fraction: 0.75, days: 4 } }) // [0.5, 0.75, 0.75, 0.75, 1]
 */
export function rampSteps(input: { fractions: readonly number[], stepDays: number, hold: { fraction: number, days: number } | null }): number[] {
  if (input.fractions.length === 0) throw new CalcInputError('ramp.empty', 'A ramp needs at least one step.', { path: 'overrides.fractions' })
  const stepDays = checkedNumber(input.stepDays, 'the days of a step', 'days', 1)
  const steps: number[] = []
  let next = 0
  while (next < input.fractions.length) {
    const wanted = checkedNumber(input.fractions[next]!, 'a step', 'of full meals', Number.MIN_VALUE, 1.5)
    const held = input.hold !== null && steps.length * stepDays < input.hold.days && wanted > input.hold.fraction
    steps.push(held ? input.hold!.fraction : wanted)
    if (!held) next += 1
  }
  return steps
}
