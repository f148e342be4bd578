import type { RegimenInput } from '#shared/schemas/regimen'
import { newLinkKey } from '../utils/access/linkKey'
import { GUEST } from '../utils/data/auditRows'
import { insertRegimen } from '../utils/data/regimenRows'
import { buildPlan } from '../utils/plan/buildPlan'
import { currentEdition } from '../utils/reference'
import type { Db } from './client'
import { regimens } from './schema'
import { CONTACTS, HOURS } from './seed.data'

/** Invented animals that anyone may look at, signed in or not. */
const SHOWN: { id: string, input: Omit<RegimenInput, 'startAt'> }[] = [
  {
    id: 'demojuniper',
    input: {
      animal: { name: 'Juniper', caseNumber: '26-041', enclosure: 'Warm room, tank 4', speciesId: 'sp-bearded-dragon', weightG: 182, scaleStepG: 1, lengthMm: 195, bodyConditionScore: 1, drynessPercent: 8, bodyTemperatureC: 36, daysUnfed: 24, lifeStage: 'adult', signs: ['mouth-and-swallow-checked'] },
      feed: { feedId: 'demo-omnivore-slurry' },
      route: 'syringe',
      feedingHours: HOURS,
      timeZone: 'Europe/London',
      contacts: CONTACTS,
      teamName: 'Saltings Rescue',
    },
  },
  {
    id: 'demopebble2',
    input: {
      animal: { name: 'Pebble', caseNumber: '26-044', enclosure: 'Night room, tub 2', speciesId: 'sp-leopard-gecko', weightG: 22, scaleStepG: 0.1, bodyConditionScore: 2, drynessPercent: 5, bodyTemperatureC: 24, daysUnfed: 40, lifeStage: 'adult', signs: [] },
      feed: { feedId: 'demo-insectivore-slurry' },
      route: 'syringe',
      feedingHours: { from: '18:00', to: '23:30' },
      timeZone: 'Europe/London',
      contacts: CONTACTS,
      teamName: 'Saltings Rescue',
    },
  },
]

/** Adds the demo plans to a database that holds no plan yet. @returns whether it did. */
export function seedDemo(db: Db, now = new Date()): boolean {
  if (db.select({ id: regimens.id }).from(regimens).limit(1).get()) return false
  const at = now.toISOString()
  for (const { id, input } of SHOWN) {
    const whole: RegimenInput = { ...input, startAt: at }
    const { keyHash, linkExpiresAt } = newLinkKey(now)
    insertRegimen(db, { id, keyHash, linkExpiresAt, demo: true, actor: { ...GUEST, id: 'demo' }, at, input: whole, plan: buildPlan(whole, currentEdition()) })
  }
  return true
}
