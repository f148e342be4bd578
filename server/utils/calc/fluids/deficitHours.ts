import { checkedNumber } from '../checkedNumber'

/**
 * Hours over which a deficit is put back: the group's hours, or longer where maintenance and deficit together would
 * pass the day's limit.
 *
 * @param input  one animal:
 * @param input.deficitMl  deficit, mL, 0 or more;
 * @param input.groupHours  the group's hours, h, above 0;
 * @param input.maintenanceMlPerDay  maintenance, mL/day, 0 or more;
 * @param input.capMlPerDay  most water in a day, mL/day, above 0;
 * @param input.longestHours  never longer than this, h, at or above the group's hours.
 * @returns h, unrounded, between `groupHours` and `longestHours`.
 * @throws CalcInputError `number.outOfRange` when a number is outside its range.
 * @source house rule; the 1 kg tortoise of the nutrition sheet (8 %, 20 mL/kg/day, cap 40) takes 96 h
 * @example deficitHours({ deficitMl: 80, groupHours: 72, maintenanceMlPerDay: 20, capMlPerDay: 40, longestHours: 168 }) // 96
 */
export function deficitHours(input: { deficitMl: number, groupHours: number, maintenanceMlPerDay: number, capMlPerDay: number, longestHours: number }): number {
  const deficit = checkedNumber(input.deficitMl, 'the deficit', 'mL', 0)
  const group = checkedNumber(input.groupHours, 'the hours of the group', 'h', Number.MIN_VALUE)
  const longest = checkedNumber(input.longestHours, 'the longest time', 'h', group)
  const room = checkedNumber(input.capMlPerDay, 'the limit', 'mL/day', Number.MIN_VALUE) - checkedNumber(input.maintenanceMlPerDay, 'maintenance', 'mL/day', 0)
  if (deficit === 0) return group
  if (room <= 0) return longest
  const hours = deficit / room * 24
  // A deficit that just fits must not become 24.000000000000004 h.
  return hours <= group * (1 + 1e-9) ? group : Math.min(longest, hours)
}
