/** Finds and reads the two print fonts. They are read once for the life of the process. */
import { existsSync, readFileSync } from 'node:fs'
import { dirname, join, resolve } from 'node:path'
import { fileURLToPath } from 'node:url'
import { TrueTypeFont } from './trueType'

export const PRINT_WEIGHTS = ['regular', 'bold'] as const
export type PrintWeight = (typeof PRINT_WEIGHTS)[number]

const FILES: Record<PrintWeight, string> = { regular: 'SourceSans3-Regular.ttf', bold: 'SourceSans3-Bold.ttf' }

/** `fonts` stands beside the built server's entry (copied there by the build), the package beside the sources. */
const FOLDERS = ['fonts', 'node_modules/source-sans/TTF']

const loaded = new Map<PrintWeight, TrueTypeFont>()

/** @throws Error when the font files are not installed. */
export function printFont(weight: PrintWeight): TrueTypeFont {
  let font = loaded.get(weight)
  if (!font) {
    font = new TrueTypeFont(readFileSync(findFontFile(FILES[weight])))
    loaded.set(weight, font)
  }
  return font
}

/** Where this code runs: a source file in tests, the build folder in development, the entry of the built server. */
function startingFolders(): string[] {
  return [dirname(fileURLToPath(import.meta.url)), dirname(resolve(process.argv[1] ?? '.')), process.cwd()]
}

/**
 * Walks up from each folder until the file is found, so that the working directory does not matter.
 * @throws Error when the font is found nowhere.
 */
export function findFontFile(file: string, folders: readonly string[] = startingFolders()): string {
  for (const start of folders) {
    for (let folder = start; ; folder = dirname(folder)) {
      const found = FOLDERS.map(name => join(folder, name, file)).find(path => existsSync(path))
      if (found) return found
      if (folder === dirname(folder)) break
    }
  }
  throw new Error(`The print font ${file} is not installed: neither beside the server nor in the source-sans package.`)
}
