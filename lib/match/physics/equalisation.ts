/**
 * What an ear hears when the record passes through no phono stage, or through two in a row.
 *
 * | symbol | name                              | unit | source                      |
 * |--------|-----------------------------------|------|-----------------------------|
 * | n      | number of phono stages in the path | 1   |                             |
 * | tilt   | (n − 1) × playback response        | dB  | the record carries the inverse of one stage |
 */
import { playbackDecibels, type PlaybackCurve } from './riaa'

export type StageCount = 0 | 1 | 2

/** Difference from a flat response at `hertz` with so many phono stages in a row, 0 dB at 1 kHz. @returns dB */
export function equalisationTiltDecibels(hertz: number, stages: StageCount, curve: PlaybackCurve = {}): number {
  // Nothing in the path can carry a bass cut when there is no stage, and one stage is flat by definition.
  if (stages === 0) return -playbackDecibels(hertz)
  if (stages === 1) return 0
  return playbackDecibels(hertz, curve)
}

/** What the owner ticked as heard. */
export interface HeardSigns {
  readonly thin?: boolean
  readonly tinny?: boolean
  readonly quiet?: boolean
  readonly boomy?: boolean
  readonly loud?: boolean
  readonly noTreble?: boolean
}

/**
 * How many phono stages the description speaks for. The tone decides: level alone (quiet, loud) has many other
 * causes and only tips the scale beside a sign of tone. Signs on both sides that balance speak for one stage.
 * @returns 0 (none), 1 (nothing points elsewhere), 2 (two in a row)
 */
export function recogniseStages(heard: HeardSigns): StageCount {
  const bright = count(heard.thin, heard.tinny)
  const dark = count(heard.boomy, heard.noTreble)
  if (bright === 0 && dark === 0) return 1
  const none = bright + count(heard.quiet)
  const two = dark + count(heard.loud)
  if (none > two) return 0
  if (two > none) return 2
  return 1
}

function count(...signs: (boolean | undefined)[]): number {
  return signs.filter(Boolean).length
}
