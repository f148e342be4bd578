import { join } from 'node:path'
import Database from 'better-sqlite3'
import { expect } from 'vitest'
import type { RegimenInput } from '#shared/schemas/regimen'
import type { ApiErrorData } from '#shared/types/error'
import type { SavedRegimenReceipt } from '#shared/types/plan'
import { baseUrl, dataDir } from '../server'

/** Juniper of Saltings Rescue: an adult inland bearded dragon, thin and warm enough. */
export function juniper(): RegimenInput {
  return {
    animal: { name: 'Juniper', speciesId: 'sp-bearded-dragon', weightG: 182, bodyConditionScore: 1, drynessPercent: 8, bodyTemperatureC: 36, daysUnfed: 24, lifeStage: 'adult', signs: ['mouth-and-swallow-checked'] },
    feed: { feedId: 'demo-omnivore-slurry' },
    route: 'syringe',
    feedingHours: { from: '07:30', to: '20:30' },
    startAt: '2026-12-03T18:00:00Z',
    timeZone: 'Europe/London',
    contacts: [{ role: 'Vet, by day', name: 'Dr Amara Osei', phone: '00 5550 0142' }],
    teamName: 'Saltings Rescue',
  }
}

export interface Answer<T = unknown> { status: number, headers: Headers, text: string, json: T, data: ApiErrorData }

/** One request; a body that is not text is sent as JSON. */
export async function ask<T = unknown>(method: string, path: string, body?: unknown, headers: Record<string, string> = {}): Promise<Answer<T>> {
  const sent = body === undefined ? {} : { body: typeof body === 'string' ? body : JSON.stringify(body), headers: { 'content-type': 'application/json', ...headers } }
  const answer = await fetch(baseUrl() + path, { method, headers, ...sent })
  const text = await answer.text()
  const json = answer.headers.get('content-type')?.includes('json') ? JSON.parse(text) as T & { data: ApiErrorData } : undefined
  return { status: answer.status, headers: answer.headers, text, json: json as T, data: json?.data as ApiErrorData }
}

export async function saved(input: RegimenInput = juniper()): Promise<SavedRegimenReceipt> {
  const answer = await ask<SavedRegimenReceipt>('POST', '/api/regimens', input)
  expect(answer.status, answer.text).toBe(201)
  return answer.json
}

/** The cookie that an answer set, ready to be sent back. */
export function cookieOf(answer: Answer): string {
  return answer.headers.getSetCookie().map(line => line.split(';')[0]).join('; ')
}

/** Every error answer has these keys, these words in its status line, and nothing of the server's insides. */
export function expectOurShape(answer: Answer, status: number, code?: string): void {
  expect(answer.status, answer.text).toBe(status)
  const whole = answer.json as { statusCode: number, statusMessage: string, message: string, data: ApiErrorData }
  expect(Object.keys(whole).sort()).toEqual(['data', 'message', 'statusCode', 'statusMessage'])
  expect(whole.statusCode).toBe(status)
  expect(whole.statusMessage).toMatch(/^[A-Za-z ]{4,30}$/)
  expect(whole.data.code).toMatch(/^[a-z][A-Za-z]*\.[a-z][A-Za-z]*$/)
  expect(whole.data.message).toBe(whole.message)
  expect(whole.message.length).toBeGreaterThan(10)
  expect(Object.keys(whole.data).filter(key => !['code', 'message', 'issues', 'findings'].includes(key))).toEqual([])
  expect(answer.text).not.toMatch(/\bat .*\.m?js:\d|node_modules|SQLITE|ZodError|\.ts:\d/)
  if (code) expect(whole.data.code).toBe(code)
}

/** The database of the server under test. */
export function withDatabase<T>(use: (db: Database.Database) => T): T {
  const db = new Database(join(dataDir(), 'thimbleful.db'))
  try {
    return use(db)
  }
  finally { db.close() }
}

export function rowCounts(): Record<string, number> {
  return withDatabase(db => Object.fromEntries(['regimens', 'regimen_versions', 'audit_records'].map(table => [table, (db.prepare(`select count(*) as count from ${table}`).get() as { count: number }).count])))
}
