import { basename } from 'node:path'
import { describe, expect, it } from 'vitest'
import { checkSkips, filesUnder, textOf } from './files'

/** A component is only kept usable when a test mounts it: each is imported by a spec under tests/nuxt. */
const components = filesUnder('components', ['.vue'])
const specs = filesUnder('tests/nuxt', ['.spec.ts']).map(textOf).join('\n')
const SKIPS: Record<string, string> = {}

describe('every component is mounted by a test', () => {
  it('and the skip list is honest', () => expect(checkSkips(SKIPS, components)).toEqual([]))
  it('and they are found', () => expect(components.length).toBeGreaterThan(20))
  it.each(components.filter(path => !(path in SKIPS)))('%s', path => expect(specs).toMatch(new RegExp(`import ${basename(path, '.vue')} from '~/components/`)))
})
