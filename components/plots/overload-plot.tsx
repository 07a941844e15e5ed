import { scaleLinear, scaleLog } from 'd3-scale'
import { DecibelGrid, DecibelUnit, FrequencyGrid, FrequencyLabels, multiples } from './axes'
import { Band, Curve } from './band'
import type { Frame, PlotForm, Spot } from './geometry'
import { curveSpots, drawnWidth, PHONE_BELOW, plotFrame, px, uprightDimension } from './geometry'
import { clamp } from './numbers'
import type { OverloadCurves } from './overload-facts'
import { overloadSentence, ROOM_AXIS, ROOM_AXIS_PHONE, worstText } from './overload-facts'
import { hatchFill, Patterns } from './patterns'
import type { Box, PlacedText } from './placement'
import { bestPlace, ledText, placeText } from './placement'
import { plotHeight } from './plot-heights'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'
import { spotNear } from './series'
import type { PlacedTag } from './tag'
import { Label, placeTag, Tag } from './tag'

/** −8 to +40 dB, wider where the room is less or all of it is more. */
function reach({ hertz, loud, extreme, worst }: OverloadCurves): [number, number] {
  const inBand = (values: number[]) => values.filter((v, i) => Number.isFinite(v) && (hertz[i] ?? 0) >= 20 && (hertz[i] ?? 0) <= 20_000)
  const lows = [...inBand(loud.low), ...inBand(loud.nominal), worst.decibels].filter(Number.isFinite)
  const least = clamp(Math.min(40, ...lows), -200, 200)
  const extremeLeast = clamp(Math.min(40, ...inBand(extreme.low)), -200, 200)
  const yMin = Math.min(least < 0 ? -14 : -8, Math.floor(Math.min(least, extremeLeast) - 4))
  const most = lows.length > 0 ? clamp(Math.min(...lows), -200, 200) : 0
  return [yMin, most > 28 ? Math.ceil((most + 14) / 10) * 10 : 40]
}

/**
 * Room at each pitch: how far loud records stay under the limit, 20 Hz to 20 kHz. Solid: middle values.
 * Screen: over what is not known. Dashed: extreme records at worst. Hatch under 0. The least room is reversed out.
 */
export function OverloadPlot(props: OverloadCurves & PlotForm) {
  const { hertz, loud, extreme, worst, print = false } = props
  const id = usePlotId()
  const width = drawnWidth(props.width)
  const small = width < PHONE_BELOW
  const height = plotHeight('room', width, print)
  const frame = plotFrame(width, height, { left: small ? 34 : 42, right: 1, top: 26, bottom: small ? 28 : 46 })
  const [yMin, yMax] = reach(props)
  const x = scaleLog([20, 20_000], [frame.left, frame.right])
  const y = scaleLinear([yMax, yMin], [frame.top, frame.bottom])
  const spots = (values: number[]) => curveSpots(hertz, values, x, y, [yMin, yMax])
  const curves = { low: spots(loud.low), nominal: spots(loud.nominal), high: spots(loud.high), extreme: spots(extreme.low) }
  const step = yMax - yMin > 70 ? 20 : 10

  const text = worstText(worst)
  const at = text
    ? ([clamp(x(worst.hertz), frame.left, frame.right), clamp(y(worst.decibels), frame.top, frame.bottom)] as const)
    : null
  const { tag, labels } = words(text, at, curves, { frame, small, zero: y(0) })

  return (
    <PlotSvg kind="overload" width={width} height={height} label={overloadSentence(props)}>
      <Patterns id={id} print={print} clip={frame} />
      <rect className="pbg" x={frame.left} y={frame.top} width={frame.width} height={frame.height} />
      <FrequencyGrid frame={frame} x={x} from={20} to={20_000} />
      <DecibelGrid frame={frame} y={y} at={multiples(yMin, yMax, step)} />
      <FrequencyLabels frame={frame} x={x} at={small ? ROOM_AXIS_PHONE : ROOM_AXIS} title={!small} />
      <rect className="pbg" x={frame.left} y={px(y(0))} width={frame.width} height={px(frame.bottom - y(0))} />
      <rect fill={hatchFill(id)} x={frame.left} y={px(y(0))} width={frame.width} height={px(frame.bottom - y(0))} />
      <path className="ceil" d={`M${frame.left} ${px(y(0))}H${frame.right}`} />
      <Band id={id} low={curves.low} high={curves.high} />
      <Curve id={id} spots={curves.extreme} kind="c-ref" />
      <Curve id={id} spots={curves.nominal} kind="c-mid" />
      {at && <path className="dim" d={uprightDimension(at[0], at[1], y(0))} />}
      {labels.map((label) => (
        <Label label={label} key={label.text} />
      ))}
      {tag && <Tag tag={tag} reversed />}
      <DecibelUnit frame={frame} y={13} />
    </PlotSvg>
  )
}

