/** The table a carer writes in: a head, a row to weigh in on for each day, a row for each feed, a spare row. */
import { BOX_WIDTH, linesHeight, middleBaseline, millimetres, type Canvas } from './canvas'
import { BODY, drawTick, drawWriteIn, gapBlock, LARGE, WRITE_ROW, type Block } from './pageParts'
import type { LogDay, LogRow, Stretch } from './sheet'
import { strong } from './richText'
import { breakLines, textWidth } from './shaping'

const FEED_COLUMNS = [27, 30, 31, 25, 23, 25, 19].map(millimetres)
const FLUID_COLUMNS = [27, 34, 47, 24, 25, 23].map(millimetres)
const DAY_ROW = millimetres(13)
const PAD = 5

function columnsOf(stretch: Stretch): number[] {
  return stretch.amounts.length > 0 ? FEED_COLUMNS : FLUID_COLUMNS
}

function isTick(stretch: Stretch, column: number): boolean {
  return stretch.amounts.length > 0 ? [2, 4, 5].includes(column) : column === 4
}

export function logHeadBlock(stretch: Stretch): Block {
  const columns = columnsOf(stretch)
  const heads = stretch.heads.map((head, index) => breakLines([strong(head)], columns[index]! - PAD * 2 + 3, BODY))
  const height = Math.max(...heads.map(lines => linesHeight(lines, BODY))) + 5
  return {
    height,
    draw: (canvas, top) => {
      canvas.rule(0, top, BOX_WIDTH, top, 1.6)
      let x = 0
      heads.forEach((lines, index) => {
        canvas.lines(x + PAD, top + height - 2 - linesHeight(lines, BODY), lines, BODY)
        x += columns[index]!
      })
      drawSides(canvas, columns, top, height)
    },
  }
}

/** Upright rules of one row, and its lower edge. */
function drawSides(canvas: Canvas, columns: readonly number[], top: number, height: number, lower = 0.8) {
  let x = 0
  for (const width of [0, ...columns]) {
    x += width
    canvas.rule(x, top, x, top + height, 0.8)
  }
  canvas.rule(0, top + height, BOX_WIDTH, top + height, lower)
}

/** The first row of a day: which day, weight before the first feed, water. */
export function dayRowBlock(day: LogDay, continued: boolean): Block {
  const columns = [millimetres(33), millimetres(59), millimetres(88)]
  const weigh = breakLines(day.weigh, columns[1]! - millimetres(26), BODY)
  const figureWidth = day.water.figure ? textWidth(day.water.figure, 17, 'bold') + 8 : 0
  const given = millimetres(33)
  const water = breakLines(day.water.label, columns[2]! - PAD * 2 - figureWidth - given + 4, BODY)
  const note = breakLines(continued ? 'continued' : day.note, columns[0]! - PAD * 2, BODY)
  const label = breakLines([strong(day.label)], columns[0]! - PAD * 2, 16)
  const height = Math.max(DAY_ROW, linesHeight(label, 16) + linesHeight(note, BODY) + 2, linesHeight(weigh, BODY) + 7, linesHeight(water, BODY) + 7)
  return {
    height,
    draw: (canvas, top) => {
      canvas.rule(0, top, BOX_WIDTH, top, 2.2)
      const labelTop = top + (height - linesHeight(label, 16) - linesHeight(note, BODY)) / 2
      canvas.lines(PAD, labelTop, label, 16)
      canvas.lines(PAD, labelTop + linesHeight(label, 16), note, BODY)

      const second = columns[0]! + PAD
      canvas.lines(second, top + (height - linesHeight(weigh, BODY)) / 2, weigh, BODY)
      drawWriteIn(canvas, columns[0]! + columns[1]! - millimetres(25), columns[0]! + columns[1]! - PAD, top + height - 9, '', 'g', LARGE)

      const third = columns[0]! + columns[1]! + PAD
      canvas.lines(third, top + (height - linesHeight(water, BODY)) / 2, water, BODY)
      if (day.water.figure) {
        canvas.text(BOX_WIDTH - given - PAD - 6, middleBaseline(top, height, 17), day.water.figure, { size: 17, weight: 'bold', align: 'right' })
        drawWriteIn(canvas, BOX_WIDTH - given - PAD + 2, BOX_WIDTH - PAD, top + height - 9, 'given', 'mL')
      }
      else if (day.water.label.endsWith(':')) drawWriteIn(canvas, BOX_WIDTH - given - PAD, BOX_WIDTH - PAD, top + height - 9, '', '')
      drawSides(canvas, columns, top, height)
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
        canvas.text(PAD, top + 16, clock, { size: 17, weight: 'bold' })
        canvas.text(PAD, top + 29, part, { size: BODY, weight: 'bold' })
      }
      else canvas.text(PAD, middleBaseline(top, WRITE_ROW, 17), clock, { size: 17, weight: 'bold' })
      const give = columns[0]! + PAD
      canvas.text(give, row.giveNote ? top + 16 : middleBaseline(top, WRITE_ROW, 18), row.give, { size: 18, weight: 'bold' })
      if (row.giveNote) canvas.text(give, top + 29, row.giveNote, { size: BODY })
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
      canvas.text(PAD, middleBaseline(top, WRITE_ROW, BODY), spare, { size: BODY })
      drawCells(canvas, stretch, [0, columns[0]! + columns[1]!, ...columns.slice(2)], top)
    },
  }
}

function drawCells(canvas: Canvas, stretch: Stretch, columns: readonly number[], top: number) {
  let x = 0
  columns.forEach((width, index) => {
    if (isTick(stretch, index)) {
      drawTick(canvas, x + PAD + 2, top + WRITE_ROW / 2)
      if (index === 2) canvas.text(x + PAD + 2 + millimetres(5.5) + 5, middleBaseline(top, WRITE_ROW, BODY), 'yes', { size: BODY })
    }
    x += width
  })
  drawSides(canvas, columns, top, WRITE_ROW)
}
