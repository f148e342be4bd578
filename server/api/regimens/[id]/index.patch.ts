import { RegimenChange, RegimenParams, RegimenQuery } from '#shared/schemas/regimen'
import { requireRegimen } from '#server/utils/access/requireRegimen'
import { readBodyOf, readParamsOf, readQueryOf } from '#server/utils/http/readInput'
import { limitRequests } from '#server/utils/http/limitRequests'
import { saveChange } from '#server/utils/regimen/saveChange'

defineRouteMeta({ openAPI: { tags: ['Plans'], summary: 'A new version of a saved plan; the old one stays, and an approval of it ends', parameters: [{ in: 'path', name: 'id', required: true }, { in: 'query', name: 'key' }], requestBody: { description: 'RegimenChange', content: { 'application/json': {} } }, responses: { 200: { description: '{ id, version }' }, 403: { description: 'A plan of the demonstration, or not with this role' }, 404: { description: 'No such plan, wrong key, or the link has ended' }, 409: { description: 'Someone else saved a newer version meanwhile: who, when, and data.issues says what' }, 422: { description: 'Understood, but impossible' } } } })

export default defineEventHandler(async (event) => {
  await limitRequests(event, 'save', useRuntimeConfig().rateLimitFactor)
  const { id } = readParamsOf(event, RegimenParams)
  const opened = await requireRegimen(event, id, readQueryOf(event, RegimenQuery).key, 'plan.edit')
  return { id, version: saveChange(event, opened, await readBodyOf(event, RegimenChange)) }
})
