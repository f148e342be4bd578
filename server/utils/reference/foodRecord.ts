import type { Diet, FoodForm, FoodItem, PowderRecipe, Provenance } from '#shared/types/reference'
import { provenance } from './record'

type Origin = Omit<Provenance, 'unit'>

/** A food as it is written in the edition: per g as fed for solids and liquids (1 g/mL), by its recipe for powders. */
export interface FoodRow {
  id: string
  name: string
  form: FoodForm
  /** Energy at full strength, kcal per mL (solids: per g), with its origin; for a powder the recipe gives it. */
  energy?: { kcalPerMl: number, origin: Origin }
  water: { fraction: number, origin: Origin }
  /** % as fed. */
  protein?: number
  fat?: number
  carbohydrate?: number
  composition?: Origin
  /** mg/kg as fed. */
  calcium?: number
  phosphorus?: number
  minerals?: Origin
  band: { fraction: number, origin: Origin }
  recipe?: PowderRecipe
  suits: Diet[]
  notes?: string[]
}

/**
 * One food of the reference data, with where each of its values comes from, frozen.
 *
 * @param row  the food as written in the edition; either `energy` or `recipe`, never both.
 * @returns the record; `provenance` has one entry for every field that holds a value; a powder's energy is its recipe's.
 * @throws Error when energy and recipe are both given or both missing, when a recipe makes more than its parts or less than
 *   its water, when water is outside 0 to 1, or when a composition adds up to more than 100 %;
 * @throws UncitedNumberError as `cited` does.
 * @source the row's own origins
 * @example defineFood(omnivoreSlurry).energyKcalPerMl // 1.2
 */
export function defineFood(row: FoodRow): FoodItem {
  refuseImpossible(row)
  const demo = row.recipe !== undefined
  const demoOrigin: Origin = { sourceKey: 'demo', locator: 'invented recipe', howRead: 'demo' }
  const energyKcalPerMl = row.recipe ? row.recipe.energyKcalPerPowderG * row.recipe.powderG / row.recipe.madeUpMl : row.energy!.kcalPerMl
  const from: Record<string, Readonly<Provenance>> = {}
  const note = (field: string, value: unknown, unit: string, origin: Origin | undefined) => {
    if (value === null || value === undefined) return
    if (!origin) throw new Error(`${row.id} does not say where its ${field} comes from.`)
    from[field] = provenance({ ...origin, unit }, `${row.id} ${field}`)
  }
  const perMl = row.form === 'solid' ? 'kcal/g, blended at 1 g/mL' : 'kcal/mL'
  note('energyKcalPerMl', energyKcalPerMl, perMl, demo ? demoOrigin : row.energy!.origin)
  note('waterFraction', row.water.fraction, row.form === 'solid' ? 'g/g' : 'mL/mL', row.water.origin)
  note('proteinPercent', row.protein, '%', row.composition)
  note('fatPercent', row.fat, '%', row.composition)
  note('carbohydratePercent', row.carbohydrate, '%', row.composition)
  note('calciumMgPerKg', row.calcium, 'mg/kg', row.minerals)
  note('phosphorusMgPerKg', row.phosphorus, 'mg/kg', row.minerals)
  note('energyBandFraction', row.band.fraction, 'of the energy', row.band.origin)
  note('recipe', row.recipe, 'g, mL, kcal/g', demoOrigin)
  note('suits', row.suits, 'diet classes', { sourceKey: demo ? 'demo' : 'house-rule', locator: 'whom it suits', howRead: demo ? 'demo' : 'house-rule' })
  return Object.freeze({
    id: row.id,
    name: row.name,
    form: row.form,
    energyKcalPerMl,
    waterFraction: row.water.fraction,
    proteinPercent: row.protein ?? null,
    fatPercent: row.fat ?? null,
    carbohydratePercent: row.carbohydrate ?? null,
    calciumMgPerKg: row.calcium ?? null,
    phosphorusMgPerKg: row.phosphorus ?? null,
    energyBandFraction: row.band.fraction,
    recipe: row.recipe ? Object.freeze({ ...row.recipe }) : null,
    suits: Object.freeze([...row.suits]) as Diet[],
    demo,
    notes: Object.freeze([...row.notes ?? []]) as string[],
    provenance: Object.freeze(from),
  })
}

function refuseImpossible({ id, energy, recipe, water, protein = 0, fat = 0, carbohydrate = 0 }: FoodRow): void {
  if ((energy === undefined) === (recipe === undefined)) throw new Error(`${id} needs either an energy or a recipe.`)
  if (!(water.fraction >= 0 && water.fraction <= 1)) throw new Error(`${id}: water must be from 0 to 1.`)
  if (protein + fat + carbohydrate > 100) throw new Error(`${id}: protein, fat and carbohydrate are more than 100 %.`)
  // Powder takes up room when it is wetted, but never more than its own weight in mL for a food powder.
  if (recipe && (recipe.madeUpMl <= recipe.waterMl || recipe.madeUpMl > recipe.waterMl + recipe.powderG)) throw new Error(`${id}: ${recipe.powderG} g and ${recipe.waterMl} mL cannot make ${recipe.madeUpMl} mL.`)
}
