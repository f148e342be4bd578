import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { currentEdition } from '#server/utils/reference'
import { compareVersions, type ComparedVersion } from '#server/utils/regimen/compareVersions'
import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan, PlanDay } from '#shared/types/plan'
import type { ChangedLine } from '#shared/types/planLife'
import { regimenInput } from '../plan/inputs'
import { beardedDragon, dayOn, feedAt, potOf, snake } from '../print/fixtures'

const PARTS = ['What is given', 'May it be fed', 'Animal', 'Feed and mixing', 'Steps', 'Fluids', 'Limits', 'House', 'Reference data']

/** Lines as "part: text", with plain spaces for reading; `*` marks what a carer would give differently. */
function written(lines: ChangedLine[]): string[] {
  return lines.map(({ part, text, weight }) => `${weight === 'amount' ? '* ' : ''}${part}: ${text.replaceAll('\u00A0', ' ')}`)
}

/** Two plans written by hand that come of the same input. */
function ofPlans(before: Plan, after: Plan): string[] {
  const input = regimenInput()
  return written(compareVersions({ input, plan: before }, { input, plan: after }))
}

/** The same plan by hand, entered differently. */
function ofInputs(before: RegimenInput, after: RegimenInput, plan = beardedDragon()): string[] {
  return written(compareVersions({ input: before, plan }, { input: after, plan }))
}

type Given = [time: string, volumeMl: number][]

function dayWith(date: string, feeds: Given, changes: Partial<PlanDay> = {}): PlanDay {
  return dayOn(date, { feeds: feeds.map(([time, volumeMl]) => feedAt(date, time, volumeMl)), ...changes })
}

const ofDays = (before: PlanDay[], after: PlanDay[]) => ofPlans(beardedDragon({ days: before, mixing: [] }), beardedDragon({ days: after, mixing: [] })).filter(line => !line.includes('Steps:'))
const threeOf = (volumeMl: number): Given => [['07:30', volumeMl], ['14:00', volumeMl], ['20:30', volumeMl]]
const december = (...days: number[]) => days.map(day => `2026-12-${String(day).padStart(2, '0')}`)
const onDays = (days: number[], feeds: Given, changes: Partial<PlanDay> = {}) => december(...days).map(date => dayWith(date, feeds, changes))

function built(change: Parameters<typeof regimenInput>[0] = {}): ComparedVersion {
  const input = regimenInput(change)
  return { input, plan: buildPlan(input, currentEdition()) }
}

