import type { Group, SpeciesItem } from '#shared/types/reference'
import { defineSpecies, type SpeciesRow } from '../../../speciesRecord'
import { equations } from '../equations.data'
import { anurans } from './anurans.data'
import { caudates } from './caudates.data'
import { chelonians } from './chelonians.data'
import { crocodilians } from './crocodilians.data'
import { lizards } from './lizards.data'
import { marsupials } from './marsupials.data'
import { notInList } from './notInList.data'
import { otherBirds } from './otherBirds.data'
import { placentals } from './placentals.data'
import { sharedFigures, temperatureRules } from './rules.data'
import { snakes } from './snakes.data'
import { songbirds } from './songbirds.data'

const rows: [Group, SpeciesRow[]][] = [
  ['lizard', lizards],
  ['snake', snakes],
  ['chelonian', chelonians],
  ['crocodilian', crocodilians],
  ['amphibian-anuran', anurans],
  ['amphibian-caudate', caudates],
  ['bird-passerine', songbirds],
  ['bird-other', otherBirds],
  ['mammal-placental', placentals],
  ['mammal-marsupial', marsupials],
]

/**
 * Species of edition 2026-12 by group, each group ended by its entry for a species not in the list.
 *
 * @source published data sets where a value is marked restated; memory, house rules otherwise (see each `provenance`)
 * @example species.find(one => one.id === 'sp-leopard-gecko')!.warmPlaceC // { low: 32, high: 34.5, what: 'warm end' }
 */
export const species: readonly SpeciesItem[] = rows.flatMap(([group, own]) =>
  [...own, notInList[group]].map(row => defineSpecies(row, group, sharedFigures(row, group), temperatureRules, equations)))
