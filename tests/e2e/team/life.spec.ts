import { beforeAll, describe, expect, it } from 'vitest'
import type { Comparison, PlanRow, SheetAnswer, TeamPlanInfo, VersionRow } from '#shared/types/planLife'
import type { SavedRegimen } from '#shared/types/plan'
import type { SheetLook } from '#shared/types/sheet'
import type { Page, RecordRow } from '#shared/types/team'
import { readPdf } from '../../unit/print/readPdf'
import { baseUrl } from '../server'
import { expectOurShape, juniper, withDatabase } from '../api/client'
import { approvedPlan, Browser, changeSettings, juniperNow, makeTeam, savedPlan, signedUp, visitBy, type Team } from './people'

let team: Team
beforeAll(async () => {
  team = await makeTeam()
  await changeSettings(team.people.coordinator, { approvalRequired: true, contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }], ladder: [{ role: 'Out of hours', phone: '00 5550 0199' }, { role: 'Then', phone: '00 5550 0333' }] })
}, 60_000)

const step = (who: keyof Team['people'], id: string, name: string, body: Record<string, unknown> = { version: 1 }) => team.people[who].ask<TeamPlanInfo>('POST', `/api/regimens/${id}/${name}`, body)
const infoOf = async (id: string, who: keyof Team['people'] = 'keeper') => (await team.people[who].done<SavedRegimen>('GET', `/api/regimens/${id}`)).team!
/** Words of a PDF, with plain spaces. */
async function paper(by: Browser, path: string): Promise<string> {
  const answer = await fetch(baseUrl() + path, { headers: { cookie: by.cookie } })
  expect(answer.status).toBe(200)
  return (await readPdf(Buffer.from(await answer.arrayBuffer()))).text.replace(/\s+/g, ' ')
}
/** The address in the square code of a team's sheet, by the secret of the server under test. */
async function sheetLook(id: string, version: number): Promise<SheetLook> {
  const { createHmac } = await import('node:crypto')
  const { readFileSync } = await import('node:fs')
  const { dataDir } = await import('../server')
  const secret = process.env.NUXT_SESSION_PASSWORD ?? readFileSync(`${dataDir()}/session-secret`, 'utf8').trim()
  const letters = 'abcdefghjkmnpqrstuvwxyz23456789'
  const code = [...createHmac('sha256', secret).update(`sheet|${id}|${version}`).digest().subarray(0, 20)].map(byte => letters[byte % letters.length]).join('')
  const answer = await new Browser().ask<SheetLook>('GET', `/api/sheets/${id}?version=${version}&code=${code}`)
  expect(answer.status, answer.text).toBe(200)
  return answer.json
}

