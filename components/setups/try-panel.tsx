'use client'

import { FittedPanel } from '../panel/fitted-panel'
import type { ControlState, Positions } from '@/lib/match/controls'
import { TryStrip } from './try-strip'
import { useWhatIf } from './what-if'

interface Props {
  /** How the unit stands; null draws nothing as a move. */
  present: Positions | null
  target: ControlState
}

/** The drawn panel. Every switch can be pressed to try it out; then no mark asks for a move. */
export function TryPanel({ present, target }: Props) {
  const { inputs, trying, press } = useWhatIf()
  const movable = inputs.preamp.controls.length > 0
  return (
    <>
      <TryStrip />
      <FittedPanel preamp={inputs.preamp} present={present} target={target} trying={trying} onFlip={movable ? press : undefined} />
    </>
  )
}
