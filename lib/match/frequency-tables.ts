import type { Filter } from './controls'
import type { GainOption, Preamp } from './preamp'
import type { RecordLevel } from './result'
import { aWeightingPower } from './physics/weighting'
import { angular, AUDIO_HIGH_HERTZ, AUDIO_LOW_HERTZ, BOLTZMANN_JOULES_PER_KELVIN, NOMINAL_LATERAL_PEAK_METRES_PER_SECOND } from './physics/constants'
import { logQuadrature, logSpacedHertz } from './physics/grid'
import type { OverloadLimit } from './physics/overload'
import { accelerationCornerHertz, amplitudeCornerHertz, envelopeVelocity, RECORD_ENVELOPES } from './physics/record-envelope'
import { playbackPower } from './physics/riaa'

/**
 * What depends on frequency alone, computed once. Responses of a coil are rational in the square of the angular
 * frequency (`w2`), so tables hold that square.
 */

/** Peak velocity of the record at a frequency over nominal level, both lateral. */
export function envelopeOverNominal(hertz: number, level: RecordLevel): number {
  return envelopeVelocity(RECORD_ENVELOPES[level], hertz) / NOMINAL_LATERAL_PEAK_METRES_PER_SECOND
}

/** Frequencies at which margins are taken: log-spaced, with the envelope's corners and 1 kHz exactly. */
export function marginGrid(count: number, level: RecordLevel): Float64Array {
  const envelope = RECORD_ENVELOPES[level]
  const corners = [amplitudeCornerHertz(envelope), accelerationCornerHertz(envelope)]
  const inside = corners.filter((hertz) => hertz > AUDIO_LOW_HERTZ && hertz < AUDIO_HIGH_HERTZ)
  return Float64Array.from([...logSpacedHertz({ low: AUDIO_LOW_HERTZ, high: AUDIO_HIGH_HERTZ, count }), ...inside, 1000]).sort()
}

const TOPOLOGIES = { 'output-limited': 'outputLimited', 'first-stage-flat': 'flatFirstStage', 'first-stage-bass': 'bassFirst' } as const

/** The input stage's limit at one gain: the printed points on top of the topology's shape. */
export function inputLimit({ topology, iecBass }: Preamp, { overload }: GainOption): OverloadLimit {
  return { topology: TOPOLOGIES[topology], limit: { points: overload }, with7950: iecBass }
}

/** A limit behind the equalisation, 1 V at 1 kHz: the preamp's output or the next input. */
export function equalisedLimit({ iecBass }: Preamp): OverloadLimit {
  return { topology: 'outputLimited', limit: { voltsAt1k: 1 }, with7950: iecBass }
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
