import { allowedInputVolts, type OverloadTopology } from '../../lib/match/physics/overload'
import { overloadMarginDecibels, worstMargin, type OverloadChain } from '../../lib/match/physics/overload-margin'
import { STANDARD_GRAVITY } from '../../lib/match/physics/constants'
import { accelerationCornerHertz, amplitudeCornerHertz } from '../../lib/match/physics/record-envelope'
import { atHertz, type Figures } from './figures'
import { flagOf, networkOf, numberOf, wordOf, type Inputs } from './inputs'

const TOPOLOGIES: Readonly<Record<string, OverloadTopology>> = {
  output_limited: 'outputLimited',
  first_stage_flat: 'flatFirstStage',
  first_stage_bass_eq: 'bassFirst',
}
const USUAL = atHertz(20, 50, 100, 500, 1000, 2000, 5000, 10_000, 20_000)

/** Cases state their envelope as peaks of one channel. */
export function overloadCase(inputs: Inputs): Figures {
  const chain: OverloadChain = {
    network: networkOf(inputs),
    // 1 mV per cm/s is 0.1 V per m/s.
    sensitivityVoltSecondsPerMetre: numberOf(inputs, 'emf_sensitivity_mV_per_cm_s') / 10,
    envelope: {
      footing: 'perChannel',
      amplitudeMetres: numberOf(inputs, 'record_amplitude_limit_um_peak') * 1e-6,
      velocityMetresPerSecond: numberOf(inputs, 'record_velocity_limit_cm_s_peak') / 100,
      accelerationMetresPerSecondSquared: numberOf(inputs, 'record_acceleration_limit_g_peak') * STANDARD_GRAVITY,
    },
    limit: {
      topology: wordOf(inputs, 'overload_topology', TOPOLOGIES),
      limit: { voltsAt1k: numberOf(inputs, 'overload_1kHz_mV_rms') * 1e-3 },
      with7950: flagOf(inputs, 'iec_7950us'),
    },
  }
  const worst = worstMargin(chain)
  return {
    named: {
      corner_amplitude_velocity_Hz: () => amplitudeCornerHertz(chain.envelope),
      corner_velocity_acceleration_Hz: () => accelerationCornerHertz(chain.envelope),
      worst_margin_20_20k_dB: () => worst.decibels,
      worst_margin_frequency_Hz: () => worst.hertz,
    },
    series: [
      { template: 'margin_{f}_dB', usual: USUAL, value: (hertz = 0) => overloadMarginDecibels(chain, hertz) },
      {
        template: 'allowed_input_{f}_mV_peak',
        usual: USUAL,
        value: (hertz = 0) => allowedInputVolts(chain.limit, hertz) * Math.SQRT2 * 1e3,
      },
    ],
  }
}
