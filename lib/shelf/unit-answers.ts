import type { BoardView } from '../catalogue/views'
import { readPositions } from '../setups/positions'
import type { AnswersInput } from '../setups/schema'

interface Stood {
  boardId: string
  left: string | null
  right: string | null
}

/** How a unit stands, where that is known and is of the board it has; null otherwise. */
export function standsOn(board: BoardView | null, step: Stood | undefined): { left: string; right: string } | null {
  if (!board || !step || step.boardId !== board.id || step.left === null || step.right === null) return null
  const texts = { left: step.left, right: step.right }
  return readPositions(texts, board.preamp) && texts
}

/** The same as answers of a check. */
export function presentAnswers(board: BoardView | null, step: Stood | undefined): AnswersInput {
  const stands = standsOn(board, step)
  return stands ? { present: 'known', ...stands } : { present: 'unknown', left: '', right: '' }
}
