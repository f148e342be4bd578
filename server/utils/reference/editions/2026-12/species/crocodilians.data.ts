import type { SpeciesRow } from '../../../speciesRecord'

/** Crocodilians. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const crocodilians: SpeciesRow[] = [
  {
    id: 'sp-salt-croc', commonName: 'Saltwater crocodile', scientificName: 'Crocodylus porosus', diet: 'carnivore', activity: 'nocturnal',
    weightG: [100000, 500000], weightRead: 'restated', weightsPublished: { myhrvold2015: 200000 }, lengthMm: [3000, 5000, 'total'],
    feedC: [29, 33, 'body'], notes: ['Licensed hands only.'],
  },
  {
    id: 'sp-american-alligator', commonName: 'American alligator', scientificName: 'Alligator mississippiensis', diet: 'carnivore', activity: 'nocturnal',
    weightG: [40000, 230000], weightRead: 'restated', weightsPublished: { myhrvold2015: 62000, anage: 150000 }, lengthMm: [2000, 3800, 'total'],
    feedC: [28, 33, 'body'], notes: ['Licensed hands only.'],
  },
  {
    id: 'sp-spectacled-caiman', commonName: 'Spectacled caiman', scientificName: 'Caiman crocodilus', diet: 'carnivore', activity: 'nocturnal',
    weightG: [10000, 40000], weightRead: 'restated', weightsPublished: { myhrvold2015: 10900 }, lengthMm: [1200, 2200, 'total'],
    feedC: [28, 33, 'body'], notes: ['Licensed hands only.'],
  },
  // From memory throughout.
  {
    id: 'sp-freshwater-croc', commonName: 'Freshwater crocodile', scientificName: 'Crocodylus johnsoni', diet: 'carnivore', activity: 'nocturnal',
    weightG: [10000, 60000], weightRead: 'memory', lengthMm: [1500, 2500, 'total'],
    feedC: [29, 33, 'body'], notes: ['Licensed hands only.'],
  },
  {
    id: 'sp-nile-croc', commonName: 'Nile crocodile', scientificName: 'Crocodylus niloticus', diet: 'carnivore', activity: 'nocturnal',
    weightG: [70000, 400000], weightRead: 'memory', lengthMm: [2500, 4500, 'total'],
    feedC: [29, 33, 'body'], notes: ['Licensed hands only.'],
  },
  {
    id: 'sp-dwarf-caiman', commonName: 'Cuvier\'s dwarf caiman', scientificName: 'Paleosuchus palpebrosus', diet: 'carnivore', activity: 'nocturnal',
    weightG: [5000, 15000], weightRead: 'memory', lengthMm: [1000, 1600, 'total'],
    feedC: [27, 32, 'body'], notes: ['Licensed hands only.'],
  },
]
