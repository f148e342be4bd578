import { cited, type Cited } from '../../record'
import type { Rules } from '../../rules'

/** A choice of ours. Shown as "house rule" wherever the number is. */
const house = (value: number, unit: string, locator: string, note?: string): Cited =>
  cited({ value, unit, sourceKey: 'house-rule', locator, howRead: 'house-rule', note })

const ADULT = 'factor at maintenance'
const one = (why: string) => house(1, 'times resting', why)

export const rules: Rules = {
  energy: {
    defaultEquationId: {
      'lizard': 'andrews-pough-1985',
      'snake': 'andrews-pough-1985',
      'chelonian': 'hughes-1971-tortoise',
      'crocodilian': 'seymour-2013-crocodile',
      'amphibian-anuran': 'gillooly-2001-amphibian',
      'amphibian-caudate': 'gillooly-2001-amphibian',
      'bird-passerine': 'k129-passerine',
      'bird-other': 'k78-nonpasserine',
      'mammal-placental': 'kleiber-1961-placental',
      'mammal-marsupial': 'dawson-hulbert-1970',
    },
    fieldEquationId: {
      'lizard': 'nagy-1999-reptile',
      'snake': 'nagy-1999-reptile',
      'chelonian': 'nagy-1999-reptile',
      'crocodilian': 'nagy-1999-reptile',
      'amphibian-anuran': null,
      'amphibian-caudate': null,
      'bird-passerine': 'nagy-1999-bird',
      'bird-other': 'nagy-1999-bird',
      'mammal-placental': 'nagy-1999-mammal',
      'mammal-marsupial': 'nagy-1999-mammal',
    },
    groupFactor: {
      'amphibian-caudate': house(0.5, 'times the frog rate', 'salamanders run lower; fits lungless ones best', 'A primary abstract puts lunged salamanders higher above 10 deg C.'),
    },
    factor: {
      reptile: { adult: house(1.5, 'times resting', ADULT, 'By analogy with 2 to 2.5 times resting for free-living lizards; no trial.'), growing: house(2, 'times resting', 'growth may double the need; weak source, no trial'), breeding: house(2, 'times resting', 'reproduction may double the need; weak source, no trial') },
      amphibian: { adult: house(1.5, 'times resting', ADULT, 'By analogy with reptiles.'), growing: house(2, 'times resting', 'by analogy with reptiles'), breeding: house(2, 'times resting', 'by analogy with reptiles') },
      bird: {
        adult: one('no more than resting until the bird is past the ramp; the starvation factor of the old table says the same'),
        growing: house(2.25, 'times resting', '1.5 (caged) times 1.5 (low end of growth 1.5 to 3)'),
        breeding: house(1.5, 'times resting', 'caged adult factor'),
      },
      mammal: { adult: one('illness factors have fallen out of favour; resting is the goal for most'), growing: house(2, 'times resting', 'puppy after four months, teaching notes'), breeding: house(1.6, 'times resting', 'adult dog, teaching notes') },
    },
    temperatureLowC: house(15, 'deg C', 'equations are not used below this'),
    temperatureHighC: house(40, 'deg C', 'equations are not used above this'),
  },
  condition: {
    lossPerNinthStep: cited({ value: 0.075, unit: 'of body weight per step of nine', sourceKey: 'wsava2018', locator: 'p. 290, cat 3.4 kg at 3/9 against 4.0 kg at 5/9', howRead: 'computed' }),
    lossPerNinthStepUpper: cited({ value: 0.1, unit: 'of body weight per step of nine', sourceKey: 'laflamme1997', locator: 'about 10 % per step, derived from ideal and fat animals', howRead: 'restated' }),
    ownWeightBand: house(0.1, 'fraction', 'an animal\'s own healthy weight moves by about a tenth'),
    cladeLengthBand: house(0.3, 'fraction', 'spread of species around their clade\'s line'),
    groupLengthFactor: house(2, 'times either way', 'pooled equations are a last resort'),
    lengthOverMaximum: house(1.1, 'times the longest published', 'longer than any measured: tail measured too?'),
    groupLengthEquationId: {
      'lizard': { equationId: 'lm-lizard', measure: 'snout-vent' },
      'snake': { equationId: 'lm-snake', measure: 'snout-vent' },
      'chelonian': { equationId: 'lm-turtle', measure: 'carapace' },
      'amphibian-anuran': { equationId: 'lm-frog', measure: 'snout-vent' },
      'amphibian-caudate': { equationId: 'lm-salamander', measure: 'snout-vent' },
    },
    shellIndex: {
      speciesIds: ['sp-t-hermanni', 'sp-t-graeca'],
      warnUnder: cited({ value: 0.18, unit: 'g/cm3', sourceKey: 'jackson1980', locator: 'acceptable 0.18 to 0.22', howRead: 'restated' }),
      highRiskUnder: cited({ value: 0.16, unit: 'g/cm3', sourceKey: 'jackson1980', locator: 'underweight under 0.16 to 0.17', howRead: 'restated' }),
    },
    emaciatedFromPercent: house(20, '% under expected', 'skin and eyes mislead from here on'),
    plausibleLow: house(0.2, 'times the low end of the adult range', 'a lighter adult is taken for a slip'),
    plausibleHigh: house(5, 'times the high end of the adult range', 'a heavier animal is taken for a slip'),
  },
  risk: {
    shortfallPercent: { moderate: house(10, '%', 'tiers proposed for this product'), high: house(20, '%', 'tiers proposed for this product'), extreme: house(30, '%', 'tiers proposed for this product') },
    daysUnfed: { moderate: house(3, 'days', 'tiers proposed for this product'), high: house(5, 'days', 'tiers proposed for this product; people 5 days (NICE CG32, minor)'), extreme: house(10, 'days', 'tiers proposed for this product; people 10 days (NICE CG32, major)') },
    drynessPercent: { moderate: house(5, '%', 'dry enough to see'), high: house(10, '%', 'severe'), extreme: house(13, '%', 'beyond severe') },
    score: { high: house(2, 'of 5', 'under 3.5 of 9 is at risk'), extreme: house(1, 'of 5', '1 of 9') },
    daysStretch: { reptile: house(5, 'times', 'cautious end of 5 to 10'), amphibian: house(5, 'times', 'cautious end of 5 to 10'), bird: house(1, 'times', 'endotherm'), mammal: house(1, 'times', 'endotherm') },
    snakeDaysStretch: house(10, 'times', 'upper end of 5 to 10: snakes fast longest'),
  },
  fluids: {
    deficitHours: {
      reptile: cited({ value: 72, unit: 'h', sourceKey: 'memory', locator: 'texts give 48 to 96 h', howRead: 'memory' }),
      amphibian: house(72, 'h', 'as for reptiles; water goes in through the skin'),
      bird: cited({ value: 48, unit: 'h', sourceKey: 'carpenter2018', locator: 'Table 5-36: half in 12 to 24 h, the rest over 24 to 48 h', howRead: 'restated' }),
      mammal: cited({ value: 24, unit: 'h', sourceKey: 'aaha2013', locator: 'restore over about 24 h', howRead: 'restated' }),
    },
    longestHours: house(168, 'h', 'a deficit is not stretched over more than a week'),
    capMlPerKgPerDay: {
      reptile: cited({ value: 40, unit: 'mL/kg/day', sourceKey: 'memory', locator: 'texts give 25 to 40', howRead: 'memory' }),
      amphibian: house(40, 'mL/kg/day', 'as for reptiles, counts only water in feed'),
      bird: house(100, 'mL/kg/day', 'top of what parrots are given (50 to 100)'),
      birdUnder100G: cited({ value: 200, unit: 'mL/kg/day', sourceKey: 'mcdonald2006', locator: 'Table 4.1.1, measured drinking 114 to 222', howRead: 'restated' }),
      mammalOverMaintenance: house(80, 'mL/kg/day over maintenance', 'an 8 % deficit put back in one day'),
    },
    birdSmallUnderG: house(100, 'g', 'small birds drink far more; threshold is our judgement from measured drinking'),
    birdMaintenance: {
      small: cited({ value: 100, unit: 'mL/kg/day', sourceKey: 'mcdonald2006', locator: 'Table 4.1.1, under about 100 g', howRead: 'restated' }),
      large: cited({ value: 50, unit: 'mL/kg/day', sourceKey: 'carpenter2018', locator: 'Table 5-36, 40 to 60', howRead: 'restated' }),
    },
    drynessCapWhenEmaciatedPercent: house(8, '%', 'thinness itself tents the skin and sinks the eyes'),
    wildlifeAssumedDrynessPercent: cited({ value: 10, unit: '%', sourceKey: 'carpenter2018', locator: 'wildlife chapter: assume most wildlife 10 % dry on admission', howRead: 'restated' }),
    metabolicMlPerKcal: cited({ value: 0.11, unit: 'mL/kcal', sourceKey: 'hainsworth1981', locator: 'protein 0.093, fat 0.114, carbohydrate 0.133', howRead: 'computed' }),
    overMaintenance: house(2, 'times maintenance', 'no doubling of maintenance'),
  },
  ramp: {
    fractions: {
      low: [0.5, 0.75, 1].map(value => house(value, 'of full meals', 'ramp proposed for this product, low')),
      moderate: [0.33, 0.5, 0.67, 1].map(value => house(value, 'of full meals', 'ramp proposed for this product, moderate')),
      high: [0.25, 0.33, 0.5, 0.67, 0.85, 1].map(value => house(value, 'of full meals', 'ramp proposed for this product, high')),
      extreme: [0.15, 0.2, 0.25, 0.33, 0.45, 0.6, 0.8, 1].map(value => house(value, 'of full meals', 'ramp proposed for this product, extreme')),
    },
    reptileHold: {
      fraction: cited({ value: 0.75, unit: 'of full meals', sourceKey: 'vetstream', locator: 'assisted feeding: 40 to 75 % at first', howRead: 'restated', note: 'Read the cautious way: a plateau, not a climb.' }),
      days: cited({ value: 4, unit: 'days', sourceKey: 'vetstream', locator: 'over the first 2 to 4 days', howRead: 'restated' }),
    },
    fluidHours: {
      endotherm: { low: house(2, 'h', 'low end of 2 to 6'), moderate: house(6, 'h', 'low end of 6 to 24'), high: house(12, 'h', 'low end of 12 to 48'), extreme: house(24, 'h', 'low end of 24 to 72') },
      ectotherm: { low: house(6, 'h', 'top of 2 to 6'), moderate: house(12, 'h', 'middle of 6 to 24'), high: house(24, 'h', 'low end of 24 to 72'), extreme: house(48, 'h', 'middle of 24 to 72') },
    },
    smallEndotherm: { underG: house(100, 'g', 'a small bird or mammal starves within a day'), fluidHoursAtMost: house(6, 'h', 'no longer without energy when this small') },
    holdBeforeFeedHours: cited({ value: 0.5, unit: 'h', sourceKey: 'vin2007', locator: 'at least 30 minutes at preferred temperature before any treatment', howRead: 'restated' }),
    warmingCPerHour: house(1, 'deg C per hour', 'slow warming; the thermometer decides, not the clock'),
    warmingHoursAtMost: house(24, 'h', 'still cold after a day: call a vet'),
    fullDays: house(3, 'days', 'days of full meals shown at the end'),
    daysAtLeast: house(7, 'days', 'a plan shows a week at least'),
  },
  meals: {
    strengths: [0.25, 0.5, 0.75, 1].map(value => cited({ value, unit: 'of full strength', sourceKey: 'squirrel2011', locator: 'quarter, half, three-quarter, full, 2 to 4 feeds each', howRead: 'restated' })),
    startStrength: house(0.5, 'of full strength', 'first mix thin and watery'),
    startDensityKcalPerMl: cited({ value: 0.6, unit: 'kcal/mL', sourceKey: 'memory', locator: 'first feeds about 0.5 kcal/mL and 300 mOsm/kg', howRead: 'memory' }),
    thickenFromFraction: house(0.5, 'of full meals', 'density is raised only after half is tolerated'),
    usualFeeds: {
      lizard: { count: cited({ value: 3, unit: 'feeds a day', sourceKey: 'common-practice', locator: 'small amounts morning, evening and night at first', howRead: 'practice' }) },
      snake: { count: house(1, 'meal an interval', 'one meal') },
      chelonian: { count: house(2, 'feeds a day', 'the day\'s amount divided') },
      crocodilian: { count: house(1, 'meal an interval', 'one meal') },
      amphibian: { count: house(1, 'meal an interval', 'one meal every 24 to 72 h') },
      passerine: { everyHours: house(1, 'h', 'small songbirds need 30 to 60 minutes') },
      birdWithCrop: { everyHours: cited({ value: 3.5, unit: 'h', sourceKey: 'hrb2020', locator: 'scan page 361, emaciated eaglets every 3 to 4 h by day', howRead: 'restated' }) },
      birdWithoutCrop: { everyHours: house(3, 'h', '4 to 6 times a day') },
      smallMammal: { everyHours: house(2, 'h', 'under 100 g') },
      mammal: { everyHours: cited({ value: 4, unit: 'h', sourceKey: 'cbicu', locator: 'tube feeding every 4 to 6 h', howRead: 'restated' }) },
    },
    smallMammalUnderG: house(100, 'g', 'small mammals starve first'),
    onceAnInterval: ['snake', 'crocodilian', 'amphibian-anuran', 'amphibian-caudate'],
    chelonianDayMlPerKg: {
      first: cited({ value: 5, unit: 'mL/kg/day', sourceKey: 'boxturtle', locator: '0.5 % of body weight a day, divided, for 3 days', howRead: 'restated', note: 'One handout.' }),
      later: cited({ value: 20, unit: 'mL/kg/day', sourceKey: 'boxturtle', locator: 'then 2 % a day', howRead: 'restated', note: 'One handout.' }),
      firstDays: cited({ value: 3, unit: 'days', sourceKey: 'boxturtle', locator: 'for 3 days', howRead: 'restated', note: 'One handout.' }),
    },
    growing: {
      minimumGapHours: cited({ value: 2, unit: 'h', sourceKey: 'hrb2020', locator: 'Tables 27.1 and 27.2: small squabs every 2 h', howRead: 'restated', note: 'Carried to all young birds and mammals.' }),
      mammalMlPerKg: cited({ value: 50, unit: 'mL/kg', sourceKey: 'afrma2009', locator: '5 % of body weight a feed', howRead: 'restated' }),
      kittenMlPerKg: cited({ value: 40, unit: 'mL/kg', sourceKey: 'lawler2008', locator: '4 mL per 100 g', howRead: 'restated' }),
      birdWithCropMlPerKg: cited({ value: 50, unit: 'mL/kg', sourceKey: 'edubirds', locator: 'crop about 50 mL/kg', howRead: 'restated' }),
      squabMlPerKg: cited({ value: 100, unit: 'mL/kg', sourceKey: 'hrb2020', locator: 'Tables 27.1 and 27.2', howRead: 'restated' }),
      squabMl: cited({ value: 20, unit: 'mL', sourceKey: 'hrb2020', locator: 'Table 27.2', howRead: 'restated' }),
      squabSpeciesIds: ['sp-feral-pigeon', 'sp-wood-pigeon', 'sp-collared-dove', 'sp-mourning-dove'],
    },
  },
  measuring: {
    syringes: [{ capacityMl: 1, stepMl: 0.01 }, { capacityMl: 3, stepMl: 0.1 }, { capacityMl: 5, stepMl: 0.2 }, { capacityMl: 10, stepMl: 0.2 }, { capacityMl: 20, stepMl: 1 }, { capacityMl: 60, stepMl: 1 }],
    smallestMarks: house(2, 'marks', 'feeds may go below the limit that medicines have'),
    smallestMl: house(0.05, 'mL', 'feeds may go below the limit that medicines have'),
    preferredOfCapacity: cited({ value: 0.2, unit: 'of capacity', sourceKey: 'memory', locator: 'USP 1176, graduates not below 20 % of capacity', howRead: 'memory' }),
    roundingNotice: house(0.05, 'fraction', 'up to this, silent'),
    roundingCaution: house(0.1, 'fraction', 'over this, take care'),
    isoClasses: [
      { underCapacityMl: 2, ofCapacity: iso(0.015, 'restated'), ofVolume: iso(0.02, 'restated'), ofVolumeFromHalf: iso(0.05, 'restated') },
      { underCapacityMl: 5, ofCapacity: iso(0.015, 'memory'), ofVolume: iso(0.02, 'memory'), ofVolumeFromHalf: iso(0.05, 'memory') },
      { underCapacityMl: Number.POSITIVE_INFINITY, ofCapacity: iso(0.015, 'memory'), ofVolume: iso(0.01, 'memory'), ofVolumeFromHalf: iso(0.04, 'memory') },
    ],
    scaleStepG: { under100G: house(0.1, 'g', 'scale for animals under 100 g'), under1000G: house(1, 'g', 'scale for animals under 1 kg'), above: house(10, 'g', 'scale for animals from 1 kg') },
  },
  mixing: {
    overage: house(0.1, 'of the amount', 'left in the syringe and the pot'),
    fewestScaleSteps: house(5, 'scale steps', 'less powder than this drowns in the scale\'s own step'),
    kitchenScaleStepG: { under100G: house(0.1, 'g', 'scale assumed when none is given'), above: house(1, 'g', 'scale assumed when none is given') },
    waterStepMl: { under10Ml: house(0.1, 'mL', 'measured with a syringe'), above: house(1, 'mL', 'measured with a large syringe') },
    discardHours: {
      room: cited({ value: 2, unit: 'h', sourceKey: 'memory', locator: 'blended feeds at room warmth', howRead: 'memory' }),
      started: cited({ value: 1, unit: 'h', sourceKey: 'hrb2020', locator: 'scan page 453, chick tube formula', howRead: 'restated' }),
      fridge: cited({ value: 24, unit: 'h', sourceKey: 'hrb2020', locator: 'scan page 222, chilled formula', howRead: 'restated' }),
    },
    warmToC: {
      bird: [warmed(38), warmed(39)],
      mammal: [house(35, 'deg C', 'hand-warm'), house(38, 'deg C', 'body warmth')],
    },
    densityNotice: house(0.05, 'fraction', 'the rounded pot differs from the plan by more than this'),
  },
  validity: {
    weightDays: { usual: house(7, 'days', 'small exotics'), adultCatDog: house(30, 'days', 'stable adult dog or cat') },
    weighEveryDays: { endotherm: cited({ value: 1, unit: 'day', sourceKey: 'hrb2020', locator: 'scan page 343: daily, same time, before feeding', howRead: 'restated' }), ectothermHighRisk: house(2, 'days', 'every 1 to 3 days early on'), ectotherm: house(7, 'days', 'weekly') },
    stopLossFraction: house(0.05, 'of body weight', 'stop and call under this'),
    ownFeedBand: house(0.1, 'fraction', 'a label\'s energy figure, either way'),
  },
}

function iso(value: number, howRead: 'restated' | 'memory'): Cited {
  return cited({ value, unit: 'fraction', sourceKey: 'iso7886', locator: 'clause 8, tolerance on graduated capacity', howRead })
}

function warmed(value: number): Cited {
  return cited({ value, unit: 'deg C', sourceKey: 'carpenter2018', locator: 'bird fluids 38 to 39 deg C', howRead: 'restated' })
}
