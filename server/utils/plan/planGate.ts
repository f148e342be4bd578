import type { Finding } from '#shared/types/finding'
import type { PlanGate } from '#shared/types/plan'
import { SIGNS, type Sign } from '#shared/schemas/regimen'
import { formatNumber, formatTemperatureC } from '#shared/utils/quantity'
import { gateState, type GateCause } from '../calc/gate/gateState'
import { makeFinding } from './makeFinding'
import type { PlanContext } from './planContext'
import type { RampOutline } from './planRamp'

/** Over the top of the window by this much, an animal is cooled before it is fed. */
const TOO_WARM_OVER_C = 1

/**
 * Feed, wait or do not feed, with each reason as a finding, worst first.
 *
 * @param context  the plan's context.
 * @param outline  hours of warming and fluids that the plan begins with.
 * @returns the gate. Its findings are not added to the context: the plan lists them first.
 * @throws Never for a context that `planContext` made.
 * @source `safe-order`, `safe-cold`, `safe-aspiration` (nutrition sheet 10), trade needs 3 and 5
 * @example planGate(context, outline).state // 'do-not-feed' at 20 deg C
 */
export function planGate(context: PlanContext, outline: RampOutline): PlanGate {
  const ticked = context.input.animal.signs
  const closing = ticked.filter(sign => SIGNS[sign].closes === 'do-not-feed')
  const waiting = ticked.filter(sign => SIGNS[sign].closes === 'wait')
  const { low, high, what } = context.species.feedingTemperatureC
  const stage = outline.warmHours > 0 && context.bodyTemperatureC !== null ? 'warm' : outline.fluidHours > 0 ? 'fluids' : 'ramp'
  const { state, causes } = gateState({ closingSigns: closing.length > 0, waitingSigns: waiting.length > 0, bodyTemperatureC: context.bodyTemperatureC, windowLowC: low, tooWarmC: high + TOO_WARM_OVER_C, stage })
  const where = what === 'body' ? 'Body' : what === 'water' ? 'Water' : 'Air around it'
  const source = context.species.provenance.feedingTemperatureC!.sourceKey
  const findings: Finding[] = []
  const add: Record<GateCause, () => void> = {
    'closing-sign': () => closing.forEach(sign => findings.push(closingFinding(sign))),
    'too-cold': () => findings.push(makeFinding('gate.tooCold', 'stop', 'Too cold to feed', `${where} at ${formatTemperatureC(context.bodyTemperatureC!)}; no food under ${formatTemperatureC(low)}. Warm it slowly, then fluids, then food: food rots in a cold gut.`, { path: 'animal.bodyTemperatureC', expected: low, received: context.bodyTemperatureC!, unit: 'deg C', sourceKey: source })),
    'too-warm': () => findings.push(makeFinding('gate.tooWarm', 'stop', 'Too warm to feed', `${where} at ${formatTemperatureC(context.bodyTemperatureC!)}; ${formatTemperatureC(high)} is the top for this species. Move it somewhere cooler first, and call a vet if it is limp or gaping.`, { path: 'animal.bodyTemperatureC', expected: high, received: context.bodyTemperatureC!, unit: 'deg C', sourceKey: source })),
    'waiting-sign': () => waiting.forEach(sign => findings.push(waitingFinding(sign))),
    'temperature-unknown': () => findings.push(makeFinding('gate.temperatureUnknown', 'caution', 'Take its temperature first', `No food under ${formatTemperatureC(low)}. Measure ${what === 'body' ? 'its body, or the place it has lain for half an hour,' : what === 'water' ? 'the water' : 'the air around it'} before the first feed.`, { path: 'animal.bodyTemperatureC', expected: low, unit: 'deg C', sourceKey: source })),
    'warming': () => findings.push(makeFinding('gate.warming', 'caution', 'Warm it first', `About ${formatNumber(outline.warmHours, 1)} h until it is at ${formatTemperatureC(low)}; the thermometer decides, not the clock. No food until then.`, { expected: low, unit: 'deg C', sourceKey: 'hrb2020' })),
    'fluids': () => findings.push(makeFinding('gate.fluids', 'caution', 'Fluids before food', `Fluids only for ${formatNumber(outline.fluidHours, 1)} h. Feeding a dry, starved animal first can kill it.`, { expected: outline.fluidHours, unit: 'h', sourceKey: 'house-rule' })),
  }
  causes.forEach(cause => add[cause]())
  return { state, findings }
}

/** The one reason that closes every day of the plan until someone has looked again; null when none does. */
export function closedReasonOf(context: PlanContext): string | null {
  const sign = context.input.animal.signs.find(one => SIGNS[one].closes === 'do-not-feed')
  return sign ? SIGNS[sign].label : null
}

const CLOSING_ADVICE: Partial<Record<Sign, string>> = {
  'unresponsive': 'Keep it warm and still and call a vet now.',
  'convulsing': 'It cannot swallow in a fit. Keep it dark and quiet and call a vet now.',
  'cannot-swallow': 'What goes in goes to the lungs. A vet must choose another way.',
  'cannot-hold-head-up': 'What goes in goes to the lungs. A vet must choose another way.',
  'open-mouth-breathing': 'Nothing by mouth. Call a vet today.',
  'blockage-suspected': 'Nothing by mouth. Call a vet today.',
  'crop-full': 'Give no food on top. Check again in two hours; if it does not empty, call a vet.',
}

function closingFinding(sign: Sign): Finding {
  return makeFinding(`gate.${camelOf(sign)}`, 'stop', SIGNS[sign].label, `Do not feed by mouth. ${CLOSING_ADVICE[sign] ?? ''}`.trim(), { path: 'animal.signs', received: sign, sourceKey: sign === 'crop-full' ? 'hrb2020' : 'edubirds' })
}

function waitingFinding(sign: Sign): Finding {
  const message = sign === 'no-droppings-yet'
    ? 'Warmth and drops of fluid first; food may begin once droppings come.'
    : 'Do not feed again at once. Rest it, check mouth and nose, and call a vet if it happens twice in a day.'
  return makeFinding(`gate.${camelOf(sign)}`, 'caution', SIGNS[sign].label, message, { path: 'animal.signs', received: sign, sourceKey: sign === 'no-droppings-yet' ? 'hrb2020' : 'common-practice' })
}

function camelOf(sign: string): string {
  return sign.replace(/-(\w)/g, (_, letter: string) => letter.toUpperCase())
}
