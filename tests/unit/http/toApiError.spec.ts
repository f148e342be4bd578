import { createError } from 'h3'
import { describe, expect, it } from 'vitest'
import { CalcInputError } from '../../../server/utils/calc/calcInputError'
import { fail } from '../../../server/utils/http/fail'
import { toApiError } from '../../../server/utils/http/toApiError'

const impossible = new CalcInputError('weight.implausible', 'Too heavy.', { path: 'animal.weightG', received: 9e9 })

describe('toApiError', () => {
  it('passes on what was said on purpose', () => {
    const { status, statusMessage, data } = toApiError(fail({ status: 409, code: 'regimen.changed', message: 'Changed.' }))
    expect({ status, statusMessage, data }).toEqual({ status: 409, statusMessage: 'Conflict', data: { code: 'regimen.changed', message: 'Changed.' } })
  })

  it.each([['itself', impossible], ['as h3 wraps it', createError(impossible as never)]])('answers 422 to an impossible value, %s', (_how, error) => {
    expect(toApiError(error)).toEqual({ status: 422, statusMessage: 'Unprocessable Content', data: { code: 'weight.implausible', message: 'Too heavy.', issues: [{ path: 'animal.weightG', message: 'Too heavy.' }] } })
  })

  it('gives an impossible value without a path the empty one', () => {
    expect(toApiError(new CalcInputError('a.b', 'No.')).data.issues).toEqual([{ path: '', message: 'No.' }])
  })

  it.each<[unknown, number, string]>([
    [createError({ statusCode: 404, statusMessage: 'Cannot find any route matching /api/x.' }), 404, 'route.notFound'],
    [createError({ statusCode: 405, statusMessage: 'HTTP method is not allowed.' }), 405, 'route.method'],
    [createError({ statusCode: 400, statusMessage: 'x', data: { name: 'ZodError', message: '[]' } }), 400, 'request.refused'],
    [createError({ statusCode: 503, message: 'db at /home/someone/data' }), 500, 'server.failed'],
    [new Error('SQLITE_CORRUPT: database disk image is malformed'), 500, 'server.failed'],
    [createError(new TypeError('Cannot read properties of undefined') as never), 500, 'server.failed'],
    ['a thrown string', 500, 'server.failed'],
    [null, 500, 'server.failed'],
    [undefined, 500, 'server.failed'],
  ])('says nothing of its insides: %s', (error, status, code) => {
    const answer = toApiError(error)
    expect(answer.status).toBe(status)
    expect(answer.data.code).toBe(code)
    expect(Object.keys(answer.data).sort()).toEqual(['code', 'message'])
    expect(JSON.stringify(answer)).not.toMatch(/SQLITE|someone|undefined|ZodError|Cannot find|thrown/)
  })
})
