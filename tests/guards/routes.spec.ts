import { describe, expect, it } from 'vitest'
import { checkSkips, filesUnder, textOf } from './files'

const routes = filesUnder('server/api', ['.ts'])

/** Routes that ask nobody who they are, each with its reason: a new route must be guarded, or stand here. */
const PUBLIC: Record<string, string> = {
  'server/api/[...].ts': 'answers only that there is nothing at an address',
  'server/api/health.get.ts': 'says only that the server is up, and its edition',
  'server/api/reference/species.get.ts': 'published figures, the same for everyone',
  'server/api/reference/foods.get.ts': 'published figures, the same for everyone',
  'server/api/reference/equations/index.get.ts': 'published figures, the same for everyone',
  'server/api/reference/equations/[id]/value.get.ts': 'a sum over published figures, nothing kept',
  'server/api/reference/sources.get.ts': 'the bibliography, the same for everyone',
  'server/api/regimens/preview.post.ts': 'works out what was sent, nothing kept',
  'server/api/regimens/sheet.pdf.post.ts': 'prints what was sent, nothing kept',
  'server/api/regimens/mixing.pdf.post.ts': 'prints what was sent, nothing kept',
  'server/api/regimens/label.pdf.post.ts': 'prints what was sent, nothing kept',
  'server/api/auth/me.get.ts': 'says who is signed in, to themselves',
  'server/api/auth/sign-out.post.ts': 'ends only the sign-in of this browser',
  'server/api/help/close.post.ts': 'ends only the visit of this browser',
  'server/api/sheets/[id].get.ts': 'lookAtSheet asks for membership, a visit or the code of the paper',
}

/** What guards a route: a member, somebody signed in, a plan's key, a helper's visit, or a counted try with a secret. */
const GUARDS = /\b(requireMember|requireSignedIn|requireRegimen|requireTeamRegimen|requireVisit|takeAttempt)\(/

describe('every route', () => {
  it('exists for each public entry, with a reason', () => expect(checkSkips(PUBLIC, routes)).toEqual([]))

  it.each(routes)('%s is public for a reason, or guarded', (path) => {
    if (!(path in PUBLIC)) expect(textOf(path), 'call a guard of access/, or list it as public with a reason').toMatch(GUARDS)
  })
  it.each(routes)('%s is described in the OpenAPI document', path => expect(textOf(path)).toContain('defineRouteMeta('))
  it.each(routes.filter(path => /\.(post|put|patch)\.ts$/.test(path)))('%s reads its body through a schema', path => expect(textOf(path)).toContain('readBodyOf('))
  it.each(routes.filter(path => path.includes('[') && !path.includes('[...]')))('%s reads the parts of its address through a schema', path => expect(textOf(path)).toContain('readParamsOf('))
  it.each(routes.filter(path => /\.(post|put|patch|delete)\.ts$/.test(path)))('%s counts how often it is asked', path => expect(textOf(path)).toContain('limitRequests('))
  it.each(routes)('%s does not read input around the schemas', (path) => {
    expect(textOf(path)).not.toMatch(/\b(readBody|getQuery|getRouterParam|getRouterParams|readRawBody|readFormData)\(/)
  })
  it.each(routes)('%s stays short', path => expect(textOf(path).split('\n').length).toBeLessThan(90))
})
