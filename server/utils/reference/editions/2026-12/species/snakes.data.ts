import type { SpeciesRow } from '../../../speciesRecord'

/** Snakes. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const snakes: SpeciesRow[] = [
  {
    id: 'sp-ball-python', commonName: 'Ball python', scientificName: 'Python regius', diet: 'carnivore', activity: 'nocturnal',
    weightG: [1200, 2000], weightRead: 'memory', weightsPublished: { myhrvold2015: 8858 }, lengthMm: [900, 1500, 'total'],
    feedC: [27, 34, 'body'], notes: ['Long natural fasts.', 'Spectacle.'],
  },
  {
    id: 'sp-corn-snake', commonName: 'Corn snake', scientificName: 'Pantherophis guttatus', diet: 'carnivore', activity: 'nocturnal',
    weightG: [300, 900], weightRead: 'restated', weightsPublished: { myhrvold2015: 900, anage: 900 }, lengthMm: [900, 1500, 'total'], lengthPublishedMm: 1130,
    feedC: [25, 32, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-kingsnake', commonName: 'Common kingsnake', scientificName: 'Lampropeltis getula', diet: 'carnivore', activity: 'diurnal',
    weightG: [400, 1500], weightRead: 'memory', weightsPublished: { myhrvold2015: 2041 }, lengthMm: [900, 1500, 'total'],
    feedC: [25, 32, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-boa', commonName: 'Common boa', scientificName: 'Boa constrictor', diet: 'carnivore', activity: 'nocturnal',
    weightG: [3000, 12000], weightRead: 'restated', weightsPublished: { myhrvold2015: 10592, anage: 3532 }, lengthMm: [1500, 3000, 'total'], lengthPublishedMm: 1750,
    feedC: [28, 34, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-carpet-python', commonName: 'Carpet python', scientificName: 'Morelia spilota', diet: 'carnivore', activity: 'nocturnal',
    weightG: [2000, 5000], weightRead: 'memory', weightsPublished: { myhrvold2015: 15926 }, lengthMm: [1800, 2600, 'total'],
    feedC: [29, 33, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-garter', commonName: 'Common garter snake', scientificName: 'Thamnophis sirtalis', diet: 'carnivore', activity: 'diurnal',
    weightG: [50, 150], weightRead: 'restated', weightsPublished: { myhrvold2015: 150, anage: 150 }, lengthMm: [500, 900, 'total'],
    feedC: [22, 32, 'body'], notes: ['Fish and worms.'],
  },
  {
    id: 'sp-grass-snake', commonName: 'Grass snake', scientificName: 'Natrix natrix', diet: 'carnivore', activity: 'diurnal',
    weightG: [80, 250], weightRead: 'restated', weightsPublished: { myhrvold2015: 96.25, anage: 96.25 }, lengthMm: [700, 1100, 'total'],
    feedC: [22, 31, 'body'], notes: ['Plays dead.'],
  },
  {
    id: 'sp-hognose', commonName: 'Western hognose snake', scientificName: 'Heterodon nasicus', diet: 'carnivore', activity: 'diurnal',
    weightG: [100, 350], weightRead: 'restated', weightsPublished: { myhrvold2015: 350 }, lengthMm: [400, 800, 'total'],
    feedC: [25, 32, 'body'],
  },
  {
    id: 'sp-adder', commonName: 'Adder', scientificName: 'Vipera berus', diet: 'carnivore', activity: 'diurnal',
    weightG: [50, 150], weightRead: 'memory', weightsPublished: { myhrvold2015: 279 }, lengthMm: [450, 650, 'total'],
    feedC: [24, 32, 'body'], notes: ['Venomous: trained hands only.'],
  },
  // From memory throughout.
  {
    id: 'sp-milk-snake', commonName: 'Milk snake', scientificName: 'Lampropeltis triangulum', diet: 'carnivore', activity: 'nocturnal',
    weightG: [150, 800], weightRead: 'memory', lengthMm: [600, 1200, 'total'],
    feedC: [25, 31, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-rat-snake', commonName: 'Western rat snake', scientificName: 'Pantherophis obsoletus', diet: 'carnivore', activity: 'diurnal',
    weightG: [500, 1500], weightRead: 'memory', lengthMm: [1100, 1800, 'total'],
    feedC: [25, 31, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-childrens-python', commonName: 'Children\'s python', scientificName: 'Antaresia childreni', diet: 'carnivore', activity: 'nocturnal',
    weightG: [250, 600], weightRead: 'memory', lengthMm: [700, 1100, 'total'],
    feedC: [28, 33, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-green-tree-python', commonName: 'Green tree python', scientificName: 'Morelia viridis', diet: 'carnivore', activity: 'nocturnal',
    weightG: [900, 1600], weightRead: 'memory', lengthMm: [1200, 1800, 'total'],
    feedC: [27, 31, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-reticulated-python', commonName: 'Reticulated python', scientificName: 'Malayopython reticulatus', diet: 'carnivore', activity: 'nocturnal',
    weightG: [15000, 60000], weightRead: 'memory', lengthMm: [3000, 6000, 'total'],
    feedC: [28, 33, 'body'], notes: ['Two people to handle.'],
  },
  {
    id: 'sp-rainbow-boa', commonName: 'Brazilian rainbow boa', scientificName: 'Epicrates cenchria', diet: 'carnivore', activity: 'nocturnal',
    weightG: [1000, 2500], weightRead: 'memory', lengthMm: [1200, 1800, 'total'],
    feedC: [26, 30, 'body'], notes: ['Spectacle.'],
  },
  {
    id: 'sp-smooth-snake', commonName: 'Smooth snake', scientificName: 'Coronella austriaca', diet: 'carnivore', activity: 'diurnal',
    weightG: [35, 90], weightRead: 'memory', lengthMm: [450, 700, 'total'],
    feedC: [25, 32, 'body'], notes: ['Protected.'],
  },
]
