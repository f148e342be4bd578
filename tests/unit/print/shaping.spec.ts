import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { breakLines, canPrint, printable, shape, textWidth } from '../../../server/utils/print/shaping'

const lines = (text: Parameters<typeof breakLines>[0], width: number, size = 12) => breakLines(text, width, size).map(line => line.pieces.map(piece => piece.text).join(''))

describe('lines', () => {
  it('break at spaces', () => {
    expect(lines('Go in at the side, slowly', 80)).toEqual(['Go in at the', 'side, slowly'])
    expect(lines('', 80)).toEqual([''])
    expect(lines('one', 80)).toEqual(['one'])
  })

  it('never part a number from its unit', () => {
    for (let width = 40; width < 200; width++) expect(lines('draw up to 0.35\u00A0mL now', width).filter(line => line.includes('0.35\u00A0mL'))).toHaveLength(1)
  })

  it('break a word that is wider than the line, and lose nothing', () => {
    const name = 'Donaudampfschifffahrtsgesellschaft'
    const broken = lines(name, 60)
    expect(broken.length).toBeGreaterThan(2)
    expect(broken.join('')).toBe(name)
  })

  it('keep a full stop with the bold number before it', () => {
    expect(lines([{ text: 'under ' }, { text: '173\u00A0g', strong: true }, { text: '. Stop.' }], 62)).toEqual(['under', '173\u00A0g. Stop.'])
    expect(breakLines([{ text: 'under ' }, { text: '173\u00A0g', strong: true }, { text: '.' }], 200, 12)[0]!.pieces.map(piece => piece.weight)).toEqual(['regular', 'bold', 'regular'])
  })

  it('fit their width and lose no word, whatever the text', () => {
    fc.assert(fc.property(fc.array(fc.string({ unit: 'grapheme', maxLength: 20 }), { maxLength: 20 }), fc.integer({ min: 40, max: 500 }), fc.constantFrom(12, 14, 22), (words, width, size) => {
      const text = words.join(' ')
      const broken = breakLines(text, width, size)
      expect(Math.max(...broken.map(line => line.width))).toBeLessThanOrEqual(Math.max(width, size * 2.5))
      const letters = (all: string) => all.replace(/ /g, '')
      expect(letters(broken.flatMap(line => line.pieces.map(piece => piece.text)).join(''))).toBe(letters(printable(text)))
    }))
  })
})

describe('letters', () => {
  it.each([['Žofie'], ['Nguyễn Thị Ngọc Ánh'], ['Черепаха'], ['Χελώνα'], ['½ × ≥ – “ ” µ']])('of %s are all in the font', text => expect(canPrint(text)).toBe(true))
  it.each([['🦎'], ['亀'], ['حرباء'], ['Gecko 🦎']])('of %s are not', text => expect(canPrint(text)).toBe(false))

  it('that are composed of two are printed as one', () => {
    expect(shape('Z\u030Cofie', 'regular').map(letter => letter.source).join('')).toBe('Žofie')
  })

  it('that the font lacks are one box each, whatever they are made of', () => {
    const family = '👩‍👩‍👧‍👦'
    expect(shape(`A${family}B`, 'bold').map(letter => letter.source)).toEqual(['A', family, 'B'])
    expect(shape('🦎', 'regular')[0]!.glyph).toBe(shape('□', 'regular')[0]!.glyph)
  })

  it('that draw nothing or turn the text round are dropped', () => {
    expect(shape('Ju\u200Bni\u202Eper\u0007\uFEFF', 'regular').map(letter => letter.source).join('')).toBe('Juniper')
  })

  it('stand closer where the font kerns them', () => {
    expect(textWidth('To', 10, 'bold')).toBeLessThan(textWidth('T', 10, 'bold') + textWidth('o', 10, 'bold'))
    expect(textWidth('HH', 10, 'bold')).toBe(2 * textWidth('H', 10, 'bold'))
    expect(textWidth('0.4', 20, 'regular')).toBeCloseTo(2 * textWidth('0.4', 10, 'regular'))
  })

  it('on one line stay on one line', () => {
    expect(printable(' Warm room,\n\ttank  4 ')).toBe(' Warm room, tank 4 ')
  })
})
