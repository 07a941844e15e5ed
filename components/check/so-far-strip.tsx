import { Patterns, screenFill } from '@/components/plots/patterns'
import { usePlotId } from '@/components/plots/plot-id'
import type { SoFarView } from '@/lib/setups/views-so-far'
import { CAPACITANCE_ENDS } from './so-far'

/** Part of the way along the scale, 0 to 1, logarithmic as the bar in the panel. */
function along(picofarads: number): number {
  const { min, max } = CAPACITANCE_ENDS
  return Math.min(1, Math.max(0, Math.log(picofarads / min) / Math.log(max / min)))
}

const percent = (part: number) => `${(part * 100).toFixed(1)}%`

/** The same in a line, at the lower edge of a phone while the form is on the screen. `first` is what the page began with. */
export function SoFarStrip({ view, first }: { view: SoFarView; first: SoFarView }) {
  const id = usePlotId()
  const { capacitance } = view
  const was = first.capacitance
  const moved = capacitance && was && (capacitance.low !== was.low || capacitance.high !== was.high)
  return (
    <div className="sof">
      <div>
        <b>{view.short}</b>
        {capacitance && (
          <span>
            {capacitance.low} to {capacitance.high} pF{moved && `; it was ${was.low} to ${was.high}`}
          </span>
        )}
      </div>
      <a href="#so-far">Show</a>
      {capacitance && (
        <svg className="gb" aria-hidden="true" width="100%" height="10">
          <Patterns id={id} />
          <rect
            fill={screenFill(id)}
            x={percent(along(capacitance.low))}
            width={percent(along(capacitance.high) - along(capacitance.low))}
            height="10"
          />
        </svg>
      )}
    </div>
  )
}
