import type { ZoneOffset } from './zoneOffsets'

/**
 * The instant of a wall-clock time. A time that the clocks skip moves forward by the gap; a time that comes twice is
 * taken the first time.
 *
 * @param localMs  the wall-clock time written as if it were UTC, ms since 1970.
 * @param offsets  offsets of the zone around it, from `zoneOffsets`, at least one, in order.
 * @returns instant, ms since 1970.
 * @throws Never.
 * @source house rule for skipped and doubled times; definition otherwise
 * @example instantOfLocalMs(Date.UTC(2026, 5, 1, 7, 30), [{ fromMs: 0, offsetMs: 3_600_000 }]) // Date.UTC(2026, 5, 1, 6, 30)
 */
export function instantOfLocalMs(localMs: number, offsets: readonly ZoneOffset[]): number {
  for (let index = 0; index < offsets.length; index += 1) {
    const instant = localMs - offsets[index]!.offsetMs
    const next = offsets[index + 1]
    // Before the next change: this offset holds. The first one that fits is the earlier of two.
    if (!next || instant < next.fromMs) {
      const from = index === 0 ? Number.NEGATIVE_INFINITY : offsets[index]!.fromMs
      // Skipped time: it lies after the change by the old clock and before it by the new one.
      return instant >= from ? instant : localMs - offsets[index - 1]!.offsetMs
    }
  }
  return localMs - offsets.at(-1)!.offsetMs
}
