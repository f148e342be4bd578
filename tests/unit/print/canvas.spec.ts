import PDFDocument from 'pdfkit'
import { expect, it } from 'vitest'
import { BOX_HEIGHT, BOX_WIDTH, Canvas, PT_PER_MM } from '../../../server/utils/print/canvas'
import { readPdf } from './readPdf'

const INFO = { title: 'Test', author: '', subject: 'Test', appVersion: '0.1.0', madeAt: '2026-12-02T18:40:00Z' }

it('finds in pdfkit what it builds on: this fails when an upgrade takes it away', async () => {
  const document = new PDFDocument({ autoFirstPage: false, font: '' })
  expect(typeof document.ref).toBe('function')
  expect(typeof document.addContent).toBe('function')
  document.addPage()
  expect(document.page.fonts).toEqual({})
  const reference = document.ref({ Registry: new String('Adobe'), Type: 'Name' })
  expect(reference.data).toMatchObject({ Type: 'Name' })
  document.page.fonts.R = reference
  document.addContent('0 0 10 10 re f')
  const parts: Buffer[] = []
  document.on('data', (part: Buffer) => parts.push(part))
  const done = new Promise(resolve => document.on('end', resolve))
  reference.end(undefined)
  document.end()
  await done
  const file = Buffer.concat(parts).toString('latin1')
  expect(file).toContain('/Registry (Adobe)')
  expect(file).toContain('/Type /Name')
  expect(file).toMatch(/\/Font <<\n\/R \d+ 0 R/)
  // No font of pdfkit's own is opened.
  expect(file).not.toContain('/BaseFont')
})

it('has the same box on both papers, 15 mm or more from the edges', async () => {
  for (const paper of ['a4', 'letter'] as const) {
    const canvas = new Canvas(paper, INFO)
    canvas.addPage()
    canvas.frame(0, 0, BOX_WIDTH, BOX_HEIGHT, 2)
    canvas.text(10, 30, 'inside', { size: 12 })
    const { pages: [page] } = await readPdf(await canvas.finish())
    const [box] = page!.shapes
    expect((box!.right - box!.left) / PT_PER_MM).toBeCloseTo(180, 1)
    expect((box!.bottom - box!.top) / PT_PER_MM).toBeCloseTo(253.4, 1)
    expect(box!.left / PT_PER_MM).toBeGreaterThanOrEqual(14.99)
    expect(box!.top / PT_PER_MM).toBeGreaterThanOrEqual(14.99)
    expect(box!.left + box!.right).toBeCloseTo(page!.width, 1)
  }
})

it('puts text where it is asked to', async () => {
  const canvas = new Canvas('a4', INFO)
  canvas.addPage()
  canvas.text(100, 100, 'left', { size: 20 })
  canvas.text(100, 140, 'right', { size: 20, align: 'right' })
  canvas.text(100, 180, 'middle', { size: 20, weight: 'bold', align: 'center' })
  canvas.addPage()
  canvas.text(0, 20, '', { size: 20 })
  canvas.text(0, 20, 'second page', { size: 20, tone: 'white' })
  const { pages } = await readPdf(await canvas.finish())
  const [left, right, middle] = pages[0]!.texts
  expect(left!.text).toBe('left')
  expect(right!.right).toBeCloseTo(left!.left, 0)
  expect((middle!.left + middle!.right) / 2).toBeCloseTo(left!.left, 0)
  expect(right!.bottom - left!.bottom).toBeCloseTo(40, 1)
  expect(pages[1]!.text).toBe('second page')
})
