import type { Group, SpeciesItem } from '#shared/types/reference'
import { kindOf } from '#shared/utils/groups'
import type { Origin, SharedFigures, Sourced, SpeciesRow, TemperatureRules } from '../../../speciesRecord'

const house = (locator: string, note?: string): Origin => ({ sourceKey: 'house-rule', locator, howRead: 'house-rule', ...(note && { note }) })
const memory = (locator: string, note?: string): Origin => ({ sourceKey: 'memory', locator, howRead: 'memory', ...(note && { note }) })
const restated = (sourceKey: string, locator: string, note?: string): Origin => ({ sourceKey, locator, howRead: 'restated', ...(note && { note }) })
const from = <Value>(value: Value, origin: Origin): Sourced<Value> => ({ value, origin })

/** House rules; the floor of 38 deg C for birds is the published gate of a seabird protocol, carried to all birds. */
export const temperatureRules: TemperatureRules = { belowNormal: 2, aboveNormal: 1.5, birdsLowest: 38, warmEndAbove: 2.5, warmEndHighest: 42 }

const SMALL_G = 100
const BATS = new Set(['sp-pipistrelle', 'sp-big-brown-bat', 'sp-noctule', 'sp-flying-fox'])
const CAT_AND_DOG = new Set(['sp-cat', 'sp-dog'])

/**
 * What a species shares with its group: meal limits, intervals, maintenance fluid, thinning of first feeds.
 *
 * @param row  the species' own values; diet, crop and adult weight decide within a group.
 * @param group  its group.
 * @returns each value with its origin.
 * @throws Never.
 * @source nutrition sheet 5, 6.1 and 11 with corrections B and C; house rules where no text gives a number
 * @example sharedFigures(leopardGecko, 'lizard').feedingIntervalHours.value // 48
 */
export function sharedFigures(row: SpeciesRow, group: Group): SharedFigures {
  return {
    mealLimitMlPerKg: mealLimit(row, group),
    feedingIntervalHours: interval(row, group),
    minimumGapHours: gap(row, group),
    ...maintenance(row, group),
    diluteFirstFeeds: BATS.has(row.id)
      ? from(false, restated('infantbats', 'rehydrate, wait 10 to 20 minutes, then full strength; do not dilute', 'Printed for pups.'))
      : from(true, restated('squirrel2011', 'quarter, half, three-quarter, full, 2 to 4 feeds each', 'Printed for squirrels, carried to all but bats.')),
  }
}

function mealLimit(row: SpeciesRow, group: Group): Sourced<SpeciesItem['mealLimitMlPerKg']> {
  const limit = (first: number, later: number, origin: Origin) => from(Object.freeze({ first, later, firstMeals: 3 }), origin)
  switch (group) {
    case 'snake': return limit(20, 50, restated('wikivet', 'stomach about 2 % of body weight; 5 % later', 'The 50 mL/kg is from veterinary education articles (edur); the three first meals are ours.'))
    case 'lizard': return limit(10, 20, memory('5 to 10 mL/kg at first, 20 to 30 later', 'The lower of each.'))
    case 'chelonian': return limit(5, 20, restated('boxturtle', '0.5 % of body weight a day, divided, for 3 days, then 2 %', 'One handout, eastern box turtles.'))
    case 'crocodilian': return limit(10, 20, house('as for lizards; no text gives a number'))
    case 'amphibian-anuran':
    case 'amphibian-caudate': return limit(10, 20, house('1 to 3 % of body weight in texts, uncertain; as for lizards'))
    case 'mammal-marsupial': return limit(10, 15, house('as for other mammals; no text gives a number'))
    case 'mammal-placental': return CAT_AND_DOG.has(row.id)
      ? limit(10, 15, restated('cbicu', '5 to 10 mL/kg usually tolerated by tube', 'The 15 of later meals is from memory.'))
      : limit(10, 15, memory('rabbits, guinea pigs, chinchillas 10 to 15 mL/kg; ferrets and hedgehogs 5 to 10', 'Carried to other small and wild mammals.'))
    default: return row.hasCrop
      ? limit(17, 25, restated('edubirds', 'crop about 50 mL/kg, begin at a third to half of it', 'A third at first is printed for emaciated eaglets (hrb2020, scan page 361).'))
      : limit(10, 20, memory('birds without a crop 10 to 20 mL/kg'))
  }
}

function interval(row: SpeciesRow, group: Group): Sourced<number> {
  const plantPart = row.diet === 'herbivore' || row.diet === 'omnivore' || row.diet === 'frugivore'
  switch (group) {
    case 'snake': return from(168, house('one meal a week; texts give one to two weeks'))
    case 'lizard': return plantPart ? from(24, house('plant-eaters and mixed feeders daily')) : from(48, house('insect- and meat-eaters every second day'))
    case 'chelonian': return plantPart ? from(24, house('plant-eaters and mixed feeders daily')) : from(48, house('meat-eaters every second day'))
    case 'crocodilian':
    case 'amphibian-anuran':
    case 'amphibian-caudate': return from(48, house('every second day; texts give 24 to 72 h'))
    default: return from(24, house('birds and mammals eat every day'))
  }
}

