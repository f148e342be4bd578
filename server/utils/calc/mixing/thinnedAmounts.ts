import { checkedNumber } from '../checkedNumber'

/**
 * Ready-made (liquid or blended) feed and water for one pot.
 *
 * @param input  one pot:
 * @param input.neededMl  at least this much, mL, above 0;
 * @param input.strengthFraction  strength, above 0 to 1;
 * @param input.stepMl  step that both are measured to, mL, above 0;
 * @param input.densityKcalPerMl  energy of the feed, kcal/mL, above 0.
 * @returns `{ feedMl, waterMl, madeUpMl, energyKcalPerMl }`, whole steps; `energyKcalPerMl` is what they really give.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source definition (C1 V1 = C2 V2), rounding house rule
 * @example thinnedAmounts({ neededMl: 4, strengthFraction: 0.5, stepMl: 0.5, densityKcalPerMl: 1 }) // { feedMl: 2, waterMl: 2, madeUpMl: 4, energyKcalPerMl: 0.5 }
 */
export function thinnedAmounts(input: { neededMl: number, strengthFraction: number, stepMl: number, densityKcalPerMl: number }): { feedMl: number, waterMl: number, madeUpMl: number, energyKcalPerMl: number } {
  const needed = checkedNumber(input.neededMl, 'the pot', 'mL', Number.MIN_VALUE)
  const strength = checkedNumber(input.strengthFraction, 'the strength', 'of full', Number.MIN_VALUE, 1)
  const step = checkedNumber(input.stepMl, 'the step', 'mL', Number.MIN_VALUE)
  const density = checkedNumber(input.densityKcalPerMl, 'the energy density', 'kcal/mL', Number.MIN_VALUE)
  let steps = Math.max(1, Math.ceil(needed * strength / step - 1e-9))
  for (;;) {
    const feedMl = tidyMl(steps * step)
    const waterMl = tidyMl(Math.round(feedMl * (1 / strength - 1) / step) * step)
    const madeUpMl = tidyMl(feedMl + waterMl)
    if (madeUpMl >= needed - 1e-9) return { feedMl, waterMl, madeUpMl, energyKcalPerMl: density * feedMl / madeUpMl }
    steps += 1
  }
}

/** Takes the binary tail off a product of steps. */
function tidyMl(value: number): number {
  return Math.round(value * 1e6) / 1e6
}
