import type { RegimenInput } from '#shared/schemas/regimen'
import type { Finding, FindingLevel } from '#shared/types/finding'
import type { Plan, PlanFeedInfo } from '#shared/types/plan'
import type { Edition } from '../reference'
import { planCautions } from './planCautions'
import { planCondition } from './planCondition'
import { planContext, type PlanContext } from './planContext'
import { planDays } from './planDays'
import { planEnergy } from './planEnergy'
import { planFluids } from './planFluids'
import { closedReasonOf, planGate } from './planGate'
import { planMeals } from './planMeals'
import { planMixing } from './planMixing'
import { planRamp } from './planRamp'
import { planUncertainty } from './planUncertainty'
import { planValidity, weighedOnOf } from './planValidity'
import { howToGive, ROUTE_LABELS, stopSigns } from './planWords'

const WEIGHT_OF_LEVEL: Record<FindingLevel, number> = { stop: 0, caution: 1, note: 2 }

/**
 * A whole feeding plan: from an animal and a feed to days with clock times, marks on a syringe, water, pots, findings.
 *
 * Pure: the same input and edition give the same plan; the time comes from `input.startAt`.
 *
 * @param input  checked by `RegimenInput`.
 * @param edition  reference data to work with; its id is written into the plan.
 * @returns the plan. Amounts to give are rounded to marks; all other numbers are unrounded.
 * @throws CalcInputError for impossible input, with the path of the field: `species.unknown`, `feed.unknown`,
 *   `feed.noEnergy`, `weight.implausible`, `energy.unknownEquation`, `timeZone.unknown`, `number.outOfRange`.
 * @source nutrition and dosing sheets as named in each part; joined here without a number of its own
 * @example buildPlan(input, currentEdition()).gate.state // 'wait'
 */
export function buildPlan(input: RegimenInput, edition: Edition): Plan {
  const context = planContext(input, edition)
  const energy = planEnergy(context)
  const condition = planCondition(context)
  const emaciated = (condition.shortfallPercent ?? 0) >= context.rules.condition.emaciatedFromPercent.value || (input.animal.bodyConditionScore ?? 3) <= 1.5
  const fluids = planFluids(context, emaciated)
  const outline = planRamp(context, condition)
  const meals = planMeals(context, energy, fluids, outline.onceAStep ? outline.stepDays : 1)
  const gate = planGate(context, outline)
  const planned = planDays(context, outline, energy, fluids, meals, closedReasonOf(context))
  const mixing = planMixing(context, planned.days)
  const uncertainty = planUncertainty(context, planned.days)
  const validity = planValidity(context, outline.tier, planned.days, gate)
  planCautions(context, condition, outline.tier, outline.reasons)
  return {
    edition: edition.id,
    timeZone: input.timeZone,
    animal: animalOf(context, weighedOnOf(context, planned.days)),
    feed: feedInfoOf(context),
    route: input.route,
    routeLabel: ROUTE_LABELS[input.route],
    gate,
    energy,
    condition,
    fluids,
    ramp: {
      tier: outline.tier,
      reasons: outline.reasons,
      fractions: outline.fractions,
      steps: planned.steps,
      stepDays: outline.stepDays,
      warmHours: outline.warmHours,
      fluidHours: outline.fluidHours,
      startsAt: new Date(context.startMs).toISOString(),
      fluidsFrom: new Date(planned.fluidsFromMs).toISOString(),
      firstFeedAt: planned.firstFeedAt,
      fullMealsOn: planned.fullMealsOn,
      daysToFull: planned.daysToFull,
      sourceKey: outline.sourceKey,
    },
    meal: {
      capMl: meals.laterCapMl,
      firstCapMl: meals.firstCapMl,
      firstCapMeals: meals.firstCapMeals,
      firstMealMl: planned.firstMealMl,
      largestMealMl: planned.largestMealMl,
      smallestMeasurableMl: meals.smallestMeasurableMl,
      binds: planned.binds,
      steps: meals.steps,
      firstMealSteps: planned.firstMealSteps,
    },
    days: planned.days,
    mixing,
    uncertainty,
    validity,
    howToGive: howToGive(context),
    stopSigns: stopSigns(context),
    findings: sorted([...gate.findings, ...context.findings]),
  }
}

/** Figures of the species that a plan shows, each with where it comes from. */
const SHOWN_ORIGINS = ['adultWeightG', 'feedingTemperatureC', 'warmPlaceC', 'mealLimitMlPerKg', 'feedingIntervalHours', 'maintenanceMlPerKgPerDay']

function sorted(findings: Finding[]): Finding[] {
  return findings.sort((a, b) => WEIGHT_OF_LEVEL[a.level] - WEIGHT_OF_LEVEL[b.level])
}

function animalOf(context: PlanContext, weighedOn: string): Plan['animal'] {
  const { animal } = context.input
  const { species } = context
  return {
    name: animal.name ?? '',
    caseNumber: animal.caseNumber ?? '',
    enclosure: animal.enclosure ?? '',
    speciesId: species.id,
    speciesName: species.commonName,
    scientificName: species.scientificName,
    group: species.group,
    diet: species.diet,
    weightG: animal.weightG,
    weighedOn,
    lengthMm: animal.lengthMm ?? null,
    lengthMeasure: animal.lengthMm === undefined ? null : animal.lengthMeasure ?? species.adultLengthMm?.measure ?? null,
    feedingTemperatureC: { low: species.feedingTemperatureC.low, high: species.feedingTemperatureC.high, what: species.feedingTemperatureC.what },
    warmPlaceC: { low: species.warmPlaceC.low, high: species.warmPlaceC.high, what: species.warmPlaceC.what },
    origins: Object.fromEntries(SHOWN_ORIGINS.flatMap(field => species.provenance[field] ? [[field, species.provenance[field]]] : [])),
  }
}

function feedInfoOf(context: PlanContext): PlanFeedInfo {
  const { feed } = context
  return { feedId: feed.feedId, name: feed.name, energyKcalPerMl: feed.energyKcalPerMl, waterFraction: feed.waterFraction, demo: feed.demo, sourceKey: feed.sourceKey }
}
