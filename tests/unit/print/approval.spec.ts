import { describe, expect, it } from 'vitest'
import type { Plan } from '#shared/types/plan'
import type { Standing } from '#shared/types/planLife'
import { labelPdf, mixingPdf, packetPdf, sheetPdf } from '../../../server/utils/print/index'
import { labelModel } from '../../../server/utils/print/label'
import { mixingCardModel } from '../../../server/utils/print/mixingCard'
import type { PrintOptions } from '../../../server/utils/print/options'
import { plainTextOf } from '../../../server/utils/print/richText'
import { sheetModel } from '../../../server/utils/print/sheet'
import { codedFrom, haltsOf, heldInside } from '../../../server/utils/print/wording'
import { APPROVED, beardedDragon, fromFirstDay, LAPSED, longestNames, LONGEST_APPROVED, LONGEST_CONTACTS, NONE, OPTIONS, shut, sparrow, STOPPED } from './fixtures'
import { expectReadable } from './pageChecks'
import { plainOf, readPdf, type PlacedText, type ReadPage } from './readPdf'

const PRINTS = { sheet: sheetPdf, mixing: mixingPdf, label: labelPdf, packet: packetPdf }
const KINDS = Object.keys(PRINTS) as (keyof typeof PRINTS)[]
const MODELS = { sheet: sheetModel, mixing: mixingCardModel, label: labelModel }

const footTexts = (model: { foot: { lines: Parameters<typeof plainTextOf>[0][] } }) => model.foot.lines.map(line => plainOf(plainTextOf(line)))

describe.each(Object.entries(MODELS))('the foot of a %s', (_, modelOf) => {
  it('says who approved it, framed, with the whole of it in a line of its own', () => {
    const model = modelOf(beardedDragon(), { ...OPTIONS, approval: APPROVED })
    expect(model.foot).toMatchObject({ band: 'Approved by Dr Amara Osei', isReversed: false })
    expect(footTexts(model)).toEqual([
      APPROVED.line,
      'Worked out from 182 g, weighed Wed 2 Dec. Good until Wed 9 Dec. Next weigh-in Fri 4 Dec.',
      'Sheet TF-0412, version 2. Replaces version 1: bin it. Made Wed 2 Dec 2026, 18:40. Saltings Rescue',
    ])
  })

  it('says that an approval lapsed, and why, white on black', () => {
    const model = modelOf(beardedDragon(), { ...OPTIONS, approval: LAPSED })
    expect(model.foot).toMatchObject({ band: 'APPROVAL LAPSED', isReversed: true })
    expect(footTexts(model)[0]).toBe(LAPSED.line)
  })

  it('is the same with no approval as with nothing said about one, in words that no caller chooses', () => {
    const plan = beardedDragon()
    const usual = modelOf(plan, OPTIONS)
    expect(usual.foot).toMatchObject({ band: 'NOT APPROVED BY A VET', isReversed: true })
    expect(modelOf(plan, { ...OPTIONS, approval: NONE })).toEqual(usual)
    expect(modelOf(plan, { ...OPTIONS, approval: { state: 'none', band: 'Nearly approved', line: 'Soon.' } })).toEqual(usual)
  })

  it('ends no line inside a day or a weight', () => {
    const line = plainTextOf(modelOf(beardedDragon(), { ...OPTIONS, approval: APPROVED }).foot.lines[0]!)
    expect(line).toContain('Wed\u00A02\u00A0Dec\u00A02026')
    expect(line).toContain('182\u00A0g')
    expect(line).toContain('until Wed\u00A09\u00A0Dec.')
  })
})

describe('a strip, which is cut from its foot,', () => {
  const strip = (approval?: Standing) => labelModel(beardedDragon(), { ...OPTIONS, approval }).strips[0]!

  it.each<[string, Standing | undefined, string, string]>([
    ['approved', APPROVED, 'framed', `${APPROVED.line} Sheet TF-0412, version 2.`],
    ['lapsed', LAPSED, 'reversed', `APPROVAL LAPSED. ${LAPSED.line} Sheet TF-0412, version 2.`],
    ['none', NONE, 'plain', 'NOT APPROVED BY A VET. Good until Wed 9 Dec. Sheet TF-0412, version 2.'],
    ['not said', undefined, 'plain', 'NOT APPROVED BY A VET. Good until Wed 9 Dec. Sheet TF-0412, version 2.'],
  ])('says itself how it stands: %s', (_, approval, look, terms) => {
    expect([strip(approval).termsLook, plainOf(strip(approval).terms.join(' '))]).toEqual([look, terms])
  })

  it('says the last good day where the vet\'s line does not', () => {
    expect(plainOf(strip({ ...APPROVED, line: 'Approved by Dr Amara Osei for 182 g.' }).terms[0]!)).toBe('Approved by Dr Amara Osei for 182 g. Good until Wed 9 Dec.')
  })
})

