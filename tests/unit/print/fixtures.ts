/** Plans written by hand, one for each thing that paper has to get right. No formula is run here. */
import type { PrintOptions } from '../../../server/utils/print/options'
import type { Plan, PlanDay, PlanFeed, PlanMixing, Syringe } from '#shared/types/plan'
import type { Standing } from '#shared/types/planLife'

const ONE_ML: Syringe = { capacityMl: 1, stepMl: 0.01 }

export const OPTIONS: PrintOptions = {
  paper: 'a4',
  reference: { id: 'TF-0412', version: 2, latestVersion: 2, createdAt: '2026-12-02T18:40:00Z', url: 'https://sheets.example.org/plans/TF-0412?key=3f9c0b7e5d2a4c61' },
  contacts: [
    { role: 'Vet', name: 'Dr Amara Osei', phone: '00 5550 0142' },
    { role: 'Out of hours', phone: '00 5550 0199' },
  ],
  teamName: 'Saltings Rescue',
  appVersion: '0.1.0',
  madeAt: '2026-12-02T18:40:00Z',
}

export const APPROVED: Standing = {
  state: 'approved',
  band: 'Approved by Dr Amara Osei',
  line: 'Approved by Dr Amara Osei (DEMO-0142), Wed 2 Dec 2026, 18:45: version 2, 182 g, until Wed 9 Dec.',
}
export const LAPSED: Standing = {
  state: 'lapsed',
  band: 'APPROVAL LAPSED',
  line: 'Its weight was good until Wed 9 Dec. It was approved by Dr Amara Osei (DEMO-0142) on Wed 2 Dec 2026, 18:45.',
}
export const NONE: Standing = { state: 'none', band: 'NOT APPROVED BY A VET', line: 'No vet has approved this version.' }

/** Name and registration as long as the form lets in. */
const LONGEST_VET = 'Dr Amara Oluwaseun Željezna-Kornjača Osei-Đorđević-Čakovečka of the Old Saltings'
export const LONGEST_APPROVED: Standing = {
  state: 'approved',
  band: `Approved by ${LONGEST_VET}`,
  line: `Approved by ${LONGEST_VET} (REGISTER OF SALTINGS VETS, SECTION 4, ENTRY 000142, RENEWED 2026, BRANCH NORTH), Wed 2 Dec 2026, 18:45: version 12, 182 g, until Wed 9 Dec.`,
}
/** Four people, as long as the form lets them be. */
export const LONGEST_CONTACTS = [
  { role: 'Vet, by day, on Tuesdays and Thursdays only, else the next', name: 'Dr Amara Oluwaseun Željezna-Kornjača Osei-Đorđević-Čakovečka', phone: '00 5550 0142 extension 12345678 reception' },
  { role: 'Foster lead', name: 'Mara Linde', phone: '00 5550 0177' },
  { role: 'Out of hours', phone: '0055500199005550019900555001990055500199' },
  { role: 'Night', name: 'Juno Vale' },
]
export const STOPPED = 'This plan was stopped on Thu 3 Dec. Do not use this sheet.'

export function feedAt(date: string, localTime: string, volumeMl: number, syringe: Syringe = ONE_ML, draws = 1): PlanFeed {
  return { at: `${date}T${localTime}:00.000Z`, localTime, volumeMl, markMl: volumeMl / draws, draws, syringe, energyKcal: volumeMl * 0.6, toleranceMl: 0.02, toleranceFraction: 0.05, roundingFraction: 0.01 }
}

export function dayOn(date: string, changes: Partial<PlanDay> = {}): PlanDay {
  return {
    date, stage: 'ramp', state: 'feed', stateReason: 'Only at 33 °C or more', step: 1, feedingDay: 1, fraction: 0.2, energyTargetKcal: 0.7, energyGivenKcal: 0.7,
    strengthFraction: 0.5, strengthLabel: 'half strength', feeds: [], waterNeedMl: 10.9, waterInFeedMl: 1, metabolicWaterMl: 0.1, waterToGiveMl: 9.8, ...changes,
  }
}

function feedingDay(date: string, feedingDay: number, times: string[], volumeMl: number, changes: Partial<PlanDay> = {}, syringe: Syringe = ONE_ML, draws = 1): PlanDay {
  return dayOn(date, { feedingDay, step: feedingDay, feeds: times.map(time => feedAt(date, time, volumeMl, syringe, draws)), ...changes })
}

