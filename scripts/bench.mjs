/**
 * `npm run bench`: speed as ratios measured in one run on one machine. Prints; never passes or fails.
 *
 * 1. plans a second without HTTP, over every species
 * 2. the preview over HTTP beside a bare node:http server that answers the same bytes, and beside one that does the
 *    same computing and nothing else
 * 3. the sheet PDF beside bare pdfkit drawing as many pages of the same text with built-in Helvetica
 * 4. script and font bytes of the first page, as sent
 */
import { spawn } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { createServer } from 'node:http'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { gzipSync } from 'node:zlib'
import { buildIfNeeded, installIfNeeded, root } from './run.mjs'

installIfNeeded()
buildIfNeeded()
const { build } = await import('vite')
const { default: autocannon } = await import('autocannon')
const { default: PDFDocument } = await import('pdfkit')
const scratch = mkdtempSync(join(tmpdir(), 'thimbleful-bench-'))

try {
  const library = await libraryBuilt()
  const input = exampleInput('sp-bearded-dragon', 182)
  const plans = benchPlans(library)
  console.log(`\nPlan without HTTP: median ${plans.medianMs.toFixed(3)} ms over ${plans.species} species (slowest ${plans.slowestId}, ${plans.slowestMs.toFixed(3)} ms); ${Math.round(1000 / plans.medianMs).toLocaleString('en-GB')} plans a second. Aim: under 0.5 ms.`)
  await benchHttp(library, input)
  await benchPdf(library, input)
}
finally {
  rmSync(scratch, { recursive: true, force: true })
}
process.exit(0)

/** The plan and print code as it is bundled for production, importable here. */
async function libraryBuilt() {
  await build({
    root,
    configFile: false,
    logLevel: 'error',
    resolve: { alias: { '#shared': join(root, 'shared'), '#server': join(root, 'server') } },
    build: { ssr: true, rollupOptions: { input: [join(root, 'scripts', 'bench.entry.ts'), join(root, 'scripts', 'bench.server.ts')] }, outDir: scratch, emptyOutDir: false, target: 'node20' },
    ssr: { external: ['pdfkit', 'fontkit', 'mathjs', 'zod', 'uqr'] },
  })
  // Packages are found from the project, not from the scratch folder.
  const { symlinkSync } = await import('node:fs')
  symlinkSync(join(root, 'node_modules'), join(scratch, 'node_modules'))
  return import(pathToFileURL(join(scratch, 'bench.entry.js')).href)
}

function exampleInput(speciesId, weightG) {
  return {
    animal: { name: 'Juniper', caseNumber: '26-041', enclosure: 'Warm room, tank 4', speciesId, weightG, drynessPercent: 8, bodyTemperatureC: 36, daysUnfed: 24, lifeStage: 'growing', signs: [] },
    feed: { feedId: 'demo-omnivore-slurry' },
    route: 'syringe',
    feedingHours: { from: '07:30', to: '20:30' },
    startAt: '2026-12-02T18:40:00Z',
    timeZone: 'Europe/London',
  }
}

function benchPlans({ buildPlan, currentEdition }) {
  const edition = currentEdition()
  const times = [...edition.species.values()].map((species) => {
    const input = exampleInput(species.id, Math.max(1, species.adultWeightG.low * 0.7))
    for (let warm = 0; warm < 30; warm += 1) buildPlan(input, edition)
    const started = performance.now()
    for (let run = 0; run < 40; run += 1) buildPlan(input, edition)
    return { id: species.id, ms: (performance.now() - started) / 40 }
  }).sort((a, b) => a.ms - b.ms)
  const slowest = times.at(-1)
  return { medianMs: times[Math.floor(times.length / 2)].ms, slowestId: slowest.id, slowestMs: slowest.ms, species: times.length }
}

async function benchHttp({ buildPlan, currentEdition }, input) {
  const body = JSON.stringify(input)
  const answer = JSON.stringify(buildPlan(input, currentEdition()))
  const headers = { 'content-type': 'application/json' }
  // Each in a process of its own, as the application is: none shares its thread with the load generator.
  const bare = await serverStarted({ BENCH_ANSWER: answer })
  const computing = await serverStarted({})
  const app = await applicationStarted()
  try {
    const rate = async url => (await autocannon({ url, method: 'POST', headers, body, connections: 10, duration: 6 })).requests.average
    const preview = `${app.base}/api/regimens/preview`
    const check = await fetch(preview, { method: 'POST', headers, body })
    if (!check.ok) throw new Error(`The preview answered ${check.status}: ${await check.text()}`)
    await autocannon({ url: preview, method: 'POST', headers, body, connections: 10, duration: 2 })
    const rates = { bare: await rate(bare.url), computing: await rate(computing.url), preview: await rate(preview) }
    console.log(`Preview over HTTP: ${Math.round(rates.preview)} a second; bare node:http with the same ${answer.length.toLocaleString('en-GB')} bytes ${Math.round(rates.bare)}; the computing alone behind node:http ${Math.round(rates.computing)}.`)
    console.log(`  ratio to bare ${(rates.preview / rates.bare).toFixed(2)}; ratio to what its computing allows ${(rates.preview / rates.computing).toFixed(2)}. Aim: 0.7 or more.`)
    await benchFirstPage(app.base)
  }
  finally {
    bare.stop()
    computing.stop()
    app.stop()
  }
}

