import { describe, expect, it } from 'vitest'
import { methodsAt } from '../../../server/utils/http/methodsAt'

const routes = [
  { route: '/api/regimens/:id', method: 'get' }, { route: '/api/regimens/:id', method: 'patch' }, { route: '/api/regimens/preview', method: 'post' },
  { route: '/api/regimens', method: 'get' }, { route: '/api/**' }, { route: '/**', method: undefined }, { route: '', method: undefined }, { route: '/api/health', method: 'get' },
]

describe('methodsAt', () => {
  it.each([
    ['/api/regimens/abc', ['GET', 'PATCH']],
    ['/api/regimens/preview', ['GET', 'PATCH', 'POST']],
    ['/api/regimens', ['GET']],
    ['/api/regimens/', []],
    ['/api/nothing', []],
    ['/api/regimens/a/b', []],
    ['/api', []],
  ])('%s takes %j', (path, methods) => expect(methodsAt(path, routes)).toEqual(methods))
})
