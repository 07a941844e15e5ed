import 'server-only'
import type { Context } from '../kernel/context'
import { Fault } from '../kernel/errors'
import type { MatchInputs } from '../match/inputs'
import { addRevision } from './add-revision'
import { writePositions } from './positions'
import { revisionOf, sheetByCode } from './rows'
import { fromStored } from './stored'
import type { SheetResult } from './views'

/**
 * The owner has moved what the newest revision asked for: the next one starts from there. The one before is kept.
 * @throws Fault not_found; conflict when it asks for no move, or after Z
 */
export function markMoved(context: Context, { code }: { code: string }): { code: string; letter: string } {
  const newest = revisionOf(context.db, sheetByCode(context.db, code).id)
  const { preamp } = fromStored<MatchInputs>(newest.inputs)
  const { match } = fromStored<SheetResult>(newest.result)
  const state = match.tonight?.state ?? match.chosen?.setting.state
  if (!state) throw new Fault('conflict', 'This sheet asks for no move.')
  const { left, right } = writePositions({ left: state, right: state }, preamp)
  return addRevision(context, code, (answers) => ({ ...answers, present: 'known', left, right }))
}
