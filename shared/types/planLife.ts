/** The life of a team's plan: draft, checked, approved, in use, then finished or stopped. */

export const PLAN_STATES = ['draft', 'checked', 'approved', 'in-use', 'finished', 'stopped'] as const
export type PlanState = (typeof PLAN_STATES)[number]

export const PLAN_STATE_LABELS: Record<PlanState, string> = {
  'draft': 'Draft', 'checked': 'Checked', 'approved': 'Approved', 'in-use': 'In use', 'finished': 'Finished', 'stopped': 'Stopped',
}

/** What a plan waits for, when someone was asked. */
export const WAITS = ['check', 'approval'] as const
export type Wait = (typeof WAITS)[number]

export const LIFE_STEPS = ['ask-check', 'check', 'ask-approval', 'approve', 'send-back', 'use', 'finish', 'stop'] as const
export type LifeStep = (typeof LIFE_STEPS)[number]

export const LIFE_STEP_LABELS: Record<LifeStep, string> = {
  'ask-check': 'Ask for a check', 'check': 'Mark as checked', 'ask-approval': 'Ask a vet to approve', 'approve': 'Approve this version',
  'send-back': 'Send back', 'use': 'Put in use', 'finish': 'Finish', 'stop': 'Stop this plan',
}

/** One approval: of one version, for one weight, from and to a date, under one edition. */
export interface Approval {
  version: number
  weightG: number
  /** YYYY-MM-DD in the plan's time zone. */
  fromDate: string
  goodUntil: string
  edition: string
  vetName: string
  registration: string
  note: string
  /** Instant. */
  at: string
  lapsedAt: string | null
  /** A sentence. */
  lapseReason: string | null
}

/** Whether a plan's approval holds, as screens and paper say it. */
export interface Standing {
  state: 'approved' | 'lapsed' | 'none'
  /** Short, for the band: "NOT APPROVED BY A VET", "APPROVAL LAPSED" or "Approved by Dr Amara Osei". */
  band: string
  /** One sentence with the whole of it. */
  line: string
}

/** What a team's plan adds to a saved plan (`SavedRegimen.team`). */
export interface TeamPlanInfo {
  state: PlanState
  waiting: Wait | null
  waitingSince: string | null
  askedBy: string | null
  draftedBy: string
  checkedBy: string | null
  checkedAt: string | null
  sentBack: { by: string, at: string, reason: string } | null
  approval: Approval | null
  standing: Standing
  lastWeighIn: { weightG: number, weighedAt: string } | null
  /** Steps that this member may take now, in the order of buttons; others are not offered. */
  steps: LifeStep[]
  /** Why a step that the role has is not open now, for example that the drafter cannot check. */
  notYet: Partial<Record<LifeStep, string>>
  mayEdit: boolean
  mayWeigh: boolean
  mayTransfer: boolean
  mayLink: boolean
}

/** A row of a team's list of plans. */
export interface PlanRow {
  id: string
  version: number
  animalName: string
  caseNumber: string
  speciesName: string
  enclosure: string
  room: string
  weightG: number
  goodUntil: string
  state: PlanState
  waiting: Wait | null
  waitingSince: string | null
  askedBy: string | null
  standing: Standing
  updatedAt: string
  updatedBy: string
  demo?: boolean
}

export interface VersionRow {
  version: number
  createdAt: string
  author: string
  edition: string
  weightG: number
  /** What the author said of the change. */
  note: string
  approval: Approval | null
}

/** One changed line between two versions, in words. */
export interface ChangedLine {
  /** Heading to group by: "Animal", "Feed", "Days", "Limits" … */
  part: string
  /** "Weight from 182 g to 196 g". */
  text: string
  /** Amounts that a carer would give differently are the ones to look at first. */
  weight: 'amount' | 'other'
}

export interface Comparison { from: number, to: number, lines: ChangedLine[] }

/** What the code on a printed sheet answers. */
export const SHEET_ANSWERS = ['current', 'replaced', 'not-approved', 'lapsed', 'out-of-date', 'finished', 'stopped', 'moved'] as const
export type SheetAnswerCode = (typeof SHEET_ANSWERS)[number]

export interface SheetAnswer {
  code: SheetAnswerCode
  /** "This sheet is current." */
  title: string
  /** What to do now. */
  message: string
  /** Whether the sheet in the hand may be fed from. */
  good: boolean
  version: number
  latestVersion: number
}

export const FEED_OUTCOMES = ['all', 'part', 'refused', 'brought-up', 'not-given'] as const
export type FeedOutcome = (typeof FEED_OUTCOMES)[number]
export const FEED_OUTCOME_LABELS: Record<FeedOutcome, string> = { 'all': 'All taken', 'part': 'Part taken', 'refused': 'Refused', 'brought-up': 'Brought up', 'not-given': 'Not given' }

export interface FeedEntry {
  id: number
  at: string
  dueAt: string | null
  outcome: FeedOutcome
  takenMl: number | null
  note: string
  initials: string
  by: string
  struckAt: string | null
  struckReason: string | null
}

export interface WeighIn { id: number, weightG: number, weighedAt: string, by: string, effect: string }
