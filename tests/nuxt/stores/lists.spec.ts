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
registerEndpoint('/api/regimens', () => ({ items: [{ id: 'abc', version: 1 }] }))
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
})
