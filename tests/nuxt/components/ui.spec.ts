import { mountSuspended } from '@nuxt/test-utils/runtime'
import { describe, expect, it } from 'vitest'
import UiChoice from '~/components/ui/UiChoice.vue'
import UiDisclosure from '~/components/ui/UiDisclosure.vue'
import UiQuantity from '~/components/ui/UiQuantity.vue'
import UiSelect from '~/components/ui/UiSelect.vue'
import UiText from '~/components/ui/UiText.vue'

// Generic over its units, which the mounting function has no words for.
const Quantity = UiQuantity as unknown as typeof UiText

describe('a field', () => {
  it.each([['UiText', UiText, { modelValue: '' }], ['UiSelect', UiSelect, { modelValue: 'a', options: [{ value: 'a', label: 'A' }] }], ['UiQuantity', Quantity, { modelValue: { text: '', unit: 'g' }, units: ['g', 'kg'], unitLabels: { g: 'g', kg: 'kg' } }]])('%s is tied to its label, its hint and its problem', async (_name, component, props) => {
    const field = await mountSuspended(component as typeof UiText, { props: { label: 'Weight', hint: 'On an empty scale.', error: 'Type a number.', ...props } as never })
    const control = field.get('input, select')
    expect(field.get('label').attributes('for')).toBe(control.attributes('id'))
    const described = control.attributes('aria-describedby')!.split(' ').map(id => field.get(`[id="${id}"]`).text())
    expect(described).toEqual(['On an empty scale.', 'Type a number.'])
    expect(control.attributes('aria-invalid')).toBe('true')
    expect(field.get('[role="alert"]').text()).toBe('Type a number.')
  })

  it('without hint or problem is described by nothing and invalid by nothing', async () => {
    const field = await mountSuspended(UiText, { props: { label: 'Name', modelValue: '' } })
    expect(field.get('input').attributes('aria-describedby')).toBeUndefined()
    expect(field.get('input').attributes('aria-invalid')).toBeUndefined()
    expect(field.find('[role="alert"]').exists()).toBe(false)
  })

  it('says when it is needed', async () => {
    const field = await mountSuspended(UiText, { props: { label: 'Weight', required: true, modelValue: '' } })
    expect(field.get('label').text()).toBe('Weight (needed)')
  })

  it('passes on what is typed', async () => {
    const field = await mountSuspended(UiText, { props: { label: 'Name', modelValue: '' } })
    await field.get('input').setValue('Pebble')
    expect(field.emitted('update:modelValue')).toEqual([['Pebble']])
  })
})

describe('UiQuantity', () => {
  const props = { label: 'Weight', modelValue: { text: '22', unit: 'g' }, units: ['g', 'lb'], unitLabels: { g: 'g', lb: 'lb' } } as const
  it('changes the number without the unit, and the unit without the number', async () => {
    const field = await mountSuspended(Quantity, { props: props as never })
    await field.get('input').setValue('23')
    await field.get('select').setValue('lb')
    expect(field.emitted('update:modelValue')).toEqual([[{ text: '23', unit: 'g' }], [{ text: '23', unit: 'lb' }]])
  })
  it('names its list of units, opens the keyboard for numbers and says the echo aloud', async () => {
    const field = await mountSuspended(Quantity, { props: { ...props, echo: '= 0.78 oz' } as never })
    expect(field.get('select').attributes('aria-label')).toBe('Unit of: Weight')
    expect(field.get('input').attributes('inputmode')).toBe('decimal')
    expect(field.get('[aria-live="polite"]').text()).toBe('= 0.78 oz')
  })
})

describe('UiChoice', () => {
  it('is one group of radio buttons with a legend', async () => {
    const choice = await mountSuspended(UiChoice, { props: { legend: 'Route', modelValue: 'syringe', options: [{ value: 'syringe', label: 'Syringe' }, { value: 'tube', label: 'Tube' }] } })
    expect(choice.get('fieldset > legend').text()).toBe('Route')
    const radios = choice.findAll('input[type="radio"]')
    expect(new Set(radios.map(radio => radio.attributes('name'))).size).toBe(1)
    expect(radios.map(radio => (radio.element as HTMLInputElement).checked)).toEqual([true, false])
    await radios[1]!.setValue()
    expect(choice.emitted('update:modelValue')).toEqual([['tube']])
  })
})

describe('UiDisclosure', () => {
  it('opens from its summary, without script', async () => {
    const disclosure = await mountSuspended(UiDisclosure, { props: { summary: 'How this was worked out' }, slots: { default: () => '78 × 0.022' } })
    expect(disclosure.get('details > summary').text()).toContain('How this was worked out')
    expect(disclosure.get('details').attributes('open')).toBeUndefined()
    expect(disclosure.text()).toContain('78 × 0.022')
  })
})
