import type { z } from 'zod'
import type { TeamChange } from '#shared/schemas/team'
import type { Me } from '#shared/types/team'
import { can, type Role } from '#shared/utils/abilities'
import { notAllowed, type Member } from '../access/requireMember'
import { changedFields, countCoordinators, database, endLinksOf, endMember, findMemberById, setMemberRole, updateTeam, writeAudit, WRITING } from '../data'
import { fail } from '../http/fail'
import { meOf } from './meOf'

export function changeTeam(member: Member, { name, settings }: z.output<typeof TeamChange>): Me['team'] {
  const { team, teamId, actor } = member
  const settingsJson = JSON.stringify(settings)
  database().transaction((tx) => {
    updateTeam(tx, teamId, { name, settingsJson })
    writeAudit(tx, { at: new Date().toISOString(), actor, teamId, action: 'team.change', objectType: 'team', objectId: teamId, objectName: name, ...changedFields({ name: team.name, settings: member.settings }, { name, settings }) })
  }, WRITING)
  return meOf({ ...member, team: { ...team, name, settingsJson } }).team
}

/** @throws 404, 422 `member.lastCoordinator`. */
export function changeRole({ teamId, actor }: Member, id: string, role: Role): { role: Role } {
  database().transaction((tx) => {
    const found = findMemberById(tx, teamId, id)
    if (!found) throw memberNotFound()
    if (found.member.role === 'coordinator' && role !== 'coordinator' && countCoordinators(tx, teamId) === 1) throw lastCoordinator()
    setMemberRole(tx, teamId, id, role)
    writeAudit(tx, { at: new Date().toISOString(), actor, teamId, action: 'member.changeRole', objectType: 'member', objectId: id, objectName: found.user.name, before: { role: found.member.role }, after: { role } })
  }, WRITING)
  return { role }
}

/** Anyone may leave; only coordinators take others out. @throws 403, 404, 422 `member.lastCoordinator`. */
export function removeMember({ teamId, user, role, actor }: Member, id: string): void {
  database().transaction((tx) => {
    const found = findMemberById(tx, teamId, id)
    const isSelf = found?.user.id === user.id
    if (!isSelf && !can(role, 'people.change')) throw notAllowed(role, 'people.change')
    if (!found) throw memberNotFound()
    if (found.member.role === 'coordinator' && countCoordinators(tx, teamId) === 1) throw lastCoordinator()
    const at = new Date().toISOString()
    endMember(tx, teamId, id, found.user.id, at)
    const linksEnded = endLinksOf(tx, teamId, found.user.id, at)
    writeAudit(tx, { at, actor, teamId, action: isSelf ? 'member.leave' : 'member.remove', objectType: 'member', objectId: id, objectName: found.user.name, before: { role: found.member.role }, detail: { linksEnded } })
  }, WRITING)
}

function memberNotFound() {
  return fail({ status: 404, code: 'member.notFound', message: 'There is no such person in this team.' })
}

function lastCoordinator() {
  return fail({ status: 422, code: 'member.lastCoordinator', message: 'A team needs a coordinator. Make somebody else one first.' })
}
