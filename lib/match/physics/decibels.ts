/**
 * Ratios of like quantities (volts, velocities) in decibels.
 *
 * | symbol | name            | unit | source                       |
 * |--------|-----------------|------|------------------------------|
 * | r      | amplitude ratio | 1    | dB = 20·log10 r, definition  |
 */

const NEPERS_PER_DECIBEL = Math.LN10 / 20

/** Amplitude ratio in decibels, 20·log10 r. A ratio of 0 gives −Infinity; a negative one NaN. @returns dB */
export function toDecibels(ratio: number): number {
  return 20 * Math.log10(ratio)
}

/** Amplitude ratio of a number of decibels, 10^(dB/20). @returns 1 */
export function fromDecibels(decibels: number): number {
  return Math.exp(decibels * NEPERS_PER_DECIBEL)
}

/** Ratio of powers (or of squared amplitudes) in decibels, 10·log10. @returns dB */
export function powerToDecibels(powerRatio: number): number {
  return 10 * Math.log10(powerRatio)
}
