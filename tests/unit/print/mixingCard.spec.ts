import { describe, expect, it } from 'vitest'
import { SheetRefusedError } from '../../../server/utils/print/options'
import { mixingCardModel } from '../../../server/utils/print/mixingCard'
import { plainTextOf } from '../../../server/utils/print/richText'
import { beardedDragon, fromFirstDay, gecko, OPTIONS, potOf, shut, snake } from './fixtures'
import { plainOf } from './readPdf'

const steps = (model: ReturnType<typeof mixingCardModel>) => model.steps.map(step => plainOf(plainTextOf(step)))
const rows = (model: ReturnType<typeof mixingCardModel>) => model.rows.map(row => Object.values(row).map(plainOf))

describe('a mixing card', () => {
  it('has a row for each strength, in grams and millilitres', () => {
    const model = mixingCardModel(beardedDragon(), OPTIONS)
    expect(model.heads.map(plainOf)).toEqual(['Days', 'Strength', 'Powder', 'Water', 'Makes', 'Energy in 1 mL'])
    expect(rows(model)).toEqual([
      ['Thu 3 and Fri 4 Dec', 'Half strength', '1 g', '4 mL', '4.7 mL', '0.61 kcal', '1 part powder to 4 parts water by weight, so 5 parts in all.'],
      ['Sat 5 to Sun 13 Dec', 'Three-quarter strength', '1.2 g', '3 mL', '3.9 mL', '0.91 kcal', '2 parts powder to 5 parts water by weight, so 7 parts in all.'],
    ])
  })

  it('says the amounts in the steps when there is one strength, and points at the row when there are more', () => {
    expect(steps(mixingCardModel(gecko(), OPTIONS)).slice(2, 4)).toEqual(['Weigh in 1 g of powder. Never a scoop: scoops run high.', 'Add 4 mL of warm boiled water, measured with a syringe.'])
    expect(steps(mixingCardModel(beardedDragon(), OPTIONS)).slice(2, 4)).toEqual(['Weigh in the powder of today\'s row. Never a scoop: scoops run high.', 'Add the water of today\'s row, boiled and warm, measured with a syringe.'])
  })

  it('warms in a cup, never in a microwave, to the plan\'s temperature', () => {
    expect(steps(mixingCardModel(gecko(), OPTIONS)).at(-1)).toBe('Warm only what you need, in a cup of warm water, to 35–38 °C. Check with a thermometer. Never a microwave: it leaves scalding pockets.')
  })

  it('has a sieve for a tube only', () => {
    expect(steps(mixingCardModel(snake(), OPTIONS)).filter(step => step.includes('sieve'))).toHaveLength(1)
    expect(steps(mixingCardModel(gecko(), OPTIONS)).filter(step => step.includes('sieve'))).toHaveLength(0)
  })

  it('measures a liquid feed, with and without water', () => {
    const plan = gecko()
    const liquid = { ...plan, mixing: [potOf('2026-12-03', '2026-12-05', { powderG: null, feedMl: 2, waterMl: 2 })] }
    expect(steps(mixingCardModel(liquid, OPTIONS)).slice(1, 4)).toEqual(['Measure 2 mL of the feed with a syringe.', 'Add 2 mL of warm boiled water, measured with a syringe.', 'Stir until it is even.'])
    const neat = { ...plan, mixing: [potOf('2026-12-03', '2026-12-05', { powderG: null, feedMl: 2, waterMl: 0, ratioInWords: 'as it is, no water added' })] }
    expect(steps(mixingCardModel(neat, OPTIONS)).join(' ')).not.toContain('water, measured')
    expect(rows(mixingCardModel(neat, OPTIONS))[0]!.slice(2, 4)).toEqual(['2 mL', 'none'])
  })

  it('says when to bin it, and not to thin by eye', () => {
    const model = mixingCardModel(beardedDragon(), OPTIONS)
    expect(model.discard.map(plainOf)).toEqual(['Bin it 2 hours after mixing at room warmth, 24 hours in the fridge, 1 hour once started.'])
    expect(model.bin).toBe('Lumpy, thick or smells? Bin it, make new. Do not thin it by eye.')
    expect(mixingCardModel({ ...gecko(), mixing: [potOf('2026-12-03', '2026-12-05', { discardHours: { room: 0.5, started: 1.5, fridge: 24 } })] }, OPTIONS).discard.map(plainOf)).toEqual(['Bin it 30 minutes after mixing at room warmth, 24 hours in the fridge, 1.5 hours once started.'])
  })

  it('has a label for the pot of each day', () => {
    const { labels } = mixingCardModel(beardedDragon(), { ...OPTIONS, days: { from: 2, to: 3 } })
    expect(labels.map(label => [label.mix, label.animal, plainOf(label.day)])).toEqual([
      ['Omnivore recovery mix, half strength', 'Juniper, case TF-0412, Warm room, tank 4', 'Fri 4 Dec'],
      ['Omnivore recovery mix, three-quarter strength', 'Juniper, case TF-0412, Warm room, tank 4', 'Sat 5 Dec'],
    ])
    expect(plainOf(labels[0]!.lines.join(' | '))).toBe('Made at | Bin at | Made by | Bin after: fridge 24 hours, room 2 hours, started 1 hour')
    expect(mixingCardModel(beardedDragon(), OPTIONS).labels).toHaveLength(6)
  })

  it('shows the pots of the days asked for, or all where those days have none', () => {
    expect(rows(mixingCardModel(beardedDragon(), { ...OPTIONS, days: { from: 1, to: 2 } }))).toHaveLength(1)
    const plan = fromFirstDay()
    expect(rows(mixingCardModel(plan, { ...OPTIONS, days: { from: 1, to: 1 } }))).toHaveLength(2)
    expect(mixingCardModel(plan, { ...OPTIONS, days: { from: 1, to: 1 } }).labels.length).toBeGreaterThan(0)
  })

  it('mixes nothing behind a shut gate', () => {
    const model = mixingCardModel(shut(), OPTIONS)
    expect([model.rows, model.steps, model.labels]).toEqual([[], [], []])
    expect(model.nothing).toEqual({ isSign: true, title: 'Nothing to mix', message: 'Cannot swallow. Nothing by mouth. Call a vet now.' })
    expect(mixingCardModel({ ...beardedDragon(), mixing: [] }, OPTIONS).nothing).toEqual({ isSign: false, title: 'Nothing to mix', message: 'No feed of this plan is mixed.' })
  })

  it.each([
    ['the name of the feed', { feedName: ' ' }],
    ['how much to weigh', { powderG: null }],
    ['how much to weigh', { powderG: 0 }],
    ['how much water', { waterMl: Number.NaN }],
    ['how warm to give it', { warmToC: { low: Number.NaN, high: 38 } }],
  ])('is refused without %s', (missing, changes) => {
    const refused = () => mixingCardModel({ ...gecko(), mixing: [potOf('2026-12-03', '2026-12-05', changes)] }, OPTIONS)
    expect(refused).toThrow(SheetRefusedError)
    expect(refused).toThrow(missing)
  })

  it('says that a feed is invented', () => {
    expect(mixingCardModel(gecko(), OPTIONS).demo).toBe('Demo feed: invented figures. Not for a real animal.')
    expect(mixingCardModel(beardedDragon(), OPTIONS).demo).toBeNull()
  })
})
