import { scaleLinear, scaleLog } from 'd3-scale'
import { px } from './geometry'
import { plainNumber } from './numbers'
import { Patterns, screenFill } from './patterns'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'
import { textWidth } from './text-width'

const HEIGHT = 24
const LABEL = 13.5

/**
 * Where a value sits between two ends: a tick when known, the screen when a range. Always beside the value in words.
 * All values are display numbers in `unit`. The axis is logarithmic unless `log` is false or an end is not above 0.
 */
export function RangeBar({
  min,
  max,
  low,
  high,
  unit,
  log = true,
  width = 290,
  print = false,
}: {
  min: number
  max: number
  low: number
  high: number
  unit: string
  log?: boolean
  width?: number
  print?: boolean
}) {
  const id = usePlotId()
  const [start, end] = [plainNumber(min), `${plainNumber(max)} ${unit}`]
  const left = Math.max(46, textWidth(start, { size: LABEL }) + 10)
  const right = width - Math.max(52, textWidth(end, { size: LABEL }) + 10)
  const scale = log && min > 0 && max > min ? scaleLog([min, max], [left, right]) : scaleLinear([min, max], [left, right])
  const at = (value: number) => px(scale.clamp(true)(log ? Math.max(value, min) : value))
  const drawn = Number.isFinite(low) && Number.isFinite(high) && Number.isFinite(at(low)) && Number.isFinite(at(high))
  const [from, to] = drawn ? [at(Math.min(low, high)), at(Math.max(low, high))] : [left, left]
  const value = low === high ? `${plainNumber(low)} ${unit}` : `${plainNumber(low)} to ${plainNumber(high)} ${unit}`
  return (
    <PlotSvg
      kind="range"
      width={width}
      height={HEIGHT}
      label={drawn ? `${value}, on a scale from ${start} to ${end}` : `Not known, on a scale from ${start} to ${end}`}
    >
      <Patterns id={id} print={print} />
      <text className="tk sm" textAnchor="end" x={px(left - 8)} y={17}>
        {start}
      </text>
      <text className="tk sm" x={px(right + 8)} y={17}>
        {end}
      </text>
      <path className="g1" d={`M${px(left)} 12H${px(right)}M${px(left)} 7v10M${px(right)} 7v10`} />
      {drawn && to - from < 1 && <path className="c-mid" d={`M${from} 3v18`} />}
      {drawn && to - from >= 1 && (
        <>
          <rect fill={screenFill(id)} x={from} y={5} width={px(to - from)} height={14} />
          <path className="edge" d={`M${from} 4v16M${to} 4v16`} />
        </>
      )}
    </PlotSvg>
  )
}
