import type { SpeciesRow } from '../../../speciesRecord'

/** Salamanders and newts. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const caudates: SpeciesRow[] = [
  {
    id: 'sp-axolotl', commonName: 'Axolotl', scientificName: 'Ambystoma mexicanum', diet: 'carnivore', activity: 'nocturnal',
    weightG: [80, 250], weightRead: 'memory', lengthMm: [200, 280, 'total'],
    feedC: [14, 18, 'water'], notes: ['Harmed above 24 °C.'],
  },
  {
    id: 'sp-tiger-salamander', commonName: 'Tiger salamander', scientificName: 'Ambystoma tigrinum', diet: 'carnivore', activity: 'nocturnal',
    weightG: [30, 120], weightRead: 'restated', weightsPublished: { anage: 9.402, oliveira2017: 79 }, lengthMm: [180, 250, 'total'],
    feedC: [15, 22, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-fire-salamander', commonName: 'Fire salamander', scientificName: 'Salamandra salamandra', diet: 'insectivore', activity: 'nocturnal',
    weightG: [15, 45], weightRead: 'restated', weightsPublished: { anage: 19.1, oliveira2017: 35.8 }, lengthMm: [140, 220, 'total'],
    feedC: [12, 20, 'ambient'], notes: ['Toxin.'],
  },
  {
    id: 'sp-great-crested-newt', commonName: 'Great crested newt', scientificName: 'Triturus cristatus', diet: 'insectivore', activity: 'nocturnal',
    weightG: [6, 14], weightRead: 'restated', weightsPublished: { oliveira2017: 15 }, lengthMm: [110, 160, 'total'],
    feedC: [12, 20, 'ambient'], notes: ['Protected.'],
  },
  // From memory throughout.
  {
    id: 'sp-smooth-newt', commonName: 'Smooth newt', scientificName: 'Lissotriton vulgaris', diet: 'insectivore', activity: 'nocturnal',
    weightG: [1.5, 3.5], weightRead: 'memory', lengthMm: [70, 105, 'total'],
    feedC: [12, 20, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-marbled-newt', commonName: 'Marbled newt', scientificName: 'Triturus marmoratus', diet: 'insectivore', activity: 'nocturnal',
    weightG: [6, 14], weightRead: 'memory', lengthMm: [110, 160, 'total'],
    feedC: [13, 20, 'ambient'], notes: ['Water through the skin.'],
  },
  {
    id: 'sp-ribbed-newt', commonName: 'Iberian ribbed newt', scientificName: 'Pleurodeles waltl', diet: 'carnivore', activity: 'nocturnal',
    weightG: [12, 40], weightRead: 'memory', lengthMm: [150, 280, 'total'],
    feedC: [15, 21, 'water'], notes: ['Lives in water.'],
  },
  {
    id: 'sp-fire-bellied-newt', commonName: 'Japanese fire-bellied newt', scientificName: 'Cynops pyrrhogaster', diet: 'carnivore', activity: 'nocturnal',
    weightG: [3, 8], weightRead: 'memory', lengthMm: [80, 130, 'total'],
    feedC: [14, 20, 'water'], notes: ['Toxin.'],
  },
  {
    id: 'sp-spotted-salamander', commonName: 'Spotted salamander', scientificName: 'Ambystoma maculatum', diet: 'insectivore', activity: 'nocturnal',
    weightG: [12, 35], weightRead: 'memory', lengthMm: [150, 230, 'total'],
    feedC: [13, 20, 'ambient'], notes: ['Water through the skin.'],
  },
]
