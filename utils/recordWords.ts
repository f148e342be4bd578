import { FEED_OUTCOME_LABELS, PLAN_STATE_LABELS } from '#shared/types/planLife'
import { SIGNS } from '#shared/types/regimenLists'
import { formatDayAndYear } from '#shared/utils/calendar'
import { ROLE_LABELS } from '#shared/utils/abilities'
import { formatNumber, formatQuantity, formatWeightG, NBSP } from '#shared/utils/quantity'
import { stampInZone } from './teamWords'

/** One field that a row of the record tells of, in words. Empty where there was nothing. */
export interface RecordLine { field: string, before: string, after: string }

// A name of a field carries its unit at its end.
const UNITS: [ending: RegExp, unit: string][] = [
  [/MlPerKgPerDay$/, 'mL/kg/day'], [/KcalPerMl$/, 'kcal/mL'], [/Ml$/, 'mL'], [/Mm$/, 'mm'], [/Percent$/, '%'], [/Hours$/, 'hours'], [/C$/, '°C'],
]
const NAMES: Record<string, string> = {
  daysUnfed: 'days without a proper meal', bodyConditionScore: 'body condition', scaleStepG: 'scale reads to', kitchenScaleStepG: 'kitchen scale reads to', lengthMeasure: 'measured as', weighedOn: 'weighed on', weighedAt: 'weighed',
  stepMl: 'one mark is', stepG: 'reads to', mostG: 'carries at most', capacityMl: 'holds', deadVolumeMl: 'stays in it', waiting: 'waits for', paper: 'paper', startAt: 'start', takenMl: 'taken', feedingHours: 'feeding hours', flushMl: 'flush',
  approvalRequired: 'a vet approves before use', sheetCodes: 'codes on sheets answer everyone', codesRequired: 'one-time codes needed', approvalWaitsHours: 'an approval may wait', approvalWaitsTell: 'then told', broughtUpTell: 'told of a feed brought up',
  syringes: 'syringe', scales: 'scale', tubes: 'tube', contacts: 'contact', ladder: 'out of hours', fractions: 'steps', escalation: '', settings: '', animal: '', overrides: '',
}
const VALUES: Record<string, string> = {
  ...PLAN_STATE_LABELS, ...FEED_OUTCOME_LABELS, ...Object.fromEntries(Object.entries(ROLE_LABELS).map(([role, { label }]) => [role, label])), ...Object.fromEntries(Object.entries(SIGNS).map(([sign, { label }]) => [sign, label])),
  a4: 'A4', letter: 'Letter', both: 'coordinators and vets', check: 'a check', approval: 'approval',
}
/** Written as they are: a person called Finished stays so. */
const FREE_TEXT = /(^|\.)(name|animalName|caseNumber|enclosure|room|note|reason|purpose|email|address|phone|initials|teamName|registration)$|(contacts|ladder)\.\d+\.role$/
/** Of no use to anyone reading. */
const LEFT_OUT = /(^|\.)(teamId|id|key|tokenHash|userId)$/

function flat(value: unknown, path: string, into: Map<string, unknown>): Map<string, unknown> {
  const isList = Array.isArray(value)
  if (typeof value !== 'object' || value === null || (isList && value.every(one => typeof one !== 'object'))) into.set(path, value)
  else for (const [key, inner] of Object.entries(value)) flat(inner, path === '' ? key : `${path}.${key}`, into)
  return into
}

/** @example fieldInWords('animal.weightG') // 'Weight' */
export function fieldInWords(path: string): string {
  const parts = path.split('.').map((part) => {
    if (/^\d+$/.test(part)) return String(Number(part) + 1)
    if (part in NAMES) return NAMES[part]!
    const bare = [...UNITS.map(([ending]) => ending), /G$/, /Id$/].reduce((name, ending) => name.length > 2 ? name.replace(ending, '') : name, part)
    return bare.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase()
  }).filter(Boolean)
  const written = parts.reduce((text, part, index) => index === 0 ? part : /^\d+$/.test(part) ? `${text} ${part}` : `${text}: ${part}`, '')
  return written.charAt(0).toUpperCase() + written.slice(1)
}

/** @example valueInWords('animal.weightG', 196, zone) // '196 g' */
export function valueInWords(path: string, value: unknown, timeZone: string): string {
  const name = path.split('.').at(-1) ?? ''
  if (value === null || value === undefined || value === '') return ''
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (Array.isArray(value)) return name === 'fractions' ? value.map(one => `${formatNumber(Number(one) * 100, 1)}${NBSP}%`).join(', ') : value.map(one => valueInWords(path, one, timeZone)).join(', ')
  if (typeof value === 'number') {
    if (/G$/.test(name)) return formatWeightG(value)
    if (/Fraction$/.test(name)) return `${formatNumber(value * 100, 1)}${NBSP}%`
    const unit = UNITS.find(([ending]) => ending.test(name))?.[1]
    return unit ? formatQuantity(value, unit, 3) : formatNumber(value, 3)
  }
  const text = String(value)
  if (FREE_TEXT.test(path)) return text
  if (/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}/.test(text)) return stampInZone(text, timeZone)
  if (/^\d{4}-\d{2}-\d{2}$/.test(text)) return formatDayAndYear(text)
  if (/Id$/.test(name)) return text.replace(/^sp-/, '').replaceAll('-', ' ')
  return VALUES[text] ?? text
}

/** What a row changed, field by field. */
export function recordLines(row: { before: unknown, after: unknown }, timeZone: string): RecordLine[] {
  const [before, after] = [row.before, row.after].map(side => flat(side ?? {}, '', new Map<string, unknown>()))
  return [...new Set([...before!.keys(), ...after!.keys()])].filter(path => path !== '' && !LEFT_OUT.test(path)).map(path => ({
    field: fieldInWords(path), before: valueInWords(path, before!.get(path), timeZone), after: valueInWords(path, after!.get(path), timeZone),
  })).filter(line => line.before !== line.after)
}

/** What can be asked for by name; actions that turn up and are not among these are added to the choice. */
export const RECORD_ACTIONS: Record<string, string> = {
  'regimen.create': 'Plan made', 'regimen.change': 'Plan changed', 'regimen.take': 'Plan taken into the team', 'plan.askCheck': 'Check asked for', 'plan.check': 'Plan checked', 'plan.askApproval': 'Approval asked for', 'plan.approve': 'Plan approved',
  'approval.lapse': 'Approval lapsed', 'plan.sendBack': 'Plan sent back', 'plan.use': 'Plan put in use', 'plan.finish': 'Plan finished', 'plan.stop': 'Plan stopped', 'weight.add': 'Weighed', 'feed.log': 'Feed logged', 'feed.strike': 'Feed struck out',
  'transfer.accept': 'Animal handed over', 'transfer.receive': 'Animal taken over',
}
