import fc from 'fast-check'
import { encode } from 'uqr'
import { describe, expect, it } from 'vitest'
import type { Plan } from '#shared/types/plan'
import { formatVolumeMl, volumeInWords } from '#shared/utils/quantity'
import { labelPdf, mixingPdf, sheetPdf } from '../../../server/utils/print/index'
import type { PrintOptions } from '../../../server/utils/print/options'
import { beardedDragon, dayOn, feedAt, fromFirstDay, gecko, longestNames, NAMES, OPTIONS, shut, snake, sparrow } from './fixtures'
import { expectInsideMargins, PT_PER_MM } from './pageChecks'
import { collisions, plainOf, readPdf, type ReadFile } from './readPdf'

const PRINTS = { sheet: sheetPdf, mixing: mixingPdf, label: labelPdf }

const cases: [string, Plan, Partial<PrintOptions>][] = [
  ['bearded dragon', beardedDragon(), {}],
  ['bearded dragon, one day', beardedDragon(), { days: { from: 1, to: 1 } }],
  ['bearded dragon, a week', beardedDragon(), { days: { from: 1, to: 7 } }],
  ['first day', fromFirstDay(), {}],
  ['gecko, not saved, no contacts', gecko(), { reference: null, contacts: [] }],
  ['sparrow', sparrow(), {}],
  ['snake, a week', snake(), { days: { from: 1, to: 7 } }],
  ['shut gate', shut(), {}],
  ['longest names, replaced', longestNames(), { reference: { ...OPTIONS.reference!, latestVersion: 4 } }],
  ['no names', { ...beardedDragon(), animal: { ...beardedDragon().animal, name: '', caseNumber: '', enclosure: '' } }, {}],
  ['weight out of date', { ...beardedDragon(), validity: { ...beardedDragon().validity, goodUntil: '2026-12-03' } }, {}],
]

async function printed(plan: Plan, options: Partial<PrintOptions> = {}, kind: keyof typeof PRINTS = 'sheet'): Promise<ReadFile> {
  return readPdf(await PRINTS[kind](plan, { ...OPTIONS, ...options }))
}

describe.each(Object.keys(PRINTS) as (keyof typeof PRINTS)[])('every %s', (kind) => {
  it.each(cases)('keeps its margins and sizes, says the same on A4 and Letter and names itself on every page: %s', async (_, plan, options) => {
    const [a4, letter] = await Promise.all([printed(plan, { ...options, paper: 'a4' }, kind), printed(plan, { ...options, paper: 'letter' }, kind)])
    expect(letter.pages.map(page => page.text)).toEqual(a4.pages.map(page => page.text))
    expect(new Set(a4.pages.map(page => `${page.width.toFixed()} ${page.height.toFixed()}`))).toEqual(new Set(['595 842']))
    expect(new Set(letter.pages.map(page => `${page.width} ${page.height}`))).toEqual(new Set(['612 792']))
    for (const page of [...a4.pages, ...letter.pages]) {
      expectInsideMargins(page)
      expect(Math.min(...page.texts.map(text => text.size))).toBeGreaterThanOrEqual(12)
      expect(collisions(page)).toEqual([])
    }
    a4.pages.forEach((page, index) => {
      expect(page.text).toContain(plainOf(plan.animal.name || plan.animal.speciesName))
      expect(page.text).toContain(`page ${index + 1} of ${a4.pages.length}`)
      expect(page.text).toContain('NOT APPROVED BY A VET')
      if (kind === 'sheet') expect(page.text).toContain('Not sure? Do not feed. Leave a note. Call.')
    })
  })
})

