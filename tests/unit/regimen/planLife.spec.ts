import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { LIFE_STEPS, PLAN_STATES, type LifeStep } from '../../../shared/types/planLife'
import type { ApprovalRecord, RegimenRow } from '../../../shared/types/rows'
import { can, ROLES, type Role } from '../../../shared/utils/abilities'
import { buildPlan } from '../../../server/utils/plan/buildPlan'
import { currentEdition } from '../../../server/utils/reference'
import { judgeWeighIn } from '../../../server/utils/regimen/judgeWeighIn'
import type { PlanStepError, StepAsked} from '../../../server/utils/regimen/planLife';
import { decideStep, openSteps, standingNow, STEP_ABILITIES } from '../../../server/utils/regimen/planLife'
import { sheetAnswer } from '../../../server/utils/regimen/sheetAnswer'
import { approvalFor } from '../../../server/utils/regimen/standingOf'
import { regimenInput } from '../plan/inputs'

const plan = buildPlan(regimenInput(), currentEdition())
const START = new Date(plan.ramp.startsAt)
const DAY_MS = 86_400_000
const row = (change: Partial<RegimenRow> = {}): RegimenRow => ({
  id: 'pebble', latestVersion: 1, keyHash: '', linkExpiresAt: '', teamId: 'saltings', demo: false, createdAt: START.toISOString(), updatedAt: START.toISOString(), state: 'draft', waiting: null, waitingSince: null, askedBy: null,
  draftedById: 'user:mara', draftedBy: 'Mara Linde', checkedById: null, checkedBy: null, checkedAt: null, sentBackJson: null, endedAt: null, endedReason: null, movedAt: null,
  animalName: 'Pebble', caseNumber: '', speciesName: '', enclosure: '', room: '', weightG: 22, goodUntil: plan.validity.goodUntil, searchText: '', lastWeightG: null, lastWeighedAt: null, ...change,
})
const vet = { id: 'user:amara', name: 'Dr Amara Osei', role: 'vet' as Role, registration: 'no. 00-4821' }
const approval = (change: Partial<ApprovalRecord> = {}): ApprovalRecord => ({ id: 1, regimenId: 'pebble', teamId: 'saltings', lapsedAt: null, lapseReason: null, ...approvalFor(plan, 1, { ...vet, id: 'amara' }, '', START.toISOString()), ...change })
const asked = (change: Partial<StepAsked> = {}): StepAsked => ({ row: row(), plan, approval: null, approvalRequired: true, who: vet, now: START, ...change })
const codeOf = (step: LifeStep, one: StepAsked) => {
  try {
    decideStep(step, one, 'because')
    return 'open'
  }
  catch (error) { return (error as PlanStepError).code }
}
const checked = { checkedById: 'user:tove', checkedBy: 'Tove Brandt', checkedAt: START.toISOString() }