/** The tag of the worst place first, then what the ground and the two curves are, each where it is still free. */
function words(
  text: string | null,
  at: readonly [number, number] | null,
  curves: Record<'low' | 'nominal' | 'high' | 'extreme', Spot[]>,
  { frame, small, zero }: { frame: Frame; small: boolean; zero: number },
): { tag: PlacedTag | null; labels: PlacedText[] } {
  const lines = Object.values(curves)
  const taken: Box[] = []
  const inset = small ? 7 : 12
  const about = () => ({ frame, taken, curves: lines })
  const take = <T extends { box: Box }>(placed: T): T => {
    taken.push(placed.box)
    return placed
  }
  const labels: PlacedText[] = []

  const hatchHeight = frame.bottom - zero
  if (hatchHeight > 16) {
    const high = zero + Math.min(18, hatchHeight / 2 + 5)
    const long = small ? 'Distorts' : 'Distorts below this line'
    labels.push(
      take(
        bestPlace(
          [
            placeText(long, frame.left + inset, high),
            placeText(long, frame.left + frame.width * 0.3, high),
            placeText(long, frame.right - inset, high, 'end'),
            placeText('Distorts', frame.left + inset, frame.bottom - 8),
            placeText('Distorts', frame.right - inset, frame.bottom - 8, 'end'),
          ],
          about(),
        ),
      ),
    )
  }

  let tag: PlacedTag | null = null
  if (text && at) {
    const [wx, wy] = at
    // The arrow takes the height between the worst place and 0, or a tail beyond both.
    taken.push({ x: wx - 4, y: Math.min(wy, zero) - 20, width: 8, height: Math.abs(wy - zero) + 40 })
    const { width } = placeTag(text, 0, 0).box
    const right = Math.min(wx + 9, frame.right - width - 4)
    const left = Math.max(frame.left + 4, wx - 9 - width)
    const middle = (wy + zero) / 2
    const heights = [0, 1, -1, 2, -2, 3, -3, 4, -4, 5, -5, 6, -6].map((step) => middle + step * 12)
    const [nearest, ...others] = heights.flatMap((height) => [placeTag(text, right, height), placeTag(text, left, height)])
    tag = nearest ? take(bestPlace([nearest, ...others], about())) : null
  }

  const beside = (spots: Spot[], text: string, bold: boolean, parts: number[], offsets: [number, number][]) => {
    const seen = parts.map((part) => spotNear(spots, frame.left + frame.width * part, frame)).filter((spot) => spot !== null)
    const [first, ...rest] = seen.flatMap((spot) => offsets.map((offset) => ledText(text, spot, offset, bold)))
    if (first) labels.push(take(bestPlace([first, ...rest], about())))
  }
  beside(curves.nominal, 'loud records', true, [small ? 0.14 : 0.16, 0.26, 0.36], [[20, -26], [16, -12], [20, 30], [20, -44], [20, 48]])
  const below: [number, number][] = [[16, 20], [-16, 20], [16, 36], [-16, 36]]
  const above: [number, number][] = [[-20, -24], [-30, -44], [16, -30]]
  beside(curves.extreme, small ? 'extreme' : 'extreme records', false, [0.75, 0.68, 0.82], [...below, ...above])
  return { tag, labels }
}
