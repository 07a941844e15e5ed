import { finite, finiteRange, isOver, roomText } from './numbers'

interface Range {
  low: number
  nominal: number
  high: number
}

/** One place that the music passes. Decibels against the cartridge's nominal output, 5 cm/s peak, sideways. */
export interface LevelStageDrawn {
  key: 'record' | 'into-preamp' | 'out-of-preamp' | 'into-next'
  title: string
  /** Usual and peak level in the stage's own unit, as words: "5.3 mV", "4.9 to 6.9 mV", "5 cm/s". */
  usual: string
  peak: string
  /** Null where nothing limits. `low` is at worst. */
  limit: Range | null
  /** `high` is at worst. */
  floor: Range
  /** Between limit and loud records; null where nothing limits. `low` is at worst. */
  room: Range | null
}

export interface LevelPicture {
  stages: LevelStageDrawn[]
  /** Where records peak, ordinary and loud. */
  peaks: { ordinary: number; loud: number }
}

/** Room under this is tight enough to be reversed out. */
const TIGHT_UNDER = 6
/** Hiss nearer to the groove's noise than this is reversed out. */
const NEAR_GROOVE = 6

/** Room at worst, read from the stage, or from its limit where the stage does not say. */
export function roomAtWorst(stage: LevelStageDrawn, peaks: LevelPicture['peaks']): number | null {
  const said = finite(stage.room?.low)
  const limit = finite(stage.limit?.low)
  return said ?? (limit === null ? null : finite(limit - peaks.loud))
}

export function grooveFloor(stages: readonly LevelStageDrawn[]): number | null {
  return finite(stages.find(({ key }) => key === 'record')?.floor.high)
}

/** The stage with least room, and its room. Stages that read alike are all tightest. */
export function tightest({ stages, peaks }: LevelPicture): { room: number; isTightest: (room: number) => boolean } | null {
  const rooms = stages.map((stage) => roomAtWorst(stage, peaks)).filter((room) => room !== null)
  if (rooms.length === 0) return null
  const least = Math.min(...rooms)
  return { room: least, isTightest: (room) => room < TIGHT_UNDER && room.toFixed(1) === least.toFixed(1) }
}

/** Noise of a stage against the groove: `under` is negative when louder. */
export function hissAgainstGroove(stage: LevelStageDrawn, groove: number | null) {
  const floor = finite(stage.floor.high)
  if (stage.key === 'record' || floor === null || groove === null) return null
  const under = groove - floor
  return { under, near: under <= NEAR_GROOVE, louder: Math.round(under) < 0 }
}

/** A stage whose figures can all be drawn, or say that they are not there. */
export function drawable(stage: LevelStageDrawn): LevelStageDrawn {
  return { ...stage, limit: finiteRange(stage.limit), room: finiteRange(stage.room) }
}

export function levelSentence(picture: LevelPicture): string {
  const { stages, peaks } = picture
  const tight = tightest(picture)
  const where = stages.find((stage) => roomAtWorst(stage, peaks) === tight?.room)
  const room =
    tight && where
      ? ` Tightest is ${where.title}: at worst ${
          isOver(tight.room) ? `loud records go ${roomText(tight.room)} dB` : `${roomText(tight.room)} dB of room`
        }.`
      : ''
  const groove = grooveFloor(stages)
  const hiss = stages.map((stage) => hissAgainstGroove(stage, groove)).filter((found) => found !== null)
  const nearest = hiss.length > 0 ? Math.round(Math.min(...hiss.map(({ under }) => under))) : null
  const noise =
    nearest === null
      ? ''
      : nearest < 0
        ? ` Hiss is louder than the groove by ${-nearest} dB.`
        : ` Hiss stays ${nearest} dB under the noise of the groove.`
  return `Level from the record to where it plays into.${room}${noise}`
}
