import { describe, expect, it } from 'vitest'
import { ACTIVITIES, DIETS, GROUPS, HOW_READ } from '#shared/types/reference'
import { isEctotherm, kindOf } from '#shared/utils/groups'
import { currentEdition } from '#server/utils/reference'
import { defineSpecies, type SharedFigures, type SpeciesRow } from '#server/utils/reference/speciesRecord'

const { equations, sources, species: byId, rules } = currentEdition()
const species = [...byId.values()]
const temperatures = { belowNormal: 2, aboveNormal: 1.5, birdsLowest: 38, warmEndAbove: 2.5, warmEndHighest: 42 }
const house = { sourceKey: 'house-rule', locator: 'a test', howRead: 'house-rule' } as const
const shared: SharedFigures = {
  mealLimitMlPerKg: { value: { first: 10, later: 20, firstMeals: 3 }, origin: house },
  feedingIntervalHours: { value: 48, origin: house },
  minimumGapHours: { value: 4, origin: house },
  maintenanceMlPerKgPerDay: null,
  maintenanceEquationId: null,
  diluteFirstFeeds: { value: true, origin: house },
}
const lizard: SpeciesRow = { id: 'sp-test', commonName: 'Test lizard', scientificName: 'Lacerta probata', diet: 'insectivore', activity: 'diurnal', weightG: [45, 80], weightRead: 'memory', feedC: [26, 32, 'body'] }
const bird: SpeciesRow = { ...lizard, feedC: undefined, hasCrop: true, bodyC: 39, airC: [26, 30] }

describe('defineSpecies', () => {
  it('puts the warm end above a window of body temperature', () => {
    expect(defineSpecies(lizard, 'lizard', shared, temperatures, equations).warmPlaceC).toEqual({ low: 32, high: 34.5, what: 'warm end' })
  })
  it('takes a window of air or water as the warm place itself', () => {
    expect(defineSpecies({ ...lizard, feedC: [14, 18, 'water'] }, 'amphibian-caudate', shared, temperatures, equations).warmPlaceC).toEqual({ low: 14, high: 18, what: 'water' })
    expect(defineSpecies({ ...lizard, feedC: [22, 27, 'ambient'] }, 'lizard', shared, temperatures, equations).warmPlaceC).toEqual({ low: 22, high: 27, what: 'air' })
  })
  it('makes the window of a warm-blooded animal from its body temperature, and no bird\'s under 38', () => {
    expect(defineSpecies(bird, 'bird-other', shared, temperatures, equations).feedingTemperatureC).toEqual({ low: 38, high: 40.5, what: 'body' })
    expect(defineSpecies(bird, 'mammal-placental', shared, temperatures, equations).feedingTemperatureC).toEqual({ low: 37, high: 40.5, what: 'body' })
    expect(defineSpecies({ ...bird, bodyC: 38.6 }, 'mammal-placental', shared, temperatures, equations).feedingTemperatureC.low).toBe(36.6)
  })
  it('cites the published weight nearest the middle of the range, or says that they differ', () => {
    const agreeing = defineSpecies({ ...lizard, weightRead: 'restated', weightsPublished: { anage: 300, myhrvold2015: 62 } }, 'lizard', shared, temperatures, equations)
    expect(agreeing.provenance.adultWeightG).toMatchObject({ sourceKey: 'myhrvold2015', howRead: 'restated' })
    const differing = defineSpecies({ ...lizard, weightsPublished: { anage: 300 } }, 'lizard', shared, temperatures, equations)
    expect(differing.provenance.adultWeightG).toMatchObject({ sourceKey: 'memory', note: 'Published figures differ: anage has 300 g.' })
  })
  it('refuses a row without the temperatures its group needs, or a clade without its equation', () => {
    expect(() => defineSpecies({ ...lizard, feedC: undefined }, 'lizard', shared, temperatures, equations)).toThrow('no feeding window')
    expect(() => defineSpecies(lizard, 'mammal-placental', shared, temperatures, equations)).toThrow('no body temperature')
    expect(() => defineSpecies({ ...bird, airC: undefined }, 'bird-other', shared, temperatures, equations)).toThrow('no air temperature')
    expect(() => defineSpecies({ ...lizard, lengthMm: [100, 140, 'snout-vent'], clade: 'Dracones' }, 'lizard', shared, temperatures, equations)).toThrow('lm-clade-dracones')
  })
  it('freezes all of it and leaves the row alone', () => {
    const before = JSON.stringify(lizard)
    const made = defineSpecies(lizard, 'lizard', shared, temperatures, equations)
    for (const part of [made, made.feedingTemperatureC, made.warmPlaceC, made.adultWeightG, made.notes, made.provenance]) expect(Object.isFrozen(part)).toBe(true)
    expect(JSON.stringify(lizard)).toBe(before)
  })
})