describe('the numbers on a sheet', () => {
  it.each(cases.filter(([name]) => !['shut gate', 'weight out of date'].includes(name)))('are the plan\'s: %s', async (_, plan, options) => {
    const { text } = await printed(plan, options)
    const { from, to } = options.days ?? { from: 1, to: 3 }
    let feeds = 0
    for (const day of plan.days.slice(from - 1, to)) {
      for (const feed of day.feeds) {
        feeds += 1
        expect(text).toContain(plainOf(formatVolumeMl(feed.volumeMl)))
        expect(text.split(' ').join('')).toContain(volumeInWords(feed.volumeMl).split(' ').join(''))
        expect(text).toContain(plainOf(`${formatVolumeMl(feed.syringe.capacityMl)} syringe, draw up to ${formatVolumeMl(feed.markMl)}`))
      }
    }
    // One row for each feed, and nowhere a row more.
    const rows = text.match(/\d\d:\d\d( noon| midnight)? [\d.]+ mL( \d × [\d.]+ mL)? yes/g) ?? []
    expect(rows).toHaveLength(feeds)
  })

  it('has nothing else that reads as an amount on a DO NOT FEED sign', async () => {
    for (const kind of ['sheet', 'label', 'mixing'] as const) {
      const { text, pages } = await printed(shut(), {}, kind)
      expect(pages).toHaveLength(1)
      expect(text).toContain('DO NOT FEED')
      expect(text).toContain('Cannot swallow')
      expect(text).not.toMatch(/\d\s?mL|syringe|\bFEED Only/)
    }
    expect((await printed(shut())).text).toMatch(/Next check: day time by/)
  })

  it('stands at 28 pt or more where the amount is said, larger than anything but the sign', async () => {
    const { pages } = await printed(beardedDragon())
    const amount = pages[0]!.texts.find(text => text.text === '0.4' && text.size > 20)
    expect(amount?.size).toBeGreaterThanOrEqual(28)
    expect(Math.max(...pages[0]!.texts.map(text => text.size))).toBe(amount?.size)
    // On later pages the band says it again.
    expect(pages[1]!.texts.find(text => plainOf(text.text) === '0.4 mL' && text.size >= 28)).toBeDefined()
  })

  it('never says more than the days that were asked for', async () => {
    const { text } = await printed(beardedDragon(), { days: { from: 3, to: 3 } })
    expect(text).toContain('0.35 mL')
    expect(text).not.toMatch(/0\.4 mL|0\.45 mL|Fri 4 Dec 0/)
  })
})

describe('pages', () => {
  it.each([
    ['one day of a bearded dragon', 2, beardedDragon(), { from: 1, to: 1 }],
    ['three days of it', 3, beardedDragon(), { from: 1, to: 3 }],
    ['a week of it', 5, beardedDragon(), { from: 1, to: 7 }],
    ['three days of a sparrow', 6, sparrow(), { from: 1, to: 3 }],
    ['a week of a snake', 3, snake(), { from: 1, to: 7 }],
    ['a shut gate', 1, shut(), { from: 1, to: 3 }],
  ])('%s: %d', async (_, pages, plan, days) => {
    expect((await printed(plan, { days })).pages).toHaveLength(pages)
  })

  it('a day that fits a page is never split, and a table has its head on every page', async () => {
    for (const plan of [beardedDragon(), fromFirstDay(), snake(), gecko()]) {
      const { pages, text } = await printed(plan, { days: { from: 1, to: Math.min(7, plan.days.length) } })
      expect(text).not.toContain('continued')
      for (const page of pages) expect(page.text.includes('Time ')).toBe(/ yes|Weigh at/.test(page.text))
    }
  })

  it('a day longer than a page goes on under its own name', async () => {
    const { pages } = await printed(sparrow(), { days: { from: 1, to: 1 } })
    const log = pages.filter(page => / yes/.test(page.text))
    expect(log).toHaveLength(2)
    expect(log[1]!.text).toMatch(/Thu 3 Dec continued/)
    for (const page of log) expect(page.text).toMatch(/Time Give/)
    expect(log.flatMap(page => page.text.match(/\d\d:00( noon)? 0\.3 mL yes/g) ?? [])).toHaveLength(14)
  })

  it('stands 24 feeds a day for a week', async () => {
    const times = Array.from({ length: 24 }, (_, hour) => `${String(hour).padStart(2, '0')}:00`)
    const days = Array.from({ length: 7 }, (_, index) => `2026-12-0${index + 3}`).map((date, index) => dayOn(date, { feedingDay: index + 1, feeds: times.map(time => feedAt(date, time, 0.1 + index / 20)) }))
    const { text, pages } = await printed({ ...sparrow(), days }, { days: { from: 1, to: 7 } })
    expect(text.match(/ mL yes/g)).toHaveLength(7 * 24)
    expect(pages.flatMap(collisions)).toEqual([])
    expect(text).toContain('00:00 midnight')
  })
})

