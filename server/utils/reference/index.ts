import type { EquationItem, FoodItem, SourceItem, SpeciesItem } from '#shared/types/reference'
import type { Rules } from './rules'
import { equations } from './editions/2026-12/equations.data'
import { foods } from './editions/2026-12/foods.data'
import { rules } from './editions/2026-12/rules.data'
import { species } from './editions/2026-12/species'
import { sources } from './sources'

/** One frozen set of everything a plan is worked out from. A saved plan names its edition, and old editions stay. */
export interface Edition {
  id: string
  equations: ReadonlyMap<string, EquationItem>
  species: ReadonlyMap<string, SpeciesItem>
  foods: ReadonlyMap<string, FoodItem>
  sources: ReadonlyMap<string, SourceItem>
  rules: Rules
}

/** By id, in the order of the list. Two of one name would hide each other. */
function itemsById<Item extends { id: string }>(items: readonly Item[]): ReadonlyMap<string, Item> {
  const map = new Map(items.map(item => [item.id, item]))
  if (map.size !== items.length) throw new Error('Two items of the reference data have the same id.')
  return map
}

/** Newest last. */
const EDITIONS: ReadonlyMap<string, Edition> = new Map([
  ['2026-12', Object.freeze({ id: '2026-12', equations, species: itemsById(species), foods: itemsById(foods), sources, rules })],
])

/**
 * The edition that new plans are worked out from.
 *
 * @returns the newest edition; the same object every time.
 * @throws Never.
 * @source house rule (a plan is worked out from one edition only)
 * @example currentEdition().id // '2026-12'
 */
export function currentEdition(): Edition {
  return [...EDITIONS.values()].at(-1)!
}

/**
 * An edition by its id, for plans that were saved under it.
 *
 * @param id  for example `2026-12`.
 * @returns the edition, or null when this version of the product does not carry it.
 * @throws Never.
 * @source house rule (a saved plan keeps its edition)
 * @example editionById('2026-12')?.id // '2026-12'
 */
export function editionById(id: string): Edition | null {
  return EDITIONS.get(id) ?? null
}
