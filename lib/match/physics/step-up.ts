/**
 * A step-up transformer between a moving coil and a moving-magnet input.
 *
 * | symbol     | name                                             | unit | source            |
 * |------------|--------------------------------------------------|------|-------------------|
 * | n          | secondary turns over primary turns               | 1    |                   |
 * | Rp, Rs     | winding resistances                              | Ω    |                   |
 * | Lp         | primary inductance; null or Infinity: not known, taken as endless | H | |
 * | Z_th       | source seen at the secondary                     | Ω    | Thévenin          |
 * | Rp+(Rs+Rl)/n² | load that the coil sees                       | Ω    | ideal transformer |
 *
 * Network: EMF, R + L + Rp in series, Lp across, ideal 1:n, Rs, then Rl and C across. Leakage inductance and winding
 * capacitance are not in it unless added to C: they shape what lies above the audio band.
 * Valid: n > 0, all resistances and capacitances ≥ 0, Lp > 0, Rl > 0.
 */
import { ONE, add, divide, magnitude, multiply, scale, type Complex } from './complex'
import { REFERENCE_HERTZ, angular } from './constants'
import { toDecibels } from './decibels'
import { fallBelowReferenceHertz, parallelOhms, type LoadingNetwork } from './loading'

export interface StepUpNetwork extends LoadingNetwork {
  readonly turnsRatio: number
  readonly primaryOhms: number
  readonly secondaryOhms: number
  readonly primaryHenries: number | null
}

/** Turns ratio of a label of two impedances, √(secondary/primary): 150 : 50k is 1:18. @returns 1 */
export function turnsRatioOfImpedances({ primaryOhms, secondaryOhms }: { primaryOhms: number; secondaryOhms: number }): number {
  return Math.sqrt(secondaryOhms / primaryOhms)
}

/** 20·log10 n. @returns dB */
export function turnsGainDecibels({ turnsRatio }: Pick<StepUpNetwork, 'turnsRatio'>): number {
  return toDecibels(turnsRatio)
}

/** Rl/n², the load through an ideal transformer. @returns ohms */
export function reflectedLoadOhms({ loadOhms, turnsRatio }: Pick<StepUpNetwork, 'loadOhms' | 'turnsRatio'>): number {
  return loadOhms / turnsRatio ** 2
}

/** Rp + (Rs + Rl)/n², the load with the windings in it. @returns ohms */
export function reflectedLoadWithWindingsOhms({ loadOhms, turnsRatio, primaryOhms, secondaryOhms }: StepUpNetwork): number {
  return primaryOhms + (secondaryOhms + loadOhms) / turnsRatio ** 2
}

/** n²·C, the capacitance that the coil sees. @returns farads */
export function reflectedFarads({ loadFarads, turnsRatio }: Pick<StepUpNetwork, 'loadFarads' | 'turnsRatio'>): number {
  return loadFarads * turnsRatio ** 2
}

/** Rp + Rs/n², what the windings add to the coil. @returns ohms */
export function windingOhms({ turnsRatio, primaryOhms, secondaryOhms }: StepUpNetwork): number {
  return primaryOhms + secondaryOhms / turnsRatio ** 2
}

/**
 * The same circuit without its primary inductance, brought to the secondary: a coil of n²(R + Rp) + Rs and n²L with
 * n times the EMF. Exact when the primary inductance is null, the treble of it otherwise.
 */
export function equivalentLoading(network: StepUpNetwork): LoadingNetwork {
  const squared = network.turnsRatio ** 2
  return {
    coilOhms: squared * (network.coilOhms + network.primaryOhms) + network.secondaryOhms,
    coilHenries: squared * network.coilHenries,
    loadOhms: network.loadOhms,
    loadFarads: network.loadFarads,
  }
}

/** Whether the primary inductance is in the circuit: null and Infinity both mean that it is not. */
export function hasPrimaryInductance({ primaryHenries }: StepUpNetwork): boolean {
  return primaryHenries !== null && Number.isFinite(primaryHenries)
}

