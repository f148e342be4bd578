/** The API contract of a team's plan and its life. */
import { z } from 'zod'
import { FEED_OUTCOMES, PLAN_STATES, WAITS } from '../types/planLife'
import { Instant, listQuery, number, text } from './fields'

const version = z.number({ error: 'Say which version this is about.' }).int('Versions are whole numbers.').min(1, 'Versions begin at 1.')

/** Every step names the version the person was looking at: approving one that has changed meanwhile is refused. */
export const StepInput = z.object({ version, note: text('the note', 500).default('') })
export const SendBackInput = z.object({ version, reason: text('the reason', 500).min(3, 'Say why it goes back, so that the next version can be right.') })
export const StopInput = z.object({ version, reason: text('the reason', 500).min(3, 'Say why it is stopped.') })

export const PLAN_SORTS = ['updatedAt', 'animalName', 'enclosure', 'state', 'waitingSince', 'goodUntil'] as const
export const PlansQuery = listQuery(PLAN_SORTS, '-updatedAt').extend({
  state: z.enum(PLAN_STATES, { error: `States are: ${PLAN_STATES.join(', ')}.` }).optional(),
  waiting: z.enum(WAITS, { error: `A plan waits for: ${WAITS.join(', ')}.` }).optional(),
  room: text('the room', 60).optional(),
  /** Plans this browser remembers by their private links, whoever is signed in. */
  of: z.enum(['team', 'browser'], { error: 'Plans are those of the team or of this browser.' }).optional(),
})
export type PlansQuery = z.infer<typeof PlansQuery>

export const VersionsQuery = listQuery(['version'], '-version')
export const CompareQuery = z.object({
  from: z.coerce.number({ error: 'Say which version to compare from.' }).int().min(1),
  to: z.coerce.number({ error: 'Say which version to compare to.' }).int().min(1),
})

export const WeighInInput = z.object({ weightG: number('the weight', 'g', 0.1, 500_000), weighedAt: Instant.optional() })
export const FeedEntryInput = z.object({
  outcome: z.enum(FEED_OUTCOMES, { error: `What happened is one of: ${FEED_OUTCOMES.join(', ')}.` }),
  dueAt: Instant.optional(),
  takenMl: number('what was taken', 'mL', 0, 2000).optional(),
  note: text('the note', 300).default(''),
  initials: text('initials', 6).min(2, 'Give your initials: 2 to 6 letters.').optional(),
})
export const StrikeInput = z.object({ reason: text('the reason', 200).min(3, 'Say why this line is struck out.') })
export const EntryParams = z.object({ id: z.string().min(1).max(64), entryId: z.coerce.number().int().min(1) })
export const LogQuery = listQuery(['at'], '-at')
