import { CalcInputError } from '../calcInputError'
import { checkedNumber } from '../checkedNumber'

/** One row of the tolerance table of ISO 7886-1; rows are in order of capacity, the last one open. */
export interface SyringeToleranceClass {
  /** The row holds for capacities under this, mL; Infinity for the last. */
  underCapacityMl: number
  /** Share of the capacity, for volumes under half of it. */
  ofCapacity: number
  /** Share of the volume, for volumes under half of the capacity. */
  ofVolume: number
  /** Share of the volume, from half of the capacity on. */
  ofVolumeFromHalf: number
}

/**
 * Error that ISO 7886-1 allows a syringe for one expelled volume (half-width).
 *
 * @param input  one draw:
 * @param input.capacityMl  nominal capacity, mL, above 0;
 * @param input.volumeMl  volume expelled, mL, above 0 to the capacity.
 * @param classes  tolerance rows in order of capacity, at least one.
 * @returns mL, unrounded, above 0.
 * @throws CalcInputError `number.outOfRange` when the volume is not above 0 or more than the capacity;
 * @throws CalcInputError `syringe.noClass` when no row covers the capacity.
 * @source ISO 7886-1:2017 (corrected version 2019-08), clause 8, by capacity
 * @example isoToleranceMl({ capacityMl: 1, volumeMl: 0.2 }, classes) // 0.019
 */
export function isoToleranceMl(input: { capacityMl: number, volumeMl: number }, classes: readonly SyringeToleranceClass[]): number {
  const capacity = checkedNumber(input.capacityMl, 'the capacity', 'mL', Number.MIN_VALUE)
  const volume = checkedNumber(input.volumeMl, 'the volume', 'mL', Number.MIN_VALUE, capacity * (1 + 1e-6))
  const row = classes.find(one => capacity < one.underCapacityMl)
  if (!row) throw new CalcInputError('syringe.noClass', `No tolerance is known for a syringe of ${capacity} mL.`)
  return volume < capacity / 2 ? row.ofCapacity * capacity + row.ofVolume * volume : row.ofVolumeFromHalf * volume
}
