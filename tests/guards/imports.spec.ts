import { dirname, join, normalize } from 'node:path'
import { describe, expect, it } from 'vitest'
import { filesUnder, textOf } from './files'

/** Folder, what it may import of our own, which packages it must not touch, and the sentence of DEVELOPERS.md. */
const RULES: { folder: string, may: string[], notPackages: RegExp, sentence: string }[] = [
  { folder: 'shared', may: ['shared'], notPackages: /^(?!zod$)/, sentence: 'shared/ imports only shared/ and zod.' },
  { folder: 'server/utils/calc', may: ['server/utils/calc', 'shared'], notPackages: /^(?!mathjs)/, sentence: 'calc/ imports only calc/, shared/ and mathjs: no values, no clock, no framework.' },
  { folder: 'server/utils/reference', may: ['server/utils/reference', 'server/utils/calc/equation', 'shared'], notPackages: /^/, sentence: 'reference/ imports only itself, the equation parser and shared/.' },
  { folder: 'server/utils/plan', may: ['server/utils/plan', 'server/utils/calc', 'server/utils/reference', 'shared'], notPackages: /^/, sentence: 'plan/ imports calc/, reference/ and shared/.' },
  { folder: 'server/utils/print', may: ['server/utils/print', 'shared'], notPackages: /^(?!(pdfkit|uqr|fontkit|node:.*)$)/, sentence: 'print/ imports shared/ and the PDF libraries: it computes nothing.' },
  { folder: 'server/utils/data', may: ['server/utils/data', 'server/db', 'shared'], notPackages: /^(?!(drizzle-orm.*|node:.*|better-sqlite3)$)/, sentence: 'data/ imports db/ and shared/.' },
  { folder: 'server/utils/access', may: ['server/utils/access', 'server/utils/data', 'server/utils/http', 'shared'], notPackages: /^(?!(h3|node:.*|otpauth|@zxcvbn-ts\/language-common)$)/, sentence: 'access/ imports data/, http/, shared/ and h3: who someone is and what they may open.' },
  { folder: 'server/utils/http', may: ['server/utils/http', 'server/utils/calc/calcInputError', 'shared'], notPackages: /^(?!(h3|zod|node:.*|rate-limiter-flexible|nitropack.*)$)/, sentence: 'http/ imports shared/ and h3.' },
  { folder: 'server/utils/mail', may: ['server/utils/mail', 'server/utils/data', 'server/db/client', 'shared'], notPackages: /^(?!(nodemailer|node:.*)$)/, sentence: 'mail/ imports data/, shared/ and nodemailer: it words and sends, and decides nothing.' },
  { folder: 'server/utils/team', may: ['server/utils/team', 'server/utils/access', 'server/utils/data', 'server/utils/mail', 'server/utils/http', 'server/utils/regimen/whenInZone', 'shared'], notPackages: /^(?!(h3|uqr|zod|node:.*)$)/, sentence: 'team/ joins access/, data/ and mail/ for people, invitations, links and the record; it knows no plan.' },
  { folder: 'server/utils/regimen', may: ['server/utils/regimen', 'server/utils/team', 'server/utils/access', 'server/utils/mail', 'server/utils/plan', 'server/utils/reference', 'server/utils/print', 'server/utils/data', 'server/utils/http', 'shared'], notPackages: /^(?!(h3|zod)$)/, sentence: 'regimen/ joins plan/, print/, data/, access/ and mail/ for the routes of plans, and computes nothing.' },
  { folder: 'server/middleware', may: ['server/middleware', 'server/utils/access', 'server/utils/http', 'shared'], notPackages: /^(?!h3$)/, sentence: 'middleware/ imports access/ and http/ only.' },
  { folder: 'server/plugins', may: ['server/plugins', 'server/db', 'server/utils/data/auditRows', 'server/utils/mail/worker', 'server/utils/mail/transport', 'server/utils/regimen/sweep', 'shared'], notPackages: /^(?!(node:.*|nitropack\/runtime|zod)$)/, sentence: 'plugins/ open the database, describe the API and start what works in the background.' },
  { folder: 'server/db', may: ['server/db', 'server/utils/access/linkKey', 'server/utils/data', 'server/utils/plan/buildPlan', 'server/utils/reference', 'server/utils/regimen/planLife', 'shared'], notPackages: /^(?!(drizzle-orm.*|better-sqlite3|node:.*)$)/, sentence: 'db/ is below everything; only the seed makes plans and takes steps.' },
  { folder: 'server/api', may: ['server/utils', 'shared'], notPackages: /^(drizzle-orm|better-sqlite3)/, sentence: 'Routes import server/utils and shared/, never server/db.' },
  ...['pages', 'components', 'composables', 'stores', 'utils', 'layouts', 'middleware'].map(folder => ({ folder, may: ['pages', 'components', 'composables', 'stores', 'utils', 'shared', 'assets'], notPackages: /^(drizzle-orm|better-sqlite3|mathjs|pdfkit|h3|node:)/, sentence: 'The browser imports nothing from server/, types included.' })),
  { folder: 'components/ui', may: ['components/ui', 'utils', 'shared'], notPackages: /^(pinia)/, sentence: 'components/ui know no domain: they import utils/ and shared/.' },
  { folder: 'stores', may: ['stores', 'utils', 'shared', 'composables'], notPackages: /^(mathjs|h3)/, sentence: 'stores/ import shared/ and utils/; no formula of any kind.' },
]

