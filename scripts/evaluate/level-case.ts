import { toDecibels } from '../../lib/match/physics/decibels'
import { dbuOf, dbvOf, gainNeededDecibels, outputVolts, peakLevelVolts } from '../../lib/match/physics/level'
import { inputVolts } from '../../lib/match/physics/noise'
import type { Figures } from './figures'
import { networkOf, numberOf, type Inputs } from './inputs'

export function levelCase(inputs: Inputs): Figures {
  const input = inputVolts(networkOf(inputs), numberOf(inputs, 'nominal_emf_mV_rms') * 1e-3)
  const output = outputVolts({ inputVolts: input, gainDecibels: numberOf(inputs, 'gain_1kHz_dB') })
  const wanted = () => numberOf(inputs, 'target_output_mV_rms') * 1e-3
  return {
    named: {
      input_1kHz_mV_rms: () => input * 1e3,
      output_nominal_mV_rms: () => output * 1e3,
      output_nominal_dBV: () => dbvOf(output),
      output_nominal_dBu: () => dbuOf(output),
      output_at_peak_level_mV_rms_equiv: () =>
        peakLevelVolts({ nominalVolts: output, decibelsAbove: numberOf(inputs, 'peak_level_above_nominal_dB') }) * 1e3,
      gain_needed_for_target_dB: () => gainNeededDecibels({ inputVolts: input, wantedVolts: wanted() }),
      output_re_target_dB: () => toDecibels(output / wanted()),
    },
    series: [],
  }
}
