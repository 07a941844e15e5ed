import type { PageOf } from './views'

const ROWS_A_PAGE = 50

/** Which rows a page holds: the one asked for, or the last there is. */
export function pageOf<Row>(asked: number, total: number, read: (limit: number, offset: number) => Row[]): PageOf<Row> {
  const pages = Math.max(1, Math.ceil(total / ROWS_A_PAGE))
  const page = Math.min(Math.max(1, Math.trunc(asked) || 1), pages)
  return { rows: read(ROWS_A_PAGE, (page - 1) * ROWS_A_PAGE), page, pages, total }
}
