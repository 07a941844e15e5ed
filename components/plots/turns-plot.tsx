import { scaleLinear, scaleLog } from 'd3-scale'
import type { Mark } from '@/components/ui/verdict-mark'
import { VerdictMark } from '@/components/ui/verdict-mark'
import type { PlotForm } from './geometry'
import { drawnWidth, PHONE_BELOW, px } from './geometry'
import { clamp, plainNumber } from './numbers'
import { Patterns, screenFill } from './patterns'
import { overlap, padded, textBox } from './placement'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'
import { textWidth, wrapText } from './text-width'
import type { Turns, TurnStretch, TurnVerdict } from './turns-facts'
import { joinedStretches, stretchText, TURN_WORDS, turnsSentence, whereabouts } from './turns-facts'

const HEIGHT = 150
const AXIS = 30
const TITLE_SIZE = 17
const LINE = 18

const MARKS: Record<TurnVerdict, Mark> = {
  suits: 'suits',
  changes: 'suits-with-changes',
  limit: 'suits-with-a-limit',
  no: 'does-not-suit',
  unsure: 'cannot-say',
}

/** A mark is 1 em wide, or, where a browser gives no such size to an inner drawing, as wide as what holds it. */
function PlacedMark({ verdict, x, y, size }: { verdict: TurnVerdict; x: number; y: number; size: number }) {
  return (
    <svg x={px(x)} y={y} width={size} height={size} fontSize={size}>
      <VerdictMark mark={MARKS[verdict]} />
    </svg>
  )
}

type Axis = (value: number) => number
type Drawn = { turns: Turns; stretches: TurnStretch[]; id: string; width: number; print: boolean }

const axisOver = ({ min, max }: Turns, from: number, to: number): Axis => {
  const scale = min > 0 && max > min ? scaleLog([min, max], [from, to]) : scaleLinear([min, max], [from, to])
  return (value) => scale.clamp(true)(min > 0 ? Math.max(value, min) : value)
}

/**
 * The number to find next: the one unknown, cut where our advice changes. Screen: where it may be.
 * Lying where each stretch holds its words, else standing, with a row for each stretch.
 */
export function TurnsPlot(props: Turns & PlotForm) {
  const { print = false } = props
  const id = usePlotId()
  const width = drawnWidth(props.width)
  const stretches = joinedStretches(props)
  const x = axisOver(props, 2, width - 2)
  const drawn = { turns: { ...props, ...whereabouts(props) }, stretches, id, width, print }
  const holds = (stretch: TurnStretch) => {
    const space = x(stretch.to) - x(stretch.from) - 16
    const title = 28 + textWidth(TURN_WORDS[stretch.verdict], { size: TITLE_SIZE, bold: true })
    const lines = wrapText(stretch.text, space)
    return title <= space && lines.length <= 2 && lines.every((line) => textWidth(line) <= space)
  }
  const lying = width >= PHONE_BELOW && stretches.every(holds)
  return lying ? <Lying {...drawn} x={x} /> : <Standing {...drawn} />
}

function Lying({ turns, stretches, id, width, print, x }: Drawn & { x: Axis }) {
  const { unit, max, low, high } = turns
  const [left, right] = [2, width - 2]
  const ticks = labelledTicks(turns, x, left, right)
  return (
    <PlotSvg kind="turns" width={width} height={HEIGHT} label={turnsSentence(turns)}>
      <Patterns id={id} print={print} />
      {ticks.map(({ value, anchor }) => (
        <g key={value}>
          <path className="g1" d={`M${px(x(value))} 22v8`} />
          <text className="tk" textAnchor={anchor} x={px(x(value))} y={15}>
            {plainNumber(value)}
            {value === max && ` ${unit}`}
          </text>
        </g>
      ))}
      <path className="g0" d={`M${left} ${AXIS}H${right}`} />
      {x(high) - x(low) < 1 ? (
        <path className="c-mid" d={`M${px(x(low))} 34v26`} />
      ) : (
        <>
          <rect fill={screenFill(id)} x={px(x(low))} y={34} width={px(x(high) - x(low))} height={26} />
          <path className="edge" d={`M${px(x(low))} 34v26M${px(x(high))} 34v26`} />
        </>
      )}
      {stretches.map((stretch, i) => {
        const start = x(stretch.from)
        return (
          <g key={stretch.from}>
            <path className={i > 0 ? 'ceil' : 'g1'} d={`M${px(start)} ${AXIS}V${HEIGHT - 4}`} />
            <PlacedMark verdict={stretch.verdict} x={start + 12} y={75} size={20} />
            <text className="an b lg17" x={px(start + 40)} y={91}>
              {TURN_WORDS[stretch.verdict]}
            </text>
            {wrapText(stretch.text, x(stretch.to) - start - 16).map((line, k) => (
              <text className="tk" key={line} x={px(start + 12)} y={116 + k * LINE}>
                {line}
              </text>
            ))}
          </g>
        )
      })}
      <path className="g1" d={`M${right} ${AXIS}V${HEIGHT - 4}`} />
    </PlotSvg>
  )
}

