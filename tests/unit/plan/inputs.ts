import type { RegimenInput } from '#shared/schemas/regimen'

type Change = Partial<Omit<RegimenInput, 'animal'>> & { animal?: Partial<RegimenInput['animal']> }

/** A gecko from our own demo world: thin, dry, warm enough. */
export function regimenInput(change: Change = {}): RegimenInput {
  const { animal, ...rest } = change
  return {
    feed: { feedId: 'demo-insectivore-slurry' },
    route: 'syringe',
    feedingHours: { from: '07:30', to: '20:30' },
    startAt: '2026-12-02T09:00:00Z',
    timeZone: 'Europe/London',
    ...rest,
    animal: {
      name: 'Pebble',
      speciesId: 'sp-leopard-gecko',
      weightG: 22,
      drynessPercent: 8,
      bodyTemperatureC: 29,
      daysUnfed: 30,
      lifeStage: 'adult',
      signs: [],
      ...animal,
    },
  }
}
