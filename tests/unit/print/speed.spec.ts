import PDFDocument from 'pdfkit'
import { describe, expect, it } from 'vitest'
import { sheetPdf } from '../../../server/utils/print/index'
import { Canvas } from '../../../server/utils/print/canvas'
import { beardedDragon, OPTIONS } from './fixtures'
import { readPdf } from './readPdf'

const OPERATIONS = ['addPage', 'text', 'rule', 'frame', 'fill', 'fillAll', 'shape'] as const
type Call = { [Name in (typeof OPERATIONS)[number]]: [Name, Parameters<Canvas[Name]>] }[(typeof OPERATIONS)[number]]

const plan = beardedDragon()
const options = { ...OPTIONS, days: { from: 1, to: 5 } }

/** Everything that a sheet draws, in order. */
async function recorded(): Promise<Call[]> {
  const calls: Call[] = []
  const drawing = Canvas.prototype as unknown as Record<string, (...values: unknown[]) => unknown>
  const own = OPERATIONS.map(name => [name, drawing[name]!] as const)
  for (const [name, operation] of own) {
    drawing[name] = function (...values) {
      calls.push([name, values] as unknown as Call)
      return operation.apply(this, values)
    }
  }
  try { await sheetPdf(plan, options) }
  finally { for (const [name, operation] of own) drawing[name] = operation }
  return calls
}

/** The same pages by pdfkit alone, with the fonts every reader has: the floor to compare with. */
async function bare(calls: readonly Call[]): Promise<Buffer> {
  const document = new PDFDocument({ size: 'A4', margin: 0, autoFirstPage: false })
  const parts: Buffer[] = []
  document.on('data', (part: Buffer) => parts.push(part))
  const done = new Promise(resolve => document.on('end', resolve))
  const dashed = (dash: number | undefined, draw: () => void) => {
    if (dash) document.dash(dash, {})
    draw()
    if (dash) document.undash()
  }
  for (const [name, values] of calls) {
    if (name === 'addPage') document.addPage()
    if (name === 'text') {
      const [x, y, text, style] = values
      document.font(style.weight === 'bold' ? 'Helvetica-Bold' : 'Helvetica').fontSize(style.size).fillColor(style.tone ?? 'black')
      document.text(text, 42 + x - (style.align ? document.widthOfString(text) : 0), 42 + y - style.size, { lineBreak: false })
    }
    if (name === 'rule') dashed(values[5], () => document.lineWidth(values[4]).moveTo(42 + values[0], 42 + values[1]).lineTo(42 + values[2], 42 + values[3]).stroke())
    if (name === 'frame') dashed(values[5], () => document.lineWidth(values[4]).rect(42 + values[0], 42 + values[1], values[2], values[3]).stroke())
    if (name === 'fill') document.rect(42 + values[0], 42 + values[1], values[2], values[3]).fill(values[4] === 'white' ? 'white' : 'black')
    if (name === 'fillAll') {
      for (const box of values[0]) document.rect(42 + box.x, 42 + box.y, box.width, box.height)
      document.fill('black')
    }
    if (name === 'shape') {
      values[0].forEach(([x, y], index) => index === 0 ? document.moveTo(42 + x, 42 + y) : document.lineTo(42 + x, 42 + y))
      document.closePath().fill('black')
    }
  }
  document.end()
  await done
  return Buffer.concat(parts)
}

async function medianMs(work: () => Promise<unknown>, times: number): Promise<number> {
  const taken: number[] = []
  for (let i = 0; i < times; i++) {
    const start = performance.now()
    await work()
    taken.push(performance.now() - start)
  }
  return taken.sort((a, b) => a - b)[times >> 1]!
}

describe('a sheet of four pages', () => {
  it('takes less than twice what pdfkit needs for the same pages in Helvetica', async () => {
    const calls = await recorded()
    expect(calls.filter(([name]) => name === 'addPage')).toHaveLength(4)
    expect((await readPdf(await bare(calls))).text).toContain('Each feed: at 07:30, 14:00 and 20:30')
    // Both warm, in turns: a busy machine slows both.
    const ratios: number[] = []
    for (let round = 0; round < 3; round++) ratios.push(await medianMs(() => sheetPdf(plan, options), 15) / await medianMs(() => bare(calls), 15))
    expect(Math.min(...ratios)).toBeLessThan(2)
  }, 30_000)
})
