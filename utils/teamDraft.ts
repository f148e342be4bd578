import type { TeamSettings } from '#shared/schemas/team'
import type { Issue } from '#shared/types/error'
import { parseNumber, whyNoNumber } from './parseNumber'

/** Rows that can be moved and taken away keep a key of their own, so that the focus goes with them. */
type Keyed<Row> = Row & { key: number }
export type DraftContact = Keyed<{ role: string, name: string, phone: string }>

/** The settings of a team as typed: numbers are text until they are saved. */
export interface TeamDraft extends Pick<TeamSettings, 'address' | 'timeZone' | 'paper' | 'approvalRequired' | 'sheetCodes' | 'codesRequired'> {
  name: string
  from: string
  to: string
  contacts: DraftContact[]
  ladder: DraftContact[]
  syringes: Keyed<{ capacity: string, step: string }>[]
  scales: Keyed<{ name: string, step: string, most: string }>[]
  tubes: Keyed<{ name: string, dead: string }>[]
  waitsHours: string
  waitsTell: TeamSettings['escalation']['approvalWaitsTell']
  broughtUpTell: TeamSettings['escalation']['broughtUpTell']
}

const keyed = <Row extends object>(rows: Row[]): Keyed<Row>[] => rows.map((row, index) => ({ ...row, key: index + 1 }))

/** Adds a row at the end, under a key that no other has. */
export function addKeyed<Row extends object>(rows: Keyed<Row>[], row: Row): void {
  rows.push({ ...row, key: Math.max(0, ...rows.map(one => one.key)) + 1 })
}

/** Moves a row one place up (-1) or down (1), where there is a place. */
export function moveRow(rows: unknown[], index: number, by: -1 | 1): void {
  const to = index + by
  if (to < 0 || to >= rows.length) return
  const [row] = rows.splice(index, 1)
  rows.splice(to, 0, row)
}

export function draftOfTeam(team: { name: string, settings: TeamSettings }): TeamDraft {
  const { settings } = team
  return {
    name: team.name, address: settings.address, timeZone: settings.timeZone, paper: settings.paper, from: settings.feedingHours.from, to: settings.feedingHours.to,
    contacts: keyed(settings.contacts), ladder: keyed(settings.ladder),
    approvalRequired: settings.approvalRequired, sheetCodes: settings.sheetCodes, codesRequired: settings.codesRequired,
    syringes: keyed(settings.syringes.map(one => ({ capacity: String(one.capacityMl), step: String(one.stepMl) }))),
    scales: keyed(settings.scales.map(one => ({ name: one.name, step: String(one.stepG), most: String(one.mostG) }))),
    tubes: keyed(settings.tubes.map(one => ({ name: one.name, dead: String(one.deadVolumeMl) }))),
    waitsHours: String(settings.escalation.approvalWaitsHours), waitsTell: settings.escalation.approvalWaitsTell, broughtUpTell: settings.escalation.broughtUpTell,
  }
}

/** What the API is sent; numbers that cannot be read are left out and come back as issues with the API's own paths. */
export function changeOfDraft(draft: TeamDraft): { change: { name: string, settings: unknown }, issues: Issue[] } {
  const issues: Issue[] = []
  const read = (text: string, path: string): number | undefined => {
    const value = parseNumber(text)
    if (value === null && text.trim() !== '') issues.push({ path: `settings.${path}`, message: whyNoNumber(text) })
    return value ?? undefined
  }
  const plain = ({ role, name, phone }: DraftContact) => ({ role, name, phone })
  const settings = {
    address: draft.address, timeZone: draft.timeZone, paper: draft.paper, feedingHours: { from: draft.from, to: draft.to },
    contacts: draft.contacts.map(plain), ladder: draft.ladder.map(plain),
    approvalRequired: draft.approvalRequired, sheetCodes: draft.sheetCodes, codesRequired: draft.codesRequired,
    syringes: draft.syringes.map((one, index) => ({ capacityMl: read(one.capacity, `syringes.${index}.capacityMl`), stepMl: read(one.step, `syringes.${index}.stepMl`) })),
    scales: draft.scales.map((one, index) => ({ name: one.name, stepG: read(one.step, `scales.${index}.stepG`), mostG: read(one.most, `scales.${index}.mostG`) })),
    tubes: draft.tubes.map((one, index) => ({ name: one.name, deadVolumeMl: read(one.dead, `tubes.${index}.deadVolumeMl`) })),
    escalation: { approvalWaitsHours: read(draft.waitsHours, 'escalation.approvalWaitsHours'), approvalWaitsTell: draft.waitsTell, broughtUpTell: draft.broughtUpTell },
  }
  // The schema would take its usual hours for an emptied field: that must not happen unseen.
  if (draft.waitsHours.trim() === '') issues.push({ path: 'settings.escalation.approvalWaitsHours', message: 'Type the hours, or 0 to tell nobody.' })
  return { change: { name: draft.name, settings }, issues }
}
