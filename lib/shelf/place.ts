import 'server-only'
import { and, isNull } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { ownedCartridges, units } from '@/db/schema/shelf'
import type { Actor } from '@/lib/access/actor'
import { visibleTo } from '@/lib/access/visible-to'
import type { Context } from '@/lib/kernel/context'
import { fold } from '@/lib/kernel/text'
import type { SheetPlace } from '@/lib/setups/save-sheet'
import type { AnswersInput } from '@/lib/setups/schema'

type Rows = Database | Transaction

/** Someone's units and cartridges that are not put away. */
function shelfOf(db: Rows, actor: Actor) {
  return {
    units: db.select().from(units).where(and(visibleTo(actor, units.ownerId), isNull(units.archivedAt))).all(),
    cartridges: db.select().from(ownedCartridges).where(and(visibleTo(actor, ownedCartridges.ownerId), isNull(ownedCartridges.archivedAt))).all(),
  }
}

interface About {
  modelId: string
  boardId?: string
  cartridgeName: string
  catalogueId?: string
}

const fits = (unit: { modelId: string; boardId: string | null }, { modelId, boardId }: About) =>
  unit.modelId === modelId && (unit.boardId === null || boardId === undefined || unit.boardId === boardId)
const isThat = (cartridge: { name: string; catalogueId: string | null }, { cartridgeName, catalogueId }: About) =>
  (catalogueId !== undefined && cartridge.catalogueId === catalogueId) || (cartridgeName !== '' && fold(cartridge.name) === fold(cartridgeName))

const onlyOne = <T>(found: T[]): T | null => (found.length === 1 ? found[0] : null)

/**
 * The unit and the cartridge that someone chose for a check from their own shelf. What is not theirs, or no longer what
 * the answers are about, counts as not chosen. A cartridge that was not chosen is still known where just one of theirs
 * is the one that the answers name; a unit is not, since someone else's may be of the same model.
 */
export function placeChosen({ db, actor }: Pick<Context, 'db' | 'actor'>, answers: AnswersInput): SheetPlace {
  const about = { modelId: answers.preamp ?? '', boardId: answers.board || undefined, cartridgeName: (answers.name ?? '').trim(), catalogueId: answers.cart || undefined }
  const own = shelfOf(db, actor)
  const unit = own.units.find(({ id }) => id === answers.unit)
  const cartridge = own.cartridges.find(({ id }) => id === answers.own)
  return {
    unitId: unit && fits(unit, about) ? unit.id : null,
    cartridgeId: cartridge && isThat(cartridge, about) ? cartridge.id : (onlyOne(own.cartridges.filter((each) => isThat(each, about)))?.id ?? null),
  }
}

/** Where a sheet that was made before would stand: beside the one unit and the one cartridge that it can be about. */
export function placeGuessed({ db, actor }: { db: Rows; actor: Actor }, about: About): SheetPlace {
  const own = shelfOf(db, actor)
  return {
    unitId: onlyOne(own.units.filter((unit) => fits(unit, about)))?.id ?? null,
    cartridgeId: onlyOne(own.cartridges.filter((cartridge) => isThat(cartridge, about)))?.id ?? null,
  }
}
