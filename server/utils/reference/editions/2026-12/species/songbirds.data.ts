import type { SpeciesRow } from '../../../speciesRecord'

/** Songbirds. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const songbirds: SpeciesRow[] = [
  {
    id: 'sp-house-sparrow', commonName: 'House sparrow', scientificName: 'Passer domesticus', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 60 %, plants 30 %, invertebrates 10 %'],
    weightG: [24, 34], weightRead: 'restated', weightsPublished: { myhrvold2015: 27.7, anage: 25.3, wilman2014: 26.51 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-zebra-finch', commonName: 'Zebra finch', scientificName: 'Taeniopygia guttata', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 100 %'],
    weightG: [11, 16], weightRead: 'restated', weightsPublished: { myhrvold2015: 11.933, anage: 12, wilman2014: 12.04 },
    bodyC: 41.5, bodyPublishedC: 41, airC: [28, 32],
  },
  {
    id: 'sp-canary', commonName: 'Canary', scientificName: 'Serinus canaria', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 70 %, invertebrates 10 %, fruit 10 %, plants 10 %'],
    weightG: [15, 25], weightRead: 'restated', weightsPublished: { myhrvold2015: 21, anage: 24.3, wilman2014: 24.3 },
    bodyC: 41.5, bodyPublishedC: 41, airC: [28, 32],
  },
  {
    id: 'sp-robin', commonName: 'European robin', scientificName: 'Erithacus rubecula', diet: 'insectivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 40 %, vertebrates 30 %, fruit 20 %, seed 10 %'],
    weightG: [14, 22], weightRead: 'restated', weightsPublished: { myhrvold2015: 17.55, anage: 17.3, wilman2014: 17.7 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-blue-tit', commonName: 'Eurasian blue tit', scientificName: 'Cyanistes caeruleus', diet: 'insectivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 50 %, fruit 20 %, seed 20 %, nectar 10 %'],
    weightG: [9, 12], weightRead: 'restated', weightsPublished: { myhrvold2015: 11.2, anage: 10.3, wilman2014: 13.3 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-great-tit', commonName: 'Great tit', scientificName: 'Parus major', diet: 'insectivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 40 %, fruit 20 %, seed 20 %, vertebrates 10 %, nectar 10 %'],
    weightG: [15, 21], weightRead: 'restated', weightsPublished: { myhrvold2015: 18, anage: 17.9, wilman2014: 16.25 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-blackbird', commonName: 'Common blackbird', scientificName: 'Turdus merula', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 50 %, fruit 20 %, seed 20 %, vertebrates 10 %'],
    weightG: [80, 120], weightRead: 'restated', weightsPublished: { myhrvold2015: 102, anage: 103.2, wilman2014: 102.73 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-song-thrush', commonName: 'Song thrush', scientificName: 'Turdus philomelos', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 40 %, fruit 30 %, seed 30 %'],
    weightG: [60, 95], weightRead: 'restated', weightsPublished: { myhrvold2015: 68.8, anage: 67.8, wilman2014: 67.74 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-american-robin', commonName: 'American robin', scientificName: 'Turdus migratorius', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 50 %, fruit 50 %'],
    weightG: [65, 90], weightRead: 'restated', weightsPublished: { myhrvold2015: 78.783, anage: 75.5, wilman2014: 78.5 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-starling', commonName: 'Common starling', scientificName: 'Sturnus vulgaris', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'fruit 30 %, invertebrates 20 %, vertebrates 20 %, seed 20 %, nectar 10 %'],
    weightG: [65, 95], weightRead: 'restated', weightsPublished: { myhrvold2015: 77.675, anage: 74, wilman2014: 77.14 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-barn-swallow', commonName: 'Barn swallow', scientificName: 'Hirundo rustica', diet: 'insectivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 80 %, fruit 10 %, seed 10 %'],
    weightG: [16, 22], weightRead: 'restated', weightsPublished: { myhrvold2015: 19, anage: 18.3, wilman2014: 17.91 },
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-magpie', commonName: 'Eurasian magpie', scientificName: 'Pica pica', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 60 %, invertebrates 20 %, fruit 10 %, seed 10 %'],
    weightG: [170, 260], weightRead: 'restated', weightsPublished: { myhrvold2015: 213.375, anage: 178, wilman2014: 217.48 },
    bodyC: 41.5, airC: [26, 30],
  },
  {
    id: 'sp-carrion-crow', commonName: 'Carrion crow', scientificName: 'Corvus corone', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 60 %, invertebrates 30 %, seed 10 %'],
    weightG: [400, 620], weightRead: 'restated', weightsPublished: { myhrvold2015: 544.5, anage: 472.7, wilman2014: 570 },
    bodyC: 41.5, airC: [26, 30],
  },
  {
    id: 'sp-raven', commonName: 'Common raven', scientificName: 'Corvus corax', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 60 %, invertebrates 10 %, fruit 10 %, seed 10 %, plants 10 %'],
    weightG: [800, 1500], weightRead: 'restated', weightsPublished: { myhrvold2015: 1097, anage: 1041.2, wilman2014: 927.97 },
    bodyC: 41.5, airC: [26, 30],
  },
  // From memory throughout.
  {
    id: 'sp-greenfinch', commonName: 'European greenfinch', scientificName: 'Chloris chloris', diet: 'granivore', activity: 'diurnal', hasCrop: true,
    weightG: [24, 34], weightRead: 'memory',
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-goldfinch', commonName: 'European goldfinch', scientificName: 'Carduelis carduelis', diet: 'granivore', activity: 'diurnal', hasCrop: true,
    weightG: [13, 19], weightRead: 'memory',
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-wren', commonName: 'Eurasian wren', scientificName: 'Troglodytes troglodytes', diet: 'insectivore', activity: 'diurnal', hasCrop: false,
    weightG: [7, 12], weightRead: 'memory',
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-house-martin', commonName: 'Common house martin', scientificName: 'Delichon urbicum', diet: 'insectivore', activity: 'diurnal', hasCrop: false,
    weightG: [15, 22], weightRead: 'memory',
    bodyC: 41.5, airC: [28, 32],
  },
  {
    id: 'sp-jackdaw', commonName: 'Western jackdaw', scientificName: 'Coloeus monedula', diet: 'omnivore', activity: 'diurnal', hasCrop: false,
    weightG: [190, 270], weightRead: 'memory',
    bodyC: 41.5, airC: [26, 30],
  },
]
