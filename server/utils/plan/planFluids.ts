import type { PlanFluids } from '#shared/types/plan'
import type { EquationStep } from '#shared/types/reference'
import { formatNumber, formatSignificant } from '#shared/utils/quantity'
import { equationVariables } from '../calc/equation/equationVariables'
import { equationNumber } from '../calc/equation/evaluateEquation'
import { deficitHours } from '../calc/fluids/deficitHours'
import { deficitMl } from '../calc/fluids/deficitMl'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'

const USUAL_ROUTE = {
  reptile: 'A shallow lukewarm soak and drops at the lips; other ways only under a vet.',
  amphibian: 'Through the skin: a shallow soak in dechlorinated water, never by volume into the mouth.',
  bird: 'Drops along the beak, or by tube by someone trained; under the skin only by a vet or under one.',
  mammal: 'By mouth, or under the skin by a vet or under one.',
} as const

/**
 * Water: maintenance of the group, the deficit and the hours to put it back, and the most a day may bring.
 *
 * @param context  the plan's context; findings are added.
 * @param emaciated  true when the animal is thin enough that skin and eyes mislead; the dryness is then capped.
 * @returns mL, mL/day and h, unrounded. Amphibians get no volume: they soak.
 * @throws Never for a context that `planContext` made.
 * @source nutrition sheet 6.1 to 6.3 and 12.2, corrections C
 * @example planFluids(planContext(gecko, edition), true).drynessUsedPercent // 8 at most
 */
export function planFluids(context: PlanContext, emaciated: boolean): PlanFluids {
  const { rules, weightG, weightKg, kind } = context
  const steps: EquationStep[] = []
  const maintenance = maintenanceOf(context, steps)
  const entered = context.input.animal.drynessPercent
  const capPercent = rules.fluids.drynessCapWhenEmaciatedPercent.value
  const drynessUsedPercent = emaciated ? Math.min(entered, capPercent) : entered
  if (drynessUsedPercent < entered) {
    context.findings.push(makeFinding('fluids.drynessCapped', 'caution', 'Dryness taken as 8 %, not more', `${formatNumber(entered)} % was entered, but a very thin animal looks drier than it is. The plan puts back ${capPercent} % (${formatSignificant(deficitMl({ weightG, drynessPercent: capPercent }))} mL); a vet may ask for the whole ${formatSignificant(deficitMl({ weightG, drynessPercent: entered }))} mL.`, { path: 'animal.drynessPercent', expected: capPercent, received: entered, unit: '%', sourceKey: 'house-rule' }))
  }
  const deficit = deficitMl({ weightG, drynessPercent: drynessUsedPercent })
  steps.push({ label: 'Deficit: kg × % × 10', expression: `${formatSignificant(weightKg)} × ${formatNumber(drynessUsedPercent)} × 10`, value: deficit, unit: 'mL' })

  const capMlPerDay = capOf(context)
  steps.push({ label: 'Most in a day', expression: `limit of the group`, value: capMlPerDay, unit: 'mL/day' })
  const groupHours = rules.fluids.deficitHours[kind].value
  const hours = deficitHours({ deficitMl: deficit, groupHours, maintenanceMlPerDay: maintenance.mlPerDay, capMlPerDay, longestHours: rules.fluids.longestHours.value })
  steps.push({ label: hours > groupHours ? `Hours to put it back: ${groupHours} h, made longer to stay under the day's limit` : 'Hours to put it back', expression: `${formatNumber(hours, 1)} h`, value: hours, unit: 'h' })
  if (maintenance.mlPerDay > capMlPerDay) {
    context.findings.push(makeFinding('fluids.aboveCap', 'caution', 'Maintenance is over the day\'s limit', `The rate entered comes to ${formatSignificant(maintenance.mlPerDay)} mL a day; the limit for this group is ${formatSignificant(capMlPerDay)} mL. The plan gives no more than the limit: too much fluid kills too.`, { path: 'overrides.maintenanceMlPerKgPerDay', expected: capMlPerDay, received: maintenance.mlPerDay, unit: 'mL/day', sourceKey: maintenance.sourceKey }))
  }
  if (kind === 'amphibian') context.findings.push(makeFinding('fluids.bySoak', 'note', 'Water through the skin', 'Frogs and salamanders take water through the skin: give a shallow soak. No volume is planned by mouth.', { sourceKey: 'educ' }))
  return {
    maintenanceMlPerDay: maintenance.mlPerDay,
    maintenanceMlPerKgPerDay: maintenance.mlPerDay / weightKg,
    drynessUsedPercent,
    deficitMl: deficit,
    deficitAsEnteredMl: deficitMl({ weightG, drynessPercent: entered }),
    deficitHours: hours,
    capMlPerDay,
    metabolicWaterMlPerKcal: rules.fluids.metabolicMlPerKcal.value,
    usualRoute: USUAL_ROUTE[kind],
    steps,
    sourceKey: maintenance.sourceKey,
  }
}

