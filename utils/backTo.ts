/**
 * Where to go after signing in: only a path of this site.
 * @example backTo('//evil.example') // '/plans'
 */
export function backTo(asked: unknown, usual = '/plans'): string {
  return typeof asked === 'string' && /^\/(?![/\\])/.test(asked) ? asked : usual
}