describe('what is given', () => {
  it.each<[string, PlanDay[], PlanDay[], string[]]>([
    ['an amount on one day', onDays([4], threeOf(0.35)), onDays([4], threeOf(0.4)), ['Each feed on Fri 4 Dec from 0.35 mL to 0.4 mL']],
    ['the same on days in a row', onDays([4, 5, 6], threeOf(0.35)), onDays([4, 5, 6], threeOf(0.4)), ['Each feed on Fri 4 to Sun 6 Dec from 0.35 mL to 0.4 mL']],
    ['another change in between',
      [...onDays([4, 5, 6], threeOf(0.35)), ...onDays([7], threeOf(0.5))],
      [...onDays([4], threeOf(0.4)), ...onDays([5], threeOf(0.45)), ...onDays([6], threeOf(0.4)), ...onDays([7], threeOf(0.6))],
      ['Each feed on Fri 4 Dec from 0.35 mL to 0.4 mL', 'Each feed on Sat 5 Dec from 0.35 mL to 0.45 mL', 'Each feed on Sun 6 Dec from 0.35 mL to 0.4 mL', 'Each feed on Mon 7 Dec from 0.5 mL to 0.6 mL']],
    ['a day that stays as it was', onDays([4, 5, 6], threeOf(0.35)), [...onDays([4], threeOf(0.4)), ...onDays([5], threeOf(0.35)), ...onDays([6], threeOf(0.4))],
      ['Each feed on Fri 4 Dec from 0.35 mL to 0.4 mL', 'Each feed on Sun 6 Dec from 0.35 mL to 0.4 mL']],
    ['into the next month', [dayWith('2026-12-31', threeOf(1)), dayWith('2027-01-01', threeOf(1))], [dayWith('2026-12-31', threeOf(1.25)), dayWith('2027-01-01', threeOf(1.25))], ['Each feed on Thu 31 Dec and Fri 1 Jan from 1 mL to 1.25 mL']],
    ['feeds that differ among themselves', onDays([4, 5], threeOf(0.4)), onDays([4, 5], [['07:30', 0.35], ['14:00', 0.4], ['20:30', 0.45]]),
      ['The feed at 07:30 on Fri 4 and Sat 5 Dec from 0.4 mL to 0.35 mL', 'The feed at 20:30 on Fri 4 and Sat 5 Dec from 0.4 mL to 0.45 mL']],
    ['a feed more among such feeds', onDays([4], [['07:30', 0.35], ['12:00', 0.4]]), onDays([4], [['07:30', 0.35], ['20:30', 0.5]]),
      ['The feed at 12:00 noon on Fri 4 Dec is no longer planned, it was 0.4 mL', 'The feed at 20:30 on Fri 4 Dec is new: 0.5 mL', 'Feeds on Fri 4 Dec at 07:30 and 20:30 instead of 07:30 and 12:00 noon']],
    ['an earlier feed more among such feeds', onDays([4], [['12:00', 0.4], ['20:30', 0.5]]), onDays([4], [['07:30', 0.3], ['12:00', 0.45], ['20:30', 0.5]]),
      ['The feed at 07:30 on Fri 4 Dec is new: 0.3 mL', 'The feed at 12:00 noon on Fri 4 Dec from 0.4 mL to 0.45 mL', 'Number of feeds on Fri 4 Dec from 2 to 3', 'Feeds on Fri 4 Dec at 07:30, 12:00 noon and 20:30 instead of 12:00 noon and 20:30']],
    ['times and the number of feeds', onDays([4], [['08:00', 0.4], ['18:00', 0.4]]), onDays([4], threeOf(0.4)),
      ['Number of feeds on Fri 4 Dec from 2 to 3', 'Feeds on Fri 4 Dec at 07:30, 14:00 and 20:30 instead of 08:00 and 18:00']],
    ['many times', onDays([4], [['08:00', 0.4], ['18:00', 0.4]]), onDays([4], ['07:00', '08:00', '09:00', '10:00', '11:00'].map(time => [time, 0.4])),
      ['Number of feeds on Fri 4 Dec from 2 to 5', 'Feeds on Fri 4 Dec 5 times from 07:00 to 11:00 instead of 08:00 and 18:00']],
    ['one time among many', onDays([4], ['07:00', '08:00', '09:00', '10:00', '11:00'].map(time => [time, 0.4])), onDays([4], ['07:00', '08:00', '09:30', '10:00', '11:00'].map(time => [time, 0.4])),
      ['Feeds on Fri 4 Dec at 07:00, 08:00, 09:30, 10:00 and 11:00 instead of 07:00, 08:00, 09:00, 10:00 and 11:00']],
    ['strength', onDays([4, 5], threeOf(0.4)), onDays([4, 5], threeOf(0.4), { strengthFraction: 0.75, strengthLabel: 'three-quarter strength' }), ['Strength on Fri 4 and Sat 5 Dec from half strength to three-quarter strength']],
    ['a new day', onDays([11], threeOf(0.4)), [...onDays([11], threeOf(0.4)), ...onDays([12], threeOf(0.5))], ['Sat 12 Dec is new: 3 feeds of 0.5 mL, half strength']],
    ['new days', onDays([11], threeOf(0.4)), [...onDays([11], threeOf(0.4)), ...onDays([12, 13], threeOf(0.5)), ...onDays([14], [['07:30', 0.6]])],
      ['Sat 12 to Mon 14 Dec are new: 3 feeds of 0.5 mL, half strength (Sat 12 and Sun 13 Dec); 1 feed of 0.6 mL, half strength (Mon 14 Dec)']],
    ['a new day without a meal', onDays([4], threeOf(0.4)), [dayOn('2026-12-03', { state: 'wait', strengthLabel: '', waterToGiveMl: 10.9 }), ...onDays([4], threeOf(0.4))], ['Thu 3 Dec is new: WAIT, no meal, 11 mL of water']],
    ['a new day of different feeds', onDays([11], threeOf(0.4)), [...onDays([11], threeOf(0.4)), ...onDays([12], [['07:30', 0.5], ['20:30', 0.6]])], ['Sat 12 Dec is new: feeds of 0.5 mL at 07:30 and 0.6 mL at 20:30, half strength']],
    ['days gone', onDays([11, 12, 13], threeOf(0.4)), onDays([11], threeOf(0.4)), ['Sat 12 and Sun 13 Dec are no longer planned']],
    ['days before and after', onDays([5], threeOf(0.4)), onDays([4, 5, 6], threeOf(0.4)), ['Fri 4 Dec is new: 3 feeds of 0.4 mL, half strength', 'Sun 6 Dec is new: 3 feeds of 0.4 mL, half strength']],
    ['the hour that a clock change repeats', [dayWith('2026-10-25', [['01:30', 0.3], ['01:30', 0.4]])], [dayWith('2026-10-25', [['01:30', 0.35], ['01:30', 0.4]])], ['The feed at 01:30 on Sun 25 Oct from 0.3 mL to 0.35 mL']],
    ['a day gone', onDays([11, 12], threeOf(0.4)), onDays([11], threeOf(0.4)), ['Sat 12 Dec is no longer planned']],
  ])('%s', (_, before, after, texts) => {
    expect(ofDays(before, after)).toEqual(texts.map(text => `* What is given: ${text}`))
  })

  it('says meals that are gone, and meals that are new, with the state of the day', () => {
    const fed = onDays([4, 5], threeOf(0.4))
    const waiting = onDays([4, 5], [], { state: 'wait', strengthFraction: 0, strengthLabel: '' })
    expect(ofDays(fed, waiting)).toEqual(['* What is given: No meals any more on Fri 4 and Sat 5 Dec', '* May it be fed: WAIT instead of FEED on Fri 4 and Sat 5 Dec'])
    expect(ofDays(waiting, fed)).toEqual(['* What is given: Meals on Fri 4 and Sat 5 Dec are new: 3 feeds of 0.4 mL, half strength', '* May it be fed: FEED instead of WAIT on Fri 4 and Sat 5 Dec'])
  })

  it('gives nothing on a day that does not say FEED, whatever is reckoned for it', () => {
    const shut = onDays([4], threeOf(0.4), { state: 'do-not-feed' })
    expect(ofDays(onDays([4], threeOf(0.4)), shut)).toEqual(['* What is given: No meals any more on Fri 4 Dec', '* May it be fed: DO NOT FEED instead of FEED on Fri 4 Dec'])
    expect(ofDays(shut, onDays([4], threeOf(0.9), { state: 'do-not-feed' }))).toEqual([])
  })

  it('sees another syringe, also one that only has other marks', () => {
    const withSyringe = (capacityMl: number, stepMl: number) => [dayOn('2026-12-04', { feeds: ['07:30', '20:30'].map(time => feedAt('2026-12-04', time, 0.4, { capacityMl, stepMl })) })]
    expect(ofDays(withSyringe(0.5, 0.01), withSyringe(1, 0.01))).toEqual(['* What is given: Syringe for each feed on Fri 4 Dec from 0.5 mL with marks every 0.01 mL to 1 mL with marks every 0.01 mL'])
    expect(ofDays(withSyringe(1, 0.01), withSyringe(1, 0.05))).toEqual(['* What is given: Syringe for each feed on Fri 4 Dec from 1 mL with marks every 0.01 mL to 1 mL with marks every 0.05 mL'])
  })

  it('sees more draws of the same feed, and a mark that is not the amount', () => {
    const filled = (draws: number, markMl: number) => [dayOn('2026-12-03', { feeds: [{ ...feedAt('2026-12-03', '18:00', 60, { capacityMl: 60, stepMl: 1 }), draws, markMl }] })]
    expect(ofDays(filled(1, 60), filled(2, 30))).toEqual(['* What is given: Draw up 2 times to 30 mL instead of once for each feed on Thu 3 Dec'])
    expect(ofDays(filled(1, 60), filled(1, 59))).toEqual(['* What is given: Draw up once to 59 mL instead of once for each feed on Thu 3 Dec'])
  })

  it('joins the meals of an animal that is not fed each day', () => {
    const stronger = { ...snake(), days: snake().days.map(day => day.feeds.length > 0 ? { ...day, strengthLabel: 'full strength' } : day) }
    expect(ofPlans(snake(), stronger)).toEqual(['* What is given: Strength on Thu 3 to Thu 10 Dec from half strength to full strength'])
  })

  it('says water in two figures, and only when it changes by more than a twentieth', () => {
    const fed = (waterToGiveMl: number) => onDays([4, 5], threeOf(0.4), { waterToGiveMl })
    expect(ofDays(fed(4.4), fed(5))).toEqual(['* What is given: Water on top of feeds on Fri 4 and Sat 5 Dec from 4.4 mL to 5 mL'])
    expect(ofDays(fed(4), fed(4.2))).toEqual([])
    expect(ofDays(fed(4), fed(4.21))).toEqual(['* What is given: Water on top of feeds on Fri 4 and Sat 5 Dec from 4 mL to 4.2 mL'])
    expect(ofDays(fed(4.21), fed(4))).toEqual(['* What is given: Water on top of feeds on Fri 4 and Sat 5 Dec from 4.2 mL to 4 mL'])
    expect(ofDays(fed(4.4), fed(0))).toEqual(['* What is given: Water on top of feeds on Fri 4 and Sat 5 Dec from 4.4 mL to none'])
    expect(ofDays(fed(0), fed(0.01))).toEqual([])
    const waiting = (waterToGiveMl: number) => onDays([4], [], { state: 'wait', waterToGiveMl })
    expect(ofDays(waiting(10.9), waiting(5.45))).toEqual(['* What is given: Water to give on Fri 4 Dec from 11 mL to 5.5 mL'])
  })

  it('holds numbers, units and days together', () => {
    const input = regimenInput()
    const [line] = compareVersions({ input, plan: beardedDragon({ days: onDays([4, 5, 6], threeOf(0.35)) }) }, { input, plan: beardedDragon({ days: onDays([4, 5, 6], threeOf(0.4)) }) })
    expect(line).toEqual({ part: 'What is given', text: 'Each feed on Fri\u00A04 to Sun\u00A06\u00A0Dec from 0.35\u00A0mL to 0.4\u00A0mL', weight: 'amount' })
  })
})

