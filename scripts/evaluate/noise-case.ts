import { magnitude, type Complex } from '../../lib/match/physics/complex'
import { nodeImpedance } from '../../lib/match/physics/loading'
import {
  inputVolts,
  kelvinOf,
  noiseFigureDecibels,
  noiseIntegrals,
  noiseVolts,
  signalToNoiseDecibels,
  type NoiseVolts,
} from '../../lib/match/physics/noise'
import { stepUpNodeImpedance } from '../../lib/match/physics/step-up'
import type { Figures, Value } from './figures'
import { flagOf, networkOf, numberOf, numberOr, type Inputs } from './inputs'

export function noiseCase(inputs: Inputs): Figures {
  const network = networkOf(inputs)
  const node = (hertz: number): Complex =>
    'turnsRatio' in network ? stepUpNodeImpedance(network, hertz) : nodeImpedance(network, hertz)
  const signalVolts = inputVolts(network, numberOf(inputs, 'nominal_emf_mV_rms') * 1e-3)
  const preamp = {
    voltsPerRootHertz: numberOr(inputs, 'preamp_en_nV_rtHz', 0) * 1e-9,
    amperesPerRootHertz: numberOr(inputs, 'preamp_in_pA_rtHz', 0) * 1e-12,
    kelvin: kelvinOf(numberOf(inputs, 'temperature_C')),
  }
  const integrals = noiseIntegrals(network, { with7950: flagOf(inputs, 'iec_7950us') })
  return {
    named: {
      signal_at_preamp_input_1kHz_mV_rms: () => signalVolts * 1e3,
      ...weighted('unweighted', noiseVolts(integrals.flat, preamp), signalVolts),
      ...weighted('A_weighted', noiseVolts(integrals.aWeighted, preamp), signalVolts),
    },
    series: [
      { template: 'source_abs_z_{f}_ohm', usual: [['1kHz']], value: (hertz = 0) => magnitude(node(hertz)) },
      { template: 'source_re_z_{f}_ohm', usual: [['1kHz'], ['10kHz']], value: (hertz = 0) => node(hertz).re },
    ],
  }
}

function weighted(name: string, noise: NoiseVolts, signalVolts: number): Record<string, () => Value> {
  return {
    [`thermal_noise_${name}_uV_rms`]: () => noise.thermal * 1e6,
    [`preamp_en_noise_${name}_uV_rms`]: () => noise.voltage * 1e6,
    [`preamp_in_noise_${name}_uV_rms`]: () => noise.current * 1e6,
    [`total_noise_${name}_uV_rms`]: () => noise.total * 1e6,
    [`snr_thermal_limit_${name}_dB`]: () => signalToNoiseDecibels({ signalVolts, noise: noise.thermal }),
    [`snr_total_${name}_dB`]: () => signalToNoiseDecibels({ signalVolts, noise: noise.total }),
    [`noise_figure_${name}_dB`]: () => noiseFigureDecibels(noise),
  }
}
