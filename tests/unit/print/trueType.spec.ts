import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { describe, expect, it } from 'vitest'
import { findFontFile, printFont } from '../../../server/utils/print/font'
import { TrueTypeFont } from '../../../server/utils/print/trueType'

interface OtherGlyph { id: number, advanceWidth: number, path: { toSVG: () => string } }
interface OtherFont {
  postscriptName: string
  unitsPerEm: number
  ascent: number
  descent: number
  capHeight: number
  numGlyphs: number
  characterSet: number[]
  glyphForCodePoint: (codePoint: number) => OtherGlyph
  getGlyph: (glyph: number) => OtherGlyph
  layout: (text: string, features: Record<string, boolean>) => { glyphs: OtherGlyph[], positions: { xAdvance: number }[] }
}

/** The reader that pdfkit brings along: slow and complete, and not ours. */
const { create } = createRequire(createRequire(import.meta.url).resolve('pdfkit'))('fontkit') as { create: (bytes: Buffer) => OtherFont }

describe.each(['regular', 'bold'] as const)('the %s font', (weight) => {
  const font = printFont(weight)
  const other = create(readFileSync(findFontFile(`SourceSans3-${weight === 'bold' ? 'Bold' : 'Regular'}.ttf`)))

  it('has the same measures for another reader', () => {
    expect([font.name, font.unitsPerEm, font.ascent, font.descent, font.capHeight]).toEqual([other.postscriptName, other.unitsPerEm, other.ascent, other.descent, other.capHeight])
  })

  it('has the same glyph and width for every letter', () => {
    expect(other.characterSet.length).toBeGreaterThan(1500)
    const wrong = other.characterSet.filter((codePoint) => {
      const glyph = other.glyphForCodePoint(codePoint)
      return !font.has(codePoint) || font.glyph(codePoint) !== glyph.id || font.advance(glyph.id) !== glyph.advanceWidth
    })
    expect(wrong).toEqual([])
    expect([font.has(0x1F98E), font.glyph(0x1F98E)]).toEqual([false, 0])
  })

  it('kerns every pair of common letters alike', () => {
    const wrong: string[] = []
    let kerned = 0
    // Script by script: between scripts the other reader goes on to a second table where the format says to stop.
    for (const letters of [[...'AFLPTVWYaceforvwy.,-’”0147Žđ'], [...'АГЖРТУабготу.,'], [...'ΑΓΛΤΥαγλοτυ.,']]) for (const left of letters) {
      for (const right of letters) {
        const run = other.layout(left + right, { liga: false, ccmp: false })
        // A ligature is another matter: no sheet uses one.
        if (run.glyphs.length !== 2) continue
        const theirs = run.positions[0]!.xAdvance - run.glyphs[0]!.advanceWidth
        const ours = font.kern(font.glyph(left.codePointAt(0)!), font.glyph(right.codePointAt(0)!))
        if (theirs !== 0) kerned += 1
        if (theirs !== ours) wrong.push(`${left}${right}: ${ours}, not ${theirs}`)
      }
    }
    expect(wrong).toEqual([])
    expect(kerned).toBeGreaterThan(100)
  })

  it('gives the same figures the same width, so that columns of amounts align', () => {
    expect(new Set([...'0123456789'].map(figure => font.advance(font.glyph(figure.codePointAt(0)!)))).size).toBe(1)
  })

  it('makes a subset that another reader draws alike, parts of composite letters included', () => {
    const wanted = [0, ...[...'FEED 0.35 mL Žofie Nguyễn Ắ Ёж ώ □'].map(letter => font.glyph(letter.codePointAt(0)!))]
    const file = font.subset(wanted)
    const subset = create(file)
    expect(wanted.map((_, index) => subset.getGlyph(index).path.toSVG())).toEqual(wanted.map(glyph => other.getGlyph(glyph).path.toSVG()))
    expect(wanted.map((_, index) => subset.getGlyph(index).advanceWidth)).toEqual(wanted.map(glyph => other.getGlyph(glyph).advanceWidth))
    expect(subset.numGlyphs).toBeGreaterThan(wanted.length)
    expect(file.length).toBeLessThan(10_000)
    // Checksum of the whole file, as the format asks.
    let sum = 0
    for (let at = 0; at < file.length; at += 4) sum = (sum + file.readUInt32BE(at)) >>> 0
    expect(sum).toBe(0xB1B0AFBA)
  })
})

describe('a font', () => {
  it('is read once', () => {
    expect(printFont('bold')).toBe(printFont('bold'))
  })

  it.each([['nothing', Buffer.alloc(0)], ['a text', Buffer.from('this is not a font at all')], ['a font in another wrapping', Buffer.from('wOF2............')]])('is refused when it is %s', (_, bytes) => {
    expect(() => new TrueTypeFont(bytes)).toThrow('This file is not a TrueType font.')
  })

  it('is refused without its tables', () => {
    expect(() => new TrueTypeFont(Buffer.from([0, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0]))).toThrow('The font has no head table.')
  })
})
