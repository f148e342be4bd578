/** `npm start`: install, build, serve. The server itself migrates, makes its secret and seeds the demo. */
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
        console.log(`\nThimbleful is ready: http://${shown}:${port}\nData are kept in ${dataDir}. Ctrl+C stops it.\n`)
        return
      }
    }
    catch { /* not up yet */ }
    await new Promise(resolve => setTimeout(resolve, 200))
  }
}
