/** Shapes of the reference data as the API gives them. Values live in `server/utils/reference`. */

/**
 * How a number came to us. Shown on screen beside the number.
 * - `original`: read in the paper, book or standard itself
 * - `restated`: read in another text, data set or program that states it
 * - `memory`: from memory of general handbooks, not seen in a text
 * - `practice`: common practice, no source
 * - `computed`: worked out from numbers that carry their own source
 * - `house-rule`: our own choice
 * - `demo`: invented, for the demonstration only
 */
export const HOW_READ = ['original', 'restated', 'memory', 'practice', 'computed', 'house-rule', 'demo'] as const
export type HowRead = (typeof HOW_READ)[number]

/** Where one value comes from. */
export interface Provenance {
  sourceKey: string
  /** Page, table, equation, row or section in that source. */
  locator: string
  howRead: HowRead
  unit: string
  note?: string
}

export const GROUPS = [
  'lizard', 'snake', 'chelonian', 'crocodilian',
  'amphibian-anuran', 'amphibian-caudate',
  'bird-passerine', 'bird-other',
  'mammal-placental', 'mammal-marsupial',
] as const
export type Group = (typeof GROUPS)[number]

export const DIETS = ['insectivore', 'carnivore', 'omnivore', 'herbivore', 'granivore', 'frugivore'] as const
export type Diet = (typeof DIETS)[number]

export const ACTIVITIES = ['diurnal', 'nocturnal', 'crepuscular'] as const
export type Activity = (typeof ACTIVITIES)[number]

export const LENGTH_MEASURES = ['snout-vent', 'total', 'carapace', 'wing', 'body'] as const
export type LengthMeasure = (typeof LENGTH_MEASURES)[number]

export interface Range { low: number, high: number }

export interface PublishedValue { value: number, sourceKey: string }

/** log10(g) = intercept + slope * log10(length mm). */
export interface WeightFromLength {
  equationId: string
  clade: string
  interceptLog10G: number
  slope: number
  measure: LengthMeasure
  sourceKey: string
}

export interface SpeciesItem {
  id: string
  commonName: string
  scientificName: string
  group: Group
  diet: Diet
  activity: Activity
  /** True for the "not in the list" entry of a group; its ranges are wide. */
  notInList: boolean
  /** Birds only; null elsewhere. */
  hasCrop: boolean | null
  /** No food below `low`. `what` says where the thermometer goes. */
  feedingTemperatureC: Range & { what: 'body' | 'ambient' | 'water' }
  /** Warm end of the enclosure (ectotherms) or the air around it (birds and mammals) while it recovers. */
  warmPlaceC: Range & { what: 'warm end' | 'air' | 'water' }
  adultWeightG: Range & { published: PublishedValue[] }
  adultLengthMm: (Range & { measure: LengthMeasure, publishedMaximumMm: number | null }) | null
  weightFromLength: WeightFromLength | null
  mealLimitMlPerKg: { first: number, later: number, firstMeals: number }
  /** Hours from one meal day to the next once on full meals. */
  feedingIntervalHours: number
  /** Shortest time between two meals of one day, h. */
  minimumGapHours: number
  /** Null for amphibians: they take water through the skin, not by volume. */
  maintenanceMlPerKgPerDay: number | null
  /** Set where maintenance follows an allometric equation of the animal's weight (cat, dog). */
  maintenanceEquationId: string | null
  /** Dilution of first feeds; false for bats (they are fed full strength). */
  diluteFirstFeeds: boolean
  notes: string[]
  /** Where each value above comes from, by field name. */
  provenance: Record<string, Provenance>
}

export const FOOD_FORMS = ['slurry-powder', 'liquid', 'solid'] as const
export type FoodForm = (typeof FOOD_FORMS)[number]

/** How a powder is made up to full strength. All by weight and volume, never by scoop. */
export interface PowderRecipe {
  powderG: number
  waterMl: number
  /** Volume that the powder and water make together, mL. */
  madeUpMl: number
  energyKcalPerPowderG: number
}

export interface FoodItem {
  id: string
  name: string
  form: FoodForm
  /** Energy of the food at full strength, as it goes into the syringe. Solids: blended, taken as 1 g/mL. */
  energyKcalPerMl: number
  /** Water by volume of the food at full strength, 0-1 (solids: by mass). */
  waterFraction: number
  proteinPercent: number | null
  fatPercent: number | null
  carbohydratePercent: number | null
  calciumMgPerKg: number | null
  phosphorusMgPerKg: number | null
  /** Half-width of the energy figure, as a fraction of it (0.25 = plus or minus 25 %). */
  energyBandFraction: number
  recipe: PowderRecipe | null
  suits: Diet[]
  /** Invented, for the demonstration only. */
  demo: boolean
  notes: string[]
  provenance: Record<string, Provenance>
}

export interface SourceItem {
  key: string
  kind: 'paper' | 'book' | 'guideline' | 'standard' | 'dataset' | 'page' | 'house-rule' | 'practice' | 'demo' | 'definition'
  authors: string
  year: number | null
  title: string
  where: string
  /** What of it was seen: whole text, abstract, a page scan, a restatement. */
  seen: string
  errata: string[]
}

export type EquationTopic = 'energy' | 'fluid' | 'length' | 'index'
/** What the value of an energy equation stands for. */
export type EnergyBasis = 'standard' | 'resting' | 'maintenance' | 'field'

export interface EquationVariable {
  name: string
  meaning: string
  unit: string
  low: number
  high: number
}

export interface EquationConstant {
  value: number
  unit: string
  meaning: string
  sourceKey?: string
  locator?: string
  howRead?: HowRead
  note?: string
}

export interface EquationItem {
  id: string
  topic: EquationTopic
  /** What it gives, in one sentence. */
  title: string
  /** Parsed by mathjs with a closed set of functions; the one expression computes and shows its working. */
  expression: string
  variables: EquationVariable[]
  /** Constants of the expression that carry their own source, by name. */
  constants: Record<string, EquationConstant>
  taxon: string
  groups: Group[]
  /** Only these species, where an equation holds for no other. */
  speciesIds: string[] | null
  basis: EnergyBasis | null
  /** Temperature the value holds at when the equation has no temperature term; null for endotherms or where it has one. */
  holdsAtC: number | null
  temperatureTerm: 'none' | 'in-equation' | 'q10'
  resultUnit: string
  provenance: Provenance
  notes: string[]
}

export interface EquationStep {
  label: string
  /** The expression with the values filled in. */
  expression: string
  value: number
  unit: string
  /** Where the factor of this step comes from, for conversions. */
  sourceKey?: string
}

export interface EquationValue {
  /** In the equation's own published unit. */
  value: number
  unit: string
  /** Only for energy equations. */
  kcalPerDay?: number
  steps: EquationStep[]
  sourceKey: string
}

export interface ReferenceList<T> { edition: string, items: T[] }
