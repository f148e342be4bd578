import { existsSync } from 'node:fs'
import { basename, join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { checkSkips, filesUnder, root, textOf } from './files'

const files = filesUnder('server/utils/calc', ['.ts'])
/** Files without a formula of their own, each with the reason. */
const SKIPS: Record<string, string> = {}

it('keeps its skip list honest', () => expect(checkSkips(SKIPS, files)).toEqual([]))
it('finds the formulas', () => expect(files.length).toBeGreaterThan(20))

describe.each(files.filter(path => !(path in SKIPS)))('%s', (path) => {
  const text = textOf(path)
  it('has a spec of the same name', () => {
    expect(existsSync(join(root, path.replace('server/utils/calc/', 'tests/unit/calc/').replace(/\.ts$/, '.spec.ts')))).toBe(true)
  })
  it('has a doc block with every tag on what it exports', () => {
    const exported = [...text.matchAll(/(\/\*\*(?:(?!\*\/)[\s\S])*\*\/)?\s*\nexport (?:function|class) (\w+)/g)].map(match => ({ block: match[1] ?? '', name: match[2]! }))
    const blocks = exported.length > 0 ? exported : [...text.matchAll(/^(\/\*\*(?:(?!\*\/)[\s\S])*\*\/)\s*export (?:function|class) (\w+)/gm)].map(match => ({ block: match[1]!, name: match[2]! }))
    expect(blocks.length, `${path} exports no documented function`).toBeGreaterThan(0)
    for (const { block, name } of blocks) {
      const isClass = new RegExp(`export class ${name}\\b`).test(text)
      for (const tag of isClass ? ['@source', '@example'] : ['@param', '@returns', '@throws', '@source', '@example']) expect(block, `${name} lacks ${tag}`).toContain(tag)
    }
  })
  it('holds no number that needs a source', () => {
    const code = text.replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, '').replace(/'[^']*'|`[^`]*`/g, '')
    // Small whole numbers, halves, powers of ten, minutes, hours and days are arithmetic; the rest is a value and lives in reference/.
    const arithmetic = new Set(['0', '1', '2', '3', '4', '5', '6', '9', '10', '24', '60', '100', '1000', '1440', '1439', '0.1', '0.2', '0.5', '1.5', '15', '50', '2000', '60_000', '3_600_000', '86_400_000', '7', '1e-9', '1e6', '1e-6', '1e9', '1e4', '1e3', '12'])
    const found = [...code.matchAll(/(?<![\w.])\d[\d_]*(?:\.\d+)?(?:e-?\d+)?/gi)].map(match => match[0]).filter(number => !arithmetic.has(number))
    expect(found, `${basename(path)} holds ${found.join(', ')}`).toEqual([])
  })
})
