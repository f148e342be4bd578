import type { SpeciesRow } from '../../../speciesRecord'

/** Frogs and toads. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const anurans: SpeciesRow[] = [
  {
    id: 'sp-whites-frog', commonName: 'White\'s tree frog', scientificName: 'Litoria caerulea', diet: 'insectivore', activity: 'nocturnal',
    weightG: [30, 90], weightRead: 'restated', weightsPublished: { oliveira2017: 50 }, lengthMm: [70, 110, 'snout-vent'],
    feedC: [22, 28, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-horned-frog', commonName: 'Argentine horned frog', scientificName: 'Ceratophrys ornata', diet: 'carnivore', activity: 'nocturnal',
    weightG: [150, 450], weightRead: 'memory', lengthMm: [90, 150, 'snout-vent'],
    feedC: [24, 28, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-common-toad', commonName: 'Common toad', scientificName: 'Bufo bufo', diet: 'insectivore', activity: 'nocturnal',
    weightG: [20, 80], weightRead: 'memory', weightsPublished: { oliveira2017: 164.75 }, lengthMm: [60, 130, 'snout-vent'],
    feedC: [15, 22, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-common-frog', commonName: 'Common frog', scientificName: 'Rana temporaria', diet: 'insectivore', activity: 'nocturnal',
    weightG: [15, 45], weightRead: 'restated', weightsPublished: { oliveira2017: 47.6 }, lengthMm: [60, 90, 'snout-vent'],
    feedC: [12, 20, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-cane-toad', commonName: 'Cane toad', scientificName: 'Rhinella marina', diet: 'carnivore', activity: 'nocturnal',
    weightG: [100, 500], weightRead: 'restated', weightsPublished: { anage: 106.25, oliveira2017: 106.25 }, lengthMm: [90, 150, 'snout-vent'],
    feedC: [22, 29, 'ambient'], notes: ['Toxin.'],
  },
  {
    id: 'sp-bullfrog', commonName: 'American bullfrog', scientificName: 'Lithobates catesbeianus', diet: 'carnivore', activity: 'nocturnal',
    weightG: [150, 500], weightRead: 'restated', weightsPublished: { anage: 54.4, oliveira2017: 467.8 }, lengthMm: [100, 170, 'snout-vent'],
    feedC: [20, 27, 'ambient'], notes: ['Water through the skin.'],
  },
  // From memory throughout.
  {
    id: 'sp-clawed-frog', commonName: 'African clawed frog', scientificName: 'Xenopus laevis', diet: 'carnivore', activity: 'nocturnal',
    weightG: [35, 150], weightRead: 'memory', lengthMm: [60, 120, 'snout-vent'],
    feedC: [17, 22, 'water'], notes: ['Lives in water.'],
  },
  {
    id: 'sp-fire-bellied-toad', commonName: 'Oriental fire-bellied toad', scientificName: 'Bombina orientalis', diet: 'insectivore', activity: 'diurnal',
    weightG: [5, 12], weightRead: 'memory', lengthMm: [38, 55, 'snout-vent'],
    feedC: [18, 24, 'ambient'], notes: ['Toxin.'],
  },
  {
    id: 'sp-red-eyed-tree-frog', commonName: 'Red-eyed tree frog', scientificName: 'Agalychnis callidryas', diet: 'insectivore', activity: 'nocturnal',
    weightG: [5, 15], weightRead: 'memory', lengthMm: [45, 75, 'snout-vent'],
    feedC: [23, 28, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-european-tree-frog', commonName: 'European tree frog', scientificName: 'Hyla arborea', diet: 'insectivore', activity: 'nocturnal',
    weightG: [4, 9], weightRead: 'memory', lengthMm: [35, 50, 'snout-vent'],
    feedC: [18, 25, 'ambient'], notes: ['Water through the skin.', 'Protected.'],
  },
  {
    id: 'sp-natterjack', commonName: 'Natterjack toad', scientificName: 'Epidalea calamita', diet: 'insectivore', activity: 'nocturnal',
    weightG: [10, 30], weightRead: 'memory', lengthMm: [50, 80, 'snout-vent'],
    feedC: [16, 24, 'ambient'], notes: ['Protected.'],
  },
  {
    id: 'sp-dyeing-dart-frog', commonName: 'Dyeing dart frog', scientificName: 'Dendrobates tinctorius', diet: 'insectivore', activity: 'diurnal',
    weightG: [3, 7], weightRead: 'memory', lengthMm: [38, 52, 'snout-vent'],
    feedC: [22, 26, 'ambient'], notes: ['Water through the skin.'],
  },
]
