import { inspect } from 'node:util'

/** What failed, for the log of the server. Keys of plans stand in addresses and must not end up in a log. */
export function failureForLog(request: { method: string, path: string }, error: unknown): string {
  const whole = `${request.method} ${request.path.split('?')[0]} ${inspect(error)}`
  return whole.replace(/([?&]key=)[^&\s"']+/g, '$1…')
}
