/** From text to glyphs: what can be printed, how wide it is and where a line may break. */
import type { PrintWeight } from './font'
import { printFont } from './font'
import type { RichText } from './richText'

/** One letter as it is drawn. `source` is what a reader copies out of the page. */
export interface Letter { glyph: number, source: string }

/** Stands for a letter that the font lacks, so that a gap is seen as a gap. */
const REPLACEMENT = 0x25A1

/** Joiners, direction marks, variation selectors: they draw nothing, and can make a name read as another. */
// eslint-disable-next-line no-control-regex, no-misleading-character-class -- single invisible characters are meant
const INVISIBLE = /[\u0000-\u001F\u007F-\u009F\u00AD\u200B-\u200F\u202A-\u202E\u2060-\u206F\uFE00-\uFE0F\uFEFF]|[\u{E0000}-\u{E01EF}]/gu

const graphemes = new Intl.Segmenter('en', { granularity: 'grapheme' })

/** Text in composed form, on one line. */
export function printable(text: string): string {
  return text.normalize('NFC').replace(/[\t\n\r\u2028\u2029 ]+/g, ' ')
}

/** True when every letter of the text can be printed. */
export function canPrint(text: string): boolean {
  const font = printFont('regular')
  return [...printable(text).replace(INVISIBLE, '')].every(letter => font.has(letter.codePointAt(0)!))
}

/** Shaped texts with their widths in ems: the same few hundred words come back on every sheet. */
const shaped: Record<PrintWeight, Map<string, { letters: Letter[], width: number }>> = { regular: new Map(), bold: new Map() }
/** Names come and go; the words of a sheet are soon known again. */
const MOST_SHAPED = 4000

function shapedText(text: string, weight: PrintWeight) {
  const known = shaped[weight].get(text)
  if (known) return known
  const letters = shapeAnew(text, weight)
  const entry = { letters, width: widthOf(letters, weight) }
  if (shaped[weight].size >= MOST_SHAPED) shaped[weight].clear()
  shaped[weight].set(text, entry)
  return entry
}

/** @returns the letters of a text; a letter the font lacks is one box, however many code points it has. */
export function shape(text: string, weight: PrintWeight): readonly Letter[] {
  return shapedText(text, weight).letters
}

function shapeAnew(text: string, weight: PrintWeight): Letter[] {
  const font = printFont(weight)
  const letters: Letter[] = []
  let complete = true
  for (const source of printable(text).replace(INVISIBLE, '')) {
    const codePoint = source.codePointAt(0)!
    if (!font.has(codePoint)) {
      complete = false
      break
    }
    letters.push({ glyph: font.glyph(codePoint), source })
  }
  if (complete) return letters

  // The rare path: whole graphemes first, so that a family of three joined faces is one box and not five.
  return [...graphemes.segment(printable(text))].flatMap(({ segment }) => {
    const visible = [...segment.replace(INVISIBLE, '')]
    if (visible.every(source => font.has(source.codePointAt(0)!))) return visible.map(source => ({ glyph: font.glyph(source.codePointAt(0)!), source }))
    return [{ glyph: font.glyph(REPLACEMENT), source: segment }]
  })
}

/** Width of shaped letters with their kerning, in ems. */
function widthOf(letters: readonly Letter[], weight: PrintWeight): number {
  const font = printFont(weight)
  let width = 0
  for (let i = 0; i < letters.length; i++) {
    width += font.advance(letters[i]!.glyph)
    if (i + 1 < letters.length) width += font.kern(letters[i]!.glyph, letters[i + 1]!.glyph)
  }
  return width / font.unitsPerEm
}

/** Width of a text, pt. */
export function textWidth(text: string, size: number, weight: PrintWeight): number {
  return shapedText(text, weight).width * size
}

/** One line of a paragraph: its pieces with their places, pt from the left. */
export interface Line { pieces: { x: number, text: string, weight: PrintWeight }[], width: number }

/**
 * Breaks a text into lines. Breaks at spaces only (a non-breaking space holds a number and its unit together); a word
 * wider than the line is broken between letters, because nothing may be cut off.
 */
export function breakLines(text: RichText, width: number, size: number): Line[] {
  const lines: Line[] = []
  let line: Line = { pieces: [], width: 0 }
  const finish = () => {
    lines.push(line)
    line = { pieces: [], width: 0 }
  }
  const add = (text: string, weight: PrintWeight, wide: number) => {
    const last = line.pieces.at(-1)
    if (last && last.weight === weight) last.text += text
    else line.pieces.push({ x: line.width, text, weight })
    line.width += wide
  }

  for (const { words, spaceBefore } of wordsOf(text)) {
    const wide = words.reduce((sum, word) => sum + textWidth(word.text, size, word.weight), 0)
    const gap = spaceBefore && line.pieces.length > 0 ? textWidth(' ', size, words[0]!.weight) : 0
    if (line.pieces.length > 0 && line.width + gap + wide > width) finish()
    else if (gap > 0) add(' ', words[0]!.weight, gap)

    if (line.width + wide <= width) {
      for (const word of words) add(word.text, word.weight, textWidth(word.text, size, word.weight))
      continue
    }
    for (const word of words) {
      for (const { segment } of graphemes.segment(word.text)) {
        const letter = textWidth(segment, size, word.weight)
        if (line.pieces.length > 0 && line.width + letter > width) finish()
        add(segment, word.weight, letter)
      }
    }
  }
  if (line.pieces.length > 0 || lines.length === 0) finish()
  return lines
}

interface Word { words: { text: string, weight: PrintWeight }[], spaceBefore: boolean }

/** Words across runs: a full stop after a bold number stays with it. */
function wordsOf(text: RichText): Word[] {
  const found: Word[] = []
  let glue = false
  for (const run of typeof text === 'string' ? [{ text, strong: false }] : text) {
    const weight: PrintWeight = run.strong ? 'bold' : 'regular'
    const parts = printable(run.text).split(' ')
    parts.forEach((part, index) => {
      const spaceBefore = index > 0
      if (part === '') {
        if (spaceBefore) glue = false
        return
      }
      const last = found.at(-1)
      if (!spaceBefore && glue && last) last.words.push({ text: part, weight })
      else found.push({ words: [{ text: part, weight }], spaceBefore: spaceBefore || found.length > 0 })
      glue = true
    })
    if (parts.at(-1) === '' && parts.length > 1) glue = false
  }
  return found
}
