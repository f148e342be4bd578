/**
 * `npm test`: everything a reviewer would run, in the order that fails soonest. `--long` gives the properties far
 * more runs. The last line counts all tests and checks together.
 */
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { spawn } from 'node:child_process'
import { ensureBrowser } from './browser.mjs'
import { buildIfNeeded, installIfNeeded, root, run, tool } from './run.mjs'

const long = process.argv.includes('--long')
const only = process.argv.find(one => one.startsWith('--only='))?.slice(7)
installIfNeeded()
const browser = ensureBrowser()
const scratch = mkdtempSync(join(tmpdir(), 'thimbleful-test-'))
const totals = { passed: 0, failed: 0, skipped: 0 }
const failedParts = []

if (!only && !run(tool('nuxt'), ['prepare'], { env: { NUXT_TELEMETRY_DISABLED: '1' } })) failPart('nuxt prepare')
check('lint', () => run(tool('eslint'), ['.', '--max-warnings', '0']))
check('types', () => run(tool('nuxt'), ['typecheck']))
check('unused code', () => run(tool('knip'), []))
vitest('unit, reference, guards', ['--project', 'unit', '--project', 'reference', '--project', 'guards'], long ? { PROPERTY_RUNS: '5000', PROPERTY_SEED: 'random' } : { PROPERTY_RUNS: '400' })
// The calculations must not depend on where the server stands. Mail is not one, and its tests wait for real answers.
const elsewhere = ['--project', 'unit', '--project', 'reference', '--exclude', 'tests/unit/mail/**']
vitest('unit, reference in New York', elsewhere, { TZ: 'America/New_York', PROPERTY_RUNS: '50' })
vitest('unit, reference in Chatham', elsewhere, { TZ: 'Pacific/Chatham', PROPERTY_RUNS: '50' })
vitest('components', ['--config', 'vitest.nuxt.config.ts'])
await builtApplication()

rmSync(scratch, { recursive: true, force: true })
if (failedParts.length > 0) console.error(`\nFailed: ${failedParts.join(', ')}`)
if (totals.skipped > 0) console.log(`\n${totals.skipped} skipped`)
console.log(`\n${totals.passed} passed, ${totals.failed} failed`)
process.exit(totals.failed > 0 || totals.passed === 0 ? 1 : 0)

function wanted(name) {
  return !only || name.startsWith(only)
}

function check(name, holds) {
  if (!wanted(name)) return
  console.log(`\n— ${name}`)
  if (holds()) totals.passed += 1
  else failPart(name)
}

function failPart(name) {
  totals.failed += 1
  failedParts.push(name)
}

/** One vitest run; its JSON report is what is counted, so a crash without tests counts as a failure. */
function vitest(name, args, env = {}) {
  if (!wanted(name)) return
  console.log(`\n— ${name}`)
  const report = join(scratch, `${name.replace(/\W+/g, '-')}.json`)
  const went = run(tool('vitest'), ['run', ...args, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`], { env: { CI: 'true', ...env } })
  try {
    const counted = JSON.parse(readFileSync(report, 'utf8'))
    totals.passed += counted.numPassedTests
    totals.failed += counted.numFailedTests
    totals.skipped += counted.numPendingTests + counted.numTodoTests
    if (!went && counted.numFailedTests === 0) failPart(name)
    else if (counted.numFailedTests > 0) failedParts.push(name)
  }
  catch { failPart(name) }
}

/** API and browser tests against one built server with its own data. */
async function builtApplication() {
  if (!wanted('built application')) return
  if (!browser) return failPart('a browser')
  buildIfNeeded()
  const port = await freePort()
  const base = `http://127.0.0.1:${port}`
  const dataDir = join(scratch, 'data')
  const server = spawn(process.execPath, [join(root, '.output', 'server', 'index.mjs')], { cwd: scratch, stdio: ['ignore', 'inherit', 'inherit'], env: { ...process.env, PORT: String(port), HOST: '127.0.0.1', NUXT_DATA_DIR: dataDir, NODE_ENV: 'production', NUXT_RATE_LIMIT_FACTOR: '1000', NUXT_SEED_DEMO: 'false' } })
  try {
    await answers(`${base}/api/health`)
    vitest('built application', ['--config', 'vitest.e2e.config.ts'], { E2E_BASE_URL: base, E2E_DATA_DIR: dataDir, CHROMIUM_PATH: browser })
  }
  catch (error) {
    console.error(String(error))
    failPart('built application')
  }
  finally { server.kill('SIGTERM') }
}

function freePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer()
    probe.on('error', reject)
    probe.listen(0, '127.0.0.1', () => {
      const { port } = probe.address()
      probe.close(() => resolve(port))
    })
  })
}

async function answers(url) {
  for (let tries = 0; tries < 150; tries += 1) {
    try {
      if ((await fetch(url)).ok) return
    }
    catch { /* not up yet */ }
    await new Promise(resolve => setTimeout(resolve, 200))
  }
  throw new Error('The built server did not answer within 30 seconds.')
}
