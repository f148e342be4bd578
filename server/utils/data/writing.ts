import type { Db } from '../../db/client'

/** The database or a transaction on it: what writes in one transaction with others takes either. */
export type Writer = Db | Parameters<Parameters<Db['transaction']>[0]>[0]

/** Takes the write lock at once: reading first and then finding the database busy would fail instead of waiting. */
export const WRITING = { behavior: 'immediate' } as const
