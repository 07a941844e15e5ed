import { DecibelGrid, DecibelUnit } from './axes'
import type { Frame, PlotForm } from './geometry'
import { drawnWidth, PHONE_BELOW, plotFrame, px } from './geometry'
import type { LevelPicture } from './level-facts'
import { drawable, grooveFloor, levelSentence, tightest } from './level-facts'
import { levelScale } from './level-scale'
import type { Column } from './level-stage'
import { dimensions, FloorGround, LimitGround, LimitHatch, LimitLine } from './level-stage'
import { groundLabels, titleLines, valueText } from './level-words'
import { Patterns, screenFill } from './patterns'
import { plotHeight } from './plot-heights'
import { usePlotId } from './plot-id'
import { PlotSvg } from './plot-svg'
import { Label, Tag } from './tag'

const WAVE = 18

/** A wavy line across: here something was cut out. */
function wave(frame: Frame, y: number): string {
  const count = Math.max(1, Math.round(frame.width / WAVE))
  const length = frame.width / count
  const waves = Array.from({ length: count }, (_, i) => `q${px(length / 4)} ${i % 2 ? -4 : 4} ${px(length / 2)} 0t${px(length / 2)} 0`)
  return `M${frame.left} ${px(y)}${waves.join('')}`
}

/**
 * Music between distortion above and noise below, at each place from the stylus on. 0 dB is the cartridge's nominal
 * output, one straight line across. Screen: where records peak, and how far a limit or a noise may lie.
 * Hatch: distortion. Dots: noise. Arrows: room, the tightest reversed out.
 */
export function LevelDiagram(props: LevelPicture & PlotForm) {
  const { peaks, print = false } = props
  const stages = props.stages.map(drawable)
  const picture = { stages, peaks }
  const id = usePlotId()
  const width = drawnWidth(props.width)
  const small = width < PHONE_BELOW
  const height = plotHeight('level', width, print)
  const frame = plotFrame(width, height, { left: small ? 38 : 48, right: 1, top: small ? 42 : 36, bottom: small ? 48 : 52 })
  const columnWidth = frame.width / Math.max(1, stages.length)
  const columns: Column[] = stages.map((stage, i) => ({ stage, x: frame.left + columnWidth * i, width: columnWidth }))
  const scale = levelScale(picture, frame, small ? 14 : 16)
  const groove = grooveFloor(stages)
  const isTightest = tightest(picture)?.isTightest ?? (() => false)
  const figures = columns.flatMap((column) => dimensions(column, { peaks, groove, isTightest, scale, frame, small }))
  const labels = groundLabels(picture, columns, { frame, scale, small, taken: figures.flatMap(({ taken }) => taken) })
  const [ordinary, loud] = [scale.y(peaks.ordinary), scale.y(peaks.loud)]
  const inset = small ? 7 : 12
  const grounds = { id, scale, frame }

  return (
    <PlotSvg kind="level" width={width} height={height} label={levelSentence(picture)}>
      <Patterns id={id} print={print} />
      <rect className="pbg" x={frame.left} y={frame.top} width={frame.width} height={frame.height} />
      {columns.map((column) => (
        <FloorGround key={column.stage.key} column={column} {...grounds} />
      ))}
      <DecibelGrid frame={frame} y={scale.y} at={scale.lines} labelEvery={20} />
      {columns.map((column, i) => (
        <Words key={column.stage.key} column={column} first={i === 0} frame={frame} small={small} height={height} inset={inset} />
      ))}
      {groove !== null && columns.length > 1 && (
        <path className="gho" d={`M${px(frame.left + columnWidth)} ${px(scale.y(groove))}H${frame.right}`} />
      )}
      {columns.map((column) => (
        <LimitGround key={column.stage.key} column={column} {...grounds} />
      ))}
      <rect fill={screenFill(id)} x={frame.left} y={px(loud)} width={frame.width} height={px(Math.max(0, ordinary - loud))} />
      <path className="edge" d={`M${frame.left} ${px(loud)}h${frame.width}M${frame.left} ${px(ordinary)}h${frame.width}`} />
      {columns.map((column) => (
        <LimitHatch key={column.stage.key} column={column} {...grounds} />
      ))}
      {scale.cut && (
        <>
          <rect
            className="br-f"
            x={frame.left - 1}
            y={px(scale.cut.top + 2)}
            width={frame.width + 2}
            height={px(scale.cut.bottom - scale.cut.top - 4)}
          />
          <path className="br-e" d={wave(frame, scale.cut.top + 2) + wave(frame, scale.cut.bottom - 2)} />
        </>
      )}
      {columns.map((column) => (
        <LimitLine key={column.stage.key} column={column} scale={scale} />
      ))}
      {labels.map((label) => (
        <Label key={`${label.text}${label.x}`} label={label} className="zn" />
      ))}
      {figures.map(({ path, tag, reversed }) => (
        <g key={`${tag.x} ${tag.y}`}>
          <path className="dim" d={path} />
          <Tag tag={tag} reversed={reversed} />
        </g>
      ))}
      <text className="tk" textAnchor="end" x={frame.left - 7} y={frame.bottom + 20}>
        usual
      </text>
      <text className="tk" textAnchor="end" x={frame.left - 7} y={frame.bottom + 40}>
        peak
      </text>
      <DecibelUnit frame={frame} y={small ? 14 : 20} />
    </PlotSvg>
  )
}

/** Over a column its name, under it the usual and the peak level in its own unit. */
function Words({
  column,
  first,
  frame,
  small,
  height,
  inset,
}: {
  column: Column
  first: boolean
  frame: Frame
  small: boolean
  height: number
  inset: number
}) {
  const { stage, x, width } = column
  const left = px(x + inset)
  const space = width - inset - 3
  const value = (words: string, bold: boolean) => valueText(words, space, { volts: !first, bold, small })
  return (
    <>
      {!first && <path className="g1" d={`M${px(x)} ${frame.top - 26}V${height - 2}`} />}
      {titleLines(stage, space, small).map((line, i) => (
        <text className="st" key={line} x={left} y={small ? 14 + i * 18 : 20}>
          {line}
        </text>
      ))}
      <text className="vl0" x={left} y={frame.bottom + 20}>
        {value(stage.usual, true)}
      </text>
      <text className="vl2" x={left} y={frame.bottom + 40}>
        {value(stage.peak, false)}
      </text>
    </>
  )
}
