import 'server-only'
import type { Transaction } from '@/db/client'
import type { Context } from '../kernel/context'
import { Fault } from '../kernel/errors'
import type { MatchInputs } from '../match/inputs'
import { addRevision } from './add-revision'
import { writePositions } from './positions'
import { revisionOf, sheetByCode, type SheetRow } from './rows'
import { fromStored } from './stored'
import type { SheetResult } from './views'

/** What was moved, and where that stands: for whoever keeps how the unit itself stands. */
export interface Moved {
  sheet: SheetRow
  letter: string
  boardId: string
  left: string
  right: string
}

/**
 * The owner has moved what the newest revision asked for: the next one starts from there. The one before is kept.
 * @param also is done in the same transaction
 * @throws Fault not_found; conflict when it asks for no move, or after Z
 */
export function markMoved(
  context: Context,
  { code }: { code: string },
  also?: (tx: Transaction, moved: Moved) => void,
): { code: string; letter: string } {
  const newest = revisionOf(context.db, sheetByCode(context.db, code).id)
  const { preamp } = fromStored<MatchInputs>(newest.inputs)
  const { match } = fromStored<SheetResult>(newest.result)
  const state = match.tonight?.state ?? match.chosen?.setting.state
  if (!state) throw new Fault('conflict', 'This sheet asks for no move.')
  const { left, right } = writePositions({ left: state, right: state }, preamp)
  return addRevision(
    context,
    code,
    (answers) => ({ ...answers, present: 'known', left, right }),
    (tx, sheet, letter) => also?.(tx, { sheet, letter, boardId: preamp.boardId, left, right }),
  )
}
