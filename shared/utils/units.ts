/**
 * Unit names and exact factors, the one place both sides take them from.
 *
 * Inside the product every quantity is in its canonical unit (g or kg, mL, kcal, mm, deg C, h) and its
 * name says so. Conversion happens at the edges, with these.
 */

/** International avoirdupois pound in grams, exact (1959 definition). */
export const G_PER_LB = 453.59237
/** Avoirdupois ounce in grams, exact: one sixteenth of a pound. */
export const G_PER_OZ = 28.349523125
/** International inch in millimetres, exact (1959 definition). */
export const MM_PER_INCH = 25.4
/** Thermochemical kilocalorie in kilojoules, exact by definition. */
export const KJ_PER_KCAL = 4.184
/** One watt over a day, in kilojoules, exact. */
export const KJ_PER_DAY_PER_WATT = 86.4
/**
 * Energy of one mL of oxygen used (STPD), J, at a respiratory quotient of about 0.8. Not a definition: the usual default of open
 * biophysical code, restated there from Kleiber's fuel values (4.5 to 5 kcal per L).
 */
export const J_PER_ML_O2 = 20.1
/** Millilitres in one US fluid ounce (231 cubic inches / 128), exact. */
export const ML_PER_US_FL_OZ = 29.5735295625

export const MASS_UNITS = ['g', 'kg', 'oz', 'lb'] as const
export type MassUnit = (typeof MASS_UNITS)[number]
export const LENGTH_UNITS = ['mm', 'cm', 'in'] as const
export type LengthUnit = (typeof LENGTH_UNITS)[number]
export const TEMPERATURE_UNITS = ['degC', 'degF'] as const
export type TemperatureUnit = (typeof TEMPERATURE_UNITS)[number]

const G_PER: Record<MassUnit, number> = { g: 1, kg: 1000, oz: G_PER_OZ, lb: G_PER_LB }
const MM_PER: Record<LengthUnit, number> = { mm: 1, cm: 10, in: MM_PER_INCH }

/** Mass in grams. @example gramsFrom(1, 'lb') // 453.59237 */
export function gramsFrom(value: number, unit: MassUnit): number {
  return value * G_PER[unit]
}

/** Mass from grams into `unit`. @example gramsTo(453.59237, 'lb') // 1 */
export function gramsTo(valueG: number, unit: MassUnit): number {
  return valueG / G_PER[unit]
}

/** Length in millimetres. @example millimetresFrom(1, 'in') // 25.4 */
export function millimetresFrom(value: number, unit: LengthUnit): number {
  return value * MM_PER[unit]
}

/** Length from millimetres into `unit`. @example millimetresTo(25.4, 'in') // 1 */
export function millimetresTo(valueMm: number, unit: LengthUnit): number {
  return valueMm / MM_PER[unit]
}

/** Temperature in deg C. @example celsiusFrom(95, 'degF') // 35 */
export function celsiusFrom(value: number, unit: TemperatureUnit): number {
  return unit === 'degC' ? value : (value - 32) * 5 / 9
}

/** Temperature from deg C into `unit`. @example celsiusTo(35, 'degF') // 95 */
export function celsiusTo(valueC: number, unit: TemperatureUnit): number {
  return unit === 'degC' ? valueC : valueC * 9 / 5 + 32
}
