/** The amount of one feed: the largest thing on the page, in figures, in words and as a barrel. */
import { BOX_WIDTH, linesHeight, millimetres, type Canvas } from './canvas'
import { barrelLook, drawBarrel, drawCheckLine } from './drawBarrel'
import { BODY_SIZE, BLOCK_GAP, gapBlock, LARGE_SIZE, paragraphBlock, stack, type Block } from './pageParts'
import { strong } from './richText'
import { breakLines, textWidth } from './shaping'
import type { Amount } from './wording'

const FIGURE_SIZE = 48
const UNIT_SIZE = 28
/** Words need this much; the barrel gets the rest, and gives back what it does not need. */
const LEAST_LEFT = millimetres(78)
/** Narrower than this and words fall apart. */
const LEAST_WORDS = millimetres(32)
const MOST_BARREL_HEIGHT = millimetres(42)
const CHECK_HEIGHT = 10
/** Room for the check line and its words. */
const LEAST_RIGHT = millimetres(72)

export function amountBlock(amount: Amount): Block {
  const look = barrelLook(amount.barrel.capacityMl, BOX_WIDTH - LEAST_LEFT - BLOCK_GAP, MOST_BARREL_HEIGHT)
  const trueSize = look.scale === 1
  const leftWidth = BOX_WIDTH - BLOCK_GAP - Math.max(look.width, LEAST_RIGHT)
  const heading = breakLines([strong(amount.heading)], leftWidth, LARGE_SIZE)
  const figureWidth = textWidth(amount.figure, FIGURE_SIZE, 'bold') + 7 + textWidth(amount.unit, UNIT_SIZE, 'regular') + 14
  const figureHeight = FIGURE_SIZE * 0.66 + 10
  // Words stand beside the figure where two lines hold them, else below it.
  const beside = breakLines(amount.words, leftWidth - figureWidth, LARGE_SIZE)
  const isBeside = beside.length <= 2 && leftWidth - figureWidth > LEAST_WORDS
  const below = [
    ...isBeside ? [] : [breakLines(amount.words, leftWidth, LARGE_SIZE)],
    breakLines([strong(amount.syringe)], leftWidth, LARGE_SIZE),
    breakLines([strong(amount.strength), { text: `, ${amount.feedName}` }], leftWidth, LARGE_SIZE),
  ]
  const demo = amount.demo ? breakLines([strong(amount.demo)], leftWidth, BODY_SIZE) : []
  const leftHeight = linesHeight(heading, LARGE_SIZE) + figureHeight + below.reduce((sum, lines) => sum + linesHeight(lines, LARGE_SIZE), 0) + linesHeight(demo, BODY_SIZE)

  const note = breakLines(trueSize ? 'This line is 50\u00A0mm when printed at 100\u00A0%' : 'Drawn smaller than the real syringe', BOX_WIDTH - leftWidth - BLOCK_GAP, BODY_SIZE)
  const noteHeight = linesHeight(note, BODY_SIZE) + (trueSize ? CHECK_HEIGHT : 0)
  const height = Math.max(leftHeight, look.height + noteHeight + 6)
  return {
    height: height + 3,
    draw: (canvas, top) => {
      let y = top + canvas.lines(0, top, heading, LARGE_SIZE)
      const baseline = y + FIGURE_SIZE * 0.66 + 4
      canvas.text(0, baseline, amount.figure, { size: FIGURE_SIZE, weight: 'bold' })
      canvas.text(textWidth(amount.figure, FIGURE_SIZE, 'bold') + 7, baseline, amount.unit, { size: UNIT_SIZE })
      if (isBeside) canvas.lines(figureWidth, baseline - FIGURE_SIZE * 0.33 - linesHeight(beside, LARGE_SIZE) / 2, beside, LARGE_SIZE)
      y += figureHeight
      for (const lines of below) y += canvas.lines(0, y, lines, LARGE_SIZE)
      canvas.lines(0, y, demo, BODY_SIZE)

      const left = BOX_WIDTH - look.width
      const barrelTop = top + Math.max(0, (height - noteHeight - 6 - look.height) / 2)
      drawBarrel(canvas, left, barrelTop, amount.barrel, look)
      const noteTop = top + height - noteHeight
      if (trueSize) drawCheckLine(canvas, BOX_WIDTH, noteTop)
      canvas.lines(BOX_WIDTH - Math.max(...note.map(line => line.width)), noteTop + (trueSize ? CHECK_HEIGHT : 0), note, BODY_SIZE)
    },
  }
}

/** All amounts of a stretch, then what else to know before the syringe is picked up. */
export function amountsBlock(amounts: readonly Amount[], facts: readonly string[]): Block {
  const rule: Block = { height: 6, draw: (canvas: Canvas, top) => canvas.rule(0, top + 2, BOX_WIDTH, top + 2, 0.8) }
  return stack([
    ...amounts.flatMap((amount, index) => index === 0 ? [amountBlock(amount)] : [rule, amountBlock(amount)]),
    ...facts.map(fact => paragraphBlock(fact, BODY_SIZE)),
    gapBlock(5),
  ])
}
