import { randomBytes, scryptSync } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { desc, eq } from 'drizzle-orm'
import type { RegimenInput } from '#shared/schemas/regimen'
import { TeamSettings } from '#shared/schemas/team'
import { newLinkKey, newRegimenId } from '../utils/access/linkKey'
import { insertMember, insertTeam, insertUser } from '../utils/data/peopleRows'
import { insertRegimen, insertRegimenVersion, stepRegimen } from '../utils/data/regimenRows'
import { buildPlan } from '../utils/plan/buildPlan'
import { currentEdition } from '../utils/reference'
import { decideStep } from '../utils/regimen/planLife'
import type { Db } from './client'
import { regimenVersions, teams } from './schema'
import { CONTACTS, DEMO_PEOPLE, DEMO_PLANS, HOURS, type DemoPlan } from './seed.data'

const HOUR_MS = 3_600_000
const ID = 'demosaltings'

/**
 * A team of invented people with one account for each role, and plans in every state of their life. Their password is
 * made on the first start and kept beside the data, for `npm start` to print.
 * @returns whether it was added: never to a database that holds a team.
 */
export function seedTeam(db: Db, folder: string, now = new Date()): boolean {
  if (db.select({ id: teams.id }).from(teams).limit(1).get()) return false
  const passwordHash = hashOf(demoPassword(folder))
  const settings = TeamSettings.parse({ address: 'The Boathouse, Saltings Lane', feedingHours: HOURS, contacts: CONTACTS.slice(0, 1).map(one => ({ name: '', ...one })), ladder: CONTACTS.slice(1).map(one => ({ name: '', ...one })), syringes: [{ capacityMl: 0.5, stepMl: 0.01 }, { capacityMl: 1, stepMl: 0.01 }, { capacityMl: 3, stepMl: 0.1 }, { capacityMl: 10, stepMl: 0.5 }] })
  // All of it or nothing: half a demonstration would be a puzzle.
  db.transaction(() => addTeam(db, settings, passwordHash, now))
  return true
}

function addTeam(db: Db, settings: TeamSettings, passwordHash: string, now: Date): void {
  const at = now.toISOString()
  insertTeam(db, { id: ID, name: 'Saltings Rescue', settingsJson: JSON.stringify(settings), demo: true, createdAt: at })
  for (const { name, email, role, registration = '' } of DEMO_PEOPLE) {
    const id = `demo${email.split('@')[0]}`
    insertUser(db, { id, name, email, passwordHash, registration, demo: true, createdAt: at })
    insertMember(db, { id: newRegimenId(), teamId: ID, userId: id, role, joinedAt: at })
  }
  for (const plan of DEMO_PLANS) seedPlan(db, plan, settings, now)
}

function seedPlan(db: Db, { input, by, hoursAgo, steps }: DemoPlan, settings: TeamSettings, now: Date): void {
  const ago = (hours: number) => new Date(now.getTime() - hours * HOUR_MS)
  const start = ago(hoursAgo).toISOString()
  // A plan goes on from where it began; what is new is the weight and its day.
  const whole = (weightG: number, at: Date): RegimenInput => ({ ...input, animal: { ...input.animal, weightG, weighedOn: at.toISOString().slice(0, 10) }, startAt: start, syringes: settings.syringes })
  const id = newRegimenId()
  const first = whole(input.animal.weightG, ago(hoursAgo))
  insertRegimen(db, { id, ...newLinkKey(now), teamId: ID, actor: actorOfDemo(by), at: first.startAt, input: first, plan: buildPlan(first, currentEdition()) })
  for (const { hoursAgo: when, by: who, step, text = '', weightG, note } of steps) {
    const at = ago(when)
    if (weightG !== undefined) {
      const changed = whole(weightG, at)
      insertRegimenVersion(db, { id, actor: actorOfDemo(who), at: at.toISOString(), input: changed, plan: buildPlan(changed, currentEdition()), note })
    }
    if (!step) continue
    const newest = db.select().from(regimenVersions).where(eq(regimenVersions.regimenId, id)).orderBy(desc(regimenVersions.version)).limit(1).get()!
    const person = DEMO_PEOPLE.find(one => one.email.startsWith(`${who}@`))!
    stepRegimen(db, { teamId: ID, id, at: at.toISOString(), actor: actorOfDemo(who) }, (_tx, row, approval) => decideStep(step, { row, plan: JSON.parse(newest.planJson) as ReturnType<typeof buildPlan>, approval, approvalRequired: true, who: { ...actorOfDemo(who), role: person.role, registration: person.registration ?? '' }, now: at }, text))
  }
}

function actorOfDemo(who: string) {
  return { id: `user:demo${who}`, name: DEMO_PEOPLE.find(one => one.email.startsWith(`${who}@`))!.name }
}

function demoPassword(folder: string): string {
  const file = join(folder, 'demo-password')
  if (!existsSync(file)) writeFileSync(file, `saltings-${randomBytes(6).toString('hex')}\n`, { mode: 0o600 })
  return readFileSync(file, 'utf8').trim()
}

/** The form that the sign-in verifies (PHC string of scrypt with the usual cost), made without waiting: the start is synchronous. */
function hashOf(password: string): string {
  const salt = randomBytes(16)
  const hash = scryptSync(password, salt, 64, { N: 16384, r: 8, p: 1, maxmem: 64 * 1024 * 1024 })
  const text = (bytes: Buffer) => bytes.toString('base64').replace(/=+$/, '')
  return `$scrypt$n=16384,r=8,p=1$${text(salt)}$${text(hash)}`
}
