import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import PlanAmount from '~/components/plan/PlanAmount.vue'
import PlanBarrel from '~/components/plan/PlanBarrel.vue'
import PlanDayTable from '~/components/plan/PlanDayTable.vue'
import PlanFindings from '~/components/plan/PlanFindings.vue'
import PlanGateBand from '~/components/plan/PlanGateBand.vue'
import { formatVolumeMl, NBSP } from '#shared/utils/quantity'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { currentEdition } from '#server/utils/reference'
import { regimenInput } from '../../unit/plan/inputs'

const plan = buildPlan(regimenInput(), currentEdition())
const closed = buildPlan(regimenInput({ animal: { signs: ['unresponsive'] } }), currentEdition())
const written = (text: string) => text.replaceAll(NBSP, ' ').replace(/\s+/g, ' ')

describe('the band', () => {
  it.each([[plan], [closed]])('says the state in words and each reason', async ({ gate }) => {
    const band = await mountSuspended(PlanGateBand, { props: { gate } })
    expect(band.get('#gate-state').text()).toBe({ 'feed': 'FEED', 'wait': 'WAIT', 'do-not-feed': 'DO NOT FEED' }[gate.state])
    for (const finding of gate.findings) expect(band.text()).toContain(finding.message)
    expect(band.get('section').attributes('aria-live')).toBe('polite')
  })
  it('of a closed gate says that nothing goes in by mouth', async () => {
    expect(closed.gate.state).toBe('do-not-feed')
    expect((await mountSuspended(PlanGateBand, { props: { gate: closed.gate } })).text()).toContain('Nothing by mouth now')
  })
})

describe('the amount', () => {
  const feed = plan.days.find(day => day.feeds.length > 0)!.feeds[0]!
  it('is the plan\'s own, never rounded again', async () => {
    const amount = await mountSuspended(PlanAmount, { props: { plan } })
    expect(amount.get('strong').text()).toBe(String(feed.volumeMl))
    expect(written(amount.text())).toContain(`${feed.volumeMl} mL`)
  })
  it('behind a closed gate is not offered as due', async () => {
    const text = written((await mountSuspended(PlanAmount, { props: { plan: closed } })).text())
    if (closed.days.some(day => day.feeds.length > 0)) expect(text).toContain('Only once the reasons above are gone')
    else expect(text).toContain('No amount is planned')
    expect(text).not.toContain('First meal ')
  })
})

describe('the barrel', () => {
  it.each([[1, 0.01, 0.35], [3, 0.1, 1.2], [60, 1, 34], [0.5, 0.01, 0.05]])('of %d mL says its mark and numbers its scale', async (capacityMl, stepMl, markMl) => {
    const barrel = await mountSuspended(PlanBarrel, { props: { syringe: { capacityMl, stepMl }, markMl } })
    expect(barrel.get('svg').attributes('role')).toBe('img')
    expect(barrel.get('svg').attributes('aria-label')).toBe(`A ${capacityMl} mL syringe drawn up to ${formatVolumeMl(markMl)}`)
    const numbers = barrel.findAll('text').map(text => Number(text.text()))
    expect(numbers[0]).toBe(0)
    expect(numbers.at(-1)).toBe(capacityMl)
    expect([...numbers].sort((a, b) => a - b)).toEqual(numbers)
    // The fill reaches as far along the barrel as the mark along the scale.
    const [, fill] = barrel.findAll('rect')
    expect(Number(fill!.attributes('width')) / 360).toBeCloseTo(markMl / capacityMl, 9)
  })
})

describe('findings', () => {
  it('show what is loud, and fold away what is only a note', async () => {
    const findings = [
      { code: 'a.note', level: 'note' as const, title: 'A note', message: 'Read this later.' },
      { code: 'a.caution', level: 'caution' as const, title: 'A caution', message: 'Mind this.', sourceKey: 'house-rule' },
    ]
    const list = await mountSuspended(PlanFindings, { props: { findings, heading: 'Before you feed' } })
    expect(list.get('section').attributes('aria-label')).toBe('Before you feed')
    expect(list.get('section > ul').text()).toContain('Take care')
    expect(list.get('section > ul').text()).not.toContain('Read this later.')
    expect(list.get('details').attributes('open')).toBeUndefined()
    expect(list.get('a').attributes('href')).toBe('/sources#house-rule')
    expect(list.get('a').text()).toBe('house rule')
  })
  it('are nothing at all when there are none', async () => {
    expect((await mountSuspended(PlanFindings, { props: { findings: [], heading: 'x' } })).find('section').exists()).toBe(false)
  })
})

describe('the table of days', () => {
  it('has a row for each day with the plan\'s own volumes and times', async () => {
    const table = await mountSuspended(PlanDayTable, { props: { plan } })
    const rows = table.findAll('tbody tr').filter(row => row.find('th[scope="row"]').exists())
    expect(rows).toHaveLength(Math.min(14, plan.days.length))
    rows.forEach((row, at) => {
      const day = plan.days[at]!
      for (const feed of day.feeds) expect(row.text()).toContain(feed.localTime)
      if (day.feeds[0]) expect(row.text()).toContain(`${day.feeds.length} × ${formatVolumeMl(day.feeds[0].volumeMl)}`)
    })
    for (const head of table.findAll('thead th')) expect(head.attributes('scope')).toBe('col')
  })

  it('says from when the weight is too old, between the last day it holds and the next', async () => {
    const table = await mountSuspended(PlanDayTable, { props: { plan } })
    const at = plan.days.findIndex(day => day.date > plan.validity.goodUntil)
    expect(at).toBeGreaterThan(0)
    const rows = table.findAll('tbody tr')
    expect(rows[at]!.text()).toContain('Weigh it and plan again')
    expect(rows.filter(row => row.text().includes('Weigh it and plan again'))).toHaveLength(1)
  })
})
