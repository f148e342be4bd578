import type { Finding, FindingLevel } from '#shared/types/finding'

/**
 * One finding, with only the fields that were given.
 *
 * @param code  `topic.problem`, stable.
 * @param level  `note`, `caution` or `stop`.
 * @param title  heading of a few words.
 * @param message  one or two plain sentences: what is the case and what to do next.
 * @param detail  the rest of a finding; fields left out stay out.
 * @returns the finding.
 * @throws Never.
 * @source house rule (findings carry codes, nobody parses messages)
 * @example makeFinding('weight.stale', 'caution', 'Old weight', 'Weigh it again before the first feed.').level // 'caution'
 */
export function makeFinding(code: string, level: FindingLevel, title: string, message: string, detail: Omit<Finding, 'code' | 'level' | 'title' | 'message'> = {}): Finding {
  return { code, level, title, message, ...detail }
}
