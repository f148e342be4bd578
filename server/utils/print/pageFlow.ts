/** Puts blocks on pages. Two passes, because "page n of m" needs m. */
import type { Canvas } from './canvas'
import { BOX_HEIGHT } from './canvas'
import type { Block } from './pageParts'

interface Placed { block: Block, top: number }

export interface PageFrame {
  /** Head of a page, counted from 0. */
  head: (page: number) => Block
  /** What stands at the bottom of a page above its foot, or null. */
  bottom: (page: number) => Block | null
  /** @param page  counted from 0 through the whole file. */
  foot: (page: number, pages: number) => Block
}

export class PageFlow {
  readonly pages: Placed[][] = []
  private cursor = 0
  private limit = 0

  constructor(private readonly frame: PageFrame) {
    this.newPage()
  }

  get remaining(): number {
    return this.limit - this.cursor
  }

  /** Room for blocks on a page that holds nothing yet. */
  roomOn(page: number): number {
    return BOX_HEIGHT - this.frame.head(page).height - (this.frame.bottom(page)?.height ?? 0) - this.frame.foot(page, 1).height
  }

  get isFresh(): boolean {
    return this.pages.at(-1)!.length === 1
  }

  get page(): number {
    return this.pages.length - 1
  }

  newPage(): void {
    const page = this.pages.length
    const head = this.frame.head(page)
    this.pages.push([{ block: head, top: 0 }])
    this.cursor = head.height
    this.limit = this.cursor + this.roomOn(page)
  }

  fits(...blocks: readonly Block[]): boolean {
    return blocks.reduce((sum, block) => sum + block.height, 0) <= this.remaining + 0.01
  }

  /** Places a block here, whether or not it fits: the caller has asked. */
  place(block: Block): void {
    this.pages.at(-1)!.push({ block, top: this.cursor })
    this.cursor += block.height
  }

  /** Places a block here or, when it does not fit, on the next page. */
  placeWhole(block: Block): void {
    if (this.isBetterNext(block)) this.newPage()
    this.place(block)
  }

  /** Whether a block that does not fit here has more room on the next page: a first page with a tall head and foot may hold little. */
  isBetterNext(block: Block): boolean {
    return !this.fits(block) && (!this.isFresh || this.roomOn(this.page + 1) > this.remaining + 0.01)
  }

  /** @param before  pages of the same file before these; `of` counts all of them. */
  draw(canvas: Canvas, before = 0, of = this.pages.length): void {
    this.pages.forEach((placed, page) => {
      canvas.addPage()
      for (const { block, top } of placed) block.draw(canvas, top)
      const foot = this.frame.foot(page + before, of)
      const bottom = this.frame.bottom(page)
      foot.draw(canvas, BOX_HEIGHT - foot.height)
      bottom?.draw(canvas, BOX_HEIGHT - foot.height - bottom.height)
    })
  }
}
