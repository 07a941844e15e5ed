import type { ArmAndLead, Cartridge, CartridgeType, NextInput } from './inputs'
import { between, exactly, type Quantity } from './quantity'

/**
 * What is usual, for values that nobody knows. Each steps in as a range, named `typical`, or `unknown` where not
 * even the type is known. Ranges met in practice (read in part, memory in part): moving magnet 2.5–10 mV,
 * 400–1500 Ω, 250–900 mH; moving iron 2–6 mV, 300–1000 Ω, 30–550 mH; high-output moving coil 1–2.5 mV, 70–200 Ω,
 * 0.06–2 mH; low-output moving coil 0.1–0.7 mV, 2–45 Ω, 2–60 µH.
 */
interface Usual {
  outputVolts: [number, number]
  coilOhms: [number, number]
  coilHenries: [number, number]
  massKilograms: [number, number]
  compliance: [number, number]
}

const MAGNET: Usual = {
  outputVolts: [2.5e-3, 8e-3],
  coilOhms: [400, 1500],
  coilHenries: [0.25, 0.9],
  massKilograms: [5e-3, 7.5e-3],
  compliance: [10e-3, 30e-3],
}
const IRON: Usual = { ...MAGNET, outputVolts: [2e-3, 6e-3], coilOhms: [300, 1000], coilHenries: [0.03, 0.55] }
const COIL: Usual = {
  outputVolts: [0.2e-3, 2.5e-3],
  coilOhms: [3, 160],
  coilHenries: [2e-6, 1e-3],
  massKilograms: [5.5e-3, 11e-3],
  compliance: [7e-3, 18e-3],
}
const LOW_COIL: Usual = { ...COIL, outputVolts: [0.15e-3, 0.7e-3], coilOhms: [2, 45], coilHenries: [2e-6, 60e-6] }
const HIGH_COIL: Usual = { ...COIL, outputVolts: [1e-3, 2.5e-3], coilOhms: [70, 200], coilHenries: [60e-6, 2e-3] }
const ANY: Usual = {
  outputVolts: [0.2e-3, 8e-3],
  coilOhms: [3, 1500],
  coilHenries: [2e-6, 0.9],
  massKilograms: [5e-3, 11e-3],
  compliance: [7e-3, 30e-3],
}

/** Output that parts low-output from high-output moving coils, volts at the reference level. */
const HIGH_OUTPUT_COIL_VOLTS = 0.85e-3

/** What is known of a cartridge's electrics, for narrowing what is not. */
export interface KnownOfCartridge {
  outputVolts?: Quantity | null
  coilOhms?: Quantity | null
  coilHenries?: Quantity | null
}

function usualFor(type: CartridgeType, known: KnownOfCartridge): Usual {
  if (type === 'moving-magnet') return MAGNET
  if (type === 'moving-iron') return IRON
  if (type !== 'moving-coil') return ANY
  const output = known.outputVolts
  if (output && output.low >= HIGH_OUTPUT_COIL_VOLTS) return HIGH_COIL
  if (output && output.high < HIGH_OUTPUT_COIL_VOLTS) return LOW_COIL
  const coil = known.coilOhms
  if (coil && coil.low >= 60) return HIGH_COIL
  if (coil && coil.high < 60) return LOW_COIL
  return COIL
}

const clamp = (value: number, [low, high]: [number, number]) => Math.min(Math.max(value, low), high)

/**
 * Turns follow from output and wire: a magnet's inductance grows with the square of its turns, its output with the
 * turns, its resistance with them. So 5.4 mV usually means some 400 to 550 mH. Rule of thumb, no source; the
 * published pairs 610 Ω/470 mH, 1000 Ω/500 mH, 1300 Ω/700 mH lie inside.
 */
