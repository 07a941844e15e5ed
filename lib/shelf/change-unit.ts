import 'server-only'
import { eq } from 'drizzle-orm'
import { units } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { unitById } from './rows'
import type { ChangeUnitInput } from './schema'
import { modelOfUnit, settleBoard } from './settle-board'
import { saidOf } from './unit-fields'

/**
 * Changes what is kept of a unit. Its model stays: another model is another unit. On another board the positions told
 * before mean something else, and from then on it is not known how it stands.
 * @throws Fault not_found; bad_input by field
 */
export function changeUnit(context: Context, { unitId, forgetSerial, ...input }: ChangeUnitInput): { id: string } {
  const { db, actor } = context
  return db.transaction((tx) => {
    const unit = permit(actor, 'unit:change', unitById(tx, unitId))
    const model = modelOfUnit(context, unit.modelId)
    const serial = input.serial || (forgetSerial ? '' : (unit.serial ?? ''))
    tx.update(units)
      .set({ ...settleBoard(model, { ...input, serial }), ...saidOf(input) })
      .where(eq(units.id, unit.id))
      .run()
    return { id: unit.id }
  })
}
