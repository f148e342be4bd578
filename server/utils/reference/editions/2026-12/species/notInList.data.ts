import type { Group } from '#shared/types/reference'
import type { SpeciesRow } from '../../../speciesRecord'

const NOTE = 'Not in the list: the ranges are wide. Look its temperature up before you feed.'
const entry = (id: string, commonName: string, own: Omit<SpeciesRow, 'id' | 'commonName' | 'scientificName' | 'weightRead' | 'notInList' | 'notes'>): SpeciesRow =>
  ({ id, commonName, scientificName: 'species not in the list', weightRead: 'house-rule', notInList: true, notes: [NOTE], ...own })

/** One entry per group for a species that is not in the list. Ranges are ours and wide. */
export const notInList: Record<Group, SpeciesRow> = {
  'lizard': entry('sp-other-lizard', 'Other lizard', { diet: 'omnivore', activity: 'diurnal', weightG: [1, 10_000], feedC: [27, 33, 'body'] }),
  'snake': entry('sp-other-snake', 'Other snake', { diet: 'carnivore', activity: 'nocturnal', weightG: [10, 30_000], feedC: [27, 32, 'body'] }),
  'chelonian': entry('sp-other-chelonian', 'Other tortoise or turtle', { diet: 'omnivore', activity: 'diurnal', weightG: [30, 100_000], feedC: [25, 30, 'body'] }),
  'crocodilian': entry('sp-other-crocodilian', 'Other crocodilian', { diet: 'carnivore', activity: 'nocturnal', weightG: [500, 300_000], feedC: [28, 33, 'body'] }),
  'amphibian-anuran': entry('sp-other-anuran', 'Other frog or toad', { diet: 'insectivore', activity: 'nocturnal', weightG: [1, 1_000], feedC: [18, 24, 'ambient'] }),
  'amphibian-caudate': entry('sp-other-caudate', 'Other salamander or newt', { diet: 'carnivore', activity: 'nocturnal', weightG: [1, 1_000], feedC: [13, 18, 'ambient'] }),
  'bird-passerine': entry('sp-other-passerine', 'Other songbird', { diet: 'insectivore', activity: 'diurnal', hasCrop: false, weightG: [5, 1_500], bodyC: 41, airC: [28, 32] }),
  'bird-other': entry('sp-other-bird', 'Other bird', { diet: 'omnivore', activity: 'diurnal', hasCrop: false, weightG: [15, 15_000], bodyC: 40.5, airC: [24, 29] }),
  'mammal-placental': entry('sp-other-placental', 'Other mammal', { diet: 'omnivore', activity: 'nocturnal', weightG: [3, 60_000], bodyC: 37.5, airC: [22, 27] }),
  'mammal-marsupial': entry('sp-other-marsupial', 'Other marsupial', { diet: 'omnivore', activity: 'nocturnal', weightG: [10, 60_000], bodyC: 36, airC: [22, 27] }),
}
