import type { Diet, FoodItem } from '#shared/types/reference'
import { defineFood, type FoodRow } from '../../foodRecord'

const memory = (locator: string) => ({ sourceKey: 'memory', locator, howRead: 'memory' }) as const
const house = (locator: string, note?: string) => ({ sourceKey: 'house-rule', locator, howRead: 'house-rule', ...(note && { note }) }) as const
const usda = (row: string) => ({ sourceKey: 'usda-sr27', locator: row, howRead: 'restated' }) as const
const prey = { sourceKey: 'sacn2010', locator: 'Table 71-5, p. 1242', howRead: 'original' } as const

/** Printed kcal/g of insects counts chitin that few animals digest; nutrition sheet 12.2. */
const CHITIN = 0.92
const INSECT_BAND = { fraction: 0.25, origin: house('an older table differs by up to a quarter', 'sacn2010, Table 71-5: mealworm 2.1, waxworm 2.1, earthworm 0.5, crickets 1.0 and 1.9 kcal/g.') }
const TABLE_BAND = { fraction: 0.1, origin: house('foods of a national table vary by about a tenth') }
const PREY_BAND = { fraction: 0.15, origin: house('prey varies with its own last meal') }

const INSECT_EATERS: Diet[] = ['insectivore', 'omnivore']
const MEAT_EATERS: Diet[] = ['carnivore', 'omnivore', 'insectivore']
const PLANT_EATERS: Diet[] = ['herbivore', 'omnivore', 'granivore']

/** Row of Hand-Rearing Birds, Table 41.1: printed kcal/g, moisture, protein and fat in %, calcium and phosphorus in mg/kg. */
function invertebrate(id: string, name: string, printed: number, moisture: number, protein: number, fat: number, minerals: { calcium?: number, phosphorus?: number } = {}, notes: string[] = []): FoodRow {
  const table = { sourceKey: 'hrb2020', locator: 'Table 41.1', howRead: 'original' } as const
  return {
    id, name, form: 'solid', protein, fat, composition: table, ...minerals, minerals: { ...memory('Finke 2002, mg/kg as fed'), sourceKey: 'finke2002' },
    energy: { kcalPerMl: Math.round(printed * CHITIN * 1000) / 1000, origin: { sourceKey: 'hrb2020', locator: `Table 41.1, ${printed.toFixed(2)} kcal/g x ${CHITIN}`, howRead: 'computed', note: 'Times 0.92 for chitin: a house rule.' } },
    water: { fraction: Math.round(moisture * 10) / 1000, origin: table }, band: INSECT_BAND, suits: INSECT_EATERS, notes,
  }
}

const CALCIUM = 'Calcium to phosphorus about 0.1: calcium must be added.'

const invertebrates: FoodRow[] = [
  invertebrate('food-cricket-adult', 'House cricket, adult', 1.40, 69.2, 20.5, 6.8, { calcium: 407, phosphorus: 2950 }, [CALCIUM]),
  invertebrate('food-cricket-nymph', 'House cricket, nymph', 0.95, 77.1, 15.4, 3.3, { calcium: 275, phosphorus: 2520 }, [CALCIUM]),
  invertebrate('food-mealworm', 'Mealworm', 2.05, 61.9, 18.7, 13.4, { calcium: 169, phosphorus: 2850 }, [CALCIUM]),
  invertebrate('food-superworm', 'Superworm', 2.42, 57.9, 19.7, 17.7, { calcium: 177, phosphorus: 2370 }, [CALCIUM]),
  invertebrate('food-waxworm', 'Waxworm', 2.75, 58.5, 14.1, 24.9, { calcium: 243, phosphorus: 1950 }, [CALCIUM]),
  invertebrate('food-silkworm', 'Silkworm', 0.67, 82.7, 9.3, 1.4),
  invertebrate('food-butterworm', 'Butterworm', 2.98, 60.2, 15.5, 29.4),
  invertebrate('food-bsf', 'Black soldier fly larva', 1.99, 61.2, 17.5, 14.0, { calcium: 9340 }, ['Rich in calcium.']),
  invertebrate('food-roach-nymph', 'Rusty red roach, nymph', 1.60, 69.1, 19.0, 10.0),
  invertebrate('food-fruitfly', 'Fruit fly', 1.37, 69.1, 21.0, 5.9),
  invertebrate('food-woodlouse', 'Woodlouse', 0.83, 67.8, 13.3, 3.7, {}, ['Very rich in calcium.']),
  invertebrate('food-earthworm', 'Earthworm', 0.71, 83.6, 10.5, 1.6, { calcium: 444, phosphorus: 1590 }),
]

