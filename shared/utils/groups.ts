import type { Group } from '../types/reference'

/** Coarse kinds that many rules are written for. */
export type Kind = 'reptile' | 'amphibian' | 'bird' | 'mammal'

const KIND_OF: Record<Group, Kind> = {
  'lizard': 'reptile',
  'snake': 'reptile',
  'chelonian': 'reptile',
  'crocodilian': 'reptile',
  'amphibian-anuran': 'amphibian',
  'amphibian-caudate': 'amphibian',
  'bird-passerine': 'bird',
  'bird-other': 'bird',
  'mammal-placental': 'mammal',
  'mammal-marsupial': 'mammal',
}

/** @example kindOf('snake') // 'reptile' */
export function kindOf(group: Group): Kind {
  return KIND_OF[group]
}

/** True for animals that take their warmth from the place they are in. */
export function isEctotherm(group: Group): boolean {
  const kind = kindOf(group)
  return kind === 'reptile' || kind === 'amphibian'
}

export const GROUP_LABELS: Record<Group, string> = {
  'lizard': 'Lizards',
  'snake': 'Snakes',
  'chelonian': 'Tortoises and turtles',
  'crocodilian': 'Crocodilians',
  'amphibian-anuran': 'Frogs and toads',
  'amphibian-caudate': 'Salamanders and newts',
  'bird-passerine': 'Songbirds',
  'bird-other': 'Other birds',
  'mammal-placental': 'Mammals',
  'mammal-marsupial': 'Marsupials',
}
