import { readdirSync, readFileSync, statSync } from 'node:fs'
import { join, relative, resolve } from 'node:path'
import { fileURLToPath } from 'node:url'

export const root = resolve(fileURLToPath(new URL('../..', import.meta.url)))

/** Files under a folder of the project, by ending, as paths from the root. Empty when the folder is missing. */
export function filesUnder(folder: string, endings: string[]): string[] {
  const found: string[] = []
  const walk = (path: string) => {
    for (const name of readdirSync(path)) {
      const full = join(path, name)
      if (statSync(full).isDirectory()) {
        if (name !== 'node_modules') walk(full)
      }
      else if (endings.some(ending => name.endsWith(ending))) found.push(relative(root, full))
    }
  }
  try {
    walk(join(root, folder))
  }
  catch { return [] }
  return found.sort()
}

export function textOf(path: string): string {
  return readFileSync(join(root, path), 'utf8')
}

/** A skip list must say why, and must not outlive what it skips. */
export function checkSkips(skips: Record<string, string>, existing: string[]): string[] {
  const stale = Object.keys(skips).filter(name => !existing.includes(name)).map(name => `${name}: no longer exists, take it off the skip list`)
  const silent = Object.entries(skips).filter(([, reason]) => reason.length < 10).map(([name]) => `${name}: give a reason`)
  return [...stale, ...silent]
}
