/** Pieces that every printed page is put together from. Each knows its height before it is drawn. */
import { BOX_WIDTH, firstBaseline, linesHeight, middleBaseline, millimetres, type Canvas } from './canvas'
import { drawCode } from './drawCode'
import type { StateBand } from './sheet'
import { plain, strong, type RichText, type Run } from './richText'
import { breakLines, textWidth } from './shaping'
import { haltsOf, type CallLine, type Coded, type FootLines, type Identity } from './wording'

export interface Block {
  height: number
  draw: (canvas: Canvas, top: number) => void
}

/** Body text, pt. Nothing on paper is smaller. */
export const BODY_SIZE = 12
export const LARGE_SIZE = 14
/** A row that a hand writes in. */
export const WRITE_ROW = millimetres(12)
export const BLOCK_GAP = millimetres(3)

export function paragraphBlock(text: RichText, size: number, width = BOX_WIDTH, left = 0): Block {
  const lines = breakLines(text, width, size)
  return { height: linesHeight(lines, size), draw: (canvas, top) => void canvas.lines(left, top, lines, size) }
}

export function gapBlock(height: number): Block {
  return { height, draw: () => {} }
}

/** Blocks below one another as one. */
export function stack(blocks: readonly Block[]): Block {
  return {
    height: blocks.reduce((sum, block) => sum + block.height, 0),
    draw: (canvas, top) => {
      let y = top
      for (const block of blocks) {
        block.draw(canvas, y)
        y += block.height
      }
    },
  }
}

/** A box to tick. */
export function drawTick(canvas: Canvas, x: number, middle: number): void {
  const side = millimetres(5.5)
  canvas.frame(x, middle - side / 2, side, side, 1.4)
}

/** "Label ______ unit": a line to write on after a label, up to `right`. */
export function drawWriteIn(canvas: Canvas, x: number, right: number, baseline: number, label: string, unit = '', size = BODY_SIZE): void {
  canvas.text(x, baseline, label, { size })
  const from = x + (label ? textWidth(label, size, 'regular') + 4 : 0)
  const unitWidth = unit ? textWidth(unit, size, 'regular') + 4 : 0
  canvas.rule(from, baseline + 2.5, right - unitWidth, baseline + 2.5, 0.8)
  if (unit) canvas.text(right, baseline, unit, { size, align: 'right' })
}

const NAME_SIZES = [34, 30, 26, 22]
const CODE_SIDE = millimetres(25)
const CAPTION_WIDTH = millimetres(29)
/** White beside the code: four modules of the largest code that is drawn. */
const CODE_QUIET = millimetres(3)

/** A name at the largest size that takes two lines; the longest take more lines, none is cut. */
function nameLines(name: string, width: number) {
  for (const size of NAME_SIZES) {
    const lines = breakLines([strong(name)], width, size)
    if (lines.length <= (size >= 30 ? 1 : 2) || size === NAME_SIZES.at(-1)) return { size, lines }
  }
  throw new Error('There is always a smallest size.')
}

/** Case and enclosure: printed, or lines to write them on, because one name alone is not enough. */
function identifierBlock(identity: Identity, width: number): Block {
  const named = [identity.caseNumber && `Case ${identity.caseNumber}`, identity.enclosure].filter((text): text is string => Boolean(text))
  const missing = [...identity.caseNumber ? [] : ['Case'], ...identity.enclosure ? [] : ['Enclosure']]
  const text = [strong(named.join(', '))]
  const printed = paragraphBlock(text, LARGE_SIZE, width)
  if (missing.length === 0) return printed
  const lines = breakLines(text, width, LARGE_SIZE)
  // A short one leaves room on its own row for the line of the other.
  const shares = named.length > 0 && lines.length === 1 && lines[0]!.width < width / 2
  const from = shares ? width / 2 : 0
  const each = (width - from) / missing.length
  const row: Block = {
    height: WRITE_ROW,
    draw: (canvas, top) => {
      if (shares) canvas.text(0, top + WRITE_ROW - 8, named[0]!, { size: LARGE_SIZE, weight: 'bold' })
      missing.forEach((label, index) => drawWriteIn(canvas, from + index * each, from + (index + 1) * each - 8, top + WRITE_ROW - 8, `${label}:`, '', LARGE_SIZE))
    },
  }
  return shares || named.length === 0 ? row : stack([printed, row])
}

