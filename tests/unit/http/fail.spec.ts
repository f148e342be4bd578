import { isError } from 'h3'
import { describe, expect, it } from 'vitest'
import { fail } from '../../../server/utils/http/fail'

describe('fail', () => {
  it('makes an error answer in our shape', () => {
    const error = fail({ status: 422, code: 'weight.implausible', message: 'Give 0.5 µg – or “more”.', issues: [{ path: 'animal.weightG', message: 'Too much.' }], findings: [] })
    expect(isError(error)).toBe(true)
    expect(error).toMatchObject({ statusCode: 422, message: 'Give 0.5 µg – or “more”.', data: { code: 'weight.implausible', message: 'Give 0.5 µg – or “more”.', issues: [{ path: 'animal.weightG', message: 'Too much.' }], findings: [] } })
  })
  it('leaves out what there is not', () => {
    expect(fail({ status: 404, code: 'a.b', message: 'No.' }).data).toEqual({ code: 'a.b', message: 'No.' })
  })
  it.each([400, 403, 404, 405, 409, 413, 422, 429, 500, 418])('keeps the status line of %i to short ASCII words', (status) => {
    const { statusMessage } = fail({ status, code: 'a.b', message: 'Größe > 5 µg' })
    expect(statusMessage).toMatch(/^[A-Za-z ]{4,30}$/)
    expect(statusMessage).not.toContain('Gr')
  })
})
