/**
 * From a printed "S/N re 5 mV, input shorted" to a voltage noise that can be added up.
 *
 * | symbol | name                                        | unit  | source                          |
 * |--------|---------------------------------------------|-------|---------------------------------|
 * | B      | noise bandwidth ∫W df, 20 Hz to 20 kHz       | Hz    | noise-points.ts                 |
 * | e_n    | V_ref / (10^(S/N / 20)·√B)                  | V/√Hz | a shorted input leaves e_n alone |
 *
 * It is a conversion, not a measurement: it takes the noise for white and says nothing about current noise.
 */
import { fromDecibels } from './decibels'
import { noisePoints } from './noise-points'
import type { PlaybackCurve } from './riaa'

export type NoiseWeighting = 'flat' | 'aWeighted'

/** ∫W df from 20 Hz to 20 kHz: 8630 Hz with RIAA, 3214 Hz with RIAA and A. @returns hertz */
export function noiseBandwidthHertz(weighting: NoiseWeighting, { with7950 = false }: PlaybackCurve = {}): number {
  const points = noisePoints({ qualityFactor: null, naturalHertz: null, with7950 })
  return points[weighting].reduce((sum, weight) => sum + weight, 0)
}

export interface ConvertedVoltageNoise {
  readonly voltsPerRootHertz: number
  /** Always said beside the figure: it was converted from a ratio, taken for white, current noise left out. */
  readonly origin: 'converted-from-snr'
}

/** White voltage noise that gives the printed ratio. `referenceVolts` RMS, 5 mV on most leaflets. @returns V/√Hz */
export function voltageNoiseFromSnr({
  snrDecibels,
  referenceVolts,
  weighting,
  with7950,
}: {
  snrDecibels: number
  referenceVolts: number
  weighting: NoiseWeighting
  with7950?: boolean
}): ConvertedVoltageNoise {
  const bandwidth = noiseBandwidthHertz(weighting, { with7950: with7950 ?? false })
  return { voltsPerRootHertz: referenceVolts / (fromDecibels(snrDecibels) * Math.sqrt(bandwidth)), origin: 'converted-from-snr' }
}
