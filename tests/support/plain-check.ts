import type { MatchInputs, UnknownName } from '@/lib/match'
import { equalisedLimit, filterPower, inputLimit } from '@/lib/match/frequency-tables'
import type { Setting } from '@/lib/match/preamp'
import { armResonanceHertz } from '@/lib/match/physics/arm'
import { midbandLossDecibels } from '@/lib/match/physics/line-output'
import { deviationDecibels, levelLossDecibels, type LoadingNetwork } from '@/lib/match/physics/loading'
import { logSpacedHertz } from '@/lib/match/physics/grid'
import { inputVolts, noiseIntegrals, noiseVolts, signalToNoiseDecibels } from '@/lib/match/physics/noise'
import { overloadMarginDecibels, worstMargin, type OverloadChain } from '@/lib/match/physics/overload-margin'
import { accelerationCornerHertz, amplitudeCornerHertz, RECORD_ENVELOPES } from '@/lib/match/physics/record-envelope'
import { equivalentLoading, type StepUpNetwork } from '@/lib/match/physics/step-up'

/**
 * The figures of one setting at one point of the doubt, straight from the formulas and one by one: no tables, no
 * shared work. Slow on purpose; the reference that ranges and speed are held against.
 */
export type PlainFigures = Record<
  | 'inputVolts'
  | 'outputVolts'
  | 'levelLossDecibels'
  | 'overloadMarginDecibels'
  | 'worstMarginDecibels'
  | 'extremeMarginDecibels'
  | 'nextMarginDecibels'
  | 'cartridgeLoadOhms'
  | 'loadRatio'
  | 'totalFarads'
  | 'liftDecibels'
  | 'fallDecibels'
  | 'at10kHzDecibels'
  | 'at15kHzDecibels'
  | 'at20kHzDecibels'
  | 'snrFlatDecibels'
  | 'snrWeightedDecibels'
  | 'coilSnrWeightedDecibels'
  | 'armResonanceHertz'
  | 'cableLossAt20kHzDecibels'
  | 'dividerLossDecibels',
  number
>

/** One value for every quantity in doubt, SI. */
export type Point = Record<UnknownName, number>

const TILT_HERTZ = logSpacedHertz({ low: 1000, high: 15_000, count: 121 })

