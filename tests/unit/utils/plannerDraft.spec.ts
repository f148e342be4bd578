import { afterEach, describe, expect, it } from 'vitest'
import { RegimenInput } from '../../../shared/schemas/regimen'
import { draftOfInput, emptyDraft, inputOfDraft, localOf, nextDraft, startIsOld, stillNeeded, type PlannerDraft } from '../../../utils/plannerDraft'
import { regimenInput } from '../plan/inputs'

function filled(change: Partial<PlannerDraft> = {}): PlannerDraft {
  return { ...emptyDraft(), speciesId: 'sp-leopard-gecko', weight: { text: '22', unit: 'g' }, dryness: '8', daysUnfed: '30', startAt: '2026-12-02T09:00', timeZone: 'Europe/London', ...change }
}

describe('stillNeeded', () => {
  it('lists what is missing in the order of the form, and nothing once it is there', () => {
    expect(stillNeeded(emptyDraft())).toEqual(['its species', 'its weight', 'how dry it is', 'the days without a proper meal', 'the start'])
    expect(stillNeeded(filled())).toEqual([])
  })
  it.each(['', 'heavy', '1,250'])('misses a weight that is written %j', text => expect(stillNeeded(filled({ weight: { text, unit: 'g' } }))).toEqual(['its weight']))
})

describe('inputOfDraft', () => {
  it('makes an input that the server takes', () => {
    const { input, issues } = inputOfDraft(filled())
    expect(issues).toEqual([])
    expect(RegimenInput.safeParse(input).success).toBe(true)
    expect(input.animal).toMatchObject({ speciesId: 'sp-leopard-gecko', weightG: 22, drynessPercent: 8, daysUnfed: 30 })
  })

  it.each([['g', 22], ['kg', 22_000], ['oz', 623.69], ['lb', 9979.032]] as const)('turns 22 %s into %d g', (unit, grams) => {
    expect(inputOfDraft(filled({ weight: { text: '22', unit } })).input.animal.weightG).toBe(grams)
  })

  it('sends what was left empty as nothing, never as nought', () => {
    const { animal, ...rest } = inputOfDraft(filled()).input
    for (const field of ['lengthMm', 'bodyTemperatureC', 'healthyWeightG', 'bodyConditionScore', 'scaleStepG', 'weighedOn', 'name'] as const) expect(animal[field]).toBeUndefined()
    for (const field of ['feedsPerDay', 'kitchenScaleStepG', 'flushMl', 'teamName', 'contacts', 'overrides'] as const) expect(rest[field]).toBeUndefined()
  })

  it.each<[Partial<PlannerDraft>, string]>([
    [{ length: { text: 'long', unit: 'cm' } }, 'animal.lengthMm'],
    [{ temperature: { text: 'warm', unit: 'degC' } }, 'animal.bodyTemperatureC'],
    [{ healthyWeight: { text: '1,250', unit: 'g' } }, 'animal.healthyWeightG'],
    [{ weight: { text: '1,250', unit: 'g' } }, 'animal.weightG'],
    [{ dryness: 'very' }, 'animal.drynessPercent'],
    [{ daysUnfed: 'many' }, 'animal.daysUnfed'],
    [{ scaleStep: 'fine' }, 'animal.scaleStepG'],
    [{ feedsPerDay: 'few' }, 'feedsPerDay'],
    [{ syringes: [{ capacity: 'big', step: '0.1' }] }, 'syringes.0.capacityMl'],
    [{ fractions: '10 twenty' }, 'overrides.fractions.1'],
    [{ feedMode: 'energy', own: { ...emptyDraft().own, energy: 'rich' } }, 'feed.energyKcalPerMl'],
  ])('says where a word stands for a number: %j', (change, path) => {
    expect(inputOfDraft(filled(change)).issues).toEqual([{ path, message: expect.stringMatching(/^Type a number, for example 0\.4\.$|^This can be read two ways\./) }])
  })

  it('sends a flush only with a tube', () => {
    expect(inputOfDraft(filled({ flush: '1' })).input.flushMl).toBeUndefined()
    expect(inputOfDraft(filled({ flush: '1', route: 'tube' })).input.flushMl).toBe(1)
  })
})

describe('nextDraft', () => {
  it('keeps the house and nothing of the animal', () => {
    const before = filled({ name: 'Pebble', score: 1, signs: ['swollen'], teamName: 'Saltings Rescue', from: '06:00', syringes: [{ capacity: '1', step: '0.01' }], scaleStep: '0.1', weight: { text: '0.8', unit: 'oz' }, tier: 'low', weighedOn: '2026-12-01' })
    const next = nextDraft(before)
    expect(next).toEqual({ ...emptyDraft(), teamName: 'Saltings Rescue', from: '06:00', timeZone: 'Europe/London', syringes: [{ capacity: '1', step: '0.01' }], weight: { text: '', unit: 'oz' } })
    next.syringes[0]!.step = '0.1'
    expect(before.syringes[0]!.step).toBe('0.01')
  })
})

describe('startIsOld', () => {
  it.each([[0, false], [11.9, false], [12.1, true], [72, true], [-24, false]])('%d h after the start: %s', (hours, old) => {
    const draft = filled({ startAt: '2026-12-02T09:00' })
    expect(startIsOld(draft, new Date(new Date(draft.startAt).getTime() + hours * 3_600_000))).toBe(old)
  })
  it('knows nothing of a start that is none', () => expect(startIsOld(filled({ startAt: '' }), new Date())).toBe(false))
})

describe('draftOfInput', () => {
  it('gives back the same input', () => {
    const input = regimenInput({ animal: { lengthMm: 95, healthyWeightG: 40, bodyConditionScore: 2, signs: ['swollen'] }, overrides: { tier: 'high', fractions: [0.25, 0.5, 1] }, contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }] })
    const again = inputOfDraft(draftOfInput(input)).input
    expect(JSON.parse(JSON.stringify(again))).toMatchObject({ ...JSON.parse(JSON.stringify(input)) as object, startAt: '2026-12-02T09:00:00.000Z' })
  })
  it.each([[{ energyKcalPerMl: 1.2, waterFraction: 0.8 }, 'energy'], [{ proteinPercent: 20, fatPercent: 5, carbohydratePercent: 3 }, 'composition']])('knows a feed of one\'s own: %j', (feed, mode) => {
    const draft = draftOfInput(regimenInput({ feed }))
    expect(draft.feedMode).toBe(mode)
    expect(inputOfDraft(draft).input.feed).toMatchObject(feed)
  })
})

describe('localOf', () => {
  const zone = process.env.TZ
  afterEach(() => {
    if (zone === undefined) delete process.env.TZ
    else process.env.TZ = zone
  })
  it.each([['Etc/UTC', '2026-12-03T18:05'], ['America/New_York', '2026-12-03T13:05'], ['Pacific/Chatham', '2026-12-04T07:50']])('writes the clock of %s', (zone, written) => {
    process.env.TZ = zone
    expect(localOf(new Date('2026-12-03T18:05:00Z'))).toBe(written)
  })
})
