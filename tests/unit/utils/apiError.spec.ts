import { describe, expect, it } from 'vitest'
import { apiProblemOf } from '../../../utils/apiError'

describe('apiProblemOf', () => {
  it('reads our shape out of what a request threw', () => {
    const data = { code: 'input.invalid', message: 'The weight must be a number in g.', issues: [{ path: 'animal.weightG', message: 'The weight must be a number in g.' }] }
    expect(apiProblemOf({ statusCode: 400, data: { statusCode: 400, message: data.message, data } })).toEqual({ ...data, offline: false })
  })
  it('knows that nothing answered', () => expect(apiProblemOf(new TypeError('Failed to fetch'))).toMatchObject({ code: 'network.offline', offline: true }))
  it.each([{ statusCode: 502, data: '<html>Bad Gateway</html>' }, { statusCode: 500 }, { statusCode: 500, data: { data: { message: 'x' } } }])('takes an answer of another shape for a failure of the server: %j', (error) => {
    expect(apiProblemOf(error)).toMatchObject({ code: 'server.failed', offline: false })
  })
  it.each([null, undefined, 'text'])('does not fall over %j', error => expect(apiProblemOf(error).message.length).toBeGreaterThan(10))
})
