import type { GateState, Stage } from '#shared/types/plan'

/** Why the gate is not open, by name. */
export type GateCause = 'closing-sign' | 'too-cold' | 'too-warm' | 'waiting-sign' | 'temperature-unknown' | 'warming' | 'fluids'

/**
 * Feed, wait or do not feed. Stronger than any number: nothing is given by mouth behind a closed gate.
 *
 * @param input  the animal at the start:
 * @param input.closingSigns  true with any sign that forbids food by mouth (see the signs' `closes`);
 * @param input.waitingSigns  true with any sign that asks to wait;
 * @param input.bodyTemperatureC  measured, deg C; null when unknown;
 * @param input.windowLowC  no food below this, deg C;
 * @param input.tooWarmC  no food above this, deg C, over the window;
 * @param input.stage  the stage the plan begins with.
 * @returns `{ state, causes }`, the causes in order of weight; empty only for `feed`.
 * @throws Never.
 * @source nutrition sheet 4.2, 8 and 10 (`safe-order`, `safe-cold`, `safe-aspiration`), trade needs 3 (show-stoppers)
 * @example gateState({ closingSigns: false, waitingSigns: false, bodyTemperatureC: 31, windowLowC: 35, tooWarmC: 41, stage: 'warm' }).state // 'do-not-feed'
 */
export function gateState(input: { closingSigns: boolean, waitingSigns: boolean, bodyTemperatureC: number | null, windowLowC: number, tooWarmC: number, stage: Stage }): { state: GateState, causes: GateCause[] } {
  const causes: GateCause[] = []
  if (input.closingSigns) causes.push('closing-sign')
  if (input.bodyTemperatureC !== null && input.bodyTemperatureC < input.windowLowC) causes.push('too-cold')
  const closed = causes.length > 0
  if (input.bodyTemperatureC !== null && input.bodyTemperatureC > input.tooWarmC) causes.push('too-warm')
  if (input.waitingSigns) causes.push('waiting-sign')
  if (input.bodyTemperatureC === null) causes.push('temperature-unknown')
  if (input.stage === 'warm') causes.push('warming')
  if (input.stage === 'fluids') causes.push('fluids')
  return { state: closed ? 'do-not-feed' : causes.length > 0 ? 'wait' : 'feed', causes }
}
