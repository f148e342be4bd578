import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { currentEdition } from '#server/utils/reference'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { gramsFrom, gramsTo } from '#shared/utils/units'
import type { Plan, PlanFeed } from '#shared/types/plan'
import { regimenInput } from './inputs'

/**
 * What must hold for every species, weight, temperature and kitchen. No published figures here: these are properties
 * of the plan itself, and each is a way to kill an animal if it fails.
 */
const edition = currentEdition()
const allSpecies = [...edition.species.values()]
const allFoods = [...edition.foods.keys()]
const RUNS = Number(process.env.PROPERTY_RUNS ?? 400)
const zones = ['Europe/London', 'America/New_York', 'Australia/Lord_Howe', 'Pacific/Chatham', 'Asia/Kathmandu', 'Africa/Casablanca']

const anyInput = fc.record({
  species: fc.constantFrom(...allSpecies),
  thinness: fc.double({ min: 0.21, max: 1.2, noNaN: true }),
  dryness: fc.integer({ min: 0, max: 15 }),
  temperature: fc.option(fc.double({ min: 5, max: 43, noNaN: true }), { nil: undefined }),
  daysUnfed: fc.integer({ min: 0, max: 400 }),
  lifeStage: fc.constantFrom('adult', 'growing', 'breeding'),
  score: fc.option(fc.integer({ min: 1, max: 5 }), { nil: undefined }),
  feedId: fc.constantFrom(...allFoods),
  route: fc.constantFrom('syringe', 'tube', 'hand'),
  feedsPerDay: fc.option(fc.integer({ min: 1, max: 24 }), { nil: undefined }),
  from: fc.integer({ min: 0, max: 23 }),
  length: fc.integer({ min: 2, max: 23 }),
  start: fc.date({ min: new Date('2026-01-01T00:00:00Z'), max: new Date('2027-12-31T00:00:00Z'), noInvalidDate: true }),
  timeZone: fc.constantFrom(...zones),
  syringes: fc.option(fc.uniqueArray(fc.constantFrom({ capacityMl: 0.5, stepMl: 0.01 }, { capacityMl: 1, stepMl: 0.01 }, { capacityMl: 1, stepMl: 0.05 }, { capacityMl: 3, stepMl: 0.1 }, { capacityMl: 5, stepMl: 0.2 }, { capacityMl: 10, stepMl: 0.5 }, { capacityMl: 20, stepMl: 1 }, { capacityMl: 60, stepMl: 1 }), { minLength: 1 }), { nil: undefined }),
}).map(one => regimenInput({
  animal: {
    speciesId: one.species.id,
    weightG: Math.round(one.species.adultWeightG.low * Math.pow(one.species.adultWeightG.high / one.species.adultWeightG.low, 0.5) * one.thinness * 1000) / 1000,
    drynessPercent: one.dryness,
    bodyTemperatureC: one.temperature,
    daysUnfed: one.daysUnfed,
    lifeStage: one.lifeStage as 'adult',
    bodyConditionScore: one.score,
  },
  feed: { feedId: one.feedId },
  route: one.route as 'syringe',
  feedsPerDay: one.feedsPerDay,
  feedingHours: { from: clock(one.from), to: clock((one.from + one.length) % 24) },
  startAt: one.start.toISOString(),
  timeZone: one.timeZone,
  syringes: one.syringes,
})).filter(input => input.animal.lifeStage === 'growing' || input.animal.weightG >= edition.species.get(input.animal.speciesId)!.adultWeightG.low * 0.2)

function clock(hour: number): string {
  return `${String(hour).padStart(2, '0')}:30`
}

function feedsOf(plan: Plan): PlanFeed[] {
  return plan.days.flatMap(day => day.feeds)
}

function check(name: string, holds: (plan: Plan, input: ReturnType<typeof regimenInput>) => void) {
  it(name, () => fc.assert(fc.property(anyInput, input => holds(buildPlan(input, edition), input)), { numRuns: RUNS }), 120_000)
}

