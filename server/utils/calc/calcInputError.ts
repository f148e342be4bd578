/**
 * Impossible input to a formula. Worrying but possible input is returned as a finding instead.
 *
 * @param code  `topic.problem`, stable, for example `weight.notPositive`.
 * @param message  one sentence that names the quantity and what is expected.
 * @param detail.path  path of the input, when it is known, for example `animal.weightG`.
 * @source house rule (one error for every formula)
 * @example throw new CalcInputError('weight.notPositive', 'The weight must be above 0 g.', { path: 'animal.weightG' })
 */
export class CalcInputError extends Error {
  readonly code: string
  readonly path?: string
  readonly received?: unknown
  readonly expected?: string

  constructor(code: string, message: string, detail: { path?: string, received?: unknown, expected?: string } = {}) {
    super(message)
    this.name = 'CalcInputError'
    this.code = code
    this.path = detail.path
    this.received = detail.received
    this.expected = detail.expected
  }
}