/** Source before the load: open-circuit gain re EMF and the Thévenin impedance at the secondary. */
function source(network: StepUpNetwork, hertz: number): { gain: Complex; ohms: Complex } {
  const { coilOhms, coilHenries, turnsRatio, primaryOhms, secondaryOhms, primaryHenries } = network
  const w = angular(hertz)
  const series: Complex = { re: coilOhms + primaryOhms, im: w * coilHenries }
  const squared = turnsRatio ** 2
  if (primaryHenries === null || !Number.isFinite(primaryHenries)) {
    return { gain: { re: turnsRatio, im: 0 }, ohms: { re: series.re * squared + secondaryOhms, im: series.im * squared } }
  }
  // At 0 Hz the primary inductance is a short: no output, and only the secondary winding is left as a source.
  if (w === 0) return { gain: { re: 0, im: 0 }, ohms: { re: secondaryOhms, im: 0 } }
  const across: Complex = { re: 0, im: w * primaryHenries }
  const share = divide(across, add(series, across))
  const ohms = scale(multiply(series, share), squared)
  return { gain: scale(share, turnsRatio), ohms: { re: ohms.re + secondaryOhms, im: ohms.im } }
}

function loadSiemens({ loadOhms, loadFarads }: LoadingNetwork, hertz: number): Complex {
  return { re: 1 / loadOhms, im: angular(hertz) * loadFarads }
}

/** 1 + Z_th·Y: the factor by which the load divides gain and impedance. */
function divider(network: StepUpNetwork, ohms: Complex, hertz: number): Complex {
  return add(ONE, multiply(ohms, loadSiemens(network, hertz)))
}

/** Voltage at the preamp over the cartridge's EMF, with everything connected. @returns 1 */
export function netGain(network: StepUpNetwork, hertz: number): number {
  const { gain, ohms } = source(network, hertz)
  return magnitude(gain) / magnitude(divider(network, ohms, hertz))
}

/** Net gain at 1 kHz less the gain of the turns. @returns dB, negative for a loss */
export function lossFromTurnsGainDecibels(network: StepUpNetwork): number {
  return toDecibels(netGain(network, REFERENCE_HERTZ) / network.turnsRatio)
}

/** Response re 1 kHz. @returns dB; −Infinity at 0 Hz with a primary inductance */
export function stepUpDeviationDecibels(network: StepUpNetwork, hertz: number): number {
  return toDecibels(netGain(network, hertz) / netGain(network, REFERENCE_HERTZ))
}

/** What the preamp sees looking back, its load included. @returns ohms */
export function stepUpNodeImpedance(network: StepUpNetwork, hertz: number): Complex {
  const { ohms } = source(network, hertz)
  return divide(ohms, divider(network, ohms, hertz))
}

/** What the coil sees, Rp + (jωLp ‖ (Rs + Z_load)/n²). @returns ohms */
export function cartridgeLoad(network: StepUpNetwork, hertz: number): Complex {
  const { turnsRatio, primaryOhms, secondaryOhms, primaryHenries } = network
  const y = loadSiemens(network, hertz)
  // With neither load nor capacitance only the primary inductance is left, and without that nothing at all.
  const open = y.re === 0 && y.im === 0
  const load = open ? null : divide(ONE, y)
  const reflected = load && { re: (load.re + secondaryOhms) / turnsRatio ** 2, im: load.im / turnsRatio ** 2 }
  if (primaryHenries === null || !Number.isFinite(primaryHenries)) {
    return reflected ? { re: reflected.re + primaryOhms, im: reflected.im } : { re: Infinity, im: 0 }
  }
  const across: Complex = { re: 0, im: angular(hertz) * primaryHenries }
  if (across.im === 0) return { re: primaryOhms, im: 0 }
  const both = reflected ? divide(multiply(reflected, across), add(reflected, across)) : across
  return { re: both.re + primaryOhms, im: both.im }
}

/**
 * Half-power corner of the bass, R_par/(2π·Lp) with R_par = (R + Rp) ‖ (Rs + Rl)/n²; coil inductance and capacitance
 * play no part so low. @returns hertz, or null when the primary inductance is not known
 */
export function bassCornerHertz(network: StepUpNetwork): number | null {
  const { coilOhms, primaryOhms, secondaryOhms, loadOhms, turnsRatio, primaryHenries } = network
  if (primaryHenries === null || !Number.isFinite(primaryHenries)) return null
  const ohms = parallelOhms(coilOhms + primaryOhms, (secondaryOhms + loadOhms) / turnsRatio ** 2)
  return ohms / (2 * Math.PI * primaryHenries)
}

/**
 * Highest frequency 3.000 dB below 1 kHz, for the circuit without primary inductance; with one, its effect on the
 * level at 1 kHz is left out. @returns hertz, or null when it never falls so far
 */
export function trebleCornerHertz(network: StepUpNetwork): number | null {
  return fallBelowReferenceHertz(equivalentLoading(network))
}
