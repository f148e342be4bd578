import { describe, expect, it } from 'vitest'
import { DIETS, FOOD_FORMS, HOW_READ } from '#shared/types/reference'
import { currentEdition } from '#server/utils/reference'
import { defineFood, type FoodRow } from '#server/utils/reference/foodRecord'
import { UncitedNumberError } from '#server/utils/reference/record'

const { foods, sources } = currentEdition()
const house = { sourceKey: 'house-rule', locator: 'a test', howRead: 'house-rule' } as const
const solid: FoodRow = { id: 'food-test', name: 'Test food', form: 'solid', energy: { kcalPerMl: 1.5, origin: house }, water: { fraction: 0.7, origin: house }, band: { fraction: 0.1, origin: house }, suits: ['carnivore'] }
const recipe = { powderG: 30, waterMl: 80, madeUpMl: 100, energyKcalPerPowderG: 4 }
const { energy: _energy, ...withoutEnergy } = solid
const powder: FoodRow = { ...withoutEnergy, form: 'slurry-powder', recipe }

describe('defineFood', () => {
  it('takes the energy of a powder from its recipe', () => {
    expect(defineFood(powder)).toMatchObject({ energyKcalPerMl: 1.2, demo: true, recipe })
    expect(defineFood(solid)).toMatchObject({ energyKcalPerMl: 1.5, demo: false, recipe: null, proteinPercent: null })
  })
  it.each([
    ['both energy and recipe', { ...solid, recipe }, 'either an energy or a recipe'],
    ['neither', withoutEnergy, 'either an energy or a recipe'],
    ['water of 70', { ...solid, water: { fraction: 70, origin: house } }, 'from 0 to 1'],
    ['water that is no number', { ...solid, water: { fraction: Number.NaN, origin: house } }, 'from 0 to 1'],
    ['more than everything', { ...solid, protein: 60, fat: 30, carbohydrate: 11, composition: house }, 'more than 100 %'],
    ['a pot smaller than its water', { ...powder, recipe: { ...recipe, madeUpMl: 79 } }, 'cannot make 79 mL'],
    ['a pot larger than its parts', { ...powder, recipe: { ...recipe, madeUpMl: 111 } }, 'cannot make 111 mL'],
    ['a composition from nowhere', { ...solid, protein: 10 }, 'where its proteinPercent comes from'],
  ] as [string, FoodRow, string][])('refuses %s', (_, row, message) => expect(() => defineFood(row)).toThrow(message))
  it('refuses a source that is not in the bibliography', () => {
    expect(() => defineFood({ ...solid, water: { fraction: 0.7, origin: { ...house, sourceKey: 'nobody1999' } } })).toThrow(UncitedNumberError)
  })
  it('freezes all of it', () => {
    const made = defineFood(powder)
    for (const part of [made, made.recipe, made.suits, made.notes, made.provenance]) expect(Object.isFrozen(part)).toBe(true)
  })
})

describe('the foods of the edition', () => {
  it.each([...foods.values()].map(food => [food.id, food] as const))('%s is whole: values in range, each with its source', (_id, food) => {
    expect(food.id).toMatch(/^(food|demo)-[a-z0-9-]+$/)
    expect(FOOD_FORMS).toContain(food.form)
    for (const diet of food.suits) expect(DIETS).toContain(diet)
    expect(food.energyKcalPerMl).toBeGreaterThan(0.05)
    expect(food.energyKcalPerMl).toBeLessThan(9)
    expect(food.waterFraction).toBeGreaterThan(0.4)
    expect(food.waterFraction).toBeLessThan(1)
    expect(food.energyBandFraction).toBeGreaterThan(0)
    expect(food.energyBandFraction).toBeLessThan(1)
    expect(food.recipe !== null).toBe(food.form === 'slurry-powder')

    const holding = ['energyKcalPerMl', 'waterFraction', 'energyBandFraction', 'suits',
      ...(['proteinPercent', 'fatPercent', 'carbohydratePercent', 'calciumMgPerKg', 'phosphorusMgPerKg', 'recipe'] as const).filter(field => food[field] !== null)]
    expect(Object.keys(food.provenance).sort()).toEqual(holding.sort())
    for (const [field, { sourceKey, howRead }] of Object.entries(food.provenance)) {
      expect(sources.has(sourceKey), `${field}: ${sourceKey}`).toBe(true)
      expect(HOW_READ).toContain(howRead)
      expect(howRead === 'demo', field).toBe(sourceKey === 'demo')
    }
  })
  it('leave no diet without a powder', () => {
    const suited = new Set([...foods.values()].filter(food => food.recipe).flatMap(food => food.suits))
    expect([...suited].sort()).toEqual([...DIETS].sort())
  })
})
