const BROWSERS: [RegExp, string][] = [[/\bEdgA?\//, 'Edge'], [/\bOPR\//, 'Opera'], [/\bSamsungBrowser\//, 'Samsung Internet'], [/\bFirefox\/|\bFxiOS\//, 'Firefox'], [/Chrome\/|\bCriOS\//, 'Chrome'], [/\bSafari\//, 'Safari']]
const SYSTEMS: [RegExp, string][] = [[/\bAndroid\b/, 'Android'], [/\biPhone\b/, 'iPhone'], [/\biPad\b/, 'iPad'], [/\bWindows\b/, 'Windows'], [/\bMac OS X\b/, 'Mac'], [/\bCrOS\b/, 'Chromebook'], [/\bLinux\b/, 'Linux']]

/**
 * A browser in words a person knows their own by. Not exact, and need not be.
 * @example deviceOf('Mozilla/5.0 (Linux; Android 15) … Chrome/140.0 Mobile Safari/537.36') // 'Chrome on Android'
 */
export function deviceOf(userAgent: string | undefined): string {
  const find = (list: [RegExp, string][]) => list.find(([pattern]) => pattern.test(userAgent ?? ''))?.[1]
  const [browser, system] = [find(BROWSERS), find(SYSTEMS)]
  return browser && system ? `${browser} on ${system}` : browser ?? system ?? 'A program'
}
