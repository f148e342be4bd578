import { describe, expect, it } from 'vitest'
import type { Plan } from '#shared/types/plan'
import { sheetPdf } from '../../../server/utils/print/index'
import { SheetRefusedError } from '../../../server/utils/print/options'
import { missingFor } from '../../../server/utils/print/refusal'
import { beardedDragon, dayOn, fromFirstDay, gecko, OPTIONS, shut, snake, sparrow } from './fixtures'

const plan = beardedDragon()
const day = plan.days[0]!
const withDay = (changes: Partial<typeof day>): Plan => ({ ...plan, days: [{ ...day, ...changes }] })
const withFeed = (changes: Partial<(typeof day.feeds)[number]>): Plan => withDay({ feeds: [{ ...day.feeds[0]!, ...changes }] })

async function refusalOf(refused: Plan, options = OPTIONS): Promise<string[]> {
  const error = await sheetPdf(refused, options).then(() => null, (reason: unknown) => reason)
  expect(error).toBeInstanceOf(SheetRefusedError)
  return (error as SheetRefusedError).missing
}

describe('a sheet is refused', () => {
  it.each<[string, Plan, string]>([
    ['what', { ...plan, feed: { ...plan.feed, name: ' ' } }, 'the name of the feed'],
    ['which strength', withDay({ strengthLabel: '' }), 'the strength on Thu 3 Dec'],
    ['how much', withDay({ feeds: [] }), 'how much to give on Thu 3 Dec'],
    ['how much (a zero)', withFeed({ volumeMl: 0 }), 'how much to give on Thu 3 Dec'],
    ['how much (no number)', withFeed({ volumeMl: Number.NaN }), 'how much to give on Thu 3 Dec'],
    ['the mark', withFeed({ markMl: 0 }), 'how much to give on Thu 3 Dec'],
    ['the syringe', withFeed({ syringe: { capacityMl: 1, stepMl: 0 } }), 'the syringe on Thu 3 Dec'],
    ['when', withFeed({ localTime: '' }), 'how often and when on Thu 3 Dec'],
    ['the route', { ...plan, routeLabel: '' }, 'how to give it'],
    ['the steps', { ...plan, howToGive: [''] }, 'how to give it'],
    ['the temperature', { ...plan, animal: { ...plan.animal, feedingTemperatureC: { low: Number.NaN, high: 37, what: 'body' } } }, 'the temperature to feed at'],
    ['the stop signs', { ...plan, stopSigns: [] }, 'when to stop and call'],
    ['the stop weight', { ...plan, validity: { ...plan.validity, stopWeightG: 0 } }, 'when to stop and call'],
    ['how long it holds', { ...plan, validity: { ...plan.validity, goodUntil: '' } }, 'how long the weight holds'],
    ['the species', { ...plan, animal: { ...plan.animal, speciesName: '' } }, 'the species'],
    ['why to wait', { ...fromFirstDay(), gate: { state: 'wait', findings: [] } }, 'the reason not to feed yet'],
    ['why not to feed', { ...shut(), gate: { state: 'do-not-feed', findings: [] } }, 'the reason not to feed yet'],
    ['why to wait on a day', { ...plan, days: [dayOn('2026-12-03', { state: 'wait', stateReason: '' })] }, 'the reason not to feed on Thu 3 Dec'],
  ])('without %s', async (_, refused, missing) => {
    expect(await refusalOf(refused)).toEqual([missing])
  })

  it('with everything that is missing at once', async () => {
    const refused = { ...plan, feed: { ...plan.feed, name: '' }, routeLabel: '', stopSigns: [], days: [{ ...day, feeds: [] }] }
    expect(await refusalOf(refused)).toEqual(['the name of the feed', 'how much to give on Thu 3 Dec', 'how to give it', 'when to stop and call'])
    await expect(sheetPdf(refused, OPTIONS)).rejects.toThrow('This sheet cannot be printed. It lacks: the name of the feed; how much to give on Thu 3 Dec; how to give it; when to stop and call.')
  })

  it.each([
    [{ from: 1, to: 8 }, 'a span of at most 7 days: 8 were asked for'],
    [{ from: 12, to: 13 }, 'day 12: the plan has 11 days'],
    [{ from: 0, to: 2 }, 'days to print: from 0 to 2 is no span of days'],
    [{ from: 3, to: 2 }, 'days to print: from 3 to 2 is no span of days'],
    [{ from: 1.5, to: 2 }, 'days to print: from 1.5 to 2 is no span of days'],
  ])('for the days %j', async (days, missing) => {
    expect(await refusalOf(plan, { ...OPTIONS, days })).toEqual([missing])
  })
})

describe('a sheet is not refused', () => {
  it.each([['dragon', plan], ['first day', fromFirstDay()], ['snake', snake()], ['sparrow', sparrow()], ['gecko', gecko()], ['shut', shut()]])('when it is whole: %s', (_, whole) => {
    expect(missingFor(whole, whole.days)).toEqual([])
  })

  it('behind a shut gate for want of an order', () => {
    expect(missingFor({ ...shut(), days: [], feed: { ...plan.feed, name: '' }, routeLabel: '', stopSigns: [] }, [])).toEqual([])
  })

  it('for days that give nothing', () => {
    expect(missingFor({ ...plan, feed: { ...plan.feed, name: '' }, routeLabel: '' }, [dayOn('2026-12-03', { state: 'wait', stateReason: 'Fluids only' })])).toEqual([])
  })

  it('for days that are not printed', () => {
    const later = { ...plan, days: [day, { ...day, date: '2026-12-04', feeds: [] }] }
    expect(missingFor(later, later.days.slice(0, 1))).toEqual([])
    expect(missingFor(later, later.days)).toEqual(['how much to give on Fri 4 Dec'])
  })
})
