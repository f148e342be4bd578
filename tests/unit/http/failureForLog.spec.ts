import { expect, it } from 'vitest'
import { failureForLog } from '../../../server/utils/http/failureForLog'

it('says what failed and where, without the key of a plan', () => {
  const cause = new Error('[GET] "/api/regimens/abc?key=SECRET-1&version=2": 500')
  const text = failureForLog({ method: 'GET', path: '/plans/abc?key=SECRET-2' }, new Error('render of http://x/plans/abc?a=1&key=SECRET-3 failed', { cause }))
  expect(text).toContain('GET /plans/abc ')
  expect(text).toContain('key=…&version=2')
  expect(text).toContain('failureForLog.spec')
  expect(text).not.toContain('SECRET')
})
