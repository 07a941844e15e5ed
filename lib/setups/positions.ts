import type { Positions } from '../match/controls'
import type { Preamp } from '../match/preamp'
import { decodeState, encodeState } from '../match/states'

/** How both sides stand, out of their short texts. @returns null when either does not fit this board */
export function readPositions(texts: { left: string; right: string }, preamp: Preamp): Positions | null {
  const left = decodeState(preamp, texts.left)
  const right = decodeState(preamp, texts.right)
  return left && right && { left, right }
}

/** The short texts under which positions travel. */
export function writePositions(positions: Positions, preamp: Preamp): { left: string; right: string } {
  return { left: encodeState(preamp, positions.left), right: encodeState(preamp, positions.right) }
}
