import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import type { ChangedLine } from '#shared/types/planLife'
import { comparedAnimal, comparedEdition, comparedFeed, comparedFluids, comparedHouse, comparedLimits, comparedSteps } from './compareEntered'
import { comparedGate, comparedGiven } from './compareGiven'

/** One version of a plan as it was saved: what was entered, and what came of it. */
export interface ComparedVersion { input: RegimenInput, plan: Plan }

/**
 * What changed between two versions of a plan, line by line, in plain words: first what a carer would give
 * differently, then what was entered or worked out differently. What reads the same on paper is no change.
 *
 * Pure: nothing is worked out again; both versions are read as they were saved.
 *
 * @param before  the version compared with, usually the older one.
 * @param after  the version that is looked at.
 * @returns lines in the order of `ComparedPart`; `amount` where a carer would give something else; empty when nothing changed.
 * @throws Never for plans that `buildPlan` made.
 * @example compareVersions(first, second)[0].text // 'Each feed on Fri 4 to Sun 6 Dec from 0.35 mL to 0.4 mL'
 */
export function compareVersions(before: ComparedVersion, after: ComparedVersion): ChangedLine[] {
  return [
    ...comparedGiven(before.plan, after.plan),
    ...comparedGate(before.plan, after.plan),
    ...comparedAnimal(before, after),
    ...comparedFeed(before, after),
    ...comparedSteps(before, after),
    ...comparedFluids(before, after),
    ...comparedLimits(before, after),
    ...comparedHouse(before, after),
    ...comparedEdition(before, after),
  ]
}
