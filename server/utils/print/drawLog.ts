/** The table a carer writes in: a head, a row to weigh in on for each day, a row for each feed, a spare row. */
import { BOX_WIDTH, linesHeight, middleBaseline, millimetres, type Canvas } from './canvas'
import { BODY_SIZE, drawTick, drawWriteIn, gapBlock, LARGE_SIZE, WRITE_ROW, type Block } from './pageParts'
import type { LogDay, LogRow, Stretch } from './sheet'
import { strong } from './richText'
import { breakLines, textWidth } from './shaping'
import { CELL_PAD, drawRowSides, headRowBlock } from './tableParts'

const FEED_COLUMNS = [27, 30, 31, 25, 23, 25, 19].map(millimetres)
const FLUID_COLUMNS = [22, 37, 44, 28, 27, 22].map(millimetres)
const DAY_ROW = millimetres(13)

function columnsOf(stretch: Stretch): number[] {
  return stretch.amounts.length > 0 ? FEED_COLUMNS : FLUID_COLUMNS
}

function isTick(stretch: Stretch, column: number): boolean {
  return stretch.amounts.length > 0 ? [2, 4, 5].includes(column) : column === 4
}

export function logHeadBlock(stretch: Stretch): Block {
  return headRowBlock(stretch.heads, columnsOf(stretch))
}

/** The first row of a day: which day, weight before the first feed, water. */
export function dayRowBlock(day: LogDay, continued: boolean): Block {
  const columns = [millimetres(33), millimetres(59), millimetres(88)]
  const weigh = breakLines(day.weigh, columns[1]! - millimetres(26), BODY_SIZE)
  const figureWidth = day.water.figure ? textWidth(day.water.figure, 17, 'bold') + 8 : 0
  const given = millimetres(33)
  const water = breakLines(day.water.label, columns[2]! - CELL_PAD * 2 - figureWidth - given + 4, BODY_SIZE)
  const note = breakLines(continued ? 'continued' : day.note, columns[0]! - CELL_PAD * 2, BODY_SIZE)
  const label = breakLines([strong(day.label)], columns[0]! - CELL_PAD * 2, 16)
  const height = Math.max(DAY_ROW, linesHeight(label, 16) + linesHeight(note, BODY_SIZE) + 2, linesHeight(weigh, BODY_SIZE) + 7, linesHeight(water, BODY_SIZE) + 7)
  return {
    height,
    draw: (canvas, top) => {
      canvas.rule(0, top, BOX_WIDTH, top, 2.2)
      const labelTop = top + (height - linesHeight(label, 16) - linesHeight(note, BODY_SIZE)) / 2
      canvas.lines(CELL_PAD, labelTop, label, 16)
      canvas.lines(CELL_PAD, labelTop + linesHeight(label, 16), note, BODY_SIZE)

      const second = columns[0]! + CELL_PAD
      canvas.lines(second, top + (height - linesHeight(weigh, BODY_SIZE)) / 2, weigh, BODY_SIZE)
      drawWriteIn(canvas, columns[0]! + columns[1]! - millimetres(25), columns[0]! + columns[1]! - CELL_PAD, top + height - 9, '', 'g', LARGE_SIZE)

      const third = columns[0]! + columns[1]! + CELL_PAD
      canvas.lines(third, top + (height - linesHeight(water, BODY_SIZE)) / 2, water, BODY_SIZE)
      if (day.water.figure) {
        canvas.text(BOX_WIDTH - given - CELL_PAD - 6, middleBaseline(top, height, 17), day.water.figure, { size: 17, weight: 'bold', align: 'right' })
        drawWriteIn(canvas, BOX_WIDTH - given - CELL_PAD + 2, BOX_WIDTH - CELL_PAD, top + height - 9, 'given', 'mL')
      }
      else if (day.water.label.endsWith(':')) drawWriteIn(canvas, BOX_WIDTH - given - CELL_PAD, BOX_WIDTH - CELL_PAD, top + height - 9, '', '')
      drawRowSides(canvas, columns, top, height)
    },
  }
}

export function logRowBlock(stretch: Stretch, row: LogRow): Block {
  const columns = columnsOf(stretch)
  // "12:00 noon": the figures stay large, the word goes below.
  const [clock = '', part = ''] = row.time.split('\u00A0')
  return {
    height: WRITE_ROW,
    draw: (canvas, top) => {
      if (part) {
        canvas.text(CELL_PAD, top + 16, clock, { size: 17, weight: 'bold' })
        canvas.text(CELL_PAD, top + 29, part, { size: BODY_SIZE, weight: 'bold' })
      }
      else canvas.text(CELL_PAD, middleBaseline(top, WRITE_ROW, 17), clock, { size: 17, weight: 'bold' })
      const give = columns[0]! + CELL_PAD
      canvas.text(give, row.giveNote ? top + 16 : middleBaseline(top, WRITE_ROW, 18), row.give, { size: 18, weight: 'bold' })
      if (row.giveNote) canvas.text(give, top + 29, row.giveNote, { size: BODY_SIZE })
      drawCells(canvas, stretch, columns, top)
    },
  }
}

/** For a feed that nobody planned: it must be seen too. */
export function spareRowBlock(stretch: Stretch): Block {
  const { spare } = stretch
  if (spare === null) return gapBlock(0)
  const columns = columnsOf(stretch)
  return {
    height: WRITE_ROW,
    draw: (canvas, top) => {
      canvas.text(CELL_PAD, middleBaseline(top, WRITE_ROW, BODY_SIZE), spare, { size: BODY_SIZE })
      drawCells(canvas, stretch, [0, columns[0]! + columns[1]!, ...columns.slice(2)], top)
    },
  }
}

function drawCells(canvas: Canvas, stretch: Stretch, columns: readonly number[], top: number) {
  let x = 0
  columns.forEach((width, index) => {
    if (isTick(stretch, index)) {
      drawTick(canvas, x + CELL_PAD + 2, top + WRITE_ROW / 2)
      if (index === 2) canvas.text(x + CELL_PAD + 2 + millimetres(5.5) + 5, middleBaseline(top, WRITE_ROW, BODY_SIZE), 'yes', { size: BODY_SIZE })
    }
    x += width
  })
  drawRowSides(canvas, columns, top, WRITE_ROW)
}
