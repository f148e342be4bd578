/** The barrel: a syringe of the real size with its real graduation, filled to the mark. */
import { formatNumber } from '#shared/utils/quantity'
import type { Canvas } from './canvas'
import { millimetres } from './canvas'

/**
 * Bore of a common syringe by its capacity, mm. With the bore the length of the scale follows, so that a printed
 * barrel is the length of the one in the hand. Makers differ by some millimetres; the sheet says so.
 */
const BORES_MM: [capacityMl: number, boreMm: number][] = [
  [0.3, 2.9], [0.5, 4], [1, 4.7], [2, 8.7], [2.5, 8.9], [3, 8.7], [5, 12.1], [6, 12.4], [10, 14.5], [12, 15.7], [20, 19.1], [30, 21.7], [35, 23.8], [50, 26.7], [60, 26.7], [100, 32],
]

/** Parts that carry no scale, mm. */
const TIP_MM = 8
const FREE_BARREL_MM = 5
const ROD_MM = 9
const THUMB_MM = 1.8

const NUMERAL_SIZE = 12
const MARK_SIZE = 14
const ABOVE = millimetres(9.5)
const BELOW = millimetres(7.5)
/** Numbers closer than this run into each other, pt. */
const NUMERAL_GAP = 4

export interface BarrelLook {
  /** Printed length over real length; 1 is true to scale. */
  scale: number
  width: number
  height: number
}

function sizeOf(capacityMl: number) {
  const bore = BORES_MM.reduce((best, one) => Math.abs(Math.log(one[0] / capacityMl)) < Math.abs(Math.log(best[0] / capacityMl)) ? one : best)[1]
  const length = capacityMl * 1000 / (Math.PI / 4 * bore ** 2)
  return { bore, length, whole: length + TIP_MM + FREE_BARREL_MM + ROD_MM + THUMB_MM }
}

/** How large a barrel comes out in a space: true to scale where it fits, smaller where it does not. */
export function barrelLook(capacityMl: number, mostWidth: number, mostHeight: number): BarrelLook {
  const { bore, whole } = sizeOf(capacityMl)
  const scale = Math.min(1, mostWidth / millimetres(whole), (mostHeight - ABOVE - BELOW) / millimetres(bore))
  return { scale, width: millimetres(whole) * scale, height: millimetres(bore) * scale + ABOVE + BELOW }
}

export function drawBarrel(canvas: Canvas, x: number, y: number, barrel: { capacityMl: number, stepMl: number, markMl: number, markLabel: string }, look: BarrelLook): void {
  const { bore, length } = sizeOf(barrel.capacityMl)
  const part = (mm: number) => millimetres(mm) * look.scale
  const top = y + ABOVE
  const height = part(bore)
  const zero = x + part(TIP_MM)
  const scaleLength = part(length)
  const at = (volumeMl: number) => zero + scaleLength * volumeMl / barrel.capacityMl
  const end = zero + scaleLength + part(FREE_BARREL_MM)
  const mark = at(barrel.markMl)
  const middle = top + height / 2

  // Rod and thumb rest first: the barrel's wall is drawn over them.
  const seal = Math.max(2.2, Math.min(part(2), end - mark))
  const rod = Math.max(3, height * 0.22)
  // The rod of a drawn plunger sticks out by as much as is drawn up; beyond the free end it is cut short on paper.
  const thumb = end + part(ROD_MM)
  canvas.frame(mark + seal, middle - rod / 2, thumb - mark - seal, rod, 0.8)
  canvas.fill(thumb, middle - Math.max(height * 0.75, 7), part(THUMB_MM), Math.max(height * 1.5, 14))

  canvas.fill(zero, top, mark - zero, height, 'grey')
  canvas.fill(mark, top, seal, height)
  canvas.frame(x, middle - 2, zero - x, 4, 1)
  canvas.frame(zero - 0.6, top - 0.6, end - zero + 0.6, height + 1.2, 1.2)
  canvas.fill(end - 0.6, middle - Math.max(height * 0.72, 6.5), 1.8, Math.max(height * 1.44, 13))

  drawScale(canvas, barrel, at, top, height)

  // The arrow and its number say where to stop, whatever the numbers below.
  canvas.shape([[mark - 4.5, top - 9.5], [mark + 4.5, top - 9.5], [mark, top - 1.6]])
  canvas.text(mark, top - 12.5, barrel.markLabel, { size: MARK_SIZE, weight: 'bold', align: 'center' })
}

function drawScale(canvas: Canvas, barrel: { capacityMl: number, stepMl: number }, at: (volumeMl: number) => number, top: number, height: number) {
  const { capacityMl, stepMl } = barrel
  const steps = Math.round(capacityMl / stepMl)
  const numbered = numberedEvery(canvas, capacityMl, stepMl, at(stepMl) - at(0))
  const bottom = top + height
  for (let step = 0; step <= steps; step++) {
    const isNumbered = step % numbered === 0
    const isHalf = numbered % 2 === 0 && step % (numbered / 2) === 0
    const long = isNumbered ? 0.62 : isHalf ? 0.46 : 0.32
    const x = at(step * stepMl)
    if (step > 0) canvas.rule(x, bottom, x, bottom - height * long, isNumbered ? 0.8 : 0.45)
    if (isNumbered) canvas.text(x, bottom + 14, formatNumber(step * stepMl, 3), { size: NUMERAL_SIZE, align: 'center' })
  }
}

/** Fewest steps between two numbers that still leaves room for them; people count in ones, twos and fives. */
function numberedEvery(canvas: Canvas, capacityMl: number, stepMl: number, stepWidth: number): number {
  const steps = Math.round(capacityMl / stepMl)
  for (const every of [1, 2, 4, 5, 10, 20, 25, 40, 50, 100, 200]) {
    if (every > steps) break
    if (steps % every !== 0) continue
    const widest = Math.max(...[every, steps].map(step => canvas.width(formatNumber(step * stepMl, 3), { size: NUMERAL_SIZE })))
    const roundNumber = Number((every * stepMl).toPrecision(1)) === Number((every * stepMl).toPrecision(6)) && /^[125]/.test((every * stepMl).toExponential())
    if (roundNumber && stepWidth * every >= widest + NUMERAL_GAP) return every
  }
  return steps
}

const CHECK_LINE_MM = 50

/** A line to hold a ruler to: printers shrink pages without asking. Its end marks stand 50 mm apart, inside `right`. */
export function drawCheckLine(canvas: Canvas, right: number, y: number): void {
  const thickness = 0.8
  const to = right - thickness / 2
  const from = to - millimetres(CHECK_LINE_MM)
  canvas.rule(from, y + 4, to, y + 4, thickness)
  canvas.rule(from, y, from, y + 8, thickness)
  canvas.rule(to, y, to, y + 8, thickness)
}
