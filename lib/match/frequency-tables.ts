import { ENVELOPES, NOMINAL_VELOCITY } from './rules'
import type { Filter } from './controls'
import type { OverloadTopology } from './preamp'
import type { RecordLevel } from './result'
import { aWeightingPower } from './physics/weighting'
import { angular, AUDIO_HIGH_HERTZ, AUDIO_LOW_HERTZ, BOLTZMANN_JOULES_PER_KELVIN, STANDARD_GRAVITY } from './physics/constants'
import { logQuadrature, logSpacedHertz } from './physics/grid'
import { bassHalfMagnitude, playbackPower } from './physics/riaa'

/**
 * What depends on frequency alone, computed once. Responses of a coil are rational in the square of the angular
 * frequency (`w2`), so tables hold that square.
 */

/** Peak velocity of the record at a frequency, over nominal: min(2πf·A, V, a/2πf) over 5 cm/s lateral. */
export function envelopeOverNominal(hertz: number, level: RecordLevel): number {
  const { velocity, amplitude, accelerationG } = ENVELOPES[level]
  const omega = angular(hertz)
  return Math.min(omega * amplitude, velocity, (accelerationG * STANDARD_GRAVITY) / omega) / NOMINAL_VELOCITY
}

/** The envelope's corners, where a margin may be tightest although nothing is smooth there. */
function cornersHertz(level: RecordLevel): number[] {
  const { velocity, amplitude, accelerationG } = ENVELOPES[level]
  return [velocity / (2 * Math.PI * amplitude), (accelerationG * STANDARD_GRAVITY) / (2 * Math.PI * velocity)]
}

/** Frequencies at which margins are taken: log-spaced, with the envelope's corners and 1 kHz exactly. */
export function marginGrid(count: number, level: RecordLevel): Float64Array {
  const corners = cornersHertz(level).filter((hertz) => hertz > AUDIO_LOW_HERTZ && hertz < AUDIO_HIGH_HERTZ)
  const grid = [...logSpacedHertz({ low: AUDIO_LOW_HERTZ, high: AUDIO_HIGH_HERTZ, count }), ...corners, 1000]
  return Float64Array.from(grid).sort()
}

/** Allowed input at a frequency over the allowed input at 1 kHz, for a topology. */
export function allowedOverReference(hertz: number, topology: OverloadTopology, with7950: boolean): number {
  if (topology === 'first-stage-flat') return 1
  if (topology === 'first-stage-bass') return 1 / bassHalfMagnitude(hertz)
  return 1 / Math.sqrt(playbackPower(hertz, { with7950 }))
}

/**
 * Allowed input by frequency as a factor on the 1 kHz figure, from measured points where there are several:
 * between points the measured factor over the topology's own shape is interpolated in the logarithm of frequency,
 * beyond the outermost points it stays.
 */
export function allowedFactor(
  hertz: number,
  topology: OverloadTopology,
  with7950: boolean,
  points: { hertz: number; volts: number }[],
): number {
  const shape = allowedOverReference(hertz, topology, with7950)
  if (points.length < 2) return shape
  const reference = Math.log(allowedAt1kHz(points, topology, with7950))
  const excess = (point: { hertz: number; volts: number }) =>
    Math.log(point.volts / allowedOverReference(point.hertz, topology, with7950)) - reference
  const after = points.findIndex((point) => point.hertz >= hertz)
  if (after === 0) return shape * Math.exp(excess(points[0]))
  if (after < 0) return shape * Math.exp(excess(points[points.length - 1]))
  const [left, right] = [points[after - 1], points[after]]
  const part = Math.log(hertz / left.hertz) / Math.log(right.hertz / left.hertz)
  return shape * Math.exp(excess(left) + part * (excess(right) - excess(left)))
}

/** Volts RMS allowed at the input at 1 kHz, from one or several measured points. */
export function allowedAt1kHz(points: { hertz: number; volts: number }[], topology: OverloadTopology, with7950: boolean): number {
  const nearest = points.reduce((best, point) =>
    Math.abs(Math.log(point.hertz / 1000)) < Math.abs(Math.log(best.hertz / 1000)) ? point : best,
  )
  return nearest.volts / allowedOverReference(nearest.hertz, topology, with7950)
}

/** Power gain of a Butterworth high-pass. */
export function filterPower(hertz: number, filter: Filter | null): number {
  return filter ? 1 / (1 + (filter.cornerHertz / hertz) ** (2 * filter.order)) : 1
}

/** For the largest of `demand / D(w2)` over a grid: what the record asks over what the stage allows, squared. */
export interface Demand {
  hertz: Float64Array
  w2: Float64Array
  demand: Float64Array
}

export function demandTable(
  grid: Float64Array,
  level: RecordLevel,
  allowedAt: (hertz: number) => number,
): Demand {
  const w2 = Float64Array.from(grid, (hertz) => angular(hertz) ** 2)
  const demand = Float64Array.from(grid, (hertz) => (envelopeOverNominal(hertz, level) / allowedAt(hertz)) ** 2)
  return { hertz: grid, w2, demand }
}

/** Quadrature of the noise integrals: weights already hold the RIAA curve, flat or A-weighted. */
export interface NoiseTable {
  w2: Float64Array
  flat: Float64Array
  weighted: Float64Array
  /** ∫ W df, the bandwidth of white noise, hertz. */
  flatHertz: number
  weightedHertz: number
}

const noiseTables = new Map<string, NoiseTable>()

/** 20 Hz to 20 kHz, RIAA normalised at 1 kHz, with or without 7950 µs. */
export function noiseTable(with7950: boolean, points: number): NoiseTable {
  const key = `${with7950} ${points}`
  const known = noiseTables.get(key)
  if (known) return known
  const { hertz, weightHertz } = logQuadrature({ low: AUDIO_LOW_HERTZ, high: AUDIO_HIGH_HERTZ, count: points })
  const flat = hertz.map((f, i) => weightHertz[i] * playbackPower(f, { with7950 }))
  const weighted = hertz.map((f, i) => flat[i] * aWeightingPower(f))
  const sum = (values: Float64Array) => values.reduce((total, value) => total + value, 0)
  const table = { w2: hertz.map((f) => angular(f) ** 2), flat, weighted, flatHertz: sum(flat), weightedHertz: sum(weighted) }
  noiseTables.set(key, table)
  return table
}

/** 4kT, joules. */
export const fourKT = (kelvin: number): number => 4 * BOLTZMANN_JOULES_PER_KELVIN * kelvin
