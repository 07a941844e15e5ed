import type { MatchInputs, Quantity, UnknownName } from '@/lib/match'
import type { Setting } from '@/lib/match/preamp'

/** The box of a setting: every quantity that the figures rest on. */
export function boxOf(inputs: MatchInputs, setting: Setting): Record<UnknownName, Quantity> {
  const { cartridge, arm, next, preamp } = inputs
  const nothing = { low: 0, nominal: 0, high: 0, origin: 'printed' as const }
  const stepUp = inputs.stepUp ?? setting.path.stepUp
  return {
    output: cartridge.outputVolts,
    coilResistance: cartridge.coilOhms,
    inductance: cartridge.coilHenries,
    armWiring: arm.wiringFarads,
    lead: arm.leadFarads,
    stepUpRatio: stepUp?.ratio ?? nothing,
    stepUpPrimary: stepUp?.primaryOhms ?? nothing,
    stepUpSecondary: stepUp?.secondaryOhms ?? nothing,
    stepUpCapacitance: stepUp?.secondaryFarads ?? nothing,
    stepUpInductance: stepUp?.primaryHenries ?? nothing,
    inputLoad: setting.loadOhms,
    inputCapacitance: setting.inputFarads,
    gain: setting.gain.gainDecibels,
    voltageNoise: setting.gain.voltageNoise,
    currentNoise: setting.gain.currentNoise,
    maximumOutput: preamp.maximumOutputVolts,
    outputResistance: preamp.outputOhms,
    couplingCapacitor: preamp.couplingFarads ?? nothing,
    nextMaximum: next.maximumVolts,
    nextResistance: next.inputOhms,
    cable: next.cableFarads,
    armMass: arm.effectiveMassKilograms,
    cartridgeMass: cartridge.massKilograms,
    fixings: arm.fixingsKilograms,
    compliance: cartridge.complianceMetresPerNewton,
  }
}
