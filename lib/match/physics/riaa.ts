/**
 * Disc equalisation, normalised to 0 dB at exactly 1 kHz.
 *
 * | symbol   | name                        | unit | source                                  |
 * |----------|-----------------------------|------|-----------------------------------------|
 * | τ1 τ2 τ3 | 3180, 318, 75 µs            | s    | IEC 60098 (RIAA)                        |
 * | τ4       | 7950 µs, playback only      | s    | IEC 60098 amendment 4                   |
 * | G(f)     | playback, √(1+(ωτ2)²) / √((1+(ωτ1)²)(1+(ωτ3)²)), with τ4 times ωτ4/√(1+(ωτ4)²) | 1 | same |
 *
 * The 7950 µs term stands inside the normalisation: it costs 0.0017 dB at 1 kHz.
 */
import {
  ADDED_BASS_CUT_SECONDS,
  BASS_BOOST_SECONDS,
  BASS_TURNOVER_SECONDS,
  REFERENCE_HERTZ,
  TREBLE_SECONDS,
  angular,
} from './constants'
import { powerToDecibels } from './decibels'

export interface PlaybackCurve {
  /** Whether the added bass cut of 7950 µs is in the playback chain. */
  readonly with7950?: boolean
}

function squared(hertz: number): number {
  const w2 = angular(hertz) ** 2
  return (1 + w2 * BASS_TURNOVER_SECONDS ** 2) / ((1 + w2 * BASS_BOOST_SECONDS ** 2) * (1 + w2 * TREBLE_SECONDS ** 2))
}

/** Squared magnitude of the 7950 µs high-pass alone, not normalised. @returns 1 */
export function addedBassCutSquared(hertz: number): number {
  const x2 = (angular(hertz) * ADDED_BASS_CUT_SECONDS) ** 2
  return x2 / (1 + x2)
}

const REFERENCE = squared(REFERENCE_HERTZ)
const REFERENCE_WITH_7950 = REFERENCE * addedBassCutSquared(REFERENCE_HERTZ)

/** Squared playback magnitude, 1 at 1 kHz; at 0 Hz it is finite, and 0 with 7950 µs. @returns 1 */
export function playbackPower(hertz: number, { with7950 = false }: PlaybackCurve = {}): number {
  return with7950 ? (squared(hertz) * addedBassCutSquared(hertz)) / REFERENCE_WITH_7950 : squared(hertz) / REFERENCE
}

/** Playback magnitude, 1 at 1 kHz. @returns 1 */
export function playbackMagnitude(hertz: number, curve: PlaybackCurve = {}): number {
  return Math.sqrt(playbackPower(hertz, curve))
}

/** Playback response, 0 dB at 1 kHz. At 0 Hz with 7950 µs it is −Infinity. @returns dB */
export function playbackDecibels(hertz: number, curve: PlaybackCurve = {}): number {
  return powerToDecibels(playbackPower(hertz, curve))
}

/** Recording response, the mirror of playback without 7950 µs, which was never part of recording. @returns dB */
export function recordingDecibels(hertz: number): number {
  return -playbackDecibels(hertz)
}

/** Response of the 7950 µs high-pass alone, 0 dB far above it. @returns dB */
export function addedBassCutDecibels(hertz: number): number {
  return powerToDecibels(addedBassCutSquared(hertz))
}

/** Magnitude of the bass half alone, √(1+(ωτ2)²)/√(1+(ωτ1)²), 1 at 1 kHz. @returns 1 */
export function bassHalfMagnitude(hertz: number): number {
  return Math.sqrt(bassHalfSquared(hertz) / BASS_HALF_REFERENCE)
}

function bassHalfSquared(hertz: number): number {
  const w2 = angular(hertz) ** 2
  return (1 + w2 * BASS_TURNOVER_SECONDS ** 2) / (1 + w2 * BASS_BOOST_SECONDS ** 2)
}
const BASS_HALF_REFERENCE = bassHalfSquared(REFERENCE_HERTZ)
