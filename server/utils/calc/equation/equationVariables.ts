import type { EquationItem } from '#shared/types/reference'

/** What a caller knows of an animal; an equation takes what it needs of it. */
export interface EquationGiven {
  massG?: number
  /** Null or left out: the temperature the equation holds at. */
  temperatureC?: number | null
  state?: number
  lengthMm?: number
  [extra: string]: number | null | undefined
}

const MM_PER_UNIT: Record<string, number> = { m: 1000, cm: 10, mm: 1 }

/**
 * Fills the variables of an equation by their canonical names: `M` (kg, or g where the record says so), `g` (g), `T` (deg C, kept
 * inside the record's range), `S` (state), `L` (length in the record's own unit). Other names are taken as given.
 *
 * @param record  the equation.
 * @param given  `massG` (g), `temperatureC` (deg C), `state` (0 or 1), `lengthMm` (mm), and extras by their own names.
 * @returns the variables by name; one that is not known is NaN, which `evaluateEquation` refuses.
 * @throws Never.
 * @source house rule (canonical names)
 * @example equationVariables(kleiber, { massG: 1360 }) // { M: 1.36 }
 */
export function equationVariables(record: EquationItem, given: EquationGiven): Record<string, number> {
  const filled: Record<string, number> = {}
  for (const { name, unit, low, high } of record.variables) {
    const own = given[name]
    if (typeof own === 'number') filled[name] = own
    else if (name === 'M') filled[name] = unit === 'g' ? given.massG ?? Number.NaN : (given.massG ?? Number.NaN) / 1000
    else if (name === 'g') filled[name] = given.massG ?? Number.NaN
    else if (name === 'T') filled[name] = Math.min(Math.max(given.temperatureC ?? record.holdsAtC ?? Number.NaN, low), high)
    else if (name === 'S') filled[name] = given.state ?? 1
    else if (name === 'L') filled[name] = (given.lengthMm ?? Number.NaN) / (MM_PER_UNIT[unit] ?? 1)
    else filled[name] = Number.NaN
  }
  return filled
}
