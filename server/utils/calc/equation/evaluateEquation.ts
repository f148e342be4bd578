import type { EquationItem, EquationStep, EquationValue } from '#shared/types/reference'
import { formatSignificant } from '#shared/utils/quantity'
import { J_PER_ML_O2, KJ_PER_DAY_PER_WATT, KJ_PER_KCAL } from '#shared/utils/units'
import { CalcInputError } from '../calcInputError'
import { compileExpression } from './compileExpression'

/** One way from a published unit to kcal/day: factor, and how the step is written. */
interface Conversion { label: string, factor: number, shown: string, unit: string, sourceKey: string }

const TO_KCAL: Record<string, Conversion[]> = {
  'kcal/day': [],
  'kJ/day': [{ label: 'Kilojoules to kilocalories', factor: 1 / KJ_PER_KCAL, shown: '÷ 4.184', unit: 'kcal/day', sourceKey: 'definition' }],
  'W': [
    { label: 'Watts to kilojoules a day', factor: KJ_PER_DAY_PER_WATT, shown: '× 86.4', unit: 'kJ/day', sourceKey: 'definition' },
    { label: 'Kilojoules to kilocalories', factor: 1 / KJ_PER_KCAL, shown: '÷ 4.184', unit: 'kcal/day', sourceKey: 'definition' },
  ],
  'mL O2/h': [
    { label: 'Oxygen a day', factor: 24, shown: '× 24', unit: 'mL O2/day', sourceKey: 'definition' },
    { label: 'Energy at 20.1 J per mL of oxygen', factor: J_PER_ML_O2 / 1000, shown: '× 20.1 ÷ 1,000', unit: 'kJ/day', sourceKey: 'trenchr' },
    { label: 'Kilojoules to kilocalories', factor: 1 / KJ_PER_KCAL, shown: '÷ 4.184', unit: 'kcal/day', sourceKey: 'definition' },
  ],
  'mL O2/min': [
    { label: 'Oxygen an hour', factor: 60, shown: '× 60', unit: 'mL O2/h', sourceKey: 'definition' },
    { label: 'Oxygen a day', factor: 24, shown: '× 24', unit: 'mL O2/day', sourceKey: 'definition' },
    { label: 'Energy at 20.1 J per mL of oxygen', factor: J_PER_ML_O2 / 1000, shown: '× 20.1 ÷ 1,000', unit: 'kJ/day', sourceKey: 'trenchr' },
    { label: 'Kilojoules to kilocalories', factor: 1 / KJ_PER_KCAL, shown: '÷ 4.184', unit: 'kcal/day', sourceKey: 'definition' },
  ],
}

/**
 * The value of an equation in its own published unit, without the working.
 *
 * @param record  the equation.
 * @param variables  every variable of the record, by name, in its unit.
 * @returns in `record.resultUnit`, unrounded.
 * @throws CalcInputError `equation.variable` when a variable is missing or not finite;
 * @throws CalcInputError `equation.notFinite` when the result is not finite.
 * @source the record's own
 * @example equationNumber(kleiber, { M: 1 }) // 70
 */
export function equationNumber(record: EquationItem, variables: Record<string, number>): number {
  const value = compileExpression(record.expression).valueOf(scopeOf(record, variables))
  if (!Number.isFinite(value)) throw new CalcInputError('equation.notFinite', `The equation ${record.id} gives no number for these values.`)
  return value
}

/**
 * Energy of an equation in kcal/day, without the working.
 *
 * @param record  an energy equation.
 * @param variables  every variable of the record, by name, in its unit.
 * @returns kcal/day, unrounded.
 * @throws CalcInputError `equation.variable`, `equation.notFinite` as `equationNumber`;
 * @throws CalcInputError `equation.notEnergy` when its unit is none of energy.
 * @source the record's own; 20.1 J per mL O2 (`conv-o2-energy`), 4.184 kJ/kcal, 86.4 kJ/day per W by definition
 * @example equationKcalPerDay(nagyReptile, { g: 10 }) // 0.3628
 */
export function equationKcalPerDay(record: EquationItem, variables: Record<string, number>): number {
  return conversionsOf(record).reduce((value, step) => value * step.factor, equationNumber(record, variables))
}

/**
 * An equation worked out in full: value in the published unit, the working, and kcal/day for energy.
 *
 * Hint: the first step shows the expression with names and then with values; each unit on the way is a step of its own.
 *
 * @param record  the equation.
 * @param variables  every variable of the record, by name, in its unit.
 * @param options.refuseOutOfRange  true to refuse values outside the record's ranges.
 * @returns value, unit, steps in order and the source's key; `kcalPerDay` for energy equations only. Unrounded.
 * @throws CalcInputError `equation.variable`, `equation.notFinite` as `equationNumber`;
 * @throws CalcInputError `equation.outOfRange` when asked to refuse and a variable is outside its range.
 * @source the record's own
 * @example evaluateEquation(kleiber, { M: 1.36 }).value // 88.156
 */
export function evaluateEquation(record: EquationItem, variables: Record<string, number>, options: { refuseOutOfRange?: boolean } = {}): EquationValue {
  if (options.refuseOutOfRange) refuseOutOfRange(record, variables)
  const value = equationNumber(record, variables)
  const compiled = compileExpression(record.expression)
  const filledIn = compiled.filledIn(scopeOf(record, variables), one => formatSignificant(one, 4))
  const sourceKey = record.provenance.sourceKey
  const steps: EquationStep[] = [{ label: record.title, expression: `${compiled.written} = ${filledIn}`, value, unit: record.resultUnit, sourceKey }]
  if (record.topic !== 'energy') return { value, unit: record.resultUnit, steps, sourceKey }
  let running = value
  for (const step of conversionsOf(record)) {
    const expression = `${formatSignificant(running, 4)} ${step.shown}`
    running *= step.factor
    steps.push({ label: step.label, expression, value: running, unit: step.unit, sourceKey: step.sourceKey })
  }
  return { value, unit: record.resultUnit, kcalPerDay: running, steps, sourceKey }
}

function conversionsOf(record: EquationItem): Conversion[] {
  const conversions = TO_KCAL[record.resultUnit]
  if (!conversions) throw new CalcInputError('equation.notEnergy', `The equation ${record.id} gives ${record.resultUnit}, which is not an energy.`)
  return conversions
}

function scopeOf(record: EquationItem, variables: Record<string, number>): Record<string, number> {
  const scope: Record<string, number> = {}
  for (const name in record.constants) scope[name] = record.constants[name]!.value
  for (const { name, meaning, unit } of record.variables) {
    const value = variables[name]
    if (value === undefined || !Number.isFinite(value)) throw new CalcInputError('equation.variable', `This equation needs ${meaning}, in ${unit}.`, { path: name, received: value })
    scope[name] = value
  }
  return scope
}

function refuseOutOfRange(record: EquationItem, variables: Record<string, number>): void {
  for (const { name, meaning, unit, low, high } of record.variables) {
    const value = variables[name]
    if (value !== undefined && (value < low || value > high)) {
      throw new CalcInputError('equation.outOfRange', `${meaning.charAt(0).toUpperCase()}${meaning.slice(1)} must be from ${low} to ${high} ${unit} for this equation.`, { path: name, received: value, expected: `${low} to ${high} ${unit}` })
    }
  }
}
