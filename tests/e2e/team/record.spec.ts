import { spawnSync } from 'node:child_process'
import { cpSync, mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import Database from 'better-sqlite3'
import { describe, expect, it } from 'vitest'
import type { PlanRow } from '#shared/types/planLife'
import type { Page, RecordRow } from '#shared/types/team'
import { ask, expectOurShape, withDatabase } from '../api/client'
import { dataDir } from '../server'
import { approvedPlan, changeSettings, juniperNow, makeTeam, savedPlan, signedUp } from './people'

const root = fileURLToPath(new URL('../../..', import.meta.url))
/** `npm run audit:verify` on a file. */
const verify = (file: string) => spawnSync(process.execPath, [join(root, 'scripts/audit-verify.mjs'), file], { encoding: 'utf8', timeout: 60_000 })

/** A copy of the record of the server under test, changed behind its back. */
function tampered(sql: string): { status: number | null, said: string } {
  const folder = mkdtempSync(join(tmpdir(), 'thimbleful-audit-test-'))
  const file = join(folder, 'thimbleful.db')
  withDatabase(db => db.pragma('wal_checkpoint(TRUNCATE)'))
  cpSync(join(dataDir(), 'thimbleful.db'), file)
  const db = new Database(file)
  db.exec('drop trigger audit_records_no_update; drop trigger audit_records_no_delete')
  db.exec(sql)
  db.close()
  const { status, stdout, stderr } = verify(file)
  rmSync(folder, { recursive: true, force: true })
  return { status, said: stdout + stderr }
}

describe('the record', () => {
  it('says who, when, what and why, of a plan, of an animal, of the team', async () => {
    const team = await makeTeam()
    const id = await approvedPlan(team)
    await team.people.keeper.done('PATCH', `/api/regimens/${id}`, { ...juniperNow({ weightG: 190 }), baseVersion: 1, note: 'Weighed again.' })
    const ofPlan = await team.people.keeper.done<Page<RecordRow>>('GET', `/api/regimens/${id}/record`)
    expect(ofPlan.items.map(row => [row.actor, row.action])).toEqual([['Mara Linde', 'approval.lapse'], ['Mara Linde', 'regimen.change'], ['Dr Amara Osei', 'plan.approve'], ['Tove Brandt', 'plan.check'], ['Mara Linde', 'regimen.create']])
    const change = ofPlan.items[1]!
    expect(change).toMatchObject({ version: 2, reason: 'Weighed again.', objectName: 'Juniper', before: { 'animal.weightG': 182 }, after: { 'animal.weightG': 190 } })
    const ofAnimal = await team.people.keeper.done<Page<RecordRow>>('GET', '/api/team/record?caseNumber=26-041&pageSize=100')
    expect(ofAnimal.total).toBe(ofPlan.total)
    const ofTeam = await team.people.keeper.done<Page<RecordRow>>('GET', '/api/team/record?pageSize=100')
    expect(ofTeam.items.map(row => row.action)).toEqual(expect.arrayContaining(['team.create', 'invitation.create', 'member.join', 'user.change']))
    expect((await team.people.keeper.done<Page<RecordRow>>('GET', '/api/team/record?action=plan.approve')).total).toBe(1)
    expect((await team.people.keeper.done<Page<RecordRow>>('GET', '/api/team/record?q=amara')).items.every(row => /Amara/.test(row.actor + row.objectName))).toBe(true)
  })

  it('of one team shows nothing of another', async () => {
    const other = await signedUp('Harbour Refuge')
    const { items } = await other.browser.done<Page<RecordRow>>('GET', '/api/team/record?pageSize=100')
    expect(items.map(row => row.action).sort()).toEqual(['session.begin', 'team.create'])
  })

  it('is exported as CSV that no spreadsheet runs as a formula', async () => {
    const { browser } = await signedUp('=cmd|calc', '+Stig "the" Aalto,\nx')
    const answer = await browser.ask('GET', '/api/team/record.csv')
    expect(answer.headers.get('content-type')).toContain('text/csv')
    const lines = answer.text.split('\r\n')
    expect(lines[0]).toBe('id,at,actor,action,what,objectType,objectId,objectName,version,reason,before,after,hash')
    expect(answer.text).toContain('\'=cmd|calc')
    expect(answer.text).toContain('"\'+Stig ""the"" Aalto, x"')
    expect(answer.text).not.toMatch(/(^|,)[=+@]/m)
  })

  it('cannot be changed or shortened in the database', () => {
    withDatabase((db) => {
      expect(() => db.exec('update audit_records set actor_name = \'nobody\' where id = 1')).toThrow('never changed')
      expect(() => db.exec('delete from audit_records where id = 1')).toThrow('never deleted')
    })
  })

  it('holds, and its check finds a row that was changed, taken away, added or cut off the end', () => {
    withDatabase(db => db.pragma('wal_checkpoint(TRUNCATE)'))
    const whole = verify(join(dataDir(), 'thimbleful.db'))
    expect(whole.stdout + whole.stderr).toContain('The record holds')
    expect(whole.status).toBe(0)
    const middle = withDatabase(db => db.prepare('select id from audit_records where action = \'plan.approve\' limit 1').pluck().get()) as number
    for (const [sql, sentence] of [
      [`update audit_records set actor_name = 'Somebody else' where id = ${middle}`, `Row ${middle} `],
      [`update audit_records set at = '2020-01-01T00:00:00.000Z' where id = ${middle}`, 'was changed after it was written'],
      [`delete from audit_records where id = ${middle}`, 'a row is missing, added or moved'],
      ['delete from audit_records where id = (select max(id) from audit_records)', 'taken off the end'],
      ['insert into audit_records (actor, action, object_type, object_id) values (\'guest\', \'plan.approve\', \'regimen\', \'x\')', 'has no hash'],
    ] as const) {
      const { status, said } = tampered(sql)
      expect(said, sql).toContain(sentence)
      expect(status, sql).toBe(1)
    }
  }, 120_000)
})

describe('lists', () => {
  it('page, sort, filter and search on the server, and stay quick with 5,000 plans', async () => {
    const { browser, me } = await signedUp('A large house')
    const id = await savedPlan(browser, juniperNow())
    withDatabase((db) => {
      const insert = db.prepare('insert into regimens (id, latest_version, key_hash, link_expires_at, team_id, created_at, updated_at, animal_name, case_number, species_name, enclosure, room, weight_g, good_until, search_text, state) select ?, 1, \'\', \'\', team_id, created_at, ?, ?, ?, species_name, ?, ?, weight_g, good_until, ?, ? from regimens where id = ?')
      db.transaction(() => {
        for (let count = 0; count < 5000; count += 1) {
          const [name, room] = [`Animal ${String(count).padStart(4, '0')}`, `Room ${count % 40}`]
          insert.run(`many${me.team!.id}${count}`, new Date(Date.UTC(2026, 0, 1) + count * 60_000).toISOString(), name, `C-${count}`, `${room}, tub ${count}`, room, `${name} c-${count} ${room} 100%_sure`.toLowerCase(), count % 3 === 0 ? 'in-use' : 'draft', id)
        }
      })()
    })
    const list = (query: string) => browser.done<Page<PlanRow>>('GET', `/api/regimens?${query}`)
    const all = await list('')
    expect([all.total, all.items.length, all.page, all.pageSize]).toEqual([5001, 25, 1, 25])
    expect(all.items[0]!.id).toBe(id)
    expect((await list('sort=animalName&page=2&pageSize=100')).items.map(one => one.animalName)[0]).toBe('Animal 0100')
    expect((await list('sort=-animalName&pageSize=2')).items.map(one => one.animalName)).toEqual(['Juniper', 'Animal 4999'])
    expect((await list('state=in-use')).total).toBe(1667)
    expect((await list('room=Room%207')).total).toBe(125)
    expect((await list('q=animal%200042')).items.map(one => one.caseNumber)).toEqual(['C-42'])
    expect((await list('q=100%25_sure')).total).toBe(5000)
    expect((await list('q=100%25Xsure')).total).toBe(0)
    expect((await list('page=400')).items).toEqual([])
    // Every plan is on exactly one page.
    const seen = new Set<string>()
    for (let page = 1; page <= 51; page += 1) for (const one of (await list(`sort=state&pageSize=100&page=${page}`)).items) seen.add(one.id)
    expect(seen.size).toBe(5001)
    // Beside the same list of a team with one plan: paging must not read all of it.
    const small = await signedUp('A small house')
    await savedPlan(small.browser, juniperNow())
    const time = async (one: typeof browser) => {
      const started = performance.now()
      for (let count = 0; count < 20; count += 1) await one.done('GET', '/api/regimens?sort=-updatedAt')
      return performance.now() - started
    }
    await time(browser)
    console.info(`20 lists of 5,001 plans beside 20 lists of one: ${(await time(browser)).toFixed(0)} and ${(await time(small.browser)).toFixed(0)} ms`)
  }, 120_000)

  it.each(['page=0', 'pageSize=101', 'sort=password', 'state=gone', 'page=x'])('say what is wrong with ?%s', async (query) => {
    const { browser } = await signedUp()
    expectOurShape(await browser.ask('GET', `/api/regimens?${query}`), 400, 'input.invalid')
  })

  it('use their indexes', async () => {
    const plan = withDatabase(db => (db.prepare('explain query plan select * from regimens where team_id = ? and moved_at is null order by updated_at desc limit 25').all('x') as { detail: string }[]).map(row => row.detail).join('; '))
    expect(plan).toContain('USING INDEX regimens_team_id')
    expect(plan).not.toContain('TEMP B-TREE FOR ORDER BY')
  })
})

describe('settings', () => {
  it('are refused field by field and kept whole', async () => {
    const { browser, me } = await signedUp()
    const wrong = await browser.ask('PATCH', '/api/team', { name: 'X', settings: { ...me.team!.settings, timeZone: 'Mars/North', contacts: [{ role: 'Vet', phone: '' }], syringes: [{ capacityMl: 1, stepMl: 0.9 }] } })
    expectOurShape(wrong, 400, 'input.invalid')
    expect(wrong.data.issues!.map(issue => issue.path)).toEqual(expect.arrayContaining(['settings.timeZone', 'settings.contacts.0.phone', 'settings.syringes.0']))
    await changeSettings(browser, { paper: 'letter' })
    expect((await browser.done<{ settings: { paper: string } }>('GET', '/api/team')).settings.paper).toBe('letter')
    const pdf = await browser.ask('GET', `/api/regimens/${await savedPlan(browser)}/sheet.pdf`)
    expect(pdf.text).toMatch(/MediaBox\s*\[0 0 612 792\]/)
  })

  it('are not for somebody else\'s team', async () => {
    expectOurShape(await ask('PATCH', '/api/team', { name: 'X', settings: {} }), 401, 'auth.signIn')
  })
})
