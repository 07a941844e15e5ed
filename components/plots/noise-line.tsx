import { scaleLinear } from 'd3-scale'
import type { Frame, PlotForm } from './geometry'
import { arrowHead, drawnWidth, PHONE_BELOW, plotFrame, px } from './geometry'
import type { Mark } from './noise-words'
import { namesOver } from './noise-words'
import type { NoiseLevels } from './noise-facts'
import { noiseSentence, underGroove } from './noise-facts'
import { finite, fixed, signed } from './numbers'
import { multiples } from './axes'
import { dotsFill, Patterns, screenFill } from './patterns'
import { bestPlace } from './placement'
import { plotHeight } from './plot-heights'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'
import { Label, placeTag, Tag } from './tag'

const HALF = 17
/** Decibels under usual music at the loud and the quiet end; wider when a value lies beyond. */
const [LOUD_END, QUIET_END] = [40, 92]

/**
 * Noise in one bar: decibels under usual music, loud left, quiet right, dots from the noise on.
 * A range is solid at worst and screened up to its best. The gap to the groove is an arrow, or reversed out when small.
 */
export function NoiseLine(props: NoiseLevels & PlotForm) {
  const { groove, yours, coil, print = false } = props
  const id = usePlotId()
  const width = drawnWidth(props.width)
  const small = width < PHONE_BELOW
  const height = plotHeight('noise', width, print)
  const frame = plotFrame(width, height, { left: small ? 8 : 10, right: small ? 10 : 14, top: 0, bottom: 0 })
  const middle = small ? 70 : 58
  const [top, bottom] = [middle - HALF, middle + HALF]

  const known = [groove, yours.low, yours.high, coil].filter((value) => Number.isFinite(value) && Math.abs(value) < 300)
  const from = Math.min(LOUD_END, ...known.map((value) => Math.floor((value - 2) / 10) * 10))
  const to = Math.max(QUIET_END, ...known.map((value) => Math.ceil(value) + 2))
  const scale = scaleLinear([from, to], [frame.left, frame.right]).clamp(true)
  const at = (value: number) => (finite(value) === null ? null : scale(value))
  const [grooveX, worstX, bestX, coilX] = [at(groove), at(yours.low), at(yours.high), at(coil)]

  const marks: Mark[] = []
  if (grooveX !== null) marks.push({ x: grooveX, long: 'noise of the groove', short: 'groove', bold: false })
  if (worstX !== null) {
    const range = bestX !== null && bestX - worstX > 1
    marks.push({ x: worstX, long: range ? 'yours, at worst' : 'your preamp and cartridge', short: 'yours', bold: true })
  }
  if (coilX !== null) marks.push({ x: coilX, long: 'the coil alone', short: 'coil', bold: false })
  const labels = namesOver(marks, { small, frame })
  const step = small || to - from > 100 ? 20 : 10

  return (
    <PlotSvg kind="noise" width={width} height={height} label={noiseSentence(props)}>
      <Patterns id={id} print={print} />
      <rect className="pbg" x={frame.left} y={top} width={frame.width} height={HALF * 2} />
      {worstX !== null && (
        <rect fill={dotsFill(id)} x={px(bestX ?? worstX)} y={top} width={px(frame.right - (bestX ?? worstX))} height={HALF * 2} />
      )}
      {worstX !== null && bestX !== null && bestX > worstX && (
        <>
          <rect fill={screenFill(id)} x={px(worstX)} y={top} width={px(bestX - worstX)} height={HALF * 2} />
          <path className="edge" d={`M${px(bestX)} ${top}v${HALF * 2}`} />
        </>
      )}
      {multiples(from, to, 10).map((value) => (
        <path className="g2" key={value} d={`M${px(scale(value))} ${top}v${HALF * 2}`} />
      ))}
      {multiples(from, to, step).map((value, i) => (
        <text className="tk" key={value} textAnchor={i === 0 ? 'start' : 'middle'} x={px(scale(value))} y={bottom + 19}>
          {signed(-value)}
          {i === 0 && ' dB'}
        </text>
      ))}
      <path className="dim" d={`M${frame.left} ${top}H${frame.right}M${frame.left} ${bottom}H${frame.right}`} />
      {grooveX !== null && <path className="gro" d={`M${px(grooveX)} ${top - 5}v${HALF * 2 + 10}`} />}
      {coilX !== null && <path className="g0" d={`M${px(coilX)} ${top}v${HALF * 2}`} />}
      {worstX !== null && <path className="floor" d={`M${px(worstX)} ${top - 5}v${HALF * 2 + 10}`} />}
      {labels.map((label) => (
        <Label label={label} key={label.text} />
      ))}
      {grooveX !== null && worstX !== null && (
        <Gap from={grooveX} to={worstX} decibels={underGroove(props)} y={middle} frame={frame} />
      )}
    </PlotSvg>
  )
}

/** How far under the groove: an arrow with its figure, or reversed out beside the two marks where they are close. */
function Gap({ from, to, decibels, y, frame }: { from: number; to: number; decibels: number; y: number; frame: Frame }) {
  if (to - from > 70) {
    const text = `${fixed(decibels, 0)} dB`
    const { width } = placeTag(text, 0, 0).box
    return (
      <>
        <path className="dim" d={`M${px(from)} ${y}H${px(to)}${arrowHead(from, y, -1, 0)}${arrowHead(to, y, 1, 0)}`} />
        <Tag tag={placeTag(text, (from + to - width) / 2, y)} />
      </>
    )
  }
  const louder = Number(decibels.toFixed(1)) < 0
  const text = `${louder ? 'louder by ' : ''}${fixed(Math.abs(decibels))} dB`
  const [left, right] = [Math.min(from, to), Math.max(from, to)]
  const { width } = placeTag(text, 0, 0).box
  if (right - left > width + 40) {
    return (
      <>
        <path className="dim" d={`M${px(left)} ${y}H${px(right)}${arrowHead(left, y, -1, 0)}${arrowHead(right, y, 1, 0)}`} />
        <Tag tag={placeTag(text, (left + right - width) / 2, y)} reversed />
      </>
    )
  }
  const tag = bestPlace([placeTag(text, left - 28 - width, y), placeTag(text, right + 28, y)], {
    frame: { ...frame, top: y - 20, height: 40, bottom: y + 20 },
    taken: [],
  })
  return (
    <>
      <path
        className="dim"
        d={`M${px(left - 24)} ${y}H${px(left)}${arrowHead(left, y, 1, 0)}M${px(right + 24)} ${y}H${px(right)}${arrowHead(right, y, -1, 0)}`}
      />
      <Tag tag={tag} reversed />
    </>
  )
}
