import type { Frame } from './geometry'
import { px, uprightDimension } from './geometry'
import type { LevelPicture, LevelStageDrawn } from './level-facts'
import { hissAgainstGroove, roomAtWorst } from './level-facts'
import type { LevelScale } from './level-scale'
import { LEVEL_TOP } from './level-scale'
import { finite, isOver, roomText } from './numbers'
import { dotsFill, hatchFill, screenFill } from './patterns'
import type { Box } from './placement'
import type { PlacedTag } from './tag'
import { placeTag } from './tag'

/** One column of the level diagram. */
export interface Column {
  stage: LevelStageDrawn
  x: number
  width: number
}

/** Noise from the worst case down; the screen where it may be quieter. */
export function FloorGround({ id, column, scale, frame }: { id: string; column: Column; scale: LevelScale; frame: Frame }) {
  const { x, width, stage } = column
  const worst = finite(stage.floor.high)
  if (worst === null) return null
  const [top, quiet] = [scale.y(worst), scale.y(Math.min(worst, finite(stage.floor.low) ?? worst))]
  return (
    <>
      {quiet - top > 0.5 && (
        <>
          <rect fill={screenFill(id)} x={px(x)} y={px(top)} width={px(width)} height={px(quiet - top)} />
          <path className="edge" d={`M${px(x)} ${px(quiet)}h${px(width)}`} />
        </>
      )}
      <rect fill={dotsFill(id)} x={px(x)} y={px(quiet)} width={px(width)} height={px(Math.max(0, frame.bottom - quiet))} />
      <path className="floor" d={`M${px(x)} ${px(top)}h${px(width)}`} />
    </>
  )
}

/** Where the limit stands, at worst and at best; null where there is none on the diagram. */
export function limitHeights({ stage }: Column, scale: LevelScale): { worst: number; best: number } | null {
  const limit = stage.limit
  if (!limit || limit.low > LEVEL_TOP) return null
  return { worst: scale.y(limit.low), best: scale.y(Math.max(limit.low, limit.high)) }
}

/** Clears the ground above a limit and lays the screen where the limit may be higher; the hatch comes over the peaks. */
export function LimitGround({ id, column, scale, frame }: { id: string; column: Column; scale: LevelScale; frame: Frame }) {
  const heights = limitHeights(column, scale)
  if (!heights) return null
  const { x, width } = column
  const { worst, best } = heights
  return (
    <>
      <rect className="pbg" x={px(x)} y={frame.top} width={px(width)} height={px(best - frame.top)} />
      {worst - best > 0.5 && (
        <>
          <rect fill={screenFill(id)} x={px(x)} y={px(best)} width={px(width)} height={px(worst - best)} />
          <path className="edge" d={`M${px(x)} ${px(best)}h${px(width)}`} />
        </>
      )}
    </>
  )
}

export function LimitHatch({ id, column, scale, frame }: { id: string; column: Column; scale: LevelScale; frame: Frame }) {
  const heights = limitHeights(column, scale)
  if (!heights) return null
  const { x, width } = column
  return <rect fill={hatchFill(id)} x={px(x)} y={frame.top} width={px(width)} height={px(heights.best - frame.top)} />
}

export function LimitLine({ column, scale }: { column: Column; scale: LevelScale }) {
  const heights = limitHeights(column, scale)
  return heights && <path className="ceil" d={`M${px(column.x)} ${px(heights.worst)}h${px(column.width)}`} />
}

export interface Dimension {
  path: string
  tag: PlacedTag
  reversed: boolean
  /** What figure and arrow take up, for the words to keep clear of. */
  taken: Box[]
}

interface DimensionContext {
  peaks: LevelPicture['peaks']
  groove: number | null
  isTightest: (room: number) => boolean
  scale: LevelScale
  frame: Frame
  small: boolean
}

/** The unit is dropped where a column is narrow. */
const UNIT_FROM = 150

/** The arrows of one column with their figures: room above the peaks, and noise under the groove's. */
export function dimensions(column: Column, context: DimensionContext): Dimension[] {
  const { stage, x, width } = column
  const { peaks, groove, isTightest, scale, frame, small } = context
  const unit = small || width < UNIT_FROM ? '' : ' dB'
  const lineX = x + width * (small ? 0.16 : 0.2)
  const tagAt = (text: string, y: number) => {
    const tag = placeTag(text, lineX + 7, y)
    // Kept inside its column, over its own arrow if need be.
    return placeTag(text, Math.max(x + 2, Math.min(tag.x, x + width - tag.box.width - 1)), y)
  }
  const found: Dimension[] = []
  const add = (y1: number, y2: number, { roomFor, tail }: { roomFor: number; tail: number }, tag: PlacedTag, reversed: boolean) => {
    const beyond = Math.abs(y1 - y2) > roomFor ? 0 : tail
    const arrow = { x: lineX - 4, y: Math.min(y1, y2) - beyond, width: 8, height: Math.abs(y1 - y2) + beyond * 2 }
    found.push({ path: uprightDimension(lineX, y1, y2, { roomFor, tail }), tag, reversed, taken: [tag.box, arrow] })
  }

  const room = roomAtWorst(stage, peaks)
  const limit = finite(stage.limit?.low)
  if (room !== null && limit !== null) {
    const peak = scale.y(peaks.loud)
    const end = scale.y(limit) + (limit > LEVEL_TOP ? 6 : 0)
    const apart = Math.abs(peak - end) > 20
    const above = Math.min(end, peak) - 16
    const text = roomText(room, small || !unit ? 'over ' : 'over by ')
    const tag = tagAt(text + unit, apart ? (end + peak) / 2 : above < frame.top ? Math.max(end, peak) + 16 : above)
    add(end, peak, { roomFor: 20, tail: 20 }, tag, isTightest(room) || isOver(room))
  }

  const floor = finite(stage.floor.high)
  const hiss = hissAgainstGroove(stage, groove)
  if (stage.key === 'record' && floor !== null) {
    const [zero, end] = [scale.y(0), scale.y(floor)]
    const middle = (zero + end) / 2
    const { cut } = scale
    // The figure stands clear of the wavy lines, if there is place for it above them.
    const nearCut = cut && middle > cut.top - 12 && middle < cut.bottom + 12
    const y = nearCut && cut.top - 14 > zero + 12 ? cut.top - 14 : middle
    add(zero, end, { roomFor: 20, tail: 20 }, tagAt(Math.abs(floor).toFixed(0) + unit, y), false)
  } else if (hiss && floor !== null && groove !== null) {
    const [grooveY, floorY] = [scale.y(groove), scale.y(floor)]
    const text = Math.abs(Math.round(hiss.under)).toFixed(0)
    const louder = small || !unit ? '+' : 'louder by '
    const roomFor = hiss.near ? 40 : 14
    const apart = Math.abs(grooveY - floorY) > roomFor
    const tag = tagAt((hiss.louder ? louder : '') + text + unit, apart ? (grooveY + floorY) / 2 : Math.min(grooveY, floorY) - 14)
    add(grooveY, floorY, { roomFor, tail: 18 }, tag, hiss.near)
  }
  return found
}
