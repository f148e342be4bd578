import { describe, expect, it } from 'vitest'
import { sheetModel, type Stretch } from '../../../server/utils/print/sheet'
import { plainTextOf } from '../../../server/utils/print/richText'
import { beardedDragon, dayOn, feedAt, fromFirstDay, gecko, longestNames, OPTIONS, shut, snake, sparrow } from './fixtures'
import { plainOf } from './readPdf'

const plain = (text: string) => plainOf(text)
/** A stretch as lines, to compare at a glance. */
function told(stretch: Stretch): string[] {
  return [
    `${stretch.band.word} | ${plain(stretch.band.days)} | ${plain(stretch.band.reason)}`,
    ...stretch.amounts.map(amount => plain(`${amount.heading} | ${amount.figure} ${amount.unit} | ${amount.words} | ${amount.syringe} | ${amount.strength}`)),
    ...stretch.days.map(day => plain(`${day.label} | ${day.note} | ${day.weigh} | ${day.water.label} ${day.water.figure ?? '-'} | ${day.rows.map(row => [row.time, row.give, row.giveNote].filter(Boolean).join(' ')).join(', ')}`)),
  ]
}

describe('a plan on paper', () => {
  it('says each day of a lizard, with a new amount where it changes', () => {
    const model = sheetModel(beardedDragon(), OPTIONS)
    expect(model.stretches.map(told)).toEqual([
      [
        'FEED | Thu 3 and Fri 4 Dec | Only at 33 °C or more',
        'Each feed: at 07:30, 14:00 and 20:30 | 0.4 mL | nought point four millilitres | 1 mL syringe, draw up to 0.4 mL | Half strength',
        'Thu 3 Dec | Feeding day 1 | Weigh before the first feed: | Water on top of feeds: 9.8 mL | 07:30 0.4 mL, 14:00 0.4 mL, 20:30 0.4 mL',
        'Fri 4 Dec | Feeding day 2 | Weigh before the first feed: | Water on top of feeds: 4.4 mL | 07:30 0.4 mL, 14:00 0.4 mL, 20:30 0.4 mL',
      ],
      [
        'FEED | Sat 5 Dec | Only at 33 °C or more',
        'Each feed: at 07:30, 14:00 and 20:30 | 0.35 mL | nought point three five millilitres | 1 mL syringe, draw up to 0.35 mL | Three-quarter strength',
        'Sat 5 Dec | Feeding day 3 | Weigh before the first feed: | Water on top of feeds: 4.5 mL | 07:30 0.35 mL, 14:00 0.35 mL, 20:30 0.35 mL',
      ],
    ])
    expect(model.identity).toEqual({ name: 'Juniper', caseNumber: 'TF-0412', enclosure: 'Warm room, tank 4', species: 'Inland bearded dragon', weight: '182\u00A0g, weighed Wed\u00A02\u00A0Dec' })
    expect(plain(model.dates)).toBe('Thursday 3 to Saturday 5 December, feeding days 1 to 3 of 11')
    expect(model.notice).toBeNull()
    expect(model.stretches[0]!.heads.map(plain)).toEqual(['Time', 'Give', 'Body 33 °C or more?', 'Taken (mL)', 'Brought up?', 'Droppings?', 'Initials'])
    expect(plain(model.stretches[0]!.facts.join(' '))).toBe('By mouth with a syringe, by a carer who has been shown how. Warm the feed to 35–38 °C.')
  })

  it('draws the barrel of the syringe that the plan chose, filled to the mark', () => {
    expect(sheetModel(gecko(), OPTIONS).stretches[0]!.amounts[0]!.barrel).toEqual({ capacityMl: 0.5, stepMl: 0.01, markMl: 0.05, markLabel: '0.05' })
    expect(sheetModel(snake(), OPTIONS).stretches[0]!.amounts[0]!.barrel).toEqual({ capacityMl: 60, stepMl: 1, markMl: 35, markLabel: '35' })
  })

  it('says noon, and that a feed is invented', () => {
    const [stretch] = sheetModel(gecko(), OPTIONS).stretches
    expect(told(stretch!)[1]).toBe('Each feed: at 07:30, 12:00 noon and 20:30 | 0.05 mL | nought point nought five millilitres | 0.5 mL syringe, draw up to 0.05 mL | Half strength')
    expect(stretch!.amounts[0]!.demo).toBe('Demo feed: invented figures. Not for a real animal.')
    expect(sheetModel(beardedDragon(), OPTIONS).stretches[0]!.amounts[0]!.demo).toBeNull()
  })

  it('gives a sparrow fourteen rows a day', () => {
    const stretches = sheetModel(sparrow(), OPTIONS).stretches
    expect(stretches.map(stretch => stretch.days.map(day => day.rows.length))).toEqual([[14], [14], [14]])
    expect(plain(stretches[0]!.amounts[0]!.heading)).toBe('Each feed: 14 times from 07:00 to 20:00')
  })

  it('gives a snake its meal in two draws and six days of waiting', () => {
    expect(sheetModel(snake(), { ...OPTIONS, days: { from: 1, to: 7 } }).stretches.map(told)).toEqual([
      [
        'FEED | Thu 3 Dec | Only at 28 °C or more',
        'One feed: at 18:00 | 70 mL | seventy millilitres | 60 mL syringe, draw up to 35 mL, 2 times for each feed | Half strength',
        'Thu 3 Dec | Feeding day 1 | Weigh before the first feed: | Water on top of feeds: 14 mL | 18:00 70 mL 2 × 35 mL',
      ],
      ['WAIT | Fri 4 to Wed 9 Dec | No meal today', ...['Fri 4', 'Sat 5', 'Sun 6', 'Mon 7', 'Tue 8', 'Wed 9'].map((day, index) => `${day} Dec | Feeding day ${index + 2} | Weigh at the same time each day: | Water to give in the day: 14 mL |`)],
    ])
  })

  it('puts the reason to wait before everything, and asks for water on those days', () => {
    const model = sheetModel(fromFirstDay(), OPTIONS)
    expect(model.notice).toMatchObject({ state: 'wait', word: 'WAIT', reasons: [{ title: 'Body temperature not measured' }, { title: 'Fluids first' }] })
    expect(plain(model.notice!.warm.join(' '))).toBe('No food until its body is at 33 °C or more. Keep the warm end at 38–42 °C.')
    expect(model.stretches.map(stretch => [stretch.band.word, stretch.amounts.length, ...stretch.days.map(day => plain(day.water.figure ?? '-'))])).toEqual([['WAIT', 0, '5.5 mL'], ['WAIT', 0, '11 mL'], ['FEED', 1, '4.4 mL']])
    expect(model.stretches[1]!.days[0]!.rows).toHaveLength(3)
    expect(plain(model.dates)).toBe('Wednesday 2 to Friday 4 December, feeding day 2 of 11')
  })

  it('is a sign and nothing else behind a shut gate', () => {
    const model = sheetModel(shut(), OPTIONS)
    expect(model.notice).toMatchObject({ state: 'do-not-feed', word: 'DO NOT FEED', reasons: [{ title: 'Cannot swallow' }, { title: 'Too cool to feed' }] })
    expect([model.stretches, model.boxes]).toEqual([[], []])
    expect(JSON.stringify({ ...model, foot: null })).not.toMatch(/\d\u00A0mL/)
  })

  it('orders nothing on a day of its own that says do not feed, even where the plan holds feeds', () => {
    const plan = beardedDragon()
    const day = dayOn('2026-12-03', { state: 'do-not-feed', stateReason: 'The meal is too small to measure: call a vet', feeds: [feedAt('2026-12-03', '07:30', 0.4)] })
    const [stretch] = sheetModel({ ...plan, days: [day] }, OPTIONS).stretches
    expect(stretch!.band).toMatchObject({ word: 'DO NOT FEED', reason: 'The meal is too small to measure: call a vet' })
    expect([stretch!.amounts, stretch!.days[0]!.rows.map(row => row.give)]).toEqual([[], ['']])
  })

  it('orders nothing that the weight no longer carries', () => {
    const plan = beardedDragon()
    const model = sheetModel({ ...plan, validity: { ...plan.validity, goodUntil: '2026-12-03' } }, OPTIONS)
    expect(model.stretches.map(stretch => [stretch.band.word, plain(stretch.band.days), plain(stretch.band.reason)])).toEqual([
      ['FEED', 'Thu 3 Dec', 'Only at 33 °C or more'],
      ['WAIT', 'Fri 4 and Sat 5 Dec', 'Weigh it and make a new sheet: the weight of Wed 2 Dec was good until Thu 3 Dec'],
    ])
    expect(model.stretches[1]!.days.map(day => [day.water, day.rows[0]!.give])).toEqual(Array(2).fill([{ label: 'Water: see the new sheet', figure: null }, '']))
    expect(plainTextOf(model.boxes[0]!.lines[0]!)).not.toContain('Three-quarter')
  })

  it('shows two amounts of one day with the times of each', () => {
    const plan = beardedDragon()
    const date = '2026-12-03'
    const day = dayOn(date, { feeds: [feedAt(date, '07:30', 0.4), feedAt(date, '14:00', 0.4), feedAt(date, '20:30', 0.3)] })
    const amounts = sheetModel({ ...plan, days: [day] }, OPTIONS).stretches[0]!.amounts
    expect(amounts.map(amount => plain(`${amount.heading}: ${amount.figure}`))).toEqual(['Each feed: at 07:30 and 14:00: 0.4', 'One feed: at 20:30: 0.3'])
  })

  it('asks for a soak where an amphibian gets no volume', () => {
    const plan = beardedDragon()
    const day = dayOn('2026-12-03', { stage: 'fluids', state: 'wait', stateReason: 'Fluids only, no food yet', feedingDay: 0, waterNeedMl: 0, waterToGiveMl: 0 })
    expect(sheetModel({ ...plan, fluids: { ...plan.fluids, maintenanceMlPerDay: 0 }, days: [day] }, OPTIONS).stretches[0]!.days[0]!.water).toEqual({ label: 'Soak given, for how long:', figure: null })
    expect(sheetModel({ ...plan, days: [{ ...day, waterNeedMl: 1 }] }, OPTIONS).stretches[0]!.days[0]!.water).toEqual({ label: 'No water on top', figure: null })
    expect(sheetModel({ ...plan, days: [{ ...day, waterNeedMl: 1, waterToGiveMl: 0.0321 }] }, OPTIONS).stretches[0]!.days[0]!.water).toEqual({ label: 'Water: less than a drop', figure: null })
  })
})

