import type { Draws } from './draws'
import { rangeOf, spread } from './ensemble'
import { demandTable, equalisedLimit, filterPower, inputLimit, marginGrid, noiseTable, type Demand } from './frequency-tables'
import { allowedInputVolts } from './physics/overload'
import { deviationDecibels, drawNetwork, noiseDraws, stepUpOf, tallest, type NetworkDraws, type NoiseDraws, type Tallest } from './network-draws'
import { angular } from './physics/constants'
import { DIGITAL_SOURCE_VOLTS } from './physics/level'
import { playbackPower } from './physics/riaa'
import type { Filter } from './controls'
import type { UnknownName } from './inputs'
import type { Quantity } from './quantity'
import type { GainOption, Setting } from './preamp'
import type { FigureName, Figures } from './result'

/** Every figure of one setting, one array over the draws; null where the figure has no meaning. */
export type FigureDraws = Record<FigureName, Float64Array | null> & {
  inputVolts: Float64Array
  outputVolts: Float64Array
}

/** How finely frequency is sampled. `quick` ranks combinations, `full` is what a sheet shows. */
export type Depth = 'quick' | 'full'
const MARGIN_POINTS = { quick: 40, full: 120 } as const
const NOISE_POINTS = { quick: 24, full: 48 } as const

const W2_AT = { low: angular(1000) ** 2, high: angular(15_000) ** 2, cable: angular(20_000) ** 2 }

/** 20·log10 of an array's values, each through `of`. */
function decibels(count: number, of: (i: number) => number): Float64Array {
  const values = new Float64Array(count)
  for (let i = 0; i < count; i++) values[i] = 20 * Math.log10(of(i))
  return values
}
function each(count: number, of: (i: number) => number): Float64Array {
  const values = new Float64Array(count)
  for (let i = 0; i < count; i++) values[i] = of(i)
  return values
}

/**
 * Works out the figures of settings of one set of inputs. Networks, noise integrals and the record's tallest peaks
 * depend on load and capacitance only, so settings that share those share the work.
 */
export class FigureBench {
  private readonly networks = new Map<string, { network: NetworkDraws; noise: NoiseDraws; peaks: Map<Demand, Tallest> }>()
  private readonly demands = new Map<string, Demand>()
  private readonly spreads = new Map<Quantity, Float64Array>()
  private readonly outside: Partial<Record<FigureName, Float64Array>>

  constructor(
    readonly draws: Draws,
    readonly depth: Depth,
  ) {
    this.outside = figuresOutside(draws)
  }

  network(setting: Setting) {
    const key = [setting.path.id, setting.loadOhms.low, setting.loadOhms.nominal, setting.inputFarads.nominal].join(' ')
    let known = this.networks.get(key)
    if (!known) {
      const network = drawNetwork(this.draws, setting)
      const table = noiseTable(this.draws.inputs.preamp.iecBass, NOISE_POINTS[this.depth])
      const noise = noiseDraws(network, table, this.draws.inputs.temperatureKelvin)
      known = { network, noise, peaks: new Map() }
      this.networks.set(key, known)
    }
    return known
  }

  /** The draws of one of the preamp's own quantities; settings share them. */
  private drawn(quantity: Quantity, name: UnknownName): Float64Array {
    let known = this.spreads.get(quantity)
    if (!known) {
      known = spread(quantity, name, this.draws.ensemble)
      this.spreads.set(quantity, known)
    }
    return known
  }

  /** What loud or extreme records ask of a stage, by the stage's own shape over frequency. */
  private demand(stage: 'input' | 'output' | 'next', gain: GainOption, level: 'loud' | 'extreme', filter: Filter | null): Demand {
    const { preamp } = this.draws.inputs
    const own = stage === 'input' && gain.overload.length > 1 ? gain.id : ''
    const filterKey = stage === 'next' && filter ? `${filter.cornerHertz}/${filter.order}` : ''
    const shape = stage === 'input' ? preamp.topology : 'output-limited'
    const key = [shape, own, level, filterKey].join(' ')
    let known = this.demands.get(key)
    if (!known) {
      const limit = stage === 'input' ? inputLimit(preamp, gain) : equalisedLimit(preamp)
      const at1kHz = allowedInputVolts(limit, 1000)
      const behind = stage === 'next' ? filter : null
      known = demandTable(
        marginGrid(MARGIN_POINTS[this.depth], level),
        level,
        (hertz) => allowedInputVolts(limit, hertz) / at1kHz / Math.sqrt(filterPower(hertz, behind)),
      )
      this.demands.set(key, known)
    }
    return known
  }

