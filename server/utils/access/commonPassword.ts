import { dictionary } from '@zxcvbn-ts/language-common'

let known: Set<string> | null = null

/**
 * Whether a password is one of those that are tried first: on the shipped list of common ones, one of them with figures
 * or signs around it, one of them several times over, one sign again and again, or the person's own words.
 * @param own  words that others know of them: address, name, team.
 */
export function isCommonPassword(password: string, own: string[] = []): boolean {
  known ??= new Set((dictionary['passwords-common'] as string[]).map(one => one.toLowerCase()))
  const lower = password.toLowerCase().trim()
  const core = lower.replace(/^[^\p{L}]+|[^\p{L}]+$/gu, '')
  if (known.has(lower) || (core.length > 0 && known.has(core))) return true
  if (new Set(lower).size < 4 || isRun(lower)) return true
  for (let times = 2; times <= lower.length / 3; times += 1) {
    if (lower.length % times === 0 && lower === lower.slice(0, lower.length / times).repeat(times)) return true
  }
  return own.flatMap(word => [word, word.split('@')[0]!]).map(word => word.toLowerCase().trim()).some(word => word.length > 3 && (lower === word || core === word))
}

/** Keys in a row, up or down: 1234567890, abcdefghijkl. */
function isRun(text: string): boolean {
  const steps = [...text].slice(1).map((letter, index) => letter.codePointAt(0)! - text.codePointAt(index)!)
  return steps.every(step => step === 1) || steps.every(step => step === -1)
}
