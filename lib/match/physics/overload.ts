/**
 * How much a preamp's input takes at each frequency before a stage runs out.
 *
 * | symbol  | name                                                       | unit   | source                      |
 * |---------|------------------------------------------------------------|--------|-----------------------------|
 * | V1k     | greatest input at 1 kHz                                     | V RMS  | printed per gain setting    |
 * | S(f)    | allowed input re 1 kHz                                      | 1      | by topology, below          |
 * | output-limited | feedback equalisation, the output clips: 1/RIAA(f)   | 1      | gain of the stage           |
 * | flat first stage | passive equalisation behind it: 1                  | 1      | gain of the stage           |
 * | bass-first | bass half in the first stage, 75 µs after: √(1+(ω·3180 µs)²)/√(1+(ω·318 µs)²) re 1 kHz | 1 | gain of the stage |
 *
 * Measured points overrule the 1 kHz figure: their ratio to the topology's shape is interpolated, straight in the
 * logarithms of both axes, and held constant beyond the first and last point.
 */
import { fromDecibels, toDecibels } from './decibels'
import { bassHalfMagnitude, playbackMagnitude } from './riaa'

export type OverloadTopology = 'outputLimited' | 'flatFirstStage' | 'bassFirst'

export interface MeasuredOverload {
  readonly hertz: number
  readonly volts: number
}

export interface OverloadLimit {
  readonly topology: OverloadTopology
  /** Greatest input RMS at 1 kHz, or points RMS in rising order of frequency, at least one. */
  readonly limit: { readonly voltsAt1k: number } | { readonly points: readonly MeasuredOverload[] }
  /** Whether the 7950 µs cut sits within the limited stage's gain. It only touches the output-limited kind. */
  readonly with7950: boolean
}

/** Allowed input re 1 kHz by the topology alone, 1 at 1 kHz. @returns 1 */
export function overloadShape(hertz: number, { topology, with7950 }: Pick<OverloadLimit, 'topology' | 'with7950'>): number {
  if (topology === 'flatFirstStage') return 1
  return 1 / (topology === 'outputLimited' ? playbackMagnitude(hertz, { with7950 }) : bassHalfMagnitude(hertz))
}

/** Greatest input at a frequency. @returns volts RMS  @throws RangeError for an empty list of points */
export function allowedInputVolts(limit: OverloadLimit, hertz: number): number {
  const shape = overloadShape(hertz, limit)
  if ('voltsAt1k' in limit.limit) return limit.limit.voltsAt1k * shape
  return shape * fromDecibels(measuredRatioDecibels(limit, limit.limit.points, hertz))
}

function measuredRatioDecibels(limit: OverloadLimit, points: readonly MeasuredOverload[], hertz: number): number {
  const ratio = (point: MeasuredOverload) => toDecibels(point.volts / overloadShape(point.hertz, limit))
  let below: MeasuredOverload | undefined
  for (const point of points) {
    if (point.hertz > hertz) {
      if (!below) return ratio(point)
      const share = Math.log(hertz / below.hertz) / Math.log(point.hertz / below.hertz)
      return ratio(below) + share * (ratio(point) - ratio(below))
    }
    below = point
  }
  if (!below) throw new RangeError('Measured overload needs one point or more.')
  return ratio(below)
}
