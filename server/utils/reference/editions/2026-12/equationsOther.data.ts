import { cited } from '../../record'
import { defineEquation } from '../../defineEquation'
import { GROUPS, type EquationItem, type Group } from '#shared/types/reference'
import { bodyLength, kilograms } from './equationDrafts'

const PLAIN = { basis: null, holdsAtC: null, temperatureTerm: 'none' } as const
const EVERY_GROUP: Group[] = [...GROUPS]
const WEIGHT_G = { name: 'M', meaning: 'body weight', unit: 'g', low: 0.01, high: 2000000 }
const SNOUT_VENT = 'length from snout to vent'

/** Maintenance fluid that follows weight, nutrition sheet 6.1. */
export const fluidEquations: EquationItem[] = [
  defineEquation({ ...PLAIN, id: 'fluid-cat-80', topic: 'fluid', title: 'Maintenance fluid of cats', expression: '80 * M ^ 0.75', variables: [kilograms(0.05, 15)], taxon: 'cats', groups: ['mammal-placental'], speciesIds: ['sp-cat'], resultUnit: 'mL/day', provenance: { sourceKey: 'aaha2013', locator: 'maintenance tables', howRead: 'original' }, notes: ['Rule of thumb beside it: 2 to 3 mL/kg/h. A ceiling for an animal that does not eat.'] }),
  defineEquation({ ...PLAIN, id: 'fluid-dog-132', topic: 'fluid', title: 'Maintenance fluid of dogs', expression: '132 * M ^ 0.75', variables: [kilograms(0.05, 120)], taxon: 'dogs', groups: ['mammal-placental'], speciesIds: ['sp-dog'], resultUnit: 'mL/day', provenance: { sourceKey: 'aaha2013', locator: 'maintenance tables', howRead: 'original' }, notes: ['Rule of thumb beside it: 2 to 6 mL/kg/h. A ceiling for an animal that does not eat.'] }),
  defineEquation({ ...PLAIN, id: 'fluid-30m70', topic: 'fluid', title: 'Maintenance fluid of dogs and cats, straight-line form', expression: '30 * M + 70', variables: [kilograms(2, 45)], taxon: 'dogs and cats of 2 to 45 kg', groups: ['mammal-placental'], speciesIds: ['sp-cat', 'sp-dog'], resultUnit: 'mL/day', provenance: { sourceKey: 'memory', locator: 'texts on fluid therapy', howRead: 'memory' } }),
]

/** Pooled weight from length, nutrition sheet 7.2: last resort, half to double. */
const pooled = (id: string, title: string, expression: string, groups: Group[], measure: string, high: number, sourceKey: string, locator: string, notes: string[] = []): EquationItem =>
  defineEquation({ ...PLAIN, id, topic: 'length', title, expression, variables: [bodyLength(measure, 'm', 0.005, high)], taxon: groups.join(', '), groups, resultUnit: 'g', provenance: { sourceKey, locator, howRead: 'restated' }, notes: ['One line through many species: a last resort, true to about half or double.', ...notes] })

const pooledLengthEquations: EquationItem[] = [
  pooled('lm-lizard', 'Weight of a lizard from its length, all lizards pooled', '16368.17 * L ^ 3.022', ['lizard'], SNOUT_VENT, 1.5, 'meiri2010', 'log10 g = -4.852 + 3.022 log10 mm, more than 900 species', ['Legless lizards are lighter, sit-and-wait hunters heavier: a leopard gecko of 110 mm comes out at 21 g and should weigh 45 to 60 g.']),
  pooled('lm-salamander', 'Weight of a salamander from its length', '13654.4 * L ^ 2.94', ['amphibian-caudate'], SNOUT_VENT, 1.5, 'pough1980', 'salamanders'),
  pooled('lm-frog', 'Weight of a frog or toad from its length', '181197.1 * L ^ 3.24', ['amphibian-anuran'], SNOUT_VENT, 0.5, 'pough1980', 'frogs'),
  pooled('lm-snake', 'Weight of a snake from its length', '723.6756 * L ^ 3.02', ['snake'], SNOUT_VENT, 10, 'pough1980', 'snakes', ['Live-bearing snakes are heavier, tree snakes lighter. Clade equations exist (Feldman & Meiri 2013); their coefficients were not seen.']),
  pooled('lm-turtle', 'Weight of a tortoise or turtle from its shell length', '93554.48 * L ^ 2.69', ['chelonian'], 'straight length of the upper shell', 2.5, 'pough1980', 'turtles, carapace length'),
]

/** One line per family of lizards: clade, intercept (log10 g) and slope over log10 mm from snout to vent. */
const CLADES: [string, number, number][] = [
  ['Anolis', -4.574, 2.942],
  ['Chamaeleonidae', -3.997, 2.68],
  ['Diplodactylidae', -4.804, 3.057],
  ['Eublepharidae', -5.201, 3.255],
  ['Gekkonidae', -4.242, 2.761],
  ['Iguanidae', -4.298, 2.972],
  ['Lacertidae', -4.543, 2.951],
  ['Legged Scincidae', -5.125, 3.229],
  ['Limbless anguids', -5.224, 2.892],
  ['Teiidae', -4.747, 3.11],
  ['Typical Agamidae', -4.686, 3.105],
  ['Varanidae', -5.301, 3.235],
]

