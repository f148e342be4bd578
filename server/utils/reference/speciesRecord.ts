import type { Activity, Diet, EquationItem, Group, HowRead, LengthMeasure, Provenance, SpeciesItem, WeightFromLength } from '#shared/types/reference'
import { isEctotherm, kindOf } from '#shared/utils/groups'
import { provenance } from './record'

type Pair = [low: number, high: number]

/** A species as it is written in the edition: what is its own. What it shares with its group comes from the species rules. */
export interface SpeciesRow {
  id: string
  commonName: string
  scientificName: string
  diet: Diet
  activity: Activity
  hasCrop?: boolean
  /** Source key, and what it says of the diet. */
  dietPublished?: [sourceKey: string, words: string]
  weightG: Pair
  /** `restated` where a published weight agrees with the range; `memory` otherwise. */
  weightRead: 'restated' | 'memory' | 'house-rule'
  /** Published adult weights, g, by source key. */
  weightsPublished?: Record<string, number>
  lengthMm?: [low: number, high: number, measure: LengthMeasure]
  lengthRead?: 'restated'
  /** Longest published (lizard data set), mm. */
  longestMm?: number
  /** Published adult length (amniote database), mm. */
  lengthPublishedMm?: number
  /** Lizard clade with a weight-from-length equation of its own. */
  clade?: string
  /** Ectotherms: feeding window, deg C, and where the thermometer goes. */
  feedC?: [low: number, high: number, what: 'body' | 'ambient' | 'water']
  /** Lowest and highest published mean body temperature of active wild animals, deg C. */
  fieldMeansC?: Pair
  /** Birds and mammals: normal body temperature, deg C. */
  bodyC?: number
  bodyPublishedC?: number
  /** Birds and mammals: air around it while it recovers, deg C. */
  airC?: Pair
  notes?: string[]
  notInList?: boolean
}

export type Origin = Omit<Provenance, 'unit'>
export interface Sourced<Value> { value: Value, origin: Origin }

/** What a species shares with its group, chosen by the edition's species rules. */
export interface SharedFigures {
  mealLimitMlPerKg: Sourced<SpeciesItem['mealLimitMlPerKg']>
  feedingIntervalHours: Sourced<number>
  minimumGapHours: Sourced<number>
  maintenanceMlPerKgPerDay: Sourced<number> | null
  maintenanceEquationId: string | null
  diluteFirstFeeds: Sourced<boolean>
}

/** Windows around a normal body temperature, deg C; and how far the warm end lies above the feeding window. */
export interface TemperatureRules { belowNormal: number, aboveNormal: number, birdsLowest: number, warmEndAbove: number, warmEndHighest: number }

/**
 * One species of the reference data, with where each of its values comes from, frozen.
 *
 * @param row  the species' own values.
 * @param group  its group.
 * @param shared  values of its group, each with its origin.
 * @param temperatures  the rules that make windows from a body temperature, deg C.
 * @param equations  the edition's equations; the clade's equation gives weight from length.
 * @returns the record; `provenance` has one entry for every field that holds a value.
 * @throws Error when a row lacks the temperatures its group needs, or its clade has no equation;
 * @throws UncitedNumberError as `cited` does.
 * @source the row's own marks; the rules are house rules
 * @example defineSpecies(row, 'lizard', shared, temperatures, equations).warmPlaceC // { low: 32, high: 34.5, what: 'warm end' }
 */
