import { afterAll, beforeAll, expect, it, vi } from 'vitest'
import { closeDatabase } from '../../../server/db/client'
import { migrateDatabase } from '../../../server/db/migrate'
import { mails, regimens, approvals } from '../../../server/db/schema'
import { seedTeam } from '../../../server/db/seedTeam'
import { database, listRecord, verifyChain } from '../../../server/utils/data'
import { beginChain } from '../../../server/utils/data/auditRows'
import { sweep } from '../../../server/utils/regimen/sweep'
import { MIGRATIONS, scratchFolder } from '../db/scratch'

/** The invented team of the demonstration, and time that goes by. */
const scratch = scratchFolder()
const NOW = new Date('2026-12-03T12:00:00Z')
const later = (hours: number) => new Date(NOW.getTime() + hours * 3_600_000)
const told = (kind: string) => database().select().from(mails).all().filter(mail => mail.kind === kind)
const team = () => database().select().from(regimens).all()[0]!.teamId!

beforeAll(() => {
  vi.stubEnv('NUXT_DATA_DIR', scratch.folder)
  closeDatabase()
  migrateDatabase(database(), MIGRATIONS)
  beginChain(database(), NOW.toISOString())
  seedTeam(database(), scratch.folder, NOW)
})
afterAll(() => {
  closeDatabase()
  scratch.remove()
  vi.unstubAllEnvs()
})

it('seeds plans in every state of their life, each state reached by its own steps', () => {
  const states = database().select().from(regimens).all().map(row => [row.animalName, row.state, row.waiting].filter(Boolean).join(' '))
  expect(states.sort()).toEqual(['Bracken draft', 'Juniper in-use', 'Oak checked approval', 'Pebble draft check', 'Sorrel finished'])
  expect(seedTeam(database(), scratch.folder, NOW)).toBe(false)
})

it('does nothing while nothing is due', () => {
  sweep(NOW, 'https://plans.saltings.example')
  expect(database().select().from(mails).all()).toEqual([])
})

it('tells once of an approval that waits too long', () => {
  for (const hours of [5, 7, 8]) sweep(later(hours), 'https://plans.saltings.example')
  expect(told('approvalWaits').map(mail => mail.toAddress).sort()).toEqual(['amara@saltings.example', 'ines@saltings.example'])
  expect(told('approvalWaits')[0]!.text).toMatch(/https:\/\/plans\.saltings\.example\/plans\/\w+\/approve/)
})

it('lets an approval lapse with its last day in its own zone, writes it down, and tells of it once', () => {
  const standing = () => database().select().from(approvals).all().filter(one => one.lapsedAt === null)
  // Pebble's ended with its second version, Sorrel's with the plan.
  expect(standing()).toHaveLength(1)
  const [juniper] = standing()
  const lastDay = Date.parse(`${juniper!.goodUntil}T23:59:00Z`)
  sweep(new Date(lastDay), 'https://plans.saltings.example')
  expect(standing()).toHaveLength(1)
  for (const minutes of [2, 3]) sweep(new Date(lastDay + minutes * 60_000), 'https://plans.saltings.example')
  expect(standing()).toEqual([])
  expect(told('approvalLapsed')).toHaveLength(2)
  const { items } = listRecord(database(), team(), { page: 1, pageSize: 100, sort: '-at', q: '', action: 'approval.lapse' })
  expect(items[0]).toMatchObject({ actor: 'system', reason: expect.stringContaining('good until') as string })
  expect(verifyChain(database()).problems).toEqual([])
})
