import { scaleLinear } from 'd3-scale'
import type { Frame } from './geometry'
import type { LevelPicture } from './level-facts'
import { clamp, finite } from './numbers'

/** Decibels at the top of the diagram. A limit above runs off it. */
export const LEVEL_TOP = 40
const [USUAL_BOTTOM, DEEPEST_BOTTOM] = [-90, -160]
/** The upper part is drawn larger: that is where room is read. */
const UPPER_STRETCH = 1.25
const CUT_TOP = -8
const CUT_BOTTOM = -48
/** A cut that would take out less than this is left away. */
const CUT_WORTHWHILE = -24

export interface LevelScale {
  y: (decibels: number) => number
  bottom: number
  /** The empty middle that was cut out, in pixels; null where noise or a limit stands in it. */
  cut: { top: number; bottom: number } | null
  /** Level lines that stand outside the cut. */
  lines: number[]
}

/** The upright axis with its empty middle taken out, so that room above and noise below can both be read. */
export function levelScale({ stages, peaks }: LevelPicture, frame: Frame, cutHeight: number): LevelScale {
  const floors = stages.map(({ floor }) => finite(floor.high)).filter((floor) => floor !== null)
  const quietest = Math.min(...stages.map(({ floor }) => finite(floor.high) ?? USUAL_BOTTOM))
  const bottom = quietest < USUAL_BOTTOM + 8 ? Math.max(DEEPEST_BOTTOM, Math.floor((quietest - 8) / 10) * 10) : USUAL_BOTTOM
  const lowestLimit = Math.min(LEVEL_TOP, peaks.ordinary, ...stages.map(({ limit }) => finite(limit?.low) ?? LEVEL_TOP))
  const loudestFloor = Math.max(bottom, ...floors)
  const wished = Math.max(CUT_BOTTOM, loudestFloor + 6)
  const isCut = wished < CUT_WORTHWHILE && lowestLimit > CUT_TOP
  const low = isCut ? wished : CUT_TOP
  const gap = isCut ? cutHeight : 0
  const unit = (frame.height - gap) / ((LEVEL_TOP - CUT_TOP) * UPPER_STRETCH + (low - bottom))
  const cutTop = frame.top + unit * UPPER_STRETCH * (LEVEL_TOP - CUT_TOP)
  const scale = isCut
    ? scaleLinear([LEVEL_TOP, CUT_TOP, low, bottom], [frame.top, cutTop, cutTop + gap, frame.bottom])
    : scaleLinear([LEVEL_TOP, CUT_TOP, bottom], [frame.top, cutTop, frame.bottom])
  const lines = Array.from({ length: 21 }, (_, i) => LEVEL_TOP - i * 10).filter(
    (level) => level > bottom && (level >= CUT_TOP || level <= low),
  )
  return {
    y: (decibels) => scale(clamp(decibels, bottom, LEVEL_TOP)),
    bottom,
    cut: isCut ? { top: cutTop, bottom: cutTop + gap } : null,
    lines,
  }
}
