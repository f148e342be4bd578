import type { ExpectedWeight, PlanCondition } from '#shared/types/plan'
import type { EquationStep } from '#shared/types/reference'
import { expectedWeightFromScoreG } from '../calc/condition/expectedWeightFromScoreG'
import { shortfallPercent } from '../calc/condition/shortfallPercent'
import { equationVariables } from '../calc/equation/equationVariables'
import { equationNumber, evaluateEquation } from '../calc/equation/evaluateEquation'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'

/**
 * What the animal should weigh, how far it is below, and the indices its length allows.
 *
 * The best estimate wins: its own earlier weight; then its length by its clade's equation; then the species' adult
 * weight (adults only); then its score; and the pooled equation of the group last, with a factor of two either way.
 *
 * @param context  the plan's context; findings are added.
 * @returns estimates with their spread, the one used and why; nulls where nothing allows an estimate.
 * @throws Never for a context that `planContext` made.
 * @source nutrition sheet 7.1 and 7.2, species sources (clade equations); order is a house rule
 * @example planCondition(planContext(gecko, edition)).method // 'species-adult-weight'
 */
export function planCondition(context: PlanContext): PlanCondition {
  const { weightG } = context
  const lengthMm = usableLengthMm(context)
  const steps: EquationStep[] = []
  const estimates = [fromOwnWeight(context), fromCladeLength(context, lengthMm, steps), fromAdultWeight(context), fromScore(context), fromGroupLength(context, lengthMm, steps)].filter(one => one !== null)
  const used = estimates[0] ?? null
  const shell = shellIndex(context, steps)
  const short = used && shortfallPercent(weightG, used.expectedG)
  return {
    expectedWeightG: used?.expectedG ?? null,
    method: used?.method ?? null,
    why: used ? `Worked out ${used.label}${estimates.length > 1 ? ', the surest of what was given' : ''}.` : 'Nothing given allows an estimate: add a length, a body condition score or an earlier weight.',
    estimates,
    shortfallPercent: short,
    shortfallLowPercent: used && shortfallPercent(weightG, used.lowG),
    shortfallHighPercent: used && shortfallPercent(weightG, used.highG),
    scaledMassIndexG: scaledMassIndex(context, lengthMm),
    relativeCondition: relativeCondition(context, lengthMm),
    shellIndexGPerCm3: shell,
    steps,
  }
}

/** The length where it is measured the species' way and can be true; null otherwise, with a finding. */
function usableLengthMm(context: PlanContext): number | null {
  const { lengthMm, lengthMeasure } = context.input.animal
  const known = context.species.adultLengthMm
  if (lengthMm === undefined || known === null) return lengthMm ?? null
  if (lengthMeasure !== undefined && lengthMeasure !== known.measure) {
    context.findings.push(makeFinding('condition.otherMeasure', 'note', 'Length measured another way', `The figures of this species are for ${measureWords(known.measure)}. The length you gave serves at most for the rough estimate of its whole group.`, { path: 'animal.lengthMeasure', expected: known.measure, received: lengthMeasure }))
    return null
  }
  const longest = (known.publishedMaximumMm ?? known.high) * context.rules.condition.lengthOverMaximum.value
  if (lengthMm > longest) {
    context.findings.push(makeFinding('condition.lengthTooLong', 'caution', 'Longer than this species grows', `${lengthMm} mm ${measureWords(known.measure)} is more than the longest known (${Math.round(known.publishedMaximumMm ?? known.high)} mm). Was the tail measured too? The length is not used.`, { path: 'animal.lengthMm', expected: Math.round(longest), received: lengthMm, unit: 'mm', sourceKey: 'house-rule' }))
    return null
  }
  return lengthMm
}

function measureWords(measure: string): string {
  const words: Record<string, string> = { 'snout-vent': 'from snout to vent', 'total': 'from snout to tail tip', 'carapace': 'straight along the shell', 'wing': 'of the wing', 'body': 'of the body' }
  return words[measure] ?? measure
}

function fromOwnWeight(context: PlanContext): ExpectedWeight | null {
  const own = context.input.animal.healthyWeightG
  if (own === undefined) return null
  const band = context.rules.condition.ownWeightBand.value
  return { method: 'own-earlier-weight', label: 'from its own earlier healthy weight', expectedG: own, lowG: own * (1 - band), highG: own * (1 + band), sourceKey: 'house-rule' }
}

