import type { ControlState, Positions, Preamp } from '@/lib/match'
import { sidesDiffer } from '@/lib/match/moves'
import { statesEqual } from '@/lib/match/states'

/** One channel as drawn, and as it was. Both are the same where nothing is marked. */
export interface SideView {
  shown: ControlState
  was: ControlState
}

/** What a drawing shows: how things stand, what is to be moved, and whether the channels are drawn apart. */
export interface PanelView {
  left: SideView
  right: SideView
  alike: boolean
}

/** What a drawing is made from. With neither `present` nor `target` it is as delivered. */
export interface PanelSource {
  preamp: Preamp
  /** How the unit stands now; null when nobody knows, and then nothing is marked as a move. */
  present: Positions | null
  /** How it is to stand; null draws it as it is. */
  target: ControlState | null
  /** A setting being tried out: drawn as it is, without marks. */
  trying?: ControlState | null
  /** Another setting of the same board: what differs from it gets a thick edge instead of a move. */
  comparedWith?: ControlState | null
}

export function panelView({ preamp, present, target, trying, comparedWith }: PanelSource): PanelView {
  const still = (state: ControlState): SideView => ({ shown: state, was: state })
  const sideOf = (side: 'left' | 'right'): SideView => {
    if (trying) return still(trying)
    const now = present?.[side] ?? target ?? preamp.asDelivered
    if (comparedWith) return { shown: target ?? now, was: comparedWith }
    return target ? { shown: target, was: now } : still(now)
  }
  const left = sideOf('left')
  const right = sideOf('right')
  return { left, right, alike: statesEqual(left.shown, right.shown) && statesEqual(left.was, right.was) }
}

/** Both channels as drawn. */
export function shownPositions({ left, right }: PanelView): Positions {
  return { left: left.shown, right: right.shown }
}

/** True when both channels show the same, whatever they come from. */
export function showsAlike(view: PanelView): boolean {
  return !sidesDiffer(shownPositions(view))
}
