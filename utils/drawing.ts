/** A point of a drawing, in its own units. */
export type Point = readonly [x: number, y: number]

/**
 * A smooth closed line through points, as the `d` of an SVG path (Catmull-Rom turned into Bézier curves).
 * @example closedCurve([[0, 0], [2, 0], [1, 2]]) // 'M0 0C…Z'
 */
export function closedCurve(points: readonly Point[]): string {
  const at = (index: number) => points[(index + points.length) % points.length]!
  const two = (value: number) => Math.round(value * 100) / 100
  const pieces = points.map((_, index) => {
    const [before, from, to, after] = [at(index - 1), at(index), at(index + 1), at(index + 2)]
    const control = [from[0] + (to[0] - before[0]) / 6, from[1] + (to[1] - before[1]) / 6, to[0] - (after[0] - from[0]) / 6, to[1] - (after[1] - from[1]) / 6]
    return `C${control.map(two).join(' ')} ${two(to[0])} ${two(to[1])}`
  })
  return `M${two(at(0)[0])} ${two(at(0)[1])}${pieces.join('')}Z`
}

/** The outline of a body lying along a line: half-widths at places along it, mirrored. Ends are left out of the mirror. */
export function mirrored(half: readonly Point[], axisY: number): Point[] {
  const below = half.slice(1, -1).map(([x, width]): Point => [x, axisY + width])
  return [[half[0]![0], axisY], ...half.slice(1, -1).map(([x, width]): Point => [x, axisY - width]), [half.at(-1)![0], axisY], ...below.reverse()]
}

/** The same left and right of an upright axis: points from the top down the right side to the bottom, mirrored. */
export function leftAndRight(right: readonly Point[], axisX: number): Point[] {
  const left = right.slice(1, -1).map(([dx, y]): Point => [axisX - dx, y])
  return [...right.map(([dx, y]): Point => [axisX + dx, y]), ...left.reverse()]
}
