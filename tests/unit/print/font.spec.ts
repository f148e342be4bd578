import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, expect, it } from 'vitest'
import { findFontFile } from '../../../server/utils/print/font'

const root = mkdtempSync(join(tmpdir(), 'print-font-'))
mkdirSync(join(root, 'server/fonts'), { recursive: true })
mkdirSync(join(root, 'server/chunks/routes'), { recursive: true })
mkdirSync(join(root, 'elsewhere'))
writeFileSync(join(root, 'server/fonts/Test.ttf'), 'x')
afterAll(() => rmSync(root, { recursive: true }))

it('is found beside the built server, from any folder below it', () => {
  const found = join(root, 'server/fonts/Test.ttf')
  expect(findFontFile('Test.ttf', [join(root, 'server')])).toBe(found)
  expect(findFontFile('Test.ttf', [join(root, 'server/chunks/routes')])).toBe(found)
  expect(findFontFile('Test.ttf', [join(root, 'elsewhere'), join(root, 'server')])).toBe(found)
})

it('is found in the package beside the sources', () => {
  expect(findFontFile('SourceSans3-Regular.ttf')).toMatch(/source-sans.TTF.SourceSans3-Regular\.ttf$/)
})

it('says so when it is nowhere', () => {
  expect(() => findFontFile('Test.ttf', [join(root, 'elsewhere')])).toThrow('The print font Test.ttf is not installed')
})
