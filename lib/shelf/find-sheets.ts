import 'server-only'
import { and, asc, count, desc, isNotNull, isNull, like, or, sql, type SQL } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { visibleTo } from '@/lib/access/visible-to'
import type { Context } from '@/lib/kernel/context'
import { foldedWords } from '@/lib/kernel/text'
import { mustHaveShelf } from './owner'
import type { SheetSearch } from './schema'
import { MAX_SEARCH_WORDS, SHEETS_A_PAGE, type SheetOrder } from './terms'
import { toSheetMark } from './to-views'
import type { SheetsPage } from './views'

/** Verdicts as their owner has to act on them: what is open first. */
const BY_VERDICT = sql`case ${sheets.verdict} when 'cannot-say' then 0 when 'does-not-suit' then 1 when 'suits-with-a-limit' then 2 when 'suits-with-changes' then 3 else 4 end`

const ORDERS: Record<SheetOrder, SQL[]> = {
  newest: [desc(sheets.changedAt)],
  number: [],
  cartridge: [sql`${sheets.cartridgeName} collate nocase`],
  preamp: [sql`${sheets.modelName} collate nocase`],
  verdict: [BY_VERDICT],
}

/** Every word stands in the owner's name for it or in what it is about, or is its number. Folded words hold no signs of patterns. */
function saying(text: string): SQL | undefined {
  const words = foldedWords(text).slice(0, MAX_SEARCH_WORDS)
  return and(...words.map((word) => or(like(sheets.words, `%${word}%`), like(sheets.name, `%${word}%`), sql`cast(${sheets.number} as text) = ${word}`)))
}

/**
 * One page of one's own sheets. Pages past the end give the last one.
 * @throws Fault sign_in
 */
export function findSheets({ db, actor }: Pick<Context, 'db' | 'actor'>, { q, show, order, page: wanted }: SheetSearch): SheetsPage {
  mustHaveShelf(actor, 'shelf:read')
  const where = and(
    visibleTo(actor, sheets.ownerId),
    show === 'put-away' ? isNotNull(sheets.archivedAt) : isNull(sheets.archivedAt),
    saying(q),
  )
  const total = db.select({ so: count() }).from(sheets).where(where).get()?.so ?? 0
  const pages = Math.max(1, Math.ceil(total / SHEETS_A_PAGE))
  const page = Math.min(wanted, pages)
  const rows = db
    .select()
    .from(sheets)
    .where(where)
    .orderBy(...ORDERS[order], order === 'number' ? asc(sheets.number) : desc(sheets.number))
    .limit(SHEETS_A_PAGE)
    .offset((page - 1) * SHEETS_A_PAGE)
    .all()
  return { sheets: rows.map(toSheetMark), total, page, pages, q, show, order }
}