/** Ticks whose figures do not touch; both ends come first, turned inwards. */
function labelledTicks({ ticks, min, max, unit }: Turns, x: Axis, left: number, right: number) {
  const wanted = [min, max, ...ticks].filter((value, i, all) => value >= min && value <= max && all.indexOf(value) === i)
  const placed: { value: number; anchor: 'start' | 'middle' | 'end'; box: ReturnType<typeof textBox> }[] = []
  for (const value of wanted) {
    const anchor = value === min || x(value) - left < 14 ? 'start' : value === max || right - x(value) < 14 ? 'end' : 'middle'
    const box = textBox(value === max ? `${plainNumber(value)} ${unit}` : plainNumber(value), x(value), 15, anchor, false)
    if (placed.every((other) => overlap(padded(other.box, 8), box) === 0)) placed.push({ value, anchor, box })
  }
  return placed
}

function Standing({ turns, stretches, id, width, print }: Drawn) {
  const names = stretches.map((stretch) => stretchText(stretch, turns))
  const column = clamp(Math.max(...names.map((name) => textWidth(name, { bold: true }))) + 46, 138, width * 0.48)
  const space = width - column - 26
  const lines = stretches.map(({ text }) => wrapText(text, space))
  const heights = lines.map((words) => Math.max(78, 42 + words.length * LINE))
  const tops = heights.map((_, i) => 4 + heights.slice(0, i).reduce((sum, height) => sum + height, 0))
  const height = 8 + heights.reduce((sum, one) => sum + one, 0)
  // Each row holds its own piece of the axis, so the rows can be of like height.
  const at = (value: number) => {
    const i = Math.max(0, stretches.findIndex(({ to }) => value <= to))
    const stretch = stretches[i] ?? stretches.at(-1)
    const [top, tall] = [tops[i] ?? 4, heights[i] ?? 0]
    return stretch ? axisOver({ ...turns, min: stretch.from, max: stretch.to }, top, top + tall)(value) : top
  }
  const last = stretches.at(-1)
  const [from, to] = [at(turns.low), last && turns.high >= last.to ? height - 4 : at(turns.high)]
  return (
    <PlotSvg kind="turns" width={width} height={height} label={turnsSentence(turns)}>
      <Patterns id={id} print={print} />
      <path className="g1" d={`M1 4V${height - 4}M22 4V${height - 4}`} />
      {to - from < 1 ? (
        <path className="c-mid" d={`M1 ${px(from)}h21`} />
      ) : (
        <>
          <rect fill={screenFill(id)} x={1} y={px(from)} width={21} height={px(to - from)} />
          <path className="edge" d={`M1 ${px(from)}h21M1 ${px(to)}h21`} />
        </>
      )}
      {stretches.map((stretch, i) => {
        const top = tops[i] ?? 4
        return (
          <g key={stretch.from}>
            <path className="g1" d={`M0 ${top}H${width}`} />
            {i > 0 && <path className="ceil" d={`M0 ${top}H26`} />}
            <text className="mg" x={34} y={top + 24}>
              {names[i]}
            </text>
            <PlacedMark verdict={stretch.verdict} x={column} y={top + 10} size={18} />
            <text className="an b" x={px(column + 26)} y={top + 24}>
              {TURN_WORDS[stretch.verdict]}
            </text>
            {(lines[i] ?? []).map((line, k) => (
              <text className="tk" key={line} x={px(column + 26)} y={top + 44 + k * LINE}>
                {line}
              </text>
            ))}
          </g>
        )
      })}
      <path className="g1" d={`M0 ${height - 4}H${width}`} />
    </PlotSvg>
  )
}
