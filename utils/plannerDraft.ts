import type { RegimenInput } from '#shared/schemas/regimen'
import type { Issue } from '#shared/types/error'
import type { Route, Tier } from '#shared/types/plan'
import type { LengthMeasure } from '#shared/types/reference'
import type { LifeStage, Sign } from '#shared/types/regimenLists'
import type { Me } from '#shared/types/team'
import type { LengthUnit, MassUnit, TemperatureUnit } from '#shared/utils/units'
import { typedCelsius, typedGrams, typedMillimetres, type Typed } from './entryUnits'
import { parseNumber, whyNoNumber } from './parseNumber'

/** The planner's form, as typed. */
export interface PlannerDraft {
  name: string
  caseNumber: string
  enclosure: string
  speciesId: string
  weight: Typed<MassUnit>
  weighedOn: string
  scaleStep: string
  length: Typed<LengthUnit>
  lengthMeasure: LengthMeasure | ''
  temperature: Typed<TemperatureUnit>
  healthyWeight: Typed<MassUnit>
  score: number | null
  dryness: string
  daysUnfed: string
  lifeStage: LifeStage
  signs: Sign[]
  feedMode: 'list' | 'energy' | 'composition'
  feedId: string
  own: { name: string, energy: string, water: string, protein: string, fat: string, carbohydrate: string }
  route: Route
  feedsPerDay: string
  from: string
  to: string
  /** Local date and time of the browser, YYYY-MM-DDTHH:MM. */
  startAt: string
  timeZone: string
  syringes: { capacity: string, step: string }[]
  kitchenScaleStep: string
  flush: string
  teamName: string
  contacts: { role: string, name: string, phone: string }[]
  tier: Tier | ''
  fractions: string
  maintenance: string
  fluidHours: string
  energyEquationId: string
}

export function emptyDraft(): PlannerDraft {
  return {
    name: '', caseNumber: '', enclosure: '', speciesId: '',
    weight: { text: '', unit: 'g' }, weighedOn: '', scaleStep: '',
    length: { text: '', unit: 'cm' }, lengthMeasure: '', temperature: { text: '', unit: 'degC' }, healthyWeight: { text: '', unit: 'g' },
    score: null, dryness: '', daysUnfed: '', lifeStage: 'adult', signs: [],
    feedMode: 'list', feedId: 'demo-insectivore-slurry', own: { name: '', energy: '', water: '', protein: '', fat: '', carbohydrate: '' },
    route: 'syringe', feedsPerDay: '', from: '07:30', to: '20:30', startAt: '', timeZone: '',
    syringes: [['1', '0.01'], ['3', '0.1'], ['5', '0.2'], ['10', '0.2'], ['20', '1'], ['60', '1']].map(([capacity, step]) => ({ capacity: capacity!, step: step! })),
    kitchenScaleStep: '', flush: '', teamName: '',
    contacts: [{ role: 'Vet, by day', name: '', phone: '' }, { role: 'Out of hours', name: '', phone: '' }],
    tier: '', fractions: '', maintenance: '', fluidHours: '', energyEquationId: '',
  }
}

/** An empty form for the next animal, in the same house: its syringes, people, hours and units need no typing again. */
export function nextDraft(before: PlannerDraft): PlannerDraft {
  const empty = emptyDraft()
  const { syringes, kitchenScaleStep, teamName, contacts, from, to, timeZone } = before
  const same = <Unit extends string>(typed: Typed<Unit>): Typed<Unit> => ({ text: '', unit: typed.unit })
  return {
    ...empty, kitchenScaleStep, teamName, from, to, timeZone,
    syringes: syringes.map(one => ({ ...one })), contacts: contacts.map(one => ({ ...one })),
    weight: same(before.weight), healthyWeight: same(before.healthyWeight), length: same(before.length), temperature: same(before.temperature),
  }
}

/** Whether nothing of an animal is typed yet, so that the house may still be filled in. */
export function isUntouched(draft: PlannerDraft): boolean {
  return draft.speciesId === '' && [draft.name, draft.caseNumber, draft.enclosure, draft.weight.text].every(text => text.trim() === '')
}

/** The form in the house of a team: its hours, time zone, name, people to call and syringes. What a team has not set stays. */
export function draftInHouse(before: PlannerDraft, team: NonNullable<Me['team']>): PlannerDraft {
  const { timeZone, feedingHours, contacts, syringes } = team.settings
  return {
    ...before, timeZone, from: feedingHours.from, to: feedingHours.to, teamName: team.name,
    contacts: contacts.length > 0 ? contacts.map(({ role, name, phone }) => ({ role, name, phone })) : before.contacts,
    syringes: syringes.length > 0 ? syringes.map(one => ({ capacity: String(one.capacityMl), step: String(one.stepMl) })) : before.syringes,
  }
}

