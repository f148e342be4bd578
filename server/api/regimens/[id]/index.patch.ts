import { RegimenChange, RegimenParams, RegimenQuery } from '#shared/schemas/regimen'
import { requireRegimen } from '#server/utils/access/requireRegimen'
import { database, insertRegimenVersion, RegimenChangedError } from '#server/utils/data'
import { fail } from '#server/utils/http/fail'
import { limitRequests } from '#server/utils/http/limitRequests'
import { readBodyOf, readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { planOf } from '#server/utils/regimen/planOf'
import { whenInZone } from '#server/utils/regimen/whenInZone'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'A new version of a saved plan; the old one stays', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'key' }], requestBody: { description: 'RegimenInput, and baseVersion: the version it was changed from', content: { 'application/json': {} } }, responses: { 200: { description: '{ id, version }' }, 403: { description: 'A plan of the demonstration' }, 404: { description: 'No such plan, wrong key, or the link has ended' }, 409: { description: 'Someone else saved a newer version meanwhile' }, 422: { description: 'Understood, but impossible' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const row = await requireRegimen(event, id, readQueryOf(event, RegimenQuery).key, 'change')
  const { baseVersion, ...input } = await readBodyOf(event, RegimenChange)
  const plan = planOf(input)
  try {
    return { id, version: insertRegimenVersion(database(), { id: row.id, baseVersion, actor: 'guest', at: new Date().toISOString(), input, plan }) }
  }
  catch (error) {
    if (!(error instanceof RegimenChangedError)) throw error
    throw fail({ status: 409, code: 'regimen.changed', message: `Version ${error.latestVersion} was saved meanwhile by someone with this plan's link: ${whenInZone(error.changedAt, input.timeZone)}. Open it, compare, and make your change there. Nothing was overwritten.` })
  }
})
