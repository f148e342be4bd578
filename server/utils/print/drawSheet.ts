/** Lays the sheet out and draws it. What it says is decided in `sheet.ts`. */
import type { Paper } from '#shared/schemas/regimen'
import { BOX_WIDTH, Canvas, linesHeight, millimetres, type DocumentInfo } from './canvas'
import { amountsBlock } from './drawAmount'
import { dayRowBlock, logHeadBlock, logRowBlock, spareRowBlock } from './drawLog'
import { layOutSign } from './drawSign'
import { PageFlow } from './pageFlow'
import {
  BODY_SIZE, callsBlock, drawStateSign, drawTick, drawWriteIn, BLOCK_GAP, gapBlock, LARGE_SIZE, paragraphBlock, stack, stateBandBlock, WRITE_ROW, type Block,
} from './pageParts'
import { plain, strong } from './richText'
import type { LogDay, Notice, SheetModel, StepBox, Stretch, StopBox } from './sheet'
import { sheetFrame } from './sheetFrame'
import { breakLines } from './shaping'
import { daySpan, held } from './wording'

/** @returns the file. */
export async function drawSheet(model: SheetModel, paper: Paper, info: DocumentInfo): Promise<Buffer> {
  const canvas = new Canvas(paper, info)
  layOutSheet(model).draw(canvas)
  return canvas.finish()
}

/**
 * The pages of a sheet, or the sign where the gate is shut.
 *
 * @param firstPage  number that its first page bears in the file.
 */
export function layOutSheet(model: SheetModel, firstPage = 1): PageFlow {
  return model.notice?.state === 'do-not-feed' ? layOutSign(model, model.notice) : layOutDays(model, firstPage)
}

/** Fewer rows than this at the foot of a page are not worth splitting a long day for. */
const FEWEST_ROWS = 3

/**
 * Today comes first with everything it needs, the stop box always at the foot of the first page. Boxes go where a page
 * would end early, or to the end. A day is split only when it is longer than a page.
 */
function layOutDays(model: SheetModel, firstPage: number): PageFlow {
  const stop = stopBlock(model.stop)
  const reminder = reminderBlock(model.stop, firstPage)
  const flow = new PageFlow(sheetFrame(model, page => page === 0 ? stop : reminder))
  let boxes = model.boxes.length > 0 ? boxesBlock(model.boxes) : null
  const turnPage = () => {
    if (boxes && flow.fits(boxes)) {
      flow.place(boxes)
      boxes = null
    }
    flow.newPage()
  }

  if (model.notice) flow.placeWhole(noticeBlock(model.notice))
  const [first] = model.stretches
  model.stretches.forEach(stretch => placeStretch(flow, stretch, turnPage, stretch === first && model.notice !== null && stretch.band.state === 'wait'))
  if (boxes) flow.placeWhole(boxes)
  flow.placeWhole(paragraphBlock(model.origin, BODY_SIZE))
  return flow
}

/** @param isUnderNotice  the notice right above has said WAIT already, larger. */
function placeStretch(flow: PageFlow, stretch: Stretch, turnPage: () => void, isUnderNotice: boolean): void {
  const amounts = amountsBlock(stretch.amounts, stretch.facts)
  const withBand = stack([stateBandBlock(stretch.band), amounts])
  const head = logHeadBlock(stretch)
  const spare = stack([spareRowBlock(stretch), gapBlock(BLOCK_GAP)])
  const continued = (from: LogDay) => continuedBlock(stretch, from)
  const longest = flow.roomOn(flow.page + 1) - heightOf(continued(stretch.days[0]!), head, spare)
  const days = stretch.days.map(day => ({ day, block: dayBlock(stretch, day) }))

  const first = days[0]!
  if (isUnderNotice && !flow.fits(amounts, head, first.block, spare)) {
    // One blank row less is better than a first page without a row.
    const shorter = dayBlock(stretch, { ...first.day, rows: first.day.rows.slice(1) })
    if (flow.fits(amounts, head, shorter, spare)) first.block = shorter
  }
  const beginning = first.block.height > longest ? splitBeginning(stretch, first.day) : first.block
  const lead = isUnderNotice && flow.fits(amounts, head, beginning, spare) ? amounts : withBand
  if (flow.isFresh ? flow.isBetterNext(lead) : !flow.fits(lead, head, beginning, spare)) turnPage()
  flow.place(lead)
  let isOpen = false
  for (const { day, block } of days) {
    const isLong = block.height > longest
    const needed = isLong ? splitBeginning(stretch, day) : block
    if (!isOpen) {
      // The order alone stands on this page; its rows follow on the next.
      if (!flow.fits(head, needed, spare)) {
        turnPage()
        flow.place(continued(day))
      }
      flow.place(head)
      isOpen = true
    }
    else if (!flow.fits(needed, spare)) {
      flow.place(spare)
      turnPage()
      flow.place(continued(day))
      flow.place(head)
    }
    if (isLong) placeSplitDay(flow, stretch, day, [continued(day), head], spare)
    else flow.place(block)
  }
  flow.place(spare)
}

