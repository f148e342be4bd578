import { eq, lt } from 'drizzle-orm'
import type { Db } from '../../db/client'
import { attempts } from '../../db/schema'

export interface Attempts { failures: number, lastAt: string }

export function findAttempts(db: Db, key: string): Attempts | undefined {
  return db.select({ failures: attempts.failures, lastAt: attempts.lastAt }).from(attempts).where(eq(attempts.key, key)).get()
}
export function saveAttempts(db: Db, key: string, failures: number, at: string): void {
  db.insert(attempts).values({ key, failures, lastAt: at }).onConflictDoUpdate({ target: attempts.key, set: { failures, lastAt: at } }).run()
}
export function forgetAttempts(db: Db, key: string): void {
  db.delete(attempts).where(eq(attempts.key, key)).run()
}
export function forgetAttemptsBefore(db: Db, at: string): void {
  db.delete(attempts).where(lt(attempts.lastAt, at)).run()
}
