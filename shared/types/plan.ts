/** The plan: what `POST /api/regimens/preview` answers, what is saved, and what is printed. */
import type { Finding } from './finding'
import type { Diet, EnergyBasis, EquationStep, Group, LengthMeasure, Provenance, Range } from './reference'

export const GATE_STATES = ['feed', 'wait', 'do-not-feed'] as const
export type GateState = (typeof GATE_STATES)[number]

export const STAGES = ['warm', 'fluids', 'ramp', 'full'] as const
export type Stage = (typeof STAGES)[number]

export const TIERS = ['low', 'moderate', 'high', 'extreme'] as const
export type Tier = (typeof TIERS)[number]

export interface Syringe { capacityMl: number, stepMl: number }

export interface PlanGate {
  state: GateState
  /** Why, worst first. Empty only when the state is `feed`. */
  findings: Finding[]
}

export interface EnergyAlternative {
  equationId: string
  title: string
  basis: EnergyBasis
  kcalPerDay: number
  /** Temperature it was worked out for, or holds at; null for endotherms. */
  temperatureC: number | null
  sourceKey: string
}

export interface PlanEnergy {
  restingKcalPerDay: number
  /** Multiplier on resting that gives full meals. */
  factor: number
  targetKcalPerDay: number
  targetKjPerDay: number
  equationId: string
  /** Body temperature that was used, deg C; null for endotherms. */
  temperatureC: number | null
  /** Free-living (field) rate that the target never exceeds; null where none is published for the group. */
  fieldCapKcalPerDay: number | null
  cappedByFieldRate: boolean
  alternatives: EnergyAlternative[]
  steps: EquationStep[]
  sourceKey: string
}

export const EXPECTED_WEIGHT_METHODS = ['own-earlier-weight', 'clade-length', 'species-adult-weight', 'condition-score', 'group-length'] as const
export type ExpectedWeightMethod = (typeof EXPECTED_WEIGHT_METHODS)[number]

export interface ExpectedWeight {
  method: ExpectedWeightMethod
  /** Plain words, for example "from its length, by the equation of its family (Eublepharidae)". */
  label: string
  expectedG: number
  lowG: number
  highG: number
  sourceKey: string
}

export interface PlanCondition {
  /** Null when nothing allows an estimate (no length, no score, growing). */
  expectedWeightG: number | null
  method: ExpectedWeightMethod | null
  /** Why this method and not another, in a sentence. */
  why: string
  estimates: ExpectedWeight[]
  /** 0-100 below the expected weight; 0 when at or above it; null when unknown. */
  shortfallPercent: number | null
  shortfallLowPercent: number | null
  shortfallHighPercent: number | null
  /** M x (L0 / L)^b, g; null without a length. */
  scaledMassIndexG: number | null
  /** Ratio of the weight to the weight expected at its length; null without a length. */
  relativeCondition: number | null
  /** g per cubic cm; only for the two tortoise species it was made for. */
  shellIndexGPerCm3: number | null
  steps: EquationStep[]
}

export interface PlanFluids {
  maintenanceMlPerDay: number
  maintenanceMlPerKgPerDay: number
  /** Dryness that the deficit uses, %: the entered one, or lower where it is capped. */
  drynessUsedPercent: number
  deficitMl: number
  /** Deficit from the dryness as entered, mL; differs from `deficitMl` where that is capped. */
  deficitAsEnteredMl: number
  deficitHours: number
  capMlPerDay: number
  /** mL of water made per kcal burnt. */
  metabolicWaterMlPerKcal: number
  /** How it is usually given, in words. */
  usualRoute: string
  steps: EquationStep[]
  sourceKey: string
}

export interface PlanStep {
  /** 1 for the first step. */
  number: number
  fraction: number
  /** Calendar days that this step lasts. */
  days: number
  firstDate: string
}

export interface PlanRamp {
  tier: Tier
  /** Each reason in a sentence. */
  reasons: string[]
  /** Fractions of the full amount, one per step; never fall and end at 1. */
  fractions: number[]
  steps: PlanStep[]
  /** Days that one step lasts: 1 for birds and mammals, the feeding interval for the others. */
  stepDays: number
  warmHours: number
  fluidHours: number
  /** Instants, UTC ISO 8601. */
  startsAt: string
  fluidsFrom: string
  firstFeedAt: string | null
  fullMealsOn: string | null
  /** Days from the start to the first day of full meals, counting both. */
  daysToFull: number | null
  sourceKey: string
}

export interface PlanMeal {
  /** Limit of a later meal, mL: the largest that any meal of this plan may be. */
  capMl: number
  /** Limit of the first meals, mL. */
  firstCapMl: number
  /** How many meal days the first limit holds. */
  firstCapMeals: number
  /** Null when no meal can be measured or the gate stays closed. */
  firstMealMl: number | null
  largestMealMl: number | null
  /** Smallest amount that the syringes in the house can measure for a feed, mL. */
  smallestMeasurableMl: number
  /** What bound, in a sentence, and what would free it; empty when all fits. */
  binds: string[]
  /** How the limits were worked out. */
  steps: EquationStep[]
  /** How the first meal was worked out, from energy to the mark; empty without one. */
  firstMealSteps: EquationStep[]
}

