import type { Route } from '#shared/types/plan'
import { formatTemperatureC } from '#shared/utils/quantity'
import type { PlanContext } from './planContext'

/** Route in plain words, with who may do it. */
export const ROUTE_LABELS: Record<Route, string> = {
  syringe: 'By mouth with a syringe, by a carer who has been shown how',
  tube: 'By tube, only by someone a vet has trained',
  hand: 'Offered by hand or bowl, taken by itself',
}

/**
 * How to give a feed, one action each, for the route and the kind of animal.
 *
 * @param context  the plan's context.
 * @returns short sentences in order.
 * @throws Never.
 * @source common practice; `safe-residue`, `safe-aspiration` (nutrition sheet 10), trade needs 4.1
 * @example howToGive(context)[0] // 'Wash hands. Weigh it before the first feed of the day.'
 */
export function howToGive(context: PlanContext): string[] {
  const { kind, species, input } = context
  const steps = ['Wash hands. Weigh it before the first feed of the day.', `Check it is at ${formatTemperatureC(species.feedingTemperatureC.low)} or more. Colder: do not feed.`]
  if (kind === 'bird') steps.push(species.hasCrop ? 'Feel that the crop is empty. Still full: do not feed.' : 'Check droppings have come since the last feed.')
  if (input.route === 'syringe') {
    if (kind !== 'amphibian') steps.push('One drop on the lips; wait for a lick or a swallow.')
    steps.push('Go in at the side, a drop at a time. Watch each swallow.', 'Any bubble at the nose or a gasp: stop.')
  }
  if (input.route === 'tube') steps.push('Check the tube is where it should be.', 'Give slowly, over several minutes. Flush before and after.')
  if (input.route === 'hand') steps.push('Weigh what is offered and what is left over.', 'Take left-overs away within the hour.')
  steps.push('Never more than the sheet says, even if it asks.')
  steps.push('Leave it quiet and warm with its head up for 20 minutes.')
  if (kind === 'reptile' && species.group !== 'snake') steps.push('A shallow dish of water in reach, never a deep one.')
  steps.push('Tick the sheet at once. Wash hands again.')
  return steps
}

/**
 * Signs at which the carer stops and calls, one each.
 *
 * @param context  the plan's context.
 * @returns short phrases, most urgent first.
 * @throws Never.
 * @source trade needs 5, nutrition sheet 4.5 and 10 (`safe-regurgitate`, `safe-refeed`)
 * @example stopSigns(context).length // 6
 */
export function stopSigns(context: PlanContext): string[] {
  const signs = ['Food or fluid from the nose', 'Breathing with its mouth open, bubbles or clicks', 'Limp, trembling, twitching or fits', 'Brought up twice in a day', 'Swelling, or a hard or swollen belly']
  if (context.kind === 'bird') signs.push(context.species.hasCrop ? 'Crop not empty before the next feed' : 'No droppings since the last two feeds')
  return signs
}
