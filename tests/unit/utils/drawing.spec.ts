import { describe, expect, it } from 'vitest'
import { closedCurve, leftAndRight, mirrored } from '../../../utils/drawing'

describe('drawing', () => {
  it('goes through every point and closes', () => {
    const path = closedCurve([[0, 0], [10, 0], [5, 8]])
    expect(path).toMatch(/^M0 0C.* 10 0C.* 5 8C.* 0 0Z$/)
  })
  it('mirrors a body along its line, ends once', () => {
    expect(mirrored([[0, 0], [4, 2], [8, 3], [12, 0]], 10)).toEqual([[0, 10], [4, 8], [8, 7], [12, 10], [8, 13], [4, 12]])
  })
  it('mirrors left and right, ends once', () => {
    expect(leftAndRight([[0, 1], [3, 2], [0, 9]], 20)).toEqual([[20, 1], [23, 2], [20, 9], [17, 2]])
  })
})