/** Row of the national table: kcal, water, protein, fat and carbohydrate in g, calcium and phosphorus in mg, all per 100 g. */
function table(id: string, name: string, row: string, [kcal, water, protein, fat, carbohydrate, calcium, phosphorus]: [number, number, number, number, number, number, number], suits: Diet[], notes: string[] = []): FoodRow {
  const origin = usda(row)
  return {
    id, name, form: 'solid', energy: { kcalPerMl: kcal / 100, origin }, water: { fraction: Math.round(water * 100) / 10_000, origin },
    protein, fat, carbohydrate, composition: origin, calcium: calcium * 10, phosphorus: phosphorus * 10, minerals: origin, band: TABLE_BAND, suits, notes,
  }
}

const eggs: FoodRow[] = [
  table('food-egg-yolk', 'Hen egg yolk, raw', '01125 egg, yolk, raw', [322, 52.31, 15.86, 26.54, 3.59, 129, 390], MEAT_EATERS),
  table('food-egg-whole', 'Hen egg, whole, raw', '01123 egg, whole, raw', [143, 76.15, 12.56, 9.51, 0.72, 56, 198], MEAT_EATERS),
  table('food-egg-white', 'Hen egg white, raw', '01124 egg, white, raw', [52, 87.57, 10.9, 0.17, 0.73, 7, 15], MEAT_EATERS),
]

const greens: FoodRow[] = [
  table('food-greens-watercress', 'Watercress', '11591 watercress, raw', [11, 95.11, 2.3, 0.1, 1.29, 120, 60], PLANT_EATERS),
  table('food-greens-romaine', 'Romaine lettuce', '11251 lettuce, cos or romaine, raw', [17, 94.61, 1.23, 0.3, 3.29, 33, 30], PLANT_EATERS),
  table('food-greens-endive', 'Endive', '11213 endive, raw', [17, 93.79, 1.25, 0.2, 3.35, 52, 28], PLANT_EATERS),
  table('food-greens-spinach', 'Spinach', '11457 spinach, raw', [23, 91.4, 2.86, 0.39, 3.63, 99, 49], PLANT_EATERS, ['Binds calcium: seldom, not daily.']),
  table('food-greens-chicory', 'Chicory leaves', '11152 chicory greens, raw', [23, 92, 1.7, 0.3, 4.7, 100, 47], PLANT_EATERS),
  table('food-greens-mustard', 'Mustard greens', '11270 mustard greens, raw', [27, 90.7, 2.86, 0.42, 4.67, 115, 58], PLANT_EATERS),
  table('food-greens-collard', 'Collard greens', '11161 collards, raw', [32, 89.62, 3.02, 0.61, 5.42, 232, 25], PLANT_EATERS),
  table('food-greens-turnip', 'Turnip greens', '11568 turnip greens, raw', [32, 89.67, 1.5, 0.3, 7.13, 190, 42], PLANT_EATERS),
  table('food-greens-dandelion', 'Dandelion leaves', '11207 dandelion greens, raw', [45, 85.6, 2.7, 0.7, 9.2, 187, 66], PLANT_EATERS),
  table('food-greens-kale', 'Kale', '11233 kale, raw', [49, 84.04, 4.28, 0.93, 8.75, 150, 92], PLANT_EATERS),
  {
    id: 'food-greens', name: 'Leafy greens, mix not known', form: 'solid', suits: PLANT_EATERS, notes: ['Greens differ fourfold: pick the plant if you can.'],
    energy: { kcalPerMl: 0.25, origin: house('unknown mix; 0.11 to 0.49 kcal/g by plant') }, water: { fraction: 0.91, origin: house('84 to 95 % by plant') },
    band: { fraction: 0.6, origin: house('0.11 to 0.49 kcal/g by plant') },
  },
  table('food-pumpkin', 'Pumpkin, canned, plain', '11424 pumpkin, canned, without salt', [34, 89.97, 1.1, 0.28, 8.09, 26, 35], PLANT_EATERS),
  table('food-squash-babyfood', 'Strained squash baby food, plain', '03104 baby food, vegetables, squash, strained', [28, 92.66, 0.81, 0.2, 5.73, 24, 21], PLANT_EATERS),
]

