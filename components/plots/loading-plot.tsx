import { scaleLinear, scaleLog } from 'd3-scale'
import { DecibelGrid, DecibelUnit, FrequencyGrid, FrequencyLabels, multiples } from './axes'
import { Band, Curve } from './band'
import type { Frame, PlotForm, Spot } from './geometry'
import { curveSpots, drawnWidth, PHONE_BELOW, plotFrame, px } from './geometry'
import type { LoadingCurves } from './loading-facts'
import { HEARING_ENDS, LOADING_AXIS, LOADING_AXIS_PHONE, loadingSentence } from './loading-facts'
import { Patterns } from './patterns'
import type { PlacedText } from './placement'
import { bestPlace, ledText } from './placement'
import { plotHeight } from './plot-heights'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'
import { extreme, spotNear, valueAt } from './series'
import { Label } from './tag'

export interface LoadingPlotData extends LoadingCurves {
  /** Names the middle line, or the line itself: "after the two moves". */
  label?: string
  /** Decibels at the frame's edges; −6 and +6 unless said. */
  yMin?: number
  yMax?: number
  /** Lower in a side panel. */
  size?: 'sheet' | 'panel'
}

/** A step that gives five lines or so. */
const stepFor = (span: number) => [3, 6, 10, 20].find((step) => span / step <= 6) ?? 50

/**
 * What load and capacitance do to the treble: decibels relative to 1 kHz against frequency.
 * Known: a line. Range: screen and line. Early: screen only. Compare: a dashed line with its name.
 */
export function LoadingPlot(props: LoadingPlotData & PlotForm) {
  const { hertz, low, nominal, high, compare, label = '', yMin = -6, yMax = 6, size = 'sheet', print = false } = props
  const id = usePlotId()
  const width = drawnWidth(props.width)
  const small = width < PHONE_BELOW
  const height = plotHeight(size === 'panel' ? 'loading-panel' : 'loading', width, print)
  const frame = plotFrame(width, height, { left: small ? 34 : 42, right: 1, top: 26, bottom: small ? 26 : 44 })
  const [from, to] = [small ? 200 : 100, 40_000]
  const x = scaleLog([from, to], [frame.left, frame.right])
  const y = scaleLinear([yMax, yMin], [frame.top, frame.bottom])
  const spots = (values: number[] | null) => curveSpots(hertz, values, x, y, [yMin, yMax])
  const curves = { low: spots(low), nominal: spots(nominal), high: spots(high), compare: spots(compare?.decibels ?? null) }

  const labels: PlacedText[] = []
  const around = () => ({
    frame,
    taken: labels.map(({ box }) => box),
    curves: [curves.low, curves.nominal, curves.high, curves.compare],
  })
  const compared = compare && flank(hertz, compare.decibels, x, curves.compare, frame)
  if (compare && compared) {
    labels.push(
      bestPlace(
        [
          ledText(compare.label, compared, [small ? -16 : -26, -12]),
          ledText(compare.label, compared, [-26, -30]),
          ledText(compare.label, compared, [-26, 26]),
          ledText(compare.label, compared, [20, -22]),
        ],
        around(),
      ),
    )
  }
  const named = label ? underside(hertz, props, x, y, curves, frame) : null
  if (named) {
    const reach = small ? -26 : -44
    labels.push(
      bestPlace(
        [
          ledText(label, named, [reach, 34], true),
          ledText(label, named, [reach, 54], true),
          ledText(label, named, [reach * 2, 34], true),
          ledText(label, named, [reach, -34], true),
          ledText(label, named, [reach, 18], true),
          ledText(label, named, [reach, -18], true),
        ],
        around(),
      ),
    )
  }

  return (
    <PlotSvg kind="loading" width={width} height={height} label={loadingSentence(props)}>
      <Patterns id={id} print={print} clip={frame} />
      <rect className="pbg" x={frame.left} y={frame.top} width={frame.width} height={frame.height} />
      <FrequencyGrid frame={frame} x={x} from={from} to={to} />
      <DecibelGrid frame={frame} y={y} at={multiples(yMin, yMax, stepFor(yMax - yMin))} />
      <FrequencyLabels frame={frame} x={x} at={small ? LOADING_AXIS_PHONE : LOADING_AXIS} title={!small} />
      <path className="lim" d={`M${px(x(HEARING_ENDS))} ${frame.top}V${frame.bottom}`} />
      <Band id={id} low={curves.low} high={curves.high} />
      <Curve id={id} spots={curves.nominal} kind="c-mid" />
      <Curve id={id} spots={curves.compare} kind="c-ref" />
      {labels.map((placed) => (
        <Label label={placed} key={placed.text} />
      ))}
      <DecibelUnit frame={frame} y={13} />
    </PlotSvg>
  )
}

/** Where a leader meets the compared curve: on the way up to its peak, or in the open where it has none. */
function flank(hertz: number[], decibels: number[], x: (hertz: number) => number, spots: Spot[], frame: Frame) {
  const peak = extreme(hertz, decibels, 1000, HEARING_ENDS)
  const rising = peak && peak.value > 0.3 ? hertz.find((f, i) => f >= 1000 && (decibels[i] ?? 0) > peak.value * 0.72) : null
  return spotNear(spots, x(rising ?? 5000), frame)
}

/** Where the leader of the main label meets the drawing: in the lower half of the screen, or on the line. */
function underside(
  hertz: number[],
  { low, nominal, high }: LoadingCurves,
  x: (hertz: number) => number,
  y: (decibels: number) => number,
  curves: { nominal: Spot[]; low: Spot[] },
  frame: Frame,
) {
  const at = 13_500
  const floor = valueAt(hertz, low, at)
  const middle = valueAt(hertz, nominal ?? high, at)
  if (floor !== null && middle !== null) {
    const height = y((floor + middle) / 2)
    if (height > frame.top && height < frame.bottom) return [x(at), height] as const
  }
  return spotNear(nominal ? curves.nominal : curves.low, x(at), frame)
}