function heightOf(...blocks: readonly Block[]): number {
  return blocks.reduce((sum, block) => sum + block.height, 0)
}

function dayBlock(stretch: Stretch, day: LogDay): Block {
  return stack([dayRowBlock(day, false), ...day.rows.map(row => logRowBlock(stretch, row))])
}

function splitBeginning(stretch: Stretch, day: LogDay): Block {
  return stack([dayRowBlock(day, false), ...day.rows.slice(0, FEWEST_ROWS).map(row => logRowBlock(stretch, row))])
}

/** On every page of a long day its head and its day row are repeated; the spare row comes after its last feed. */
function placeSplitDay(flow: PageFlow, stretch: Stretch, day: LogDay, again: readonly Block[], spare: Block): void {
  flow.place(dayRowBlock(day, false))
  day.rows.forEach((row, index) => {
    const block = logRowBlock(stretch, row)
    const isLast = index === day.rows.length - 1
    if (!flow.fits(block, ...isLast ? [spare] : [])) {
      flow.newPage()
      again.forEach(part => flow.place(part))
      flow.place(dayRowBlock(day, true))
    }
    flow.place(block)
  })
}

/** The band again on a later page: the days that are left, or the amount where there is one. */
function continuedBlock(stretch: Stretch, from: LogDay): Block {
  const amounts = stretch.amounts.map(amount => `${amount.figure}\u00A0${amount.unit}`)
  return amounts.length > 0
    ? stateBandBlock({ ...stretch.band, reason: `${stretch.band.reason}. ${stretch.amounts[0]!.strength}, ${stretch.amounts[0]!.syringe}.` }, [strong(amounts.join(' or '))], 28)
    : stateBandBlock({ ...stretch.band, days: daySpan(from.date, stretch.days.at(-1)!.date) })
}

/** Wait, and why: before anything else. Every reason has a box to tick once it is put right. */
function noticeBlock(notice: Notice): Block {
  const inset = 12
  const width = BOX_WIDTH - inset * 2
  const text = inset + millimetres(9)
  const reasons = notice.reasons.map((reason): Block => {
    const block = stack([paragraphBlock([strong(reason.title)], 15, width - millimetres(9), text), paragraphBlock(reason.message, BODY_SIZE, width - millimetres(9), text), gapBlock(3)])
    return {
      height: block.height,
      draw: (canvas, top) => {
        drawTick(canvas, inset, top + 10)
        block.draw(canvas, top)
      },
    }
  })
  const body = stack([
    gapBlock(5),
    {
      height: 29,
      draw: (canvas, top) => {
        drawStateSign(canvas, notice.state, inset + 8, top + 13)
        canvas.text(inset + 24, top + 21, notice.word, { size: 22, weight: 'bold' })
        canvas.text(inset + 34 + canvas.width(notice.word, { size: 22, weight: 'bold' }), top + 21, 'before the first feed. Put right, then tick:', { size: LARGE_SIZE })
      },
    },
    ...reasons,
    paragraphBlock(notice.warm.join(' '), BODY_SIZE, width, inset),
    {
      height: WRITE_ROW,
      draw: (canvas, top) => {
        const third = width / 3
        drawWriteIn(canvas, inset, inset + third * 1.3 - 10, top + WRITE_ROW - 8, 'All put right on')
        drawWriteIn(canvas, inset + third * 1.3, inset + third * 2.1 - 10, top + WRITE_ROW - 8, 'at')
        drawWriteIn(canvas, inset + third * 2.1, inset + width, top + WRITE_ROW - 8, 'initials')
      },
    },
    gapBlock(2),
  ])
  return {
    height: body.height + BLOCK_GAP,
    draw: (canvas, top) => {
      canvas.frame(0, top, BOX_WIDTH, body.height, 2.4, 7)
      body.draw(canvas, top)
    },
  }
}

/** Shares of the width that the left column may have. */
const LEFT_SHARES = [0.5, 0.44, 0.38, 0.33]