/** Energy from the national table, water from memory unless it was read too; composition not read. */
function meat(id: string, name: string, row: string, kcalPerG: number, water: number, waterRead: 'read' | 'memory', suits: Diet[] = MEAT_EATERS, notes: string[] = []): FoodRow {
  return {
    id, name, form: 'solid', energy: { kcalPerMl: kcalPerG, origin: usda(row) }, water: { fraction: water, origin: waterRead === 'read' ? usda(row) : memory('water of raw meat and fish') },
    band: TABLE_BAND, suits, notes,
  }
}

const PLAIN_ONLY = 'Without onion or garlic.'

const meats: FoodRow[] = [
  meat('food-meat-babyfood', 'Strained chicken baby food', 'baby food, meat, chicken, strained', 1.30, 0.775, 'read', MEAT_EATERS, [PLAIN_ONLY]),
  meat('food-meat-babyfood-turkey', 'Strained turkey baby food', 'baby food, meat, turkey, strained', 1.11, 0.803, 'read', MEAT_EATERS, [PLAIN_ONLY]),
  meat('food-meat-babyfood-beef', 'Strained beef baby food', 'baby food, meat, beef, strained', 0.81, 0.824, 'read', MEAT_EATERS, [PLAIN_ONLY]),
  meat('food-ground-beef', 'Ground beef, 95 % lean, raw', 'beef, ground, 95 % lean, raw', 1.31, 0.73, 'memory'),
  meat('food-beef-heart', 'Beef heart, raw', 'beef, heart, raw', 1.12, 0.77, 'memory'),
  meat('food-ground-chicken', 'Ground chicken, raw', 'chicken, ground, raw', 1.43, 0.73, 'memory'),
  meat('food-chicken-heart', 'Chicken heart, raw', 'chicken, heart, raw', 1.53, 0.74, 'memory'),
  meat('food-quail-meat', 'Quail meat, raw', 'quail, meat only, raw', 1.34, 0.70, 'memory'),
  meat('food-rabbit-meat', 'Rabbit meat, raw', 'rabbit, domesticated, raw', 1.36, 0.73, 'memory'),
  meat('food-smelt', 'Smelt, raw', 'fish, smelt, rainbow, raw', 0.97, 0.79, 'memory', ['carnivore', 'omnivore'], ['Frozen smelt needs thiamine added.']),
  meat('food-herring', 'Herring, raw', 'fish, herring, Atlantic, raw', 1.58, 0.72, 'memory', ['carnivore', 'omnivore'], ['Frozen herring needs thiamine added.']),
]

/** Whole prey as fed, kcal/g and water fraction as printed. */
function wholePrey(id: string, name: string, kcalPerG: number, water: number, notes: string[] = []): FoodRow {
  return { id, name, form: 'solid', energy: { kcalPerMl: kcalPerG, origin: prey }, water: { fraction: water, origin: prey }, band: PREY_BAND, suits: ['carnivore', 'omnivore'], notes }
}

