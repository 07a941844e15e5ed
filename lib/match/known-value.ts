import type { MatchInputs, UnknownName } from './inputs'
import { exactly } from './quantity'

/** The same inputs with one unknown settled. Unknowns of the preamp itself are not an owner's to settle. */
export function withKnown(inputs: MatchInputs, name: UnknownName, value: number): MatchInputs {
  const known = exactly(value, 'owner')
  const { cartridge, arm, next, stepUp } = inputs
  switch (name) {
    case 'output':
      return { ...inputs, cartridge: { ...cartridge, outputVolts: known } }
    case 'coilResistance':
      return { ...inputs, cartridge: { ...cartridge, coilOhms: known } }
    case 'inductance':
      return { ...inputs, cartridge: { ...cartridge, coilHenries: known } }
    case 'cartridgeMass':
      return { ...inputs, cartridge: { ...cartridge, massKilograms: known } }
    case 'compliance':
      return { ...inputs, cartridge: { ...cartridge, complianceMetresPerNewton: known } }
    case 'armWiring':
      return { ...inputs, arm: { ...arm, wiringFarads: known } }
    case 'lead':
      return { ...inputs, arm: { ...arm, leadFarads: known } }
    case 'armMass':
      return { ...inputs, arm: { ...arm, effectiveMassKilograms: known } }
    case 'fixings':
      return { ...inputs, arm: { ...arm, fixingsKilograms: known } }
    case 'nextMaximum':
      return { ...inputs, next: { ...next, maximumVolts: known } }
    case 'nextResistance':
      return { ...inputs, next: { ...next, inputOhms: known } }
    case 'cable':
      return { ...inputs, next: { ...next, cableFarads: known } }
    case 'stepUpRatio':
      return { ...inputs, stepUp: stepUp && { ...stepUp, ratio: known } }
    case 'stepUpPrimary':
      return { ...inputs, stepUp: stepUp && { ...stepUp, primaryOhms: known } }
    case 'stepUpSecondary':
      return { ...inputs, stepUp: stepUp && { ...stepUp, secondaryOhms: known } }
    case 'stepUpCapacitance':
      return { ...inputs, stepUp: stepUp && { ...stepUp, secondaryFarads: known } }
    case 'stepUpInductance':
      return { ...inputs, stepUp: stepUp && { ...stepUp, primaryHenries: known } }
    default:
      return inputs
  }
}
