import convert from 'convert-units'
import { gramsFrom, gramsTo, millimetresFrom, millimetresTo, type LengthUnit, type MassUnit, type TemperatureUnit } from '#shared/utils/units'
import { formatNumber, formatTemperatureC, formatWeightG } from '#shared/utils/quantity'
import { parseNumber } from './parseNumber'

/** What a person typed, with the unit they chose. Kept as typed, so that nothing changes under their fingers. */
export interface Typed<Unit extends string> { text: string, unit: Unit }

const TEMPERATURE_NAMES = { degC: 'C', degF: 'F' } as const
export const UNIT_LABELS: Record<MassUnit | LengthUnit | TemperatureUnit, string> = { g: 'g', kg: 'kg', oz: 'oz', lb: 'lb', mm: 'mm', cm: 'cm', in: 'in', degC: '°C', degF: '°F' }

/** Grams, to a thousandth: the exact factor, without the binary tail. */
export function typedGrams(typed: Typed<MassUnit>): number | null {
  const value = parseNumber(typed.text)
  return value === null ? null : Number(gramsFrom(value, typed.unit).toFixed(3))
}

export function typedMillimetres(typed: Typed<LengthUnit>): number | null {
  const value = parseNumber(typed.text)
  return value === null ? null : Number(millimetresFrom(value, typed.unit).toFixed(2))
}

export function typedCelsius(typed: Typed<TemperatureUnit>): number | null {
  const value = parseNumber(typed.text)
  return value === null ? null : Number(convert(value).from(TEMPERATURE_NAMES[typed.unit]).to('C').toFixed(2))
}

/** The same quantity in the unit the plan works in, shown beside what was typed. Empty when there is nothing to show. */
export function massEcho(typed: Typed<MassUnit>): string {
  const grams = typedGrams(typed)
  if (grams === null) return ''
  return typed.unit === 'g' ? (grams >= 1000 ? `= ${formatWeightG(grams)}` : `= ${formatNumber(gramsTo(grams, 'oz'), 2)} oz`) : `= ${formatNumber(grams, 1)} g`
}

export function lengthEcho(typed: Typed<LengthUnit>): string {
  const millimetres = typedMillimetres(typed)
  if (millimetres === null) return ''
  return typed.unit === 'mm' ? `= ${formatNumber(millimetresTo(millimetres, 'cm'), 2)} cm` : `= ${formatNumber(millimetres, 0)} mm`
}

export function temperatureEcho(typed: Typed<TemperatureUnit>): string {
  const celsius = typedCelsius(typed)
  if (celsius === null) return ''
  return typed.unit === 'degC' ? `= ${formatNumber(convert(celsius).from('C').to('F'), 1)} °F` : `= ${formatTemperatureC(celsius)}`
}
