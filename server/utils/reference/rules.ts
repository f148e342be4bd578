import type { LifeStage } from '#shared/schemas/regimen'
import type { Group } from '#shared/types/reference'
import type { Tier } from '#shared/types/plan'
import type { Kind } from '#shared/utils/groups'
import type { Cited } from './record'

/** Feeds a day to begin with: a number, or one every so many hours of the feeding hours. */
export type UsualFeeds = { count: Cited } | { everyHours: Cited }

/** The rules a plan follows, as cited numbers. One object per edition; `plan/` reads it, `calc/` gets plain numbers. */
export interface Rules {
  energy: {
    defaultEquationId: Record<Group, string>
    /** Free-living rate that caps the target; null where none is published for the group. */
    fieldEquationId: Record<Group, string | null>
    /** Multiplies the default equation's result for the group, where it was made for another. */
    groupFactor: Partial<Record<Group, Cited>>
    /** Multiplier on resting that gives full meals. */
    factor: Record<Kind, Record<LifeStage, Cited>>
    temperatureLowC: Cited
    temperatureHighC: Cited
  }
  condition: {
    lossPerNinthStep: Cited
    lossPerNinthStepUpper: Cited
    /** Half-widths of the expected weight by method, as a fraction; group equations are a factor. */
    ownWeightBand: Cited
    cladeLengthBand: Cited
    groupLengthFactor: Cited
    lengthOverMaximum: Cited
    groupLengthEquationId: Partial<Record<Group, { equationId: string, measure: string }>>
    shellIndex: { speciesIds: string[], warnUnder: Cited, highRiskUnder: Cited }
    emaciatedFromPercent: Cited
    /** Weights outside these multiples of the adult range are refused. */
    plausibleLow: Cited
    plausibleHigh: Cited
  }
  risk: {
    shortfallPercent: { moderate: Cited, high: Cited, extreme: Cited }
    daysUnfed: { moderate: Cited, high: Cited, extreme: Cited }
    drynessPercent: { moderate: Cited, high: Cited, extreme: Cited }
    score: { high: Cited, extreme: Cited }
    daysStretch: Record<Kind, Cited>
    snakeDaysStretch: Cited
  }
  fluids: {
    deficitHours: Record<Kind, Cited>
    longestHours: Cited
    /** Most water in a day, mL/kg; mammals: on top of maintenance. */
    capMlPerKgPerDay: { reptile: Cited, amphibian: Cited, bird: Cited, birdUnder100G: Cited, mammalOverMaintenance: Cited }
    birdSmallUnderG: Cited
    birdMaintenance: { small: Cited, large: Cited }
    drynessCapWhenEmaciatedPercent: Cited
    wildlifeAssumedDrynessPercent: Cited
    metabolicMlPerKcal: Cited
    /** Above this multiple of maintenance, with no deficit to put back, water in the feed is named. */
    overMaintenance: Cited
  }
  ramp: {
    fractions: Record<Tier, Cited[]>
    reptileHold: { fraction: Cited, days: Cited }
    fluidHours: { endotherm: Record<Tier, Cited>, ectotherm: Record<Tier, Cited> }
    smallEndotherm: { underG: Cited, fluidHoursAtMost: Cited }
    holdBeforeFeedHours: Cited
    warmingCPerHour: Cited
    warmingHoursAtMost: Cited
    fullDays: Cited
    daysAtLeast: Cited
  }
  meals: {
    strengths: Cited[]
    startStrength: Cited
    startDensityKcalPerMl: Cited
    /** From this fraction on, a mix is thickened before meals are added. */
    thickenFromFraction: Cited
    usualFeeds: Record<'lizard' | 'snake' | 'chelonian' | 'crocodilian' | 'amphibian' | 'passerine' | 'birdWithCrop' | 'birdWithoutCrop' | 'smallMammal' | 'mammal', UsualFeeds>
    smallMammalUnderG: Cited
    /** Groups that eat once per interval, not every day. */
    onceAnInterval: Group[]
    chelonianDayMlPerKg: { first: Cited, later: Cited, firstDays: Cited }
    growing: { minimumGapHours: Cited, mammalMlPerKg: Cited, kittenMlPerKg: Cited, birdWithCropMlPerKg: Cited, squabMlPerKg: Cited, squabMl: Cited, squabSpeciesIds: string[] }
  }
  measuring: {
    syringes: { capacityMl: number, stepMl: number }[]
    smallestMarks: Cited
    smallestMl: Cited
    preferredOfCapacity: Cited
    roundingNotice: Cited
    roundingCaution: Cited
    isoClasses: { underCapacityMl: number, ofCapacity: Cited, ofVolume: Cited, ofVolumeFromHalf: Cited }[]
    scaleStepG: { under100G: Cited, under1000G: Cited, above: Cited }
  }
  mixing: {
    overage: Cited
    fewestScaleSteps: Cited
    kitchenScaleStepG: { under100G: Cited, above: Cited }
    waterStepMl: { under10Ml: Cited, above: Cited }
    discardHours: { room: Cited, started: Cited, fridge: Cited }
    warmToC: { bird: [Cited, Cited], mammal: [Cited, Cited] }
    densityNotice: Cited
  }
  validity: {
    weightDays: { usual: Cited, adultCatDog: Cited }
    weighEveryDays: { endotherm: Cited, ectothermHighRisk: Cited, ectotherm: Cited }
    stopLossFraction: Cited
    ownFeedBand: Cited
  }
}