export interface PlanFeed {
  /** Instant, UTC ISO 8601. */
  at: string
  /** Wall clock in the plan's time zone, HH:MM. */
  localTime: string
  volumeMl: number
  /** Mark to draw up to, mL; per draw when there are several. */
  markMl: number
  /** How many syringes full; 1 nearly always. */
  draws: number
  syringe: Syringe
  /** volumeMl x density x strength. */
  energyKcal: number
  /** Half-width that ISO 7886-1 allows the syringe for this volume, mL and as a fraction of it. */
  toleranceMl: number
  toleranceFraction: number
  /** What rounding to the mark changed, as a fraction of the amount before (0.04 = 4 % more). */
  roundingFraction: number
}

export interface PlanDay {
  /** YYYY-MM-DD in the plan's time zone. */
  date: string
  stage: Stage
  /** What the band on this day's sheet says. */
  state: GateState
  stateReason: string
  /** Feeding step, 1-based; 0 before feeding starts. */
  step: number
  /** 1-based day of feeding; 0 before. */
  feedingDay: number
  fraction: number
  energyTargetKcal: number
  energyGivenKcal: number
  /** 0 when no feed is due on this day. */
  strengthFraction: number
  strengthLabel: string
  feeds: PlanFeed[]
  waterNeedMl: number
  waterInFeedMl: number
  metabolicWaterMl: number
  waterToGiveMl: number
}

/** One strength's pot for one day. */
export interface PlanMixing {
  strengthFraction: number
  strengthLabel: string
  /** Days of the plan it serves. */
  fromDate: string
  toDate: string
  feedName: string
  /** The most that any of its days needs, with overage, mL. */
  neededMl: number
  overageFraction: number
  /** What to weigh and measure; powder null for a liquid feed (then `feedMl` is set). */
  powderG: number | null
  feedMl: number | null
  waterMl: number
  madeUpMl: number
  kitchenScaleStepG: number
  /** Energy density that these rounded amounts really give, kcal/mL. */
  energyKcalPerMl: number
  /** Energy density the plan reckons with, kcal/mL. */
  plannedKcalPerMl: number
  differenceFraction: number
  ratioInWords: string
  /** Throw away: at room warmth, once started, in the fridge, h. */
  discardHours: { room: number, started: number, fridge: number }
  warmToC: Range
}

export interface UncertaintyPart {
  name: 'scale' | 'density' | 'syringe'
  label: string
  relativeStandard: number
  /** Its share of the combined variance, 0-1. */
  share: number
}

export interface PlanUncertainty {
  /** Expanded, k = 2, as a fraction (0.06 = plus or minus 6 %). */
  relativeExpanded: number
  coverageFactor: 2
  parts: UncertaintyPart[]
}

export interface PlanValidity {
  /** Last date the weight carries the plan. */
  goodUntil: string
  nextWeighInOn: string
  /** The rule in a sentence. */
  rule: string
  /** Stop and call when it weighs less than this, g. */
  stopWeightG: number
}

/** Echo of the animal, finished for screens and print. */
export interface PlanAnimal {
  name: string
  caseNumber: string
  enclosure: string
  speciesId: string
  speciesName: string
  scientificName: string
  group: Group
  diet: Diet
  weightG: number
  weighedOn: string
  lengthMm: number | null
  lengthMeasure: LengthMeasure | null
  feedingTemperatureC: Range & { what: 'body' | 'ambient' | 'water' }
  warmPlaceC: Range & { what: 'warm end' | 'air' | 'water' }
  /** Where the species' own figures come from, by field, as the plan used them. */
  origins: Record<string, Provenance>
}

export interface PlanFeedInfo {
  feedId: string | null
  name: string
  energyKcalPerMl: number
  waterFraction: number
  demo: boolean
  sourceKey: string
}

export interface Plan {
  edition: string
  timeZone: string
  animal: PlanAnimal
  feed: PlanFeedInfo
  route: Route
  routeLabel: string
  gate: PlanGate
  energy: PlanEnergy
  condition: PlanCondition
  fluids: PlanFluids
  ramp: PlanRamp
  meal: PlanMeal
  days: PlanDay[]
  mixing: PlanMixing[]
  uncertainty: PlanUncertainty
  validity: PlanValidity
  /** How to give it, one action each, for this route and group. */
  howToGive: string[]
  /** Stop and call, one sign each. */
  stopSigns: string[]
  findings: Finding[]
}

export const ROUTES = ['syringe', 'tube', 'hand'] as const
export type Route = (typeof ROUTES)[number]

/** A saved plan as `GET /api/regimens/{id}` answers it. */
export interface SavedRegimen {
  id: string
  version: number
  /** Number of the newest version; higher than `version` when this one was replaced. */
  latestVersion: number
  createdAt: string
  linkExpiresAt: string
  edition: string
  /** An invented plan of the demonstration: anyone may look at it, nobody changes it. */
  demo?: boolean
  input: import('../schemas/regimen').RegimenInput
  plan: Plan
  /** Only for a member of the team that owns it. */
  team?: import('./planLife').TeamPlanInfo
}

export interface SavedRegimenReceipt {
  id: string
  version: number
  key: string
  link: string
}
