/** What the benchmark imports of the product, built the way production is. */
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs'

export { RegimenInput } from '#shared/schemas/regimen'
export { buildPlan } from '#server/utils/plan/buildPlan'
export { sheetPdf } from '#server/utils/print'
export { currentEdition } from '#server/utils/reference'

interface PlacedText { text: string, x: number, y: number, size: number }

/** Every piece of text of a PDF with its place, page by page. */
export async function textOfPages(pdf: Buffer): Promise<PlacedText[][]> {
  const document = await getDocument({ data: new Uint8Array(pdf), verbosity: 0 }).promise
  const pages: PlacedText[][] = []
  for (let number = 1; number <= document.numPages; number += 1) {
    const page = await document.getPage(number)
    const height = page.getViewport({ scale: 1 }).height
    const { items } = await page.getTextContent()
    pages.push(items.flatMap(item => 'str' in item && item.str.trim() !== '' ? [{ text: item.str, x: item.transform[4] as number, y: height - (item.transform[5] as number), size: Math.max(4, Math.abs(item.transform[3] as number)) }] : []))
  }
  return pages
}
