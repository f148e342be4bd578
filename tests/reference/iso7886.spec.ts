import { describe, expect, it } from 'vitest'
import { isoToleranceMl, type SyringeToleranceClass } from '#server/utils/calc/measuring/isoToleranceMl'
import { currentEdition } from '#server/utils/reference'

// ISO 7886-1:2017 (corrected version 2019-08), clause 8, as tolerance in percent of the volume drawn.
const CAPACITIES_ML = [0.5, 1, 3, 5, 10, 20, 35, 60]
const TOLERANCE_PERCENT: [volumeMl: number, ...percent: (number | null)[]][] = [
  [0.02, 39.5, 77, 227, 376, 751, 1501, 2626, 4501],
  [0.05, 17, 32, 92, 151, 301, 601, 1051, 1801],
  [0.1, 9.5, 17, 47, 76, 151, 301, 526, 901],
  [0.2, 5.8, 9.5, 24.5, 38.5, 76, 151, 263.5, 451],
  [0.25, 5, 8, 20, 31, 61, 121, 211, 361],
  [0.5, 5, 5, 11, 16, 31, 61, 106, 181],
  [1, null, 5, 6.5, 8.5, 16, 31, 53.5, 91],
  [2, null, null, 5, 4.8, 8.5, 16, 27.3, 46],
  [2.5, null, null, 5, 4, 7, 13, 22, 37],
  [5, null, null, null, 4, 4, 7, 11.5, 19],
  [10, null, null, null, null, 4, 4, 6.2, 10],
  [20, null, null, null, null, null, 4, 4, 5.5],
  [30, null, null, null, null, null, null, 4, 4],
  [60, null, null, null, null, null, null, null, 4],
]

const classes: SyringeToleranceClass[] = currentEdition().rules.measuring.isoClasses.map(one => ({
  underCapacityMl: one.underCapacityMl, ofCapacity: one.ofCapacity.value, ofVolume: one.ofVolume.value, ofVolumeFromHalf: one.ofVolumeFromHalf.value,
}))
const cells = TOLERANCE_PERCENT.flatMap(([volumeMl, ...percents]) => percents.map((percent, at) => [volumeMl, CAPACITIES_ML[at]!, percent ?? null] as const))

describe('tolerance of syringes by ISO 7886-1', () => {
  it.each(cells.filter(cell => cell[2] !== null))('%d mL out of %d mL: %d %% of the volume', (volumeMl, capacityMl, percent) => {
    const found = isoToleranceMl({ volumeMl, capacityMl }, classes) / volumeMl * 100
    // The table is printed to one decimal; half of the last place is the most it can be off.
    expect(Math.abs(found - percent!)).toBeLessThanOrEqual(0.05 + 1e-9)
  })
  it.each(cells.filter(cell => cell[2] === null))('%d mL does not fit in %d mL', (volumeMl, capacityMl) => {
    expect(() => isoToleranceMl({ volumeMl, capacityMl }, classes)).toThrow(expect.objectContaining({ code: 'number.outOfRange' }))
  })

  it.each([[1, 18.75], [3, 18.75], [5, 100 / 6], [60, 100 / 6]])('keeps a %d mL syringe within 10 %% from %d %% of its capacity on', (capacityMl, percentOfCapacity) => {
    const volumeMl = capacityMl * percentOfCapacity / 100
    expect(isoToleranceMl({ volumeMl, capacityMl }, classes) / volumeMl).toBeCloseTo(0.1, 9)
    expect(isoToleranceMl({ volumeMl: volumeMl * 0.99, capacityMl }, classes) / (volumeMl * 0.99)).toBeGreaterThan(0.1)
  })
  it('changes class exactly at 2 and 5 mL', () => {
    const at = (capacityMl: number) => isoToleranceMl({ capacityMl, volumeMl: capacityMl / 4 }, classes) / capacityMl
    expect([1.99, 2, 4.99].map(at).every(value => Math.abs(value - 0.02) < 1e-12)).toBe(true)
    expect([5, 10, 60].map(at).every(value => Math.abs(value - 0.0175) < 1e-12)).toBe(true)
  })
})
