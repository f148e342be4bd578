import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { FeedInput, RegimenInput } from '../../../shared/schemas/regimen'
import { issuesOf } from '../../../server/utils/http/issuesOf'
import { regimenInput } from '../plan/inputs'

function issues(schema: z.ZodType, value: unknown) {
  const result = schema.safeParse(value)
  expect(result.success).toBe(false)
  return issuesOf(result.error!, value)
}

describe('issuesOf a choice between shapes', () => {
  it.each<[string, unknown, string, RegExp]>([
    ['a list feed of the wrong type', { feedId: 7 }, '', /^Choose a feed/],
    ['an energy given as text', { energyKcalPerMl: '1.2' }, 'energyKcalPerMl', /must be a number in kcal\/mL/],
    ['an energy out of range', { energyKcalPerMl: 12 }, 'energyKcalPerMl', /at most 9 kcal\/mL/],
    ['one composition of the wrong type', { proteinPercent: 'x' }, 'proteinPercent', /must be a number in %/],
    ['a composition that cannot be', { proteinPercent: 60, fatPercent: 50, carbohydratePercent: 10 }, '', /more than 100 % together/],
    ['a composition that is not whole', { proteinPercent: 60 }, '', /^Choose a feed/],
    ['nothing', {}, '', /^Choose a feed/],
    ['no object', 5, '', /^Choose a feed/],
    ['nothing at all', undefined, '', /^Choose a feed/],
    ['a list', [], '', /^Choose a feed/],
  ])('tells of %s', (_what, value, path, message) => {
    const found = issues(FeedInput, value)
    expect(found).toHaveLength(1)
    expect(found[0]!.path).toBe(path)
    expect(found[0]!.message).toMatch(message)
  })

  it('names every wrong field of the shape that came nearest, with the path from the top', () => {
    const found = issues(RegimenInput, { ...regimenInput(), feed: { energyKcalPerMl: 'much', waterFraction: 2 } })
    expect(found.map(issue => issue.path)).toEqual(['feed.energyKcalPerMl', 'feed.waterFraction'])
  })

  it('reaches into choices inside choices', () => {
    const inner = z.union([z.object({ a: z.number('A must be a number.') }), z.object({ b: z.number('B must be a number.') })], 'Give a or b.')
    const outer = z.object({ list: z.array(z.union([z.object({ inner }), z.object({ other: z.string('Other must be text.') })], 'Give inner or other.')) })
    expect(issues(outer, { list: [{ other: 'x' }, { inner: { b: 'x' } }] })).toEqual([{ path: 'list.1.inner.b', message: 'B must be a number.' }])
  })
})

describe('issuesOf anything else', () => {
  it('gives each field its path and its own sentence', () => {
    const { startAt, timeZone, ...rest } = regimenInput()
    expect(startAt && timeZone).toBeTruthy()
    expect(issues(RegimenInput, rest).map(issue => issue.path)).toEqual(['startAt', 'timeZone'])
  })
  it('words what zod words for programmers', () => {
    expect(issues(RegimenInput, null)).toEqual([{ path: '', message: 'The request must be an object with named fields.' }])
    expect(issues(RegimenInput, { ...regimenInput(), animal: [] })).toEqual([{ path: 'animal', message: '"animal" must be an object with named fields.' }])
    expect(issues(z.object({ list: z.array(z.number()) }), { list: ['x'] })[0]!.message).toMatch(/^"list" is not as expected/)
  })
  it('says nothing twice', () => {
    const twice = z.object({ a: z.string().refine(() => false, 'No.').refine(() => false, 'No.') })
    expect(issues(twice, { a: 'x' })).toEqual([{ path: 'a', message: 'No.' }])
  })
  it('is not misled by names that every object has', () => {
    expect(issues(FeedInput, JSON.parse('{"__proto__": {"feedId": 5}}'))[0]!.message).toMatch(/^Choose a feed/)
  })
})
