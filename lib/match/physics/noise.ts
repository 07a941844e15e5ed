/**
 * Hiss of a cartridge and a preamp at the preamp's input, equalised, 20 Hz to 20 kHz, flat or A-weighted.
 *
 * | symbol   | name                                              | unit  | source                          |
 * |----------|---------------------------------------------------|-------|---------------------------------|
 * | Z(f)     | node impedance, load included                     | Ω     | loading.ts, step-up.ts          |
 * | W(f)     | |RIAA|² or |RIAA|²·|A|², 1 at 1 kHz                | 1     | riaa.ts, weighting.ts           |
 * | 4kT·Re Z | thermal noise density squared                     | V²/Hz | Nyquist 1928                    |
 * | e_n, i_n | the preamp's voltage and current noise, white, uncorrelated | V/√Hz, A/√Hz | noisy two-port, Rothe and Dahlke 1956 |
 * | total²   | 4kT·∫Re Z·W df + e_n²·∫W df + i_n²·∫|Z|²·W df      | V²    | sum of uncorrelated powers      |
 *
 * The thermal part follows Re Z of the whole network, not the coil's resistance and not |Z|. The three integrals are
 * kept apart because temperature, e_n and i_n then cost nothing to change. One temperature for all resistors.
 */
import { BOLTZMANN_JOULES_PER_KELVIN, REFERENCE_HERTZ, ZERO_CELSIUS_KELVIN, angular } from './constants'
import { toDecibels } from './decibels'
import { dampingSeconds, directLossFactor, loadingMagnitude, naturalHertz, qualityFactor, type LoadingNetwork } from './loading'
import { noisePoints } from './noise-points'
import type { PlaybackCurve } from './riaa'
import { equivalentLoading, hasPrimaryInductance, netGain, stepUpNodeImpedance, type StepUpNetwork } from './step-up'

/** A cartridge straight into the preamp, or through a step-up transformer. */
export type NoiseNetwork = LoadingNetwork | StepUpNetwork

export interface NoiseIntegrals {
  /** ∫ Re Z·W df */
  readonly resistanceOhmHertz: number
  /** ∫ W df, the noise bandwidth */
  readonly bandwidthHertz: number
  /** ∫ |Z|²·W df */
  readonly impedanceSquaredOhmHertz: number
}

export interface WeightedNoiseIntegrals {
  readonly flat: NoiseIntegrals
  readonly aWeighted: NoiseIntegrals
}

/** The three integrals, flat and A-weighted, for one network. Accurate to 0.002 dB up to Q = 50. */
export function noiseIntegrals(network: NoiseNetwork, { with7950 = false }: PlaybackCurve = {}): WeightedNoiseIntegrals {
  const isStepUp = 'turnsRatio' in network
  const loading = isStepUp ? equivalentLoading(network) : network
  const points = noisePoints({ qualityFactor: qualityFactor(loading), naturalHertz: naturalHertz(loading), with7950 })
  const exact = isStepUp && hasPrimaryInductance(network) ? network : null

  const k = directLossFactor(loading)
  const d = dampingSeconds(loading)
  const lc = loading.coilHenries * loading.loadFarads
  const resistiveAtZero = loading.coilOhms * k
  const coilOhmsSquared = loading.coilOhms ** 2
  const coilHenriesSquared = loading.coilHenries ** 2
  let resistanceFlat = 0
  let resistanceA = 0
  let bandwidthFlat = 0
  let bandwidthA = 0
  let impedanceFlat = 0
  let impedanceA = 0
  for (let i = 0; i < points.hertz.length; i += 1) {
    const hertz = points.hertz[i]
    const flat = points.flat[i]
    const aWeighted = points.aWeighted[i]
    let resistance: number
    let impedanceSquared: number
    if (exact) {
      const z = stepUpNodeImpedance(exact, hertz)
      resistance = z.re
      impedanceSquared = z.re * z.re + z.im * z.im
    } else {
      // Written out from loading.ts: this line runs some ten thousand times in one recommendation.
      const w2 = angular(hertz) ** 2
      const squared = (k - w2 * lc) ** 2 + w2 * d * d
      resistance = (resistiveAtZero + (w2 * coilHenriesSquared) / loading.loadOhms) / squared
      impedanceSquared = (coilOhmsSquared + w2 * coilHenriesSquared) / squared
    }
    resistanceFlat += resistance * flat
    resistanceA += resistance * aWeighted
    bandwidthFlat += flat
    bandwidthA += aWeighted
    impedanceFlat += impedanceSquared * flat
    impedanceA += impedanceSquared * aWeighted
  }
  return {
    flat: { resistanceOhmHertz: resistanceFlat, bandwidthHertz: bandwidthFlat, impedanceSquaredOhmHertz: impedanceFlat },
    aWeighted: { resistanceOhmHertz: resistanceA, bandwidthHertz: bandwidthA, impedanceSquaredOhmHertz: impedanceA },
  }
}

export interface PreampNoise {
  readonly voltsPerRootHertz: number
  readonly amperesPerRootHertz: number
}

export interface NoiseVolts {
  readonly thermal: number
  readonly voltage: number
  readonly current: number
  readonly total: number
}

/** RMS noise at the preamp input, its three parts and their sum in power. @returns volts */
export function noiseVolts(
  integrals: NoiseIntegrals,
  { voltsPerRootHertz, amperesPerRootHertz, kelvin }: PreampNoise & { readonly kelvin: number },
): NoiseVolts {
  const thermal = Math.sqrt(4 * BOLTZMANN_JOULES_PER_KELVIN * kelvin * integrals.resistanceOhmHertz)
  const voltage = voltsPerRootHertz * Math.sqrt(integrals.bandwidthHertz)
  const current = amperesPerRootHertz * Math.sqrt(integrals.impedanceSquaredOhmHertz)
  return { thermal, voltage, current, total: Math.hypot(thermal, voltage, current) }
}

/** Cartridge output at the preamp input at 1 kHz, after load and transformer. @returns volts, as `emfVolts` */
export function inputVolts(network: NoiseNetwork, emfVolts: number): number {
  const gain = 'turnsRatio' in network ? netGain(network, REFERENCE_HERTZ) : loadingMagnitude(network, REFERENCE_HERTZ)
  return emfVolts * gain
}

/** Signal over noise. Without any noise it is Infinity. @returns dB */
export function signalToNoiseDecibels({ signalVolts, noise }: { signalVolts: number; noise: number }): number {
  return toDecibels(signalVolts / noise)
}

/** Total over thermal: what the preamp adds to the cartridge's own limit; 0 when neither makes noise. @returns dB */
export function noiseFigureDecibels({ thermal, total }: NoiseVolts): number {
  return total === 0 ? 0 : toDecibels(total / thermal)
}

/** Celsius to kelvin. @returns kelvin */
export function kelvinOf(celsius: number): number {
  return celsius + ZERO_CELSIUS_KELVIN
}