/** Boxes in two columns, what to mix on the left and how to give it on the right, as wide as makes them lowest. */
export function boxesBlock(boxes: readonly StepBox[]): Block {
  const [first, second] = boxes
  if (!second) return stepBoxBlock(first!, BOX_WIDTH, 0)
  const between = BLOCK_GAP * 2
  const pairs = LEFT_SHARES.map((share) => {
    const width = (BOX_WIDTH - between) * share
    return [stepBoxBlock(first!, width, 0), stepBoxBlock(second, BOX_WIDTH - between - width, width + between)] as const
  })
  const heightOfPair = (pair: readonly Block[]) => Math.max(...pair.map(block => block.height))
  const lowest = pairs.reduce((best, pair) => heightOfPair(pair) < heightOfPair(best) - 1 ? pair : best)
  return {
    height: heightOfPair(lowest) + 4,
    draw: (canvas, top) => lowest.forEach(block => block.draw(canvas, top + 2)),
  }
}

function stepBoxBlock(box: StepBox, width: number, x: number): Block {
  const title = breakLines([strong(box.title)], width, LARGE_SIZE)
  const items = box.lines.map(line => breakLines(line, width - 12, BODY_SIZE))
  return {
    height: linesHeight(title, LARGE_SIZE) + 8 + items.reduce((sum, lines) => sum + linesHeight(lines, BODY_SIZE) + 2, 0) + 6,
    draw: (canvas, top) => {
      let y = top + canvas.lines(x, top, title, LARGE_SIZE) + 2
      canvas.fill(x, y, width, 2)
      y += 6
      for (const lines of items) {
        canvas.text(x + 1, y + 11.5, '•', { size: BODY_SIZE, weight: 'bold' })
        y += canvas.lines(x + 12, y, lines, BODY_SIZE) + 2
      }
    },
  }
}

/** The stop box: signs, weight, whom to ring. The heaviest frame on the page. */
export function stopBlock(stop: StopBox): Block {
  const frame = 3.4
  const inset = 11
  const wordWidth = millimetres(37)
  const left = inset + wordWidth
  const width = BOX_WIDTH - left - inset
  const column = (width - 10) / 2
  const signs = [...stop.signs.map(plain), strong(stop.weight), strong(stop.order)].map(sign => breakLines([sign], column - 11, BODY_SIZE))
  const half = splitAt(signs.map(lines => lines.length))
  const columns = [signs.slice(0, half), signs.slice(half)]
  const signsHeight = Math.max(...columns.map(lines => lines.reduce((sum, one) => sum + linesHeight(one, BODY_SIZE) + 1, 0)))
  const calls = callsBlock(stop.calls, left, width)
  const last = breakLines([strong(stop.last)], BOX_WIDTH - inset * 2, 16)
  const height = frame * 2 + 10 + signsHeight + 4 + calls.height + linesHeight(last, 16) + 6
  return {
    height: height + BLOCK_GAP,
    draw: (canvas, top) => {
      canvas.frame(0, top, BOX_WIDTH, height, frame)
      canvas.text(inset, top + 33, 'STOP', { size: 30, weight: 'bold' })
      canvas.text(inset, top + 63, '& CALL', { size: 30, weight: 'bold' })
      const y = top + frame + 6
      columns.forEach((lines, index) => {
        let lineTop = y
        for (const one of lines) {
          // The last line is the order, not a sign.
          if (one !== signs.at(-1)) canvas.text(left + index * (column + 10), lineTop + 11.5, '•', { size: BODY_SIZE, weight: 'bold' })
          lineTop += canvas.lines(left + index * (column + 10) + 11, lineTop, one, BODY_SIZE) + 1
        }
      })
      calls.draw(canvas, y + signsHeight + 4)
      canvas.lines(inset, top + height - frame - 6 - linesHeight(last, 16), last, 16)
    },
  }
}

/** Where to break a list in two so that both columns are about as long. */
function splitAt(heights: readonly number[]): number {
  const all = heights.reduce((sum, height) => sum + height, 0)
  let sum = 0
  for (let i = 0; i < heights.length; i++) {
    sum += heights[i]!
    if (sum >= all / 2) return i + 1
  }
  return heights.length
}

/** One line on later pages: the stop box is on the first. */
function reminderBlock(stop: StopBox, stopPage: number): Block {
  const call = stop.calls.find(line => line.phone)
  const lines = breakLines([strong(`STOP & CALL signs: page ${stopPage}. ${stop.last}`), ...call ? [plain(` ${call.role}:\u00A0`), strong(held(call.phone!))] : []], BOX_WIDTH, BODY_SIZE)
  const height = linesHeight(lines, BODY_SIZE) + 9
  return {
    height: height + 4,
    draw: (canvas, top) => {
      canvas.fill(0, top, BOX_WIDTH, 3)
      canvas.lines(0, top + 6, lines, BODY_SIZE)
    },
  }
}