const HALT_SIZE = 15

/** Why not to use this paper, white on black, above everything else. */
function haltBlock(text: string): Block {
  const lines = breakLines([strong(text)], BOX_WIDTH - 24, HALT_SIZE)
  const height = Math.max(millimetres(9), linesHeight(lines, HALT_SIZE) + 6)
  return {
    height: height + 4,
    draw: (canvas, top) => {
      canvas.fill(0, top, BOX_WIDTH, height)
      const first = top + (height - linesHeight(lines, HALT_SIZE)) / 2
      lines.forEach((line, index) => canvas.lines((BOX_WIDTH - line.width) / 2, first + linesHeight(lines.slice(0, index), HALT_SIZE), [line], HALT_SIZE, 'white'))
    },
  }
}

/** The code with its caption on the left, or a note that there is none. Stands at the right edge. */
function codeBlock(coded: Coded): { block: Block, width: number } {
  if (!coded.url) {
    const lines = breakLines(coded.note, CAPTION_WIDTH, BODY_SIZE)
    const width = CAPTION_WIDTH + 14
    const height = linesHeight(lines, BODY_SIZE) + 10
    const draw = (canvas: Canvas, top: number) => {
      canvas.frame(BOX_WIDTH - width, top, width, height, 1)
      canvas.lines(BOX_WIDTH - width + 7, top + 5, lines, BODY_SIZE)
    }
    return { width, block: { height, draw } }
  }
  const { url } = coded
  const caption = [[strong(coded.code!)], [plain(coded.version!)], [plain(coded.note)]].flatMap(text => breakLines(text, CAPTION_WIDTH, BODY_SIZE))
  const right = BOX_WIDTH - CODE_SIDE - CODE_QUIET
  const draw = (canvas: Canvas, top: number) => {
    drawCode(canvas, BOX_WIDTH - CODE_SIDE, top, CODE_SIDE, url)
    caption.forEach((line, index) => canvas.lines(right - line.width, top - 2 + linesHeight(caption.slice(0, index), BODY_SIZE), [line], BODY_SIZE))
  }
  return { width: CODE_SIDE + CODE_QUIET + CAPTION_WIDTH, block: { height: Math.max(CODE_SIDE + 2, linesHeight(caption, BODY_SIZE) - 2), draw } }
}

/** The head of the first page: who, where, when, and the square code. */
export function headBlock(identity: Identity, dates: string, coded: Coded): Block {
  const code = codeBlock(coded)
  const width = BOX_WIDTH - code.width - BLOCK_GAP
  const name = nameLines(identity.name ?? '', width)
  const nameHeight = identity.name ? linesHeight(name.lines, name.size) : WRITE_ROW + 4
  const left = stack([
    {
      height: nameHeight,
      draw: (canvas, top) => {
        if (identity.name) canvas.lines(0, top, name.lines, name.size)
        else drawWriteIn(canvas, 0, width - 8, top + nameHeight - 10, 'Name:', '', 22)
      },
    },
    paragraphBlock([strong(identity.species), plain(`, ${identity.weight}`)], LARGE_SIZE, width),
    identifierBlock(identity, width),
  ])
  const upper: Block = {
    height: Math.max(left.height, code.block.height),
    draw: (canvas, top) => {
      left.draw(canvas, top)
      code.block.draw(canvas, top)
    },
  }
  return stack([
    ...haltsOf(coded).map(haltBlock),
    upper,
    ...dates ? [paragraphBlock(dates, LARGE_SIZE)] : [],
    { height: 12, draw: (canvas, top) => canvas.fill(0, top + 2, BOX_WIDTH, 4) },
  ])
}

