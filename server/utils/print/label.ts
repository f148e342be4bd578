/**
 * The label strip as rows of finished text: one strip for each state or amount, to stick on the tub or the syringe box.
 * It writes what the plan says and works out nothing.
 */
import type { Plan } from '#shared/types/plan'
import { formatDay } from '#shared/utils/calendar'
import { approvalInWords, approvalOn, callLines, codedFrom, ended, footOf, held, identityOf, NOT_SURE, type Amount, type ApprovalLines, type CallLine, type Coded, type FootLines, type Identity } from './wording'
import { chosenDays, type PrintOptions } from './options'
import { refuseIncomplete } from './refusal'
import { plainTextOf } from './richText'
import { heldToWeight, STATE_WORDS, stretchesOf, type StateBand, type Stretch } from './sheet'

export interface LabelStrip {
  identity: Identity
  coded: Coded
  band: StateBand
  amounts: Amount[]
  facts: string[]
  /** Whether a vet approved it and until when it counts: the foot of the page is cut away. */
  terms: string[]
  termsLook: 'plain' | 'framed' | 'reversed'
  last: string
  call: CallLine | null
}

export interface LabelModel {
  title: string
  strips: LabelStrip[]
  /** About the paper to print on. */
  note: string
  foot: FootLines
}

/** @throws SheetRefusedError when something that a carer needs is missing; see `missingFor`. */
export function labelModel(plan: Plan, options: PrintOptions): LabelModel {
  const days = chosenDays(plan.days, options).map(day => heldToWeight(plan, day))
  refuseIncomplete(plan, days)
  const identity = identityOf(plan.animal)
  const coded = codedFrom(options)
  const approval = approvalOn(options)
  const common = {
    identity,
    coded,
    termsLook: termsLookOf(approval),
    terms: [termOf(approval, plan.validity.goodUntil), coded.code ? `Sheet ${coded.code}, ${coded.version!.toLowerCase()}.` : coded.note],
    last: NOT_SURE,
    call: callLines(options).find(line => line.phone !== null) ?? null,
  }
  const shut = plan.gate.state === 'do-not-feed'
  const strips: LabelStrip[] = shut
    ? [{
        ...common,
        band: { state: 'do-not-feed', word: STATE_WORDS['do-not-feed'], reason: plan.gate.findings.map(finding => finding.title).join('. '), days: '' },
        amounts: [],
        facts: plan.gate.findings.map(finding => finding.message),
      }]
    : stretchesOf(plan, days).map(stretch => ({ ...common, band: stretch.band, amounts: stretch.amounts, facts: [...stretch.facts, ...watersOf(stretch)] }))
  return {
    title: `Label: ${identity.name ?? identity.species}`,
    strips,
    note: 'Not on direct-thermal labels near heat lamps, disinfectant or plastic: they fade and darken. Laser print, matt.',
    foot: footOf(plan, options),
  }
}

/** The vet's word and until when it counts; that day is said once. */
function termOf(approval: ApprovalLines, goodUntil: string): string {
  const words = ended(plainTextOf(approvalInWords(approval)))
  const day = held(formatDay(goodUntil))
  return words.includes(day) ? words : `${words} Good until ${day}.`
}

/** A strip without any approval keeps its plain bold words; its page has the black band. */
function termsLookOf({ state }: ApprovalLines): LabelStrip['termsLook'] {
  return ({ none: 'plain', approved: 'framed', lapsed: 'reversed' } as const)[state]
}

/** Water of each day in one line; none where no volume is due. */
function watersOf(stretch: Stretch): string[] {
  const due = stretch.days.filter(day => day.water.figure !== null)
  if (due.length === 0) return []
  return [`${due[0]!.water.label} ${due.map(day => due.length === 1 ? day.water.figure! : `${day.label} ${day.water.figure}`).join(', ')}.`]
}
