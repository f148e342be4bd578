import { describe, expect, it } from 'vitest'
import { gateState } from '#server/utils/calc/gate/gateState'

const well = { closingSigns: false, waitingSigns: false, bodyTemperatureC: 36, windowLowC: 35, tooWarmC: 41, stage: 'ramp' as const }

describe('gateState', () => {
  it.each([
    ['warm, hydrated, well', {}, 'feed', []],
    ['on the edge of the window', { bodyTemperatureC: 35 }, 'feed', []],
    ['a tenth below it', { bodyTemperatureC: 34.9 }, 'do-not-feed', ['too-cold']],
    ['a closing sign', { closingSigns: true }, 'do-not-feed', ['closing-sign']],
    ['both, the sign first', { closingSigns: true, bodyTemperatureC: 20, stage: 'warm' }, 'do-not-feed', ['closing-sign', 'too-cold', 'warming']],
    ['too warm', { bodyTemperatureC: 41.1 }, 'wait', ['too-warm']],
    ['a waiting sign', { waitingSigns: true }, 'wait', ['waiting-sign']],
    ['temperature not known', { bodyTemperatureC: null }, 'wait', ['temperature-unknown']],
    ['still being warmed', { stage: 'warm' }, 'wait', ['warming']],
    ['in the fluids stage', { stage: 'fluids' }, 'wait', ['fluids']],
  ] as const)('%s', (_, change, state, causes) => {
    expect(gateState({ ...well, ...change })).toEqual({ state, causes })
  })
})
