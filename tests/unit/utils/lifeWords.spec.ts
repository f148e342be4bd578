import { describe, expect, it } from 'vitest'
import type { TeamPlanInfo } from '#shared/types/planLife'
import { changedParts, initialsOf, lapseInWords, momentInZone, planAnswer, stateInWords } from '../../../utils/lifeWords'

const info = (change: Partial<TeamPlanInfo>) => ({ state: 'in-use', standing: { state: 'approved', band: '', line: '' }, ...change }) as TeamPlanInfo
const asked = (change: Partial<Parameters<typeof planAnswer>[0]> = {}) => ({ info: info({}), version: 2, latestVersion: 2, goodUntil: '2026-12-10', today: '2026-12-03', gate: 'feed' as const, approvalRequired: true, ...change })

describe('moments', () => {
  it('are the team\'s, wherever the browser is', () => {
    expect(momentInZone('2026-12-03T14:10:00Z', 'Europe/London')).toBe('Thu 3 Dec 14:10')
    expect(momentInZone('2026-12-03T23:10:00Z', 'Pacific/Chatham')).toBe('Fri 4 Dec 12:55')
    expect(momentInZone('2026-12-03T12:00:00Z', 'Europe/London')).toBe('Thu 3 Dec 12:00 noon')
  })
  it.each([[30_000, 'less than a minute'], [60_000, '1 minute'], [7_200_000, '2 hours'], [47 * 3_600_000, '47 hours'], [72 * 3_600_000, '3 days'], [-5, 'less than a minute']])('%d ms are "%s"', (ms, words) => expect(lapseInWords(0, ms)).toBe(words))
})

describe('a state', () => {
  it('says what it waits for, and since when', () => {
    expect(stateInWords({ state: 'draft', waiting: 'check', waitingSince: '2026-12-03T14:10:00Z' }, 'Europe/London')).toBe('Draft, waits for a check since Thu 3 Dec 14:10')
    expect(stateInWords({ state: 'checked', waiting: 'approval', waitingSince: null }, 'Europe/London')).toBe('Checked, waits for approval')
    expect(stateInWords({ state: 'in-use', waiting: null, waitingSince: null }, 'Europe/London')).toBe('In use')
  })
})

describe('initials', () => {
  it.each([['Mara Linde', 'ML'], ['Dr Amara Osei', 'AO'], ['Juniper', 'JU'], ['', '']])('of %s are %s', (name, initials) => expect(initialsOf(name)).toBe(initials))
})

describe('what a plan is good for', () => {
  it('is current only in use, approved, with a weight that carries it', () => expect(planAnswer(asked())).toMatchObject({ look: 'good', title: 'This plan is current, version 2.' }))
  it('says the most serious thing first', () => {
    const lapsed = { state: 'lapsed' as const, band: '', line: '' }
    expect(planAnswer(asked({ latestVersion: 3, info: info({ state: 'stopped' }) })).title).toBe('Replaced by version 3.')
    expect(planAnswer(asked({ info: info({ state: 'stopped', standing: lapsed }) })).title).toBe('This plan is stopped.')
    expect(planAnswer(asked({ info: info({ standing: lapsed }), today: '2026-12-11' })).title).toBe('The approval has lapsed.')
    expect(planAnswer(asked({ today: '2026-12-11' })).title).toBe('The weight is too old.')
  })
  it('never looks like a go-ahead behind a closed gate, nor without an approval', () => {
    expect(planAnswer(asked({ gate: 'do-not-feed' }))).toMatchObject({ look: 'care', message: expect.stringContaining('do not feed') })
    const none = { state: 'none' as const, band: '', line: '' }
    expect(planAnswer(asked({ info: info({ standing: none }) })).look).toBe('stop')
    expect(planAnswer(asked({ info: info({ standing: none }), approvalRequired: false })).look).toBe('care')
    expect(planAnswer(asked({ info: info({ state: 'draft', standing: none }) })).title).toBe('Not approved by a vet.')
  })
  it('makes no claim about the day before it is known', () => expect(planAnswer(asked({ today: null, goodUntil: '2000-01-01' })).look).toBe('good'))
})

describe('changed lines', () => {
  it('stand by part, amounts first', () => {
    const parts = changedParts([{ part: 'Animal', text: 'a', weight: 'other' }, { part: 'Days', text: 'b', weight: 'other' }, { part: 'Days', text: 'c', weight: 'amount' }])
    expect(parts.map(one => [one.part, one.lines.map(line => line.text).join('')])).toEqual([['Days', 'cb'], ['Animal', 'a']])
  })
})
