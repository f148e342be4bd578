import { describe, expect, it } from 'vitest'
import type { Plan } from '#shared/types/plan'
import { mixingPdf, packetPdf, sheetOnScreen, sheetPdf } from '../../../server/utils/print/index'
import { SheetRefusedError, type PrintOptions } from '../../../server/utils/print/options'
import { packetModel, partInWords } from '../../../server/utils/print/packet'
import { plainTextOf } from '../../../server/utils/print/richText'
import { sheetModel } from '../../../server/utils/print/sheet'
import { APPROVED, beardedDragon, dayOn, fromFirstDay, gecko, LAPSED, longestNames, LONGEST_APPROVED, LONGEST_CONTACTS, OPTIONS, potOf, shut, snake, sparrow, STOPPED } from './fixtures'
import { expectReadable } from './pageChecks'
import { plainOf, readPdf } from './readPdf'

const plain = (lines: readonly Parameters<typeof plainTextOf>[0][]) => lines.map(line => plainOf(plainTextOf(line)))
const printed = async (plan: Plan, options: Partial<PrintOptions> = {}) => readPdf(await packetPdf(plan, { ...OPTIONS, ...options }))

describe('the cover of a packet', () => {
  const { cover, title } = packetModel(beardedDragon(), { ...OPTIONS, approval: APPROVED })

  it('is about one animal, and says whether a vet approved', () => {
    expect([title, cover.title]).toEqual(['Foster packet: Juniper', 'Foster packet: Juniper'])
    expect(cover.identity).toMatchObject({ name: 'Juniper', caseNumber: 'TF-0412', enclosure: 'Warm room, tank 4' })
    expect(cover.approval).toMatchObject({ state: 'approved', band: 'Approved by Dr Amara Osei' })
    expect(cover.notice).toBeNull()
  })

  it('says whom to call and when to stop', () => {
    expect([cover.callTitle, cover.calls]).toEqual(['Who to call', [{ role: 'Vet', name: 'Dr Amara Osei', phone: '00 5550 0142' }, { role: 'Out of hours', name: null, phone: '00 5550 0199' }]])
    expect([cover.stopTitle, plainOf(cover.stop.weight), cover.stop.last]).toEqual(['When to stop', 'It weighs less than 173 g', 'Not sure? Do not feed. Leave a note. Call.'])
    expect(cover.stop.signs).toEqual(beardedDragon().stopSigns)
  })

  it('says how warm, until when, and when to weigh', () => {
    expect(cover.careTitle).toBe('Warmth and weight')
    expect(plain(cover.care)).toEqual([
      'Keep the warm end at 38–42 °C.',
      'No food until its body is at 33 °C or more.',
      'This plan is good until Wed 9 Dec. Then do not feed from it: call for a new one.',
      'Weigh next on Fri 4 Dec. Weigh every second day.',
    ])
  })

  it('lists what is in it, and has lines to sign on', () => {
    expect(cover.parts.map(part => plainOf(`${part.title}: ${part.place}`))).toEqual(['This cover: by the phone', 'Feeding sheet for Thu 3 to Sat 5 Dec: on the enclosure', 'Mixing card: where you mix'])
    expect(cover.writeIns).toEqual(['Taken by', 'Phone', 'Date'])
  })

  it.each([
    [2, 2, 'Mixing card, page 2: where you mix.'],
    [2, 3, 'Mixing card, pages 2 and 3: where you mix.'],
    [2, 5, 'Mixing card, pages 2 to 5: where you mix.'],
  ])('numbers a part from %d to %d', (from, to, words) => {
    expect(plainOf(plainTextOf(partInWords({ title: 'Mixing card', place: 'where you mix' }, from, to)))).toBe(words)
  })

  it('says wait, or do not feed, with the reasons', () => {
    expect(packetModel(fromFirstDay(), OPTIONS).cover.notice).toMatchObject({ word: 'WAIT', reasons: [{ title: 'Body temperature not measured' }, { title: 'Fluids first' }] })
    const packet = packetModel(shut(), OPTIONS)
    expect(packet.cover.notice).toMatchObject({ word: 'DO NOT FEED', reasons: [{ title: 'Cannot swallow' }, { title: 'Too cool to feed' }] })
    expect(packet.cover.parts.map(part => part.title)).toEqual(['This cover', 'DO NOT FEED sign'])
    expect(plain(packet.cover.care).join(' ')).not.toContain('feed from it')
  })
})