/** The head of later pages. */
export function shortHeadBlock(identity: Identity, coded: Coded): Block {
  const codeText = coded.code ? `${coded.code}, ${coded.version!.toLowerCase()}` : 'Not saved, no code'
  const codeWidth = textWidth(codeText, BODY_SIZE, 'regular')
  const width = BOX_WIDTH - codeWidth - 16
  const size = 20
  const name = breakLines([strong(identity.name ?? 'Name:')], width, size)
  const second = breakLines([identity.species, identity.caseNumber && `case ${identity.caseNumber}`, identity.enclosure, identity.weight].filter(Boolean).join(', '), BOX_WIDTH, BODY_SIZE)
  const nameHeight = linesHeight(name, size)
  const height = nameHeight + linesHeight(second, BODY_SIZE)
  return stack([
    ...haltsOf(coded).map(haltBlock),
    {
      height: height + 6,
      draw: (canvas, top) => {
        canvas.lines(0, top, name, size)
        if (!identity.name) canvas.rule(70, top + nameHeight - 5, width, top + nameHeight - 5, 0.8)
        canvas.text(BOX_WIDTH, top + firstBaseline(size), codeText, { size: BODY_SIZE, align: 'right' })
        canvas.lines(0, top + nameHeight, second, BODY_SIZE)
        canvas.fill(0, top + height + 3, BOX_WIDTH, 3)
      },
    },
    gapBlock(7),
  ])
}

const FOOT_BAND = millimetres(7.5)

/** Widths of the words of a foot's band when they share its row with a long name, as shares of the row. */
const BAND_SHARES = [0.34, 0.42, 0.5, 0.58]
const BAND_INSET = 12
const BETWEEN = 14
/** No sheet has more pages than this writes: a name breaks at the same place on all of them. */
const WIDEST_PAGE_TEXT = 'page 88 of 88'

/** The words of the band and whose sheet it is, side by side, at the widths that make them lowest. */
function bandLines({ band, animal }: FootLines) {
  const row = BOX_WIDTH - BAND_INSET * 2
  const room = row - 16 - textWidth(WIDEST_PAGE_TEXT, BODY_SIZE, 'bold') - BETWEEN
  const natural = textWidth(band, LARGE_SIZE, 'bold')
  const sharing = BAND_SHARES.map(share => share * row)
  const choices = [...natural <= sharing.at(-1)! ? [natural + 0.01] : [], ...sharing].map((width) => {
    const words = breakLines([strong(band)], width, LARGE_SIZE)
    const owner = breakLines([strong(animal)], room - Math.max(...words.map(line => line.width)), BODY_SIZE)
    return { words, owner, height: Math.max(FOOT_BAND, linesHeight(words, LARGE_SIZE) + (words.length === 1 ? 3 : 8), linesHeight(owner, BODY_SIZE) + 6) }
  })
  return choices.reduce((best, one) => one.height < best.height - 0.01 ? one : best)
}

/** The foot of every page: the band, framed where a vet's approval stands and white on black where not, then its lines. */
export function footBlock(foot: FootLines, page: number, pages: number, extra = ''): Block {
  const paragraphs = foot.lines.map((line, index) => breakLines(index === foot.lines.length - 1 && extra ? [...line, plain(` ${extra}`)] : line, BOX_WIDTH, BODY_SIZE))
  const pageText = `page ${page} of ${pages}`
  const { words, owner, height: bandHeight } = bandLines(foot)
  const tone = foot.isReversed ? 'white' : 'black'
  return {
    height: bandHeight + 4 + paragraphs.reduce((sum, lines) => sum + linesHeight(lines, BODY_SIZE), 0),
    draw: (canvas, top) => {
      if (foot.isReversed) canvas.fill(0, top, BOX_WIDTH, bandHeight)
      else canvas.frame(0, top, BOX_WIDTH, bandHeight, 1.6)
      canvas.lines(BAND_INSET, top + (bandHeight - linesHeight(words, LARGE_SIZE)) / 2, words, LARGE_SIZE, tone)
      canvas.text(BOX_WIDTH - BAND_INSET, middleBaseline(top, bandHeight, BODY_SIZE), pageText, { size: BODY_SIZE, weight: 'bold', tone, align: 'right' })
      const ownerWidth = Math.max(...owner.map(line => line.width))
      canvas.lines(BOX_WIDTH - BAND_INSET - textWidth(pageText, BODY_SIZE, 'bold') - BETWEEN - ownerWidth, top + (bandHeight - linesHeight(owner, BODY_SIZE)) / 2, owner, BODY_SIZE, tone)
      let y = top + bandHeight + 4
      for (const lines of paragraphs) y += canvas.lines(0, y, lines, BODY_SIZE)
    },
  }
}

const STATE_SIZE = 22

