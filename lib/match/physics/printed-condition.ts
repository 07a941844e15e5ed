/**
 * What the velocity beside a printed output may mean, and the factor to the nominal output that follows.
 *
 * | printed                                   | factor low, nominal, high     | source                                 |
 * |-------------------------------------------|-------------------------------|----------------------------------------|
 * | kind and direction both said              | one value, v0/v               | velocity.ts                            |
 * | one of the two said                       | both readings of the other    | conventions differ, so both are kept   |
 * | 5 cm/s, nothing more                      | 0.707, 1, 1                   | peak lateral usual, RMS lateral and one channel met |
 * | 3.54 cm/s, nothing more                   | 0.707, 1, 1                   | the per-channel name of 5 cm/s lateral |
 * | another velocity, nothing more            | as 5 cm/s, in proportion      | the same                               |
 * | mV per cm/s                               | 2.5 × (RMS over RMS, one channel) | IEC way of stating                 |
 * | no velocity at all                        | 0.5, 1, √2                    | spread of the conventions, common practice, no source |
 */
import { factorToNominal, type VelocityDirection, type VelocityKind } from './velocity'
import { NOMINAL_CHANNEL_PEAK_METRES_PER_SECOND, NOMINAL_CHANNEL_RMS_METRES_PER_SECOND } from './constants'

export type PrintedCondition =
  | { readonly form: 'atVelocity'; readonly metresPerSecond: number; readonly kind?: VelocityKind; readonly direction?: VelocityDirection }
  /** Output printed per velocity; the factor turns V per m/s into volts at the nominal level. */
  | { readonly form: 'perVelocity' }
  | { readonly form: 'none' }

export interface NominalFactor {
  readonly low: number
  readonly nominal: number
  readonly high: number
  /** What was taken where the leaflet is silent; null where it says all. */
  readonly assumed: { readonly kind?: VelocityKind; readonly direction?: VelocityDirection } | 'no-velocity' | null
}

/**
 * Factor low, nominal and high from the printed output to the output at 5 cm/s peak lateral.
 * @throws RangeError for a velocity that is not positive
 */
export function nominalFactor(condition: PrintedCondition): NominalFactor {
  if (condition.form === 'perVelocity') return certain(NOMINAL_CHANNEL_RMS_METRES_PER_SECOND)
  if (condition.form === 'none') return { low: 0.5, nominal: 1, high: Math.SQRT2, assumed: 'no-velocity' }
  const { metresPerSecond, kind, direction } = condition
  if (!(metresPerSecond > 0)) throw new RangeError('A printed velocity is above zero.')
  const factor = (k: VelocityKind, d: VelocityDirection) => factorToNominal({ metresPerSecond, kind: k, direction: d })
  if (kind && direction) return certain(factor(kind, direction))

  if (direction) return { ...spread(factor('peak', direction), factor('rms', direction)), assumed: { kind: 'peak' } }

  // 3.54 is how the reference level is written for one channel; every other bare figure is read as lateral first.
  const bare: VelocityDirection = isChannelName(metresPerSecond) ? 'perChannel' : 'lateral'
  if (kind && bare === 'perChannel') return { ...certain(factor(kind, bare)), assumed: { direction: bare } }
  if (kind) return { ...spread(factor(kind, 'lateral'), factor(kind, 'perChannel')), assumed: { direction: 'lateral' } }
  // RMS and one channel each take 3 dB; both at once is rare enough to be left out.
  return { ...spread(factor('peak', bare), factor('rms', bare)), assumed: { kind: 'peak', direction: bare } }
}

function isChannelName(metresPerSecond: number): boolean {
  return Math.abs(metresPerSecond / NOMINAL_CHANNEL_PEAK_METRES_PER_SECOND - 1) < 0.015
}

function certain(factor: number): NominalFactor {
  return { low: factor, nominal: factor, high: factor, assumed: null }
}

function spread(nominal: number, other: number): Omit<NominalFactor, 'assumed'> {
  return { low: Math.min(nominal, other), nominal, high: Math.max(nominal, other) }
}
