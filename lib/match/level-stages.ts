import { rangeOf, spread } from './ensemble'
import type { FigureBench, FigureDraws } from './figure-draws'
import type { Setting } from './preamp'
import type { Range } from './quantity'
import type { LevelStage } from './result'
import { envelopeOverNominal } from './frequency-tables'
import { GROOVE_NOISE_DECIBELS } from './rules'

/** How far loud records peak over nominal level where velocity limits them, dB. */
export const LOUD_PEAK_DECIBELS = 20 * Math.log10(envelopeOverNominal(2000, 'loud'))

const shifted = (range: Range, by: number): Range => ({ low: range.low + by, nominal: range.nominal + by, high: range.high + by })
const times = (range: Range, factor: number): Range => ({ low: range.low * factor, nominal: range.nominal * factor, high: range.high * factor })

/**
 * The four places of the level diagram, from stylus to amplifier, all on one footing: 0 dB is nominal level.
 * Limits are taken at the frequency where loud records come closest, so their room is that of the figures.
 */
export function levelStages(bench: FigureBench, setting: Setting, figures: FigureDraws): LevelStage[] {
  const { draws } = bench
  const doubling = draws.inputs.output === 'balanced' && draws.inputs.preamp.hasBalancedOutput ? 2 : 1
  const gain = spread(setting.gain.gainDecibels, 'gain', draws.ensemble)
  const input = rangeOf(figures.inputVolts)
  const open = rangeOf(figures.inputVolts.map((volts, i) => volts * doubling * 10 ** (gain[i] / 20)))
  const output = rangeOf(figures.outputVolts)
  const preampRoom = rangeOf(figures.worstMarginDecibels as Float64Array)
  const nextRoom = rangeOf(figures.nextMarginDecibels as Float64Array)
  const preampHertz = (figures.worstMarginHertz as Float64Array)[0]
  const nextHertz = (figures.nextMarginHertz as Float64Array)[0]
  const floor = rangeOf((figures.snrWeightedDecibels as Float64Array).map((snr) => -snr))
  const loud = 10 ** (LOUD_PEAK_DECIBELS / 20)
  const groove = -GROOVE_NOISE_DECIBELS
  const stage = (key: LevelStage['key'], usual: Range, room: Range, limitHertz: number): LevelStage => ({
    key,
    usualVolts: usual,
    peakVolts: times(usual, loud),
    limitDecibels: shifted(room, LOUD_PEAK_DECIBELS),
    floorDecibels: floor,
    roomDecibels: room,
    limitHertz,
  })
  return [
    {
      key: 'record',
      usualVolts: null,
      peakVolts: null,
      limitDecibels: null,
      floorDecibels: { low: groove, nominal: groove, high: groove },
      roomDecibels: null,
      limitHertz: null,
    },
    stage('into-preamp', input, preampRoom, preampHertz),
    stage('out-of-preamp', open, preampRoom, preampHertz),
    stage('into-next', output, nextRoom, nextHertz),
  ]
}
