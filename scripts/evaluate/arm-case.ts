import { armResonanceHertz, complianceForResonance, highPassDecibels, massForResonance } from '../../lib/match/physics/arm'
import { addedBassCutDecibels, playbackDecibels } from '../../lib/match/physics/riaa'
import { atHertz, type Figures } from './figures'
import { numberOf, numberOr, type Inputs } from './inputs'

const ORDERS = ['1', '2', '3', '4'] as const
/** 1 µm/mN is 10⁻³ m/N. */
const COMPLIANCE_UNIT = 1e-3

export function armCase(inputs: Inputs): Figures {
  const grams =
    numberOf(inputs, 'arm_effective_mass_g') + numberOf(inputs, 'cartridge_mass_g') + numberOr(inputs, 'fixings_mass_g', 0)
  const massKilograms = grams * 1e-3
  const complianceMetresPerNewton = numberOf(inputs, 'compliance_um_mN') * COMPLIANCE_UNIT
  const resonance = armResonanceHertz({ massKilograms, complianceMetresPerNewton })
  const cornerHertz = numberOr(inputs, 'highpass_fc_Hz', 0)
  return {
    named: {
      total_mass_g: () => grams,
      resonance_Hz: () => resonance,
      iec_7950us_alone_at_resonance_dB: () => addedBassCutDecibels(resonance),
      riaa_gain_at_resonance_re_1kHz_dB: () => playbackDecibels(resonance),
    },
    series: [
      {
        template: 'compliance_for_{f}_um_mN',
        usual: atHertz(8, 10, 12),
        value: (hertz = 0) => complianceForResonance({ massKilograms, hertz }) / COMPLIANCE_UNIT,
      },
      {
        template: 'total_mass_for_{f}_g',
        usual: atHertz(8, 10, 12),
        value: (hertz = 0) => massForResonance({ complianceMetresPerNewton, hertz }) * 1e3,
      },
      {
        template: 'highpass_order{n}_at_resonance_dB',
        usual: ORDERS.map((order) => [order]),
        value: (order = 0) => highPassDecibels({ hertz: resonance, cornerHertz, order }),
      },
      {
        template: 'highpass_order{n}_at_{f}_dB',
        usual: ORDERS.map((order) => [order, '20Hz']),
        value: (order = 0, hertz = 0) => highPassDecibels({ hertz, cornerHertz, order }),
      },
    ],
  }
}
