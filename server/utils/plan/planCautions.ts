import type { PlanCondition, Tier } from '#shared/types/plan'
import { formatPercent } from '#shared/utils/quantity'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'

const RABIES_SPECIES = ['sp-fox', 'sp-pipistrelle', 'sp-flying-fox', 'sp-raccoon', 'sp-skunk']
const PELLET_CASTERS = ['sp-barn-owl', 'sp-tawny-owl', 'sp-little-owl', 'sp-great-horned-owl', 'sp-kestrel', 'sp-sparrowhawk', 'sp-buzzard', 'sp-red-tailed-hawk']
const KEPT_GROUPS = ['lizard', 'snake', 'chelonian', 'crocodilian', 'amphibian-anuran', 'amphibian-caudate']

/**
 * The usual cautions of the trade, each once and only where it applies.
 *
 * @param context  the plan's context; findings are added.
 * @param condition  how thin it is.
 * @param tier  refeeding risk, with `reasons`.
 * @param reasons  each reason for the tier, in words.
 * @returns nothing; the context's findings grow.
 * @throws Never.
 * @source nutrition sheet 10 (`safe-…`), corrections B to D, trade needs 5
 * @example planCautions(context, condition, 'extreme', ['48 % under its expected weight'])
 */
export function planCautions(context: PlanContext, condition: PlanCondition, tier: Tier, reasons: readonly string[]): void {
  const { species, kind, input } = context
  const say = (code: string, level: 'note' | 'caution' | 'stop', title: string, message: string, sourceKey: string) => context.findings.push(makeFinding(code, level, title, message, { sourceKey }))

  if (tier !== 'low') say('risk.refeeding', 'caution', `${tier.charAt(0).toUpperCase()}${tier.slice(1)} refeeding risk`, `${reasons.join('; ')}. Phosphate, potassium and magnesium can fall on days 1 to 7: weakness, trembling, fits, fast breathing or swelling are an emergency.`, 'cook2021')
  if (tier === 'extreme') say('risk.vetRequired', 'caution', 'A vet is needed for this one', 'At this risk no plan is safe without a vet: blood values, fluids and thiamine before the first feed are theirs to decide.', 'house-rule')
  if (species.notInList) say('species.notInList', 'caution', 'Species not known', 'The figures are wide ones for the whole group. Find out the species: diet, warmth and limits differ.', 'house-rule')
  if (condition.shortfallPercent === null) say('condition.unknown', 'note', 'Healthy weight unknown', condition.why, 'house-rule')
  if (condition.method === 'species-adult-weight' && condition.shortfallPercent! > 0) say('condition.fromSpecies', 'note', 'Healthy weight is a guess', `${formatPercent(condition.shortfallPercent! / 100)} under the middle of its species' adult weight; it may be ${formatPercent(condition.shortfallLowPercent! / 100)} to ${formatPercent(condition.shortfallHighPercent! / 100)}. Its length or an earlier weight would be surer.`, 'house-rule')
  if ((species.id === 'sp-cat' || species.id === 'sp-dog') && input.route === 'syringe') say('route.noSyringeCatDog', 'caution', 'Not by syringe', 'Syringe feeding of cats and dogs by mouth is no longer advised: it brings aversion and food into the lungs. Ask a vet about a feeding tube within 72 hours.', 'aaha2021')
  if (input.route === 'tube') say('route.tubeTrained', 'caution', 'Tube: trained people only', 'Placing and checking a tube is for a vet or someone a vet has trained. A tube in the windpipe drowns the animal.', 'hrb2020')
  if (input.route === 'tube' && input.flushMl === undefined) say('fluids.flushNotCounted', 'note', 'Flush water not counted', 'Water flushed through the tube counts toward the day\'s water. Enter it, at least twice what the tube holds.', 'house-rule')
  if (input.animal.signs.includes('swollen')) say('sign.swollen', 'caution', 'Swelling', 'Swelling under the skin or in the limbs can mean too much fluid or too little protein. Call a vet before fluids or food.', 'common-practice')
  if (input.animal.signs.includes('mouth-sore')) say('sign.mouthSore', 'caution', 'Sore mouth', 'A sore, swollen or broken mouth may need another way to feed. A vet should look first.', 'common-practice')
  if (input.animal.signs.includes('fed-by-finder')) say('sign.fedByFinder', 'caution', 'Already fed by someone', 'Find out what, how much and when. It counts, and it can make the first feed unsafe.', 'common-practice')
  if (input.animal.drynessPercent > 0 && (condition.shortfallPercent ?? 0) >= context.rules.condition.emaciatedFromPercent.value) say('fluids.skinMisleads', 'note', 'Skin and eyes mislead', 'Thinness itself tents the skin and sinks the eyes. Droppings, urates and a moist mouth tell more.', 'aaha2013')
  if (PELLET_CASTERS.includes(species.id)) say('species.pellet', 'note', 'Wait for the pellet', 'After a meal with fur or bone, no food until the pellet is up (12 to 18 hours at the earliest). No fur, bone or feathers while it is thin.', 'hrb2020')
  if (species.id === 'sp-swift') say('species.swift', 'caution', 'Insects, not slurry', 'Swifts are fed whole insects, 6 to 12 a feed, every 30 to 60 minutes, with water after each; never a blended mix. The amounts here are only a measure of energy.', 'hrb2020')
  if (RABIES_SPECIES.includes(species.id)) say('safety.rabies', 'caution', 'Professionals only', 'Foxes, bats, raccoons and skunks can carry rabies. Only people who are trained, vaccinated and permitted handle them.', 'merck')
  if (kind === 'mammal' && input.animal.lifeStage === 'growing') say('safety.milk', 'note', 'No cow\'s milk', 'Young mammals are not given cow\'s milk. Keep to a milk made for the species.', 'hrb2020')
  if (context.feed.demo) say('feed.demo', 'caution', 'Demo feed', 'This feed is invented for the demonstration. Do not feed by its figures: enter the label of yours.', 'demo')
  if (KEPT_GROUPS.includes(species.group) || kind === 'bird') say('safety.salmonella', 'note', 'Wash hands', 'Reptiles, amphibians and birds carry Salmonella. Wash hands after every contact; keep animals and dishes out of kitchens; no contact for children under 5.', 'aap')
  say('safety.legal', 'note', 'Local law comes first', 'Most wild animals may not be kept without a permit in many places, even to help them. Ask the local wildlife authority.', 'merck')
  say('safety.vet', 'note', 'This supports a vet, it does not replace one', 'Estimates only. A starved, collapsed or vomiting animal needs a veterinarian or a licensed rehabilitator.', 'merck')
}
