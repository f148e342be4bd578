import type { H3Event } from 'h3'
import type { z } from 'zod'
import type { FeedEntryInput, WeighInInput } from '#shared/schemas/planLife'
import type { FeedEntry, TeamPlanInfo, WeighIn } from '#shared/types/planLife'
import type { FeedEntryRecord, RegimenRow } from '#shared/types/rows'
import type { Page } from '#shared/types/team'
import type { Role } from '#shared/utils/abilities'
import { settingsOf, type Member } from '../access/requireMember'
import { regimenNotFound, type OpenedRegimen } from '../access/requireRegimen'
import { database, findTeam, findTeamRegimen, insertFeedEntry, insertWeighIn, lapseRegimen, listFeedEntries, strikeFeedEntry } from '../data'
import type { ListAsked } from '../data/paging'
import { fail } from '../http/fail'
import { approvalLapsedMail, broughtUpMail } from '../mail/templates'
import { serverOrigin } from '../team/serverOrigin'
import { tellRoles } from '../team/tell'
import { judgeWeighIn } from './judgeWeighIn'
import { newestPlan, teamInfo } from './teamPlan'
import { whenInZone } from './whenInZone'

const animalOf = (row: RegimenRow) => row.animalName || row.speciesName

/** Writes a weight down. One that no longer fits the plan ends its approval at once, and tells the vets. */
export function addWeighIn(event: H3Event, { row, member }: OpenedRegimen & { member: Member }, { weightG, weighedAt }: z.output<typeof WeighInInput>): { weighIn: WeighIn, team: TeamPlanInfo } {
  const now = new Date()
  const at = now.toISOString()
  const when = new Date(weighedAt ?? at).toISOString()
  if (when > new Date(now.getTime() + 60_000).toISOString()) throw fail({ status: 422, code: 'weight.fromTheFuture', message: 'This weighing lies in the future. Check date and time.', issues: [{ path: 'weighedAt', message: 'Give a time that has passed.' }] })
  const { teamId, actor, user, team } = member
  const plan = newestPlan(row)
  // A weight from before the last one is kept, but says nothing about today.
  const isNewest = row.lastWeighedAt === null || when >= row.lastWeighedAt
  const verdict = isNewest ? judgeWeighIn(plan, weightG) : { effect: 'An earlier weight, kept for the record.', lapse: null }
  const entry = insertWeighIn(database(), { row, teamId, weightG, weighedAt: when, actor, at, effect: verdict.effect })
  const { lapse } = verdict
  if (lapse) {
    lapseRegimen(database(), { teamId, id: row.id, at, reason: lapse, actor }, (tx, _row, lapsed) => {
      tellRoles(tx, teamId, ['vet', 'coordinator'], user.id, approvalLapsedMail({ animal: animalOf(row), version: lapsed[0]!.version, reason: lapse, link: `${serverOrigin(event)}/plans/${row.id}` }, { teamName: team.name }), at)
    })
  }
  const { id, by, effect } = entry
  return { weighIn: { id, weightG, weighedAt: when, by, effect }, team: teamInfo(findTeamRegimen(database(), teamId, row.id)!, member, now) }
}

const TOLD: Record<string, Role[]> = { nobody: [], coordinators: ['coordinator'], vets: ['vet'], both: ['coordinator', 'vet'] }

/** Writes down what happened at a feed. Initials come from the visit of a helper, or from the person. */
export function addFeed(event: H3Event, { row, actor, member, initials }: OpenedRegimen, { outcome, dueAt, takenMl, note, initials: given }: z.output<typeof FeedEntryInput>): FeedEntry {
  if (!row.teamId) throw regimenNotFound()
  const teamId = row.teamId
  if (outcome === 'part' && takenMl === undefined) throw fail({ status: 422, code: 'feed.noAmount', message: 'Say how much it took, in mL.', issues: [{ path: 'takenMl', message: 'Say how much it took, in mL.' }] })
  const signed = initials ?? given ?? (member ? initialsOf(member.user.name) : '')
  const at = new Date().toISOString()
  const team = findTeam(database(), teamId)!
  const settings = settingsOf(team)
  const entry = insertFeedEntry(database(), { row, teamId, actor, entry: { version: row.latestVersion, at, dueAt: dueAt ? new Date(dueAt).toISOString() : null, outcome, takenMl: takenMl ?? null, note, initials: signed, by: actor.name } }, (tx) => {
    if (outcome !== 'brought-up') return
    tellRoles(tx, teamId, TOLD[settings.escalation.broughtUpTell] ?? [], member?.user.id ?? null, broughtUpMail({ animal: animalOf(row), when: whenInZone(at, settings.timeZone), initials: signed, link: `${serverOrigin(event)}/plans/${row.id}` }, { teamName: team.name }), at)
  })
  return feedEntryOf(entry)
}

export function strikeFeed({ row, actor }: OpenedRegimen, entryId: number, reason: string): void {
  if (!row.teamId || !strikeFeedEntry(database(), { row, teamId: row.teamId, entryId, reason, actor, at: new Date().toISOString() })) throw fail({ status: 404, code: 'feed.notFound', message: 'There is no such line, or it was struck out before.' })
}

export function listFeeds(row: RegimenRow, asked: ListAsked): Page<FeedEntry> {
  if (!row.teamId) throw regimenNotFound()
  const page = listFeedEntries(database(), row.teamId, row.id, asked)
  return { ...page, items: page.items.map(feedEntryOf) }
}

function feedEntryOf({ id, at, dueAt, outcome, takenMl, note, initials, by, struckAt, struckReason }: FeedEntryRecord): FeedEntry {
  return { id, at, dueAt, outcome, takenMl, note, initials, by, struckAt, struckReason }
}

/** @example initialsOf('Mara Linde') // 'ML' */
export function initialsOf(name: string): string {
  return name.split(/\s+/).filter(word => /\p{L}/u.test(word)).map(word => word.charAt(0).toUpperCase()).join('').slice(0, 6) || name.slice(0, 2)
}
