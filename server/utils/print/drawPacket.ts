/** Lays the foster packet out and draws it as one file. What it says is decided in `packet.ts`. */
import type { Paper } from '#shared/schemas/regimen'
import { BOX_WIDTH, Canvas, linesHeight, millimetres, type DocumentInfo } from './canvas'
import { layOutMixingCard } from './drawMixingCard'
import { boxesBlock, layOutSheet, stopBlock } from './drawSheet'
import { wordBlock } from './drawSign'
import { PageFlow } from './pageFlow'
import { BLOCK_GAP, callsBlock, drawWriteIn, gapBlock, LARGE_SIZE, paragraphBlock, stack, stateBandBlock, WRITE_ROW, type Block } from './pageParts'
import { partInWords, type PacketCover, type PacketModel } from './packet'
import { plain, strong } from './richText'
import { sheetFrame } from './sheetFrame'
import { breakLines } from './shaping'
import { approvalInWords, ended, type ApprovalLines } from './wording'

const WORD_SIZE = 46
const TITLE_SIZE = 21
const CALL_SIZES = { name: LARGE_SIZE, phone: 24 }

export async function drawPacket(model: PacketModel, paper: Paper, info: DocumentInfo): Promise<Buffer> {
  const canvas = new Canvas(paper, info)
  const flows = layOutPacket(model)
  const total = pagesOf(flows)
  flows.forEach((flow, index) => flow.draw(canvas, pagesOf(flows.slice(0, index)), total))
  return canvas.finish()
}

function pagesOf(flows: readonly PageFlow[]): number {
  return flows.reduce((sum, flow) => sum + flow.pages.length, 0)
}

/** The cover lists the pages after it, so its own number of pages is tried from one upwards until it fits. */
function layOutPacket(model: PacketModel): PageFlow[] {
  for (let coverPages = 1; ; coverPages++) {
    const parts = [layOutSheet(model.sheet, coverPages + 1), ...model.mixing ? [layOutMixingCard(model.mixing)] : []]
    const cover = layOutCover(model.cover, [coverPages, ...parts.map(part => part.pages.length)])
    if (cover.pages.length <= coverPages) return [cover, ...parts]
  }
}

/** @param pages  how many each part has, the cover first. */
function layOutCover(cover: PacketCover, pages: readonly number[]): PageFlow {
  const writeIns = writeInsBlock(cover.writeIns)
  const flow = new PageFlow(sheetFrame(cover, page => page === 0 ? writeIns : null))
  flow.place(stack([paragraphBlock([strong(cover.title)], TITLE_SIZE), gapBlock(4)]))
  if (cover.notice) noticeBlocks(cover.notice).forEach(block => flow.placeWhole(block))
  flow.placeWhole(approvalBlock(cover.approval))
  flow.placeWhole(whoBlock(cover))
  flow.placeWhole(stack([headingBlock(cover.stopTitle), stopBlock(cover.stop)]))
  const parts = cover.parts.map((part, index) => {
    const before = pages.slice(0, index).reduce((sum, count) => sum + count, 0)
    return partInWords(part, before + 1, before + pages[index]!)
  })
  flow.placeWhole(boxesBlock([{ title: cover.partsTitle, lines: parts }, { title: cover.careTitle, lines: cover.care }]))
  return flow
}

function noticeBlocks(notice: NonNullable<PacketCover['notice']>): Block[] {
  if (notice.state !== 'do-not-feed') return [stateBandBlock({ state: notice.state, word: notice.word, reason: notice.reasons.map(reason => reason.title).join('. '), days: '' })]
  // The sign itself is the next page: here the word leaves room for whom to ring.
  return [wordBlock(notice.word, WORD_SIZE), ...notice.reasons.map(reason => stack([paragraphBlock([strong(ended(reason.title)), plain(` ${reason.message}`)], LARGE_SIZE), gapBlock(4)]))]
}

/** The band of the foot again, with what the vet's word rests on. */
function approvalBlock(approval: ApprovalLines): Block {
  const inset = 12
  const lines = breakLines(approvalInWords(approval), BOX_WIDTH - inset * 2, LARGE_SIZE)
  const height = linesHeight(lines, LARGE_SIZE) + 10
  const isApproved = approval.state === 'approved'
  return {
    height: height + BLOCK_GAP,
    draw: (canvas, top) => {
      if (isApproved) canvas.frame(0, top, BOX_WIDTH, height, 1.6)
      else canvas.fill(0, top, BOX_WIDTH, height)
      canvas.lines(inset, top + 5, lines, LARGE_SIZE, isApproved ? 'black' : 'white')
    },
  }
}

/** The title on the left, the numbers beside it as large as a hand that shakes needs them. */
function whoBlock({ callTitle, calls }: PacketCover): Block {
  const left = millimetres(31)
  const title = breakLines([strong(callTitle)], left - 10, TITLE_SIZE)
  const numbers = callsBlock(calls, left, BOX_WIDTH - left, CALL_SIZES)
  const height = Math.max(numbers.height, linesHeight(title, TITLE_SIZE))
  return {
    height: height + BLOCK_GAP + 2,
    draw: (canvas, top) => {
      canvas.lines(0, top, title, TITLE_SIZE)
      numbers.draw(canvas, top)
    },
  }
}

function headingBlock(text: string): Block {
  const lines = breakLines([strong(text)], BOX_WIDTH, LARGE_SIZE)
  const height = linesHeight(lines, LARGE_SIZE)
  return {
    height: height + 2,
    draw: (canvas, top) => void canvas.lines(0, top, lines, LARGE_SIZE),
  }
}

/** Shares of the row for a name, a number and a date. */
const WRITE_SHARES = [0.42, 0.33, 0.25]

/** Who took the animal: at the foot of the cover, where a hand has room. */
function writeInsBlock(labels: readonly string[]): Block {
  return {
    height: WRITE_ROW + 4,
    draw: (canvas, top) => {
      let x = 0
      labels.forEach((label, index) => {
        const right = x + WRITE_SHARES[index]! * BOX_WIDTH
        drawWriteIn(canvas, x, index === labels.length - 1 ? BOX_WIDTH : right - 12, top + WRITE_ROW - 8, label, '', LARGE_SIZE)
        x = right
      })
    },
  }
}
