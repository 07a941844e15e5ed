import type { Candidate } from './candidates'
import type { Draws } from './draws'
import { isMagnet, recommendedLoad } from './judge'
import type { Judgement } from './judgement'
import type { FindingCode, Remedy } from './result'
import { AT_LEAST, INSIDE } from './rules'

/** A step-up should bring the signal here, at the MM input (common practice, no source). Volts. */
const STEPPED_UP_VOLTS = { low: 2.5e-3, high: 6e-3 }
/** Load that the coil should keep, as a multiple of its resistance, behind a transformer. */
const LOAD_OVER_COIL = 4

/** What would make it fit, for the rules that hold it back. Empty when nothing does. */
export function remediesFor(chosen: Candidate, draws: Draws): Remedy[] {
  const heaviest = Math.max(2, ...chosen.judgements.map(({ counts }) => counts))
  const heavy = chosen.judgements.filter(({ counts }) => counts === heaviest)
  const remedies: Remedy[] = []
  for (const judgement of heavy) {
    for (const remedy of remediesOf(judgement, chosen, draws)) {
      if (!remedies.some(({ kind }) => kind === remedy.kind)) remedies.push(remedy)
    }
  }
  return remedies
}

function remediesOf(judgement: Judgement, chosen: Candidate, draws: Draws): Remedy[] {
  const { preamp, stepUp, cartridge } = draws.inputs
  const other = (pathId: 'mm' | 'mc'): Remedy[] =>
    preamp.paths.some((path) => path.id === pathId) && chosen.setting.path.id !== pathId ? [{ kind: 'other-input', pathId }] : []
  const tooStrong = (): Remedy[] => [...(stepUp ? [{ kind: 'without-step-up' as const }] : []), ...other('mm')]
  const codes: Partial<Record<FindingCode, () => Remedy[]>> = {
    'level-low': () => [
      { kind: 'more-gain', decibels: 20 * Math.log10(INSIDE.outputVolts.fine[0] / chosen.figures.outputVolts[0]) },
      ...stepUpRemedy(draws),
      { kind: 'other-model', needs: 'gain' },
    ],
    hiss: () => [...stepUpRemedy(draws), { kind: 'other-model', needs: 'gain' }],
    'level-high': () => [...tooStrong(), { kind: 'attenuator', decibels: 20 * Math.log10(chosen.figures.outputVolts[0] / INSIDE.outputVolts.fine[1]) }],
    'next-input-tight': () => [...tooStrong(), { kind: 'attenuator', decibels: AT_LEAST.nextMarginDecibels.worthKnowing + 3 - lowest(chosen.figures.nextMarginDecibels) }],
    'headroom-tight': () => [...tooStrong(), { kind: 'other-model', needs: 'room' }],
    'headroom-loud-records': () => [...tooStrong(), { kind: 'other-model', needs: 'room' }],
    'load-below-recommended': () => [...other('mm'), { kind: 'other-model', needs: isMagnet(cartridge.type) ? 'magnet-input' : 'load' }],
    'load-near-coil': () => [{ kind: 'other-model', needs: 'load' }],
    'load-above-recommended': () => loadPlug(draws, chosen),
    'capacitance-high': () => [{ kind: 'lead', farads: leadForRange(draws, chosen) }],
    'treble-lift': () => [{ kind: 'lead', farads: draws.inputs.arm.leadFarads.low / 2 }],
    'double-step-up': () => [{ kind: 'without-step-up' }],
    'step-up-into-mc': () => [...other('mm'), { kind: 'without-step-up' }],
    'magnet-into-mc': () => [...other('mm'), { kind: 'other-model', needs: 'magnet-input' }],
    'two-phono-stages': () => [{ kind: 'line-input' }],
  }
  return codes[judgement.code]?.() ?? []
}

const lowest = (values: Float64Array | null): number => (values ? values.reduce((a, b) => Math.min(a, b)) : 0)

/** A transformer for a moving coil into the MM input, with the ratios that suit level and coil; none otherwise. */
function stepUpRemedy({ inputs }: Draws): Remedy[] {
  const { cartridge, preamp, stepUp } = inputs
  const mm = preamp.paths.find((path) => path.id === 'mm')
  if (!mm || stepUp || isMagnet(cartridge.type)) return []
  const volts = cartridge.outputVolts.nominal
  const mostByCoil = Math.sqrt(mm.loadOhms.nominal / (LOAD_OVER_COIL * cartridge.coilOhms.nominal))
  const ratioLow = STEPPED_UP_VOLTS.low / volts
  const ratioHigh = Math.min(STEPPED_UP_VOLTS.high / volts, mostByCoil)
  return ratioHigh >= ratioLow ? [{ kind: 'step-up', ratioLow, ratioHigh }] : []
}

/** The resistor of a loading plug that brings the load to the upper end of the maker's range: 1/(1/wanted − 1/present). */
function loadPlug(draws: Draws, { setting }: Candidate): Remedy[] {
  const wanted = recommendedLoad(draws.inputs)?.high
  const present = setting.loadOhms.nominal
  if (!wanted || wanted >= present || draws.inputs.stepUp || setting.path.stepUp) return []
  return [{ kind: 'load-plug', ohms: 1 / (1 / wanted - 1 / present) }]
}

/** Most that a lead may have so that the total stays in the printed range. */
function leadForRange({ inputs }: Draws, { setting }: Candidate): number {
  const most = inputs.cartridge.recommendedFarads?.high ?? 0
  return Math.max(0, most - setting.inputFarads.nominal - inputs.arm.wiringFarads.nominal)
}
