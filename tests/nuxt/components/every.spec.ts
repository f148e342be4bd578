import { mountSuspended } from '@nuxt/test-utils/runtime'
import type { Component } from 'vue'
import { beforeEach, describe, expect, it } from 'vitest'
import PlanAlternatives from '~/components/plan/PlanAlternatives.vue'
import PlanAmount from '~/components/plan/PlanAmount.vue'
import PlanBarrel from '~/components/plan/PlanBarrel.vue'
import PlanCondition from '~/components/plan/PlanCondition.vue'
import PlanDayTable from '~/components/plan/PlanDayTable.vue'
import PlanFluids from '~/components/plan/PlanFluids.vue'
import PlanGiving from '~/components/plan/PlanGiving.vue'
import PlanFindings from '~/components/plan/PlanFindings.vue'
import PlanGateBand from '~/components/plan/PlanGateBand.vue'
import PlanKeyFigures from '~/components/plan/PlanKeyFigures.vue'
import PlanMixing from '~/components/plan/PlanMixing.vue'
import PlanSheet from '~/components/plan/PlanSheet.vue'
import PlanStaircase from '~/components/plan/PlanStaircase.vue'
import PlanWorking from '~/components/plan/PlanWorking.vue'
import SourceMark from '~/components/plan/SourceMark.vue'
import ConditionPicture from '~/components/planner/ConditionPicture.vue'
import ConditionScore from '~/components/planner/ConditionScore.vue'
import PlannerAnimal from '~/components/planner/PlannerAnimal.vue'
import PlannerCondition from '~/components/planner/PlannerCondition.vue'
import PlannerFeed from '~/components/planner/PlannerFeed.vue'
import PlannerForm from '~/components/planner/PlannerForm.vue'
import PlannerHouse from '~/components/planner/PlannerHouse.vue'
import SpeciesPicker from '~/components/planner/SpeciesPicker.vue'
import TapePicture from '~/components/planner/TapePicture.vue'
import PrintChoices from '~/components/print/PrintChoices.vue'
import EquationCard from '~/components/reference/EquationCard.vue'
import ReportNumber from '~/components/reference/ReportNumber.vue'
import SpeciesCard from '~/components/reference/SpeciesCard.vue'
import UiChoice from '~/components/ui/UiChoice.vue'
import UiDisclosure from '~/components/ui/UiDisclosure.vue'
import UiField from '~/components/ui/UiField.vue'
import UiQuantity from '~/components/ui/UiQuantity.vue'
import UiSelect from '~/components/ui/UiSelect.vue'
import UiText from '~/components/ui/UiText.vue'
import { formatDay } from '#shared/utils/calendar'
import { formatNumber } from '#shared/utils/quantity'
import { buildPlan } from '#server/utils/plan/buildPlan'
import { currentEdition } from '#server/utils/reference'
import { regimenInput } from '../../unit/plan/inputs'
import { slipsOf } from '../structure'

const edition = currentEdition()
const plan = buildPlan(regimenInput({ animal: { lengthMm: 110 } }), edition)
const PLANS = {
  'a gecko': plan,
  'a gate closed by a sign': buildPlan(regimenInput({ animal: { signs: ['convulsing'] } }), edition),
  'a meal too small to measure': buildPlan(regimenInput({ animal: { speciesId: 'sp-green-anole', weightG: 2, bodyTemperatureC: 28 } }), edition),
  'a snake': buildPlan(regimenInput({ animal: { speciesId: 'sp-corn-snake', weightG: 300, bodyTemperatureC: 28 } }), edition),
}
const options = [{ value: 'a', label: 'One' }, { value: 'b', label: 'Other' }]
const slots = { default: () => 'inside' }

