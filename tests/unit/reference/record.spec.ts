import { describe, expect, expectTypeOf, it } from 'vitest'
import { cited, citedRange, isCited, provenance, UncitedNumberError, type Cited } from '#server/utils/reference/record'

const good = { value: 72, unit: 'h', sourceKey: 'memory', locator: 'texts give 48 to 96 h', howRead: 'memory' } as const

describe('cited', () => {
  it('keeps the number with its source, frozen', () => {
    const number = cited({ ...good, note: 'A note.' })
    expect(number).toEqual({ ...good, note: 'A note.' })
    expect(Object.isFrozen(number)).toBe(true)
    expect(() => Object.assign(number, { value: 1 })).toThrow(TypeError)
    expect('note' in cited(good)).toBe(false)
  })

  it.each([
    ['cited.notANumber', { value: Number.NaN }],
    ['cited.notANumber', { value: Number.POSITIVE_INFINITY }],
    ['cited.notANumber', { value: '72' }],
    ['cited.notANumber', { value: undefined }],
    ['cited.noUnit', { unit: '' }],
    ['cited.noUnit', { unit: '  ' }],
    ['cited.noUnit', { unit: undefined }],
    ['cited.noLocator', { locator: '' }],
    ['cited.noLocator', { locator: undefined }],
    ['cited.unknownReading', { howRead: 'guessed' }],
    ['cited.unknownReading', { howRead: undefined }],
    ['cited.unknownSource', { sourceKey: 'nobody1900' }],
    ['cited.unknownSource', { sourceKey: 'toString' }],
    ['cited.unknownSource', { sourceKey: undefined }],
  ])('refuses with %s: %o', (code, wrong) => {
    const draft = { ...good, ...wrong } as Parameters<typeof cited>[0]
    expect(() => cited(draft)).toThrow(UncitedNumberError)
    expect(() => cited(draft)).toThrow(expect.objectContaining({ code, name: 'UncitedNumberError' }))
  })

  it('cannot be imitated', () => {
    expect(isCited(cited(good))).toBe(true)
    expect(isCited({ ...good })).toBe(false)
    expect(isCited({ ...cited(good) })).toBe(false)
    expect(isCited(null)).toBe(false)
    expect(isCited(72)).toBe(false)
    expectTypeOf(good).not.toExtend<Cited>()
  })
})

describe('citedRange', () => {
  const range = { low: 45, high: 80, unit: 'g', sourceKey: 'memory', locator: 'adults', howRead: 'memory' } as const

  it('keeps both ends with their source', () => {
    expect(citedRange(range)).toEqual(range)
    expect(isCited(citedRange({ ...range, low: 80 }))).toBe(true)
  })
  it('refuses a range that is upside down or open', () => {
    expect(() => citedRange({ ...range, low: 81 })).toThrow(expect.objectContaining({ code: 'cited.rangeReversed' }))
    expect(() => citedRange({ ...range, high: Number.POSITIVE_INFINITY })).toThrow(expect.objectContaining({ code: 'cited.notANumber' }))
    expect(() => citedRange({ ...range, unit: '' })).toThrow(expect.objectContaining({ code: 'cited.noUnit' }))
  })
})

describe('provenance', () => {
  it('is checked like a cited number, and frozen', () => {
    const { value: _, ...origin } = good
    expect(provenance(origin, '72')).toEqual(origin)
    expect(Object.isFrozen(provenance(origin, '72'))).toBe(true)
    expect(() => provenance({ ...origin, sourceKey: 'nobody1900' }, '72')).toThrow(expect.objectContaining({ code: 'cited.unknownSource', message: expect.stringContaining('72 h') }))
  })
})
