import { fixed } from './numbers'

/** Noise in decibels under the usual music level, A-weighted; more is quieter. */
export interface NoiseLevels {
  groove: number
  /** Preamp and cartridge; `low` is at worst. */
  yours: { low: number; nominal: number; high: number }
  /** The coil alone: no preamp can be quieter with this cartridge. */
  coil: number
}

/** How far the noise stays under the groove's, at worst. Negative when louder. */
export function underGroove({ groove, yours }: NoiseLevels): number {
  return yours.low - groove
}

export function noiseSentence(levels: NoiseLevels): string {
  const { yours } = levels
  if (!Number.isFinite(yours.low)) return 'Noise of preamp and cartridge. It is not known.'
  const gap = underGroove(levels)
  const against = !Number.isFinite(gap)
    ? ''
    : Number(gap.toFixed(1)) < 0
      ? `, and louder than the groove by ${fixed(-gap)} dB`
      : `, and ${fixed(gap)} dB under the noise of the groove`
  const worst = yours.high > yours.low ? 'At worst it' : 'It'
  return `Noise of preamp and cartridge. ${worst} lies ${fixed(yours.low, 0)} dB under usual music${against}.`
}
