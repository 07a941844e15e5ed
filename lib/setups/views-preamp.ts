import { boardForSerial, type BoardView, type PreampView } from '../catalogue/views'
import type { RawAnswers } from './trouble'

/** The preamp that answers are about. Pure; the browser holds the maker's whole list, which is short. */
export interface PickedPreamp {
  model: PreampView | null
  /** The board said, or the newest where none is. */
  board: BoardView | null
  /** True when more than one exists and none was said. */
  boardOpen: boolean
}

export function pickPreamp(models: readonly PreampView[], { preamp, board: said }: RawAnswers): PickedPreamp {
  const model = models.find(({ id }) => id === preamp) ?? null
  if (!model) return { model: null, board: null, boardOpen: false }
  const known = model.boards.find(({ id }) => id === said)
  return { model, board: known ?? model.boards[model.boards.length - 1], boardOpen: !known && model.boards.length > 1 }
}

export type SerialTrouble = 'not-figures' | 'no-board'

/** What a serial number settles: the board it belongs to, or why it does not. Null where nothing was typed. */
export function boardOfSerial(model: PreampView, text: string): { board: BoardView } | { reason: SerialTrouble } | null {
  const figures = text.replace(/[\s.,'-]/g, '')
  if (figures === '') return null
  if (!/^\d+$/.test(figures)) return { reason: 'not-figures' }
  const board = boardForSerial(model, Number(figures))
  return board ? { board } : { reason: 'no-board' }
}

export function serialSentence(reason: SerialTrouble, { name }: PreampView): string {
  return reason === 'not-figures'
    ? 'The serial number is figures only. It is on the plate at the back.'
    : `No ${name} has this number. Choose the board beside it, or leave it open.`
}
