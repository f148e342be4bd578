import { describe, expect, it } from 'vitest'
import { equationNumber } from '#server/utils/calc/equation/evaluateEquation'
import { currentEdition } from '#server/utils/reference'

const { equations, foods } = currentEdition()
const energy = (id: string) => foods.get(id)!.energyKcalPerMl

/** kcal/g as printed in Hand-Rearing Birds, Table 41.1; moisture, protein and fat in %. */
const table41: [id: string, kcal: number, moisture: number, protein: number, fat: number][] = [
  ['food-cricket-adult', 1.40, 69.2, 20.5, 6.8],
  ['food-cricket-nymph', 0.95, 77.1, 15.4, 3.3],
  ['food-mealworm', 2.05, 61.9, 18.7, 13.4],
  ['food-superworm', 2.42, 57.9, 19.7, 17.7],
  ['food-waxworm', 2.75, 58.5, 14.1, 24.9],
  ['food-silkworm', 0.67, 82.7, 9.3, 1.4],
  ['food-butterworm', 2.98, 60.2, 15.5, 29.4],
  ['food-bsf', 1.99, 61.2, 17.5, 14.0],
  ['food-roach-nymph', 1.60, 69.1, 19.0, 10.0],
  ['food-fruitfly', 1.37, 69.1, 21.0, 5.9],
  ['food-woodlouse', 0.83, 67.8, 13.3, 3.7],
  ['food-earthworm', 0.71, 83.6, 10.5, 1.6],
]

describe('invertebrates (hrb2020, Table 41.1)', () => {
  it.each(table41)('%s is the printed %d kcal/g times 0.92, within a quarter', (id, kcal, moisture, protein, fat) => {
    const food = foods.get(id)!
    expect(food.energyKcalPerMl).toBeCloseTo(kcal * 0.92, 3)
    expect(food.energyBandFraction).toBe(0.25)
    expect(food).toMatchObject({ proteinPercent: protein, fatPercent: fat })
    expect(food.waterFraction).toBeCloseTo(moisture / 100, 9)
  })
  // Nutrition sheet 9: 4 x protein + 9 x fat reproduces the print within 5 % for nine of the twelve.
  it('are printed with the factors for people: 4 and 9 kcal/g reproduce nine of the twelve within 5 %', () => {
    const people = equations.get('atwater')!
    const near = table41.filter(([, kcal, , protein, fat]) => Math.abs(equationNumber(people, { P: protein, F: fat, C: 0 }) / kcal - 1) <= 0.05)
    expect(near).toHaveLength(9)
  })
  // Nutrition sheet 9: the factors for animals, 3.5 and 8.5, give 5 to 14 % less than the print for those nine.
  it('are printed generously: 3.5 and 8.5 kcal/g give less for the same nine, and the figure used lies in between', () => {
    const people = equations.get('atwater')!
    const animals = equations.get('atwater-modified')!
    const near = table41.filter(([, kcal, , protein, fat]) => Math.abs(equationNumber(people, { P: protein, F: fat, C: 0 }) / kcal - 1) <= 0.05)
    for (const [id, kcal, , protein, fat] of near) {
      const byAnimals = equationNumber(animals, { P: protein, F: fat, C: 0 })
      expect(byAnimals / kcal, id).toBeGreaterThan(0.855)
      expect(byAnimals / kcal, id).toBeLessThan(0.955)
      expect(Math.abs(byAnimals / energy(id) - 1), `${id} as used`).toBeLessThan(0.08)
    }
  })
})

