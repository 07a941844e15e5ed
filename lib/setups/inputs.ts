import type { Positions } from '../match/controls'
import type { Cartridge, MatchInputs, NextInput } from '../match/inputs'
import { COMPLIANCE_FACTORS } from '../match/physics/arm'
import type { Preamp, StepUp } from '../match/preamp'
import { between, scaled, type Quantity } from '../match/quantity'
import {
  ROOM_TEMPERATURE_KELVIN,
  TYPICAL_ARM,
  TYPICAL_CABLE_FARADS,
  TYPICAL_CABLE_FARADS_PER_METRE,
  TYPICAL_LEAD_FARADS,
  TYPICAL_NEXT,
  typicalCartridge,
} from '../match/typical'
import type { Answers, Stated, WireAnswer } from './answers'
import { conditionText, footingOf } from './footing'
import { readPositions } from './positions'

/**
 * Answers, read, made into what the engine takes. Pure; runs in the browser and on the server.
 * Prefixes end here: millivolts, kilohms, picofarads in, SI out. What is not known is filled with what is usual, and
 * its origin says so.
 */
export function toMatchInputs(answers: Answers, preamp: Preamp): MatchInputs {
  return {
    preamp,
    present: presentOf(answers, preamp),
    cartridge: toCartridge(answers.cartridge),
    arm: {
      effectiveMassKilograms: quantity(answers.arm.effectiveMassGrams, 1e-3) ?? TYPICAL_ARM.effectiveMassKilograms,
      fixingsKilograms: quantity(answers.arm.fixingsGrams, 1e-3) ?? TYPICAL_ARM.fixingsKilograms,
      wiringFarads: quantity(answers.arm.wiringPicofarads, 1e-12) ?? TYPICAL_ARM.wiringFarads,
      leadFarads: wire(answers.arm.lead, TYPICAL_LEAD_FARADS),
    },
    stepUp: answers.stepUp && toStepUp(answers.stepUp),
    output: preamp.hasBalancedOutput ? answers.output : 'unbalanced',
    next: toNextInput(answers.next),
    wishedVolts: wished(answers.wishedMillivolts),
    temperatureKelvin: ROOM_TEMPERATURE_KELVIN,
  }
}

/** A stated value times a unit, with its text kept beside it. */
function quantity(stated: Stated | null, size: number, condition?: string): Quantity | null {
  if (!stated) return null
  const { low, nominal, high, origin, text } = stated
  return scaled({ low, nominal, high, origin, printed: text, ...(condition ? { condition } : {}) }, size)
}

/** The cartridge at the reference level. Complete for every type. */
export function toCartridge(cartridge: Answers['cartridge']): Cartridge {
  const known = {
    outputVolts: outputVolts(cartridge),
    coilOhms: quantity(cartridge.coilOhms, 1),
    coilHenries: quantity(cartridge.inductanceMillihenries, 1e-3),
  }
  const usual = typicalCartridge(cartridge.type, known)
  const range = (stated: Stated | null, size: number) =>
    stated && { low: stated.low * size, high: stated.high * size }
  return {
    name: cartridge.name,
    type: cartridge.type,
    outputVolts: known.outputVolts ?? usual.outputVolts,
    coilOhms: known.coilOhms ?? usual.coilOhms,
    coilHenries: known.coilHenries ?? usual.coilHenries,
    recommendedLoadOhms: range(cartridge.loadOhms, 1),
    recommendedFarads: range(cartridge.capacitancePicofarads, 1e-12),
    massKilograms: quantity(cartridge.massGrams, 1e-3) ?? usual.massKilograms,
    complianceMetresPerNewton: complianceAt10Hertz(cartridge) ?? usual.complianceMetresPerNewton,
    trackingForceNewtons: quantity(cartridge.trackingForceGrams, GRAM_FORCE_NEWTONS),
    channels: cartridge.mono ? 'mono' : 'stereo',
  }
}

/** One gram-force, newtons. */
const GRAM_FORCE_NEWTONS = 9.80665e-3

function outputVolts(cartridge: Answers['cartridge']): Quantity | null {
  const printed = quantity(cartridge.outputMillivolts, 1e-3, conditionText(cartridge))
  return printed && times(printed, footingOf(cartridge))
}

