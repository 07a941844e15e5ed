/**
 * A cartridge coil into a resistor and a capacitor.
 *
 * | symbol | name                                   | unit | source                         |
 * |--------|----------------------------------------|------|--------------------------------|
 * | R, L   | coil resistance, inductance            | Ω, H |                                |
 * | Rl, C  | load resistance, all capacitance       | Ω, F |                                |
 * | Y      | 1/Rl, 0 without a load                 | S    |                                |
 * | k      | 1 + R·Y, the loss at 0 Hz              | 1    | circuit theory                 |
 * | d      | L·Y + R·C, the damping                 | s    | circuit theory                 |
 * | D(ω)   | (k − ω²LC)² + (ωd)² = 1/|H|²            | 1    | H = Z_p/(R + jωL + Z_p)        |
 * | Z      | node impedance, (R + jωL)·H            | Ω    | the network seen from the preamp |
 *
 * D is a quadratic in ω², so peaks and −3 dB points are closed forms. A real coil has eddy losses that the lumped
 * model leaves out: peaks of moving magnets and irons come out lower than reckoned here.
 * Valid: R ≥ 0, L ≥ 0, C ≥ 0, Rl > 0 (Infinity for none). The one singular circuit is R = 0 with no load at all:
 * nothing damps it, and its Q and its peak are Infinity.
 */
import { REFERENCE_HERTZ, angular } from './constants'
import { powerToDecibels } from './decibels'
import type { Complex } from './complex'

export interface LoadingNetwork {
  readonly coilOhms: number
  readonly coilHenries: number
  /** Infinity when nothing loads the coil. */
  readonly loadOhms: number
  readonly loadFarads: number
}

/** All load resistors across one another, 1/Σ(1/R). None gives Infinity; a resistor of 0 shorts all. @returns ohms */
export function parallelOhms(...ohms: readonly number[]): number {
  let siemens = 0
  for (const resistor of ohms) siemens += 1 / resistor
  return 1 / siemens
}

/** k = 1 + R/Rl: the factor by which the load divides the EMF at 0 Hz. @returns 1 */
export function directLossFactor({ coilOhms, loadOhms }: LoadingNetwork): number {
  return 1 + coilOhms / loadOhms
}

/** d = L/Rl + R·C. @returns seconds */
export function dampingSeconds({ coilOhms, coilHenries, loadOhms, loadFarads }: LoadingNetwork): number {
  return coilHenries / loadOhms + coilOhms * loadFarads
}

/** D = 1/|H|² at a frequency. @returns 1 */
export function attenuationSquared(network: LoadingNetwork, hertz: number): number {
  const w = angular(hertz)
  const real = directLossFactor(network) - w * w * network.coilHenries * network.loadFarads
  const imaginary = w * dampingSeconds(network)
  return real * real + imaginary * imaginary
}

/** |H|, output over EMF. @returns 1 */
export function loadingMagnitude(network: LoadingNetwork, hertz: number): number {
  return 1 / Math.sqrt(attenuationSquared(network, hertz))
}

/** Response re the open-circuit EMF. @returns dB */
export function responseDecibels(network: LoadingNetwork, hertz: number): number {
  return -powerToDecibels(attenuationSquared(network, hertz))
}

/** What the load costs at 1 kHz, re the EMF. @returns dB, negative for a loss */
export function levelLossDecibels(network: LoadingNetwork): number {
  return responseDecibels(network, REFERENCE_HERTZ)
}

/** Response re 1 kHz. @returns dB */
export function deviationDecibels(network: LoadingNetwork, hertz: number): number {
  return powerToDecibels(attenuationSquared(network, REFERENCE_HERTZ) / attenuationSquared(network, hertz))
}

/**
 * Largest departure from the level at 1 kHz between two frequencies. The response has one turning point at most,
 * so the ends and the peak are all there is to look at.
 * @returns dB, never negative
 */
export function maximumDeviationDecibels(
  network: LoadingNetwork,
  { low = 1000, high = 20_000 }: { low?: number; high?: number } = {},
): number {
  let largest = Math.max(Math.abs(deviationDecibels(network, low)), Math.abs(deviationDecibels(network, high)))
  const peak = peakHertz(network)
  if (peak !== null && peak > low && peak < high) largest = Math.max(largest, Math.abs(deviationDecibels(network, peak)))
  return largest
}

