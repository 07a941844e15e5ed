import 'server-only'
import { units } from '@/db/schema/shelf'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { newId } from '@/lib/kernel/ids'
import { mustHaveShelf } from './owner'
import { countUnits } from './rows'
import type { AddUnitInput } from './schema'
import { modelOfUnit, settleBoard } from './settle-board'
import { MAX_UNITS } from './terms'
import { saidOf } from './unit-fields'

/**
 * Puts a preamp on the shelf. Its serial number settles the board.
 * @throws Fault sign_in; bad_input by field; conflict when the shelf is full
 */
export function addUnit(context: Context, input: AddUnitInput): { id: string } {
  const { db, actor, now } = context
  const owner = mustHaveShelf(actor, 'unit:add')
  const model = modelOfUnit(context, input.model)
  const unit = { id: newId('unt'), ownerId: owner.id, modelId: model.id, ...settleBoard(model, input), ...saidOf(input), createdAt: now }
  return db.transaction((tx) => {
    if (countUnits(tx, owner.id) >= MAX_UNITS) throw new Fault('conflict', `A shelf holds ${MAX_UNITS} preamps, and yours is full.`)
    tx.insert(units).values(unit).run()
    return { id: unit.id }
  })
}