describe('may it be fed', () => {
  const cold = { code: 'gate.tooCold', level: 'stop' as const, title: 'Too cool to feed', message: '31 °C is too cool.' }
  const early = { code: 'gate.fluidsFirst', level: 'note' as const, title: 'Fluids first', message: 'Fluids only.' }
  const waiting = beardedDragon({ gate: { state: 'wait', findings: [early] } })
  const closed = beardedDragon({ gate: { state: 'do-not-feed', findings: [cold] } })

  it('says the state with reasons new and gone', () => {
    expect(ofPlans(beardedDragon(), waiting)).toEqual(['* May it be fed: The plan says WAIT instead of FEED', 'May it be fed: New reason: Fluids first'])
    expect(ofPlans(waiting, beardedDragon())).toEqual(['* May it be fed: The plan says FEED instead of WAIT', 'May it be fed: Reason gone: Fluids first'])
  })

  it('gives and mixes nothing behind a shut gate, whatever the plan reckons with', () => {
    expect(ofPlans(waiting, closed)).toEqual([
      '* What is given: No meals any more on Thu 3 to Sun 13 Dec',
      '* May it be fed: The plan says DO NOT FEED instead of WAIT',
      'May it be fed: New reason: Too cool to feed',
      'May it be fed: Reason gone: Fluids first',
      '* May it be fed: DO NOT FEED instead of FEED on Thu 3 to Sun 13 Dec',
      '* Feed and mixing: Half strength pot is no longer mixed, it was 1 g of powder and 4 mL of warm boiled water',
      '* Feed and mixing: Three-quarter strength pot is no longer mixed, it was 1.2 g of powder and 3 mL of warm boiled water',
      'Steps: First meal from Thu 3 Dec to none planned',
      'Steps: Full meals from Sun 13 Dec to none planned',
    ])
    expect(ofPlans({ ...waiting, days: onDays([4], [], { state: 'wait', waterToGiveMl: 9 }) }, { ...closed, days: onDays([4], [], { state: 'wait', waterToGiveMl: 3 }) }).filter(line => line.includes('What is given'))).toEqual([])
    expect(ofPlans(closed, { ...closed, days: onDays([3, 4], threeOf(9)) })).toEqual([])
  })

  it('says which days a gate that was never shut lets in', () => {
    const day = (plan: Plan, state: 'wait' | 'feed') => ({ ...plan, days: onDays([3], threeOf(0.4), { state }) })
    expect(ofPlans(day(waiting, 'wait'), day(beardedDragon(), 'feed'))).toContain('* May it be fed: FEED instead of WAIT on Thu 3 Dec')
  })

  it('does not say again for each day what a gate that opens has said', () => {
    const lines = ofPlans(closed, beardedDragon())
    expect(lines).toContain('* May it be fed: The plan says FEED instead of DO NOT FEED')
    expect(lines).toContain('* What is given: Meals on Thu 3 to Sun 13 Dec are new: 3 feeds of 0.4 mL, half strength (Thu 3 and Fri 4 Dec); 3 feeds of 0.35 mL, three-quarter strength (Sat 5 Dec); 3 feeds of 0.45 mL, three-quarter strength (Sun 6 to Sun 13 Dec)')
    expect(lines.filter(line => line.includes('DO NOT FEED'))).toHaveLength(1)
  })
})