describe('decideStep', () => {
  it('walks the whole way', () => {
    let current = row()
    const keeper = { id: 'user:mara', name: 'Mara Linde', role: 'keeper' as Role, registration: '' }
    const technician = { id: 'user:tove', name: 'Tove Brandt', role: 'technician' as Role, registration: '' }
    let standing: ApprovalRecord | null = null
    for (const [step, who, state] of [['ask-check', keeper, 'draft'], ['check', technician, 'checked'], ['ask-approval', keeper, 'checked'], ['approve', vet, 'approved'], ['use', keeper, 'in-use'], ['finish', keeper, 'finished']] as const) {
      const change = decideStep(step, asked({ row: current, who, approval: standing }), '')
      current = { ...current, ...change.set }
      if (change.approval) standing = approval(change.approval)
      expect(current.state, step).toBe(state)
    }
    expect(current.waiting).toBeNull()
  })

  it.each<[string, LifeStep, Partial<StepAsked>, string]>([
    ['a check by the hand that drafted', 'check', { who: { ...vet, id: 'user:mara' } }, 'plan.sameHand'],
    ['an approval of what nobody checked', 'approve', {}, 'plan.step'],
    ['an approval without registration', 'approve', { row: row({ state: 'checked', ...checked }), who: { ...vet, registration: ' ' } }, 'plan.noRegistration'],
    ['an approval of an old weight', 'approve', { row: row({ state: 'checked', ...checked }), now: new Date(START.getTime() + 20 * DAY_MS) }, 'plan.staleWeight'],
    ['an approval of what is approved', 'approve', { row: row({ state: 'approved', ...checked }), approval: approval() }, 'plan.step'],
    ['an approval once it lapsed', 'approve', { row: row({ state: 'draft', ...checked }), approval: approval({ lapsedAt: START.toISOString(), lapseReason: 'Weighed.' }) }, 'plan.step'],
    ['use where approval is required', 'use', { row: row({ state: 'checked', ...checked }) }, 'plan.needsApproval'],
    ['use where the approval lapsed', 'use', { row: row({ state: 'approved', ...checked }), approval: approval({ lapsedAt: START.toISOString(), lapseReason: 'Weighed.' }) }, 'plan.needsApproval'],
    ['finishing what is not in use', 'finish', { row: row({ state: 'approved' }) }, 'plan.step'],
    ['stopping what has ended', 'stop', { row: row({ state: 'finished', endedAt: START.toISOString() }) }, 'plan.step'],
    ['a step of a checker who is not the one, when a vet has it', 'send-back', { row: row({ state: 'checked', ...checked, waiting: 'approval' }), who: { ...vet, role: 'technician', id: 'user:somebody' } }, 'plan.sendBack'],
  ])('refuses %s', (_what, step, change, code) => expect(codeOf(step, asked(change))).toBe(code))

  it('lets a team without a vet use a draft, and says nothing of approval', () => {
    const change = decideStep('use', asked({ approvalRequired: false, who: { ...vet, role: 'keeper' } }), '')
    expect(change.set.state).toBe('in-use')
    expect(change.approval).toBeUndefined()
  })

  const anyAsked = fc.record({
    state: fc.constantFrom(...PLAN_STATES), waiting: fc.constantFrom(null, 'check' as const, 'approval' as const), isChecked: fc.boolean(), ended: fc.boolean(), role: fc.constantFrom(...ROLES),
    drafter: fc.boolean(), registration: fc.constantFrom('', 'no. 1'), required: fc.boolean(), approved: fc.constantFrom('no', 'yes', 'lapsed'), days: fc.integer({ min: 0, max: 30 }),
  }).map(({ state, waiting, isChecked, ended, role, drafter, registration, required, approved, days }) => asked({
    row: row({ state, waiting, ...(isChecked && checked), ...(ended && { endedAt: START.toISOString() }) }), approvalRequired: required, who: { id: drafter ? 'user:mara' : 'user:other', name: 'Someone', role, registration },
    approval: approved === 'no' ? null : approval(approved === 'lapsed' ? { lapsedAt: START.toISOString(), lapseReason: 'Weighed.' } : {}), now: new Date(START.getTime() + days * DAY_MS),
  }))

  it('never approves what is unchecked, stale or unsigned, nor lets a role do what it may not, whatever the state', () => {
    fc.assert(fc.property(anyAsked, (one) => {
      const { steps, notYet } = openSteps(one)
      for (const step of [...steps, ...Object.keys(notYet) as LifeStep[]]) expect(can(one.who.role, STEP_ABILITIES[step])).toBe(true)
      for (const step of LIFE_STEPS) expect(steps.includes(step)).toBe(can(one.who.role, STEP_ABILITIES[step]) && codeOf(step, one) === 'open')
      if (steps.includes('approve')) expect([one.row.checkedAt !== null, one.who.registration !== '', standingNow(one).state]).toEqual([true, true, 'none'])
      if (steps.includes('check')) expect(one.row.draftedById).not.toBe(one.who.id)
      if (steps.includes('use') && one.approvalRequired) expect(standingNow(one).state).toBe('approved')
    }))
  })
})

describe('sheetAnswer', () => {
  const answer = (change: Partial<Parameters<typeof sheetAnswer>[0]> = {}) => sheetAnswer({ row: row({ state: 'in-use' }), plan, version: 1, approval: approval(), approvalRequired: true, call: 'Dr Amara Osei, 00 5550 0142', now: START, ...change })

  it('is a go-ahead only for the newest version that is approved and in time', () => {
    expect(answer()).toMatchObject({ code: 'current', good: true })
    expect(answer({ version: 1, row: row({ state: 'draft', latestVersion: 2 }) })).toMatchObject({ code: 'replaced', good: false })
    expect(answer({ approval: null })).toMatchObject({ code: 'not-approved', good: false })
    expect(answer({ approval: null, approvalRequired: false })).toMatchObject({ code: 'current', good: true })
    expect(answer({ now: new Date(START.getTime() + 20 * DAY_MS) })).toMatchObject({ code: 'lapsed', good: false })
    expect(answer({ approval: null, approvalRequired: false, now: new Date(START.getTime() + 20 * DAY_MS) })).toMatchObject({ code: 'out-of-date', good: false })
    expect(answer({ row: row({ state: 'stopped', endedReason: 'It died' }) })).toMatchObject({ code: 'stopped', good: false })
    expect(answer({ row: row({ state: 'finished' }) })).toMatchObject({ code: 'finished', good: false })
    expect(answer({ row: row({ movedAt: START.toISOString() }) })).toMatchObject({ code: 'moved', good: false })
  })

  it('says whom to call, or to ask', () => {
    expect(answer({ approval: null }).message).toContain('Call Dr Amara Osei, 00 5550 0142.')
    expect(answer({ approval: null, call: '' }).message).toContain('Ask who runs the enclosure.')
  })
})

describe('judgeWeighIn', () => {
  const made = plan.animal.weightG
  it.each([[0.901, 'stop'], [0.96, 'stands'], [1, 'stands'], [1.099, 'stands'], [1.1, 'lapses'], [1.3, 'lapses'], [0.9, 'stop']])('at %f of the weight: %s', (share, what) => {
    const { effect, lapse } = judgeWeighIn(plan, made * share)
    expect(lapse !== null).toBe(what !== 'stands')
    expect(effect.includes('do not give the next feed')).toBe(what === 'stop')
  })
})
