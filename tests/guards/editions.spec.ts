import { spawnSync } from 'node:child_process'
import { cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { root } from './files'

const script = join(root, 'scripts/freeze-edition.mjs')

function freeze(...options: string[]): { status: number | null, said: string } {
  const { status, stdout, stderr } = spawnSync(process.execPath, [script, ...options], { encoding: 'utf8' })
  return { status, said: stdout + stderr }
}

it('has not changed a frozen edition: saved plans name it', () => {
  expect(freeze('--check')).toEqual({ status: 0, said: '' })
})

describe('the freeze', () => {
  let copy: string
  const edition = () => join(copy, 'server/utils/reference/editions/2026-12')
  const check = () => freeze('--check', '--root', copy)

  beforeEach(() => {
    copy = mkdtempSync(join(tmpdir(), 'thimbleful-editions-'))
    mkdirSync(join(copy, 'tests/guards'), { recursive: true })
    cpSync(join(root, 'server/utils/reference/editions'), join(copy, 'server/utils/reference/editions'), { recursive: true })
    expect(freeze('--root', copy).status).toBe(0)
    expect(check()).toEqual({ status: 0, said: '' })
  })
  afterEach(() => rmSync(copy, { recursive: true, force: true }))

  it('notices one changed digit', () => {
    const file = join(edition(), 'rules.data.ts')
    const text = readFileSync(file, 'utf8')
    const changed = text.replace('0.075', '0.076')
    expect(changed).not.toBe(text)
    writeFileSync(file, changed)
    expect(check()).toMatchObject({ status: 1, said: expect.stringContaining('2026-12 has changed') })
    // Freezing again is refused unless asked for by name.
    expect(freeze('--root', copy).status).toBe(1)
    expect(freeze('--root', copy, '--again', '2026-12').status).toBe(0)
    expect(check().status).toBe(0)
  })

  it('notices a file added, renamed or gone', () => {
    writeFileSync(join(edition(), 'more.data.ts'), 'export const more = 1\n')
    expect(check().status).toBe(1)
    rmSync(join(edition(), 'more.data.ts'))
    expect(check().status).toBe(0)
    rmSync(join(edition(), 'equationsOther.data.ts'))
    expect(check().status).toBe(1)
  })

  it('does not mind line ends of another system', () => {
    const file = join(edition(), 'rules.data.ts')
    writeFileSync(file, readFileSync(file, 'utf8').replaceAll('\n', '\r\n'))
    expect(check().status).toBe(0)
  })

  it('asks for a new edition to be frozen, and for a lost one to come back', () => {
    cpSync(edition(), join(edition(), '../2027-02'), { recursive: true })
    expect(check()).toMatchObject({ status: 1, said: expect.stringContaining('2027-02 is not frozen yet') })
    expect(freeze('--root', copy).status).toBe(0)
    rmSync(edition(), { recursive: true })
    expect(check()).toMatchObject({ status: 1, said: expect.stringContaining('2026-12 is gone') })
  })
})