/** What a preamp sees looking back, its own load included: Z = (R + jωL)·H. @returns ohms */
export function nodeImpedance(network: LoadingNetwork, hertz: number): Complex {
  const { coilOhms, coilHenries, loadOhms, loadFarads } = network
  const w = angular(hertz)
  const d = dampingSeconds(network)
  const k = directLossFactor(network)
  const squared = attenuationSquared(network, hertz)
  // Re Z is written as a sum of positive terms: the plain product would subtract nearly equal numbers.
  return {
    re: (coilOhms * k + (w * coilHenries) ** 2 / loadOhms) / squared,
    im: (w * coilHenries * (k - w * w * coilHenries * loadFarads) - coilOhms * w * d) / squared,
  }
}

/** Resonance of coil and capacitance alone, 1/(2π√(LC)); null when either is missing. @returns hertz */
export function resonanceHertz({ coilHenries, loadFarads }: LoadingNetwork): number | null {
  const squared = coilHenries * loadFarads
  return squared > 0 ? 1 / (2 * Math.PI * Math.sqrt(squared)) : null
}

/** Natural frequency of the loaded circuit, f_LC·√k; null when coil or capacitance is missing. @returns hertz */
export function naturalHertz(network: LoadingNetwork): number | null {
  const resonance = resonanceHertz(network)
  return resonance === null ? null : resonance * Math.sqrt(directLossFactor(network))
}

/** Q = √(k·L·C)/d; null when there is nothing to resonate, Infinity when nothing damps. @returns 1 */
export function qualityFactor(network: LoadingNetwork): number | null {
  const squared = network.coilHenries * network.loadFarads
  if (!(squared > 0)) return null
  return Math.sqrt(directLossFactor(network) * squared) / dampingSeconds(network)
}

/** Damping ratio ζ = 1/(2Q) of the same resonance; null when there is none. @returns 1 */
export function dampingRatio(network: LoadingNetwork): number | null {
  const q = qualityFactor(network)
  return q === null ? null : 1 / (2 * q)
}

/** Where the response is highest, ω² = (2kLC − d²)/(2L²C²); null when Q ≤ 1/√2, it then falls from 0 Hz on. @returns hertz */
export function peakHertz(network: LoadingNetwork): number | null {
  const lc = network.coilHenries * network.loadFarads
  const excess = 2 * directLossFactor(network) * lc - dampingSeconds(network) ** 2
  if (!(excess > 0)) return null
  return Math.sqrt(excess / 2) / (lc * 2 * Math.PI)
}

/** D at the peak, d²·(4kLC − d²)/(4L²C²). */
function attenuationSquaredAtPeak(network: LoadingNetwork): number {
  const lc = network.coilHenries * network.loadFarads
  const d = dampingSeconds(network)
  return (d / (2 * lc)) ** 2 * (4 * directLossFactor(network) * lc - d * d)
}

/** Height of the peak above 1 kHz; null when there is no peak. @returns dB */
export function peakHeightDecibels(network: LoadingNetwork): number | null {
  if (peakHertz(network) === null) return null
  return powerToDecibels(attenuationSquared(network, REFERENCE_HERTZ) / attenuationSquaredAtPeak(network))
}

/** Height of the peak above the level at 0 Hz; null when there is no peak. @returns dB */
export function peakHeightAboveBassDecibels(network: LoadingNetwork): number | null {
  if (peakHertz(network) === null) return null
  return powerToDecibels(directLossFactor(network) ** 2 / attenuationSquaredAtPeak(network))
}

/**
 * The highest frequency at which the response is `decibels` below its level at 1 kHz (3.000 dB unless said).
 * @returns hertz, or null when it never falls that far (no inductance and no capacitance, or nothing to work against)
 */
export function fallBelowReferenceHertz(network: LoadingNetwork, decibels = 3): number | null {
  return highestCrossing(network, attenuationSquared(network, REFERENCE_HERTZ) * 10 ** (decibels / 10))
}

/** The highest frequency of half the power of 0 Hz, −3.0103 dB. @returns hertz, or null when there is none */
export function halfPowerHertz(network: LoadingNetwork): number | null {
  return highestCrossing(network, 2 * directLossFactor(network) ** 2)
}

/** Highest root of D(ω) = target: (LC)²x² + (d² − 2kLC)x + k² − target = 0 in x = ω². */
function highestCrossing(network: LoadingNetwork, target: number): number | null {
  const lc = network.coilHenries * network.loadFarads
  const d = dampingSeconds(network)
  const k = directLossFactor(network)
  const b = d * d - 2 * k * lc
  const c = k * k - target
  const discriminant = b * b - 4 * lc * lc * c
  if (discriminant < 0) return null
  const root = Math.sqrt(discriminant)
  // Of the two forms of the same root, the one that adds like signs keeps its digits, and the first also holds for LC = 0.
  const x = b > 0 ? (-2 * c) / (b + root) : (root - b) / (2 * lc * lc)
  return x > 0 && Number.isFinite(x) ? Math.sqrt(x) / (2 * Math.PI) : null
}
