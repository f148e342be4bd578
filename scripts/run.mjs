/** Small pieces that start, dev and test share. Node built-ins only: they run before anything is installed. */
import { spawn, spawnSync } from 'node:child_process'
import { existsSync, readdirSync, statSync } from 'node:fs'
import { dirname, join, resolve } from 'node:path'
import { fileURLToPath } from 'node:url'

export const root = resolve(dirname(fileURLToPath(import.meta.url)), '..')

/** Tools of the project, by name. */
export function tool(name) {
  return join(root, 'node_modules', '.bin', name)
}

/** Runs to the end with its output shown; answers whether it went well. */
export function run(command, args, options = {}) {
  const { env, ...rest } = options
  return spawnSync(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env }, ...rest }).status === 0
}

/** Installs what the lock says when it is missing or older than the lock. */
export function installIfNeeded() {
  const mark = join(root, 'node_modules', '.package-lock.json')
  if (existsSync(mark) && statSync(mark).mtimeMs >= statSync(join(root, 'package-lock.json')).mtimeMs) return
  console.log('Installing packages (a minute or two the first time)…')
  if (!run('npm', ['ci', '--no-audit', '--no-fund'], { env: { NUXT_TELEMETRY_DISABLED: '1', npm_config_build_from_source: 'true' } })) {
    console.error('The packages could not be installed. better-sqlite3 needs Python 3, make and a C++ compiler.')
    process.exit(1)
  }
}

const SOURCES = ['app.vue', 'error.vue', 'nuxt.config.ts', 'tailwind.config.ts', 'package-lock.json', 'assets', 'components', 'composables', 'layouts', 'middleware', 'pages', 'plugins', 'public', 'server', 'shared', 'stores', 'utils']

/** Builds when there is no build or a source is newer than it. */
export function buildIfNeeded() {
  const entry = join(root, '.output', 'server', 'index.mjs')
  const built = existsSync(entry) ? statSync(entry).mtimeMs : 0
  if (built > Math.max(...SOURCES.map(name => newestIn(join(root, name))))) return
  console.log('Building the application…')
  if (!run(tool('nuxt'), ['build'], { env: { NUXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' } })) {
    console.error('The build failed; what it printed above says where.')
    process.exit(1)
  }
}

function newestIn(path) {
  if (!existsSync(path)) return 0
  const stat = statSync(path)
  if (!stat.isDirectory()) return stat.mtimeMs
  return Math.max(stat.mtimeMs, ...readdirSync(path).map(name => newestIn(join(path, name))))
}

/** Runs a long-lived child and ends with it; signals go through, so nothing is left behind. */
export function stayWith(command, args, env = {}) {
  const child = spawn(command, args, { cwd: root, stdio: 'inherit', env: { ...process.env, ...env } })
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => child.kill(signal))
  child.on('exit', (code, signal) => process.exit(code ?? (signal ? 0 : 1)))
  return child
}
