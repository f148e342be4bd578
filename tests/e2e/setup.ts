import { startServer } from './server'

/** Uses the server that scripts/test.mjs started, or starts one from .output for this run. */
export default async function setup(): Promise<(() => Promise<unknown>) | undefined> {
  if (process.env.E2E_BASE_URL) return undefined
  const server = await startServer()
  process.env.E2E_BASE_URL = server.url
  process.env.E2E_DATA_DIR = server.dataDir
  return () => server.stop()
}
