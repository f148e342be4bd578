import { expect, it } from 'vitest'
import { standardFromLimit } from '#server/utils/calc/sureness/standardFromLimit'

// JCGM 100:2008, 4.3.7. Check value K-UNC-01: a scale that reads to 1 g, on 10 g: 2.887 %.
it('is the half-width over the root of three', () => {
  expect(standardFromLimit(1)).toBeCloseTo(0.57735, 5)
  expect(standardFromLimit(0.5) / 10).toBeCloseTo(0.02887, 5)
  expect(() => standardFromLimit(-1)).toThrow()
})
