/** A printed sheet as a screen shows it: the finished text of `server/utils/print/sheet`, as `GET /api/sheets/{id}` answers it. */
import type { GateState } from './plan'
import type { SheetAnswer } from './planLife'

interface SheetRun { text: string, strong?: boolean }
type SheetText = string | readonly SheetRun[]

interface SheetAmount {
  heading: string
  figure: string
  unit: string
  words: string
  syringe: string
  strength: string
  feedName: string
  demo: string | null
  barrel: { capacityMl: number, stepMl: number, markMl: number, markLabel: string }
}

interface SheetDay {
  date: string
  label: string
  note: string
  water: { label: string, figure: string | null }
  weigh: string
  rows: { time: string, give: string, giveNote: string }[]
}

export interface SheetStretch {
  band: { state: GateState, word: string, reason: string, days: string }
  amounts: SheetAmount[]
  facts: string[]
  days: SheetDay[]
}

export interface SheetStop { signs: string[], weight: string, order: string, calls: { role: string, name: string | null, phone: string | null }[], last: string }

export interface SheetView {
  title: string
  identity: { name: string | null, caseNumber: string | null, enclosure: string | null, species: string, weight: string }
  dates: string
  notice: { state: GateState, word: string, reasons: { title: string, message: string }[], warm: string[] } | null
  stretches: SheetStretch[]
  boxes: { title: string, lines: SheetText[] }[]
  stop: SheetStop
  origin: string
}

/** `GET /api/sheets/{id}`. */
export interface SheetLook {
  answer: SheetAnswer
  sheet: SheetView | null
  /** For members: where the plan is. */
  planId: string | null
}
