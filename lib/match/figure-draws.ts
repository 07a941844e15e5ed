import { newFloats } from './arrays'
import type { Draws } from './draws'
import { rangeOf, spread } from './ensemble'
import { cartridgeLoad, each, figuresOutside, resonanceDraws, responseDraws, stepUpCorner, tiltDraws } from './figure-parts'
import { demandTable, equalisedLimit, filterPower, inputLimit, marginGrid, noiseTable, type Demand } from './frequency-tables'
import type { UnknownName } from './inputs'
import { drawNetwork, noiseDraws, tallest, type NetworkDraws } from './network-draws'
import { DIGITAL_SOURCE_VOLTS } from './physics/level'
import { allowedInputVolts } from './physics/overload'
import { playbackPower } from './physics/riaa'
import type { Setting } from './preamp'
import type { Quantity } from './quantity'
import type { FigureName, Figures } from './result'

/** Every figure of one setting, one array over the draws; null where the figure has no meaning. */
export type FigureDraws = Record<FigureName, Float64Array | null> & {
  inputVolts: Float64Array
  outputVolts: Float64Array
}

/** How finely frequency is sampled. `quick` ranks combinations, `full` is what a sheet shows. */
export type Depth = 'quick' | 'full'
const MARGIN_POINTS = { quick: 32, full: 120 } as const
const NOISE_POINTS = { quick: 24, full: 48 } as const

/**
 * Works out the figures of settings of one set of inputs. A figure depends on the network (load and capacitance), on
 * network and gain, or on the filter as well; arrays are worked out once for each of these and shared, so they must
 * not be written to.
 */
export class FigureBench {
  private readonly known = new Map<string, unknown>()
  private readonly keys = new WeakMap<Setting, SettingKeys>()
  private readonly spreads = new Map<Quantity, Float64Array>()
  private readonly outside: ReturnType<typeof figuresOutside>

  constructor(
    readonly draws: Draws,
    readonly depth: Depth,
  ) {
    this.outside = figuresOutside(draws)
  }

  private once<T>(key: string, make: () => T): T {
    if (!this.known.has(key)) this.known.set(key, make())
    return this.known.get(key) as T
  }

  /** Names of what settings share. Written once for each setting: numbers are slow to write out. */
  private keysOf(setting: Setting): SettingKeys {
    let keys = this.keys.get(setting)
    if (!keys) {
      const { path, loadOhms, inputFarads, gain, filter } = setting
      const network = `${path.id} ${loadOhms.low} ${loadOhms.nominal} ${inputFarads.nominal}`
      keys = { network, gain: `${network} ${gain.id}`, filter: filter ? `${filter.cornerHertz}/${filter.order}` : '' }
      this.keys.set(setting, keys)
    }
    return keys
  }

  /** The draws of one of the preamp's own quantities; settings share them. */
  private drawn(quantity: Quantity, name: UnknownName): Float64Array {
    let values = this.spreads.get(quantity)
    if (!values) {
      values = spread(quantity, name, this.draws.ensemble)
      this.spreads.set(quantity, values)
    }
    return values
  }

  /** All figures of a setting; those that only a sheet shows are null at `quick` depth. */
  figures(setting: Setting): FigureDraws {
    const { outside } = this
    const load = this.networkFigures(setting)
    const gain = this.gainFigures(setting)
    const next = this.filterFigures(setting)
    // Written out, name by name: this runs for every combination, and spreading objects would take most of the time.
    // Null is what ranking does not need.
    const quick: FigureDraws = {
      outputDecibelVolts: null,
      outputReDigitalDecibels: null,
      levelLossDecibels: null,
      extremeMarginDecibels: null,
      at10kHzDecibels: null,
      at15kHzDecibels: null,
      at20kHzDecibels: null,
      resonanceHertz: null,
      peakHertz: null,
      peakDecibels: null,
      minus3dBHertz: null,
      snrFlatDecibels: null,
      coilSnrWeightedDecibels: null,
      filterAtResonanceDecibels: null,
      filterAt4HertzDecibels: null,
      filterAt20HertzDecibels: null,
      riaaAtResonanceDecibels: null,
      stepUpBassCornerHertz: null,
      inputVolts: load.inputVolts,
      totalFarads: load.totalFarads,
      cartridgeLoadOhms: load.cartridgeLoadOhms,
      loadRatio: load.loadRatio,
      liftDecibels: load.liftDecibels,
      fallDecibels: load.fallDecibels,
      outputVolts: gain.outputVolts,
      overloadMarginDecibels: gain.overloadMarginDecibels,
      worstMarginDecibels: gain.worstMarginDecibels,
      worstMarginHertz: gain.worstMarginHertz,
      snrWeightedDecibels: gain.snrWeightedDecibels,
      nextMarginDecibels: next.nextMarginDecibels,
      nextMarginHertz: next.nextMarginHertz,
      armResonanceHertz: outside.armResonanceHertz,
      cableLossAt20kHzDecibels: outside.cableLossAt20kHzDecibels,
      bassCornerHertz: outside.bassCornerHertz,
      dividerLossDecibels: outside.dividerLossDecibels,
    }
    return this.depth === 'full' ? { ...quick, ...this.shownFigures(setting), ...this.shownByFilter(setting) } : quick
  }

