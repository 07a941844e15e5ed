import 'server-only'
import { and, count, desc, eq, isNull, max } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { sheets } from '@/db/schema/setups'
import { ownedCartridges, unitPositions, units } from '@/db/schema/shelf'
import type { Actor } from '@/lib/access/actor'
import type { Permitted } from '@/lib/access/permit'
import { visibleTo } from '@/lib/access/visible-to'
import type { Milliseconds } from '@/lib/kernel/clock'
import { Fault } from '@/lib/kernel/errors'
import { newId } from '@/lib/kernel/ids'
import type { SheetRow } from '@/lib/setups/rows'
import type { PositionSource } from './terms'

export type UnitRow = typeof units.$inferSelect
export type CartridgeRow = typeof ownedCartridges.$inferSelect
export type PositionsRow = typeof unitPositions.$inferSelect

type Rows = Database | Transaction

/** In the words of `permit`: what is someone else's and what never was must sound the same. */
const NOTHING = 'There is nothing here under that name.'

/** @throws Fault not_found */
export function unitById(db: Rows, id: string): UnitRow {
  const row = db.select().from(units).where(eq(units.id, id)).get()
  if (!row) throw new Fault('not_found', NOTHING)
  return row
}

/** @throws Fault not_found */
export function cartridgeById(db: Rows, id: string): CartridgeRow {
  const row = db.select().from(ownedCartridges).where(eq(ownedCartridges.id, id)).get()
  if (!row) throw new Fault('not_found', NOTHING)
  return row
}

/**
 * One of the actor's own sheets, put away or not. Anyone may read a sheet by its code, but its number opens nothing: to
 * everyone else there is none.
 * @throws Fault not_found
 */
export function ownSheet(db: Rows, actor: Actor, number: number): SheetRow {
  const row = db.select().from(sheets).where(and(eq(sheets.number, number), visibleTo(actor, sheets.ownerId))).get()
  if (!row) throw new Fault('not_found', NOTHING)
  return row
}

export function countUnits(db: Rows, ownerId: string): number {
  return db.select({ so: count() }).from(units).where(eq(units.ownerId, ownerId)).get()?.so ?? 0
}

export function countCartridges(db: Rows, ownerId: string): number {
  return db.select({ so: count() }).from(ownedCartridges).where(eq(ownedCartridges.ownerId, ownerId)).get()?.so ?? 0
}

/** The last step that was not undone; undefined where nothing was ever said, or all of it was undone. */
export function lastStep(db: Rows, unitId: string): PositionsRow | undefined {
  return db
    .select()
    .from(unitPositions)
    .where(and(eq(unitPositions.unitId, unitId), isNull(unitPositions.undoneAt)))
    .orderBy(desc(unitPositions.step))
    .limit(1)
    .get()
}

interface Step {
  boardId: string
  left: string | null
  right: string | null
  source: PositionSource
  sheetId?: string
  letter?: string
}

/** Writes down how a unit stands from now on. Saying again what stands there already adds no step. */
export function addStep(tx: Rows, unit: Permitted<UnitRow, 'unit:change'>, step: Step, now: Milliseconds) {
  const last = lastStep(tx, unit.id)
  if (last && last.boardId === step.boardId && last.left === step.left && last.right === step.right) return
  const highest = tx.select({ step: max(unitPositions.step) }).from(unitPositions).where(eq(unitPositions.unitId, unit.id)).get()?.step ?? 0
  tx.insert(unitPositions)
    .values({ id: newId('pos'), unitId: unit.id, ...step, step: highest + 1, createdAt: now })
    .run()
}
