import { VersionsQuery } from '#shared/schemas/planLife'
import { RegimenParams } from '#shared/schemas/regimen'
import type { Plan } from '#shared/types/plan'
import { requireTeamRegimen } from '#server/utils/access/requireRegimen'
import { database, findApproval, listRegimenVersions } from '#server/utils/data'
import { readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { approvalOf } from '#server/utils/regimen/standingOf'

defineRouteMeta({ openAPI: { tags: ['Life of a plan'], summary: 'Every version of a plan: by whom, when, for which weight, approved or not', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'page' }, { in: 'query', name: 'pageSize' }, { in: 'query', name: 'sort' }, { in: 'query', name: 'q' }], responses: { 200: { description: 'Page of VersionRow' }, 404: { description: 'No such plan in this team' } } } })

export default defineEventHandler(async (event) => {
  const { id } = readParamsOf(event, RegimenParams)
  await requireTeamRegimen(event, id, 'plan.see')
  const page = listRegimenVersions(database(), id, readQueryOf(event, VersionsQuery))
  return {
    ...page,
    items: page.items.map(({ planJson, ...row }) => {
      const approval = findApproval(database(), id, row.version)
      return { version: row.version, createdAt: row.createdAt, author: row.author, edition: row.edition, note: row.note, weightG: (JSON.parse(planJson) as Plan).animal.weightG, approval: approval ? approvalOf(approval) : null }
    }),
  }
})
