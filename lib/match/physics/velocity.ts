/**
 * Recorded velocities and the conditions that leaflets print beside an output.
 *
 * | symbol | name                                             | unit | source                               |
 * |--------|--------------------------------------------------|------|--------------------------------------|
 * | v      | velocity, RMS or peak, of one channel or lateral | m/s  |                                      |
 * |        | one channel = lateral/√2 (walls at 45°)          |      | geometry of the groove               |
 * |        | RMS = peak/√2 (sine)                             |      | definition                           |
 * | v0     | 5 cm/s peak lateral = 3.54 peak = 2.5 RMS per channel | | the reference level of every output here |
 *
 * Output follows velocity, so a printed output is brought to v0 by the ratio v0/v, both as RMS per channel.
 */
import { NOMINAL_CHANNEL_RMS_METRES_PER_SECOND } from './constants'
import { toDecibels } from './decibels'

export type VelocityKind = 'peak' | 'rms'
/** `lateral`: both channels alike and in phase; `vertical`: in opposite phase; `perChannel`: one wall, at 45°. */
export type VelocityDirection = 'lateral' | 'vertical' | 'perChannel'

export interface Velocity {
  readonly metresPerSecond: number
  readonly kind: VelocityKind
  readonly direction: VelocityDirection
}

/** The same velocity as RMS of one channel. @returns m/s */
export function perChannelRms({ metresPerSecond, kind, direction }: Velocity): number {
  const rms = kind === 'peak' ? metresPerSecond / Math.SQRT2 : metresPerSecond
  return direction === 'perChannel' ? rms : rms / Math.SQRT2
}

/** The same velocity in another manner of speaking. @returns m/s */
export function velocityAs(velocity: Velocity, { kind, direction }: Pick<Velocity, 'kind' | 'direction'>): number {
  const rms = perChannelRms(velocity) * (direction === 'perChannel' ? 1 : Math.SQRT2)
  return kind === 'peak' ? rms * Math.SQRT2 : rms
}

/** Output per velocity, both RMS of one channel (or both peak, which is the same number). @returns V/(m/s); 1 mV per cm/s is 0.1 */
export function sensitivity({ outputVolts, velocity }: { outputVolts: number; velocity: Velocity }): number {
  return outputVolts / perChannelRms(velocity)
}

/** Output at another velocity. @returns volts RMS of one channel, as `outputVolts` */
export function outputAt(target: Velocity, printed: { outputVolts: number; velocity: Velocity }): number {
  return sensitivity(printed) * perChannelRms(target)
}

/** Level of one velocity over another. @returns dB */
export function velocityLevelDecibels(velocity: Velocity, reference: Velocity): number {
  return toDecibels(perChannelRms(velocity) / perChannelRms(reference))
}

/** Peak velocity of a displacement amplitude, 2πf·A; lateral or per channel, as the amplitude is. @returns m/s */
export function velocityOfAmplitude({ hertz, amplitudeMetres }: { hertz: number; amplitudeMetres: number }): number {
  return 2 * Math.PI * hertz * amplitudeMetres
}

/** Factor from an output printed at this velocity to the nominal output at 5 cm/s peak lateral. @returns 1 */
export function factorToNominal(velocity: Velocity): number {
  return NOMINAL_CHANNEL_RMS_METRES_PER_SECOND / perChannelRms(velocity)
}
