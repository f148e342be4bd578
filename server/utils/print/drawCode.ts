/** The square code of a saved plan, as vector squares. Readers want four empty modules around it; whoever places it leaves them white. */
import { encode } from 'uqr'
import type { Canvas } from './canvas'

/**
 * Squares of one row that touch are one box: fewer shapes, and no hairlines between them on a cheap printer.
 *
 * @param side  side of the code without its quiet border, pt.
 */
export function drawCode(canvas: Canvas, x: number, y: number, side: number, text: string): void {
  const { data, size } = encode(text, { ecc: 'M', border: 0 })
  const module = side / size
  const boxes: { x: number, y: number, width: number, height: number }[] = []
  data.forEach((row, rowIndex) => {
    for (let from = 0; from < size; from++) {
      if (!row[from]) continue
      let to = from
      while (to < size && row[to]) to++
      boxes.push({ x: x + from * module, y: y + rowIndex * module, width: (to - from) * module, height: module })
      from = to
    }
  })
  canvas.fillAll(boxes)
}
