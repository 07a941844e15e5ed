import 'server-only'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { readPositions, writePositions } from '@/lib/setups/positions'
import { addStep, unitById } from './rows'
import type { SetPositionsInput } from './schema'
import { boardOfUnit } from './unit-board'

const CLASH = 'It cannot stand like that: two of these cannot be ON together. Turn one off first.'

/**
 * How a unit stands now, as its owner sees it; or that they cannot say any more. What was said before is kept, and can
 * be brought back.
 * @throws Fault not_found; bad_input for positions that this board cannot have; conflict where nothing can be set
 */
export function setPositions(context: Context, { unitId, known, left, right }: SetPositionsInput): { id: string } {
  const { db, actor, now } = context
  return db.transaction((tx) => {
    const unit = permit(actor, 'unit:change', unitById(tx, unitId))
    const board = boardOfUnit(context, unit)
    if (!board || board.preamp.controls.length === 0) throw new Fault('conflict', 'There is nothing on it that can be set.')
    const stands = known === 'yes' ? readPositions({ left, right }, board.preamp) : null
    if (known === 'yes' && !stands) throw new Fault('bad_input', CLASH, { fields: { positions: CLASH } })
    const texts = stands ? writePositions(stands, board.preamp) : { left: null, right: null }
    addStep(tx, unit, { boardId: board.id, ...texts, source: 'told' }, now)
    return { id: unit.id }
  })
}
