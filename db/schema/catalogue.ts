import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { CATALOGUE_KINDS } from '../../lib/catalogue/terms'
import { milliseconds } from './columns'

/** Everything in the catalogue, one row an entry. What a query needs has a column; the entry itself is `data`. */
export const catalogueEntries = sqliteTable(
  'catalogue_entries',
  {
    /** Readable and lasting, such as "calloway-wren". Unique over all kinds. */
    id: text('id').primaryKey(),
    kind: text('kind', { enum: CATALOGUE_KINDS }).notNull(),
    /** What narrows a list of this kind: a cartridge's type, an input's kind, a lead's use; null for the others. */
    type: text('type'),
    maker: text('maker').notNull(),
    name: text('name').notNull(),
    /** Maker and name, folded, one space between words. */
    sortName: text('sort_name').notNull(),
    /** All that a search finds it by, folded, without spaces, maker and name first. */
    searchTight: text('search_tight').notNull(),
    /** JSON in edge units; read through the schema of its kind. */
    data: text('data').notNull(),
    /** Of `data` as the demo last wrote it; null for entries that people made. Different from `data`: edited. */
    demoHash: text('demo_hash'),
    createdAt: milliseconds('created_at').notNull(),
    updatedAt: milliseconds('updated_at').notNull(),
  },
  (table) => [
    // Every list and search of a kind, in order of name, answered from the index alone: what it takes to match and to
    // rank is in it, so that thousands of entries are looked through without reading their data.
    index('catalogue_entries_search').on(table.kind, table.sortName, table.id, table.searchTight, table.type),
  ],
)
