/** Saltings Rescue: an invented team, for the demonstration only. */
import type { RegimenInput } from '#shared/schemas/regimen'
import type { LifeStep } from '#shared/types/planLife'
import type { Role } from '#shared/utils/abilities'

export const HOURS = { from: '07:30', to: '20:30' }
export const CONTACTS = [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }, { role: 'Out of hours', phone: '00 5550 0199' }]

export const DEMO_PEOPLE: { name: string, email: string, role: Role, registration?: string }[] = [
  { name: 'Ines Carvalho', email: 'ines@saltings.example', role: 'coordinator' },
  { name: 'Dr Amara Osei', email: 'amara@saltings.example', role: 'vet', registration: 'Register of vets, no. 00-4821 (invented)' },
  { name: 'Tove Brandt', email: 'tove@saltings.example', role: 'technician' },
  { name: 'Mara Linde', email: 'mara@saltings.example', role: 'keeper' },
  { name: 'Joss Tait', email: 'joss@saltings.example', role: 'carer' },
]

const base = (animal: RegimenInput['animal'], changes: Partial<RegimenInput> = {}): Omit<RegimenInput, 'startAt'> =>
  ({ animal, feed: { feedId: 'demo-omnivore-slurry' }, route: 'syringe', feedingHours: HOURS, timeZone: 'Europe/London', ...changes })

/** Who did what to each plan, hours ago. `again` saves a new version with another weight. */
export interface DemoPlan {
  input: Omit<RegimenInput, 'startAt'>
  by: string
  hoursAgo: number
  steps: { hoursAgo: number, by: string, step?: LifeStep, text?: string, weightG?: number, note?: string }[]
}

export const DEMO_PLANS: DemoPlan[] = [
  {
    input: base({ name: 'Juniper', caseNumber: '26-041', enclosure: 'Warm room, tank 4', speciesId: 'sp-bearded-dragon', weightG: 182, scaleStepG: 1, lengthMm: 195, bodyConditionScore: 1, drynessPercent: 8, bodyTemperatureC: 36, daysUnfed: 24, lifeStage: 'adult', signs: ['mouth-and-swallow-checked'] }),
    by: 'mara', hoursAgo: 30,
    steps: [{ hoursAgo: 29, by: 'mara', step: 'ask-check' }, { hoursAgo: 28, by: 'tove', step: 'check' }, { hoursAgo: 28, by: 'tove', step: 'ask-approval' }, { hoursAgo: 26, by: 'amara', step: 'approve', text: 'Watch the droppings on the first day.' }, { hoursAgo: 25, by: 'mara', step: 'use' }],
  },
  {
    input: base({ name: 'Pebble', caseNumber: '26-044', enclosure: 'Night room, tub 2', speciesId: 'sp-leopard-gecko', weightG: 22, scaleStepG: 0.1, bodyConditionScore: 2, drynessPercent: 5, bodyTemperatureC: 29, daysUnfed: 40, lifeStage: 'adult', signs: ['mouth-and-swallow-checked'] }, { feed: { feedId: 'demo-insectivore-slurry' }, feedingHours: { from: '18:00', to: '23:30' } }),
    by: 'mara', hoursAgo: 50,
    steps: [{ hoursAgo: 49, by: 'tove', step: 'check' }, { hoursAgo: 48, by: 'amara', step: 'approve' }, { hoursAgo: 47, by: 'mara', step: 'use' }, { hoursAgo: 5, by: 'mara', weightG: 23.4, note: 'Weighed again, up a little.' }, { hoursAgo: 4, by: 'mara', step: 'ask-check' }],
  },
  {
    input: base({ name: 'Oak', caseNumber: '26-038', enclosure: 'Snake room, vivarium 3', speciesId: 'sp-corn-snake', weightG: 310, scaleStepG: 1, bodyConditionScore: 2, drynessPercent: 4, bodyTemperatureC: 28, daysUnfed: 60, lifeStage: 'adult', signs: ['mouth-and-swallow-checked'] }, { feed: { feedId: 'demo-insectivore-slurry' } }),
    by: 'tove', hoursAgo: 8,
    steps: [{ hoursAgo: 7, by: 'amara', step: 'check' }, { hoursAgo: 6, by: 'tove', step: 'ask-approval' }],
  },
  {
    input: base({ name: 'Bracken', caseNumber: '26-046', enclosure: 'Warm room, tank 7', speciesId: 'sp-t-hermanni', weightG: 640, scaleStepG: 1, bodyConditionScore: 2, drynessPercent: 6, bodyTemperatureC: 30, daysUnfed: 30, lifeStage: 'adult', signs: [] }, { feed: { feedId: 'demo-herbivore-slurry' } }),
    by: 'mara', hoursAgo: 3, steps: [],
  },
  {
    input: base({ name: 'Sorrel', caseNumber: '26-029', enclosure: 'Warm room, tank 2', speciesId: 'sp-crested-gecko', weightG: 31, scaleStepG: 0.1, bodyConditionScore: 2, drynessPercent: 3, bodyTemperatureC: 25, daysUnfed: 15, lifeStage: 'adult', signs: ['mouth-and-swallow-checked'] }),
    by: 'mara', hoursAgo: 24 * 12,
    steps: [{ hoursAgo: 24 * 12 - 2, by: 'tove', step: 'check' }, { hoursAgo: 24 * 12 - 4, by: 'amara', step: 'approve' }, { hoursAgo: 24 * 12 - 5, by: 'mara', step: 'use' }, { hoursAgo: 20, by: 'mara', step: 'finish', text: 'Eats on its own for three days.' }],
  },
]