describe('boxes', () => {
  it('say what to mix for the printed days only, once what is the same', () => {
    const [mix, how] = sheetModel(beardedDragon(), OPTIONS).boxes
    expect(mix!.lines.map(line => plain(plainTextOf(line)))).toEqual([
      'Half strength, Thu 3 and Fri 4 Dec: 1 g of powder and 4 mL of warm boiled water. 1 part powder to 4 parts water by weight, so 5 parts in all.',
      'Three-quarter strength, Sat 5 Dec: 1.2 g of powder and 3 mL of warm boiled water. 2 parts powder to 5 parts water by weight, so 7 parts in all.',
      'Weigh and measure, never by scoop. Warm it in a cup of warm water, never a microwave.',
      'Bin it 2 hours after mixing at room warmth, 24 hours in the fridge, 1 hour once started.',
      'Lumpy, thick or smells: bin it, make new.',
    ])
    expect(how).toEqual({ title: 'How to give it', lines: beardedDragon().howToGive })
  })

  it('stop with signs, weight, people and the last word', () => {
    const { stop } = sheetModel(beardedDragon(), OPTIONS)
    expect(stop.signs).toEqual(beardedDragon().stopSigns)
    expect(plain(stop.weight)).toBe('It weighs less than 173 g')
    expect(stop.calls).toEqual([{ role: 'Vet', name: 'Dr Amara Osei', phone: '00 5550 0142' }, { role: 'Out of hours', name: null, phone: '00 5550 0199' }])
    expect(stop.last).toBe('Not sure? Do not feed. Leave a note. Call.')
  })

  it.each([
    [[], [['By day', null], ['At night', null]]],
    [[{ role: 'Vet', phone: '00 5550 0142' }], [['Vet', '00 5550 0142'], ['At night', null]]],
    [[{ role: 'Night line', phone: '00 5550 0199' }], [['Night line', '00 5550 0199']]],
    [[{ role: 'Vet', name: '  ', phone: ' ' }], [['Vet', null], ['At night', null]]],
  ])('leave lines to write on for people who were not given: %j', (contacts, lines) => {
    expect(sheetModel(beardedDragon(), { ...OPTIONS, contacts }).stop.calls.map(call => [call.role, call.phone])).toEqual(lines)
  })
})

