import { describe, expect, it } from 'vitest'
import { HOW_READ } from '#shared/types/reference'
import { currentEdition } from '#server/utils/reference'
import { isCited } from '#server/utils/reference/record'
import { checkSkips, filesUnder, textOf } from './files'

const { rules, equations, species, foods, sources } = currentEdition()

/** Numbers of the rules that name a thing and claim nothing of an animal, each with the reason. */
const SKIPS: Record<string, string> = {
  'measuring.syringes.capacityMl': 'what a maker prints on a syringe: a name, chosen by the user',
  'measuring.syringes.stepMl': 'what a maker prints on a syringe: a name, chosen by the user',
  'measuring.isoClasses.underCapacityMl': 'row heading of the standard\'s table; its values are cited',
}

/** Sources that no number cites and that still carry something, each with what. */
const UNCITED: Record<string, string> = {
  'throckmorton1973': 'the measured lizard that tests/reference holds the reptile equations against',
  'dibartola2012': 'published fluid sum worked out again in tests/reference',
  'bartges1999': 'second witness of the K constants of birds, named in their locators',
  'harper2000': 'says that equations from fasted birds are unsuitable: the reason for no more than resting at first',
  'chappell1987': 'boas and pythons: agrees with the squamate equation, named in its notes',
  'becklowe1994': 'beaded lizards: a steeper rise with warmth, why the temperature term is a caution',
  'bennettnagy1977': 'free-living lizards at 2 to 2.5 times resting: the analogy behind the factor of 1.5',
  'gienger2017': 'freshwater crocodiles and alligators lower than saltwater ones, named in the notes',
  'mcnab2005': 'spread of marsupial rates, named in the notes',
  'feldman2013': 'clade equations of snakes that exist and whose coefficients were not seen, named in the notes',
  'feldman2016': 'where the lizard clade equations come from, named in their locators',
  'dvmhospital': 'why illness factors are left out, named in the rules by what it says',
  'wsava2017': 'top of the fluid range of birds, named in the rules by what it says',
  'nice2006': 'days without food that the tiers are compared with, named in the rules',
  'aspen2020': 'shape of the ramps: a third to a half at first',
  'who2021': 'shape of the ramps: a third to a half at first',
}

/** Path of every number in a value, lists without their index, and whether it was made by `cited`. */
function numbersIn(value: unknown, path: string[] = []): { path: string, isCited: boolean }[] {
  if (isCited(value)) return [{ path: path.join('.'), isCited: true }]
  if (typeof value === 'number') return [{ path: path.join('.'), isCited: false }]
  if (Array.isArray(value)) return value.flatMap(one => numbersIn(one, path))
  if (typeof value === 'object' && value !== null) return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, [...path, key]))
  return []
}

describe('rules', () => {
  const numbers = numbersIn(rules)
  it('has no number without a source', () => {
    expect(numbers.filter(one => one.isCited).length).toBeGreaterThan(100)
    expect(numbers.filter(one => !one.isCited && !(one.path in SKIPS)).map(one => one.path)).toEqual([])
  })
  it('keeps its skip list honest', () => expect(checkSkips(SKIPS, numbers.filter(one => !one.isCited).map(one => one.path))).toEqual([]))
  it('would notice a number without one', () => expect(numbersIn({ a: [{ b: 1 }] })).toEqual([{ path: 'a.b', isCited: false }]))
})

describe('equations', () => {
  it.each([...equations.values()].map(equation => [equation.id, equation] as const))('%s names its source and that of its constants', (_id, { provenance, constants, resultUnit }) => {
    expect(provenance.unit).toBe(resultUnit)
    for (const one of [provenance, ...Object.values(constants)]) {
      expect(sources.has(one.sourceKey ?? '')).toBe(true)
      expect(one.locator?.trim()).toBeTruthy()
      expect(HOW_READ).toContain(one.howRead)
    }
  })
})

/** Fields that hold numbers of a record, those that are null or empty left out. */
function numberFields(record: object, except: string[]): string[] {
  return Object.entries(record).filter(([name, value]) => !except.includes(name) && numbersIn(value).length > 0).map(([name]) => name)
}