function freePort() {
  return new Promise((resolve) => {
    const probe = createServer().listen(0, '127.0.0.1', () => {
      const { port } = probe.address()
      probe.close(() => resolve(String(port)))
    })
  })
}

/** Waits until something answers there, well or not. */
async function answering(url) {
  for (let tries = 0; tries < 300; tries += 1) {
    try {
      await fetch(url)
      return
    }
    catch { await new Promise(resolve => setTimeout(resolve, 200)) }
  }
  throw new Error(`Nothing answered at ${url}.`)
}

/** The plain node:http server of bench.server.ts: the same bytes, or the same computing. */
async function serverStarted(env) {
  const port = await freePort()
  const child = spawn(process.execPath, [join(scratch, 'bench.server.js')], { cwd: scratch, stdio: ['ignore', 'ignore', 'inherit'], env: { ...process.env, ...env, PORT: port } })
  const url = `http://127.0.0.1:${port}/`
  await answering(url)
  return { url, stop: () => child.kill('SIGTERM') }
}

async function applicationStarted() {
  const port = await freePort()
  const child = spawn(process.execPath, [join(root, '.output', 'server', 'index.mjs')], { cwd: scratch, stdio: ['ignore', 'ignore', 'inherit'], env: { ...process.env, PORT: port, HOST: '127.0.0.1', NUXT_DATA_DIR: join(scratch, 'data'), NODE_ENV: 'production', NUXT_RATE_LIMIT_FACTOR: '1000000' } })
  const base = `http://127.0.0.1:${port}`
  await answering(`${base}/api/health`)
  return { base, stop: () => child.kill('SIGTERM') }
}

/** What the first page makes a browser load at once: module scripts and what they import statically, and fonts of its CSS. */
async function benchFirstPage(base) {
  const html = await (await fetch(base)).text()
  const scripts = new Set([...html.matchAll(/<(?:script|link)[^>]+(?:src|href)="([^"]+\.m?js)"[^>]*>/g)].filter(match => !/rel="prefetch"/.test(match[0])).map(match => match[1]))
  const queue = [...scripts]
  const seen = new Map()
  while (queue.length > 0) {
    const path = queue.pop()
    if (seen.has(path)) continue
    const text = await (await fetch(new URL(path, base))).text()
    seen.set(path, gzipSync(text).length)
    for (const match of text.matchAll(/(?:from|import)\s*"(\.\/[^"]+\.js)"/g)) queue.push(new URL(match[1], new URL(path, base)).pathname)
  }
  const css = [...html.matchAll(/href="([^"]+\.css)"/g)].map(match => match[1])
  const cssText = (await Promise.all(css.map(async path => (await fetch(new URL(path, base))).text()))).join('') + html
  const fonts = [...new Set([...cssText.matchAll(/url\(["']?([^"')]+\.woff2)["']?\)/g)].map(match => match[1]))]
  const fontBytes = await Promise.all(fonts.map(async path => (await (await fetch(new URL(path, new URL(css[0] ?? '/', base)))).arrayBuffer()).byteLength))
  const total = [...seen.values()].reduce((sum, one) => sum + one, 0)
  console.log(`First page: ${(total / 1000).toFixed(1)} kB of script (gzip, ${seen.size} files), ${(fontBytes.reduce((sum, one) => sum + one, 0) / 1000).toFixed(1)} kB of fonts (${fonts.length} files). Aim: under 150 kB of script.`)
}

/** The same sheet pages: ours, and bare pdfkit writing the same words at the same places in Helvetica. */
async function benchPdf({ buildPlan, currentEdition, sheetPdf, textOfPages }, input) {
  const plan = buildPlan({ ...input, feedsPerDay: 4 }, currentEdition())
  const first = plan.days.findIndex(day => day.feeds.length > 0) + 1
  const options = { paper: 'a4', days: { from: first, to: first + 6 }, reference: { id: 'abcdefghij', version: 1, latestVersion: 1, createdAt: input.startAt, url: 'http://localhost:3000/plans/abcdefghij?key=x' }, contacts: [], teamName: 'Saltings Rescue', appVersion: 'bench', madeAt: input.startAt }
  const pages = await textOfPages(await sheetPdf(plan, options))
  const bare = () => new Promise((resolve) => {
    const document = new PDFDocument({ size: 'A4', autoFirstPage: false })
    const chunks = []
    document.on('data', chunk => chunks.push(chunk)).on('end', () => resolve(Buffer.concat(chunks)))
    for (const page of pages) {
      document.addPage()
      for (const one of page) document.font('Helvetica').fontSize(one.size).text(one.text.replace(/[^\x20-\xFF]/g, '?'), one.x, one.y, { lineBreak: false })
    }
    document.end()
  })
  const time = async (make) => {
    for (let warm = 0; warm < 10; warm += 1) await make()
    const started = performance.now()
    for (let run = 0; run < 60; run += 1) await make()
    return (performance.now() - started) / 60
  }
  const [ours, helvetica] = [await time(() => sheetPdf(plan, options)), await time(bare)]
  console.log(`Sheet PDF of ${pages.length} pages: ${ours.toFixed(1)} ms; the same words with bare pdfkit and Helvetica: ${helvetica.toFixed(1)} ms; ratio ${(ours / helvetica).toFixed(2)}. Aim: within 2.`)
}
