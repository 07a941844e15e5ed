import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { milliseconds } from './columns'

/** A set-up sheet. Its number is for saying and opens nothing; whoever has its code can read it. */
export const sheets = sqliteTable('sheets', {
  id: text('id').primaryKey(),
  number: integer('number').notNull().unique(),
  code: text('code').notNull().unique(),
  /** A name that its owner gave it; null while nobody did. */
  name: text('name'),
  /** Account that keeps it; null while it is kept by its code alone. */
  ownerId: text('owner_id'),
  /** Short name of the press that made it, so that a second press or a retry makes no second sheet. */
  requestKey: text('request_key').unique(),
  archivedAt: milliseconds('archived_at'),
  createdAt: milliseconds('created_at').notNull(),
})

/** One state of a sheet, as it was reckoned then. Only added, never changed. */
export const revisions = sqliteTable(
  'revisions',
  {
    id: text('id').primaryKey(),
    sheetId: text('sheet_id')
      .notNull()
      .references(() => sheets.id),
    /** A, B, C in order of making. */
    letter: text('letter').notNull(),
    /** JSON: what was answered, as typed. */
    answers: text('answers').notNull(),
    /** JSON: what the engine was given, SI. */
    inputs: text('inputs').notNull(),
    /** JSON: all that it said, curves and stages included. */
    result: text('result').notNull(),
    engineVersion: text('engine_version').notNull(),
    rulesVersion: integer('rules_version').notNull(),
    /** Of the inputs: another one now means that the catalogue says something else than it did. */
    dataHash: text('data_hash').notNull(),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [uniqueIndex('revisions_sheet_letter').on(table.sheetId, table.letter)],
)

/** How often an address asked lately. Kept here so that a restart forgets nothing. */
export const rateLimits = sqliteTable(
  'rate_limits',
  {
    key: text('key').primaryKey(),
    points: integer('points').notNull(),
    /** When it starts from nothing again. */
    expire: milliseconds('expire'),
  },
  (table) => [
    // Sweeping out what has run out.
    index('rate_limits_expire').on(table.expire),
  ],
)
