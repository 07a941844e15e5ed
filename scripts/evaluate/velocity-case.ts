import {
  outputAt,
  perChannelRms,
  sensitivity,
  velocityAs,
  velocityLevelDecibels,
  type Velocity,
  type VelocityDirection,
  type VelocityKind,
} from '../../lib/match/physics/velocity'
import type { Figures } from './figures'
import { numberOf, wordOf, type Inputs } from './inputs'

const KINDS: Readonly<Record<string, VelocityKind>> = { peak: 'peak', rms: 'rms' }
const DIRECTIONS: Readonly<Record<string, VelocityDirection>> = {
  lateral: 'lateral',
  vertical: 'vertical',
  '45deg': 'perChannel',
  per_channel: 'perChannel',
}
const CENTIMETRES = 100

export function velocityCase(inputs: Inputs): Figures {
  const spec = velocityOf(inputs, 'spec')
  const target = velocityOf(inputs, 'target')
  const printed = { outputVolts: numberOf(inputs, 'spec_output_mV_rms') * 1e-3, velocity: spec }
  const output = outputAt(target, printed)
  const figures = (name: string, velocity: Velocity) => ({
    [`${name}_velocity_per_channel_rms_cm_s`]: () => perChannelRms(velocity) * CENTIMETRES,
    [`${name}_velocity_per_channel_peak_cm_s`]: () => velocityAs(velocity, { kind: 'peak', direction: 'perChannel' }) * CENTIMETRES,
    [`${name}_velocity_lateral_rms_cm_s`]: () => velocityAs(velocity, { kind: 'rms', direction: 'lateral' }) * CENTIMETRES,
    [`${name}_velocity_lateral_peak_cm_s`]: () => velocityAs(velocity, { kind: 'peak', direction: 'lateral' }) * CENTIMETRES,
  })
  return {
    named: {
      ...figures('spec', spec),
      ...figures('target', target),
      // 1 mV per cm/s is 0.1 V per m/s.
      sensitivity_mV_per_cm_s_per_channel: () => sensitivity(printed) * 10,
      output_at_target_mV_rms: () => output * 1e3,
      output_at_target_mV_peak: () => output * Math.SQRT2 * 1e3,
      target_level_re_spec_dB: () => velocityLevelDecibels(target, spec),
    },
    series: [],
  }
}

function velocityOf(inputs: Inputs, name: 'spec' | 'target'): Velocity {
  return {
    metresPerSecond: numberOf(inputs, `${name}_velocity_cm_s`) / CENTIMETRES,
    kind: wordOf(inputs, `${name}_velocity_kind`, KINDS),
    direction: wordOf(inputs, `${name}_direction`, DIRECTIONS),
  }
}
