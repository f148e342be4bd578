import type { EnergyAlternative, PlanEnergy } from '#shared/types/plan'
import type { EquationItem, Group } from '#shared/types/reference'
import { KJ_PER_KCAL } from '#shared/utils/units'
import { formatSignificant } from '#shared/utils/quantity'
import { CalcInputError } from '../calc/calcInputError'
import { targetKcalPerDay } from '../calc/energy/targetKcalPerDay'
import { usedTemperatureC } from '../calc/energy/usedTemperatureC'
import { equationKcalPerDay, evaluateEquation } from '../calc/equation/evaluateEquation'
import { equationVariables } from '../calc/equation/equationVariables'
import type { Edition } from '../reference'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'

/**
 * Energy of full meals: resting rate by the group's default equation (or the one a person chose) at the temperature it
 * will be fed at, times a factor, capped by the free-living rate; and every other equation of the group beside it.
 *
 * @param context  the plan's context; findings are added.
 * @returns kcal/day and kJ/day, unrounded, with the working.
 * @throws CalcInputError `energy.unknownEquation` when the chosen equation is unknown or not one for this group.
 * @source nutrition sheet 12.1 and 12.2 (defaults), corrections A
 * @example planEnergy(planContext(gecko, edition)).equationId // 'andrews-pough-1985'
 */
export function planEnergy(context: PlanContext): PlanEnergy {
  const { edition, rules, species, weightG } = context
  const equation = chosenEquation(context)
  const temperatureC = context.ectotherm
    ? usedTemperatureC({
        bodyTemperatureC: context.bodyTemperatureC,
        windowLowC: species.feedingTemperatureC.low,
        windowHighC: species.feedingTemperatureC.high,
        limitLowC: rules.energy.temperatureLowC.value,
        limitHighC: rules.energy.temperatureHighC.value,
      })
    : null
  const evaluated = evaluateEquation(equation, equationVariables(equation, { massG: weightG, temperatureC, state: 1 }))
  const isDefault = equation.id === rules.energy.defaultEquationId[species.group]
  const groupFactor = isDefault ? rules.energy.groupFactor[species.group] : undefined
  const steps = [...evaluated.steps]
  let baseKcalPerDay = evaluated.kcalPerDay!
  if (groupFactor) {
    steps.push({ label: `Adjusted for this group (${groupFactor.locator})`, expression: `${formatSignificant(baseKcalPerDay)} × ${groupFactor.value}`, value: baseKcalPerDay * groupFactor.value, unit: 'kcal/day' })
    baseKcalPerDay *= groupFactor.value
  }

  // A maintenance or field equation already holds a day of living: multiplying it again would count that twice.
  const isBase = equation.basis === 'resting' || equation.basis === 'standard'
  const factorRecord = rules.energy.factor[context.kind][context.input.animal.lifeStage]
  const factor = isBase ? factorRecord.value : 1
  const fieldId = rules.energy.fieldEquationId[species.group]
  const field = fieldId === null ? null : edition.equations.get(fieldId)!
  const fieldCapKcalPerDay = field === null ? null : equationKcalPerDay(field, equationVariables(field, { massG: weightG, temperatureC, state: 1 }))
  const { targetKcalPerDay: target, cappedByFieldRate } = targetKcalPerDay({ restingKcalPerDay: baseKcalPerDay, factor, fieldCapKcalPerDay })
  steps.push({ label: isBase ? `Full meals: resting × ${factor} (${factorRecord.locator})` : 'Full meals: this equation already covers a whole day', expression: `${formatSignificant(baseKcalPerDay)} × ${factor}`, value: baseKcalPerDay * factor, unit: 'kcal/day' })
  if (cappedByFieldRate) {
    steps.push({ label: 'Never above the free-living rate', expression: `${formatSignificant(target)} kcal/day (${field!.title})`, value: target, unit: 'kcal/day' })
    context.findings.push(makeFinding('energy.cappedByFieldRate', isDefault ? 'note' : 'caution', 'Energy held at the free-living rate', `The equation asks for ${formatSignificant(baseKcalPerDay * factor)} kcal a day; a free-living animal of this weight spends ${formatSignificant(target)}. The plan keeps to the lower figure.`, { expected: target, received: baseKcalPerDay * factor, unit: 'kcal/day', sourceKey: field!.provenance.sourceKey }))
  }
  return {
    restingKcalPerDay: baseKcalPerDay,
    factor,
    targetKcalPerDay: target,
    targetKjPerDay: target * KJ_PER_KCAL,
    equationId: equation.id,
    temperatureC,
    fieldCapKcalPerDay,
    cappedByFieldRate,
    alternatives: alternativesTo(equation.id, context, temperatureC),
    steps,
    sourceKey: equation.provenance.sourceKey,
  }
}

function chosenEquation(context: PlanContext): EquationItem {
  const { edition, rules, species } = context
  const chosenId = context.input.overrides?.energyEquationId
  const defaultId = rules.energy.defaultEquationId[species.group]
  if (chosenId === undefined || chosenId === defaultId) return edition.equations.get(defaultId)!
  const chosen = edition.equations.get(chosenId)
  if (!chosen || chosen.topic !== 'energy' || !chosen.groups.includes(species.group) || (chosen.speciesIds && !chosen.speciesIds.includes(species.id))) {
    throw new CalcInputError('energy.unknownEquation', `There is no energy equation "${chosenId}" for this group. Choose one that the plan lists.`, { path: 'overrides.energyEquationId', received: chosenId })
  }
  context.findings.push(makeFinding('energy.otherEquation', 'caution', 'Another energy equation was chosen', `The plan uses "${chosen.title}" instead of the default for this group. Compare the two before you trust it.`, { path: 'overrides.energyEquationId', expected: defaultId, received: chosenId, sourceKey: chosen.provenance.sourceKey }))
  return chosen
}

// The equations of a group never change within an edition.
const equationsOfGroup = new WeakMap<Edition, Map<Group, EquationItem[]>>()

function energyEquationsOf(edition: Edition, group: Group): EquationItem[] {
  let byGroup = equationsOfGroup.get(edition)
  if (!byGroup) equationsOfGroup.set(edition, byGroup = new Map())
  let list = byGroup.get(group)
  if (!list) byGroup.set(group, list = [...edition.equations.values()].filter(one => one.topic === 'energy' && one.groups.includes(group)))
  return list
}

function alternativesTo(usedId: string, context: PlanContext, temperatureC: number | null): EnergyAlternative[] {
  const { species, weightG } = context
  const alternatives: EnergyAlternative[] = []
  for (const equation of energyEquationsOf(context.edition, species.group)) {
    if (equation.id === usedId || equation.basis === null) continue
    if (equation.speciesIds && !equation.speciesIds.includes(species.id)) continue
    const variables = equationVariables(equation, { massG: weightG, temperatureC, state: 1 })
    if (equation.variables.some(one => variables[one.name]! < one.low || variables[one.name]! > one.high)) continue
    alternatives.push({ equationId: equation.id, title: equation.title, basis: equation.basis, kcalPerDay: equationKcalPerDay(equation, variables), temperatureC: equation.temperatureTerm === 'none' ? equation.holdsAtC : temperatureC, sourceKey: equation.provenance.sourceKey })
  }
  return alternatives
}
