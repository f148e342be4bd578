import type { PlanDay, PlanUncertainty } from '#shared/types/plan'
import { combinedUncertainty } from '../calc/sureness/combinedUncertainty'
import { standardFromLimit } from '../calc/sureness/standardFromLimit'
import type { PlanContext } from './planContext'
import { scaleStepG } from './planValidity'

/**
 * How sure the energy of one feed is: the scale the animal stood on, the feed's energy figure, the syringe.
 *
 * @param context  the plan's context.
 * @param days  days of the plan; the first feed is judged, the smallest and so the least sure.
 * @returns expanded relative uncertainty, k = 2, with its parts; without a feed the syringe's part is 0.
 * @throws Never for a context that `planContext` made.
 * @source JCGM 100:2008 (GUM) 4.3.7, 5.1.2; ISO 7886-1 for the syringe
 * @example planUncertainty(context, days).parts.map(part => part.name) // ['scale', 'density', 'syringe']
 */
export function planUncertainty(context: PlanContext, days: readonly PlanDay[]): PlanUncertainty {
  const feed = days.find(day => day.feeds.length > 0)?.feeds[0]
  const relative = {
    scale: standardFromLimit(scaleStepG(context) / 2) / context.weightG,
    density: standardFromLimit(context.feed.bandFraction),
    syringe: feed ? standardFromLimit(feed.toleranceFraction) : 0,
  }
  const { relativeExpanded, shares } = combinedUncertainty(relative)
  return {
    relativeExpanded,
    coverageFactor: 2,
    parts: [
      { name: 'scale', label: 'The scale it was weighed on', relativeStandard: relative.scale, share: shares.scale },
      { name: 'density', label: 'Energy figure of the feed', relativeStandard: relative.density, share: shares.density },
      { name: 'syringe', label: 'The syringe, at the first feed', relativeStandard: relative.syringe, share: shares.syringe },
    ],
  }
}