export function potOf(fromDate: string, toDate: string, changes: Partial<PlanMixing> = {}): PlanMixing {
  return {
    strengthFraction: 0.5, strengthLabel: 'half strength', fromDate, toDate, feedName: 'Omnivore recovery mix', neededMl: 1.4, overageFraction: 0.2, powderG: 1, feedMl: null, waterMl: 4,
    madeUpMl: 4.7, kitchenScaleStepG: 0.1, energyKcalPerMl: 0.61, plannedKcalPerMl: 0.6, differenceFraction: 0.02, ratioInWords: '1 part powder to 4 parts water by weight, so 5 parts in all',
    discardHours: { room: 2, started: 1, fridge: 24 }, warmToC: { low: 35, high: 38 }, ...changes,
  }
}

const HOW_TO_GIVE = [
  'Wash your hands. Check the name and the enclosure.',
  'Hold it upright and level, with its head free.',
  'One drop on the lips, then wait for a lick.',
  'Go in at the side, slowly, and wait for each swallow.',
  'Keep it level and quiet for 20 minutes afterwards.',
  'Wash your hands again: reptiles carry Salmonella.',
]
const STOP_SIGNS = [
  'Fluid or feed comes from the nose',
  'Breathes with its mouth open, bubbles or clicks',
  'Brought up twice in a day',
  'Limp, twitching or trembling',
  'Swelling under the skin or in the limbs',
  'Belly hard or growing',
]

/** An inland bearded dragon: two days at one amount, then a smaller one of a stronger mix. */
export function beardedDragon(changes: Partial<Plan> = {}): Plan {
  const times = ['07:30', '14:00', '20:30']
  return {
    edition: '2026-1',
    timeZone: 'Europe/London',
    animal: {
      name: 'Juniper', caseNumber: 'TF-0412', enclosure: 'Warm room, tank 4', speciesId: 'inland-bearded-dragon', speciesName: 'Inland bearded dragon', scientificName: 'Pogona vitticeps',
      group: 'lizard', diet: 'omnivore', weightG: 182, weighedOn: '2026-12-02', lengthMm: 195, lengthMeasure: 'snout-vent',
      feedingTemperatureC: { low: 33, high: 37, what: 'body' }, warmPlaceC: { low: 38, high: 42, what: 'warm end' }, origins: {},
    },
    feed: { feedId: 'demo-omnivore', name: 'Omnivore recovery mix', energyKcalPerMl: 1.2, waterFraction: 0.8, demo: false, sourceKey: 'label2026' },
    route: 'syringe',
    routeLabel: 'By mouth with a syringe, by a carer who has been shown how',
    gate: { state: 'feed', findings: [] },
    energy: { restingKcalPerDay: 2.84, factor: 1, targetKcalPerDay: 2.84, targetKjPerDay: 11.9, equationId: 'andrews', temperatureC: 35, fieldCapKcalPerDay: null, cappedByFieldRate: false, alternatives: [], steps: [], sourceKey: 'andrews1985' },
    condition: { expectedWeightG: 350, method: 'species-adult-weight', why: '', estimates: [{ method: 'species-adult-weight', label: '', expectedG: 350, lowG: 250, highG: 500, sourceKey: 'meiri2024' }], shortfallPercent: 48, shortfallLowPercent: 27, shortfallHighPercent: 64, scaledMassIndexG: null, relativeCondition: null, shellIndexGPerCm3: null, steps: [] },
    fluids: { maintenanceMlPerDay: 3.6, maintenanceMlPerKgPerDay: 20, drynessUsedPercent: 8, deficitMl: 14.6, deficitAsEnteredMl: 14.6, deficitHours: 48, capMlPerDay: 11, metabolicWaterMlPerKcal: 0.13, usualRoute: 'A shallow lukewarm soak and drops at the lips; under the skin or by tube only by a vet or under one.', steps: [], sourceKey: 'house-rule' },
    ramp: { tier: 'high', reasons: [], fractions: [0.2, 0.27, 0.34], steps: [], stepDays: 1, warmHours: 0, fluidHours: 24, startsAt: '2026-12-02T07:30:00Z', fluidsFrom: '2026-12-02T07:30:00Z', firstFeedAt: '2026-12-03T07:30:00Z', fullMealsOn: '2026-12-13', daysToFull: 12, sourceKey: 'nice2006' },
    meal: { capMl: 3.6, firstCapMl: 1.8, firstCapMeals: 3, firstMealMl: 0.4, largestMealMl: 1.25, smallestMeasurableMl: 0.02, binds: [], steps: [], firstMealSteps: [] },
    days: [
      feedingDay('2026-12-03', 1, times, 0.4),
      feedingDay('2026-12-04', 2, times, 0.4, { waterToGiveMl: 4.4 }),
      feedingDay('2026-12-05', 3, times, 0.35, { waterToGiveMl: 4.5, strengthFraction: 0.75, strengthLabel: 'three-quarter strength' }),
      ...[4, 5, 6, 7, 8, 9, 10, 11].map(day => feedingDay(`2026-12-${String(day + 2).padStart(2, '0')}`, day, times, 0.45, { strengthFraction: 0.75, strengthLabel: 'three-quarter strength', waterToGiveMl: 4.2 })),
    ],
    mixing: [
      potOf('2026-12-03', '2026-12-04'),
      potOf('2026-12-05', '2026-12-13', { strengthFraction: 0.75, strengthLabel: 'three-quarter strength', powderG: 1.2, waterMl: 3, madeUpMl: 3.9, energyKcalPerMl: 0.91, plannedKcalPerMl: 0.9, ratioInWords: '2 parts powder to 5 parts water by weight, so 7 parts in all' }),
    ],
    uncertainty: { relativeExpanded: 0.061, coverageFactor: 2, parts: [] },
    validity: { goodUntil: '2026-12-09', nextWeighInOn: '2026-12-04', rule: 'Weigh every second day.', stopWeightG: 173 },
    howToGive: HOW_TO_GIVE,
    stopSigns: STOP_SIGNS,
    findings: [],
    ...changes,
  }
}