  network(setting: Setting): NetworkDraws {
    return this.once(`network ${this.keysOf(setting).network}`, () => drawNetwork(this.draws, setting))
  }

  private networkFigures(setting: Setting) {
    return this.once(`load ${this.keysOf(setting).network}`, () => {
      const network = this.network(setting)
      const { count, emfVolts, at1kHz, farads } = network
      const cartridgeLoadOhms = each(count, (i) => cartridgeLoad(this.draws, setting, network, i))
      const coil = this.draws.values.coilResistance
      return {
        inputVolts: each(count, (i) => emfVolts[i] / Math.sqrt(at1kHz[i])),
        totalFarads: farads,
        cartridgeLoadOhms,
        loadRatio: each(count, (i) => cartridgeLoadOhms[i] / Math.max(coil[i], Number.MIN_VALUE)),
        ...tiltDraws(network),
      }
    })
  }

  private noise(setting: Setting) {
    return this.once(`noise ${this.keysOf(setting).network}`, () => {
      const { preamp, temperatureKelvin } = this.draws.inputs
      const table = noiseTable(preamp.iecBass, NOISE_POINTS[this.depth])
      return { table, ...noiseDraws(this.network(setting), table, temperatureKelvin) }
    })
  }

  private gainFigures(setting: Setting) {
    return this.once(`gain ${this.keysOf(setting).gain}`, () => {
      const { values, inputs } = this.draws
      const { inputVolts } = this.networkFigures(setting)
      const openVolts = this.openVolts(setting)
      const doubling = this.doubling()
      const divider = (i: number) => values.nextResistance[i] / (values.nextResistance[i] + values.outputResistance[i])
      const allowed = allowedInputVolts(inputLimit(inputs.preamp, setting.gain), 1000)
      const noise = this.noise(setting)
      const loud = this.preampMargin(setting, 'loud')
      return {
        outputVolts: each(openVolts.length, (i) => openVolts[i] * doubling * divider(i)),
        overloadMarginDecibels: each(openVolts.length, (i) => 20 * Math.log10(allowed / inputVolts[i])),
        worstMarginDecibels: loud.margin,
        worstMarginHertz: loud.hertz,
        snrWeightedDecibels: this.signalToNoise(setting, noise.thermalWeighted, noise.currentWeighted, noise.table.weightedHertz),
      }
    })
  }

  private filterFigures(setting: Setting) {
    const keys = this.keysOf(setting)
    return this.once(`filter ${keys.gain} ${keys.filter}`, () => {
      const { outputVolts } = this.gainFigures(setting)
      const { nextMaximum } = this.draws.values
      const peaks = this.peaks(setting, 'next', 'loud')
      return {
        nextMarginDecibels: each(outputVolts.length, (i) => 20 * Math.log10(nextMaximum[i] / outputVolts[i]) - 10 * Math.log10(peaks.power[i])),
        nextMarginHertz: peaks.hertz,
      }
    })
  }

  private doubling(): number {
    return this.draws.inputs.output === 'balanced' && this.draws.inputs.preamp.hasBalancedOutput ? 2 : 1
  }

  /** At the unbalanced output with nothing connected. */
  private openVolts(setting: Setting): Float64Array {
    return this.once(`open ${this.keysOf(setting).gain}`, () => {
      const { inputVolts } = this.networkFigures(setting)
      const gain = this.drawn(setting.gain.gainDecibels, 'gain')
      return each(inputVolts.length, (i) => inputVolts[i] * 10 ** (gain[i] / 20))
    })
  }

  private signalToNoise(setting: Setting, thermal: Float64Array, current: Float64Array, bandHertz: number): Float64Array {
    const { inputVolts } = this.networkFigures(setting)
    const voltageNoise = this.drawn(setting.gain.voltageNoise, 'voltageNoise')
    const currentNoise = this.drawn(setting.gain.currentNoise, 'currentNoise')
    return each(inputVolts.length, (i) => {
      const noise = thermal[i] + voltageNoise[i] ** 2 * bandHertz + currentNoise[i] ** 2 * current[i]
      return 10 * Math.log10(inputVolts[i] ** 2 / noise)
    })
  }

