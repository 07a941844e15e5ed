import { newFloats } from './arrays'
import type { Draws } from './draws'
import { spread } from './ensemble'
import { fourKT, type Demand, type NoiseTable } from './frequency-tables'
import { angular } from './physics/constants'
import type { Setting, StepUp } from './preamp'

/**
 * The coil into its load, for every draw.
 *
 * | symbol | name | unit |
 * |---|---|---|
 * | R, L | coil (with a transformer: coil and windings seen from the secondary, n²(R+R_p)+R_s and n²L) | Ω, H |
 * | R_l, C | load resistance and all capacitance across it | Ω, F |
 * | D(ω²) | 1/|H|², a quadratic in ω²: (a − bω²)² + c²ω², a = 1+R/R_l, b = LC, c = L/R_l + RC | – |
 *
 * The transformer's own inductance is left out here: at 1 kHz it costs a few thousandths of a decibel; its corner
 * in the bass is a figure of its own.
 */
export interface NetworkDraws {
  count: number
  /** Open-circuit volts at the preamp's side, nominal level. */
  emfVolts: Float64Array
  coilOhms: Float64Array
  coilHenries: Float64Array
  loadOhms: Float64Array
  farads: Float64Array
  /** D = d0 + d1·w2 + d2·w2², and its value at 1 kHz. */
  d0: Float64Array
  d1: Float64Array
  d2: Float64Array
  at1kHz: Float64Array
}

const W2_1KHZ = angular(1000) ** 2

/** Whether this setting's signal passes a transformer, the owner's or the one built into the input. */
export function stepUpOf(draws: Draws, setting: Setting): StepUp | null {
  return draws.inputs.stepUp ?? setting.path.stepUp
}

export function drawNetwork(draws: Draws, setting: Setting): NetworkDraws {
  const { values, ensemble } = draws
  const count = ensemble.count
  const load = spread(setting.loadOhms, 'inputLoad', ensemble)
  const input = spread(setting.inputFarads, 'inputCapacitance', ensemble)
  const transformer = stepUpOf(draws, setting)
  const make = () => newFloats(count)
  const network: NetworkDraws = {
    count,
    emfVolts: make(),
    coilOhms: make(),
    coilHenries: make(),
    loadOhms: load,
    farads: make(),
    d0: make(),
    d1: make(),
    d2: make(),
    at1kHz: make(),
  }
  for (let i = 0; i < count; i++) {
    const outside = values.armWiring[i] + values.lead[i]
    const n = transformer ? values.stepUpRatio[i] : 1
    const series = transformer ? values.stepUpPrimary[i] : 0
    const secondary = transformer ? values.stepUpSecondary[i] : 0
    // Capacitance before the transformer lies across the low source and is n² times less at the secondary: left out.
    const farads = input[i] + (transformer ? values.stepUpCapacitance[i] : outside)
    const R = n * n * (values.coilResistance[i] + series) + secondary
    const L = n * n * values.inductance[i]
    const a = 1 + R / load[i]
    const b = L * farads
    const c = L / load[i] + R * farads
    network.emfVolts[i] = n * values.output[i]
    network.coilOhms[i] = R
    network.coilHenries[i] = L
    network.farads[i] = farads
    network.d0[i] = a * a
    network.d1[i] = c * c - 2 * a * b
    network.d2[i] = b * b
    network.at1kHz[i] = network.d0[i] + W2_1KHZ * (network.d1[i] + W2_1KHZ * network.d2[i])
  }
  return network
}

/** Largest demand/D over the table for each draw: how far the record's tallest peak goes, squared, and where. */
export interface Tallest {
  power: Float64Array
  hertz: Float64Array
}

export function tallest(network: NetworkDraws, { w2, demand, hertz }: Demand): Tallest {
  const power = newFloats(network.count)
  const at = newFloats(network.count)
  for (let i = 0; i < network.count; i++) {
    const d0 = network.d0[i]
    const d1 = network.d1[i]
    const d2 = network.d2[i]
    let best = 0
    let where = 0
    for (let k = 0; k < w2.length; k++) {
      const value = demand[k] / (d0 + w2[k] * (d1 + w2[k] * d2))
      if (value > best) {
        best = value
        where = k
      }
    }
    power[i] = best * network.at1kHz[i]
    at[i] = hertz[where]
  }
  return { power, hertz: at }
}

/** The noise integrals of a network: thermal in V², and what multiplies i_n², in Ω²·Hz. */
export interface NoiseDraws {
  thermalFlat: Float64Array
  thermalWeighted: Float64Array
  currentFlat: Float64Array
  currentWeighted: Float64Array
}

/**
 * Re Z and |Z|² of the parallel network share the denominator D: |Z|² = (R² + ω²L²)/D and
 * Re Z = (R + (R² + ω²L²)/R_l)/D. Thermal noise is 4kT·Re Z, load resistor included.
 */
export function noiseDraws(network: NetworkDraws, table: NoiseTable, kelvin: number): NoiseDraws {
  const make = () => newFloats(network.count)
  const noise = { thermalFlat: make(), thermalWeighted: make(), currentFlat: make(), currentWeighted: make() }
  const { w2, flat, weighted } = table
  const boltzmann = fourKT(kelvin)
  for (let i = 0; i < network.count; i++) {
    const R = network.coilOhms[i]
    const R2 = R * R
    const L2 = network.coilHenries[i] ** 2
    const conductance = 1 / network.loadOhms[i]
    const d0 = network.d0[i]
    const d1 = network.d1[i]
    const d2 = network.d2[i]
    let tf = 0
    let tw = 0
    let cf = 0
    let cw = 0
    for (let k = 0; k < w2.length; k++) {
      const w = w2[k]
      const inverse = 1 / (d0 + w * (d1 + w * d2))
      const coil = (R2 + w * L2) * inverse
      const real = R * inverse + coil * conductance
      tf += flat[k] * real
      tw += weighted[k] * real
      cf += flat[k] * coil
      cw += weighted[k] * coil
    }
    noise.thermalFlat[i] = boltzmann * tf
    noise.thermalWeighted[i] = boltzmann * tw
    noise.currentFlat[i] = cf
    noise.currentWeighted[i] = cw
  }
  return noise
}

/** Response re 1 kHz at a frequency, dB, for one draw. */
export function deviationDecibels(network: NetworkDraws, i: number, hertz: number): number {
  const w = angular(hertz) ** 2
  return 10 * Math.log10(network.at1kHz[i] / (network.d0[i] + w * (network.d1[i] + w * network.d2[i])))
}
