import type { Plan } from '#shared/types/plan'
import type { Role } from '#shared/utils/abilities'
import { forgetOldAttempts } from '../access/attempts'
import { settingsOf } from '../access/requireMember'
import { approvalsGoodUntilBefore, database, emptyOldMails, findTeam, findTeamRegimen, lapseRegimen, regimensWaitingSince, SYSTEM, wasToldSince, writeAudit, WRITING } from '../data'
import { approvalLapsedMail, approvalWaitsMail } from '../mail/templates'
import { tellRoles } from '../team/tell'
import { dateReason } from './standingOf'
import { todayInZone } from './whenInZone'

const DAY_MS = 86_400_000
const KEEP_UNSENT_DAYS = 30
const TOLD: Record<string, Role[]> = { coordinators: ['coordinator'], vets: ['vet'], both: ['coordinator', 'vet'] }

/**
 * What time alone brings about: approvals whose days are over lapse, and are told of; an approval that waits too long is
 * told to those the team named. Screens and paper say so by themselves; this writes it down and sends the mails.
 */
export function sweep(now: Date, origin: string): void {
  lapseByDate(now, origin)
  tellOfWaiting(now, origin)
  forgetOldAttempts(now)
  emptyOldMails(database(), new Date(now.getTime() - KEEP_UNSENT_DAYS * DAY_MS).toISOString())
}

function lapseByDate(now: Date, origin: string): void {
  const at = now.toISOString()
  // A day is over first where the sun rises first: each plan's own zone is looked at below.
  const latest = new Date(now.getTime() + DAY_MS).toISOString().slice(0, 10)
  for (const approval of approvalsGoodUntilBefore(database(), latest)) {
    const { timeZone } = JSON.parse(approval.planJson) as Plan
    if (todayInZone(now, timeZone) <= approval.goodUntil) continue
    const reason = dateReason(approval.goodUntil)
    lapseRegimen(database(), { teamId: approval.teamId, id: approval.regimenId, at, reason }, (tx, row) => {
      tellRoles(tx, approval.teamId, ['vet', 'coordinator'], null, approvalLapsedMail({ animal: row.animalName || row.speciesName, version: approval.version, reason, link: `${origin}/plans/${row.id}` }, { teamName: findTeam(tx, approval.teamId)?.name }), at)
    })
  }
}

function tellOfWaiting(now: Date, origin: string): void {
  const at = now.toISOString()
  for (const row of regimensWaitingSince(database(), 'approval', new Date(now.getTime() - 3_600_000).toISOString())) {
    const team = findTeam(database(), row.teamId!)!
    const { approvalWaitsHours, approvalWaitsTell } = settingsOf(team).escalation
    const hours = Math.floor((now.getTime() - Date.parse(row.waitingSince!)) / 3_600_000)
    if (approvalWaitsHours === 0 || hours < approvalWaitsHours || wasToldSince(database(), row.id, 'plan.waitsLong', row.waitingSince!)) continue
    database().transaction((tx) => {
      if (findTeamRegimen(tx, team.id, row.id)?.waiting !== 'approval') return
      const animal = row.animalName || row.speciesName
      writeAudit(tx, { at, actor: SYSTEM, teamId: team.id, action: 'plan.waitsLong', objectType: 'regimen', objectId: row.id, objectName: animal, version: row.latestVersion, detail: { hours } })
      tellRoles(tx, team.id, TOLD[approvalWaitsTell] ?? [], null, approvalWaitsMail({ animal, hours, link: `${origin}/plans/${row.id}/approve` }, { teamName: team.name }), at)
    }, WRITING)
  }
}
