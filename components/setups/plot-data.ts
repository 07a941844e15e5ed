import type { ArmCurves } from '../plots/arm-facts'
import type { LevelPicture } from '../plots/level-facts'
import type { LoadingPlotData } from '../plots/loading-plot'
import type { NoiseLevels } from '../plots/noise-facts'
import type { OverloadCurves } from '../plots/overload-facts'
import type { Turns, TurnVerdict } from '../plots/turns-facts'
import type { MatchInputs, NextInput, UnknownName } from '@/lib/match/inputs'
import { LOUD_PEAK_DECIBELS } from '@/lib/match/level-stages'
import type { Curves, LevelStage, NumberToFindNext, VerdictKind } from '@/lib/match/result'
import { GROOVE_NOISE_DECIBELS } from '@/lib/match/rules'
import { figureText, rounded, voltsText } from '@/lib/setups/format'
import { stretchWords } from '@/lib/setups/sentences/number-to-find'
import { inDisplayUnit, UNKNOWN_WORDS } from '@/lib/setups/sentences/unknowns'
import type { Outcome } from '@/lib/setups/views'

/** What the drawings of a sheet are made from, out of a result. Plain values, the same on server and in the browser. */

const INTO: Record<NextInput['kind'], string> = {
  line: 'Into amplifier',
  digital: 'Into digital input',
  recorder: 'Into recorder',
  headphones: 'Into headphone stage',
  phono: 'Into phono input',
  unknown: 'Into amplifier',
}

/** Ordinary records peak at 25 cm/s, dB over 5 cm/s. */
const ORDINARY_PEAK_DECIBELS = 20 * Math.log10(25 / 5)

export function levelPicture(stages: readonly LevelStage[], { next }: MatchInputs): LevelPicture {
  const titles: Record<LevelStage['key'], string> = {
    record: 'Record',
    'into-preamp': 'Into preamp',
    'out-of-preamp': 'Out of preamp',
    'into-next': INTO[next.kind],
  }
  return {
    stages: stages.map((stage) => ({
      key: stage.key,
      title: titles[stage.key],
      usual: stage.key === 'record' ? '5 cm/s' : voltsOf(stage, 'usualVolts'),
      peak: stage.key === 'record' ? '38 cm/s' : voltsOf(stage, 'peakVolts'),
      limit: stage.limitDecibels,
      floor: stage.floorDecibels,
      room: stage.roomDecibels,
    })),
    peaks: { ordinary: ORDINARY_PEAK_DECIBELS, loud: LOUD_PEAK_DECIBELS },
  }
}

function voltsOf(stage: LevelStage, which: 'usualVolts' | 'peakVolts'): string {
  const volts = stage[which]
  if (!volts) return ''
  return stage.key === 'into-preamp' ? figureText(volts, 'volts') : voltsText(volts)
}

/** Less than this between the ends is one line, dB. */
const ONE_LINE_DECIBELS = 0.05

export interface Compared {
  label: string
  decibels: number[]
}

export function loadingPlot({ loading }: Curves, { cartridge }: MatchInputs, label: string, compare: Compared | null): LoadingPlotData {
  const { hertz, low, nominal, high } = loading
  const known = low.every((value, i) => Math.abs(high[i] - value) < ONE_LINE_DECIBELS)
  return {
    hertz,
    low: known ? null : low,
    // While not even the type is known, a middle line would claim more than there is.
    nominal: cartridge.type === 'unknown' && !known ? null : nominal,
    high: known ? null : high,
    compare,
    label,
  }
}

export function overloadCurves({ curves, evaluation }: Outcome): OverloadCurves {
  const { hertz, low, nominal, high, extremeLow } = curves.room
  const { worstMarginDecibels, worstMarginHertz } = evaluation.figures
  return {
    hertz,
    loud: { low, nominal, high },
    extreme: { low: extremeLow },
    worst: { decibels: worstMarginDecibels.low, hertz: worstMarginHertz.nominal },
  }
}

export function armCurves({ curves, evaluation }: Outcome): ArmCurves {
  const { hertz, low, nominal, high, filtered } = curves.arm
  return {
    hertz,
    low,
    nominal,
    high,
    filtered,
    resonance: evaluation.figures.armResonanceHertz,
    filterOn: evaluation.setting.filter !== null,
  }
}

export function noiseLevels({ evaluation }: Outcome): NoiseLevels {
  const { snrWeightedDecibels, coilSnrWeightedDecibels } = evaluation.figures
  return { groove: GROOVE_NOISE_DECIBELS, yours: snrWeightedDecibels, coil: coilSnrWeightedDecibels.nominal }
}

const TURN_VERDICTS: Record<VerdictKind, TurnVerdict> = {
  suits: 'suits',
  'suits-with-changes': 'changes',
  'suits-with-a-limit': 'limit',
  'does-not-suit': 'no',
  'cannot-say': 'unsure',
}

/** Where each scale may begin and end, so that it starts and stops on a round number. */
const ROUND = [1, 1.5, 2, 3, 5, 7]

function roundBelow(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value))
  return Math.max(...ROUND.map((step) => step * decade).filter((step) => step <= value * 0.9999), decade / 1.4)
}

function roundAbove(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value))
  return Math.min(...[...ROUND, 10].map((step) => step * decade).filter((step) => step >= value * 1.0001), decade * 14)
}

/** Values along the axis that are easy to read off, four to six of them. */
function roundTicks(min: number, max: number): number[] {
  const ticks: number[] = []
  for (let decade = 10 ** Math.floor(Math.log10(min)); decade <= max; decade *= 10) {
    for (const step of [1, 2, 5]) {
      const value = Number((step * decade).toPrecision(3))
      if (value > min * 1.15 && value < max * 0.87) ticks.push(value)
    }
  }
  return [min, ...(ticks.length > 5 ? ticks.filter((_, i) => i % 2 === 0) : ticks), max].map((value) => Number(value.toPrecision(3)))
}

export function turnsOf(next: NumberToFindNext, inputs: MatchInputs): Turns {
  const at = (si: number) => inDisplayUnit(next.unknown, si)
  const [low, high] = [at(next.low), at(next.high)]
  const [min, max] = low > 0 ? [roundBelow(low), roundAbove(high)] : [low, high]
  return {
    min,
    max,
    unit: unitOf(next.unknown),
    low,
    high,
    ticks: low > 0 ? roundTicks(min, max) : [low, high],
    stretches: next.stretches.map((stretch, i) => ({
      from: i === 0 ? min : rounded(at(stretch.from), 2),
      to: i === next.stretches.length - 1 ? max : rounded(at(stretch.to), 2),
      verdict: TURN_VERDICTS[stretch.verdict],
      text: stretchWords(stretch, inputs).todo,
    })),
  }
}

const unitOf = (unknown: UnknownName) => (unknown === 'stepUpRatio' ? ': 1' : UNKNOWN_WORDS[unknown].unit)
