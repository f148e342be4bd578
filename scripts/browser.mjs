/** Finds Chromium, or gets Debian's where that is possible. */
import { spawnSync } from 'node:child_process'
import { existsSync } from 'node:fs'

const PLACES = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome', '/usr/bin/google-chrome-stable', '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome']

export function findBrowser() {
  if (process.env.CHROMIUM_PATH) return existsSync(process.env.CHROMIUM_PATH) ? process.env.CHROMIUM_PATH : null
  return PLACES.find(existsSync) ?? null
}

/** Path of a browser, or null after saying in one sentence what to do. Poppler reads the PDFs back. */
export function ensureBrowser() {
  const hasPoppler = spawnSync('pdftotext', ['-v']).error === undefined
  const found = findBrowser()
  if (found && hasPoppler) return found
  if (existsSync('/usr/bin/apt-get') && process.getuid?.() === 0) {
    console.log('Installing Chromium and Poppler from Debian…')
    const quiet = { stdio: ['ignore', 'ignore', 'inherit'], env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } }
    spawnSync('apt-get', ['update', '-qq'], quiet)
    spawnSync('apt-get', ['install', '-y', '-qq', 'chromium', 'poppler-utils'], quiet)
  }
  const now = findBrowser()
  if (!now) console.error('No Chromium was found. Install it (on Debian: apt-get install chromium poppler-utils) or set CHROMIUM_PATH to one, then run npm test again.')
  return now
}