describe('a packet', () => {
  it('holds the sheet of the days, word for word', () => {
    const options = { ...OPTIONS, days: { from: 2, to: 5 }, approval: APPROVED }
    expect(packetModel(beardedDragon(), options).sheet).toEqual(sheetModel(beardedDragon(), options))
  })

  it('holds the mixing card of the days that are fed', () => {
    expect(packetModel(beardedDragon(), { ...OPTIONS, days: { from: 1, to: 2 } }).mixing?.rows.map(row => plainOf(row.days))).toEqual(['Thu 3 and Fri 4 Dec'])
    const short = { ...beardedDragon(), validity: { ...beardedDragon().validity, goodUntil: '2026-12-03' } }
    expect(packetModel(short, OPTIONS).mixing?.labels.map(label => plainOf(label.day))).toEqual(['Thu 3 Dec'])
  })

  it('has no mixing card where nothing is mixed', () => {
    const shutPlan = shut()
    const notMixed = { ...gecko(), mixing: [] }
    const fluidsOnly = packetModel(fromFirstDay(), { ...OPTIONS, days: { from: 1, to: 2 } })
    const heldDay = { ...beardedDragon(), days: [dayOn('2026-12-03', { state: 'do-not-feed', stateReason: 'Call a vet', feeds: beardedDragon().days[0]!.feeds })] }
    expect([packetModel(shutPlan, OPTIONS), packetModel(notMixed, OPTIONS), fluidsOnly, packetModel(heldDay, OPTIONS)].map(packet => packet.mixing)).toEqual([null, null, null, null])
    expect(fluidsOnly.cover.parts.map(part => plainOf(part.title))).toEqual(['This cover', 'Feeding sheet for Wed 2 and Thu 3 Dec'])
  })
})

describe('a packet is refused', () => {
  const missingOf = (plan: Plan, options: Partial<PrintOptions> = {}) => {
    try {
      packetModel(plan, { ...OPTIONS, ...options })
    }
    catch (error) {
      expect(error).toBeInstanceOf(SheetRefusedError)
      return (error as SheetRefusedError).missing
    }
    return []
  }

  it.each<[string, PrintOptions['contacts']]>([
    ['nobody', []],
    ['not said', undefined],
    ['a name without a number', [{ role: 'Vet', name: 'Dr Amara Osei' }]],
    ['an empty number', [{ role: 'Vet', phone: ' ' }]],
    ['words where the number goes', [{ role: 'Vet', phone: 'ask at the desk' }]],
  ])('without a number to ring: %s', (_, contacts) => {
    expect(missingOf(beardedDragon(), { contacts })).toEqual(['a phone number to call'])
    expect(missingOf(shut(), { contacts })).toEqual(['a phone number to call'])
  })

  it('not for one number among several people', () => {
    expect(missingOf(beardedDragon(), { contacts: [{ role: 'Vet', name: 'Dr Amara Osei' }, { role: 'Night', phone: '00 5550 0199' }] })).toEqual([])
  })

  it('where the sheet is, with everything at once', () => {
    const plan = { ...gecko(), routeLabel: '', stopSigns: [], mixing: [potOf('2026-12-03', '2026-12-05', { powderG: null })] }
    expect(missingOf(plan, { contacts: [] })).toEqual(['how to give it', 'when to stop and call', 'how much to weigh', 'a phone number to call'])
    expect(missingOf({ ...shut(), gate: { state: 'do-not-feed', findings: [] } })).toEqual(['the reason not to feed yet'])
    expect(missingOf(beardedDragon(), { days: { from: 12, to: 13 } })).toEqual(['day 12: the plan has 11 days'])
  })

  it('as a file too', async () => {
    await expect(packetPdf(beardedDragon(), { ...OPTIONS, contacts: [] })).rejects.toThrow('a phone number to call')
  })
})

const cases: [string, Plan, Partial<PrintOptions>][] = [
  ['bearded dragon, approved', beardedDragon(), { approval: APPROVED }],
  ['bearded dragon, a week', beardedDragon(), { days: { from: 1, to: 7 } }],
  ['first day, lapsed and stopped', fromFirstDay(), { approval: LAPSED, lifeNote: STOPPED }],
  ['gecko, not saved', gecko(), { reference: null }],
  ['sparrow', sparrow(), {}],
  ['snake', snake(), {}],
  ['shut gate', shut(), { approval: APPROVED }],
  ['longest names', longestNames(), {
    approval: LONGEST_APPROVED,
    lifeNote: STOPPED,
    reference: { ...OPTIONS.reference!, latestVersion: 4 },
    contacts: LONGEST_CONTACTS,
  }],
  ['no names', { ...beardedDragon(), animal: { ...beardedDragon().animal, name: '', caseNumber: '', enclosure: '' } }, {}],
]

