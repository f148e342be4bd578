/** The API contract of plans: what a person may send. One schema for screen and server. */
import { z } from 'zod'
import { LENGTH_MEASURES } from '../types/reference'
import { LIFE_STAGES, PAPERS, SIGN_IDS } from '../types/regimenLists'
import { ROUTES, TIERS } from '../types/plan'
import { CalendarDate, ClockTime, Instant, number, text, TimeZone } from './fields'

export { LIFE_STAGES, PAPERS, SIGN_IDS, SIGNS } from '../types/regimenLists'
export type { LifeStage, Paper, Sign } from '../types/regimenLists'

export const SyringeInput = z.object({
  capacityMl: number('the capacity of a syringe', 'mL', 0.1, 100),
  stepMl: number('the step between two marks', 'mL', 0.005, 10),
}).refine(syringe => syringe.stepMl * 2 <= syringe.capacityMl, 'A syringe needs at least two marks: its step must be at most half of its capacity.')

export const OwnFeedInput = z.object({
  name: text('the name of the feed', 80).optional(),
  energyKcalPerMl: number('the energy of the feed', 'kcal/mL', 0.05, 9).optional(),
  waterFraction: number('the water share of the feed', 'mL per mL (0 to 1)', 0, 1).optional(),
  /** For energy from composition by the modified Atwater factors, % as fed. */
  proteinPercent: number('protein', '%', 0, 100).optional(),
  fatPercent: number('fat', '%', 0, 100).optional(),
  carbohydratePercent: number('carbohydrate', '%', 0, 100).optional(),
})

export const FeedInput = z.union([
  z.object({ feedId: text('the feed', 80).min(1, 'Choose a feed.') }),
  OwnFeedInput.refine(feed => feed.energyKcalPerMl !== undefined
    || (feed.proteinPercent !== undefined && feed.fatPercent !== undefined && feed.carbohydratePercent !== undefined),
  'Choose a feed, or give its energy in kcal/mL, or its protein, fat and carbohydrate in %.')
    .refine(feed => (feed.proteinPercent ?? 0) + (feed.fatPercent ?? 0) + (feed.carbohydratePercent ?? 0) <= 100,
      'Protein, fat and carbohydrate cannot be more than 100 % together.'),
], { error: 'Choose a feed, or give its energy in kcal/mL, or its protein, fat and carbohydrate in %.' })

export const AnimalInput = z.object({
  name: text('the name', 60).optional(),
  caseNumber: text('the case number', 40).optional(),
  enclosure: text('the enclosure', 60).optional(),
  speciesId: text('the species', 80).min(1, 'Choose a species.'),
  weightG: number('the weight', 'g', 0.1, 500_000),
  weighedOn: CalendarDate.optional(),
  scaleStepG: number('the step of the scale', 'g', 0.001, 5_000).optional(),
  lengthMm: number('the length', 'mm', 5, 10_000).optional(),
  /** Defaults to the measure that the species' own figures use. */
  lengthMeasure: z.enum(LENGTH_MEASURES).optional(),
  healthyWeightG: number('its earlier healthy weight', 'g', 0.1, 500_000).optional(),
  bodyConditionScore: number('the body condition score', 'points', 1, 5).optional(),
  drynessPercent: number('the dryness', '% of body weight', 0, 15),
  bodyTemperatureC: number('the body temperature', 'deg C', 0, 50).optional(),
  daysUnfed: number('the days without a proper meal', 'days', 0, 730),
  lifeStage: z.enum(LIFE_STAGES, { error: `Choose one: ${LIFE_STAGES.join(', ')}.` }),
  signs: z.array(z.enum(SIGN_IDS, { error: `Signs are named: ${SIGN_IDS.join(', ')}.` }), { error: 'Signs must be a list.' }).refine(signs => new Set(signs).size === signs.length, 'A sign is listed twice.'),
})

export const ContactInput = z.object({
  role: text('the role of a contact', 60).min(1),
  name: text('the name of a contact', 60).optional(),
  phone: text('the phone number of a contact', 40).optional(),
})

export const RegimenInput = z.object({
  animal: AnimalInput,
  feed: FeedInput,
  route: z.enum(ROUTES, { error: `Choose how it is given: ${ROUTES.join(', ')}.` }),
  feedsPerDay: z.number({ error: 'Feeds a day must be a whole number.' }).int('Feeds a day must be a whole number.').min(1, 'Give at least 1 feed a day.').max(24, 'Give at most 24 feeds a day.').optional(),
  feedingHours: z.object({ from: ClockTime, to: ClockTime }, { error: 'Give the feeding hours as from and to, for example 07:30 and 20:30.' }),
  startAt: Instant,
  timeZone: TimeZone,
  syringes: z.array(SyringeInput).min(1, 'List at least one syringe.').max(20, 'List at most 20 syringes.').optional(),
  kitchenScaleStepG: number('the step of the kitchen scale', 'g', 0.001, 100).optional(),
  /** Water flushed after each tube feed, mL. */
  flushMl: number('the flush', 'mL', 0, 60).optional(),
  contacts: z.array(ContactInput).max(4, 'List at most four contacts.').optional(),
  teamName: text('the name of the rescue', 60).optional(),
  overrides: z.object({
    energyEquationId: text('the energy equation', 80).optional(),
    tier: z.enum(TIERS, { error: `Tiers are: ${TIERS.join(', ')}.` }).optional(),
    fractions: z.array(number('a step', 'of the full amount', 0.01, 1.5)).min(1, 'Give at least one step.').max(60, 'Give at most 60 steps.').optional(),
    maintenanceMlPerKgPerDay: number('maintenance fluid', 'mL/kg/day', 0, 400).optional(),
    fluidHours: number('the fluids-only stage', 'hours', 0, 168).optional(),
  }).optional(),
})
export type RegimenInput = z.infer<typeof RegimenInput>

export const SheetQuery = z.object({
  key: z.string().max(200).optional(),
  version: z.coerce.number().int().min(1).optional(),
  /** Without one, what the team has set; else A4. */
  paper: z.enum(PAPERS, { error: 'Paper is a4 or letter.' }).optional(),
  /** Days of the plan, counted from 1: "1-3" or "2". At most seven. */
  days: z.string().regex(/^\d{1,3}(-\d{1,3})?$/, 'Give the days as 1-3 or 2.').default('1-3'),
})
export type SheetQuery = z.infer<typeof SheetQuery>

/** A packet goes with the animal: it holds a week where nothing else is asked for. */
export const PacketQuery = SheetQuery.extend({ days: SheetQuery.shape.days.unwrap().default('1-7') })

/** A change of a saved plan: the whole input again, and the version it is based on. */
export const RegimenChange = RegimenInput.extend({
  baseVersion: z.number({ error: 'The version this change is based on must be a whole number.' }).int('The version this change is based on must be a whole number.').min(1, 'Versions begin at 1.').optional(),
  /** What was changed and why, in a sentence. */
  note: text('the note', 300).optional(),
})

export const RegimenParams = z.object({ id: z.string().min(1).max(64) })

export const RegimenQuery = z.object({
  key: z.string().max(200).optional(),
  version: z.coerce.number({ error: 'The version must be a whole number.' }).int('The version must be a whole number.').min(1, 'Versions begin at 1.').optional(),
})
