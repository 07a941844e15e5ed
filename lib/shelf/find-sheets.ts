import 'server-only'
import { and, asc, count, desc, isNotNull, isNull, or, sql, type SQL } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { visibleTo } from '@/lib/access/visible-to'
import type { Context } from '@/lib/kernel/context'
import { foldedWords } from '@/lib/kernel/text'
import { mustHaveShelf } from './owner'
import type { SheetSearch } from './schema'
import { SHEETS_A_PAGE, type SheetOrder } from './terms'
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

/** Text that a pattern takes as it stands. */
const literally = (text: string) => text.replace(/[\\%_]/g, '\\$&')

/** Every word stands in the number, the owner's name for it, or what it is about. */
function saying(text: string): SQL | undefined {
  const words = foldedWords(text).slice(0, 8)
  return and(
    ...words.map((word) => {
      const pattern = `%${literally(word)}%`
      return or(
        sql`${sheets.words} like ${pattern} escape '\\'`,
        sql`${sheets.name} like ${pattern} escape '\\'`,
        sql`cast(${sheets.number} as text) like ${`${literally(word)}%`} escape '\\'`,
      )
    }),
  )
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
