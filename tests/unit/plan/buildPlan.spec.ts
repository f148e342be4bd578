import { describe, expect, it } from 'vitest'
import { currentEdition } from '#server/utils/reference'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { regimenInput } from './inputs'

const edition = currentEdition()
const plan = (change: Parameters<typeof regimenInput>[0] = {}) => buildPlan(regimenInput(change), edition)
const codes = (one: ReturnType<typeof plan>) => one.findings.map(finding => finding.code)

/** Facts of the trade that serve as checks: common practice, no published source. */
describe('common practice', () => {
  const gecko = plan({ animal: { weightG: 10, lengthMm: 200, lengthMeasure: 'total', drynessPercent: 8, daysUnfed: 60 } })

  it('a gecko about 20 cm long that weighs 10 g is far under half of its healthy weight and in the highest tier', () => {
    expect(gecko.condition.shortfallPercent).toBeGreaterThan(50)
    expect(gecko.condition.shortfallLowPercent).toBeGreaterThan(50)
    expect(gecko.ramp.tier).toBe('extreme')
  })
  it('its first mix is thin and watery', () => {
    const first = gecko.days.find(day => day.feeds.length > 0)!
    expect(first.strengthFraction).toBeLessThanOrEqual(0.5)
    expect(gecko.feed.energyKcalPerMl * first.strengthFraction).toBeLessThanOrEqual(0.6)
  })
  it('it is fed small amounts morning, evening and night at first', () => {
    const first = gecko.days.find(day => day.feeds.length > 0)!
    expect(first.feeds).toHaveLength(3)
    for (const feed of first.feeds) expect(feed.volumeMl).toBeLessThanOrEqual(0.1)
  })
  it('its warm end is at 90 to 94 deg F', () => {
    const low = gecko.animal.warmPlaceC.low * 9 / 5 + 32
    const high = gecko.animal.warmPlaceC.high * 9 / 5 + 32
    expect(low).toBeGreaterThan(89)
    expect(low).toBeLessThan(91)
    expect(high).toBeGreaterThan(93)
    expect(high).toBeLessThan(95)
  })
  it('too much or too strong a first meal is held back by the limit and said to be brought up', () => {
    expect(gecko.meal.firstMealMl).toBeLessThanOrEqual(gecko.meal.firstCapMl)
    expect(gecko.stopSigns.join(' ')).toContain('Brought up')
  })
  it('it is left quiet with its head up, with a shallow dish of water', () => {
    expect(gecko.howToGive.join(' ')).toMatch(/quiet.*head up/)
    expect(gecko.howToGive.join(' ')).toMatch(/shallow dish of water/)
  })
})

describe('energy', () => {
  // Nutrition sheet 5 and 12.1: 10 g gecko at 30 deg C, resting 0.18, full meals 0.27, free-living 0.363 kcal/day.
  it('is resting times 1.5 for the 10 g gecko', () => {
    const { energy } = plan({ animal: { weightG: 10, bodyTemperatureC: 30 } })
    expect(energy.restingKcalPerDay).toBeCloseTo(0.18, 3)
    expect(energy.targetKcalPerDay).toBeCloseTo(0.27, 2)
    expect(energy.fieldCapKcalPerDay).toBeCloseTo(0.3628, 3)
    expect(energy.alternatives.map(one => one.equationId)).toEqual(expect.arrayContaining(['reptile-k10-37c', 'donoghue-32-077', 'gillooly-2001-reptile']))
  })
  it('never passes the free-living rate, whoever chose the equation', () => {
    const one = plan({ animal: { weightG: 10, bodyTemperatureC: 30 }, overrides: { energyEquationId: 'donoghue-32-077' } })
    expect(one.energy.targetKcalPerDay).toBeCloseTo(0.3628, 3)
    expect(codes(one)).toEqual(expect.arrayContaining(['energy.otherEquation', 'energy.cappedByFieldRate']))
  })
  it('refuses an equation of another group', () => {
    expect(() => plan({ overrides: { energyEquationId: 'k129-passerine' } })).toThrow('no energy equation')
  })
  it('rises with body temperature inside the window and not outside of it', () => {
    const at = (bodyTemperatureC?: number) => plan({ animal: { bodyTemperatureC } }).energy.targetKcalPerDay
    expect(at(31)).toBeGreaterThan(at(28))
    expect(at(20)).toBe(at(undefined))
    expect(at(36)).toBe(at(32))
  })
})

