/**
 * From the preamp's output over a cable into the next input.
 *
 * | symbol | name                                  | unit | source                          |
 * |--------|---------------------------------------|------|---------------------------------|
 * | Ro, Ck | output resistance, coupling capacitor (Infinity for none) | Ω, F |             |
 * | Ri, Cc | input resistance (loads in parallel), cable capacitance | Ω, F |               |
 * | k      | 1 + Ro/Ri, the midband divider        | 1    | circuit theory                  |
 * | m      | k + Cc/Ck                             | 1    | circuit theory                  |
 * | 1/|H|² | m² + (ω·Ro·Cc − 1/(ω·Ck·Ri))²          | 1    | H = Z_i/(Ro + 1/jωCk + Z_i)     |
 *
 * Valid: Ro ≥ 0, Ri > 0, Cc ≥ 0, Ck > 0.
 */
import { REFERENCE_HERTZ, angular } from './constants'
import { powerToDecibels, toDecibels } from './decibels'
import { parallelOhms } from './loading'

export interface LineNetwork {
  readonly outputOhms: number
  /** Infinity when nothing but wire couples the output. */
  readonly couplingFarads: number
  readonly cableFarads: number
  readonly inputOhms: number
}

function midbandFactor({ outputOhms, inputOhms }: LineNetwork): number {
  return 1 + outputOhms / inputOhms
}

function lineAttenuationSquared(network: LineNetwork, hertz: number): number {
  const { outputOhms, couplingFarads, cableFarads, inputOhms } = network
  const w = angular(hertz)
  const real = midbandFactor(network) + cableFarads / couplingFarads
  const imaginary = w * outputOhms * cableFarads - 1 / (w * couplingFarads * inputOhms)
  return real * real + imaginary * imaginary
}

/** Loss of the plain divider, −20·log10(1 + Ro/Ri). @returns dB, negative for a loss */
export function midbandLossDecibels(network: LineNetwork): number {
  return -toDecibels(midbandFactor(network))
}

/** Response re the unloaded output. At 0 Hz behind a capacitor it is −Infinity. @returns dB */
export function lineResponseDecibels(network: LineNetwork, hertz: number): number {
  // At 0 Hz without a capacitor only the divider is left; the general form would divide zero by zero.
  if (hertz === 0 && network.couplingFarads === Infinity) return midbandLossDecibels(network)
  return -powerToDecibels(lineAttenuationSquared(network, hertz))
}

/** Response at 1 kHz re the unloaded output. @returns dB */
export function lineLossDecibels(network: LineNetwork): number {
  return lineResponseDecibels(network, REFERENCE_HERTZ)
}

/** Response re midband: at 20 kHz what the cable costs, at 20 Hz what the capacitor costs. @returns dB */
export function lineDeviationDecibels(network: LineNetwork, hertz: number): number {
  return lineResponseDecibels(network, hertz) - midbandLossDecibels(network)
}

/** Treble corner as a single pole, 1/(2π·(Ro ‖ Ri)·Cc). @returns hertz, or null when nothing limits the treble */
export function trebleCornerSimpleHertz({ outputOhms, inputOhms, cableFarads }: LineNetwork): number | null {
  const seconds = parallelOhms(outputOhms, inputOhms) * cableFarads
  return seconds > 0 ? 1 / (2 * Math.PI * seconds) : null
}

/** Bass corner as a single pole, 1/(2π·(Ro + Ri)·Ck). @returns hertz, or null without a capacitor */
export function bassCornerSimpleHertz({ outputOhms, inputOhms, couplingFarads }: LineNetwork): number | null {
  const seconds = (outputOhms + inputOhms) * couplingFarads
  return Number.isFinite(seconds) ? 1 / (2 * Math.PI * seconds) : null
}

/**
 * Half power re midband of the whole network, at the top: the larger root of (ω·Ro·Cc − 1/(ω·Ck·Ri))² = 2k² − m².
 * @returns hertz, or null when nothing limits the treble or midband is never reached
 */
export function trebleCornerExactHertz(network: LineNetwork): number | null {
  const parts = halfPowerParts(network)
  if (parts === null || parts.trebleSeconds === 0) return null
  const { spread, root, trebleSeconds } = parts
  return (spread + root) / (2 * trebleSeconds) / (2 * Math.PI)
}

/** The same at the bottom. @returns hertz, or null without a capacitor or when midband is never reached */
export function bassCornerExactHertz(network: LineNetwork): number | null {
  const parts = halfPowerParts(network)
  if (parts === null || parts.bassRadians === 0) return null
  // The root written so that like signs add; it holds for a cable without capacitance as well.
  return (2 * parts.bassRadians) / (parts.spread + parts.root) / (2 * Math.PI)
}

function halfPowerParts(network: LineNetwork) {
  const { outputOhms, couplingFarads, cableFarads, inputOhms } = network
  const k = midbandFactor(network)
  const rest = 2 * k * k - (k + cableFarads / couplingFarads) ** 2
  // A coupling capacitor hardly larger than the cable's leaves no midband to be 3 dB below.
  if (!(rest > 0)) return null
  const spread = Math.sqrt(rest)
  const trebleSeconds = outputOhms * cableFarads
  const bassRadians = 1 / (couplingFarads * inputOhms)
  return { spread, root: Math.sqrt(rest + 4 * trebleSeconds * bassRadians), trebleSeconds, bassRadians }
}