/** FEED, WAIT or DO NOT FEED: a word, and a shape of its own so that it is known from across the room. */
export function stateBandBlock(band: StateBand, right: RichText = [strong(band.days)], rightSize = LARGE_SIZE): Block {
  const wordAt = millimetres(12)
  const wordWidth = textWidth(band.word, STATE_SIZE, 'bold')
  const rightLines = breakLines(right, BOX_WIDTH / 3, rightSize)
  const rightWidth = Math.max(0, ...rightLines.map(line => line.width))
  const reasonAt = wordAt + wordWidth + 12
  const reason = breakLines(band.reason, BOX_WIDTH - reasonAt - rightWidth - 24, LARGE_SIZE)
  const height = Math.max(millimetres(11.5), linesHeight(reason, LARGE_SIZE) + 9, linesHeight(rightLines, rightSize) + 6)
  const tone = band.state === 'do-not-feed' ? 'white' : 'black'
  return {
    height: height + 5,
    draw: (canvas, top) => {
      if (band.state === 'do-not-feed') canvas.fill(0, top, BOX_WIDTH, height)
      else canvas.frame(0, top, BOX_WIDTH, height, 2.4, band.state === 'wait' ? 7 : undefined)
      drawStateSign(canvas, band.state, millimetres(6), top + height / 2)
      canvas.text(wordAt, middleBaseline(top, height, STATE_SIZE), band.word, { size: STATE_SIZE, weight: 'bold', tone })
      canvas.lines(reasonAt, top + (height - linesHeight(reason, LARGE_SIZE)) / 2, reason, LARGE_SIZE, tone)
      canvas.lines(BOX_WIDTH - 10 - rightWidth, top + (height - linesHeight(rightLines, rightSize)) / 2, rightLines, rightSize, tone)
    },
  }
}

/** A triangle for go, two bars for wait, a crossed ring for never. */
export function drawStateSign(canvas: Canvas, state: StateBand['state'], x: number, middle: number) {
  const half = millimetres(3)
  if (state === 'feed') canvas.shape([[x - half * 0.8, middle - half], [x - half * 0.8, middle + half], [x + half, middle]])
  if (state === 'wait') {
    canvas.fill(x - half * 0.8, middle - half, half * 0.6, half * 2)
    canvas.fill(x + half * 0.2, middle - half, half * 0.6, half * 2)
  }
  if (state === 'do-not-feed') {
    canvas.fill(x - half, middle - half, half * 2, half * 2, 'white')
    canvas.rule(x - half + 3, middle - half + 3, x + half - 3, middle + half - 3, 2.6)
    canvas.rule(x - half + 3, middle + half - 3, x + half - 3, middle - half + 3, 2.6)
  }
}

const USUAL_CALL_SIZES = { name: BODY_SIZE, phone: 17 }

/** Who to ring, two to a row; a missing number is a line wide enough to write one on, a long one takes two lines. */
export function callsBlock(calls: readonly CallLine[], left: number, width: number, sizes = USUAL_CALL_SIZES): Block {
  const each = width / 2
  const cells = calls.map((call) => {
    const text: Run[] = [plain(`${call.role}: `), ...call.name ? [strong(`${call.name} `)] : []]
    const lines = breakLines(text, each - 10, sizes.name)
    const phone = call.phone ? breakLines([strong(call.phone)], each - 10, sizes.phone) : []
    const under = call.phone ? linesHeight(phone.slice(1), sizes.phone) + sizes.phone + 3 : WRITE_ROW - BODY_SIZE
    return { lines, phone, height: linesHeight(lines, sizes.name) + under }
  })
  const rows: typeof cells[] = []
  for (let i = 0; i < cells.length; i += 2) rows.push(cells.slice(i, i + 2))
  return stack(rows.map((row): Block => ({
    height: Math.max(...row.map(cell => cell.height)),
    draw: (canvas, top) => row.forEach(({ lines, phone, height }, index) => {
      const x = left + index * each
      canvas.lines(x, top, lines, sizes.name)
      const under = top + linesHeight(lines, sizes.name)
      // Capitals and figures stand close below the name they belong to.
      if (phone.length > 0) canvas.lines(x, under + 14 * sizes.phone / USUAL_CALL_SIZES.phone - firstBaseline(sizes.phone), phone, sizes.phone)
      else canvas.rule(x, top + height - 5, x + each - 14, top + height - 5, 0.8)
    }),
  })))
}