/** Every component with something true to show. */
const CASES: [string, Component, Record<string, unknown>?, Record<string, unknown>?][] = [
  ...Object.entries(PLANS).flatMap(([name, one]): [string, Component, Record<string, unknown>][] => [
    [`PlanSheet, ${name}`, PlanSheet, { plan: one, badge: 'Draft' }],
    [`PlanStaircase, ${name}`, PlanStaircase, { plan: one }],
    [`PlanAmount, ${name}`, PlanAmount, { plan: one }],
    [`PlanDayTable, ${name}`, PlanDayTable, { plan: one }],
  ]),
  ['PlanAlternatives', PlanAlternatives, { plan }],
  ['PlanBarrel', PlanBarrel, { syringe: { capacityMl: 1, stepMl: 0.01 }, markMl: 0.4 }],
  ['PlanCondition', PlanCondition, { plan }],
  ['PlanFindings', PlanFindings, { findings: plan.findings, heading: 'Before the first feed' }],
  ['PlanGateBand', PlanGateBand, { gate: plan.gate }],
  ['PlanKeyFigures', PlanKeyFigures, { plan }],
  ['PlanFluids', PlanFluids, { plan }],
  ['PlanGiving', PlanGiving, { plan }],
  ['PlanMixing', PlanMixing, { plan }],
  ['PlanWorking', PlanWorking, { steps: plan.energy.steps, sourceKey: 'andrews1985' }],
  ['SourceMark', SourceMark, { sourceKey: 'house-rule' }],
  ...(['lizard', 'snake', 'chelonian', 'bird-other', 'mammal-placental', 'amphibian-anuran'] as const).map((group): [string, Component, Record<string, unknown>] => [`ConditionPicture, ${group}`, ConditionPicture, { group, score: 1 }]),
  ...(['lizard', 'snake', 'chelonian', 'amphibian-anuran'] as const).map((group): [string, Component, Record<string, unknown>] => [`TapePicture, ${group}`, TapePicture, { group, measure: group === 'chelonian' ? 'carapace' : 'snout-vent' }]),
  ['ConditionScore', ConditionScore, { group: 'lizard', modelValue: 2 }],
  ['PlannerAnimal', PlannerAnimal], ['PlannerCondition', PlannerCondition], ['PlannerFeed', PlannerFeed], ['PlannerHouse', PlannerHouse], ['PlannerForm', PlannerForm],
  ['SpeciesPicker', SpeciesPicker, { species: [...edition.species.values()], modelValue: '' }],
  ['PrintChoices', PrintChoices, { plan, saved: { id: 'abc', key: 'k', version: 1 } }],
  ['EquationCard', EquationCard, { equation: edition.equations.get('andrews-pough-1985') }],
  ['ReportNumber', ReportNumber],
  ['SpeciesCard', SpeciesCard, { species: edition.species.get('sp-leopard-gecko') }],
  ['UiChoice', UiChoice, { legend: 'Which', options, modelValue: 'a' }],
  ['UiDisclosure', UiDisclosure, { summary: 'More' }, slots],
  ['UiField', UiField, { label: 'Weight', hint: 'in g' }, { default: ({ id, described }: { id: string, described: string }) => h('input', { id, 'aria-describedby': described }) }],
  ['UiQuantity', UiQuantity, { label: 'Weight', units: ['g', 'kg'], unitLabels: { g: 'g', kg: 'kg' }, modelValue: { text: '10', unit: 'g' } }],
  ['UiSelect', UiSelect, { label: 'Paper', options, modelValue: 'a' }],
  ['UiText', UiText, { label: 'Name', modelValue: 'Pebble', hint: 'as on the tub', error: 'Too long.' }],
]

beforeEach(() => {
  const reference = useReferenceStore()
  reference.species = [...edition.species.values()]
  reference.foods = [...edition.foods.values()]
})

describe('every component', () => {
  it.each(CASES)('%s can be used without sight or mouse', async (_, component, props, given) => {
    const mounted = await mountSuspended(component, { props, slots: given as never })
    const root = document.createElement('div')
    root.innerHTML = mounted.html()
    expect(root.textContent!.length + root.querySelectorAll('svg').length).toBeGreaterThan(0)
    expect(slipsOf(root)).toEqual([])
  })
  it('would not pass with a slip', () => {
    const root = document.createElement('div')
    root.innerHTML = '<input id="a"><svg></svg><button></button><table><th>x</th></table><p id="a" aria-describedby="b"></p>'
    expect(slipsOf(root).length).toBe(6)
  })
})

describe('the species picker', () => {
  const mountPicker = () => mountSuspended(SpeciesPicker, { props: { species: [...edition.species.values()], modelValue: '' } })
  it('finds by scientific name and takes with the keyboard', async () => {
    const picker = await mountPicker()
    const field = picker.get('input')
    await field.trigger('focus')
    await field.setValue('eublepharis')
    expect(picker.findAll('[role="option"]')).toHaveLength(1)
    expect(field.attributes('aria-activedescendant')).toBe(picker.get('[role="option"]').attributes('id'))
    await field.trigger('keydown', { key: 'Enter' })
    expect(picker.emitted('update:modelValue')).toEqual([['sp-leopard-gecko']])
  })
  it('moves with the arrows and closes with Escape', async () => {
    const picker = await mountPicker()
    const field = picker.get('input')
    await field.trigger('focus')
    await field.setValue('gecko')
    await field.trigger('keydown', { key: 'ArrowDown' })
    expect(picker.findAll('[role="option"]')[1]!.attributes('aria-selected')).toBe('true')
    await field.trigger('keydown', { key: 'Escape' })
    expect(field.attributes('aria-expanded')).toBe('false')
  })
  it('keeps "not in the list" at the end of each group', async () => {
    const picker = await mountPicker()
    await picker.get('input').trigger('focus')
    const lizards = picker.findAll('[role="option"]').map(one => one.text()).slice(0, [...edition.species.values()].filter(one => one.group === 'lizard').length)
    expect(lizards.at(-1)).toBe(edition.species.get('sp-other-lizard')!.commonName)
  })
})

