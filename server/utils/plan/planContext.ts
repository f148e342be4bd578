import type { RegimenInput } from '#shared/schemas/regimen'
import type { Finding } from '#shared/types/finding'
import type { SpeciesItem } from '#shared/types/reference'
import { isEctotherm, kindOf, type Kind } from '#shared/utils/groups'
import { formatNumber } from '#shared/utils/quantity'
import { CalcInputError } from '../calc/calcInputError'
import type { Edition } from '../reference'
import type { Rules } from '../reference/rules'
import { resolveFeed, type ResolvedFeed } from './resolveFeed'

/** What every part of a plan is worked out from. Made once per plan; parts add findings to it. */
export interface PlanContext {
  input: RegimenInput
  edition: Edition
  rules: Rules
  species: SpeciesItem
  feed: ResolvedFeed
  kind: Kind
  ectotherm: boolean
  weightG: number
  weightKg: number
  bodyTemperatureC: number | null
  startMs: number
  findings: Finding[]
}

/**
 * Joins an input and an edition of the reference data, and refuses what cannot be.
 *
 * @param input  checked by `RegimenInput`.
 * @param edition  reference data to work with.
 * @returns the context, with the feed resolved and no findings but the feed's own.
 * @throws CalcInputError `species.unknown` when the species is not in the edition;
 * @throws CalcInputError `weight.implausible` when the weight is outside 0.2 to 5 times the species' adult range
 *   (growing animals: only above), which is how a slip of unit looks;
 * @throws CalcInputError `feed.unknown` when the feed is not in the edition.
 * @source house rule MET-05 (plausible weights)
 * @example planContext(input, currentEdition()).kind // 'reptile'
 */
export function planContext(input: RegimenInput, edition: Edition): PlanContext {
  const rules = edition.rules
  const species = edition.species.get(input.animal.speciesId)
  if (!species) throw new CalcInputError('species.unknown', `There is no species "${input.animal.speciesId}". Choose one from the list, or the entry "not in the list" of its group.`, { path: 'animal.speciesId', received: input.animal.speciesId })
  const weightG = input.animal.weightG
  refuseImplausibleWeight(weightG, input.animal.lifeStage, species, rules)
  const findings: Finding[] = []
  return {
    input,
    edition,
    rules,
    species,
    feed: resolveFeed(input.feed, edition, findings),
    kind: kindOf(species.group),
    ectotherm: isEctotherm(species.group),
    weightG,
    weightKg: weightG / 1000,
    bodyTemperatureC: input.animal.bodyTemperatureC ?? null,
    startMs: Date.parse(input.startAt),
    findings,
  }
}

function refuseImplausibleWeight(weightG: number, lifeStage: RegimenInput['animal']['lifeStage'], species: SpeciesItem, rules: Rules): void {
  const lowest = species.adultWeightG.low * rules.condition.plausibleLow.value
  const highest = species.adultWeightG.high * rules.condition.plausibleHigh.value
  const range = `${formatNumber(species.adultWeightG.low)} to ${formatNumber(species.adultWeightG.high)} g`
  const typed = `${formatNumber(weightG, 3)} g`
  if (weightG > highest) {
    throw new CalcInputError('weight.implausible', `${typed} is too heavy for this species (adults ${range}). Was the weight typed in another unit? Give it in grams.`, { path: 'animal.weightG', received: weightG, expected: range })
  }
  if (lifeStage !== 'growing' && weightG < lowest) {
    throw new CalcInputError('weight.implausible', `${typed} is too light for an adult of this species (adults ${range}). Was it typed in kilograms? Give it in grams, or choose "growing" if it is young.`, { path: 'animal.weightG', received: weightG, expected: range })
  }
}
