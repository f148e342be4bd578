import type { EquationItem } from '#shared/types/reference'

/** A record for tests of the evaluator: no figure of the reference data. */
export function equationRecord(expression: string, variables: [name: string, unit: string, low: number, high: number][], change: Partial<EquationItem> = {}): EquationItem {
  return {
    id: 'test',
    topic: 'energy',
    title: 'A test',
    expression,
    variables: variables.map(([name, unit, low, high]) => ({ name, meaning: `the value ${name}`, unit, low, high })),
    constants: {},
    taxon: 'none',
    groups: [],
    speciesIds: null,
    basis: 'resting',
    holdsAtC: null,
    temperatureTerm: 'none',
    resultUnit: 'kcal/day',
    provenance: { sourceKey: 'definition', locator: 'test', howRead: 'house-rule', unit: 'kcal/day' },
    notes: [],
    ...change,
  }
}
