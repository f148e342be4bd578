/** A route as the server knows it: `/api/regimens/:id`, and its method in lower case, or none for all. */
export interface KnownRoute { route?: string, method?: string }

/**
 * Methods that an address takes, in capitals; empty when there is nothing at the address.
 * Catch-all routes do not count: they take everything and say nothing about an address.
 *
 * @example methodsAt('/api/regimens/abc', [{ route: '/api/regimens/:id', method: 'get' }]) // ['GET']
 */
export function methodsAt(path: string, routes: readonly KnownRoute[]): string[] {
  const parts = path.split('/')
  const methods = routes.filter(({ route, method }) => {
    if (!route || !method || route.includes('**')) return false
    const pattern = route.split('/')
    return pattern.length === parts.length && pattern.every((part, at) => part === parts[at] || (part.startsWith(':') && parts[at] !== ''))
  }).map(({ method }) => method!.toUpperCase())
  return [...new Set(methods)].sort()
}
