/**
 * Points and weights for noise integrals from 20 Hz to 20 kHz.
 *
 * | symbol | name                                                             | unit  | source            |
 * |--------|------------------------------------------------------------------|-------|-------------------|
 * | Q, f_n | quality factor and natural frequency of the network              | 1, Hz | loading.ts        |
 * | ρ      | ellipse through the nearest pole, in the plane of ln f            | 1     | theory of Gauss quadrature |
 * | n      | points, error about ρ^(−2n)                                      | 1     | the same          |
 *
 * A sharp resonance brings a pole near the path, 1/(2Q) away in ln f, and asks for more points: their number
 * follows from that distance. Measured against 40 000 points of the trapezium rule the error stays below 0.002 dB
 * up to Q = 50 within the band; cartridges stay below 10.
 */
import { AUDIO_HIGH_HERTZ, AUDIO_LOW_HERTZ } from './constants'
import { logQuadrature } from './grid'
import { playbackPower } from './riaa'
import { aWeightingPower } from './weighting'

export interface NoisePoints {
  readonly hertz: Float64Array
  /** RIAA power times the quadrature weight, in hertz. */
  readonly flat: Float64Array
  /** The same with A-weighting. */
  readonly aWeighted: Float64Array
}

const COUNTS = [24, 32, 48, 64, 96, 128, 192, 256, 384, 512, 768, 1024, 1536, 2048] as const
const WANTED_ERROR = 1e-5
const MIDDLE = Math.log(AUDIO_LOW_HERTZ * AUDIO_HIGH_HERTZ) / 2
const HALF = Math.log(AUDIO_HIGH_HERTZ / AUDIO_LOW_HERTZ) / 2

const kept = new Map<number, NoisePoints>()

/** Points enough for a network with this resonance; null for one that has none. */
export function noisePoints({
  qualityFactor,
  naturalHertz,
  with7950,
}: {
  qualityFactor: number | null
  naturalHertz: number | null
  with7950: boolean
}): NoisePoints {
  return pointsOf(countFor(qualityFactor, naturalHertz), with7950)
}

function countFor(q: number | null, naturalHertz: number | null): number {
  // Real poles, like those of the equalisation itself, lie π/2 away, which the smallest count already covers.
  if (q === null || naturalHertz === null || q <= 0.5) return COUNTS[0]
  const across = Math.asin(1 / (2 * q)) / HALF
  const along = (Math.log(naturalHertz) - MIDDLE) / HALF
  const axis = (Math.hypot(along - 1, across) + Math.hypot(along + 1, across)) / 2
  const rho = axis + Math.sqrt(axis * axis - 1)
  const wanted = -Math.log(WANTED_ERROR) / (2 * Math.log(rho))
  return COUNTS.find((count) => count >= wanted) ?? 2048
}

function pointsOf(count: number, with7950: boolean): NoisePoints {
  const key = with7950 ? -count : count
  const known = kept.get(key)
  if (known) return known
  const { hertz, weightHertz } = logQuadrature({ low: AUDIO_LOW_HERTZ, high: AUDIO_HIGH_HERTZ, count })
  const flat = weightHertz.map((weight, i) => weight * playbackPower(hertz[i], { with7950 }))
  const aWeighted = flat.map((weight, i) => weight * aWeightingPower(hertz[i]))
  const points = { hertz, flat, aWeighted }
  kept.set(key, points)
  return points
}
