import { describe, expect, it } from 'vitest'
import { RegimenInput } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import type { SpeciesItem } from '#shared/types/reference'
import { formatVolumeMl } from '#shared/utils/quantity'
import { buildPlan } from '../../../server/utils/plan/buildPlan'
import { labelPdf, mixingPdf, sheetPdf } from '../../../server/utils/print/index'
import { currentEdition } from '../../../server/utils/reference'
import { OPTIONS } from './fixtures'
import { collisions, plainOf, readPdf } from './readPdf'

const edition = currentEdition()
const everySpecies = [...edition.species.values()]

function planFor(species: SpeciesItem, bodyTemperatureC: number | undefined): Plan {
  const feed = [...edition.foods.values()].find(food => food.suits.includes(species.diet))!
  return buildPlan(RegimenInput.parse({
    animal: { name: 'Pebble', enclosure: 'Rack 2, tub 11', speciesId: species.id, weightG: Math.round((species.adultWeightG.low + species.adultWeightG.high) * 3.5) / 10, weighedOn: '2026-12-02', drynessPercent: 8, daysUnfed: 24, lifeStage: 'adult', bodyConditionScore: 1.5, signs: [], bodyTemperatureC },
    feed: { feedId: feed.id },
    route: 'syringe',
    feedingHours: { from: '07:30', to: '20:30' },
    startAt: '2026-12-02T18:00:00Z',
    timeZone: 'Europe/London',
  }), edition)
}

describe('a plan of every species', () => {
  it('is printed, whole, as a sheet, a mixing card and labels', async () => {
    expect(everySpecies.length).toBeGreaterThan(100)
    for (const species of everySpecies) {
      const plan = planFor(species, species.feedingTemperatureC.low + 1)
      for (const print of [sheetPdf, mixingPdf, labelPdf]) {
        expect((await print(plan, { ...OPTIONS, days: { from: 1, to: Math.min(4, plan.days.length) } })).length, species.id).toBeGreaterThan(5000)
      }
    }
  }, 60_000)

  it.each(everySpecies.filter((_, index) => index % 11 === 0).map(species => [species.id, species] as const))('says the plan\'s numbers: %s', async (_, species) => {
    const plan = planFor(species, species.feedingTemperatureC.low + 1)
    const days = { from: 1, to: Math.min(7, plan.days.length) }
    const { text, pages } = await readPdf(await sheetPdf(plan, { ...OPTIONS, days }))
    const ordered = plan.days.slice(0, days.to).filter(day => day.state === 'feed' && day.date <= plan.validity.goodUntil)
    for (const feed of ordered.flatMap(day => day.feeds)) expect(text).toContain(plainOf(`${feed.localTime} ${formatVolumeMl(feed.volumeMl)}`).replace('12:00', '12:00 noon'))
    expect(text.match(/ mL( \d × [\d.,]+ mL)? yes/g) ?? []).toHaveLength(ordered.flatMap(day => day.feeds).length)
    for (const sign of plan.stopSigns) expect(text).toContain(plainOf(sign))
    for (const { title } of plan.gate.findings) expect(text).toContain(plainOf(title))
    expect(pages.flatMap(collisions)).toEqual([])
  })

  it.each(everySpecies.filter((_, index) => index % 23 === 0).map(species => [species.id, species] as const))('is a sign without an amount when it is too cold: %s', async (_, species) => {
    const { text } = await readPdf(await sheetPdf(planFor(species, species.feedingTemperatureC.low - 3), OPTIONS))
    expect(text).toContain('DO NOT FEED')
    expect(text).not.toMatch(/\d mL/)
  })
})
