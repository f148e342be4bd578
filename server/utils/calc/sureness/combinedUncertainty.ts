import { checkedNumber } from '../checkedNumber'

/**
 * Combined expanded uncertainty of a product of independent quantities, as a fraction of it (k = 2, about 95 %).
 *
 * @param relativeStandard  relative standard uncertainty of each input, by name, each 0 or more; at least one.
 * @returns `{ relativeExpanded, shares }`: fraction, unrounded; and each input's share of the variance, 0 to 1, same names.
 * @throws CalcInputError `number.outOfRange` when one is negative or not finite.
 * @source JCGM 100:2008 (GUM) 5.1.2, power-product form 5.1.6; k = 2
 * @example combinedUncertainty({ scale: 0.02887, density: 0.05774, syringe: 0.1198 }).relativeExpanded // 0.2721…
 */
export function combinedUncertainty<Name extends string>(relativeStandard: Record<Name, number>): { relativeExpanded: number, shares: Record<Name, number> } {
  const names = Object.keys(relativeStandard) as Name[]
  const variances = names.map(name => checkedNumber(relativeStandard[name], `the uncertainty of the ${name}`, 'as a fraction', 0) ** 2)
  const total = variances.reduce((sum, one) => sum + one, 0)
  const shares = Object.fromEntries(names.map((name, index) => [name, total === 0 ? 0 : variances[index]! / total])) as Record<Name, number>
  return { relativeExpanded: 2 * Math.sqrt(total), shares }
}
