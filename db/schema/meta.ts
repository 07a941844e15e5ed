import { sqliteTable, text } from 'drizzle-orm/sqlite-core'
import { milliseconds } from './columns'

/** Facts about this installation, one a row: when it last answered, which demo data it holds. */
export const meta = sqliteTable('meta', {
  key: text('key').primaryKey(),
  value: text('value').notNull(),
  updatedAt: milliseconds('updated_at').notNull(),
})