function gap(row: SpeciesRow, group: Group): Sourced<number> {
  const small = middleG(row) < SMALL_G
  switch (kindOf(group)) {
    case 'amphibian': return from(24, house('one meal a day at most'))
    case 'reptile': return group === 'snake' || group === 'crocodilian' ? from(24, house('one meal a day at most')) : from(4, house('time for a small meal to leave the stomach'))
    case 'mammal':
      if (CAT_AND_DOG.has(row.id)) return from(4, restated('cbicu', 'every 4 to 6 h'))
      return small ? from(2, house('small mammals starve first')) : from(3, house('4 to 6 times a day'))
    default: return birdGap(row, group, small)
  }
}

function birdGap(row: SpeciesRow, group: Group, small: boolean): Sourced<number> {
  if (group === 'bird-passerine') return small || row.notInList ? from(0.5, house('small songbirds need 30 to 60 minutes')) : from(1, house('larger songbirds every hour'))
  if (row.id === 'sp-swift') return from(0.5, restated('hrb2020', 'scan page 516, every 30 to 60 minutes'))
  if (row.id === 'sp-common-tern') return from(1.5, restated('hrb2020', 'scan page 437, terns every 90 to 120 minutes'))
  if (row.id === 'sp-herring-gull') return from(3, restated('hrb2020', 'scan page 437, gulls every 3 to 4 h after the first week'))
  return row.hasCrop
    ? from(3, restated('hrb2020', 'scan page 361, emaciated eaglets every 3 to 4 h by day'))
    : from(2, house('4 to 6 times a day'))
}

// Species with a published or remembered rate of their own, mL/kg/day.
const OWN_MAINTENANCE: Readonly<Record<string, Sourced<number>>> = {
  'sp-rabbit': from(100, restated('infusionleaflet', 'p. 7, rabbits 3 to 4 mL/kg/h, up to 100 mL/kg/day')),
  'sp-guinea-pig': from(100, restated('edumammals', 'small mammals 75 to 100 mL/kg/day')),
  'sp-chinchilla': from(100, restated('edumammals', 'small mammals 75 to 100 mL/kg/day')),
  'sp-degu': from(100, house('as for guinea pigs and chinchillas')),
  'sp-rat': from(80, memory('60 to 100 mL/kg/day', 'A leaflet on infusion gives 100.')),
  'sp-mouse': from(125, memory('100 to 150 mL/kg/day', 'A leaflet on infusion gives 150.')),
  'sp-hamster': from(90, memory('80 to 100 mL/kg/day')),
  'sp-gerbil': from(90, house('as for hamsters')),
  'sp-ferret': from(67, memory('60 to 75 mL/kg/day')),
  'sp-hedgehog': from(75, memory('50 to 100 mL/kg/day')),
  'sp-pygmy-hedgehog': from(75, memory('50 to 100 mL/kg/day')),
  'sp-sugar-glider': from(80, memory('60 to 100 mL/kg/day')),
  'sp-cat': from(54.9, { sourceKey: 'aaha2013', locator: '80 mL x kg^0.75 at 4.5 kg, the middle of the adult range', howRead: 'computed' }),
  'sp-dog': from(61.3, { sourceKey: 'aaha2013', locator: '132 mL x kg^0.75 at 21.5 kg, the middle of the adult range', howRead: 'computed' }),
}

function maintenance(row: SpeciesRow, group: Group): Pick<SharedFigures, 'maintenanceMlPerKgPerDay' | 'maintenanceEquationId'> {
  const equationId = { 'sp-cat': 'fluid-cat-80', 'sp-dog': 'fluid-dog-132' }[row.id] ?? null
  return { maintenanceMlPerKgPerDay: maintenanceRate(row, group), maintenanceEquationId: equationId }
}

function maintenanceRate(row: SpeciesRow, group: Group): Sourced<number> | null {
  const own = OWN_MAINTENANCE[row.id]
  if (own) return own
  switch (kindOf(group)) {
    case 'amphibian': return null
    case 'reptile': return from(20, restated('edur', 'reptiles 10 to 30 mL/kg/day', 'Loggerhead turtles were given 20 (camacho2015).'))
    case 'bird': return middleG(row) < SMALL_G
      ? from(100, restated('mcdonald2006', 'Table 4.1.1, measured drinking 114 to 222 mL/kg/day under about 100 g', 'The threshold is our judgement.'))
      : from(50, restated('carpenter2018', 'Table 5-36, 40 to 60 mL/kg/day'))
    default: return group === 'mammal-marsupial'
      ? from(40, house('two thirds of the 60 of wild mammals, by the ratio of their energy'))
      : from(60, restated('carpenter2018', 'wildlife chapter p. 885, mammals 60 mL/kg/day'))
  }
}

function middleG({ weightG: [low, high] }: SpeciesRow): number {
  return (low + high) / 2
}