  private peaks(setting: Setting, demand: Demand): Tallest {
    const { network, peaks } = this.network(setting)
    let known = peaks.get(demand)
    if (!known) {
      known = tallest(network, demand)
      peaks.set(demand, known)
    }
    return known
  }

  /** The preamp's own worst margin: its input stage, and its output where that is a limit of its own. */
  private preampMargin(setting: Setting, level: 'loud' | 'extreme', inputVolts: Float64Array, outputOpenVolts: Float64Array) {
    const { preamp } = this.draws.inputs
    const count = inputVolts.length
    const input = this.peaks(setting, this.demand('input', setting.gain, level, null))
    const allowed = allowedInputVolts(inputLimit(preamp, setting.gain), 1000)
    const margin = each(count, (i) => 20 * Math.log10(allowed / inputVolts[i]) - 10 * Math.log10(input.power[i]))
    const hertz = input.hertz.slice()
    if (preamp.topology !== 'output-limited') {
      const output = this.peaks(setting, this.demand('output', setting.gain, level, null))
      const most = this.draws.values.maximumOutput
      for (let i = 0; i < count; i++) {
        const out = 20 * Math.log10(most[i] / outputOpenVolts[i]) - 10 * Math.log10(output.power[i])
        if (out < margin[i]) {
          margin[i] = out
          hertz[i] = output.hertz[i]
        }
      }
    }
    return { margin, hertz }
  }

  /** All figures of a setting; those that only a sheet shows are null at `quick` depth. */
  figures(setting: Setting): FigureDraws {
    const { draws } = this
    const { values, inputs } = draws
    const { network, noise } = this.network(setting)
    const { count } = network
    const gain = this.drawn(setting.gain.gainDecibels, 'gain')
    const en = this.drawn(setting.gain.voltageNoise, 'voltageNoise')
    const iN = this.drawn(setting.gain.currentNoise, 'currentNoise')
    const doubling = inputs.output === 'balanced' && inputs.preamp.hasBalancedOutput ? 2 : 1
    const inputVolts = each(count, (i) => network.emfVolts[i] / Math.sqrt(network.at1kHz[i]))
    const openVolts = each(count, (i) => inputVolts[i] * 10 ** (gain[i] / 20))
    const outputVolts = each(
      count,
      (i) => (openVolts[i] * doubling * values.nextResistance[i]) / (values.nextResistance[i] + values.outputResistance[i]),
    )
    const allowed = allowedInputVolts(inputLimit(inputs.preamp, setting.gain), 1000)
    const preampLoud = this.preampMargin(setting, 'loud', inputVolts, openVolts)
    const next = this.peaks(setting, this.demand('next', setting.gain, 'loud', setting.filter))
    const table = noiseTable(inputs.preamp.iecBass, NOISE_POINTS[this.depth])
    const snr = (thermal: Float64Array, current: Float64Array, band: number) =>
      each(count, (i) => -10 * Math.log10((thermal[i] + en[i] ** 2 * band + iN[i] ** 2 * current[i]) / inputVolts[i] ** 2))
    const load = each(count, (i) => cartridgeLoad(draws, setting, network, i))
    const tilt = tiltDraws(network)
    const quick: Partial<FigureDraws> = {
      inputVolts,
      outputVolts,
      overloadMarginDecibels: decibels(count, (i) => allowed / inputVolts[i]),
      worstMarginDecibels: preampLoud.margin,
      worstMarginHertz: preampLoud.hertz,
      nextMarginDecibels: each(count, (i) => 20 * Math.log10(values.nextMaximum[i] / outputVolts[i]) - 10 * Math.log10(next.power[i])),
      nextMarginHertz: next.hertz,
      cartridgeLoadOhms: load,
      loadRatio: each(count, (i) => load[i] / Math.max(values.coilResistance[i], Number.MIN_VALUE)),
      totalFarads: network.farads,
      ...tilt,
      snrWeightedDecibels: snr(noise.thermalWeighted, noise.currentWeighted, table.weightedHertz),
      ...this.outside,
    }
    return { ...NONE, ...quick, ...(this.depth === 'full' ? this.fullFigures(setting, quick, snr(noise.thermalFlat, noise.currentFlat, table.flatHertz)) : {}) } as FigureDraws
  }

