/**
 * Pages to draw on: black on white, sizes in pt, the origin at the top left of the content box.
 *
 * The content box is the same on A4 and Letter (the smaller of each side), so a sheet is the same sheet on both:
 * 15 mm or more at the top and sides for tape and hole punch, 11 mm or more below.
 *
 * pdfkit keeps the document: objects, pages, compression, metadata. Text and lines are written as PDF operators and
 * handed over once a page, because most of a sheet is short texts and rules, and each call into pdfkit costs more than
 * what it draws. Only documented or typed parts of pdfkit are used: `ref`, `addContent`, `addPage`, `page.fonts`.
 */
import PDFDocument from 'pdfkit'
import type { Paper } from '#shared/schemas/regimen'
import { LettersInUse } from './embedFont'
import type { PrintWeight } from './font'
import { printFont } from './font'
import type { RichText } from './richText'
import type { Line } from './shaping'
import { breakLines, textWidth } from './shaping'

export const PT_PER_MM = 72 / 25.4

/** @example millimetres(15) // 42.5… pt */
export function millimetres(value: number): number {
  return value * PT_PER_MM
}

const PAGE_SIZES: Record<Paper, { width: number, height: number }> = {
  a4: { width: millimetres(210), height: millimetres(297) },
  letter: { width: 612, height: 792 },
}

/** 210 mm less two side margins of 15 mm. */
export const BOX_WIDTH = millimetres(180)
/** 279.4 mm less 15 mm above and 11 mm below: nothing stands in the outer 10 mm. */
export const BOX_HEIGHT = millimetres(253.4)
const TOP = millimetres(15)
const BOTTOM = millimetres(11)

/** Lines stand this many times their size apart. */
export const LEADING = 1.24

export interface TextStyle {
  size: number
  weight?: PrintWeight
  /** White only ever stands on a black box. */
  tone?: 'black' | 'white'
  align?: 'left' | 'right' | 'center'
}

export interface DocumentInfo {
  title: string
  author: string
  subject: string
  appVersion: string
  /** Instant, ISO 8601. The same plan printed for the same instant is the same file, byte for byte. */
  madeAt: string
}

export class Canvas {
  private readonly document: PDFKit.PDFDocument
  private readonly fonts: Record<PrintWeight, LettersInUse>
  private readonly dictionaries = new Map<PrintWeight, PDFKit.PDFKitReference>()
  private operators: string[] = []
  private readonly left: number
  private readonly top: number

  constructor(paper: Paper, info: DocumentInfo) {
    const { width, height } = PAGE_SIZES[paper]
    this.left = (width - BOX_WIDTH) / 2
    this.top = TOP + (height - TOP - BOTTOM - BOX_HEIGHT) / 2
    this.fonts = { regular: new LettersInUse('R', 'regular'), bold: new LettersInUse('B', 'bold') }
    this.document = new PDFDocument({
      size: [width, height],
      margin: 0,
      autoFirstPage: false,
      // Empty, not absent: pdfkit then opens no font of its own.
      font: '',
      pdfVersion: '1.7',
      lang: 'en-GB',
      displayTitle: true,
      info: {
        Title: info.title,
        Author: info.author,
        Subject: info.subject,
        Creator: `Thimbleful ${info.appVersion}`,
        CreationDate: new Date(info.madeAt),
      },
    })
  }

  addPage(): void {
    this.flush()
    this.document.addPage()
    // Butt ends and sharp corners, so that a box ends where its measure says.
    this.operators.push('0 J 0 j')
  }

  /** Text on a base line. */
  text(x: number, baseline: number, text: string, style: TextStyle): void {
    if (text === '') return
    const weight = style.weight ?? 'regular'
    const shift = style.align === 'right' ? this.width(text, style) : style.align === 'center' ? this.width(text, style) / 2 : 0
    this.useFont(weight)
    const letters = this.fonts[weight]
    const [before, after] = style.tone === 'white' ? ['1 g ', ' 0 g'] : ['', '']
    // The second -1 turns letters upright again: the page's y axis points down.
    this.operators.push(`BT ${before}/${letters.resource} ${short(style.size)} Tf 1 0 0 -1 ${this.x(x - shift)} ${this.y(baseline)} Tm ${letters.show(text)}${after} ET`)
  }

  width(text: string, style: TextStyle): number {
    return textWidth(text, style.size, style.weight ?? 'regular')
  }

