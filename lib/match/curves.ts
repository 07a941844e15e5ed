import type { Draws } from './draws'
import type { FigureBench, FigureDraws } from './figure-draws'
import { envelopeOverNominal, filterPower, inputLimit } from './frequency-tables'
import type { NetworkDraws } from './network-draws'
import type { Setting } from './preamp'
import type { Curves, RecordLevel } from './result'
import { armResponsePower } from './physics/arm'
import { angular } from './physics/constants'
import { powerToDecibels } from './physics/decibels'
import { logSpacedHertz } from './physics/grid'
import { allowedInputVolts } from './physics/overload'

/** Points of each plotted curve. */
const POINTS = 121
/** The arm and stylus as a second-order resonance; its quality is taken as 2 (common practice, no source). */
const ARM_QUALITY = 2

type Band = { low: number[]; nominal: number[]; high: number[] }

/** A power ratio at each frequency over all draws, in decibels; the logarithm is taken last, of three values only. */
function band(hertz: Float64Array, count: number, powerAt: (hertz: number) => (i: number) => number): Band {
  const result: Band = { low: [], nominal: [], high: [] }
  for (const f of hertz) {
    const power = powerAt(f)
    const middle = power(0)
    let least = middle
    let most = middle
    for (let i = 1; i < count; i++) {
      const value = power(i)
      if (value < least) least = value
      else if (value > most) most = value
    }
    result.low.push(powerToDecibels(least))
    result.nominal.push(powerToDecibels(middle))
    result.high.push(powerToDecibels(most))
  }
  return result
}

/** The three plotted responses of a setting: treble, room at each pitch, arm. */
export function curvesOf(bench: FigureBench, setting: Setting, figures: FigureDraws): Curves {
  const network = bench.network(setting)
  const { count } = network
  const loadingHertz = logSpacedHertz({ low: 100, high: 40_000, count: POINTS })
  const roomHertz = logSpacedHertz({ low: 20, high: 20_000, count: POINTS })
  const armHertz = logSpacedHertz({ low: 2, high: 60, count: POINTS })
  const room = (level: RecordLevel) => band(roomHertz, count, roomPower(bench.draws, setting, network, figures.inputVolts, level))
  const arm = band(armHertz, count, armPower(figures.armResonanceHertz as Float64Array))
  return {
    loading: { hertz: [...loadingHertz], ...band(loadingHertz, count, loadingPower(network)) },
    room: { hertz: [...roomHertz], ...room('loud'), extremeLow: room('extreme').low },
    arm: {
      hertz: [...armHertz],
      ...arm,
      filtered: setting.filter ? arm.nominal.map((value, k) => value + powerToDecibels(filterPower(armHertz[k], setting.filter))) : null,
    },
  }
}

/** |H|² re 1 kHz. */
function loadingPower({ d0, d1, d2, at1kHz }: NetworkDraws) {
  return (hertz: number) => {
    const w = angular(hertz) ** 2
    return (i: number) => at1kHz[i] / (d0[i] + w * (d1[i] + w * d2[i]))
  }
}

/** What the preamp allows over what the record's envelope asks for, squared. */
function roomPower(draws: Draws, setting: Setting, network: NetworkDraws, inputVolts: Float64Array, level: RecordLevel) {
  const limit = inputLimit(draws.inputs.preamp, setting.gain)
  const response = loadingPower(network)
  return (hertz: number) => {
    const allowed = (allowedInputVolts(limit, hertz) / envelopeOverNominal(hertz, level)) ** 2
    const at = response(hertz)
    return (i: number) => allowed / (inputVolts[i] * inputVolts[i] * at(i))
  }
}

/** How strongly the arm passes a frequency, as a power ratio. */
function armPower(resonanceHertz: Float64Array) {
  return (hertz: number) => (i: number) => armResponsePower({ hertz, resonanceHertz: resonanceHertz[i], qualityFactor: ARM_QUALITY })
}
