import { H3Error } from 'h3'
import type { ApiErrorData } from '#shared/types/error'
import { CalcInputError } from '../calc/calcInputError'
import { fail } from './fail'

/** The one place that turns any failure into our error shape. What we did not foresee says nothing of its insides. */
export function toApiError(error: unknown): { status: number, statusMessage: string, data: ApiErrorData } {
  const known = knownError(error)
  return { status: known.statusCode, statusMessage: known.statusMessage ?? 'Error', data: known.data as ApiErrorData }
}

function knownError(error: unknown): H3Error<unknown> {
  const inner = causeOf(error)
  if (inner instanceof CalcInputError) return fromCalc(inner)
  if (error instanceof H3Error || isH3Like(error)) {
    if (isApiData(error.data)) return error as H3Error
    if (error.statusCode === 404) return fail({ status: 404, code: 'route.notFound', message: 'There is nothing at this address.' })
    if (error.statusCode === 405) return fail({ status: 405, code: 'route.method', message: 'This address does not take this kind of request.' })
    if (error.statusCode >= 400 && error.statusCode < 500) return fail({ status: error.statusCode, code: 'request.refused', message: 'The request was refused.' })
  }
  return fail({ status: 500, code: 'server.failed', message: 'Something went wrong on the server. Nothing was saved. Try again; if it stays, report what you did.' })
}

/** An impossible value that only the calculation could see: understood, not acceptable. */
function fromCalc(error: CalcInputError): H3Error<ApiErrorData> {
  return fail({ status: 422, code: error.code, message: error.message, issues: [{ path: error.path ?? '', message: error.message }] })
}

function causeOf(error: unknown): unknown {
  if (error instanceof CalcInputError) return error
  return error instanceof Error && error.cause !== undefined ? error.cause : error
}

function isH3Like(error: unknown): error is H3Error {
  return typeof error === 'object' && error !== null && typeof (error as H3Error).statusCode === 'number'
}

function isApiData(data: unknown): data is ApiErrorData {
  return typeof data === 'object' && data !== null && typeof (data as ApiErrorData).code === 'string'
}