describe('letters', () => {
  it.each(NAMES)('of %s are read back as they were written', async (name) => {
    const { pages } = await printed({ ...gecko(), animal: { ...gecko().animal, name } })
    // A reader turns words of right-to-left scripts around; the letters are the same.
    const sorted = (text: string) => [...plainOf(text)].sort().join('')
    for (const page of pages) expect(page.texts.some(text => sorted(text.text) === sorted(name) || plainOf(text.text).includes(plainOf(name))), name).toBe(true)
  })

  it('that the font lacks are named as such', async () => {
    const note = 'stands for a letter that cannot be printed'
    expect((await printed({ ...gecko(), animal: { ...gecko().animal, name: 'Gecko 🦎' } })).text).toContain(note)
    expect((await printed({ ...gecko(), animal: { ...gecko().animal, name: 'Žofie' } })).text).not.toContain(note)
  })

  it('of any kind never stop a sheet', async () => {
    const any = fc.string({ unit: 'grapheme', maxLength: 60 })
    await fc.assert(fc.asyncProperty(any, any, any, async (name, caseNumber, enclosure) => {
      const plan = gecko()
      const { pages } = await printed({ ...plan, animal: { ...plan.animal, name, caseNumber, enclosure } }, { days: { from: 1, to: 1 }, teamName: enclosure })
      expect(pages.length).toBeGreaterThan(0)
      expect(pages.flatMap(collisions)).toEqual([])
      // A name of many lines can push the mixing box to a page of its own; the amount stands before it.
      expect(pages.map(page => page.text).join(' ')).toContain('0.05 mL')
    }), { numRuns: 25 })
  }, 60_000)
})

describe('any plan of sane numbers', () => {
  const times = fc.uniqueArray(fc.integer({ min: 0, max: 23 }), { minLength: 1, maxLength: 24 }).map(hours => hours.sort((a, b) => a - b).map(hour => `${String(hour).padStart(2, '0')}:30`))
  const syringe = fc.constantFrom({ capacityMl: 0.5, stepMl: 0.01 }, { capacityMl: 1, stepMl: 0.05 }, { capacityMl: 3, stepMl: 0.1 }, { capacityMl: 5, stepMl: 0.2 }, { capacityMl: 10, stepMl: 0.5 }, { capacityMl: 20, stepMl: 1 }, { capacityMl: 60, stepMl: 1 }, { capacityMl: 100, stepMl: 10 }, { capacityMl: 0.3, stepMl: 0.005 })
  const day = fc.record({ times, syringe, share: fc.double({ min: 0.01, max: 1, noNaN: true }), draws: fc.integer({ min: 1, max: 3 }), feeds: fc.boolean() })

  it('prints, keeps its margins and shows each feed once', async () => {
    await fc.assert(fc.asyncProperty(fc.array(day, { minLength: 1, maxLength: 7 }), fc.constantFrom('a4' as const, 'letter' as const), async (drawn, paper) => {
      const days = drawn.map((one, index) => {
        const date = `2026-12-0${index + 1}`
        const markMl = Math.max(1, Math.round(one.share * one.syringe.capacityMl / one.syringe.stepMl)) * one.syringe.stepMl
        const rounded = Number(markMl.toFixed(3))
        if (!one.feeds) return dayOn(date, { state: 'wait', stateReason: 'No meal today', feedingDay: index + 1 })
        return dayOn(date, { feedingDay: index + 1, feeds: one.times.map(time => feedAt(date, time, Number((rounded * one.draws).toFixed(3)), one.syringe, one.draws)) })
      })
      const { pages, text } = await printed({ ...beardedDragon(), days }, { paper, days: { from: 1, to: days.length } })
      expect(text.match(/ mL yes/g) ?? []).toHaveLength(days.reduce((sum, one) => sum + one.feeds.length, 0))
      expect(pages.flatMap(collisions)).toEqual([])
      pages.forEach(expectInsideMargins)
    }), { numRuns: 25 })
  }, 60_000)
})

