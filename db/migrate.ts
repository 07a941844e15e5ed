import { migrate } from 'drizzle-orm/better-sqlite3/migrator'
import type { Database } from './client'

/**
 * Brings a database up to the present schema: runs each migration of `drizzle/` that it has not had yet, in
 * order, in one transaction. Running it again changes nothing.
 */
export function migrateDatabase(db: Database, migrationsFolder = 'drizzle') {
  migrate(db, { migrationsFolder })
}
