/** Rows of tables that a hand writes in. */
import { BOX_WIDTH, linesHeight, type Canvas } from './canvas'
import { BODY_SIZE, WRITE_ROW, type Block } from './pageParts'
import { strong } from './richText'
import { breakLines } from './shaping'

/** Between a rule and what stands beside it. */
export const CELL_PAD = 5
const RULE = 0.8

/** Upright rules of one row and its lower edge, all inside the content box. */
export function drawRowSides(canvas: Canvas, columns: readonly number[], top: number, height: number): void {
  let x = 0
  for (const width of [0, ...columns]) {
    x += width
    const inside = Math.min(Math.max(x, RULE / 2), BOX_WIDTH - RULE / 2)
    canvas.rule(inside, top, inside, top + height, RULE)
  }
  canvas.rule(0, top + height, BOX_WIDTH, top + height, RULE)
}

export function headRowBlock(heads: readonly string[], columns: readonly number[]): Block {
  const cells = heads.map((head, index) => breakLines([strong(head)], columns[index]! - CELL_PAD * 2 + 3, BODY_SIZE))
  const height = Math.max(...cells.map(lines => linesHeight(lines, BODY_SIZE))) + 5
  return {
    height,
    draw: (canvas, top) => {
      canvas.rule(0, top, BOX_WIDTH, top, 1.6)
      let x = 0
      cells.forEach((lines, index) => {
        canvas.lines(x + CELL_PAD, top + height - 2 - linesHeight(lines, BODY_SIZE), lines, BODY_SIZE)
        x += columns[index]!
      })
      drawRowSides(canvas, columns, top, height)
    },
  }
}

export function emptyRowBlock(columns: readonly number[]): Block {
  return { height: WRITE_ROW, draw: (canvas, top) => drawRowSides(canvas, columns, top, WRITE_ROW) }
}