describe('the file', () => {
  it('is the same for the same plan and instant', async () => {
    const [one, other] = [await sheetPdf(beardedDragon(), OPTIONS), await sheetPdf(beardedDragon(), OPTIONS)]
    expect(one.equals(other)).toBe(true)
    expect(one.equals(await sheetPdf(beardedDragon(), { ...OPTIONS, madeAt: '2026-12-02T18:41:00Z' }))).toBe(false)
  })

  it('carries two embedded subsets with a way back to the text, and no other font', async () => {
    const file = (await sheetPdf(beardedDragon(), OPTIONS)).toString('latin1')
    expect([...file.matchAll(/\/FontName \/([A-Z]{6}\+[\w-]+)/g)].map(match => match[1]!.slice(7)).sort()).toEqual(['SourceSans3-Bold', 'SourceSans3-Regular'])
    expect(file.match(/\/FontFile2 /g)).toHaveLength(2)
    expect(file.match(/\/ToUnicode /g)).toHaveLength(2)
    expect(file).not.toContain('Helvetica')
    expect(file.length).toBeLessThan(60_000)
  })

  it('says what it is', async () => {
    const { info } = await printed(beardedDragon())
    expect(info).toMatchObject({ Title: 'Feeding sheet: Juniper', Author: 'Saltings Rescue', Creator: 'Thimbleful 0.1.0', Language: 'en-GB', CreationDate: 'D:20261202184000Z' })
    expect((await printed(shut())).info).toMatchObject({ Title: 'Do not feed: Juniper' })
  })

  it('has the square code of the link, whole and the right way round, only when the plan is saved', async () => {
    const side = 25 * PT_PER_MM
    const codes = (file: ReadFile) => file.pages.flatMap(page => page.shapes.filter(shape => shape.parts.length > 100 && Math.abs(shape.right - shape.left - side) < 0.1 && Math.abs(shape.bottom - shape.top - side) < 0.1))
    const [code, ...more] = codes(await printed(beardedDragon()))
    expect(more).toEqual([])
    const { data, size } = encode(OPTIONS.reference!.url, { ecc: 'M', border: 0 })
    const module = side / size
    const seen = data.map((row, y) => row.map((_, x) => {
      const [atX, atY] = [code!.left + (x + 0.5) * module, code!.top + (y + 0.5) * module]
      return code!.parts.some(part => part.left < atX && atX < part.right && part.top < atY && atY < part.bottom)
    }))
    expect(seen).toEqual(data)
    const unsaved = await printed(beardedDragon(), { reference: null })
    expect(codes(unsaved)).toEqual([])
    expect(unsaved.text).toContain('Not saved: this sheet has no code.')
  })
})

describe('the barrel', () => {
  const FIFTY = 50 * PT_PER_MM

  it('has a line of exactly 50 mm beside it where it is drawn at its size', async () => {
    const { pages } = await printed(beardedDragon())
    const lines = pages[0]!.shapes.filter(shape => Math.abs(shape.right - shape.left - FIFTY) < 0.05)
    expect(lines).toHaveLength(1)
    expect(pages[0]!.text).toContain('This line is 50 mm when printed at 100 %')
  })

  it('says so where it is drawn smaller', async () => {
    const { pages } = await printed(snake())
    expect(pages[0]!.text).toContain('Drawn smaller than the real syringe')
    expect(pages[0]!.text).not.toContain('50 mm when printed')
  })

  it.each([[0.05, 0.5], [0.4, 1], [1, 1], [2.5, 5]])('is filled to %d of %d mL, in proportion', async (markMl, capacityMl) => {
    const plan = beardedDragon()
    const date = '2026-12-03'
    const { pages } = await printed({ ...plan, days: [dayOn(date, { feeds: [feedAt(date, '07:30', markMl, { capacityMl, stepMl: capacityMl / 20 })] })] }, { days: { from: 1, to: 1 } })
    const numerals = pages[0]!.texts.filter(text => text.size === 12 && /^[\d.]+$/.test(text.text)).map(text => ({ value: Number(text.text), x: (text.left + text.right) / 2, top: text.top }))
    const zero = numerals.find(one => one.value === 0)!
    const full = numerals.find(one => one.value === capacityMl)!
    expect(zero.top).toBe(full.top)
    const mark = zero.x + (full.x - zero.x) * markMl / capacityMl
    const height = (shape: { top: number, bottom: number }) => shape.bottom - shape.top
    const fill = pages[0]!.shapes.find(shape => Math.abs(shape.left - zero.x) < 0.3 && Math.abs(shape.right - mark) < 0.3 && height(shape) > 8 && shape.bottom < zero.top)
    expect(fill, 'a filled part from nought to the mark').toBeDefined()
    const arrow = pages[0]!.texts.find(text => text.size === 14 && text.text === String(markMl))!
    expect((arrow.left + arrow.right) / 2).toBeCloseTo(mark, 0)
  })
})
