import type { RegimenInput } from '#shared/schemas/regimen'
import type { Plan, SavedRegimen } from '#shared/types/plan'
import type { RegimenRow } from '#shared/types/rows'
import { database, findRegimenVersion } from '../data'
import { fail } from '../http/fail'

/** One version of a plan exactly as it was saved: nothing is worked out again. The newest when none is named. */
export function versionOf(row: RegimenRow, version = row.latestVersion): SavedRegimen {
  const found = findRegimenVersion(database(), row.id, version)
  if (!found) throw fail({ status: 404, code: 'regimen.noVersion', message: `This plan has no version ${version}. Its newest is ${row.latestVersion}.` })
  return {
    id: row.id,
    version: found.version,
    latestVersion: row.latestVersion,
    createdAt: found.createdAt,
    linkExpiresAt: row.linkExpiresAt,
    edition: found.edition,
    ...(row.demo && { demo: true }),
    input: JSON.parse(found.inputJson) as RegimenInput,
    plan: JSON.parse(found.planJson) as Plan,
  }
}