describe('the gate', () => {
  it.each([
    ['too cold', { bodyTemperatureC: 24 }, 'do-not-feed', 'gate.tooCold'],
    ['a fit', { signs: ['convulsing'] }, 'do-not-feed', 'gate.convulsing'],
    ['unresponsive', { signs: ['unresponsive'] }, 'do-not-feed', 'gate.unresponsive'],
    ['cannot swallow', { signs: ['cannot-swallow'] }, 'do-not-feed', 'gate.cannotSwallow'],
    ['cannot hold its head up', { signs: ['cannot-hold-head-up'] }, 'do-not-feed', 'gate.cannotHoldHeadUp'],
    ['open-mouth breathing', { signs: ['open-mouth-breathing'] }, 'do-not-feed', 'gate.openMouthBreathing'],
    ['blockage', { signs: ['blockage-suspected'] }, 'do-not-feed', 'gate.blockageSuspected'],
    ['crop full', { signs: ['crop-full'] }, 'do-not-feed', 'gate.cropFull'],
    ['brought up', { signs: ['brought-up'] }, 'wait', 'gate.broughtUp'],
    ['temperature unknown', { bodyTemperatureC: undefined }, 'wait', 'gate.temperatureUnknown'],
    ['fluids stage', {}, 'wait', 'gate.fluids'],
  ] as const)('%s', (_, animal, state, code) => {
    const one = plan({ animal: { ...animal, signs: 'signs' in animal ? [...animal.signs] : [] } })
    expect(one.gate.state).toBe(state)
    expect(one.gate.findings.map(finding => finding.code)).toContain(code)
    expect(one.findings[0]!.level).toBe(state === 'do-not-feed' ? 'stop' : one.findings[0]!.level)
  })
  it('is open for a warm, hydrated animal that is barely thin', () => {
    const one = plan({ animal: { weightG: 60, drynessPercent: 0, daysUnfed: 3 } })
    expect(one.gate).toEqual({ state: 'feed', findings: [] })
    expect(one.days[0]!.stage).toBe('ramp')
  })
  it('waits when the weight is older than it may be', () => {
    const old = plan({ animal: { weightG: 60, drynessPercent: 0, daysUnfed: 3, weighedOn: '2026-11-20' } })
    expect(old.gate.state).toBe('wait')
    expect(old.gate.findings.map(finding => finding.code)).toEqual(['weight.stale'])
    const fresh = plan({ animal: { weightG: 60, drynessPercent: 0, daysUnfed: 3, weighedOn: '2026-11-25' } })
    expect(fresh.gate.state).toBe('feed')
    expect(fresh.validity.goodUntil).toBe('2026-12-02')
  })
  it('closes every day behind a closing sign, and says why', () => {
    for (const day of plan({ animal: { signs: ['convulsing'] } }).days) expect(day).toMatchObject({ state: 'do-not-feed', stateReason: 'Fits, twitches or trembles' })
  })
})

describe('fluids', () => {
  it('are kg x % x 10 and spread over the hours of the group', () => {
    const cat = plan({ animal: { speciesId: 'sp-cat', weightG: 4000, healthyWeightG: 4100, drynessPercent: 8, bodyTemperatureC: 38.5, daysUnfed: 2 }, feed: { feedId: 'demo-omnivore-slurry' }, route: 'tube' })
    // Nutrition sheet 6.3: 4 kg cat, 8 %: 320 mL + 226 mL a day, 24 h.
    expect(cat.fluids.deficitMl).toBeCloseTo(320, 9)
    expect(cat.fluids.maintenanceMlPerDay).toBeCloseTo(226, 0)
    expect(cat.fluids.deficitHours).toBe(24)
  })
  it('stretch the deficit of the worked tortoise to 96 h under a limit of 40 mL/kg/day', () => {
    const tortoise = plan({ animal: { speciesId: 'sp-t-hermanni', weightG: 1000, drynessPercent: 8, bodyTemperatureC: 28 }, feed: { feedId: 'demo-herbivore-slurry' } })
    expect(tortoise.fluids).toMatchObject({ maintenanceMlPerDay: 20, deficitMl: 80, capMlPerDay: 40 })
    expect(tortoise.fluids.deficitHours).toBeCloseTo(96, 9)
  })
  it('cap the dryness of a very thin animal and print both', () => {
    const one = plan({ animal: { drynessPercent: 12 } })
    expect(one.fluids.drynessUsedPercent).toBe(8)
    expect(one.fluids.deficitAsEnteredMl).toBeGreaterThan(one.fluids.deficitMl)
    expect(codes(one)).toContain('fluids.drynessCapped')
  })
  it('give a bird of 100 g with 8 % its 9 mL on a whole first day', () => {
    const bird = plan({ animal: { speciesId: 'sp-cockatiel', weightG: 100, drynessPercent: 8, bodyTemperatureC: 41, daysUnfed: 1 }, feed: { feedId: 'demo-omnivore-slurry' }, startAt: '2026-12-02T00:00:00Z' })
    expect(bird.fluids.deficitMl).toBeCloseTo(8, 9)
    expect(bird.days[0]!.waterNeedMl).toBeCloseTo(9, 9)
  })
  it('leave frogs to soak', () => {
    const frog = plan({ animal: { speciesId: 'sp-whites-frog', weightG: 20, bodyTemperatureC: 25 } })
    expect(frog.days.every(day => day.waterToGiveMl === 0)).toBe(true)
    expect(codes(frog)).toContain('fluids.bySoak')
  })
})

