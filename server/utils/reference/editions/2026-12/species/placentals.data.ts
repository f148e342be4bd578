import type { SpeciesRow } from '../../../speciesRecord'

/** Placental mammals. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const placentals: SpeciesRow[] = [
  {
    id: 'sp-hedgehog', commonName: 'European hedgehog', scientificName: 'Erinaceus europaeus', diet: 'insectivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'invertebrates 80 %, vertebrates 20 %'],
    weightG: [600, 1200], weightRead: 'restated', weightsPublished: { myhrvold2015: 777.95, anage: 750, wilman2014: 771 },
    bodyC: 35, bodyPublishedC: 34, airC: [24, 28], notes: ['Hibernates: warm first.'],
  },
  {
    id: 'sp-pygmy-hedgehog', commonName: 'African pygmy hedgehog', scientificName: 'Atelerix albiventris', diet: 'insectivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'vertebrates 50 %, invertebrates 20 %, fruit 20 %, plants 10 %'],
    weightG: [300, 600], weightRead: 'restated', weightsPublished: { myhrvold2015: 450, anage: 500, wilman2014: 600 },
    bodyC: 35.5, bodyPublishedC: 35.2, airC: [24, 29], notes: ['Torpor when cool.'],
  },
  {
    id: 'sp-rabbit', commonName: 'European rabbit', scientificName: 'Oryctolagus cuniculus', diet: 'herbivore', activity: 'crepuscular', dietPublished: ['wilman2014', 'plants 100 %'],
    weightG: [1200, 2500], weightRead: 'restated', weightsPublished: { myhrvold2015: 1900, anage: 1800, wilman2014: 1832.22 },
    bodyC: 38.8, bodyPublishedC: 39, airC: [18, 24], notes: ['Cannot vomit.', 'Hindgut fermenter.', 'Never left empty.'],
  },
  {
    id: 'sp-brown-hare', commonName: 'European hare', scientificName: 'Lepus europaeus', diet: 'herbivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'plants 100 %'],
    weightG: [3000, 5000], weightRead: 'restated', weightsPublished: { myhrvold2015: 3673.33, anage: 4175, wilman2014: 3740 },
    bodyC: 38.5, bodyPublishedC: 38.3, airC: [18, 24], notes: ['Stress kills.'],
  },
  {
    id: 'sp-guinea-pig', commonName: 'Guinea pig', scientificName: 'Cavia porcellus', diet: 'herbivore', activity: 'diurnal', dietPublished: ['wilman2014', 'plants 100 %'],
    weightG: [700, 1200], weightRead: 'restated', weightsPublished: { myhrvold2015: 639.1, anage: 728, wilman2014: 728 },
    bodyC: 38.5, bodyPublishedC: 39, airC: [20, 25], notes: ['Cannot vomit.', 'Needs vitamin C.', 'Hindgut fermenter.'],
  },
  {
    id: 'sp-chinchilla', commonName: 'Chinchilla', scientificName: 'Chinchilla lanigera', diet: 'herbivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'plants 100 %'],
    weightG: [400, 700], weightRead: 'restated', weightsPublished: { myhrvold2015: 485, anage: 642.5, wilman2014: 417 },
    bodyC: 37, bodyPublishedC: 34.7, airC: [16, 22], notes: ['Cannot vomit.', 'Overheats.'],
  },
  {
    id: 'sp-rat', commonName: 'Brown rat', scientificName: 'Rattus norvegicus', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'seed 40 %, invertebrates 30 %, fruit 20 %, plants 10 %'],
    weightG: [250, 500], weightRead: 'restated', weightsPublished: { myhrvold2015: 280, anage: 300, wilman2014: 338.33 },
    bodyC: 37.5, bodyPublishedC: 37.1, airC: [22, 26], notes: ['Cannot vomit.'],
  },
  {
    id: 'sp-mouse', commonName: 'House mouse', scientificName: 'Mus musculus', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'plants 60 %, invertebrates 20 %, seed 20 %'],
    weightG: [18, 40], weightRead: 'restated', weightsPublished: { myhrvold2015: 20.5, anage: 20.5, wilman2014: 16.25 },
    bodyC: 37, bodyPublishedC: 36.9, airC: [24, 28], notes: ['Cannot vomit.'],
  },
  {
    id: 'sp-hamster', commonName: 'Golden hamster', scientificName: 'Mesocricetus auratus', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'fruit 30 %, seed 30 %, plants 30 %, vertebrates 10 %'],
    weightG: [90, 150], weightRead: 'restated', weightsPublished: { myhrvold2015: 105, anage: 105, wilman2014: 105 },
    bodyC: 37, bodyPublishedC: 38.1, airC: [22, 26], notes: ['Cheek pouches.', 'Torpor.'],
  },
  {
    id: 'sp-gerbil', commonName: 'Mongolian gerbil', scientificName: 'Meriones unguiculatus', diet: 'omnivore', activity: 'crepuscular', dietPublished: ['wilman2014', 'plants 50 %, invertebrates 20 %, seed 20 %, fruit 10 %'],
    weightG: [60, 100], weightRead: 'restated', weightsPublished: { myhrvold2015: 58.1, anage: 53.2, wilman2014: 53.3 },
    bodyC: 38, bodyPublishedC: 38.2, airC: [22, 26],
  },
  {
    id: 'sp-red-squirrel', commonName: 'Eurasian red squirrel', scientificName: 'Sciurus vulgaris', diet: 'granivore', activity: 'diurnal', dietPublished: ['wilman2014', 'seed 50 %, plants 30 %, fruit 20 %'],
    weightG: [250, 380], weightRead: 'restated', weightsPublished: { myhrvold2015: 328.875, anage: 600, wilman2014: 333 },
    bodyC: 38.5, airC: [22, 27],
  },
  {
    id: 'sp-grey-squirrel', commonName: 'Eastern grey squirrel', scientificName: 'Sciurus carolinensis', diet: 'granivore', activity: 'diurnal', dietPublished: ['wilman2014', 'seed 50 %, plants 30 %, fruit 20 %'],
    weightG: [400, 650], weightRead: 'restated', weightsPublished: { myhrvold2015: 540.33, anage: 533, wilman2014: 506.5 },
    bodyC: 38.5, bodyPublishedC: 38.7, airC: [22, 27], notes: ['Release may be unlawful.'],
  },
  {
    id: 'sp-ferret', commonName: 'Ferret', scientificName: 'Mustela putorius', diet: 'carnivore', activity: 'crepuscular', dietPublished: ['wilman2014', 'vertebrates 90 %, invertebrates 10 %'],
    weightG: [600, 2000], weightRead: 'restated', weightsPublished: { myhrvold2015: 809, anage: 809, wilman2014: 915.37 },
    bodyC: 38.8, airC: [18, 24], notes: ['Short gut.'],
  },
  {
    id: 'sp-badger', commonName: 'European badger', scientificName: 'Meles meles', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'vertebrates 40 %, invertebrates 20 %, fruit 20 %, seed 10 %, plants 10 %'],
    weightG: [7000, 13000], weightRead: 'restated', weightsPublished: { myhrvold2015: 11884.03, anage: 13000, wilman2014: 13000 },
    bodyC: 38, bodyPublishedC: 37, airC: [18, 24], notes: ['Protected.', 'Bites.'],
  },
  {
    id: 'sp-fox', commonName: 'Red fox', scientificName: 'Vulpes vulpes', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'vertebrates 70 %, invertebrates 20 %, fruit 10 %'],
    weightG: [4000, 8000], weightRead: 'restated', weightsPublished: { myhrvold2015: 4580.3, anage: 4131.7, wilman2014: 5476.17 },
    bodyC: 38.5, bodyPublishedC: 38.7, airC: [18, 24], notes: ['Rabies law in places.'],
  },
  {
    id: 'sp-pipistrelle', commonName: 'Common pipistrelle', scientificName: 'Pipistrellus pipistrellus', diet: 'insectivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'invertebrates 100 %'],
    weightG: [4, 8], weightRead: 'restated', weightsPublished: { myhrvold2015: 5, anage: 5, wilman2014: 5.69 },
    bodyC: 37, airC: [26, 32], notes: ['Torpor.', 'Gloves.', 'Rabies law.'],
  },
  {
    id: 'sp-flying-fox', commonName: 'Grey-headed flying fox', scientificName: 'Pteropus poliocephalus', diet: 'frugivore', activity: 'nocturnal', dietPublished: ['wilman2014', 'fruit 100 %'],
    weightG: [600, 1000], weightRead: 'restated', weightsPublished: { myhrvold2015: 675, anage: 675, wilman2014: 749.91 },
    bodyC: 37, bodyPublishedC: 36.5, airC: [26, 30], notes: ['Vaccinated hands only.'],
  },
  {
    id: 'sp-cat', commonName: 'Domestic cat', scientificName: 'Felis catus', diet: 'carnivore', activity: 'crepuscular', dietPublished: ['wilman2014', 'vertebrates 100 %'],
    weightG: [3000, 6000], weightRead: 'restated', weightsPublished: { myhrvold2015: 4573.08, anage: 3900, wilman2014: 2884.8 },
    bodyC: 38.6, bodyPublishedC: 38.1, airC: [20, 26], notes: ['No syringe feeding by mouth.', 'Liver at risk after days unfed.'],
  },
  {
    id: 'sp-dog', commonName: 'Domestic dog', scientificName: 'Canis familiaris', diet: 'omnivore', activity: 'diurnal', dietPublished: ['wilman2014', 'vertebrates 100 %'],
    weightG: [3000, 40000], weightRead: 'restated', weightsPublished: { myhrvold2015: 29190.755, anage: 40000, wilman2014: 32183.33 },
    bodyC: 38.6, airC: [20, 26], notes: ['No syringe feeding by mouth.'],
  },
  // From memory throughout.
  {
    id: 'sp-big-brown-bat', commonName: 'Big brown bat', scientificName: 'Eptesicus fuscus', diet: 'insectivore', activity: 'nocturnal',
    weightG: [14, 24], weightRead: 'memory',
    bodyC: 37, airC: [26, 32], notes: ['Torpor.', 'Gloves.', 'Rabies law.'],
  },
  {
    id: 'sp-noctule', commonName: 'Common noctule', scientificName: 'Nyctalus noctula', diet: 'insectivore', activity: 'nocturnal',
    weightG: [20, 35], weightRead: 'memory',
    bodyC: 37, airC: [26, 32], notes: ['Torpor.', 'Gloves.', 'Rabies law.'],
  },
  {
    id: 'sp-eurasian-otter', commonName: 'Eurasian otter', scientificName: 'Lutra lutra', diet: 'carnivore', activity: 'nocturnal',
    weightG: [5000, 11000], weightRead: 'memory',
    bodyC: 38, airC: [18, 24], notes: ['Protected.', 'Bites.'],
  },
  {
    id: 'sp-raccoon', commonName: 'Common raccoon', scientificName: 'Procyon lotor', diet: 'omnivore', activity: 'nocturnal',
    weightG: [4000, 9000], weightRead: 'memory',
    bodyC: 38, airC: [18, 24], notes: ['Rabies: professionals only.'],
  },
  {
    id: 'sp-stoat', commonName: 'Stoat', scientificName: 'Mustela erminea', diet: 'carnivore', activity: 'diurnal',
    weightG: [140, 350], weightRead: 'memory',
    bodyC: 38.5, airC: [20, 25], notes: ['Short gut.', 'Bites.'],
  },
  {
    id: 'sp-hazel-dormouse', commonName: 'Hazel dormouse', scientificName: 'Muscardinus avellanarius', diet: 'omnivore', activity: 'nocturnal',
    weightG: [15, 30], weightRead: 'memory',
    bodyC: 36.5, airC: [24, 28], notes: ['Torpor: warm first.', 'Protected.'],
  },
  {
    id: 'sp-degu', commonName: 'Degu', scientificName: 'Octodon degus', diet: 'herbivore', activity: 'diurnal',
    weightG: [170, 300], weightRead: 'memory',
    bodyC: 37.5, airC: [20, 25], notes: ['No sugar.', 'Hindgut fermenter.'],
  },
  {
    id: 'sp-cottontail', commonName: 'Eastern cottontail', scientificName: 'Sylvilagus floridanus', diet: 'herbivore', activity: 'crepuscular',
    weightG: [900, 1500], weightRead: 'memory',
    bodyC: 38.5, airC: [20, 25], notes: ['Cannot vomit.', 'Hindgut fermenter.', 'Stress kills.'],
  },
]