const CONDITIONS = { '10-hz': 'dynamic10Hz', '100-hz': 'dynamic100Hz', static: 'static', 'not-said': 'unknown' } as const
const CONDITION_WORDS = { '10-hz': 'at 10 Hz', '100-hz': 'at 100 Hz', static: 'static', 'not-said': 'condition not said' }

function complianceAt10Hertz({ compliance, complianceAt }: Answers['cartridge']): Quantity | null {
  const printed = quantity(compliance, 1e-3, CONDITION_WORDS[complianceAt])
  return printed && times(printed, COMPLIANCE_FACTORS[CONDITIONS[complianceAt]])
}

/** Two things that each carry doubt, multiplied; both positive. The origin is that of the first. */
function times(a: Quantity, b: { low: number; nominal: number; high: number }): Quantity {
  return { ...a, low: a.low * b.low, nominal: a.nominal * b.nominal, high: a.high * b.high }
}

function wire(answer: WireAnswer, usual: Quantity): Quantity {
  if ('picofarads' in answer) return quantity(answer.picofarads, 1e-12) ?? usual
  const perMetre = quantity(answer.picofaradsPerMetre, 1e-12) ?? TYPICAL_CABLE_FARADS_PER_METRE
  const { low, nominal, high, text } = answer.metres
  const total = times({ low, nominal, high, origin: perMetre.origin }, perMetre)
  return { ...total, printed: answer.picofaradsPerMetre ? `${text} of ${answer.picofaradsPerMetre.text}` : text }
}

/** Ratios in use; windings and lead of small transformers for moving coils. Common practice, no source. */
export const TYPICAL_STEP_UP = {
  ratio: between(5, 40, 'typical'),
  primaryOhms: between(0.5, 20, 'typical'),
  secondaryOhms: between(100, 2000, 'typical'),
  secondaryFarads: between(50e-12, 250e-12, 'typical'),
}

function toStepUp(stepUp: NonNullable<Answers['stepUp']>): StepUp {
  return {
    name: stepUp.name,
    ratio: quantity(stepUp.ratio, 1) ?? TYPICAL_STEP_UP.ratio,
    primaryOhms: quantity(stepUp.primaryOhms, 1) ?? TYPICAL_STEP_UP.primaryOhms,
    secondaryOhms: quantity(stepUp.secondaryOhms, 1) ?? TYPICAL_STEP_UP.secondaryOhms,
    primaryHenries: quantity(stepUp.primaryHenries, 1),
    secondaryFarads: quantity(stepUp.leadPicofarads, 1e-12) ?? TYPICAL_STEP_UP.secondaryFarads,
  }
}

function toNextInput(next: Answers['next']): NextInput {
  const usual = TYPICAL_NEXT[next.kind]
  const own = quantity(next.inputKilohms, 1e3) ?? usual.inputOhms
  return {
    kind: next.kind,
    name: next.name,
    maximumVolts: quantity(next.maximumVolts, 1) ?? usual.maximumVolts,
    inputOhms: inParallel(own, next.alsoKilohms.map((also) => scaled(also, 1e3))),
    cableFarads: wire(next.cable, TYPICAL_CABLE_FARADS),
  }
}

/** 1/Σ(1/R), end by end: it rises with every one of them. */
function inParallel(own: Quantity, others: { low: number; nominal: number; high: number }[]): Quantity {
  if (others.length === 0) return own
  const all = [own, ...others]
  const combined = (end: 'low' | 'nominal' | 'high') => 1 / all.reduce((sum, one) => sum + 1 / one[end], 0)
  const { printed: _, ...rest } = own
  return { ...rest, low: combined('low'), nominal: combined('nominal'), high: combined('high') }
}

/** One wished level is met within 3 dB either way. */
function wished(stated: Stated | null): MatchInputs['wishedVolts'] {
  if (!stated) return null
  const { low, high } = stated
  const slack = low === high ? Math.SQRT2 : 1
  return { low: (low * 1e-3) / slack, high: high * 1e-3 * slack }
}

function presentOf({ present }: Answers, preamp: Preamp): Positions | null {
  if (present.kind === 'unknown') return null
  if (present.kind === 'delivered') return { left: preamp.asDelivered, right: preamp.asDelivered }
  return readPositions(present, preamp)
}
