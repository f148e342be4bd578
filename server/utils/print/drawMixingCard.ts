/** Lays the mixing card out and draws it. What it says is decided in `mixingCard.ts`. */
import type { Paper } from '#shared/schemas/regimen'
import { BOX_WIDTH, Canvas, linesHeight, millimetres, type DocumentInfo } from './canvas'
import { wordBlock } from './drawSign'
import type { MixingCardModel, MixRow, PotLabel } from './mixingCard'
import { PageFlow } from './pageFlow'
import { BODY_SIZE, drawWriteIn, BLOCK_GAP, gapBlock, LARGE_SIZE, paragraphBlock, stack, WRITE_ROW, type Block } from './pageParts'
import { plain, strong, type RichText } from './richText'
import { sheetFrame } from './sheetFrame'
import { breakLines } from './shaping'
import { CELL_PAD, drawRowSides, emptyRowBlock, headRowBlock } from './tableParts'

const COLUMNS = [38, 34, 30, 26, 25, 27].map(millimetres)
const LOG_COLUMNS = [30, 30, 30, 30, 30, 30].map(millimetres)
const FEWEST_LOG_ROWS = 2
const MOST_LOG_ROWS = 7

export async function drawMixingCard(model: MixingCardModel, paper: Paper, info: DocumentInfo): Promise<Buffer> {
  const canvas = new Canvas(paper, info)
  layOutMixingCard(model).draw(canvas)
  return canvas.finish()
}

export function layOutMixingCard(model: MixingCardModel): PageFlow {
  const flow = new PageFlow(sheetFrame({ ...model, dates: '' }, () => null))
  const origin = paragraphBlock(model.origin, BODY_SIZE)
  flow.place(titleBlock(model))
  if (model.nothing) flow.placeWhole(stack([...model.nothing.isSign ? [wordBlock('DO NOT FEED')] : [], paragraphBlock([strong(model.nothing.title)], 24), paragraphBlock(model.nothing.message, LARGE_SIZE), gapBlock(BLOCK_GAP)]))
  else {
    flow.placeWhole(headRowBlock(model.heads, COLUMNS))
    model.rows.forEach(row => flow.placeWhole(mixRowBlock(row)))
    flow.placeWhole(gapBlock(BLOCK_GAP))
    model.steps.forEach((step, index) => flow.placeWhole(stepBlock(index + 1, step)))
    flow.placeWhole(stack([...model.discard.map(text => paragraphBlock([strong(text)], BODY_SIZE)), binBlock(model.bin)]))
    const pairs: Block[] = []
    for (let i = 0; i < model.labels.length; i += 2) pairs.push(labelsBlock(model.labels.slice(i, i + 2)))
    flow.placeWhole(stack([headRowBlock(model.logHeads, LOG_COLUMNS), ...Array.from({ length: FEWEST_LOG_ROWS }, () => emptyRowBlock(LOG_COLUMNS))]))
    // More rows where they do not push the labels to another page, or where the labels go there anyway.
    const after = [gapBlock(BLOCK_GAP), ...pairs, origin]
    const keep = flow.fits(...after) ? after : []
    for (let row = FEWEST_LOG_ROWS; row < MOST_LOG_ROWS && flow.fits(emptyRowBlock(LOG_COLUMNS), ...keep); row++) flow.place(emptyRowBlock(LOG_COLUMNS))
    if (keep.length === 0) flow.newPage()
    else flow.place(gapBlock(BLOCK_GAP))
    pairs.forEach(pair => flow.placeWhole(pair))
  }
  flow.placeWhole(origin)
  return flow
}

function titleBlock(model: MixingCardModel): Block {
  return stack([
    paragraphBlock([strong('Mixing card: '), plain(model.feedName)], 22),
    ...model.demo ? [paragraphBlock([strong(model.demo)], LARGE_SIZE)] : [],
    gapBlock(6),
  ])
}

