import { HOW_READ, type HowRead, type Provenance } from '#shared/types/reference'
import { sources } from './sources'

declare const citedBrand: unique symbol

/** A number with its unit and where it comes from. Only `cited` makes one. */
export interface Cited extends Readonly<Provenance> {
  readonly value: number
  readonly [citedBrand]: true
}

/** A range with its unit and where it comes from. Only `citedRange` makes one. */
export interface CitedRange extends Readonly<Provenance> {
  readonly low: number
  readonly high: number
  readonly [citedBrand]: true
}

export type UncitedCode = 'cited.notANumber' | 'cited.noUnit' | 'cited.noLocator' | 'cited.unknownReading' | 'cited.unknownSource' | 'cited.rangeReversed'

/**
 * A number that was about to enter the reference data without its unit or its source.
 *
 * @param code  what is missing, stable.
 * @param message  one sentence that names the number and what to add.
 * @source house rule (no number without unit and source)
 * @example new UncitedNumberError('cited.noUnit', 'The value 1.5 has no unit.').code // 'cited.noUnit'
 */
export class UncitedNumberError extends Error {
  readonly code: UncitedCode

  constructor(code: UncitedCode, message: string) {
    super(message)
    this.name = 'UncitedNumberError'
    this.code = code
  }
}

// A look-alike object is not a cited number: only what passed the checks below is remembered here.
const made = new WeakSet<object>()

/**
 * A number of the reference data, with unit and source.
 *
 * @param draft  value, unit, key into the bibliography, locator (page, table, equation, row) and how it was read; a note if needed.
 * @returns the same, frozen; it cannot be made any other way.
 * @throws UncitedNumberError `cited.notANumber` when the value is not finite;
 * @throws UncitedNumberError `cited.noUnit`, `cited.noLocator` when one is empty;
 * @throws UncitedNumberError `cited.unknownReading` when `howRead` is none of `HOW_READ`;
 * @throws UncitedNumberError `cited.unknownSource` when the source is not in the bibliography.
 * @source house rule (no number without unit and source)
 * @example cited({ value: 20.1, unit: 'J/mL O2', sourceKey: 'trenchr', locator: 'default', howRead: 'restated' }).value // 20.1
 */
export function cited(draft: { value: number } & Provenance): Cited {
  if (!Number.isFinite(draft.value)) throw new UncitedNumberError('cited.notANumber', `A cited value must be a finite number, not ${String(draft.value)} (${draft.sourceKey}, ${draft.locator}).`)
  return brand({ value: draft.value, ...provenance(draft, String(draft.value)) }) as Cited
}

/**
 * A range of the reference data, with unit and source.
 *
 * @param draft  as for `cited`, with `low` and `high` in place of `value`; `low` at most `high`.
 * @returns the same, frozen.
 * @throws UncitedNumberError as `cited` does, and `cited.rangeReversed` when `low` is above `high`.
 * @source house rule (no number without unit and source)
 * @example citedRange({ low: 45, high: 80, unit: 'g', sourceKey: 'memory', locator: 'adults', howRead: 'memory' }).high // 80
 */
export function citedRange(draft: { low: number, high: number } & Provenance): CitedRange {
  const words = `${String(draft.low)} to ${String(draft.high)}`
  if (!Number.isFinite(draft.low) || !Number.isFinite(draft.high)) throw new UncitedNumberError('cited.notANumber', `A cited range must be two finite numbers, not ${words}.`)
  if (draft.low > draft.high) throw new UncitedNumberError('cited.rangeReversed', `The range ${words} is upside down.`)
  return brand({ low: draft.low, high: draft.high, ...provenance(draft, words) }) as CitedRange
}

/**
 * True for what `cited` or `citedRange` made, false for anything that only looks like it.
 *
 * @param candidate  anything.
 * @returns whether it passed the checks of this file.
 * @throws Never.
 * @source house rule
 * @example isCited({ value: 1, unit: 'g', sourceKey: 'memory', locator: 'x', howRead: 'memory' }) // false
 */
export function isCited(candidate: unknown): candidate is Cited | CitedRange {
  return typeof candidate === 'object' && candidate !== null && made.has(candidate)
}

/**
 * Where a value comes from, checked and frozen; for records that keep value and provenance apart.
 *
 * @param draft  source key, locator, how it was read, unit; a note if needed.
 * @param words  the value in words, for the error sentence.
 * @returns the same fields, frozen, without an empty note.
 * @throws UncitedNumberError as `cited` does for unit, locator, reading and source.
 * @source house rule (no number without unit and source)
 * @example provenance({ sourceKey: 'memory', locator: 'adults', howRead: 'memory', unit: 'g' }, '45 to 80').unit // 'g'
 */
export function provenance(draft: Provenance, words: string): Readonly<Provenance> {
  const { sourceKey, locator, howRead, unit, note } = draft
  if (!unit?.trim()) throw new UncitedNumberError('cited.noUnit', `The value ${words} has no unit.`)
  if (!locator?.trim()) throw new UncitedNumberError('cited.noLocator', `The value ${words} ${unit} does not say where in "${sourceKey}" it stands.`)
  if (!HOW_READ.includes(howRead as HowRead)) throw new UncitedNumberError('cited.unknownReading', `The value ${words} ${unit} does not say how it was read ("${String(howRead)}").`)
  if (!sources.has(sourceKey)) throw new UncitedNumberError('cited.unknownSource', `The value ${words} ${unit} cites "${sourceKey}", which is not in sources.ts.`)
  return Object.freeze(note ? { sourceKey, locator, howRead, unit, note } : { sourceKey, locator, howRead, unit })
}

function brand(value: object): object {
  Object.freeze(value)
  made.add(value)
  return value
}
