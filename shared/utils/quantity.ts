/**
 * How quantities are written, on every screen, sheet and export: leading zero always, trailing zero never,
 * a non-breaking space before the unit, thousands as 1,250, never cc, µg, IU or fractions.
 *
 * These functions only write. What is measured was rounded once, in `server/utils/calc/measuring`.
 */

export const NBSP = '\u00A0'

/**
 * A number with at most `decimals` decimals and no trailing zeros.
 * @example formatNumber(0.40, 2) // '0.4'
 * @example formatNumber(1250, 0) // '1,250'
 */
export function formatNumber(value: number, decimals = 2): string {
  if (!Number.isFinite(value)) return '–'
  const fixed = roundHalfUp(value, decimals)
  const [whole = '0', part = ''] = Math.abs(fixed).toFixed(decimals).split('.')
  const grouped = whole.replace(/\B(?=(\d{3})+(?!\d))/g, ',')
  const trimmed = part.replace(/0+$/, '')
  const sign = fixed < 0 ? '−' : ''
  return sign + grouped + (trimmed ? `.${trimmed}` : '')
}

/** Three significant figures, never in exponent form. @example formatSignificant(0.27123) // '0.271' */
export function formatSignificant(value: number, figures = 3): string {
  if (!Number.isFinite(value)) return '–'
  if (value === 0) return '0'
  const decimals = Math.max(0, figures - 1 - Math.floor(Math.log10(Math.abs(value))))
  return formatNumber(value, Math.min(decimals, 8))
}

/** A number with its unit, held together. @example formatQuantity(0.4, 'mL') // '0.4 mL' */
export function formatQuantity(value: number, unit: string, decimals = 2): string {
  return `${formatNumber(value, decimals)}${NBSP}${unit}`
}

/** A volume that was already rounded to a mark. @example formatVolumeMl(0.35) // '0.35 mL' */
export function formatVolumeMl(valueMl: number): string {
  return formatQuantity(valueMl, 'mL', 3)
}

/** Weight in g under 1 kg and in kg from there on. @example formatWeightG(1250) // '1.25 kg' */
export function formatWeightG(valueG: number): string {
  if (valueG >= 1000) return formatQuantity(valueG / 1000, 'kg', 3)
  return formatQuantity(valueG, 'g', valueG < 100 ? 2 : 1)
}

/** A fraction as percent. @example formatPercent(0.333) // '33 %' */
export function formatPercent(fraction: number, decimals = 0): string {
  return `${formatNumber(fraction * 100, decimals)}${NBSP}%`
}

/** @example formatTemperatureC(33) // '33 °C' */
export function formatTemperatureC(valueC: number): string {
  return `${formatNumber(valueC, 1)}${NBSP}°C`
}

/** @example formatRange(33, 37, '°C') // '33–37 °C' */
export function formatRange(low: number, high: number, unit: string, decimals = 1): string {
  return `${formatNumber(low, decimals)}–${formatNumber(high, decimals)}${NBSP}${unit}`
}

const ONES = ['nought', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten', 'eleven', 'twelve',
  'thirteen', 'fourteen', 'fifteen', 'sixteen', 'seventeen', 'eighteen', 'nineteen']
const TENS = ['', '', 'twenty', 'thirty', 'forty', 'fifty', 'sixty', 'seventy', 'eighty', 'ninety']

/** A number in words, digit by digit after the point. @example numberInWords(0.35) // 'nought point three five' */
export function numberInWords(value: number): string {
  const written = formatNumber(value, 3).replace(/,/g, '')
  const [whole = '0', part] = written.split('.')
  const words = wholeInWords(Number(whole))
  return part ? `${words} point ${[...part].map(digit => ONES[Number(digit)]).join(' ')}` : words
}

function wholeInWords(value: number): string {
  if (value < 20) return ONES[value]!
  if (value < 100) return TENS[Math.floor(value / 10)]! + (value % 10 ? `-${ONES[value % 10]}` : '')
  if (value < 1000) return `${ONES[Math.floor(value / 100)]} hundred${value % 100 ? ` and ${wholeInWords(value % 100)}` : ''}`
  return `${wholeInWords(Math.floor(value / 1000))} thousand${value % 1000 ? ` ${wholeInWords(value % 1000)}` : ''}`
}

/** @example volumeInWords(0.4) // 'nought point four millilitres' */
export function volumeInWords(valueMl: number): string {
  return `${numberInWords(valueMl)} ${valueMl === 1 ? 'millilitre' : 'millilitres'}`
}

/** A strength in the words of the kitchen. @example strengthInWords(0.5) // 'half strength' */
export function strengthInWords(fraction: number): string {
  const names: Record<string, string> = { 0.25: 'quarter strength', 0.5: 'half strength', 0.75: 'three-quarter strength', 1: 'full strength' }
  return names[String(fraction)] ?? `${formatPercent(fraction)} strength`
}

/** Half up on the decimal that is seen, free of binary surprises. @example roundHalfUp(1.005, 2) // 1.01 */
function roundHalfUp(value: number, decimals: number): number {
  const shifted = Number(`${Math.abs(value)}e${decimals}`)
  if (Number.isNaN(shifted)) return Number(value.toFixed(decimals))
  return Math.sign(value) * Number(`${Math.floor(shifted + 0.5)}e-${decimals}`)
}
