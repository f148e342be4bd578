import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import UiTable from '~/components/ui/UiTable.vue'
import type UiText from '~/components/ui/UiText.vue'
import { slipsOf } from '../structure'

// Generic over its rows, which the mounting function has no words for.
const Table = UiTable as unknown as typeof UiText
const columns = [{ id: 'name', header: 'Name', sortable: true }, { id: 'weight', header: 'Weight', sortable: true, numeric: true }, { id: 'note', header: 'Note', wide: true }, { id: 'act', header: 'Change', bare: true }]
const rows = [{ id: 'a', name: 'Juniper', weight: 196, note: 'eats', act: '' }, { id: 'b', name: 'Pebble', weight: 22, note: '', act: '' }]
const props = { caption: 'Animals', columns, rows, total: 2, page: 1, pageSize: 25, sort: 'name', empty: 'No animal yet.' }
const mountTable = (changes: Record<string, unknown> = {}, slots: Record<string, unknown> = {}) => mountSuspended(Table, { props: { ...props, ...changes } as never, slots: slots as never })

describe('UiTable', () => {
  it.each([['as a table', {}], ['as cards', { cards: true }], ['empty', { rows: [], total: 0 }], ['with pages', { total: 60 }], ['with a row opened', { cards: true, opened: 'b' }]])('can be used without sight or mouse, %s', async (_, changes) => {
    const table = await mountTable(changes, { details: () => 'more' })
    const root = document.createElement('div')
    root.innerHTML = table.html()
    expect(slipsOf(root)).toEqual([])
  })
  it('heads each row with its first column, and fills cells from slots', async () => {
    const table = await mountTable({}, { weight: ({ row }: { row: { weight: number } }) => `${row.weight} g` })
    expect(table.findAll('tbody th[scope="row"]').map(one => one.text())).toEqual(['Juniper', 'Pebble'])
    expect(table.text()).toContain('196 g')
  })
  it('says how it is sorted, and turns it round', async () => {
    const table = await mountTable()
    const [name, weight] = table.findAll('thead th')
    expect([name!.attributes('aria-sort'), weight!.attributes('aria-sort')]).toEqual(['ascending', 'none'])
    await name!.get('button').trigger('click')
    await weight!.get('button').trigger('click')
    expect(table.emitted('sort')).toEqual([['-name'], ['-weight']])
    expect(table.findAll('thead th')[2]!.find('button').exists()).toBe(false)
  })
  it('pages, and goes no further than there is', async () => {
    const table = await mountTable({ total: 1260, page: 2 })
    const [before, next] = table.findAll('nav button')
    expect(table.get('nav').text()).toContain('26 to 27 of 1,260')
    await before!.trigger('click')
    await next!.trigger('click')
    expect(table.emitted('page')).toEqual([[1], [3]])
    const last = await mountTable({ total: 27, page: 2 })
    expect(last.findAll('nav button')[1]!.attributes('disabled')).toBeDefined()
  })
  it('leads back from a page that is no longer there', async () => {
    const table = await mountTable({ rows: [], total: 30, page: 9 })
    expect(table.get('nav').text()).toContain('Nothing on this page')
    await table.get('nav button').trigger('click')
    expect(table.emitted('page')).toEqual([[2]])
  })
  it('tells loading from empty', async () => {
    const loading = await mountTable({ rows: [], total: 0, loading: true })
    expect(loading.get('tbody').text()).toBe('Fetching…')
    expect(loading.get('[role="region"]').attributes('aria-busy')).toBe('true')
    const empty = await mountTable({ rows: [], total: 0 })
    expect(empty.get('tbody').text()).toBe('No animal yet.')
    expect(empty.get('[role="status"]').text()).toBe('No animal yet.')
  })
  it('on cards puts a label to each value, but not to buttons or the heading', async () => {
    const table = await mountTable({ cards: true })
    const first = table.findAll('tbody tr')[0]!
    expect(first.findAll('span.lg\\:hidden').map(one => one.text())).toEqual(['Weight', 'Note'])
  })
  it('opens the details of one row under it', async () => {
    const table = await mountTable({ opened: 'a' }, { details: ({ row }: { row: { name: string } }) => `More of ${row.name}` })
    expect(table.findAll('tbody tr').map(one => one.text())[1]).toBe('More of Juniper')
    expect(table.text()).not.toContain('More of Pebble')
  })
})
