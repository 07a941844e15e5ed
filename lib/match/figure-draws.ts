import type { Filter } from './controls'
import type { Draws } from './draws'
import { rangeOf, spread } from './ensemble'
import { cartridgeLoad, each, figuresOutside, resonanceDraws, responseDraws, stepUpCorner, tiltDraws } from './figure-parts'
import { demandTable, equalisedLimit, filterPower, inputLimit, marginGrid, noiseTable, type Demand } from './frequency-tables'
import type { UnknownName } from './inputs'
import { drawNetwork, noiseDraws, tallest, type NetworkDraws } from './network-draws'
import { DIGITAL_SOURCE_VOLTS } from './physics/level'
import { allowedInputVolts } from './physics/overload'
import { playbackPower } from './physics/riaa'
import type { GainOption, Setting } from './preamp'
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
  private readonly spreads = new Map<Quantity, Float64Array>()
  private readonly outside: Partial<Record<FigureName, Float64Array>>

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
    const full = this.depth === 'full'
    return {
      ...NONE,
      ...this.outside,
      ...this.networkFigures(setting),
      ...this.gainFigures(setting),
      ...this.filterFigures(setting),
      ...(full ? { ...this.shownFigures(setting), ...this.shownByFilter(setting) } : {}),
    } as FigureDraws
  }

  network(setting: Setting): NetworkDraws {
    return this.once(`network ${networkKey(setting)}`, () => drawNetwork(this.draws, setting))
  }

  private networkFigures(setting: Setting) {
    return this.once(`load ${networkKey(setting)}`, () => {
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
    return this.once(`noise ${networkKey(setting)}`, () => {
      const { preamp, temperatureKelvin } = this.draws.inputs
      const table = noiseTable(preamp.iecBass, NOISE_POINTS[this.depth])
      return { table, ...noiseDraws(this.network(setting), table, temperatureKelvin) }
    })
  }

  private gainFigures(setting: Setting) {
    return this.once(`gain ${gainKey(setting)}`, () => {
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
    const filter = setting.filter ? `${setting.filter.cornerHertz}/${setting.filter.order}` : ''
    return this.once(`filter ${gainKey(setting)} ${filter}`, () => {
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
    return this.once(`open ${gainKey(setting)}`, () => {
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

  /** What records ask of a stage, by the stage's own shape over frequency. */
  private demand(setting: Setting, stage: Stage, level: 'loud' | 'extreme'): Demand {
    const { preamp } = this.draws.inputs
    const filter = stage === 'next' ? setting.filter : null
    return this.once(`demand ${demandKey(setting.gain, stage, level, filter)}`, () => {
      const limit = stage === 'input' ? inputLimit(preamp, setting.gain) : equalisedLimit(preamp)
      const at1kHz = allowedInputVolts(limit, 1000)
      const grid = marginGrid(MARGIN_POINTS[this.depth], level)
      return demandTable(grid, level, (hertz) => allowedInputVolts(limit, hertz) / at1kHz / Math.sqrt(filterPower(hertz, filter)))
    })
  }

  private peaks(setting: Setting, stage: Stage, level: 'loud' | 'extreme') {
    const filter = stage === 'next' ? setting.filter : null
    const key = `peaks ${networkKey(setting)} ${demandKey(setting.gain, stage, level, filter)}`
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
    const hertz = input.hertz.slice()
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
    const arm = this.outside.armResonanceHertz as Float64Array
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

const networkKey = ({ path, loadOhms, inputFarads }: Setting): string => `${path.id} ${loadOhms.low} ${loadOhms.nominal} ${inputFarads.nominal}`
const gainKey = (setting: Setting): string => `${networkKey(setting)} ${setting.gain.id}`

/** Stages behind the equalisation share a shape; an input stage with measured points has its own at each gain. */
function demandKey(gain: GainOption, stage: Stage, level: string, filter: Filter | null): string {
  const own = stage === 'input' ? (gain.overload.length > 1 ? gain.id : 'input') : ''
  return `${own} ${level} ${filter ? `${filter.cornerHertz}/${filter.order}` : ''}`
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

/** The ranges of every figure over the draws. */
export function rangesOf(draws: FigureDraws): Figures {
  return Object.fromEntries(
    Object.entries(draws).map(([name, values]) => [name, values ? rangeOf(values) : null]),
  ) as unknown as Figures
}