describe('the staircase', () => {
  it.each(['a gecko', 'a snake'] as const)('of %s has a column for each day before food and each step after, and says it in words', async (name) => {
    const plan = PLANS[name]
    const stairs = await mountSuspended(PlanStaircase, { props: { plan } })
    const before = plan.days.filter(day => day.stage === 'warm' || day.stage === 'fluids').length
    expect(stairs.findAll('svg > svg')).toHaveLength(before + plan.ramp.steps.length)
    for (const step of plan.ramp.steps) expect(stairs.get('figcaption').text()).toContain(`${Math.round(step.fraction * 100)}`)
  })
})

describe('a page opened days later', () => {
  const later = plan.days.filter(day => day.feeds.length > 0)[2]!
  it('shows the amount of that day, not of the first', async () => {
    const amount = await mountSuspended(PlanAmount, { props: { plan, today: later.date } })
    expect(amount.text()).toContain('Each feed today')
    expect(amount.get('strong').text()).toBe(formatNumber(later.feeds[0]!.volumeMl, 3))
    const table = await mountSuspended(PlanDayTable, { props: { plan, today: later.date } })
    expect(table.findAll('tbody tr').find(row => row.text().includes('today'))!.text()).toContain(formatDay(later.date))
  })
  it('offers no amount as due once the weight is too old', async () => {
    const amount = await mountSuspended(PlanAmount, { props: { plan, today: later.date, held: true } })
    expect(amount.text()).toContain('Only once the reasons above are gone')
    expect(amount.text()).not.toContain('Each feed today')
  })
})

describe('the key figures', () => {
  it('open one working at a time, each named for its figure', async () => {
    const figures = await mountSuspended(PlanKeyFigures, { props: { plan } })
    const [energy, water] = figures.findAll('button')
    await energy!.trigger('click')
    expect(figures.text()).toContain(plan.energy.steps[0]!.label)
    await water!.trigger('click')
    expect(figures.text()).toContain(plan.fluids.steps[0]!.label)
    expect(figures.text()).not.toContain(plan.energy.steps[0]!.label)
    expect(figures.findAll('button').map(one => one.attributes('aria-expanded'))).toEqual(['false', 'true', 'false', 'false'])
    expect(energy!.text()).toContain('Energy at full meals')
  })
})

describe('the house', () => {
  it('adds and takes away syringes, and keeps one', async () => {
    const planner = usePlannerStore()
    planner.startOver()
    const house = await mountSuspended(PlannerHouse)
    const count = planner.draft.syringes.length
    await house.findAll('button').find(one => one.text() === 'Add a syringe')!.trigger('click')
    expect(planner.draft.syringes).toHaveLength(count + 1)
    planner.draft.syringes = planner.draft.syringes.slice(0, 1)
    await nextTick()
    expect(house.get('button[aria-label^="Take syringe 1"]').attributes('disabled')).toBeDefined()
  })
})

describe('printing a saved plan', () => {
  it('goes to addresses with key, version, days and paper', async () => {
    const print = await mountSuspended(PrintChoices, { props: { plan, saved: { id: 'abc', key: 'a/b+c', version: 2 } } })
    const [sheet] = print.findAll('a')
    const url = new URL(sheet!.attributes('href')!, 'http://localhost')
    expect(url.pathname).toBe('/api/regimens/abc/sheet.pdf')
    expect(Object.fromEntries(url.searchParams)).toMatchObject({ key: 'a/b+c', version: '2', paper: 'a4' })
    expect(url.searchParams.get('days')).toMatch(/^\d+-\d+$/)
  })
})

describe('the source of a number', () => {
  it.each([['house-rule', undefined, 'house rule'], ['memory', undefined, 'from memory'], ['meiri2018', 'restated', 'restated elsewhere'], ['demo', undefined, 'demo, invented']] as const)('%s %s says "%s"', async (sourceKey, howRead, words) => {
    expect((await mountSuspended(SourceMark, { props: { sourceKey, howRead } })).text()).toContain(words)
  })
})
