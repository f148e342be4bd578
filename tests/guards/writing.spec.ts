import { describe, expect, it } from 'vitest'
import { filesUnder, textOf } from './files'

/** Spellings that have killed (ISMP, Joint Commission, FDA lists): never on a screen, a sheet or in an answer. */
const NEVER: [RegExp, string][] = [
  [/\d\s?cc\b/i, 'cc: write mL'],
  [/µg|\bug\b|\bmcg\/ug\b/, 'micrograms: write mcg'],
  [/\d\s?IU\b/, 'IU: write units'],
  [/\btsp\b|\btbsp\b|teaspoon/i, 'spoons: write mL'],
  [/\b(BID|TID|QID|SID|PRN|QD|QOD)\b/, 'shorthand: write every 8 hours, with clock times'],
  [/(?<![\d.,#\w-])\.\d+\s?(mL|mg|g|kg|kcal)\b/, 'naked decimal: write 0.5'],
  [/\b\d+\.\d*0\s?(mL|mg|kcal)\b/, 'trailing zero: write 1, not 1.0'],
  [/\bregurgitat/i, 'write "brought up"'],
  [/[½¼¾]/, 'fractions: write 0.5'],
]

/** What a person can read: text of templates, and string literals of the code that words plans, sheets and answers. */
function readableOf(path: string): string {
  const text = textOf(path)
  if (path.endsWith('.vue')) {
    const template = /<template>([\s\S]*)<\/template>/.exec(text)?.[1] ?? ''
    return template.replace(/class="[^"]*"|:class="[^"]*"|<!--[\s\S]*?-->/g, '') + stringsOf(/<script[^>]*>([\s\S]*?)<\/script>/.exec(text)?.[1] ?? '')
  }
  return stringsOf(text)
}

function stringsOf(code: string): string {
  const withoutComments = code.replace(/\/\*[\s\S]*?\*\//g, '').replace(/(^|\s)\/\/.*$/gm, '')
  return [...withoutComments.matchAll(/'((?:[^'\\\n]|\\.)*)'|`((?:[^`\\]|\\.)*)`/g)].map(match => match[1] ?? match[2]).join('\n')
}

const files = [
  ...filesUnder('pages', ['.vue']), ...filesUnder('components', ['.vue']), ...filesUnder('layouts', ['.vue']),
  ...filesUnder('server/utils/plan', ['.ts']), ...filesUnder('server/utils/print', ['.ts']), ...filesUnder('server/utils/mail', ['.ts']), ...filesUnder('server/utils/regimen', ['.ts']), ...filesUnder('server/utils/team', ['.ts']), ...filesUnder('server/utils/access', ['.ts']), ...filesUnder('shared', ['.ts']), ...filesUnder('utils', ['.ts']),
]

describe('what people read', () => {
  it.each(files)('%s', (path) => {
    const text = readableOf(path)
    expect(NEVER.filter(([pattern]) => pattern.test(text)).map(([pattern, advice]) => `${advice} (${pattern.exec(text)?.[0]})`)).toEqual([])
  })
  it('is really looked at', () => {
    expect(stringsOf('const a = \'give .5 mL\' // .5 mL in a comment')).toBe('give .5 mL')
    expect(NEVER.some(([pattern]) => pattern.test('give .5 mL'))).toBe(true)
    expect(NEVER.some(([pattern]) => pattern.test('give 0.5 mL of 1.25 kcal'))).toBe(false)
    expect(NEVER.some(([pattern]) => pattern.test('give 1.0 mL'))).toBe(true)
  })
})
