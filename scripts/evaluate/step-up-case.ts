import { magnitude } from '../../lib/match/physics/complex'
import { toDecibels } from '../../lib/match/physics/decibels'
import {
  bassCornerHertz,
  cartridgeLoad,
  lossFromTurnsGainDecibels,
  netGain,
  reflectedFarads,
  reflectedLoadOhms,
  reflectedLoadWithWindingsOhms,
  stepUpDeviationDecibels,
  stepUpNodeImpedance,
  trebleCornerHertz,
  turnsGainDecibels,
} from '../../lib/match/physics/step-up'
import { atHertz, type Figures } from './figures'
import { numberOf, stepUpOf, type Inputs } from './inputs'

export function stepUpCase(inputs: Inputs): Figures {
  const network = stepUpOf(inputs)
  const gain = netGain(network, 1000)
  // The treble corner is stated for the circuit without a primary inductance, the bass corner for the one with.
  const corner: Figures['named'] =
    network.primaryHenries === null
      ? { f_minus3dB_hf_re_1kHz_Hz: () => trebleCornerHertz(network) }
      : { f_bass_corner_half_power_Hz: () => bassCornerHertz(network) }
  return {
    named: {
      turns_gain_dB: () => turnsGainDecibels(network),
      reflected_load_ideal_ohm: () => reflectedLoadOhms(network),
      reflected_load_with_windings_ohm: () => reflectedLoadWithWindingsOhms(network),
      reflected_capacitance_nF: () => reflectedFarads(network) * 1e9,
      cartridge_load_abs_z_1kHz_ohm: () => magnitude(cartridgeLoad(network, 1000)),
      net_gain_1kHz_re_emf_x: () => gain,
      net_gain_1kHz_re_emf_dB: () => toDecibels(gain),
      loss_re_turns_gain_1kHz_dB: () => lossFromTurnsGainDecibels(network),
      source_impedance_at_preamp_1kHz_ohm: () => magnitude(stepUpNodeImpedance(network, 1000)),
      output_mV_rms: () => numberOf(inputs, 'emf_mV_rms') * gain,
      ...corner,
    },
    series: [
      {
        template: 'deviation_{f}_re_1kHz_dB',
        usual: atHertz(20, 100, 10_000, 20_000, 50_000),
        value: (hertz = 0) => stepUpDeviationDecibels(network, hertz),
      },
    ],
  }
}
