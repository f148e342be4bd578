import { spawn } from 'node:child_process'
import { existsSync, mkdtempSync, rmSync } from 'node:fs'
import { createServer, type AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

export const ENTRY = fileURLToPath(new URL('../../.output/server/index.mjs', import.meta.url))

/** Address of the server under test, without a slash at the end. */
export function baseUrl(): string {
  return needed('E2E_BASE_URL')
}

/** Folder where that server keeps its database and secret. */
export function dataDir(): string {
  return needed('E2E_DATA_DIR')
}

function needed(name: string): string {
  const value = process.env[name]
  if (!value) throw new Error(`${name} is not set: run these tests with vitest.e2e.config.ts.`)
  return value
}

export interface StartedServer {
  url: string
  dataDir: string
  /** All that it has said so far, on both channels. */
  log: () => string
  /** Ends it and waits; answers its exit code, null when the signal ended it. */
  stop: () => Promise<number | null>
}

/**
 * Starts the built server as a person would: node, the entry, an environment. Answers once it does.
 * Its data folder is thrown away at its end unless one was given.
 */
export async function startServer(options: { dataDir?: string, env?: Record<string, string>, /** Mail leaves through this address: links in it then lead back here. */ smtpUrl?: string } = {}): Promise<StartedServer> {
  if (!existsSync(ENTRY)) throw new Error('There is no built application. Run npm run build first.')
  const folder = options.dataDir ?? mkdtempSync(join(tmpdir(), 'thimbleful-e2e-'))
  const port = await freePort()
  const url = `http://127.0.0.1:${port}`
  const { NUXT_SESSION_PASSWORD: _, ...inherited } = process.env
  const child = spawn(process.execPath, [ENTRY], { cwd: folder, env: { ...inherited, NODE_ENV: 'production', PORT: String(port), HOST: '127.0.0.1', NUXT_DATA_DIR: folder, NUXT_SEED_DEMO: 'false', NUXT_RATE_LIMIT_FACTOR: '1000', ...(options.smtpUrl && { NUXT_SMTP_URL: options.smtpUrl, NUXT_SMTP_FROM: 'Saltings Rescue <plans@saltings.example>', NUXT_SMTP_RETRY_SECONDS: '1', NUXT_ORIGIN: url }), ...options.env } })
  let said = ''
  child.stdout.on('data', (text: Buffer) => said += text.toString())
  child.stderr.on('data', (text: Buffer) => said += text.toString())
  const ended = new Promise<number | null>(resolve => child.on('exit', code => resolve(code)))
  const stop = async () => {
    child.kill('SIGTERM')
    const code = await ended
    if (!options.dataDir) rmSync(folder, { recursive: true, force: true })
    return code
  }
  for (let tries = 0; tries < 150; tries += 1) {
    if (child.exitCode !== null) throw new Error(`The server ended with code ${child.exitCode}.\n${said}`)
    if (await fetch(`${url}/api/health`).then(answer => answer.ok, () => false)) return { url, dataDir: folder, log: () => said, stop }
    await new Promise(resolve => setTimeout(resolve, 200))
  }
  await stop()
  throw new Error(`The server did not answer within 30 seconds.\n${said}`)
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.on('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address() as AddressInfo
      probe.close(() => resolve(port))
    })
  })
}
