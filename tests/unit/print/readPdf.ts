/** Reads a printed file back with a reader that is not ours: texts, where they stand, and what is drawn. */
import { getDocument, OPS } from 'pdfjs-dist/legacy/build/pdf.mjs'

export interface Box { left: number, top: number, right: number, bottom: number }
export interface PlacedText extends Box { text: string, size: number }
/** A path with the closed parts it is made of. */
export interface Shape extends Box { parts: Box[], isFilled: boolean }
export interface ReadPage {
  width: number
  height: number
  texts: PlacedText[]
  /** All texts in the order they were written, one space between, in composed form. */
  text: string
  /** Around every line and box that was drawn. */
  shapes: Shape[]
}
export interface ReadFile { pages: ReadPage[], text: string, info: Record<string, unknown> }

const CAPITALS = 0.66

export async function readPdf(file: Buffer): Promise<ReadFile> {
  const document = await getDocument({ data: new Uint8Array(file), verbosity: 0 }).promise
  const pages: ReadPage[] = []
  for (let number = 1; number <= document.numPages; number++) {
    const page = await document.getPage(number)
    const { width, height } = page.getViewport({ scale: 1 })
    const content = await page.getTextContent()
    const texts = content.items.flatMap((item): PlacedText[] => {
      if (!('str' in item) || item.str.trim() === '') return []
      const [, , , size, x, y] = item.transform as number[]
      return [{ text: item.str, size: Math.abs(size!), left: x!, right: x! + item.width, bottom: height - y!, top: height - y! - Math.abs(size!) * CAPITALS }]
    })
    pages.push({ width, height, texts, text: plainOf(texts.map(one => one.text).join(' ')), shapes: await shapesOf(page) })
  }
  const { info } = await document.getMetadata()
  await document.destroy()
  return { pages, text: pages.map(page => page.text).join(' '), info: info as Record<string, unknown> }
}

/** One spelling for what readers spell in several ways: composed letters, plain spaces. */
export function plainOf(text: string): string {
  return text.normalize('NFKC').replace(/\s+/g, ' ').trim()
}

/** Our pages turn the y axis once at the start; after that a path's corners are measured from the top. */
async function shapesOf(page: { getOperatorList: () => Promise<{ fnArray: number[], argsArray: unknown[][] }> }): Promise<Shape[]> {
  const { fnArray, argsArray } = await page.getOperatorList()
  const boxes: Shape[] = []
  let thickness = 1
  fnArray.forEach((operator, index) => {
    const values = argsArray[index]!
    if (operator === OPS.setLineWidth) thickness = values[0] as number
    if (operator !== OPS.constructPath) return
    const [left, top, right, bottom] = [...values[2] as Float32Array]
    const half = [OPS.stroke, OPS.closeStroke].includes(values[0] as number) ? thickness / 2 : 0
    // Lines end where they end: a level one is thick upwards and downwards only.
    const wide = top === bottom ? 0 : half
    const high = left === right ? 0 : half
    boxes.push({ left: left! - wide, top: top! - high, right: right! + wide, bottom: bottom! + high, parts: partsOf([...(values[1] as Float32Array[])[0]!]), isFilled: values[0] === OPS.fill })
  })
  return boxes
}

const MOVE = 0
const LINE = 1
const CLOSE = 4

/** Boxes around the closed parts of a path without curves. */
function partsOf(path: number[]): Box[] {
  const parts: Box[] = []
  let corners: [number, number][] = []
  for (let at = 0; at < path.length;) {
    const step = path[at]
    if (step === CLOSE) {
      const xs = corners.map(([x]) => x)
      const ys = corners.map(([, y]) => y)
      parts.push({ left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) })
      at += 1
      continue
    }
    if (step !== MOVE && step !== LINE) throw new Error(`A step of kind ${step} is not expected here.`)
    if (step === MOVE) corners = []
    corners.push([path[at + 1]!, path[at + 2]!])
    at += 3
  }
  return parts
}

/** Texts that run into each other. */
export function collisions(page: ReadPage): string[] {
  const found: string[] = []
  page.texts.forEach((one, index) => {
    for (const other of page.texts.slice(index + 1)) {
      const wide = Math.min(one.right, other.right) - Math.max(one.left, other.left)
      const high = Math.min(one.bottom, other.bottom) - Math.max(one.top, other.top)
      if (wide > 0.6 && high > 0.6) found.push(`"${one.text}" and "${other.text}"`)
    }
  })
  return found
}