function fromCladeLength(context: PlanContext, lengthMm: number | null, steps: EquationStep[]): ExpectedWeight | null {
  const clade = context.species.weightFromLength
  if (lengthMm === null || clade === null) return null
  const equation = context.edition.equations.get(clade.equationId)!
  const evaluated = evaluateEquation(equation, equationVariables(equation, { lengthMm }))
  steps.push(...evaluated.steps)
  const band = context.rules.condition.cladeLengthBand.value
  return { method: 'clade-length', label: `from its length, by the equation of its family (${clade.clade})`, expectedG: evaluated.value, lowG: evaluated.value / (1 + band), highG: evaluated.value * (1 + band), sourceKey: clade.sourceKey }
}

function fromAdultWeight(context: PlanContext): ExpectedWeight | null {
  if (context.input.animal.lifeStage === 'growing' || context.species.notInList) return null
  const { low, high } = context.species.adultWeightG
  // The middle of a range of weights is geometric: 45 to 80 g is as far above 60 as below.
  return { method: 'species-adult-weight', label: 'from the adult weight of its species', expectedG: Math.sqrt(low * high), lowG: low, highG: high, sourceKey: context.species.provenance.adultWeightG!.sourceKey }
}

function fromScore(context: PlanContext): ExpectedWeight | null {
  const score = context.input.animal.bodyConditionScore
  if (score === undefined) return null
  const { lossPerNinthStep, lossPerNinthStepUpper } = context.rules.condition
  const at = (lossPerStep: number) => expectedWeightFromScoreG({ weightG: context.weightG, score, lossPerNinthStep: lossPerStep })
  return { method: 'condition-score', label: 'from its body condition score', expectedG: at(lossPerNinthStep.value), lowG: at(lossPerNinthStep.value / 2), highG: at(lossPerNinthStepUpper.value), sourceKey: lossPerNinthStep.sourceKey }
}

function fromGroupLength(context: PlanContext, lengthMm: number | null, steps: EquationStep[]): ExpectedWeight | null {
  const group = context.rules.condition.groupLengthEquationId[context.species.group]
  const measure = context.input.animal.lengthMeasure ?? context.species.adultLengthMm?.measure
  const given = lengthMm ?? (measure === group?.measure ? context.input.animal.lengthMm ?? null : null)
  if (!group || given === null || measure !== group.measure || context.findings.some(one => one.code === 'condition.lengthTooLong')) return null
  const equation = context.edition.equations.get(group.equationId)!
  const evaluated = evaluateEquation(equation, equationVariables(equation, { lengthMm: given }))
  if (steps.length === 0) steps.push(...evaluated.steps)
  const factor = context.rules.condition.groupLengthFactor.value
  return { method: 'group-length', label: 'from its length, by one equation for the whole group (rough: half to double)', expectedG: evaluated.value, lowG: evaluated.value / factor, highG: evaluated.value * factor, sourceKey: equation.provenance.sourceKey }
}

function scaledMassIndex(context: PlanContext, lengthMm: number | null): number | null {
  const clade = context.species.weightFromLength
  const known = context.species.adultLengthMm
  if (lengthMm === null || clade === null || known === null) return null
  return equationNumber(context.edition.equations.get('scaled-mass-index')!, { M: context.weightG, L: lengthMm, L0: (known.low + known.high) / 2, b: clade.slope })
}

function relativeCondition(context: PlanContext, lengthMm: number | null): number | null {
  const clade = context.species.weightFromLength
  if (lengthMm === null || clade === null) return null
  return context.weightG / equationNumber(context.edition.equations.get(clade.equationId)!, equationVariables(context.edition.equations.get(clade.equationId)!, { lengthMm }))
}

function shellIndex(context: PlanContext, steps: EquationStep[]): number | null {
  const rule = context.rules.condition.shellIndex
  const { lengthMm, lengthMeasure = 'carapace' } = context.input.animal
  if (!rule.speciesIds.includes(context.species.id) || lengthMm === undefined || lengthMeasure !== 'carapace') return null
  const equation = context.edition.equations.get('jackson-ratio')!
  const evaluated = evaluateEquation(equation, equationVariables(equation, { massG: context.weightG, lengthMm }))
  steps.push(...evaluated.steps)
  const high = evaluated.value < rule.highRiskUnder.value
  if (high || evaluated.value < rule.warnUnder.value) {
    context.findings.push(makeFinding(high ? 'condition.shellIndexVeryLow' : 'condition.shellIndexLow', 'caution', high ? 'Shell index very low' : 'Shell index low', `Weight over shell length cubed is ${evaluated.value.toFixed(3)} g per cubic cm; 0.18 to 0.22 is usual. Bladder water or eggs shift it, and it holds for this species only.`, { expected: rule.warnUnder.value, received: evaluated.value, unit: 'g/cm3', sourceKey: rule.warnUnder.sourceKey }))
  }
  return evaluated.value
}
