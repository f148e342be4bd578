/** What must hold for every printed page, whatever is on it. */
import { expect } from 'vitest'
import { collisions, type ReadPage } from './readPdf'

export const PT_PER_MM = 72 / 25.4

/** 15 mm at the top and the sides, and nothing in the outer 10 mm below. */
export function expectInsideMargins(page: ReadPage): void {
  const drawn = [...page.texts, ...page.shapes]
  const tolerance = 0.1
  expect(drawn.length).toBeGreaterThan(10)
  expect(Math.min(...drawn.map(one => one.left))).toBeGreaterThanOrEqual(15 * PT_PER_MM - tolerance)
  expect(Math.min(...drawn.map(one => one.top))).toBeGreaterThanOrEqual(15 * PT_PER_MM - tolerance)
  expect(page.width - Math.max(...drawn.map(one => one.right))).toBeGreaterThanOrEqual(15 * PT_PER_MM - tolerance)
  expect(page.height - Math.max(...drawn.map(one => one.bottom))).toBeGreaterThanOrEqual(10 * PT_PER_MM)
}

/** Inside the margins, 12 pt or more, nothing over anything else. */
export function expectReadable(page: ReadPage): void {
  expectInsideMargins(page)
  expect(Math.min(...page.texts.map(text => text.size))).toBeGreaterThanOrEqual(12)
  expect(collisions(page)).toEqual([])
}
