/**
 * Letters of one weight as one document uses them, and the font that is embedded for them at the end.
 *
 * Each different letter gets its own number, in order of first use, and its own entry in the ToUnicode map: what is
 * copied or searched in the PDF is the very text that was printed, also where two letters share a glyph.
 */
import type { PrintWeight } from './font'
import { printFont } from './font'
import { shape } from './shaping'

const LETTERS_PER_BLOCK = 100

export class LettersInUse {
  private readonly numbers = new Map<string, number>()
  private readonly glyphs: number[] = [0]
  private readonly sources: string[] = ['\uFFFD']

  constructor(readonly resource: string, private readonly weight: PrintWeight) {}

  /** The operand of the PDF operator that shows this text, kerned. */
  show(text: string): string {
    const font = printFont(this.weight)
    const letters = shape(text, this.weight)
    let shown = '<'
    letters.forEach(({ glyph, source }, index) => {
      shown += hex4(this.number(source, glyph))
      const next = letters[index + 1]
      const kern = next ? font.kern(glyph, next.glyph) : 0
      if (kern !== 0) shown += `>${-kern * 1000 / font.unitsPerEm}<`
    })
    return `[${shown}>] TJ`
  }

  /** Writes the font into the document and ends its dictionary. */
  embed(document: PDFKit.PDFDocument, dictionary: PDFKit.PDFKitReference): void {
    const font = printFont(this.weight)
    const scale = 1000 / font.unitsPerEm
    // The tag says which letters are inside, so that two subsets are never taken for one another.
    const name = `${tagOf(this.sources)}+${font.name}`

    const outlines = font.subset(this.glyphs)
    const file = document.ref({ Length1: outlines.length })
    file.end(outlines)
    const descriptor = document.ref({
      Type: 'FontDescriptor',
      FontName: name,
      Flags: 4,
      FontBBox: font.box.map(edge => edge * scale),
      ItalicAngle: 0,
      Ascent: font.ascent * scale,
      Descent: font.descent * scale,
      CapHeight: font.capHeight * scale,
      StemV: this.weight === 'bold' ? 140 : 80,
      FontFile2: file,
    })
    descriptor.end(undefined)
    const descendant = document.ref({
      Type: 'Font',
      Subtype: 'CIDFontType2',
      BaseFont: name,
      // pdfkit writes a String object as a PDF string and a plain one as a name.
      CIDSystemInfo: { Registry: new String('Adobe'), Ordering: new String('Identity'), Supplement: 0 },
      FontDescriptor: descriptor,
      W: [0, this.glyphs.map(glyph => font.advance(glyph) * scale)],
      CIDToGIDMap: 'Identity',
    })
    descendant.end(undefined)
    const unicode = document.ref({})
    unicode.end(this.unicodeMap())
    Object.assign(dictionary.data as object, {
      Type: 'Font',
      Subtype: 'Type0',
      BaseFont: name,
      Encoding: 'Identity-H',
      DescendantFonts: [descendant],
      ToUnicode: unicode,
    })
    dictionary.end(undefined)
  }

  private number(source: string, glyph: number): number {
    let number = this.numbers.get(source)
    if (number === undefined) {
      number = this.glyphs.length
      this.numbers.set(source, number)
      this.glyphs.push(glyph)
      this.sources.push(source)
    }
    return number
  }

  private unicodeMap(): string {
    const blocks: string[] = []
    for (let from = 0; from < this.sources.length; from += LETTERS_PER_BLOCK) {
      const part = this.sources.slice(from, from + LETTERS_PER_BLOCK)
      blocks.push(`${part.length} beginbfchar`, ...part.map((source, index) => `<${hex4(from + index)}> <${utf16(source)}>`), 'endbfchar')
    }
    return [
      '/CIDInit /ProcSet findresource begin', '12 dict begin', 'begincmap',
      '/CIDSystemInfo << /Registry (Adobe) /Ordering (UCS) /Supplement 0 >> def',
      '/CMapName /Adobe-Identity-UCS def', '/CMapType 2 def',
      '1 begincodespacerange', '<0000> <FFFF>', 'endcodespacerange',
      ...blocks,
      'endcmap', 'CMapName currentdict /CMap defineresource pop', 'end', 'end',
    ].join('\n')
  }
}

function hex4(value: number): string {
  return value.toString(16).padStart(4, '0')
}

function utf16(text: string): string {
  let written = ''
  for (let i = 0; i < text.length; i++) written += hex4(text.charCodeAt(i))
  return written
}

/** Six capitals, as the PDF standard asks before the name of a subset. */
function tagOf(sources: readonly string[]): string {
  let sum = 7
  for (const source of sources) for (let i = 0; i < source.length; i++) sum = (sum * 31 + source.charCodeAt(i)) % 308_915_776
  let tag = ''
  for (let i = 0; i < 6; i++) {
    tag += String.fromCharCode(65 + sum % 26)
    sum = Math.floor(sum / 26)
  }
  return tag
}
