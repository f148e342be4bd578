// The screens' own type check reads routes too, and finds no declaration by itself.
// eslint-disable-next-line @typescript-eslint/triple-slash-reference
/// <reference path="../virtual.d.ts" />
import { handlersMeta } from '#nitro-internal-virtual/server-handlers-meta'
import { fail } from '#server/utils/http/fail'
import { methodsAt } from '#server/utils/http/methodsAt'

defineRouteMeta({ openAPI: { tags: ['About'], summary: 'Whatever no other route answers', responses: { 404: { description: 'There is nothing at this address' }, 405: { description: 'There is, but not for this kind of request; the header Allow says for which' } } } })

/** Without this, unknown addresses under /api would fall through to the pages. */
export default defineEventHandler((event) => {
  const methods = methodsAt(event.path.split('?')[0]!, handlersMeta)
  if (methods.length === 0) throw fail({ status: 404, code: 'route.notFound', message: 'There is nothing at this address.' })
  setResponseHeader(event, 'allow', methods.join(', '))
  throw fail({ status: 405, code: 'route.method', message: `This address takes ${methods.join(' and ')} requests only.` })
})
