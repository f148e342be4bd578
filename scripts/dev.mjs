/** `npm run dev`: the same with hot reload. Works on a fresh clone. */
import { join } from 'node:path'
import { installIfNeeded, root, stayWith, tool } from './run.mjs'

installIfNeeded()
stayWith(tool('nuxt'), ['dev', '--no-fork', ...process.argv.slice(2)], {
  NUXT_TELEMETRY_DISABLED: '1',
  NUXT_DATA_DIR: process.env.NUXT_DATA_DIR ?? join(root, '.data'),
})
