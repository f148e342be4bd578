import { existsSync } from 'node:fs'
import { dirname, resolve } from 'node:path'
import { defineNitroPlugin } from 'nitropack/runtime'
import { database, dataFolder } from '../db/client'
import { migrateDatabase } from '../db/migrate'
import { seedDemo } from '../db/seed'
import { seedTeam } from '../db/seedTeam'
import { beginChain } from '../utils/data/auditRows'

/** Open, migrate, check, or do not start. All of it is synchronous: Nitro does not wait for anything else. */
export default defineNitroPlugin(() => {
  const db = database()
  const applied = migrateDatabase(db, migrationsFolder())
  if (applied > 0) console.info(`Database: ${applied} ${applied === 1 ? 'migration' : 'migrations'} applied.`)
  beginChain(db, new Date().toISOString())
  if (process.env.NUXT_SEED_DEMO === 'false') return
  try {
    const [plans, team] = [seedDemo(db), seedTeam(db, dataFolder())]
    if (plans || team) console.info('Database: the demonstration, Saltings Rescue, was added.')
  }
  catch (error) {
    // Real plans do not depend on the demo: a rescue must not stand before a closed door because of it.
    console.error('The demo plans could not be added.', error)
  }
})

/** Beside the built server's entry, or in the sources while developing. */
function migrationsFolder(): string {
  const places = [resolve(dirname(process.argv[1] ?? '.'), 'migrations'), resolve('server/db/migrations')]
  const found = places.find(place => existsSync(resolve(place, 'meta', '_journal.json')))
  if (!found) throw new Error('The database migrations were not found beside the server.')
  return found
}