describe('the life of a plan', () => {
  it('goes from draft over checked and approved into use, each step by those who may, and is finished', async () => {
    const id = await savedPlan(team.people.keeper)
    expect(await infoOf(id)).toMatchObject({ state: 'draft', draftedBy: 'Mara Linde', standing: { state: 'none' }, steps: ['ask-check', 'stop'] })
    expect((await step('keeper', id, 'ask-check')).json).toMatchObject({ waiting: 'check', askedBy: 'Mara Linde' })
    expect((await step('technician', id, 'check')).json).toMatchObject({ state: 'checked', checkedBy: 'Tove Brandt', waiting: null })
    expect((await step('keeper', id, 'ask-approval')).json).toMatchObject({ waiting: 'approval' })
    const approved = (await step('vet', id, 'approve', { version: 1, note: 'Watch the droppings.' })).json
    expect(approved).toMatchObject({ state: 'approved', waiting: null, standing: { state: 'approved', band: 'Approved by Dr Amara Osei' }, approval: { version: 1, weightG: 182, vetName: 'Dr Amara Osei', registration: 'Register of vets, no. 00-4821', note: 'Watch the droppings.' } })
    expect(approved.approval!.goodUntil > approved.approval!.fromDate).toBe(true)
    expect((await step('keeper', id, 'use')).json.state).toBe('in-use')
    expect((await step('keeper', id, 'finish')).json).toMatchObject({ state: 'finished', steps: [] })
  })

  it('is not checked by the hand that drafted it', async () => {
    const id = await savedPlan(team.people.technician)
    expectOurShape(await step('technician', id, 'check'), 403, 'plan.sameHand')
    expect((await infoOf(id, 'technician')).notYet.check).toContain('somebody else')
    expect((await step('vet', id, 'check')).status).toBe(200)
  })

  it.each([
    ['approve a draft', 'vet', 'approve', 409], ['use a draft where approval is required', 'keeper', 'use', 422], ['finish what is not in use', 'keeper', 'finish', 409], ['ask for approval of a draft', 'keeper', 'ask-approval', 409], ['send back what nobody asked about', 'technician', 'send-back', 409],
  ] as const)('does not let anyone %s', async (_what, who, name, status) => {
    const id = await savedPlan(team.people.keeper)
    expectOurShape(await step(who, id, name, { version: 1, ...(name === 'send-back' && { reason: 'why not' }) }), status)
    expect((await infoOf(id)).state).toBe('draft')
  })

  it('wants the registration of a vet before an approval', async () => {
    const id = await savedPlan(team.people.keeper)
    await step('technician', id, 'check')
    await team.people.vet.done('PATCH', '/api/auth/profile', { name: 'Dr Amara Osei', registration: '' })
    expectOurShape(await step('vet', id, 'approve'), 422, 'plan.noRegistration')
    await team.people.vet.done('PATCH', '/api/auth/profile', { name: 'Dr Amara Osei', registration: 'Register of vets, no. 00-4821' })
    expect((await step('vet', id, 'approve')).status).toBe(200)
  })

  it('goes back with a reason, and the drafter is told', async () => {
    const id = await savedPlan(team.people.keeper)
    await step('technician', id, 'check')
    expectOurShape(await step('vet', id, 'send-back', { version: 1, reason: '' }), 400, 'input.invalid')
    expect((await step('vet', id, 'send-back', { version: 1, reason: 'Weigh it on the small scale.' })).json).toMatchObject({ state: 'draft', sentBack: { by: 'Dr Amara Osei', reason: 'Weigh it on the small scale.' }, checkedBy: null })
    expect(withDatabase(db => db.prepare('select text from mails where to_address = ? and kind = \'sentBack\' order by id desc limit 1').pluck().get(team.emails.keeper))).toContain('Weigh it on the small scale.')
  })

  it('is stopped with a reason, and then changes no more', async () => {
    const id = await approvedPlan(team)
    expect((await step('keeper', id, 'stop', { version: 1, reason: 'It died in the night.' })).json).toMatchObject({ state: 'stopped', standing: { state: 'lapsed' } })
    expectOurShape(await team.people.keeper.ask('PATCH', `/api/regimens/${id}`, { ...juniperNow(), baseVersion: 1 }), 409, 'plan.ended')
  })

  it('refuses to approve or use a weight that is too old', async () => {
    const id = await savedPlan(team.people.keeper, { ...juniperNow(), startAt: new Date(Date.now() - 20 * 86_400_000).toISOString() })
    await step('technician', id, 'check')
    expectOurShape(await step('vet', id, 'approve'), 422, 'plan.staleWeight')
  })

  it('works for one person without a vet: its sheets say so', async () => {
    const { browser } = await signedUp('One kitchen')
    const id = await savedPlan(browser, juniperNow())
    expect((await browser.ask<TeamPlanInfo>('POST', `/api/regimens/${id}/use`, { version: 1 })).json.state).toBe('in-use')
    expect(await paper(browser, `/api/regimens/${id}/sheet.pdf`)).toContain('NOT APPROVED BY A VET')
  })
})