export function plainFigures(inputs: MatchInputs, setting: Setting, at: Point): PlainFigures {
  const { preamp } = inputs
  const stepUp = inputs.stepUp ?? setting.path.stepUp
  const outside = stepUp ? at.stepUpCapacitance : at.armWiring + at.lead
  const coil: LoadingNetwork = {
    coilOhms: at.coilResistance,
    coilHenries: at.inductance,
    loadOhms: at.inputLoad,
    loadFarads: outside + at.inputCapacitance,
  }
  const transformer: StepUpNetwork | null = stepUp
    ? { ...coil, turnsRatio: at.stepUpRatio, primaryOhms: at.stepUpPrimary, secondaryOhms: at.stepUpSecondary, primaryHenries: null }
    : null
  const network = transformer ?? coil
  const loading = transformer ? equivalentLoading(transformer) : coil
  const volts = inputVolts(network, at.output)
  const open = volts * 10 ** (at.gain / 20)
  const doubling = inputs.output === 'balanced' && preamp.hasBalancedOutput ? 2 : 1
  const line = { outputOhms: at.outputResistance, inputOhms: at.nextResistance, cableFarads: at.cable, couplingFarads: Infinity }
  const out = open * doubling * 10 ** (midbandLossDecibels(line) / 20)
  // EMF per lateral velocity: the nominal output belongs to 5 cm/s peak lateral, 5/√2 peak of one channel.
  const sensitivityVoltSecondsPerMetre = (Math.SQRT2 * at.output) / (0.05 / Math.SQRT2)
  const chain = (level: 'loud' | 'extreme'): OverloadChain => ({
    network,
    sensitivityVoltSecondsPerMetre,
    envelope: RECORD_ENVELOPES[level],
    limit: inputLimit(preamp, setting.gain),
  })
  const margin = (level: 'loud' | 'extreme') => {
    const input = worstMargin(chain(level)).decibels
    if (preamp.topology === 'output-limited') return input
    const behind: OverloadChain = { ...chain(level), limit: { ...equalisedLimit(preamp), limit: { voltsAt1k: at.maximumOutput / 10 ** (at.gain / 20) } } }
    return Math.min(input, worstMargin(behind).decibels)
  }
  const noise = noiseIntegrals(network, { with7950: preamp.iecBass })
  const amplifier = { voltsPerRootHertz: at.voltageNoise, amperesPerRootHertz: at.currentNoise, kelvin: inputs.temperatureKelvin }
  const weighted = noiseVolts(noise.aWeighted, amplifier)
  const tilts = Array.from(TILT_HERTZ, (hertz) => deviationDecibels(loading, hertz))
  const cartridgeLoad = transformer ? at.stepUpPrimary + (at.stepUpSecondary + at.inputLoad) / at.stepUpRatio ** 2 : at.inputLoad
  const parallelOhms = (at.outputResistance * at.nextResistance) / (at.outputResistance + at.nextResistance)
  return {
    inputVolts: volts,
    outputVolts: out,
    levelLossDecibels: levelLossDecibels(loading),
    overloadMarginDecibels: marginAt1kHz(setting, inputs, volts),
    worstMarginDecibels: margin('loud'),
    extremeMarginDecibels: margin('extreme'),
    nextMarginDecibels: nextMargin(chain('loud'), inputs, setting, at.nextMaximum, out / volts),
    cartridgeLoadOhms: cartridgeLoad,
    loadRatio: cartridgeLoad / at.coilResistance,
    totalFarads: coil.loadFarads,
    liftDecibels: Math.max(0, ...tilts),
    fallDecibels: Math.min(0, ...tilts),
    at10kHzDecibels: deviationDecibels(loading, 10_000),
    at15kHzDecibels: deviationDecibels(loading, 15_000),
    at20kHzDecibels: deviationDecibels(loading, 20_000),
    snrFlatDecibels: signalToNoiseDecibels({ signalVolts: volts, noise: noiseVolts(noise.flat, amplifier).total }),
    snrWeightedDecibels: signalToNoiseDecibels({ signalVolts: volts, noise: weighted.total }),
    coilSnrWeightedDecibels: signalToNoiseDecibels({ signalVolts: volts, noise: weighted.thermal }),
    armResonanceHertz: armResonanceHertz({
      massKilograms: at.armMass + at.cartridgeMass + at.fixings,
      complianceMetresPerNewton: at.compliance,
    }),
    cableLossAt20kHzDecibels: -10 * Math.log10(1 + (2 * Math.PI * 20_000 * parallelOhms * at.cable) ** 2),
    dividerLossDecibels: midbandLossDecibels(line),
  }
}

function marginAt1kHz(setting: Setting, { preamp }: MatchInputs, volts: number): number {
  const nominal: OverloadChain = {
    network: { coilOhms: 0, coilHenries: 0, loadOhms: 1, loadFarads: 0 },
    sensitivityVoltSecondsPerMetre: Math.SQRT2 * volts,
    envelope: { footing: 'perChannel', amplitudeMetres: 1, velocityMetresPerSecond: 1, accelerationMetresPerSecondSquared: 1e9 },
    limit: inputLimit(preamp, setting.gain),
  }
  return overloadMarginDecibels(nominal, 1000)
}

/** The next input behind gain, equalisation and filter. The filter only takes away in the bass, so a grid will do. */
function nextMargin(chain: OverloadChain, { preamp }: MatchInputs, { filter }: Setting, maximumVolts: number, gain: number): number {
  const behind = { ...chain, limit: { ...equalisedLimit(preamp), limit: { voltsAt1k: maximumVolts / gain } } }
  if (!filter) return worstMargin(behind).decibels
  const grid = [...logSpacedHertz({ low: 20, high: 20_000, count: 241 }), amplitudeCornerHertz(chain.envelope), accelerationCornerHertz(chain.envelope)]
  return Math.min(...grid.map((hertz) => overloadMarginDecibels(behind, hertz) - 10 * Math.log10(filterPower(hertz, filter))))
}
