import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import type { ChangedLine } from '#shared/types/planLife'
import type { RegimenRow } from '#shared/types/rows'
import { database, findRegimenVersion } from '../data'
import { fail } from '../http/fail'
import { compareVersions, type ComparedVersion } from './compareVersions'
import { whenInZone } from './whenInZone'

/** @throws 404 `regimen.noVersion`. */
export function comparedVersion(id: string, version: number): ComparedVersion {
  const found = findRegimenVersion(database(), id, version)
  if (!found) throw fail({ status: 404, code: 'regimen.noVersion', message: `This plan has no version ${version}.` })
  return { input: JSON.parse(found.inputJson) as RegimenInput, plan: JSON.parse(found.planJson) as Plan }
}

/** What differs between two versions of a plan, line by line, in words. */
export function changesSince(id: string, from: number, to: number): ChangedLine[] {
  return compareVersions(comparedVersion(id, from), comparedVersion(id, to))
}

/** More lines than anyone reads in an error; the comparison has them all. */
const MOST_LINES = 20

/** Somebody else was quicker: who, when and what. Nothing was overwritten. */
export function changedMeanwhile(row: RegimenRow, baseVersion: number) {
  const version = findRegimenVersion(database(), row.id, row.latestVersion)!
  const plan = JSON.parse(version.planJson) as Plan
  const who = row.teamId ? version.author || 'somebody' : 'someone with this plan\'s link'
  const lines = baseVersion < row.latestVersion && findRegimenVersion(database(), row.id, baseVersion) ? changesSince(row.id, baseVersion, row.latestVersion) : []
  return fail({
    status: 409, code: 'regimen.changed', message: `Version ${row.latestVersion} was saved meanwhile by ${who}: ${whenInZone(version.createdAt, plan.timeZone)}. Open it, compare, and make your change there. Nothing was overwritten.`,
    issues: lines.slice(0, MOST_LINES).map(line => ({ path: line.part, message: line.text })),
  })
}