describe('an approval', () => {
  it('names vet, version, weight and days on paper', async () => {
    const id = await approvedPlan(team)
    const words = await paper(team.people.carer, `/api/regimens/${id}/sheet.pdf`)
    expect(words).toContain('Approved by Dr Amara Osei')
    expect(words).toContain('Register of vets, no. 00-4821')
    expect(words).toMatch(/version 1, 182 g, until/)
    expect(words).not.toContain('NOT APPROVED')
    expect(words).toContain('00 5550 0142')
    expect(words).toContain('00 5550 0199')
    // Of the ladder one number is printed.
    expect(words).not.toContain('00 5550 0333')
  })

  it('ends with any change, on screen and on paper', async () => {
    const id = await approvedPlan(team)
    await team.people.keeper.done('PATCH', `/api/regimens/${id}`, { ...juniperNow({ enclosure: 'Warm room, tank 5' }), baseVersion: 1, note: 'moved' })
    expect(withDatabase(db => db.prepare('select text from mails where to_address = ? and kind = \'approvalLapsed\' order by id desc limit 1').pluck().get(team.emails.vet))).toContain(`/plans/${id}`)
    expect(await infoOf(id)).toMatchObject({ state: 'draft', standing: { state: 'none' } })
    expect(await paper(team.people.carer, `/api/regimens/${id}/sheet.pdf`)).toContain('NOT APPROVED BY A VET')
    expect(await paper(team.people.carer, `/api/regimens/${id}/sheet.pdf?version=1`)).toMatch(/APPROVAL LAPSED.*SUPERSEDED|SUPERSEDED.*APPROVAL LAPSED/)
  })

  it('ends with a weight a tenth away, and the vet is told', async () => {
    const id = await approvedPlan(team)
    const fits = await team.people.keeper.done<{ weighIn: { effect: string }, team: TeamPlanInfo }>('POST', `/api/regimens/${id}/weigh-ins`, { weightG: 186 })
    expect(fits.team.standing.state).toBe('approved')
    const jumped = await team.people.keeper.done<{ weighIn: { effect: string }, team: TeamPlanInfo }>('POST', `/api/regimens/${id}/weigh-ins`, { weightG: 202 })
    expect(jumped.weighIn.effect.replace(/\s/g, ' ')).toContain('Weighed 202 g, 11 % more than the 182 g')
    expect(jumped.team).toMatchObject({ standing: { state: 'lapsed' }, state: 'draft' })
    expect(withDatabase(db => db.prepare('select count(*) from mails where to_address = ? and kind = \'approvalLapsed\'').pluck().get(team.emails.vet))).toBeGreaterThan(0)
    expect(await paper(team.people.carer, `/api/regimens/${id}/sheet.pdf`)).toContain('APPROVAL LAPSED')
  })

  it('ends under the stop weight, and says do not feed', async () => {
    const id = await approvedPlan(team)
    const { weighIn } = await team.people.keeper.done<{ weighIn: { effect: string } }>('POST', `/api/regimens/${id}/weigh-ins`, { weightG: 170 })
    expect(weighIn.effect).toContain('do not give the next feed')
    expect((await infoOf(id)).standing.state).toBe('lapsed')
  })

  it('ends with its last day, whether or not anyone looked', async () => {
    const id = await approvedPlan(team)
    withDatabase((db) => {
      db.prepare('update approvals set good_until = \'2026-01-05\' where regimen_id = ?').run(id)
    })
    expect((await infoOf(id)).standing).toMatchObject({ state: 'lapsed', band: 'APPROVAL LAPSED' })
    const { items } = await team.people.carer.done<Page<PlanRow>>('GET', '/api/regimens?q=juniper&pageSize=100')
    expect(items.find(one => one.id === id)!.standing.state).toBe('lapsed')
  })

  it('comes to the vet by mail with what changed, and waits on the desk, oldest first', async () => {
    const own = await makeTeam()
    await changeSettings(own.people.coordinator, { approvalRequired: true })
    const first = await approvedPlan(own)
    await own.people.keeper.done('PATCH', `/api/regimens/${first}`, { ...juniperNow({ weightG: 200 }), baseVersion: 1, note: 'weighed' })
    await own.people.technician.done('POST', `/api/regimens/${first}/check`, { version: 2 })
    await own.people.keeper.done('POST', `/api/regimens/${first}/ask-approval`, { version: 2 })
    const text = (withDatabase(db => db.prepare('select text from mails where to_address = ? and kind = \'approvalAsked\' order by id desc limit 1').pluck().get(own.emails.vet)) as string).replace(/\s+/g, ' ')
    expect(text).toContain(`/plans/${first}/approve`)
    expect(text).toContain('Weight from 182 g to 200 g')
    const second = await savedPlan(own.people.keeper)
    await own.people.technician.done('POST', `/api/regimens/${second}/check`, { version: 1 })
    await own.people.keeper.done('POST', `/api/regimens/${second}/ask-approval`, { version: 1 })
    const desk = await own.people.vet.done<{ approvals: Page<PlanRow>, checks: Page<PlanRow> }>('GET', '/api/team/desk')
    expect(desk.approvals.items.map(one => one.id)).toEqual([first, second])
    expect((await own.people.carer.done<typeof desk>('GET', '/api/team/desk')).approvals.items).toEqual([])
  })
})