export function defineSpecies(row: SpeciesRow, group: Group, shared: SharedFigures, temperatures: TemperatureRules, equations: ReadonlyMap<string, EquationItem>): SpeciesItem {
  const from: Record<string, Readonly<Provenance>> = {}
  const note = (field: string, unit: string, origin: Origin) => {
    from[field] = provenance({ ...origin, unit }, `${row.id} ${field}`)
  }
  note('diet', 'diet class', row.dietPublished ? { sourceKey: row.dietPublished[0], locator: row.dietPublished[1], howRead: 'restated', note: 'The class is our reading of it.' } : plain(row, 'diet class'))
  note('activity', 'part of the day', plain(row, 'when it is active'))
  if (row.hasCrop !== undefined) note('hasCrop', 'yes or no', plain(row, 'crop or none'))
  note('adultWeightG', 'g', weightOrigin(row))
  const item = {
    id: row.id,
    commonName: row.commonName,
    scientificName: row.scientificName,
    group,
    diet: row.diet,
    activity: row.activity,
    notInList: row.notInList ?? false,
    hasCrop: kindOf(group) === 'bird' ? row.hasCrop ?? false : null,
    ...windows(row, group, temperatures, note),
    adultWeightG: Object.freeze({ low: row.weightG[0], high: row.weightG[1], published: Object.freeze(Object.entries(row.weightsPublished ?? {}).map(([sourceKey, value]) => Object.freeze({ value, sourceKey }))) as { value: number, sourceKey: string }[] }),
    adultLengthMm: lengthOf(row, note),
    weightFromLength: weightFromLengthOf(row, equations, note),
    mealLimitMlPerKg: shared.mealLimitMlPerKg.value,
    feedingIntervalHours: shared.feedingIntervalHours.value,
    minimumGapHours: shared.minimumGapHours.value,
    maintenanceMlPerKgPerDay: shared.maintenanceMlPerKgPerDay?.value ?? null,
    maintenanceEquationId: shared.maintenanceEquationId,
    diluteFirstFeeds: shared.diluteFirstFeeds.value,
    notes: Object.freeze([...row.notes ?? []]) as string[],
  }
  note('mealLimitMlPerKg', 'mL/kg', shared.mealLimitMlPerKg.origin)
  note('feedingIntervalHours', 'h', shared.feedingIntervalHours.origin)
  note('minimumGapHours', 'h', shared.minimumGapHours.origin)
  if (shared.maintenanceMlPerKgPerDay) note('maintenanceMlPerKgPerDay', 'mL/kg/day', shared.maintenanceMlPerKgPerDay.origin)
  if (shared.maintenanceEquationId) note('maintenanceEquationId', 'mL/day', originOf(equations.get(shared.maintenanceEquationId), shared.maintenanceEquationId))
  note('diluteFirstFeeds', 'yes or no', shared.diluteFirstFeeds.origin)
  if (item.notes.length > 0) note('notes', 'words', plain(row, 'notes'))
  return Object.freeze({ ...item, provenance: Object.freeze(from) })
}

type Note = (field: string, unit: string, origin: Origin) => void

function plain(row: SpeciesRow, locator: string): Origin {
  return row.notInList ? { sourceKey: 'house-rule', locator: `${locator}; entry for a species not in the list`, howRead: 'house-rule' } : { sourceKey: 'memory', locator, howRead: 'memory' }
}

function weightOrigin(row: SpeciesRow): Origin {
  const published = Object.entries(row.weightsPublished ?? {})
  if (row.weightRead === 'restated' && published.length > 0) {
    const [sourceKey, value] = closest(published, row.weightG)
    return { sourceKey, locator: `adult weight ${value} g`, howRead: 'restated', note: 'The range around it is ours.' }
  }
  const differs = published.map(([sourceKey, value]) => `${sourceKey} has ${value} g`).join(', ')
  return { ...plain(row, 'weight of healthy adults'), ...(differs && { note: `Published figures differ: ${differs}.` }) }
}

/** The published weight that lies nearest the middle of the range, on a scale of ratios. */
function closest(published: [string, number][], [low, high]: Pair): [string, number] {
  const middle = Math.sqrt(low * high)
  return published.reduce((best, one) => Math.abs(Math.log(one[1] / middle)) < Math.abs(Math.log(best[1] / middle)) ? one : best)
}

function windows(row: SpeciesRow, group: Group, rules: TemperatureRules, note: Note): Pick<SpeciesItem, 'feedingTemperatureC' | 'warmPlaceC'> {
  const feeding = isEctotherm(group) ? ectothermWindow(row, note) : endothermWindow(row, group, rules, note)
  return { feedingTemperatureC: Object.freeze(feeding), warmPlaceC: Object.freeze(warmPlace(row, group, feeding, rules, note)) }
}

function ectothermWindow(row: SpeciesRow, note: Note): SpeciesItem['feedingTemperatureC'] {
  if (!row.feedC) throw new Error(`${row.id} has no feeding window.`)
  const [low, high, what] = row.feedC
  note('feedingTemperatureC', 'deg C', row.fieldMeansC
    ? { sourceKey: 'meiri2018', locator: `mean body temperatures of active wild animals ${row.fieldMeansC[0]} to ${row.fieldMeansC[1]} deg C`, howRead: 'restated', note: 'The window around it is a house rule.' }
    : plain(row, 'feeding window'))
  return { low, high, what }
}

