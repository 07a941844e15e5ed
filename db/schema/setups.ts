import { index, integer, sqliteTable, text, uniqueIndex, type AnySQLiteColumn } from 'drizzle-orm/sqlite-core'
import type { VerdictKind } from '../../lib/match/result'
import { milliseconds } from './columns'
import { ownedCartridges, units } from './shelf'

/** A set-up sheet. Its number is for saying and opens nothing; whoever has its code can read it. */
export const sheets = sqliteTable(
  'sheets',
  {
    id: text('id').primaryKey(),
    number: integer('number').notNull().unique(),
    code: text('code').notNull().unique(),
    /** A name that its owner gave it; null while nobody did. */
    name: text('name'),
    /** Account that keeps it; null while it is kept by its code alone. */
    ownerId: text('owner_id'),
    /** The owner's unit and cartridge that it is about, where that is known. */
    unitId: text('unit_id').references((): AnySQLiteColumn => units.id, { onDelete: 'set null' }),
    cartridgeId: text('cartridge_id').references((): AnySQLiteColumn => ownedCartridges.id, { onDelete: 'set null' }),
    /** What its newest revision says, beside it, so that a list of thousands opens no revision. */
    letter: text('letter').notNull().default('A'),
    verdict: text('verdict').$type<VerdictKind>().notNull().default('cannot-say'),
    modelId: text('model_id').notNull().default(''),
    modelName: text('model_name').notNull().default(''),
    cartridgeName: text('cartridge_name').notNull().default(''),
    /** Preamp, board and cartridge in folded words, for searching. */
    words: text('words').notNull().default(''),
    changedAt: milliseconds('changed_at').notNull().default(0),
    /** Short name of the press that made it, so that a second press or a retry makes no second sheet. */
    requestKey: text('request_key').unique(),
    archivedAt: milliseconds('archived_at'),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [
    // Someone's sheets, those changed last first.
    index('sheets_owner').on(table.ownerId, table.changedAt, table.number),
    // The newest sheet of each cartridge on each unit, and letting go of a unit or cartridge that is deleted.
    index('sheets_unit').on(table.unitId, table.cartridgeId),
    index('sheets_cartridge').on(table.cartridgeId),
  ],
)

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
