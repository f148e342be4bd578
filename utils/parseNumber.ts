/** A number as people type it: "0,4" and "1 250" are fine. Null for nothing or nonsense. @example parseNumber('0,4') // 0.4 */
export function parseNumber(text: string | null | undefined): number | null {
  const tidy = (text ?? '').trim().replace(/[\s\u00A0']/g, '').replace(',', '.')
  if (!/^-?(\d+\.?\d*|\.\d+)$/.test(tidy)) return null
  return Number(tidy)
}
