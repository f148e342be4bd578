import { registerEndpoint } from '@nuxt/test-utils/runtime'
import { createError, getQuery } from 'h3'
import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import { useReferenceStore } from '~/stores/reference'
import { useRegimensStore } from '~/stores/regimens'

let calls = 0
let down = false
registerEndpoint('/api/reference/species', () => {
  calls += 1
  if (down) throw createError({ statusCode: 500 })
  return { edition: '2026-12', items: [{ id: 'sp-leopard-gecko', commonName: 'Leopard gecko' }, { id: 'sp-corn-snake', commonName: 'Corn snake' }] }
})
registerEndpoint('/api/regimens', event => getQuery(event).of === 'browser' ? { items: [{ id: 'abc', version: 1 }] } : { items: [] })
registerEndpoint('/api/regimens/abc/take', { method: 'POST', handler: () => ({ id: 'team1' }) })
registerEndpoint('/api/regimens/abc/check', { method: 'POST', handler: () => ({ state: 'checked' }) })
registerEndpoint('/api/sheets/abc', event => ({ answer: getQuery(event), sheet: null, planId: null }))
registerEndpoint('/api/regimens/abc', (event) => {
  const { key, version } = getQuery(event)
  if (key === 'wrong') throw createError({ statusCode: 404, data: { code: 'regimen.notFound', message: 'There is no plan behind this link.' } })
  return { id: 'abc', version: Number(version ?? 3), asked: { key, version } }
})

beforeEach(() => {
  setActivePinia(createPinia())
  calls = 0
  down = false
})

describe('the reference store', () => {
  it('loads a list once and finds by id', async () => {
    const reference = useReferenceStore()
    await reference.loadSpecies()
    await reference.loadSpecies()
    expect(calls).toBe(1)
    expect(reference.edition).toBe('2026-12')
    expect(reference.speciesById.get('sp-corn-snake')?.commonName).toBe('Corn snake')
    expect(reference.failed).toBe(false)
  })

  it('says that it failed, and tries again when asked again', async () => {
    const reference = useReferenceStore()
    down = true
    await reference.loadSpecies()
    expect(reference.failed).toBe(true)
    expect(reference.species).toEqual([])
    down = false
    await reference.loadSpecies()
    expect(reference.failed).toBe(false)
    expect(reference.species).toHaveLength(2)
  })

  it('of one person is not the store of another', async () => {
    await useReferenceStore().loadSpecies()
    setActivePinia(createPinia())
    expect(useReferenceStore().species).toEqual([])
  })
})

describe('the store of saved plans', () => {
  it('lists what this browser remembers', async () => {
    const regimens = useRegimensStore()
    await regimens.loadRemembered()
    expect(regimens.remembered).toEqual([{ id: 'abc', version: 1 }])
    expect(regimens.loading).toBe(false)
  })

  it('opens a plan by its key and version, or without either', async () => {
    const regimens = useRegimensStore()
    await regimens.load('abc', 'k', 2)
    expect(regimens.saved).toMatchObject({ version: 2, asked: { key: 'k', version: '2' } })
    await regimens.load('abc', null)
    expect(regimens.saved).toMatchObject({ version: 3, asked: {} })
  })

  it('shows no plan of before when one cannot be opened', async () => {
    const regimens = useRegimensStore()
    await regimens.load('abc', 'k')
    await regimens.load('abc', 'wrong')
    expect(regimens.saved).toBeNull()
    expect(regimens.problem).toMatchObject({ code: 'regimen.notFound' })
    await regimens.load('abc', 'k')
    expect(regimens.problem).toBeNull()
  })

  it('keeps the plan on the screen and its life together', async () => {
    const regimens = useRegimensStore()
    await regimens.load('abc', null)
    await regimens.takeStep('abc', 'check', { version: 3, note: '' })
    expect(regimens.saved).toMatchObject({ version: 3, team: { state: 'checked' } })
    regimens.takeTeam('other', { state: 'stopped' } as never)
    expect(regimens.saved!.team!.state).toBe('checked')
  })

  it('takes a guest\'s plan into the team', async () => expect(await useRegimensStore().takeIn('abc')).toBe('team1'))

  it('looks a sheet up by its code, or by who asks', async () => {
    const regimens = useRegimensStore()
    await regimens.loadSheet('abc', 2, 'c0de')
    expect(regimens.sheet!.answer).toEqual({ version: '2', code: 'c0de' })
    await regimens.loadSheet('abc', null, null)
    expect(regimens.sheet!.answer).toEqual({})
  })
})
