/**
 * The loudest that a record asks for, against frequency.
 *
 * | symbol | name                                  | unit | source                                                |
 * |--------|---------------------------------------|------|-------------------------------------------------------|
 * | A      | greatest amplitude, peak              | m    | 50 µm, common practice, no source                     |
 * | V      | greatest velocity, peak               | m/s  | 25 cm/s after Holman (1970s); 50 cm/s after J. Lesurf |
 * | a      | greatest acceleration, peak           | m/s² | up to 5000 g after J. Lesurf                          |
 * | v(f)   | min(2πf·A, V, a/2πf)                  | m/s  | a sine of that frequency at each limit                |
 *
 * All three limits stand on one footing, stated beside them: `lateral` (both channels) or `perChannel`.
 * Sources differ on which they mean, and one channel read as lateral is 3 dB more.
 */
import { STANDARD_GRAVITY, angular } from './constants'

export type Footing = 'lateral' | 'perChannel'

export interface RecordEnvelope {
  readonly footing: Footing
  readonly amplitudeMetres: number
  readonly velocityMetresPerSecond: number
  readonly accelerationMetresPerSecondSquared: number
}

export type EnvelopeName = 'ordinary' | 'loud' | 'extreme'

function envelope(velocityMetresPerSecond: number, gravities: number): RecordEnvelope {
  return {
    footing: 'lateral',
    amplitudeMetres: 50e-6,
    velocityMetresPerSecond,
    accelerationMetresPerSecondSquared: gravities * STANDARD_GRAVITY,
  }
}

/** Re 5 cm/s peak lateral: +14, +17.6 and +20 dB. */
export const RECORD_ENVELOPES: Readonly<Record<EnvelopeName, RecordEnvelope>> = {
  ordinary: envelope(0.25, 3000),
  loud: envelope(0.38, 4000),
  extreme: envelope(0.5, 5000),
}

/** Greatest peak velocity at a frequency, on the envelope's own footing; 0 at 0 Hz. @returns m/s */
export function envelopeVelocity(limits: RecordEnvelope, hertz: number): number {
  const w = angular(hertz)
  const amplitude = w * limits.amplitudeMetres
  // At 0 Hz the acceleration never limits, and the quotient would be infinite.
  const acceleration = w > 0 ? limits.accelerationMetresPerSecondSquared / w : Infinity
  return Math.min(amplitude, limits.velocityMetresPerSecond, acceleration)
}

/** The same as peak of one channel. @returns m/s */
export function envelopeVelocityPerChannel(limits: RecordEnvelope, hertz: number): number {
  return limits.footing === 'lateral' ? envelopeVelocity(limits, hertz) / Math.SQRT2 : envelopeVelocity(limits, hertz)
}

/** Where amplitude hands over to velocity, V/(2πA). @returns hertz; Infinity for an amplitude of 0 */
export function amplitudeCornerHertz(limits: RecordEnvelope): number {
  return limits.velocityMetresPerSecond / (2 * Math.PI * limits.amplitudeMetres)
}

/** Where velocity hands over to acceleration, a/(2πV). @returns hertz; Infinity for a velocity of 0 */
export function accelerationCornerHertz(limits: RecordEnvelope): number {
  return limits.accelerationMetresPerSecondSquared / (2 * Math.PI * limits.velocityMetresPerSecond)
}

/** Where amplitude would hand over to acceleration if velocity never limited, √(a/A)/2π. @returns hertz */
export function amplitudeAccelerationCornerHertz(limits: RecordEnvelope): number {
  return Math.sqrt(limits.accelerationMetresPerSecondSquared / limits.amplitudeMetres) / (2 * Math.PI)
}