describe('what was entered', () => {
  type Animal = Partial<RegimenInput['animal']>
  it.each<[string, Animal, Animal, string]>([
    ['length', { lengthMm: 195 }, { lengthMm: 200.5 }, 'Length from 195 mm to 200.5 mm'],
    ['length given', {}, { lengthMm: 200 }, 'Length added: 200 mm'],
    ['earlier weight', { healthyWeightG: 300 }, { healthyWeightG: 1250 }, 'Earlier healthy weight from 300 g to 1.25 kg'],
    ['scale', { scaleStepG: 0.1 }, { scaleStepG: 1 }, 'Scale it is weighed on, step from 0.1 g to 1 g'],
    ['score', { bodyConditionScore: 2 }, { bodyConditionScore: 2.5 }, 'Body condition score from 2 to 2.5'],
    ['dryness', { drynessPercent: 8 }, { drynessPercent: 5 }, 'Dryness from 8 % to 5 %'],
    ['body temperature', { bodyTemperatureC: 29 }, { bodyTemperatureC: 31.5 }, 'Body temperature from 29 °C to 31.5 °C'],
    ['body temperature not taken', { bodyTemperatureC: 29 }, { bodyTemperatureC: undefined }, 'Body temperature taken off, it was 29 °C'],
    ['days unfed', { daysUnfed: 1 }, { daysUnfed: 30 }, 'Time without a proper meal from 1 day to 30 days'],
    ['life stage', { lifeStage: 'adult' }, { lifeStage: 'growing' }, 'Life stage from adult to growing'],
    ['a sign', { signs: [] }, { signs: ['eyes-sunken'] }, 'Sign added: Eyes sunken'],
    ['a sign gone', { signs: ['swollen', 'eyes-sunken'] }, { signs: ['eyes-sunken'] }, 'Sign taken off: Swelling under the skin or in the limbs'],
  ])('of the animal: %s', (_, before, after, text) => {
    expect(ofInputs(regimenInput({ animal: before }), regimenInput({ animal: after }))).toEqual([`Animal: ${text}`])
  })

  it.each<[string, Partial<Plan['animal']>, string]>([
    ['name', { name: 'Marble' }, 'Name from Juniper to Marble'],
    ['name taken off', { name: '' }, 'Name taken off, it was Juniper'],
    ['case number', { caseNumber: 'TF-0413' }, 'Case number from TF-0412 to TF-0413'],
    ['enclosure', { enclosure: 'Tank 5' }, 'Enclosure from Warm room, tank 4 to Tank 5'],
    ['species', { speciesName: 'Leopard gecko' }, 'Species from Inland bearded dragon to Leopard gecko'],
    ['species of the same name', { scientificName: 'Pogona barbata' }, 'Species from Inland bearded dragon (Pogona vitticeps) to Inland bearded dragon (Pogona barbata)'],
    ['weight', { weightG: 196 }, 'Weight from 182 g to 196 g (8 % more), weighed Wed 2 Dec'],
    ['weight and its date', { weightG: 173.4, weighedOn: '2026-12-05' }, 'Weight from 182 g to 173.4 g (5 % less), weighed Wed 2 Dec and Sat 5 Dec'],
    ['weight by a hair', { weightG: 182.5 }, 'Weight from 182 g to 182.5 g (0.3 % more), weighed Wed 2 Dec'],
    ['date weighed', { weighedOn: '2026-12-05' }, 'Weighed on Sat 5 Dec instead of Wed 2 Dec'],
  ])('of the animal, as the plan shows it: %s', (_, change, text) => {
    expect(ofPlans(beardedDragon(), beardedDragon({ animal: { ...beardedDragon().animal, ...change } }))).toEqual([`Animal: ${text}`])
  })

  it('of the animal: how the length was measured', () => {
    const input = regimenInput({ animal: { lengthMm: 195 } })
    const total = beardedDragon({ animal: { ...beardedDragon().animal, lengthMeasure: 'total' } })
    expect(written(compareVersions({ input, plan: beardedDragon() }, { input, plan: total }))).toEqual(['Animal: Length measured from snout to tail tip instead of from snout to vent'])
  })

  it.each<[string, Partial<RegimenInput>, Partial<RegimenInput>, string[]]>([
    ['flush', { flushMl: 0.5 }, { flushMl: 1 }, ['* Feed and mixing: Flush after each tube feed from 0.5 mL to 1 mL']],
    ['feeds a day', {}, { feedsPerDay: 4 }, ['Feed and mixing: Feeds a day set by hand: 4']],
    ['composition of an own feed', { feed: { proteinPercent: 10, fatPercent: 5, carbohydratePercent: 4 } }, { feed: { proteinPercent: 12, fatPercent: 4.5, carbohydratePercent: 5 } },
      ['Feed and mixing: Protein of the feed from 10 % to 12 %', 'Feed and mixing: Fat of the feed from 5 % to 4.5 %', 'Feed and mixing: Carbohydrate of the feed from 4 % to 5 %']],
    ['feeding hours', {}, { feedingHours: { from: '08:00', to: '20:00' } }, ['House: Feeding hours 08:00 to 20:00 instead of 07:30 to 20:30']],
    ['time zone', {}, { timeZone: 'Europe/Paris' }, ['House: Time zone from Europe/London to Europe/Paris']],
    ['syringes', { syringes: [{ capacityMl: 1, stepMl: 0.01 }, { capacityMl: 5, stepMl: 0.2 }] }, { syringes: [{ capacityMl: 1, stepMl: 0.01 }, { capacityMl: 3, stepMl: 0.1 }] },
      ['House: Syringe added: 3 mL with marks every 0.1 mL', 'House: Syringe taken off: 5 mL with marks every 0.2 mL']],
    ['one of two equal syringes', { syringes: [{ capacityMl: 1, stepMl: 0.01 }, { capacityMl: 1, stepMl: 0.01 }] }, { syringes: [{ capacityMl: 1, stepMl: 0.01 }] }, ['House: Syringe taken off: 1 mL with marks every 0.01 mL']],
    ['syringes listed for the first time', {}, { syringes: [{ capacityMl: 1, stepMl: 0.01 }] }, ['House: Syringes: 1 mL with marks every 0.01 mL instead of the usual ones']],
    ['kitchen scale', { kitchenScaleStepG: 0.1 }, { kitchenScaleStepG: 1 }, ['House: Kitchen scale, step from 0.1 g to 1 g']],
    ['contacts', { contacts: [{ role: 'Vet', name: 'Dr Amara Osei' }] }, { contacts: [{ role: 'Vet', name: 'Dr Amara Osei', phone: '00 5550 0142' }] },
      ['House: Contact added: Vet, Dr Amara Osei, 00 5550 0142', 'House: Contact taken off: Vet, Dr Amara Osei']],
    ['team name', { teamName: 'Saltings Rescue' }, { teamName: 'Marsh Rescue' }, ['House: Team name from Saltings Rescue to Marsh Rescue']],
    ['set by hand', {}, { overrides: { tier: 'low', fractions: [0.3, 1], maintenanceMlPerKgPerDay: 25, fluidHours: 12 } },
      ['House: Refeeding risk set by hand: low', 'House: Steps set by hand: 30 and 100 %', 'House: Maintenance fluid set by hand: 25 mL/kg/day', 'House: Time on fluids only set by hand: 12 hours']],
    ['set otherwise, and no longer', { overrides: { tier: 'high', fluidHours: 12 } }, { overrides: { tier: 'low' } },
      ['House: Refeeding risk set by hand from high to low', 'House: Time on fluids only no longer set by hand, it was 12 hours']],
  ])('of feed and house: %s', (_, before, after, lines) => {
    expect(ofInputs(regimenInput(before), regimenInput(after))).toEqual(lines)
  })

  it('names a chosen equation by its title', () => {
    const plain = built()
    const other = plain.plan.energy.alternatives[0]!
    const lines = written(compareVersions(plain, built({ overrides: { energyEquationId: other.equationId } })))
    expect(lines).toContain(`House: Energy equation set by hand: ${other.title}`)
    expect(lines.filter(line => line.includes(other.equationId))).toEqual([])
  })
})