/** The same animal from its first day: warm, then fluids, then the first meal. */
export function fromFirstDay(changes: Partial<Plan> = {}): Plan {
  const base = beardedDragon()
  return {
    ...base,
    gate: {
      state: 'wait',
      findings: [
        { code: 'gate.temperatureUnknown', level: 'caution', title: 'Body temperature not measured', message: 'Measure it before the first feed. No food until it is at 33 °C or more.' },
        { code: 'gate.fluidsFirst', level: 'note', title: 'Fluids first', message: 'Fluids only for 24 hours; then look again.' },
      ],
    },
    days: [
      dayOn('2026-12-02', { stage: 'warm', state: 'wait', stateReason: 'Warm to 33 °C or more first, then fluids only', step: 0, feedingDay: 0, fraction: 0, strengthFraction: 0, strengthLabel: '', waterToGiveMl: 5.45 }),
      dayOn('2026-12-03', { stage: 'fluids', state: 'wait', stateReason: 'Fluids only, no food yet', step: 0, feedingDay: 0, fraction: 0, strengthFraction: 0, strengthLabel: '', waterToGiveMl: 10.9 }),
      ...base.days.slice(1),
    ],
    ...changes,
  }
}

/** A gecko of 10 g: three feeds of 0.05 mL. */
export function gecko(changes: Partial<Plan> = {}): Plan {
  const base = beardedDragon()
  return {
    ...base,
    animal: { ...base.animal, name: 'Pebble', caseNumber: 'TF-0419', enclosure: 'Rack 2, tub 11', speciesName: 'Leopard gecko', scientificName: 'Eublepharis macularius', weightG: 10, feedingTemperatureC: { low: 28, high: 32, what: 'body' } },
    feed: { ...base.feed, name: 'Insectivore demo slurry', demo: true, sourceKey: 'demo' },
    days: ['2026-12-03', '2026-12-04', '2026-12-05'].map((date, index) => feedingDay(date, index + 1, ['07:30', '12:00', '20:30'], 0.05, { stateReason: 'Only at 28 °C or more', waterToGiveMl: 0.487 }, { capacityMl: 0.5, stepMl: 0.01 })),
    mixing: [potOf('2026-12-03', '2026-12-05', { feedName: 'Insectivore demo slurry' })],
    validity: { ...base.validity, stopWeightG: 9.5 },
    ...changes,
  }
}