function endothermWindow(row: SpeciesRow, group: Group, rules: TemperatureRules, note: Note): SpeciesItem['feedingTemperatureC'] {
  if (row.bodyC === undefined) throw new Error(`${row.id} has no body temperature.`)
  const low = tenth(row.bodyC - rules.belowNormal)
  const words = `normal ${row.bodyC} deg C, less ${rules.belowNormal}, plus ${rules.aboveNormal}`
  note('feedingTemperatureC', 'deg C', row.bodyPublishedC !== undefined && Math.abs(row.bodyPublishedC - row.bodyC) <= 1.5
    ? { sourceKey: 'anage', locator: `body temperature ${row.bodyPublishedC} deg C; ${words}`, howRead: 'restated', note: 'The window around it is a house rule.' }
    : { ...plain(row, words), note: 'The window around it is a house rule.' })
  return { low: kindOf(group) === 'bird' ? Math.max(low, rules.birdsLowest) : low, high: tenth(row.bodyC + rules.aboveNormal), what: 'body' }
}

function warmPlace(row: SpeciesRow, group: Group, feeding: SpeciesItem['feedingTemperatureC'], rules: TemperatureRules, note: Note): SpeciesItem['warmPlaceC'] {
  if (!isEctotherm(group)) {
    if (!row.airC) throw new Error(`${row.id} has no air temperature.`)
    note('warmPlaceC', 'deg C', plain(row, 'air around it while it recovers'))
    return { low: row.airC[0], high: row.airC[1], what: 'air' }
  }
  const house = (locator: string): Origin => ({ sourceKey: 'house-rule', locator, howRead: 'house-rule' })
  if (feeding.what === 'body') {
    note('warmPlaceC', 'deg C', house(`top of the feeding window to ${rules.warmEndAbove} deg C above it, never over ${rules.warmEndHighest}`))
    return { low: feeding.high, high: Math.max(feeding.high, Math.min(feeding.high + rules.warmEndAbove, rules.warmEndHighest)), what: 'warm end' }
  }
  note('warmPlaceC', 'deg C', house('the feeding window itself'))
  return { low: feeding.low, high: feeding.high, what: feeding.what === 'water' ? 'water' : 'air' }
}

function lengthOf(row: SpeciesRow, note: Note): SpeciesItem['adultLengthMm'] {
  if (!row.lengthMm) return null
  const [low, high, measure] = row.lengthMm
  const published = row.lengthPublishedMm === undefined ? '' : `amniote database: adults ${row.lengthPublishedMm} mm. `
  note('adultLengthMm', 'mm', row.lengthRead && row.longestMm !== undefined
    ? { sourceKey: 'meiri2018', locator: `longest ${row.longestMm} mm from snout to vent`, howRead: 'restated', note: `${capital(published)}The range is ours.` }
    : { ...plain(row, 'length of adults'), ...(published && { note: capital(published).trim() }) })
  return Object.freeze({ low, high, measure, publishedMaximumMm: row.longestMm ?? null })
}

function weightFromLengthOf(row: SpeciesRow, equations: ReadonlyMap<string, EquationItem>, note: Note): WeightFromLength | null {
  if (!row.clade || !row.lengthMm) return null
  const equationId = `lm-clade-${row.clade.toLowerCase().replaceAll(' ', '-')}`
  const equation = equations.get(equationId)
  const { a, b } = equation?.constants ?? {}
  if (!equation || !a || !b) throw new Error(`${row.id}: there is no equation "${equationId}" with the constants a and b.`)
  note('weightFromLength', 'g', originOf(equation, equationId))
  return Object.freeze({ equationId, clade: row.clade, interceptLog10G: a.value, slope: b.value, measure: row.lengthMm[2], sourceKey: equation.provenance.sourceKey })
}

function originOf(equation: EquationItem | undefined, id: string): Origin {
  if (!equation) throw new Error(`There is no equation "${id}".`)
  const { sourceKey, locator, howRead } = equation.provenance
  return { sourceKey, locator: `${id}: ${locator}`, howRead: howRead as HowRead }
}

/** Clears binary dust: 38.6 - 2 is shown and compared as 36.6. */
function tenth(value: number): number {
  return Math.round(value * 10) / 10
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}
