import { asc, count, desc, type SQL } from 'drizzle-orm'
import type { SQLiteColumn, SQLiteTable } from 'drizzle-orm/sqlite-core'
import type { Page } from '#shared/types/team'
import type { Db } from '../../db/client'

export interface ListAsked { page: number, pageSize: number, sort: string, q: string }

/** Order of a list: the column asked for, then one that is never equal, so that no row is on two pages. */
export function orderBy(sort: string, columns: Record<string, SQLiteColumn | SQL>, last: SQLiteColumn): SQL[] {
  const column = columns[sort.replace(/^-/, '')]
  const way = sort.startsWith('-') ? desc : asc
  return [...column ? [way(column)] : [], way(last)]
}

/** Rows of one page, and how many there are in all. */
export function pageOf<Row, Item>(db: Db, table: SQLiteTable, where: SQL | undefined, asked: Pick<ListAsked, 'page' | 'pageSize'>, rows: (limit: number, offset: number) => Row[], item: (row: Row) => Item): Page<Item> {
  const total = db.select({ count: count() }).from(table).where(where).get()?.count ?? 0
  return { items: rows(asked.pageSize, (asked.page - 1) * asked.pageSize).map(item), total, page: asked.page, pageSize: asked.pageSize }
}

/** A search text as a pattern for LIKE … ESCAPE '\', its own signs taken literally. */
export function likePattern(q: string): string {
  return `%${q.toLowerCase().replace(/[\\%_]/g, sign => `\\${sign}`)}%`
}
