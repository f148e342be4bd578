import { checkedNumber } from '../checkedNumber'

/**
 * Powder and water for one pot, in amounts that the kitchen scale and a measuring syringe can show.
 *
 * The powder is a whole number of scale steps, enough of them that the scale's own step does not spoil the mix; the
 * water follows from it. A pot may therefore be larger than needed; the rest is thrown away.
 *
 * @param input  one pot:
 * @param input.neededMl  at least this much, mL, above 0;
 * @param input.strengthFraction  strength, above 0 to 1;
 * @param input.powderGPerMl  powder in one mL of full-strength feed, g/mL, above 0;
 * @param input.powderVolumeMlPerG  room that a gram of powder takes in the mix, mL/g, 0 or more;
 * @param input.energyKcalPerPowderG  energy of the powder, kcal/g, above 0;
 * @param input.scaleStepG  step of the kitchen scale, g, above 0;
 * @param input.fewestSteps  fewest scale steps of powder, whole, 1 or more;
 * @param input.waterStepMl  step that water is measured to, mL, above 0.
 * @returns `{ powderG, waterMl, madeUpMl, energyKcalPerMl }`; `energyKcalPerMl` is what these amounts really give.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule (weigh, never scoop; trade needs 4.3)
 * @example potAmounts({ neededMl: 10, strengthFraction: 0.5, powderGPerMl: 0.25, powderVolumeMlPerG: 0.6, energyKcalPerPowderG: 4, scaleStepG: 0.1, fewestSteps: 5, waterStepMl: 0.5 }) // { powderG: 1.3, waterMl: 9.5, madeUpMl: 10.28, energyKcalPerMl: 0.5058… }
 */
export function potAmounts(input: { neededMl: number, strengthFraction: number, powderGPerMl: number, powderVolumeMlPerG: number, energyKcalPerPowderG: number, scaleStepG: number, fewestSteps: number, waterStepMl: number }): { powderG: number, waterMl: number, madeUpMl: number, energyKcalPerMl: number } {
  const needed = checkedNumber(input.neededMl, 'the pot', 'mL', Number.MIN_VALUE)
  const strength = checkedNumber(input.strengthFraction, 'the strength', 'of full', Number.MIN_VALUE, 1)
  const gPerMl = strength * checkedNumber(input.powderGPerMl, 'the powder', 'g/mL', Number.MIN_VALUE)
  const scaleStep = checkedNumber(input.scaleStepG, 'the scale step', 'g', Number.MIN_VALUE)
  const waterStep = checkedNumber(input.waterStepMl, 'the water step', 'mL', Number.MIN_VALUE)
  const room = checkedNumber(input.powderVolumeMlPerG, 'the room of the powder', 'mL/g', 0)
  let steps = Math.max(checkedNumber(input.fewestSteps, 'the steps', 'steps', 1), Math.ceil(needed * gPerMl / scaleStep - 1e-9))
  for (;;) {
    const powderG = tidy(steps * scaleStep)
    const waterMl = tidy(Math.round((powderG / gPerMl - powderG * room) / waterStep) * waterStep)
    const madeUpMl = tidy(waterMl + powderG * room)
    // Rounding the water down must not leave the pot short.
    if (waterMl > 0 && madeUpMl >= needed - 1e-9) return { powderG, waterMl, madeUpMl, energyKcalPerMl: powderG * input.energyKcalPerPowderG / madeUpMl }
    steps += 1
  }
}

/** Takes the binary tail off a product of steps, far below any step. */
function tidy(value: number): number {
  return Math.round(value * 1e6) / 1e6
}