const wholeAnimals: FoodRow[] = [
  { ...wholePrey('food-pinky-mouse', 'Newborn mouse of about 1.5 g', 0.8, 0.81), protein: 12, fat: 3.5, composition: memory('newborn mouse') },
  wholePrey('food-pinky-mouse-4g', 'Nestling mouse of about 4 g, full of milk', 1.7, 0.71, ['69 % of its energy is fat.']),
  { ...wholePrey('food-adult-mouse', 'Adult mouse', 1.7, 0.65), protein: 18, fat: 8, composition: memory('adult mouse') },
  wholePrey('food-adult-rat', 'Adult rat', 1.6, 0.66),
  { ...wholePrey('food-day-chick', 'Day-old chick', 1.3, 0.73), protein: 17, fat: 6, composition: memory('day-old chick') },
]

function milk(id: string, name: string, kcalPerMl: number, locator: string, water: number, suits: Diet[], notes: string[]): FoodRow {
  return { id, name, form: 'liquid', energy: { kcalPerMl, origin: { sourceKey: 'milks', locator, howRead: 'restated' } }, water: { fraction: water, origin: memory('water of milk, by volume') }, band: TABLE_BAND, suits, notes }
}

const milks: FoodRow[] = [
  milk('food-milk-ferret', 'Ferret milk, for comparison', 1.29, '5,400 kJ/L', 0.78, ['carnivore'], ['What a ferret\'s young get: a yardstick for a replacer.']),
  milk('food-milk-dog', 'Dog milk, for comparison', 1.30, '5,440 kJ/L', 0.79, ['carnivore', 'omnivore'], ['What puppies get: a yardstick for a replacer.']),
  milk('food-kitten-formula', 'Kitten milk replacer, made up', 0.74, 'kitten formula 0.74 kcal/mL, after Lawler 2008', 0.83, ['carnivore', 'insectivore'], []),
  milk('food-milk-cow', 'Cow\'s milk, for comparison', 0.63, '2,620 kJ/L', 0.88, [], ['Not for young wild animals.']),
]

/** Three recovery powders of our own invention; composition is of the feed made up to full strength, % by weight. */
function slurry(id: string, name: string, recipe: { powderG: number, waterMl: number, madeUpMl: number, energyKcalPerPowderG: number }, [protein, fat, carbohydrate]: [number, number, number], suits: Diet[]): FoodRow {
  return {
    id, name, form: 'slurry-powder', recipe, protein, fat, carbohydrate, composition: { sourceKey: 'demo', locator: 'invented recipe', howRead: 'demo' },
    water: { fraction: Math.round(recipe.waterMl / recipe.madeUpMl * 1000) / 1000, origin: { sourceKey: 'demo', locator: 'water over what it makes', howRead: 'demo' } },
    band: { fraction: 0.1, origin: house('a label\'s energy figure, either way') }, suits, notes: ['Invented for the demonstration. Use the label of the feed in your hand.'],
  }
}

const slurries: FoodRow[] = [
  slurry('demo-insectivore-slurry', 'Insect-eater recovery powder (demonstration)', { powderG: 20, waterMl: 87, madeUpMl: 100, energyKcalPerPowderG: 4.5 }, [8.6, 5.4, 2.2], ['insectivore', 'carnivore']),
  slurry('demo-omnivore-slurry', 'All-eater recovery powder (demonstration)', { powderG: 30, waterMl: 80, madeUpMl: 100, energyKcalPerPowderG: 4 }, [8.2, 4.1, 13.1], ['omnivore', 'granivore', 'frugivore']),
  slurry('demo-herbivore-slurry', 'Plant-eater recovery powder (demonstration)', { powderG: 25, waterMl: 84, madeUpMl: 100, energyKcalPerPowderG: 3.2 }, [4.6, 1.1, 13.5], ['herbivore']),
]

/**
 * Foods of edition 2026-12: three invented recovery powders, then invertebrates, prey, eggs, meats and fish, plants, milks.
 *
 * @source nutrition sheet 9 with corrections F; see each `provenance`
 * @example foods.find(food => food.id === 'food-mealworm')!.energyKcalPerMl // 1.886
 */
export const foods: readonly FoodItem[] = [...slurries, ...invertebrates, ...wholeAnimals, ...eggs, ...meats, ...greens, ...milks].map(defineFood)
