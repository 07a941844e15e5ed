import 'server-only'
import { permit } from '@/lib/access/permit'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import type { Preamp } from '@/lib/match/preamp'
import { parseState } from '@/lib/match/states'
import { readPositions, writePositions } from '@/lib/setups/positions'
import { addStep, unitById } from './rows'
import type { SetPositionsInput } from './schema'
import { boardOfUnit } from './unit-board'

const CLASH = 'It cannot stand like that: two of these cannot be ON together. Turn one off first.'
const ANOTHER_BOARD = 'Those are switches of another board. Say again how yours stand.'

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
    const texts = known === 'yes' ? readable(board.preamp, { left, right }) : { left: null, right: null }
    addStep(tx, unit, { boardId: board.id, ...texts, source: 'told' }, now)
    return { id: unit.id }
  })
}

/** The same texts as they are kept. @throws Fault bad_input */
function readable(preamp: Preamp, texts: { left: string; right: string }): { left: string; right: string } {
  const stands = readPositions(texts, preamp)
  if (stands) return writePositions(stands, preamp)
  const words = parseState(preamp, texts.left) && parseState(preamp, texts.right) ? CLASH : ANOTHER_BOARD
  throw new Fault('bad_input', words, { fields: { positions: words } })
}
