import BetterSqlite3 from 'better-sqlite3'
import { drizzle } from 'drizzle-orm/better-sqlite3'
import * as schema from './schema'

export type Database = ReturnType<typeof openDatabase>

/** What a transaction's callback receives; reads and writes like the database itself. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]

/**
 * Opens a database; the only place that does. Everything is synchronous.
 *
 * @param source path of a file (its folder must exist; the file is made), or the bytes of a serialized
 *   database, which then lives in memory
 * @throws SqliteError when the file cannot be opened or is no database
 */
export function openDatabase(source: string | Buffer) {
  const connection = new BetterSqlite3(source)
  // Readers do not wait for the writer.
  connection.pragma('journal_mode = WAL')
  // SQLite leaves these off unless asked, for every connection anew.
  connection.pragma('foreign_keys = ON')
  connection.pragma('busy_timeout = 5000')
  // With WAL, a power cut can lose the last writes but never break the file.
  connection.pragma('synchronous = NORMAL')
  return drizzle(connection, { schema })
}
