import {
  deviationDecibels,
  fallBelowReferenceHertz,
  halfPowerHertz,
  levelLossDecibels,
  maximumDeviationDecibels,
  naturalHertz,
  peakHeightAboveBassDecibels,
  peakHeightDecibels,
  peakHertz,
  qualityFactor,
  resonanceHertz,
  responseDecibels,
} from '../../lib/match/physics/loading'
import { atHertz, type Figures } from './figures'
import { loadingOf, type Inputs } from './inputs'

export function loadingCase(inputs: Inputs): Figures {
  const network = loadingOf(inputs)
  return {
    named: {
      level_loss_1kHz_dB: () => levelLossDecibels(network),
      resonance_lc_Hz: () => resonanceHertz(network),
      resonance_natural_Hz: () => naturalHertz(network),
      q_factor: () => qualityFactor(network),
      peak_frequency_Hz: () => peakHertz(network),
      peak_height_re_1kHz_dB: () => peakHeightDecibels(network),
      peak_height_re_lf_dB: () => peakHeightAboveBassDecibels(network),
      f_minus3dB_re_1kHz_Hz: () => fallBelowReferenceHertz(network),
      f_half_power_re_lf_Hz: () => halfPowerHertz(network),
      max_abs_deviation_1k_to_20kHz_dB: () => maximumDeviationDecibels(network),
    },
    series: [
      {
        template: 'deviation_{f}_re_1kHz_dB',
        usual: [['10kHz'], ['15kHz'], ['20kHz']],
        value: (hertz = 0) => deviationDecibels(network, hertz),
      },
      {
        template: 'response_{f}_re_emf_dB',
        usual: atHertz(20, 100, 500, 1000, 2000, 5000, 10_000, 12_500, 15_000, 16_000, 20_000, 30_000, 50_000),
        value: (hertz = 0) => responseDecibels(network, hertz),
      },
    ],
  }
}
