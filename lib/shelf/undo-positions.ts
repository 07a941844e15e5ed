import 'server-only'
import { and, eq } from 'drizzle-orm'
import { unitPositions } from '@/db/schema/shelf'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { lastStep, unitById } from './rows'
import type { UndoPositionsInput } from './schema'

/**
 * Takes the last word on how a unit stands back, whoever or whatever gave it: what was kept before counts again. No
 * switch is moved by it. Pressing twice undoes once.
 * @throws Fault not_found; conflict when something newer was said in between
 */
export function undoPositions({ db, actor, now }: Context, { unitId, positionsId }: UndoPositionsInput): { id: string } {
  return db.transaction((tx) => {
    const unit = permit(actor, 'unit:change', unitById(tx, unitId))
    const step = tx
      .select()
      .from(unitPositions)
      .where(and(eq(unitPositions.id, positionsId), eq(unitPositions.unitId, unit.id)))
      .get()
    if (!step) throw new Fault('not_found', 'There is nothing to undo under that name.')
    if (step.undoneAt !== null) return { id: unit.id }
    if (lastStep(tx, unit.id)?.id !== step.id) throw new Fault('conflict', 'Something newer was said since. Look how it stands now.')
    tx.update(unitPositions).set({ undoneAt: now }).where(eq(unitPositions.id, step.id)).run()
    return { id: unit.id }
  })
}