describe('national table, release 27 (usda-sr27)', () => {
  it.each([
    ['food-egg-yolk', 3.22], ['food-egg-whole', 1.43], ['food-egg-white', 0.52],
    ['food-meat-babyfood', 1.30], ['food-meat-babyfood-turkey', 1.11], ['food-meat-babyfood-beef', 0.81],
    ['food-ground-beef', 1.31], ['food-beef-heart', 1.12], ['food-ground-chicken', 1.43], ['food-chicken-heart', 1.53],
    ['food-quail-meat', 1.34], ['food-rabbit-meat', 1.36], ['food-smelt', 0.97], ['food-herring', 1.58],
    ['food-pumpkin', 0.34], ['food-squash-babyfood', 0.28],
    ['food-greens-watercress', 0.11], ['food-greens-romaine', 0.17], ['food-greens-endive', 0.17], ['food-greens-spinach', 0.23], ['food-greens-chicory', 0.23],
    ['food-greens-mustard', 0.27], ['food-greens-collard', 0.32], ['food-greens-turnip', 0.32], ['food-greens-dandelion', 0.45], ['food-greens-kale', 0.49],
  ])('%s has %d kcal/g', (id, kcal) => expect(energy(id)).toBeCloseTo(kcal, 9))

  it('an unknown mix of greens lies between the leanest and the richest, and its band reaches neither in vain', () => {
    const greens = [...foods.values()].filter(food => food.id.startsWith('food-greens-')).map(food => food.energyKcalPerMl)
    const { energyKcalPerMl, energyBandFraction } = foods.get('food-greens')!
    expect(energyKcalPerMl * (1 - energyBandFraction)).toBeLessThanOrEqual(Math.min(...greens))
    expect(energyKcalPerMl).toBeLessThan(Math.max(...greens))
    expect(energyKcalPerMl).toBeGreaterThan(Math.min(...greens))
  })
})

describe('prey and milks', () => {
  // Hand et al. 2010, Table 71-5.
  it.each([['food-pinky-mouse', 0.8, 0.81], ['food-pinky-mouse-4g', 1.7, 0.71], ['food-adult-mouse', 1.7, 0.65], ['food-adult-rat', 1.6, 0.66], ['food-day-chick', 1.3, 0.73]])('%s has %d kcal/g and %d water', (id, kcal, water) => {
    expect(foods.get(id)).toMatchObject({ energyKcalPerMl: kcal, waterFraction: water })
  })
  // kJ per litre as printed.
  it.each([['food-milk-ferret', 5400], ['food-milk-dog', 5440], ['food-milk-cow', 2620]])('%s has %d kJ/L', (id, kilojoules) => {
    expect(energy(id)).toBeCloseTo(kilojoules / 4.184 / 1000, 2)
  })
  it('cow\'s milk is offered to no one', () => expect(foods.get('food-milk-cow')!.suits).toEqual([]))
})

describe('composition and energy of a table food agree', () => {
  // The national table uses factors of its own for each food; 4, 9, 4 stay near them.
  it.each([...foods.values()].filter(food => food.provenance.energyKcalPerMl!.sourceKey === 'usda-sr27' && food.carbohydratePercent !== null).map(food => [food.id, food] as const))('%s', (_id, food) => {
    const byComposition = equationNumber(equations.get('atwater')!, { P: food.proteinPercent!, F: food.fatPercent!, C: food.carbohydratePercent! })
    expect(byComposition / food.energyKcalPerMl).toBeGreaterThan(0.85)
    expect(byComposition / food.energyKcalPerMl).toBeLessThan(1.45)
    expect(food.waterFraction * 100 + food.proteinPercent! + food.fatPercent! + food.carbohydratePercent!).toBeLessThanOrEqual(100.05)
  })
})

describe('demonstration powders', () => {
  const powders = [...foods.values()].filter(food => food.recipe)
  it('are three, and nothing else is invented', () => {
    expect(powders.map(food => food.id)).toEqual(['demo-insectivore-slurry', 'demo-omnivore-slurry', 'demo-herbivore-slurry'])
    expect([...foods.values()].filter(food => food.demo)).toEqual(powders)
  })
  it.each(powders.map(food => [food.id, food] as const))('%s: energy, water and composition follow from its recipe', (_id, food) => {
    const { powderG, waterMl, madeUpMl, energyKcalPerPowderG } = food.recipe!
    expect(food.energyKcalPerMl).toBeCloseTo(energyKcalPerPowderG * powderG / madeUpMl, 9)
    expect(food.waterFraction).toBeCloseTo(waterMl / madeUpMl, 3)
    const displacementMlPerG = (madeUpMl - waterMl) / powderG
    expect(displacementMlPerG).toBeGreaterThanOrEqual(0.6)
    expect(displacementMlPerG).toBeLessThanOrEqual(0.7)
    const perG = equationNumber(equations.get('atwater-modified')!, { P: food.proteinPercent!, F: food.fatPercent!, C: food.carbohydratePercent! })
    const gramsPerMl = (powderG + waterMl) / madeUpMl
    expect(perG * gramsPerMl / food.energyKcalPerMl).toBeCloseTo(1, 1)
  })
})
