import type { SpeciesRow } from '../../../speciesRecord'

/** Tortoises and turtles. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const chelonians: SpeciesRow[] = [
  {
    id: 'sp-t-hermanni', commonName: 'Hermann\'s tortoise', scientificName: 'Testudo hermanni', diet: 'herbivore', activity: 'diurnal',
    weightG: [600, 2500], weightRead: 'restated', weightsPublished: { myhrvold2015: 1249 }, lengthMm: [130, 200, 'carapace'],
    feedC: [24, 32, 'body'], notes: ['Brumates.', 'Shell index applies.'],
  },
  {
    id: 'sp-t-graeca', commonName: 'Spur-thighed tortoise', scientificName: 'Testudo graeca', diet: 'herbivore', activity: 'diurnal',
    weightG: [700, 2500], weightRead: 'restated', weightsPublished: { myhrvold2015: 1430 }, lengthMm: [140, 220, 'carapace'],
    feedC: [24, 32, 'body'], notes: ['Brumates by race.', 'Shell index applies.'],
  },
  {
    id: 'sp-t-horsfieldii', commonName: 'Horsfield\'s tortoise', scientificName: 'Testudo horsfieldii', diet: 'herbivore', activity: 'diurnal',
    weightG: [500, 1200], weightRead: 'restated', weightsPublished: { myhrvold2015: 1018 }, lengthMm: [130, 200, 'carapace'],
    feedC: [24, 32, 'body'], notes: ['Brumates.'],
  },
  {
    id: 'sp-t-marginata', commonName: 'Marginated tortoise', scientificName: 'Testudo marginata', diet: 'herbivore', activity: 'diurnal',
    weightG: [1500, 5000], weightRead: 'restated', weightsPublished: { myhrvold2015: 1918 }, lengthMm: [220, 320, 'carapace'],
    feedC: [24, 32, 'body'], notes: ['Brumates.'],
  },
  {
    id: 'sp-red-footed', commonName: 'Red-footed tortoise', scientificName: 'Chelonoidis carbonarius', diet: 'omnivore', activity: 'diurnal',
    weightG: [3000, 9000], weightRead: 'memory', weightsPublished: { myhrvold2015: 2000 }, lengthMm: [250, 350, 'carapace'],
    feedC: [25, 31, 'body'], notes: ['Does not brumate.'],
  },
  {
    id: 'sp-sulcata', commonName: 'African spurred tortoise', scientificName: 'Centrochelys sulcata', diet: 'herbivore', activity: 'diurnal',
    weightG: [30000, 60000], weightRead: 'restated', weightsPublished: { myhrvold2015: 43000, anage: 43000 }, lengthMm: [450, 750, 'carapace'],
    feedC: [27, 35, 'body'], notes: ['Does not brumate.'],
  },
  {
    id: 'sp-leopard-tortoise', commonName: 'Leopard tortoise', scientificName: 'Stigmochelys pardalis', diet: 'herbivore', activity: 'diurnal',
    weightG: [8000, 20000], weightRead: 'restated', weightsPublished: { myhrvold2015: 20000 }, lengthMm: [300, 450, 'carapace'],
    feedC: [26, 33, 'body'], notes: ['Does not brumate.'],
  },
  {
    id: 'sp-gopher-tortoise', commonName: 'Gopher tortoise', scientificName: 'Gopherus polyphemus', diet: 'herbivore', activity: 'diurnal',
    weightG: [2500, 6000], weightRead: 'restated', weightsPublished: { myhrvold2015: 4142, anage: 5500 }, lengthMm: [220, 310, 'carapace'],
    feedC: [25, 33, 'body'], notes: ['Protected.'],
  },
  {
    id: 'sp-red-eared-slider', commonName: 'Red-eared slider', scientificName: 'Trachemys scripta', diet: 'omnivore', activity: 'diurnal',
    weightG: [400, 2500], weightRead: 'restated', weightsPublished: { myhrvold2015: 1854, anage: 240 }, lengthMm: [130, 280, 'carapace'],
    feedC: [25, 32, 'body'], notes: ['Feeds in water.'],
  },
  {
    id: 'sp-painted-turtle', commonName: 'Painted turtle', scientificName: 'Chrysemys picta', diet: 'omnivore', activity: 'diurnal',
    weightG: [250, 500], weightRead: 'restated', weightsPublished: { myhrvold2015: 371.8, anage: 371.8 }, lengthMm: [110, 170, 'carapace'],
    feedC: [23, 30, 'body'], notes: ['Feeds in water.'],
  },
  {
    id: 'sp-map-turtle', commonName: 'Common map turtle', scientificName: 'Graptemys geographica', diet: 'carnivore', activity: 'diurnal',
    weightG: [150, 2000], weightRead: 'restated', weightsPublished: { myhrvold2015: 1138 }, lengthMm: [90, 250, 'carapace'],
    feedC: [23, 30, 'body'], notes: ['Feeds in water.'],
  },
  {
    id: 'sp-musk-turtle', commonName: 'Common musk turtle', scientificName: 'Sternotherus odoratus', diet: 'omnivore', activity: 'nocturnal',
    weightG: [100, 300], weightRead: 'restated', weightsPublished: { myhrvold2015: 137.9 }, lengthMm: [80, 130, 'carapace'],
    feedC: [22, 29, 'body'], notes: ['Feeds in water.'],
  },
  {
    id: 'sp-snapping-turtle', commonName: 'Common snapping turtle', scientificName: 'Chelydra serpentina', diet: 'omnivore', activity: 'nocturnal',
    weightG: [4000, 15000], weightRead: 'restated', weightsPublished: { myhrvold2015: 5170, anage: 10250 }, lengthMm: [230, 400, 'carapace'],
    feedC: [22, 29, 'body'], notes: ['Bites.'],
  },
  {
    id: 'sp-european-pond-turtle', commonName: 'European pond turtle', scientificName: 'Emys orbicularis', diet: 'carnivore', activity: 'diurnal',
    weightG: [400, 1000], weightRead: 'memory', lengthMm: [130, 190, 'carapace'],
    feedC: [22, 29, 'body'], notes: ['Feeds in water.'],
  },
  {
    id: 'sp-box-turtle', commonName: 'Eastern box turtle', scientificName: 'Terrapene carolina', diet: 'omnivore', activity: 'diurnal',
    weightG: [300, 550], weightRead: 'restated', weightsPublished: { myhrvold2015: 372 }, lengthMm: [110, 160, 'carapace'],
    feedC: [22, 29, 'body'], notes: ['Brumates.'],
  },
  {
    id: 'sp-longneck', commonName: 'Eastern long-necked turtle', scientificName: 'Chelodina longicollis', diet: 'carnivore', activity: 'diurnal',
    weightG: [500, 1300], weightRead: 'restated', weightsPublished: { myhrvold2015: 1293 }, lengthMm: [180, 250, 'carapace'],
    feedC: [23, 29, 'body'], notes: ['Feeds in water.'],
  },
  {
    id: 'sp-loggerhead', commonName: 'Loggerhead sea turtle', scientificName: 'Caretta caretta', diet: 'carnivore', activity: 'diurnal',
    weightG: [70000, 160000], weightRead: 'restated', weightsPublished: { myhrvold2015: 109150, anage: 156500 }, lengthMm: [800, 1050, 'carapace'],
    feedC: [22, 27, 'body'], notes: ['Permit.', 'Marine.'],
  },
  {
    id: 'sp-green-turtle', commonName: 'Green sea turtle', scientificName: 'Chelonia mydas', diet: 'herbivore', activity: 'diurnal',
    weightG: [80000, 180000], weightRead: 'restated', weightsPublished: { myhrvold2015: 160000, anage: 160000 }, lengthMm: [850, 1150, 'carapace'],
    feedC: [22, 28, 'body'], notes: ['Permit.', 'Marine.'],
  },
]
