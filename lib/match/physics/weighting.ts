/**
 * A-weighting, 0 dB at exactly 1 kHz.
 *
 * | symbol      | name                                            | unit | source                  |
 * |-------------|-------------------------------------------------|------|-------------------------|
 * | f1 f2 f3 f4 | 20.598997, 107.65265, 737.86223, 12194.217      | Hz   | IEC 61672-1, annex (memory) |
 * | A(f)        | f4²f⁴ / ((f²+f1²)·√((f²+f2²)(f²+f3²))·(f²+f4²)) | 1    | IEC 61672-1             |
 */
import { REFERENCE_HERTZ } from './constants'
import { powerToDecibels } from './decibels'

const F1 = 20.598997 ** 2
const F2 = 107.65265 ** 2
const F3 = 737.86223 ** 2
const F4 = 12194.217 ** 2

function squared(hertz: number): number {
  const f2 = hertz * hertz
  const upper = F4 / (f2 + F4)
  const lower = f2 / (f2 + F1)
  return upper ** 2 * lower ** 2 * (f2 / (f2 + F2)) * (f2 / (f2 + F3))
}

const REFERENCE = squared(REFERENCE_HERTZ)

/** Squared magnitude of the A-weighting, 1 at 1 kHz, 0 at 0 Hz. @returns 1 */
export function aWeightingPower(hertz: number): number {
  return squared(hertz) / REFERENCE
}

/** A-weighting, 0 dB at exactly 1 kHz; −Infinity at 0 Hz. @returns dB */
export function aWeightingDecibels(hertz: number): number {
  return powerToDecibels(aWeightingPower(hertz))
}
