import type { RegimenInput } from '#shared/schemas/regimen'
import type { Finding } from '#shared/types/finding'
import type { PowderRecipe } from '#shared/types/reference'
import { CalcInputError } from '../calc/calcInputError'
import { equationNumber } from '../calc/equation/evaluateEquation'
import type { Edition } from '../reference'
import { makeFinding } from './makeFinding'

/** A feed with all that a plan needs of it. */
export interface ResolvedFeed {
  feedId: string | null
  name: string
  energyKcalPerMl: number
  waterFraction: number
  /** Half-width of the energy figure, as a fraction of it. */
  bandFraction: number
  recipe: PowderRecipe | null
  demo: boolean
  sourceKey: string
}

/** Assumed for an own feed whose water is not given. */
const ASSUMED_WATER_FRACTION = 0.8

/**
 * The feed of a plan: one of the edition's foods, or an own one by its label or its composition.
 *
 * @param feed  `{ feedId }`, or own figures: `energyKcalPerMl`, or protein, fat and carbohydrate in % as fed.
 * @param edition  reference data.
 * @param findings  findings of the plan; notes on assumptions are added.
 * @returns the feed; own feeds by composition are taken as 1 g/mL, energy by the modified Atwater factors.
 * @throws CalcInputError `feed.unknown` when the id is not in the edition;
 * @throws CalcInputError `feed.noEnergy` when its energy comes to nothing.
 * @source `atwater-modified` (3.5, 8.5, 3.5 kcal/g); density and assumed water are house rules
 * @example resolveFeed({ energyKcalPerMl: 1.2, waterFraction: 0.75 }, edition, []).energyKcalPerMl // 1.2
 */
export function resolveFeed(feed: RegimenInput['feed'], edition: Edition, findings: Finding[]): ResolvedFeed {
  if ('feedId' in feed) {
    const food = edition.foods.get(feed.feedId)
    if (!food) throw new CalcInputError('feed.unknown', `There is no feed "${feed.feedId}". Choose one from the list, or give your own.`, { path: 'feed.feedId', received: feed.feedId })
    return { feedId: food.id, name: food.name, energyKcalPerMl: food.energyKcalPerMl, waterFraction: food.waterFraction, bandFraction: food.energyBandFraction, recipe: food.recipe, demo: food.demo, sourceKey: food.provenance.energyKcalPerMl!.sourceKey }
  }
  const own = feed
  const { proteinPercent = 0, fatPercent = 0, carbohydratePercent = 0 } = own
  const byComposition = own.energyKcalPerMl === undefined
  const energyKcalPerMl = byComposition
    ? equationNumber(edition.equations.get('atwater-modified')!, { P: proteinPercent, F: fatPercent, C: carbohydratePercent })
    : own.energyKcalPerMl!
  if (!(energyKcalPerMl > 0)) throw new CalcInputError('feed.noEnergy', 'This feed comes to no energy at all. Give its energy in kcal/mL, or its protein, fat and carbohydrate in %.', { path: 'feed.energyKcalPerMl' })
  let waterFraction = own.waterFraction
  if (waterFraction === undefined) {
    waterFraction = byComposition ? 1 - (proteinPercent + fatPercent + carbohydratePercent) / 100 : ASSUMED_WATER_FRACTION
    findings.push(makeFinding('feed.waterAssumed', 'note', 'Water of the feed assumed', `The water of this feed was not given; ${Math.round(waterFraction * 100)} % is assumed. Give it from the label: it counts toward the day's water.`, { path: 'feed.waterFraction', sourceKey: 'house-rule' }))
  }
  return { feedId: null, name: own.name?.trim() || 'Own feed', energyKcalPerMl, waterFraction, bandFraction: edition.rules.validity.ownFeedBand.value, recipe: null, demo: false, sourceKey: byComposition ? edition.equations.get('atwater-modified')!.provenance.sourceKey : 'house-rule' }
}
