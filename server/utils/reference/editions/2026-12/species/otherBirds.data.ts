import type { SpeciesRow } from '../../../speciesRecord'

/** Birds other than songbirds. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const otherBirds: SpeciesRow[] = [
  {
    id: 'sp-swift', commonName: 'Common swift', scientificName: 'Apus apus', diet: 'insectivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 100 %'],
    weightG: [36, 50], weightRead: 'restated', weightsPublished: { myhrvold2015: 39, anage: 37.6, wilman2014: 37.6 },
    bodyC: 41, airC: [27, 32], notes: ['Cannot take off from the ground.', 'Never force the throat.'],
  },
  {
    id: 'sp-feral-pigeon', commonName: 'Feral pigeon', scientificName: 'Columba livia', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 60 %, plants 30 %, invertebrates 10 %'],
    weightG: [250, 370], weightRead: 'restated', weightsPublished: { myhrvold2015: 320, anage: 358.7, wilman2014: 354.2 },
    bodyC: 41, airC: [26, 31],
  },
  {
    id: 'sp-wood-pigeon', commonName: 'Common wood pigeon', scientificName: 'Columba palumbus', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'plants 40 %, fruit 30 %, seed 30 %'],
    weightG: [430, 560], weightRead: 'restated', weightsPublished: { myhrvold2015: 490, anage: 490, wilman2014: 490 },
    bodyC: 41, airC: [26, 31],
  },
  {
    id: 'sp-collared-dove', commonName: 'Eurasian collared dove', scientificName: 'Streptopelia decaocto', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 40 %, fruit 30 %, plants 20 %, invertebrates 10 %'],
    weightG: [150, 230], weightRead: 'restated', weightsPublished: { myhrvold2015: 154.7, anage: 157.4, wilman2014: 148.96 },
    bodyC: 41, airC: [26, 31],
  },
  {
    id: 'sp-mourning-dove', commonName: 'Mourning dove', scientificName: 'Zenaida macroura', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 90 %, plants 10 %'],
    weightG: [95, 160], weightRead: 'restated', weightsPublished: { myhrvold2015: 119, anage: 119, wilman2014: 118.93 },
    bodyC: 41, airC: [26, 31],
  },
  {
    id: 'sp-budgerigar', commonName: 'Budgerigar', scientificName: 'Melopsittacus undulatus', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 100 %'],
    weightG: [28, 45], weightRead: 'restated', weightsPublished: { myhrvold2015: 29.05, anage: 30, wilman2014: 28.99 },
    bodyC: 41, bodyPublishedC: 41, airC: [28, 32],
  },
  {
    id: 'sp-cockatiel', commonName: 'Cockatiel', scientificName: 'Nymphicus hollandicus', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 100 %'],
    weightG: [80, 115], weightRead: 'restated', weightsPublished: { myhrvold2015: 90, anage: 90, wilman2014: 94.61 },
    bodyC: 41, airC: [28, 32],
  },
  {
    id: 'sp-grey-parrot', commonName: 'Grey parrot', scientificName: 'Psittacus erithacus', diet: 'omnivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'fruit 50 %, seed 50 %'],
    weightG: [400, 550], weightRead: 'restated', weightsPublished: { myhrvold2015: 333, anage: 333, wilman2014: 333 },
    bodyC: 41, airC: [27, 31],
  },
  {
    id: 'sp-amazon', commonName: 'Blue-fronted amazon', scientificName: 'Amazona aestiva', diet: 'omnivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'fruit 50 %, seed 50 %'],
    weightG: [350, 500], weightRead: 'restated', weightsPublished: { myhrvold2015: 400, anage: 451, wilman2014: 451 },
    bodyC: 41, airC: [27, 31],
  },
  {
    id: 'sp-galah', commonName: 'Galah', scientificName: 'Eolophus roseicapilla', diet: 'granivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'seed 100 %'],
    weightG: [270, 400], weightRead: 'restated', weightsPublished: { myhrvold2015: 305.5, anage: 300, wilman2014: 325.33 },
    bodyC: 41, airC: [27, 31],
  },
  {
    id: 'sp-barn-owl', commonName: 'Barn owl', scientificName: 'Tyto alba', diet: 'carnivore', activity: 'nocturnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 90 %, invertebrates 10 %'],
    weightG: [250, 400], weightRead: 'restated', weightsPublished: { myhrvold2015: 381.6, anage: 580, wilman2014: 403.32 },
    bodyC: 40, airC: [26, 30], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-tawny-owl', commonName: 'Tawny owl', scientificName: 'Strix aluco', diet: 'carnivore', activity: 'nocturnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 90 %, invertebrates 10 %'],
    weightG: [350, 600], weightRead: 'restated', weightsPublished: { myhrvold2015: 496.5, anage: 520, wilman2014: 472.46 },
    bodyC: 40, airC: [26, 30], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-little-owl', commonName: 'Little owl', scientificName: 'Athene noctua', diet: 'carnivore', activity: 'nocturnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 70 %, vertebrates 30 %'],
    weightG: [140, 220], weightRead: 'restated', weightsPublished: { myhrvold2015: 169, anage: 169, wilman2014: 168.92 },
    bodyC: 40, airC: [26, 30], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-great-horned-owl', commonName: 'Great horned owl', scientificName: 'Bubo virginianus', diet: 'carnivore', activity: 'nocturnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 90 %, invertebrates 10 %'],
    weightG: [1000, 2000], weightRead: 'restated', weightsPublished: { myhrvold2015: 1377.25, anage: 1191.2, wilman2014: 1575.7 },
    bodyC: 40, airC: [24, 29], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-kestrel', commonName: 'Common kestrel', scientificName: 'Falco tinnunculus', diet: 'carnivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'vertebrates 90 %, invertebrates 10 %'],
    weightG: [150, 260], weightRead: 'restated', weightsPublished: { myhrvold2015: 204.75, anage: 184, wilman2014: 183.21 },
    bodyC: 41, airC: [26, 30], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-sparrowhawk', commonName: 'Eurasian sparrowhawk', scientificName: 'Accipiter nisus', diet: 'carnivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'vertebrates 100 %'],
    weightG: [120, 300], weightRead: 'restated', weightsPublished: { myhrvold2015: 212, anage: 237.5, wilman2014: 220.79 },
    bodyC: 41, airC: [26, 30], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-buzzard', commonName: 'Common buzzard', scientificName: 'Buteo buteo', diet: 'carnivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'vertebrates 100 %'],
    weightG: [650, 1200], weightRead: 'restated', weightsPublished: { myhrvold2015: 878.25, anage: 1012, wilman2014: 759.1 },
    bodyC: 41, airC: [24, 29], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-red-tailed-hawk', commonName: 'Red-tailed hawk', scientificName: 'Buteo jamaicensis', diet: 'carnivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'vertebrates 90 %, invertebrates 10 %'],
    weightG: [700, 1500], weightRead: 'restated', weightsPublished: { myhrvold2015: 1126, anage: 1362, wilman2014: 1101.16 },
    bodyC: 41, airC: [24, 29], notes: ['Casts pellets.'],
  },
  {
    id: 'sp-herring-gull', commonName: 'European herring gull', scientificName: 'Larus argentatus', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 70 %, invertebrates 30 %'],
    weightG: [750, 1250], weightRead: 'restated', weightsPublished: { myhrvold2015: 1085, anage: 1094, wilman2014: 1090.99 },
    bodyC: 41, airC: [22, 28], notes: ['Throws up easily.'],
  },
  {
    id: 'sp-mallard', commonName: 'Mallard', scientificName: 'Anas platyrhynchos', diet: 'omnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'invertebrates 40 %, vertebrates 20 %, seed 20 %, plants 20 %'],
    weightG: [800, 1400], weightRead: 'restated', weightsPublished: { myhrvold2015: 1121, anage: 1048.1, wilman2014: 843.42 },
    bodyC: 41, airC: [22, 28],
  },
  {
    id: 'sp-mute-swan', commonName: 'Mute swan', scientificName: 'Cygnus olor', diet: 'herbivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'plants 80 %, invertebrates 10 %, vertebrates 10 %'],
    weightG: [8000, 12500], weightRead: 'restated', weightsPublished: { myhrvold2015: 10230, anage: 8300, wilman2014: 10682.04 },
    bodyC: 41, airC: [18, 25],
  },
  {
    id: 'sp-grey-heron', commonName: 'Grey heron', scientificName: 'Ardea cinerea', diet: 'carnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 80 %, invertebrates 20 %'],
    weightG: [1000, 2000], weightRead: 'restated', weightsPublished: { myhrvold2015: 1443, anage: 1443, wilman2014: 1443 },
    bodyC: 41, airC: [22, 28], notes: ['Throws up easily.', 'Stabs.'],
  },
  {
    id: 'sp-common-murre', commonName: 'Common guillemot', scientificName: 'Uria aalge', diet: 'carnivore', activity: 'diurnal', hasCrop: false, dietPublished: ['wilman2014', 'vertebrates 90 %, invertebrates 10 %'],
    weightG: [800, 1100], weightRead: 'restated', weightsPublished: { myhrvold2015: 991.5, anage: 992, wilman2014: 991.93 },
    bodyC: 40, airC: [20, 26], notes: ['Throws up easily.', 'Marine.'],
  },
  {
    id: 'sp-domestic-hen', commonName: 'Domestic hen', scientificName: 'Gallus gallus', diet: 'omnivore', activity: 'diurnal', hasCrop: true, dietPublished: ['wilman2014', 'invertebrates 30 %, plants 30 %, fruit 20 %, seed 20 %'],
    weightG: [1500, 3000], weightRead: 'memory', weightsPublished: { myhrvold2015: 912.5, anage: 779.8, wilman2014: 751.72 },
    bodyC: 41.5, airC: [20, 26], notes: ['Food animal: medicine law.'],
  },
  // From memory throughout.
  {
    id: 'sp-lovebird', commonName: 'Rosy-faced lovebird', scientificName: 'Agapornis roseicollis', diet: 'granivore', activity: 'diurnal', hasCrop: true,
    weightG: [43, 60], weightRead: 'memory',
    bodyC: 41, airC: [28, 32],
  },
  {
    id: 'sp-ring-necked-parakeet', commonName: 'Ring-necked parakeet', scientificName: 'Psittacula krameri', diet: 'granivore', activity: 'diurnal', hasCrop: true,
    weightG: [105, 150], weightRead: 'memory',
    bodyC: 41, airC: [27, 31],
  },
  {
    id: 'sp-white-cockatoo', commonName: 'Sulphur-crested cockatoo', scientificName: 'Cacatua galerita', diet: 'granivore', activity: 'diurnal', hasCrop: true,
    weightG: [650, 950], weightRead: 'memory',
    bodyC: 41, airC: [26, 30],
  },
  {
    id: 'sp-common-tern', commonName: 'Common tern', scientificName: 'Sterna hirundo', diet: 'carnivore', activity: 'diurnal', hasCrop: false,
    weightG: [100, 145], weightRead: 'memory',
    bodyC: 40.5, airC: [24, 29], notes: ['Marine.', 'Throws up easily.'],
  },
  {
    id: 'sp-gannet', commonName: 'Northern gannet', scientificName: 'Morus bassanus', diet: 'carnivore', activity: 'diurnal', hasCrop: false,
    weightG: [2400, 3600], weightRead: 'memory',
    bodyC: 40, airC: [20, 26], notes: ['Marine.', 'Stabs.'],
  },
  {
    id: 'sp-humboldt-penguin', commonName: 'Humboldt penguin', scientificName: 'Spheniscus humboldti', diet: 'carnivore', activity: 'diurnal', hasCrop: false,
    weightG: [3500, 5000], weightRead: 'memory',
    bodyC: 39, airC: [15, 22], notes: ['Marine.', 'Overheats.'],
  },
  {
    id: 'sp-moorhen', commonName: 'Common moorhen', scientificName: 'Gallinula chloropus', diet: 'omnivore', activity: 'diurnal', hasCrop: false,
    weightG: [220, 420], weightRead: 'memory',
    bodyC: 41, airC: [24, 29],
  },
  {
    id: 'sp-white-stork', commonName: 'White stork', scientificName: 'Ciconia ciconia', diet: 'carnivore', activity: 'diurnal', hasCrop: false,
    weightG: [2300, 4400], weightRead: 'memory',
    bodyC: 40, airC: [22, 28], notes: ['Throws up easily.'],
  },
  {
    id: 'sp-kingfisher', commonName: 'Common kingfisher', scientificName: 'Alcedo atthis', diet: 'carnivore', activity: 'diurnal', hasCrop: false,
    weightG: [32, 46], weightRead: 'memory',
    bodyC: 40.5, airC: [26, 31],
  },
  {
    id: 'sp-woodpecker', commonName: 'Great spotted woodpecker', scientificName: 'Dendrocopos major', diet: 'insectivore', activity: 'diurnal', hasCrop: false,
    weightG: [70, 98], weightRead: 'memory',
    bodyC: 41, airC: [27, 31],
  },
  {
    id: 'sp-japanese-quail', commonName: 'Japanese quail', scientificName: 'Coturnix japonica', diet: 'omnivore', activity: 'diurnal', hasCrop: true,
    weightG: [100, 200], weightRead: 'memory',
    bodyC: 41.5, airC: [24, 29],
  },
]
