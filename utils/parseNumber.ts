/** "1,250": 1250 to some, 1.25 to others. */
const TWO_READINGS = /^-?[1-9]\d{0,2},\d{3}$/

/**
 * A number as people type it: "0,4" and "1 250" are fine. Null for nothing, for nonsense, and for "1,250", which is
 * 1250 to some and 1.25 to others: a thousandfold amount must not hang on where a person went to school.
 * @example parseNumber('0,4') // 0.4
 */
export function parseNumber(text: string | null | undefined): number | null {
  const tidy = tidyOf(text)
  if (TWO_READINGS.test(tidy)) return null
  const dotted = tidy.replace(',', '.')
  if (!/^-?(\d+\.?\d*|\.\d+)$/.test(dotted)) return null
  return Number(dotted)
}

/**
 * What to say at a field whose text is no number, and nothing where it is one or is empty.
 * @example whyNoNumber('1,250') // 'This can be read two ways. Type 1250 or 1.25.'
 */
export function whyNoNumber(text: string | null | undefined): string {
  const tidy = tidyOf(text)
  if (tidy === '' || parseNumber(tidy) !== null) return ''
  if (TWO_READINGS.test(tidy)) return `This can be read two ways. Type ${tidy.replace(',', '')} or ${Number(tidy.replace(',', '.'))}.`
  return 'Type a number, for example 0.4.'
}

function tidyOf(text: string | null | undefined): string {
  return (text ?? '').trim().replace(/[\s\u00A0']/g, '')
}