describe('the species of the edition', () => {
  it('number more than 180, every group with a few and with one entry for a species not in the list', () => {
    expect(species.length).toBeGreaterThan(180)
    for (const group of GROUPS) {
      const own = species.filter(one => one.group === group)
      expect(own.filter(one => !one.notInList).length, group).toBeGreaterThanOrEqual(6)
      expect(own.filter(one => one.notInList), group).toHaveLength(1)
    }
    expect(species.filter(one => one.notInList).map(one => one.id).sort()).toEqual([
      'sp-other-anuran', 'sp-other-bird', 'sp-other-caudate', 'sp-other-chelonian', 'sp-other-crocodilian',
      'sp-other-lizard', 'sp-other-marsupial', 'sp-other-passerine', 'sp-other-placental', 'sp-other-snake',
    ])
  })
  it('have no two alike', () => {
    for (const key of ['commonName', 'scientificName'] as const) {
      const names = species.filter(one => !one.notInList).map(one => one[key])
      expect(new Set(names).size, key).toBe(names.length)
    }
  })
  it.each(species.map(one => [one.id, one] as const))('%s is whole: values in order, each with its source', (_id, one) => {
    expect(one.id).toMatch(/^sp-[a-z-]+$/)
    expect(GROUPS).toContain(one.group)
    expect(DIETS).toContain(one.diet)
    expect(ACTIVITIES).toContain(one.activity)
    expect(one.hasCrop === null).toBe(kindOf(one.group) !== 'bird')
    for (const range of [one.feedingTemperatureC, one.warmPlaceC, one.adultWeightG, one.adultLengthMm]) {
      if (range) expect(range.low).toBeLessThan(range.high)
    }
    expect(one.feedingTemperatureC.low).toBeGreaterThanOrEqual(isEctotherm(one.group) ? 10 : 30)
    expect(one.feedingTemperatureC.high).toBeLessThanOrEqual(44)
    if (kindOf(one.group) === 'bird') expect(one.feedingTemperatureC.low).toBeGreaterThanOrEqual(38)
    expect(one.mealLimitMlPerKg.first).toBeLessThan(one.mealLimitMlPerKg.later)
    expect(one.mealLimitMlPerKg.firstMeals).toBe(3)
    expect(one.minimumGapHours).toBeLessThanOrEqual(one.feedingIntervalHours)
    expect(one.maintenanceMlPerKgPerDay === null).toBe(kindOf(one.group) === 'amphibian')

    const holding = ['diet', 'activity', 'feedingTemperatureC', 'warmPlaceC', 'adultWeightG', 'mealLimitMlPerKg', 'feedingIntervalHours', 'minimumGapHours', 'diluteFirstFeeds',
      ...(['hasCrop', 'adultLengthMm', 'weightFromLength', 'maintenanceMlPerKgPerDay', 'maintenanceEquationId'] as const).filter(field => one[field] !== null),
      ...(one.notes.length > 0 ? ['notes'] : [])]
    expect(Object.keys(one.provenance).sort()).toEqual(holding.sort())
    for (const [field, { sourceKey, howRead, unit, locator }] of Object.entries(one.provenance)) {
      expect(sources.has(sourceKey), `${field}: ${sourceKey}`).toBe(true)
      expect(HOW_READ, field).toContain(howRead)
      expect(unit.length * locator.length, field).toBeGreaterThan(0)
    }
    for (const { sourceKey, value } of one.adultWeightG.published) {
      expect(sources.has(sourceKey)).toBe(true)
      expect(value).toBeGreaterThan(0)
    }
  })
  it('give the chosen limits by group', () => {
    const limits = (id: string) => Object.values(byId.get(id)!.mealLimitMlPerKg).slice(0, 2)
    expect(['sp-corn-snake', 'sp-leopard-gecko', 'sp-box-turtle', 'sp-nile-croc', 'sp-axolotl', 'sp-kestrel', 'sp-feral-pigeon', 'sp-tawny-owl', 'sp-robin', 'sp-cat', 'sp-rabbit', 'sp-koala'].map(limits))
      .toEqual([[20, 50], [10, 20], [5, 20], [10, 20], [10, 20], [17, 25], [17, 25], [10, 20], [10, 20], [10, 15], [10, 15], [10, 15]])
  })
  it.each([
    ['sp-leopard-gecko', 48, 4, 20], ['sp-green-iguana', 24, 4, 20], ['sp-bearded-dragon', 24, 4, 20], ['sp-corn-snake', 168, 24, 20], ['sp-t-hermanni', 24, 4, 20],
    ['sp-longneck', 48, 4, 20], ['sp-salt-croc', 48, 24, 20], ['sp-whites-frog', 48, 24, null], ['sp-house-sparrow', 24, 0.5, 100], ['sp-carrion-crow', 24, 1, 50],
    ['sp-swift', 24, 0.5, 100], ['sp-herring-gull', 24, 3, 50], ['sp-common-tern', 24, 1.5, 50], ['sp-barn-owl', 24, 2, 50], ['sp-budgerigar', 24, 3, 100],
    ['sp-mouse', 24, 2, 125], ['sp-rat', 24, 3, 80], ['sp-hedgehog', 24, 3, 75], ['sp-fox', 24, 3, 60], ['sp-cat', 24, 4, 54.9], ['sp-brushtail-possum', 24, 3, 40],
  ])('%s: a meal day every %d h, meals %d h apart, maintenance %s mL/kg/day', (id, interval, gap, maintenance) => {
    expect(byId.get(id)).toMatchObject({ feedingIntervalHours: interval, minimumGapHours: gap, maintenanceMlPerKgPerDay: maintenance })
  })
  it('thin the first feeds of all but bats', () => {
    expect(species.filter(one => !one.diluteFirstFeeds).map(one => one.id).sort()).toEqual(['sp-big-brown-bat', 'sp-flying-fox', 'sp-noctule', 'sp-pipistrelle'])
  })
  it('include every species that a rule names', () => {
    for (const id of [...rules.condition.shellIndex.speciesIds, ...rules.meals.growing.squabSpeciesIds]) expect(byId.has(id), id).toBe(true)
    for (const equation of equations.values()) for (const id of equation.speciesIds ?? []) expect(byId.has(id), `${equation.id}: ${id}`).toBe(true)
  })
})
