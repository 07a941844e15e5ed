import type { Draws } from './draws'
import type { FigureBench } from './figure-draws'
import { envelopeOverNominal, filterPower, inputLimit } from './frequency-tables'
import { deviationDecibels, type NetworkDraws } from './network-draws'
import type { Setting } from './preamp'
import type { Curves, RecordLevel } from './result'
import { armResponseDecibels } from './physics/arm'
import { logSpacedHertz } from './physics/grid'
import { allowedInputVolts } from './physics/overload'

/** Points of each plotted curve. */
const POINTS = 121
/** The arm and stylus as a second-order resonance; its quality is taken as 2 (common practice, no source). */
const ARM_QUALITY = 2

type Band = { low: number[]; nominal: number[]; high: number[] }

/** A figure at each frequency over all draws. */
function band(hertz: Float64Array, count: number, value: (i: number, hertz: number) => number): Band {
  const low: number[] = []
  const nominal: number[] = []
  const high: number[] = []
  for (const f of hertz) {
    const middle = value(0, f)
    let least = middle
    let most = middle
    for (let i = 1; i < count; i++) {
      const v = value(i, f)
      if (v < least) least = v
      else if (v > most) most = v
    }
    low.push(least)
    nominal.push(middle)
    high.push(most)
  }
  return { low, nominal, high }
}

/** The three plotted responses of a setting: treble, room at each pitch, arm. */
export function curvesOf(bench: FigureBench, setting: Setting): Curves {
  const { draws } = bench
  const { network } = bench.network(setting)
  const count = network.count
  const loadingHertz = logSpacedHertz({ low: 100, high: 40_000, count: POINTS })
  const roomHertz = logSpacedHertz({ low: 20, high: 20_000, count: POINTS })
  const armHertz = logSpacedHertz({ low: 2, high: 60, count: POINTS })
  const figures = bench.figures(setting)
  const loud = roomAt(draws, setting, network, figures.inputVolts, 'loud')
  const extreme = roomAt(draws, setting, network, figures.inputVolts, 'extreme')
  const resonance = figures.armResonanceHertz as Float64Array
  const arm = band(armHertz, count, (i, hertz) =>
    armResponseDecibels({ hertz, resonanceHertz: resonance[i], qualityFactor: ARM_QUALITY }),
  )
  return {
    loading: { hertz: [...loadingHertz], ...band(loadingHertz, count, (i, hertz) => deviationDecibels(network, i, hertz)) },
    room: { hertz: [...roomHertz], ...band(roomHertz, count, loud), extremeLow: band(roomHertz, count, extreme).low },
    arm: {
      hertz: [...armHertz],
      ...arm,
      filtered: setting.filter ? arm.nominal.map((value, k) => value + 10 * Math.log10(filterPower(armHertz[k], setting.filter))) : null,
    },
  }
}

/** Room of the preamp above the record's envelope at a frequency, dB. */
function roomAt(draws: Draws, setting: Setting, network: NetworkDraws, inputVolts: Float64Array, level: RecordLevel) {
  const limit = inputLimit(draws.inputs.preamp, setting.gain)
  const shape = new Map<number, number>()
  return (i: number, hertz: number) => {
    let stage = shape.get(hertz)
    if (stage === undefined) {
      stage = 20 * Math.log10(allowedInputVolts(limit, hertz) / envelopeOverNominal(hertz, level))
      shape.set(hertz, stage)
    }
    return stage - 20 * Math.log10(inputVolts[i]) - deviationDecibels(network, i, hertz)
  }
}