describe('what was worked out', () => {
  const base = beardedDragon()
  const [half] = base.mixing
  const withPots = (...mixing: Plan['mixing']) => beardedDragon({ mixing })
  it.each<[string, Plan, Plan, string[]]>([
    ['feed', base, { ...base, feed: { ...base.feed, name: 'Carnivore mix', energyKcalPerMl: 1.25, waterFraction: 0.75 } },
      ['* Feed and mixing: Feed from Omnivore recovery mix to Carnivore mix', 'Feed and mixing: Energy of the feed from 1.2 kcal/mL to 1.25 kcal/mL', 'Feed and mixing: Water in the feed from 80 % to 75 %']],
    ['route', base, { ...base, route: 'tube' }, ['* Feed and mixing: Given by tube instead of by mouth with a syringe']],
    ['powder and water', withPots(half!), withPots({ ...half!, powderG: 1.4, waterMl: 4.2 }), ['* Feed and mixing: Half strength pot: powder from 1 g to 1.4 g', '* Feed and mixing: Half strength pot: water from 4 mL to 4.2 mL']],
    ['a liquid feed', withPots({ ...half!, powderG: null, feedMl: 2, waterMl: 0 }), withPots({ ...half!, powderG: null, feedMl: 2.5, waterMl: 1 }), ['* Feed and mixing: Half strength pot: feed from 2 mL to 2.5 mL', '* Feed and mixing: Half strength pot: water from none to 1 mL']],
    ['powder for liquid', withPots(half!), withPots({ ...half!, powderG: null, feedMl: 2, waterMl: 0 }), ['* Feed and mixing: Half strength pot: 2 mL of the feed, no water added instead of 1 g of powder and 4 mL of warm boiled water']],
    ['a new pot', withPots(half!), withPots(half!, potOf('2026-12-05', '2026-12-13', { strengthFraction: 1, strengthLabel: 'full strength', powderG: 2 })), ['* Feed and mixing: Full strength pot is new: 2 g of powder and 4 mL of warm boiled water']],
    ['how a pot is kept', withPots(half!), withPots({ ...half!, warmToC: { low: 30, high: 33 }, discardHours: { room: 1, started: 0.5, fridge: 24 } }),
      ['Feed and mixing: Half strength pot: warm to 30–33 °C instead of 35–38 °C', 'Feed and mixing: Half strength pot: bin after 1 hour at room warmth, 30 minutes once started, 24 hours in the fridge instead of 2 hours at room warmth, 1 hour once started, 24 hours in the fridge']],
    ['steps', base, { ...base, ramp: { ...base.ramp, tier: 'extreme', fractions: [0.15, 0.333, 1], stepDays: 2, warmHours: 6.5, fluidHours: 48, startsAt: '2026-12-02T09:00:00Z', fullMealsOn: '2026-12-19' } },
      ['Steps: Start of the plan from Wed 2 Dec 2026, 07:30 to Wed 2 Dec 2026, 09:00', 'Steps: Refeeding risk from high to extreme', 'Steps: Steps up to full meals from 20, 27 and 34 % to 15, 33 and 100 %', 'Steps: Each step lasts from 1 day to 2 days',
        'Steps: Time to warm it first from none to 6.5 hours', 'Steps: Time on fluids only from 24 hours to 48 hours', 'Steps: Full meals from Sun 13 Dec to Sat 19 Dec']],
    ['fluids', base, { ...base, fluids: { ...base.fluids, maintenanceMlPerDay: 4.55, deficitMl: 9.1, deficitHours: 72, capMlPerDay: 12 } },
      ['Fluids: Maintenance fluid a day from 3.6 mL to 4.6 mL', 'Fluids: Missing fluid to bring back from 15 mL to 9.1 mL', 'Fluids: Time to bring it back from 48 hours to 72 hours', 'Limits: Most fluid on a day from 11 mL to 12 mL']],
    ['limits', base, { ...base, meal: { ...base.meal, capMl: 4, firstCapMl: 2 }, energy: { ...base.energy, targetKcalPerDay: 3.125 }, validity: { ...base.validity, stopWeightG: 186, goodUntil: '2026-12-12', nextWeighInOn: '2026-12-07' } },
      ['Limits: Largest meal allowed from 3.6 mL to 4 mL', 'Limits: Largest first meal allowed from 1.8 mL to 2 mL', 'Limits: Energy of full meals from 2.84 kcal/day to 3.13 kcal/day',
        'Limits: Weight under which to stop and call from 173 g to 186 g', 'Limits: Good until Sat 12 Dec instead of Wed 9 Dec', 'Limits: Next weigh-in from Fri 4 Dec to Mon 7 Dec']],
    ['warmth to feed at', base, { ...base, animal: { ...base.animal, feedingTemperatureC: { low: 28, high: 32, what: 'ambient' } } }, ['* Limits: No food until air at 28 °C instead of body at 33 °C']],
    ['edition', base, { ...base, edition: '2027-1' }, ['Reference data: Reference data from 2026-1 to 2027-1']],
  ])('%s', (_, before, after, lines) => {
    expect(ofPlans(before, after)).toEqual(lines)
  })

  it('never tells of a difference that nobody would read', () => {
    const ghost = (plan: Plan): Plan => ({
      ...plan,
      animal: { ...plan.animal, weightG: 182.00000001 },
      feed: { ...plan.feed, energyKcalPerMl: 1.2 + 1e-12 },
      fluids: { ...plan.fluids, maintenanceMlPerDay: 3.6000001 },
      ramp: { ...plan.ramp, fractions: plan.ramp.fractions.map(one => one + 1e-9) },
      meal: { ...plan.meal, capMl: 0.1 + 3.5 },
      days: plan.days.map(day => ({ ...day, waterToGiveMl: day.waterToGiveMl + 1e-9, feeds: day.feeds.map(feed => ({ ...feed, volumeMl: feed.volumeMl + 1e-12, markMl: feed.markMl - 1e-12 })) })),
      mixing: plan.mixing.map(pot => ({ ...pot, powderG: pot.powderG! + 1e-12 })),
      validity: { ...plan.validity, stopWeightG: 172.9999999 },
    })
    expect(ofPlans(base, ghost(base))).toEqual([])
  })
})