describe.each([
  ['species', [...species.values()], 100, ['weightFromLength']],
  ['foods', [...foods.values()], 30, []],
] as const)('%s', (_what, items, atLeast, except) => {
  it('are there', () => expect(items.length).toBeGreaterThanOrEqual(atLeast))
  it('say of every number where it comes from', () => {
    const silent = items.flatMap(item => numberFields(item, [...except]).filter(field => !Object.keys(item.provenance).some(key => key === field || key.startsWith(`${field}.`))).map(field => `${item.id}: ${field}`))
    expect(silent).toEqual([])
  })
  it('name only sources of the bibliography, and say how they were read', () => {
    const wrong = items.flatMap(item => Object.entries(item.provenance).filter(([, one]) => !sources.has(one.sourceKey) || !HOW_READ.includes(one.howRead) || !one.locator.trim() || !one.unit.trim()).map(([field]) => `${item.id}: ${field}`))
    expect(wrong).toEqual([])
  })
  it('has no provenance of a field it does not have', () => {
    expect(items.flatMap(item => Object.keys(item.provenance).filter(key => !(key.split('.')[0]! in item)).map(key => `${item.id}: ${key}`))).toEqual([])
  })
})

describe('weight from length', () => {
  it('stands in an equation of the same numbers and source', () => {
    const lines = [...species.values()].flatMap(one => one.weightFromLength ? [one.weightFromLength] : [])
    expect(lines.length).toBeGreaterThan(10)
    for (const line of lines) {
      const equation = equations.get(line.equationId)
      expect(equation, line.equationId).toBeDefined()
      expect(equation).toMatchObject({ topic: 'length', constants: { a: { value: line.interceptLog10G }, b: { value: line.slope } }, provenance: { sourceKey: line.sourceKey } })
    }
  })
})

describe('bibliography', () => {
  it('says of each source what was seen of it', () => {
    for (const [key, source] of sources) {
      expect(source.key).toBe(key)
      expect(key).toMatch(/^[a-z][a-z0-9-]*$/)
      for (const text of [source.authors, source.title, source.where, source.seen]) expect(text.trim(), key).not.toBe('')
      if (source.year !== null) expect(source.year).toBeGreaterThan(1850)
    }
  })
  it('holds every key that the code writes down', () => {
    const files = ['server/utils/plan', 'server/utils/reference', 'server/utils/regimen', 'server/utils/print', 'shared'].flatMap(folder => filesUnder(folder, ['.ts']))
    const written = files.flatMap(path => [...textOf(path).matchAll(/sourceKey:\s*'([^']*)'|'([a-z]+(?:19|20)\d{2}[a-z]?)'/g)].map(match => ({ path, key: match[1] ?? match[2]! })))
    expect(written.length).toBeGreaterThan(50)
    expect(written.filter(({ key }) => !sources.has(key)).map(({ path, key }) => `${path}: ${key}`)).toEqual([])
  })

  const cited = new Set([...keysIn([...equations.values()]), ...keysIn([...species.values()]), ...keysIn([...foods.values()]), ...keysIn(rules), ...keysInCode()])
  it('holds no source that nothing rests on', () => {
    expect([...sources.keys()].filter(key => !cited.has(key) && !(key in UNCITED))).toEqual([])
  })
  it('keeps its list of uncited sources honest', () => {
    expect(checkSkips(UNCITED, [...sources.keys()].filter(key => !cited.has(key)))).toEqual([])
  })
})

/** Every `sourceKey` in a value, at any depth. */
function keysIn(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(keysIn)
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([name, inner]) => name === 'sourceKey' && typeof inner === 'string' ? [inner] : keysIn(inner))
}

/** Keys that code or a note writes out, the bibliography itself left aside. */
function keysInCode(): string[] {
  const text = filesUnder('server/utils', ['.ts']).filter(path => path !== 'server/utils/reference/sources.ts').map(textOf).join('\n')
  return [...sources.keys()].filter(key => new RegExp(`(?<![\\w-])${key}(?![\\w-])`).test(text))
}

it('lets nothing but record.ts make a cited number', () => {
  const forged = filesUnder('server', ['.ts']).filter(path => path !== 'server/utils/reference/record.ts' && /\bas (unknown as )?Cited(Range)?\b|<Cited(Range)?>\{/.test(textOf(path)))
  expect(forged).toEqual([])
})
