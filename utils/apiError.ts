import type { ApiErrorData } from '#shared/types/error'

/** What went wrong with a request, in words a person can act on. */
export interface ApiProblem extends ApiErrorData { offline: boolean }

/** Reads our error shape out of whatever a request threw. */
export function apiProblemOf(error: unknown): ApiProblem {
  const data = (error as { data?: { data?: ApiErrorData } } | null)?.data?.data
  if (data && typeof data.code === 'string') return { ...data, offline: false }
  const status = (error as { statusCode?: number } | null)?.statusCode
  if (status === undefined) return { code: 'network.offline', message: 'The server cannot be reached. What you typed is kept in this browser; the plan shown is the last one that was worked out.', offline: true }
  return { code: 'server.failed', message: 'The server could not work this out. Nothing you typed is lost. Try again in a moment.', offline: false }
}
