import type { ReactNode } from 'react'

/**
 * A part of a panel, drawn from its own upper left corner. What can be seen and what a hand can press are kept apart:
 * the first is hidden from those who have it read aloud, the second is all they need.
 */
export interface Piece {
  width: number
  height: number
  drawing: ReactNode
  targets: ReactNode
  /** A low piece may stand under another one. */
  low?: boolean
  /** Pieces after this one are set apart by a line. */
  lineAfter?: boolean
}

/** One press on a drawn control: the member (1-based) of a bank or row, or the id of a place or plug. */
export interface Flip {
  control: string
  to: number | string
}

/** Set when the drawing can be operated. */
export type Hand = ((flip: Flip) => void) | null

/** Two decimals are plenty for a drawing. */
export function px(value: number): number {
  return Math.round(value * 100) / 100
}