describe('what a sheet rests on', () => {
  const foot = (model: ReturnType<typeof sheetModel>) => model.foot.lines.map(line => plain(plainTextOf(line)))

  it('is at the foot: weight, dates, version, when made', () => {
    const model = sheetModel(beardedDragon(), OPTIONS)
    expect(model.foot.band).toBe('NOT APPROVED BY A VET')
    expect(foot(model)).toEqual([
      'Worked out from 182 g, weighed Wed 2 Dec. Good until Wed 9 Dec. Next weigh-in Fri 4 Dec.',
      'Sheet TF-0412, version 2. Replaces version 1: bin it. Made Wed 2 Dec 2026, 18:40. Saltings Rescue',
    ])
    expect(model.origin).toBe('Thimbleful 0.1.0, reference data 2026-1. Sources: andrews1985, house-rule, nice2006, label2026, meiri2024.')
  })

  it('says the time on the plan\'s own clock', () => {
    expect(foot(sheetModel({ ...beardedDragon(), timeZone: 'Australia/Sydney' }, OPTIONS))[1]).toContain('Made Thu 3 Dec 2026, 05:40.')
    expect(foot(sheetModel({ ...beardedDragon(), timeZone: 'Europe/London' }, { ...OPTIONS, madeAt: '2026-07-01T11:00:00Z' }))[1]).toContain('Made Wed 1 Jul 2026, 12:00 noon.')
  })

  it.each([
    ['a first version', { version: 1, latestVersion: 1 }, null, null],
    ['a later version', { version: 3, latestVersion: 3 }, 'Replaces version 2: bin it.', null],
    ['a version that was replaced', { version: 3, latestVersion: 5 }, 'Replaces version 2: bin it.', 'SUPERSEDED. Version 5 is newer: do not use this sheet.'],
  ])('tells %s', (_, versions, replaces, superseded) => {
    expect(sheetModel(beardedDragon(), { ...OPTIONS, reference: { ...OPTIONS.reference!, ...versions } }).coded).toMatchObject({ code: 'TF-0412', replaces, superseded })
  })

  it('says so when the plan was not saved', () => {
    const model = sheetModel(beardedDragon(), { ...OPTIONS, reference: null, teamName: undefined })
    expect(model.coded).toEqual({ code: null, version: null, url: null, note: 'Not saved: this sheet has no code.', replaces: null, superseded: null, lifeNote: null })
    expect(foot(model)[1]).toBe('Not saved, no code. Made Wed 2 Dec 2026, 18:40.')
  })

  it('keeps the longest names whole', () => {
    const { animal } = longestNames()
    expect(sheetModel(longestNames(), OPTIONS).identity).toMatchObject({ name: animal.name, caseNumber: animal.caseNumber, enclosure: animal.enclosure })
  })
})

it('changes nothing in the plan', () => {
  const plan = fromFirstDay()
  const before = structuredClone(plan)
  sheetModel(plan, OPTIONS)
  expect(plan).toEqual(before)
})
