import type { z } from 'zod'
import type { Issue } from '#shared/types/error'

type ZodIssue = z.core.$ZodIssue

/**
 * The refused fields of an input, each with its path and a sentence. Of a choice between shapes only the shape that
 * came nearest is reported: a list of everything the other shape lacks would help no one.
 */
export function issuesOf(error: z.ZodError): Issue[] {
  const issues = error.issues.flatMap(issue => flattened(issue, []))
  const seen = new Set<string>()
  return issues.filter(({ path, message }) => {
    const key = `${path}|${message}`
    if (seen.has(key)) return false
    seen.add(key)
    return true
  })
}

function flattened(issue: ZodIssue, above: PropertyKey[]): Issue[] {
  const path = [...above, ...issue.path]
  if (issue.code === 'invalid_union') {
    const nearest = nearestShape(issue.errors)
    if (nearest) return nearest.flatMap(inner => flattened(inner, path))
  }
  return [{ path: path.map(String).join('.'), message: sentenceOf(issue) }]
}

/** The shape whose problems lie deepest and are fewest; none when every shape only says "wrong type" or "missing". */
function nearestShape(shapes: ZodIssue[][]): ZodIssue[] | null {
  const told = shapes.filter(shape => shape.length > 0 && shape.some(inner => !isMissing(inner) || inner.code === 'custom'))
  if (told.length === 0) return null
  return told.sort((a, b) => a.filter(isMissing).length - b.filter(isMissing).length || a.length - b.length)[0]!
}

function isMissing(issue: ZodIssue): boolean {
  return issue.code === 'invalid_type' && (issue.input === undefined || issue.path.length === 0)
}

function sentenceOf(issue: ZodIssue): string {
  const field = String(issue.path.at(-1) ?? 'The request')
  // Schemas say their own sentence; zod's default ones begin with "Invalid" and name types, not fields.
  if (/^(Invalid|Unrecognized|Too )/.test(issue.message)) return `${field.charAt(0).toUpperCase()}${field.slice(1)} is not as expected. ${issue.message}.`
  return issue.message
}
