import { statSync } from 'node:fs'
import { join } from 'node:path'
import { afterEach, expect, it, vi } from 'vitest'
import { dataFolder, openDatabase } from '../../../server/db/client'
import { scratchFolder } from './scratch'

const scratch = scratchFolder()
afterEach(() => vi.unstubAllEnvs())

it('makes its folder for nobody else to read', () => {
  vi.stubEnv('NUXT_DATA_DIR', join(scratch.folder, 'deep/data'))
  expect(dataFolder()).toBe(join(scratch.folder, 'deep/data'))
  expect(statSync(dataFolder()).mode & 0o077).toBe(0)
})

it('opens a file with what every connection needs', () => {
  const db = openDatabase(join(scratch.folder, 'one.db'))
  expect(db.$client.pragma('journal_mode', { simple: true })).toBe('wal')
  expect(db.$client.pragma('foreign_keys', { simple: true })).toBe(1)
  expect(db.$client.pragma('busy_timeout', { simple: true })).toBe(5000)
  db.$client.close()
  scratch.remove()
})