describe('the file of a packet', () => {
  it.each(cases)('is readable, the same on A4 and Letter, and numbered right through: %s', async (_, plan, options) => {
    const [a4, letter] = await Promise.all([printed(plan, options), printed(plan, { ...options, paper: 'letter' })])
    expect(letter.pages.map(page => page.text)).toEqual(a4.pages.map(page => page.text))
    for (const page of [...a4.pages, ...letter.pages]) expectReadable(page)
    a4.pages.forEach((page, index) => expect(page.text).toContain(`page ${index + 1} of ${a4.pages.length}`))
    expect(a4.pages[0]!.text).toMatch(/Taken by Phone Date/)
    expect(a4.info).toMatchObject({ Title: `Foster packet: ${plan.animal.name || plan.animal.speciesName}`, Subject: 'Foster packet' })
  })

  it('has its parts on the pages that the cover names', async () => {
    const { pages } = await printed(beardedDragon(), { approval: APPROVED })
    expect(pages[0]!.text).toContain('This cover, page 1 : by the phone.')
    expect(pages[0]!.text).toContain('Feeding sheet for Thu 3 to Sat 5 Dec, pages 2 to 4 : on the enclosure.')
    expect(pages[0]!.text).toMatch(/Mixing card, pages 5 and 6 : where you mix\./)
    const at = (words: string) => pages.flatMap((page, index) => page.text.includes(words) ? [index + 1] : [])
    expect(at('Foster packet')).toEqual([1])
    expect(at('Initials')).toEqual([2, 3, 4])
    expect(at('Mixing card: Omnivore')).toEqual([5])
    expect(at('Bin after:')).toEqual([6])
  })

  it.each(cases.filter(([name]) => !['no names', 'longest names'].includes(name)))('has one page of cover with everything on it: %s', async (_, plan, options) => {
    const [cover, next] = (await printed(plan, options)).pages
    for (const words of ['Who to call', 'When to stop', 'In this packet', 'Warmth and weight', 'Not sure? Do not feed. Leave a note. Call.', 'Taken by']) expect(cover!.text).toContain(words)
    for (const sign of plan.stopSigns) expect(cover!.text).toContain(plainOf(sign))
    for (const { phone } of options.contacts ?? OPTIONS.contacts!) expect(cover!.texts.find(text => text.text === phone)!.size).toBeGreaterThanOrEqual(24)
    expect(next!.text).not.toContain('Foster packet')
  })

  it('sends a reader of the sheet to the page of the stop signs', async () => {
    const { pages } = await printed(beardedDragon())
    expect(pages[1]!.text).toContain('STOP & CALL')
    expect(pages[2]!.text).toContain('STOP & CALL signs: page 2.')
    expect((await readPdf(await sheetPdf(beardedDragon(), OPTIONS))).pages[1]!.text).toContain('STOP & CALL signs: page 1.')
  })

  it('says the same as the sheet and the mixing card by themselves', async () => {
    const days = { from: 1, to: 3 }
    const [packet, sheet, mixing] = await Promise.all([packetPdf, sheetPdf, mixingPdf].map(async print => readPdf(await print(beardedDragon(), { ...OPTIONS, days }))))
    const bare = (text: string) => text.replace(/page \d+ of \d+|signs: page \d+/g, '')
    const pages = packet!.pages.map(page => bare(page.text))
    expect(pages.slice(1)).toEqual([...sheet!.pages, ...mixing!.pages].map(page => bare(page.text)))
  })

  it('is a cover and a sign behind a shut gate, without an amount', async () => {
    const { pages, text } = await printed(shut(), { approval: APPROVED })
    expect(pages).toHaveLength(2)
    for (const page of pages) expect(page.text).toMatch(/DO NOT FEED.*Cannot swallow.*Too cool to feed/)
    expect(pages[0]!.text).toContain('00 5550 0142')
    expect(pages[1]!.text).toMatch(/Next check: day time by/)
    expect(text).not.toMatch(/\d\s?mL|syringe|Mixing card|\bFEED Only/)
  })

  it('writes no number of a page over another name, however many pages', async () => {
    const { pages } = await printed(longestNames(), { days: { from: 1, to: 7 }, approval: LONGEST_APPROVED })
    expect(pages.length).toBeGreaterThan(9)
    pages.forEach(expectReadable)
  })
})

it('shows on a screen what the sheet says', () => {
  expect(sheetOnScreen(fromFirstDay(), OPTIONS)).toEqual(sheetModel(fromFirstDay(), OPTIONS))
  expect(() => sheetOnScreen({ ...beardedDragon(), routeLabel: '' }, OPTIONS)).toThrow(SheetRefusedError)
})
