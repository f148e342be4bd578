import { describe, expect, it } from 'vitest'
import { deficitMl } from '#server/utils/calc/fluids/deficitMl'
import { waterDueMl } from '#server/utils/calc/fluids/waterDueMl'
import { equationKcalPerDay, evaluateEquation } from '#server/utils/calc/equation/evaluateEquation'
import { equationVariables } from '#server/utils/calc/equation/equationVariables'
import { currentEdition } from '#server/utils/reference'
import published from './feeding-examples.json'

/** Published feeding sums worked out again with our own records: each result named in the row is compared within its tolerance. */
interface Example { id: string, inputs: Record<string, number>, expected: Record<string, number>, tolerance: Record<string, number>, source: string }
const examples = new Map((published as unknown as Example[]).map(example => [example.id, example]))

const { equations, foods, species, sources, rules } = currentEdition()
const growing = rules.meals.growing
const HOUR_MS = 3_600_000
const kcalPerDay = (equationId: string, massG: number, temperatureC?: number) => {
  const equation = equations.get(equationId)!
  return equationKcalPerDay(equation, equationVariables(equation, { massG, temperatureC }))
}
const energyOf = (foodId: string) => foods.get(foodId)!.energyKcalPerMl
const mealMl = (mlPerKg: number, massG: number) => mlPerKg * massG / 1000

/** By id, what our records make of the row's inputs. Results the product has no rule for are left out, with the reason. */
const worked: Record<string, { results: (inputs: Record<string, number>) => Record<string, number>, leftOut?: Record<string, string> }> = {
  'FX-01-otter-neonate-135g': {
    results: ({ mass_g: g, factor }) => ({ kcal_day: kcalPerDay('otter-84-078', g!) * factor!, mL_per_feed_max: mealMl(growing.mammalMlPerKg.value, g!) }),
  },
  'FX-03-kitten-a-100g': { results: ({ mass_g: g }) => kitten(g!) },
  'FX-05-kitten-b-113g': { results: ({ mass_g: g }) => kitten(g!) },
  'FX-23-kitten-a-450g': { results: ({ mass_g: g }) => kitten(g!) },
  'FX-07-squirrel-60g': { results: ({ mass_g: g }) => ({ mL_per_feed: mealMl(growing.mammalMlPerKg.value, g!) }) },
  'FX-17-box-turtle-400g-ramp': {
    results: ({ mass_g: g }) => ({ mL_day_1_to_3: mealMl(rules.meals.chelonianDayMlPerKg.first.value, g!), mL_day_from_4: mealMl(rules.meals.chelonianDayMlPerKg.later.value, g!) }),
  },
  'FX-19-adult-mouse-27g': { results: ({ mass_g: g }) => ({ kcal_item: g! * energyOf('food-adult-mouse') }) },
  'FX-21-cat-4.4kg-rehydration': {
    results: ({ mass_kg: kg, dehydration_pct: percent, maintenance_mL_kg_day: rate, hours }) => {
      const deficit = deficitMl({ weightG: kg! * 1000, drynessPercent: percent! })
      const day = waterDueMl({ spanFromMs: 0, spanToMs: hours! * HOUR_MS, fluidsFromMs: 0, maintenanceMlPerDay: kg! * rate!, deficitMl: deficit, deficitHours: hours!, capMlPerDay: 10_000 })
      return { deficit_mL: deficit, rate_mL_h: day / hours! }
    },
    leftOut: { maintenance_mL_day: 'the question\'s own rate; cats go by their equation here' },
  },
  'FX-27-white-tailed-kite-watts': {
    // Any record published in watts carries the conversion; its own value cancels.
    results: ({ watts }) => {
      const bird = evaluateEquation(equations.get('mckechnie-wolf-2004')!, { g: 300 })
      return { kcal_day: watts! * bird.kcalPerDay! / bird.value }
    },
  },
  'FX-11-rock-pigeon-100g': { results: squabCap, leftOut: { hours_between_feeds: 'feeds of growing squabs come every 1 to 4 h by size; the species\' 3 h is for adults' } },
  'FX-13-mourning-dove-30g': { results: squabCap, leftOut: { hours_between_feeds: 'feeds of growing squabs come every 1 to 4 h by size; the species\' 3 h is for adults' } },
}

