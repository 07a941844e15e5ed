import { scaleLinear, scaleLog } from 'd3-scale'
import type { ArmCurves } from './arm-facts'
import { ARM_AXIS, ARM_AXIS_PHONE, ARM_PLACES, armSentence, resonanceText } from './arm-facts'
import { DecibelGrid, DecibelUnit, FrequencyGrid, FrequencyLabels, multiples } from './axes'
import { Band, Curve } from './band'
import type { PlotForm } from './geometry'
import { curveSpots, drawnWidth, PHONE_BELOW, plotFrame, px } from './geometry'
import { clamp } from './numbers'
import { dotsFill, Patterns } from './patterns'
import { bestPlace, ledText } from './placement'
import { plotHeight } from './plot-heights'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'
import { spotNear } from './series'
import { Label, placeTag, Tag } from './tag'

const [Y_MIN, Y_MAX] = [-46, 14]
/** The tag stands at this height, above where a well damped arm peaks. */
const TAG_DECIBELS = 8

/** A bracket over the frame, with what is found there. */
function Bracket({ from, to, y, text }: { from: number; to: number; y: number; text: string }) {
  return (
    <>
      <path className="brk" d={`M${px(from)} ${y + 7}v-6H${px(to)}v6`} />
      <text className="zn" textAnchor="middle" x={px((from + to) / 2)} y={y - 5}>
        {text}
      </text>
    </>
  )
}

/**
 * Arm and rumble, 2 to 60 Hz. Dots: where warps and footfall are. Screen: the arm over the range of compliance.
 * Solid: with the rumble filter, the arm alone then dashed; or the arm itself where no filter is on.
 * The range of the resonance is reversed out.
 */
export function ArmPlot(props: ArmCurves & PlotForm) {
  const { hertz, low, nominal, high, filtered, resonance, filterOn, print = false } = props
  const id = usePlotId()
  const width = drawnWidth(props.width)
  const small = width < PHONE_BELOW
  const height = plotHeight('arm', width, print)
  const frame = plotFrame(width, height, { left: small ? 34 : 42, right: 1, top: small ? 44 : 46, bottom: small ? 28 : 46 })
  const { from, warpsEnd, goodFrom, goodTo, musicFrom, to } = ARM_PLACES
  const x = scaleLog([from, to], [frame.left, frame.right])
  const y = scaleLinear([Y_MAX, Y_MIN], [frame.top, frame.bottom])
  const spots = (values: number[] | null) => curveSpots(hertz, values, x, y, [Y_MIN, Y_MAX])
  const curves = { low: spots(low), nominal: spots(nominal), high: spots(high), filtered: filterOn ? spots(filtered) : [] }
  const withFilter = curves.filtered.some((spot) => spot !== null)
  const lines = Object.values(curves)

  const text = resonanceText(resonance)
  const peakX = clamp(x(Math.max(resonance.nominal, 0.1)), frame.left, frame.right)
  const tagY = y(TAG_DECIBELS)
  const tag = text ? resonanceTag(text) : null
  const named = withFilter ? spotNear(curves.filtered, x(5.2), frame) : null
  const filterLabel = named && filterName(named)

  function filterName(spot: readonly [number, number]) {
    const [nearest, ...others] = (small ? ['filter on'] : ['with the rumble filter on', 'filter on']).flatMap((words) => [
      ledText(words, spot, [-18, -18], true),
      ledText(words, spot, [-26, -8], true),
      ledText(words, spot, [18, 18], true),
      ledText(words, spot, [26, 34], true),
    ])
    return nearest ? bestPlace([nearest, ...others], { frame, taken: tag ? [tag.box] : [], curves: lines }) : null
  }

  /** Beside the band, on the right if it can be, as near as the curves leave place. */
  function resonanceTag(words: string) {
    const { width: wide } = placeTag(words, 0, 0).box
    const [fromRight, fromLeft] = [x(Math.max(resonance.high, 0.1)) + 24, x(Math.max(resonance.low, 0.1)) - 24 - wide]
    const steps = Array.from({ length: 16 }, (_, i) => i * 24)
    const inFrame = (place: number) => clamp(place, frame.left + 4, frame.right - wide - 4)
    const places = [...steps.map((step) => fromRight + step), ...steps.map((step) => fromLeft - step)].map(inFrame)
    return bestPlace([placeTag(words, inFrame(fromRight), tagY), ...places.map((place) => placeTag(words, place, tagY))], {
      frame,
      taken: [],
      curves: lines,
    })
  }

  const bracketY = frame.top - 11
  return (
    <PlotSvg kind="arm" width={width} height={height} label={armSentence(props)}>
      <Patterns id={id} print={print} clip={frame} />
      <rect className="pbg" x={frame.left} y={frame.top} width={frame.width} height={frame.height} />
      <rect fill={dotsFill(id)} x={frame.left} y={frame.top} width={px(x(warpsEnd) - frame.left)} height={frame.height} />
      <FrequencyGrid frame={frame} x={x} from={from} to={to} />
      <DecibelGrid frame={frame} y={y} at={multiples(Y_MIN, Y_MAX, 10)} labelEvery={print ? 20 : 10} />
      <FrequencyLabels frame={frame} x={x} at={small ? ARM_AXIS_PHONE : ARM_AXIS} title={!small} />
      <path
        className="lim"
        d={`M${px(x(goodFrom))} ${frame.top}V${frame.bottom}M${px(x(goodTo))} ${frame.top}V${frame.bottom}`}
      />
      <Band id={id} low={curves.low} high={curves.high} />
      <Curve id={id} spots={curves.nominal} kind={withFilter ? 'c-ref' : 'c-mid'} />
      <Curve id={id} spots={curves.filtered} kind="c-mid" />
      <Bracket from={frame.left} to={x(warpsEnd)} y={bracketY} text={small ? 'Warps' : 'Warps and footfall'} />
      <Bracket from={x(goodFrom)} to={x(goodTo)} y={bracketY} text={small ? 'Good' : 'Good place'} />
      <Bracket from={x(musicFrom)} to={frame.right} y={bracketY} text={small ? 'Music' : 'Music from here up'} />
      {filterLabel && <Label label={filterLabel} />}
      {tag && (
        <>
          <path
            className="ldr"
            d={
              tag.x > peakX
                ? `M${px(tag.x)} ${px(tagY)}H${px(peakX + 6)}`
                : `M${px(tag.x + tag.box.width)} ${px(tagY)}H${px(peakX - 6)}`
            }
          />
          <Tag tag={tag} reversed />
        </>
      )}
      <DecibelUnit frame={frame} y={frame.top - 16} />
    </PlotSvg>
  )
}