/** A sparrow with fourteen feeds a day. */
export function sparrow(changes: Partial<Plan> = {}): Plan {
  const base = beardedDragon()
  const times = Array.from({ length: 14 }, (_, index) => `${String(7 + index).padStart(2, '0')}:00`)
  return {
    ...base,
    animal: { ...base.animal, name: 'Number 61', caseNumber: 'TF-0430', enclosure: 'Incubator 1', speciesName: 'House sparrow', scientificName: 'Passer domesticus', group: 'bird-passerine', weightG: 19, feedingTemperatureC: { low: 38, high: 42, what: 'body' }, warmPlaceC: { low: 30, high: 32, what: 'air' } },
    days: ['2026-12-03', '2026-12-04', '2026-12-05'].map((date, index) => feedingDay(date, index + 1, times, [0.3, 0.35, 0.4][index]!, { stateReason: 'Only at 38 °C or more', waterToGiveMl: 1.2 })),
    mixing: [potOf('2026-12-03', '2026-12-05')],
    validity: { ...base.validity, stopWeightG: 18 },
    ...changes,
  }
}

/** A snake with one meal a week by tube, split in two draws. */
export function snake(changes: Partial<Plan> = {}): Plan {
  const base = beardedDragon()
  const quiet = (date: string, feedingDay: number) => dayOn(date, { state: 'wait', stateReason: 'No meal today', feedingDay, strengthFraction: 0, strengthLabel: '', waterToGiveMl: 14.2 })
  return {
    ...base,
    animal: { ...base.animal, name: 'Oak', caseNumber: 'TF-0422', enclosure: 'Snake room, vivarium 3', speciesName: 'Royal python', scientificName: 'Python regius', group: 'snake', weightG: 1420, feedingTemperatureC: { low: 28, high: 32, what: 'body' } },
    route: 'tube',
    routeLabel: 'By tube, only by someone a vet has trained',
    days: [
      feedingDay('2026-12-03', 1, ['18:00'], 70, { stateReason: 'Only at 28 °C or more', waterToGiveMl: 14.2 }, { capacityMl: 60, stepMl: 1 }, 2),
      ...[2, 3, 4, 5, 6, 7].map(day => quiet(`2026-12-0${day + 2}`, day)),
      feedingDay('2026-12-10', 8, ['18:00'], 80, { stateReason: 'Only at 28 °C or more' }, { capacityMl: 60, stepMl: 1 }, 2),
    ],
    mixing: [potOf('2026-12-03', '2026-12-10', { powderG: 20, waterMl: 68, madeUpMl: 84 })],
    validity: { ...base.validity, stopWeightG: 1350 },
    ...changes,
  }
}

/** A shut gate: too cold, and it cannot swallow. */
export function shut(changes: Partial<Plan> = {}): Plan {
  const base = beardedDragon()
  return {
    ...base,
    gate: {
      state: 'do-not-feed',
      findings: [
        { code: 'gate.cannotSwallow', level: 'stop', title: 'Cannot swallow', message: 'Nothing by mouth. Call a vet now.' },
        { code: 'gate.tooCold', level: 'stop', title: 'Too cool to feed', message: '31 °C is under the 33–37 °C this species digests at. Warm it first, then measure again.' },
      ],
    },
    ...changes,
  }
}

/** The longest names that the form lets in, in letters of three scripts. */
export function longestNames(): Plan {
  const base = beardedDragon()
  return {
    ...base,
    animal: {
      ...base.animal,
      name: 'Željezna-Kornjača-Žutouha Đorđević-Čakovečka the Second Sr 1',
      caseNumber: 'SALTINGS-RESCUE-2026-WINTER-000412-REV-B',
      enclosure: 'Quarantine building, upper floor, rack 14, shelf 3, tub 27 B',
      speciesName: 'Not in the list: lizard of a species that nobody could name',
    },
  }
}

/** Letters of many scripts, and some that no Latin font has. */
export const NAMES = ['Žofie Řeřicha', 'Nguyễn Thị Ngọc Ánh', 'Черепаха Жужа', 'Χελώνα Ψιψίνα', 'Ñandú Åsa Ło', 'Gecko 🦎 No. 4', '亀太郎', 'حرباء']
