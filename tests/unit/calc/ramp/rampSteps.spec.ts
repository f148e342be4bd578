import { describe, expect, it } from 'vitest'
import { rampSteps } from '#server/utils/calc/ramp/rampSteps'

const hold = { fraction: 0.75, days: 4 }

describe('rampSteps', () => {
  it('leaves the wanted steps as they are without a hold', () => {
    const fractions = Object.freeze([0.25, 0.33, 0.5, 0.67, 0.85, 1])
    expect(rampSteps({ fractions, stepDays: 1, hold: null })).toEqual([...fractions])
  })
  it('holds early steps of one day and comes to the rest later', () => {
    expect(rampSteps({ fractions: [0.5, 0.75, 1], stepDays: 1, hold })).toEqual([0.5, 0.75, 0.75, 0.75, 1])
    expect(rampSteps({ fractions: [0.33, 0.5, 0.67, 1], stepDays: 1, hold })).toEqual([0.33, 0.5, 0.67, 0.75, 1])
  })
  it('needs no hold where steps are long', () => {
    expect(rampSteps({ fractions: [0.5, 0.75, 1], stepDays: 2, hold })).toEqual([0.5, 0.75, 1])
    expect(rampSteps({ fractions: [0.5, 0.75, 1], stepDays: 7, hold })).toEqual([0.5, 0.75, 1])
  })
  it('refuses an empty ramp and a step of nothing', () => {
    expect(() => rampSteps({ fractions: [], stepDays: 1, hold: null })).toThrow('at least one step')
    expect(() => rampSteps({ fractions: [0], stepDays: 1, hold: null })).toThrow()
  })
})