  private fullFigures(setting: Setting, quick: Partial<FigureDraws>, snrFlatDecibels: Float64Array): Partial<FigureDraws> {
    const { draws } = this
    const { network, noise } = this.network(setting)
    const { count } = network
    const inputVolts = quick.inputVolts as Float64Array
    const outputVolts = quick.outputVolts as Float64Array
    const gain = this.drawn(setting.gain.gainDecibels, 'gain')
    const openVolts = each(count, (i) => inputVolts[i] * 10 ** (gain[i] / 20))
    const extreme = this.preampMargin(setting, 'extreme', inputVolts, openVolts)
    const arm = quick.armResonanceHertz as Float64Array
    const attenuation = (hertz: (i: number) => number) => each(count, (i) => 10 * Math.log10(filterPower(hertz(i), setting.filter)))
    return {
      snrFlatDecibels,
      outputDecibelVolts: decibels(count, (i) => outputVolts[i]),
      outputReDigitalDecibels: decibels(count, (i) => outputVolts[i] / DIGITAL_SOURCE_VOLTS),
      levelLossDecibels: each(count, (i) => -10 * Math.log10(network.at1kHz[i])),
      extremeMarginDecibels: extreme.margin,
      at10kHzDecibels: each(count, (i) => deviationDecibels(network, i, 10_000)),
      at15kHzDecibels: each(count, (i) => deviationDecibels(network, i, 15_000)),
      at20kHzDecibels: each(count, (i) => deviationDecibels(network, i, 20_000)),
      ...resonanceDraws(network),
      coilSnrWeightedDecibels: each(count, (i) => -10 * Math.log10(noise.thermalWeighted[i] / inputVolts[i] ** 2)),
      filterAtResonanceDecibels: attenuation((i) => arm[i]),
      filterAt4HertzDecibels: attenuation(() => 4),
      filterAt20HertzDecibels: attenuation(() => 20),
      riaaAtResonanceDecibels: each(count, (i) => 10 * Math.log10(playbackPower(arm[i], { with7950: draws.inputs.preamp.iecBass }))),
      stepUpBassCornerHertz: stepUpCorner(draws, setting),
    }
  }
}

const NONE = {
  extremeMarginDecibels: null,
  resonanceHertz: null,
  peakHertz: null,
  peakDecibels: null,
  minus3dBHertz: null,
  stepUpBassCornerHertz: null,
  bassCornerHertz: null,
} satisfies Partial<Record<FigureName, null>>

/** What the coil sees at 1 kHz as a resistance: the load, or the load and windings through the transformer. */
function cartridgeLoad({ values, inputs }: Draws, setting: Setting, network: NetworkDraws, i: number): number {
  if (!inputs.stepUp && !setting.path.stepUp) return network.loadOhms[i]
  const n = values.stepUpRatio[i]
  return values.stepUpPrimary[i] + (values.stepUpSecondary[i] + network.loadOhms[i]) / (n * n)
}

/** Largest lift and deepest fall between 1 and 15 kHz. D is convex in ω², so its ends and its lowest point decide. */
function tiltDraws({ count, d0, d1, d2, at1kHz }: NetworkDraws) {
  const liftDecibels = new Float64Array(count)
  const fallDecibels = new Float64Array(count)
  const D = (i: number, w: number) => d0[i] + w * (d1[i] + w * d2[i])
  for (let i = 0; i < count; i++) {
    const bottom = d2[i] > 0 ? Math.min(Math.max(-d1[i] / (2 * d2[i]), W2_AT.low), W2_AT.high) : d1[i] < 0 ? W2_AT.high : W2_AT.low
    liftDecibels[i] = 10 * Math.log10(at1kHz[i] / Math.min(D(i, bottom), at1kHz[i]))
    fallDecibels[i] = 10 * Math.log10(at1kHz[i] / Math.max(D(i, W2_AT.high), at1kHz[i]))
  }
  return { liftDecibels, fallDecibels }
}

const DROP_3DB = 10 ** 0.3

/**
 * Resonance of the coil, peak re 1 kHz, and the highest point 3.000 dB down. Each is null when any draw lacks it
 * (no capacitance or inductance at all, no peak): a range over draws of which some have none would mislead.
 */
function resonanceDraws({ count, coilHenries, farads, d0, d1, d2, at1kHz }: NetworkDraws) {
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
function stepUpCorner(draws: Draws, setting: Setting): Float64Array | null {
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
function figuresOutside({ values, inputs, ensemble }: Draws): Partial<Record<FigureName, Float64Array>> {
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
  const dividerLossDecibels = decibels(count, (i) => values.nextResistance[i] / (values.nextResistance[i] + values.outputResistance[i]))
  return { armResonanceHertz, cableLossAt20kHzDecibels, ...(bassCornerHertz ? { bassCornerHertz } : {}), dividerLossDecibels }
}

/** The ranges of every figure over the draws. */
export function rangesOf(draws: FigureDraws): Figures {
  return Object.fromEntries(
    Object.entries(draws).map(([name, values]) => [name, values ? rangeOf(values) : null]),
  ) as unknown as Figures
}