/** Figures to weigh and measure are the largest; the ratio in words stands below its row. */
function mixRowBlock(row: MixRow): Block {
  const cells: { text: RichText, size: number }[] = [
    { text: [strong(row.days)], size: LARGE_SIZE }, { text: row.strength, size: LARGE_SIZE }, { text: [strong(row.base)], size: 28 }, { text: [strong(row.water)], size: 28 }, { text: row.makes, size: LARGE_SIZE }, { text: row.energy, size: LARGE_SIZE },
  ]
  // A figure that is too wide for its column is set smaller, never broken.
  const sized = cells.map(({ text, size }, index) => {
    const width = COLUMNS[index]! - CELL_PAD * 2
    for (let fitted = size; ; fitted -= 2) {
      const lines = breakLines(text, width, fitted)
      if (size <= LARGE_SIZE || lines.length === 1 || fitted <= LARGE_SIZE) return { lines, size: fitted }
    }
  })
  const cellHeight = Math.max(WRITE_ROW, ...sized.map(({ lines, size }) => linesHeight(lines, size) + 8))
  const ratio = breakLines(row.ratio, BOX_WIDTH - CELL_PAD * 2, BODY_SIZE)
  const ratioHeight = linesHeight(ratio, BODY_SIZE) + 6
  return {
    height: cellHeight + ratioHeight,
    draw: (canvas, top) => {
      let x = 0
      sized.forEach(({ lines, size }, index) => {
        canvas.lines(x + CELL_PAD, top + (cellHeight - linesHeight(lines, size)) / 2, lines, size)
        x += COLUMNS[index]!
      })
      drawRowSides(canvas, COLUMNS, top, cellHeight)
      canvas.lines(CELL_PAD, top + cellHeight + 3, ratio, BODY_SIZE)
      drawRowSides(canvas, [BOX_WIDTH], top + cellHeight, ratioHeight)
    },
  }
}

function stepBlock(number: number, step: RichText): Block {
  const left = millimetres(10)
  const lines = breakLines(step, BOX_WIDTH - left, LARGE_SIZE)
  return {
    height: linesHeight(lines, LARGE_SIZE) + 3,
    draw: (canvas, top) => {
      canvas.text(0, top + 13.5, `${number}`, { size: 17, weight: 'bold' })
      canvas.lines(left, top, lines, LARGE_SIZE)
    },
  }
}

function binBlock(text: string): Block {
  const lines = breakLines([strong(text)], BOX_WIDTH - 20, LARGE_SIZE)
  const height = linesHeight(lines, LARGE_SIZE) + 12
  return {
    height: height + BLOCK_GAP + 4,
    draw: (canvas, top) => {
      canvas.frame(0, top + 4, BOX_WIDTH, height, 2.4)
      canvas.lines(10, top + 10, lines, LARGE_SIZE)
    },
  }
}

/** Labels to cut out, two to a row. */
function labelsBlock(labels: readonly PotLabel[]): Block {
  const width = (BOX_WIDTH - BLOCK_GAP) / 2
  const inner = width - 20
  const parts = labels.map((label) => {
    const text = stack([paragraphBlock([strong(label.mix)], LARGE_SIZE, inner), paragraphBlock([plain(`${label.animal}. `), strong(label.day)], BODY_SIZE, inner)])
    const [made, bin, by, note] = label.lines
    const noteLines = breakLines(note!, inner, BODY_SIZE)
    return { label, text, made: made!, bin: bin!, by: by!, noteLines }
  })
  const height = Math.max(...parts.map(part => part.text.height + WRITE_ROW * 2 + linesHeight(part.noteLines, BODY_SIZE))) + 20
  return {
    height: height + BLOCK_GAP,
    draw: (canvas, top) => parts.forEach(({ label, made, bin, by, noteLines }, index) => {
      const left = index * (width + BLOCK_GAP)
      canvas.frame(left, top, width, height, 1, 4)
      let y = top + 8
      y += canvas.paragraph(left + 10, y, inner, [strong(label.mix)], LARGE_SIZE)
      y += canvas.paragraph(left + 10, y, inner, [plain(`${label.animal}. `), strong(label.day)], BODY_SIZE)
      drawWriteIn(canvas, left + 10, left + 10 + inner / 2 - 6, y + WRITE_ROW - 6, made)
      drawWriteIn(canvas, left + 10 + inner / 2, left + 10 + inner, y + WRITE_ROW - 6, bin)
      drawWriteIn(canvas, left + 10, left + 10 + inner, y + WRITE_ROW * 2 - 6, by)
      canvas.lines(left + 10, top + height - 8 - linesHeight(noteLines, BODY_SIZE), noteLines, BODY_SIZE)
    }),
  }
}

