import type { EquationConstant, EquationItem, Provenance } from '#shared/types/reference'
import { compileExpression } from '../calc/equation/compileExpression'
import { isCited, provenance, type Cited } from './record'

/** An equation as it is written in the edition's files. */
export type EquationDraft = Omit<EquationItem, 'constants' | 'provenance' | 'notes' | 'speciesIds'> & {
  speciesIds?: string[]
  /** By name, each a cited number with its meaning. */
  constants?: Record<string, { cited: Cited, meaning: string }>
  /** Its unit is that of the result. */
  provenance: Omit<Provenance, 'unit'>
  notes?: string[]
}

export type EquationRecordCode = 'equation.unknownName' | 'equation.unusedName' | 'equation.uncitedConstant' | 'equation.badRange'

/**
 * An equation that must not enter the reference data.
 *
 * @param code  what is wrong, stable.
 * @param message  one sentence that names the equation.
 * @source house rule (expressions are data; only arithmetic is data)
 * @example new EquationRecordError('equation.unknownName', 'k129-passerine: "x" is neither a variable nor a constant of it.').code // 'equation.unknownName'
 */
export class EquationRecordError extends Error {
  readonly code: EquationRecordCode

  constructor(code: EquationRecordCode, message: string) {
    super(message)
    this.name = 'EquationRecordError'
    this.code = code
  }
}

/**
 * One equation of the reference data, checked and frozen.
 *
 * @param draft  the equation as written in the edition; constants by name, each made by `cited`.
 * @returns the record, frozen with all its parts.
 * @throws CalcInputError `equation.expression` when the expression holds more than the closed set of operations;
 * @throws EquationRecordError `equation.unknownName` when it names something that is neither variable nor constant;
 * @throws EquationRecordError `equation.unusedName` when a variable or constant does not occur in it;
 * @throws EquationRecordError `equation.uncitedConstant` when a constant was not made by `cited`;
 * @throws EquationRecordError `equation.badRange` when the range of a variable is upside down or not finite;
 * @throws UncitedNumberError as `cited` does, for its own source.
 * @source house rule (expressions are data; only arithmetic is data)
 * @example defineEquation({ id: 'k129-passerine', expression: '129 * M ^ 0.75', … }).provenance.unit // 'kcal/day'
 */
export function defineEquation(draft: EquationDraft): EquationItem {
  const { provenance: origin, constants = {}, notes = [], speciesIds = null, ...rest } = draft
  for (const { name, low, high } of draft.variables) {
    if (!(Number.isFinite(low) && Number.isFinite(high) && low < high)) throw new EquationRecordError('equation.badRange', `${draft.id}: the range of ${name} (${low} to ${high}) cannot be.`)
  }
  checkNames(draft.id, compileExpression(draft.expression).symbols, [...draft.variables.map(one => one.name), ...Object.keys(constants)])
  const plainConstants: Record<string, EquationConstant> = {}
  for (const [name, { cited, meaning }] of Object.entries(constants)) {
    if (!isCited(cited)) throw new EquationRecordError('equation.uncitedConstant', `${draft.id}: the constant ${name} has no source.`)
    plainConstants[name] = Object.freeze({ ...cited, meaning })
  }
  return Object.freeze({
    ...rest,
    variables: frozenList(draft.variables.map(one => Object.freeze({ ...one }))),
    constants: Object.freeze(plainConstants),
    groups: frozenList(draft.groups),
    speciesIds: speciesIds && frozenList(speciesIds),
    provenance: provenance({ ...origin, unit: draft.resultUnit }, draft.expression),
    notes: frozenList(notes),
  })
}

function checkNames(id: string, used: readonly string[], known: string[]): void {
  const unknown = used.find(name => !known.includes(name))
  if (unknown !== undefined) throw new EquationRecordError('equation.unknownName', `${id}: "${unknown}" is neither a variable nor a constant of it.`)
  const unused = known.find(name => !used.includes(name))
  if (unused !== undefined) throw new EquationRecordError('equation.unusedName', `${id}: ${unused} does not occur in the expression.`)
}

function frozenList<T>(list: readonly T[]): T[] {
  return Object.freeze([...list]) as T[]
}
