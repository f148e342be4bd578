import type { SpeciesRow } from '../../../speciesRecord'

/** Marsupials. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const marsupials: SpeciesRow[] = [
  {
    id: 'sp-sugar-glider', commonName: 'Sugar glider', scientificName: 'Petaurus breviceps', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'invertebrates 40 %, nectar 30 %, seed 20 %, vertebrates 10 %'],
    weightG: [90, 150], weightRead: 'restated', weightsPublished: { myhrvold2015: 127.55, anage: 110, wilman2014: 106.28 },
    bodyC: 36, bodyPublishedC: 35.9, airC: [24, 28], notes: ['Torpor.'],
  },
  {
    id: 'sp-ringtail-possum', commonName: 'Common ringtail possum', scientificName: 'Pseudocheirus peregrinus', diet: 'herbivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'plants 70 %, fruit 20 %, nectar 10 %'],
    weightG: [700, 1100], weightRead: 'restated', weightsPublished: { myhrvold2015: 859.3, anage: 850, wilman2014: 900 },
    bodyC: 36, bodyPublishedC: 37.4, airC: [22, 27], notes: ['Hindgut fermenter.'],
  },
  {
    id: 'sp-brushtail-possum', commonName: 'Common brushtail possum', scientificName: 'Trichosurus vulpecula', diet: 'herbivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'plants 60 %, fruit 20 %, seed 20 %'],
    weightG: [1500, 4000], weightRead: 'restated', weightsPublished: { myhrvold2015: 2005, anage: 2395, wilman2014: 2650 },
    bodyC: 36, bodyPublishedC: 36, airC: [22, 27],
  },
  {
    id: 'sp-virginia-opossum', commonName: 'Virginia opossum', scientificName: 'Didelphis virginiana', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'vertebrates 60 %, invertebrates 20 %, plants 20 %'],
    weightG: [1500, 4500], weightRead: 'restated', weightsPublished: { myhrvold2015: 1414.5, anage: 3000, wilman2014: 2195.48 },
    bodyC: 35.5, bodyPublishedC: 35, airC: [22, 27],
  },
  {
    id: 'sp-koala', commonName: 'Koala', scientificName: 'Phascolarctos cinereus', diet: 'herbivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'plants 100 %'],
    weightG: [5000, 12000], weightRead: 'restated', weightsPublished: { myhrvold2015: 5646.87, anage: 9300, wilman2014: 10250 },
    bodyC: 36, bodyPublishedC: 35.8, airC: [20, 26], notes: ['Licensed hands only.'],
  },
  {
    id: 'sp-bennetts-wallaby', commonName: 'Red-necked wallaby', scientificName: 'Macropus rufogriseus', diet: 'herbivore', activity: 'crepuscular', dietPublished: ['wilman2014', 'plants 100 %'],
    weightG: [11000, 20000], weightRead: 'restated', weightsPublished: { myhrvold2015: 16525, anage: 16200, wilman2014: 16850 },
    bodyC: 36, airC: [20, 26], notes: ['Foregut fermenter.', 'Stress kills.'],
  },
  {
    id: 'sp-southern-brown-bandicoot', commonName: 'Southern brown bandicoot', scientificName: 'Isoodon obesulus', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'invertebrates 100 %'],
    weightG: [500, 1200], weightRead: 'restated', weightsPublished: { myhrvold2015: 717, anage: 700, wilman2014: 775 },
    bodyC: 35.5, bodyPublishedC: 33.9, airC: [22, 27],
  },
  // From memory throughout.
  {
    id: 'sp-grey-kangaroo', commonName: 'Eastern grey kangaroo', scientificName: 'Macropus giganteus', diet: 'herbivore', activity: 'crepuscular',
    weightG: [18000, 60000], weightRead: 'memory',
    bodyC: 36, airC: [20, 26], notes: ['Foregut fermenter.', 'Stress kills.'],
  },
  {
    id: 'sp-swamp-wallaby', commonName: 'Swamp wallaby', scientificName: 'Wallabia bicolor', diet: 'herbivore', activity: 'crepuscular',
    weightG: [10000, 18000], weightRead: 'memory',
    bodyC: 36, airC: [20, 26], notes: ['Foregut fermenter.', 'Stress kills.'],
  },
  {
    id: 'sp-wombat', commonName: 'Common wombat', scientificName: 'Vombatus ursinus', diet: 'herbivore', activity: 'nocturnal',
    weightG: [20000, 36000], weightRead: 'memory',
    bodyC: 35.5, airC: [18, 24], notes: ['Hindgut fermenter.', 'Overheats.'],
  },
  {
    id: 'sp-tasmanian-devil', commonName: 'Tasmanian devil', scientificName: 'Sarcophilus harrisii', diet: 'carnivore', activity: 'nocturnal',
    weightG: [6000, 11000], weightRead: 'memory',
    bodyC: 36, airC: [20, 26], notes: ['Bites.'],
  },
  {
    id: 'sp-dunnart', commonName: 'Fat-tailed dunnart', scientificName: 'Sminthopsis crassicaudata', diet: 'insectivore', activity: 'nocturnal',
    weightG: [10, 20], weightRead: 'memory',
    bodyC: 35, airC: [24, 29], notes: ['Torpor.', 'Stores fat in the tail.'],
  },
]