function maintenanceOf(context: PlanContext, steps: EquationStep[]): { mlPerDay: number, sourceKey: string } {
  const { rules, species, weightKg, kind } = context
  const usual = usualMaintenance(context)
  const chosen = context.input.overrides?.maintenanceMlPerKgPerDay
  if (chosen !== undefined) {
    const mlPerDay = chosen * weightKg
    steps.push({ label: 'Maintenance at the rate entered', expression: `${formatNumber(chosen)} mL/kg/day × ${formatSignificant(weightKg)} kg`, value: mlPerDay, unit: 'mL/day' })
    if (kind !== 'amphibian' && mlPerDay > usual.mlPerDay * rules.fluids.overMaintenance.value) {
      context.findings.push(makeFinding('fluids.overMaintenance', 'caution', 'More than twice the usual fluid', `${formatNumber(chosen)} mL/kg a day was entered; ${formatSignificant(usual.mlPerDay / weightKg)} is usual for this group. Doubling maintenance is harmful.`, { path: 'overrides.maintenanceMlPerKgPerDay', expected: usual.mlPerDay / weightKg, received: chosen, unit: 'mL/kg/day', sourceKey: 'aaha2024' }))
    }
    return { mlPerDay, sourceKey: 'house-rule' }
  }
  if (species.maintenanceEquationId === null) steps.push({ label: 'Maintenance', expression: `${formatSignificant(usual.mlPerDay / weightKg)} mL/kg/day × ${formatSignificant(weightKg)} kg`, value: usual.mlPerDay, unit: 'mL/day' })
  else steps.push({ label: `Maintenance: ${context.edition.equations.get(species.maintenanceEquationId)!.title}`, expression: `${context.edition.equations.get(species.maintenanceEquationId)!.expression} with M = ${formatSignificant(weightKg)} kg`, value: usual.mlPerDay, unit: 'mL/day' })
  return usual
}

function usualMaintenance(context: PlanContext): { mlPerDay: number, sourceKey: string } {
  const { rules, species, weightG, weightKg, kind } = context
  if (species.maintenanceEquationId !== null) {
    const equation = context.edition.equations.get(species.maintenanceEquationId)!
    return { mlPerDay: equationNumber(equation, equationVariables(equation, { massG: weightG })), sourceKey: equation.provenance.sourceKey }
  }
  if (kind === 'bird') {
    const rate = weightG < rules.fluids.birdSmallUnderG.value ? rules.fluids.birdMaintenance.small : rules.fluids.birdMaintenance.large
    return { mlPerDay: rate.value * weightKg, sourceKey: rate.sourceKey }
  }
  return { mlPerDay: (species.maintenanceMlPerKgPerDay ?? 0) * weightKg, sourceKey: species.provenance.maintenanceMlPerKgPerDay?.sourceKey ?? 'house-rule' }
}

function capOf(context: PlanContext): number {
  const { rules, weightG, weightKg, kind } = context
  const cap = rules.fluids.capMlPerKgPerDay
  if (kind === 'mammal') return usualMaintenance(context).mlPerDay + cap.mammalOverMaintenance.value * weightKg
  if (kind === 'bird') return (weightG < rules.fluids.birdSmallUnderG.value ? cap.birdUnder100G : cap.bird).value * weightKg
  return (kind === 'reptile' ? cap.reptile : cap.amphibian).value * weightKg
}
