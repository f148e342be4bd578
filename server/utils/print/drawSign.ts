/** The full-page DO NOT FEED: clipped on top of everything else. It carries no amount of any kind. */
import { BOX_WIDTH, linesHeight, millimetres, middleBaseline, type Canvas } from './canvas'
import { PageFlow } from './pageFlow'
import { BODY, callsBlock, drawWriteIn, GAP, gapBlock, LARGE, paragraphBlock, stack, WRITE_ROW, type Block } from './pageParts'
import type { Notice, SheetModel, StopBox } from './sheet'
import { sheetFrame } from './sheetFrame'
import { strong } from './richText'
import { breakLines, textWidth } from './shaping'

const CHECK_HEADS = ['Time', 'Warmth (°C)', 'What you see', 'Checked by']
const CHECK_COLUMNS = [36, 32, 76, 36].map(millimetres)
const MOST_CHECK_ROWS = 7

export function drawSign(canvas: Canvas, model: SheetModel, notice: Notice): void {
  const flow = new PageFlow(sheetFrame(model, page => page === 0 ? callBlock(model.stop) : null))
  flow.place(wordBlock(notice.word))
  for (const reason of notice.reasons) {
    flow.placeWhole(stack([paragraphBlock([strong(reason.title)], 24), paragraphBlock(reason.message, LARGE), gapBlock(8)]))
  }
  flow.placeWhole(stack([paragraphBlock([strong(notice.warm.join(' '))], 16), gapBlock(4), nextCheckBlock(), gapBlock(GAP)]))
  const head = checkHeadBlock()
  if (flow.fits(head, checkRowBlock(), gapBlock(WRITE_ROW))) {
    flow.place(head)
    for (let row = 0; row < MOST_CHECK_ROWS && flow.fits(checkRowBlock()); row++) flow.place(checkRowBlock())
  }
  flow.draw(canvas)
}

function wordBlock(word: string): Block {
  const size = Math.min(80, 80 * (BOX_WIDTH - 28) / textWidth(word, 80, 'bold'))
  const height = size * 1.25
  return {
    height: height + 12,
    draw: (canvas, top) => {
      canvas.fill(0, top, BOX_WIDTH, height)
      canvas.text(BOX_WIDTH / 2, middleBaseline(top, height, size), word, { size, weight: 'bold', tone: 'white', align: 'center' })
    },
  }
}

function nextCheckBlock(): Block {
  const height = millimetres(14)
  return {
    height,
    draw: (canvas, top) => {
      const baseline = top + height - 8
      canvas.text(0, baseline, 'Next check:', { size: 17, weight: 'bold' })
      drawWriteIn(canvas, 102, 245, baseline, 'day', '', LARGE)
      drawWriteIn(canvas, 257, 365, baseline, 'time', '', LARGE)
      drawWriteIn(canvas, 377, BOX_WIDTH, baseline, 'by', '', LARGE)
    },
  }
}

function checkHeadBlock(): Block {
  const height = 23
  return {
    height,
    draw: (canvas, top) => {
      let x = 0
      canvas.rule(0, top, BOX_WIDTH, top, 1.6)
      CHECK_HEADS.forEach((head, index) => {
        canvas.text(x + 5, middleBaseline(top, height, BODY), head, { size: BODY, weight: 'bold' })
        x += CHECK_COLUMNS[index]!
      })
      drawCheckSides(canvas, top, height)
    },
  }
}

function checkRowBlock(): Block {
  return { height: WRITE_ROW, draw: (canvas, top) => drawCheckSides(canvas, top, WRITE_ROW) }
}

function drawCheckSides(canvas: Canvas, top: number, height: number) {
  let x = 0
  for (const width of [0, ...CHECK_COLUMNS]) {
    x += width
    canvas.rule(x, top, x, top + height, 0.8)
  }
  canvas.rule(0, top + height, BOX_WIDTH, top + height, 0.8)
}

function callBlock(stop: StopBox): Block {
  const inset = 11
  const left = millimetres(34)
  const calls = callsBlock(stop.calls, left, BOX_WIDTH - left - inset)
  const last = breakLines([strong(stop.last)], BOX_WIDTH - inset * 2, 18)
  const height = calls.height + linesHeight(last, 18) + 24
  return {
    height: height + GAP,
    draw: (canvas, top) => {
      canvas.frame(0, top, BOX_WIDTH, height, 3.4)
      canvas.text(inset, top + 36, 'CALL', { size: 30, weight: 'bold' })
      calls.draw(canvas, top + 9)
      canvas.lines(inset, top + height - 9 - linesHeight(last, 18), last, 18)
    },
  }
}
