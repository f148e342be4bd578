import type { z } from 'zod'
import type { Issue } from '#shared/types/error'

type ZodIssue = z.core.$ZodIssue
type Path = readonly PropertyKey[]

/**
 * The refused fields of an input, each with its path and a sentence. Of a choice between shapes only the shape that
 * came nearest is reported: a list of everything the other shape lacks would help no one.
 *
 * @param received  what the schema was given: zod's issues do not say whether a field was wrong or missing.
 */
export function issuesOf(error: z.ZodError, received: unknown): Issue[] {
  const seen = new Set<string>()
  return error.issues.flatMap(issue => flattened(issue, [], received)).filter(({ path, message }) => {
    const key = `${path}|${message}`
    if (seen.has(key)) return false
    seen.add(key)
    return true
  })
}

function flattened(issue: ZodIssue, above: Path, received: unknown): Issue[] {
  const path = [...above, ...issue.path]
  if (issue.code === 'invalid_union') {
    const nearest = nearestShape(issue.errors, valueAt(received, path))
    if (nearest) return nearest.flatMap(inner => flattened(inner, path, received))
  }
  return [{ path: path.map(String).join('.'), message: sentenceOf(issue, path) }]
}

/** The shape whose fields were filled in, if wrongly; of several the one that lacks least. None when nothing fits anyhow. */
function nearestShape(shapes: readonly ZodIssue[][], received: unknown): readonly ZodIssue[] | null {
  const measured = shapes.map((issues) => {
    const filled = issues.filter(issue => issue.path.length > 0 && valueAt(received, issue.path) !== undefined).length
    const whole = issues.filter(issue => issue.path.length === 0 && issue.code === 'custom').length
    return { issues, filled, whole, missing: issues.length - filled - whole }
  }).filter(({ filled, whole }) => filled + whole > 0)
  measured.sort((a, b) => Math.sign(b.filled) - Math.sign(a.filled) || a.missing - b.missing || b.filled - a.filled)
  return measured[0]?.issues ?? null
}

function valueAt(received: unknown, path: Path): unknown {
  let value = received
  for (const part of path) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, part)) return undefined
    value = (value as Record<PropertyKey, unknown>)[part]
  }
  return value
}

function sentenceOf(issue: ZodIssue, path: Path): string {
  // Schemas say their own sentence; zod's default ones begin like this and name types, not fields.
  if (!/^(Invalid|Unrecognized|Too )/.test(issue.message)) return issue.message
  const field = path.findLast(part => typeof part === 'string')
  const name = field === undefined ? 'The request' : `"${String(field)}"`
  if (issue.code === 'invalid_type' && issue.expected === 'object') return `${name} must be an object with named fields.`
  return `${name} is not as expected. ${issue.message}.`
}
