/** Label strips, each half a page, with lines to cut along. What they say is decided in `label.ts`. */
import type { Paper } from '#shared/schemas/regimen'
import { BOX_HEIGHT, BOX_WIDTH, Canvas, linesHeight, millimetres, type DocumentInfo } from './canvas'
import { amountsBlock } from './drawAmount'
import { wordBlock } from './drawSign'
import type { LabelModel, LabelStrip } from './label'
import { BODY_SIZE, footBlock, BLOCK_GAP, gapBlock, LARGE_SIZE, paragraphBlock, stack, stateBandBlock, type Block } from './pageParts'
import { plain, strong, type Run } from './richText'
import { breakLines } from './shaping'
import { haltsOf, held } from './wording'

/** Half a sheet is A5 less its margins. */
const HALF = millimetres(102)

export async function drawLabels(model: LabelModel, paper: Paper, info: DocumentInfo): Promise<Buffer> {
  const canvas = new Canvas(paper, info)
  const foot = footBlock(model.foot, 1, 1)
  const room = BOX_HEIGHT - foot.height - BLOCK_GAP
  const pages: Block[][] = [[]]
  let used = 0
  for (const strip of model.strips.map(stripBlock)) {
    // Below its cutting line the last strip needs no room.
    if (used > 0 && used + strip.height - BLOCK_GAP > room) {
      pages.push([])
      used = 0
    }
    pages.at(-1)!.push(strip)
    used += strip.height
  }
  pages.forEach((strips, page) => {
    canvas.addPage()
    let top = 0
    for (const strip of strips) {
      strip.draw(canvas, top)
      top += strip.height
    }
    const note = paragraphBlock(model.note, BODY_SIZE)
    if (page === pages.length - 1 && top + note.height <= room) note.draw(canvas, top)
    const pageFoot = footBlock(model.foot, page + 1, pages.length)
    pageFoot.draw(canvas, BOX_HEIGHT - pageFoot.height)
  })
  return canvas.finish()
}

/** A strip says all by itself: it will be cut from its page. */
function stripBlock(strip: LabelStrip): Block {
  const { identity, coded } = strip
  const inset = 10
  const name = breakLines([strong(identity.name ?? identity.species)], BOX_WIDTH - inset * 2, 26)
  const named = [identity.name && identity.species, identity.caseNumber && `case ${identity.caseNumber}`, identity.weight].filter(Boolean).join(', ')
  const last: Run[] = [strong(strip.last), ...strip.call ? [plain(` ${strip.call.role}:\u00A0`), strong(held(strip.call.phone!))] : []]
  const body = stack([
    ...haltsOf(coded).map(text => paragraphBlock([strong(text)], LARGE_SIZE)),
    { height: linesHeight(name, 26), draw: (canvas, top) => void canvas.lines(0, top, name, 26) },
    ...identity.enclosure ? [paragraphBlock([strong(identity.enclosure)], LARGE_SIZE, BOX_WIDTH - inset * 2)] : [],
    paragraphBlock(named, BODY_SIZE, BOX_WIDTH - inset * 2),
    gapBlock(5),
    ...strip.band.state === 'do-not-feed' ? [wordBlock(strip.band.word), paragraphBlock([strong([strip.band.reason, strip.band.days].filter(Boolean).join('. '))], 20)] : [stateBandBlock(strip.band)],
    amountsBlock(strip.amounts, strip.facts),
    paragraphBlock(last, LARGE_SIZE, BOX_WIDTH - inset * 2),
    termsBlock(strip, BOX_WIDTH - inset * 2),
  ])
  const height = Math.max(HALF, body.height + 4)
  return {
    height: height + BLOCK_GAP * 2,
    draw: (canvas, top) => {
      body.draw(canvas, top)
      canvas.rule(0, top + height + BLOCK_GAP, BOX_WIDTH, top + height + BLOCK_GAP, 0.8, 4)
    },
  }
}

/** What a strip rests on; a vet's word is framed, a lapsed one white on black, as in the foot that is cut away. */
function termsBlock({ terms, termsLook }: LabelStrip, width: number): Block {
  const text = [strong(terms[0]!), plain(` ${terms.slice(1).join(' ')}`)]
  if (termsLook === 'plain') return paragraphBlock(text, BODY_SIZE, width)
  const isReversed = termsLook === 'reversed'
  const lines = breakLines(text, BOX_WIDTH - 16, BODY_SIZE)
  const height = linesHeight(lines, BODY_SIZE) + 5
  return {
    height: height + 2,
    draw: (canvas, top) => {
      if (isReversed) canvas.fill(0, top + 2, BOX_WIDTH, height)
      else canvas.frame(0, top + 2, BOX_WIDTH, height, 1.6)
      canvas.lines(8, top + 4.5, lines, BODY_SIZE, isReversed ? 'white' : 'black')
    },
  }
}