/** How long after its start an unsaved plan is asked about, h: by then the animal may weigh and need something else. */
const START_HOLDS_HOURS = 12

/** Whether a draft found again begins too long ago to go on with unasked. */
export function startIsOld(draft: PlannerDraft, now: Date): boolean {
  const startMs = new Date(draft.startAt).getTime()
  return Number.isFinite(startMs) && now.getTime() - startMs > START_HOLDS_HOURS * 3_600_000
}

/** What a plan cannot do without, in the order of the form. */
export function stillNeeded(draft: PlannerDraft): string[] {
  const needed: [boolean, string][] = [
    [draft.speciesId !== '', 'its species'],
    [typedGrams(draft.weight) !== null, 'its weight'],
    [parseNumber(draft.dryness) !== null, 'how dry it is'],
    [parseNumber(draft.daysUnfed) !== null, 'the days without a proper meal'],
    [draft.startAt !== '', 'the start'],
  ]
  return needed.filter(([there]) => !there).map(([, what]) => what)
}

/** The input of the API from what was typed; fields that are no numbers come back as issues with the API's own paths. */
export function inputOfDraft(draft: PlannerDraft): { input: RegimenInput, issues: Issue[] } {
  const issues: Issue[] = []
  const optional = (text: string, path: string): number | undefined => {
    if (text.trim() === '') return undefined
    return typed(parseNumber(text), text, path)
  }
  const typed = (value: number | null, text: string, path: string): number | undefined => {
    if (value === null && text.trim() !== '') issues.push({ path, message: whyNoNumber(text) })
    return value ?? undefined
  }
  const words = (text: string) => text.trim() === '' ? undefined : text.trim()
  const fractions = draft.fractions.split(/[;\s]+/).filter(Boolean)
  const overrides = {
    tier: draft.tier || undefined,
    fractions: fractions.length > 0 ? fractions.map((one, index) => (optional(one, `overrides.fractions.${index}`) ?? 0) / 100) : undefined,
    maintenanceMlPerKgPerDay: optional(draft.maintenance, 'overrides.maintenanceMlPerKgPerDay'),
    fluidHours: optional(draft.fluidHours, 'overrides.fluidHours'),
    energyEquationId: draft.energyEquationId || undefined,
  }
  const contacts = draft.contacts.filter(one => one.role.trim() !== '').map(one => ({ role: one.role.trim(), name: words(one.name), phone: words(one.phone) }))
  const input: RegimenInput = {
    animal: {
      name: words(draft.name),
      caseNumber: words(draft.caseNumber),
      enclosure: words(draft.enclosure),
      speciesId: draft.speciesId,
      weightG: typed(typedGrams(draft.weight), draft.weight.text, 'animal.weightG') ?? 0,
      weighedOn: draft.weighedOn || undefined,
      scaleStepG: optional(draft.scaleStep, 'animal.scaleStepG'),
      lengthMm: typed(typedMillimetres(draft.length), draft.length.text, 'animal.lengthMm'),
      lengthMeasure: draft.lengthMeasure || undefined,
      healthyWeightG: typed(typedGrams(draft.healthyWeight), draft.healthyWeight.text, 'animal.healthyWeightG'),
      bodyConditionScore: draft.score ?? undefined,
      drynessPercent: optional(draft.dryness, 'animal.drynessPercent') ?? 0,
      bodyTemperatureC: typed(typedCelsius(draft.temperature), draft.temperature.text, 'animal.bodyTemperatureC'),
      daysUnfed: optional(draft.daysUnfed, 'animal.daysUnfed') ?? 0,
      lifeStage: draft.lifeStage,
      signs: draft.signs,
    },
    feed: feedOf(draft, optional),
    route: draft.route,
    feedsPerDay: optional(draft.feedsPerDay, 'feedsPerDay'),
    feedingHours: { from: draft.from, to: draft.to },
    startAt: instantOf(draft.startAt),
    timeZone: draft.timeZone,
    syringes: draft.syringes.map((one, index) => ({ capacityMl: optional(one.capacity, `syringes.${index}.capacityMl`) ?? 0, stepMl: optional(one.step, `syringes.${index}.stepMl`) ?? 0 })),
    kitchenScaleStepG: optional(draft.kitchenScaleStep, 'kitchenScaleStepG'),
    flushMl: draft.route === 'tube' ? optional(draft.flush, 'flushMl') : undefined,
    contacts: contacts.some(one => one.name || one.phone) ? contacts : undefined,
    teamName: words(draft.teamName),
    overrides: Object.values(overrides).some(value => value !== undefined) ? overrides : undefined,
  }
  return { input, issues }
}