function cladeEquation([clade, intercept, slope]: [string, number, number]): EquationItem {
  const constant = (value: number, unit: string, meaning: string) => ({ cited: cited({ value, unit, sourceKey: 'meiri2018', locator: `clade equation, ${clade}`, howRead: 'restated' }), meaning })
  return defineEquation({
    ...PLAIN, id: `lm-clade-${clade.toLowerCase().replaceAll(' ', '-')}`, topic: 'length', title: `Weight from length, ${clade}`,
    expression: '10 ^ (a + b * log10(L))', variables: [bodyLength(SNOUT_VENT, 'mm', 5, 2000)],
    constants: { a: constant(intercept, 'log10 g', 'intercept'), b: constant(slope, 'log10 g per log10 mm', 'slope') },
    taxon: clade, groups: ['lizard'], resultUnit: 'g',
    provenance: { sourceKey: 'meiri2018', locator: `clade equation, ${clade}; credited there to Feldman et al. 2016`, howRead: 'restated' },
    notes: ['For animals of this family only.'],
  })
}

/** Weight from length. */
export const lengthEquations: EquationItem[] = [...pooledLengthEquations, ...CLADES.map(cladeEquation)]

/** Indices of condition, nutrition sheet 7.2, and energy of a feed from what is in it, sections 9 and 10. */
export const indexEquations: EquationItem[] = [
  defineEquation({ ...PLAIN, id: 'scaled-mass-index', topic: 'index', title: 'Weight it would have at a reference length', expression: 'M * (L0 / L) ^ b', variables: [WEIGHT_G, bodyLength('body length', 'mm', 1, 20000), { name: 'L0', meaning: 'reference length, measured the same way', unit: 'mm', low: 1, high: 20000 }, { name: 'b', meaning: 'exponent of weight on length for the species', unit: 'exponent', low: 1, high: 5 }], taxon: 'any animal, with an exponent of its own kind', groups: EVERY_GROUP, resultUnit: 'g', provenance: { sourceKey: 'peig2009', locator: 'scaled mass index; published code', howRead: 'original' }, notes: ['The exponent is the slope of the standardised major axis of ln weight on ln length.', 'Both lengths in the same unit; any will do.'] }),
  defineEquation({ ...PLAIN, id: 'fulton-k', topic: 'index', title: 'Weight over length cubed', expression: 'M / L ^ 3', variables: [WEIGHT_G, bodyLength('body length', 'cm', 0.1, 2000)], taxon: 'any animal', groups: EVERY_GROUP, resultUnit: 'g/cm3', provenance: { sourceKey: 'peig2010', locator: 'criticised there', howRead: 'restated' }, notes: ['Fails where shape changes with size.'] }),
  defineEquation({ ...PLAIN, id: 'relative-condition', topic: 'index', title: 'Weight over the weight expected for its length', expression: 'M / (a * L ^ b)', variables: [WEIGHT_G, bodyLength('body length', 'mm', 1, 20000), { name: 'a', meaning: 'weight at 1 mm by the line of its kind', unit: 'g', low: 1e-12, high: 1000 }, { name: 'b', meaning: 'exponent of weight on length for its kind', unit: 'exponent', low: 1, high: 5 }], taxon: 'any animal, with a line of its own kind', groups: EVERY_GROUP, resultUnit: 'ratio', provenance: { sourceKey: 'peig2010', locator: 'relative condition', howRead: 'restated' }, notes: ['1 is as expected.'] }),
  defineEquation({ ...PLAIN, id: 'jackson-ratio', topic: 'index', title: 'Weight over shell length cubed, for two tortoises', expression: 'M / L ^ 3', variables: [WEIGHT_G, bodyLength('straight length of the upper shell', 'cm', 2, 60)], taxon: 'Hermann\'s and spur-thighed tortoise', groups: ['chelonian'], speciesIds: ['sp-t-hermanni', 'sp-t-graeca'], resultUnit: 'g/cm3', provenance: { sourceKey: 'jackson1980', locator: 'restated on keeper pages', howRead: 'restated' }, notes: ['0.18 to 0.22 is usual, about 0.21 aimed at. Bladder water or eggs shift it, and a fat sick animal can pass.'] }),
]

const percent = (name: 'P' | 'F' | 'C', what: string) => ({ name, meaning: `${what} of the feed as fed`, unit: '%', low: 0, high: 100 })
const COMPOSITION = [percent('P', 'protein'), percent('F', 'fat'), percent('C', 'carbohydrate')]

/** Energy of a feed from its composition. An index, not an animal's energy: it gives kcal per g. */
export const feedEnergyEquations: EquationItem[] = [
  defineEquation({ ...PLAIN, id: 'atwater-modified', topic: 'index', title: 'Energy of a feed from its composition, pet-food factors', expression: '(3.5 * P + 8.5 * F + 3.5 * C) / 100', variables: COMPOSITION, taxon: 'feeds', groups: EVERY_GROUP, resultUnit: 'kcal/g', provenance: { sourceKey: 'sacn2010', locator: 'modified Atwater factors 3.5, 8.5, 3.5', howRead: 'restated' }, notes: ['Taken as kcal per mL at 1 g/mL.'] }),
  defineEquation({ ...PLAIN, id: 'atwater', topic: 'index', title: 'Energy of a feed from its composition, factors for people', expression: '(4 * P + 9 * F + 4 * C) / 100', variables: COMPOSITION, taxon: 'feeds', groups: EVERY_GROUP, resultUnit: 'kcal/g', provenance: { sourceKey: 'atwater1900', locator: 'general factors 4, 9, 4', howRead: 'memory' }, notes: ['Runs high for animals, insect-eaters most of all.'] }),
]
