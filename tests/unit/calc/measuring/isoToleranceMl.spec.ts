import { describe, expect, it } from 'vitest'
import { isoToleranceMl } from '#server/utils/calc/measuring/isoToleranceMl'

export const classes = [
  { underCapacityMl: 2, ofCapacity: 0.015, ofVolume: 0.02, ofVolumeFromHalf: 0.05 },
  { underCapacityMl: 5, ofCapacity: 0.015, ofVolume: 0.02, ofVolumeFromHalf: 0.05 },
  { underCapacityMl: Number.POSITIVE_INFINITY, ofCapacity: 0.015, ofVolume: 0.01, ofVolumeFromHalf: 0.04 },
]

describe('isoToleranceMl', () => {
  // The whole grid of ISO 7886-1 is checked in tests/reference/iso7886.spec.ts.
  it('changes formula at half of the capacity', () => {
    expect(isoToleranceMl({ capacityMl: 1, volumeMl: 0.2 }, classes)).toBeCloseTo(0.019, 9)
    expect(isoToleranceMl({ capacityMl: 1, volumeMl: 0.5 }, classes)).toBeCloseTo(0.025, 9)
    expect(isoToleranceMl({ capacityMl: 10, volumeMl: 4 }, classes)).toBeCloseTo(0.19, 9)
  })
  it('refuses more than the syringe holds, and an empty table', () => {
    expect(() => isoToleranceMl({ capacityMl: 1, volumeMl: 1.1 }, classes)).toThrow()
    expect(() => isoToleranceMl({ capacityMl: 1, volumeMl: 0.5 }, [])).toThrow('No tolerance is known')
  })
})