/** Single imports that no rule allows, as "file imports what", each with its reason. */
const SKIPS: Record<string, string> = {
  'shared/types/rows.ts imports ../../server/db/schema': 'row types are inferred once from the tables; types only, checked below',
}

function importsOf(path: string): string[] {
  const patterns = [/(?:^|\n)\s*(?:import|export)\b[^'"`;=]*?\bfrom\s+['"]([^'"\n]+)['"]/g, /(?:^|\n)\s*import\s+['"]([^'"\n]+)['"]/g, /\bimport\(\s*['"]([^'"\n]+)['"]\s*\)/g]
  const code = textOf(path).replace(/\/\*[\s\S]*?\*\//g, '')
  return patterns.flatMap(pattern => [...code.matchAll(pattern)].map(match => match[1]!))
}

/** Own imports as a path from the root; null for a package. */
function ownPath(from: string, imported: string): string | null {
  if (imported.startsWith('#shared/')) return imported.replace('#shared/', 'shared/')
  if (imported.startsWith('#server/')) return imported.replace('#server/', 'server/')
  if (/^[~@]\//.test(imported)) return imported.slice(2)
  if (imported.startsWith('.')) return normalize(join(dirname(from), imported))
  return null
}

describe.each(RULES)('$folder', ({ folder, may, notPackages, sentence }) => {
  it(sentence, () => {
    const wrong = filesUnder(folder, ['.ts', '.vue']).flatMap(path => importsOf(path).flatMap((imported) => {
      if (imported === '#imports' || imported.startsWith('#app') || imported.startsWith('#components')) return folder.startsWith('server/utils') && folder !== 'server/utils/http' ? [`${path} imports ${imported}`] : []
      const own = ownPath(path, imported)
      if (own === null) return notPackages.test(imported) ? [`${path} imports ${imported}`] : []
      return may.some(allowed => own === allowed || own.startsWith(`${allowed}/`)) ? [] : [`${path} imports ${imported}`]
    }))
    expect(wrong.filter(one => !(one in SKIPS)), sentence).toEqual([])
  })
})

it('keeps its skip list honest', () => {
  for (const [skipped, reason] of Object.entries(SKIPS)) {
    const [path, imported] = skipped.split(' imports ') as [string, string]
    expect(importsOf(path), `${skipped} is no longer so: take it off the list`).toContain(imported)
    expect(reason.length).toBeGreaterThan(10)
  }
  expect(textOf('shared/types/rows.ts')).toMatch(/^import type .* from '\.\.\/\.\.\/server\/db\/schema'$/m)
})

it('finds the imports it judges', () => {
  expect(importsOf('server/utils/plan/buildPlan.ts')).toContain('./planContext')
  expect(ownPath('server/utils/plan/buildPlan.ts', '../reference')).toBe('server/utils/reference')
})
