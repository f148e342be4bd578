/**
 * Something worrying but possible that a person must see. Formulas throw for the impossible and
 * return findings for the worrying. Nobody parses `message`; code and numbers carry the meaning.
 */
export const FINDING_LEVELS = ['note', 'caution', 'stop'] as const
export type FindingLevel = (typeof FINDING_LEVELS)[number]

export interface Finding {
  /** `topic.problem`, stable, for example `meal.capBinds`. */
  code: string
  level: FindingLevel
  /** A heading of a few words, for a card or a printed box. */
  title: string
  /** One or two plain sentences: what is the case and what to do next. */
  message: string
  /** What was expected, in words or as a number with its unit in `unit`. */
  expected?: string | number
  received?: string | number
  unit?: string
  /** Path of the input that caused it, dot notation, for example `animal.weightG`. */
  path?: string
  /** Key into the bibliography; `house-rule` where it is ours. */
  sourceKey?: string
}
