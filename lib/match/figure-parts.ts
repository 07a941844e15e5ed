import { newFloats } from './arrays'
import type { Draws } from './draws'
import { spread } from './ensemble'
import { deviationDecibels, stepUpOf, type NetworkDraws } from './network-draws'
import { angular } from './physics/constants'
import type { Setting } from './preamp'

/** Single figures over the draws, each from the network or from what lies outside the preamp's switches. */

const W2_AT = { low: angular(1000) ** 2, high: angular(15_000) ** 2, cable: angular(20_000) ** 2 }

/** An array of one value a draw. */
export function each(count: number, of: (i: number) => number): Float64Array {
  const values = newFloats(count)
  for (let i = 0; i < count; i++) values[i] = of(i)
  return values
}

/** What the coil sees at 1 kHz as a resistance: the load, or the load and windings through the transformer. */
export function cartridgeLoad({ values, inputs }: Draws, setting: Setting, network: NetworkDraws, i: number): number {
  if (!inputs.stepUp && !setting.path.stepUp) return network.loadOhms[i]
  const n = values.stepUpRatio[i]
  return values.stepUpPrimary[i] + (values.stepUpSecondary[i] + network.loadOhms[i]) / (n * n)
}

/** Largest lift and deepest fall between 1 and 15 kHz. D is convex in ω², so its ends and its lowest point decide. */
export function tiltDraws({ count, d0, d1, d2, at1kHz }: NetworkDraws) {
  const liftDecibels = newFloats(count)
  const fallDecibels = newFloats(count)
  const D = (i: number, w: number) => d0[i] + w * (d1[i] + w * d2[i])
  for (let i = 0; i < count; i++) {
    const bottom = d2[i] > 0 ? Math.min(Math.max(-d1[i] / (2 * d2[i]), W2_AT.low), W2_AT.high) : d1[i] < 0 ? W2_AT.high : W2_AT.low
    liftDecibels[i] = 10 * Math.log10(at1kHz[i] / Math.min(D(i, bottom), at1kHz[i]))
    fallDecibels[i] = 10 * Math.log10(at1kHz[i] / Math.max(D(i, W2_AT.high), at1kHz[i]))
  }
  return { liftDecibels, fallDecibels }
}

const DROP_3DB = 10 ** 0.3

/** Response re 1 kHz at the pitches that leaflets name. */
export function responseDraws(network: NetworkDraws) {
  const at = (hertz: number) => each(network.count, (i) => deviationDecibels(network, i, hertz))
  return { at10kHzDecibels: at(10_000), at15kHzDecibels: at(15_000), at20kHzDecibels: at(20_000) }
}

/**
 * Resonance of the coil, peak re 1 kHz, and the highest point 3.000 dB down. Each is null when any draw lacks it
 * (no capacitance or inductance at all, no peak): a range over draws of which some have none would mislead.
 */
export function resonanceDraws({ count, coilHenries, farads, d0, d1, d2, at1kHz }: NetworkDraws) {
  const twoPi = 2 * Math.PI
  const resonanceHertz = each(count, (i) => 1 / (twoPi * Math.sqrt(coilHenries[i] * farads[i])))
  const bottom = each(count, (i) => -d1[i] / (2 * d2[i]))
  const peakHertz = each(count, (i) => Math.sqrt(bottom[i]) / twoPi)
  const peakDecibels = each(count, (i) => 10 * Math.log10(at1kHz[i] / (d0[i] + bottom[i] * (d1[i] + bottom[i] * d2[i]))))
  const minus3dBHertz = each(count, (i) => {
    const short = d0[i] - at1kHz[i] * DROP_3DB
    const root = d2[i] > 0 ? (-d1[i] + Math.sqrt(d1[i] * d1[i] - 4 * d2[i] * short)) / (2 * d2[i]) : -short / d1[i]
    return Math.sqrt(root) / twoPi
  })
  const whole = (values: Float64Array) => (values.every(Number.isFinite) ? values : null)
  const peaked = bottom.every((w) => w > 0) ? whole(peakHertz) : null
  return {
    resonanceHertz: whole(resonanceHertz),
    peakHertz: peaked,
    peakDecibels: peaked ? whole(peakDecibels) : null,
    minus3dBHertz: whole(minus3dBHertz),
  }
}

/** Where the transformer's own inductance takes 3 dB from the bass: source and reflected load in parallel over 2πL. */
export function stepUpCorner(draws: Draws, setting: Setting): Float64Array | null {
  if (!stepUpOf(draws, setting)?.primaryHenries) return null
  const { values } = draws
  const load = spread(setting.loadOhms, 'inputLoad', draws.ensemble)
  return each(load.length, (i) => {
    const source = values.coilResistance[i] + values.stepUpPrimary[i]
    const reflected = (values.stepUpSecondary[i] + load[i]) / values.stepUpRatio[i] ** 2
    return (source * reflected) / (source + reflected) / (2 * Math.PI * values.stepUpInductance[i])
  })
}

/** Figures that no switch changes: the arm, and the way from output socket to next input. */
export function figuresOutside({ values, inputs, ensemble }: Draws) {
  const { count } = ensemble
  const armResonanceHertz = each(count, (i) => {
    const mass = values.armMass[i] + values.cartridgeMass[i] + values.fixings[i]
    return 1 / (2 * Math.PI * Math.sqrt(mass * values.compliance[i]))
  })
  const source = (i: number) => (values.outputResistance[i] * values.nextResistance[i]) / (values.outputResistance[i] + values.nextResistance[i])
  const cableLossAt20kHzDecibels = each(count, (i) => -10 * Math.log10(1 + W2_AT.cable * (source(i) * values.cable[i]) ** 2))
  const bassCornerHertz = inputs.preamp.couplingFarads
    ? each(count, (i) => 1 / (2 * Math.PI * (values.outputResistance[i] + values.nextResistance[i]) * values.couplingCapacitor[i]))
    : null
  const dividerLossDecibels = each(count, (i) => 20 * Math.log10(values.nextResistance[i] / (values.nextResistance[i] + values.outputResistance[i])))
  return { armResonanceHertz, cableLossAt20kHzDecibels, bassCornerHertz, dividerLossDecibels }
}