describe('meals', () => {
  it('of a turtle follow the published handout: 0.5 % of its weight a day for three days, 2 % after', () => {
    // Assist-feeding handout, eastern box turtles: a 400 g animal gets 2 mL, then 8 mL a day at most.
    const turtle = plan({ animal: { speciesId: 'sp-box-turtle', weightG: 400, drynessPercent: 5, bodyTemperatureC: 27, daysUnfed: 20 }, feed: { feedId: 'demo-omnivore-slurry' } })
    const fed = turtle.days.filter(day => day.feeds.length > 0).map(day => day.feeds.reduce((sum, feed) => sum + feed.volumeMl, 0))
    for (const volume of fed.slice(0, 3)) expect(volume).toBeLessThanOrEqual(2)
    for (const volume of fed) expect(volume).toBeLessThanOrEqual(8)
  })
  it('of a snake come once an interval', () => {
    const snake = plan({ animal: { speciesId: 'sp-corn-snake', weightG: 300, drynessPercent: 5, bodyTemperatureC: 28, daysUnfed: 90 }, feed: { feedId: 'demo-insectivore-slurry' } })
    const fed = snake.days.map((day, index) => day.feeds.length > 0 ? index : -1).filter(index => index >= 0)
    for (let index = 1; index < fed.length; index += 1) expect(fed[index]! - fed[index - 1]!).toBe(7)
  })
  it('that no syringe can measure are not planned, and it says so', () => {
    const tiny = plan({ animal: { speciesId: 'sp-green-anole', weightG: 2, bodyTemperatureC: 28 } })
    expect(tiny.days.flatMap(day => day.feeds)).toEqual([])
    expect(tiny.meal.firstMealMl).toBeNull()
    expect(codes(tiny)).toContain('meal.cannotBeMeasured')
  })
  it('keep to the feeds a person asked for', () => {
    const one = plan({ feedsPerDay: 2 })
    for (const day of one.days.filter(day => day.feeds.length > 0)) expect(day.feeds).toHaveLength(2)
  })
  it('say what binds when a songbird cannot eat enough this way', () => {
    const sparrow = plan({ animal: { speciesId: 'sp-robin', weightG: 14, bodyTemperatureC: 41, daysUnfed: 2, drynessPercent: 5 }, feed: { energyKcalPerMl: 0.6, waterFraction: 0.85 } })
    expect(codes(sparrow)).toContain('meal.capBinds')
    expect(sparrow.meal.binds.join(' ')).toContain('would free it')
  })
})

describe('refusals', () => {
  it.each([
    ['grams typed as kilograms', { weightG: 0.022 }, 'too light'],
    ['kilograms typed as grams', { weightG: 22_000 }, 'too heavy'],
    ['unknown species', { speciesId: 'sp-dragon' }, 'no species'],
  ])('%s', (_, animal, message) => expect(() => plan({ animal })).toThrow(message))
  it('unknown feed', () => expect(() => plan({ feed: { feedId: 'gravel' } })).toThrow('no feed'))
})

describe('own steps', () => {
  it('say what they break', () => {
    expect(codes(plan({ overrides: { fractions: [0.8, 0.5, 0.9] } }))).toEqual(expect.arrayContaining(['ramp.startsHigh', 'ramp.fractionsFall', 'ramp.endsElsewhere', 'ramp.fewerSteps']))
    expect(codes(plan({ animal: { weightG: 20 }, overrides: { tier: 'low' } }))).toContain('ramp.tierLowered')
    expect(codes(plan({ overrides: { fluidHours: 0 } }))).toContain('ramp.fluidsCutShort')
  })
})

describe('clock changes', () => {
  it('keep the clock on the wall', () => {
    const spring = plan({ startAt: '2026-03-27T09:00:00Z' })
    for (const day of spring.days.filter(day => day.feeds.length === 3)) expect(day.feeds.map(feed => feed.localTime)).toEqual(['07:30', '14:00', '20:30'])
    const before = spring.days.find(day => day.date === '2026-03-28' && day.feeds.length > 0)
    const after = spring.days.find(day => day.date === '2026-03-30' && day.feeds.length > 0)!
    if (before) expect(before.feeds[0]!.at).toBe('2026-03-28T07:30:00.000Z')
    expect(after.feeds[0]!.at).toBe('2026-03-30T06:30:00.000Z')
  })
})

describe('a weight from after the start', () => {
  const codes = (weighedOn: string) => buildPlan(regimenInput({ animal: { weighedOn } }), currentEdition()).findings.filter(one => one.code.startsWith('weight.')).map(one => `${one.code} ${one.level}`)
  it('is how a plan goes on, and says so', () => expect(codes('2026-12-04')).toEqual(['weight.sinceStart note']))
  it('is doubted when it lies behind the plan', () => expect(codes('2027-11-04')).toEqual(['weight.fromTheFuture caution']))
  it('carries the plan from its own day', () => expect(buildPlan(regimenInput({ animal: { weighedOn: '2026-12-04' } }), currentEdition()).validity.goodUntil).toBe('2026-12-11'))
})
