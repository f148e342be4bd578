import type { ZoneOffset } from './zoneOffsets'

/**
 * The wall-clock time of an instant, written as if it were UTC.
 *
 * @param instantMs  instant, ms since 1970.
 * @param offsets  offsets of the zone around it, from `zoneOffsets`, at least one, in order.
 * @returns wall-clock time, ms since 1970 as if UTC.
 * @throws Never.
 * @source definition; undoes `instantOfLocalMs` except inside a skipped or doubled hour
 * @example localOfInstantMs(Date.UTC(2026, 5, 1, 6, 30), [{ fromMs: 0, offsetMs: 3_600_000 }]) // Date.UTC(2026, 5, 1, 7, 30)
 */
export function localOfInstantMs(instantMs: number, offsets: readonly ZoneOffset[]): number {
  let offsetMs = offsets[0]!.offsetMs
  for (const one of offsets) {
    if (one.fromMs > instantMs) break
    offsetMs = one.offsetMs
  }
  return instantMs + offsetMs
}
