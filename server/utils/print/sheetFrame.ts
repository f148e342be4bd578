/** What stands on every page of a sheet: head, foot and the box above the foot. */
import type { PageFrame } from './pageFlow'
import { footBlock, headBlock, shortHeadBlock } from './pageParts'
import { plainTextOf } from './richText'
import { canPrint } from './shaping'
import type { SheetModel } from './sheet'

type Framed = Pick<SheetModel, 'identity' | 'dates' | 'coded' | 'foot'>

/** @param bottom  what stands above the foot of a page, counted from 0. */
export function sheetFrame(model: Framed, bottom: PageFrame['bottom']): PageFrame {
  const head = headBlock(model.identity, model.dates, model.coded)
  const shortHead = shortHeadBlock(model.identity, model.coded)
  const extra = lacksLetters(model) ? 'A box (\u25A1) stands for a letter that cannot be printed.' : ''
  return {
    head: page => page === 0 ? head : shortHead,
    bottom,
    foot: (page, pages) => footBlock(model.foot, page + 1, pages, extra),
  }
}

function lacksLetters({ identity, coded, foot }: Framed): boolean {
  return ![identity.name ?? '', identity.caseNumber ?? '', identity.enclosure ?? '', coded.lifeNote ?? '', foot.band, ...foot.lines.map(plainTextOf)].every(canPrint)
}
