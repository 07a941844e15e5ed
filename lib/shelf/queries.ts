import 'server-only'
import { and, asc, count, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm'
import { revisions, sheets } from '@/db/schema/setups'
import { ownedCartridges, units } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import { visibleTo } from '@/lib/access/visible-to'
import type { Context } from '@/lib/kernel/context'
import { gistColumns, toGist } from './gist'
import { worthKnowing } from './format'
import { mustHaveShelf } from './owner'
import { cartridgeById, lastStep, ownSheet, unitById, type PositionsRow } from './rows'
import { toOwnedCartridgeView, toSheetMark, toUnitView } from './to-views'
import type { OwnedCartridgeView, PlaceView, SheetHistory, ShelfView, UnitView } from './views'

type Reader = Pick<Context, 'db' | 'actor'>

/** How a unit stands, with the number of the sheet that asked for it while that one still exists. */
function standingOf({ db }: Reader, unitId: string): (PositionsRow & { sheetNumber: number | null }) | undefined {
  const step = lastStep(db, unitId)
  if (!step) return undefined
  const sheet = step.sheetId === null ? undefined : db.select({ number: sheets.number }).from(sheets).where(eq(sheets.id, step.sheetId)).get()
  return { ...step, sheetNumber: sheet?.number ?? null }
}

/** One's own units, the oldest first. @throws Fault sign_in */
export function listUnits(context: Reader, { archived }: { archived: boolean }): UnitView[] {
  const { db, actor } = context
  mustHaveShelf(actor, 'shelf:read')
  return db
    .select()
    .from(units)
    .where(and(visibleTo(actor, units.ownerId), archived ? isNotNull(units.archivedAt) : isNull(units.archivedAt)))
    .orderBy(asc(units.createdAt), asc(units.id))
    .all()
    .map((row) => toUnitView(context, row, standingOf(context, row.id)))
}

/** @throws Fault not_found */
export function getUnit(context: Reader, id: string): UnitView {
  const row = permit(context.actor, 'unit:read', unitById(context.db, id))
  return toUnitView(context, row, standingOf(context, row.id))
}

/** One's own cartridges, the oldest first. @throws Fault sign_in */
export function listCartridges({ db, actor }: Reader, { archived }: { archived: boolean }): OwnedCartridgeView[] {
  mustHaveShelf(actor, 'shelf:read')
  return db
    .select()
    .from(ownedCartridges)
    .where(and(visibleTo(actor, ownedCartridges.ownerId), archived ? isNotNull(ownedCartridges.archivedAt) : isNull(ownedCartridges.archivedAt)))
    .orderBy(asc(ownedCartridges.createdAt), asc(ownedCartridges.id))
    .all()
    .map(toOwnedCartridgeView)
}

/** @throws Fault not_found */
export function getOwnedCartridge({ db, actor }: Reader, id: string): OwnedCartridgeView {
  return toOwnedCartridgeView(permit(actor, 'cartridge:read', cartridgeById(db, id)))
}

/** Everything that goes with everything, on one's own shelf. @throws Fault sign_in */
export function getShelf(context: Reader): ShelfView {
  const own = { units: listUnits(context, { archived: false }), cartridges: listCartridges(context, { archived: false }) }
  const places = placesOf(context, own)
  const sheetCount = context.db
    .select({ so: count() })
    .from(sheets)
    .where(and(visibleTo(context.actor, sheets.ownerId), isNull(sheets.archivedAt)))
    .get()?.so ?? 0
  return { ...own, places, sheetCount, elsewhere: sheetCount - places.reduce((sum, { older }) => sum + 1 + older, 0) }
}

/** The newest sheet of each cartridge on each unit. */
function placesOf({ db, actor }: Reader, own: Pick<ShelfView, 'units' | 'cartridges'>): PlaceView[] {
  const pair = sql`partition by ${sheets.unitId}, ${sheets.cartridgeId}`
  const ranked = db
    .select({
      id: sheets.id,
      rank: sql<number>`row_number() over (${pair} order by ${sheets.changedAt} desc, ${sheets.number} desc)`.as('rank'),
      so: sql<number>`count(*) over (${pair})`.as('so'),
    })
    .from(sheets)
    .where(and(visibleTo(actor, sheets.ownerId), isNull(sheets.archivedAt), isNotNull(sheets.unitId), isNotNull(sheets.cartridgeId)))
    .as('ranked')
  const rows = db
    .select({ sheet: sheets, so: ranked.so, ...gistColumns })
    .from(ranked)
    .innerJoin(sheets, eq(sheets.id, ranked.id))
    .innerJoin(revisions, and(eq(revisions.sheetId, sheets.id), eq(revisions.letter, sheets.letter)))
    .where(eq(ranked.rank, 1))
    .all()
  const onShelf = new Set([...own.units, ...own.cartridges].map(({ id }) => id))
  return rows.flatMap(({ sheet, so, ...gist }) => {
    const { unitId, cartridgeId } = sheet
    if (unitId === null || cartridgeId === null || !onShelf.has(unitId) || !onShelf.has(cartridgeId)) return []
    return [{ unitId, cartridgeId, sheet: toSheetMark(sheet), worthKnowing: worthKnowing(toGist(gist)), older: so - 1 }]
  })
}

/** One of one's own sheets with all its revisions, put away or not. @throws Fault not_found */
export function getSheetHistory({ db, actor }: Reader, number: number): SheetHistory {
  mustHaveShelf(actor, 'shelf:read')
  const sheet = ownSheet(db, actor, number)
  const rows = db
    .select({ letter: revisions.letter, createdAt: revisions.createdAt, ...gistColumns })
    .from(revisions)
    .where(eq(revisions.sheetId, sheet.id))
    .orderBy(desc(revisions.letter))
    .all()
  return {
    ...toSheetMark(sheet),
    createdAt: sheet.createdAt,
    unitId: sheet.unitId,
    cartridgeId: sheet.cartridgeId,
    modelId: sheet.modelId,
    revisions: rows.map(({ letter, createdAt, ...columns }) => {
      const gist = toGist(columns)
      return { letter, createdAt, verdict: gist.verdict, worthKnowing: worthKnowing(gist) }
    }),
  }
}