describe('what stopped a plan', () => {
  const replaced = { ...OPTIONS.reference!, latestVersion: 4 }

  it.each<[string, Partial<PrintOptions>, string[]]>([
    ['nothing', {}, []],
    ['a note', { lifeNote: STOPPED }, [STOPPED]],
    ['a newer version', { reference: replaced }, ['SUPERSEDED. Version 4 is newer: do not use this sheet.']],
    ['both', { lifeNote: STOPPED, reference: replaced }, [STOPPED, 'SUPERSEDED. Version 4 is newer: do not use this sheet.']],
    ['a note on a sheet that was never saved', { lifeNote: STOPPED, reference: null }, [STOPPED]],
    ['an empty note', { lifeNote: ' ' }, []],
  ])('is said before anything else: %s', (_, options, halts) => {
    expect(haltsOf(codedFrom({ ...OPTIONS, ...options })).map(plainOf)).toEqual(halts)
  })

  it.each(KINDS)('stands at the top of every page: %s', async (kind) => {
    const long = `${STOPPED} It was handed to Saltings Rescue with all that belongs to it, and they work from a plan of their own.`
    for (const note of [STOPPED, long]) {
      const { pages } = await readPdf(await PRINTS[kind](beardedDragon(), { ...OPTIONS, lifeNote: note, reference: replaced }))
      for (const page of pages) {
        expectReadable(page)
        expect(page.text.startsWith(note)).toBe(true)
        expect(page.text).toContain('SUPERSEDED. Version 4 is newer: do not use this sheet.')
      }
    }
  })
})

/** The boxes around a text, of the height of a band. */
function boxesAround(page: ReadPage, text: PlacedText) {
  return page.shapes.filter(shape => shape.left <= text.left && shape.right >= text.right && shape.top <= text.top && shape.bottom >= text.bottom && shape.bottom - shape.top < 130)
}

const cases: [string, Plan, Standing][] = [
  ['bearded dragon, approved', beardedDragon(), APPROVED],
  ['bearded dragon, lapsed', beardedDragon(), LAPSED],
  ['bearded dragon, none', beardedDragon(), NONE],
  ['bearded dragon, longest name of a vet', beardedDragon(), LONGEST_APPROVED],
  ['shut gate, approved', shut(), APPROVED],
  ['shut gate, lapsed', shut(), LAPSED],
  ['longest names, longest name of a vet', longestNames(), LONGEST_APPROVED],
  ['longest names, lapsed', longestNames(), LAPSED],
]

describe.each(KINDS)('every page of a %s', (kind) => {
  it.each(cases)('shows its band whole, framed or black, on A4 and Letter: %s', async (_, plan, approval) => {
    const [a4, letter] = await Promise.all((['a4', 'letter'] as const).map(async paper => readPdf(await PRINTS[kind](plan, { ...OPTIONS, paper, approval }))))
    expect(letter!.pages.map(page => page.text)).toEqual(a4!.pages.map(page => page.text))
    for (const page of [...a4!.pages, ...letter!.pages]) {
      expectReadable(page)
      const said = page.text.split(' ').join('')
      expect(said).toContain(approval.band.split(' ').join(''))
      if (approval.state !== 'none') expect(said).toContain(approval.line.split(' ').join(''))
      if (approval.state !== 'none') expect(page.text).not.toContain('NOT APPROVED')
      if (approval.state !== 'lapsed') expect(page.text).not.toContain('LAPSED')
      if (approval.state !== 'approved') expect(page.text).not.toContain('Approved by')
      const band = page.texts.filter(text => approval.band.startsWith(plainOf(text.text)) && text.size > 12).at(-1)!
      expect(band.top).toBeGreaterThan(page.height / 2)
      expect(boxesAround(page, band).map(box => box.isFilled)).toEqual([approval.state !== 'approved'])
    }
  }, 30_000)
})

it.each(KINDS)('a %s with the tallest head and foot puts nothing over anything else', async (kind) => {
  const { animal } = longestNames()
  const options = { ...OPTIONS, approval: LONGEST_APPROVED, lifeNote: STOPPED, reference: { ...OPTIONS.reference!, latestVersion: 4 }, contacts: LONGEST_CONTACTS }
  for (const plan of [longestNames(), { ...fromFirstDay(), animal }, { ...sparrow(), animal }, { ...shut(), animal }]) {
    const { pages } = await readPdf(await PRINTS[kind](plan, options))
    pages.forEach(expectReadable)
  }
}, 30_000)

it('holds days and weights of sentences made elsewhere together', () => {
  expect(heldInside('On Thu 3 Dec 2026, of 1.2 kg, until Wed 9 Dec. May 5 people call?')).toBe('On Thu\u00A03\u00A0Dec\u00A02026, of 1.2\u00A0kg, until Wed\u00A09\u00A0Dec. May 5 people call?')
})
