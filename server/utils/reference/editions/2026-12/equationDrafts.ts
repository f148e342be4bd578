import type { EquationVariable, Group } from '#shared/types/reference'

/** Groups as the equations name them. Each list is complete: an equation holds for every animal of a group it names. */
export const REPTILES: Group[] = ['lizard', 'snake', 'chelonian', 'crocodilian']
export const SQUAMATES: Group[] = ['lizard', 'snake']
export const AMPHIBIANS: Group[] = ['amphibian-anuran', 'amphibian-caudate']
export const BIRDS: Group[] = ['bird-passerine', 'bird-other']
export const MAMMALS: Group[] = ['mammal-placental', 'mammal-marsupial']

// Ranges are wide on purpose: they stop slips of the pen, not small patients. What was measured stands in the notes.

/** Body weight in kg. */
export function kilograms(low: number, high: number): EquationVariable {
  return { name: 'M', meaning: 'body weight', unit: 'kg', low, high }
}

/** Body weight in g. */
export function grams(low: number, high: number): EquationVariable {
  return { name: 'g', meaning: 'body weight', unit: 'g', low, high }
}

/** Body temperature; used inside this range only. */
export function bodyTemperature(low: number, high: number): EquationVariable {
  return { name: 'T', meaning: 'body temperature', unit: 'deg C', low, high }
}

/** Body length in the unit the equation was published in. */
export function bodyLength(meaning: string, unit: 'm' | 'cm' | 'mm', low: number, high: number): EquationVariable {
  return { name: 'L', meaning, unit, low, high }
}