describe('plans that were worked out', () => {
  it('says nothing of two that are the same', () => {
    expect(compareVersions(built(), built())).toEqual([])
  })

  it.each<[string, Parameters<typeof regimenInput>[0], RegExp]>([
    ['weight', { animal: { weightG: 24 } }, /^Animal: Weight from 22 g to 24 g \(9 % more\), weighed Wed 2 Dec$/],
    ['weight, what is given', { animal: { weightG: 24 } }, /^\* What is given: Each feed on Sat 5 and Sun 6 Dec from 0\.05 mL to 0\.06 mL$/],
    ['temperature', { animal: { bodyTemperatureC: 20 } }, /^\* May it be fed: The plan says DO NOT FEED instead of WAIT$/],
    ['sign', { animal: { signs: ['convulsing'] } }, /^Animal: Sign added: Fits, twitches or trembles$/],
    ['species', { animal: { speciesId: 'sp-crested-gecko' } }, /^Animal: Species from Leopard gecko to Crested gecko$/],
    ['start', { startAt: '2026-12-05T09:00:00Z' }, /^\* What is given: Wed 2 to Fri 4 Dec are no longer planned$/],
    ['feeds a day', { feedsPerDay: 2 }, /^\* What is given: Number of feeds on Sat 5 to Mon 21 Dec from 3 to 2$/],
    ['route', { route: 'tube' }, /^\* Feed and mixing: Given by tube instead of by mouth with a syringe$/],
    ['own feed', { feed: { name: 'Mash', energyKcalPerMl: 1.1 } }, /^\* Feed and mixing: Feed from .* to Mash$/],
    ['syringes', { syringes: [{ capacityMl: 3, stepMl: 0.1 }] }, /^\* What is given: Syringe for each feed on .* from 1 mL with marks every 0\.01 mL to 3 mL with marks every 0\.1 mL$/],
    ['risk', { overrides: { tier: 'low' } }, /^Steps: Refeeding risk from extreme to low$/],
    ['feeding hours', { feedingHours: { from: '09:00', to: '20:00' } }, /^House: Feeding hours 09:00 to 20:00 instead of 07:30 to 20:30$/],
  ])('names what was changed: %s', (_, change, line) => {
    const lines = written(compareVersions(built(), built(change)))
    expect(lines.filter(one => line.test(one)), lines.join('\n')).toHaveLength(1)
  })

  const anyChange = fc.record({
    animal: fc.record({
      weightG: fc.constantFrom(22, 24, 40),
      drynessPercent: fc.constantFrom(0, 5, 8),
      bodyTemperatureC: fc.constantFrom(undefined, 20, 29, 31),
      speciesId: fc.constantFrom('sp-leopard-gecko', 'sp-crested-gecko'),
      signs: fc.constantFrom<RegimenInput['animal']['signs'][]>([], ['convulsing'], ['eyes-sunken', 'swollen']),
      lengthMm: fc.constantFrom(undefined, 90),
    }),
    route: fc.constantFrom('syringe' as const, 'tube' as const),
    startAt: fc.constantFrom('2026-12-02T09:00:00Z', '2026-12-05T16:00:00Z'),
    feedsPerDay: fc.constantFrom(undefined, 1, 6),
    syringes: fc.constantFrom<RegimenInput['syringes'][]>(undefined, [{ capacityMl: 3, stepMl: 0.1 }], [{ capacityMl: 1, stepMl: 0.05 }, { capacityMl: 3, stepMl: 0.1 }]),
    contacts: fc.constantFrom<RegimenInput['contacts'][]>(undefined, [{ role: 'Vet' }], [{ role: 'Vet', name: 'Dr Osei' }, { role: 'At night', phone: '00 5550 0199' }]),
  })

  /** Days as nobody plans them: feeds of one day that differ, gaps, days that wait. */
  const anyDays = fc.array(fc.record({
    feeds: fc.uniqueArray(fc.tuple(fc.constantFrom('07:30', '12:00', '14:00', '20:30'), fc.constantFrom(0.35, 0.4, 0.5)), { maxLength: 3, selector: ([time]) => time }),
    state: fc.constantFrom('feed' as const, 'feed' as const, 'wait' as const),
    strengthLabel: fc.constantFrom('half strength', 'full strength'),
    waterToGiveMl: fc.constantFrom(0, 4, 4.1, 4.5),
    absent: fc.boolean(),
  }), { minLength: 1, maxLength: 8 }).map(days => days.flatMap(({ feeds, absent, ...day }, index) => absent ? [] : [dayWith(december(index + 1)[0]!, feeds.sort(), day)]))

  it('has as many lines there as back, in the order of the parts', () => {
    fc.assert(fc.property(anyChange, anyChange, (one, other) => {
      const [before, after] = [built(one), built(other)]
      const there = compareVersions(before, after)
      expect(compareVersions(after, before)).toHaveLength(there.length)
      const order = there.map(line => PARTS.indexOf(line.part))
      expect(order).toEqual([...order].sort((a, b) => a - b))
      expect(order).not.toContain(-1)
      expect(compareVersions(before, before)).toEqual([])
      for (const { text } of there) expect(text).not.toMatch(/undefined|null|NaN|\[object|\b(?:sp|demo)-|\w\.\w*[A-Z]|\d (?:mL|g|%|°C)|from (\S+) to \1$|from {2}|: *$/)
    }), { numRuns: 60 })
  })

  it('has as many lines there as back for any days', () => {
    const input = regimenInput()
    fc.assert(fc.property(anyDays, anyDays, (one, other) => {
      const [before, after] = [one, other].map(days => ({ input, plan: beardedDragon({ days }) })) as [ComparedVersion, ComparedVersion]
      const there = compareVersions(before, after)
      expect(compareVersions(after, before)).toHaveLength(there.length)
      expect(compareVersions(before, before)).toEqual([])
      expect(there.map(line => line.text)).toEqual([...new Set(there.map(line => line.text))])
    }), { numRuns: 200 })
  })
})