  /** Lines below one another from the top edge of the first. @returns the height they take. */
  lines(x: number, top: number, lines: readonly Line[], size: number, tone: 'black' | 'white' = 'black'): number {
    lines.forEach((line, index) => {
      const baseline = top + firstBaseline(size) + index * size * LEADING
      for (const piece of line.pieces) this.text(x + piece.x, baseline, piece.text, { size, weight: piece.weight, tone })
    })
    return linesHeight(lines, size)
  }

  /** A text broken to a width. @returns the height it takes. */
  paragraph(x: number, top: number, width: number, text: RichText, size: number, tone: 'black' | 'white' = 'black'): number {
    return this.lines(x, top, breakLines(text, width, size), size, tone)
  }

  rule(x1: number, y1: number, x2: number, y2: number, thickness: number, dash?: number): void {
    this.operators.push(`${short(thickness)} w ${dash ? `[${short(dash)}] 0 d` : ''} ${this.x(x1)} ${this.y(y1)} m ${this.x(x2)} ${this.y(y2)} l S${dash ? ' [] 0 d' : ''}`)
  }

  /** An outline drawn inside its measure. */
  frame(x: number, y: number, width: number, height: number, thickness: number, dash?: number): void {
    const half = thickness / 2
    this.operators.push(`${short(thickness)} w ${dash ? `[${short(dash)}] 0 d` : ''} ${this.rectangle(x + half, y + half, width - thickness, height - thickness)} S${dash ? ' [] 0 d' : ''}`)
  }

  /** A filled box. Grey is for the feed inside a barrel and never carries text. */
  fill(x: number, y: number, width: number, height: number, tone: 'black' | 'grey' | 'white' = 'black'): void {
    const level = { black: '', grey: '0.72 g ', white: '1 g ' }[tone]
    this.operators.push(`${level}${this.rectangle(x, y, width, height)} f${level ? ' 0 g' : ''}`)
  }

  /** Many filled boxes in one go. */
  fillAll(boxes: readonly { x: number, y: number, width: number, height: number }[]): void {
    this.operators.push(`${boxes.map(box => this.rectangle(box.x, box.y, box.width, box.height)).join('\n')} f`)
  }

  /** A filled shape with straight sides. */
  shape(points: readonly [number, number][]): void {
    this.operators.push(`${points.map(([x, y], index) => `${this.x(x)} ${this.y(y)} ${index === 0 ? 'm' : 'l'}`).join(' ')} h f`)
  }

  /** Ends the document. @returns the file. */
  async finish(): Promise<Buffer> {
    this.flush()
    const parts: Buffer[] = []
    const done = new Promise<void>((resolve, reject) => {
      this.document.on('data', (part: Buffer) => parts.push(part))
      this.document.on('end', resolve)
      this.document.on('error', reject)
    })
    for (const [weight, dictionary] of this.dictionaries) this.fonts[weight].embed(this.document, dictionary)
    this.document.end()
    await done
    return Buffer.concat(parts)
  }

  private useFont(weight: PrintWeight) {
    let dictionary = this.dictionaries.get(weight)
    if (!dictionary) {
      dictionary = this.document.ref({})
      this.dictionaries.set(weight, dictionary)
    }
    this.document.page.fonts[this.fonts[weight].resource] = dictionary
  }

  private flush() {
    if (this.operators.length > 0) this.document.addContent(this.operators.join('\n'))
    this.operators = []
  }

  private rectangle(x: number, y: number, width: number, height: number): string {
    return `${this.x(x)} ${this.y(y)} ${short(width)} ${short(height)} re`
  }

  private x(value: number): string {
    return short(this.left + value)
  }

  private y(value: number): string {
    return short(this.top + value)
  }
}

/** Hundredths of a point are finer than any printer. */
function short(value: number): string {
  return String(Math.round(value * 100) / 100)
}

/** From the top of a line to its base line: capitals stand in the middle of the line. */
export function firstBaseline(size: number): number {
  const font = printFont('regular')
  return size * (LEADING + font.capHeight / font.unitsPerEm) / 2
}

/** Base line that puts capitals and figures in the middle of a box. */
export function middleBaseline(top: number, height: number, size: number): number {
  const font = printFont('regular')
  return top + (height + size * font.capHeight / font.unitsPerEm) / 2
}

export function linesHeight(lines: readonly Line[], size: number): number {
  return lines.length * size * LEADING
}
