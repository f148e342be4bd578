/** What differs between two records, field by field, by the path of each field: what the record keeps of a change. */
export function changedFields(before: unknown, after: unknown): { before: Record<string, unknown>, after: Record<string, unknown> } {
  const [old, young] = [flat(before), flat(after)]
  const changed = { before: {} as Record<string, unknown>, after: {} as Record<string, unknown> }
  for (const path of new Set([...old.keys(), ...young.keys()])) {
    if (JSON.stringify(old.get(path)) === JSON.stringify(young.get(path))) continue
    if (old.has(path)) changed.before[path] = old.get(path)
    if (young.has(path)) changed.after[path] = young.get(path)
  }
  return changed
}

function flat(value: unknown, path = '', into = new Map<string, unknown>()): Map<string, unknown> {
  if (typeof value === 'object' && value !== null && !Array.isArray(value)) for (const [key, inner] of Object.entries(value)) flat(inner, path ? `${path}.${key}` : key, into)
  else if (value !== undefined) into.set(path, value)
  return into
}
