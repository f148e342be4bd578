/** The full-page DO NOT FEED: clipped on top of everything else. It carries no amount of any kind. */
import { BOX_WIDTH, linesHeight, millimetres, middleBaseline } from './canvas'
import { PageFlow } from './pageFlow'
import { callsBlock, drawWriteIn, BLOCK_GAP, gapBlock, LARGE_SIZE, paragraphBlock, stack, WRITE_ROW, type Block } from './pageParts'
import type { Notice, SheetModel, StopBox } from './sheet'
import { sheetFrame } from './sheetFrame'
import { strong } from './richText'
import { breakLines, textWidth } from './shaping'
import { emptyRowBlock, headRowBlock } from './tableParts'

const CHECK_HEADS = ['Time', 'Warmth (°C)', 'What you see', 'Checked by']
const CHECK_COLUMNS = [36, 32, 76, 36].map(millimetres)
const MOST_CHECK_ROWS = 7

export function layOutSign(model: SheetModel, notice: Notice): PageFlow {
  const flow = new PageFlow(sheetFrame(model, page => page === 0 ? callBlock(model.stop) : null))
  flow.placeWhole(wordBlock(notice.word))
  for (const reason of notice.reasons) {
    flow.placeWhole(stack([paragraphBlock([strong(reason.title)], 24), paragraphBlock(reason.message, LARGE_SIZE), gapBlock(8)]))
  }
  flow.placeWhole(stack([paragraphBlock([strong(notice.warm.join(' '))], 16), gapBlock(4), nextCheckBlock(), gapBlock(BLOCK_GAP)]))
  const head = headRowBlock(CHECK_HEADS, CHECK_COLUMNS)
  if (flow.fits(head, emptyRowBlock(CHECK_COLUMNS), gapBlock(WRITE_ROW))) {
    flow.place(head)
    for (let row = 0; row < MOST_CHECK_ROWS && flow.fits(emptyRowBlock(CHECK_COLUMNS)); row++) flow.place(emptyRowBlock(CHECK_COLUMNS))
  }
  return flow
}

const MOST_WORD_SIZE = 80

/** The word across the whole width, white on black. */
export function wordBlock(word: string, most = MOST_WORD_SIZE): Block {
  const size = Math.min(most, most * (BOX_WIDTH - 28) / textWidth(word, most, 'bold'))
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
      drawWriteIn(canvas, 102, 245, baseline, 'day', '', LARGE_SIZE)
      drawWriteIn(canvas, 257, 365, baseline, 'time', '', LARGE_SIZE)
      drawWriteIn(canvas, 377, BOX_WIDTH, baseline, 'by', '', LARGE_SIZE)
    },
  }
}

function callBlock(stop: StopBox): Block {
  const inset = 11
  const left = millimetres(34)
  const calls = callsBlock(stop.calls, left, BOX_WIDTH - left - inset)
  const last = breakLines([strong(stop.last)], BOX_WIDTH - inset * 2, 18)
  const height = calls.height + linesHeight(last, 18) + 24
  return {
    height: height + BLOCK_GAP,
    draw: (canvas, top) => {
      canvas.frame(0, top, BOX_WIDTH, height, 3.4)
      canvas.text(inset, top + 36, 'CALL', { size: 30, weight: 'bold' })
      calls.draw(canvas, top + 9)
      canvas.lines(inset, top + height - 9 - linesHeight(last, 18), last, 18)
    },
  }
}
