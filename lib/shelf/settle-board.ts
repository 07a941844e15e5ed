import 'server-only'
import { getPreamp } from '@/lib/catalogue/queries'
import type { PreampView } from '@/lib/catalogue/views'
import type { Context } from '@/lib/kernel/context'
import { Fault } from '@/lib/kernel/errors'
import { boardOfSerial, serialSentence } from '@/lib/setups/views-preamp'

/** Figures only, as a serial number is kept. */
const figuresOf = (text: string) => text.replace(/\D/g, '')

/** @throws Fault bad_input for a model that the maker does not make */
export function modelOfUnit(context: Pick<Context, 'db'>, modelId: string): PreampView {
  try {
    return getPreamp(context, modelId)
  } catch (trouble) {
    if (!(trouble instanceof Fault) || trouble.code !== 'not_found') throw trouble
    const words = 'Choose one of the models.'
    throw new Fault('bad_input', words, { fields: { model: words }, cause: trouble })
  }
}

/**
 * The board of a unit and its serial number as they are kept. A number settles the board, whatever else was chosen;
 * without one the board chosen counts, and where there is only one it is that.
 * @throws Fault bad_input for a number that no board has, and for a board that the model does not have. The number
 *   itself stands in no fault.
 */
export function settleBoard(model: PreampView, { serial, board }: { serial: string; board: string }): { serial: string | null; boardId: string | null } {
  const settled = boardOfSerial(model, serial)
  if (settled && 'reason' in settled) {
    const words = serialSentence(settled.reason, model)
    throw new Fault('bad_input', words, { fields: { serial: words } })
  }
  if (settled) return { serial: figuresOf(serial), boardId: settled.board.id }
  if (board === '') return { serial: null, boardId: model.boards.length === 1 ? model.boards[0].id : null }
  if (!model.boards.some(({ id }) => id === board)) {
    const words = 'Choose one of its boards, or leave it open.'
    throw new Fault('bad_input', words, { fields: { board: words } })
  }
  return { serial: null, boardId: board }
}