describe('versions', () => {
  it('are listed with who, when and why, and compared line by line in words', async () => {
    const id = await approvedPlan(team)
    await team.people.keeper.done('PATCH', `/api/regimens/${id}`, { ...juniperNow({ weightG: 200 }), baseVersion: 1, note: 'Weighed again.' })
    const { items, total } = await team.people.vet.done<Page<VersionRow>>('GET', `/api/regimens/${id}/versions`)
    expect(total).toBe(2)
    expect(items[0]).toMatchObject({ version: 2, author: 'Mara Linde', weightG: 200, note: 'Weighed again.', approval: null })
    expect(items[1]).toMatchObject({ version: 1, approval: { vetName: 'Dr Amara Osei', lapseReason: 'Version 2 replaced it.' } })
    const { lines } = await team.people.vet.done<Comparison>('GET', `/api/regimens/${id}/compare?from=1&to=2`)
    const words = lines.map(line => line.text.replace(/\s+/g, ' '))
    expect(words.some(line => line.startsWith('Weight from 182 g to 200 g'))).toBe(true)
    expect(lines.some(line => line.weight === 'amount')).toBe(true)
    expectOurShape(await team.people.vet.ask('GET', `/api/regimens/${id}/compare?from=1&to=9`), 404, 'regimen.noVersion')
  })

  it('of two people at once: the second is told what changed and by whom, and nothing is overwritten', async () => {
    const id = await savedPlan(team.people.keeper)
    await team.people.technician.done('PATCH', `/api/regimens/${id}`, { ...juniperNow({ weightG: 190 }), baseVersion: 1 })
    const second = await team.people.keeper.ask('PATCH', `/api/regimens/${id}`, { ...juniperNow({ weightG: 175 }), baseVersion: 1 })
    expectOurShape(second, 409, 'regimen.changed')
    expect(second.data.message).toContain('Tove Brandt')
    expect(second.data.issues!.map(issue => issue.message.replace(/\s+/g, ' ')).join('\n')).toContain('Weight from 182 g to 190 g')
    const kept = await team.people.keeper.done<SavedRegimen>('GET', `/api/regimens/${id}`)
    expect(kept).toMatchObject({ latestVersion: 2, input: { animal: { weightG: 190 } } })
    expectOurShape(await step('technician', id, 'ask-check', { version: 1 }), 409, 'regimen.changed')
    expectOurShape(await team.people.keeper.ask('PATCH', `/api/regimens/${id}`, juniperNow()), 400, 'input.invalid')
  })

  it('written by many at the same moment are all kept or told', async () => {
    const id = await savedPlan(team.people.keeper)
    const answers = await Promise.all([1, 2, 3, 4, 5, 6].map(count => team.people.keeper.ask('PATCH', `/api/regimens/${id}`, { ...juniperNow({ weightG: 182 + count }), baseVersion: 1 })))
    expect(answers.map(answer => answer.status).sort()).toEqual([200, 409, 409, 409, 409, 409])
  })
})