/** Rows that are only a sum of their own inputs, or a measurement: nothing of ours works them out. Used as a yardstick below. */
const LEFT_OUT: Record<string, string> = {
  'FX-09-bat-9g-regulating': 'a measurement; the bat equation is compared with it below',
  'FX-29-herbivorous-lizard-1kg': 'a measurement; the reptile equations are compared with it below',
  'FX-15-rat-300g-fluids': 'weight times the leaflet\'s rate; our rate of rats is compared with it below',
  'FX-25-rat-pup-5g-printed-error': 'a misprint of its source; it must stand in the errata, see below',
}

function kitten(massG: number): Record<string, number> {
  const kcal = kcalPerDay('fediaf-newborn-kitten', massG)
  const mlPerDay = kcal / energyOf('food-kitten-formula')
  const mlPerFeed = mealMl(growing.kittenMlPerKg.value, massG)
  return { kcal_day: kcal, mL_day: mlPerDay, mL_per_feed: mlPerFeed, feeds_day: mlPerDay / mlPerFeed }
}

/** The printed row is a range; the cap of a growing squab must lie inside it, so it is pulled to the nearer end. */
function squabCap({ mass_g: massG }: Record<string, number>): Record<string, number> {
  const example = [...examples.values()].find(one => one.inputs.mass_g === massG && 'mL_per_feed_min' in one.expected)!
  const cap = Math.min(mealMl(growing.squabMlPerKg.value, massG!), growing.squabMl.value)
  const { mL_per_feed_min: low, mL_per_feed_max: high } = example.expected
  return { mL_per_feed_min: Math.min(cap, low!), mL_per_feed_max: Math.max(cap, high!) }
}

describe('published feeding sums', () => {
  it.each([...examples.values()].filter(example => !(example.id in LEFT_OUT)).map(example => [example.id, example] as const))('%s', (id, example) => {
    const { results, leftOut = {} } = worked[id]!
    const ours = results(example.inputs)
    const compared = Object.keys(example.expected).filter(name => !(name in leftOut))
    expect(compared.length).toBeGreaterThan(0)
    for (const name of compared) {
      const tolerance = Math.max(example.tolerance[name]!, 1e-9)
      expect(Math.abs(ours[name]! - example.expected[name]!), `${name}: ${ours[name]} against ${example.expected[name]} (${example.source})`).toBeLessThanOrEqual(tolerance)
    }
  })

  it('works every example out or says why not, and names none that is gone', () => {
    expect([...Object.keys(worked), ...Object.keys(LEFT_OUT)].sort()).toEqual([...examples.keys()].sort())
    for (const [id, { leftOut = {} }] of Object.entries(worked)) {
      for (const name of Object.keys(leftOut)) expect(examples.get(id)!.expected, id).toHaveProperty(name)
    }
  })
})

describe('measured animals', () => {
  it('the accepted reptile equations fall within a factor of 1.5 of a lizard that was measured at 37 deg C; the 32 formula does not', () => {
    const measured = examples.get('FX-29-herbivorous-lizard-1kg')!.expected.kcal_day!
    for (const id of ['andrews-pough-1985', 'reptile-k10-37c', 'gillooly-2001-reptile']) {
      expect(kcalPerDay(id, 1000, 37) / measured, id).toBeGreaterThan(1 / 1.5)
      expect(kcalPerDay(id, 1000, 37) / measured, id).toBeLessThan(1.5)
    }
    expect(kcalPerDay('donoghue-32-077', 1000) / measured).toBeGreaterThan(1.5)
  })

  it('the whole-day equation of small bats lies within a quarter of the 9 g bat it was taken from', () => {
    const measured = examples.get('FX-09-bat-9g-regulating')!.expected.kcal_day!
    expect(kcalPerDay('bat-whole-day', 9) / measured).toBeGreaterThan(0.75)
    expect(kcalPerDay('bat-whole-day', 9) / measured).toBeLessThan(1.25)
  })

  it('fluid of rats stays at or under the leaflet\'s 100 mL/kg/day and within the texts\' 60 to 100', () => {
    const leaflet = examples.get('FX-15-rat-300g-fluids')!
    const rate = species.get('sp-rat')!.maintenanceMlPerKgPerDay!
    expect(rate * leaflet.inputs.mass_kg!).toBeLessThanOrEqual(leaflet.expected.mL_day!)
    expect(rate).toBeGreaterThanOrEqual(60)
  })

  it('the misprinted rat pup stands in the errata of its source', () => {
    const { mL_day: right } = examples.get('FX-25-rat-pup-5g-printed-error')!.expected
    expect(sources.get('afrma2009')!.errata.join(' ')).toMatch(new RegExp(`3\\.75 mL.*It is ${right} mL`))
  })
})
