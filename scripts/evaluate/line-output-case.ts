import {
  bassCornerExactHertz,
  bassCornerSimpleHertz,
  lineDeviationDecibels,
  lineResponseDecibels,
  midbandLossDecibels,
  trebleCornerExactHertz,
  trebleCornerSimpleHertz,
  type LineNetwork,
} from '../../lib/match/physics/line-output'
import type { Figures } from './figures'
import { numberOf, numberOr, type Inputs } from './inputs'

export function lineOutputCase(inputs: Inputs): Figures {
  const network: LineNetwork = {
    outputOhms: numberOf(inputs, 'output_resistance_ohm'),
    couplingFarads: numberOr(inputs, 'coupling_capacitor_uF', Infinity) * 1e-6,
    cableFarads: numberOr(inputs, 'cable_capacitance_total_pF', 0) * 1e-12,
    inputOhms: numberOf(inputs, 'input_resistance_ohm'),
  }
  return {
    named: {
      midband_loss_dB: () => midbandLossDecibels(network),
      hf_half_power_simple_Hz: () => trebleCornerSimpleHertz(network),
      hf_half_power_exact_Hz: () => trebleCornerExactHertz(network),
      lf_half_power_simple_Hz: () => bassCornerSimpleHertz(network),
      lf_half_power_exact_Hz: () => bassCornerExactHertz(network),
    },
    series: [
      { template: 'loss_{f}_dB', usual: [['1kHz']], value: (hertz = 0) => lineResponseDecibels(network, hertz) },
      {
        template: 'deviation_{f}_re_midband_dB',
        usual: [['20Hz'], ['20kHz']],
        value: (hertz = 0) => lineDeviationDecibels(network, hertz),
      },
    ],
  }
}
