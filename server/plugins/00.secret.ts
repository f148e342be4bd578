import { randomBytes } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { defineNitroPlugin } from 'nitropack/runtime'
import { dataFolder } from '../db/client'

/**
 * The secret that seals cookies: made on first start and kept with the data, so that no environment variable is needed
 * and a restart does not sign anyone out. Nitro reads the environment again at each request, so this is in time.
 */
export default defineNitroPlugin(() => {
  if (process.env.NUXT_SESSION_PASSWORD) return
  const file = join(dataFolder(), 'session-secret')
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600, flag: 'wx' })
  const secret = readFileSync(file, 'utf8').trim()
  if (secret.length < 32) throw new Error(`The secret in ${file} is cut short. Delete the file to have a new one made; browsers then forget their saved plans, links keep working.`)
  process.env.NUXT_SESSION_PASSWORD = secret
})