  /** What records ask of a stage, by the stage's own shape over frequency; input stages with measured points differ. */
  private demandKey({ gain }: Setting, stage: Stage, level: string, filterKey: string): string {
    const own = stage !== 'input' ? '' : gain.overload.length > 1 ? gain.id : 'input'
    return `${own} ${level} ${stage === 'next' ? filterKey : ''}`
  }

  private demand(setting: Setting, stage: Stage, level: 'loud' | 'extreme'): Demand {
    const { preamp } = this.draws.inputs
    return this.once(`demand ${this.demandKey(setting, stage, level, this.keysOf(setting).filter)}`, () => {
      const filter = stage === 'next' ? setting.filter : null
      const limit = stage === 'input' ? inputLimit(preamp, setting.gain) : equalisedLimit(preamp)
      const at1kHz = allowedInputVolts(limit, 1000)
      const grid = marginGrid(MARGIN_POINTS[this.depth], level)
      return demandTable(grid, level, (hertz) => allowedInputVolts(limit, hertz) / at1kHz / Math.sqrt(filterPower(hertz, filter)))
    })
  }

  private peaks(setting: Setting, stage: Stage, level: 'loud' | 'extreme') {
    const keys = this.keysOf(setting)
    const key = `peaks ${keys.network} ${this.demandKey(setting, stage, level, keys.filter)}`
    return this.once(key, () => tallest(this.network(setting), this.demand(setting, stage, level)))
  }

  /** The preamp's own worst margin: its input stage, and its output where that is a limit of its own. */
  private preampMargin(setting: Setting, level: 'loud' | 'extreme') {
    const { preamp } = this.draws.inputs
    const { inputVolts } = this.networkFigures(setting)
    const input = this.peaks(setting, 'input', level)
    const allowed = allowedInputVolts(inputLimit(preamp, setting.gain), 1000)
    const margin = each(inputVolts.length, (i) => 20 * Math.log10(allowed / inputVolts[i]) - 10 * Math.log10(input.power[i]))
    if (preamp.topology === 'output-limited') return { margin, hertz: input.hertz }
    const hertz = newFloats(margin.length)
    hertz.set(input.hertz)
    const output = this.peaks(setting, 'output', level)
    const openVolts = this.openVolts(setting)
    const most = this.draws.values.maximumOutput
    for (let i = 0; i < margin.length; i++) {
      const behind = 20 * Math.log10(most[i] / openVolts[i]) - 10 * Math.log10(output.power[i])
      if (behind >= margin[i]) continue
      margin[i] = behind
      hertz[i] = output.hertz[i]
    }
    return { margin, hertz }
  }

  private shownFigures(setting: Setting): Partial<FigureDraws> {
    const { draws } = this
    const network = this.network(setting)
    const noise = this.noise(setting)
    const { inputVolts } = this.networkFigures(setting)
    const { outputVolts } = this.gainFigures(setting)
    const { count, at1kHz } = network
    return {
      snrFlatDecibels: this.signalToNoise(setting, noise.thermalFlat, noise.currentFlat, noise.table.flatHertz),
      outputDecibelVolts: each(count, (i) => 20 * Math.log10(outputVolts[i])),
      outputReDigitalDecibels: each(count, (i) => 20 * Math.log10(outputVolts[i] / DIGITAL_SOURCE_VOLTS)),
      levelLossDecibels: each(count, (i) => -10 * Math.log10(at1kHz[i])),
      extremeMarginDecibels: this.preampMargin(setting, 'extreme').margin,
      ...responseDraws(network),
      ...resonanceDraws(network),
      coilSnrWeightedDecibels: each(count, (i) => 10 * Math.log10(inputVolts[i] ** 2 / noise.thermalWeighted[i])),
      stepUpBassCornerHertz: stepUpCorner(draws, setting),
    }
  }

  private shownByFilter({ filter }: Setting): Partial<FigureDraws> {
    const arm = this.outside.armResonanceHertz
    const with7950 = this.draws.inputs.preamp.iecBass
    const attenuation = (hertz: (i: number) => number) => each(arm.length, (i) => 10 * Math.log10(filterPower(hertz(i), filter)))
    return {
      filterAtResonanceDecibels: attenuation((i) => arm[i]),
      filterAt4HertzDecibels: attenuation(() => 4),
      filterAt20HertzDecibels: attenuation(() => 20),
      riaaAtResonanceDecibels: each(arm.length, (i) => 10 * Math.log10(playbackPower(arm[i], { with7950 }))),
    }
  }
}

type Stage = 'input' | 'output' | 'next'

interface SettingKeys {
  network: string
  gain: string
  filter: string
}

/** The ranges of every figure over the draws. */
export function rangesOf(draws: FigureDraws): Figures {
  return Object.fromEntries(
    Object.entries(draws).map(([name, values]) => [name, values ? rangeOf(values) : null]),
  ) as unknown as Figures
}
