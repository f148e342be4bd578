import { expect, it } from 'vitest'
import { backTo } from '../../../utils/backTo'

it.each([['/plans/abc/approve', '/plans/abc/approve'], ['//evil.example', '/plans'], ['/\\evil.example', '/plans'], ['https://evil.example', '/plans'], ['javascript:alert(1)', '/plans'], ['', '/plans'], [undefined, '/plans'], [['/a'], '/plans']])('goes back from %j to %s', (asked, to) => expect(backTo(asked)).toBe(to))
