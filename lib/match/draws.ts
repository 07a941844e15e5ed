import { drawEnsemble, spread, type Ensemble } from './ensemble'
import { UNKNOWNS, type MatchInputs, type UnknownName } from './inputs'
import type { Preamp, StepUp } from './preamp'
import { exactly, isExact, type Quantity } from './quantity'

const NOTHING = exactly(0)

/** Every quantity of the inputs that does not depend on a preamp's setting, by its name. */
function quantitiesOutside(inputs: MatchInputs): Partial<Record<UnknownName, Quantity>> {
  const { cartridge, arm, next, preamp, stepUp } = inputs
  const transformer = stepUp ?? preamp.paths.find((path) => path.stepUp)?.stepUp ?? null
  return {
    output: cartridge.outputVolts,
    coilResistance: cartridge.coilOhms,
    inductance: cartridge.coilHenries,
    armWiring: arm.wiringFarads,
    lead: arm.leadFarads,
    ...(transformer ? quantitiesOfStepUp(transformer) : {}),
    maximumOutput: preamp.maximumOutputVolts,
    outputResistance: preamp.outputOhms,
    couplingCapacitor: preamp.couplingFarads ?? NOTHING,
    nextMaximum: next.maximumVolts,
    nextResistance: next.inputOhms,
    cable: next.cableFarads,
    armMass: arm.effectiveMassKilograms,
    cartridgeMass: cartridge.massKilograms,
    fixings: arm.fixingsKilograms,
    compliance: cartridge.complianceMetresPerNewton,
  }
}

function quantitiesOfStepUp(stepUp: StepUp): Partial<Record<UnknownName, Quantity>> {
  return {
    stepUpRatio: stepUp.ratio,
    stepUpPrimary: stepUp.primaryOhms,
    stepUpSecondary: stepUp.secondaryOhms,
    stepUpCapacitance: stepUp.secondaryFarads,
    stepUpInductance: stepUp.primaryHenries ?? NOTHING,
  }
}

/** Quantities of the preamp itself: within tolerance, and the owner cannot find them out. */
function namesInPreamp(preamp: Preamp): UnknownName[] {
  const inDoubt = (quantities: Quantity[]) => quantities.some((quantity) => !isExact(quantity))
  const names: UnknownName[] = []
  const loads = preamp.groups.flatMap((group) => {
    if (group.sets !== 'load') return []
    return group.how === 'parallel' ? group.resistorsOhms : Object.values(group.options).map((option) => option.loadOhms)
  })
  const capacitors = preamp.groups.flatMap((group) => (group.sets === 'capacitance' ? group.capacitorsFarads : []))
  if (inDoubt([...preamp.paths.map((path) => path.loadOhms), ...loads])) names.push('inputLoad')
  if (inDoubt([...preamp.paths.map((path) => path.inputFarads), ...capacitors])) names.push('inputCapacitance')
  if (inDoubt(preamp.gains.map((gain) => gain.gainDecibels))) names.push('gain')
  if (inDoubt(preamp.gains.map((gain) => gain.voltageNoise))) names.push('voltageNoise')
  if (inDoubt(preamp.gains.map((gain) => gain.currentNoise))) names.push('currentNoise')
  return names
}

/** The draws of everything outside the preamp's switches, one array of values for each quantity. */
export interface Draws {
  inputs: MatchInputs
  ensemble: Ensemble
  values: Record<UnknownName, Float64Array>
}

/** Draws `count` members of the ensemble for these inputs. Quantities of a setting are filled in with the setting. */
export function drawInputs(inputs: MatchInputs, count: number): Draws {
  const outside = quantitiesOutside(inputs)
  const inDoubt = UNKNOWNS.filter((name) => outside[name] && !isExact(outside[name]))
  const ensemble = drawEnsemble([...inDoubt, ...namesInPreamp(inputs.preamp)], count)
  const values = Object.fromEntries(
    UNKNOWNS.map((name) => [name, spread(outside[name] ?? NOTHING, name, ensemble)]),
  ) as Record<UnknownName, Float64Array>
  return { inputs, ensemble, values }
}

/** The quantities in doubt that an owner could find out, with their values. */
export function findableQuantities(inputs: MatchInputs): { name: UnknownName; quantity: Quantity }[] {
  const builtIn: UnknownName[] = inputs.stepUp ? [] : ['stepUpRatio', 'stepUpPrimary', 'stepUpSecondary', 'stepUpCapacitance', 'stepUpInductance']
  const own: UnknownName[] = ['maximumOutput', 'outputResistance', 'couplingCapacitor', ...builtIn]
  return Object.entries(quantitiesOutside(inputs))
    .map(([name, quantity]) => ({ name: name as UnknownName, quantity }))
    .filter(({ name, quantity }) => !isExact(quantity) && !own.includes(name))
}