describe('the code on a sheet', () => {
  const answerOf = async (id: string, version: number): Promise<SheetAnswer> => (await sheetLook(id, version)).answer

  it('is on the paper', async () => {
    const id = await approvedPlan(team)
    expect(await paper(team.people.carer, `/api/regimens/${id}/sheet.pdf`)).toContain('Scan to see if this sheet is still current.')
  })

  it('says current, then replaced, then which day, to someone who is not signed in', async () => {
    const id = await approvedPlan(team)
    const look = await sheetLook(id, 1)
    expect(look.answer).toMatchObject({ code: 'current', title: 'This sheet is current', good: true })
    expect(look.planId).toBeNull()
    expect(Object.keys(look).sort()).toEqual(['answer', 'planId', 'sheet'])
    expect(look.sheet!.identity.name).toBe('Juniper')
    await team.people.keeper.done('PATCH', `/api/regimens/${id}`, { ...juniperNow({ weightG: 190 }), baseVersion: 1 })
    const replaced = await answerOf(id, 1)
    expect(replaced).toMatchObject({ code: 'replaced', good: false, latestVersion: 2 })
    expect(replaced.title.replace(/\s+/g, ' ')).toMatch(/^Replaced by version 2 on \w{3} \d{1,2} \w{3}$/)
    expect(replaced.message).toContain('not approved yet')
    expect(await answerOf(id, 2)).toMatchObject({ code: 'not-approved', good: false })
    await step('technician', id, 'check', { version: 2 })
    await step('vet', id, 'approve', { version: 2 })
    expect((await answerOf(id, 1)).message).toContain('Print version 2 and take this one down.')
    expect(await answerOf(id, 2)).toMatchObject({ code: 'current', good: true })
  })

  it('says lapsed, out of date, stopped and finished', async () => {
    const lapsed = await approvedPlan(team)
    await team.people.keeper.done('POST', `/api/regimens/${lapsed}/weigh-ins`, { weightG: 202 })
    expect(await answerOf(lapsed, 1)).toMatchObject({ code: 'lapsed', good: false })
    const stopped = await approvedPlan(team)
    await step('keeper', stopped, 'stop', { version: 1, reason: 'It brought everything up' })
    const answer = await answerOf(stopped, 1)
    expect(answer).toMatchObject({ code: 'stopped', good: false })
    expect(answer.message).toContain('Why: It brought everything up.')
    expect(answer.message).toContain('Dr Amara Osei, 00 5550 0142')
    const finished = await approvedPlan(team)
    await step('keeper', finished, 'use')
    await step('keeper', finished, 'finish')
    expect(await answerOf(finished, 1)).toMatchObject({ code: 'finished', good: false })
  })

  it('opens nothing when it is wrong, belongs to another version, or the team answers no codes', async () => {
    const own = await makeTeam()
    const id = await savedPlan(own.people.keeper)
    for (const query of ['', '?version=1', '?version=1&code=wrong', `?version=1&code=${'a'.repeat(20)}`]) expectOurShape(await new Browser().ask('GET', `/api/sheets/${id}${query}`), 404, 'sheet.notFound')
    await sheetLook(id, 1)
    await changeSettings(own.people.coordinator, { sheetCodes: false })
    await expect(sheetLook(id, 1)).rejects.toThrow()
    expect((await own.people.carer.ask('GET', `/api/sheets/${id}`)).status).toBe(200)
  })
})

