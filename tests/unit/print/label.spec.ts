import { describe, expect, it } from 'vitest'
import { labelModel } from '../../../server/utils/print/label'
import { beardedDragon, fromFirstDay, OPTIONS, shut, snake } from './fixtures'
import { plainOf } from './readPdf'

describe('a label', () => {
  it('has a strip for each amount, with state, times, strength and both identifiers', () => {
    const { strips } = labelModel(beardedDragon(), OPTIONS)
    expect(strips.map(strip => plainOf([strip.identity.name, strip.identity.enclosure, strip.band.word, strip.band.days, strip.amounts.map(amount => `${amount.heading} ${amount.figure} mL ${amount.strength}`).join()].join(' | ')))).toEqual([
      'Juniper | Warm room, tank 4 | FEED | Thu 3 and Fri 4 Dec | Each feed: at 07:30, 14:00 and 20:30 0.4 mL Half strength',
      'Juniper | Warm room, tank 4 | FEED | Sat 5 Dec | Each feed: at 07:30, 14:00 and 20:30 0.35 mL Three-quarter strength',
    ])
    expect(strips[0]!.facts.map(plainOf).at(-1)).toBe('Water on top of feeds: Thu 3 Dec 9.8 mL, Fri 4 Dec 4.4 mL.')
    expect(strips[0]!.call?.phone).toBe('00 5550 0142')
    expect(plainOf(strips[0]!.terms.join(' '))).toBe('NOT APPROVED BY A VET. Good until Wed 9 Dec. Sheet TF-0412, version 2.')
  })

  it('says to wait, and how much water, on days before food', () => {
    expect(labelModel(fromFirstDay(), OPTIONS).strips.map(strip => [strip.band.word, strip.amounts.length, plainOf(strip.facts.at(-1)!)])).toEqual([
      ['WAIT', 0, 'Water to give in the day: 5.5 mL.'],
      ['WAIT', 0, 'Water to give in the day: 11 mL.'],
      ['FEED', 1, 'Water on top of feeds: 4.4 mL.'],
    ])
  })

  it('is one sign behind a shut gate', () => {
    const { strips } = labelModel(shut(), OPTIONS)
    expect(strips).toHaveLength(1)
    expect(strips[0]).toMatchObject({ band: { state: 'do-not-feed', word: 'DO NOT FEED', reason: 'Cannot swallow. Too cool to feed', days: '' }, amounts: [] })
  })

  it('warns of heat-printed paper once', () => {
    expect(labelModel(snake(), OPTIONS).note).toBe('Not on direct-thermal labels near heat lamps, disinfectant or plastic: they fade and darken. Laser print, matt.')
  })

  it('has no number to ring when none was given', () => {
    expect(labelModel(beardedDragon(), { ...OPTIONS, contacts: [] }).strips[0]!.call).toBeNull()
  })
})