describe('every plan', () => {
  check('has no meal above its limit', (plan) => {
    let mealDays = 0
    for (const day of plan.days) {
      const cap = mealDays < plan.meal.firstCapMeals ? plan.meal.firstCapMl : plan.meal.capMl
      for (const feed of day.feeds) expect(feed.volumeMl).toBeLessThanOrEqual(cap + 1e-9)
      if (day.feeds.length > 0) mealDays += 1
    }
  })

  check('has no volume between two marks, none a syringe cannot hold or show', (plan) => {
    for (const feed of feedsOf(plan)) {
      const marks = feed.markMl / feed.syringe.stepMl
      expect(Math.abs(marks - Math.round(marks))).toBeLessThan(1e-3)
      expect(Math.round(marks)).toBeGreaterThanOrEqual(2)
      expect(feed.markMl).toBeLessThanOrEqual(feed.syringe.capacityMl + 1e-9)
      expect(feed.markMl).toBeGreaterThanOrEqual(0.05 - 1e-9)
      expect(feed.volumeMl).toBeCloseTo(feed.markMl * feed.draws, 9)
    }
  })

  check('gives energy that is volume times density times strength', (plan) => {
    for (const day of plan.days) {
      const volume = day.feeds.reduce((sum, feed) => sum + feed.volumeMl, 0)
      expect(day.energyGivenKcal).toBeCloseTo(volume * plan.feed.energyKcalPerMl * day.strengthFraction, 6)
    }
  })

  check('never gives much more energy than the step asks for', (plan) => {
    for (const day of plan.days) expect(day.energyGivenKcal).toBeLessThanOrEqual(day.energyTargetKcal * 1.1 + 1e-9)
  })

  check('has fractions that never fall and end at full meals', (plan) => {
    const { fractions } = plan.ramp
    for (let index = 1; index < fractions.length; index += 1) expect(fractions[index]).toBeGreaterThanOrEqual(fractions[index - 1]!)
    expect(fractions.at(-1)).toBe(1)
  })

  check('never gets thinner again', (plan) => {
    const strengths = plan.days.filter(day => day.feeds.length > 0).map(day => day.strengthFraction)
    for (let index = 1; index < strengths.length; index += 1) expect(strengths[index]).toBeGreaterThanOrEqual(strengths[index - 1]!)
  })

  check('keeps the water of a day inside its limit, or says so', (plan, input) => {
    const daysPerMeal = plan.ramp.stepDays > 1 && plan.days.some(day => day.stage === 'ramp' && day.feeds.length === 0) ? plan.ramp.stepDays : 1
    const over = plan.days.some(day => day.waterInFeedMl + day.waterToGiveMl > plan.fluids.capMlPerDay * daysPerMeal * (1 + 1e-6) * (25 / 24))
    if (over) expect(plan.findings.map(finding => finding.code)).toContain('fluids.overHydration')
    expect(input.animal.weightG).toBeGreaterThan(0)
  })

  check('has no number that is NaN, infinite or negative', (plan) => {
    const mayBeNegative = /roundingFraction|differenceFraction|temperatureC|steps/
    const wrong: string[] = []
    const walk = (value: unknown, path: string) => {
      if (typeof value === 'number') {
        if (!Number.isFinite(value) || (value < 0 && !mayBeNegative.test(path))) wrong.push(`${path}: ${value}`)
      }
      else if (value && typeof value === 'object') for (const [key, inner] of Object.entries(value)) walk(inner, `${path}.${key}`)
    }
    walk(plan, 'plan')
    expect(wrong).toEqual([])
  })

  check('feeds only inside the feeding hours, with the gap kept, never before fluids are done', (plan, input) => {
    const species = edition.species.get(input.animal.speciesId)!
    const young = input.animal.lifeStage === 'growing' && /^(bird|mammal)/.test(species.group)
    const gapMs = (young ? Math.min(2, species.minimumGapHours) : species.minimumGapHours) * 3_600_000
    const earliest = Date.parse(plan.ramp.fluidsFrom) + plan.ramp.fluidHours * 3_600_000
    for (const day of plan.days) {
      day.feeds.forEach((feed, index) => {
        expect(Date.parse(feed.at)).toBeGreaterThanOrEqual(earliest)
        // A clock change between two feeds takes up to an hour out of the gap by the clock on the wall, not more.
        if (index > 0) expect(Date.parse(feed.at) - Date.parse(day.feeds[index - 1]!.at)).toBeGreaterThanOrEqual(gapMs - 3_600_000)
      })
    }
  })

  check('says what is wrong with a state that is not "feed"', (plan) => {
    if (plan.gate.state === 'feed') expect(plan.gate.findings).toEqual([])
    else expect(plan.gate.findings.length).toBeGreaterThan(0)
    for (const day of plan.days) {
      expect(day.stateReason).not.toBe('')
      if (day.stage === 'warm' || day.stage === 'fluids') expect(day.feeds).toEqual([])
    }
  })

  check('has pots that are enough and in whole scale steps', (plan) => {
    for (const pot of plan.mixing) {
      expect(pot.madeUpMl).toBeGreaterThanOrEqual(pot.neededMl - 1e-6)
      if (pot.powderG !== null) expect(Math.abs(pot.powderG / pot.kitchenScaleStepG - Math.round(pot.powderG / pot.kitchenScaleStepG))).toBeLessThan(1e-3)
    }
  })

  check('is the same again, and does not touch its input', (plan, input) => {
    const before = JSON.stringify(input)
    expect(JSON.stringify(buildPlan(input, edition))).toBe(JSON.stringify(plan))
    expect(JSON.stringify(input)).toBe(before)
  })

  it('asks for more energy for a heavier animal', () => {
    fc.assert(fc.property(anyInput, fc.double({ min: 1.01, max: 3, noNaN: true }), (input, times) => {
      const heavier = { ...input, animal: { ...input.animal, weightG: Math.min(input.animal.weightG * times, edition.species.get(input.animal.speciesId)!.adultWeightG.high * 4.9) } }
      fc.pre(heavier.animal.weightG > input.animal.weightG)
      expect(buildPlan(heavier, edition).energy.targetKcalPerDay).toBeGreaterThan(buildPlan(input, edition).energy.targetKcalPerDay)
    }), { numRuns: RUNS })
  }, 120_000)

  it('is the same plan for the same animal in pounds and in grams', () => {
    fc.assert(fc.property(anyInput, (input) => {
      const throughPounds = gramsFrom(gramsTo(input.animal.weightG, 'lb'), 'lb')
      const plan = buildPlan(input, edition)
      const other = buildPlan({ ...input, animal: { ...input.animal, weightG: throughPounds } }, edition)
      expect(feedsOf(other).map(feed => feed.volumeMl)).toEqual(feedsOf(plan).map(feed => feed.volumeMl))
      expect(other.energy.targetKcalPerDay).toBeCloseTo(plan.energy.targetKcalPerDay, 9)
    }), { numRuns: RUNS })
  }, 120_000)

  it('covers every species of the list at its usual starved weight', () => {
    for (const species of allSpecies) {
      const plan = buildPlan(regimenInput({ animal: { speciesId: species.id, weightG: species.adultWeightG.low * 0.6, bodyTemperatureC: species.feedingTemperatureC.low + 1 } }), edition)
      expect(plan.animal.speciesId, species.id).toBe(species.id)
      expect(plan.energy.targetKcalPerDay, species.id).toBeGreaterThan(0)
      expect(plan.days.length, species.id).toBeGreaterThanOrEqual(7)
    }
  })
})