function feedOf(draft: PlannerDraft, optional: (text: string, path: string) => number | undefined): RegimenInput['feed'] {
  if (draft.feedMode === 'list') return { feedId: draft.feedId }
  const water = optional(draft.own.water, 'feed.waterFraction')
  const shared = { name: draft.own.name.trim() || undefined, waterFraction: water === undefined ? undefined : water / 100 }
  if (draft.feedMode === 'energy') return { ...shared, energyKcalPerMl: optional(draft.own.energy, 'feed.energyKcalPerMl') }
  return { ...shared, proteinPercent: optional(draft.own.protein, 'feed.proteinPercent'), fatPercent: optional(draft.own.fat, 'feed.fatPercent'), carbohydratePercent: optional(draft.own.carbohydrate, 'feed.carbohydratePercent') }
}

function instantOf(local: string): string {
  const at = new Date(local)
  return Number.isNaN(at.getTime()) ? local : at.toISOString()
}

/** The form of a saved plan, so that it can be changed. The day it was weighed is said aloud: a new weight has a new day. */
export function draftOfInput(input: RegimenInput): PlannerDraft {
  const { animal, feed, overrides } = input
  const written = (value: number | undefined) => value === undefined ? '' : String(value)
  const own = 'feedId' in feed ? null : feed
  const base = emptyDraft()
  return {
    ...base,
    name: animal.name ?? '', caseNumber: animal.caseNumber ?? '', enclosure: animal.enclosure ?? '', speciesId: animal.speciesId,
    weight: { text: written(animal.weightG), unit: 'g' }, weighedOn: animal.weighedOn ?? localOf(new Date(input.startAt)).slice(0, 10), scaleStep: written(animal.scaleStepG),
    length: { text: written(animal.lengthMm), unit: 'mm' }, lengthMeasure: animal.lengthMeasure ?? '',
    temperature: { text: written(animal.bodyTemperatureC), unit: 'degC' }, healthyWeight: { text: written(animal.healthyWeightG), unit: 'g' },
    score: animal.bodyConditionScore ?? null, dryness: written(animal.drynessPercent), daysUnfed: written(animal.daysUnfed), lifeStage: animal.lifeStage, signs: [...animal.signs],
    feedMode: 'feedId' in feed ? 'list' : feed.energyKcalPerMl === undefined ? 'composition' : 'energy',
    feedId: 'feedId' in feed ? feed.feedId : base.feedId,
    own: { name: own?.name ?? '', energy: written(own?.energyKcalPerMl), water: own?.waterFraction === undefined ? '' : String(Math.round(own.waterFraction * 1000) / 10), protein: written(own?.proteinPercent), fat: written(own?.fatPercent), carbohydrate: written(own?.carbohydratePercent) },
    route: input.route, feedsPerDay: written(input.feedsPerDay), from: input.feedingHours.from, to: input.feedingHours.to,
    startAt: localOf(new Date(input.startAt)), timeZone: input.timeZone,
    syringes: input.syringes?.map(one => ({ capacity: String(one.capacityMl), step: String(one.stepMl) })) ?? base.syringes,
    kitchenScaleStep: written(input.kitchenScaleStepG), flush: written(input.flushMl), teamName: input.teamName ?? '',
    contacts: input.contacts?.map(one => ({ role: one.role, name: one.name ?? '', phone: one.phone ?? '' })) ?? base.contacts,
    tier: overrides?.tier ?? '', fractions: overrides?.fractions?.map(one => Math.round(one * 1000) / 10).join(' ') ?? '', maintenance: written(overrides?.maintenanceMlPerKgPerDay), fluidHours: written(overrides?.fluidHours), energyEquationId: overrides?.energyEquationId ?? '',
  }
}

/** YYYY-MM-DDTHH:MM of a moment in the browser's own zone. */
export function localOf(at: Date): string {
  const two = (value: number) => String(value).padStart(2, '0')
  return `${at.getFullYear()}-${two(at.getMonth() + 1)}-${two(at.getDate())}T${two(at.getHours())}:${two(at.getMinutes())}`
}
