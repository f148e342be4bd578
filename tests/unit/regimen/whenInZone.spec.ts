import { expect, it } from 'vitest'
import { whenInZone } from '../../../server/utils/regimen/whenInZone'

it.each([
  ['2026-12-03T18:00:00Z', 'Europe/London', 'Thu 3 Dec 2026, 18:00 (Europe/London)'],
  ['2026-12-03T18:00:00Z', 'Pacific/Auckland', 'Fri 4 Dec 2026, 07:00 (Pacific/Auckland)'],
  ['2026-12-03T12:00:00Z', 'Etc/UTC', 'Thu 3 Dec 2026, 12:00 noon (Etc/UTC)'],
  ['2026-12-03T05:00:00.000Z', 'America/New_York', 'Thu 3 Dec 2026, 00:00 midnight (America/New_York)'],
])('%s in %s is %s', (instant, zone, written) => expect(whenInZone(instant, zone)).toBe(written))
