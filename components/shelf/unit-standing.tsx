import { FittedPanel } from '@/components/panel/fitted-panel'
import type { Positions, Preamp } from '@/lib/match'
import { parseState } from '@/lib/match/states'
import type { UnitView } from '@/lib/shelf/views'

/** Half of the drawing column: two units stand side by side there. */
const LIKELY_WIDTH = 440

/** How a unit is set now, drawn; in words where nobody knows. */
export function UnitStanding({ preamp, standing }: { preamp: Preamp | null; standing: UnitView['standing'] }) {
  if (!preamp) return <p className="note">This model is no longer in our list, so we cannot draw it.</p>
  const present = standing && positionsOf(preamp, standing)
  if (preamp.controls.length > 0 && !present) return <p className="note">We do not know how it stands.</p>
  return (
    <figure>
      <FittedPanel preamp={preamp} present={present} target={null} compact initialWidth={LIKELY_WIDTH} />
    </figure>
  )
}

function positionsOf(preamp: Preamp, texts: { left: string; right: string }): Positions | null {
  const [left, right] = [parseState(preamp, texts.left), parseState(preamp, texts.right)]
  return left && right && { left, right }
}
