import 'server-only'
import { eq } from 'drizzle-orm'
import { sheets } from '@/db/schema/setups'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { cartridgeById, ownSheet, unitById } from './rows'
import type { PlaceSheetInput } from './schema'

/**
 * Says which of one's units and cartridges a sheet is about.
 * @throws Fault not_found for what is not one's own; bad_input for a unit of another model
 */
export function placeSheet({ db, actor }: Context, { number, unitId, cartridgeId }: PlaceSheetInput): { number: number } {
  return db.transaction((tx) => {
    const sheet = permit(actor, 'sheet:place', ownSheet(tx, actor, number))
    const unit = unitId === '' ? null : permit(actor, 'unit:read', unitById(tx, unitId))
    const cartridge = cartridgeId === '' ? null : permit(actor, 'cartridge:read', cartridgeById(tx, cartridgeId))
    if (unit && unit.modelId !== sheet.modelId) {
      const words = `This sheet is about a ${sheet.modelName}. Choose one of those.`
      throw new Fault('bad_input', words, { fields: { unitId: words } })
    }
    tx.update(sheets)
      .set({ unitId: unit?.id ?? null, cartridgeId: cartridge?.id ?? null })
      .where(eq(sheets.id, sheet.id))
      .run()
    return { number }
  })
}