describe('links for helpers', () => {
  it('let a helper see, print and log the animals of a room, with initials, and nothing else', async () => {
    const id = await approvedPlan(team, juniperNow({ enclosure: 'Night room, tub 1' }))
    const elsewhere = await approvedPlan(team, juniperNow({ enclosure: 'Cold room, tub 1' }))
    const { browser, linkId } = await visitBy(team.people.keeper, { room: 'Night room' })
    const round = await browser.done<{ animals: { id: string }[] }>('GET', '/api/help/round')
    expect(round.animals.map(one => one.id)).toEqual([id])
    expect(await paper(browser, `/api/regimens/${id}/sheet.pdf`)).toContain('Juniper')
    const entry = await browser.done<{ initials: string, by: string }>('POST', `/api/regimens/${id}/feed-log`, { outcome: 'part', takenMl: 0.3 })
    expect(entry).toMatchObject({ initials: 'JT', by: 'JT (helper: Night shift)' })
    for (const path of [`/api/regimens/${elsewhere}`, `/api/sheets/${elsewhere}`, `/api/regimens/${elsewhere}/feed-log`]) expect((await browser.ask('GET', path)).status).toBe(404)
    expectOurShape(await browser.ask('PATCH', `/api/regimens/${id}`, { ...juniperNow(), baseVersion: 1 }), 403, 'help.notAllowed')
    const saved = await browser.done<SavedRegimen>('GET', `/api/regimens/${id}`)
    expect(saved.team).toBeUndefined()
    const { items } = await team.people.keeper.done<Page<{ id: string, opened: number, lastInitials: string }>>('GET', '/api/team/links')
    expect(items.find(one => one.id === linkId)).toMatchObject({ opened: 1, lastInitials: 'JT' })
    await team.people.keeper.done('DELETE', `/api/team/links/${linkId}`)
    expectOurShape(await browser.ask('GET', '/api/help/round'), 401, 'help.closed')
    expect((await browser.ask('GET', `/api/regimens/${id}`)).status).toBe(404)
  })

  it('end by themselves, and only their hash is kept', async () => {
    const { link, id } = await team.people.keeper.done<{ link: string, id: string }>('POST', '/api/team/links', { room: 'Night room', purpose: 'Thursday', hours: 1 })
    const token = link.split('#')[1]!
    expect(link).toMatch(/\/help#[\w-]{43}$/)
    const row = withDatabase(db => db.prepare('select * from helper_links where id = ?').get(id))
    expect(JSON.stringify(row)).not.toContain(token)
    withDatabase(db => db.prepare('update helper_links set expires_at = \'2026-01-01T00:00:00.000Z\' where id = ?').run(id))
    expectOurShape(await new Browser().ask('POST', '/api/help/open', { token, initials: 'JT' }), 401, 'help.closed')
    expectOurShape(await new Browser().ask('POST', '/api/help/open', { token, initials: 'J' }), 400, 'input.invalid')
  })

  it('of one animal open that one, and none that another team cares for', async () => {
    const id = await approvedPlan(team)
    const { browser } = await visitBy(team.people.keeper, { regimenId: id })
    expect((await browser.done<{ animals: { id: string }[] }>('GET', '/api/help/round')).animals.map(one => one.id)).toEqual([id])
    const other = await signedUp('Harbour Refuge')
    expectOurShape(await other.browser.ask('POST', '/api/team/links', { regimenId: id, purpose: 'x', hours: 1 }), 404)
    expectOurShape(await team.people.keeper.ask('POST', '/api/team/links', { regimenId: id, room: 'Warm room', purpose: 'x', hours: 1 }), 400)
  })

  it('strike a line out with a reason and delete nothing', async () => {
    const id = await approvedPlan(team)
    const entry = await team.people.carer.done<{ id: number }>('POST', `/api/regimens/${id}/feed-log`, { outcome: 'brought-up', note: 'all of it' })
    await team.people.carer.done('POST', `/api/regimens/${id}/feed-log/${entry.id}/strike`, { reason: 'It was the other gecko.' })
    const { items } = await team.people.carer.done<Page<{ id: number, struckReason: string, note: string }>>('GET', `/api/regimens/${id}/feed-log`)
    expect(items[0]).toMatchObject({ id: entry.id, struckReason: 'It was the other gecko.', note: 'all of it' })
    expectOurShape(await team.people.carer.ask('POST', `/api/regimens/${id}/feed-log/${entry.id}/strike`, { reason: 'again' }), 404)
    // What came up is told at once.
    expect(withDatabase(db => db.prepare('select count(*) from mails where kind = \'broughtUp\' and to_address = ?').pluck().get(team.emails.vet))).toBeGreaterThan(0)
  })
})

describe('handing over', () => {
  it('copies plan and papers to the other team by a link that works once, with a record on both sides', async () => {
    const id = await approvedPlan(team)
    const other = await signedUp('Harbour Refuge', 'Stig Aalto')
    const { link } = await team.people.coordinator.done<{ link: string }>('POST', `/api/regimens/${id}/transfers`, { note: 'Eats from the hand.' })
    const token = link.split('#')[1]!
    expect(await other.browser.done('POST', '/api/transfers/look', { token })).toMatchObject({ fromTeam: 'Saltings Rescue', animal: 'Juniper', versions: 1, note: 'Eats from the hand.' })
    expectOurShape(await team.people.coordinator.ask('POST', '/api/transfers/accept', { token }), 422, 'transfer.own')
    const { id: newId } = await other.browser.done<{ id: string }>('POST', '/api/transfers/accept', { token })
    expectOurShape(await other.browser.ask('POST', '/api/transfers/accept', { token }), 410, 'transfer.ended')
    // There it is a draft: another team's vet has approved nothing for them.
    expect((await other.browser.done<SavedRegimen>('GET', `/api/regimens/${newId}`)).team).toMatchObject({ state: 'draft', standing: { state: 'none' } })
    expect((await sheetLook(id, 1)).answer.code).toBe('moved')
    expect((await team.people.keeper.ask('POST', `/api/regimens/${id}/use`, { version: 1 })).status).toBe(404)
    const actions = async (browser: Browser) => (await browser.done<Page<RecordRow>>('GET', '/api/team/record?q=transfer')).items.map(one => one.action)
    expect(await actions(team.people.coordinator)).toEqual(expect.arrayContaining(['transfer.offer', 'transfer.accept']))
    expect(await actions(other.browser)).toContain('transfer.receive')
    expect((await team.people.coordinator.done<Page<{ state: string, otherTeam: string }>>('GET', '/api/team/transfers')).items[0]).toMatchObject({ state: 'accepted', otherTeam: 'Harbour Refuge' })
  })

  it('can be declined or taken back', async () => {
    const other = await signedUp('Harbour Refuge')
    const id = await savedPlan(team.people.keeper)
    const offer = async () => {
      const { id: transferId, link } = await team.people.coordinator.done<{ id: string, link: string }>('POST', `/api/regimens/${id}/transfers`, {})
      return { transferId, token: link.split('#')[1]! }
    }
    const declined = await offer()
    expect((await other.browser.ask('POST', '/api/transfers/decline', { token: declined.token })).status).toBe(204)
    const back = await offer()
    await team.people.coordinator.done('DELETE', `/api/team/transfers/${back.transferId}`)
    for (const { token } of [declined, back]) expectOurShape(await other.browser.ask('POST', '/api/transfers/accept', { token }), 410)
    expect((await infoOf(id)).state).toBe('draft')
  })

  it('to a foster home is one PDF: contacts, stop rules, sheet and mixing card', async () => {
    const id = await approvedPlan(team)
    const words = await paper(team.people.keeper, `/api/regimens/${id}/packet.pdf`)
    for (const part of ['Foster packet', 'Mixing card', '00 5550 0142', 'Not sure? Do not feed.', 'Approved by Dr Amara Osei']) expect(words).toContain(part)
  })
})

describe('a guest\'s plan', () => {
  it('is taken into the team by the browser that has it; its link then changes nothing', async () => {
    const guest = new Browser()
    const { id, key } = await guest.done<{ id: string, key: string }>('POST', '/api/regimens', { ...juniper(), startAt: new Date().toISOString() })
    expectOurShape(await team.people.keeper.ask('POST', `/api/regimens/${id}/take`, {}), 404, 'regimen.notFound')
    await team.people.keeper.done('GET', `/api/regimens/${id}?key=${key}`)
    await team.people.keeper.done('POST', `/api/regimens/${id}/take`, {})
    expect(await infoOf(id)).toMatchObject({ state: 'draft', draftedBy: 'Mara Linde' })
    expectOurShape(await guest.ask('PATCH', `/api/regimens/${id}?key=${key}`, { ...juniper(), baseVersion: 1 }), 404)
    // Paper printed before still leads somewhere.
    expect((await guest.ask<SavedRegimen>('GET', `/api/regimens/${id}?key=${key}`)).json.team).toBeUndefined()
    expect((await team.people.keeper.done<{ items: { id: string }[] }>('GET', '/api/regimens?of=browser')).items.map(one => one.id)).not.toContain(id)
  })
})
