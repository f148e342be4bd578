/**
 * A number as people type it: "0,4" and "1 250" are fine. Null for nothing, for nonsense, and for "1,250", which is
 * 1250 to some and 1.25 to others: a thousandfold amount must not hang on where a person went to school.
 * @example parseNumber('0,4') // 0.4
 */
export function parseNumber(text: string | null | undefined): number | null {
  const tidy = (text ?? '').trim().replace(/[\s\u00A0']/g, '')
  if (/^-?[1-9]\d{0,2},\d{3}$/.test(tidy)) return null
  const dotted = tidy.replace(',', '.')
  if (!/^-?(\d+\.?\d*|\.\d+)$/.test(dotted)) return null
  return Number(dotted)
}
