import { expect, it } from 'vitest'
import { filesUnder, textOf } from './files'

/** Nitro flattens all exports of server/utils into one namespace and drops the second of two equal names with only a warning. */
it('has no export name twice under server/utils', () => {
  const places = new Map<string, string[]>()
  for (const path of filesUnder('server/utils', ['.ts'])) {
    // What is passed on counts too; "export *" does not, Nitro does not follow it.
    for (const list of textOf(path).matchAll(/^export\s+(?:type\s+)?\{([^}]*)\}\s+from\b/gm)) {
      for (const name of list[1]!.split(',').map(one => one.trim().replace(/^type\s+/, '').split(/\s+as\s+/).at(-1)!).filter(Boolean)) places.set(name, [...(places.get(name) ?? []), path])
    }
    for (const match of textOf(path).matchAll(/^export\s+(?:default\s+)?(?:async\s+)?(?:abstract\s+)?(?:function\*?|const|let|class|enum|interface|type)\s+(\w+)/gm)) {
      places.set(match[1]!, [...(places.get(match[1]!) ?? []), path])
    }
  }
  expect(places.size).toBeGreaterThan(40)
  expect([...places].filter(([, paths]) => paths.length > 1)).toEqual([])
})

it('has no folder or file with a name that says nothing', () => {
  const empty = /(^|\/)(helpers?|misc|common|managers?|services?)(\.|\/|$)/i
  const all = ['server', 'shared', 'components', 'composables', 'stores', 'utils', 'pages'].flatMap(folder => filesUnder(folder, ['.ts', '.vue']))
  expect(all.filter(path => empty.test(path))).toEqual([])
})