function usualInductance(type: CartridgeType, known: KnownOfCartridge, usual: Usual): [number, number] {
  if (type === 'moving-magnet' && known.outputVolts) {
    const middle = 0.47 * (known.outputVolts.nominal / 5.4e-3) ** 0.6
    const spread = known.coilOhms ? 1.17 : 1.3
    return [clamp(middle / spread, usual.coilHenries), clamp(middle * spread, usual.coilHenries)]
  }
  if (type === 'moving-coil' && known.coilOhms) {
    const middle = 1.9e-6 * known.coilOhms.nominal
    return [clamp(middle / 2.5, usual.coilHenries), clamp(middle * 2.5, usual.coilHenries)]
  }
  return usual.coilHenries
}

function usualResistance(type: CartridgeType, known: KnownOfCartridge, usual: Usual): [number, number] {
  if (type === 'moving-coil' && known.outputVolts) {
    const middle = 25 * (known.outputVolts.nominal / 0.4e-3) ** 1.1
    return [clamp(middle / 3, usual.coilOhms), clamp(middle * 2.2, usual.coilOhms)]
  }
  return usual.coilOhms
}

type TypicalCartridge = Pick<
  Cartridge,
  'outputVolts' | 'coilOhms' | 'coilHenries' | 'massKilograms' | 'complianceMetresPerNewton'
>

/**
 * The usual values of a cartridge of this type, each narrowed by what is known. Known values are not repeated:
 * the caller puts them in place of these. Complete for every type; types without a coil give the widest ranges.
 */
export function typicalCartridge(type: CartridgeType, known: KnownOfCartridge = {}): TypicalCartridge {
  const usual = usualFor(type, known)
  const origin = type === 'unknown' ? 'unknown' : 'typical'
  const range = ([low, high]: [number, number]) => between(low, high, origin)
  return {
    outputVolts: range(usual.outputVolts),
    coilOhms: range(usualResistance(type, known, usual)),
    coilHenries: range(usualInductance(type, known, usual)),
    massKilograms: range(usual.massKilograms),
    complianceMetresPerNewton: range(usual.compliance),
  }
}

/** Arm of an unknown make; screws and nuts; arm wire 10–40 pF (published range); lead 80–200 pF. */
export const TYPICAL_ARM: Pick<ArmAndLead, 'effectiveMassKilograms' | 'fixingsKilograms' | 'wiringFarads'> = {
  effectiveMassKilograms: between(8e-3, 16e-3, 'typical'),
  fixingsKilograms: between(0.5e-3, 1.5e-3, 'typical'),
  wiringFarads: between(10e-12, 40e-12, 'typical'),
}
export const TYPICAL_LEAD_FARADS: Quantity = between(80e-12, 200e-12, 'typical')

/** Capacitance of ordinary cable, farads per metre: 66–100 pF/m (published range). */
export const TYPICAL_CABLE_FARADS_PER_METRE: Quantity = between(66e-12, 100e-12, 'typical')

/** Next inputs by kind: amplifiers take 2–10 V, digital inputs clip near 2 V RMS (common practice, no source). */
export const TYPICAL_NEXT: Record<NextInput['kind'], Pick<NextInput, 'maximumVolts' | 'inputOhms'>> = {
  line: { maximumVolts: between(3.5, 10, 'typical'), inputOhms: between(10e3, 100e3, 'typical') },
  digital: { maximumVolts: between(1.9, 2.3, 'typical'), inputOhms: between(10e3, 47e3, 'typical') },
  recorder: { maximumVolts: between(2, 5, 'typical'), inputOhms: between(22e3, 100e3, 'typical') },
  headphones: { maximumVolts: between(2.5, 8, 'typical'), inputOhms: between(10e3, 50e3, 'typical') },
  phono: { maximumVolts: between(0.05, 0.2, 'typical'), inputOhms: between(45e3, 50e3, 'typical') },
  unknown: { maximumVolts: between(2, 10, 'unknown'), inputOhms: between(10e3, 100e3, 'unknown') },
}
/** A cable of about a metre from preamp to amplifier. */
export const TYPICAL_CABLE_FARADS: Quantity = between(70e-12, 200e-12, 'typical')

/** Room temperature, kelvin; noise figures in the trade are for 25 °C. */
export const ROOM_TEMPERATURE_KELVIN = 298.15

/** No transformer and no cable: a capacitance known to be nothing. */
export const NO_FARADS: Quantity = exactly(0, 'owner')
