import { createError, type H3Error } from 'h3'
import type { ApiErrorData, Issue } from '#shared/types/error'
import type { Finding } from '#shared/types/finding'

/** Short ASCII words for the status line; a sentence or a unit there would arrive broken. */
const STATUS_WORDS: Record<number, string> = { 400: 'Bad Request', 401: 'Unauthorized', 403: 'Forbidden', 404: 'Not Found', 405: 'Method Not Allowed', 409: 'Conflict', 410: 'Gone', 413: 'Content Too Large', 422: 'Unprocessable Content', 429: 'Too Many Requests', 500: 'Internal Server Error' }

/**
 * An error answer in the one shape of the API. Throw what it returns.
 *
 * @example throw fail({ status: 404, code: 'regimen.notFound', message: 'There is no such plan.' })
 */
export function fail(problem: { status: number, code: string, message: string, issues?: Issue[], findings?: Finding[] }): H3Error<ApiErrorData> {
  const { status, code, message, issues, findings } = problem
  return createError<ApiErrorData>({
    statusCode: status,
    statusMessage: STATUS_WORDS[status] ?? 'Error',
    message,
    data: { code, message, ...(issues && { issues }), ...(findings && { findings }) },
  })
}
