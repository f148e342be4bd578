/** `npm start`: install, build, serve. The server itself migrates, makes its secret and seeds the demo. */
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { buildIfNeeded, installIfNeeded, root, stayWith } from './run.mjs'

installIfNeeded()
buildIfNeeded()

const port = process.env.PORT ?? process.env.NITRO_PORT ?? '3000'
const host = process.env.HOST ?? process.env.NITRO_HOST ?? '0.0.0.0'
const dataDir = process.env.NUXT_DATA_DIR ?? join(root, '.data')
const shown = host === '0.0.0.0' || host === '::' ? 'localhost' : host

stayWith(process.execPath, [join(root, '.output', 'server', 'index.mjs')], { PORT: port, HOST: host, NUXT_DATA_DIR: dataDir, NODE_ENV: 'production' })
announce()

/** Says the address once the server answers, not before. */
async function announce() {
  for (let tries = 0; tries < 150; tries += 1) {
    try {
      if ((await fetch(`http://${shown}:${port}/api/health`)).ok) {
        console.log(`\nThimbleful is ready: http://${shown}:${port}\nData are kept in ${dataDir}. Ctrl+C stops it.\n${demoAccounts()}`)
        return
      }
    }
    catch { /* not up yet */ }
    await new Promise(resolve => setTimeout(resolve, 200))
  }
}

/** Who can sign in to the demonstration. Nothing of it is said where there is none. */
function demoAccounts() {
  const file = join(dataDir, 'demo-password')
  if (process.env.NUXT_SEED_DEMO === 'false' || !existsSync(file)) return ''
  const people = [['ines', 'coordinator'], ['amara', 'vet'], ['tove', 'technician'], ['mara', 'keeper'], ['joss', 'carer']]
  return `Demonstration: sign in as ${people.map(([name, role]) => `${name}@saltings.example (${role})`).join(', ')}.\nPassword of all five: ${readFileSync(file, 'utf8').trim()}\nMails of the demonstration are kept in its outbox: Team, Mail. NUXT_SEED_DEMO=false leaves all of it out.\n`
}
