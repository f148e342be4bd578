/**
 * Pair kerning from a font's GPOS table: only what the `kern` feature says about two glyphs that stand side by side.
 * At 40 pt an unkerned "To" or "WAIT" falls apart, and the old `kern` table is missing from modern fonts.
 */

/** What a pair is moved by, font units. */
export type Kerning = (left: number, right: number) => number

const PAIR_ADJUSTMENT = 2
const EXTENSION = 9
const X_ADVANCE = 0x0004

type PairTable = (left: number, right: number) => number | null

/** @param table  the GPOS table, or null when the font has none. */
export function readKerning(table: Buffer | null): Kerning {
  if (!table) return () => 0
  const pairTables = kernLookups(table).map(lookup => subtablesOf(table, lookup).map(at => readPairTable(table, at)))
  const known = new Map<number, number>()
  return (left, right) => {
    const key = left * 65536 + right
    let value = known.get(key)
    if (value === undefined) {
      // In one lookup the first subtable that knows the pair decides; lookups add up.
      value = pairTables.reduce((sum, tables) => sum + firstKnown(tables, left, right), 0)
      known.set(key, value)
    }
    return value
  }
}

function firstKnown(tables: PairTable[], left: number, right: number): number {
  for (const table of tables) {
    const value = table(left, right)
    if (value !== null) return value
  }
  return 0
}

/** Offsets of the lookups that the default script's `kern` feature names. */
function kernLookups(table: Buffer): number[] {
  const scripts = table.readUInt16BE(4)
  const features = table.readUInt16BE(6)
  const lookups = table.readUInt16BE(8)
  const named = new Set<number>()
  for (const index of defaultFeatures(table, scripts)) {
    const at = features + 2 + index * 6
    if (table.toString('latin1', at, at + 4) !== 'kern') continue
    const feature = features + table.readUInt16BE(at + 4)
    for (let i = 0; i < table.readUInt16BE(feature + 2); i++) named.add(table.readUInt16BE(feature + 4 + i * 2))
  }
  return [...named].sort((a, b) => a - b).map(index => lookups + table.readUInt16BE(lookups + 2 + index * 2))
}

/** Features of every script's default language: Latin, Greek and Cyrillic share one sheet. */
function defaultFeatures(table: Buffer, scripts: number): Set<number> {
  const found = new Set<number>()
  for (let i = 0; i < table.readUInt16BE(scripts); i++) {
    const script = scripts + table.readUInt16BE(scripts + 2 + i * 6 + 4)
    const language = table.readUInt16BE(script)
    if (language === 0) continue
    const at = script + language
    for (let j = 0; j < table.readUInt16BE(at + 4); j++) found.add(table.readUInt16BE(at + 6 + j * 2))
  }
  return found
}

function subtablesOf(table: Buffer, lookup: number): number[] {
  const kind = table.readUInt16BE(lookup)
  const found: number[] = []
  for (let i = 0; i < table.readUInt16BE(lookup + 4); i++) {
    const at = lookup + table.readUInt16BE(lookup + 6 + i * 2)
    if (kind === PAIR_ADJUSTMENT) found.push(at)
    if (kind === EXTENSION && table.readUInt16BE(at + 2) === PAIR_ADJUSTMENT) found.push(at + table.readUInt32BE(at + 4))
  }
  return found
}

function readPairTable(table: Buffer, at: number): PairTable {
  const format = table.readUInt16BE(at)
  const coverage = readCoverage(table, at + table.readUInt16BE(at + 2))
  const firstFormat = table.readUInt16BE(at + 4)
  const firstSize = bits(firstFormat) * 2
  const secondSize = bits(table.readUInt16BE(at + 6)) * 2
  // Where in the value record the advance stands; null when this table moves something else.
  const advanceAt = firstFormat & X_ADVANCE ? bits(firstFormat & (X_ADVANCE - 1)) * 2 : null

  if (format === 1) {
    return (left, right) => {
      const index = coverage(left)
      if (index === null) return null
      const set = at + table.readUInt16BE(at + 10 + index * 2)
      const size = 2 + firstSize + secondSize
      let low = 0
      let high = table.readUInt16BE(set) - 1
      while (low <= high) {
        const middle = (low + high) >> 1
        const pair = set + 2 + middle * size
        const second = table.readUInt16BE(pair)
        if (second === right) return advanceAt === null ? 0 : table.readInt16BE(pair + 2 + advanceAt)
        if (second < right) low = middle + 1
        else high = middle - 1
      }
      return null
    }
  }
  const firstClass = readClasses(table, at + table.readUInt16BE(at + 8))
  const secondClass = readClasses(table, at + table.readUInt16BE(at + 10))
  const secondClasses = table.readUInt16BE(at + 14)
  return (left, right) => {
    if (coverage(left) === null) return null
    const record = at + 16 + (firstClass(left) * secondClasses + secondClass(right)) * (firstSize + secondSize)
    return advanceAt === null ? 0 : table.readInt16BE(record + advanceAt)
  }
}

function bits(mask: number): number {
  let count = 0
  for (let rest = mask; rest > 0; rest >>= 1) count += rest & 1
  return count
}

function readCoverage(table: Buffer, at: number): (glyph: number) => number | null {
  const indexOf = new Map<number, number>()
  const ranged = table.readUInt16BE(at) === 2
  for (let i = 0; i < table.readUInt16BE(at + 2); i++) {
    if (!ranged) {
      indexOf.set(table.readUInt16BE(at + 4 + i * 2), i)
      continue
    }
    const range = at + 4 + i * 6
    const start = table.readUInt16BE(range)
    for (let glyph = start; glyph <= table.readUInt16BE(range + 2); glyph++) indexOf.set(glyph, table.readUInt16BE(range + 4) + glyph - start)
  }
  return glyph => indexOf.get(glyph) ?? null
}

function readClasses(table: Buffer, at: number): (glyph: number) => number {
  const classOf = new Map<number, number>()
  if (table.readUInt16BE(at) === 1) {
    const start = table.readUInt16BE(at + 2)
    for (let i = 0; i < table.readUInt16BE(at + 4); i++) classOf.set(start + i, table.readUInt16BE(at + 6 + i * 2))
  }
  else {
    for (let i = 0; i < table.readUInt16BE(at + 2); i++) {
      const range = at + 4 + i * 6
      for (let glyph = table.readUInt16BE(range); glyph <= table.readUInt16BE(range + 2); glyph++) classOf.set(glyph, table.readUInt16BE(range + 4))
    }
  }
  return glyph => classOf.get(glyph) ?? 0
}
