import { index, integer, real, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core'
import { POSITION_SOURCES } from '../../lib/shelf/terms'
import { people } from './accounts'
import { milliseconds } from './columns'
import { sheets } from './setups'

/** Someone's own preamps, the things themselves. */
export const units = sqliteTable(
  'units',
  {
    id: text('id').primaryKey(),
    ownerId: text('owner_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** What its owner calls it; null while the model's name does. */
    name: text('name'),
    modelId: text('model_id').notNull(),
    /** Null while nobody knows which board it has. */
    boardId: text('board_id'),
    /** Figures only. Never public and never in an address; its owner sees the last three. */
    serial: text('serial'),
    /** As its owner put it: "2019", "March 2024". */
    boughtOn: text('bought_on'),
    boughtFrom: text('bought_from'),
    secondHand: integer('second_hand', { mode: 'boolean' }),
    archivedAt: milliseconds('archived_at'),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [
    // Someone's units, the oldest first.
    index('units_owner').on(table.ownerId, table.createdAt),
  ],
)

/**
 * How a unit stood, step by step. The last step that was not undone says how it stands now; nothing is overwritten, so
 * that undoing brings back what was there.
 */
export const unitPositions = sqliteTable(
  'unit_positions',
  {
    id: text('id').primaryKey(),
    unitId: text('unit_id')
      .notNull()
      .references(() => units.id, { onDelete: 'cascade' }),
    /** 1, 2, 3 in order of saying. */
    step: integer('step').notNull(),
    /** The board these texts are of: on another one they mean something else. */
    boardId: text('board_id').notNull(),
    /** Short texts of both sides; null where its owner does not know any more. */
    left: text('left'),
    right: text('right'),
    source: text('source', { enum: POSITION_SOURCES }).notNull(),
    /** The sheet that asked for it, and the revision after the moves. */
    sheetId: text('sheet_id').references(() => sheets.id, { onDelete: 'set null' }),
    letter: text('letter'),
    undoneAt: milliseconds('undone_at'),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [
    // How a unit stands now, and the step before it.
    uniqueIndex('unit_positions_step').on(table.unitId, table.step),
    // Letting go of a sheet that is deleted.
    index('unit_positions_sheet').on(table.sheetId),
  ],
)

/** Someone's own cartridges. */
export const ownedCartridges = sqliteTable(
  'owned_cartridges',
  {
    id: text('id').primaryKey(),
    ownerId: text('owner_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** The entry of the catalogue it was taken from; null where its values came by hand. */
    catalogueId: text('catalogue_id'),
    name: text('name').notNull(),
    /** JSON: the answers of a check that are about the cartridge, as typed. */
    answers: text('answers').notNull(),
    /** How long its stylus has played; null while nobody counts. */
    stylusHours: real('stylus_hours'),
    notes: text('notes').notNull().default(''),
    archivedAt: milliseconds('archived_at'),
    createdAt: milliseconds('created_at').notNull(),
  },
  (table) => [
    // Someone's cartridges, the oldest first.
    index('owned_cartridges_owner').on(table.ownerId, table.createdAt),
  ],
)
