import { currentEdition } from '#server/utils/reference'

defineRouteMeta({ openAPI: { tags: ['About'], summary: 'Is the server up, and with which reference data', responses: { 200: { description: '{ ok, edition, version }' } } } })

export default defineEventHandler(() => ({ ok: true, edition: currentEdition().id, version: useRuntimeConfig().public.appVersion }))
