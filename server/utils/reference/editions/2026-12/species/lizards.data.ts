import type { SpeciesRow } from '../../../speciesRecord'

/** Lizards. Published figures stand beside our ranges; a range is a first guess, the animal's own earlier weight is always better. */
export const lizards: SpeciesRow[] = [
  {
    id: 'sp-leopard-gecko', commonName: 'Leopard gecko', scientificName: 'Eublepharis macularius', diet: 'insectivore', activity: 'nocturnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [45, 80], weightRead: 'memory', weightsPublished: { myhrvold2015: 35.53 }, lengthMm: [105, 140, 'snout-vent'], lengthRead: 'restated', longestMm: 170, lengthPublishedMm: 125.1, clade: 'Eublepharidae',
    feedC: [26, 32, 'body'], notes: ['Stores fat in the tail.'],
  },
  {
    id: 'sp-african-fat-tailed-gecko', commonName: 'African fat-tailed gecko', scientificName: 'Hemitheconyx caudicinctus', diet: 'insectivore', activity: 'nocturnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [40, 75], weightRead: 'restated', weightsPublished: { myhrvold2015: 39.17 }, lengthMm: [100, 130, 'snout-vent'], lengthRead: 'restated', longestMm: 160, lengthPublishedMm: 228.5, clade: 'Eublepharidae',
    feedC: [26, 32, 'body'], notes: ['Stores fat in the tail.'],
  },
  {
    id: 'sp-crested-gecko', commonName: 'Crested gecko', scientificName: 'Correlophus ciliatus', diet: 'omnivore', activity: 'nocturnal', dietPublished: ['meiri2018', 'omnivorous'],
    weightG: [35, 55], weightRead: 'memory', lengthMm: [95, 120, 'snout-vent'], lengthRead: 'restated', longestMm: 130, clade: 'Diplodactylidae',
    feedC: [22, 27, 'ambient'], notes: ['Harmed above 28 °C.', 'A lost tail does not grow again.'],
  },
  {
    id: 'sp-tokay-gecko', commonName: 'Tokay gecko', scientificName: 'Gekko gecko', diet: 'insectivore', activity: 'nocturnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [50, 150], weightRead: 'restated', weightsPublished: { myhrvold2015: 54.13 }, lengthMm: [130, 180, 'snout-vent'], lengthRead: 'restated', longestMm: 220, lengthPublishedMm: 151.6, clade: 'Gekkonidae',
    feedC: [26, 32, 'body'],
  },
  {
    id: 'sp-day-gecko', commonName: 'Giant day gecko', scientificName: 'Phelsuma grandis', diet: 'omnivore', activity: 'diurnal', dietPublished: ['meiri2018', 'omnivorous'],
    weightG: [40, 70], weightRead: 'memory', weightsPublished: { myhrvold2015: 20.7 }, lengthMm: [100, 140, 'snout-vent'], longestMm: 118, lengthPublishedMm: 94.5, clade: 'Gekkonidae',
    feedC: [25, 30, 'ambient'], notes: ['Skin tears.'],
  },
  {
    id: 'sp-house-gecko', commonName: 'Common house gecko', scientificName: 'Hemidactylus frenatus', diet: 'insectivore', activity: 'nocturnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [3, 6], weightRead: 'restated', weightsPublished: { myhrvold2015: 3.295 }, lengthMm: [45, 62, 'snout-vent'], lengthRead: 'restated', longestMm: 67, lengthPublishedMm: 53.5, clade: 'Gekkonidae',
    feedC: [24, 31, 'body'], fieldMeansC: [24.9, 29.1],
  },
  {
    id: 'sp-bearded-dragon', commonName: 'Inland bearded dragon', scientificName: 'Pogona vitticeps', diet: 'omnivore', activity: 'diurnal', dietPublished: ['meiri2018', 'omnivorous'],
    weightG: [300, 500], weightRead: 'restated', weightsPublished: { myhrvold2015: 385, anage: 500 }, lengthMm: [180, 250, 'snout-vent'], lengthRead: 'restated', longestMm: 250, lengthPublishedMm: 250, clade: 'Typical Agamidae',
    feedC: [35, 39, 'body'], fieldMeansC: [32.3, 36.9], notes: ['Brumates.'],
  },
  {
    id: 'sp-water-dragon', commonName: 'Chinese water dragon', scientificName: 'Physignathus cocincinus', diet: 'omnivore', activity: 'diurnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [200, 500], weightRead: 'restated', weightsPublished: { myhrvold2015: 193.42 }, lengthMm: [180, 250, 'snout-vent'], lengthRead: 'restated', longestMm: 250, lengthPublishedMm: 178.5, clade: 'Typical Agamidae',
    feedC: [28, 32, 'body'], fieldMeansC: [25.7, 31],
  },
  {
    id: 'sp-frilled-lizard', commonName: 'Frilled lizard', scientificName: 'Chlamydosaurus kingii', diet: 'insectivore', activity: 'diurnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [350, 900], weightRead: 'restated', weightsPublished: { myhrvold2015: 449.125 }, lengthMm: [180, 270, 'snout-vent'], lengthRead: 'restated', longestMm: 290, lengthPublishedMm: 223.3, clade: 'Typical Agamidae',
    feedC: [32, 37, 'body'], fieldMeansC: [32.8, 36.7],
  },
  {
    id: 'sp-green-iguana', commonName: 'Green iguana', scientificName: 'Iguana iguana', diet: 'herbivore', activity: 'diurnal', dietPublished: ['meiri2018', 'herbivorous'],
    weightG: [1500, 4000], weightRead: 'restated', weightsPublished: { myhrvold2015: 1530 }, lengthMm: [250, 450, 'snout-vent'], lengthRead: 'restated', longestMm: 580, lengthPublishedMm: 354.9, clade: 'Iguanidae',
    feedC: [29, 38, 'body'], fieldMeansC: [33, 36.2], notes: ['Hindgut fermenter.'],
  },
  {
    id: 'sp-uromastyx', commonName: 'Spiny-tailed lizard', scientificName: 'Uromastyx ornata', diet: 'herbivore', activity: 'diurnal', dietPublished: ['meiri2018', 'herbivorous'],
    weightG: [200, 450], weightRead: 'memory', weightsPublished: { myhrvold2015: 111.425 }, lengthMm: [150, 200, 'snout-vent'], lengthRead: 'restated', longestMm: 210, lengthPublishedMm: 153.9, clade: 'Typical Agamidae',
    feedC: [33, 40, 'body'], fieldMeansC: [32.8, 39.5], notes: ['Hindgut fermenter.'],
  },
  {
    id: 'sp-veiled-chameleon', commonName: 'Veiled chameleon', scientificName: 'Chamaeleo calyptratus', diet: 'insectivore', activity: 'diurnal', dietPublished: ['meiri2018', 'omnivorous'],
    weightG: [90, 200], weightRead: 'restated', weightsPublished: { myhrvold2015: 200.215 }, lengthMm: [150, 280, 'snout-vent'], longestMm: 239, lengthPublishedMm: 209.2, clade: 'Chamaeleonidae',
    feedC: [26, 32, 'body'], notes: ['Drinks drops, not bowls.'],
  },
  {
    id: 'sp-panther-chameleon', commonName: 'Panther chameleon', scientificName: 'Furcifer pardalis', diet: 'insectivore', activity: 'diurnal', dietPublished: ['meiri2018', 'omnivorous'],
    weightG: [60, 180], weightRead: 'memory', lengthMm: [120, 220, 'snout-vent'], lengthRead: 'restated', longestMm: 250, clade: 'Chamaeleonidae',
    feedC: [25, 31, 'body'], fieldMeansC: [31.3, 32], notes: ['Drinks drops, not bowls.'],
  },
  {
    id: 'sp-green-anole', commonName: 'Green anole', scientificName: 'Anolis carolinensis', diet: 'insectivore', activity: 'diurnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [3, 7], weightRead: 'restated', weightsPublished: { myhrvold2015: 2.455 }, lengthMm: [45, 75, 'snout-vent'], lengthRead: 'restated', longestMm: 75, lengthPublishedMm: 49.7, clade: 'Anolis',
    feedC: [25, 32, 'body'], fieldMeansC: [22.2, 34.2],
  },
  {
    id: 'sp-blue-tongue', commonName: 'Eastern blue-tongued skink', scientificName: 'Tiliqua scincoides', diet: 'omnivore', activity: 'diurnal', dietPublished: ['meiri2018', 'omnivorous'],
    weightG: [300, 700], weightRead: 'restated', weightsPublished: { myhrvold2015: 496.4, anage: 493 }, lengthMm: [270, 370, 'snout-vent'], lengthRead: 'restated', longestMm: 380, lengthPublishedMm: 308.1, clade: 'Legged Scincidae',
    feedC: [28, 33, 'body'], fieldMeansC: [31.9, 34.4],
  },
  {
    id: 'sp-shingleback', commonName: 'Shingleback', scientificName: 'Tiliqua rugosa', diet: 'omnivore', activity: 'diurnal', dietPublished: ['meiri2018', 'herbivorous'],
    weightG: [400, 900], weightRead: 'restated', weightsPublished: { myhrvold2015: 617 }, lengthMm: [260, 340, 'snout-vent'], lengthRead: 'restated', longestMm: 350, lengthPublishedMm: 277.5, clade: 'Legged Scincidae',
    feedC: [30, 35, 'body'], fieldMeansC: [31.9, 35.3], notes: ['Stores fat in the tail.'],
  },
  {
    id: 'sp-slow-worm', commonName: 'Slow worm', scientificName: 'Anguis fragilis', diet: 'insectivore', activity: 'diurnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [15, 40], weightRead: 'memory', weightsPublished: { myhrvold2015: 11.655 }, lengthMm: [150, 220, 'snout-vent'], lengthRead: 'restated', longestMm: 291, lengthPublishedMm: 179.6, clade: 'Limbless anguids',
    feedC: [22, 29, 'body'], fieldMeansC: [22.1, 26.4],
  },
  {
    id: 'sp-sand-lizard', commonName: 'Sand lizard', scientificName: 'Lacerta agilis', diet: 'insectivore', activity: 'diurnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [8, 18], weightRead: 'restated', weightsPublished: { myhrvold2015: 9.87 }, lengthMm: [65, 90, 'snout-vent'], lengthRead: 'restated', longestMm: 114, lengthPublishedMm: 79.1, clade: 'Lacertidae',
    feedC: [28, 34, 'body'], fieldMeansC: [29.8, 34.6],
  },
  {
    id: 'sp-wall-lizard', commonName: 'Common wall lizard', scientificName: 'Podarcis muralis', diet: 'insectivore', activity: 'diurnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [4, 9], weightRead: 'restated', weightsPublished: { myhrvold2015: 5.41 }, lengthMm: [50, 75, 'snout-vent'], lengthRead: 'restated', longestMm: 78, lengthPublishedMm: 61.6, clade: 'Lacertidae',
    feedC: [29, 35, 'body'], fieldMeansC: [28.3, 36.1],
  },
  {
    id: 'sp-tegu', commonName: 'Black and white tegu', scientificName: 'Salvator merianae', diet: 'omnivore', activity: 'diurnal', dietPublished: ['meiri2018', 'omnivorous'],
    weightG: [2500, 6500], weightRead: 'memory', weightsPublished: { myhrvold2015: 1335.02 }, lengthMm: [350, 500, 'snout-vent'], lengthRead: 'restated', longestMm: 501, lengthPublishedMm: 339.9, clade: 'Teiidae',
    feedC: [28, 35, 'body'], fieldMeansC: [35, 35], notes: ['Brumates.'],
  },
  {
    id: 'sp-savannah-monitor', commonName: 'Savannah monitor', scientificName: 'Varanus exanthematicus', diet: 'carnivore', activity: 'diurnal', dietPublished: ['meiri2018', 'carnivorous'],
    weightG: [1000, 4000], weightRead: 'memory', weightsPublished: { myhrvold2015: 35500, anage: 35500 }, lengthMm: [280, 500, 'snout-vent'], lengthRead: 'restated', longestMm: 750, lengthPublishedMm: 344.1, clade: 'Varanidae',
    feedC: [30, 38, 'body'], fieldMeansC: [31.5, 36.5],
  },
  // From memory throughout.
  {
    id: 'sp-gargoyle-gecko', commonName: 'Gargoyle gecko', scientificName: 'Rhacodactylus auriculatus', diet: 'omnivore', activity: 'nocturnal',
    weightG: [35, 65], weightRead: 'memory', lengthMm: [95, 125, 'snout-vent'], clade: 'Diplodactylidae',
    feedC: [22, 27, 'ambient'], notes: ['Harmed above 28 °C.'],
  },
  {
    id: 'sp-viviparous-lizard', commonName: 'Common lizard', scientificName: 'Zootoca vivipara', diet: 'insectivore', activity: 'diurnal',
    weightG: [2.5, 6], weightRead: 'memory', lengthMm: [45, 70, 'snout-vent'], clade: 'Lacertidae',
    feedC: [26, 33, 'body'],
  },
  {
    id: 'sp-jacksons-chameleon', commonName: 'Jackson\'s chameleon', scientificName: 'Trioceros jacksonii', diet: 'insectivore', activity: 'diurnal',
    weightG: [50, 150], weightRead: 'memory', lengthMm: [90, 160, 'snout-vent'], clade: 'Chamaeleonidae',
    feedC: [22, 28, 'ambient'], notes: ['Drinks drops, not bowls.'],
  },
]
